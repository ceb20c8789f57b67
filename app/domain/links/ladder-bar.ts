import { type Outcome, ok, problem } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { type Degrees, toDegrees } from "../units/angle";
import type { Millimetres } from "../units/length";

/** An axle on ladder bars: each welded or bolted fast to the axle, with one pivot on the frame. */
export type LadderBar = { pivot: SidePoint; axle: SidePoint };

/**
 * The axle raised or lowered from ride height on ladder bars: it goes round the frame pivot, which is the instant centre all
 * along, and the pinion turns with the bars.
 * Source: geometry of a single link; common practice for the name.
 * @param rise of the axle's centre against the frame, millimetres, up positive
 * @returns the axle, and its turn since ride height, pinion nose up positive; a problem when the bars are too short, or their
 * pivot is on the axle's centre or straight above or below it
 * @example pivot (900, 350), axle (0, 350), raised 100 // station 5.5729 mm ahead, turned 6.3794° nose down
 */
export function ladderBarAtRise(
  { pivot, axle }: LadderBar,
  rise: Millimetres,
): Outcome<{ axle: SidePoint; turn: Degrees }> {
  const [ahead, up] = [axle.station - pivot.station, axle.height - pivot.height];
  const radius = Math.hypot(ahead, up);
  if (radius === 0) return problem("The ladder bar's pivot is on the axle's centre.");
  if (ahead === 0) return problem("The ladder bar stands upright: the axle cannot move up or down.");
  const raised = up + rise;
  if (Math.abs(raised) >= radius) return problem("The ladder bars are too short for so much travel.");
  const along = Math.sign(ahead) * Math.sqrt(radius * radius - raised * raised);
  const turn = Math.atan2(ahead * raised - up * along, ahead * along + up * raised);
  return ok({
    axle: sidePoint(pivot.station + along, pivot.height + raised),
    turn: toDegrees(turn),
  });
}
