import type { Db } from "../../app/db/client.server";
import { floorPoint, framePoint } from "../../app/domain/geometry/point";
import type { DropPointId, DropSide } from "../../app/domain/layout/drops";
import { frameFromDatums, toFloor } from "../../app/domain/layout/frame";
import { optionKey } from "../../app/domain/layout/options";
import { workLine } from "../../app/domain/layout/work-list";
import type { Role } from "../../app/domain/people/roles";
import { formatInches, inches, type Millimetres, mm, parseLength } from "../../app/domain/units/length";
import type { Context } from "../../app/services/change.server";
import { acknowledgeStands } from "../../app/services/layouts/acknowledge-stands.server";
import { approveOption } from "../../app/services/layouts/approve-option.server";
import { checkLevel } from "../../app/services/layouts/check-level.server";
import { chooseAxleLine } from "../../app/services/layouts/choose-axle-line.server";
import { chooseOption } from "../../app/services/layouts/choose-option.server";
import { confirmMarks } from "../../app/services/layouts/confirm-marks.server";
import { keepDrop } from "../../app/services/layouts/keep-drop.server";
import { keepTackCheck } from "../../app/services/layouts/keep-tack-check.server";
import { signWork } from "../../app/services/layouts/sign-work.server";
import { startLayout } from "../../app/services/layouts/start-layout.server";
import { takeSecondLook } from "../../app/services/layouts/take-second-look.server";
import { voidLevelByHand } from "../../app/services/layouts/void-level-by-hand.server";

/*
 * Layouts made by the shop's own services with the clock set back, so that every rule held and the journal is whole.
 */

export type DemoLayoutsInput = {
  db: Db;
  shopId: number;
  /** So many minutes of open shop ago. */
  ago: (minutes: number) => Date;
  id: (person: string) => number;
  build: (vehicle: string) => number;
  spring: (rackNumber: number) => number;
  hole: (number: number) => number;
};

type Drop = { point: DropPointId; side: DropSide; station: string; offset: string; height?: string };

const length = (typed: string) => {
  const read = parseLength(typed, "in");
  if (!read.ok) throw new Error(read.problem);
  return { mm: read.value, typed };
};
const at = (x: number, y: number) => floorPoint(inches(x), inches(y));

/** The frame that the demo's datums make, to lay other points by their station on it. */
function demoFrame() {
  const frame = frameFromDatums({
    frontLeft: at(100, 16),
    frontRight: at(100, -16.25),
    rearLeft: at(20, 16.25),
    rearRight: at(20, -16),
  });
  if (!frame.ok) throw new Error(frame.problem);
  return frame.value;
}

/** A point at a station of the frame, as somebody would read it off the floor: to a sixteenth. */
function onFrame(point: DropPointId, side: DropSide, station: number, offset: number, height?: string): Drop {
  const p = toFloor(demoFrame(), framePoint(inches(station), inches(offset)));
  const sixteenths = (value: Millimetres) => formatInches(mm(Math.abs(value)));
  return { point, side, station: sixteenths(p.x), offset: side === "centre" ? "0" : sixteenths(p.y), height };
}

const OPENINGS: Drop[] = [
  { point: "opening-front", side: "left", station: "82 3/8", offset: "30 1/4" },
  { point: "opening-front", side: "right", station: "82 1/8", offset: "30 3/8" },
  { point: "opening-rear", side: "left", station: "46 5/8", offset: "30 1/8" },
  { point: "opening-rear", side: "right", station: "46 1/2", offset: "30 3/16" },
];
const DATUMS: Drop[] = [
  { point: "datum-front", side: "left", station: "100", offset: "16" },
  { point: "datum-front", side: "right", station: "100", offset: "16 1/4" },
  { point: "datum-rear", side: "left", station: "20", offset: "16 1/4" },
  { point: "datum-rear", side: "right", station: "20", offset: "16" },
];
const REST: Drop[] = [
  onFrame("axle-end", "left", 42.9, 30),
  onFrame("axle-end", "right", 42.95, -30),
  onFrame("hanger-hole", "left", 70.5, 15.5),
  onFrame("hanger-hole", "right", 70.5, -15.5),
  onFrame("low-front", "centre", 76, 0, "22"),
];

const STANDS = ["left-front", "right-front", "left-rear", "right-rear"] as const;
const PLACES: Record<(typeof STANDS)[number], [string, string]> = {
  "left-front": ["70", "15"],
  "right-front": ["70", "-15"],
  "left-rear": ["-40", "15"],
  "right-rear": ["-40", "-15"],
};

/** Layouts of the demo: one half way, one on a void level, one waiting for the customer, two signed. */
export async function demoLayouts(input: DemoLayoutsInput): Promise<void> {
  const { db, shopId, ago, id, build, spring, hole } = input;
  const as = (key: string, name: string, role: Role, minutesAgo: number): Context => ({
    db,
    publish: () => {},
    now: () => ago(minutesAgo),
    actor: { shopId, role, personId: id(key), deviceId: null, name, initials: "", sessionHash: "" },
  });

  const begin = async (vehicle: string, who: Context) => {
    const { layoutId } = await startLayout(who, { buildId: build(vehicle), fixedEye: "ahead" });
    await acknowledgeStands(who, layoutId);
    return layoutId;
  };
  const level = (who: Context, layoutId: number, heights: string[]) =>
    checkLevel(who, layoutId, {
      method: "heights",
      stands: STANDS.map((place, i) => ({
        place,
        x: length(PLACES[place][0]),
        y: length(PLACES[place][1]),
        height: length(heights[i] ?? "24"),
      })),
    });
  const dropAll = async (who: Context, layoutId: number, drops: Drop[]) => {
    for (const { point, side, station, offset, height } of drops)
      await keepDrop(who, layoutId, {
        point,
        side,
        method: "offset",
        station: length(station),
        offset: length(offset),
        height: height === undefined ? null : length(height),
        clientKey: crypto.randomUUID(),
        reason: null,
      });
  };
  const AS_FOUND = ["24 1/16", "24 5/16", "23 13/16", "24 3/16"];
  const RAISED = ["24 3/8", "24 5/16", "24 5/16", "24 3/8"];
  const measureAll = async (vehicle: string, who: Context) => {
    const layoutId = await begin(vehicle, who);
    await level(who, layoutId, AS_FOUND);
    await level(who, layoutId, RAISED);
    await confirmMarks(who, layoutId, length("120"));
    await dropAll(who, layoutId, [...OPENINGS, ...DATUMS, ...REST]);
    await chooseAxleLine(who, layoutId, { method: "square", asked: null });
    return layoutId;
  };
  /** Somebody else reads the hanger holes again, which weigh most, and finds them within a thirty-second. */
  const lookAgain = async (who: Context, layoutId: number) => {
    for (const { point, side, station, offset } of REST.filter((drop) => drop.point === "hanger-hole"))
      await takeSecondLook(who, layoutId, {
        point,
        side,
        station: length(station),
        offset: length(formatInches(mm(length(offset).mm + inches(1 / 32)), { denominator: 32 })),
        clientKey: crypto.randomUUID(),
      });
  };
  const ida = (minutesAgo: number) => as("ida", "Ida Kestrel", "foreman", minutesAgo);

  const wes = as("wes", "Wes Tolliver", "tech", 41);
  const mule = await begin("mule", as("wes", "Wes Tolliver", "tech", 110));
  await level(as("wes", "Wes Tolliver", "tech", 95), mule, AS_FOUND);
  await level(wes, mule, RAISED);
  await confirmMarks(as("pilar", "Pilar Dunmore", "tech", 38), mule, length("120"));
  await dropAll(as("pilar", "Pilar Dunmore", "tech", 20), mule, [...OPENINGS, ...DATUMS.slice(0, 2)]);

  const biscuit = await measureAll("biscuit", as("mina", "Mina Fairweather", "tech", 420));
  await chooseOption(ida(300), biscuit, optionKey(spring(22), false, hole(1)));
  await lookAgain(as("pilar", "Pilar Dunmore", "tech", 240), biscuit);
  await approveOption(ida(200), biscuit, null);
  await voidLevelByHand(as("mina", "Mina Fairweather", "tech", 44), biscuit, "stand 3 was touched");

  const sunday = await measureAll("sunday", as("pilar", "Pilar Dunmore", "tech", 240));
  await chooseOption(ida(200), sunday, optionKey(spring(14), false, hole(2)));
  await lookAgain(as("wes", "Wes Tolliver", "tech", 160), sunday);
  await approveOption(ida(142), sunday, null);

  const hatchet = await measureAll("hatchet", as("cato", "Cato Reyes", "tech", 970));
  await chooseOption(ida(960), hatchet, optionKey(spring(14), false, hole(3)));
  await lookAgain(as("bram", "Bram Oduya", "tech", 920), hatchet);
  await approveOption(ida(900), hatchet, null);
  await tackAndWeld(
    (minutesAgo) => as("bram", "Bram Oduya", "tech", minutesAgo),
    hatchet,
    (minutesAgo) => as("cato", "Cato Reyes", "tech", minutesAgo),
  );
}

type By = (minutesAgo: number) => Context;

/** Both ends read after tacking, the left one moved a little, and the first four brackets welded. */
async function tackAndWeld(bram: By, layoutId: number, cato: By) {
  const check = (who: Context, left: number, right: number) => {
    const [l, r] = [onFrame("axle-end", "left", left, 30), onFrame("axle-end", "right", right, -30)];
    return keepTackCheck(who, layoutId, {
      left: { station: length(l.station), offset: length(l.offset) },
      right: { station: length(r.station), offset: length(r.offset) },
      sheet: null,
      clientKey: crypto.randomUUID(),
    });
  };
  await check(bram(260), 46.5 - 1 / 4, 46.5);
  await check(bram(215), 46.5, 46.5);
  const sign = (who: Context, id: string, tool = "") => {
    const line = workLine(id);
    if (!line) throw new Error(`The weld list has no ${id}`);
    const entry = { state: "pass" as const, wanted: "", read: "", tool, words: "", figures: [] };
    return signWork(who, layoutId, { line, entry, due: null });
  };
  const card = "Card 12, fillet and groove, all positions";
  await sign(bram(158), "ready");
  await sign(bram(139), "hanger.left", card);
  await sign(bram(118), "hanger.right", card);
  await sign(cato(74), "shackle-hanger.left", card);
  await sign(cato(37), "shackle-hanger.right", card);
}
