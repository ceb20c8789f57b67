import { type LengthUnit, type Millimetres, toInches } from "./millimetres";

export { inches, type LengthUnit, type Millimetres, MM_PER_INCH, mm, toInches } from "./millimetres";
export { parseLength } from "./parse-length";

const INCHES_PER_FOOT = 12;

export type Denominator = 16 | 32 | 64;
export type InchParts = { sign: "" | "−"; whole: number; numerator: number; denominator: number };

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/**
 * What becomes of a length that lies half way between two marks of the tape. `away-from-zero` is what people do at the
 * tape (common practice, no source) and the default; `to-even` is rule A of ISO 80000-1 and of ASTM E29 (from memory).
 */
export type Ties = "away-from-zero" | "to-even";

/**
 * The nearest whole number, by a rule for what lies half way.
 * @param value 0 or more
 * @example nearestWhole(2.5, "to-even") // 2
 */
export function nearestWhole(value: number, ties: Ties = "away-from-zero"): number {
  const below = Math.floor(value);
  if (value - below !== 0.5 || ties === "away-from-zero") return Math.round(value);
  return below % 2 === 0 ? below : below + 1;
}

/**
 * A length as whole inches and a reduced fraction, to the nearest 1/denominator.
 * @param length millimetres
 * @param ties what lies half way goes away from zero unless told
 * @returns numerator 0 (and denominator 1) when there is no fraction; no sign on zero
 * @example inchParts(inches(12.53125), 16) // 12 9/16; to even: 12 1/2
 */
export function inchParts(
  length: Millimetres,
  denominator: number = 16,
  ties: Ties = "away-from-zero",
): InchParts {
  // Six decimals of an inch are far below any tape; without them 1/64 stored as a decimal could fall just short of a half.
  const steps = nearestWhole(Number((Math.abs(toInches(length)) * denominator).toFixed(6)), ties);
  const whole = Math.floor(steps / denominator);
  const over = steps - whole * denominator;
  const common = over === 0 ? denominator : gcd(over, denominator);
  return {
    sign: length < 0 && steps > 0 ? "−" : "",
    whole,
    numerator: over / common,
    denominator: denominator / common,
  };
}

/** "26 1/2", "−1/8", "0": to the nearest 1/denominator (16 unless told), halves away from zero unless told; with `sign` also "+1/8". */
export function formatInches(
  length: Millimetres,
  options: { denominator?: Denominator; sign?: boolean; ties?: Ties } = {},
): string {
  const { sign, whole, numerator, denominator } = inchParts(length, options.denominator ?? 16, options.ties);
  const plus = options.sign && sign === "" && (whole > 0 || numerator > 0) ? "+" : "";
  const fraction = numerator === 0 ? "" : `${numerator}/${denominator}`;
  const size =
    whole === 0 && fraction !== "" ? fraction : fraction === "" ? String(whole) : `${whole} ${fraction}`;
  return `${sign || plus}${size}`;
}

/** "19 ft 2 in", "18 ft", "11 1/2 in" under a foot; to the nearest inch unless a denominator is given. */
export function formatFeet(length: Millimetres, denominator: number = 1): string {
  const parts = inchParts(length, denominator);
  const feet = Math.floor(parts.whole / INCHES_PER_FOOT);
  const rest = parts.whole - feet * INCHES_PER_FOOT;
  const fraction = parts.numerator === 0 ? "" : `${parts.numerator}/${parts.denominator}`;
  const inchesPart = [rest === 0 && fraction !== "" ? "" : String(rest), fraction]
    .filter((part) => part !== "")
    .join(" ");
  if (feet === 0) return `${parts.sign}${inchesPart} in`;
  return rest === 0 && fraction === ""
    ? `${parts.sign}${feet} ft`
    : `${parts.sign}${feet} ft ${inchesPart} in`;
}

/** "673 mm", "12.7 mm" with one decimal. */
export function formatMillimetres(length: Millimetres, decimals = 0): string {
  const size = Math.abs(length).toFixed(decimals);
  return `${length < 0 && Number(size) !== 0 ? "−" : ""}${size} mm`;
}

/** "46.50": inches with a fixed number of decimals, without the unit; a true minus sign. */
export function formatDecimalInches(length: Millimetres, places = 2): string {
  const size = Math.abs(toInches(length)).toFixed(places);
  return `${length < 0 && Number(size) !== 0 ? "−" : ""}${size}`;
}

/** A length in a person's unit, with it: "26 1/2 in" or "673 mm". */
export function formatLength(
  length: Millimetres,
  unit: LengthUnit,
  options: { denominator?: Denominator; sign?: boolean; decimals?: number } = {},
): string {
  return unit === "in"
    ? `${formatInches(length, options)} in`
    : formatMillimetres(length, options.decimals ?? 1);
}
