import { type Outcome, ok, problem } from "../outcome";

export type SpringLoad = {
  /** What the spring carries at ride height, newtons. */
  load: number;
  /** The sprung weight on that wheel, newtons. */
  sprung: number;
};

/**
 * What a spring carries: the corner weight less what hangs outside the spring, over the motion ratio (spring travel by wheel
 * travel). On a leaf-sprung solid axle, both wheels moving alike, the ratio is 1.
 * Source: virtual work.
 * @param corner newtons on the scale under the wheel @param unsprung newtons of wheel, tyre, brake and half the axle and spring
 * @returns a problem when nothing is left over, or the ratio is not above 0
 * @example springLoad(4000, 600, 1) // 3400 N; with a motion ratio of 0.8, 4250 N
 */
export function springLoad(corner: number, unsprung: number, motionRatio = 1): Outcome<SpringLoad> {
  if (!(unsprung >= 0)) return problem("The unsprung weight is no less than nothing.");
  if (!(corner > unsprung)) return problem("The wheel weighs less than what hangs outside the spring.");
  if (!(motionRatio > 0)) return problem("The motion ratio is more than nothing.");
  return ok({ load: (corner - unsprung) / motionRatio, sprung: corner - unsprung });
}

/**
 * The rate at the wheel of a spring that moves at another rate than the wheel: k·(motion ratio)².
 * Source: virtual work, the ratio taken as constant.
 * @param springRate newtons per millimetre
 * @returns newtons per millimetre; a problem when a figure is not above 0
 * @example wheelRate(40, 0.8) // 25.6
 */
export function wheelRate(springRate: number, motionRatio: number): Outcome<number> {
  return springRate > 0 && motionRatio > 0
    ? ok(springRate * motionRatio * motionRatio)
    : problem("Spring rate and motion ratio are more than nothing.");
}
