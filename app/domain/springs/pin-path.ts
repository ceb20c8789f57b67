import { type Outcome, ok, problem } from "../outcome";
import { archOf, curvatureAt, type EyesFromPin, eyesOfArc, fromFrontOf, STEEPEST_END } from "./leaf-shape";
import type { FixedEye } from "./leaf-spring";
import type { MainLeaf } from "./main-leaf";

/** A path's arches lie near each other: secants from the last two settle in two or three steps. */
const MOST_SECANTS = 8;
/** An arch is met to within this, in mm: far below any tape. */
const NEAR_ENOUGH = 1e-7;

/**
 * Where the axle pin stands from the fixed eye at many arches, eyes level: the part of an option table that does not
 * depend on the hole, so that each hole only adds its station. Each arch starts from where the last one ended.
 * Source: as leafAtArch.
 * @param arches the pin below the line of the eyes, millimetres
 * @returns stations relative to the fixed eye, millimetres, ahead positive: negative throughout when that eye is ahead of
 *   the axle; a problem when an arch is out of the leaf's reach
 * @example pinPath(leaf of 26 and 26 in, "ahead", [0, 127]) // −660.4, −643.827
 */
export function pinPath(
  leaf: MainLeaf,
  fixedEye: FixedEye,
  arches: ArrayLike<number>,
): Outcome<Float64Array> {
  const path = new Float64Array(arches.length);
  let bend = 0;
  for (let i = 0; i < arches.length; i++) {
    const found = nearCurvature(leaf, arches[i] ?? 0, bend) ?? curvatureAt(leaf, arches[i] ?? 0);
    if (found === null) return problem("The leaf is too short for so much arch.");
    bend = found;
    const eyes = eyesOfArc(leaf, bend);
    path[i] = fixedEye === "ahead" ? -fromFrontOf(eyes) : fromRearOf(eyes);
  }
  return ok(path);
}

/** The curvature near a known one that gives the arch; null when it is not found at once, or bends too far. */
function nearCurvature(leaf: MainLeaf, arch: number, start: number): number | null {
  const per = (leaf.front * leaf.rear) / 2;
  let [before, missedBefore] = [start, archOf(eyesOfArc(leaf, start)) - arch];
  if (Math.abs(missedBefore) < NEAR_ENOUGH) return start;
  let bend = start - missedBefore / per;
  for (let i = 0; i < MOST_SECANTS; i++) {
    if (!(Math.abs(bend) <= STEEPEST_END / Math.max(leaf.front, leaf.rear))) return null;
    const missed = archOf(eyesOfArc(leaf, bend)) - arch;
    if (Math.abs(missed) < NEAR_ENOUGH) return bend;
    const next = bend - (missed * (bend - before)) / (missed - missedBefore);
    [before, missedBefore, bend] = [bend, missed, next];
  }
  return null;
}

/** Seen from the other end, a leaf is its mirror image. */
const fromRearOf = (eyes: EyesFromPin): number =>
  fromFrontOf({
    frontAlong: eyes.rearAlong,
    frontUp: eyes.rearUp,
    rearAlong: eyes.frontAlong,
    rearUp: eyes.frontUp,
  });
