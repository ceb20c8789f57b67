import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { contextFor, makeBuild, makeTestShop, type TestPerson, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { readBoard } from "~/db/queries/board.server";
import { readLayoutHistory, readLayoutReadings } from "~/db/queries/layout-history.server";
import { floorPoint, framePoint } from "~/domain/geometry/point";
import type { DropPointId, DropSide } from "~/domain/layout/drops";
import { frameFromDatums, toFloor } from "~/domain/layout/frame";
import { optionKey } from "~/domain/layout/options";
import { formatDecimalInches, inches, mm, parseLength, toInches } from "~/domain/units/length";
import { acknowledgeStands } from "~/services/layouts/acknowledge-stands.server";
import { approveOption } from "~/services/layouts/approve-option.server";
import { checkLevel } from "~/services/layouts/check-level.server";
import { chooseAxleLine } from "~/services/layouts/choose-axle-line.server";
import { chooseOption } from "~/services/layouts/choose-option.server";
import { confirmMarks } from "~/services/layouts/confirm-marks.server";
import { type DropEntry, keepDrop } from "~/services/layouts/keep-drop.server";
import { readLayout } from "~/services/layouts/read-layout.server";
import { startLayout } from "~/services/layouts/start-layout.server";
import { takeSecondLook } from "~/services/layouts/take-second-look.server";
import { voidLevelByHand } from "~/services/layouts/void-level-by-hand.server";
import { waiveSecondLook } from "~/services/layouts/waive-second-look.server";
import { moveVehicle } from "~/services/move-vehicle.server";

let db: Db;
let shop: TestShop;
let buildId: number;
let layoutId: number;
let serial = 0;

const as = (person: TestPerson) => contextFor(db, person);
const tech = () => as(shop.people.tech);
const foreman = () => as(shop.people.foreman);
const view = () => readLayout(db, shop.shopId, layoutId);
const length = (typed: string) => {
  const read = parseLength(typed, "in");
  if (!read.ok) throw new Error(read.problem);
  return { mm: read.value, typed };
};

/** The measured case: see app/domain/layout/measured-case.test.ts for how its figures were come by. */
const PLACES = [
  ["left-front", "70", "15"],
  ["right-front", "70", "-15"],
  ["left-rear", "-40", "15"],
  ["right-rear", "-40", "-15"],
] as const;
const AS_FOUND = ["24 1/16", "24 5/16", "23 13/16", "24 3/16"];
const RAISED = ["24 3/8", "24 5/16", "24 5/16", "24 3/8"];

const level = (heights: string[], who = tech()) =>
  checkLevel(who, layoutId, {
    method: "heights",
    stands: PLACES.map(([place, x, y], i) => ({
      place,
      x: length(x),
      y: length(y),
      height: length(heights[i] ?? ""),
    })),
  });

const key = () => crypto.randomUUID();
const offset = (
  point: DropPointId,
  side: DropSide,
  station: string,
  off: string,
  over: Partial<DropEntry> = {},
) =>
  ({
    point,
    side,
    method: "offset",
    station: length(station),
    offset: length(off),
    height: null,
    reason: null,
    clientKey: key(),
    ...over,
  }) as DropEntry;
const drop = (...args: Parameters<typeof offset>) => keepDrop(tech(), layoutId, offset(...args));

const frame = (() => {
  const at = (x: number, y: number) => floorPoint(inches(x), inches(y));
  const made = frameFromDatums({
    frontLeft: at(100, 16),
    frontRight: at(100, -16.25),
    rearLeft: at(20, 16.25),
    rearRight: at(20, -16),
  });
  if (!made.ok) throw new Error(made.problem);
  return made.value;
})();
/** A point at a station of the frame, typed in decimal inches fine enough for four places. */
const onFrame = (
  point: DropPointId,
  side: DropSide,
  station: number,
  off: number,
  over: Partial<DropEntry> = {},
) => {
  const p = toFloor(frame, framePoint(inches(station), inches(off)));
  return offset(
    point,
    side,
    formatDecimalInches(p.x, 6),
    side === "centre"
      ? formatDecimalInches(p.y, 6).replace("−", "-")
      : formatDecimalInches(mm(Math.abs(p.y)), 6),
    over,
  );
};

async function toMarks() {
  await acknowledgeStands(tech(), layoutId);
  await level(RAISED);
  await confirmMarks(tech(), layoutId, length("120"));
}
async function dropNeeded() {
  await drop("opening-front", "left", "82 3/8", "30 1/4");
  await drop("opening-rear", "left", "46 5/8", "30 1/8");
  await drop("opening-front", "right", "82 1/8", "30 3/8");
  await drop("opening-rear", "right", "46 1/2", "30 3/16");
  await drop("datum-front", "left", "100", "16");
  await drop("datum-front", "right", "100", "16 1/4");
  await drop("datum-rear", "left", "20", "16 1/4");
  await drop("datum-rear", "right", "20", "16");
}
async function toOptions() {
  await toMarks();
  await dropNeeded();
  for (const side of ["left", "right"] as const)
    await keepDrop(tech(), layoutId, onFrame("hanger-hole", side, 70.5, side === "left" ? 15.5 : -15.5));
  await keepDrop(tech(), layoutId, onFrame("low-front", "centre", 76, 0, { height: length("22") }));
  await chooseAxleLine(tech(), layoutId, { method: "square", asked: null });
}
/** Somebody else reads the points that weigh, off by so much along the line. */
async function lookAgain(who = as(shop.people.tech2), offIn = 0) {
  for (const item of (await view()).secondLook.items) {
    if (item.state === "agrees") continue;
    const { station, offset: off } = onFrame(
      item.point,
      item.side,
      70.5 + offIn,
      item.side === "left" ? 15.5 : -15.5,
    ) as Extract<DropEntry, { method: "offset" }>;
    await takeSecondLook(who, layoutId, {
      point: item.point,
      side: item.side,
      station,
      offset: off,
      clientKey: key(),
    });
  }
}
const optionOf = (spring: "centred" | "pinAhead", hole: 1 | 2 | 3) =>
  optionKey(shop.springs[spring], false, shop.holes[hole - 1] ?? 0);

beforeEach(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
  const made = await makeBuild(db, shop.shopId, {
    nickname: "Old Mule",
    code: `Y${(++serial).toString(36).padStart(3, "0")}`,
    by: shop.people.foreman.personId ?? 0,
    bayId: shop.bays[1],
    standsSince: new Date(Date.now() - 60_000),
    at: "level",
    tyre: { words: "35 × 12.5", loadedRadius: "16.5", radius: "17.5", width: "12.5" },
    wheelbaseIn: 133,
  });
  buildId = made.buildId;
  ({ layoutId } = await startLayout(tech(), { buildId, fixedEye: "ahead" }));
});

describe("the measured case, through the shop's own services", () => {
  it("goes from stands to a signed sheet, with the figures worked out beforehand", async () => {
    await acknowledgeStands(tech(), layoutId);
    expect(await level(AS_FOUND)).toMatchObject({
      isTrue: false,
      headline: "Right side high 0.60°, nose high 0.10°.",
    });
    expect((await view()).level).toMatchObject({
      state: "not-true",
      noseHighDeg: expect.closeTo(0.0977, 4),
      rightHighDeg: expect.closeTo(0.5968, 4),
    });
    expect(await level(RAISED)).toMatchObject({ isTrue: true });
    await confirmMarks(tech(), layoutId, length("120 1/16"));
    await dropNeeded();
    let now = await view();
    expect(now.frame?.angle).toBeCloseTo(-0.179, 4);
    expect(toInches(now.openings?.left.centre.station ?? mm(0))).toBeCloseTo(44.4058, 4);
    expect(toInches(now.openings?.right.centre.station ?? mm(0))).toBeCloseTo(44.4073, 4);
    expect(now.next).toBe("axle-line");
    await chooseAxleLine(tech(), layoutId, { method: "square", asked: null });
    now = await view();
    expect(toInches(now.axle?.line.station ?? mm(0))).toBeCloseTo(44.4066, 4);
    // Each drop: square and tape 1/32 in, bob 1/32 in; the line is the mean of four, on a frame that is as unsure.
    expect(toInches(now.axle?.sureness?.plusMinus ?? mm(0))).toBeGreaterThan(
      (2 * Math.SQRT2) / 32 / 2 - 1e-9,
    );
    expect(toInches(now.axle?.sureness?.plusMinus ?? mm(0))).toBeLessThan(0.1);
    expect(now.axle?.sureness?.words).toMatch(
      /^(Mostly|The most comes from) (the bob|stations and offsets) \(50 %\)/,
    );
    expect(now).toMatchObject({ options: null, missing: ["Drop hanger hole 1 on both sides."] });

    for (const side of ["left", "right"] as const)
      await keepDrop(tech(), layoutId, onFrame("hanger-hole", side, 70.5, side === "left" ? 15.5 : -15.5));
    await keepDrop(tech(), layoutId, onFrame("low-front", "centre", 76, 0, { height: length("22") }));
    now = await view();
    const figures = (spring: "centred" | "pinAhead", hole: 1 | 2 | 3) => {
      const option = now.options?.find((one) => one.key === optionOf(spring, hole));
      return [toInches(option?.axleStation ?? mm(0)), option?.approach ?? 0] as const;
    };
    for (const [spring, hole, station, approach] of [
      ["centred", 1, 44.5, 40.97],
      ["centred", 2, 45.5, 42.39],
      ["centred", 3, 46.5, 43.92],
      ["pinAhead", 1, 46.5, 43.92],
      ["pinAhead", 3, 48.5, 47.35],
    ] as const) {
      expect(figures(spring, hole)[0]).toBeCloseTo(station, 4);
      expect(figures(spring, hole)[1]).toBeCloseTo(approach, 2);
    }
    await chooseOption(foreman(), layoutId, optionOf("pinAhead", 1));
    expect((await view()).next).toBe("second-look");
    await lookAgain();
    expect((await view()).next).toBe("approval");
    expect(await approveOption(foreman(), layoutId, optionOf("pinAhead", 1))).toMatchObject({
      sheetRevision: 1,
    });
    now = await view();
    expect(now.approval).toMatchObject({
      state: "approved",
      sheetRevision: 1,
      made: { name: "Fay Foreman" },
    });
    expect(now.steps.filter((step) => step.state === "done").map((step) => step.id)).toEqual([
      "stands",
      "level",
      "marks",
      "drops",
      "axle-line",
      "options",
      "second-look",
      "approval",
    ]);
  });

  it("keeps every entry as it was typed, beside its value", async () => {
    await toMarks();
    await keepDrop(tech(), layoutId, { ...offset("opening-front", "left", "6' 10 3/8\"", "768.35 mm") });
    const reading = (await view()).drops.find(
      (one) => one.point === "opening-front" && one.side === "left",
    )?.reading;
    expect(reading).toMatchObject({ stationTyped: "6' 10 3/8\"", offsetTyped: "768.35 mm", stands: true });
    expect(toInches(reading?.at.x ?? mm(0))).toBeCloseTo(82.375, 6);
    expect(toInches(reading?.at.y ?? mm(0))).toBeCloseTo(30.25, 6);
  });
});

describe("steps stay shut until their ground stands", () => {
  const refused = (work: Promise<unknown>, words: RegExp) =>
    expect(work).rejects.toMatchObject({ kind: "conflict", message: expect.stringMatching(words) });

  it("nothing before the stands", async () => {
    await refused(level(RAISED), /Set the vehicle on stands first/);
  });
  it("nothing after Level before it is true", async () => {
    await acknowledgeStands(tech(), layoutId);
    await refused(confirmMarks(tech(), layoutId, length("120")), /^Level first/);
    await level(AS_FOUND);
    await refused(confirmMarks(tech(), layoutId, length("120")), /^Not level yet/);
    await refused(drop("opening-front", "left", "82", "30"), /^Not level yet/);
    await refused(chooseAxleLine(tech(), layoutId, { method: "square", asked: null }), /^Not level yet/);
    await refused(chooseOption(tech(), layoutId, "1:0:1"), /^Not level yet/);
    await refused(approveOption(foreman(), layoutId, null), /^Not level yet/);
  });
  it("no drops before the marks, no axle line before the drops, no option before the line, no signature before a choice", async () => {
    await acknowledgeStands(tech(), layoutId);
    await level(RAISED);
    await refused(drop("opening-front", "left", "82", "30"), /control marks first/);
    await confirmMarks(tech(), layoutId, length("120"));
    await drop("opening-front", "left", "82 3/8", "30 1/4");
    await refused(
      chooseAxleLine(tech(), layoutId, { method: "square", asked: null }),
      /^7 drops are missing/,
    );
    await dropNeeded();
    await refused(chooseOption(tech(), layoutId, "1:0:1"), /axle line first/);
    await chooseAxleLine(tech(), layoutId, { method: "square", asked: null });
    await refused(approveOption(foreman(), layoutId, null), /option in hand first/);
  });
  it("a move voids the level, shuts what comes after, says how to get it back, and voids the signature", async () => {
    await toOptions();
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    await lookAgain();
    await approveOption(foreman(), layoutId, null);
    const card = (await readBoard(db, shop.shopId, new Date())).bays.find(
      (one) => one.vehicle?.buildId === buildId,
    );
    expect(card?.vehicle?.level).toMatchObject({ state: "true", drops: 11 });
    await moveVehicle(foreman(), {
      buildId,
      placementId: card?.vehicle?.placementId ?? 0,
      toBayId: null,
      confirmed: true,
    });
    const now = await view();
    expect(now).toMatchObject({
      next: "level",
      standsInBay: false,
      level: { state: "void", voided: { reason: "rolled out to the yard", made: { name: "Fay Foreman" } } },
    });
    expect(now.approval).toMatchObject({
      state: "void",
      voided: { reason: "the level is void, rolled out to the yard" },
    });
    await refused(
      drop("opening-front", "left", "82", "30"),
      /^The level is void: rolled out to the yard\. Level again, then drop one old point again\.$/,
    );
    await refused(level(RAISED), /stands in the yard/);
    // What was read stays in the record.
    expect(now.drops.filter((one) => one.reading).every((one) => one.reading?.stands === false)).toBe(true);
  });
});

describe("after a void", () => {
  beforeEach(async () => {
    await toOptions();
    await voidLevelByHand(tech(), layoutId, "stand 3 was touched");
    await level(RAISED);
  });
  it("wants one old point dropped again before anything else", async () => {
    const now = await view();
    expect(now.level?.redrop).toEqual({ state: "wanted", offMm: null });
    expect(now.next).toBe("drops");
    await expect(chooseAxleLine(tech(), layoutId, { method: "square", asked: null })).rejects.toMatchObject({
      message: expect.stringContaining("drop one old point again"),
    });
  });
  it("lets the old drops stand when it falls within tolerance", async () => {
    expect(await drop("opening-front", "left", "82 7/16", "30 1/4")).toMatchObject({ redrop: "stands" });
    const now = await view();
    expect(now.level?.redrop.state).toBe("stands");
    expect(toInches(now.level?.redrop.offMm ?? mm(0))).toBeCloseTo(1 / 16, 6);
    expect(now.drops.filter((one) => one.needed).every((one) => one.reading?.stands)).toBe(true);
    expect(now.options).not.toBeNull();
  });
  it("lets them all go when it does not", async () => {
    expect(await drop("opening-front", "left", "82 5/8", "30 1/4")).toMatchObject({ redrop: "void" });
    const now = await view();
    expect(now.level?.redrop.state).toBe("void");
    expect(now.drops.filter((one) => one.reading?.stands).map((one) => one.label)).toEqual([
      "Opening, front edge, left",
    ]);
    expect(now).toMatchObject({ frame: null, options: null, next: "drops" });
  });
  it("carries by itself when a level that still stands is only read again", async () => {
    await drop("opening-front", "left", "82 3/8", "30 1/4");
    await level(RAISED);
    const now = await view();
    expect(now.level?.redrop.state).toBe("none");
    expect(now.options).not.toBeNull();
  });
});

describe("readings", () => {
  beforeEach(toMarks);

  it("are never edited: a correction is a new reading beside the old one", async () => {
    await drop("opening-front", "left", "82 3/8", "30 1/4");
    await drop("opening-front", "left", "82 1/2", "30 1/4", {
      reason: "read from the wrong side of the mark",
    });
    const one = (await view()).drops.find((d) => d.point === "opening-front" && d.side === "left");
    expect(one?.reading).toMatchObject({
      stationTyped: "82 1/2",
      reason: "read from the wrong side of the mark",
    });
    expect(one?.superseded).toMatchObject([{ typed: "82 3/8, 30 1/4", made: { name: "Tess Tech" } }]);
  });
  it("count once, however often and at once they are sent", async () => {
    const entry = offset("opening-front", "left", "82 3/8", "30 1/4");
    const answers = await Promise.all(Array.from({ length: 12 }, () => keepDrop(tech(), layoutId, entry)));
    expect(new Set(answers.map((answer) => answer.readingId)).size).toBe(1);
    const rows = await db
      .select()
      .from(schema.dropReadings)
      .where(eq(schema.dropReadings.clientKey, entry.clientKey));
    expect(rows).toHaveLength(1);
    expect(
      (await view()).drops.find((d) => d.point === "opening-front" && d.side === "left")?.superseded,
    ).toEqual([]);
  });
  it("of two people at once are both kept", async () => {
    await Promise.all([
      drop("opening-front", "left", "82 3/8", "30 1/4"),
      keepDrop(as(shop.people.tech2), layoutId, offset("opening-front", "right", "82 1/8", "30 3/8")),
      keepDrop(foreman(), layoutId, offset("datum-front", "left", "100", "16")),
    ]);
    expect(
      (await view()).drops
        .filter((one) => one.reading)
        .map((one) => one.reading?.made.name)
        .sort(),
    ).toEqual(["Fay Foreman", "Tess Tech", "Tom Tech"]);
  });
  it("by tape tell of a slip, keep it in the record, and wait until it is measured again", async () => {
    const tapes = (b: string, over: Partial<DropEntry> = {}) =>
      keepDrop(tech(), layoutId, {
        point: "axle-end",
        side: "left",
        method: "ties",
        ties: [
          { mark: "A", distance: length("68 5/8") },
          { mark: "B", distance: length(b) },
          { mark: "D", distance: length("98 1/8") },
        ],
        height: null,
        reason: null,
        clientKey: key(),
        ...over,
      } as DropEntry);
    expect(await tapes("64 3/16")).toMatchObject({
      suspect: true,
      suggestions: [{ kind: "inch-burnt", mark: "B" }],
    });
    await dropNeeded();
    expect((await view()).steps.find((step) => step.id === "drops")).toMatchObject({
      note: "tapes do not meet",
    });
    await expect(chooseAxleLine(tech(), layoutId, { method: "square", asked: null })).rejects.toMatchObject({
      message: expect.stringContaining("do not meet"),
    });
    expect(await tapes("63 3/16", { reason: "inch burnt on B" })).toMatchObject({
      suspect: false,
      checked: true,
    });
    const axle = (await view()).drops.find((one) => one.point === "axle-end" && one.side === "left");
    expect(axle?.superseded).toMatchObject([{ typed: "A 68 5/8, B 64 3/16, D 98 1/8" }]);
    expect(toInches(axle?.reading?.at.x ?? mm(0))).toBeGreaterThan(60);
  });
  it("refuse what cannot be, beside the field", async () => {
    await expect(drop("opening-front", "left", "82", "-30")).rejects.toMatchObject({
      kind: "invalid",
      fields: { offset: expect.stringContaining("without a sign") },
    });
    await expect(drop("low-front", "centre", "96", "0")).rejects.toMatchObject({
      kind: "invalid",
      fields: { height: expect.any(String) },
    });
    await expect(confirmMarks(tech(), layoutId, length("121"))).rejects.toMatchObject({
      kind: "invalid",
      fields: { taped: expect.stringMatching(/^A to B is set as 120 in; the tape reads 1 in more\./) },
    });
  });
});

describe("choosing and signing", () => {
  beforeEach(toOptions);

  it("refuses an option that does not meet what was asked for, with the reason", async () => {
    await db.update(schema.builds).set({ approachAskedDeg: 45 }).where(eq(schema.builds.id, buildId));
    await expect(chooseOption(foreman(), layoutId, optionOf("centred", 1))).rejects.toMatchObject({
      kind: "conflict",
      message: "Approach 40.97°, asked at least 45°.",
    });
  });
  it("lets only foreman and owner sign, once, and only what they saw", async () => {
    await chooseOption(tech(), layoutId, optionOf("centred", 2));
    await lookAgain();
    await expect(approveOption(tech(), layoutId, null)).rejects.toMatchObject({ kind: "forbidden" });
    await expect(approveOption(foreman(), layoutId, optionOf("centred", 1))).rejects.toMatchObject({
      message: expect.stringContaining("Another option was put in hand"),
    });
    const signed = await Promise.allSettled([
      approveOption(foreman(), layoutId, null),
      approveOption(as(shop.people.foreman2), layoutId, null),
    ]);
    expect(signed.filter((one) => one.status === "fulfilled")).toHaveLength(1);
    expect(signed.find((one) => one.status === "rejected")?.reason).toMatchObject({
      kind: "conflict",
      message: expect.stringMatching(/has signed this already/),
    });
  });
  it("voids the signature when a number under it is read again", async () => {
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    await lookAgain();
    await approveOption(foreman(), layoutId, null);
    await drop("opening-front", "left", "82 1/2", "30 1/4");
    const now = await view();
    expect(now.approval).toMatchObject({
      state: "void",
      voided: { reason: "Opening, front edge read again" },
    });
    // The void sheet shows what was signed, not what today's sums say.
    expect(toInches(now.approval?.signed.axleStation ?? mm(0))).toBeCloseTo(44.5, 4);
    expect(now.approval?.signed.hole.number).toBe(1);
    expect(now.choice).toBeNull();
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    expect(await approveOption(foreman(), layoutId, null)).toMatchObject({ sheetRevision: 2 });
  });
  it("notices that the spring has left the rack", async () => {
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    await db
      .update(schema.springs)
      .set({ takenOutAt: new Date() })
      .where(eq(schema.springs.id, shop.springs.centred));
    await expect(approveOption(foreman(), layoutId, null)).rejects.toMatchObject({ kind: "conflict" });
  });
});

describe("who and where", () => {
  it("begins one layout a build, in a bay that is fit for it", async () => {
    expect(await startLayout(foreman(), { buildId, fixedEye: "behind" })).toEqual({ layoutId });
    const other = await makeBuild(db, shop.shopId, {
      nickname: "Yarder",
      code: `Z${serial}ab`,
      by: shop.people.foreman.personId ?? 0,
    });
    await expect(startLayout(tech(), { buildId: other.buildId, fixedEye: "ahead" })).rejects.toMatchObject({
      message: expect.stringContaining("stands in the yard"),
    });
    const lifted = await makeBuild(db, shop.shopId, {
      nickname: "Lifted",
      code: `Z${serial}cd`,
      kind: "open-top",
      by: shop.people.foreman.personId ?? 0,
      bayId: shop.bays[4],
    });
    await expect(startLayout(tech(), { buildId: lifted.buildId, fixedEye: "ahead" })).rejects.toMatchObject({
      message: "The floor of Bay 4 is not rated for layout.",
    });
  });
  it("is not for the counter, nor for another shop", async () => {
    await expect(acknowledgeStands(as(shop.people.counter), layoutId)).rejects.toMatchObject({
      kind: "forbidden",
    });
    const other = await makeTestShop(db);
    await expect(acknowledgeStands(as(other.people.tech), layoutId)).rejects.toMatchObject({
      kind: "not-found",
    });
    await expect(readLayout(db, other.shopId, layoutId)).rejects.toMatchObject({ kind: "not-found" });
  });
  it("wants everything anew in another bay: its floor frame is another", async () => {
    await toMarks();
    await dropNeeded();
    const card = (await readBoard(db, shop.shopId, new Date())).bays.find(
      (one) => one.vehicle?.buildId === buildId,
    );
    await moveVehicle(foreman(), {
      buildId,
      placementId: card?.vehicle?.placementId ?? 0,
      toBayId: shop.bays[2],
      confirmed: true,
    });
    await level(RAISED);
    const now = await view();
    expect(now).toMatchObject({
      bay: { number: 2 },
      marks: null,
      next: "marks",
      level: { state: "true", redrop: { state: "void" } },
    });
  });
});

describe("the second look", () => {
  beforeEach(async () => {
    await toOptions();
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
  });
  const look = (who: "tech" | "tech2", side: "left" | "right", offIn: number, clientKey = key()) => {
    const { station, offset: off } = onFrame(
      "hanger-hole",
      side,
      70.5 + offIn,
      side === "left" ? 15.5 : -15.5,
    ) as Extract<DropEntry, { method: "offset" }>;
    return takeSecondLook(as(shop.people[who]), layoutId, {
      point: "hanger-hole",
      side,
      station,
      offset: off,
      clientKey,
    });
  };

  it("is asked of the points that weigh most, without showing what was read first", async () => {
    const { secondLook } = await view();
    expect(secondLook.state).toBe("to-do");
    expect(secondLook.items.map((item) => [item.label, item.first])).toEqual([
      ["Hanger hole 1, left", null],
      ["Hanger hole 1, right", null],
    ]);
    await expect(approveOption(foreman(), layoutId, null)).rejects.toMatchObject({
      kind: "conflict",
      message: "A second person looks again first.",
    });
  });
  it("is not for the one who read first", async () => {
    await expect(look("tech", "left", 0)).rejects.toMatchObject({
      kind: "conflict",
      message: expect.stringContaining("somebody else looks again"),
    });
  });
  it("passes within both uncertainties, and then shows both", async () => {
    expect(await look("tech2", "left", 1 / 32)).toMatchObject({ outcome: "agrees" });
    expect((await view()).secondLook).toMatchObject({ state: "to-do" });
    await look("tech2", "right", -1 / 16);
    const { secondLook, next } = await view();
    expect(secondLook.state).toBe("agrees");
    expect(secondLook.items[0]?.first?.made.name).toBe("Tess Tech");
    expect(secondLook.items[0]?.looks[0]?.made.name).toBe("Tom Tech");
    expect(next).toBe("approval");
  });
  it("counts a reading once that was sent twice", async () => {
    const once = key();
    await Promise.all([look("tech2", "left", 0, once), look("tech2", "left", 0, once)]);
    expect((await view()).secondLook.items[0]?.looks).toHaveLength(1);
  });
  it("apart, a third reading for the first sets the second aside, and says why", async () => {
    expect(await look("tech2", "left", 1)).toMatchObject({ outcome: "apart" });
    expect((await view()).secondLook.state).toBe("apart");
    await expect(approveOption(foreman(), layoutId, null)).rejects.toMatchObject({
      message: "Two people's readings are apart: a third one decides.",
    });
    expect(await look("tech", "left", 0)).toMatchObject({ outcome: "decided-first" });
    expect((await view()).secondLook.items[0]).toMatchObject({ state: "agrees" });
    const rows = await db.select().from(schema.secondLooks).where(eq(schema.secondLooks.layoutId, layoutId));
    expect(rows.find((row) => row.supersededAt)?.supersededReason).toBe(
      "A third reading agrees with the first.",
    );
  });
  it("apart, a third reading for the second puts it in the first one's place, and the option has to be chosen anew", async () => {
    await look("tech2", "left", 1);
    expect(await look("tech2", "left", 1)).toMatchObject({ outcome: "decided-second" });
    let now = await view();
    expect(now.choice).toBeNull();
    const hole = now.drops.find((one) => one.point === "hanger-hole" && one.side === "left");
    expect(hole?.reading).toMatchObject({
      reason: "Second look: a third reading agreed with the second.",
      made: { name: "Tom Tech" },
    });
    expect(hole?.superseded).toHaveLength(1);
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    now = await view();
    expect(now.secondLook.items.find((item) => item.side === "left")?.state).toBe("agrees");
  });
  it("three readings far from each other decide nothing", async () => {
    await look("tech2", "left", 1);
    expect(await look("tech", "left", 3)).toMatchObject({ outcome: "apart" });
  });
  it("can be waived by a foreman, with a reason", async () => {
    await expect(waiveSecondLook(tech(), layoutId, "Alone tonight")).rejects.toMatchObject({
      kind: "forbidden",
    });
    await waiveSecondLook(foreman(), layoutId, "Alone tonight");
    expect((await view()).secondLook).toMatchObject({ state: "waived", waived: { reason: "Alone tonight" } });
    expect(await approveOption(foreman(), layoutId, null)).toMatchObject({ sheetRevision: 1 });
  });
  it("is wanted again when the point is read again", async () => {
    await lookAgain();
    await keepDrop(tech(), layoutId, onFrame("hanger-hole", "left", 70.6, 15.5, { reason: "bob swung" }));
    await chooseOption(foreman(), layoutId, optionOf("centred", 1));
    expect((await view()).secondLook.items.map((item) => item.state)).toEqual(["to-do", "agrees"]);
  });
});

describe("the history", () => {
  it("holds every reading as typed, also those that were superseded, and who took it", async () => {
    await toMarks();
    await drop("opening-front", "left", "82 3/8", "30 1/4");
    await drop("opening-front", "left", "82 1/2", "30 1/4", { reason: "bob swung" });
    const rows = await readLayoutReadings(db, layoutId);
    expect(rows.filter((row) => row.what === "level")).toHaveLength(4);
    const [old, now] = rows.filter((row) => row.what === "drop");
    expect(old).toMatchObject({ typed: "82 3/8, 30 1/4", by: "Tess Tech", supersededAt: expect.any(String) });
    expect(now).toMatchObject({ typed: "82 1/2, 30 1/4", reason: "bob swung", supersededAt: null });
    const lines = await readLayoutHistory(db, shop.shopId, layoutId);
    expect(lines[0]).toMatchObject({ verb: "keep-drop", by: "Tess Tech" });
    expect(lines.map((line) => line.verb)).toContain("check-level");
    expect(await readLayoutHistory(db, shop.shopId + 1_000_000, layoutId)).toEqual([]);
  });
});
