import { distance, type FramePoint, floorPoint } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { inches, type Millimetres, mm } from "../units/length";
import type { AxleLine } from "./axle-line";
import { axlePoint } from "./axle-line";

/** The two ends of an axle (middle of each hub face) in the frame's axes, as dropped after tacking. */
export type AxleEnds = { left: FramePoint; right: FramePoint };

/** How far an end may be from where it was meant to be. Common practice, no source. */
export const SQUARE_TOLERANCE = inches(1 / 8);
/** Axle ends nearer to each other than this (mm) across the frame are no axle. */
const NARROWEST = mm(300);

export type Axle = {
  /** Where the axle crosses the frame centre line. */
  station: Millimetres;
  /** How far its middle stands left of the frame centre line. */
  offset: Millimetres;
  /** How far it is from square to the frame; positive: the left end stands back. */
  turn: Degrees;
  /** From end to end. */
  width: Millimetres;
};

/**
 * An axle from its two ends.
 * @returns a problem when left and right are swapped or lie on each other
 * @example axleFromEnds({ left: framePoint(990, 800), right: framePoint(1010, -800) }) // station 1000, turn 0.7162°
 */
export function axleFromEnds({ left, right }: AxleEnds): Outcome<Axle> {
  const across = left.offset - right.offset;
  if (across <= 0) return problem("The axle's ends look swapped: the left one lies right of the other.");
  if (across < NARROWEST) return problem("The axle's ends are too near each other: were they dropped right?");
  const slope = (left.station - right.station) / across;
  return ok({
    station: mm(left.station - slope * left.offset),
    offset: mm((left.offset + right.offset) / 2),
    turn: toDegrees(-Math.atan(slope)),
    width: mm(Math.hypot(across, left.station - right.station)),
  });
}

export type AsBuilt = {
  axle: Axle;
  /** How far each end stands ahead of the line that was chosen; negative: behind it. */
  leftAhead: Millimetres;
  rightAhead: Millimetres;
  /** Left end's minus right end's: how far it is out of square to that line. */
  outOfSquare: Millimetres;
  /** How far the middle stands left of where it should. */
  sideways: Millimetres;
  isTrue: boolean;
};

/**
 * What was built against the axle line that was chosen. True when neither end, nor the one against the other, nor the
 * middle sideways is out by more than the tolerance; compared unrounded, equal is true.
 * @param wantedOffset how far left of the frame centre line the middle should stand; on it unless told
 * @returns a problem as axleFromEnds
 * @example compareAsBuilt({ left: framePoint(995, 800), right: framePoint(1000, -800) }, line) // leftAhead −5 of a square line at 1000
 */
export function compareAsBuilt(
  ends: AxleEnds,
  line: AxleLine,
  options: { tolerance?: Millimetres; wantedOffset?: Millimetres } = {},
): Outcome<AsBuilt> {
  const tolerance = options.tolerance ?? SQUARE_TOLERANCE;
  if (!(tolerance > 0)) throw new RangeError(`${tolerance} mm is not a tolerance`);
  const axle = axleFromEnds(ends);
  if (!axle.ok) return axle;
  const ahead = (end: FramePoint) => mm(end.station - axlePoint(line, end.offset).station);
  const [leftAhead, rightAhead] = [ahead(ends.left), ahead(ends.right)];
  const outOfSquare = mm(leftAhead - rightAhead);
  const sideways = mm(axle.value.offset - (options.wantedOffset ?? 0));
  const worst = Math.max(...[leftAhead, rightAhead, outOfSquare, sideways].map(Math.abs));
  return ok({
    axle: axle.value,
    leftAhead,
    rightAhead,
    outOfSquare,
    sideways,
    isTrue: worst <= tolerance + 1e-9,
  });
}

export type Wheelbases = {
  /** Front hub to rear hub along the frame, each side. */
  left: Millimetres;
  right: Millimetres;
  /** Left minus right. */
  difference: Millimetres;
  /** From front left to rear right, from front right to rear left, and the first minus the second. */
  leftDiagonal: Millimetres;
  rightDiagonal: Millimetres;
  diagonalDifference: Millimetres;
  /** Where the rear axle points against the line through the middles of both axles; positive: to the right. */
  thrust: Degrees;
};

/**
 * Wheelbase left and right, diagonals and thrust angle of two axles.
 * Source: plane geometry; thrust angle is the rear axle's direction against the line through both middles.
 * @returns a problem as axleFromEnds, or when the front axle is not ahead of the rear one
 * @example wheelbases({ left: framePoint(2500, 800), right: framePoint(2500, -800) }, { left: framePoint(0, 800), right: framePoint(0, -800) }) // 2500 both sides, diagonals 2968.16
 */
export function wheelbases(front: AxleEnds, rear: AxleEnds): Outcome<Wheelbases> {
  const [f, r] = [axleFromEnds(front), axleFromEnds(rear)];
  if (!f.ok) return f;
  if (!r.ok) return r;
  const [left, right] = [front.left.station - rear.left.station, front.right.station - rear.right.station];
  if (left <= 0 || right <= 0)
    return problem("The front axle is not ahead of the rear one: were they swapped?");
  const along = (front.left.station + front.right.station - rear.left.station - rear.right.station) / 2;
  const middleLine = (Math.atan2(f.value.offset - r.value.offset, along) * 180) / Math.PI;
  const apart = (a: FramePoint, b: FramePoint) =>
    distance(floorPoint(a.station, a.offset), floorPoint(b.station, b.offset));
  const [leftDiagonal, rightDiagonal] = [apart(front.left, rear.right), apart(front.right, rear.left)];
  return ok({
    left: mm(left),
    right: mm(right),
    difference: mm(left - right),
    leftDiagonal,
    rightDiagonal,
    diagonalDifference: mm(leftDiagonal - rightDiagonal),
    thrust: degrees(middleLine - r.value.turn),
  });
}

/**
 * Thrust angle from the toe of the rear wheels: (left − right)/2, toe-in positive; positive: to the right.
 * Source: common alignment practice; the sign is from memory.
 * @example thrustFromToe(degrees(0.2), degrees(-0.1)) // 0.15
 */
export const thrustFromToe = (left: Degrees, right: Degrees): Degrees => degrees((left - right) / 2);

/**
 * Total toe as an angle, from how much nearer the wheels are in front than behind: atan(difference / over).
 * @param over the length over which the difference was measured, as a rule the tyre's diameter
 * @returns a problem when that length is not above zero
 * @example toeAngle(inches(1 / 8), inches(28)) // 0.25578°, half of that at each wheel
 */
export const toeAngle = (difference: Millimetres, over: Millimetres): Outcome<Degrees> =>
  over > 0
    ? ok(toDegrees(Math.atan(difference / over)))
    : problem("The length over which toe was measured has to be above zero.");
