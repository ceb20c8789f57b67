import { z } from "zod";
import { GAUGE_RESOLUTION, levelFromAngles, levelFromHeights, levelVerdict } from "../domain/layout/level";
import { combineLevels, gaugeUncertainty } from "../domain/layout/level-combined";
import { shiftBySlope, slopeTolerance, steepestSlope } from "../domain/layout/level-shift";
import { levelUncertainty } from "../domain/layout/level-uncertainty";
import { standPlan } from "../domain/layout/stand-plan";
import { type Outcome, ok, problem } from "../domain/outcome";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { LEVEL_EXAMPLES } from "./level-examples";

const length = (words: string) => z.number().min(-50_000).max(50_000).describe(`${words}, mm`);
const angle = (words: string) => z.number().min(-45).max(45).describe(`${words}, degrees`);
const twice = (words: string) =>
  z.strictObject({ first: angle("First reading"), turned: angle("Turned end for end") }).describe(words);

const input = z.strictObject({
  stands: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(40).describe("Name of the stand"),
        x: length("Forward"),
        y: length("To the left"),
        height: length("Height of the frame datum over the stand, over any level plane"),
      }),
    )
    .min(3)
    .max(24)
    .optional()
    .describe("Heights at three stands or more; a fourth shows twist"),
  heightSigma: z.number().min(0.01).max(50).default(0.8).describe("Standard uncertainty of one height, mm"),
  gauge: z
    .strictObject({
      leftRail: twice("Left rail, nose up positive"),
      rightRail: twice("Right rail, nose up positive"),
      frontCross: twice("Front cross-member, right side up positive"),
      rearCross: twice("Rear cross-member, right side up positive"),
    })
    .optional()
    .describe("Angle gauge, each place read both ways round"),
  gaugeResolution: z
    .number()
    .min(0.001)
    .max(1)
    .default(GAUGE_RESOLUTION)
    .describe("Smallest step of the gauge, degrees"),
  allowed: z
    .number()
    .min(0.005)
    .max(5)
    .optional()
    .describe("Slope allowed each way, degrees; else from allowedError, else 0.1"),
  allowedError: z
    .number()
    .min(0.01)
    .max(100)
    .optional()
    .describe("How far the furthest point may land out, mm; needs points"),
  points: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(40).describe("Name of the point"),
        height: length("Height over the frame datum; negative below it"),
      }),
    )
    .max(50)
    .default([])
    .describe("Points that are dropped: how far the slope lands each out"),
  shim: z.number().min(0.1).max(50).default(1.5875).describe("Step of the shims under the stands, mm"),
  mode: z.enum(["raise", "either"]).default("raise").describe("Stands go only up, or also down"),
});

const slopes = {
  noseHigh: z.number().describe("Degrees; negative: nose low"),
  rightHigh: z.number().describe("Degrees; negative: right side low"),
};
const output = z.strictObject({
  ...slopes,
  steepest: z.number().describe("Slope in the steepest direction, degrees"),
  uncertainty: z.strictObject(slopes).describe("Standard uncertainty of both"),
  allowed: z.number().describe("Slope allowed each way, degrees"),
  isTrue: z.boolean(),
  headline: z.string().describe("The verdict in words"),
  twist: z.number().nullable().describe("Largest height left over the plane, mm; null with the gauge alone"),
  twistDegrees: z.number().nullable().describe("Twist by the gauge, degrees; null without it"),
  notes: z.array(z.string()).describe("What checks the reading and what does not, in sentences"),
  shifts: z
    .array(z.strictObject({ id: z.string(), ahead: z.number(), left: z.number() }))
    .describe("How far each point lands out, mm"),
  plan: z
    .strictObject({
      moves: z.array(z.strictObject({ id: z.string(), raise: z.number() })).describe("mm; 0: leave it"),
      words: z.array(z.string()),
      after: z.strictObject({ ...slopes, twist: z.number().nullable() }).describe("What is left then"),
      isTrue: z.boolean(),
    })
    .nullable()
    .describe("What to do at the stands; null without heights"),
});

type Input = z.output<typeof input>;
type Output = z.input<typeof output>;

function allowedOf(body: Input): Outcome<{ allowed: number; notes: string[] }> {
  if (body.allowed !== undefined) return ok({ allowed: body.allowed, notes: [] });
  if (body.allowedError === undefined) return ok({ allowed: GAUGE_RESOLUTION, notes: [] });
  const points = body.points.map(({ id, height }) => ({ id, height: mm(height) }));
  const tolerance = slopeTolerance(points, mm(body.allowedError), "mm");
  return tolerance.ok ? ok({ allowed: tolerance.value.allowed, notes: [tolerance.value.words] }) : tolerance;
}

const gaugeOf = ({ gauge, gaugeResolution }: Input) => {
  if (!gauge) return null;
  const both = ({ first, turned }: { first: number; turned: number }) => ({
    first: degrees(first),
    turned: degrees(turned),
  });
  return levelFromAngles(
    {
      leftRail: both(gauge.leftRail),
      rightRail: both(gauge.rightRail),
      frontCross: both(gauge.frontCross),
      rearCross: both(gauge.rearCross),
    },
    degrees(gaugeResolution),
  );
};

function run(body: Input): Outcome<Output> {
  const stands = (body.stands ?? []).map(({ id, x, y, height }) => ({
    id,
    x: mm(x),
    y: mm(y),
    height: mm(height),
  }));
  const gauge = gaugeOf(body);
  if (stands.length === 0 && !gauge)
    return problem("Give heights at the stands, the gauge's readings, or both.");
  const heights = stands.length > 0 ? levelFromHeights(stands) : null;
  if (heights && !heights.ok) return heights;
  const unsure = stands.length > 0 ? levelUncertainty(stands, mm(body.heightSigma)) : null;
  if (unsure && !unsure.ok) return unsure;
  const tolerance = allowedOf(body);
  if (!tolerance.ok) return tolerance;
  const allowed = degrees(tolerance.value.allowed);
  const gaugeSure = gaugeUncertainty(degrees(body.gaugeResolution));
  const combined =
    heights && unsure && gauge ? combineLevels(heights.value, unsure.value, gauge, gaugeSure) : null;
  const level = combined ?? heights?.value ?? gauge;
  if (!level) return problem("Give heights at the stands, the gauge's readings, or both.");
  const sure = combined?.uncertainty ?? unsure?.value ?? { noseHigh: gaugeSure, rightHigh: gaugeSure };
  const plan =
    stands.length > 0
      ? standPlan(stands, { mode: body.mode, shim: mm(body.shim), allowed, unit: "mm" })
      : null;
  if (plan && !plan.ok) return plan;
  const verdict = levelVerdict(level, allowed);
  return ok({
    noseHigh: level.noseHigh,
    rightHigh: level.rightHigh,
    steepest: steepestSlope(level),
    uncertainty: { noseHigh: sure.noseHigh, rightHigh: sure.rightHigh },
    allowed,
    isTrue: verdict.isTrue,
    headline: verdict.headline,
    twist: heights?.value.twist ?? null,
    twistDegrees: gauge?.twistDegrees ?? null,
    notes: [
      ...tolerance.value.notes,
      ...(unsure ? [unsure.value.words] : []),
      ...(combined ? [combined.words] : []),
      ...(gauge?.gaugeDoubt ? ["The gauge's own error changed between places: do not trust it."] : []),
    ],
    shifts: body.points.map(({ id, height }) => {
      const { x, y } = shiftBySlope(mm(height), level);
      return { id, ahead: x, left: y };
    }),
    plan: plan
      ? {
          moves: plan.value.moves.map(({ id, raise }) => ({ id, raise })),
          words: plan.value.words,
          after: {
            noseHigh: plan.value.after.noseHigh,
            rightHigh: plan.value.after.rightHigh,
            twist: plan.value.after.twist,
          },
          isTrue: plan.value.isTrue,
        }
      : null,
  });
}

export const levelCalc = defineCalc({
  name: "level",
  title: "How a frame stands, and what to do at the stands",
  summary:
    "Pitch and roll of a frame from heights at its stands (a plane fitted by least squares), from an angle gauge turned end for end, or from both weighted by their uncertainty; what slope is allowed; how far points land out; which stands to raise, and what is left then. x is forward, y to the left.",
  input,
  output,
  run,
  cautions: [
    "Stands must be rated for the load and stand on firm ground; never work under a vehicle on a jack alone, and chock the wheels that are on the floor.",
  ],
  examples: LEVEL_EXAMPLES,
});
