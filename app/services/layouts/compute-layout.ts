import type { DropRow, LayoutHead } from "../../db/queries/layouts.server";
import type { ShopSettings } from "../../db/queries/shop.server";
import type { FloorPoint } from "../../domain/geometry/point";
import {
  AXLE_METHODS,
  type AxleLine,
  axleLine,
  compareOpenings,
  type OpeningComparison,
} from "../../domain/layout/axle-line";
import type { DropPointId, DropSide } from "../../domain/layout/drops";
import { type Frame, frameFromDatums, toFrame } from "../../domain/layout/frame";
import { type HangerHole, type Option, optionTable, USUAL_LOCK } from "../../domain/layout/options";
import type { LeafSpring } from "../../domain/springs/leaf-spring";
import { degrees } from "../../domain/units/angle";
import { type Millimetres, mm } from "../../domain/units/length";

/** Where the drops that stand lie, and how high the one with a height is. */
export type StandingDrops = {
  at: (point: DropPointId, side: DropSide) => FloorPoint | null;
  lowFront: { at: FloorPoint; height: Millimetres } | null;
};

export function standingDrops(rows: readonly DropRow[], stands: (row: DropRow) => boolean): StandingDrops {
  const good = rows.filter((row) => row.reading.supersededAt === null && stands(row) && !row.reading.suspect);
  const find = (point: DropPointId, side: DropSide) =>
    good.find((row) => row.drop.point === point && row.drop.side === side);
  const place = (row: DropRow): FloorPoint => ({ x: mm(row.reading.xMm), y: mm(row.reading.yMm) });
  const low = find("low-front", "centre");
  return {
    at: (point, side) => {
      const row = find(point, side);
      return row ? place(row) : null;
    },
    lowFront:
      low && low.reading.heightMm !== null ? { at: place(low), height: mm(low.reading.heightMm) } : null,
  };
}

export type Geometry = {
  frame: Frame | null;
  openings: OpeningComparison | null;
  axleWays: AxleLine[];
  line: AxleLine | null;
  holes: { id: number; number: number; station: Millimetres }[];
  options: Option[] | null;
  missing: string[];
};

type Input = {
  head: LayoutHead;
  shop: ShopSettings;
  drops: StandingDrops;
  rack: LeafSpring[];
  holes: { id: number; number: number; aheadMm: number }[];
};

/** Everything that follows from the drops that stand; what cannot be told yet is null or empty, and said in `missing`. */
export function computeGeometry({ head, shop, drops, rack, holes }: Input): Geometry {
  const missing: string[] = [];
  const { layout, build } = head;
  const result: Geometry = {
    frame: null,
    openings: null,
    axleWays: [],
    line: null,
    holes: [],
    options: null,
    missing,
  };
  const pair = (point: DropPointId) => [drops.at(point, "left"), drops.at(point, "right")] as const;

  const [[frontLeft, frontRight], [rearLeft, rearRight]] = [pair("datum-front"), pair("datum-rear")];
  if (frontLeft && frontRight && rearLeft && rearRight) {
    const frame = frameFromDatums({ frontLeft, frontRight, rearLeft, rearRight });
    if (frame.ok) result.frame = frame.value;
    else missing.push(frame.problem);
  } else missing.push("Drop the front and rear frame datum on both sides.");

  const [[openFL, openFR], [openRL, openRR]] = [pair("opening-front"), pair("opening-rear")];
  if (result.frame && openFL && openFR && openRL && openRR) {
    const compared = compareOpenings(result.frame, {
      left: { front: openFL, rear: openRL },
      right: { front: openFR, rear: openRR },
    });
    if (compared.ok) result.openings = compared.value;
    else missing.push(compared.problem);
  } else if (result.frame) missing.push("Drop both edges of both wheel openings.");
  if (!result.frame || !result.openings) return result;

  const centres = { left: result.openings.left.centre, right: result.openings.right.centre };
  const asked = layout.axleAskedMm === null ? null : mm(layout.axleAskedMm);
  result.axleWays = AXLE_METHODS.filter((method) => method !== "asked" || asked !== null).map((method) =>
    axleLine(centres, method, asked ?? mm(0)),
  );
  result.line = result.axleWays.find((way) => way.method === layout.axleMethod) ?? null;

  const frame = result.frame;
  const [holeLeft, holeRight] = pair("hanger-hole");
  if (holeLeft && holeRight) {
    const station = (toFrame(frame, holeLeft).station + toFrame(frame, holeRight).station) / 2;
    result.holes = holes.map((hole) => ({
      id: hole.id,
      number: hole.number,
      station: mm(station + hole.aheadMm),
    }));
  } else missing.push("Drop hanger hole 1 on both sides.");
  if (!result.line || result.holes.length === 0) return result;
  if (rack.length === 0) missing.push("The spring rack is empty.");

  const [axleLeft, axleRight] = pair("axle-end");
  const stockStation =
    axleLeft && axleRight
      ? mm((toFrame(frame, axleLeft).station + toFrame(frame, axleRight).station) / 2)
      : null;
  if (stockStation === null) missing.push("Drop both axle ends for the wheelbase.");
  else if (build.wheelbaseMm === null) missing.push("The wheelbase as it came was not given at booking in.");
  if (!drops.lowFront)
    missing.push("Drop the lowest point in front, with its height, for the approach angle.");
  else if (build.loadedRadiusMm === null)
    missing.push("The tyre's loaded radius was not given at booking in.");
  const tyreKnown = build.tyreRadiusMm !== null && build.tyreWidthMm !== null;
  if (!tyreKnown)
    missing.push("The tyre's radius and width were not given at booking in: no room in the opening.");
  result.options = optionTable({
    springs: rack,
    holes: result.holes satisfies HangerHole[],
    fixedEye: layout.fixedEye,
    openingCentre: result.line.station,
    stock:
      stockStation !== null && build.wheelbaseMm !== null
        ? { axleStation: stockStation, wheelbase: mm(build.wheelbaseMm) }
        : null,
    loadedRadius: build.loadedRadiusMm === null ? null : mm(build.loadedRadiusMm),
    lowPoints: drops.lowFront
      ? [{ station: toFrame(frame, drops.lowFront.at).station, height: drops.lowFront.height }]
      : [],
    // Rubbing is shown, not refused on: without lip heights the plan reach is too pessimistic to reject by.
    tyre: tyreKnown
      ? { freeRadius: mm(build.tyreRadiusMm ?? 0), width: mm(build.tyreWidthMm ?? 0), lock: USUAL_LOCK }
      : null,
    opening: {
      front: mm(Math.min(result.openings.left.front, result.openings.right.front)),
      rear: mm(Math.max(result.openings.left.rear, result.openings.right.rear)),
    },
    constraints: build.approachAskedDeg === null ? {} : { approachAtLeast: degrees(build.approachAskedDeg) },
    // The hole's station is the mean of two drops; each is a tape and a bob.
    sigma: {
      hole: mm(Math.hypot(shop.tapeSigmaMm, shop.dropSigmaMm) / Math.SQRT2),
      half: mm(shop.springSigmaMm),
    },
    unit: shop.unit,
  });
  return result;
}
