import { type Outcome, ok, problem } from "../outcome";
import type { SidePoint } from "../springs/leaf-travel";
import { toRadians } from "../units/angle";
import type { Millimetres } from "../units/length";
import type { InstantCentre } from "./instant-centre";

export type AntiSquatSetting = {
  /** Where the driven rear tyre stands on the ground: under the axle's centre. */
  contact: SidePoint;
  /** The whole vehicle's centre of gravity above the ground. */
  cgHeight: Millimetres;
  wheelbase: Millimetres;
};

/** A centre nearer to upright over the tyre than this has no slope, mm (ours, no source). */
const UPRIGHT = 1e-6;

/**
 * The slope of the line from the driven tyre's contact to the instant centre, rise over run: the share of the thrust that
 * the links push up into the frame. Parallel links: their own slope, which is the limit.
 * @returns rise over run, up and forward positive; a problem when the centre stands straight over the contact
 * @example contact (0, 0), centre (60, 13) // 0.216667
 */
export function thrustSlope(centre: InstantCentre, contact: SidePoint): Outcome<number> {
  if (centre.kind === "parallel") {
    return Math.abs(centre.slope) > 90 - UPRIGHT
      ? problem("The links stand upright: they carry no thrust.")
      : ok(Math.tan(toRadians(centre.slope)));
  }
  const run = centre.point.station - contact.station;
  return Math.abs(run) < UPRIGHT
    ? problem("The links meet straight above the tyre's contact: they carry no thrust.")
    : ok((centre.point.height - contact.height) / run);
}

/**
 * Anti-squat of a driven solid rear axle whose links take the drive torque, in percent: how much of the load that goes to the
 * rear axle under power the links carry instead of the springs. 100 × (slope of contact to instant centre)/(CG height/wheelbase),
 * all four in the side view, station forward, height up, contact as the origin. At 100 the rear neither squats nor rises; over
 * 100 it rises. Only the rear axle drives; the springs stand over the axle.
 * Source: Gillespie, Fundamentals of Vehicle Dynamics, chapter 7, and Milliken & Milliken, Race Car Vehicle Dynamics,
 * chapter 17 (both from memory).
 * @returns percent, negative for pro-squat; a problem as thrustSlope, or when CG height or wheelbase is not above 0
 * @example in inches: centre (60, 13), CG 24 high, wheelbase 108 // 97.5
 */
export function antiSquat(centre: InstantCentre, setting: AntiSquatSetting): Outcome<number> {
  if (!(setting.cgHeight > 0)) return problem("The centre of gravity lies above the ground.");
  if (!(setting.wheelbase > 0)) return problem("The wheelbase is more than nothing.");
  const slope = thrustSlope(centre, setting.contact);
  return slope.ok ? ok((100 * slope.value * setting.wheelbase) / setting.cgHeight) : slope;
}
