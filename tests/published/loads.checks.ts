import { Matrix, solve } from "ml-matrix";
import { axleLoadsAfterMove } from "../../app/domain/loads/axle-move";
import { type AxleLift, cgHeightByLifting } from "../../app/domain/loads/cg-height";
import { weightPlace } from "../../app/domain/loads/corner-weights";
import { loadTransfer } from "../../app/domain/loads/load-transfer";
import { springLoad } from "../../app/domain/loads/spring-load";
import type { Outcome } from "../../app/domain/outcome";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Topic } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const G = 9.81;

const lifted: AxleLift = {
  weight: 4000,
  wheelbase: inches(110),
  levelLoad: 2200,
  liftedLoad: 2290,
  lift: inches(20),
  downRadius: inches(15),
  liftedRadius: inches(15),
};

/** Front axle lifted by a: rear distances level and lifted, the plumb line's foot on the line of the axles, height over it. */
function byDirective(
  weight: number,
  base: number,
  frontLevel: number,
  frontLifted: number,
  a: number,
): number {
  const liftedBase = Math.sqrt(base ** 2 - a ** 2);
  const [level, tilted] = [(frontLevel * base) / weight, (frontLifted * liftedBase) / weight];
  const up = (a * tilted) / liftedBase;
  return Math.tan(Math.acos(a / base)) * (level - Math.hypot(up, tilted));
}
const directive = (
  [
    [15_000, 2800, 8200, 7850, 500],
    [21_000, 3665, 9800, 9310, 600],
    [9000, 2400, 4700, 4420, 700],
  ] as const
).map(
  ([weight, base, level, up, a]): Check => ({
    about: `${weight} N on ${base} mm, front axle ${level} N level and ${up} N lifted by ${a} mm: height over the axles`,
    source: {
      name: "A body-builder directive",
      place: "centre of gravity heights, formulas 1 to 9",
      status: "derived",
    },
    got: () =>
      value(
        cgHeightByLifting({
          weight,
          wheelbase: mm(base),
          levelLoad: weight - level,
          liftedLoad: weight - up,
          lift: mm(a),
          downRadius: mm(350),
          liftedRadius: mm(350),
        }),
      ).aboveAxles,
    want: byDirective(weight, base, level, up, a),
    within: 1e-8,
  }),
);

/** Axle loads that hold the parts up: forces and moments. Each part: weight, station behind the old front axle. */
function bySolving(parts: readonly (readonly [number, number])[], front: number, rear: number): number[] {
  const weight = parts.reduce((sum, [w]) => sum + w, 0);
  const moment = parts.reduce((sum, [w, x]) => sum + w * x, 0);
  const loads = solve(
    new Matrix([
      [1, 1],
      [front, rear],
    ]),
    Matrix.columnVector([weight, moment]),
  );
  return [loads.get(0, 0), loads.get(1, 0)];
}
const moves = (
  [
    [100, 0],
    [0, -120],
    [75, 50],
    [-60, 40],
  ] as const
).map(
  ([front, rear]): Check => ({
    about: `8300 and 6800 N on 2800 mm, axles of 1500 and 1600 N moved ${front} and ${rear} mm forward: axle loads`,
    source: { name: "ml-matrix", place: "forces and moments of three parts", status: "library" },
    got: () => {
      const after = value(
        axleLoadsAfterMove({
          loads: { front: 8300, rear: 6800 },
          wheelbase: mm(2800),
          frontForward: mm(front),
          rearForward: mm(rear),
          frontUnsprung: 1500,
          rearUnsprung: 1600,
        }),
      );
      return [after.front, after.rear];
    },
    want: bySolving(
      [
        [1500, -front],
        [1600, 2800 - rear],
        [12_000, (5200 / 12_000) * 2800],
      ],
      -front,
      2800 - rear,
    ),
    within: 1e-8,
  }),
);

const HIBBELER = "Hibbeler, Engineering Mechanics: Dynamics";

const CAR = { front: (2000 * G * 0.75) / 2, rear: (2000 * G * 1.25) / 2 };
/** The slipping rear wheels push with a quarter of their load: the axle loads at the acceleration that does so. */
function slippingCar() {
  const acceleration = (0.25 * CAR.rear) / (2000 * G * (1 - (0.25 * 0.3) / 2));
  return value(loadTransfer(CAR, mm(300), mm(2000), acceleration));
}

export default {
  topic: "Weights and axle loads",
  checks: [
    {
      about:
        "wheelbase 110 in, 4000 lb, 90 lb gained, 20 in lifted, radius 15 in: tilt 10.47568°, height 28.3856 in, h = r + L·ΔW/(W·tan θ)",
      source: { name: "ISO 10392", place: "axle lift method, equal radii", status: "derived" },
      got: () => {
        const found = value(cgHeightByLifting(lifted));
        return [found.tilt, toInches(found.height)];
      },
      want: [10.47568, 28.3856],
      within: 5e-5,
    },
    ...directive,
    {
      about:
        "2 Mg car, rear wheels slipping at μ 0.25, CG 1.25 m behind the front, 0.75 m ahead of the rear, 0.3 m high: front 6.88 kN",
      source: { name: HIBBELER, place: "example 17.5", status: "recomputed" },
      got: () => slippingCar().front / 1000,
      want: 6.88,
      within: 0.005,
    },
    {
      about: "the same car: rear 12.7 kN",
      source: { name: HIBBELER, place: "example 17.5", status: "recomputed" },
      got: () => slippingCar().rear / 1000,
      want: 12.7,
      within: 0.05,
    },
    {
      about: "the same car: acceleration 1.59 m/s²",
      source: { name: HIBBELER, place: "example 17.5", status: "recomputed" },
      got: () => (0.25 * value(loadTransfer(CAR, mm(300), mm(2000), 1.59 / G)).rear) / 2000,
      want: 1.59,
      within: 0.005,
    },
    {
      about:
        "125 kg motorcycle (0.8 m ahead of the rear wheel, 0.6 m high) and 75 kg rider (0.4, 0.9): front wheel leaves the ground at 8.95 m/s²",
      source: { name: HIBBELER, place: "example 17.6", status: "recomputed" },
      got: () => {
        const ahead = (125 * 0.8 + 75 * 0.4) / 200;
        const height = (125 * 0.6 + 75 * 0.9) / 200;
        const wheelbase = 1.5;
        const front = (200 * G * ahead) / wheelbase;
        const loads = { front, rear: 200 * G - front };
        return (value(loadTransfer(loads, mm(height * 1000), mm(wheelbase * 1000), 0.1)).liftsAt ?? 0) * G;
      },
      want: 8.95,
      within: 0.005,
    },
    ...moves,
    {
      about:
        "front 4000 N, rear 3000 N, left front 100 N more than right, 2800 by 1500 mm: 1200 mm back, 10.71 mm left",
      source: { name: "Statics, moments about the axles", status: "derived" },
      got: () => {
        const place = value(
          weightPlace(
            { leftFront: 2050, rightFront: 1950, leftRear: 1500, rightRear: 1500 },
            { wheelbase: mm(2800), frontTrack: mm(1500), rearTrack: mm(1500) },
          ),
        );
        return [place.behindFront, place.leftOfCentre];
      },
      want: [1200, 75_000 / 7000],
      within: 1e-9,
    },
    {
      about: "corner of 900 lb with 150 lb outside the spring carries 750 lb on a leaf-sprung solid axle",
      source: { name: "common practice, no source", status: "practice" },
      got: () => value(springLoad(900, 150)).load,
      want: 750,
      within: 1e-9,
    },
  ],
} satisfies Topic;
