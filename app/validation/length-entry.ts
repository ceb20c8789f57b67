import { z } from "zod";
import { formatFeet, formatLength, type LengthUnit, type Millimetres, mm } from "../domain/units/length";
import { parseLength } from "../domain/units/parse-length";

/** A length with the entry as it was typed. */
export type TypedLength = { mm: Millimetres; typed: string };

/** What a length may be, and how to name the thing measured: "A vehicle is". Millimetres, both ends included. */
export type LengthRange = { least: number; most: number; what: string };

const LONGEST_ENTRY = 40;
/** From here on a length is told in feet. */
const IN_FEET_FROM_MM = 1000;

function inWords(length: number, unit: LengthUnit): string {
  const value = mm(length);
  return unit === "in" && length >= IN_FEET_FROM_MM ? formatFeet(value) : formatLength(value, unit, { decimals: 0 });
}

/**
 * A length as typed on the tape, within what can be.
 * @param unit what a bare number means
 */
export const lengthEntry = (unit: LengthUnit, { least, most, what }: LengthRange) =>
  z
    .string({ error: "Type the length as on the tape." })
    .trim()
    .max(LONGEST_ENTRY, "That is too long for a length.")
    .transform((typed, ctx): TypedLength => {
      const read = parseLength(typed, unit);
      const fault = read.ok
        ? read.value < least || read.value > most
          ? `This reads ${inWords(read.value, unit)}. ${what} between ${inWords(least, unit)} and ${inWords(most, unit)}.`
          : null
        : read.problem;
      if (fault !== null) ctx.addIssue({ code: "custom", message: fault });
      return { mm: read.ok ? read.value : mm(0), typed };
    });

/** The same, where nothing typed means that it was not given. */
export const optionalLength = (unit: LengthUnit, range: LengthRange) =>
  z
    .string()
    .trim()
    .optional()
    .transform((typed) => (typed ? typed : null))
    .pipe(z.union([z.null(), lengthEntry(unit, range)]));
