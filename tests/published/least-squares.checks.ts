import { Matrix, QrDecomposition, SingularValueDecomposition } from "ml-matrix";
import { linearRegression } from "simple-statistics";
import { type Fit, leastSquares } from "../../app/domain/geometry/least-squares";
import { combine } from "../../app/domain/uncertainty/propagate";
import type { Check, Source, Topic } from "./check";
import { ANSCOMBE, STACK_LOSS, WOMEN } from "./least-squares-data";
import { byRest, errors, must, spread } from "./least-squares-fits";
import { NORRIS } from "./nist-strd";
import { NIST_STRD } from "./nist-strd-checks";

/* JCGM 100, H.3: a thermometer's corrections against its readings less 20 °C. */
const T = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
const B = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
const H3: Source = { name: "JCGM 100:2008", place: "H.3, thermometer", status: "read" };
const thermometer = () =>
  must(
    leastSquares(
      T.map((t) => [1, t - 20]),
      B,
    ),
  );
const thermometerCorrelation = () => {
  const { cofactor } = thermometer();
  return (cofactor[0]?.[1] ?? 0) / Math.sqrt((cofactor[0]?.[0] ?? 0) * (cofactor[1]?.[1] ?? 0));
};
const at30 = () => {
  const fit = thermometer();
  const [y1 = 0, y2 = 0] = fit.solution;
  const [u1 = 0, u2 = 0] = errors(fit);
  const came = combine(y1 + 10 * y2, [1, 10], {
    inputs: [
      { name: "y1", value: y1, uncertainty: u1, freedom: 9 },
      { name: "y2", value: y2, uncertainty: u2, freedom: 9 },
    ],
    correlations: [{ a: "y1", b: "y2", r: thermometerCorrelation() }],
  });
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};

const anscombe: Source = {
  name: "Anscombe, Graphs in Statistical Analysis (1973)",
  place: "the American Statistician 27, table",
  status: "recomputed",
};
const women: Source = {
  name: "R data set women (McNeil, Interactive Data Analysis)",
  place: "weight on height",
  status: "recomputed",
};
const stack: Source = {
  name: "R data set stackloss (Brownlee, Statistical Theory and Methodology)",
  place: "loss on air flow, water temperature and acid",
  status: "recomputed",
};
const ghilani: Source = {
  name: "Ghilani, Adjustment Computations",
  place: "ch. 11, line through four points",
  status: "recomputed",
};
const four = () =>
  byRest([
    [4.5, 3],
    [4.25, 4.25],
    [5.5, 5.5],
    [5.5, 8],
  ]);

/* Against other libraries, with drawn figures that are the same every time. */
function drawn(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2_147_483_648 - 1;
  };
}
/** 12 rows by 4 columns; the last column is nearly the sum of the others when `near` is small. */
const system = (seed: number, near: number) => {
  const next = drawn(seed);
  const rows = Array.from({ length: 12 }, () => {
    const [a, b, c, d] = [next(), next(), next(), next()];
    return [a, b, c, a + b + c + near * d];
  });
  return { rows, observed: rows.map(() => next()) };
};
const SEEDS = Array.from({ length: 25 }, (_, i) => 1000 + 77 * i);
const ours = (near: number, pick: (fit: Fit) => number[]): number[] =>
  SEEDS.flatMap((seed) => {
    const { rows, observed } = system(seed, near);
    return pick(must(leastSquares(rows, observed)));
  });
const theirs = (near: number, solve: (rows: Matrix, right: Matrix) => number[]): number[] =>
  SEEDS.flatMap((seed) => {
    const { rows, observed } = system(seed, near);
    return solve(new Matrix(rows), Matrix.columnVector(observed));
  });
const library = (place: string): Source => ({ name: "ml-matrix", place, status: "library" });

export default {
  topic: "Least squares",
  checks: [
    ...NIST_STRD,
    {
      about: "thermometer: y1 −0.1712 with s 0.0029",
      source: H3,
      got: () => [thermometer().solution[0] ?? 0, errors(thermometer())[0] ?? 0],
      want: [-0.1712, 0.0029],
      within: 5e-5,
    },
    {
      about: "thermometer: y2 0.00218 with s 0.00067",
      source: H3,
      got: () => [thermometer().solution[1] ?? 0, errors(thermometer())[1] ?? 0],
      want: [0.00218, 0.00067],
      within: 5e-6,
    },
    {
      about: "thermometer: correlation of y1 and y2",
      source: H3,
      got: thermometerCorrelation,
      want: -0.93,
      within: 5e-4,
    },
    {
      about: "thermometer: s of a correction",
      source: H3,
      got: () => spread(thermometer()),
      want: 0.0035,
      within: 5e-5,
    },
    {
      about: "thermometer: correction at 30 °C −0.1494 with u 0.0041, correlation counted",
      source: H3,
      got: () => [at30().value, at30().uncertainty],
      want: [-0.1494, 0.0041],
      within: 5e-5,
    },
    ...ANSCOMBE.map(
      (rows, i): Check => ({
        about: `set ${i + 1}: intercept 3.0, slope 0.5`,
        source: anscombe,
        got: () => byRest(rows).solution,
        want: [3, 0.5],
        within: 0.005,
      }),
    ),
    {
      about: "the four sets: standard error of the slope 0.118, residual sum of squares 13.75",
      source: anscombe,
      got: () =>
        ANSCOMBE.flatMap((rows) => {
          const fit = byRest(rows);
          return [errors(fit)[1] ?? 0, fit.residuals.reduce((sum, v) => sum + v * v, 0) / 1000];
        }),
      want: ANSCOMBE.flatMap(() => [0.118, 0.01375]),
      within: 0.0005,
    },
    {
      about: "fifteen heights and weights: −87.51667 and 3.45, errors 5.93694 and 0.09114",
      source: women,
      got: () => [...byRest(WOMEN).solution, ...errors(byRest(WOMEN))],
      want: [-87.51667, 3.45, 5.93694, 0.09114],
      within: 5e-6,
    },
    {
      about: "fifteen heights and weights: residual standard error",
      source: women,
      got: () => spread(byRest(WOMEN)),
      want: 1.525,
      within: 0.0005,
    },
    {
      about: "21 days of a plant, three slopes: coefficients",
      source: stack,
      got: () => byRest(STACK_LOSS).solution,
      want: [-39.9197, 0.7156, 1.2953, -0.1521],
      within: 5e-5,
    },
    {
      about: "21 days of a plant: standard errors",
      source: stack,
      got: () => errors(byRest(STACK_LOSS)),
      want: [11.896, 0.1349, 0.368, 0.1563],
      within: 5e-5,
    },
    {
      about: "21 days of a plant: residual standard error",
      source: stack,
      got: () => spread(byRest(STACK_LOSS)),
      want: 3.243,
      within: 0.0005,
    },
    {
      about: "(3, 4.5), (4.25, 4.25), (5.5, 5.5), (8, 5.5): slope 0.246 and intercept 3.663",
      source: ghilani,
      got: () => [...four().solution].reverse(),
      want: [0.246, 3.663],
      within: 0.0005,
    },
    {
      about: "25 drawn systems of 12 rows and 4 columns: solutions",
      source: library("QrDecomposition.solve"),
      got: () => ours(1, (fit) => fit.solution),
      want: theirs(1, (rows, right) => new QrDecomposition(rows).solve(right).to1DArray()),
      within: 1e-12,
    },
    {
      about: "25 drawn systems: inverse of the normal matrix",
      source: library("SingularValueDecomposition.inverse"),
      got: () => ours(1, (fit) => fit.cofactor.flat()),
      want: theirs(1, (rows) =>
        new SingularValueDecomposition(rows.transpose().mmul(rows)).inverse().to1DArray(),
      ),
      within: 1e-10,
    },
    {
      about: "25 systems with a column that is the sum of the others but for a ten-thousandth: residuals",
      source: library("QrDecomposition.solve"),
      got: () => ours(1e-4, (fit) => fit.residuals),
      want: theirs(1e-4, (rows, right) =>
        Matrix.sub(right, rows.mmul(new QrDecomposition(rows).solve(right))).to1DArray(),
      ),
      within: 1e-11,
    },
    {
      about: "the same 25 ill-conditioned systems: solutions, some in thousands",
      source: library("SingularValueDecomposition.solve"),
      got: () => ours(1e-4, (fit) => fit.solution),
      want: theirs(1e-4, (rows, right) =>
        new SingularValueDecomposition(rows, { autoTranspose: true }).solve(right).to1DArray(),
      ),
      within: 1e-6,
    },
    {
      about: "Norris's line: slope and intercept",
      source: { name: "simple-statistics", place: "linearRegression", status: "library" },
      got: () => [...byRest(NORRIS).solution].reverse(),
      want: (() => {
        const { m, b } = linearRegression(NORRIS.map(([y, x]) => [x, y]));
        return [m, b];
      })(),
      within: 1e-9,
    },
  ],
} satisfies Topic;
