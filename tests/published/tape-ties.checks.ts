import { type BlunderSearch, searchBlunders } from "../../app/domain/geometry/blunder-search";
import {
  type AdjustedNetwork,
  adjustDistances,
  type DistanceNetwork,
} from "../../app/domain/geometry/lateration";
import { floorPoint } from "../../app/domain/geometry/point";
import { criticalResidual, minimalDetectableBias, nonCentrality } from "../../app/domain/geometry/snooping";
import { pointFromTies } from "../../app/domain/layout/drops";
import { ellipseCoverage, ellipseFactor } from "../../app/domain/layout/tie-fit";
import type { Outcome } from "../../app/domain/outcome";
import { mm } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

function must<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
}

type Points = Record<string, readonly number[]>;
const network = (
  fixed: Points,
  unknown: Points,
  distances: readonly (readonly [string, string, number])[],
  sigma: number,
): DistanceNetwork => {
  const named = (points: Points) => Object.entries(points).map(([name, at]) => ({ name, at: at.map(mm) }));
  return {
    fixed: named(fixed),
    unknown: named(unknown),
    distances: distances.map(([from, to, distance]) => ({
      from,
      to,
      distance: mm(distance),
      sigma: mm(sigma),
    })),
  };
};
/** Standard deviations as the books print them: scaled by what the residuals themselves show. */
const scaledSigmas = (fit: AdjustedNetwork) =>
  fit.points.flatMap((point) => point.sigmas.map((sigma) => sigma * (fit.varianceFactorRoot ?? 1)));
const coordinates = (fit: AdjustedNetwork) => fit.points.flatMap((point) => [...point.at]);

const STRANG = network(
  { 1: [170.71, 270.71], 2: [100, 100], 3: [241.42, 100] },
  { P: [170, 170] },
  [
    ["1", "P", 100.01],
    ["2", "P", 100.02],
    ["3", "P", 100.03],
  ],
  0.01,
);
const WOLF = network(
  { 1: [1200, 900, 900], 2: [900, 600, 900], 3: [600, 900, 900], 4: [900, 1200, 900] },
  { P: [890, 910, 1290] },
  [
    ["1", "P", 499.99],
    ["2", "P", 500],
    ["3", "P", 500.01],
    ["4", "P", 500.02],
  ],
  0.01,
);
const ROOM = network(
  {
    51: [-8.62, 27.42, 10.29],
    37: [-4.95, 27.3, 10.04],
    31: [-4.85, 20.69, 10.51],
    102: [0.52, 22.59, 9.77],
    331: [-6.12, 25.48, 10.92],
    35: [0.45, 27.39, 10.75],
    103: [0.61, 17.19, 9.71],
    101: [-7.88, 22.45, 10.16],
  },
  { P: [-2.59, 24.22, 9.62] },
  [
    ["51", "P", 8.2],
    ["37", "P", 3.85],
    ["31", "P", 4.35],
    ["102", "P", 3.51],
    ["331", "P", 3.98],
    ["35", "P", 4.37],
    ["103", "P", 8.17],
    ["101", "P", 5.73],
  ],
  0.05,
);
const CAMPUS = network(
  { Badger: [2410000, 390000], Bucky: [2411820, 386881.222] },
  { Wisconsin: [2415776.8, 391043.2], Campus: [2416898.2, 387602.3] },
  [
    ["Badger", "Wisconsin", 5870.302],
    ["Badger", "Campus", 7297.588],
    ["Wisconsin", "Campus", 3616.434],
    ["Wisconsin", "Bucky", 5742.878],
    ["Campus", "Bucky", 5123.76],
  ],
  0.01,
);
const THREE = network(
  { A: [865.4, 4527.15], B: [2432.55, 2047.25], C: [2865.22, 27.15] },
  { U: [6800, 3700] },
  [
    ["A", "U", 6049],
    ["B", "U", 4736.83],
    ["C", "U", 5446.49],
  ],
  1,
);

const BENNING = network(
  { 1: [3000, 2000], 2: [1000, 2000], 3: [3000, 2100], 4: [1000, 2100], 5: [2000, 1000] },
  { 6: [2000, 2000] },
  [
    ["6", "1", 1000],
    ["6", "2", 1000],
    ["6", "3", 1005],
    ["6", "4", 1005],
    ["6", "5", 1000],
  ],
  0.02,
);
const SQUARE = network(
  { 1: [0, 1000], 2: [1000, 1000] },
  { 3: [0, 0], 4: [1000, 0] },
  [
    ["1", "3", 1000.02],
    ["1", "4", 1414.2],
    ["2", "3", 1414.24],
    ["2", "4", 999.98],
    ["3", "4", 1000],
  ],
  0.01,
);
/** Twenty-four distances with the square root of ten times its cofactor each, as they were published. */
const WEISS_DISTANCES = [
  ["4", "6", 709.927, 1.7],
  ["2", "6", 392.55, 0.6],
  ["2", "4", 642.409, 1.3],
  ["3", "4", 939.941, 1.2],
  ["3", "9", 566.555, 0.8],
  ["4", "9", 1050.204, 1.1],
  ["1", "4", 1210.478, 0.8],
  ["1", "5", 901.755, 0.8],
  ["5", "8", 1206.806, 1],
  ["4", "8", 1634.747, 1.3],
  ["4", "5", 498.107, 1.6],
  ["2", "5", 904.962, 1.4],
  ["2", "7", 1630.454, 1.1],
  ["1", "7", 849.005, 0.8],
  ["1", "9", 601.906, 1.2],
  ["8", "9", 666.874, 1.3],
  ["7", "8", 667.595, 0.6],
  ["5", "7", 823.99, 1.6],
  ["5", "6", 722.631, 1.3],
  ["6", "9", 1193.036, 0.7],
  ["5", "9", 572.094, 0.7],
  ["3", "5", 504.968, 1.7],
  ["3", "7", 591.506, 1.6],
  ["7", "9", 328.667, 0.9],
] as const;
const WEISS: DistanceNetwork = {
  ...network(
    {
      1: [4506.299, 9001.123],
      2: [2798.622, 9502.49],
      3: [3803.973, 9894.233],
      8: [4904.569, 9413.376],
    },
    {
      4: [3299.98, 9100.838],
      5: [3697.824, 9400.545],
      6: [3080.37, 9775.9],
      7: [4393.265, 9842.503],
      9: [4251.061, 9546.226],
    },
    [],
    1,
  ),
  distances: WEISS_DISTANCES.map(([from, to, distance, variance]) => ({
    from,
    to,
    distance: mm(distance),
    sigma: mm(Math.sqrt(variance)),
  })),
};
const benning = (place: string): Source => ({
  name: "Benning, Statistik in Geodäsie, Geoinformation und Bauwesen",
  place,
  status: "read",
});
const weiss: Source = {
  name: "Weiss et al., Detection of erroneous values in local geodetic networks",
  place: "Acta Montanistica Slovaca 15 (2010), pp. 62–70, as transcribed by Krumm",
  status: "read",
};
const strang: Source = {
  name: "Strang and Borre, Linear Algebra, Geodesy, and GPS",
  place: "example 10.1, p. 345, as transcribed by Krumm",
  status: "read",
};
const wolf: Source = {
  name: "Wolf, Ausgleichungsrechnung II",
  place: "p. 87, as transcribed by Krumm",
  status: "read",
};
const room: Source = {
  name: "Blankenbach and Willert, indoor positioning",
  place: "2009, as transcribed by Krumm",
  status: "read",
};
const ghilani = (place: string, status: Source["status"]): Source => ({
  name: "Ghilani, Adjustment Computations",
  place,
  status,
});
const derived = (source: Source): Source => ({ ...source, status: "derived" });
const baarda: Source = {
  name: "Baarda, A testing procedure for use in geodetic networks",
  place: "two-sided, from the normal law",
  status: "derived",
};

const search = (): BlunderSearch => must(searchBlunders(ROOM));
const without = (...names: string[]): DistanceNetwork => ({
  ...ROOM,
  distances: ROOM.distances.filter((one) => !names.includes(one.from)),
});
const largestResidual = (input: DistanceNetwork) =>
  Math.max(...must(adjustDistances(input)).distances.map((one) => Math.abs(one.standardised ?? 0)));
const strangTies = () =>
  must(
    pointFromTies(
      [
        { mark: "1", at: floorPoint(170.71, 270.71), distance: mm(100.01) },
        { mark: "2", at: floorPoint(100, 100), distance: mm(100.02) },
        { mark: "3", at: floorPoint(241.42, 100), distance: mm(100.03) },
      ],
      "left",
      mm(0.01),
    ),
  );

const checks: Check[] = [
  {
    about: "P from three distances 100.01, 100.02, 100.03 (σ 0.01), as a network",
    source: strang,
    got: () => coordinates(must(adjustDistances(STRANG))),
    want: [170.7029, 170.7234],
    within: 0.00005,
  },
  {
    about: "the same three as tape ties to a drop",
    source: strang,
    got: () => {
      const { point } = strangTies();
      return [point.x, point.y];
    },
    want: [170.7029, 170.7234],
    within: 0.00005,
  },
  {
    about: "standard deviations of P, from the residuals",
    source: strang,
    got: () => scaledSigmas(must(adjustDistances(STRANG))),
    want: [0.03303, 0.02335],
    within: 0.000005,
  },
  {
    about: "redundancy numbers of the three distances",
    source: derived(strang),
    got: () => must(adjustDistances(STRANG)).distances.map((one) => one.redundancyNumber),
    want: [0.5, 0.25, 0.25],
    within: 0.005,
  },
  {
    about: "residuals of the three distances, as the book's sign has them: adjusted minus taped",
    source: derived(strang),
    got: () => must(adjustDistances(STRANG)).distances.map((one) => -one.residual),
    want: [-0.02336, -0.01652, -0.01651],
    within: 0.000005,
  },
  {
    about: "root of the variance factor",
    source: derived(strang),
    got: () => must(adjustDistances(STRANG)).varianceFactorRoot ?? 0,
    want: 3.30293,
    within: 0.000005,
  },
  {
    about: "P in space from four distances of about 500 (σ 0.01)",
    source: wolf,
    got: () => coordinates(must(adjustDistances(WOLF))),
    want: [900.0167, 899.9833, 1300.0062],
    within: 0.00005,
  },
  {
    about: "standard deviations of P in space",
    source: wolf,
    got: () => scaledSigmas(must(adjustDistances(WOLF))),
    want: [0.01179, 0.01179, 0.00625],
    within: 0.000005,
  },
  {
    about: "residual sizes, redundancy number of each distance and root of the variance factor",
    source: derived(wolf),
    got: () => {
      const fit = must(adjustDistances(WOLF));
      return [
        ...fit.distances.map((one) => Math.abs(one.residual) * 100),
        ...fit.distances.map((one) => one.redundancyNumber),
        fit.varianceFactorRoot ?? 0,
      ];
    },
    want: [0.5, 0.5, 0.5, 0.5, 0.25, 0.25, 0.25, 0.25, 1],
    within: 0.0005,
  },
  {
    about: "P in a room from eight distances, the two blunders still in",
    source: room,
    got: () => coordinates(must(adjustDistances(ROOM))),
    want: [-2.3042, 24.3101, 9.5248],
    within: 0.00005,
  },
  {
    about:
      "standard deviations of P, the two blunders still in; ours is 1.194265 upwards, printed a last place more, hence one unit of it",
    source: room,
    got: () => scaledSigmas(must(adjustDistances(ROOM))),
    want: [0.29914, 0.33222, 1.19427],
    within: 0.00001,
  },
  {
    about: "the blunders that the publication marks (51 and 103) are what is left out",
    source: room,
    got: () =>
      search()
        .leftOut.map((one) => one.from)
        .join(", "),
    want: "51, 103",
  },
  {
    about: "largest standardized residual with all eight, without 51, without both",
    source: derived(room),
    got: () => [largestResidual(ROOM), largestResidual(without("51")), largestResidual(without("51", "103"))],
    want: [25.09, 6.35, 1.03],
    within: 0.005,
  },
  {
    about: "P without the two blunders",
    source: derived(room),
    got: () => coordinates(search().adjusted),
    want: [-2.50775, 24.32022, 9.77532],
    within: 0.000005,
  },
  {
    about: "root of the variance factor without the two blunders",
    source: derived(room),
    got: () => search().adjusted.varianceFactorRoot ?? 0,
    want: 0.613,
    within: 0.0005,
  },
  {
    about: "stations Wisconsin and Campus of a trilateration network, adjusted together",
    source: ghilani("example 14.5, p. 251 (2010), as transcribed by Krumm", "read"),
    got: () => coordinates(must(adjustDistances(CAMPUS))),
    want: [2415776.9044, 391043.2945, 2416892.6955, 387603.2551],
    within: 0.00005,
  },
  {
    about: "standard deviations of Wisconsin and Campus",
    source: ghilani("example 14.5, p. 251 (2010), as transcribed by Krumm", "read"),
    got: () => scaledSigmas(must(adjustDistances(CAMPUS))),
    want: [0.14879, 0.22061, 0.10378, 0.27054],
    within: 0.000005,
  },
  {
    about: "with one spare distance every standardized residual is alike, and no distance is accused",
    source: derived(ghilani("example 14.5, p. 251 (2010), as transcribed by Krumm", "read")),
    got: () => {
      const found = must(searchBlunders(CAMPUS));
      const sizes = found.adjusted.distances.map((one) => Math.abs(one.standardised ?? 0));
      return `${found.leftOut.length} left out, ${found.unresolved ? "unresolved" : "resolved"}, ${sizes.map((size) => size.toFixed(2)).join(" ")}`;
    },
    want: "0 left out, unresolved, 13.59 13.59 13.59 13.59 13.59",
  },
  {
    about: "U from three distances, rounded as it is remembered",
    source: ghilani("example 14.1", "from memory"),
    got: () => coordinates(must(adjustDistances(THREE))),
    want: [6861.3, 3727.8],
    within: 0.05,
  },
  {
    about: "root of the variance factor from three distances, rounded as it is remembered",
    source: ghilani("example 14.1", "from memory"),
    got: () => must(adjustDistances(THREE)).varianceFactorRoot ?? 0,
    want: 0.1,
    within: 0.005,
  },
  {
    about: "U and its standard deviations, worked out again from the inputs",
    source: ghilani("example 14.1", "derived"),
    got: () => {
      const fit = must(adjustDistances(THREE));
      return [...coordinates(fit), ...scaledSigmas(fit)];
    },
    want: [6861.31679, 3727.81857, 0.0775, 0.1542],
    within: 0.00005,
  },
  {
    about: "point 6 of a network with five fixed points",
    source: benning("example 8-8, pp. 285–291 (2011), as transcribed by Krumm"),
    got: () => coordinates(must(adjustDistances(BENNING))),
    want: [2000, 1999.9976],
    within: 0.00005,
  },
  {
    about: "standard deviations of point 6",
    source: benning("example 8-8, pp. 285–291 (2011), as transcribed by Krumm"),
    got: () => scaledSigmas(must(adjustDistances(BENNING))),
    want: [0.00504, 0.00996],
    within: 0.000005,
  },
  {
    about: "points 3 and 4 of a square with both diagonals",
    source: benning("example 8-2, p. 256 (2011), adjusted by Krumm"),
    got: () => coordinates(must(adjustDistances(SQUARE))),
    want: [-0.0096, -0.0226, 999.993, 0.0174],
    within: 0.00005,
  },
  {
    about: "standard deviations of points 3 and 4",
    source: benning("example 8-2, p. 256 (2011), adjusted by Krumm"),
    got: () => scaledSigmas(must(adjustDistances(SQUARE))),
    want: [0.00901, 0.00637, 0.00901, 0.00637],
    within: 0.000005,
  },
  {
    about: "five points from twenty-four distances of different weight, adjusted together",
    source: weiss,
    got: () => coordinates(must(adjustDistances(WEISS))),
    want: [
      3299.9644, 9100.8289, 3697.8223, 9400.5394, 3080.3184, 9775.8943, 4393.216, 9842.5618, 4251.0495,
      9546.2298,
    ],
    within: 0.00005,
  },
  {
    about: "standard deviations of the five points",
    source: weiss,
    got: () => scaledSigmas(must(adjustDistances(WEISS))),
    want: [0.00752, 0.01121, 0.0067, 0.01207, 0.00924, 0.01193, 0.00817, 0.00879, 0.00728, 0.01016],
    within: 0.000005,
  },
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

export default { topic: "Tape ties", checks } satisfies Topic;
