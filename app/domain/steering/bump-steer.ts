import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { type Millimetres, MM_PER_INCH, mm } from "../units/length";
import { type VehiclePoint, vehiclePoint } from "./drag-link";

/** Where the axle's centre has gone from ride height, at one place of its travel; up and ahead positive. */
export type AxlePlace = { rise: Millimetres; ahead: Millimetres };

export type BumpSteerInput = {
  /** Ball at the steering box's arm, held still. */
  box: VehiclePoint;
  /** Ball on the steering arm, at ride height. */
  arm: VehiclePoint;
  /** A point of the axis that the knuckle turns about; the axis is taken as upright. */
  kingpin: VehiclePoint;
  path: readonly AxlePlace[];
};
export type Steered = AxlePlace & {
  /** Turn of the knuckle from ride height, to the left positive. */
  turn: Degrees;
};

/**
 * How far the knuckle turns when the axle goes through its path and the link keeps its length: at each place the arm's
 * ball is where a circle about the kingpin meets the sphere about the box's ball, on the side where it was.
 * Source: plane and solid geometry.
 * @returns a problem when arm and kingpin coincide in plan, or the link cannot reach
 * @example bumpSteer({ box, arm, kingpin, path: [{ rise: mm(76.2), ahead: mm(-4.781) }] }).value[0].turn
 */
export function bumpSteer({ box, arm, kingpin, path }: BumpSteerInput): Outcome<Steered[]> {
  const radius = Math.hypot(arm.x - kingpin.x, arm.y - kingpin.y);
  if (radius < 1) return problem("The steering arm's ball lies on the kingpin: it cannot turn anything.");
  const length = Math.hypot(arm.x - box.x, arm.y - box.y, arm.z - box.z);
  const start = Math.atan2(arm.y - kingpin.y, arm.x - kingpin.x);
  let last = start;
  const steered: Steered[] = [];
  for (const place of [...path].sort((a, b) => Math.abs(a.rise) - Math.abs(b.rise))) {
    const pin = vehiclePoint(kingpin.x + place.ahead, kingpin.y, kingpin.z + place.rise);
    const up = arm.z + place.rise - box.z;
    // The ball's circle, seen in plan: |box − pin|² + r² − 2·r·|box − pin|·cos = what the link leaves in plan.
    const [bx, by] = [box.x - pin.x, box.y - pin.y];
    const apart = Math.hypot(bx, by);
    const inPlan = length ** 2 - up ** 2;
    const cosine = (apart ** 2 + radius ** 2 - inPlan) / (2 * radius * apart);
    if (inPlan < 0 || apart === 0 || Math.abs(cosine) > 1)
      return problem("The link is too short for this travel: it would pull the arm straight.");
    const to = Math.atan2(by, bx);
    const found = [to + Math.acos(cosine), to - Math.acos(cosine)].map(nearest(last));
    const [one = 0, other = 0] = found;
    const angle = Math.abs(one - last) <= Math.abs(other - last) ? one : other;
    steered.push({ ...place, turn: toDegrees(angle - start) });
    last = Math.abs(place.rise) < 1e-9 ? angle : last;
  }
  return ok(steered.sort((a, b) => a.rise - b.rise));
}

/** The same direction, written within half a turn of another. */
const nearest = (last: number) => (angle: number) =>
  angle - 2 * Math.PI * Math.round((angle - last) / (2 * Math.PI));

/**
 * Degrees of steer for each inch of travel about ride height, from the two places nearest to it.
 * @returns null with fewer than two places
 * @example steerPerInch([{ rise: mm(-25.4), ahead: mm(0), turn: degrees(-0.1) }, { rise: mm(25.4), ahead: mm(0), turn: degrees(0.1) }]) // 0.1
 */
export function steerPerInch(steered: readonly Steered[]): Degrees | null {
  const [a, b] = [...steered].sort((one, other) => Math.abs(one.rise) - Math.abs(other.rise));
  if (!a || !b || a.rise === b.rise) return null;
  return degrees(((b.turn - a.turn) / (b.rise - a.rise)) * MM_PER_INCH);
}

/**
 * How far a link's end moves along when it swings up from level: R − √(R² − y²).
 * @returns null when the rise is more than the radius
 * @example swingBack(inches(30), inches(3)) // 0.15038 in
 */
export function swingBack(radius: Millimetres, rise: Millimetres): Millimetres | null {
  return Math.abs(rise) > radius ? null : mm(radius - Math.sqrt(radius ** 2 - rise ** 2));
}
