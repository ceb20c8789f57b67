import { type Outcome, ok } from "../outcome";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import type { Millimetres } from "../units/length";
import { leafAtArch } from "./leaf-shape";
import { pinAt, type SidePoint } from "./leaf-travel";
import type { MainLeaf } from "./main-leaf";
import { movingEye, type ShackleMounting, shackleAngle } from "./shackle";

/** Spring and shackle at one arch. */
export type ShacklePosition = {
  arch: Millimetres;
  eyeDistance: Millimetres;
  movingEye: SidePoint;
  /** At the moving eye, between the shackle and the line to the fixed eye. */
  shackleAngle: Degrees;
  /** The line of the eyes out of level, front eye higher positive. */
  eyeLine: Degrees;
  /** The pin, with the line of the eyes turned as the shackle turns it. */
  axle: SidePoint;
  /** The axle seat against the level, nose up positive. */
  seatLean: Degrees;
};

/**
 * Spring and shackle at one arch of the leaf.
 * @returns a problem in words when the leaf cannot bend so or the shackle binds
 * @example shacklePosition(leaf, mounting, mm(100)).value.shackleAngle // degrees
 */
export function shacklePosition(
  leaf: MainLeaf,
  mounting: ShackleMounting,
  arch: Millimetres,
): Outcome<ShacklePosition> {
  const shape = leafAtArch(leaf, arch);
  if (!shape.ok) return shape;
  const moving = movingEye(mounting, shape.value.eyeDistance);
  if (!moving.ok) return moving;
  const { eye, hanger, fixedEye } = mounting;
  const [front, rear] = fixedEye === "ahead" ? [eye, moving.value] : [moving.value, eye];
  const eyeLine = toDegrees(Math.atan2(front.height - rear.height, front.station - rear.station));
  return ok({
    arch,
    eyeDistance: shape.value.eyeDistance,
    movingEye: moving.value,
    shackleAngle: shackleAngle(eye, moving.value, hanger),
    eyeLine,
    axle: pinAt(shape.value, fixedEye, eye, eyeLine),
    seatLean: degrees(shape.value.seatAngle + eyeLine),
  });
}
