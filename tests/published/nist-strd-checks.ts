import type { Fit } from "../../app/domain/geometry/least-squares";
import type { Check, Source } from "./check";
import { byPowers, byRest, errors, ones, over, spread, throughOrigin } from "./least-squares-fits";
import { LONGLEY, NORRIS, PONTIUS, WAMPLER_1, WAMPLER_2, WAMPLER_3, WAMPLER_4, WAMPLER_5 } from "./nist-strd";

const strd = (set: string): Source => ({
  name: "NIST Statistical Reference Datasets",
  place: `linear least squares, ${set}`,
  status: "read",
});

/** Three checks of a set with certified values, as ratios to them. */
const certified = (
  set: string,
  about: string,
  solve: () => Fit,
  [values, deviations, residual]: readonly [readonly number[], readonly number[], number],
  within: number,
): Check[] => [
  {
    about: `${set}, ${about}: coefficients over the certified ${values.join(", ")}`,
    source: strd(set),
    got: () => over(solve().solution, values),
    want: ones(values.length),
    within,
  },
  {
    about: `${set}: standard deviations over the certified ${deviations.join(", ")}`,
    source: strd(set),
    got: () => over(errors(solve()), deviations),
    want: ones(deviations.length),
    within,
  },
  {
    about: `${set}: residual standard deviation over the certified ${residual}`,
    source: strd(set),
    got: () => spread(solve()) / residual,
    want: 1,
    within,
  },
];

const WAMPLER_DEVIATIONS = [
  2152.3262467817, 2363.55173469681, 779.343524331583, 101.47550755035, 5.64566512170752, 0.112324854679312,
];
const wampler = (set: string, rows: readonly (readonly [number, number])[], times: number, near: number) => {
  const solve = () => byPowers(rows, 5);
  return [
    {
      about: `${set}, polynomial of the fifth degree with strong disturbance: coefficients, certified all 1`,
      source: strd(set),
      got: () => solve().solution,
      want: ones(6),
      within: near,
    },
    {
      about: `${set}: standard deviations and residual standard deviation over the certified ones`,
      source: strd(set),
      got: () =>
        over(
          [...errors(solve()), spread(solve())],
          [...WAMPLER_DEVIATIONS.map((one) => times * one), times * 2360.14502379268],
        ),
      want: ones(7),
      within: 1e-9,
    },
  ] satisfies Check[];
};

const ELEVEN = Array.from({ length: 11 }, (_, i) => i);

export const NIST_STRD: Check[] = [
  ...certified(
    "Norris",
    "line through 36 points",
    () => byRest(NORRIS),
    [[-0.262323073774029, 1.00211681802045], [0.232818234301152, 0.429796848199937e-3], 0.884796396144373],
    1e-11,
  ),
  {
    about: "Norris: residual sum of squares",
    source: strd("Norris"),
    got: () => byRest(NORRIS).residuals.reduce((sum, v) => sum + v * v, 0),
    want: 26.6173985294224,
    within: 5e-10,
  },
  ...certified(
    "NoInt1",
    "line through the origin, 11 points",
    () =>
      throughOrigin(
        ELEVEN.map((i) => 60 + i),
        ELEVEN.map((i) => 130 + i),
      ),
    [[2.07438016528926], [0.0165289256198347], 3.56753034006338],
    1e-13,
  ),
  ...certified(
    "NoInt2",
    "line through the origin, 3 points",
    () => throughOrigin([4, 5, 6], [3, 4, 4]),
    [[0.727272727272727], [0.0420827318078432], 0.369274472937998],
    1e-13,
  ),
  ...certified(
    "Pontius",
    "square law with x to three millions",
    () => byPowers(PONTIUS, 2),
    [
      [0.673565789473684e-3, 0.732059160401003e-6, -0.316081871345029e-14],
      [0.107938612033077e-3, 0.157817399981659e-9, 0.486652849992036e-16],
      0.205177424076185e-3,
    ],
    1e-10,
  ),
  ...certified(
    "Longley",
    "six figures that rise together (ill-conditioned)",
    () => byRest(LONGLEY),
    [
      [
        -3482258.63459582, 15.0618722713733, -0.035819179292591, -2.02022980381683, -1.03322686717359,
        -0.0511041056535807, 1829.15146461355,
      ],
      [
        890420.383607373, 84.9149257747669, 0.0334910077722432, 0.488399681651699, 0.214274163161675,
        0.22607320006937, 455.478499142212,
      ],
      304.854073561965,
    ],
    1e-9,
  ),
  {
    about: "Wampler1, exact polynomial of the fifth degree: coefficients, certified all 1",
    source: strd("Wampler1"),
    got: () => byPowers(WAMPLER_1, 5).solution,
    want: ones(6),
    within: 1e-8,
  },
  {
    about: "Wampler2, exact polynomial with coefficients 1, 0.1 … 0.00001: ratios to them",
    source: strd("Wampler2"),
    got: () => over(byPowers(WAMPLER_2, 5).solution, [1, 0.1, 0.01, 1e-3, 1e-4, 1e-5]),
    want: ones(6),
    within: 1e-10,
  },
  ...wampler("Wampler3", WAMPLER_3, 1, 1e-8),
  ...wampler("Wampler4", WAMPLER_4, 100, 1e-7),
  ...wampler("Wampler5", WAMPLER_5, 10_000, 1e-5),
];
