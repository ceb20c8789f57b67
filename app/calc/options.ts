import { z } from "zod";
import { jointsOf, shackleOf } from "../domain/layout/option-detail";
import { reasonsAgainst } from "../domain/layout/option-limits";
import { alikeTo } from "../domain/layout/option-order";
import { optionSearch } from "../domain/layout/option-search";
import type { OptionColumns, OptionSearch } from "../domain/layout/option-types";
import { ok } from "../domain/outcome";
import { degrees } from "../domain/units/angle";
import { type Millimetres, mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { OPTION_EXAMPLES } from "./options-examples";

const FARTHEST = 20_000;
const station = (words: string) => z.number().min(-FARTHEST).max(FARTHEST).describe(words);
const size = (words: string) => z.number().positive().max(FARTHEST).describe(words);
const angle = (words: string) => z.number().min(0).max(90).describe(words);
const point = (words: string) =>
  z
    .strictObject({
      station: station("Ahead positive."),
      offset: station("To the left positive."),
      height: station("Over the ground."),
    })
    .describe(words);
const shaft = (words: string) =>
  z
    .strictObject({
      plan: z.number().gt(-80).lt(80).default(0).describe("In plan, degrees, to the left positive."),
      side: z.number().gt(-80).lt(80).describe("From the side, degrees, up positive."),
    })
    .describe(words);
const edge = (words: string) =>
  z
    .strictObject({
      station: station("The edge, ahead of the rear datum pair."),
      lip: z
        .number()
        .min(0)
        .max(2000)
        .nullable()
        .default(null)
        .describe(
          "Lip above the hub at full compression; null: not measured, the tyre's whole radius counts.",
        ),
    })
    .describe(words);

const springFields = z.strictObject({
  id: z.number().int().describe("The caller's own number; comes back with the options."),
  length: size("Eye centre to eye centre, measured flat along the leaf."),
  frontHalf: size("Front eye centre to pin, measured likewise."),
  arch: z
    .strictObject({
      droop: z.number().min(-2000).max(2000).describe("The pin below the line of the eyes, hanging."),
      ride: z.number().min(-2000).max(2000).describe("The same at ride height."),
    })
    .nullable()
    .default(null)
    .describe("Null: not measured; then only full compression, with the spring flat, is worked out."),
  clamped: z.number().min(0).max(1000).default(0).describe("Length that the U-bolts keep straight."),
});

const limitFields = z
  .strictObject({
    approachAtLeast: angle("Degrees.").optional(),
    departureAtLeast: angle("Degrees.").optional(),
    rampAtLeast: angle("Degrees.").optional(),
    shiftWithin: size("From the opening's centre, either way.").optional(),
    wheelbaseWithin: size("Of the wheelbase as it came.").optional(),
    dragLinkWithin: size("Change of the drag link's length.").optional(),
    noRub: z.boolean().optional().describe("No rubbing straight ahead, through the travel."),
    noRubAtLock: z.boolean().optional().describe("No rubbing over the whole steering sweep and travel."),
  })
  .describe("What was asked for. An option fails only limits whose figures are known.");

const input = z.strictObject({
  springs: z.array(springFields).min(1).max(200).describe("Springs on the rack."),
  holes: z
    .array(
      z.strictObject({
        id: z.number().int().describe("The caller's own number; comes back with the options."),
        station: station("The hole, ahead of the rear datum pair."),
      }),
    )
    .min(1)
    .max(24)
    .describe("Holes of the fixed hanger."),
  fixedEye: z.enum(["ahead", "behind"]).describe("Which side of the axle the fixed eye is."),
  axle: z.enum(["front", "rear"]).describe("Which axle is re-hung."),
  pinOffsets: z
    .array(z.number().min(-500).max(500))
    .min(1)
    .max(3)
    .default([0])
    .describe("Axle located so far ahead of the pin, by other holes in the perch."),
  openingCentre: station("Centre of the wheel opening."),
  opening: z
    .strictObject({ front: edge("Front edge."), rear: edge("Rear edge.") })
    .optional()
    .describe("Edges of the wheel opening; needs the tyre."),
  tyre: z
    .strictObject({
      freeRadius: size("Half the tyre's diameter."),
      width: size("Section width."),
      lock: angle("Full steering lock, degrees; 0 for an axle that does not steer."),
    })
    .optional()
    .describe("For room in the opening."),
  loadedRadius: size("Static loaded radius of the tyre, for the angles.").optional(),
  stock: z
    .strictObject({
      axleStation: station("The axle line as it came, at ride height."),
      wheelbase: size("The wheelbase as it came."),
    })
    .optional()
    .describe("How it was; needed for wheelbase, drag link and propshaft."),
  otherAxle: z
    .strictObject({ station: station("The axle that stays."), loadedRadius: size("Of its tyres.") })
    .optional()
    .describe("For the ramp angle."),
  lowPoints: z
    .array(
      z.strictObject({
        station: station("Ahead positive."),
        height: z.number().min(0).max(5000).describe("Over the ground."),
      }),
    )
    .max(16)
    .default([])
    .describe("Lowest points of the vehicle, ahead of, behind and between the axles."),
  dragLink: z
    .strictObject({
      box: point("Ball at the steering box."),
      axle: point("Ball at the axle, axle as it was."),
    })
    .optional()
    .describe("For the change of the drag link."),
  propshaft: z
    .strictObject({
      box: point("Joint at the gearbox."),
      axle: point("Joint at the axle, axle as it was."),
      output: shaft("How the gearbox's shaft points, taken ahead; for the joints' angles.").optional(),
      pinion: shaft("How the pinion points, likewise.").optional(),
    })
    .optional()
    .describe("For length and slip of the propshaft."),
  shackle: z
    .strictObject({
      length: size("Centre to centre."),
      load: z
        .enum(["compression", "tension"])
        .default("compression")
        .describe("Compression: hanger above the moving eye. Tension: below it."),
      angle: z
        .number()
        .gt(0)
        .lt(180)
        .optional()
        .describe("Wanted at ride height, degrees; square unless told."),
    })
    .optional()
    .describe("For the second hanger; needs the springs' arch."),
  limits: limitFields.default({}),
  sigma: z
    .strictObject({
      hole: z.number().min(0).max(50).describe("Of a hole's station."),
      half: z.number().min(0).max(50).describe("Of a half measured flat."),
    })
    .default({ hole: 0.8, half: 0.8 })
    .describe("Standard uncertainties; 1/32 in each unless told (common practice)."),
  order: z
    .enum(["centre", "angle", "room", "wheelbase"])
    .default("centre")
    .describe("What comes first among those that stand."),
  most: z.number().int().min(1).max(500).default(50).describe("How many options to answer, from the first."),
});

const maybe = (words: string) => z.number().nullable().describe(`${words} Null: not known.`);
const output = z.object({
  count: z.number().describe("Options in all."),
  standing: z.number().describe("Options that keep every limit."),
  options: z
    .array(
      z.object({
        springId: z.number().describe("As sent."),
        holeId: z.number().describe("As sent."),
        turned: z.boolean().describe("The spring turned end for end."),
        pinOffset: z.number().describe("As sent."),
        flat: maybe("Axle station at full compression."),
        ride: maybe("At ride height."),
        droop: maybe("Hanging."),
        plusMinus: maybe("Expanded uncertainty of the station, k = 2."),
        shift: maybe("Ahead of the opening's centre, at full compression."),
        wheelbase: maybe("New wheelbase."),
        approach: maybe("Approach angle, degrees."),
        departure: maybe("Departure angle, degrees."),
        ramp: maybe("Ramp angle, degrees."),
        frontRoom: maybe("Least room to the front edge straight ahead; negative: rubs."),
        rearRoom: maybe("Least room to the rear edge straight ahead."),
        frontRoomAtLock: maybe("Least room to the front edge over the steering sweep."),
        rearRoomAtLock: maybe("Least room to the rear edge over the steering sweep."),
        dragLinkChange: maybe("New length less the old."),
        propshaftRide: maybe("Propshaft at ride height, joint to joint."),
        propshaftSlip: maybe("Longest less shortest over droop, ride and full compression."),
        joints: z
          .object({
            first: z.number().describe("At the gearbox."),
            second: z.number().describe("At the axle."),
          })
          .nullable()
          .describe("Joint angles at ride height, degrees. Null: not asked for."),
        shackle: z
          .object({
            hanger: z
              .object({
                station: z.number().describe("Ahead of the rear datum pair."),
                height: z.number().describe("Over the fixed eye."),
              })
              .describe("Pivot of the second hanger."),
            droop: maybe("Shackle angle hanging, degrees."),
            ride: maybe("At ride height."),
            flat: maybe("With the spring flat."),
            warnings: z.array(z.string()).describe("What to beware of."),
          })
          .nullable()
          .describe("Null: no shackle or no arch given."),
        reasons: z.array(z.string()).describe("Why it does not stand; none when it does."),
        alike: z
          .array(z.number())
          .describe("Places in this list of options that cannot be told apart from this one."),
      }),
    )
    .describe("In the order asked for, those that stand first."),
  lipsMeasured: z
    .boolean()
    .describe("False: an edge's lip was not measured, so that its room is less than it will be."),
});

type Input = z.output<typeof input>;

function searchOf(asked: Input): OptionSearch {
  // Zod's numbers are finite, which is all that the brand promises.
  const same = asked as unknown as Omit<OptionSearch, "springs" | "holes" | "sigma">;
  return {
    ...same,
    springs: asked.springs.map((spring) => ({
      id: spring.id,
      rackNumber: spring.id,
      length: mm(spring.length),
      frontHalf: mm(spring.frontHalf),
      arch: spring.arch && { droop: mm(spring.arch.droop), ride: mm(spring.arch.ride) },
      clamped: mm(spring.clamped),
    })),
    holes: asked.holes.map((hole, i) => ({ id: hole.id, number: i + 1, station: mm(hole.station) })),
    tyre: asked.tyre && {
      freeRadius: mm(asked.tyre.freeRadius),
      width: mm(asked.tyre.width),
      lock: degrees(asked.tyre.lock),
    },
    sigma: { hole: mm(asked.sigma.hole), half: mm(asked.sigma.half) },
  };
}

function optionOut(search: OptionSearch, columns: OptionColumns, i: number, shown: readonly number[]) {
  const known = (column: Float64Array) => {
    const value = column[i] ?? Number.NaN;
    return Number.isNaN(value) ? null : value;
  };
  const hang = columns.hangs[Math.floor(i / columns.holes.length)];
  const hole = columns.holes[i % columns.holes.length];
  if (!hang || !hole) throw new RangeError(`There is no option ${i}`);
  return {
    springId: hang.spring.id,
    holeId: hole.id,
    turned: hang.turned,
    pinOffset: hang.pinOffset as Millimetres,
    flat: known(columns.flat),
    ride: known(columns.ride),
    droop: known(columns.droop),
    plusMinus: known(columns.plusMinus),
    shift: known(columns.shift),
    wheelbase: known(columns.wheelbase),
    approach: known(columns.approach),
    departure: known(columns.departure),
    ramp: known(columns.ramp),
    frontRoom: known(columns.frontRoom),
    rearRoom: known(columns.rearRoom),
    frontRoomAtLock: known(columns.frontRoomAtLock),
    rearRoomAtLock: known(columns.rearRoomAtLock),
    dragLinkChange: known(columns.dragLinkChange),
    propshaftRide: known(columns.propshaftRide),
    propshaftSlip: known(columns.propshaftSlip),
    joints: jointsOf(search, columns, i),
    shackle: shackleOf(search, columns, i),
    reasons: reasonsAgainst(search, columns, i, "mm"),
    alike: alikeTo(columns, i).flatMap((other) => {
      const place = shown.indexOf(other);
      return place < 0 ? [] : [place];
    }),
  };
}

export const optionsCalc = defineCalc({
  name: "options",
  title: "Options: springs in hanger holes",
  summary:
    "Every spring, also turned end for end, with every pin offset in every hole: where the axle comes to stand at full compression, at ride and hanging, what that does to room, angles, wheelbase, drag link and propshaft, and which limits it does not keep. A circular leaf with level eyes; angles in the sense of ISO 612 and SAE J1100.",
  input,
  output,
  run(asked) {
    const search = searchOf(asked);
    const columns = optionSearch(search);
    const shown = [...columns.order.slice(0, asked.most)];
    return ok({
      count: columns.count,
      standing: columns.rejected.reduce((sum, bits) => sum + Number(bits === 0), 0),
      options: shown.map((i) => optionOut(search, columns, i, shown)),
      lipsMeasured:
        asked.opening !== undefined && asked.opening.front.lip !== null && asked.opening.rear.lip !== null,
    });
  },
  examples: OPTION_EXAMPLES,
  cautions: [
    "Moving an axle changes steering, brakes and propshaft: they are safety-critical and want the inspection that local law demands.",
    "An aid to layout, not an engineering certificate.",
  ],
});
