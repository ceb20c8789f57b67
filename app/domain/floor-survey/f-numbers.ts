import { type Outcome, ok, problem } from "../outcome";
import { inches, type Millimetres, mm, toInches } from "../units/length";

/** Heights along a line are taken every 12 in. Source: ASTM E1155. */
export const READING_SPACING = inches(12);
/** Readings that make ten feet. */
const TEN_FEET = 10;
/** FF = 4.57/(3·s + |mean|) of the curvatures in inches. ASTM E1155: the constant is from memory, not confirmed. */
export const FLATNESS_CONSTANT = 4.57;
/** FL = 12.5/(3·s + |mean|) of the differences over ten feet in inches. ASTM E1155: from memory, not confirmed. */
export const LEVELNESS_CONSTANT = 12.5;
/** A number that a floor without any curvature would not have: the formula has no answer then. */
const PERFECT = 1e-9;

/**
 * Curvature at each reading from the third on: q = h − 2h₋₁ + h₋₂. Source: ASTM E1155.
 * @param heights in a line, evenly spaced; empty with fewer than three
 * @example curvatures([mm(418.617), mm(419.938), mm(421.894)]) // [0.635]
 */
export const curvatures = (heights: readonly Millimetres[]): Millimetres[] =>
  heights.slice(2).map((h, i) => mm(h - 2 * (heights[i + 1] ?? 0) + (heights[i] ?? 0)));

/**
 * Difference in height to the reading ten feet before: z = h − h₋₁₀. Source: ASTM E1155.
 * @param heights in a line, every 12 in; empty with fewer than eleven
 * @example elevationDifferences(heights)[0] // the eleventh height minus the first
 */
export const elevationDifferences = (heights: readonly Millimetres[]): Millimetres[] =>
  heights.slice(TEN_FEET).map((h, i) => mm(h - (heights[i] ?? 0)));

export type FNumbers = {
  curvatures: Millimetres[];
  differences: Millimetres[];
  flatness: number;
  /** Null with fewer than twelve readings in a line: two differences over ten feet are needed. */
  levelness: number | null;
};

/**
 * FF and FL of a floor from heights along one line or several, every 12 in (300 mm): constants over three standard
 * deviations (n − 1) and the mean's size, in inches. Source: ASTM E1155; both constants from memory.
 * @param lines heights of each line in order
 * @returns a problem when no line has four readings, or the floor has no curvature at all
 * @example fNumbers([heights]).value.flatness // 28.84 for the fourteen heights of the published pad
 */
export function fNumbers(lines: readonly (readonly Millimetres[])[]): Outcome<FNumbers> {
  const q = lines.flatMap(curvatures);
  const z = lines.flatMap(elevationDifferences);
  if (q.length < 2) return problem("Four heights in a line at least, 12 in apart, make a flatness number.");
  const flatness = numberOf(q, FLATNESS_CONSTANT);
  if (flatness === null)
    return problem("These heights lie in a line without any curvature: read them again.");
  return ok({
    curvatures: q,
    differences: z,
    flatness,
    levelness: z.length < 2 ? null : numberOf(z, LEVELNESS_CONSTANT),
  });
}

function numberOf(values: readonly Millimetres[], constant: number): number | null {
  const { mean, deviation } = meanAndDeviation(values.map(toInches));
  const size = 3 * deviation + Math.abs(mean);
  return size < PERFECT ? null : constant / size;
}

/**
 * Mean and standard deviation (n − 1).
 * @param values two at least; the deviation of one is 0
 * @example meanAndDeviation([1, 2, 3]) // { mean: 2, deviation: 1 }
 */
export function meanAndDeviation(values: readonly number[]): { mean: number; deviation: number } {
  const mean = values.reduce((sum, value) => sum + value, 0) / Math.max(1, values.length);
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return { mean, deviation: Math.sqrt(squares / Math.max(1, values.length - 1)) };
}
