import { type Outcome, ok, problem } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import type { SideLink } from "./side-link";

/** Where an axle turns about for the moment: a point, or infinitely far off along a slope where the links are parallel. */
export type InstantCentre =
  | { kind: "point"; point: SidePoint }
  /** Degrees to the level, rising forward positive. */
  | { kind: "parallel"; slope: Degrees };

/** Links closer to parallel than this sine are parallel: the centre would be more than 1000 km away (ours, no source). */
export const PARALLEL = 1e-9;

/**
 * The instant centre in side view: where the lines of the lower and the upper link meet.
 * Source: Gillespie, Fundamentals of Vehicle Dynamics, chapter 7; Milliken & Milliken, Race Car Vehicle Dynamics,
 * chapter 17 (both from memory); the theorem of three centres for a four-bar linkage.
 * @returns millimetres in the frame of the links; `parallel` with their slope; a problem when both lie in one line, which
 * leaves the axle free to turn
 * @example in inches: lower (0, 8) to (24, 10), upper (0, 16) to (20, 15) // (60, 13)
 */
export function instantCentre(lower: SideLink, upper: SideLink): Outcome<InstantCentre> {
  const [a, b] = [along(lower), along(upper)];
  const cross = a.station * b.height - a.height * b.station;
  const apart = {
    station: upper.axle.station - lower.axle.station,
    height: upper.axle.height - lower.axle.height,
  };
  if (Math.abs(cross) < PARALLEL) {
    const offLine = apart.station * a.height - apart.height * a.station;
    if (Math.abs(offLine) < PARALLEL * Math.max(1, Math.hypot(apart.station, apart.height)))
      return problem("Both links lie in one line: they leave the axle free to turn.");
    return ok({ kind: "parallel", slope: forwardSlope(a.station, a.height) });
  }
  const by = (apart.station * b.height - apart.height * b.station) / cross;
  return ok({
    kind: "point",
    point: sidePoint(lower.axle.station + by * a.station, lower.axle.height + by * a.height),
  });
}

/** The link's direction, of length 1. */
function along({ frame, axle }: SideLink): { station: number; height: number } {
  const [s, h] = [frame.station - axle.station, frame.height - axle.height];
  const length = Math.hypot(s, h);
  return { station: s / length, height: h / length };
}

/** A line's slope as it is seen going forward, −90 to 90 degrees. */
const forwardSlope = (station: number, height: number): Degrees =>
  degrees(station < 0 ? toDegrees(Math.atan2(-height, -station)) : toDegrees(Math.atan2(height, station)));
