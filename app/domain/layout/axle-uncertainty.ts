import { type FloorPoint, floorPoint } from "../geometry/point";
import { type Outcome, ok } from "../outcome";
import { type Degrees, degrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { type AxleLine, type AxleMethod, axleLine, compareOpenings } from "./axle-line";
import type { UncertainDrop } from "./drop-shifts";
import { frameFromDatums } from "./frame";

/** What the axle line is worked out from: datum and opening drops, each left and right, front and rear. */
export const AXLE_DROPS = [
  "datumFrontLeft",
  "datumFrontRight",
  "datumRearLeft",
  "datumRearRight",
  "openingFrontLeft",
  "openingFrontRight",
  "openingRearLeft",
  "openingRearRight",
] as const;
export type AxleDrop = (typeof AXLE_DROPS)[number];
export type AxleDrops = Record<AxleDrop, UncertainDrop>;

/** How much of the variance of the axle's station one source or one group of them makes; 1 is all of it. */
export type Contributor = { name: string; share: number };

export type AxleUncertainty = {
  line: AxleLine;
  /** Standard uncertainty of the station, and twice that (k = 2). */
  station: Millimetres;
  stationExpanded: Millimetres;
  /** Standard uncertainty of the turn; that of a square line is none. */
  turn: Degrees;
  /** Single sources and groups of them, the largest first. */
  sources: Contributor[];
  groups: Contributor[];
  /** "Mostly the tapes from mark B (62 %)." */
  words: string;
};

/** Coverage factor of the expanded uncertainty, about 95 %. Source: JCGM 100:2008, 6.3.3 (from memory). */
export const COVERAGE_FACTOR = 2;
/** A drop is moved so far (mm) each way to see what follows. */
const STEP = 0.01;
/** A group with more than this share is "mostly". */
const MOSTLY = 0.5;

/**
 * The axle line with its standard uncertainty: every source of every drop is carried through frame, openings and line
 * to first order; sources with one name move all their drops together. Source: JCGM 100:2008, 5.1.2 and 5.2.2 (from
 * memory). Station is along the frame from the rear datum pair.
 * @returns a problem as frameFromDatums and compareOpenings
 * @example axleUncertainty(drops, "square").value.words // "Mostly the tapes from mark B (62 %)."
 */
export function axleUncertainty(
  drops: AxleDrops,
  method: AxleMethod,
  asked: Millimetres = mm(0),
): Outcome<AxleUncertainty> {
  const points = eachDrop((drop) => drops[drop].point);
  const line = lineOf(points, method, asked);
  if (!line.ok) return line;
  const bySource = new Map<string, { group: string; station: number; turn: number }>();
  for (const drop of AXLE_DROPS) {
    const slope = slopesOf(points, drop, method, asked);
    if (!slope.ok) return slope;
    const { x, y } = slope.value;
    for (const shift of drops[drop].shifts) {
      const sum = bySource.get(shift.source) ?? { group: shift.group, station: 0, turn: 0 };
      sum.station += x.station * shift.x + y.station * shift.y;
      sum.turn += x.turn * shift.x + y.turn * shift.y;
      bySource.set(shift.source, sum);
    }
  }
  const all = [...bySource].map(([name, sum]) => ({ name, ...sum }));
  const variance = all.reduce((sum, one) => sum + one.station ** 2, 0);
  const station = Math.sqrt(variance);
  const groups = shares(
    all.map(({ group, station: moved }) => ({ name: group, moved })),
    variance,
  );
  return ok({
    line: line.value,
    station: mm(station),
    stationExpanded: mm(COVERAGE_FACTOR * station),
    turn: degrees(Math.hypot(...all.map((one) => one.turn))),
    sources: shares(
      all.map(({ name, station: moved }) => ({ name, moved })),
      variance,
    ),
    groups,
    words: contributorWords(groups),
  });
}

type Points = Record<AxleDrop, FloorPoint>;
type Answer = { station: number; turn: number };

/**
 * One of something for each drop of an axle line.
 * @example eachDrop((drop) => drop.length).datumFrontLeft // 14
 */
export const eachDrop = <T>(of: (drop: AxleDrop) => T): Record<AxleDrop, T> =>
  Object.fromEntries(AXLE_DROPS.map((drop) => [drop, of(drop)])) as Record<AxleDrop, T>;

function lineOf(points: Points, method: AxleMethod, asked: Millimetres): Outcome<AxleLine> {
  const frame = frameFromDatums({
    frontLeft: points.datumFrontLeft,
    frontRight: points.datumFrontRight,
    rearLeft: points.datumRearLeft,
    rearRight: points.datumRearRight,
  });
  if (!frame.ok) return frame;
  const openings = compareOpenings(frame.value, {
    left: { front: points.openingFrontLeft, rear: points.openingRearLeft },
    right: { front: points.openingFrontRight, rear: points.openingRearRight },
  });
  if (!openings.ok) return openings;
  const { left, right } = openings.value;
  return ok(axleLine({ left: left.centre, right: right.centre }, method, asked));
}

/** How station and turn change for each millimetre of a drop along x and along y. */
function slopesOf(
  points: Points,
  drop: AxleDrop,
  method: AxleMethod,
  asked: Millimetres,
): Outcome<{ x: Answer; y: Answer }> {
  const moved = (x: number, y: number) => {
    const { x: px, y: py } = points[drop];
    return lineOf({ ...points, [drop]: floorPoint(px + x, py + y) }, method, asked);
  };
  const slopes: Answer[] = [];
  for (const [x, y] of [
    [STEP, 0],
    [0, STEP],
  ] as const) {
    const [more, less] = [moved(x, y), moved(-x, -y)];
    if (!more.ok) return more;
    if (!less.ok) return less;
    slopes.push({
      station: (more.value.station - less.value.station) / (2 * STEP),
      turn: (more.value.turn - less.value.turn) / (2 * STEP),
    });
  }
  const none = { station: 0, turn: 0 };
  return ok({ x: slopes[0] ?? none, y: slopes[1] ?? none });
}

/** Shares by name, the largest first, then by name. */
function shares(moves: readonly { name: string; moved: number }[], variance: number): Contributor[] {
  const sums = new Map<string, number>();
  for (const { name, moved } of moves) sums.set(name, (sums.get(name) ?? 0) + moved ** 2);
  return [...sums]
    .map(([name, sum]) => ({ name, share: variance > 0 ? sum / variance : 0 }))
    .sort((a, b) => b.share - a.share || a.name.localeCompare(b.name));
}

const percent = (share: number) => `${Math.round(share * 100)} %`;

/**
 * The largest contributors in words.
 * @example contributorWords([{ name: "the bob", share: 0.7 }, { name: "the level", share: 0.3 }]) // "Mostly the bob (70 %), then the level (30 %)."
 */
export function contributorWords(groups: readonly Contributor[]): string {
  const [first, second] = groups.filter((group) => group.share >= 0.005);
  if (!first) return "Nothing is unsure.";
  const begin = first.share > MOSTLY ? "Mostly" : "The most comes from";
  const then = second ? `, then ${second.name} (${percent(second.share)})` : "";
  return `${begin} ${first.name} (${percent(first.share)})${then}.`;
}
