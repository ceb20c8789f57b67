import { z } from "zod";
import { type Outcome, ok } from "../domain/outcome";
import {
  effectiveSpan,
  type LeafPack,
  leafCounts,
  packNip,
  SPRING_STEEL_MODULUS,
  type SpringSeat,
} from "../domain/springs/leaf-pack";
import { type PackState, packTravel } from "../domain/springs/leaf-pack-travel";
import { leafLengths } from "../domain/springs/leaf-sizing";
import { rideFrequencyOf } from "../domain/springs/ride-frequency";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { LEAF_PACK_EXAMPLES } from "./leaf-pack-examples";

const size = (words: string) => z.number().positive().max(20_000).describe(words);
const out = (words: string) => z.number().describe(words);
const load = (words: string) => z.number().positive().max(1e6).describe(words);

const packInput = z.strictObject({
  what: z.literal("pack").describe("Rate, stress and travel of a multi-leaf spring, pin in the middle."),
  leaves: z.number().int().min(1).max(60).describe("All leaves, the main leaf among them."),
  fullLength: z.number().int().min(1).max(60).describe("Leaves from end to end, the main leaf among them."),
  mainLeafCountsAs: z
    .enum(["full-length", "graduated"])
    .describe("Set to which the formulas count the main leaf. Textbooks differ, and the answers with them."),
  width: size("Width of a leaf."),
  thickness: size("Thickness of a leaf."),
  span: size("Eye to eye, flat."),
  seat: z
    .enum(["none", "band", "u-bolts"])
    .default("u-bolts")
    .describe(
      "What holds the middle stiff: a band over all its width, U-bolts over two thirds of their distance.",
    ),
  seatLength: z
    .number()
    .min(0)
    .max(20_000)
    .default(0)
    .describe("Width of the band, or distance of the U-bolts."),
  modulus: z
    .number()
    .positive()
    .max(1e6)
    .default(SPRING_STEEL_MODULUS)
    .describe("Young's modulus, newtons per square millimetre."),
  nippedForNewtons: load("Load on the whole spring, newtons, at which nip evens out the stress.").optional(),
  freeArch: z.number().min(0).max(2000).describe("Arch off the vehicle."),
  rideLoadNewtons: load("Sprung load on this spring at ride height, newtons."),
  bumpTravel: z.number().min(0).max(1000).describe("Travel from ride height until the bump stop is home."),
});

const frequencyInput = z.strictObject({
  what: z.literal("frequency").describe("Ride frequency from rate and load."),
  rateNewtonsPerMm: z.number().positive().max(1e5).describe("Rate at ride height, newtons per millimetre."),
  loadNewtons: load("Sprung load on this spring, newtons."),
});

const stateOut = z.object({
  deflection: out("From free."),
  arch: out("Left of the free arch; negative: bent over backwards."),
  loadNewtons: out("On the whole spring, newtons."),
  fullLengthStress: z
    .number()
    .nullable()
    .describe("Newtons per square millimetre; null without such leaves."),
  graduatedStress: z.number().nullable().describe("Newtons per square millimetre; null without such leaves."),
});
const packOut = z.object({
  what: z.literal("pack").describe("As asked."),
  fullLengthLeaves: out("Full-length leaves in the formulas, by the way of counting asked for."),
  graduatedLeaves: out("Graduated leaves in the formulas."),
  effectiveSpan: out("Length that bends, both halves."),
  rateNewtonsPerMm: out("Rate of the whole spring, newtons per millimetre."),
  ride: stateOut.describe("At ride height."),
  flat: stateOut.describe("Main leaf flat: the load it takes to get there."),
  bump: stateOut.describe("With the bump stop home."),
  frequencyHertz: out("Ride frequency, hertz."),
  nip: z
    .object({
      gap: out("Gap before the bolt is drawn."),
      boltNewtons: out("Bolt load that shuts it, newtons."),
    })
    .nullable()
    .describe("Nip for even stress at the load asked for; null when not asked for."),
  lengths: z
    .array(z.number())
    .describe("Lengths of the leaves, shortest first, the main leaf without its eyes."),
});
const frequencyOut = z.object({
  what: z.literal("frequency").describe("As asked."),
  effectiveDeflection: out("Load over rate."),
  frequencyHertz: out("Ride frequency, hertz."),
});

const state = ({ stress, load: newtons, deflection, arch }: PackState): z.input<typeof stateOut> => ({
  deflection,
  arch,
  loadNewtons: newtons,
  fullLengthStress: stress.fullLength,
  graduatedStress: stress.graduated,
});

function packOf(input: z.output<typeof packInput>): LeafPack {
  const seat: SpringSeat =
    input.seat === "none" ? { kind: "none" } : { kind: input.seat, length: mm(input.seatLength) };
  const { leaves, fullLength, mainLeafCountsAs, modulus } = input;
  return {
    leaves,
    fullLength,
    mainLeafCountsAs,
    modulus,
    seat,
    width: mm(input.width),
    thickness: mm(input.thickness),
    span: mm(input.span),
    nippedFor: input.nippedForNewtons,
  };
}

function runPack(input: z.output<typeof packInput>): Outcome<z.input<typeof packOut>> {
  const pack = packOf(input);
  const counts = leafCounts(pack);
  if (!counts.ok) return counts;
  const span = effectiveSpan(pack.span, pack.seat);
  if (!span.ok) return span;
  const travel = packTravel(pack, {
    freeArch: mm(input.freeArch),
    rideLoad: input.rideLoadNewtons,
    bumpTravel: mm(input.bumpTravel),
  });
  if (!travel.ok) return travel;
  const lengths = leafLengths(pack);
  if (!lengths.ok) return lengths;
  const nip = input.nippedForNewtons === undefined ? null : packNip(pack, input.nippedForNewtons);
  if (nip && !nip.ok) return nip;
  const { rate, ride, flat, bump, frequency } = travel.value;
  return ok({
    what: "pack",
    fullLengthLeaves: counts.value.full,
    graduatedLeaves: counts.value.graduated,
    effectiveSpan: span.value,
    rateNewtonsPerMm: rate,
    ride: state(ride),
    flat: state(flat),
    bump: state(bump),
    frequencyHertz: frequency,
    nip: nip ? { gap: nip.value.gap, boltNewtons: nip.value.boltLoad } : null,
    lengths: lengths.value,
  });
}

function runFrequency(input: z.output<typeof frequencyInput>): Outcome<z.input<typeof frequencyOut>> {
  const frequency = rideFrequencyOf(input.rateNewtonsPerMm, input.loadNewtons);
  return frequency.ok
    ? ok({
        what: "frequency",
        effectiveDeflection: input.loadNewtons / input.rateNewtonsPerMm,
        frequencyHertz: frequency.value,
      })
    : frequency;
}

export const leafPackCalc = defineCalc({
  name: "leaf-pack",
  title: "Leaf pack: rate, stress, nip, ride frequency",
  summary:
    "Rate, load, deflection and stress of a semi-elliptic spring of several leaves at ride height, flat and bump, nip, lengths of the leaves and ride frequency. Formulas as in Bhandari, Design of Machine Elements, and Khurmi & Gupta, A Textbook of Machine Design, which count the main leaf differently: say which.",
  input: z.discriminatedUnion("what", [packInput, frequencyInput]).meta({ type: "object" }),
  output: z.discriminatedUnion("what", [packOut, frequencyOut]),
  run: (input) => (input.what === "pack" ? runPack(input) : runFrequency(input)),
  examples: LEAF_PACK_EXAMPLES,
  cautions: [
    "An aid to choosing, not an engineering certificate: friction between leaves, shackles, wind-up under braking and fatigue are not in these figures.",
    "The spring maker's rating comes first.",
  ],
});
