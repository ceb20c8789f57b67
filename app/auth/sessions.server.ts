import { createHash, randomBytes } from "node:crypto";
import { and, eq, gt, isNull } from "drizzle-orm";
import { type Db, type Reader, schema } from "../db/client.server";
import type { Actor } from "./actor";

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

/** How long a sign-in lasts without being used, and at most. A paired display stays until it is revoked. */
export const SESSION_LIMITS = {
  person: { idle: 8 * HOUR, absolute: 16 * HOUR },
  display: { idle: 60 * 24 * HOUR, absolute: 3650 * 24 * HOUR },
} as const;

/** Last-seen is written at most this often, so that reading a page does not write a row each time. */
const TOUCH_EVERY = MINUTE;

export const hashOf = (secret: string) => createHash("sha256").update(secret).digest("hex");
export const newSecret = () => randomBytes(32).toString("base64url");

/** Starts a session. @returns the secret for the cookie; the database keeps only its hash */
export async function startSession(
  db: Db,
  who: { shopId: number; personId: number | null; deviceId: number | null; userAgent: string },
  now: Date,
): Promise<string> {
  const secret = newSecret();
  const limits = who.personId === null ? SESSION_LIMITS.display : SESSION_LIMITS.person;
  await db.insert(schema.sessions).values({
    idHash: hashOf(secret),
    shopId: who.shopId,
    personId: who.personId,
    deviceId: who.deviceId,
    userAgent: who.userAgent.slice(0, 200),
    createdAt: now,
    lastSeenAt: now,
    expiresAt: new Date(now.getTime() + limits.absolute),
  });
  return secret;
}

/** Ends one session by its hash. Ending what has ended is fine. */
export async function endSession(db: Reader, sessionHash: string, now: Date): Promise<void> {
  await db
    .update(schema.sessions)
    .set({ endedAt: now })
    .where(and(eq(schema.sessions.idHash, sessionHash), isNull(schema.sessions.endedAt)));
}

/**
 * The actor behind a cookie's secret, or null: unknown, ended, idle too long, person gone, device revoked.
 * @param used false: looking is no use of the session, which goes on growing idle
 */
export async function actorFromSecret(
  db: Db,
  secret: string | null,
  now: Date,
  { used = true } = {},
): Promise<Actor | null> {
  if (!secret) return null;
  const { sessions, people, devices } = schema;
  const idHash = hashOf(secret);
  const [row] = await db
    .select({ session: sessions, person: people, device: devices })
    .from(sessions)
    .leftJoin(people, eq(people.id, sessions.personId))
    .leftJoin(devices, eq(devices.id, sessions.deviceId))
    .where(and(eq(sessions.idHash, idHash), isNull(sessions.endedAt), gt(sessions.expiresAt, now)));
  if (!row) return null;
  const { session, person, device } = row;
  const limits = session.personId === null ? SESSION_LIMITS.display : SESSION_LIMITS.person;
  if (now.getTime() - session.lastSeenAt.getTime() > limits.idle) return null;
  if (device?.revokedAt || person?.leftAt) return null;
  // A wall is looked at, not used: for a display hearing the shop is use enough.
  if ((used || !person) && now.getTime() - session.lastSeenAt.getTime() > TOUCH_EVERY)
    await db.update(sessions).set({ lastSeenAt: now }).where(eq(sessions.idHash, idHash));
  const base = { shopId: session.shopId, deviceId: session.deviceId, sessionHash: idHash };
  if (person)
    return { ...base, role: person.role, personId: person.id, name: person.name, initials: person.initials };
  if (device) return { ...base, role: "display", personId: null, name: device.name, initials: "" };
  return null;
}
