import { randomInt } from "node:crypto";
import { and, desc, eq, gt, isNull, lt } from "drizzle-orm";
import { endSession, hashOf, newSecret, startSession } from "../auth/sessions.server";
import { type Db, isDuplicate, schema } from "../db/client.server";
import { CODE_ALPHABET } from "../domain/tags/short-code";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { devicePairings, devices, sessions } = schema;

const PAIRING_MS = 10 * 60_000;
/** Nine signs of a 23-letter alphabet: 40 bits and a little, for ten minutes, with the tries counted. */
const PAIRING_SIGNS = 9;

const pairingCode = () =>
  Array.from({ length: PAIRING_SIGNS }, () => CODE_ALPHABET[randomInt(CODE_ALPHABET.length)]).join("");
const plain = (code: string) => code.toUpperCase().replace(/[^A-Z0-9]/g, "");

/** A display asks to be paired. @returns the code to show and the claim for its cookie */
export async function askForPairing(
  db: Db,
  now: Date,
): Promise<{ code: string; claim: string; expiresAt: Date }> {
  const claim = newSecret();
  const expiresAt = new Date(now.getTime() + PAIRING_MS);
  // Codes that nobody typed in are of no use to anybody any more.
  await db
    .delete(devicePairings)
    .where(and(lt(devicePairings.expiresAt, now), isNull(devicePairings.deviceId)));
  for (;;) {
    const code = pairingCode();
    try {
      await db
        .insert(devicePairings)
        .values({ codeHash: hashOf(code), claimHash: hashOf(claim), createdAt: now, expiresAt });
      return { code, claim, expiresAt };
    } catch (error) {
      if (!isDuplicate(error)) throw error;
    }
  }
}

/** A display with a claim asks whether somebody has confirmed it. @returns a session's secret, once; else null */
export async function collectPairing(
  db: Db,
  claim: string,
  userAgent: string,
  now: Date,
): Promise<string | null> {
  const [row] = await db
    .select()
    .from(devicePairings)
    .where(and(eq(devicePairings.claimHash, hashOf(claim)), gt(devicePairings.expiresAt, now)));
  if (!row?.deviceId || !row.shopId || row.collectedAt) return null;
  const [taken] = await db
    .update(devicePairings)
    .set({ collectedAt: now })
    .where(and(eq(devicePairings.id, row.id), isNull(devicePairings.collectedAt)));
  if (taken.affectedRows !== 1) return null;
  return startSession(db, { shopId: row.shopId, personId: null, deviceId: row.deviceId, userAgent }, now);
}

/** A foreman types the code that a display shows. @throws Refusal invalid when the code is unknown or too old */
export async function confirmPairing(
  ctx: Context,
  what: { code: string; name: string; kind: "wall" | "post" },
): Promise<{ words: string }> {
  const actor = requirePerson(ctx, "devices:pair");
  return change(ctx, async (tx, note) => {
    const now = ctx.now();
    const [pairing] = await tx
      .select()
      .from(devicePairings)
      .where(
        and(
          eq(devicePairings.codeHash, hashOf(plain(what.code))),
          gt(devicePairings.expiresAt, now),
          isNull(devicePairings.deviceId),
        ),
      )
      .for("update");
    if (!pairing)
      throw new Refusal("invalid", "No display shows that code now.", {
        code: "No display shows that code now. Codes last ten minutes: look at the display again.",
      });
    const [device] = await tx
      .insert(devices)
      .values({
        shopId: actor.shopId,
        kind: what.kind,
        name: what.name,
        pairedBy: actor.personId,
        pairedAt: now,
      })
      .$returningId();
    if (!device) throw new Error("The device was not inserted");
    await tx
      .update(devicePairings)
      .set({ deviceId: device.id, shopId: actor.shopId })
      .where(eq(devicePairings.id, pairing.id));
    note({
      verb: "pair-device",
      subject: { kind: "device", id: device.id },
      words: `${what.name} paired`,
      after: { name: what.name, kind: what.kind },
      touches: [{ kind: "setup" }],
    });
    return { words: `${what.name} is paired. It changes by itself within a few seconds.` };
  });
}

/** Takes a display's trust back. @returns the hashes of its sessions, to cut their live channels */
export async function revokeDevice(
  ctx: Context,
  deviceId: number,
): Promise<{ words: string; sessionHashes: string[] }> {
  const actor = requirePerson(ctx, "devices:pair");
  return change(ctx, async (tx, note) => {
    const [device] = await tx
      .select()
      .from(devices)
      .where(and(eq(devices.id, deviceId), eq(devices.shopId, actor.shopId)))
      .for("update");
    if (!device) throw new Refusal("not-found", "There is no such display.");
    if (device.revokedAt) throw new Refusal("conflict", `${device.name} was let go already.`);
    const now = ctx.now();
    await tx.update(devices).set({ revokedAt: now }).where(eq(devices.id, deviceId));
    const open = await tx
      .select({ idHash: sessions.idHash })
      .from(sessions)
      .where(and(eq(sessions.deviceId, deviceId), isNull(sessions.endedAt)));
    for (const session of open) await endSession(tx, session.idHash, now);
    note({
      verb: "revoke-device",
      subject: { kind: "device", id: deviceId },
      words: `${device.name} let go`,
      before: { name: device.name },
      touches: [{ kind: "setup" }],
    });
    return { words: `${device.name} is no longer trusted.`, sessionHashes: open.map((row) => row.idHash) };
  });
}

/** The shop's paired displays, newest first. */
export async function listDevices(db: Db, shopId: number) {
  return db
    .select({ id: devices.id, name: devices.name, kind: devices.kind, pairedAt: devices.pairedAt })
    .from(devices)
    .where(and(eq(devices.shopId, shopId), isNull(devices.revokedAt)))
    .orderBy(desc(devices.pairedAt));
}
