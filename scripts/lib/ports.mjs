import { createServer } from "node:net";
import { Problem } from "./output.mjs";

/** Where the app listens: HOST and PORT from the environment, checked. */
export function readAddress(env) {
  const host = env.HOST || "127.0.0.1";
  const port = readPort("PORT", env.PORT, 3000);
  const anyHost = { "0.0.0.0": "127.0.0.1", "::": "[::1]" }[host];
  const shownHost = anyHost ?? (host.includes(":") ? `[${host}]` : host);
  return { host, port, url: `http://${shownHost}:${port}` };
}

/** A port number from the environment, or its usual value. */
export function readPort(name, text, usual) {
  if (text === undefined || text === "") return usual;
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new Problem(`${name} is "${text}", which is not a port.`, {
    todo: `give a number from 1 to 65535, for example ${name}=${usual}.`,
  });
}

/** Throws in words when the app could not listen on its address. */
export async function requireFreePort({ host, port }) {
  const code = await tryPort(port, host);
  if (!code) return;
  const command = process.env.npm_lifecycle_event === "dev" ? "npm run dev" : "npm start";
  if (code === "EADDRINUSE") {
    throw new Problem(`Port ${port} is taken by another program, or by a Plumbay that still runs.`, {
      todo: `stop that one, or choose another port: PORT=${port + 1} ${command}`,
    });
  }
  if (code === "EACCES") {
    throw new Problem(`This account may not open port ${port}.`, {
      todo: `choose one from 1024 up: PORT=3000 ${command}`,
    });
  }
  throw new Problem(`Cannot listen on ${host}, port ${port} (${code}).`, {
    todo: "set HOST to an address of this computer, or leave it out for 127.0.0.1.",
  });
}

/** The first free port on 127.0.0.1, counting up from the given one. */
export async function firstFreePort(from) {
  for (let port = from; port < Math.min(from + 200, 65_536); port += 1) {
    if (!(await tryPort(port, "127.0.0.1"))) return port;
  }
  throw new Problem(`No free port for the database from ${from} up.`, {
    todo: "set DB_PORT to the start of a free range.",
  });
}

/** Any free port on 127.0.0.1, as the system gives them out. */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const server = createServer().once("error", reject);
    server.listen(0, "127.0.0.1", () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

/** Listens for a moment: undefined when that works, else the system's error code. */
function tryPort(port, host) {
  return new Promise((resolve) => {
    const server = createServer().once("error", (error) => resolve(error.code));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(undefined)));
  });
}
