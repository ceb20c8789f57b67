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
  return unit === "in" && length >= IN_FEET_FROM_MM
    ? formatFeet(value)
    : formatLength(value, unit, { decimals: 0 });
}

/** What is wrong with an entry, in a sentence; null when it will do. */
function faultOf(typed: string, unit: LengthUnit, { least, most, what }: LengthRange): string | null {
  const read = parseLength(typed, unit);
  if (!read.ok) return read.problem;
  if (read.value >= least && read.value <= most) return null;
  return `This reads ${inWords(read.value, unit)}. ${what} between ${inWords(least, unit)} and ${inWords(most, unit)}.`;
}

function entryOf(typed: string, unit: LengthUnit): TypedLength {
  const read = parseLength(typed, unit);
  return { mm: read.ok ? read.value : mm(0), typed };
}

const entry = () =>
  z
    .string({ error: "Type the length as on the tape." })
    .trim()
    .max(LONGEST_ENTRY, "That is too long for a length.");

/**
 * A length as typed on the tape, within what can be.
 * @param unit what a bare number means
 */
export const lengthEntry = (unit: LengthUnit, range: LengthRange) =>
  entry().transform((typed, ctx): TypedLength => {
    const message = faultOf(typed, unit, range);
    if (message !== null) ctx.addIssue({ code: "custom", message });
    return entryOf(typed, unit);
  });

/** The same, where nothing typed means that it was not given. */
export const optionalLength = (unit: LengthUnit, range: LengthRange) =>
  entry()
    .default("")
    .transform((typed, ctx): TypedLength | null => {
      if (typed === "") return null;
      const message = faultOf(typed, unit, range);
      if (message !== null) ctx.addIssue({ code: "custom", message });
      return entryOf(typed, unit);
    });
