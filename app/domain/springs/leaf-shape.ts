import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import type { MainLeaf } from "./main-leaf";
import { solveBetween } from "./small-angle";

/** How a leaf stands at one arch. Measured on the line through the two eye centres, whatever that line's slope. */
export type LeafShape = {
  /** The pin below the line of the eyes. Falls as the wheel rises; negative: bent over backwards. */
  arch: Millimetres;
  /** Centre to centre of the eyes, straight across. */
  eyeDistance: Millimetres;
  /** Front eye to the foot of the pin on the line of the eyes. */
  fromFront: Millimetres;
  /** The same from the rear eye; with fromFront it makes the eye distance. */
  fromRear: Millimetres;
  /** The clamped part of the leaf, and with it the axle's seat, against the line of the eyes; positive: front end up. */
  seatAngle: Degrees;
};

/** The eyes seen from the pin: along the clamped part (both counted outwards) and up from it. */
export type EyesFromPin = { frontAlong: number; frontUp: number; rearAlong: number; rearUp: number };

/** Neither half is reckoned with beyond this bend, radians: 60°, far past any leaf that still works (ours, no source). */
export const STEEPEST_END = Math.PI / 3;
/** An arch is met to within this, in mm. */
const NEAR_ENOUGH = 1e-9;

/**
 * What bends of each half: the half less its share of the clamped part.
 * @returns millimetres
 * @example bending(leaf of 650 and 700 mm, 100 mm clamped) // 600 and 650
 */
export const bending = (leaf: MainLeaf): { front: number; rear: number } => ({
  front: leaf.front - leaf.clamped / 2,
  rear: leaf.rear - leaf.clamped / 2,
});

/**
 * Where the eyes stand from the pin when the leaf has one curvature all along: R sin θ along and R(1 − cos θ) up, each with
 * the eye's own offset turned by θ.
 * @param curvature 1/mm; positive: eyes up
 * @returns millimetres; always numbers
 * @example eyesOfArc(leaf of 500 and 500 mm, 0.001) // 479.4255 along, 122.4174 up, either eye
 */
export function eyesOfArc(leaf: MainLeaf, curvature: number): EyesFromPin {
  const straight = leaf.clamped / 2;
  const front = eyeOfArc(leaf.front - straight, leaf.eyeOffset.front, curvature);
  const rear = eyeOfArc(leaf.rear - straight, leaf.eyeOffset.rear, curvature);
  return {
    frontAlong: straight + front.along,
    frontUp: front.up,
    rearAlong: straight + rear.along,
    rearUp: rear.up,
  };
}

/** One eye from where its half begins to bend. Everything from the sine and cosine of half the end's slope: exact near flat. */
function eyeOfArc(bends: number, offset: number, curvature: number): { along: number; up: number } {
  const slope = curvature * bends;
  // The next terms are below what a double holds; and the quotients below lose their digits when a slope is next to nothing.
  if (Math.abs(slope) < 1e-8) return { along: bends - offset * slope, up: (bends * slope) / 2 + offset };
  const [s, c] = [Math.sin(slope / 2), Math.cos(slope / 2)];
  const [sine, versine] = [2 * s * c, 2 * s * s];
  return {
    along: (bends * sine) / slope - offset * sine,
    up: (bends * versine) / slope + offset * (1 - versine),
  };
}

/**
 * The pin below the line of the eyes.
 * @returns millimetres
 * @example archOf({ frontAlong: 600, frontUp: 50, rearAlong: 600, rearUp: 50 }) // 50
 */
export function archOf({ frontAlong, frontUp, rearAlong, rearUp }: EyesFromPin): number {
  const [along, up] = [frontAlong + rearAlong, frontUp - rearUp];
  return (frontUp * rearAlong + rearUp * frontAlong) / Math.sqrt(along * along + up * up);
}

/**
 * Front eye to the foot of the pin on the line of the eyes.
 * @returns millimetres
 * @example fromFrontOf({ frontAlong: 600, frontUp: 50, rearAlong: 700, rearUp: 50 }) // 600
 */
export function fromFrontOf({ frontAlong, frontUp, rearAlong, rearUp }: EyesFromPin): number {
  const [along, up] = [frontAlong + rearAlong, frontUp - rearUp];
  return (frontAlong * along + frontUp * up) / Math.sqrt(along * along + up * up);
}

/**
 * The leaf's shape from where its eyes stand.
 * @returns millimetres and degrees
 * @example shapeOf({ frontAlong: 600, frontUp: 50, rearAlong: 700, rearUp: 50 }) // eye distance 1300, arch 50, seat angle 0
 */
export function shapeOf(eyes: EyesFromPin): LeafShape {
  const [along, up] = [eyes.frontAlong + eyes.rearAlong, eyes.frontUp - eyes.rearUp];
  const [distance, fromFront] = [Math.hypot(along, up), fromFrontOf(eyes)];
  return {
    arch: mm(archOf(eyes)),
    eyeDistance: mm(distance),
    fromFront: mm(fromFront),
    fromRear: mm(distance - fromFront),
    seatAngle: toDegrees(-Math.atan2(up, along)),
  };
}

/**
 * The curvature at which the leaf has an arch.
 * @param arch the pin below the line of the eyes, millimetres
 * @returns 1/mm; null when no bend within STEEPEST_END gives it
 * @example curvatureAt(leaf of 500 and 500 mm, 122.4174) // 0.001
 */
export function curvatureAt(leaf: MainLeaf, arch: number): number | null {
  const { front, rear } = bending(leaf);
  const most = STEEPEST_END / Math.max(front, rear);
  const flat = archOf(eyesOfArc(leaf, 0));
  // As of a flat parabola: near enough for a first guess.
  const perCurvature =
    (front * front * leaf.rear + rear * rear * leaf.front) / (2 * (leaf.front + leaf.rear));
  const guess = (arch - flat) / perCurvature;
  return solveBetween((bend) => archOf(eyesOfArc(leaf, bend)), arch, -most, most, guess, NEAR_ENOUGH);
}

/**
 * The arch at which the main leaf is flat: 0 with Berlin eyes, the eyes' own height with upturned ones.
 * @returns millimetres; with unlike eyes the share of each at the pin
 * @example flatArch(leaf) // both eyes 20 mm up: 20
 */
export const flatArch = (leaf: MainLeaf): Millimetres => mm(archOf(eyesOfArc(leaf, 0)));

/**
 * The main leaf as a circular arc of fixed length, clamped part straight: eye distance, where the pin stands between the
 * eyes and how the axle's seat leans. Without clamp and eye offset the pin stands s·λ·sinc(φλ)·cos(φ(1 − λ)) from the front
 * eye, with s the length, λ the front half's share of it and φ half the angle of the arc: the same as R[sin φ − sin(φ −
 * front/R)], without losing digits near flat.
 * Source: circular segment, Machinery's Handbook, 31st edition, pp. 79 and 83; one curvature all along is the usual
 * assumption for a leaf of even stress.
 * @param arch the pin below the line of the eyes, millimetres; negative: reverse
 * @returns a problem when the leaf would have to bend more than 60° in one half
 * @example leafAtArch(leaf of 26 and 26 in, inches(5)) // eye distance 50.69501 in, pin 25.34751 in from either eye
 */
export function leafAtArch(leaf: MainLeaf, arch: Millimetres): Outcome<LeafShape> {
  const curvature = curvatureAt(leaf, arch);
  return curvature === null
    ? problem("The leaf is too short for so much arch.")
    : ok({ ...shapeOf(eyesOfArc(leaf, curvature)), arch });
}
