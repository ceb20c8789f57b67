import { approachAngle, type LowPoint } from "../layout/approach";
import { type Degrees, degrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A wheel seen from the side: its axle's station and the static loaded radius of its tyre. */
export type SideWheel = { station: Millimetres; loadedRadius: Millimetres };

/** An angle with the point that makes it. */
export type Governed = { angle: Degrees; point: LowPoint };

export type ClearanceAngles = {
  /** Null: no point given bounds it. */
  approach: Governed | null;
  departure: Governed | null;
  ramp: Governed | null;
};

/**
 * Approach, departure and ramp (breakover) angle, tyres under static load: planes that touch the tyres and no part of the
 * vehicle lies below. The ramp angle of a point is the sum of its tangents to both tyres; the smallest over all points
 * counts. Points between the axles make the ramp, points ahead of the front axle the approach, points behind the rear one
 * the departure; a point within a tyre bounds nothing.
 * Source: ISO 612 and SAE J1100 (definitions from memory), 49 CFR 523.2 for the static loaded radius.
 * @throws RangeError when the front axle is not ahead of the rear one
 * @example clearanceAngles(wheel(2540, 406.4), wheel(0, 406.4), [{ station: 1270, height: 254 }]).ramp // 23.3647°
 */
export function clearanceAngles(
  front: SideWheel,
  rear: SideWheel,
  points: readonly LowPoint[],
): ClearanceAngles {
  if (!(front.station > rear.station)) throw new RangeError("The front axle is ahead of the rear one");
  const smallest = (of: (point: LowPoint) => number | null): Governed | null => {
    let found: Governed | null = null;
    for (const point of points) {
      const angle = of(point);
      if (angle !== null && (found === null || angle < found.angle)) found = { angle: degrees(angle), point };
    }
    return found;
  };
  const ahead = (point: LowPoint) =>
    approachAngle(front.loadedRadius, mm(point.station - front.station), point.height);
  const behind = (point: LowPoint) =>
    approachAngle(rear.loadedRadius, mm(rear.station - point.station), point.height);
  const between = (point: LowPoint) => {
    const toFront = approachAngle(front.loadedRadius, mm(front.station - point.station), point.height);
    const toRear = approachAngle(rear.loadedRadius, mm(point.station - rear.station), point.height);
    return toFront === null || toRear === null ? null : toFront + toRear;
  };
  return { approach: smallest(ahead), departure: smallest(behind), ramp: smallest(between) };
}
