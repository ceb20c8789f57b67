import { sql } from "drizzle-orm";
import { hashPassword } from "../../app/auth/authenticator.server";
import { type Db, schema } from "../../app/db/client.server";
import { OPEN_END } from "../../app/db/schema";
import { BUILD_TEMPLATES, type BuildTemplateId, type StageKind } from "../../app/domain/builds/stages";
import { VEHICLE_KIND, type VehicleKind } from "../../app/domain/builds/vehicle-kinds";
import type { BayKind, BayMouth } from "../../app/domain/floor/bays";
import type { Role, Skill } from "../../app/domain/people/roles";

/*
 * What the demo shop and the tests are made of. Each function writes one thing with sensible values and answers its id.
 * They write rows directly, without journal: a shop that is being made has no watchers yet.
 */

const IN = 25.4;
const FT = 12 * IN;

const one = <T>(rows: T[]): T => {
  const [row] = rows;
  if (row === undefined) throw new Error("Nothing was inserted");
  return row;
};

export async function makeShop(
  db: Db,
  shop: {
    name?: string;
    isDemo?: boolean;
    timeZone?: string;
    unit?: "in" | "mm";
    now?: Date;
    lengthFt?: number;
    widthFt?: number;
  } = {},
): Promise<number> {
  const now = shop.now ?? new Date();
  const { id } = one(
    await db
      .insert(schema.shops)
      .values({ name: shop.name ?? "Alder Row Axle", isDemo: shop.isDemo ?? false, createdAt: now })
      .$returningId(),
  );
  await db.insert(schema.shopSettings).values({
    shopId: id,
    timeZone: shop.timeZone ?? "America/Boise",
    unit: shop.unit ?? "in",
    allowedSlopeDeg: 0.1,
    shimMm: IN / 16,
    redropToleranceMm: IN / 8,
    markToleranceMm: IN / 8,
    tapeSigmaMm: IN / 32,
    dropSigmaMm: IN / 32,
    springSigmaMm: IN / 32,
  });
  await db.insert(schema.shopRevisions).values({ shopId: id, revision: 0 });
  await db
    .insert(schema.buildings)
    .values({ shopId: id, lengthMm: (shop.lengthFt ?? 90) * FT, widthMm: (shop.widthFt ?? 53) * FT });
  return id;
}

export async function makePerson(
  db: Db,
  shopId: number,
  person: {
    name: string;
    role: Role;
    skills?: readonly Skill[];
    email?: string;
    password?: string;
    passwordHash?: string;
    awayUntil?: Date;
  },
): Promise<number> {
  const hash =
    person.passwordHash ?? (person.password === undefined ? null : await hashPassword(person.password));
  const { id } = one(
    await db
      .insert(schema.people)
      .values({
        shopId,
        name: person.name,
        initials: person.name
          .split(" ")
          .map((word) => word[0] ?? "")
          .join("")
          .slice(0, 3)
          .toUpperCase(),
        role: person.role,
        email: person.email?.toLowerCase() ?? null,
        passwordHash: hash,
        awayUntil: person.awayUntil ?? null,
        createdAt: new Date(),
      })
      .$returningId(),
  );
  if (person.skills?.length)
    await db
      .insert(schema.personSkills)
      .values(person.skills.map((skill) => ({ shopId, personId: id, skill })));
  return id;
}

export async function makeBay(
  db: Db,
  shopId: number,
  bay: {
    number: number;
    kind?: BayKind;
    xFt?: number;
    yFt?: number;
    lengthFt?: number;
    widthFt?: number;
    mouth?: BayMouth;
    rated?: boolean;
    outside?: boolean;
    /** In inches, in the bay's own floor frame. */
    marks?: Record<string, [number, number]>;
  },
): Promise<number> {
  const kind = bay.kind ?? "general";
  const { id } = one(
    await db
      .insert(schema.bays)
      .values({
        shopId,
        number: bay.number,
        kind,
        xMm: (bay.xFt ?? 0.5) * FT,
        yMm: (bay.yFt ?? (bay.number - 1) * 15) * FT,
        lengthMm: (bay.lengthFt ?? 28) * FT,
        widthMm: (bay.widthFt ?? 14) * FT,
        mouth: bay.mouth ?? "east",
        ratedForLayout: bay.rated ?? kind === "level-pad",
        outside: bay.outside ?? false,
      })
      .$returningId(),
  );
  const marks = bay.marks ?? (kind === "level-pad" ? PAD_MARKS : {});
  const rows = Object.entries(marks).map(([label, [x, y]]) => ({
    shopId,
    bayId: id,
    label,
    xMm: x * IN,
    yMm: y * IN,
  }));
  if (rows.length > 0) await db.insert(schema.controlMarks).values(rows);
  return id;
}
/** Four marks: A and B on the centre line ten feet apart, C and D four feet to the right of them. */
export const PAD_MARKS: Record<string, [number, number]> = {
  A: [0, 0],
  B: [120, 0],
  C: [120, -48],
  D: [0, -48],
};

export async function makeSpring(
  db: Db,
  shopId: number,
  spring: {
    rackNumber: number;
    lengthIn: number;
    frontHalfIn: number;
    leaves?: number;
    widthIn?: number;
    note?: string;
  },
): Promise<number> {
  const { id } = one(
    await db
      .insert(schema.springs)
      .values({
        shopId,
        rackNumber: spring.rackNumber,
        lengthMm: spring.lengthIn * IN,
        lengthTyped: String(spring.lengthIn),
        frontHalfMm: spring.frontHalfIn * IN,
        frontHalfTyped: String(spring.frontHalfIn),
        leaves: spring.leaves ?? 5,
        leafWidthMm: (spring.widthIn ?? 2.5) * IN,
        leafWidthTyped: spring.widthIn === undefined ? "2 1/2" : String(spring.widthIn),
        note: spring.note ?? "",
        addedAt: new Date(),
      })
      .$returningId(),
  );
  return id;
}

/** @param aheadIn where each hole lies ahead of hole 1, in inches, hole 1 first */
export async function makeHanger(
  db: Db,
  shopId: number,
  name: string,
  aheadIn: number[],
): Promise<{ hangerId: number; holes: number[] }> {
  const { id } = one(await db.insert(schema.hangers).values({ shopId, name }).$returningId());
  const holes: number[] = [];
  for (const [i, ahead] of aheadIn.entries()) {
    const hole = one(
      await db
        .insert(schema.hangerHoles)
        .values({ shopId, hangerId: id, number: i + 1, aheadMm: ahead * IN, aheadTyped: String(ahead) })
        .$returningId(),
    );
    holes.push(hole.id);
  }
  return { hangerId: id, holes };
}

export type MadeBuild = {
  buildId: number;
  vehicleId: number;
  placementId: number;
  stages: Map<StageKind, number>;
};

export async function makeBuild(
  db: Db,
  shopId: number,
  build: {
    nickname: string;
    code: string;
    kind?: VehicleKind;
    lengthIn?: number;
    widthIn?: number;
    customer?: string;
    template?: BuildTemplateId;
    wanted?: string;
    by: number;
    bookedInAt?: Date;
    promisedAt?: Date | null;
    /** Null: the yard. */
    bayId?: number | null;
    standsSince?: Date;
    /** Stages before this one are done; this one is under way. */
    at?: StageKind;
    atState?: "open" | "under-way";
    /** When each stage that is done was finished, first stage first; left out: since it stands where it stands. */
    finishedAt?: readonly Date[];
    pieces?: { done: number; of: number; word: string };
    tyre?: { words: string; loadedRadius: string; radius: string; width: string };
    wheelbaseIn?: number;
    approachAskedDeg?: number;
  },
): Promise<MadeBuild> {
  const kind = build.kind ?? "long-bed-pickup";
  const now = build.bookedInAt ?? new Date();
  const lengthIn = build.lengthIn ?? VEHICLE_KIND[kind].lengthIn;
  const widthIn = build.widthIn ?? VEHICLE_KIND[kind].widthIn;
  const { id: customerId } = one(
    await db
      .insert(schema.customers)
      .values({ shopId, name: build.customer ?? "A. Customer", createdAt: now })
      .$returningId(),
  );
  const { id: vehicleId } = one(
    await db
      .insert(schema.vehicles)
      .values({
        shopId,
        customerId,
        kind,
        nickname: build.nickname,
        lengthMm: lengthIn * IN,
        lengthTyped: `${lengthIn}`,
        widthMm: widthIn * IN,
        widthTyped: `${widthIn}`,
        createdAt: now,
      })
      .$returningId(),
  );
  await db.insert(schema.tags).values({ shopId, vehicleId, code: build.code, issuedAt: now });
  const tyre = build.tyre;
  const inch = (typed: string | undefined) => (typed === undefined ? null : Number(typed) * IN);
  const { id: buildId } = one(
    await db
      .insert(schema.builds)
      .values({
        shopId,
        vehicleId,
        wanted: build.wanted ?? "Front axle moved ahead, springs re-hung.",
        tyreTyped: tyre?.words ?? null,
        loadedRadiusMm: inch(tyre?.loadedRadius),
        loadedRadiusTyped: tyre?.loadedRadius ?? null,
        tyreRadiusMm: inch(tyre?.radius),
        tyreRadiusTyped: tyre?.radius ?? null,
        tyreWidthMm: inch(tyre?.width),
        tyreWidthTyped: tyre?.width ?? null,
        wheelbaseMm: build.wheelbaseIn === undefined ? null : build.wheelbaseIn * IN,
        wheelbaseTyped: build.wheelbaseIn === undefined ? null : String(build.wheelbaseIn),
        approachAskedDeg: build.approachAskedDeg ?? null,
        promisedAt: build.promisedAt ?? null,
        bookedInBy: build.by,
        bookedInAt: now,
      })
      .$returningId(),
  );
  const template = BUILD_TEMPLATES[build.template ?? "front-leaf"].stages;
  const atIndex = build.at === undefined ? 0 : template.findIndex((stage) => stage.kind === build.at);
  if (atIndex < 0) throw new Error(`The template has no stage ${build.at}`);
  const finishedAt = (position: number) => build.finishedAt?.[position] ?? build.standsSince ?? now;
  const stages = new Map<StageKind, number>();
  for (const [position, stage] of template.entries()) {
    const here = build.at !== undefined && position === atIndex;
    const done = position < atIndex;
    const underWay = here && (build.atState ?? "under-way") === "under-way";
    const { id } = one(
      await db
        .insert(schema.stages)
        .values({
          shopId,
          buildId,
          position,
          kind: stage.kind,
          hours: stage.hours,
          skill: stage.skill,
          heads: stage.heads,
          stay: stage.stay,
          state: done ? "done" : underWay ? "under-way" : "open",
          piecesDone: here ? (build.pieces?.done ?? null) : null,
          piecesOf: here ? (build.pieces?.of ?? null) : null,
          piecesWord: here ? (build.pieces?.word ?? null) : null,
          startedAt: done || underWay ? finishedAt(position - 1) : null,
          finishedAt: done ? finishedAt(position) : null,
        })
        .$returningId(),
    );
    stages.set(stage.kind, id);
    if (stage.bayKinds.length > 0)
      await db
        .insert(schema.stageBayKinds)
        .values(stage.bayKinds.map((bayKind) => ({ shopId, stageId: id, kind: bayKind })));
  }
  const { id: placementId } = one(
    await db
      .insert(schema.placements)
      .values({
        shopId,
        buildId,
        bayId: build.bayId ?? null,
        fromAt: build.standsSince ?? now,
        untilAt: OPEN_END,
        movedBy: build.by,
      })
      .$returningId(),
  );
  return { buildId, vehicleId, placementId, stages };
}

export async function putOn(
  db: Db,
  shopId: number,
  personId: number,
  buildId: number,
  fromAt: Date,
): Promise<void> {
  await db.insert(schema.spells).values({ shopId, personId, buildId, fromAt, untilAt: OPEN_END });
}

export async function makeStint(
  db: Db,
  shopId: number,
  stint: { stageId: number; bayId: number; startsAt: Date; endsAt: Date; crew?: number[] },
): Promise<number> {
  const { stageId, bayId, startsAt, endsAt } = stint;
  const { id } = one(
    await db.insert(schema.stints).values({ shopId, stageId, bayId, startsAt, endsAt }).$returningId(),
  );
  for (const personId of stint.crew ?? [])
    await db.insert(schema.stintCrew).values({ shopId, stintId: id, personId, startsAt, endsAt });
  return id;
}

/** True when the database holds a shop. */
export async function hasShop(db: Db): Promise<boolean> {
  const [row] = await db.select({ n: sql<number>`count(*)`.mapWith(Number) }).from(schema.shops);
  return (row?.n ?? 0) > 0;
}
