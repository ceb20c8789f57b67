import { type Outcome, ok, problem } from "../outcome";
import { inches, type Millimetres, mm } from "../units/length";

/** A screw thread by its designation. */
export type Thread = {
  /** "1/2-13", "M12". */
  name: string;
  series: "UNC" | "UNF" | "metric coarse";
  diameter: Millimetres;
  pitch: Millimetres;
};

/** Diameter in inches as written, its size, threads an inch of the coarse and of the fine series: ASME B1.1. */
const UNIFIED: readonly (readonly [string, number, number, number])[] = [
  ["1/4", 1 / 4, 20, 28],
  ["5/16", 5 / 16, 18, 24],
  ["3/8", 3 / 8, 16, 24],
  ["7/16", 7 / 16, 14, 20],
  ["1/2", 1 / 2, 13, 20],
  ["9/16", 9 / 16, 12, 18],
  ["5/8", 5 / 8, 11, 18],
  ["3/4", 3 / 4, 10, 16],
  ["7/8", 7 / 8, 9, 14],
  ["1", 1, 8, 12],
  ["1 1/8", 9 / 8, 7, 12],
  ["1 1/4", 5 / 4, 7, 12],
  ["1 3/8", 11 / 8, 6, 12],
  ["1 1/2", 3 / 2, 6, 12],
];

/** Diameter and coarse pitch, millimetres: ISO 261. */
const METRIC_COARSE: readonly (readonly [number, number])[] = [
  [5, 0.8],
  [6, 1],
  [8, 1.25],
  [10, 1.5],
  [12, 1.75],
  [14, 2],
  [16, 2],
  [18, 2.5],
  [20, 2.5],
  [22, 2.5],
  [24, 3],
  [27, 3],
  [30, 3.5],
  [33, 3.5],
  [36, 4],
  [39, 4],
];

const unified = (series: "UNC" | "UNF", name: string, size: number, perInch: number): Thread => ({
  name: `${name}-${perInch}`,
  series,
  diameter: inches(size),
  pitch: inches(1 / perInch),
});

/** Every thread known here: inch coarse, inch fine, metric coarse, each from thin to thick. */
export const THREADS: readonly Thread[] = [
  ...UNIFIED.map(([name, size, coarse]) => unified("UNC", name, size, coarse)),
  ...UNIFIED.map(([name, size, , fine]) => unified("UNF", name, size, fine)),
  ...METRIC_COARSE.map(
    ([size, pitch]): Thread => ({
      name: `M${size}`,
      series: "metric coarse",
      diameter: mm(size),
      pitch: mm(pitch),
    }),
  ),
];

/** The designation without marks, series and class that say nothing new: `1/2"-13 UNC-2A` as `1/2-13`. */
const plain = (text: string): string =>
  text
    .normalize("NFKC")
    .replace(/[\u2044\u2215]/g, "/")
    .replace(/[−–—]/g, "-")
    .toUpperCase()
    .replace(/"|″|\bIN\b/g, "")
    .replace(/\s*UN[CFR]+(\s*-?\s*[123][AB])?\s*$/, "")
    .replace(/^(\d)-(\d+\/\d+)/, "$1 $2")
    .replace(/\s*-\s*/g, "-")
    .replace(/\s*[X×]\s*/g, "X")
    .replace(/\s+/g, " ")
    .trim();

/**
 * Finds a thread by its designation: "1/2-13", "1/2-13 UNC", "1 1/8-12", "M12", "M12x1.75".
 * Source: ASME B1.1 (UNC and UNF, 1/4 to 1 1/2 in), ISO 261 (coarse pitches, M5 to M39).
 * @returns a problem for anything else, fine metric pitches included
 * @example findThread("1/2-13 UNC") // diameter 12.7, pitch 1.953846
 */
export function findThread(designation: string): Outcome<Thread> {
  const wanted = plain(designation);
  const found = THREADS.find(
    (one) => wanted === one.name || (one.name.startsWith("M") && wanted === `${one.name}X${one.pitch}`),
  );
  return found
    ? ok(found)
    : problem(
        `“${designation.slice(0, 30)}” is not a thread known here: write it as 1/2-13, 1/2-20 or M12 (coarse).`,
      );
}

/**
 * Tensile stress area of a thread: inch 0.7854·(D − 0.9743·P)², metric (π/4)·(d − 0.9382·P)²; P the pitch.
 * Source: ASME B1.1 and ISO 898-1, each with its own rounded constant.
 * @returns square millimetres
 * @example stressArea(1/2-13) // 91.55, which is 0.1419 in²; stressArea(M12) // 84.27
 */
export function stressArea({ series, diameter, pitch }: Thread): number {
  const [quarterPi, share] = series === "metric coarse" ? [Math.PI / 4, 0.9382] : [0.7854, 0.9743];
  return quarterPi * (diameter - share * pitch) ** 2;
}

/** Area of the plain shank, (π/4)·d², square millimetres. @example shankArea(M12) // 113.097 */
export const shankArea = ({ diameter }: Thread): number => (Math.PI / 4) * diameter * diameter;
