import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";
import type { FloorSurvey } from "./survey";

/** What a bay's floor may have to be called good, or usable with shims. A shop sets its own. */
export type BayLimits = {
  goodSlope: number;
  usableSlope: number;
  goodFlatness: Millimetres;
  usableFlatness: Millimetres;
};

/**
 * Slopes in mm/m, flatness from bump to hollow. Common practice, no source: 1 mm/m is 0.06°, less than a digital gauge
 * shows; 1/8 in from bump to hollow is lost in a few shims, more than 1/2 in wants more than shims.
 */
export const BAY_LIMITS: BayLimits = {
  goodSlope: 1,
  usableSlope: 10,
  goodFlatness: mm(25.4 / 8),
  usableFlatness: mm(25.4 / 2),
};

export type BayRating = { rating: "good" | "usable" | "unfit"; words: string };

/**
 * A bay's floor for layout, in words: good as it is, usable with shims, or unfit. Drops land on the floor itself, so
 * a slope of the floor lengthens distances along it by 1/cos only; what decides is standing the frame level and bumps
 * under the tape.
 * @example rateBay(survey).words // "Good for layout: 0.4 mm/m and 1/16 in from bump to hollow."
 */
export function rateBay(
  survey: Pick<FloorSurvey, "steepest" | "flatness">,
  limits: BayLimits = BAY_LIMITS,
  unit: LengthUnit = "in",
): BayRating {
  const within = (slope: number, flatness: number) =>
    survey.steepest <= slope + 1e-9 && survey.flatness <= flatness + 1e-9;
  const figures = `${survey.steepest.toFixed(1)} mm/m and ${formatLength(survey.flatness, unit)} from bump to hollow`;
  if (within(limits.goodSlope, limits.goodFlatness))
    return { rating: "good", words: `Good for layout: ${figures}.` };
  if (within(limits.usableSlope, limits.usableFlatness))
    return { rating: "usable", words: `Usable with shims under the stands: ${figures}.` };
  const steep = survey.steepest > limits.usableSlope;
  const rough = survey.flatness > limits.usableFlatness;
  const why = steep && rough ? "too steep and too uneven" : steep ? "too steep" : "too uneven";
  return { rating: "unfit", words: `Not fit for layout, ${why}: ${figures}.` };
}
