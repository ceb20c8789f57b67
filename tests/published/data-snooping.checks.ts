import { criticalResidual, minimalDetectableBias, nonCentrality } from "../../app/domain/geometry/snooping";
import { ellipseCoverage, ellipseFactor } from "../../app/domain/layout/tie-fit";
import type { Check, Source, Topic } from "./check";

const baarda: Source = {
  name: "Baarda, A testing procedure for use in geodetic networks",
  place: "two-sided, from the normal law",
  status: "derived",
};

const checks: Check[] = [
  ...(
    [
      [0.05, 1.96],
      [0.01, 2.576],
      [0.005, 2.807],
      [0.001, 3.2905],
    ] as const
  ).map(
    ([significance, want]): Check => ({
      about: `critical standardized residual at ${significance * 100} %`,
      source: baarda,
      got: () => criticalResidual(significance),
      want,
      within: want === 3.2905 ? 0.00005 : 0.0005,
    }),
  ),
  {
    about: "non-centrality at 0.1 % and at 5 %, power 80 %",
    source: baarda,
    got: () => [nonCentrality(0.001, 0.8), nonCentrality(0.05, 0.8)],
    want: [4.1321, 2.8016],
    within: 0.00005,
  },
  {
    about: "its square at 0.1 %, power 80 %",
    source: baarda,
    got: () => nonCentrality(0.001, 0.8) ** 2,
    want: 17.07,
    within: 0.005,
  },
  {
    about: "smallest blunder that shows in a distance of redundancy number 0.25: twice δ0 times σ",
    source: baarda,
    got: () => minimalDetectableBias(0.01, 0.25) ?? 0,
    want: 0.082642,
    within: 0.000001,
  },
  {
    about: "share of the plane normal law within k = 1, 2, 3 standard ellipses",
    source: {
      name: "Ghilani, Adjustment Computations",
      place: "error ellipses, 1 − exp(−k²/2)",
      status: "derived",
    },
    got: () => [1, 2, 3].map(ellipseCoverage),
    want: [0.3935, 0.8647, 0.9889],
    within: 0.00005,
  },
  {
    about: "how many standard ellipses hold 50, 95 and 99 %",
    source: {
      name: "Ghilani, Adjustment Computations",
      place: "error ellipses, √(−2 ln(1 − p))",
      status: "derived",
    },
    got: () => [0.5, 0.95, 0.99].map(ellipseFactor),
    want: [1.1774, 2.4477, 3.0349],
    within: 0.00005,
  },
];

export default { topic: "Data snooping", checks } satisfies Topic;
