import type { FloorPoint } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";
import type { AxleLine } from "./axle-line";
import { pointFromOffset } from "./drops";
import { type Frame, toFrame } from "./frame";
import { type AsBuilt, type AxleEnds, compareAsBuilt, SQUARE_TOLERANCE } from "./square";
import { type SquareVerdict, squareVerdict } from "./square-words";

/** One axle end as it is read off the floor: along the line from A, and off it to its own side. */
export type EndReading = { station: Millimetres; offset: Millimetres };
export type TackReading = { left: EndReading; right: EndReading };

export type TackCheck = {
  /** On the floor and on the frame. */
  floor: { left: FloorPoint; right: FloorPoint };
  ends: AxleEnds;
  built: AsBuilt;
  verdict: SquareVerdict;
};

/** Further from its line than this no tacked axle stands: something else was read. */
const FURTHEST = mm(600);
/** A tape hooked at its first inch is out by one inch, give or take this. */
const INCH_WITHIN = mm(25.4 / 16);

/** The line that was signed: laid the way that was chosen, through the station of the option. */
export const signedLine = (line: AxleLine, axleStation: Millimetres): AxleLine => ({
  ...line,
  station: axleStation,
});

/**
 * Both ends of the tacked axle, as they are read off the floor, against the axle line that was signed. The same on the
 * screen before anything is kept and in the shop that keeps it.
 * @returns a problem when an entry has a sign, the ends are swapped, or they lie nowhere near the line
 */
export function checkTack(
  frame: Frame,
  wanted: AxleLine,
  reading: TackReading,
  options: { tolerance?: Millimetres; unit?: LengthUnit } = {},
): Outcome<TackCheck> {
  const { tolerance = SQUARE_TOLERANCE, unit = "in" } = options;
  const left = pointFromOffset({ ...reading.left, side: "left" });
  if (!left.ok) return left;
  const right = pointFromOffset({ ...reading.right, side: "right" });
  if (!right.ok) return right;
  const ends = { left: toFrame(frame, left.value), right: toFrame(frame, right.value) };
  const built = compareAsBuilt(ends, wanted, { tolerance });
  if (!built.ok) return built;
  const worst = Math.max(Math.abs(built.value.leftAhead), Math.abs(built.value.rightAhead));
  if (worst > FURTHEST)
    return problem(
      `That is ${formatLength(mm(worst), unit)} from the axle line: were both ends read from mark A?`,
    );
  return ok({
    floor: { left: left.value, right: right.value },
    ends,
    built: built.value,
    verdict: squareVerdict(built.value, tolerance, unit),
  });
}

/** An end that is out by an inch, and nothing else: the tape may have been hooked at its first inch. Null: no such end. */
export function burntInch({ leftAhead, rightAhead }: AsBuilt): string | null {
  const ends = [
    ["left", leftAhead, rightAhead],
    ["right", rightAhead, leftAhead],
  ] as const;
  const found = ends.find(
    ([, own, other]) => Math.abs(Math.abs(own) - 25.4) <= INCH_WITHIN && Math.abs(other) <= SQUARE_TOLERANCE,
  );
  return found ? `The ${found[0]} end is out by an inch: was the tape hooked at the inch mark?` : null;
}
