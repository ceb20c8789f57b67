import { z } from "zod";
import { type Outcome, ok } from "../domain/outcome";
import { leafAtArch } from "../domain/springs/leaf-shape";
import { sidePoint } from "../domain/springs/leaf-travel";
import type { MainLeaf } from "../domain/springs/main-leaf";
import {
  NEAR_STRAIGHT,
  placeHanger,
  type ShackleMounting,
  USUAL_SHACKLE_ANGLE,
} from "../domain/springs/shackle";
import type { ShacklePosition } from "../domain/springs/shackle-position";
import { shackleTravel } from "../domain/springs/shackle-travel";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { archField, fixedEyeField, leafFields, leafOfFields, stepsField } from "./leaf";
import { SHACKLE_EXAMPLES } from "./shackle-examples";

const LONGEST = 20_000;
const signed = (words: string) => z.number().min(-LONGEST).max(LONGEST).describe(words);
const out = (words: string) => z.number().describe(words);

const input = z.strictObject({
  leaf: leafFields,
  fixedEye: fixedEyeField,
  eye: z
    .strictObject({ station: signed("Ahead positive."), height: signed("Up positive.") })
    .describe("Centre of the fixed eye on the vehicle."),
  shackle: z.number().positive().max(2000).describe("Shackle, centre to centre."),
  load: z
    .enum(["compression", "tension"])
    .default("compression")
    .describe(
      "Compression: hanger above the moving eye, the frame stands on the shackle. Tension: hanger below it.",
    ),
  hanger: z
    .strictObject({ station: signed("Ahead positive."), height: signed("Up positive.") })
    .optional()
    .describe("Pivot of the second hanger where it is already on the vehicle. Left out: it is placed."),
  movingEyeHigher: signed("Moving eye above the fixed eye at ride height, for placing the hanger.").default(
    0,
  ),
  angle: z
    .number()
    .gt(0)
    .lt(180)
    .default(USUAL_SHACKLE_ANGLE)
    .describe(
      "Wanted at ride height between the shackle and the line to the fixed eye, degrees; over 90 leans away.",
    ),
  droop: archField("Arch with the axle hanging"),
  ride: archField("Arch at ride height"),
  bump: archField("Arch at full compression; flat when left out").optional(),
  steps: stepsField,
  nearStraight: z
    .number()
    .min(0)
    .max(45)
    .default(NEAR_STRAIGHT)
    .describe("Warn when the shackle is nearer to straight than this, degrees."),
  frame: z
    .strictObject({
      underside: signed("Height of the frame's underside over the moving eye."),
      eyeRadius: z
        .number()
        .min(0)
        .max(500)
        .describe("Radius round the moving eye's centre that must stay clear."),
    })
    .optional()
    .describe("Left out: no room to the frame is worked out."),
});

const pointOut = (words: string) =>
  z.object({ station: out("Ahead positive."), height: out("Up positive.") }).describe(words);
const fields = {
  arch: out("The pin below the line of the eyes."),
  eyeDistance: out("Eye centre to eye centre."),
  movingEye: pointOut("Centre of the moving eye."),
  shackleAngle: out("Between the shackle and the line to the fixed eye, degrees."),
  eyeLine: out("Line of the eyes out of level, degrees, front eye higher positive."),
  axle: pointOut("The axle pin."),
  seatLean: out("The axle seat against the level, degrees, nose up positive."),
};
const place = (words: string) =>
  z.object(fields).nullable().describe(`${words} Null where the shackle binds.`);

const output = z.object({
  hanger: pointOut("Pivot of the second hanger."),
  droop: place("Hanging."),
  ride: place("At ride height."),
  flat: place("Main leaf flat."),
  bump: place("At full compression."),
  path: z
    .array(z.object(fields))
    .describe("From droop to full compression, without where the shackle binds."),
  longest: out("The spring at its longest, eye to eye."),
  lengthLeft: out("How much longer it could get before the shackle lies straight; negative: it binds."),
  eyeGoesOut: z
    .number()
    .nullable()
    .describe(
      "How far the moving eye goes out from ride height: room to keep. Null when it binds at ride height.",
    ),
  frameRoom: z
    .number()
    .nullable()
    .describe("Least room between moving eye and frame; null when not asked for."),
  warnings: z
    .array(
      z.object({
        at: z.enum(["droop", "ride", "flat", "bump", "between"]).describe("Where in the travel."),
        words: z.string().describe("What to beware of."),
      }),
    )
    .describe("What to beware of; empty when nothing was found."),
});

type Input = z.output<typeof input>;

function mountingOf(given: Input, leaf: MainLeaf): Outcome<ShackleMounting> {
  const base = {
    fixedEye: given.fixedEye,
    eye: sidePoint(given.eye.station, given.eye.height),
    shackle: mm(given.shackle),
    load: given.load,
  };
  if (given.hanger) return ok({ ...base, hanger: sidePoint(given.hanger.station, given.hanger.height) });
  const atRide = leafAtArch(leaf, mm(given.ride));
  if (!atRide.ok) return atRide;
  const placed = placeHanger({
    ...base,
    eyeDistance: atRide.value.eyeDistance,
    movingEyeHigher: mm(given.movingEyeHigher),
    angle: degrees(given.angle),
  });
  return placed.ok ? ok({ ...base, hanger: placed.value.hanger }) : placed;
}

/** Copies without the brands of the domain's types, which a schema does not know. */
const plain = (position: ShacklePosition): z.input<typeof output>["path"][number] => ({
  ...position,
  movingEye: { ...position.movingEye },
  axle: { ...position.axle },
});
const orNull = (position: ShacklePosition | null) => (position ? plain(position) : null);

function run(given: Input): Outcome<z.input<typeof output>> {
  const leaf = leafOfFields(given.leaf);
  if (!leaf.ok) return leaf;
  const mounting = mountingOf(given, leaf.value);
  if (!mounting.ok) return mounting;
  const { frame, bump } = given;
  const travel = shackleTravel({
    leaf: leaf.value,
    mounting: mounting.value,
    droop: mm(given.droop),
    ride: mm(given.ride),
    bump: bump === undefined ? undefined : mm(bump),
    steps: given.steps,
    nearStraight: degrees(given.nearStraight),
    frame: frame && { underside: mm(frame.underside), eyeRadius: mm(frame.eyeRadius) },
  });
  if (!travel.ok) return travel;
  const { droop, ride, flat, bump: atBump, path, ...rest } = travel.value;
  return ok({
    hanger: { ...mounting.value.hanger },
    droop: orNull(droop),
    ride: orNull(ride),
    flat: orNull(flat),
    bump: orNull(atBump),
    path: path.map(plain),
    ...rest,
  });
}

export const shackleCalc = defineCalc({
  name: "shackle",
  title: "Shackle and second hanger",
  summary:
    "Where the second hanger's pivot goes for a wanted shackle angle at ride height, and the shackle, the moving eye and the axle through the travel: plane geometry of two circles, the leaf as a circular arc.",
  input,
  output,
  run,
  examples: SHACKLE_EXAMPLES,
  cautions: [
    "An aid to layout, not an engineering certificate: cycle the suspension by hand from droop to bump before anything is welded.",
    "A shackle that goes over centre or binds can break the spring or its hanger.",
    "Leaf springs hold energy: take the load off before a bolt is loosened.",
  ],
});
