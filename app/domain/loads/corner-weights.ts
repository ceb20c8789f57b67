import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";

/** What the scale under each wheel shows, newtons, the vehicle standing level. */
export type CornerWeights = {
  leftFront: number;
  rightFront: number;
  leftRear: number;
  rightRear: number;
};
export type AxlePlan = { wheelbase: Millimetres; frontTrack: Millimetres; rearTrack: Millimetres };

export type WeightPlace = {
  /** Newtons. */
  weight: number;
  frontAxle: number;
  rearAxle: number;
  /** Shares of the weight, 0 to 1. */
  frontShare: number;
  leftShare: number;
  /** Left front and right rear together. */
  crossShare: number;
  /** Centre of gravity behind the front axle. */
  behindFront: Millimetres;
  /** Centre of gravity left of the centre line, right negative. */
  leftOfCentre: Millimetres;
};

/**
 * Where the centre of gravity lies seen from above: moments of the four wheels about the front axle and the centre line. The
 * middle of both tracks is on the centre line.
 * Source: statics.
 * @param corners newtons @param plan millimetres
 * @returns a problem when a wheel shows less than nothing, none shows anything, or a length is not above 0
 * @example 3000, 3000, 2000, 2000 N, wheelbase 2800 // 1120 behind the front axle, 0 to the left
 */
export function weightPlace(corners: CornerWeights, plan: AxlePlan): Outcome<WeightPlace> {
  const { leftFront, rightFront, leftRear, rightRear } = corners;
  if (Math.min(leftFront, rightFront, leftRear, rightRear) < 0)
    return problem("No wheel weighs less than nothing.");
  if (!(Math.min(plan.wheelbase, plan.frontTrack, plan.rearTrack) > 0))
    return problem("Wheelbase and tracks are more than nothing.");
  const [frontAxle, rearAxle] = [leftFront + rightFront, leftRear + rightRear];
  const weight = frontAxle + rearAxle;
  if (!(weight > 0)) return problem("No wheel shows any weight.");
  const toLeft = ((leftFront - rightFront) * plan.frontTrack + (leftRear - rightRear) * plan.rearTrack) / 2;
  return ok({
    weight,
    frontAxle,
    rearAxle,
    frontShare: frontAxle / weight,
    leftShare: (leftFront + leftRear) / weight,
    crossShare: (leftFront + rightRear) / weight,
    behindFront: mm((rearAxle / weight) * plan.wheelbase),
    leftOfCentre: mm(toLeft / weight),
  });
}
