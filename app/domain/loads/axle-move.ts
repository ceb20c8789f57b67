import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import type { AxleLoads } from "./load-transfer";

export type AxleMove = {
  /** Standing, newtons, before anything is moved. */
  loads: AxleLoads;
  wheelbase: Millimetres;
  /** How far each axle is moved forward on the frame; back is negative. */
  frontForward: Millimetres;
  rearForward: Millimetres;
  /** What is moved with each axle: axle, wheels, tyres, springs; newtons. 0 when it is not to be counted. */
  frontUnsprung?: number | undefined;
  rearUnsprung?: number | undefined;
};

/**
 * Axle loads after the axles are moved on the frame, the rest staying where it is: moments of the sprung weight about the new
 * axles, and each axle's own weight on itself.
 * Source: statics.
 * @returns newtons and the new wheelbase in millimetres; a problem when the axles would change places or an axle would be lifted
 * @example front 2400, rear 1600, wheelbase 100, front axle 5 forward // wheelbase 105, front 2285.71, rear 1714.29
 */
export function axleLoadsAfterMove(move: AxleMove): Outcome<AxleLoads & { wheelbase: Millimetres }> {
  const { loads, wheelbase, frontForward, rearForward, frontUnsprung = 0, rearUnsprung = 0 } = move;
  if (!(wheelbase > 0)) return problem("The wheelbase is more than nothing.");
  if (
    !(frontUnsprung >= 0 && rearUnsprung >= 0 && frontUnsprung <= loads.front && rearUnsprung <= loads.rear)
  )
    return problem("What is moved with an axle weighs no more than the axle carries on the floor.");
  const sprung = { front: loads.front - frontUnsprung, rear: loads.rear - rearUnsprung };
  const onBoth = sprung.front + sprung.rear;
  if (!(onBoth > 0)) return problem("The frame carries some weight.");
  const between = wheelbase + frontForward - rearForward;
  if (!(between > 0)) return problem("The axles would change places.");
  const behindFront = (sprung.rear / onBoth) * wheelbase + frontForward;
  const rear = (onBoth * behindFront) / between;
  const front = onBoth - rear;
  if (rear < 0 || front < 0)
    return problem(
      `The ${front < 0 ? "front" : "rear"} axle would be lifted: the weight lies beyond the other.`,
    );
  return ok({ front: front + frontUnsprung, rear: rear + rearUnsprung, wheelbase: mm(between) });
}
