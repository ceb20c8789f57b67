import { z } from "zod";
import { type Outcome, ok } from "../domain/outcome";
import { segmentFrom } from "../domain/springs/arc";
import { flatArch } from "../domain/springs/leaf-shape";
import {
  type LeafPosition,
  type LeafSetting,
  leafStations,
  leafTravel,
  sidePoint,
} from "../domain/springs/leaf-travel";
import { type MainLeaf, mainLeaf } from "../domain/springs/main-leaf";
import { ARC_LINK, compareLinks, threeLinks } from "../domain/springs/three-link";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { LEAF_EXAMPLES } from "./leaf-examples";

/** Longer than any vehicle's frame, mm: a longer figure is a slip of the finger. */
const LONGEST = 20_000;
const MOST_STEPS = 200;

const size = (words: string) => z.number().positive().max(LONGEST).describe(words);
const signed = (words: string) => z.number().min(-LONGEST).max(LONGEST).describe(words);
const out = (words: string) => z.number().describe(words);

/** The main leaf as any calculation asks for it. */
export const leafFields = z
  .strictObject({
    front: size("Front eye centre to pin, measured along the flat leaf."),
    rear: size("Pin to rear eye centre, measured along the flat leaf."),
    clamped: z
      .number()
      .min(0)
      .max(LONGEST)
      .default(0)
      .describe(
        "Length about the pin that the U-bolts keep straight, half to either side. 0: the leaf bends all along.",
      ),
    frontEyeAbove: signed(
      "Front eye centre above the middle of the leaf: upturned positive, Berlin 0.",
    ).default(0),
    rearEyeAbove: signed(
      "Rear eye centre above the middle of the leaf: upturned positive, Berlin 0.",
    ).default(0),
  })
  .describe("The main leaf as it sits under the vehicle.");

/** @returns the leaf of the fields, or why there is none */
export const leafOfFields = (fields: z.output<typeof leafFields>): Outcome<MainLeaf> =>
  mainLeaf({
    front: mm(fields.front),
    rear: mm(fields.rear),
    clamped: mm(fields.clamped),
    eyeOffset: { front: mm(fields.frontEyeAbove), rear: mm(fields.rearEyeAbove) },
  });

export const archField = (words: string) =>
  signed(`${words}: the pin below the line through the eye centres; negative when bent over backwards.`);
export const fixedEyeField = z
  .enum(["ahead", "behind"])
  .describe("Whether the eye that does not move is ahead of the axle or behind it.");
export const stepsField = z
  .number()
  .int()
  .min(1)
  .max(MOST_STEPS)
  .default(12)
  .describe("Steps of the path, from droop on.");

const travelInput = z.strictObject({
  what: z.literal("travel").describe("Where the axle stands through the travel."),
  leaf: leafFields,
  fixedEye: fixedEyeField,
  eyeStation: signed("Station of the fixed eye, that is, of the hanger hole; ahead positive."),
  eyeHeight: signed("Height of the fixed eye.").default(0),
  eyeLine: z
    .number()
    .min(-45)
    .max(45)
    .default(0)
    .describe(
      "Line through the eye centres out of level, degrees, front eye higher positive; kept through the travel.",
    ),
  droop: archField("Arch with the axle hanging"),
  ride: archField("Arch at ride height"),
  steps: stepsField,
  radiusShare: z
    .number()
    .min(0.5)
    .max(1)
    .optional()
    .describe(
      "Also compare with three stiff links of this share of the bending half; 0.75 stands for a circular arc.",
    ),
});

const segmentInput = z.strictObject({
  what: z.literal("segment").describe("A circular arc from any two of its measures."),
  arc: size("Length along the arc.").optional(),
  chord: size("Straight from end to end.").optional(),
  rise: signed("Height of the arc over its chord; negative: turned over.").optional(),
  radius: z.number().min(-1e9).max(1e9).optional().describe("Radius; negative: turned over."),
  angle: z
    .number()
    .min(-360)
    .max(360)
    .optional()
    .describe("Angle at the centre, degrees; negative: turned over."),
});

const positionOut = z.object({
  arch: out("The pin below the line of the eyes."),
  eyeDistance: out("Eye centre to eye centre, straight."),
  fromFront: out("Front eye to the foot of the pin on the line of the eyes."),
  fromRear: out("Rear eye to the same."),
  axleStation: out("Station of the axle pin, ahead positive."),
  axleHeight: out("Height of the axle pin."),
  seatLean: out("The axle seat against the level, degrees, nose up positive."),
});

const travelOut = z.object({
  what: z.literal("travel").describe("As asked."),
  droop: positionOut.describe("Hanging."),
  ride: positionOut.describe("At ride height."),
  flat: positionOut.describe("Main leaf flat: about full compression."),
  path: z
    .array(positionOut)
    .describe("From droop to flat, or to ride where that is less arched, in even steps."),
  threeLinks: z
    .object({
      frontLink: out("Front link, eye to pivot."),
      middle: out("Stiff middle, pivot to pivot."),
      rearLink: out("Rear link, eye to pivot."),
      pinApart: out("Largest difference of the pin from the front eye between the two models."),
      eyesApart: out("Largest difference of the eye distance."),
    })
    .nullable()
    .describe("The leaf as three stiff links beside the arc; null when not asked for."),
});

const segmentOut = z.object({
  what: z.literal("segment").describe("As asked."),
  arc: out("Length along the arc."),
  chord: out("Straight from end to end."),
  rise: out("Height of the arc over its chord."),
  radius: z.number().nullable().describe("Radius; null when flat."),
  angle: out("Angle at the centre, degrees."),
  area: out("Between arc and chord, square millimetres."),
});

const position = ({ axle, seatAngle: _, ...shape }: LeafPosition): z.input<typeof positionOut> => ({
  ...shape,
  axleStation: axle.station,
  axleHeight: axle.height,
});

function runTravel(input: z.output<typeof travelInput>): Outcome<z.input<typeof travelOut>> {
  const leaf = leafOfFields(input.leaf);
  if (!leaf.ok) return leaf;
  const setting: LeafSetting = {
    leaf: leaf.value,
    fixedEye: input.fixedEye,
    eye: sidePoint(input.eyeStation, input.eyeHeight),
    eyeLine: degrees(input.eyeLine),
  };
  const [droop, ride] = [mm(input.droop), mm(input.ride)];
  const stations = leafStations(setting, { droop, ride });
  if (!stations.ok) return stations;
  const range = { from: droop, to: mm(Math.min(ride, flatArch(leaf.value))), steps: input.steps };
  const path = leafTravel(setting, range);
  if (!path.ok) return path;
  const links = input.radiusShare === undefined ? ok(null) : linksOf(leaf.value, range, input.radiusShare);
  if (!links.ok) return links;
  return ok({
    what: "travel",
    droop: position(stations.value.droop),
    ride: position(stations.value.ride),
    flat: position(stations.value.flat),
    path: path.value.map(position),
    threeLinks: links.value,
  });
}

function linksOf(
  leaf: MainLeaf,
  range: { from: ReturnType<typeof mm>; to: ReturnType<typeof mm>; steps: number },
  radiusShare: number,
): Outcome<NonNullable<z.input<typeof travelOut>["threeLinks"]>> {
  const model = { ...ARC_LINK, radiusShare };
  const links = threeLinks(leaf, model);
  if (!links.ok) return links;
  const compared = compareLinks(leaf, range, model);
  if (!compared.ok) return compared;
  const { frontLink, middle, rearLink } = links.value;
  const { pinApart, eyesApart } = compared.value;
  return ok({ frontLink, middle, rearLink, pinApart, eyesApart });
}

function runSegment({ what, ...given }: z.output<typeof segmentInput>): Outcome<z.input<typeof segmentOut>> {
  const measure = (n: number | undefined) => (n === undefined ? undefined : mm(n));
  const answer = segmentFrom({
    arc: measure(given.arc),
    chord: measure(given.chord),
    rise: measure(given.rise),
    radius: measure(given.radius),
    angle: given.angle === undefined ? undefined : degrees(given.angle),
  });
  return answer.ok ? ok({ what, ...answer.value }) : answer;
}

export const leafCalc = defineCalc({
  name: "leaf",
  title: "Leaf spring: arch and axle position",
  summary:
    "Where the axle pin stands from the fixed eye at droop, ride height and flat, the main leaf taken as a circular arc of fixed length; or a circular arc from any two of its measures. Circular segments as in Machinery's Handbook, 31st edition, pp. 79 and 83.",
  // Every choice is an object: said for readers of the schema.
  input: z.discriminatedUnion("what", [travelInput, segmentInput]).meta({ type: "object" }),
  output: z.discriminatedUnion("what", [travelOut, segmentOut]),
  run: (input) => (input.what === "travel" ? runTravel(input) : runSegment(input)),
  examples: LEAF_EXAMPLES,
  cautions: [
    "An aid to layout, not an engineering certificate: measure the spring flat, and the axle again once it hangs on the vehicle.",
    "Leaf springs hold energy: take the load off before a bolt is loosened.",
  ],
});
