import { Matrix, SingularValueDecomposition } from "ml-matrix";
import { probit, sampleStandardDeviation } from "simple-statistics";
import { curvatures, fNumbers, meanAndDeviation } from "../../app/domain/floor-survey/f-numbers";
import { FLOOR_CLASSES, floorClass, localMinimum } from "../../app/domain/floor-survey/floor-classes";
import { type FloorHeight, perMetre, surveyFloor } from "../../app/domain/floor-survey/survey";
import { normalQuantile } from "../../app/domain/geometry/snooping";
import {
  allowedSlope,
  gaugeSlope,
  landsOut,
  levelFromHeights,
  type StandHeight,
} from "../../app/domain/layout/level";
import { gaugeUncertainty } from "../../app/domain/layout/level-combined";
import { shiftBySlope } from "../../app/domain/layout/level-shift";
import { levelUncertainty } from "../../app/domain/layout/level-uncertainty";
import type { Outcome } from "../../app/domain/outcome";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";
import { BUMPY, PAD, TREES } from "./floor-heights";

function must<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
}
const trigonometry = (place: string): Source => ({ name: "Plane trigonometry", place, status: "derived" });

/** Four stands on a frame that rises so many inches in a foot to the front. */
const rising = (perFoot: number): StandHeight[] =>
  [
    [0, 15],
    [0, -15],
    [96, 15],
    [96, -15],
  ].map(([x = 0, y = 0]) => ({
    id: `${x}/${y}`,
    x: inches(x),
    y: inches(y),
    height: inches(20 + (x / 12) * perFoot),
  }));

const pad: Source = {
  name: "Concrete test pad, floor flatness work sheet of a research centre",
  place: "by ASTM E1155M, line 0 (scribd 382981185)",
  status: "read",
};
const aci: Source = { name: "ACI 117-10", place: "table 4.8.5.1 and 4.8.5.3", status: "read" };

const trees: Source = {
  name: "R data set trees (Ryan, Joiner and Ryan, The Minitab Student Handbook)",
  place: "volume on girth and height",
  status: "recomputed",
};
const woods = (): FloorHeight[] =>
  TREES.map(([x, y, height]) => ({ x: mm(x), y: mm(y), height: mm(height) }));

/** The same plane by the singular value decomposition of another library. */
const planeBySvd = (heights: readonly FloorHeight[]): number[] => {
  const rows = new Matrix(heights.map(({ x, y }) => [1, x, y]));
  const right = Matrix.columnVector(heights.map(({ height }) => height));
  return new SingularValueDecomposition(rows, { autoTranspose: true }).solve(right).to1DArray();
};

const checks: Check[] = [
  ...(
    [
      [1 / 16, 0.2984],
      [1 / 8, 0.5968],
      [3 / 16, 0.8952],
      [1 / 4, 1.1935],
      [1 / 2, 2.3859],
      [1, 4.7636],
    ] as const
  ).map(
    ([perFoot, want]): Check => ({
      about: `a frame that rises ${perFoot} in a foot stands nose high`,
      source: trigonometry("atan(rise/12)"),
      got: () => must(levelFromHeights(rising(perFoot))).noseHigh,
      want,
      within: 0.00005,
    }),
  ),
  {
    about: "1/8 and 1/4 in a foot in mm/m",
    source: trigonometry("rise/12"),
    got: () =>
      [1 / 8, 1 / 4].map(
        (rise) => must(surveyFloor(rising(rise).map(({ x, y, height }) => ({ x, y, height })))).riseAlong,
      ),
    want: [10.417, 20.833],
    within: 0.0005,
  },
  {
    about: "1 mm/m as an angle, in degrees and in seconds",
    source: trigonometry("atan(1/1000)"),
    got: () => [perMetre(1), perMetre(1) * 3600],
    want: [0.0572958, 206.2647],
    within: 0.00008,
  },
  {
    about: "a level of 0.0005 in a foot to the division: 8.5944 seconds",
    source: trigonometry("atan(0.0005/12)"),
    got: () => must(levelFromHeights(rising(0.0005))).noseHigh * 3600,
    want: 8.5944,
    within: 0.00005,
  },
  {
    about: "a point 24 in up at 1° lands out along the floor",
    source: trigonometry("24·sin 1°"),
    got: () => toInches(landsOut(inches(24), degrees(1))),
    want: 0.41886,
    within: 0.000005,
  },
  {
    about: "points 24 and 36 in up at 0.5°, as a vector; sine and tangent are the same to these places",
    source: trigonometry("z·tan 0.5°"),
    got: () =>
      [24, 36].map(
        (z) => -toInches(shiftBySlope(inches(z), { noseHigh: degrees(0.5), rightHigh: degrees(0) }).x),
      ),
    want: [0.2094, 0.3142],
    within: 0.00005,
  },
  {
    about: "a point 30 in up at 1° lands 0.524 in out",
    source: trigonometry("30·sin 1°"),
    got: () => toInches(landsOut(inches(30), degrees(1))),
    want: 0.524,
    within: 0.0005,
  },
  {
    about:
      "over a base of 60 in: 0.1°, 0.25°, 0.5° and 1° are 0.10472, 0.26180, 0.52361, 1.04730 in, read back as slopes",
    source: trigonometry("60·tan θ"),
    got: () =>
      [0.10472, 0.2618, 0.52361, 1.0473].map((rise) => must(levelFromHeights(rising(rise / 5))).noseHigh),
    want: [0.1, 0.25, 0.5, 1],
    within: 0.00001,
  },
  {
    about: "1/16 in allowed at 36 in: the slope that does it",
    source: trigonometry("asin(1/576)"),
    got: () => allowedSlope(inches(1 / 16), inches(36)),
    want: (Math.asin(1 / 576) * 180) / Math.PI,
    within: 1e-12,
  },
  {
    about: "a gauge reads 0.4° and, turned, 0.2°: slope 0.1°, own error 0.3°",
    source: { name: "common practice, no source", place: "reversal of a level", status: "practice" },
    got: () => {
      const { slope, gaugeOffset } = gaugeSlope(degrees(0.4), degrees(0.2));
      return [slope, gaugeOffset];
    },
    want: [0.1, 0.3],
    within: 1e-12,
  },
  {
    about: "a reading rounded to ±0.05°: 0.028868°, halved by turning and two places",
    source: { name: "JCGM 100:2008", place: "4.3.7, rectangular distribution", status: "derived" },
    got: () => gaugeUncertainty(degrees(0.1)) * 2,
    want: 0.028868,
    within: 0.0000005,
  },
  {
    about: "plane through 31 points: constant and both slopes",
    source: trees,
    got: () => {
      const { heightAtA, riseAlong, riseAcross } = must(surveyFloor(woods()));
      return [heightAtA, riseAlong / 1000, riseAcross / 1000];
    },
    want: [-57.9877, 4.7082, 0.3393],
    within: 0.00005,
  },
  {
    about: "what lies over and under that plane: standard deviation",
    source: trees,
    got: () => must(surveyFloor(woods())).deviation ?? 0,
    want: 3.882,
    within: 0.0005,
  },
  {
    about: "standard errors of both slopes, taken back from the angles of levelUncertainty",
    source: trees,
    got: () => {
      const stands = woods().map((one, i) => ({ id: `${i}`, ...one }));
      const survey = must(surveyFloor(woods()));
      const unsure = must(levelUncertainty(stands, survey.deviation ?? mm(1)));
      const slope = (angle: number, rise: number) => ((angle * Math.PI) / 180) * (1 + (rise / 1000) ** 2);
      return [slope(unsure.noseHigh, survey.riseAlong), slope(unsure.rightHigh, survey.riseAcross)];
    },
    want: [0.2643, 0.1302],
    within: 0.00005,
  },
  {
    about: "curvatures of fourteen heights",
    source: pad,
    got: () => curvatures(PAD),
    want: [0.635, -0.102, -0.381, -1.956, -0.457, 1.448, 0.61, -1.854, -0.787, 1.118, -1.88, -1.448],
    within: 0.0011,
  },
  {
    about: "mean and standard deviation of these curvatures",
    source: { ...pad, status: "derived" },
    got: () => {
      const { mean, deviation } = meanAndDeviation(curvatures(PAD));
      return [mean, deviation];
    },
    want: [-0.42125, 1.20119],
    within: 0.000005,
  },
  {
    about: "flatness number from them, the constant 4.57 in from memory",
    source: { ...pad, status: "derived" },
    got: () => must(fNumbers([PAD])).flatness,
    want: 28.84,
    within: 0.005,
  },
  ...FLOOR_CLASSES.map(
    (one, i): Check => ({
      about: `a floor that just reaches ${one.flatness}/${one.levelness}`,
      source: aci,
      got: () => floorClass(one.flatness, one.levelness)?.name ?? "none",
      want: ["conventional", "moderately flat", "flat", "very flat", "super flat"][i] ?? "",
    }),
  ),
  {
    about: "classes: flatness and levelness",
    source: aci,
    got: () => FLOOR_CLASSES.flatMap((one) => [one.flatness, one.levelness]),
    want: [20, 15, 25, 20, 35, 25, 45, 35, 60, 40],
    within: 0,
  },
  {
    about: "a floor of 34/30 is not flat yet",
    source: aci,
    got: () => floorClass(34, 30)?.name ?? "none",
    want: "moderately flat",
  },
  {
    about: "least local value of a flat floor: three fifths of 35 and 25",
    source: aci,
    got: () => {
      const least = localMinimum({ name: "flat", flatness: 35, levelness: 25 });
      return [least.flatness, least.levelness];
    },
    want: [21, 15],
    within: 0,
  },
  {
    about: "plane of 35 heights against a singular value decomposition",
    source: { name: "ml-matrix", place: "SingularValueDecomposition.solve", status: "library" },
    got: () => {
      const { heightAtA, riseAlong, riseAcross } = must(surveyFloor(BUMPY));
      return [heightAtA, riseAlong / 1000, riseAcross / 1000];
    },
    want: planeBySvd(BUMPY),
    within: 1e-9,
  },
  {
    about: "standard deviation of curvatures",
    source: { name: "simple-statistics", place: "sampleStandardDeviation", status: "library" },
    got: () => meanAndDeviation(curvatures(PAD)).deviation,
    want: sampleStandardDeviation(curvatures(PAD)),
    within: 1e-9,
  },
  {
    about: "quantiles of the normal law at 0.1, 0.8 and 0.99; the library's are approximate",
    source: { name: "simple-statistics", place: "probit", status: "library" },
    got: () => [0.1, 0.8, 0.99].map(normalQuantile),
    want: [0.1, 0.8, 0.99].map(probit),
    within: 0.005,
  },
];

export default { topic: "Level and floors", checks } satisfies Topic;
