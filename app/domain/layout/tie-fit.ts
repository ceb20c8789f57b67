import { leastSquares } from "../geometry/least-squares";
import { distance, type FloorPoint, floorPoint } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees } from "../units/angle";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";

/** A tape from a control mark to a dropped point. */
export type Tie = { mark: string; at: FloorPoint; distance: Millimetres };

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

/** Where two tapes meet, on a side of the A–B line (+1 left, −1 right); null when they do not reach each other. */
export function twoTapes(first: Tie, second: Tie, side: 1 | -1): FloorPoint | null {
  const base = distance(first.at, second.at);
  if (base === 0) return null;
  const along = (first.distance ** 2 - second.distance ** 2 + base ** 2) / (2 * base);
  const square = first.distance ** 2 - along ** 2;
  if (square < 0) return null;
  const [ux, uy] = [(second.at.x - first.at.x) / base, (second.at.y - first.at.y) / base];
  const off = Math.sqrt(square);
  const foot = floorPoint(first.at.x + ux * along, first.at.y + uy * along);
  const points = [
    floorPoint(foot.x - uy * off, foot.y + ux * off),
    floorPoint(foot.x + uy * off, foot.y - ux * off),
  ] as const;
  return points[0].y * side >= points[1].y * side ? points[0] : points[1];
}

/** The meeting point of the pair of tapes that cross most squarely; null when no two reach each other. */
function start(ties: readonly Tie[], side: 1 | -1): FloorPoint | null {
  let best: { point: FloorPoint; crossing: number } | null = null;
  for (const [i, a] of ties.entries())
    for (const b of ties.slice(i + 1)) {
      const point = twoTapes(a, b, side);
      if (!point) continue;
      const [va, vb] = [
        floorPoint(point.x - a.at.x, point.y - a.at.y),
        floorPoint(point.x - b.at.x, point.y - b.at.y),
      ];
      const crossing =
        Math.abs(va.x * vb.y - va.y * vb.x) / Math.max(1e-9, Math.hypot(va.x, va.y) * Math.hypot(vb.x, vb.y));
      if (!best || crossing > best.crossing) best = { point, crossing };
    }
  return best?.point ?? null;
}

/**
 * The point that fits all tapes best, by Gauss–Newton on the distances, all tapes equally sure.
 * @param sigma standard uncertainty of one tape
 * @returns a problem when no two tapes reach each other, or the point cannot be told from them
 */
export function adjustTies(
  ties: readonly Tie[],
  side: 1 | -1,
  sigma: Millimetres,
  unit: LengthUnit = "in",
): Outcome<Adjusted> {
  let point = start(ties, side);
  if (!point) {
    const [a, b] = ties;
    if (!a || !b) return problem("Two tapes or more make a point.");
    const size = (value: Millimetres) => formatLength(value, unit);
    return problem(
      `The tapes from ${a.mark} and ${b.mark} do not reach each other: ${size(a.distance)} and ${size(b.distance)} between marks ${size(distance(a.at, b.at))} apart.`,
    );
  }
  for (let round = 0; round < ROUNDS; round++) {
    const here: FloorPoint = point;
    const fit = leastSquares(
      ties.map((tie) => {
        const d = Math.max(distance(here, tie.at), 1e-6);
        return [(here.x - tie.at.x) / d, (here.y - tie.at.y) / d];
      }),
      ties.map((tie) => tie.distance - distance(here, tie.at)),
    );
    if (!fit) return problem("The marks and the point lie in one line: tape from a mark beside it as well.");
    const [dx = 0, dy = 0] = fit.solution;
    point = floorPoint(here.x + dx, here.y + dy);
    if (Math.hypot(dx, dy) > 1e-7) continue;
    const q = fit.cofactor;
    const [qxx, qxy, qyy] = [q[0]?.[0] ?? 0, q[0]?.[1] ?? 0, q[1]?.[1] ?? 0];
    return ok({
      point,
      redundancy: fit.redundancy,
      covariance: { xx: qxx * sigma ** 2, xy: qxy * sigma ** 2, yy: qyy * sigma ** 2 },
      residuals: ties.map((tie) => {
        const d = Math.max(distance(here, tie.at), 1e-6);
        const [ax, ay] = [(here.x - tie.at.x) / d, (here.y - tie.at.y) / d];
        const r = Math.min(1, Math.max(0, 1 - (ax * ax * qxx + 2 * ax * ay * qxy + ay * ay * qyy)));
        const residual = tie.distance - distance(here, tie.at);
        return {
          mark: tie.mark,
          residual: mm(residual),
          redundancyNumber: r,
          standardised: fit.redundancy > 0 && r > 1e-6 ? residual / (sigma * Math.sqrt(r)) : null,
        };
      }),
    });
  }
  return problem("The tapes do not settle on a point: measure them again.");
}

/** Do any of the tapes disagree with the others beyond chance? */
export const isSuspect = (fit: Adjusted): boolean =>
  fit.residuals.some((r) => r.standardised !== null && Math.abs(r.standardised) > CRITICAL_W);

/** The k = 2 uncertainty ellipse of a covariance; the angle is that of the major half-axis, from A to B. */
export function ellipseOf({ xx, xy, yy }: Adjusted["covariance"], k = 2): Ellipse {
  const [mean, half] = [(xx + yy) / 2, Math.hypot((xx - yy) / 2, xy)];
  return {
    major: mm(k * Math.sqrt(mean + half)),
    minor: mm(k * Math.sqrt(Math.max(0, mean - half))),
    angle: degrees((0.5 * Math.atan2(2 * xy, xx - yy) * 180) / Math.PI),
  };
}
