import { type LengthUnit, type Millimetres, toInches } from "./millimetres";
import { decimals, nearestStep, type Ties, USUAL_TIES } from "./rounding";

export { inches, type LengthUnit, type Millimetres, MM_PER_INCH, mm, toInches } from "./millimetres";
export { parseLength } from "./parse-length";
export { nearestWhole, roundToStep, type Ties } from "./rounding";

const INCHES_PER_FOOT = 12;

export type Denominator = 16 | 32 | 64;
export type InchParts = { sign: "" | "−"; whole: number; numerator: number; denominator: number };

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/**
 * A length as whole inches and a reduced fraction, to the nearest 1/denominator.
 * @param length millimetres
 * @param ties what lies half way goes away from zero unless told
 * @returns numerator 0 (and denominator 1) when there is no fraction; no sign on zero
 * @example inchParts(inches(12.53125), 16) // 12 9/16; to even: 12 1/2
 */
export function inchParts(length: Millimetres, denominator: number = 16, ties: Ties = USUAL_TIES): InchParts {
  const steps = nearestStep(Math.abs(toInches(length)) * denominator, ties);
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

/**
 * "19 ft 2 in", "18 ft", "11 1/2 in" under a foot; to the nearest inch unless a denominator is given.
 * @example formatFeet(inches(14.5), 2) // "1 ft 2 1/2 in"
 */
export function formatFeet(length: Millimetres, denominator: number = 1, ties: Ties = USUAL_TIES): string {
  const parts = inchParts(length, denominator, ties);
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

/**
 * "673 mm", "12.7 mm" with one decimal; halves away from zero unless told.
 * @example formatMillimetres(mm(12.65), 1) // "12.7 mm"; to even "12.6 mm"
 */
export function formatMillimetres(length: Millimetres, places = 0, ties: Ties = USUAL_TIES): string {
  const { sign, size } = decimals(length, places, ties);
  return `${sign}${size} mm`;
}

/**
 * "67.3 cm": one decimal, a millimetre, unless told; halves away from zero unless told.
 * @example formatCentimetres(inches(26.5)) // "67.3 cm"
 */
export function formatCentimetres(length: Millimetres, places = 1, ties: Ties = USUAL_TIES): string {
  const { sign, size } = decimals(length / 10, places, ties);
  return `${sign}${size} cm`;
}

/**
 * "46.50": inches with a fixed number of decimals, without the unit; a true minus sign; halves away from zero unless
 * told.
 * @example formatDecimalInches(inches(26.125)) // "26.13"; to even "26.12"
 */
export function formatDecimalInches(length: Millimetres, places = 2, ties: Ties = USUAL_TIES): string {
  const { sign, size } = decimals(toInches(length), places, ties);
  return `${sign}${size}`;
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
