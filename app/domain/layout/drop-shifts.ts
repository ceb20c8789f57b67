import type { FloorPoint } from "../geometry/point";
import { type Degrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { type Adjusted, type Tie, tieSigma } from "./tie-fit";

/**
 * How far one standard uncertainty of one source moves a drop on the floor. Sources are independent of each other; the
 * same source in several drops moves them together (where a mark lies, how the frame stands).
 */
export type Shift = {
  source: string;
  /** What sources of a kind are called together: "the tapes from mark B". */
  group: string;
  x: Millimetres;
  y: Millimetres;
};

/** A drop with everything that makes it unsure. */
export type UncertainDrop = { name: string; point: FloorPoint; shifts: readonly Shift[] };

/** Standard uncertainty of letting a bob come to rest and marking under it: 1/64 in. Common practice, no source. */
export const BOB_SIGMA = mm(25.4 / 64);

/** The sum of two independent shifts along x and along y of one source. */
const both = (source: string, group: string, sigmaX: number, sigmaY: number): Shift[] => [
  { source: `${source} (along the line)`, group, x: mm(sigmaX), y: mm(0) },
  { source: `${source} (across it)`, group, x: mm(0), y: mm(sigmaY) },
];

/**
 * What the tapes and the marks contribute to a drop adjusted from ties: Q·a/σ for each tape, a the direction from mark
 * to drop, Q the covariance; a mark's own uncertainty likewise, in both directions, under one name for all drops.
 * Source: propagation through the adjustment, e.g. Ghilani, Adjustment Computations, ch. 13 (from memory).
 * @param name the drop, as in "the left opening's front edge"
 * @param sigma standard uncertainty of a tape that says nothing else
 * @example covarianceOf(tieShifts("drop", ties, fit, sigma)) // fit.covariance again
 */
export function tieShifts(name: string, ties: readonly Tie[], fit: Adjusted, sigma: Millimetres): Shift[] {
  const { xx, xy, yy } = fit.covariance;
  return ties.flatMap((tie) => {
    const [dx, dy] = [fit.point.x - tie.at.x, fit.point.y - tie.at.y];
    const length = Math.max(Math.hypot(dx, dy), 1e-6);
    const [ax, ay] = [dx / length, dy / length];
    const variance = tieSigma(tie, sigma) ** 2;
    /** Where the drop goes for each millimetre more on this tape. */
    const [gx, gy] = [(xx * ax + xy * ay) / variance, (xy * ax + yy * ay) / variance];
    const own = tie.sigma ?? sigma;
    const mark = tie.markSigma ?? 0;
    const tape: Shift = {
      source: `the tape from mark ${tie.mark} to ${name}`,
      group: `the tapes from mark ${tie.mark}`,
      x: mm(gx * own),
      y: mm(gy * own),
    };
    if (mark === 0) return [tape];
    const of = (way: string, a: number): Shift => ({
      source: `where mark ${tie.mark} lies (${way})`,
      group: `where mark ${tie.mark} lies`,
      x: mm(-gx * a * mark),
      y: mm(-gy * a * mark),
    });
    return [tape, of("along the line", ax), of("across it", ay)];
  });
}

/**
 * What the square and the tape contribute to a drop measured by station and offset.
 * @example offsetShifts("the left axle end", mm(1), mm(2)) // 1 along the line, 2 across it
 */
export const offsetShifts = (name: string, station: Millimetres, offset: Millimetres): Shift[] =>
  both(`the station and offset of ${name}`, "stations and offsets", station, offset);

/**
 * What the bob contributes: the same in every direction, anew for each drop.
 * @example bobShifts("the left axle end", mm(0.4)) // 0.4 along the line, 0.4 across it
 */
export const bobShifts = (name: string, sigma: Millimetres = BOB_SIGMA): Shift[] =>
  both(`the bob at ${name}`, "the bob", sigma, sigma);

/**
 * What the level left contributes: a point h above the datum moves h·sin θ, all drops together.
 * @param noseHigh and rightHigh standard uncertainty of the level in both directions
 * @example levelShifts(mm(1000), degrees(0.1), degrees(0)) // 1.7453 back along the line
 */
export function levelShifts(height: Millimetres, noseHigh: Degrees, rightHigh: Degrees): Shift[] {
  const move = (angle: Degrees) => height * Math.sin(toRadians(angle));
  return [
    { source: "the level, nose to tail", group: "the level", x: mm(-move(noseHigh)), y: mm(0) },
    { source: "the level, side to side", group: "the level", x: mm(0), y: mm(move(rightHigh)) },
  ];
}

/**
 * The covariance that independent shifts make together, in mm².
 * @example covarianceOf([{ source: "s", group: "g", x: mm(3), y: mm(4) }]) // { xx: 9, xy: 12, yy: 16 }
 */
export const covarianceOf = (shifts: readonly Shift[]): Adjusted["covariance"] =>
  shifts.reduce(({ xx, xy, yy }, { x, y }) => ({ xx: xx + x * x, xy: xy + x * y, yy: yy + y * y }), {
    xx: 0,
    xy: 0,
    yy: 0,
  });
