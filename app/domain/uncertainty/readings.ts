/** What repeated readings of one thing come to. */
export type Repeated = {
  mean: number;
  /** Of one reading. */
  standardDeviation: number;
  /** Of the mean: the standard uncertainty. */
  ofMean: number;
  freedom: number;
};

/**
 * Mean and experimental standard deviation of repeated readings.
 * Source: JCGM 100:2008, 4.2 (from memory).
 * @returns null with fewer than two readings
 * @example repeated([5.007, 4.994, 5.005, 4.99, 4.999]) // mean 4.999, ofMean 0.003209
 */
export function repeated(readings: readonly number[]): Repeated | null {
  const n = readings.length;
  if (n < 2) return null;
  const mean = readings.reduce((sum, reading) => sum + reading, 0) / n;
  const standardDeviation = Math.sqrt(
    readings.reduce((sum, reading) => sum + (reading - mean) ** 2, 0) / (n - 1),
  );
  return { mean, standardDeviation, ofMean: standardDeviation / Math.sqrt(n), freedom: n - 1 };
}

/**
 * Correlation of readings that were taken together.
 * Source: JCGM 100:2008, 5.2.3 (from memory).
 * @returns −1 to 1; null when the lists differ in length, are too short, or one does not vary
 * @example correlation([1, 2, 3], [2, 4, 6]) // 1
 */
export function correlation(a: readonly number[], b: readonly number[]): number | null {
  const [ra, rb] = [repeated(a), repeated(b)];
  if (!ra || !rb || a.length !== b.length || ra.ofMean === 0 || rb.ofMean === 0) return null;
  const sum = a.reduce((so, value, i) => so + (value - ra.mean) * ((b[i] ?? 0) - rb.mean), 0);
  return sum / (ra.freedom * ra.standardDeviation * rb.standardDeviation);
}

/** How what is known of a limit is spread between −a and +a. */
export type Spread = "rectangular" | "triangular" | "arcsine";

/**
 * Standard uncertainty from a half-width: a/√3, a/√6 or a/√2.
 * Source: JCGM 100:2008, 4.3.7, 4.3.9 and H.1.3.4 (from memory).
 * @throws RangeError when the half-width is negative
 * @example fromHalfWidth(1 / 64, "rectangular") // 0.009021
 */
export function fromHalfWidth(halfWidth: number, spread: Spread): number {
  if (!(halfWidth >= 0)) throw new RangeError(`${halfWidth} is not a half-width`);
  return halfWidth / Math.sqrt({ rectangular: 3, triangular: 6, arcsine: 2 }[spread]);
}

/**
 * Standard uncertainty from an expanded one and the factor that it was made with, as a certificate states them.
 * Source: JCGM 100:2008, 4.3.3 and 4.3.4 (from memory).
 * @throws RangeError when the uncertainty is negative or the factor not above nothing
 * @example fromExpanded(240, 3) // 80
 */
export function fromExpanded(expanded: number, coverageFactor: number): number {
  if (!(expanded >= 0)) throw new RangeError(`${expanded} is not an uncertainty`);
  if (!(coverageFactor > 0)) throw new RangeError(`${coverageFactor} is not a coverage factor`);
  return expanded / coverageFactor;
}
