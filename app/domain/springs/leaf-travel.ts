import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { flatArch, type LeafShape, leafAtArch } from "./leaf-shape";
import type { FixedEye } from "./leaf-spring";
import type { MainLeaf } from "./main-leaf";

/** A point seen from the vehicle's side: station ahead, height up. */
export type SidePoint = { readonly station: Millimetres; readonly height: Millimetres };

export const sidePoint = (station: number, height: number): SidePoint => ({
  station: mm(station),
  height: mm(height),
});

/**
 * How far the line of the eyes is out of level, from the heights of the eyes.
 * @param fixedEye which end the fixed eye is
 * @param shackleEyeHigher the moving eye's centre above the fixed eye's, millimetres
 * @returns degrees, positive when the front eye is the higher; a problem when the eyes are nearer than that
 * @example eyeLineSlope("ahead", inches(50), inches(2)) // −2.2924: the rear eye is higher
 */
export function eyeLineSlope(
  fixedEye: FixedEye,
  eyeDistance: Millimetres,
  shackleEyeHigher: Millimetres,
): Outcome<Degrees> {
  if (Math.abs(shackleEyeHigher) >= eyeDistance)
    return problem("The eyes differ more in height than the spring is long.");
  const slope = toDegrees(Math.asin(shackleEyeHigher / eyeDistance));
  return ok(degrees(fixedEye === "ahead" ? 0 - slope : slope));
}

/**
 * Where the axle pin stands when the fixed eye stands at a point and the line of the eyes has a slope.
 * @param eyeLine degrees out of level, positive when the front eye is the higher; 0: eyes level
 * @returns the pin, on the leaf's own middle
 * @example pinAt(shape 26 in from the front, arch 0, "ahead", sidePoint(inches(71.5), 0), degrees(0)) // station 45.5 in
 */
export function pinAt(
  shape: Pick<LeafShape, "arch" | "fromFront" | "fromRear">,
  fixedEye: FixedEye,
  eye: SidePoint,
  eyeLine: Degrees,
): SidePoint {
  const [ahead, up] = [Math.cos(toRadians(eyeLine)), Math.sin(toRadians(eyeLine))];
  const along = fixedEye === "ahead" ? -shape.fromFront : shape.fromRear;
  return sidePoint(
    eye.station + along * ahead + shape.arch * up,
    eye.height + along * up - shape.arch * ahead,
  );
}

export type LeafSetting = {
  leaf: MainLeaf;
  fixedEye: FixedEye;
  /** The fixed eye, that is, the hole in the hanger. */
  eye: SidePoint;
  /** The line of the eyes out of level, kept through the travel; front eye higher is positive. Level unless told. */
  eyeLine?: Degrees | undefined;
};
export type LeafPosition = LeafShape & {
  axle: SidePoint;
  /** The axle seat against the level: nose up positive. */
  seatLean: Degrees;
};

/**
 * The axle's place at one arch. The line of the eyes keeps its slope: with a shackle it turns a little through the travel,
 * which shackleTravel follows.
 * @returns a problem as leafAtArch
 * @example leafPosition({ leaf of 26 and 26 in, fixedEye: "ahead", eye: sidePoint(inches(71.5), 0) }, mm(0)) // axle 45.5 in
 */
export function leafPosition(setting: LeafSetting, arch: Millimetres): Outcome<LeafPosition> {
  const { leaf, fixedEye, eye, eyeLine = degrees(0) } = setting;
  const shape = leafAtArch(leaf, arch);
  return shape.ok
    ? ok({
        ...shape.value,
        axle: pinAt(shape.value, fixedEye, eye, eyeLine),
        seatLean: degrees(shape.value.seatAngle + eyeLine),
      })
    : shape;
}

export type LeafStations = { droop: LeafPosition; ride: LeafPosition; flat: LeafPosition };

/**
 * The three places of the axle that matter: hanging, at ride height and with the main leaf flat, which is about full
 * compression.
 * @param arches of the pin below the line of the eyes
 * @returns a problem as leafAtArch
 * @example leafStations({ leaf of 24 and 28 in, fixedEye: "ahead", eye: sidePoint(inches(71.5), 0) }, { droop: inches(6), ride: inches(4) }) // flat 47.5 in
 */
export function leafStations(
  setting: LeafSetting,
  arches: { droop: Millimetres; ride: Millimetres },
): Outcome<LeafStations> {
  const droop = leafPosition(setting, arches.droop);
  if (!droop.ok) return droop;
  const ride = leafPosition(setting, arches.ride);
  if (!ride.ok) return ride;
  const flat = leafPosition(setting, flatArch(setting.leaf));
  return flat.ok ? ok({ droop: droop.value, ride: ride.value, flat: flat.value }) : flat;
}

/**
 * Even steps from one arch to another, both ends among them.
 * @throws RangeError when steps is not a whole number of 1 or more
 * @example archSteps(mm(100), mm(-20), 3) // 100, 60, 20, −20
 */
export function archSteps(from: Millimetres, to: Millimetres, steps: number): Millimetres[] {
  if (!Number.isInteger(steps) || steps < 1) throw new RangeError(`${steps} is not a number of steps`);
  return Array.from({ length: steps + 1 }, (_, i) => mm(i === steps ? to : from + ((to - from) * i) / steps));
}

/**
 * The axle's path from one arch to another.
 * @param to usually flat, or beyond it
 * @returns steps + 1 positions, or a problem as leafAtArch
 * @throws RangeError as archSteps
 * @example leafTravel({ leaf of 26 and 26 in, … }, { from: inches(6), to: inches(0), steps: 12 }) // 13 positions
 */
export function leafTravel(
  setting: LeafSetting,
  { from, to, steps }: { from: Millimetres; to: Millimetres; steps: number },
): Outcome<LeafPosition[]> {
  const positions: LeafPosition[] = [];
  for (const arch of archSteps(from, to, steps)) {
    const position = leafPosition(setting, arch);
    if (!position.ok) return position;
    positions.push(position.value);
  }
  return ok(positions);
}
