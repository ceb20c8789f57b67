import {
  MPA_PER_KSI,
  NEWTONS_PER_MM_PER_KIP_INCH,
  NEWTONS_PER_POUND,
} from "../../app/domain/hardware/customary";
import { filletWeld, loadAngleFactor, requiredLeg, smallestLeg } from "../../app/domain/hardware/fillet-weld";
import type { Outcome } from "../../app/domain/outcome";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm } from "../../app/domain/units/length";
import type { Check } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const KIP = 1000 * NEWTONS_PER_POUND;
const SHIGLEY = "Shigley & Mischke, Mechanical Engineering Design";
const E70 = 70 * MPA_PER_KSI;
const AISC = "AISC 360";
const perInch = (sixteenths: number, electrode: number) => {
  // A long weld, of which every inch counts alike.
  const length = inches(10);
  return value(filletWeld({ leg: inches(sixteenths / 16), length, electrode, angle: degrees(0) }));
};
const kipPerInch = (newtons: number) => newtons / inches(10) / NEWTONS_PER_MM_PER_KIP_INCH;
const perSixteenth: Check[] = [
  {
    about: "E70, 1/16 in of leg: allowable 0.928 kip an inch",
    source: { name: AISC, place: "section J2.4, per sixteenth of leg, Ω 2.00", status: "recomputed" },
    got: () => kipPerInch(perInch(1, E70).allowable),
    want: 0.928,
    within: 5e-4,
  },
  {
    about: "E70, 1/16 in of leg: design 1.392 kip an inch",
    source: { name: AISC, place: "section J2.4, per sixteenth of leg, φ 0.75", status: "recomputed" },
    got: () => kipPerInch(perInch(1, E70).design),
    want: 1.392,
    within: 5e-4,
  },
  ...([3, 4, 5, 6] as const).map(
    (sixteenths): Check => ({
      about: `E70, ${sixteenths}/16 in of leg: allowable ${[2.784, 3.712, 4.64, 5.569][sixteenths - 3]} kip an inch`,
      source: { name: AISC, place: "section J2.4, per sixteenth of leg, Ω 2.00", status: "derived" },
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
    source: { name: AISC, place: "section J2.4, a printed worked example, longitudinal", status: "read" },
    got: () => (example(0) * ROUNDED_THROAT) / KIP,
    want: 133.62,
    within: 0.005,
  },
  {
    about: "the same, across: 200.4 kip",
    source: { name: AISC, place: "section J2.4, a printed worked example, transverse", status: "read" },
    got: () => (example(90) * ROUNDED_THROAT) / KIP,
    want: 200.4,
    within: 0.05,
  },
  {
    about: "the same at 45°: 173.349 kip (printed 172.7, from a factor of 1.2925 that should be 1.2973)",
    source: { name: AISC, place: "section J2.4, a printed worked example, corrected", status: "derived" },
    got: () => (example(45) * ROUNDED_THROAT) / KIP,
    want: 173.349,
    within: 5e-4,
  },
  {
    about: "load angle factor 1.0, 1.297302, 1.5 at 0°, 45°, 90°",
    source: { name: AISC, place: "section J2.4, 1 + 0.5·sin^1.5 θ", status: "derived" },
    got: () => [0, 45, 90].map((angle) => value(loadAngleFactor(degrees(angle)))),
    want: [1, 1.297302, 1.5],
    within: 5e-7,
  },
  {
    about: "37.12 kip on 10 in of E70, allowable: a leg of 1/4 in",
    source: { name: AISC, place: "section J2.4, turned round", status: "derived" },
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

/** Fillet welds against the specification, a handbook table and a printed example. */
export const weldChecks: Check[] = [...perSixteenth, ...table96, ...printedExample];
