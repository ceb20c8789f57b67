import { boltShear, boltStrength, boltTightening } from "../../app/domain/hardware/bolt";
import { type BoltGrade, gradeStress } from "../../app/domain/hardware/bolt-grade";
import { bracketHole } from "../../app/domain/hardware/bracket-hole";
import {
  MPA_PER_KSI,
  NEWTON_METRES_PER_FOOT_POUND,
  NEWTONS_PER_POUND,
} from "../../app/domain/hardware/customary";
import { findThread, type Thread } from "../../app/domain/hardware/thread";
import type { Outcome } from "../../app/domain/outcome";
import { inches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";
import { threadChecks } from "./thread-checks";
import { weldChecks } from "./weld-checks";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const thread = (name: string): Thread => value(findThread(name));
const KIP = 1000 * NEWTONS_PER_POUND;

/* Grades: grade, thread that stands for the range, proof, tensile. */

const SHIGLEY = "Shigley & Mischke, Mechanical Engineering Design";
const SAE: readonly (readonly [BoltGrade, string, string, number, number])[] = [
  ["2", "3/4-10", "to 3/4 in", 55, 74],
  ["2", "7/8-9", "over 3/4 in", 33, 60],
  ["5", "1-8", "to 1 in", 85, 120],
  ["5", "1 1/8-7", "over 1 in", 74, 105],
  ["8", "1 1/2-6", "to 1 1/2 in", 120, 150],
];
const METRIC: readonly (readonly [BoltGrade, string, string, number, number])[] = [
  ["8.8", "M14", "under 16 mm", 580, 800],
  ["8.8", "M18", "over 16 mm", 600, 830],
  ["10.9", "M20", "all", 830, 1040],
  ["12.9", "M20", "all", 970, 1220],
];
const stresses = (
  [grade, name, range, proof, tensile]: (typeof SAE)[number],
  unit: string,
  per: number,
  source: Source,
): Check => ({
  about: `grade ${grade}, ${range}: proof ${proof}, tensile ${tensile} ${unit}`,
  source,
  got: () => {
    const stress = value(gradeStress(grade, thread(name)));
    return [stress.proof / per, stress.tensile / per];
  },
  want: [proof, tensile],
  within: 1e-9,
});
const grades = [
  ...SAE.map((row) =>
    stresses(row, "ksi", MPA_PER_KSI, {
      name: SHIGLEY,
      place: "5th edition, p. 341, SAE specifications for steel bolts (a university's copy)",
      status: "read",
    }),
  ),
  ...SAE.map((row) =>
    stresses(row, "ksi", MPA_PER_KSI, {
      name: "SAE J429",
      place: "a supplier's summary table",
      status: "read",
    }),
  ),
  ...METRIC.map((row) =>
    stresses(row, "MPa", 1, {
      name: "ISO 898-1",
      place: "a supplier's chart of bolt grades",
      status: "read",
    }),
  ),
];

/* Clamp and torque. */

const pounds = (newtons: number) => newtons / NEWTONS_PER_POUND;
const footPounds = (newtonMetres: number) => newtonMetres / NEWTON_METRES_PER_FOOT_POUND;
const GRADE_TWO: readonly (readonly [string, number, number, number, number])[] = [
  ["1/2-13", 5853, 1, 48.8, 0.05],
  ["5/8-11", 9323, 1, 97.1, 0.05],
  // Made from an area of 0.334, which is 0.33446.
  ["3/4-10", 13_778, 20, 172, 0.5],
];
const supplier = (place: string): Source => ({ name: "SAE J429", place, status: "read" });
const gradeTwo = GRADE_TWO.flatMap(([name, clamp, clampWithin, torque, torqueWithin]): Check[] => [
  {
    about: `${name} grade 2: clamp ${clamp} lb at 75 % of proof load (area there to three figures)`,
    source: supplier("a supplier's torque table, grade 2"),
    got: () => pounds(value(boltTightening(thread(name), "2")).clamp),
    want: clamp,
    within: clampWithin,
  },
  {
    about: `${name} grade 2: torque ${torque} ft·lb at K 0.2`,
    source: supplier("a supplier's torque table, grade 2"),
    got: () => footPounds(value(boltTightening(thread(name), "2")).torque),
    want: torque,
    within: torqueWithin,
  },
]);
const DERIVED: Source = { name: "T = K·D·F with K 0.2 and F 75 % of proof", status: "derived" };
/** Reckoned from the areas of the tables: a tenth of a ft·lb or N·m for their rounding. */
const torques = [
  ...(
    [
      ["1/2-13", 75.4, 106.4],
      ["1/2-20", 85, 120],
      ["9/16-18", 121.3, 171.3],
      ["5/8-18", 170, 240],
      ["3/4-16", 297.2, 419.6],
    ] as const
  ).map(
    ([name, five, eight]): Check => ({
      about: `${name}: torque ${five} ft·lb in grade 5, ${eight} in grade 8`,
      source: DERIVED,
      got: () =>
        (["5", "8"] as const).map((grade) => footPounds(value(boltTightening(thread(name), grade)).torque)),
      want: [five, eight],
      within: 0.15,
    }),
  ),
  ...(
    [
      ["M10", 50.5],
      ["M12", 88],
      ["M14", 140.6],
      ["M16", 218.1],
    ] as const
  ).map(
    ([name, torque]): Check => ({
      about: `${name} 8.8: torque ${torque} N·m`,
      source: DERIVED,
      got: () => value(boltTightening(thread(name), "8.8")).torque,
      want: torque,
      within: 0.05,
    }),
  ),
];
const shigleyBolt: Check[] = [
  {
    about: "3/4-16 grade 5 with a clamp of 25 kip, K 0.2: torque 3750 lb·in",
    source: { name: SHIGLEY, place: "example 8-3, bolt torque (later editions)", status: "recomputed" },
    got: () => {
      const one = thread("3/4-16");
      const clampShare = (25 * KIP) / value(boltStrength(one, "5")).proofLoad;
      return footPounds(value(boltTightening(one, "5", { clampShare })).torque) * 12;
    },
    want: 3750,
    within: 0.5,
  },
  {
    about: "two planes of shear carry twice one",
    source: { name: "common practice, no source", status: "practice" },
    got: () => {
      const [one, two] = ([1, 2] as const).map((planes) =>
        value(boltShear(thread("1/2-13"), "8", { planes, threadsInPlane: true })),
      );
      return (two ?? 0) / (one ?? 1);
    },
    want: 2,
    within: 1e-12,
  },
];

/* Bracket holes: kip per inch of plate for bolts of 5/8 to 1 in, far from an edge, by load and resistance factors. */

const holes = (
  [
    [58, 5 / 8, 65.3, 0.05],
    [58, 3 / 4, 78.3, 0.05],
    [58, 7 / 8, 91.4, 0.051],
    [58, 1, 104, 0.5],
    [65, 5 / 8, 73.1, 0.05],
    [65, 3 / 4, 87.8, 0.051],
    [65, 7 / 8, 102, 0.5],
    [65, 1, 117, 0.5],
  ] as const
).map(
  ([tensile, bolt, printed, within]): Check => ({
    about: `${bolt} in bolt, plate of ${tensile} ksi: bearing ${printed} kip an inch of thickness`,
    source: { name: "AISC Manual", place: "table 7-4, bearing by bolt spacing, φrn", status: "recomputed" },
    got: () =>
      value(
        bracketHole({
          bolt: inches(bolt),
          hole: inches(bolt + 1 / 16),
          thickness: inches(1),
          edgeDistance: null,
          tensile: tensile * MPA_PER_KSI,
        }),
      ).design / KIP,
    want: printed,
    within,
  }),
);

export default {
  topic: "Bolts, bracket holes and fillet welds",
  checks: [...threadChecks, ...grades, ...gradeTwo, ...torques, ...shigleyBolt, ...holes, ...weldChecks],
} satisfies Topic;
