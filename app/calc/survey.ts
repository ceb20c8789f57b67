import { z } from "zod";
import { fNumbers } from "../domain/floor-survey/f-numbers";
import { floorClass } from "../domain/floor-survey/floor-classes";
import { BAY_LIMITS, rateBay } from "../domain/floor-survey/rating";
import { standShims } from "../domain/floor-survey/stand-shims";
import { surveyFloor } from "../domain/floor-survey/survey";
import { type Outcome, ok } from "../domain/outcome";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { SURVEY_EXAMPLES } from "./survey-examples";

const length = (words: string) => z.number().min(-100_000).max(100_000).describe(`${words}, mm`);
const place = { x: length("Along A–B from A"), y: length("To the left of A–B") };

const input = z.strictObject({
  heights: z
    .array(z.strictObject({ ...place, height: length("Height of the floor over any level plane") }))
    .min(3)
    .max(500)
    .describe("Heights of the bay's floor"),
  limits: z
    .strictObject({
      goodSlope: z.number().min(0).max(100).describe("Steepest slope of a good floor, mm/m"),
      usableSlope: z.number().min(0).max(100).describe("Steepest slope of a usable floor, mm/m"),
      goodFlatness: z.number().min(0).max(500).describe("Bump to hollow of a good floor, mm"),
      usableFlatness: z.number().min(0).max(500).describe("Bump to hollow of a usable floor, mm"),
    })
    .optional()
    .describe("What the shop calls good and usable; common practice unless told"),
  stands: z
    .array(z.strictObject({ id: z.string().min(1).max(40).describe("Name of the stand"), ...place }))
    .min(1)
    .max(24)
    .optional()
    .describe("Where stands will be put: shims to bring all to one height"),
  shim: z.number().min(0.1).max(50).default(1.5875).describe("Step of the shims, mm"),
  lines: z
    .array(z.array(length("Height")).min(3).max(400))
    .min(1)
    .max(30)
    .optional()
    .describe("Heights in straight lines, every 12 in (300 mm): flatness and levelness numbers"),
});

const spot = z.strictObject({ x: z.number(), y: z.number(), deviation: z.number() });
const output = z.strictObject({
  riseAlong: z.number().describe("mm/m along A–B"),
  riseAcross: z.number().describe("mm/m to the left"),
  steepest: z.number().describe("mm/m in the steepest direction"),
  slope: z.number().describe("The same, degrees"),
  rises: z
    .number()
    .nullable()
    .describe("Direction in which the floor rises, degrees to the left of A–B; null when level"),
  words: z.string(),
  flatness: z.number().describe("Bump to hollow, mm"),
  bump: spot.describe("Highest over the plane, mm"),
  hollow: spot.describe("Deepest under it, mm"),
  deviations: z.array(z.number()).describe("Over the plane at each height, in their order, mm"),
  rating: z.enum(["good", "usable", "unfit"]),
  ratingWords: z.string(),
  shims: z
    .array(z.strictObject({ id: z.string(), low: z.number(), shim: z.number() }))
    .nullable()
    .describe(
      "How far the floor at each stand lies under the highest, and the shim for it, mm; null without stands",
    ),
  fNumbers: z
    .strictObject({
      flatness: z.number().describe("FF"),
      levelness: z.number().nullable().describe("FL; null with fewer than twelve heights in a line"),
      className: z.string().nullable().describe("Class of slab by both numbers; null when it reaches none"),
    })
    .nullable()
    .describe("Null without lines"),
});

function run(body: z.output<typeof input>): Outcome<z.input<typeof output>> {
  const heights = body.heights.map(({ x, y, height }) => ({ x: mm(x), y: mm(y), height: mm(height) }));
  const survey = surveyFloor(heights);
  if (!survey.ok) return survey;
  const { riseAlong, riseAcross, steepest, slope, rises, words, flatness, bump, hollow } = survey.value;
  const limits = body.limits && {
    ...body.limits,
    goodFlatness: mm(body.limits.goodFlatness),
    usableFlatness: mm(body.limits.usableFlatness),
  };
  const rating = rateBay(survey.value, limits ?? BAY_LIMITS, "mm");
  const stands = body.stands?.map(({ id, x, y }) => ({ id, x: mm(x), y: mm(y) }));
  const shims = stands ? standShims(heights, stands, mm(body.shim)) : null;
  if (shims && !shims.ok) return shims;
  const numbers = body.lines ? fNumbers(body.lines.map((line) => line.map((height) => mm(height)))) : null;
  if (numbers && !numbers.ok) return numbers;
  const at = ({ x, y, deviation }: typeof bump) => ({ x, y, deviation });
  return ok({
    riseAlong,
    riseAcross,
    steepest,
    slope,
    rises,
    words,
    flatness,
    bump: at(bump),
    hollow: at(hollow),
    deviations: survey.value.deviations.map((one) => one.deviation),
    rating: rating.rating,
    ratingWords: rating.words,
    shims: shims ? shims.value.map(({ id, low, shim }) => ({ id, low, shim })) : null,
    fNumbers: numbers
      ? {
          flatness: numbers.value.flatness,
          levelness: numbers.value.levelness,
          className: floorClass(numbers.value.flatness, numbers.value.levelness)?.name ?? null,
        }
      : null,
  });
}

export const surveyCalc = defineCalc({
  name: "survey",
  title: "A bay's floor: slope, bumps, shims, F-numbers",
  summary:
    "The plane that fits a bay's floor best, the bumps and hollows over it, whether the bay will do for layout, the shim under each stand, and flatness and levelness numbers from heights in lines after ASTM E1155 (its two constants from memory) with the classes of ACI 117-10. A is the origin, A to B is x, y is to the left.",
  input,
  output,
  run,
  examples: SURVEY_EXAMPLES,
});
