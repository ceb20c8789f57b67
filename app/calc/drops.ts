import { z } from "zod";
import { floorPoint } from "../domain/geometry/point";
import { dropQuality, ELLIPSE_COVERAGE } from "../domain/layout/drop-quality";
import { pointFromTies } from "../domain/layout/drops";
import { repeatedReadings } from "../domain/layout/repeated-readings";
import type { Tie } from "../domain/layout/tie-fit";
import { type Outcome, ok } from "../domain/outcome";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { DROPS_EXAMPLES } from "./drops-examples";

const coordinate = (words: string) => z.number().min(-100_000).max(100_000).describe(`${words}, mm`);

const input = z.strictObject({
  ties: z
    .array(
      z.strictObject({
        mark: z.string().min(1).max(20).describe("Name of the control mark"),
        x: coordinate("Where the mark lies along A–B"),
        y: coordinate("Where it lies to the left of A–B"),
        readings: z
          .array(z.number().positive().max(100_000))
          .min(1)
          .max(10)
          .describe("Taped distance from mark to drop, read once or several times, mm"),
        sigma: z
          .number()
          .min(0.01)
          .max(100)
          .optional()
          .describe("Standard uncertainty of one reading of this tape, mm; the common one unless told"),
        markSigma: z
          .number()
          .min(0)
          .max(100)
          .optional()
          .describe("Standard uncertainty of where the mark lies, mm; none unless told"),
      }),
    )
    .min(2)
    .max(12)
    .describe("Tapes from two marks or more; a third checks the other two"),
  side: z.enum(["left", "right"]).describe("Side of the A–B line on which the drop lies"),
  sigma: z
    .number()
    .min(0.01)
    .max(100)
    .default(0.8)
    .describe("Standard uncertainty of one reading of a tape, mm"),
  coverage: z
    .number()
    .min(0.1)
    .max(0.999)
    .default(ELLIPSE_COVERAGE)
    .describe("Share of drops that the ellipse holds, 0 to 1"),
  unit: z
    .enum(["in", "mm"])
    .default("in")
    .describe("What the tapes are read in: for digits swapped, and words"),
});

const output = z.strictObject({
  x: z.number().describe("mm along A–B"),
  y: z.number().describe("mm to the left of it"),
  redundancy: z.number().describe("Tapes more than the two that make a point"),
  sigmaX: z.number().describe("Standard uncertainty along A–B, mm"),
  sigmaY: z.number().describe("Standard uncertainty across, mm"),
  ellipse: z.strictObject({
    major: z.number().describe("Half the longer axis, mm"),
    minor: z.number().describe("Half the shorter axis, mm"),
    angle: z.number().describe("Of the longer axis from A–B to the left, degrees"),
    coverage: z.number(),
  }),
  ties: z.array(
    z.strictObject({
      mark: z.string(),
      distance: z.number().describe("Mean of the readings, mm"),
      readings: z.string().describe("How the readings agree, in words"),
      residual: z.number().describe("Taped minus what the point says, mm"),
      redundancyNumber: z.number().describe("How much the others check it, 0 to 1"),
      standardised: z.number().nullable().describe("Residual over its own standard deviation"),
      wouldFit: z.number().nullable().describe("What it alone would have to read, mm"),
      detectable: z.number().nullable().describe("Smallest blunder that would show, mm"),
    }),
  ),
  criticalResidual: z.number().describe("A standardized residual above this is not chance"),
  suspect: z.boolean(),
  suggestions: z
    .array(
      z.strictObject({
        kind: z.string(),
        mark: z.string().nullable(),
        reading: z.number().nullable().describe("What the tape would read then, mm"),
        words: z.string(),
      }),
    )
    .describe("Known slips that would make all tapes meet; nothing is changed by itself"),
  advice: z.string().nullable(),
  notes: z.array(z.string()).describe("What is weak about where the marks lie"),
});

type Taped = { tie: Tie; words: string };

function tapedOf(body: z.output<typeof input>): Outcome<Taped[]> {
  const taped: Taped[] = [];
  for (const { mark, x, y, readings, sigma, markSigma } of body.ties) {
    const repeated = repeatedReadings(readings.map(mm), mm(sigma ?? body.sigma), body.unit);
    if (!repeated.ok) return repeated;
    const { mean, meanSigma, words } = repeated.value;
    taped.push({
      words,
      tie: { mark, at: floorPoint(x, y), distance: mean, sigma: meanSigma, markSigma: mm(markSigma ?? 0) },
    });
  }
  return ok(taped);
}

function run(body: z.output<typeof input>): Outcome<z.input<typeof output>> {
  const taped = tapedOf(body);
  if (!taped.ok) return taped;
  const ties = taped.value.map((one) => one.tie);
  const sigma = mm(body.sigma);
  const fit = pointFromTies(ties, body.side, sigma, body.unit);
  if (!fit.ok) return fit;
  const { coverage, unit } = body;
  const quality = dropQuality(ties, fit.value, body.side, sigma, { coverage, unit });
  return ok({
    x: fit.value.point.x,
    y: fit.value.point.y,
    redundancy: fit.value.redundancy,
    sigmaX: quality.along,
    sigmaY: quality.across,
    ellipse: quality.ellipse,
    ties: fit.value.residuals.map(
      ({ mark, residual, redundancyNumber, standardised, wouldFit: fits }, i) => ({
        mark,
        distance: ties[i]?.distance ?? 0,
        readings: taped.value[i]?.words ?? "",
        residual,
        redundancyNumber,
        standardised,
        wouldFit: fits,
        detectable: quality.detectable[i]?.bias ?? null,
      }),
    ),
    criticalResidual: quality.criticalResidual,
    suspect: fit.value.suspect,
    suggestions: fit.value.suggestions.map(({ kind, mark, reading, words }) => ({
      kind,
      mark,
      reading,
      words,
    })),
    advice: fit.value.advice,
    notes: quality.notes,
  });
}

export const dropsCalc = defineCalc({
  name: "drops",
  title: "A drop from tapes to control marks",
  summary:
    "Where a plumbed point lies on the floor from taped distances to two marks or more, by weighted least squares, with standard errors, error ellipse, residuals, what each tape alone would have to read, and the slips that would explain tapes that do not meet (data snooping after Baarda, 1968).",
  input,
  output,
  run,
  examples: DROPS_EXAMPLES,
});
