import type { z } from "zod";
import type { Outcome } from "../domain/outcome";

/**
 * One calculation that can be asked for from outside: by the API, on the command line and from our own screens, always
 * with the same schema. Lengths are millimetres, angles degrees, forces newtons, unless a field's description says else.
 */
export type Calc<I extends z.ZodType = z.ZodType, O extends z.ZodType = z.ZodType> = {
  /** Last part of the address: /api/v1/calc/<name>. */
  name: string;
  title: string;
  /** What it answers, in a sentence or two, with the source of the sums. */
  summary: string;
  input: I;
  output: O;
  /** @returns the answer, or why the figures given have none, in a sentence */
  run: (input: z.output<I>) => Outcome<z.input<O>>;
  /** Worked examples: shown on the page of the API, run as tests. Numbers are compared to 6 significant figures. */
  examples: { title: string; input: z.input<I>; output: z.input<O> }[];
  /** Said on the page and in every answer where the work can hurt someone. */
  cautions?: string[];
};

/** Ties the types of the schemas to those of the sum. */
export const defineCalc = <I extends z.ZodType, O extends z.ZodType>(calc: Calc<I, O>): Calc<I, O> => calc;
