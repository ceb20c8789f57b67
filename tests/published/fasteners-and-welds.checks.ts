import { boltShear, boltStrength, boltTightening } from "../../app/domain/hardware/bolt";
import { type BoltGrade, gradeStress } from "../../app/domain/hardware/bolt-grade";
import { bracketHole } from "../../app/domain/hardware/bracket-hole";
import {
  MPA_PER_KSI,
  NEWTON_METRES_PER_FOOT_POUND,
  NEWTONS_PER_MM_PER_KIP_INCH,
  NEWTONS_PER_POUND,
} from "../../app/domain/hardware/customary";
import { filletWeld, loadAngleFactor, requiredLeg, smallestLeg } from "../../app/domain/hardware/fillet-weld";
import { findThread, stressArea, type Thread } from "../../app/domain/hardware/thread";
import type { Outcome } from "../../app/domain/outcome";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const thread = (name: string): Thread => value(findThread(name));
const SQUARE_INCH = 25.4 ** 2;
const KIP = 1000 * NEWTONS_PER_POUND;

/* Stress areas. */

/** Thread, area as printed, half a unit of its last place. The last digit of some is cut, not rounded: a whole unit there. */
const UNF: readonly (readonly [string, number, number])[] = [
  ["1/4-28", 0.0364, 5e-5],
  ["5/16-24", 0.058, 5e-4],
  ["3/8-24", 0.0878, 5e-5],
  ["7/16-20", 0.1187, 5e-5],
  ["1/2-20", 0.1599, 1e-4],
  ["9/16-18", 0.203, 5e-4],
  ["5/8-18", 0.256, 5e-4],
  ["3/4-16", 0.373, 5e-4],
  ["7/8-14", 0.509, 1e-3],
  ["1-12", 0.663, 5e-4],
  ["1 1/8-12", 0.856, 5e-4],
  ["1 1/4-12", 1.073, 5e-4],
  ["1 3/8-12", 1.315, 5e-4],
  ["1 1/2-12", 1.581, 5e-4],
];
const UNC: readonly (readonly [string, number, number])[] = [
  ["1/4-20", 0.0318, 5e-5],
  ["5/16-18", 0.0524, 5e-5],
  ["3/8-16", 0.0775, 5e-5],
  ["7/16-14", 0.1063, 5e-5],
  ["1/2-13", 0.1419, 5e-5],
  ["9/16-12", 0.182, 5e-4],
  ["5/8-11", 0.226, 5e-4],
  ["3/4-10", 0.334, 5e-4],
  ["7/8-9", 0.462, 5e-4],
  ["1-8", 0.606, 5e-4],
  ["1 1/8-7", 0.763, 5e-4],
];
const inchAreas = ([rows, place]: readonly [typeof UNF, string]) =>
  rows.map(
    ([name, printed, within]): Check => ({
      about: `${name}: stress area ${printed} in²`,
      source: { name: "ASME B1.1, unified threads", place, status: "read" },
      got: () => stressArea(thread(name)) / SQUARE_INCH,
      want: printed,
      within,
    }),
  );

/** Thread, stress area in mm², least tensile load at 8.8, 10.9, 12.9, proof load likewise; newtons. */
const ISO: readonly (readonly [string, number, number, readonly number[], readonly number[] | null])[] = [
  ["M5", 14.2, 0.05, [11_350, 14_800, 17_300], [8230, 11_800, 13_800]],
  ["M6", 20.1, 0.05, [16_100, 20_900, 24_500], [11_600, 16_700, 19_500]],
  ["M8", 36.6, 0.05, [29_200, 38_100, 44_600], [21_200, 30_400, 35_500]],
  ["M10", 58, 0.05, [46_400, 60_300, 70_800], [33_700, 48_100, 56_300]],
  ["M12", 84.3, 0.05, [67_400, 87_700, 103_000], [48_900, 70_000, 81_800]],
  ["M14", 115, 0.5, [92_000, 120_000, 140_000], [66_700, 95_500, 112_000]],
  ["M16", 157, 0.5, [125_000, 163_000, 192_000], [91_000, 130_000, 152_000]],
  ["M18", 192, 0.5, [159_000, 200_000, 234_000], [115_000, 159_000, 186_000]],
  ["M20", 245, 0.5, [203_000, 255_000, 299_000], [147_000, 203_000, 238_000]],
  ["M22", 303, 0.5, [252_000, 315_000, 370_000], [182_000, 252_000, 294_000]],
  ["M24", 353, 0.5, [293_000, 367_000, 431_000], [212_000, 293_000, 342_000]],
  ["M27", 459, 0.5, [381_000, 477_000, 560_000], [275_000, 381_000, 445_000]],
  ["M30", 561, 0.5, [466_000, 583_000, 684_000], null],
  ["M33", 694, 0.5, [576_000, 722_000, 847_000], null],
  ["M36", 817, 0.5, [678_000, 850_000, 997_000], null],
  ["M39", 976, 0.5, [810_000, 1_020_000, 1_200_000], null],
];
const CLASSES = ["8.8", "10.9", "12.9"] as const;
/** The loads were made from the area rounded to three figures and cut to three figures themselves: each worth up to 0.5 %. */
const ISO_PERCENT = 0.7;
/** Over a million the steps are of 20 000: 1 %. */
const ISO_PERCENT_OVER_A_MILLION = 1;
const percentOf = (name: string, which: "proofLoad" | "tensileLoad", printed: readonly number[]) =>
  CLASSES.map((grade, i) => (100 * value(boltStrength(thread(name), grade))[which]) / (printed[i] ?? 0));
const isoLoads = ISO.flatMap(([name, area, within, tensile, proof]): Check[] => [
  {
    about: `${name} coarse: stress area ${area} mm²`,
    source: { name: "ISO 898-1", place: "nominal stress areas (copies of the table)", status: "read" },
    got: () => stressArea(thread(name)),
    want: area,
    within,
  },
  {
    about: `${name}: least tensile load ${tensile.join(", ")} N at 8.8, 10.9, 12.9, as percent of the printed`,
    source: {
      name: "ISO 898-1",
      place: "least tensile loads, coarse pitch (copies of the table)",
      status: "read",
    },
    got: () => percentOf(name, "tensileLoad", tensile),
    want: [100, 100, 100],
    within: Math.max(...tensile) > 1e6 ? ISO_PERCENT_OVER_A_MILLION : ISO_PERCENT,
  },
  ...(proof
    ? [
        {
          about: `${name}: proof load ${proof.join(", ")} N at 8.8, 10.9, 12.9, as percent of the printed`,
          source: {
            name: "ISO 898-1",
            place: "proof loads, coarse pitch (copies of the table)",
            status: "read",
          } as const,
          got: () => percentOf(name, "proofLoad", proof),
          want: [100, 100, 100],
          within: ISO_PERCENT,
        },
      ]
    : []),
]);

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

/* Fillet welds. */

const E70 = 70 * MPA_PER_KSI;
const AISC = "AISC 360, section J2.4";
const perInch = (sixteenths: number, electrode: number) => {
  // A long weld, of which every inch counts alike.
  const length = inches(10);
  return value(filletWeld({ leg: inches(sixteenths / 16), length, electrode, angle: degrees(0) }));
};
const kipPerInch = (newtons: number) => newtons / inches(10) / NEWTONS_PER_MM_PER_KIP_INCH;
const perSixteenth: Check[] = [
  {
    about: "E70, 1/16 in of leg: allowable 0.928 kip an inch",
    source: { name: AISC, place: "per sixteenth of leg, Ω 2.00", status: "recomputed" },
    got: () => kipPerInch(perInch(1, E70).allowable),
    want: 0.928,
    within: 5e-4,
  },
  {
    about: "E70, 1/16 in of leg: design 1.392 kip an inch",
    source: { name: AISC, place: "per sixteenth of leg, φ 0.75", status: "recomputed" },
    got: () => kipPerInch(perInch(1, E70).design),
    want: 1.392,
    within: 5e-4,
  },
  ...([3, 4, 5, 6] as const).map(
    (sixteenths): Check => ({
      about: `E70, ${sixteenths}/16 in of leg: allowable ${[2.784, 3.712, 4.64, 5.569][sixteenths - 3]} kip an inch`,
      source: { name: AISC, place: "per sixteenth of leg, Ω 2.00", status: "derived" },
      got: () => kipPerInch(perInch(sixteenths, E70).allowable),
      want: [2.784, 3.712, 4.64, 5.569][sixteenths - 3] ?? 0,
      within: 1e-3,
    }),
  ),
];
/** Allowable kip an inch of a fillet of one inch of leg, and of a quarter, by electrode. */
const table96 = (
  [
    [60, 12.73, 3.18],
    [70, 14.85, 3.71],
    [80, 16.97, 4.24],
    [90, 19.09, 4.77],
    [100, 21.21, 5.3],
    [110, 23.33, 5.83],
    [120, 25.45, 6.36],
  ] as const
).map(
  ([electrode, whole, quarter]): Check => ({
    about: `E${electrode}: ${whole} kip an inch for a leg of 1 in, ${quarter} for 1/4 in, at 0.30·FEXX`,
    source: { name: SHIGLEY, place: "table 9-6, allowable loads of fillet welds", status: "recomputed" },
    got: () =>
      [16, 4].map((sixteenths) => kipPerInch(perInch(sixteenths, electrode * MPA_PER_KSI).allowable)),
    want: [whole, quarter],
    within: 0.006,
  }),
);
const example = (angle: number) =>
  value(filletWeld({ leg: inches(0.75), length: inches(8), electrode: E70, angle: degrees(angle) })).design;
/** The example takes the throat as 0.707 of the leg. */
const ROUNDED_THROAT = 707 / 1000 / Math.SQRT1_2;
const printedExample: Check[] = [
  {
    about: "3/4 in by 8 in E70, along, throat as 0.707·leg: design 133.62 kip",
    source: { name: AISC, place: "a printed worked example, longitudinal", status: "read" },
    got: () => (example(0) * ROUNDED_THROAT) / KIP,
    want: 133.62,
    within: 0.005,
  },
  {
    about: "the same, across: 200.4 kip",
    source: { name: AISC, place: "a printed worked example, transverse", status: "read" },
    got: () => (example(90) * ROUNDED_THROAT) / KIP,
    want: 200.4,
    within: 0.05,
  },
  {
    about: "the same at 45°: 173.349 kip (printed 172.7, from a factor of 1.2925 that should be 1.2973)",
    source: { name: AISC, place: "a printed worked example, corrected", status: "derived" },
    got: () => (example(45) * ROUNDED_THROAT) / KIP,
    want: 173.349,
    within: 5e-4,
  },
  {
    about: "load angle factor 1.0, 1.297302, 1.5 at 0°, 45°, 90°",
    source: { name: AISC, place: "1 + 0.5·sin^1.5 θ", status: "derived" },
    got: () => [0, 45, 90].map((angle) => value(loadAngleFactor(degrees(angle)))),
    want: [1, 1.297302, 1.5],
    within: 5e-7,
  },
  {
    about: "37.12 kip on 10 in of E70, allowable: a leg of 1/4 in",
    source: { name: AISC, place: "turned round", status: "derived" },
    got: () =>
      value(
        requiredLeg(37.12 * KIP, {
          length: inches(10),
          electrode: E70,
          angle: degrees(0),
          method: "allowable",
        }),
      ) / 25.4,
    want: 0.25,
    within: 5e-5,
  },
  {
    about: "smallest legs on plates of 1/4, 1/2, 3/4 and 1 in: 2, 3, 4 and 5 sixteenths",
    source: { name: "AISC 360", place: "table J2.4", status: "from memory" },
    got: () => [0.25, 0.5, 0.75, 1].map((thick) => value(smallestLeg(mm(thick * 25.4))) / (25.4 / 16)),
    want: [2, 3, 4, 5],
    within: 1e-9,
  },
];

export default {
  topic: "Bolts, bracket holes and fillet welds",
  checks: [
    ...inchAreas([UNC, "coarse series (copies of the table)"]),
    ...inchAreas([UNF, "fine series (copies of the table)"]),
    ...isoLoads,
    ...grades,
    ...gradeTwo,
    ...torques,
    ...shigleyBolt,
    ...holes,
    ...perSixteenth,
    ...table96,
    ...printedExample,
  ],
} satisfies Topic;
