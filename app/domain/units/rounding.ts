import { type Millimetres, mm } from "./millimetres";

/**
 * What becomes of a length that lies half way between two marks of the tape. `away-from-zero` is what people do at the
 * tape (common practice, no source) and the default; `to-even` is rule A of ISO 80000-1 and of ASTM E29 (from memory).
 */
export type Ties = "away-from-zero" | "to-even";
export const USUAL_TIES: Ties = "away-from-zero";

/**
 * The nearest whole number, by a rule for what lies half way.
 * @param value 0 or more
 * @example nearestWhole(2.5, "to-even") // 2
 */
export function nearestWhole(value: number, ties: Ties = USUAL_TIES): number {
  const below = Math.floor(value);
  if (value - below !== 0.5 || ties === "away-from-zero") return Math.round(value);
  return below % 2 === 0 ? below : below + 1;
}

/**
 * The nearest whole number of steps in a size that was itself worked out: its last figures are the machine's, so that
 * 26 1/8 in, kept in millimetres, would otherwise lie half way today and just below it tomorrow.
 * @param size 0 or more, in steps
 * @example nearestStep(2612.4999999996) // 2613: half way but for the machine's last figures
 */
export function nearestStep(size: number, ties: Ties = USUAL_TIES): number {
  // A millionth of a step is far below any tape, and above what a double loses in any shop's lengths.
  return nearestWhole(Number(size.toFixed(6)), ties);
}

/**
 * A number with so many decimals, by a rule for what lies half way; no minus on a zero.
 * @param places 0 to 6
 * @example decimals(-26.125, 2, "to-even") // { sign: "−", size: "26.12" }
 */
export function decimals(
  value: number,
  places: number,
  ties: Ties = USUAL_TIES,
): { sign: "" | "−"; size: string } {
  const scale = 10 ** places;
  const steps = nearestStep(Math.abs(value) * scale, ties);
  return { sign: value < 0 && steps > 0 ? "−" : "", size: (steps / scale).toFixed(places) };
}

/**
 * A length to the nearest mark: of 1/16 in, of 1 mm, whatever the step is.
 * @throws RangeError when the step is not above nothing
 * @example roundToStep(inches(12.53125), inches(1 / 16)) // 12 9/16 in
 */
export function roundToStep(length: Millimetres, step: Millimetres, ties: Ties = USUAL_TIES): Millimetres {
  if (!(step > 0)) throw new RangeError(`${step} mm is not a step`);
  const size = nearestStep(Math.abs(length) / step, ties) * step;
  return mm(length < 0 && size > 0 ? -size : size);
}
