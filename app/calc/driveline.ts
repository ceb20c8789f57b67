import { z } from "zod";
import { jointWords, limitAt, mostLag, peakAcceleration, unevenness } from "../domain/driveline/joint";
import { propshaft } from "../domain/driveline/propshaft";
import { ok } from "../domain/outcome";
import { vehiclePoint } from "../domain/steering/drag-link";
import { degrees } from "../domain/units/angle";
import { defineCalc } from "./calc";
import { DRIVELINE_EXAMPLES } from "./driveline-examples";

const coordinate = (words: string) => z.number().min(-20_000).max(20_000).describe(words);
const point = (words: string) =>
  z
    .strictObject({ x: coordinate("Ahead."), y: coordinate("To the left."), z: coordinate("Up.") })
    .describe(words);
const angles = (words: string) =>
  z
    .strictObject({
      plan: z.number().gt(-80).lt(80).default(0).describe("In plan, degrees, to the left positive."),
      side: z.number().gt(-80).lt(80).describe("From the side, degrees, up ahead positive."),
    })
    .describe(words);

export const drivelineCalc = defineCalc({
  name: "driveline",
  title: "Propshaft and joints",
  summary:
    "Length, slip and joint angles of a propshaft through the travel, what two joints leave together, how unevenly they drive, and driveshaft makers' guidance by speed (guidance, no standard): solid geometry and the single universal joint.",
  input: z.strictObject({
    box: point("Joint at the gearbox."),
    output: angles("How the gearbox's shaft points, taken as it would run ahead."),
    places: z
      .array(
        z.strictObject({
          name: z.string().min(1).max(40).describe("ride, droop …"),
          joint: point("Joint at the axle there."),
          pinion: angles("How the pinion points there, likewise."),
        }),
      )
      .min(1)
      .max(100)
      .describe("Places of the travel."),
    phase: z.number().min(0).max(180).default(0).describe("Forks out of line, degrees; 0: in line."),
    rpm: z.number().min(1).max(20_000).optional().describe("Of the propshaft, for makers' guidance."),
  }),
  output: z.object({
    places: z
      .array(
        z.object({
          name: z.string().describe("As sent."),
          length: z.number().describe("Joint to joint."),
          first: z.number().describe("Joint at the gearbox, degrees."),
          second: z.number().describe("Joint at the axle, degrees."),
          residual: z.number().describe("The one joint that would drive as unevenly, degrees."),
          unevenness: z.number().describe("Of that: fastest less slowest over the mean."),
          mostLag: z
            .number()
            .describe("Of the first joint: how far its far side lags or leads at most, degrees."),
          peakAcceleration: z
            .number()
            .nullable()
            .describe("Of the first joint, rad/s². Null: no speed given."),
          words: z.array(z.string()).describe("What is outside the usual."),
        }),
      )
      .describe("In the order sent."),
    longest: z.number().describe("Over the places."),
    shortest: z.number().describe("Over the places."),
    slip: z.number().describe("What the slip joint has to give."),
    makersLimit: z
      .object({
        rpm: z.number().describe("Row of the table."),
        angle: z.number().describe("Degrees."),
        status: z.enum(["read", "from memory"]).describe("How sure it is."),
      })
      .nullable()
      .describe("Makers' guidance for the speed. Null: no speed given, or above the table."),
  }),
  run({ box, output, places, phase, rpm }) {
    const shaft = (one: { plan: number; side: number }) => ({
      plan: degrees(one.plan),
      side: degrees(one.side),
    });
    const came = propshaft(
      vehiclePoint(box.x, box.y, box.z),
      shaft(output),
      places.map(({ name, joint, pinion }) => ({
        name,
        joint: vehiclePoint(joint.x, joint.y, joint.z),
        pinion: shaft(pinion),
      })),
      degrees(phase),
    );
    if (!came.ok) return came;
    const { longest, shortest, slip } = came.value;
    const limit = rpm === undefined ? null : limitAt(rpm);
    return ok({
      places: came.value.places.map(({ name, length, first, second, residual }) => ({
        name,
        length,
        first,
        second,
        residual,
        unevenness: unevenness(residual),
        mostLag: mostLag(first),
        peakAcceleration: rpm === undefined ? null : peakAcceleration(first, rpm),
        words: jointWords(first, second, rpm ?? null),
      })),
      longest,
      shortest,
      slip,
      makersLimit: limit && { ...limit },
    });
  },
  examples: DRIVELINE_EXAMPLES,
  cautions: [
    "A propshaft that fails at speed can pass through the floor: have it made and balanced by people who do, and check it at droop and at full compression.",
    "An aid to layout, not an engineering certificate.",
  ],
});
