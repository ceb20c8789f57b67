import { z } from "zod";
import { type Outcome, ok, problem } from "../domain/outcome";
import {
  type Correlation,
  combine,
  type Input,
  type Propagation,
  propagate,
  USUAL_COVERAGE,
} from "../domain/uncertainty/propagate";
import { correlation, fromExpanded, fromHalfWidth, repeated } from "../domain/uncertainty/readings";
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
  expanded: z
    .strictObject({
      value: z.number().min(0).max(FARTHEST).describe("The expanded uncertainty, in its own unit."),
      coverageFactor: z.number().min(0.1).max(1000).describe("The factor that it was made with, mostly 2."),
    })
    .optional()
    .describe("As a certificate states it, in place of a standard uncertainty."),
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
  readTogether: z
    .boolean()
    .default(false)
    .describe(
      "The readings of all inputs that have some were taken together, in the same order: their correlations follow.",
    ),
  coverage: z
    .number()
    .min(0.5)
    .max(0.9999)
    .optional()
    .describe(`Coverage probability; ${USUAL_COVERAGE} unless told.`),
  coverageFactor: z
    .number()
    .min(0.1)
    .max(100)
    .optional()
    .describe("A coverage factor that was agreed on, 2 say, in place of a coverage."),
});

const output = z.object({
  value: z.number().describe("The result."),
  uncertainty: z.number().describe("Combined standard uncertainty."),
  freedom: z.number().nullable().describe("Effective degrees of freedom. Null: endless."),
  coverage: z.number().describe("As asked, or what the factor agreed on comes to."),
  coverageFactor: z
    .number()
    .describe("Student's t for that coverage and those degrees of freedom, or as agreed on."),
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
  const { name, readings, halfWidth, expanded } = asked;
  const ways = [readings, asked.uncertainty, halfWidth, expanded].filter((one) => one !== undefined);
  if (ways.length !== 1)
    return problem(
      `${name} needs one of these: readings, a standard uncertainty, a half-width or an expanded uncertainty.`,
    );
  if (readings) {
    const own = repeated(readings);
    if (!own) return problem(`${name} needs two readings or more.`);
    return asked.value === undefined && asked.freedom === undefined
      ? ok({ name, value: own.mean, uncertainty: own.ofMean, freedom: own.freedom })
      : problem(`${name} has readings: its value and degrees of freedom follow from them.`);
  }
  if (asked.value === undefined) return problem(`${name} needs a value or readings.`);
  const uncertainty = halfWidth
    ? fromHalfWidth(halfWidth.value, halfWidth.spread)
    : expanded
      ? fromExpanded(expanded.value, expanded.coverageFactor)
      : (asked.uncertainty ?? 0);
  return ok({ name, value: asked.value, uncertainty, freedom: asked.freedom });
}

/** Correlations of the readings that were taken together; what does not vary hangs together with nothing. */
function fromReadings(inputs: readonly Asked[]): Outcome<Correlation[]> {
  const read = inputs.flatMap(({ name, readings }) => (readings ? [{ name, readings }] : []));
  if (read.length < 2) return problem("Nothing was read together: two inputs need readings.");
  if (read.some((one) => one.readings.length !== read[0]?.readings.length))
    return problem("What was read together has as many readings each.");
  return ok(
    read.flatMap((a, i) =>
      read.slice(i + 1).flatMap((b) => {
        const r = correlation(a.readings, b.readings);
        return r === null ? [] : [{ a: a.name, b: b.name, r: Math.max(-1, Math.min(1, r)) }];
      }),
    ),
  );
}

type Question = z.output<typeof input>;

/** What is asked, as the domain takes it. */
function settingOf(asked: Question): Outcome<Propagation> {
  const { coverage, coverageFactor } = asked;
  if (coverage !== undefined && coverageFactor !== undefined)
    return problem("A coverage and a coverage factor: give one or the other.");
  const inputs: Input[] = [];
  for (const one of asked.inputs) {
    const came = inputOf(one);
    if (!came.ok) return came;
    inputs.push(came.value);
  }
  const read = asked.readTogether ? fromReadings(asked.inputs) : ok([]);
  return read.ok
    ? ok({ inputs, correlations: [...asked.correlations, ...read.value], coverage, coverageFactor })
    : read;
}

export const uncertaintyCalc = defineCalc({
  name: "uncertainty",
  title: "Uncertainty of a result",
  summary:
    "The uncertainty of a sum or a product of inputs to first order with correlations, its effective degrees of freedom after Welch and Satterthwaite, Student's coverage factor, and what weighs most. Source: JCGM 100:2008.",
  input,
  output,
  run(asked) {
    const setting = settingOf(asked);
    if (!setting.ok) return setting;
    const sensitivities = asked.inputs.map((one) => one.sensitivity ?? 1);
    const powers = asked.inputs.map((one) => one.power ?? 1);
    const came =
      asked.model === "sum"
        ? combine(
            setting.value.inputs.reduce((sum, one, i) => sum + (sensitivities[i] ?? 1) * one.value, 0),
            sensitivities,
            setting.value,
          )
        : propagate(
            (values) => values.reduce((so, value, i) => so * value ** (powers[i] ?? 1), asked.factor),
            setting.value,
          );
    if (!came.ok) return came;
    const { freedom, ...rest } = came.value;
    return ok({ ...rest, freedom: Number.isFinite(freedom) ? freedom : null });
  },
  examples: UNCERTAINTY_EXAMPLES,
});
