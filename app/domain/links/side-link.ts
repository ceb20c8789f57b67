import { type Outcome, ok, problem } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { type Degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A link seen from the vehicle's side: its pivot on the frame and its pivot on the axle. */
export type SideLink = { readonly frame: SidePoint; readonly axle: SidePoint };

/** A link shorter than this is two pivots on one bolt, mm (ours, no source). */
export const SHORTEST_LINK = 1;

/**
 * A link from stations (ahead) and heights (up) of its pivots, millimetres.
 * @returns a problem when its pivots are less than 1 mm apart
 * @example sideLink({ station: 609.6, height: 254 }, { station: 0, height: 203.2 }) // 611.713 mm long
 */
export function sideLink(
  frame: { station: number; height: number },
  axle: { station: number; height: number },
): Outcome<SideLink> {
  const link = { frame: sidePoint(frame.station, frame.height), axle: sidePoint(axle.station, axle.height) };
  return linkLength(link) < SHORTEST_LINK
    ? problem("The link's two pivots are in the same place seen from the side.")
    : ok(link);
}

/** Pivot to pivot, millimetres: √(Δs² + Δh²). @example linkLength(from (0, 0) to (3, 4)) // 5 */
export const linkLength = ({ frame, axle }: SideLink): Millimetres =>
  mm(Math.hypot(frame.station - axle.station, frame.height - axle.height));

/**
 * How a link stands against the level, seen along it from the axle to the frame: rising towards the frame is positive.
 * Source: definition.
 * @returns degrees from −180 to 180; beyond ±90 the frame pivot is behind the axle pivot
 * @example linkSlope(axle (0, 8), frame (24, 10)) // 4.7636
 */
export const linkSlope = ({ frame, axle }: SideLink): Degrees =>
  toDegrees(Math.atan2(frame.height - axle.height, frame.station - axle.station));
