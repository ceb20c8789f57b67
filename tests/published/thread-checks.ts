import { boltStrength } from "../../app/domain/hardware/bolt";
import { findThread, stressArea, type Thread } from "../../app/domain/hardware/thread";
import type { Outcome } from "../../app/domain/outcome";
import type { Check } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const thread = (name: string): Thread => value(findThread(name));
const SQUARE_INCH = 25.4 ** 2;

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
/** The loads were made from the area rounded to three figures and cut or rounded to three figures themselves. */
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

/** Stress areas and loads of threads against the tables. */
export const threadChecks: Check[] = [
  ...inchAreas([UNC, "coarse series (copies of the table)"]),
  ...inchAreas([UNF, "fine series (copies of the table)"]),
  ...isoLoads,
];
