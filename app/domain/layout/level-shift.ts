import { type FloorPoint, floorPoint } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";
import { allowedSlope } from "./level";

export type Slopes = { noseHigh: Degrees; rightHigh: Degrees };

/**
 * How far a point lands out when it is dropped from a frame that is not level, forward and to the left, against a point
 * on the datum plane below it: −h·a/√(1 + a² + b²) and −h·b/√(1 + a² + b²) with a = tan(nose high), b = −tan(right
 * high). A high nose lands it back, a high right side to the left. With one slope alone it is h·sin θ.
 * Source: the plane's normal; plain trigonometry.
 * @param height of the point over the datum plane; negative below it
 * @example shiftBySlope(inches(30), { noseHigh: degrees(1), rightHigh: degrees(0) }) // 0.524 in back
 */
export function shiftBySlope(height: Millimetres, { noseHigh, rightHigh }: Slopes): FloorPoint {
  const [a, b] = [Math.tan(toRadians(noseHigh)), -Math.tan(toRadians(rightHigh))];
  const length = Math.sqrt(1 + a * a + b * b);
  return floorPoint((-height * a) / length + 0, (-height * b) / length + 0);
}

/**
 * The slope of a frame in its steepest direction: atan √(tan² pitch + tan² roll).
 * @example steepestSlope({ noseHigh: degrees(0.3), rightHigh: degrees(0.4) }) // 0.5
 */
export const steepestSlope = ({ noseHigh, rightHigh }: Slopes): Degrees =>
  toDegrees(Math.atan(Math.hypot(Math.tan(toRadians(noseHigh)), Math.tan(toRadians(rightHigh)))));

export type SlopeTolerance = {
  allowed: Degrees;
  /** The point that decides: the one furthest from the datum plane. */
  point: string;
  words: string;
};

/**
 * The slope allowed, from the error allowed at the dropped point furthest from the datum plane: asin(e/h).
 * @returns a problem when there is no point off the datum plane, or the error is not above zero and below that height
 * @example slopeTolerance([{ id: "lip", height: inches(30) }], inches(1 / 16)) // 0.1194°
 */
export function slopeTolerance(
  points: readonly { id: string; height: Millimetres }[],
  error: Millimetres,
  unit: LengthUnit = "in",
): Outcome<SlopeTolerance> {
  const size = (height: Millimetres) => Math.abs(height);
  const furthest = points.reduce<{ id: string; height: Millimetres } | null>(
    (best, point) => (best === null || size(point.height) > size(best.height) ? point : best),
    null,
  );
  if (!furthest || furthest.height === 0)
    return problem("No point is off the datum plane: any slope will do, and none can be worked out.");
  const height = mm(size(furthest.height));
  if (!(error > 0)) return problem("The error allowed has to be above zero.");
  if (error >= height)
    return problem(
      `An error of ${formatLength(error, unit)} is as much as the point is high: no slope would matter.`,
    );
  const allowed = allowedSlope(error, height);
  return ok({
    allowed,
    point: furthest.id,
    words: `${formatLength(error, unit)} at ${furthest.id}, ${formatLength(height, unit)} from the datum, allows ${degrees(allowed).toFixed(3)}°.`,
  });
}
