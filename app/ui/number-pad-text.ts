/*
 * What the keys of the number pad do to the entry, which stays text as on the tape: "23 13/16", "2' 2 1/2", or in
 * centimetres "67.3 cm". Pure; the meaning of the text is read elsewhere.
 */

export type PadUnit = "in" | "mm";
export type PadEntry = { feet: string; whole: string; numerator: number; denominator: number };

const EMPTY: PadEntry = { feet: "", whole: "", numerator: 0, denominator: 16 };
const MAX_DIGITS = 4;

/** The pieces of an inch entry; empty pieces for anything that the pad did not make. */
export function readPad(text: string): PadEntry {
  const match = /^\s*(?:(\d+)\s*['′]\s*)?(\d+(?!\s*\/))?\s*(?:(\d+)\s*\/\s*(\d+))?\s*$/.exec(text);
  if (!match) return EMPTY;
  const [, feet = "", whole = "", numerator, denominator] = match;
  return { feet, whole, numerator: Number(numerator ?? 0), denominator: Number(denominator ?? 16) };
}

function write({ feet, whole, numerator, denominator }: PadEntry): string {
  const fraction = numerator > 0 ? `${numerator}/${denominator}` : "";
  const rest = [whole, fraction].filter((part) => part !== "").join(" ");
  return feet === "" ? rest : `${feet}' ${rest}`.trimEnd();
}

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/** A digit goes to the whole inches; after a fraction it begins anew, since the reading was complete. */
export function typeDigit(text: string, digit: number, unit: PadUnit): string {
  if (unit === "mm") {
    const { whole, tenth } = readCm(text);
    return tenth !== null || whole.length >= MAX_DIGITS
      ? writeCm(String(digit), null)
      : writeCm(`${whole}${digit}`.replace(/^0+(?=\d)/, ""), null);
  }
  const entry = readPad(text);
  if (entry.numerator > 0) return write({ ...EMPTY, whole: String(digit) });
  if (entry.whole.length >= MAX_DIGITS) return text;
  return write({ ...entry, whole: `${entry.whole}${digit}`.replace(/^0+(?=\d)/, "") });
}

/** Sets the fraction alone; 0 takes it off. Reduced, as it is written on a tape. */
export function setFraction(text: string, steps: number, denominator: number): string {
  const entry = readPad(text);
  if (steps <= 0) return write({ ...entry, numerator: 0 });
  const common = gcd(steps, denominator);
  return write({ ...entry, numerator: steps / common, denominator: denominator / common });
}

/** How many steps of 1/denominator the entry's fraction is, rounded. */
export function fractionSteps(text: string, denominator: number): number {
  const entry = readPad(text);
  return Math.round((entry.numerator / entry.denominator) * denominator);
}

/** What was typed so far was feet. */
export function asFeet(text: string): string {
  const entry = readPad(text);
  if (entry.whole === "" || entry.feet !== "" || entry.numerator > 0) return text;
  return write({ ...EMPTY, feet: entry.whole });
}

/** Takes the last piece off: the fraction, then a digit, then the feet. An entry that is not the pad's goes whole. */
export function wipe(text: string, unit: PadUnit): string {
  if (unit === "mm") {
    const { whole, tenth } = readCm(text);
    return tenth !== null ? writeCm(whole, null) : writeCm(whole.slice(0, -1), null);
  }
  const entry = readPad(text);
  if (entry.numerator > 0) return write({ ...entry, numerator: 0 });
  if (entry.whole !== "") return write({ ...entry, whole: entry.whole.slice(0, -1) });
  return "";
}

function readCm(text: string): { whole: string; tenth: number | null } {
  const match = /^\s*(\d+)(?:\.(\d))?\s*(?:cm)?\s*$/.exec(text);
  if (!match) return { whole: "", tenth: null };
  return { whole: match[1] ?? "", tenth: match[2] === undefined ? null : Number(match[2]) };
}
const writeCm = (whole: string, tenth: number | null): string =>
  whole === "" && tenth === null
    ? ""
    : `${whole === "" ? "0" : whole}${tenth === null ? "" : `.${tenth}`} cm`;

/** Sets the tenths of a centimetre. */
export const setTenth = (text: string, tenth: number): string => writeCm(readCm(text).whole, tenth);
/** The tenth that is set; null when none is. */
export const tenthOf = (text: string): number | null => readCm(text).tenth;
/** The whole centimetres typed. */
export const wholeCm = (text: string): number => Number(readCm(text).whole || 0);
