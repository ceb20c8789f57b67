import { z } from "zod";
import { type LengthUnit, type Millimetres, parseLength } from "../domain/units/length";

/** A length as typed on the tape: answers the millimetres, or says what is wrong with the entry. */
export const typedLength = (unit: LengthUnit, limits: { min?: number; max?: number; words?: string } = {}) =>
  z.string().transform((text, ctx): Millimetres => {
    const parsed = parseLength(text, unit);
    if (!parsed.ok) {
      ctx.addIssue({ code: "custom", message: parsed.problem });
      return z.NEVER;
    }
    const { min = Number.NEGATIVE_INFINITY, max = Number.POSITIVE_INFINITY } = limits;
    if (parsed.value < min || parsed.value > max) {
      ctx.addIssue({ code: "custom", message: limits.words ?? "That is outside what can be right here." });
      return z.NEVER;
    }
    return parsed.value;
  });

const decimal = (label: string, min: number, max: number) =>
  z
    .string()
    .trim()
    .transform((text, ctx) => {
      const value = Number(text.replace(",", "."));
      if (text === "" || !Number.isFinite(value) || value < min || value > max) {
        ctx.addIssue({ code: "custom", message: `${label} is a number from ${min} to ${max}.` });
        return z.NEVER;
      }
      return value;
    });

export const isTimeZone = (name: string): boolean => {
  try {
    new Intl.DateTimeFormat("en", { timeZone: name });
    return true;
  } catch {
    return false;
  }
};

export const SetupForm = (unit: LengthUnit) =>
  z.object({
    name: z.string().trim().min(1, "The shop needs a name.").max(80, "Keep the name under 80 letters."),
    timeZone: z.string().trim().refine(isTimeZone, "That is not a time zone. For example: America/Boise."),
    unit: z.enum(["in", "mm"], "Choose inches or millimetres."),
    allowedSlopeDeg: decimal("The slope allowed", 0.01, 1),
    shim: typedLength(unit, { min: 0.1, max: 51, words: "A shim is between 0.1 mm and 2 in." }),
    redropTolerance: typedLength(unit, { min: 0.1, max: 26, words: "Between 0.1 mm and 1 in." }),
    markTolerance: typedLength(unit, { min: 0.1, max: 26, words: "Between 0.1 mm and 1 in." }),
    tapeSigma: typedLength(unit, { min: 0.05, max: 13, words: "Between 0.05 mm and 1/2 in." }),
    dropSigma: typedLength(unit, { min: 0.05, max: 13, words: "Between 0.05 mm and 1/2 in." }),
    springSigma: typedLength(unit, { min: 0.05, max: 13, words: "Between 0.05 mm and 1/2 in." }),
  });

export const PairForm = z.object({
  code: z.string().trim().min(1, "Type the code that the display shows."),
  name: z
    .string()
    .trim()
    .min(1, "Give the display a name, such as Wall by the door.")
    .max(60, "Keep it under 60 letters."),
  kind: z.enum(["wall", "post"], "Choose what it is."),
});

export const TokenForm = z.object({
  name: z
    .string()
    .trim()
    .min(1, "Give the token a name: the program that will use it.")
    .max(60, "Keep it under 60 letters."),
});
