import { z } from "zod";
import { clearanceAngles } from "../domain/dimensions/clearance-angles";
import { OFF_ROAD_RULES, offRoadVerdict } from "../domain/dimensions/off-road";
import { ok, problem } from "../domain/outcome";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { DIMENSIONS_EXAMPLES } from "./dimensions-examples";

const station = (words: string) => z.number().min(-20_000).max(20_000).describe(words);
const size = (words: string) => z.number().positive().max(3000).describe(words);
const wheel = (words: string) =>
  z
    .strictObject({
      station: station("The axle, ahead positive."),
      loadedRadius: size("Static loaded radius, measured."),
    })
    .describe(words);
const clearance = (words: string) => z.number().min(0).max(2000).nullable().default(null).describe(words);

const governed = (words: string) =>
  z
    .object({
      angle: z.number().describe("Degrees."),
      point: z
        .object({
          station: z.number().describe("The point that makes it."),
          height: z.number().describe("Over the ground."),
        })
        .describe("Which point."),
    })
    .nullable()
    .describe(`${words} Null: no point bounds it.`);

export const dimensionsCalc = defineCalc({
  name: "dimensions",
  title: "Approach, departure and ramp angle",
  summary:
    "The angles under a vehicle from its lowest points, tyres under static load, in the sense of ISO 612 and SAE J1100, and which criteria of two published off-road rules they meet.",
  input: z.strictObject({
    front: wheel("Front axle."),
    rear: wheel("Rear axle."),
    points: z
      .array(
        z.strictObject({
          station: station("Ahead positive."),
          height: z.number().min(0).max(5000).describe("Over the ground."),
        }),
      )
      .max(200)
      .describe("Lowest points, anywhere along the vehicle."),
    clearances: z
      .strictObject({
        frontAxle: clearance("Under the front axle; null: not measured."),
        rearAxle: clearance("Under the rear axle."),
        running: clearance("Between the axles."),
      })
      .default({ frontAxle: null, rearAxle: null, running: null })
      .describe("For the off-road rules."),
  }),
  output: z.object({
    approach: governed("Approach."),
    departure: governed("Departure."),
    ramp: governed("Ramp, also called breakover."),
    rules: z
      .array(
        z.object({
          name: z.string().describe("The rule."),
          status: z.enum(["read", "from memory"]).describe("How sure its figures are."),
          isMet: z
            .boolean()
            .nullable()
            .describe("Its geometric part. Null: depends on what was not measured."),
          missed: z.array(z.string()).describe("Criteria that are not met."),
          besides: z.string().describe("What else it asks for."),
        }),
      )
      .describe("Off-road rules."),
  }),
  run({ front, rear, points, clearances }) {
    if (front.station <= rear.station) return problem("The front axle is ahead of the rear one.");
    const wheelOf = (one: typeof front) => ({
      station: mm(one.station),
      loadedRadius: mm(one.loadedRadius),
    });
    const angles = clearanceAngles(
      wheelOf(front),
      wheelOf(rear),
      points.map((point) => ({ station: mm(point.station), height: mm(point.height) })),
    );
    const orNull = (value: number | null) => (value === null ? null : mm(value));
    const figures = {
      approach: angles.approach?.angle ?? null,
      departure: angles.departure?.angle ?? null,
      ramp: angles.ramp?.angle ?? null,
      frontAxleClearance: orNull(clearances.frontAxle),
      rearAxleClearance: orNull(clearances.rearAxle),
      runningClearance: orNull(clearances.running),
    };
    return ok({
      ...angles,
      rules: OFF_ROAD_RULES.map((rule) => {
        const { isMet, missed } = offRoadVerdict(rule, figures);
        return { name: rule.name, status: rule.status, isMet, missed, besides: rule.besides };
      }),
    });
  },
  examples: DIMENSIONS_EXAMPLES,
});
