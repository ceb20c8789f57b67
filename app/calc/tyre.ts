import { z } from "zod";
import { ok } from "../domain/outcome";
import { ruleDiameter, turnsPerKilometre, tyreSize } from "../domain/tyres/designation";
import { loadOf, speedOf } from "../domain/tyres/load-index";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { TYRE_EXAMPLES } from "./tyre-examples";

const maybe = (words: string) => z.number().nullable().describe(`${words} Null: not known.`);

export const tyreCalc = defineCalc({
  name: "tyre",
  title: "Tyre size",
  summary:
    "What a tyre's size says: width, section height and nominal diameter, the diameter by the regulation's rule (UN R30 and R54, from memory), load and speed by index and symbol. The static loaded radius is not in it: measure it.",
  input: z.strictObject({
    size: z
      .string()
      .max(60)
      .describe("As on the side: 265/70R17, P205/60R15, LT285/75R16 126/123Q, 35x12.50R15LT."),
    rollingRadius: z.number().min(50).max(2000).optional().describe("Measured; for turns in a kilometre."),
  }),
  output: z.object({
    system: z.enum(["metric", "flotation"]).describe("How the size is written."),
    service: z.enum(["", "P", "LT"]).describe("P, LT or none."),
    width: z.number().describe("Section width."),
    sectionHeight: z.number().describe("Nominal."),
    rimInches: z.number().describe("Rim diameter in inches."),
    diameter: z.number().describe("Nominal outside diameter, unloaded."),
    ruleDiameter: maybe("Outside diameter by the regulation's rule; metric sizes only."),
    loadKilograms: maybe("Load by the index."),
    speedKilometresPerHour: maybe("Speed by the symbol."),
    turnsPerKilometre: maybe("From the rolling radius."),
  }),
  run({ size, rollingRadius }) {
    const read = tyreSize(size);
    if (!read.ok) return read;
    const { system, service, width, sectionHeight, rimInches, diameter, loadIndex, speedSymbol } = read.value;
    return ok({
      system,
      service,
      width,
      sectionHeight,
      rimInches,
      diameter,
      ruleDiameter: ruleDiameter(read.value),
      loadKilograms: loadIndex === null ? null : loadOf(loadIndex),
      speedKilometresPerHour: speedSymbol === null ? null : speedOf(speedSymbol),
      turnsPerKilometre: rollingRadius === undefined ? null : turnsPerKilometre(mm(rollingRadius)),
    });
  },
  examples: TYRE_EXAMPLES,
});
