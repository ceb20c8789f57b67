import { type Outcome, ok } from "../outcome";
import { byDifferences, type Correlation, combine, type Propagation, type Uncertain } from "./propagate";

/** Several results of the same inputs. */
export type Several = {
  results: Uncertain[];
  covariance: number[][];
  /** −1 to 1; null where one of the two is sure. */
  correlation: (number | null)[][];
};

/**
 * The uncertainty of several results of the same inputs, and how they go together.
 * Source: JCGM 100:2008, H.2.3 (from memory); JCGM 102:2011, 6.2 (from memory).
 * @param of the results from the values in the order of the inputs, always as many
 * @returns a problem as propagate
 * @example propagateSeveral(([a = 0, b = 0]) => [a + b, a - b], { inputs }).value.correlation // [[1, 0], [0, 1]] for u equal
 */
export function propagateSeveral(
  of: (values: readonly number[]) => readonly number[],
  setting: Propagation,
): Outcome<Several> {
  const { results: values, sensitivities } = byDifferences(of, setting.inputs);
  const results: Uncertain[] = [];
  for (const [k, value] of values.entries()) {
    const came = combine(value, sensitivities[k] ?? [], setting);
    if (!came.ok) return came;
    results.push(came.value);
  }
  const pairs = results.map((a) => results.map((b) => covarianceOf(a, b, setting.correlations)));
  return ok({
    results,
    covariance: pairs.map((row) => row.map((pair) => pair.covariance)),
    correlation: pairs.map((row) => row.map((pair) => pair.correlation)),
  });
}

/**
 * Covariance of two results of the same inputs, from their contributions.
 * Source: JCGM 100:2008, H.2.3 (from memory).
 * @param correlations those of the inputs, as given to both results
 * @returns the correlation of the results as well; null when one of them is sure
 * @example covarianceOf(sum, difference).correlation // 0 where both inputs are equally unsure
 */
export function covarianceOf(
  a: Uncertain,
  b: Uncertain,
  correlations: readonly Correlation[] = [],
): { covariance: number; correlation: number | null } {
  const moved = (of: Uncertain, name: string) =>
    of.contributions.find((one) => one.name === name)?.moves ?? 0;
  let covariance = a.contributions.reduce((sum, one) => sum + one.moves * moved(b, one.name), 0);
  for (const { a: p, b: q, r } of correlations)
    covariance += r * (moved(a, p) * moved(b, q) + moved(a, q) * moved(b, p));
  const scale = a.uncertainty * b.uncertainty;
  return {
    covariance,
    correlation: scale > 0 ? Math.max(-1, Math.min(1, covariance / scale)) : null,
  };
}
