import { type FloorPoint, floorPoint } from "../geometry/point";
import { type Millimetres, mm } from "../units/length";
import { type AxleMethod, axleLine, compareOpenings } from "./axle-line";
import { type DropPointId, type DropSide, dropPoint } from "./drops";
import { frameFromDatums, toFrame } from "./frame";

/** A drop that the marked numbers rest on. */
export type LookedAt = { point: DropPointId; side: DropSide };

/** The drops between frame, opening and hanger hole. */
export const WEIGHED: readonly LookedAt[] = (
  ["datum-front", "datum-rear", "opening-front", "opening-rear", "hanger-hole"] as const
).flatMap((point) => (["left", "right"] as const).map((side) => ({ point, side })));

export type Weight = LookedAt & {
  /** Its share of the variance of where the axle comes to stand in its opening; 1 is all of it. */
  share: number;
};

/** A drop is moved so far (mm) each way to see what follows. */
const STEP = 0.01;

/**
 * How much each drop weighs in how far the axle stands from the opening's centre, every drop being as unsure as the
 * others: the share of the variance, to first order. Heaviest first; equal ones in the order of dropping.
 * Source: JCGM 100:2008, 5.1.2 (from memory).
 * @returns an empty list when the drops make no frame or no opening
 * @example weightsOf(at, "square")[0] // { point: "hanger-hole", side: "left", share: 0.25 }
 */
export function weightsOf(
  at: (point: DropPointId, side: DropSide) => FloorPoint | null,
  method: AxleMethod,
): Weight[] {
  const places = new Map<string, FloorPoint>();
  for (const { point, side } of WEIGHED) {
    const place = at(point, side);
    if (!place) return [];
    places.set(`${point} ${side}`, place);
  }
  const slopes = WEIGHED.map((drop) => {
    const moved = (x: number, y: number) => {
      const from = places.get(`${drop.point} ${drop.side}`);
      return shiftOf((point, side) => {
        const here = places.get(`${point} ${side}`) as FloorPoint;
        return here === from ? floorPoint(here.x + x, here.y + y) : here;
      }, method);
    };
    const [east, west, north, south] = [moved(STEP, 0), moved(-STEP, 0), moved(0, STEP), moved(0, -STEP)];
    if (east === null || west === null || north === null || south === null) return null;
    return Math.hypot(east - west, north - south) / (2 * STEP);
  });
  const total = slopes.reduce<number>((sum, slope) => sum + (slope ?? Number.NaN) ** 2, 0);
  if (!(total > 0)) return [];
  return WEIGHED.map((drop, i) => ({ ...drop, share: (slopes[i] ?? 0) ** 2 / total })).sort((a, b) =>
    Math.abs(a.share - b.share) > 1e-9 ? b.share - a.share : orderOf(a) - orderOf(b),
  );
}

const orderOf = (drop: LookedAt) =>
  WEIGHED.findIndex((one) => one.point === drop.point && one.side === drop.side);

/** Where a hole stands from the opening's centre; a spring moves the axle from it by a half that is no drop. */
function shiftOf(at: (point: DropPointId, side: DropSide) => FloorPoint, method: AxleMethod): number | null {
  const frame = frameFromDatums({
    frontLeft: at("datum-front", "left"),
    frontRight: at("datum-front", "right"),
    rearLeft: at("datum-rear", "left"),
    rearRight: at("datum-rear", "right"),
  });
  if (!frame.ok) return null;
  const openings = compareOpenings(frame.value, {
    left: { front: at("opening-front", "left"), rear: at("opening-rear", "left") },
    right: { front: at("opening-front", "right"), rear: at("opening-rear", "right") },
  });
  if (!openings.ok) return null;
  const { left, right } = openings.value;
  const line = axleLine({ left: left.centre, right: right.centre }, method, mm(0));
  const hole = (side: DropSide) => toFrame(frame.value, at("hanger-hole", side)).station;
  return (hole("left") + hole("right")) / 2 - line.station;
}

const FEWEST = 2;
const MOST = 4;
/** Enough is looked at again once this share of the variance is. */
const ENOUGH = 0.6;

/**
 * The two to four drops to look at again: the heaviest, until they make up more than half of what is unsure.
 * @example pointsToLookAt([{ share: 0.4, … }, { share: 0.3, … }, { share: 0.3, … }]).length // 2
 */
export function pointsToLookAt(weights: readonly Weight[]): Weight[] {
  const chosen: Weight[] = [];
  let share = 0;
  for (const weight of weights) {
    if (chosen.length >= MOST || (chosen.length >= FEWEST && share >= ENOUGH)) break;
    chosen.push(weight);
    share += weight.share;
  }
  return chosen;
}

/**
 * How far two readings of one point may be apart: both are a bob and a tape, so that the difference is unsure by √2 of
 * one; twice that (k = 2).
 * Source: JCGM 100:2008, uncertainty of a difference of independent readings (from memory).
 */
export const agreeWithin = (sigma: { tape: Millimetres; drop: Millimetres }): Millimetres =>
  mm(2 * Math.SQRT2 * Math.hypot(sigma.tape, sigma.drop));

/** What a third reading makes of two that do not agree. */
export type ThirdReading = "first-stands" | "second-stands" | "neither";

/**
 * Which of two readings that do not agree stands, by a third: the nearer one, if it is near enough.
 * @example thirdDecides({ fromFirst: mm(1), fromSecond: mm(9) }, mm(3)) // "first-stands"
 */
export function thirdDecides(
  { fromFirst, fromSecond }: { fromFirst: Millimetres; fromSecond: Millimetres },
  within: Millimetres,
): ThirdReading {
  if (Math.min(fromFirst, fromSecond) > within) return "neither";
  return fromFirst <= fromSecond ? "first-stands" : "second-stands";
}

/** "Hanger hole 1, left". */
export const lookLabel = ({ point, side }: LookedAt): string =>
  `${dropPoint(point)?.label ?? point}, ${side}`;
