import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A point of the vehicle: ahead, to the left, up; millimetres. */
export type VehiclePoint = { readonly x: Millimetres; readonly y: Millimetres; readonly z: Millimetres };
export const vehiclePoint = (x: number, y: number, z: number): VehiclePoint => ({
  x: mm(x),
  y: mm(y),
  z: mm(z),
});

const between = (a: VehiclePoint, b: VehiclePoint) => Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z);
/** Ends nearer than this (mm) make no link. */
const SHORTEST = 1;

export type Link = {
  length: Millimetres;
  /** In plan against the vehicle's length, positive: its far end to the left. */
  planAngle: Degrees;
  /** From the side against the level, positive: its far end higher. */
  sideAngle: Degrees;
};

/**
 * A drag link from the ball at the steering box to the ball at the axle.
 * @returns a problem when the balls lie on each other
 * @example dragLink(vehiclePoint(0, 0, 0), vehiclePoint(300, 400, 0)).value // 500 mm, plan 53.13°
 */
export function dragLink(box: VehiclePoint, axle: VehiclePoint): Outcome<Link> {
  const length = between(box, axle);
  if (length < SHORTEST) return problem("Both balls of the link lie on one spot.");
  const [x, y, z] = [axle.x - box.x, axle.y - box.y, axle.z - box.z];
  return ok({
    length: mm(length),
    planAngle: toDegrees(Math.atan2(y, x)),
    sideAngle: toDegrees(Math.atan2(z, Math.hypot(x, y))),
  });
}

/**
 * How much longer the link has to be when the axle is moved; negative: shorter.
 * @param by how far the axle's ball moves with the axle, ahead positive
 * @returns a problem as dragLink
 * @example dragLinkChange(vehiclePoint(0, 0, 0), vehiclePoint(-400, 0, 0), mm(-100)).value // 100
 */
export function dragLinkChange(box: VehiclePoint, axle: VehiclePoint, by: Millimetres): Outcome<Millimetres> {
  const [old, moved] = [dragLink(box, axle), dragLink(box, vehiclePoint(axle.x + by, axle.y, axle.z))];
  if (!old.ok) return old;
  if (!moved.ok) return moved;
  return ok(mm(moved.value.length - old.value.length));
}
