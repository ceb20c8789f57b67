import type { DistanceNetwork } from "../../app/domain/geometry/lateration";
import { mm } from "../../app/domain/units/length";

/* Published networks of distances; where each stands is said in tape-ties.checks.ts. */

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
export const STRANG = network(
  { 1: [170.71, 270.71], 2: [100, 100], 3: [241.42, 100] },
  { P: [170, 170] },
  [
    ["1", "P", 100.01],
    ["2", "P", 100.02],
    ["3", "P", 100.03],
  ],
  0.01,
);
export const WOLF = network(
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
export const ROOM = network(
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
export const CAMPUS = network(
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
export const THREE = network(
  { A: [865.4, 4527.15], B: [2432.55, 2047.25], C: [2865.22, 27.15] },
  { U: [6800, 3700] },
  [
    ["A", "U", 6049],
    ["B", "U", 4736.83],
    ["C", "U", 5446.49],
  ],
  1,
);

export const BENNING = network(
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
export const SQUARE = network(
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
/** Twenty-four distances, each with the variance that weights it. */
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
export const WEISS: DistanceNetwork = {
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
