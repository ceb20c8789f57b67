import { distance, type FloorPoint, floorPoint } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import type { LengthUnit, Millimetres } from "../units/length";
import { type Suggestion, suggestBlunders } from "./blunders";
import type { DropSide } from "./drop-points";
import {
  type Adjusted,
  adjustTies,
  type Ellipse,
  ellipseOf,
  isOnSide,
  isSuspect,
  type Tie,
  type TieResidual,
} from "./tie-fit";

export type { Suggestion } from "./blunders";
export {
  DROP_POINTS,
  DROP_SIDES,
  DROPS_NEEDED,
  type DropPoint,
  type DropPointId,
  type DropSide,
  dropPoint,
} from "./drop-points";
export { CRITICAL_W, type Ellipse, ellipseOf, type Tie, type TieResidual } from "./tie-fit";

/**
 * A drop measured square to the A–B line.
 * @param reading station from A along the line; offset without a sign, the side says which way
 * @returns a problem when the offset is negative
 * @example pointFromOffset({ station: mm(1000), offset: mm(300), side: "right" }) // (1000, −300)
 */
export function pointFromOffset(reading: {
  station: Millimetres;
  offset: Millimetres;
  side: DropSide;
}): Outcome<FloorPoint> {
  const { station, offset, side } = reading;
  if (side === "centre") return ok(floorPoint(station, offset));
  if (offset < 0) return problem("The offset is typed without a sign: left or right says which way.");
  return ok(floorPoint(station, side === "left" ? offset : -offset));
}

export type TieFit = Omit<Adjusted, "residuals"> & {
  /** False with two tapes: nothing would show a blunder. */
  checked: boolean;
  residuals: TieResidual[];
  ellipse: Ellipse;
  /** The tapes disagree beyond chance, with each other or with the side that was named. */
  suspect: boolean;
  /** Blunders that would explain it. Nothing is ever changed by itself. */
  suggestions: Suggestion[];
  /** What to do, in a sentence; null when all is well. */
  advice: string | null;
};

/**
 * A drop from taped distances to two control marks or more.
 * Two tapes give the point on the side that is named, with nothing to check it. Three or more are adjusted; with one
 * spare tape a blunder is seen but not located (all standardized residuals are alike), so each tape is asked what it
 * alone would have to read.
 * @param sigma standard uncertainty of one tape
 * @returns a problem when tapes do not reach each other, one is not above zero, or a mark is named twice
 * @example pointFromTies(ties, "right", mm(0.8)).value.point // (43.2, −57.6) in from 72 and 96 in, marks 120 in apart
 */
export function pointFromTies(
  ties: readonly Tie[],
  side: Exclude<DropSide, "centre">,
  sigma: Millimetres,
  unit: LengthUnit = "in",
): Outcome<TieFit> {
  if (!(sigma > 0)) throw new RangeError(`${sigma} is not an uncertainty`);
  if (ties.length < 2) return problem("Tape from two marks at least; a third checks the other two.");
  for (const [i, tie] of ties.entries()) {
    if (!(tie.distance > 0)) return problem(`The tape from ${tie.mark} has to be longer than nothing.`);
    if (ties.slice(0, i).some((other) => other.mark === tie.mark))
      return problem(`Mark ${tie.mark} is there twice.`);
  }
  const sign = side === "left" ? 1 : -1;
  const fit = adjustTies(ties, sign, sigma, unit);
  if (!fit.ok) return fit;
  const checked = fit.value.redundancy > 0;
  const suspect = isSuspect(fit.value) || !isOnSide(fit.value, sign);
  const suggestions = suspect ? suggestBlunders(ties, sign, sigma, unit) : [];
  return ok({
    ...fit.value,
    checked,
    suspect,
    suggestions,
    ellipse: ellipseOf(fit.value.covariance),
    residuals: fit.value.residuals.map((residual, i) => ({
      ...residual,
      wouldFit: checked ? wouldFit(ties, i, sign, sigma) : null,
    })),
    advice: advise(checked, suspect, suggestions),
  });
}

/** What the tape would read if the others alone were right; null when they do not meet. */
function wouldFit(ties: readonly Tie[], index: number, side: 1 | -1, sigma: Millimetres): Millimetres | null {
  const tie = ties[index];
  const others = ties.filter((_, i) => i !== index);
  const fit = adjustTies(others, side, sigma);
  return tie && fit.ok ? distance(fit.value.point, tie.at) : null;
}

function advise(checked: boolean, suspect: boolean, suggestions: readonly Suggestion[]): string | null {
  if (!checked) return "Two tapes: nothing checks this point. A third would.";
  if (!suspect) return null;
  const [first] = suggestions;
  if (!first) return "The tapes do not meet, and no usual slip explains it: tape all of them again.";
  const places = new Set(suggestions.map((suggestion) => suggestion.mark ?? suggestion.kind));
  return places.size > 1
    ? "More than one slip would explain it: tape them again."
    : `${first.words} Tape it again, or keep it with that reason.`;
}
