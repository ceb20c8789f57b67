import type { IncomingMessage } from "node:http";
import type { RequestHandler } from "express";
import { bearerOf } from "../app/auth/tokens.server";

const SAFE = new Set(["GET", "HEAD", "OPTIONS"]);

/** True when an Origin header names the host that was asked. */
function originMatches(origin: string, host: string | undefined): boolean {
  try {
    return host !== undefined && new URL(origin).host === host;
  } catch {
    return false;
  }
}

/**
 * Lets an unsafe request through only when the browser says that it comes from our own pages: by Origin, or, where a
 * browser leaves that out, by Sec-Fetch-Site. A request that says neither is refused: no browser of today sends it.
 * A request with a token in its Authorization header is let through: no other site can make a browser send one, and
 * cookies do not count beside it. Covers pages, resource routes and the API alike; the framework's own check covers pages only.
 */
export const sameOrigin: RequestHandler = (req, res, next) => {
  if (SAFE.has(req.method) || bearerOf(req.get("authorization") ?? null)) return next();
  const origin = req.get("origin");
  const allowed =
    origin !== undefined
      ? originMatches(origin, req.get("host"))
      : req.get("sec-fetch-site") === "same-origin";
  if (allowed) return next();
  res.status(403).json({ message: "This request came from another site and was refused." });
};

/** The same question for the live channel's handshake, which browsers do not guard at all. */
export function socketOriginAllowed(req: IncomingMessage): boolean {
  const { origin, host } = req.headers;
  return origin === undefined ? req.headers["sec-fetch-site"] === undefined : originMatches(origin, host);
}
