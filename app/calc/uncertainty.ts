import { z } from "zod";
import { type Outcome, ok, problem } from "../domain/outcome";
import { combine, type Input, propagate, USUAL_COVERAGE } from "../domain/uncertainty/propagate";
import { fromHalfWidth, repeated } from "../domain/uncertainty/readings";
import { defineCalc } from "./calc";
import { UNCERTAINTY_EXAMPLES } from "./uncertainty-examples";

const FARTHEST = 1e12;
const figure = (words: string) => z.number().min(-FARTHEST).max(FARTHEST).describe(words);

const inputFields = z.strictObject({
  name: z.string().min(1).max(80).describe("What it is, in words: the tape tie to mark B."),
  value: figure("Its value; left out with readings, whose mean it is.").optional(),
  readings: z
    .array(z.number().min(-FARTHEST).max(FARTHEST))
    .min(2)
    .max(500)
    .optional()
    .describe("Repeated readings of it: their mean is the value, the uncertainty follows from them."),
  uncertainty: z.number().min(0).max(FARTHEST).optional().describe("Standard uncertainty, in its own unit."),
  halfWidth: z
    .strictObject({
      value: z.number().min(0).max(FARTHEST).describe("Half of what it lies within."),
      spread: z.enum(["rectangular", "triangular", "arcsine"]).describe("How it lies in there."),
    })
    .optional()
    .describe("Where only limits are known, in place of a standard uncertainty."),
  freedom: z.number().min(1).max(1e6).optional().describe("Degrees of freedom; endless unless told."),
  sensitivity: figure("Model sum: change of the result per unit of this.").optional(),
  power: z
    .number()
    .min(-20)
    .max(20)
    .optional()
    .describe("Model product: the power with which this stands in the product."),
});

const input = z.strictObject({
  model: z
    .enum(["sum", "product"])
    .describe(
      "sum: the result is the sum of sensitivity × value; product: of value to its power, multiplied.",
    ),
  factor: figure("Model product: a number that multiplies it.").default(1),
  inputs: z.array(inputFields).min(1).max(50).describe("What the result depends on."),
  correlations: z
    .array(
      z.strictObject({
        a: z.string().describe("Name of an input."),
        b: z.string().describe("Name of another."),
        r: z.number().min(-1).max(1).describe("Correlation of the two."),
      }),
    )
    .max(500)
    .default([])
    .describe("What is not named is independent."),
  coverage: z.number().min(0.5).max(0.9999).default(USUAL_COVERAGE).describe("Coverage probability."),
});

const output = z.object({
  value: z.number().describe("The result."),
  uncertainty: z.number().describe("Combined standard uncertainty."),
  freedom: z.number().nullable().describe("Effective degrees of freedom. Null: endless."),
  coverage: z.number().describe("As asked."),
  coverageFactor: z.number().describe("Student's t for that coverage and those degrees of freedom."),
  expanded: z.number().describe("Coverage factor times the standard uncertainty."),
  contributions: z
    .array(
      z.object({
        name: z.string().describe("Which input."),
        moves: z.number().describe("Change of the result for one standard uncertainty of it."),
        share: z.number().describe("Share of the variance; 1 is all."),
      }),
    )
    .describe("The largest first."),
  words: z.string().describe("The largest in words."),
});

type Asked = z.output<typeof inputFields>;

function inputOf(asked: Asked): Outcome<Input> {
  const { name, readings, halfWidth } = asked;
  const own = readings ? repeated(readings) : null;
  const value = own?.mean ?? asked.value;
  const uncertainty =
    own?.ofMean ??
    asked.uncertainty ??
    (halfWidth ? fromHalfWidth(halfWidth.value, halfWidth.spread) : undefined);
  if (value === undefined) return problem(`${name} needs a value or readings.`);
  if (uncertainty === undefined)
    return problem(`${name} needs readings, a standard uncertainty or a half-width.`);
  return ok({ name, value, uncertainty, freedom: own?.freedom ?? asked.freedom });
}

export const uncertaintyCalc = defineCalc({
  name: "uncertainty",
  title: "Uncertainty of a result",
  summary:
    "The uncertainty of a sum or a product of inputs to first order with correlations, its effective degrees of freedom after Welch and Satterthwaite, Student's coverage factor, and what weighs most. Source: JCGM 100:2008.",
  input,
  output,
  run(asked) {
    const inputs: Input[] = [];
    for (const one of asked.inputs) {
      const came = inputOf(one);
      if (!came.ok) return came;
      if (inputs.some((other) => other.name === one.name))
        return problem(`Two inputs are called ${one.name}.`);
      inputs.push(came.value);
    }
    const { correlations, coverage, factor } = asked;
    const setting = { inputs, correlations, coverage };
    const came =
      asked.model === "sum"
        ? combine(
            inputs.reduce((sum, one, i) => sum + (asked.inputs[i]?.sensitivity ?? 1) * one.value, 0),
            asked.inputs.map((one) => one.sensitivity ?? 1),
            setting,
          )
        : propagate(
            (values) => values.reduce((so, value, i) => so * value ** (asked.inputs[i]?.power ?? 1), factor),
            setting,
          );
    if (!came.ok) return came;
    const { freedom, ...rest } = came.value;
    return ok({ ...rest, freedom: Number.isFinite(freedom) ? freedom : null });
  },
  examples: UNCERTAINTY_EXAMPLES,
});
