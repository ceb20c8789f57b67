import { leastSquares } from "../geometry/least-squares";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees } from "../units/angle";
import type { Millimetres } from "../units/length";
import { levelFromHeights, type StandHeight } from "./level";

/** Standard uncertainty of one height by water level: 1/32 in. Common practice, no source. */
export const HEIGHT_SIGMA = 25.4 / 32;

export type LevelUncertainty = {
  /** Standard uncertainty of nose high and of right high. */
  noseHigh: Degrees;
  rightHigh: Degrees;
  /** How the two go together, −1 to 1; 0 when the stands make a rectangle. */
  correlation: number;
  /** Heights more than the three that make a plane. */
  redundancy: number;
  /** √(Σv²/redundancy) of the residuals: twist and misreading together; null with three stands. */
  residualDeviation: Millimetres | null;
  words: string;
};

/**
 * How sure a level from heights is: the slopes' covariance σ²·(AᵀA)⁻¹ of the plane fit, carried to angles with
 * dθ = da/(1 + a²). Source: any text on adjustment, e.g. Ghilani, Adjustment Computations, ch. 13 (from memory).
 * @param sigma standard uncertainty of one height
 * @returns a problem as levelFromHeights
 * @example levelUncertainty(stands, mm(0.8)) // stands 2000 by 800 mm: nose high ±0.0229°, right high ±0.0573°
 */
export function levelUncertainty(
  stands: readonly StandHeight[],
  sigma: Millimetres,
): Outcome<LevelUncertainty> {
  if (!(sigma > 0)) throw new RangeError(`${sigma} is not an uncertainty`);
  const level = levelFromHeights(stands);
  if (!level.ok) return level;
  const fit = leastSquares(
    stands.map((stand) => [1, stand.x, stand.y]),
    stands.map((stand) => stand.height),
  );
  if (!fit) return problem("The stands are in one line: a height beside it is needed.");
  const [, a = 0, b = 0] = fit.solution;
  const q = fit.cofactor;
  const [qaa, qab, qbb] = [q[1]?.[1] ?? 0, q[1]?.[2] ?? 0, q[2]?.[2] ?? 0];
  const squares = fit.residuals.reduce((sum, v) => sum + v * v, 0);
  return ok({
    noseHigh: toDegrees((sigma * Math.sqrt(qaa)) / (1 + a * a)),
    rightHigh: toDegrees((sigma * Math.sqrt(qbb)) / (1 + b * b)),
    // Right high falls with the slope to the left: the sign turns.
    correlation: -qab / Math.sqrt(qaa * qbb) + 0,
    redundancy: fit.redundancy,
    residualDeviation: fit.redundancy > 0 ? (Math.sqrt(squares / fit.redundancy) as Millimetres) : null,
    words: redundancyWords(fit.redundancy),
  });
}

function redundancyWords(redundancy: number): string {
  if (redundancy === 0)
    return "Three heights always fit a plane: nothing checks them, and twist does not show. A fourth would.";
  return redundancy === 1
    ? "One height more than a plane needs: a wrong one or twist shows, but not which stand."
    : `${redundancy} heights more than a plane needs check the others.`;
}
