import {
  formatInches,
  formatLength,
  type LengthUnit,
  type Millimetres,
  MM_PER_INCH,
  mm,
} from "../units/length";
import { type AsBuilt, SQUARE_TOLERANCE } from "./square";

/** What to do with one end of the axle, or with all of it. */
export type AxleMove = {
  what: "left end" | "right end" | "axle";
  way: "ahead" | "back" | "to the left" | "to the right";
  distance: Millimetres;
  words: string;
};

export type SquareVerdict = { isTrue: boolean; headline: string; moves: AxleMove[] };

/** Distances below half of this are not spoken of. */
const SPOKEN: Record<LengthUnit, number> = { in: MM_PER_INCH / 16, mm: 1 };

/**
 * The verdict after tacking, in words, with what to move: an end that is out by more than the tolerance goes back to
 * its line; where only the one end against the other is out, the worse end goes. Nothing is moved when all is true.
 * @param unit what lengths are said in
 * @example squareVerdict(asBuilt).moves[0].words // "Move the left end ahead 3/16 in."
 */
export function squareVerdict(
  built: AsBuilt,
  tolerance: Millimetres = SQUARE_TOLERANCE,
  unit: LengthUnit = "in",
): SquareVerdict {
  const size = (value: number) =>
    unit === "in" ? `${formatInches(mm(Math.abs(value)))} in` : formatLength(mm(Math.abs(value)), "mm");
  const said = (value: number) => Math.abs(value) >= SPOKEN[unit] / 2;
  const along = (value: number, end: string) =>
    said(value) ? `${end} ${size(value)} ${value > 0 ? "ahead" : "back"}` : `${end} on the line`;
  const aside = said(built.sideways)
    ? `, ${size(built.sideways)} to the ${built.sideways > 0 ? "left" : "right"}`
    : "";
  const begin = built.isTrue
    ? `True within ${size(tolerance)}`
    : Math.abs(built.outOfSquare) > tolerance
      ? `Out of square by ${size(built.outOfSquare)}`
      : "Square, but not where it was meant to be";
  return {
    isTrue: built.isTrue,
    headline: `${begin}: ${along(built.leftAhead, "left end")}, ${along(built.rightAhead, "right end")}${aside}.`,
    moves: built.isTrue ? [] : movesFor(built, tolerance, size),
  };
}

function movesFor(built: AsBuilt, tolerance: number, size: (value: number) => string): AxleMove[] {
  const moves: AxleMove[] = [];
  const add = (what: AxleMove["what"], way: AxleMove["way"], by: number) =>
    moves.push({
      what,
      way,
      distance: mm(Math.abs(by)),
      words: `Move the ${what} ${what === "axle" ? `${size(by)} ${way}` : `${way} ${size(by)}`}.`,
    });
  const { leftAhead, rightAhead, sideways } = built;
  const ends = [{ what: "left end", by: leftAhead } as const, { what: "right end", by: rightAhead } as const];
  const out = ends.filter((end) => Math.abs(end.by) > tolerance);
  const worse = Math.abs(leftAhead) >= Math.abs(rightAhead) ? ends.slice(0, 1) : ends.slice(1);
  const outOfSquare = Math.abs(built.outOfSquare) > tolerance;
  for (const { what, by } of out.length > 0 ? out : outOfSquare ? worse : [])
    add(what, by > 0 ? "back" : "ahead", by);
  if (Math.abs(sideways) > tolerance) add("axle", sideways > 0 ? "to the right" : "to the left", sideways);
  return moves;
}
