import { randomBytes } from "node:crypto";
import { TZDate } from "@date-fns/tz";
import { and, eq, gt } from "drizzle-orm";
import { isDuplicate, schema, type Tx } from "../db/client.server";
import { readShop } from "../db/queries/shop.server";
import { OPEN_END } from "../db/schema";
import {
  BAYS_FOR_STAGE,
  BUILD_TEMPLATES,
  SKILL_FOR_STAGE,
  type StageTemplate,
} from "../domain/builds/stages";
import { codeFromBytes } from "../domain/tags/short-code";
import type { BookIn } from "../validation/book-in";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { builds, customers, placements, shops, stageBayKinds, stages, tags, vehicles } = schema;

/** The same vehicle booked in again within this time is the same press of the button. */
const TWICE_MS = 60_000;
const CODE_TRIES = 8;

export type NewCode = () => string | null;
/** A short code out of the system's random source; null in the rare case that too few bytes were usable. */
export const randomCode: NewCode = () => codeFromBytes(randomBytes(16));

/**
 * A date and a time as they stand on the shop's clock, as the moment they are.
 * @param date as 2026-12-01
 * @param time as 15:30
 */
export function momentInShop(date: string, time: string, timeZone: string): Date {
  const [year = 0, month = 1, day = 1] = date.split("-").map(Number);
  const [hour = 0, minute = 0] = time.split(":").map(Number);
  return new Date(new TZDate(year, month - 1, day, hour, minute, timeZone).getTime());
}

/**
 * Books a vehicle in: customer, vehicle, tag, build, stages, and its place in the yard, all or nothing.
 * @returns the build, the tag's code, and one line in words
 * @throws Refusal invalid (the promise is past), not-found (another shop's customer), conflict (booked in a moment ago)
 */
export async function bookIn(
  ctx: Context,
  what: BookIn,
  newCode: NewCode = randomCode,
): Promise<{ buildId: number; code: string; words: string }> {
  const actor = requirePerson(ctx, "builds:book-in");
  const { shopId, personId } = actor;
  return change(ctx, async (tx, note) => {
    const now = ctx.now();
    // One book-in of a shop after another: two presses of one button must see each other.
    await tx.select({ id: shops.id }).from(shops).where(eq(shops.id, shopId)).for("update");
    const shop = await readShop(tx, shopId);
    const promisedAt = what.promise
      ? momentInShop(what.promise.date, what.promise.time, shop.timeZone)
      : null;
    if (promisedAt && promisedAt.getTime() <= now.getTime())
      throw new Refusal("invalid", "The promise is in the past.", {
        promiseDate: "The promise is in the past: choose a later day.",
      });
    const customer = await findCustomer(tx, shopId, what);
    await refuseTwice(tx, shopId, customer.name, what.nickname, now);

    const customerId = customer.id ?? (await insertCustomer(tx, shopId, what, now));
    const vehicleId = await insertVehicle(tx, shopId, customerId, what, now);
    const code = await insertTag(tx, shopId, vehicleId, now, newCode);
    const buildId = await insertBuild(tx, { shopId, personId, vehicleId, promisedAt, now }, what);
    await insertStages(tx, shopId, buildId, what);
    await tx
      .insert(placements)
      .values({ shopId, buildId, bayId: null, fromAt: now, untilAt: OPEN_END, movedBy: personId });

    const words = `${what.nickname} booked in`;
    note({
      verb: "book-in",
      subject: { kind: "build", id: buildId },
      words,
      after: { vehicleId, customerId, code, kind: what.kind, promisedAt: promisedAt?.toISOString() ?? null },
      touches: [{ kind: "yard" }, { kind: "build", id: buildId }],
    });
    return { buildId, code, words };
  });
}

/** The customer meant: one of this shop's, or one to be written down (no id yet). */
async function findCustomer(
  tx: Tx,
  shopId: number,
  what: BookIn,
): Promise<{ id: number | null; name: string }> {
  if (what.customer.id === null) return { id: null, name: what.customer.name };
  const [row] = await tx
    .select({ id: customers.id, name: customers.name })
    .from(customers)
    .where(and(eq(customers.id, what.customer.id), eq(customers.shopId, shopId)));
  if (!row)
    throw new Refusal("not-found", "There is no such customer.", {
      customerId: "There is no such customer. Choose one from the list, or write down a new one.",
    });
  return row;
}

/** Tells a second press of the button from a second vehicle: same owner, same nickname, within a minute. */
async function refuseTwice(
  tx: Tx,
  shopId: number,
  customerName: string,
  nickname: string,
  now: Date,
): Promise<void> {
  const [twin] = await tx
    .select({ buildId: builds.id })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(customers, eq(customers.id, vehicles.customerId))
    .where(
      and(
        eq(builds.shopId, shopId),
        eq(vehicles.nickname, nickname),
        eq(customers.name, customerName),
        gt(builds.bookedInAt, new Date(now.getTime() - TWICE_MS)),
      ),
    );
  if (twin)
    throw new Refusal(
      "conflict",
      `${nickname} was booked in a moment ago. If this is another vehicle, give it another nickname.`,
      {},
      { buildId: twin.buildId },
    );
}

async function insertCustomer(tx: Tx, shopId: number, what: BookIn, now: Date): Promise<number> {
  if (what.customer.id !== null) return what.customer.id;
  const { name, phone, email } = what.customer;
  const [row] = await tx
    .insert(customers)
    .values({ shopId, name, phone, email, createdAt: now })
    .$returningId();
  if (!row) throw new Error("The customer was not inserted");
  return row.id;
}

async function insertVehicle(
  tx: Tx,
  shopId: number,
  customerId: number,
  what: BookIn,
  now: Date,
): Promise<number> {
  const { kind, nickname, length, width } = what;
  const [row] = await tx
    .insert(vehicles)
    .values({
      shopId,
      customerId,
      kind,
      nickname,
      lengthMm: length.mm,
      lengthTyped: length.typed,
      widthMm: width.mm,
      widthTyped: width.typed,
      createdAt: now,
    })
    .$returningId();
  if (!row) throw new Error("The vehicle was not inserted");
  return row.id;
}

/** Hangs a new tag on a vehicle; a code that is in use already is drawn again. @returns the code */
export async function insertTag(
  tx: Tx,
  shopId: number,
  vehicleId: number,
  now: Date,
  newCode: NewCode = randomCode,
): Promise<string> {
  for (let attempt = 0; attempt < CODE_TRIES; attempt++) {
    const code = newCode();
    if (code === null) continue;
    try {
      await tx.insert(tags).values({ shopId, vehicleId, code, issuedAt: now });
      return code;
    } catch (error) {
      if (!isDuplicate(error)) throw error;
    }
  }
  throw new Error(`No free tag code in ${CODE_TRIES} tries`);
}

type Visit = { shopId: number; personId: number; vehicleId: number; promisedAt: Date | null; now: Date };

async function insertBuild(tx: Tx, visit: Visit, what: BookIn): Promise<number> {
  const { loadedRadius, tyreRadius, tyreWidth, wheelbase } = what;
  const [row] = await tx
    .insert(builds)
    .values({
      shopId: visit.shopId,
      vehicleId: visit.vehicleId,
      wanted: what.wanted,
      tyreTyped: what.tyre,
      loadedRadiusMm: loadedRadius?.mm ?? null,
      loadedRadiusTyped: loadedRadius?.typed ?? null,
      tyreRadiusMm: tyreRadius?.mm ?? null,
      tyreRadiusTyped: tyreRadius?.typed ?? null,
      tyreWidthMm: tyreWidth?.mm ?? null,
      tyreWidthTyped: tyreWidth?.typed ?? null,
      wheelbaseMm: wheelbase?.mm ?? null,
      wheelbaseTyped: wheelbase?.typed ?? null,
      approachAskedDeg: what.approach,
      promisedAt: visit.promisedAt,
      bookedInBy: visit.personId,
      bookedInAt: visit.now,
    })
    .$returningId();
  if (!row) throw new Error("The build was not inserted");
  return row.id;
}

/** The stages that were left ticked, in the template's order with the hours as typed. */
async function insertStages(tx: Tx, shopId: number, buildId: number, what: BookIn): Promise<void> {
  const template: readonly StageTemplate[] = BUILD_TEMPLATES[what.template].stages;
  for (const [position, { index, hours }] of what.stages.entries()) {
    const line = template[index];
    if (!line) throw new Refusal("invalid", "That stage is not in the list chosen.");
    const [stage] = await tx
      .insert(stages)
      .values({
        shopId,
        buildId,
        position,
        kind: line.kind,
        hours,
        skill: SKILL_FOR_STAGE[line.kind],
        heads: line.heads,
        stay: line.stay,
      })
      .$returningId();
    if (!stage) throw new Error("The stage was not inserted");
    const kinds = BAYS_FOR_STAGE[line.kind];
    if (kinds.length > 0)
      await tx.insert(stageBayKinds).values(kinds.map((kind) => ({ shopId, stageId: stage.id, kind })));
  }
}
