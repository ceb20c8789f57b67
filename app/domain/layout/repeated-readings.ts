import { criticalResidual } from "../geometry/snooping";
import { type Outcome, ok, problem } from "../outcome";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";

export type RepeatedReadings = {
  mean: Millimetres;
  count: number;
  /** Largest minus smallest. */
  spread: Millimetres;
  /** Standard deviation of one reading, n − 1; null with one. */
  deviation: Millimetres | null;
  /** Standard uncertainty of the mean: the larger of the tape's own and what the readings show, over √n. */
  meanSigma: Millimetres;
  /** They agree within chance. */
  agree: boolean;
  /** The reading that stands out against the others, counted from 0; null when none does or nothing tells which. */
  standsOut: { index: number; reading: Millimetres; away: Millimetres } | null;
  words: string;
};

/** Two readings disagree without saying which is wrong. */
const TELLS_WHICH = 3;

/**
 * One length read several times: mean, spread, and a reading that stands out: away from the mean of the others by more
 * than the critical value (3.29) times σ√(1 + 1/(n − 1)). Nothing is left out by itself: the mean is over all.
 * Source: the standardized residual of a mean, e.g. Ghilani, Adjustment Computations (from memory).
 * @param sigma standard uncertainty of one reading
 * @returns a problem when there is no reading
 * @example repeatedReadings([mm(1000), mm(1001), mm(1026)], mm(0.8)) // the third stands out by 25.5
 */
export function repeatedReadings(
  readings: readonly Millimetres[],
  sigma: Millimetres,
  unit: LengthUnit = "in",
): Outcome<RepeatedReadings> {
  if (!(sigma > 0)) throw new RangeError(`${sigma} is not an uncertainty`);
  const count = readings.length;
  if (count === 0) return problem("There is no reading yet.");
  const sum = readings.reduce((total, reading) => total + reading, 0);
  const mean = sum / count;
  const deviation =
    count > 1 ? Math.sqrt(readings.reduce((total, r) => total + (r - mean) ** 2, 0) / (count - 1)) : null;
  const away = readings.map((reading) => reading - (count > 1 ? (sum - reading) / (count - 1) : reading));
  const limit = criticalResidual() * sigma * Math.sqrt(1 + 1 / Math.max(1, count - 1));
  const worst = away.reduce((best, one, i) => (Math.abs(one) > Math.abs(away[best] ?? 0) ? i : best), 0);
  const agree = Math.abs(away[worst] ?? 0) <= limit;
  const standsOut =
    agree || count < TELLS_WHICH
      ? null
      : { index: worst, reading: mm(readings[worst] ?? 0), away: mm(away[worst] ?? 0) };
  const spread = mm(Math.max(...readings) - Math.min(...readings));
  return ok({
    mean: mm(mean),
    count,
    spread,
    deviation: deviation === null ? null : mm(deviation),
    meanSigma: mm(Math.max(sigma, deviation ?? 0) / Math.sqrt(count)),
    agree,
    standsOut,
    words: wordsFor(count, spread, agree, standsOut, unit),
  });
}

function wordsFor(
  count: number,
  spread: Millimetres,
  agree: boolean,
  standsOut: RepeatedReadings["standsOut"],
  unit: LengthUnit,
): string {
  const size = (value: number) => formatLength(mm(Math.abs(value)), unit, { denominator: 32 });
  if (count === 1) return "Read once.";
  if (agree) return `Read ${count} times, all within ${size(spread)}.`;
  if (!standsOut) return `The two readings differ by ${size(spread)}: read it a third time.`;
  const place = `${size(standsOut.away)} ${standsOut.away > 0 ? "more" : "less"} than the others`;
  return `Reading ${standsOut.index + 1} (${size(standsOut.reading)}) is ${place}: read it again.`;
}
