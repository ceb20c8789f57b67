import { z } from "zod";
import { type LinkedAxle, type LinkTravelRow, linkTravel } from "../domain/links/link-travel";
import {
  lateralBarRollAxis,
  pairConvergence,
  type RollAxis,
  type SpaceLink,
  spacePoint,
  triangulatedRollAxis,
} from "../domain/links/roll-axis";
import { sideLink } from "../domain/links/side-link";
import { type Outcome, ok, problem } from "../domain/outcome";
import { sidePoint } from "../domain/springs/leaf-travel";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { FOUR_LINK_EXAMPLES } from "./four-link-examples";

/** Longer than any vehicle's frame, mm: a longer figure is a slip of the finger. */
const LONGEST = 20_000;
const MOST_STEPS = 50;

const size = (words: string) => z.number().positive().max(LONGEST).describe(words);
const signed = (words: string) => z.number().min(-LONGEST).max(LONGEST).describe(words);
const out = (words: string) => z.number().describe(words);

const sidePointField = (words: string) =>
  z
    .strictObject({ station: signed("Ahead of the station datum."), height: signed("Up from the datum.") })
    .describe(words);
const sideLinkField = (words: string) =>
  z
    .strictObject({
      frame: sidePointField("Pivot on the frame."),
      axle: sidePointField("Pivot on the axle."),
    })
    .describe(words);

const linkageField = z
  .discriminatedUnion("kind", [
    z.strictObject({
      kind: z.literal("fourLink").describe("Lower and upper links; a pair counts as one from the side."),
      lower: sideLinkField("The lower link or pair."),
      upper: sideLinkField("The upper link or pair."),
    }),
    z.strictObject({
      kind: z.literal("ladderBar").describe("Bars fast to the axle with one pivot on the frame."),
      pivot: sidePointField("The bars' pivot on the frame."),
    }),
  ])
  .describe("What carries the axle.");

const travelInput = z.strictObject({
  what: z.literal("travel").describe("Instant centre, anti-squat, axle and pinion through the travel."),
  linkage: linkageField,
  axle: sidePointField("The axle's centre at ride height."),
  tyreRadius: size("Axle centre to ground, loaded."),
  cgHeight: size("Whole vehicle's centre of gravity above the ground at ride height."),
  wheelbase: size("Front to rear axle."),
  pinionAngle: z
    .number()
    .min(-45)
    .max(45)
    .default(0)
    .describe("Pinion to the level at ride height, degrees, nose up positive."),
  droop: z.number().min(0).max(2000).describe("How far the axle goes down from ride height."),
  bump: z.number().min(0).max(2000).describe("How far it goes up."),
  steps: z.number().int().min(1).max(MOST_STEPS).default(4).describe("Steps either side of ride height."),
});

const spacePointField = (words: string) =>
  z
    .strictObject({
      station: signed("Ahead of the station datum."),
      offset: signed("Left of the centre line; right negative."),
      height: signed("Up from the datum."),
    })
    .describe(words);
const spaceLinkField = (words: string) =>
  z
    .strictObject({
      frame: spacePointField("Pivot on the frame."),
      axle: spacePointField("Pivot on the axle."),
    })
    .describe(words);

const rollInput = z.strictObject({
  what: z.literal("roll").describe("Roll centre, roll axis and roll steer."),
  lower: spaceLinkField("One lower link; the other is its mirror image."),
  upper: spaceLinkField(
    "One upper link; the other is its mirror image. May be left out with a lateral bar, for a single upper link on the centre line.",
  ).optional(),
  lateralBar: spaceLinkField(
    "The bar across, frame to axle. With it the links of a pair run side by side.",
  ).optional(),
  axleStation: signed("Station of the axle's centre, where the roll centre is wanted.").default(0),
});

const rowOut = z.object({
  rise: out("Axle above ride height, against the frame."),
  axleStation: out("Station of the axle's centre."),
  axleHeight: out("Height of the axle's centre."),
  forward: out("Ahead of where it stands at ride height."),
  pinionAngle: out("Pinion to the frame's level, degrees, nose up positive."),
  centreStation: z
    .number()
    .nullable()
    .describe("Station of the instant centre; null when the links are parallel."),
  centreHeight: z.number().nullable().describe("Height of the instant centre; null likewise."),
  centreAboveGround: z
    .number()
    .nullable()
    .describe("The same above the ground under the tyre; null likewise."),
  centreRise: z
    .number()
    .nullable()
    .describe("Instant centre higher than at ride height; null when parallel here or there."),
  parallelSlope: z
    .number()
    .nullable()
    .describe("Degrees to the level of parallel links, rising forward positive; null when they meet."),
  antiSquat: z
    .number()
    .nullable()
    .describe(
      "Percent, rear axle driven, the links taking the drive torque; null when they meet straight above the tyre.",
    ),
});

const travelOut = z.object({
  what: z.literal("travel").describe("As asked."),
  ride: rowOut.describe("At ride height."),
  path: z.array(rowOut).describe("From droop to bump."),
});

const pairOut = z.object({
  planAngle: out("Angle between the two links in plan, degrees; coming together going forward positive."),
  meetStation: z
    .number()
    .nullable()
    .describe("Where they meet on the centre line; null when they run side by side."),
  meetHeight: z.number().nullable().describe("Height of that point; null likewise."),
});

const rollOut = z.object({
  what: z.literal("roll").describe("As asked."),
  rollCentreHeight: out("Height of the roll axis at the axle's station."),
  rollAxisSlope: out("Rise over run of the roll axis, up going forward positive."),
  steerPerDegree: out(
    "Degrees that a rear axle steers for each degree of roll: positive, the wheel that goes up goes back (oversteer).",
  ),
  steerApart: z
    .number()
    .nullable()
    .describe(
      "What the upper links would steer more than the lower, degrees for each degree of roll: bind. Null for a triangulated four-link or a single upper link.",
    ),
  lower: pairOut.describe("How the lower links run together."),
  upper: pairOut.nullable().describe("How the upper links run together; null when left out."),
});

type Travel = z.output<typeof travelInput>;
type Roll = z.output<typeof rollInput>;
type Row = z.input<typeof rowOut>;

const row = ({ axle, centre, ...rest }: LinkTravelRow): Row => ({
  ...rest,
  axleStation: axle.station,
  axleHeight: axle.height,
  centreStation: centre.kind === "point" ? centre.point.station : null,
  centreHeight: centre.kind === "point" ? centre.point.height : null,
  parallelSlope: centre.kind === "parallel" ? centre.slope : null,
});

function linkedAxle({ linkage, axle }: Travel): Outcome<LinkedAxle> {
  const centre = sidePoint(axle.station, axle.height);
  if (linkage.kind === "ladderBar") {
    const pivot = sidePoint(linkage.pivot.station, linkage.pivot.height);
    return ok({ kind: "ladderBar", pivot, axle: centre });
  }
  const lower = sideLink(linkage.lower.frame, linkage.lower.axle);
  if (!lower.ok) return lower;
  const upper = sideLink(linkage.upper.frame, linkage.upper.axle);
  return upper.ok ? ok({ kind: "fourLink", lower: lower.value, upper: upper.value, axle: centre }) : upper;
}

function runTravel(input: Travel): Outcome<z.input<typeof travelOut>> {
  const axle = linkedAxle(input);
  if (!axle.ok) return axle;
  const setting = {
    tyreRadius: mm(input.tyreRadius),
    cgHeight: mm(input.cgHeight),
    wheelbase: mm(input.wheelbase),
    pinionAngle: degrees(input.pinionAngle),
  };
  const { steps } = input;
  const rows = linkTravel(axle.value, setting, { droop: mm(input.droop), bump: mm(input.bump), steps });
  if (!rows.ok) return rows;
  const path = rows.value.map(row);
  return ok({ what: "travel", ride: path[steps] as Row, path });
}

const spaceLink = ({ frame, axle }: z.output<ReturnType<typeof spaceLinkField>>): SpaceLink => ({
  frame: spacePoint(frame.station, frame.offset, frame.height),
  axle: spacePoint(axle.station, axle.offset, axle.height),
});

function pair(link: SpaceLink): Outcome<z.input<typeof pairOut>> {
  const found = pairConvergence(link);
  if (!found.ok) return found;
  const { planAngle, meet } = found.value;
  return ok({ planAngle, meetStation: meet?.station ?? null, meetHeight: meet?.height ?? null });
}

function runRoll(input: Roll): Outcome<z.input<typeof rollOut>> {
  const lower = spaceLink(input.lower);
  const upper = input.upper && spaceLink(input.upper);
  const station = mm(input.axleStation);
  const axis: Outcome<RollAxis & { steerApart?: number | null }> = input.lateralBar
    ? lateralBarRollAxis({ lower, upper, bar: spaceLink(input.lateralBar) }, station)
    : upper
      ? triangulatedRollAxis(lower, upper, station)
      : problem("Give the upper links, a lateral bar, or both.");
  if (!axis.ok) return axis;
  const lowerPair = pair(lower);
  if (!lowerPair.ok) return lowerPair;
  const upperPair = upper ? pair(upper) : ok(null);
  if (!upperPair.ok) return upperPair;
  const { rollCentre, slope, steerPerDegree } = axis.value;
  return ok({
    what: "roll",
    rollCentreHeight: rollCentre,
    rollAxisSlope: slope,
    steerPerDegree,
    steerApart: axis.value.steerApart ?? null,
    lower: lowerPair.value,
    upper: upperPair.value,
  });
}

export const fourLinkCalc = defineCalc({
  name: "four-link",
  title: "Four-link and ladder bar",
  summary:
    "Instant centre, anti-squat, axle path and pinion angle of a solid rear axle on links or ladder bars through the travel; or roll centre, roll axis and roll steer of a triangulated four-link or of links with a lateral bar. Anti-squat and roll axis by the usual constructions (Gillespie, chapter 7, and Milliken & Milliken, chapter 17, from memory); the path as a planar four-bar linkage.",
  input: z.discriminatedUnion("what", [travelInput, rollInput]).meta({ type: "object" }),
  output: z.discriminatedUnion("what", [travelOut, rollOut]),
  run: (input) => (input.what === "travel" ? runTravel(input) : runRoll(input)),
  examples: FOUR_LINK_EXAMPLES,
  cautions: [
    "An aid to layout, not an engineering certificate: it says where links and axle go, not whether brackets, links or welds hold.",
    "Cycle the axle by hand through its travel, in roll too, before anything is welded: look for bind, brake hoses and propshaft.",
  ],
});
