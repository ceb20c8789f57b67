import { distance } from "../geometry/point";
import { type Outcome, ok } from "../outcome";
import { formatInches, formatLength, inches, type LengthUnit, type Millimetres, mm } from "../units/length";
import { type DatumPairs, frameFromDatums } from "./frame";

/** How far a frame's diagonals may differ before it is called racked. Common practice, no source. */
export const DIAGONAL_TOLERANCE = inches(1 / 8);

export type FrameSquare = {
  /** Between the datums of each pair, and along each rail. */
  frontWidth: Millimetres;
  rearWidth: Millimetres;
  leftLength: Millimetres;
  rightLength: Millimetres;
  /** From front left to rear right, from front right to rear left, and the first minus the second. */
  leftDiagonal: Millimetres;
  rightDiagonal: Millimetres;
  difference: Millimetres;
  isSquare: boolean;
  words: string;
};

/**
 * Is the frame itself square? From its four datum drops: widths, rails, and the two diagonals, which are alike in a
 * frame whose left and right mirror each other. Source: plane geometry; the tolerance is common practice.
 * @returns a problem as frameFromDatums
 * @example frameSquare(pairs).value.words // "The diagonals are alike within 1/8 in."
 */
export function frameSquare(
  pairs: DatumPairs,
  tolerance: Millimetres = DIAGONAL_TOLERANCE,
  unit: LengthUnit = "in",
): Outcome<FrameSquare> {
  const frame = frameFromDatums(pairs);
  if (!frame.ok) return frame;
  const { frontLeft, frontRight, rearLeft, rearRight } = pairs;
  const [leftDiagonal, rightDiagonal] = [distance(frontLeft, rearRight), distance(frontRight, rearLeft)];
  const difference = mm(leftDiagonal - rightDiagonal);
  const isSquare = Math.abs(difference) <= tolerance + 1e-9;
  const size = (value: number) =>
    unit === "in" ? `${formatInches(mm(Math.abs(value)))} in` : formatLength(mm(Math.abs(value)), "mm");
  const ahead = difference > 0 ? "left" : "right";
  return ok({
    frontWidth: distance(frontLeft, frontRight),
    rearWidth: distance(rearLeft, rearRight),
    leftLength: distance(frontLeft, rearLeft),
    rightLength: distance(frontRight, rearRight),
    leftDiagonal,
    rightDiagonal,
    difference,
    isSquare,
    words: isSquare
      ? `The diagonals are alike within ${size(tolerance)}.`
      : `The diagonals differ by ${size(difference)}: the ${ahead} rail stands ahead, or a datum was dropped wrong.`,
  });
}
