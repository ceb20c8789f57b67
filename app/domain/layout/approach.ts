import { type Degrees, toDegrees } from "../units/angle";
import type { Millimetres } from "../units/length";

/** A point under the vehicle: how far ahead of the rear datum pair, how high above the ground. */
export type LowPoint = { station: Millimetres; height: Millimetres };

/**
 * Approach angle for one point: between the ground and the plane that touches the tyre's static loaded radius and the
 * point. asin(r/√(d² + (r−p)²)) − atan((r−p)/d), in the sense of ISO 612 and SAE J1100 (definitions from memory; the
 * formula is their geometry).
 * @param loadedRadius static loaded radius of the tyre, above 0
 * @param ahead how far the point is ahead of the axle centre
 * @param height of the point above the ground
 * @returns null when the point does not bound the approach: it is not ahead of the axle, or lies within the tyre
 */
export function approachAngle(
  loadedRadius: Millimetres,
  ahead: Millimetres,
  height: Millimetres,
): Degrees | null {
  if (!(loadedRadius > 0) || !(ahead > 0) || height < 0) return null;
  const over = Math.hypot(ahead, loadedRadius - height);
  if (over <= loadedRadius) return null;
  return toDegrees(Math.asin(loadedRadius / over) - Math.atan2(loadedRadius - height, ahead));
}

/** The smallest approach angle over all points, with the point that makes it; null when none bounds it. */
export function lowestApproach(
  loadedRadius: Millimetres,
  axleStation: Millimetres,
  points: readonly LowPoint[],
): { angle: Degrees; point: LowPoint } | null {
  let lowest: { angle: Degrees; point: LowPoint } | null = null;
  for (const point of points) {
    const angle = approachAngle(loadedRadius, (point.station - axleStation) as Millimetres, point.height);
    if (angle !== null && (lowest === null || angle < lowest.angle)) lowest = { angle, point };
  }
  return lowest;
}
