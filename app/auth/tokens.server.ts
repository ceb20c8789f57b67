import { and, eq, isNull } from "drizzle-orm";
import { type Db, schema } from "../db/client.server";
import type { Actor } from "./actor";
import { hashOf } from "./sessions.server";

const TOUCH_EVERY_MS = 60_000;

/** The token of an Authorization header; null when the request carries none. */
export function bearerOf(header: string | null): string | null {
  return /^Bearer\s+(\S{1,200})\s*$/i.exec(header ?? "")?.[1] ?? null;
}

/** The actor behind a token, or null: unknown or revoked. */
export async function actorFromToken(db: Db, token: string, now: Date): Promise<Actor | null> {
  const { apiTokens } = schema;
  const tokenHash = hashOf(token);
  const [row] = await db
    .select()
    .from(apiTokens)
    .where(and(eq(apiTokens.tokenHash, tokenHash), isNull(apiTokens.revokedAt)));
  if (!row) return null;
  if (!row.lastUsedAt || now.getTime() - row.lastUsedAt.getTime() > TOUCH_EVERY_MS)
    await db.update(apiTokens).set({ lastUsedAt: now }).where(eq(apiTokens.id, row.id));
  return {
    shopId: row.shopId,
    role: "token",
    personId: null,
    deviceId: null,
    name: row.name,
    initials: "",
    sessionHash: "",
  };
}
