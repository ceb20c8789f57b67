import { type Outcome, ok, problem } from "../outcome";
import { type BoltGrade, gradeStress } from "./bolt-grade";
import { shankArea, stressArea, type Thread } from "./thread";

/** Share of the proof load to clamp with, for bolts that come undone again (common practice; Shigley's text likewise). */
export const CLAMP_SHARE = 0.75;
/** Nut factor of dry, plain steel (common practice; oiled, plated or waxed threads have less and need less torque). */
export const DRY_NUT_FACTOR = 0.2;
/** How far the clamp comes out either way with a torque wrench, as a share (often quoted, from memory: 25 to 35 %). */
export const TORQUE_SCATTER = 0.3;
/** Shear strength of a bolt as a share of its tensile strength (common practice, from memory: 0.6). */
export const SHEAR_SHARE = 0.6;

export type BoltStrength = {
  /** Square millimetres. */
  stressArea: number;
  /** Megapascals. */
  proofStress: number;
  tensileStress: number;
  /** Newtons. */
  proofLoad: number;
  tensileLoad: number;
};

/**
 * What a bolt of a grade holds in tension: stress area times stress.
 * Source: SAE J429, ISO 898-1.
 * @returns newtons; a problem as gradeStress
 * @example boltStrength(M12, "8.8") // proof 48 874 N, tensile 67 413 N
 */
export function boltStrength(thread: Thread, grade: BoltGrade): Outcome<BoltStrength> {
  const stress = gradeStress(grade, thread);
  if (!stress.ok) return stress;
  const area = stressArea(thread);
  return ok({
    stressArea: area,
    proofStress: stress.value.proof,
    tensileStress: stress.value.tensile,
    proofLoad: area * stress.value.proof,
    tensileLoad: area * stress.value.tensile,
  });
}

export type BoltTightening = BoltStrength & {
  /** Newtons: aimed at, and what the scatter leaves of it. */
  clamp: number;
  clampLow: number;
  clampHigh: number;
  /** Newton metres. */
  torque: number;
  /** The highest clamp goes beyond the proof load: the bolt may be stretched for good. */
  overProof: boolean;
};

/**
 * The clamp of a tightened bolt, share·proof load, and the torque that makes it, T = K·D·F, with the range that the same torque
 * really gives.
 * Source: Shigley's Mechanical Engineering Design, chapter 8 (from memory); the factors are common practice.
 * @param nutFactor K, 0.2 for dry plain steel; @param scatter as a share, 0.3
 * @returns newtons and newton metres; a problem as boltStrength, or when a factor is out of range
 * @example boltTightening(1/2-13, "5") // clamp 40 239 N (9046 lb), torque 102.21 N·m (75.4 ft·lb)
 */
export function boltTightening(
  thread: Thread,
  grade: BoltGrade,
  factors: {
    clampShare?: number | undefined;
    nutFactor?: number | undefined;
    scatter?: number | undefined;
  } = {},
): Outcome<BoltTightening> {
  const { clampShare = CLAMP_SHARE, nutFactor = DRY_NUT_FACTOR, scatter = TORQUE_SCATTER } = factors;
  if (!(clampShare > 0 && clampShare <= 1))
    return problem("The clamp is more than nothing and no more than the proof load.");
  if (!(nutFactor > 0 && nutFactor <= 1)) return problem("The nut factor is more than 0 and no more than 1.");
  if (!(scatter >= 0 && scatter < 1)) return problem("The scatter is a share: 0.3 for 30 %.");
  const strength = boltStrength(thread, grade);
  if (!strength.ok) return strength;
  const clamp = clampShare * strength.value.proofLoad;
  const clampHigh = clamp * (1 + scatter);
  return ok({
    ...strength.value,
    clamp,
    clampLow: clamp * (1 - scatter),
    clampHigh,
    torque: (nutFactor * thread.diameter * clamp) / 1000,
    overProof: clampHigh > strength.value.proofLoad,
  });
}

/**
 * The force across a bolt that shears it: planes × share × tensile strength × area, the stress area when threads lie in a plane
 * of shear, the plain shank when none do. It is what breaks it: divide by a factor of safety.
 * Source: common practice, the share of 0.6 from memory.
 * @param planes 1 for a bracket on one side, 2 for a bolt held on both sides
 * @returns newtons; a problem as gradeStress, or when the share is out of range
 * @example boltShear(1/2-13, "8", { planes: 2, threadsInPlane: false }) // 157 213 N (35 343 lb)
 */
export function boltShear(
  thread: Thread,
  grade: BoltGrade,
  joint: { planes: 1 | 2; threadsInPlane: boolean; shearShare?: number | undefined },
): Outcome<number> {
  const { planes, threadsInPlane, shearShare = SHEAR_SHARE } = joint;
  if (!(shearShare > 0 && shearShare <= 1))
    return problem("The shear share is more than 0 and no more than 1.");
  const stress = gradeStress(grade, thread);
  if (!stress.ok) return stress;
  const area = threadsInPlane ? stressArea(thread) : shankArea(thread);
  return ok(planes * shearShare * stress.value.tensile * area);
}
