/** Chance of calling a good distance bad, both sides together. Source: Baarda, A testing procedure for use in geodetic networks, 1968 (from memory). */
export const SIGNIFICANCE = 0.001;
/** Chance of seeing a blunder of the minimal detectable size. Source: as above (from memory). */
export const POWER = 0.8;
/** Redundancy numbers below this mean that nothing checks the distance. */
const UNCHECKED = 1e-6;

/** Terms of the series; it has settled long before. */
const TERMS = 400;
/** Beyond this the law is 0 or 1 to the last place of a double. */
const FURTHEST = 8.3;

/**
 * How much of the standard normal law lies below x: Φ(x) = ½ + φ(x)·(x + x³/3 + x⁵/15 + …).
 * Source: Marsaglia, Evaluating the normal distribution, J. Stat. Software 11(4), 2004 (from memory).
 * @returns 0 to 1; 0 and 1 far out
 * @example normalDistribution(1.959964) // 0.975
 */
export function normalDistribution(x: number): number {
  if (x > FURTHEST) return 1;
  if (x < -FURTHEST) return 0;
  let term = x;
  let sum = x;
  for (let k = 1; k < TERMS && Math.abs(term) > 1e-18; k++) {
    term *= (x * x) / (2 * k + 1);
    sum += term;
  }
  return 0.5 + (sum * Math.exp((-x * x) / 2)) / Math.sqrt(2 * Math.PI);
}

/**
 * The value below which a share p of the standard normal law lies, by halving the interval on normalDistribution.
 * @throws RangeError unless 0 < p < 1
 * @example normalQuantile(0.8) // 0.841621
 */
export function normalQuantile(p: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`${p} is no share between 0 and 1`);
  if (p > 0.5) return -normalQuantile(1 - p);
  let [low, high] = [-FURTHEST, 0];
  while (high - low > 1e-13) {
    const middle = (low + high) / 2;
    if (normalDistribution(middle) < p) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * The standardized residual above which chance is no longer believed, two-sided.
 * @param significance chance of calling a good distance bad
 * @throws RangeError unless 0 < significance < 1
 * @example criticalResidual(0.001) // 3.2905
 */
export const criticalResidual = (significance: number = SIGNIFICANCE): number =>
  -normalQuantile(significance / 2);

/**
 * The non-centrality δ₀ of a blunder that is seen with the given power: critical value plus the power's quantile.
 * The other tail is left out, as is usual: it matters below the sixth place. Source: Baarda 1968 (from memory).
 * @example nonCentrality(0.001, 0.8) // 4.1321
 */
export const nonCentrality = (significance: number = SIGNIFICANCE, power: number = POWER): number =>
  criticalResidual(significance) + normalQuantile(power);

/**
 * The smallest blunder in one distance that the others would show: δ₀·σ/√r. Source: Baarda 1968 (from memory).
 * @param sigma standard uncertainty of the distance, any unit; the answer is in the same
 * @param redundancyNumber 0 nothing checks it, 1 the others check it wholly
 * @returns null when nothing checks the distance
 * @example minimalDetectableBias(1, 0.25) // 8.2642
 */
export const minimalDetectableBias = (
  sigma: number,
  redundancyNumber: number,
  delta: number = nonCentrality(),
): number | null => (redundancyNumber > UNCHECKED ? (delta * sigma) / Math.sqrt(redundancyNumber) : null);

/**
 * A residual over its own standard deviation: v/(σ·√r).
 * @returns null when nothing checks the distance
 * @example standardisedResidual(0.5, 0.25, 1) // 1
 */
export const standardisedResidual = (
  residual: number,
  redundancyNumber: number,
  sigma: number,
): number | null => (redundancyNumber > UNCHECKED ? residual / (sigma * Math.sqrt(redundancyNumber)) : null);
