import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A point on the vehicle: station ahead, offset to the left of the centre line, height up. */
export type SpacePoint = {
  readonly station: Millimetres;
  readonly offset: Millimetres;
  readonly height: Millimetres;
};
export const spacePoint = (station: number, offset: number, height: number): SpacePoint => ({
  station: mm(station),
  offset: mm(offset),
  height: mm(height),
});

/** A link in space; of a pair, either one, the other being its mirror image across the vehicle's centre line. */
export type SpaceLink = { readonly frame: SpacePoint; readonly axle: SpacePoint };

/** Where the two links of a pair meet on the centre line in space, or that they run side by side. */
export type PairConvergence = {
  /** Angle between the two in plan, degrees; 0: side by side. Positive: they come together going forward. */
  planAngle: Degrees;
  /** On the centre line; null when side by side. */
  meet: { station: Millimetres; height: Millimetres } | null;
  /** Each link's slope in side view, rise over run going forward; null when it stands across or upright. */
  slope: number | null;
};

/** Sideways per length of a link below which a pair runs side by side (ours, no source). */
const SIDE_BY_SIDE = 1e-9;

/**
 * How the two mirrored links of a pair run together: in plan, and the point of the centre line where they meet.
 * Source: descriptive geometry of two mirrored lines.
 * @returns a problem when the link's pivots are in one place
 * @example axle (0, 600, 400) to frame (600, 300, 430) // they meet at station 1200, height 460; plan angle 53.1301°
 */
export function pairConvergence({ frame, axle }: SpaceLink): Outcome<PairConvergence> {
  const side = Math.sign(axle.offset || frame.offset);
  const [x, y, z] = [
    frame.station - axle.station,
    side * (frame.offset - axle.offset),
    frame.height - axle.height,
  ];
  const length = Math.hypot(x, y, z);
  if (length === 0) return problem("The link's two pivots are in the same place.");
  const slope = Math.abs(x) < SIDE_BY_SIDE * length ? null : z / x;
  if (Math.abs(y) < SIDE_BY_SIDE * length) return ok({ planAngle: degrees(0), meet: null, slope });
  const by = (-side * axle.offset) / y;
  const inward = x < 0 ? y : -y;
  return ok({
    planAngle: degrees(2 * toDegrees(Math.atan2(inward, Math.abs(x)))),
    meet: { station: mm(axle.station + by * x), height: mm(axle.height + by * z) },
    slope,
  });
}

/** The line about which the axle rolls under the vehicle, in its centre plane. */
export type RollAxis = {
  /** Height of the line above the axle's station: the roll centre, in the heights of the links. */
  rollCentre: Millimetres;
  /** Rise over run going forward. */
  slope: number;
  /**
   * Degrees that a rear axle steers for each degree by which the axle rolls against the frame: the slope of the axis. Positive:
   * the wheel that goes up against the frame goes back, which in a turn steers a rear axle outwards (oversteer).
   */
  steerPerDegree: number;
};

const axisThrough = (
  point: { station: number; height: number },
  slope: number,
  axleStation: Millimetres,
): RollAxis => ({
  rollCentre: mm(point.height + slope * (axleStation - point.station)),
  slope,
  steerPerDegree: slope,
});

/** Two points of the centre line nearer than this in station have no line that can be used, mm (ours, no source). */
const SAME_STATION = 1e-6;

/**
 * The roll axis of a triangulated four-link: through the points where the links of either pair meet; parallel to a pair that
 * runs side by side.
 * Source: the usual construction for solid axles, Milliken & Milliken, Race Car Vehicle Dynamics, chapter 17 (from memory).
 * @param lower one link of the lower pair, the other being its mirror image; `upper` likewise
 * @param axleStation where the roll centre is wanted, millimetres
 * @returns a problem when both pairs run side by side (nothing holds the axle sideways) or meet at one station
 * @example lower side by side and level, upper meeting at (−150, 500), axle at 0 // roll centre 500 high, slope 0
 */
export function triangulatedRollAxis(
  lower: SpaceLink,
  upper: SpaceLink,
  axleStation: Millimetres,
): Outcome<RollAxis> {
  const [a, b] = [pairConvergence(lower), pairConvergence(upper)];
  if (!a.ok) return a;
  if (!b.ok) return b;
  const [p, q] = [a.value.meet, b.value.meet];
  if (p && q) {
    const run = q.station - p.station;
    return Math.abs(run) < SAME_STATION
      ? problem("Both pairs meet at the same station: the axle has no roll axis along the vehicle.")
      : ok(axisThrough(p, (q.height - p.height) / run, axleStation));
  }
  const [point, slope] = p ? [p, b.value.slope] : [q, a.value.slope];
  if (!point)
    return problem("Both pairs run side by side: nothing holds the axle sideways without a lateral bar.");
  if (slope === null) return problem("A pair stands upright: it does not hold the axle fore and aft.");
  return ok(axisThrough(point, slope, axleStation));
}

export type LateralBarRollAxis = RollAxis & {
  /** Where the bar crosses the centre line. */
  bar: { station: Millimetres; height: Millimetres };
  /**
   * What the upper pair would steer more than the lower, degrees per degree of roll: what rubber must give, or rod ends bind.
   * Null with no upper pair (one link on the centre line does not steer).
   */
  steerApart: number | null;
};

/**
 * The roll axis of links side by side with a lateral bar: through the point where the bar crosses the centre line, parallel to
 * the lower links. Where the upper links do not run as the lower, they want another axis and the difference is given.
 * Source: the usual construction for solid axles, Milliken & Milliken, Race Car Vehicle Dynamics, chapter 17 (from memory).
 * @param links one of each pair; leave `upper` out for a single upper link on the centre line
 * @returns a problem when a pair is not side by side, stands upright, or the bar does not cross the centre line
 * @example lower level, bar from (−50, −500, 380) to (−50, 500, 360) // roll centre 370 high, slope 0
 */
export function lateralBarRollAxis(
  links: { lower: SpaceLink; upper?: SpaceLink | undefined; bar: SpaceLink },
  axleStation: Millimetres,
): Outcome<LateralBarRollAxis> {
  const lower = sideBySideSlope(links.lower);
  if (!lower.ok) return lower;
  const upper = links.upper === undefined ? ok(null) : sideBySideSlope(links.upper);
  if (!upper.ok) return upper;
  const bar = crossing(links.bar);
  if (!bar.ok) return bar;
  return ok({
    ...axisThrough(bar.value, lower.value, axleStation),
    bar: bar.value,
    steerApart: upper.value === null ? null : upper.value - lower.value,
  });
}

function sideBySideSlope(link: SpaceLink): Outcome<number> {
  const pair = pairConvergence(link);
  if (!pair.ok) return pair;
  if (pair.value.meet)
    return problem("With a lateral bar the links of a pair run side by side; these come together.");
  if (pair.value.slope === null)
    return problem("A pair stands upright: it does not hold the axle fore and aft.");
  return ok(pair.value.slope);
}

/** Where a line from one side to the other crosses the centre line, or would if it were longer. */
function crossing({ frame, axle }: SpaceLink): Outcome<{ station: Millimetres; height: Millimetres }> {
  const across = frame.offset - axle.offset;
  if (Math.abs(across) < SAME_STATION)
    return problem("The lateral bar does not run across: it does not hold the axle sideways.");
  const by = -axle.offset / across;
  return ok({
    station: mm(axle.station + by * (frame.station - axle.station)),
    height: mm(axle.height + by * (frame.height - axle.height)),
  });
}
