import { type Outcome, ok } from "../outcome";
import {
  type AdjustedDistance,
  type AdjustedNetwork,
  adjustDistances,
  type DistanceNetwork,
} from "./lateration";
import { criticalResidual } from "./snooping";

export type BlunderSearch = {
  /** The adjustment of what is left. */
  adjusted: AdjustedNetwork;
  /** Distances left out, in that order, as they stood when they were the worst. */
  leftOut: AdjustedDistance[];
  /** Distances still disagree beyond chance, and nothing tells which: measure again. */
  unresolved: boolean;
};

/** Two standardized residuals nearer to each other than this share are the same: the blunder is not located. */
const ALIKE = 1e-3;

/**
 * Data snooping: leaves out the distance whose standardized residual is the largest, as long as it is above the
 * critical value, and adjusts again. Stops where the worst two are alike, as they are with one spare distance: a
 * blunder is seen then, and not located. Nothing is changed; it only says. Source: Baarda 1968 (from memory).
 * @param critical critical standardized residual, 3.2905 unless told
 * @returns a problem as adjustDistances
 * @example searchBlunders(network) // { leftOut: [], unresolved: false, … } when all agree
 */
export function searchBlunders(
  network: DistanceNetwork,
  critical: number = criticalResidual(),
): Outcome<BlunderSearch> {
  const leftOut: AdjustedDistance[] = [];
  let rest = network;
  for (;;) {
    const fit = adjustDistances(rest);
    if (!fit.ok) return fit;
    const [worst, second] = fit.value.distances
      .filter((one) => one.standardised !== null)
      .sort((a, b) => Math.abs(b.standardised ?? 0) - Math.abs(a.standardised ?? 0));
    const size = Math.abs(worst?.standardised ?? 0);
    if (!worst || size <= critical) return ok({ adjusted: fit.value, leftOut, unresolved: false });
    const alike = second && size - Math.abs(second.standardised ?? 0) < ALIKE * size;
    if (alike || fit.value.redundancy < 2) return ok({ adjusted: fit.value, leftOut, unresolved: true });
    leftOut.push(worst);
    const at = fit.value.distances.indexOf(worst);
    rest = { ...rest, distances: rest.distances.filter((_, i) => i !== at) };
  }
}
