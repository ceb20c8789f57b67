import { type Outcome, ok, problem } from "../outcome";
import { inches, type Millimetres, mm } from "../units/length";
import { MPA_PER_KSI } from "./customary";
import type { Thread } from "./thread";

export const BOLT_GRADES = ["2", "5", "8", "8.8", "10.9", "12.9"] as const;
/** SAE J429 grades 2, 5, 8 for inch threads; ISO 898-1 classes 8.8, 10.9, 12.9 for metric ones. */
export type BoltGrade = (typeof BOLT_GRADES)[number];

/** Stress under proof load and least tensile strength, megapascals, up to a diameter. */
type Range = { upTo: Millimetres; proof: number; tensile: number };

const ksi = (upTo: number, proof: number, tensile: number): Range => ({
  upTo: inches(upTo),
  proof: proof * MPA_PER_KSI,
  tensile: tensile * MPA_PER_KSI,
});
const mpa = (upTo: number, proof: number, tensile: number): Range => ({ upTo: mm(upTo), proof, tensile });

/** Source: SAE J429 and ISO 898-1, both from copies of their tables. Grade 2 over 3/4 in is weaker, grade 5 over 1 in. */
const RANGES: Record<BoltGrade, readonly Range[]> = {
  "2": [ksi(3 / 4, 55, 74), ksi(3 / 2, 33, 60)],
  "5": [ksi(1, 85, 120), ksi(3 / 2, 74, 105)],
  "8": [ksi(3 / 2, 120, 150)],
  "8.8": [mpa(16, 580, 800), mpa(39, 600, 830)],
  "10.9": [mpa(39, 830, 1040)],
  "12.9": [mpa(39, 970, 1220)],
};

const isMetric = (grade: BoltGrade): boolean => grade.includes(".");

/**
 * Stress under proof load and least tensile strength of a bolt of a grade, which fall for thick bolts of some grades.
 * Source: SAE J429, ISO 898-1 (copies of the tables).
 * @returns megapascals; a problem when an inch grade is asked of a metric thread or the other way round
 * @example gradeStress("5", 1/2-13) // proof 586.05, tensile 827.37: 85 and 120 ksi
 */
export function gradeStress(grade: BoltGrade, thread: Thread): Outcome<{ proof: number; tensile: number }> {
  const metricThread = thread.series === "metric coarse";
  if (metricThread !== isMetric(grade))
    return problem(
      metricThread
        ? `${thread.name} is metric: its grade is 8.8, 10.9 or 12.9, not ${grade}.`
        : `${thread.name} is an inch thread: its grade is 2, 5 or 8, not ${grade}.`,
    );
  // A hair over, so that 3/4 in as millimetres is not thicker than 3/4 in.
  const range = RANGES[grade].find((one) => thread.diameter <= one.upTo + 1e-6);
  return range
    ? ok({ proof: range.proof, tensile: range.tensile })
    : problem(`Grade ${grade} is not made as thick as ${thread.name}.`);
}
