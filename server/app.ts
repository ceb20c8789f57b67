import { randomBytes } from "node:crypto";
import { createRequestHandler } from "@react-router/express";
import express, { type RequestHandler } from "express";
import { ipKeyGenerator, rateLimit } from "express-rate-limit";
import helmet from "helmet";
import pino from "pino";
import { pinoHttp } from "pino-http";
import { RouterContextProvider, type ServerBuild } from "react-router";
import { hashOf } from "../app/auth/sessions.server";
import { bearerOf } from "../app/auth/tokens.server";
import { appContext, nonceContext, tooManyContext } from "../app/context";
import { openDatabase } from "../app/db/client.server";
import { isUpToDate } from "../app/db/migrate.server";
import { env } from "../app/env.server";
import { pagePath } from "../app/http/path";
import { type LiveServer, startRealtime } from "../app/realtime/sockets.server";
import { sameOrigin, socketOriginAllowed } from "./origin";

type Options = { io: LiveServer; migrationsDir: string; loadBuild?: () => Promise<ServerBuild> };

/**
 * The bridge between the process and the application: opens the database and the live channel, and answers requests.
 * @throws in words when the database is behind the code
 */
export async function createApp({ io, migrationsDir, loadBuild }: Options) {
  const settings = env();
  const log = pino({ level: settings.LOG_LEVEL });
  const now = () => new Date();
  const { db, pool } = openDatabase(settings.DATABASE_URL);
  if (!(await isUpToDate(pool, migrationsDir))) {
    await pool.end();
    throw new Error(
      "The database is behind this version of the shop. Start it with `npm start`, which brings it up to date.",
    );
  }
  const realtime = startRealtime(io, {
    db,
    now,
    onFault: (error, what) => log.error({ err: error, what }, "live channel"),
  });
  const production = settings.NODE_ENV === "production";

  const app = express();
  app.disable("x-powered-by");
  app.set("trust proxy", settings.TRUST_PROXY);
  app.get("/healthz", async (_req, res) => {
    try {
      await pool.query("select 1");
      res.json({ ok: true });
    } catch {
      res.status(503).json({ ok: false });
    }
  });
  app.use(
    pinoHttp({
      logger: log,
      customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? "error" : "debug"),
      // Method, path and status only: cookies, codes in queries and what was typed stay out of the log.
      serializers: {
        req: (req: { method: string; url: string }) => ({ method: req.method, path: req.url.split("?")[0] }),
        res: (res: { statusCode: number }) => ({ status: res.statusCode }),
      },
    }),
  );
  app.use((_req, res, next) => {
    res.locals.nonce = randomBytes(16).toString("base64");
    next();
  });
  app.use(securityHeaders(production, settings.COOKIE_SECURE === "1"));
  app.use(plainRequests);
  app.use(sameOrigin);
  app.use(shortBodies);
  const tries = limited(settings.SIGN_IN_PER_MINUTE);
  const sums = limited(settings.CALC_PER_MINUTE, (req) => hashOf(tokenOf(req) ?? ""));
  app.use((req, res, next) => {
    const page = pagePath(req.path);
    if (page === "/pair" || (req.method === "POST" && (page === "/sign-in" || page === "/devices")))
      return tries(req, res, next);
    if (page?.startsWith("/api/v1/calc/")) return sums(req, res, next);
    next();
  });
  app.use((_req, res, next) => {
    // Pages are made for one person: nothing between us and them keeps a copy.
    res.set("Cache-Control", "no-store");
    next();
  });
  app.use(
    createRequestHandler({
      // Read before the first request: a new build on disk must not change a server that runs.
      build: loadBuild ?? (await import("virtual:react-router/server-build")),
      mode: settings.NODE_ENV,
      getLoadContext(_req, res) {
        const context = new RouterContextProvider();
        context.set(appContext, { db, publish: realtime.publish, dropSession: realtime.dropSession, now });
        context.set(tooManyContext, res.locals.tooMany === true);
        context.set(nonceContext, production ? (res.locals.nonce as string) : undefined);
        return context;
      },
    }),
  );

  return {
    handler: app as unknown as RequestHandler,
    allowSocket: socketOriginAllowed,
    async close() {
      await realtime.close();
      await pool.end();
    },
  };
}

const METHODS = new Set(["GET", "HEAD", "POST"]);

/** Refuses what no browser sends, before anything makes an address of it: other methods, odd targets, a broken Host. */
const plainRequests: RequestHandler = (req, res, next) => {
  if (!METHODS.has(req.method)) res.status(405).json({ message: "There is nothing that takes this." });
  else if (!req.url.startsWith("/") || !URL.canParse(`http://${req.get("host") ?? ""}/`))
    res.status(400).json({ message: "That is not an address of this shop." });
  else next();
};

/** Longer than any form or list of figures that the shop sends. */
const LONGEST_BODY = 1024 * 1024;

/** Refuses bodies that are too long, or do not say how long they are, before anything reads them. */
const shortBodies: RequestHandler = (req, res, next) => {
  const length = req.get("content-length");
  if (req.get("transfer-encoding") !== undefined)
    res.set("Connection", "close").status(411).json({ message: "Say how long the body is." });
  else if (length !== undefined && Number(length) > LONGEST_BODY)
    res.set("Connection", "close").status(413).json({ message: "That is more than can be sent at once." });
  else next();
};

/**
 * Marks requests beyond so many a minute, by address unless a key tells them apart; the route answers 429 in its own
 * words, with what was typed.
 */
function limited(perMinute: number, keyOf?: (req: express.Request) => string): RequestHandler {
  return rateLimit({
    windowMs: 60_000,
    limit: perMinute,
    standardHeaders: "draft-8",
    legacyHeaders: false,
    keyGenerator: (req) => (keyOf && tokenOf(req) ? keyOf(req) : ipKeyGenerator(req.ip ?? "")),
    handler: (_req, res, next) => {
      res.locals.tooMany = true;
      next();
    },
  });
}
const tokenOf = (req: express.Request) => bearerOf(req.get("authorization") ?? null);

function securityHeaders(production: boolean, https: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: production && {
      useDefaults: false,
      directives: {
        "default-src": ["'self'"],
        // The tag reader is WebAssembly.
        "script-src": [
          "'self'",
          "'wasm-unsafe-eval'",
          (_req, res) => `'nonce-${(res as express.Response).locals.nonce}'`,
        ],
        // Dragging and drawings to scale set style attributes.
        "style-src": ["'self'", "'unsafe-inline'"],
        "img-src": ["'self'", "data:", "blob:"],
        "font-src": ["'self'"],
        "connect-src": ["'self'"],
        "media-src": ["'self'", "blob:"],
        "worker-src": ["'self'", "blob:"],
        "object-src": ["'none'"],
        "base-uri": ["'none'"],
        "form-action": ["'self'"],
        "frame-ancestors": ["'none'"],
      },
    },
    strictTransportSecurity: https,
    referrerPolicy: { policy: "same-origin" },
  });
}
