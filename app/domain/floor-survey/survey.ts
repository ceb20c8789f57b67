import { leastSquares } from "../geometry/least-squares";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A height of the bay's floor over any level plane, by laser or water level. x along A–B, y to the left. */
export type FloorHeight = { x: Millimetres; y: Millimetres; height: Millimetres };

export type FloorDeviation = FloorHeight & {
  /** Over the best plane; negative: under it. */
  deviation: Millimetres;
};

export type FloorSurvey = {
  /** The plane: its height at A, and its rise in mm per metre along A–B and to the left. */
  heightAtA: Millimetres;
  riseAlong: number;
  riseAcross: number;
  /** In the steepest direction: mm per metre, and as an angle. */
  steepest: number;
  slope: Degrees;
  /** Which way the floor rises, positive to the left of A–B; null when it is level. */
  rises: Degrees | null;
  deviations: FloorDeviation[];
  /** The highest bump and the deepest hollow over the plane. */
  bump: FloorDeviation;
  hollow: FloorDeviation;
  /** Bump to hollow: the floor's flatness. */
  flatness: Millimetres;
  /** √(Σv²/(n − 3)); null with three heights, which always fit. */
  deviation: Millimetres | null;
  words: string;
};

/** Heights of a survey at most: a larger grid is a slip. */
export const MOST_HEIGHTS = 2000;
/** Slopes below this (mm/m) are level: they round to 0.0. */
const SPOKEN = 0.05;

/** Deviations nearer to each other than this are one: of several such points the first counts. */
const SAME_MM = 1e-6;

/**
 * The plane z = c + a·x + b·y that fits a floor best, its slope and what lies over and under it.
 * Source: a regression plane, any text on adjustment; 1 mm/m is 0.0573°.
 * @returns a problem with fewer than three heights, more than 2000, or all in one line
 * @example surveyFloor(heights).value.words // "The floor rises 2.0 mm/m ahead and to the left."
 */
export function surveyFloor(heights: readonly FloorHeight[]): Outcome<FloorSurvey> {
  if (heights.length < 3) return problem("Three heights at least make a plane; more show bumps and hollows.");
  if (heights.length > MOST_HEIGHTS) return problem(`At most ${MOST_HEIGHTS} heights make a survey.`);
  const fit = leastSquares(
    heights.map(({ x, y }) => [1, x, y]),
    heights.map(({ height }) => height),
  );
  if (!fit) return problem("The heights are in one line: a height beside it is needed.");
  const [c = 0, a = 0, b = 0] = fit.solution;
  const deviations = heights.map((one, i) => ({ ...one, deviation: mm(fit.residuals[i] ?? 0) }));
  const bump = deviations.reduce((best, one) => (one.deviation > best.deviation + SAME_MM ? one : best));
  const hollow = deviations.reduce((best, one) => (one.deviation < best.deviation - SAME_MM ? one : best));
  const steepest = Math.hypot(a, b) * 1000;
  const rises = steepest < SPOKEN ? null : toDegrees(Math.atan2(b, a));
  const squares = fit.residuals.reduce((sum, v) => sum + v * v, 0);
  return ok({
    heightAtA: mm(c),
    riseAlong: a * 1000,
    riseAcross: b * 1000,
    steepest,
    slope: toDegrees(Math.atan(Math.hypot(a, b))),
    rises,
    deviations,
    bump,
    hollow,
    flatness: mm(bump.deviation - hollow.deviation),
    deviation: fit.redundancy > 0 ? mm(Math.sqrt(squares / fit.redundancy)) : null,
    words:
      rises === null
        ? "The floor is level as a whole."
        : `The floor rises ${steepest.toFixed(1)} mm/m ${directionWords(rises)}.`,
  });
}

const WAYS = [
  "ahead",
  "ahead and to the left",
  "to the left",
  "back and to the left",
  "back",
  "back and to the right",
  "to the right",
  "ahead and to the right",
];

/**
 * A direction in words, to the nearest of eight; ahead is from A to B.
 * @example directionWords(degrees(45)) // "ahead and to the left"
 */
export const directionWords = (angle: Degrees): string =>
  WAYS[((Math.round(angle / 45) % 8) + 8) % 8] ?? "ahead";

/**
 * Millimetres a metre as an angle: atan(n/1000).
 * @example perMetre(1) // 0.0572958
 */
export const perMetre = (millimetres: number): Degrees => toDegrees(Math.atan(millimetres / 1000));
