// The process: makes the HTTP server and the socket server, hands them to the application, and ends in order.
// Plain JavaScript, so that it runs as it is. NODE_ENV=development serves through Vite with hot reload.
import { createServer } from "node:http";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import compression from "compression";
import express from "express";
import { Server } from "socket.io";

const root = join(dirname(fileURLToPath(import.meta.url)), "..");
const port = Number(process.env.PORT ?? 3000);
const host = process.env.HOST ?? "127.0.0.1";
const development = process.env.NODE_ENV === "development";
const migrationsDir = join(root, "drizzle");
/** Requests in flight get this long to end. */
const PATIENCE_MS = 10_000;

const outer = express();
outer.disable("x-powered-by");
const http = createServer(outer);

/** Set once the application is there: until then no socket is let in. */
let allowSocket = () => false;
const io = new Server(http, {
  serveClient: false,
  transports: ["websocket"],
  pingInterval: 8000,
  pingTimeout: 6000,
  maxHttpBufferSize: 64 * 1024,
  destroyUpgrade: !development,
  allowRequest: (req, callback) => callback(null, allowSocket(req)),
});
let shop;
let vite;
if (development) {
  const { createServer: createVite } = await import("vite");
  vite = await createVite({ root, server: { middlewareMode: true, hmr: { server: http } } });
  const { createApp } = await vite.ssrLoadModule("./server/app.ts");
  shop = await createApp({
    io,
    migrationsDir,
    loadBuild: () => vite.ssrLoadModule("virtual:react-router/server-build"),
  });
  outer.use(vite.middlewares);
} else {
  const { createApp } = await import("../build/server/index.js");
  shop = await createApp({ io, migrationsDir });
  outer.use(compression());
  const client = join(root, "build/client");
  outer.use((_req, res, next) => {
    res.set("X-Content-Type-Options", "nosniff");
    next();
  });
  outer.use(
    "/assets",
    express.static(join(client, "assets"), { immutable: true, maxAge: "1y", fallthrough: false }),
  );
  outer.use(express.static(client, { maxAge: "1h", index: false }));
}
allowSocket = shop.allowSocket;
outer.use(shop.handler);

http.on("error", (error) => {
  if (error.code === "EADDRINUSE")
    console.error(`Port ${port} is taken. Choose another:  PORT=${port + 1} npm start`);
  else console.error(error.message);
  process.exit(1);
});
http.listen(port, host, () => process.send?.("ready"));

let closing = false;
/** No new requests, those in flight may end, then the live channel and the database connections close. */
async function close() {
  if (closing) return;
  closing = true;
  const giveUp = setTimeout(() => process.exit(1), PATIENCE_MS + 2000);
  giveUp.unref();
  const ended = new Promise((resolve) => http.close(resolve));
  io.disconnectSockets(true);
  // A connection is idle as soon as its last answer is out: not waiting for its keep-alive to run out.
  const sweep = setInterval(() => http.closeIdleConnections(), 100);
  const hurry = setTimeout(() => http.closeAllConnections(), PATIENCE_MS);
  await ended;
  clearInterval(sweep);
  clearTimeout(hurry);
  await shop.close();
  await vite?.close();
  process.exit(0);
}
process.on("SIGTERM", close);
process.on("SIGINT", close);
