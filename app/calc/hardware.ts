import { z } from "zod";
import {
  boltShear,
  boltTightening,
  CLAMP_SHARE,
  DRY_NUT_FACTOR,
  SHEAR_SHARE,
  TORQUE_SCATTER,
} from "../domain/hardware/bolt";
import { BOLT_GRADES } from "../domain/hardware/bolt-grade";
import { bracketHole } from "../domain/hardware/bracket-hole";
import { filletWeld, requiredLeg, smallestLeg, weldThroat } from "../domain/hardware/fillet-weld";
import { findThread } from "../domain/hardware/thread";
import { type Outcome, ok } from "../domain/outcome";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { HARDWARE_EXAMPLES } from "./hardware-examples";

/** No plate, weld or load in the trade is beyond these: mm, N, MPa. */
const LONGEST = 10_000;
const STRONGEST_LOAD = 1e7;
const STRONGEST_STEEL = 2500;

const size = (words: string) => z.number().positive().max(LONGEST).describe(words);
const strength = (words: string) => z.number().positive().max(STRONGEST_STEEL).describe(words);
const share = (words: string) => z.number().positive().max(1).describe(words);
const out = (words: string) => z.number().describe(words);

const threadField = z
  .string()
  .max(40)
  .describe("Thread by name: 1/2-13, 1/2-20 or M12 (coarse pitch). Inch 1/4 to 1 1/2, metric M5 to M39.");
const gradeField = z
  .enum(BOLT_GRADES)
  .describe("SAE J429 grade 2, 5 or 8 for inch threads, ISO 898-1 class 8.8, 10.9 or 12.9 for metric ones.");
const weldFields = {
  length: size("Length of the weld."),
  electrodeMegapascals: strength("Tensile strength of the weld metal, MPa.").default(482.633),
  loadAngle: z
    .number()
    .min(0)
    .max(90)
    .default(0)
    .describe("Force to the weld's length, degrees: 0 along, 90 across."),
};

const boltInput = z.strictObject({
  what: z.literal("bolt").describe("Clamp and torque of a tightened bolt."),
  thread: threadField,
  grade: gradeField,
  clampShare: share("Clamp as a share of the proof load; common practice 0.75.").default(CLAMP_SHARE),
  nutFactor: share("K in T = K·D·F: common practice 0.2 dry; less when oiled or plated.").default(
    DRY_NUT_FACTOR,
  ),
  scatter: z
    .number()
    .min(0)
    .max(0.9)
    .default(TORQUE_SCATTER)
    .describe("How far the clamp comes out either way at one torque, as a share."),
});
const shearInput = z.strictObject({
  what: z.literal("boltShear").describe("The force across a bolt that shears it."),
  thread: threadField,
  grade: gradeField,
  planes: z
    .union([z.literal(1), z.literal(2)])
    .describe("1: held on one side (single shear), 2: held on both sides (double shear)."),
  threadsInPlane: z.boolean().describe("Whether threads lie in a plane of shear."),
  shearShare: share("Shear strength as a share of tensile strength.").default(SHEAR_SHARE),
});
const holeInput = z.strictObject({
  what: z.literal("bracketHole").describe("What a bolt hole in one bracket plate carries."),
  bolt: size("Diameter of the bolt."),
  hole: size("Diameter of the hole."),
  thickness: size("Thickness of the plate."),
  edgeDistance: z
    .number()
    .positive()
    .max(LONGEST)
    .nullable()
    .default(null)
    .describe("Hole's centre to the edge in the direction of the force; null: far from any edge."),
  tensileMegapascals: strength("Tensile strength of the plate, MPa."),
});
const weldInput = z.strictObject({
  what: z.literal("weld").describe("What a fillet weld carries."),
  leg: size("Leg of the fillet, both alike."),
  ...weldFields,
});
const legInput = z.strictObject({
  what: z.literal("weldLeg").describe("The leg that a fillet weld needs for a load."),
  loadNewtons: z
    .number()
    .positive()
    .max(STRONGEST_LOAD)
    .describe("Load on the weld, newtons: as it is for allowable, with its load factors for design."),
  method: z
    .enum(["allowable", "design"])
    .describe("Allowable strength (Ω 2.00) or load and resistance factors (φ 0.75)."),
  ...weldFields,
  thinnerPlate: size("Thickness of the thinner part joined, for the smallest leg to lay on it.").optional(),
});

const boltOut = z.object({
  what: z.literal("bolt").describe("As asked."),
  stressArea: out("Tensile stress area, square millimetres."),
  proofMegapascals: out("Stress under proof load, MPa."),
  tensileMegapascals: out("Least tensile strength, MPa."),
  proofNewtons: out("Proof load, newtons."),
  tensileNewtons: out("Least tensile load, newtons."),
  clampNewtons: out("Clamp aimed at, newtons."),
  clampLowNewtons: out("The least that the scatter leaves of it, newtons."),
  clampHighNewtons: out("The most, newtons."),
  torqueNewtonMetres: out("Torque, newton metres."),
  overProof: z.boolean().describe("The most is over the proof load: the bolt may be stretched for good."),
});
const shearOut = z.object({
  what: z.literal("boltShear").describe("As asked."),
  shearNewtons: out("Force that shears the bolt, newtons; divide by a factor of safety."),
});
const holeOut = z.object({
  what: z.literal("bracketHole").describe("As asked."),
  bearingNewtons: out("Force that stretches the hole out, newtons."),
  tearOutNewtons: z
    .number()
    .nullable()
    .describe("Force that tears it out to the edge, newtons; null far from an edge."),
  governs: z.enum(["bearing", "tearOut"]).describe("The smaller of the two."),
  allowableNewtons: out("Allowable, half of it, newtons."),
  designNewtons: out("Design strength for factored loads, 0.75 of it, newtons."),
});
const weldOut = z.object({
  what: z.literal("weld").describe("As asked."),
  throat: out("Root to face."),
  countedLeg: out("Leg that counts: less than the leg on a weld shorter than four legs."),
  nominalNewtons: out("Nominal strength, newtons."),
  allowableNewtons: out("Allowable, Ω 2.00, newtons."),
  designNewtons: out("Design strength for factored loads, φ 0.75, newtons."),
});
const legOut = z.object({
  what: z.literal("weldLeg").describe("As asked."),
  leg: out("Leg for the load, not rounded."),
  throat: out("Its throat."),
  smallestLeg: z
    .number()
    .nullable()
    .describe("Smallest leg to lay on that plate whatever the load; null when no plate was given."),
  layLeg: out("The larger of the two."),
});

const input = z.discriminatedUnion("what", [boltInput, shearInput, holeInput, weldInput, legInput]);
const output = z.discriminatedUnion("what", [boltOut, shearOut, holeOut, weldOut, legOut]);
type Answer<T extends z.ZodType> = Outcome<z.input<T>>;

function runBolt(given: z.output<typeof boltInput>): Answer<typeof boltOut> {
  const thread = findThread(given.thread);
  if (!thread.ok) return thread;
  const { clampShare, nutFactor, scatter } = given;
  const bolt = boltTightening(thread.value, given.grade, { clampShare, nutFactor, scatter });
  if (!bolt.ok) return bolt;
  return ok({
    what: "bolt",
    stressArea: bolt.value.stressArea,
    proofMegapascals: bolt.value.proofStress,
    tensileMegapascals: bolt.value.tensileStress,
    proofNewtons: bolt.value.proofLoad,
    tensileNewtons: bolt.value.tensileLoad,
    clampNewtons: bolt.value.clamp,
    clampLowNewtons: bolt.value.clampLow,
    clampHighNewtons: bolt.value.clampHigh,
    torqueNewtonMetres: bolt.value.torque,
    overProof: bolt.value.overProof,
  });
}

function runShear(given: z.output<typeof shearInput>): Answer<typeof shearOut> {
  const thread = findThread(given.thread);
  if (!thread.ok) return thread;
  const force = boltShear(thread.value, given.grade, given);
  return force.ok ? ok({ what: "boltShear", shearNewtons: force.value }) : force;
}

function runHole(given: z.output<typeof holeInput>): Answer<typeof holeOut> {
  const found = bracketHole({
    bolt: mm(given.bolt),
    hole: mm(given.hole),
    thickness: mm(given.thickness),
    edgeDistance: given.edgeDistance === null ? null : mm(given.edgeDistance),
    tensile: given.tensileMegapascals,
  });
  if (!found.ok) return found;
  const { bearing, tearOut, governs, allowable, design } = found.value;
  return ok({
    what: "bracketHole",
    bearingNewtons: bearing,
    tearOutNewtons: tearOut,
    governs,
    allowableNewtons: allowable,
    designNewtons: design,
  });
}

function runWeld(given: z.output<typeof weldInput>): Answer<typeof weldOut> {
  const found = filletWeld({
    leg: mm(given.leg),
    length: mm(given.length),
    electrode: given.electrodeMegapascals,
    angle: degrees(given.loadAngle),
  });
  if (!found.ok) return found;
  const { throat, countedLeg, nominal, allowable, design } = found.value;
  return ok({
    what: "weld",
    throat,
    countedLeg,
    nominalNewtons: nominal,
    allowableNewtons: allowable,
    designNewtons: design,
  });
}

function runLeg(given: z.output<typeof legInput>): Answer<typeof legOut> {
  const leg = requiredLeg(given.loadNewtons, {
    length: mm(given.length),
    electrode: given.electrodeMegapascals,
    angle: degrees(given.loadAngle),
    method: given.method,
  });
  if (!leg.ok) return leg;
  const least = given.thinnerPlate === undefined ? ok(null) : smallestLeg(mm(given.thinnerPlate));
  if (!least.ok) return least;
  return ok({
    what: "weldLeg",
    leg: leg.value,
    throat: weldThroat(leg.value),
    smallestLeg: least.value,
    layLeg: Math.max(leg.value, least.value ?? 0),
  });
}

function run(given: z.output<typeof input>): Answer<typeof output> {
  switch (given.what) {
    case "bolt":
      return runBolt(given);
    case "boltShear":
      return runShear(given);
    case "bracketHole":
      return runHole(given);
    case "weld":
      return runWeld(given);
    case "weldLeg":
      return runLeg(given);
  }
}

export const hardwareCalc = defineCalc({
  name: "hardware",
  title: "Bolts, bracket holes and fillet welds",
  summary:
    "Stress area, proof load, clamp and torque of a bolt by grade; bolt shear; bearing of a bracket hole; strength of a fillet weld and the leg for a load. ASME B1.1, SAE J429, ISO 898-1 and AISC 360; nut factor, scatter, clamp and shear shares are common practice.",
  input: input.meta({ type: "object" }),
  output,
  run,
  examples: HARDWARE_EXAMPLES,
  cautions: [
    "An aid, not an engineering certificate: steady loads only, no shock, fatigue, heat or bending. Choose the factor of safety with somebody who may answer for it.",
    "A torque from the maker of the part or of the bolt goes before any torque worked out here.",
    "Frame and suspension welding is for qualified welders working to the code that applies; the figures say nothing of how a weld was laid.",
  ],
});
