import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { type Fit, leastSquares } from "./least-squares";
import { minimalDetectableBias, standardisedResidual } from "./snooping";

/** A point with a name and its coordinates: two on a floor, three in space. */
export type NamedPoint = { name: string; at: readonly Millimetres[] };
/** A distance taped between two points, with the standard uncertainty of the tape. */
export type TapedDistance = { from: string; to: string; distance: Millimetres; sigma: Millimetres };
/** Distances between points of which some are known; for the others `at` says roughly where they are. */
export type DistanceNetwork = {
  fixed: readonly NamedPoint[];
  unknown: readonly NamedPoint[];
  distances: readonly TapedDistance[];
};

export type AdjustedPoint = NamedPoint & {
  /** Covariance of its coordinates in mm², as the stated uncertainties make it. */
  covariance: number[][];
  /** Standard uncertainty of each coordinate. */
  sigmas: Millimetres[];
};
export type AdjustedDistance = TapedDistance & {
  /** Taped minus what the points say. */
  residual: Millimetres;
  /** How much the others check it: 0 not at all, 1 wholly. They add up to the redundancy. */
  redundancyNumber: number;
  /** Residual over its own standard deviation; null when nothing checks it. */
  standardised: number | null;
  /** The smallest blunder in it that would show; null when nothing checks it. */
  minimalDetectableBias: Millimetres | null;
};
export type AdjustedNetwork = {
  points: AdjustedPoint[];
  distances: AdjustedDistance[];
  /** Distances more than unknown coordinates. */
  redundancy: number;
  /** √(Σ(v/σ)²/redundancy): about 1 when the stated uncertainties are right; null without redundancy. */
  varianceFactorRoot: number | null;
};

/** Steps before the adjustment counts as failed. */
const ROUNDS = 200;
/** A step below this (mm) ends it. */
const SETTLED = 1e-7;
/** A step below this (mm) is taken whole: a fit that looks worse by it does so by the last digits only. */
const SURE_STEP = 1e-3;
/** A step is halved at most so often. */
const HALVINGS = 30;

type Row = { row: number[]; misclosure: number };
type Places = Map<string, readonly number[]>;

/**
 * The points that fit all taped distances best, each weighted by its own uncertainty: Gauss–Newton on
 * d = |to − from|, a step being halved while it makes the fit worse. On a floor or in space, with one unknown point
 * or several. Source: any text on adjustment, e.g. Ghilani, Adjustment Computations, 5th ed. 2010, ch. 14.
 * @returns a problem when a name is not known or there twice, too few distances are given, they leave a point free to
 * move, or the start is too far off
 * @example
 * adjustDistances({
 *   fixed: [{ name: "A", at: [mm(0), mm(0)] }, { name: "B", at: [mm(1200), mm(0)] }],
 *   unknown: [{ name: "P", at: [mm(400), mm(400)] }],
 *   distances: [
 *     { from: "A", to: "P", distance: mm(720), sigma: mm(1) },
 *     { from: "B", to: "P", distance: mm(960), sigma: mm(1) },
 *   ],
 * }) // P at (432, 576)
 */
export function adjustDistances(network: DistanceNetwork): Outcome<AdjustedNetwork> {
  const wrong = faultOf(network);
  if (wrong) return problem(wrong);
  let places = placesOf(network);
  for (let round = 0; round < ROUNDS; round++) {
    const rows = rowsAt(network, places);
    const fit = leastSquares(
      rows.map((row) => row.row),
      rows.map((row) => row.misclosure),
    );
    if (!fit) return problem("These distances leave a point free to move: one from another side is needed.");
    if (Math.hypot(...fit.solution) < SETTLED) return ok(adjusted(network, places, fit));
    places = stepped(network, places, fit.solution);
  }
  return problem("The distances do not settle on one place: start nearer to it, or measure them again.");
}

function faultOf({ fixed, unknown, distances }: DistanceNetwork): string | null {
  const points = [...fixed, ...unknown];
  const dimensions = points[0]?.at.length ?? 0;
  if (unknown.length === 0) return "There is no point to find.";
  if (points.some((point) => point.at.length !== dimensions) || dimensions < 2 || dimensions > 3)
    return "All points need two coordinates, or all three.";
  const names = new Set(points.map((point) => point.name));
  if (names.size !== points.length) return "Two points have the same name.";
  for (const { from, to, distance, sigma } of distances) {
    const stranger = [from, to].find((name) => !names.has(name));
    if (stranger !== undefined) return `${stranger} is no point of this network.`;
    if (from === to) return `A distance from ${from} to itself says nothing.`;
    if (!(distance > 0)) return `The distance from ${from} to ${to} has to be longer than nothing.`;
    if (!(sigma > 0)) return `The uncertainty of the distance from ${from} to ${to} has to be above nothing.`;
  }
  return distances.length < unknown.length * dimensions
    ? `${unknown.length * dimensions} distances at least are needed; there are ${distances.length}.`
    : null;
}

const placesOf = ({ fixed, unknown }: DistanceNetwork): Places =>
  new Map([...fixed, ...unknown].map((point) => [point.name, point.at]));

/** The linear rows at these places, each divided by its uncertainty. */
function rowsAt({ unknown, distances }: DistanceNetwork, places: Places): Row[] {
  const dimensions = unknown[0]?.at.length ?? 0;
  const column = new Map(unknown.map((point, i) => [point.name, i * dimensions]));
  return distances.map(({ from, to, distance, sigma }) => {
    const [a, b] = [places.get(from) ?? [], places.get(to) ?? []];
    const length = Math.max(lengthBetween(a, b), 1e-9);
    const row = new Array<number>(unknown.length * dimensions).fill(0);
    for (let axis = 0; axis < dimensions; axis++) {
      const cosine = ((b[axis] ?? 0) - (a[axis] ?? 0)) / length / sigma;
      const [atFrom, atTo] = [column.get(from), column.get(to)];
      if (atFrom !== undefined) row[atFrom + axis] = -cosine;
      if (atTo !== undefined) row[atTo + axis] = cosine;
    }
    return { row, misclosure: (distance - length) / sigma };
  });
}

const lengthBetween = (a: readonly number[], b: readonly number[]): number =>
  Math.hypot(...a.map((value, axis) => (b[axis] ?? 0) - value));

const misfit = (network: DistanceNetwork, places: Places): number =>
  network.distances.reduce((sum, { from, to, distance, sigma }) => {
    const length = lengthBetween(places.get(from) ?? [], places.get(to) ?? []);
    return sum + ((distance - length) / sigma) ** 2;
  }, 0);

/** One step on, halved while it makes the fit worse. */
function stepped(network: DistanceNetwork, places: Places, solution: readonly number[]): Places {
  if (Math.hypot(...solution) < SURE_STEP) return movedBy(network, places, solution);
  const before = misfit(network, places);
  let share = 1;
  for (let halving = 0; ; halving++) {
    const moved = movedBy(
      network,
      places,
      solution.map((value) => value * share),
    );
    if (misfit(network, moved) <= before * (1 + 1e-12) + 1e-18 || halving === HALVINGS) return moved;
    share /= 2;
  }
}

function movedBy({ unknown }: DistanceNetwork, places: Places, step: readonly number[]): Places {
  const moved = new Map(places);
  unknown.forEach(({ name, at }, i) => {
    const now = places.get(name) ?? at;
    moved.set(
      name,
      now.map((value, axis) => value + (step[i * at.length + axis] ?? 0)),
    );
  });
  return moved;
}

function adjusted(network: DistanceNetwork, places: Places, fit: Fit): AdjustedNetwork {
  const rows = rowsAt(network, places);
  const distances = network.distances.map((taped, k): AdjustedDistance => {
    const { row, misclosure } = rows[k] ?? { row: [], misclosure: 0 };
    const variance = row.reduce(
      (sum, a, i) => sum + row.reduce((inner, b, j) => inner + a * b * (fit.cofactor[i]?.[j] ?? 0), 0),
      0,
    );
    const residual = mm(misclosure * taped.sigma);
    const redundancyNumber = Math.min(1, Math.max(0, 1 - variance));
    const bias = fit.redundancy > 0 ? minimalDetectableBias(taped.sigma, redundancyNumber) : null;
    return {
      ...taped,
      residual,
      redundancyNumber,
      standardised: fit.redundancy > 0 ? standardisedResidual(residual, redundancyNumber, taped.sigma) : null,
      minimalDetectableBias: bias === null ? null : mm(bias),
    };
  });
  const squares = rows.reduce((sum, row) => sum + row.misclosure ** 2, 0);
  return {
    points: network.unknown.map(({ name, at }, i) => pointOf(name, places.get(name) ?? at, i, fit)),
    distances,
    redundancy: fit.redundancy,
    varianceFactorRoot: fit.redundancy > 0 ? Math.sqrt(squares / fit.redundancy) : null,
  };
}

function pointOf(name: string, at: readonly number[], index: number, fit: Fit): AdjustedPoint {
  const first = index * at.length;
  const covariance = at.map((_, i) => at.map((_, j) => fit.cofactor[first + i]?.[first + j] ?? 0));
  return {
    name,
    at: at.map(mm),
    covariance,
    sigmas: covariance.map((row, i) => mm(Math.sqrt(Math.max(0, row[i] ?? 0)))),
  };
}
