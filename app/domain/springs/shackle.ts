import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";
import type { Millimetres } from "../units/length";
import type { FixedEye } from "./leaf-spring";
import { type SidePoint, sidePoint } from "./leaf-travel";

/**
 * How the shackle is loaded, which says on which side of the eye its hanger is: above the eye the frame stands on it
 * (compression), below the eye the frame hangs from it (tension).
 */
export type ShackleLoad = "compression" | "tension";

/** The spring's mounting seen from the side. */
export type ShackleMounting = {
  fixedEye: FixedEye;
  /** Centre of the fixed eye. */
  eye: SidePoint;
  /** Pivot of the second hanger. */
  hanger: SidePoint;
  /** Centre to centre. */
  shackle: Millimetres;
  load: ShackleLoad;
};

/** Shackle square to the line of the eyes at ride height. Common practice, no source. */
export const USUAL_SHACKLE_ANGLE = degrees(90);
/** A shackle nearer to straight than this is about to go over centre. Common practice, no source. */
export const NEAR_STRAIGHT = degrees(5);

/** Two points nearer to each other than this (mm) are one (ours, no source). */
const SAME_POINT = 1e-3;

/** To which hand of the way from the fixed eye to the moving one the hanger lies: 1 left, −1 right, seen with ahead to the right. */
const hand = (fixedEye: FixedEye, load: ShackleLoad): 1 | -1 =>
  (fixedEye === "behind") === (load === "compression") ? 1 : -1;

export type HangerPlace = { hanger: SidePoint; movingEye: SidePoint };

/**
 * Where the second hanger's pivot goes so that the shackle makes the wanted angle at ride height. The moving eye stands on
 * the line of the eyes; the hanger is a shackle's length from it, turned by the angle from the way back to the fixed eye.
 * More than 90° leans the shackle away from the fixed eye.
 * Source: plane geometry; the angle between shackle and line of the eyes is how the trade measures it (common practice).
 * @param wanted eyeDistance at ride height; movingEyeHigher: the moving eye's centre above the fixed one's
 * @returns a problem when a length is not above nothing, the eyes differ in height by more than their distance, or the
 *   angle is not between 0° and 180°
 * @example placeHanger({ fixedEye: "ahead", eye: sidePoint(0, 0), eyeDistance: mm(1300), movingEyeHigher: mm(0), shackle: mm(100), load: "compression" }) // hanger 1300 behind, 100 up
 */
export function placeHanger(wanted: {
  fixedEye: FixedEye;
  eye: SidePoint;
  eyeDistance: Millimetres;
  movingEyeHigher: Millimetres;
  shackle: Millimetres;
  load: ShackleLoad;
  angle?: Degrees | undefined;
}): Outcome<HangerPlace> {
  const { fixedEye, eye, eyeDistance, movingEyeHigher, shackle, load, angle = USUAL_SHACKLE_ANGLE } = wanted;
  if (eyeDistance < SAME_POINT || shackle < SAME_POINT)
    return problem("Eye distance and shackle length are more than nothing.");
  if (Math.abs(movingEyeHigher) >= eyeDistance)
    return problem("The eyes differ more in height than they are apart.");
  if (angle <= 0 || angle >= 180) return problem("The shackle angle is between 0° and 180°.");
  const away = fixedEye === "ahead" ? -1 : 1;
  const [along, up] = [away * Math.sqrt(eyeDistance ** 2 - movingEyeHigher ** 2), movingEyeHigher];
  const turn = -hand(fixedEye, load) * toRadians(angle);
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const share = shackle / eyeDistance;
  const movingEye = sidePoint(eye.station + along, eye.height + up);
  return ok({
    movingEye,
    hanger: sidePoint(
      movingEye.station + share * (-along * c + up * s),
      movingEye.height + share * (-along * s - up * c),
    ),
  });
}

/**
 * Where the moving eye is: as far from the fixed eye as the spring holds it, and a shackle from the hanger. Of the two such
 * points the one that leaves the hanger on its side of the line of the eyes; they meet where the shackle is straight, so the
 * choice never jumps.
 * Source: intersection of two circles; the same sum as the position of a four-bar linkage, Norton, Design of Machinery, ch. 4.
 * @param eyeDistance millimetres
 * @returns a problem in words when the circles do not meet: the shackle binds
 * @example movingEye({ fixedEye: "ahead", eye: sidePoint(0, 0), hanger: sidePoint(-1300, 100), shackle: mm(100), load: "compression" }, mm(1300)) // 1300 behind, height 0
 */
export function movingEye(mounting: ShackleMounting, eyeDistance: Millimetres): Outcome<SidePoint> {
  const { fixedEye, eye, hanger, shackle, load } = mounting;
  const [x, z] = [hanger.station - eye.station, hanger.height - eye.height];
  const base = Math.hypot(x, z);
  if (Math.min(eyeDistance, shackle, base) < SAME_POINT)
    return problem("Eye distance, shackle and the distance of the hangers are more than nothing.");
  if (eyeDistance > base + shackle)
    return problem(
      "The spring is too long for its hangers: the shackle binds, laid over towards the fixed eye.",
    );
  if (eyeDistance < base - shackle)
    return problem("The eyes are too near: the shackle is pulled straight, away from the fixed eye.");
  if (eyeDistance < shackle - base)
    return problem("The shackle is too long for hangers so near to each other.");
  const along = (eyeDistance ** 2 - shackle ** 2 + base ** 2) / (2 * base);
  const aside = Math.sqrt(Math.max(0, (eyeDistance - along) * (eyeDistance + along)));
  const off = -hand(fixedEye, load) * aside;
  return ok(sidePoint(eye.station + (along * x - off * z) / base, eye.height + (along * z + off * x) / base));
}

/**
 * The angle at the moving eye between the shackle and the line back to the fixed eye.
 * @returns 0° to 180°; both ends are straight
 * @example shackleAngle(sidePoint(0, 0), sidePoint(-1300, 0), sidePoint(-1300, 100)) // 90
 */
export function shackleAngle(eye: SidePoint, moving: SidePoint, hanger: SidePoint): Degrees {
  const [ax, az] = [eye.station - moving.station, eye.height - moving.height];
  const [bx, bz] = [hanger.station - moving.station, hanger.height - moving.height];
  return toDegrees(Math.atan2(Math.abs(ax * bz - az * bx), ax * bx + az * bz));
}

/**
 * How far a shackle is from straight, either way.
 * @example fromStraight(degrees(172)) // 8
 */
export const fromStraight = (angle: Degrees): Degrees => degrees(Math.min(angle, 180 - angle));
