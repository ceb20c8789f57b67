import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";
import type { Millimetres } from "../units/length";

/**
 * The outer wheel's angle that goes with an inner one so that both roll about one point: cot φo − cot φi = c/b.
 * Source: correct steering, as in Khurmi & Gupta, Theory of Machines, ch. 9 (formula read in a copy).
 * @param pivots distance of the kingpins, c
 * @param wheelbase b
 * @param inner above 0° and below 90°; 0 gives 0
 * @throws RangeError outside that, or for distances that are none
 * @example outerAngle(degrees(28), mm(1500), mm(2600)) // 22.1411°
 */
export function outerAngle(inner: Degrees, pivots: Millimetres, wheelbase: Millimetres): Degrees {
  check(inner, pivots, wheelbase);
  if (inner === 0) return degrees(0);
  return toDegrees(Math.atan(1 / (1 / Math.tan(toRadians(inner)) + pivots / wheelbase)));
}

/**
 * The inner wheel's angle that goes with an outer one.
 * @throws RangeError as outerAngle, or when no inner wheel could follow
 * @example innerAngle(degrees(30), mm(1500), mm(2800)) // 39.8918°
 */
export function innerAngle(outer: Degrees, pivots: Millimetres, wheelbase: Millimetres): Degrees {
  check(outer, pivots, wheelbase);
  if (outer === 0) return degrees(0);
  const cot = 1 / Math.tan(toRadians(outer)) - pivots / wheelbase;
  return toDegrees(Math.atan2(1, cot));
}

/**
 * Angle of the sliding arms of a gear that steers correctly throughout: tan α = c/(2b).
 * Source: Davis's gear, Khurmi & Gupta, Theory of Machines, ch. 9 (from memory).
 * @example davisAngle(mm(1200), mm(2700)) // 12.5288°
 */
export const davisAngle = (pivots: Millimetres, wheelbase: Millimetres): Degrees =>
  toDegrees(Math.atan2(pivots, 2 * wheelbase));

function check(angle: Degrees, pivots: Millimetres, wheelbase: Millimetres): void {
  if (!(angle >= 0 && angle < 90)) throw new RangeError(`${angle}° is not a steering angle`);
  if (!(pivots > 0) || !(wheelbase > 0)) throw new RangeError("Pivots and wheels are apart");
}
