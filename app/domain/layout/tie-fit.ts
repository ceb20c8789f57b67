import { type Fit, leastSquares } from "../geometry/least-squares";
import { distance, type FloorPoint, floorPoint } from "../geometry/point";
import { standardisedResidual } from "../geometry/snooping";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees } from "../units/angle";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";

/** A tape from a control mark to a dropped point. */
export type Tie = {
  mark: string;
  at: FloorPoint;
  distance: Millimetres;
  /** Standard uncertainty of this tape alone, where it differs from the others': the mean of several readings, say. */
  sigma?: Millimetres;
  /** Standard uncertainty of where the mark itself lies, in each direction; none unless told. */
  markSigma?: Millimetres;
};

/**
 * Standard uncertainty of a tie: the tape's and the mark's own together, √(σ² + σ_mark²). A mark serves one tie of a
 * point, so only its part along the tape matters.
 * @param sigma what a tape has that says nothing else
 * @example tieSigma({ mark: "A", at, distance, markSigma: mm(3) }, mm(4)) // 5
 */
export const tieSigma = (tie: Tie, sigma: Millimetres): Millimetres =>
  mm(Math.hypot(tie.sigma ?? sigma, tie.markSigma ?? 0));

/** A standardized residual above this is not chance: 0.1 % two-sided of the normal law. Source: Baarda's data snooping, 1968 (from memory). */
export const CRITICAL_W = 3.29;

export type TieResidual = {
  mark: string;
  /** Taped minus what the point says. */
  residual: Millimetres;
  /** Over its own standard deviation; null when nothing checks the point. */
  standardised: number | null;
  /** How much the others check this tape: 0 not at all, 1 wholly. */
  redundancyNumber: number;
  /** What this tape alone would have to read so that the others agree with it; null with two tapes. */
  wouldFit: Millimetres | null;
};

export type Ellipse = { major: Millimetres; minor: Millimetres; angle: Degrees };

export type Adjusted = {
  point: FloorPoint;
  redundancy: number;
  residuals: Omit<TieResidual, "wouldFit">[];
  covariance: { xx: number; xy: number; yy: number };
};

/** How much the start may be moved on before the adjustment counts as failed. */
const ROUNDS = 60;

/**
 * Both places where two tapes meet; none when they do not reach each other, or the marks lie on each other.
 * @example meetings(a, b) // (432, 576) and (432, −576) for 720 and 960 from marks 1200 mm apart on the line
 */
export function meetings(first: Tie, second: Tie): readonly FloorPoint[] {
  const base = distance(first.at, second.at);
  if (base === 0) return [];
  const along = (first.distance ** 2 - second.distance ** 2 + base ** 2) / (2 * base);
  const square = first.distance ** 2 - along ** 2;
  if (square < 0) return [];
  const [ux, uy] = [(second.at.x - first.at.x) / base, (second.at.y - first.at.y) / base];
  const off = Math.sqrt(square);
  const foot = floorPoint(first.at.x + ux * along, first.at.y + uy * along);
  return [floorPoint(foot.x - uy * off, foot.y + ux * off), floorPoint(foot.x + uy * off, foot.y - ux * off)];
}

/**
 * How squarely two tapes cross at a point: 1 square, 0 along each other.
 * @example crossing(a, b, point) // 1 where marks 1200 mm apart are taped 720 and 960
 */
export function crossing(a: Tie, b: Tie, point: FloorPoint): number {
  const va = floorPoint(point.x - a.at.x, point.y - a.at.y);
  const vb = floorPoint(point.x - b.at.x, point.y - b.at.y);
  return (
    Math.abs(va.x * vb.y - va.y * vb.x) / Math.max(1e-9, Math.hypot(va.x, va.y) * Math.hypot(vb.x, vb.y))
  );
}

/** Meetings nearer to the A–B line than this count for either side: the drop may lie on it. */
const ON_LINE = 1e-6;

type Beginning = { point: FloorPoint; onSide: boolean; misfit: number; crossing: number };

/**
 * Where to start: the meeting of two tapes, on the named side, that the others agree with best (by the sum of their
 * misfits, so that one blunder does not decide); of those that agree alike, where the tapes cross most squarely.
 */
function start(ties: readonly Tie[], side: 1 | -1): FloorPoint | null {
  let best = null as Beginning | null;
  for (const [i, a] of ties.entries())
    for (const b of ties.slice(i + 1))
      for (const point of meetings(a, b)) {
        const one: Beginning = {
          point,
          onSide: point.y * side >= -ON_LINE,
          misfit: ties.reduce((sum, tie) => sum + Math.abs(tie.distance - distance(point, tie.at)), 0),
          crossing: crossing(a, b, point),
        };
        if (!best || isBetter(one, best, side)) best = one;
      }
  return best?.point ?? null;
}

function isBetter(one: Beginning, best: Beginning, side: 1 | -1): boolean {
  if (one.onSide !== best.onSide) return one.onSide;
  if (Math.abs(one.misfit - best.misfit) > ON_LINE) return one.misfit < best.misfit;
  if (Math.abs(one.crossing - best.crossing) > ON_LINE) return one.crossing > best.crossing;
  return one.point.y * side > best.point.y * side;
}

/** Why no two tapes meet, in words. */
function apartWords(ties: readonly Tie[], unit: LengthUnit): string {
  const [a, b] = ties;
  if (!a || !b) return "Two tapes or more make a point.";
  const size = (value: Millimetres) => formatLength(value, unit);
  const base = distance(a.at, b.at);
  if (base === 0) return `Marks ${a.mark} and ${b.mark} lie on each other: they make no point.`;
  const figures = `${size(a.distance)} and ${size(b.distance)} between marks ${size(base)} apart`;
  return Math.abs(a.distance - b.distance) > base
    ? `The tapes from ${a.mark} and ${b.mark} differ by more than the marks are apart, so they do not meet: ${figures}.`
    : `The tapes from ${a.mark} and ${b.mark} do not reach each other: ${figures}.`;
}

/**
 * The point that fits all tapes best, by Gauss–Newton on the distances, each weighted by its own uncertainty.
 * @param sigma standard uncertainty of a tape that says nothing else
 * @returns a problem when no two tapes reach each other, or the point cannot be told from them
 * @example adjustTies(ties, 1, mm(0.01)).value.point // (170.7029, 170.7234) for the three ties of the published check
 */
export function adjustTies(
  ties: readonly Tie[],
  side: 1 | -1,
  sigma: Millimetres,
  unit: LengthUnit = "in",
): Outcome<Adjusted> {
  let point = start(ties, side);
  if (!point) return problem(apartWords(ties, unit));
  for (let round = 0; round < ROUNDS; round++) {
    const here: FloorPoint = point;
    const fit = leastSquares(
      ties.map((tie) => rowAt(tie, here, sigma)),
      ties.map((tie) => (tie.distance - distance(here, tie.at)) / tieSigma(tie, sigma)),
    );
    if (!fit) return problem("The marks and the point lie in one line: tape from a mark beside it as well.");
    const [dx = 0, dy = 0] = fit.solution;
    point = floorPoint(here.x + dx, here.y + dy);
    if (Math.hypot(dx, dy) <= 1e-7) return ok(adjustedAt(point, ties, fit, sigma));
  }
  return problem("The tapes do not settle on a point: measure them again.");
}

/** The direction of a tape at a point, over its uncertainty. */
function rowAt(tie: Tie, here: FloorPoint, sigma: Millimetres): [number, number] {
  const d = Math.max(distance(here, tie.at), 1e-6) * tieSigma(tie, sigma);
  return [(here.x - tie.at.x) / d, (here.y - tie.at.y) / d];
}

function adjustedAt(point: FloorPoint, ties: readonly Tie[], fit: Fit, sigma: Millimetres): Adjusted {
  const q = fit.cofactor;
  const [xx, xy, yy] = [q[0]?.[0] ?? 0, q[0]?.[1] ?? 0, q[1]?.[1] ?? 0];
  return {
    point,
    redundancy: fit.redundancy,
    covariance: { xx, xy, yy },
    residuals: ties.map((tie) => {
      const [ax, ay] = rowAt(tie, point, sigma);
      const r = Math.min(1, Math.max(0, 1 - (ax * ax * xx + 2 * ax * ay * xy + ay * ay * yy)));
      const residual = tie.distance - distance(point, tie.at);
      return {
        mark: tie.mark,
        residual: mm(residual),
        redundancyNumber: r,
        standardised: fit.redundancy > 0 ? standardisedResidual(residual, r, tieSigma(tie, sigma)) : null,
      };
    }),
  };
}

/**
 * Do any of the tapes disagree with the others beyond chance?
 * @example isSuspect(fit) // true where an inch was burnt on one of three tapes
 */
export const isSuspect = (fit: Adjusted): boolean =>
  fit.residuals.some((r) => r.standardised !== null && Math.abs(r.standardised) > CRITICAL_W);

/**
 * Does the point lie on the side that was named, as far as its own uncertainty can tell?
 * @example isOnSide(fit, 1) // false when the tapes meet to the right beyond chance
 */
export const isOnSide = (fit: Adjusted, side: 1 | -1): boolean =>
  fit.point.y * side >= -CRITICAL_W * Math.sqrt(fit.covariance.yy);

/**
 * Share of drops that fall within k times the standard ellipse: 1 − exp(−k²/2), of the plane normal law.
 * Source: any text on adjustment, e.g. Ghilani, Adjustment Computations, ch. 19 (from memory).
 * @example ellipseCoverage(2) // 0.8647
 */
export const ellipseCoverage = (k: number): number => 1 - Math.exp((-k * k) / 2);

/**
 * How many times the standard ellipse holds a share of the drops: √(−2 ln(1 − p)). Source: as ellipseCoverage.
 * @throws RangeError unless 0 < p < 1
 * @example ellipseFactor(0.95) // 2.4477
 */
export function ellipseFactor(coverage: number): number {
  if (!(coverage > 0 && coverage < 1)) throw new RangeError(`${coverage} is no share between 0 and 1`);
  return Math.sqrt(-2 * Math.log(1 - coverage));
}

/**
 * The uncertainty ellipse of a covariance, k = 2 unless told; the angle is that of the major half-axis, from A to B.
 * @example ellipseOf({ xx: 4, xy: 0, yy: 1 }) // major 4, minor 2, angle 0
 */
export function ellipseOf({ xx, xy, yy }: Adjusted["covariance"], k = 2): Ellipse {
  const [mean, half] = [(xx + yy) / 2, Math.hypot((xx - yy) / 2, xy)];
  return {
    major: mm(k * Math.sqrt(mean + half)),
    minor: mm(k * Math.sqrt(Math.max(0, mean - half))),
    angle: degrees((0.5 * Math.atan2(2 * xy, xx - yy) * 180) / Math.PI),
  };
}
