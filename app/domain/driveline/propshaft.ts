import { type Outcome, ok, problem } from "../outcome";
import type { VehiclePoint } from "../steering/drag-link";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { jointAngle, residualAngle, type ShaftAngles } from "./joint";

/** The joint at the axle at one place of its travel, and how the pinion points there. */
export type PinionPlace = { name: string; joint: VehiclePoint; pinion: ShaftAngles };
export type PropshaftPlace = {
  name: string;
  length: Millimetres;
  shaft: ShaftAngles;
  /** At the gearbox and at the axle. */
  first: Degrees;
  second: Degrees;
  residual: Degrees;
};
export type Propshaft = {
  places: PropshaftPlace[];
  longest: Millimetres;
  shortest: Millimetres;
  /** What the slip joint has to give. */
  slip: Millimetres;
};

/** Joints nearer than this (mm) have no shaft between them. */
const SHORTEST = 10;

/**
 * A propshaft through the travel: length, direction, both joints' angles in space and what they leave together.
 * All directions are taken along the vehicle, so that a shaft that runs rearwards is given as it would look ahead.
 * Source: solid geometry, joints as jointAngle and residualAngle.
 * @param phase 0 with the forks in line
 * @returns a problem when the joints lie on each other or the shaft runs across the vehicle
 * @example propshaft(box, { plan: degrees(0), side: degrees(3) }, [ride, droop]).value.slip
 */
export function propshaft(
  box: VehiclePoint,
  output: ShaftAngles,
  places: readonly PinionPlace[],
  phase: Degrees = degrees(0),
): Outcome<Propshaft> {
  const found: PropshaftPlace[] = [];
  for (const { name, joint, pinion } of places) {
    const [x, y, z] = [joint.x - box.x, joint.y - box.y, joint.z - box.z];
    const length = Math.hypot(x, y, z);
    if (length < SHORTEST) return problem("The two joints lie on one spot.");
    if (Math.abs(x) < 0.1 * length) return problem("The propshaft runs across the vehicle, not along it.");
    const shaft = { plan: toDegrees(Math.atan(y / x)), side: toDegrees(Math.atan(z / x)) };
    const [first, second] = [jointAngle(output, shaft), jointAngle(shaft, pinion)];
    found.push({
      name,
      length: mm(length),
      shaft,
      first,
      second,
      residual: residualAngle(first, second, phase),
    });
  }
  if (found.length === 0) return problem("At least one place of the travel is needed.");
  const lengths = found.map((place) => place.length);
  const [longest, shortest] = [Math.max(...lengths), Math.min(...lengths)];
  return ok({ places: found, longest: mm(longest), shortest: mm(shortest), slip: mm(longest - shortest) });
}
