import { type BlunderSearch, searchBlunders } from "../../app/domain/geometry/blunder-search";
import {
  type AdjustedNetwork,
  adjustDistances,
  type DistanceNetwork,
} from "../../app/domain/geometry/lateration";
import { floorPoint } from "../../app/domain/geometry/point";
import { pointFromTies } from "../../app/domain/layout/drops";
import type { Outcome } from "../../app/domain/outcome";
import { mm } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";
import { BENNING, CAMPUS, ROOM, SQUARE, STRANG, THREE, WEISS, WOLF } from "./tape-ties-networks";

function must<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
}

/** Standard deviations as the books print them: scaled by what the residuals themselves show. */
const scaledSigmas = (fit: AdjustedNetwork) =>
  fit.points.flatMap((point) => point.sigmas.map((sigma) => sigma * (fit.varianceFactorRoot ?? 1)));
const coordinates = (fit: AdjustedNetwork) => fit.points.flatMap((point) => [...point.at]);

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
];

export default { topic: "Tape ties", checks } satisfies Topic;
