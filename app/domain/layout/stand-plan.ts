import { type Outcome, ok, problem } from "../outcome";
import type { Degrees } from "../units/angle";
import { formatInches, formatLength, inches, type LengthUnit, type Millimetres, mm } from "../units/length";
import { type LevelReading, levelFromHeights, type StandHeight } from "./level";

/** Shims: a sixteenth of an inch, or a millimetre. Common practice, no source. */
export const SHIM: Record<LengthUnit, Millimetres> = { in: inches(1 / 16), mm: mm(1) };
/** With more stands than this, which of them might be left alone is not tried one by one. */
const TRIED = 6;
/** More stands than this are not planned for. */
const MOST = 24;

export type StandPlan = {
  /** How far to raise each stand; negative: lower; 0: leave it. */
  moves: { id: string; raise: Millimetres }[];
  /** Stands that stay as they are. */
  untouched: string[];
  /** What will be left then: slopes, twist and residuals. */
  after: LevelReading;
  /** Neither slope left exceeds what is allowed. */
  isTrue: boolean;
  words: string[];
};

export type StandPlanOptions = {
  /** Only up, or also down. */
  mode: "raise" | "either";
  shim: Millimetres;
  /** The slope allowed, each way. */
  allowed: Degrees;
  unit?: LengthUnit;
};

/**
 * What to do at each stand with as few stands moved as possible. Heights to level to are tried half a shim around each
 * stand's place on the fitted plane (with `raise` around the highest, which then stays), and so is leaving out any stand
 * whose move is small; what is kept has both slopes within what is allowed and adds no more than half a shim of twist.
 * Of those the fewest moved stands win, then the smallest slope left, then the least movement. Where nothing comes
 * within what is allowed, the smallest slope left is given, and isTrue says so. Twist is left: no stand takes it out.
 * Source: common practice, no source; the plane is levelFromHeights'.
 * @returns a problem as levelFromHeights, or with more than 24 stands
 * @example standPlan(stands, { mode: "raise", shim: inches(1 / 16), allowed: degrees(0.1) }).value.words // ["Raise left rear 1/2 in.", …]
 */
export function standPlan(stands: readonly StandHeight[], options: StandPlanOptions): Outcome<StandPlan> {
  if (!(options.shim > 0)) throw new RangeError(`${options.shim} mm is not a shim`);
  if (stands.length > MOST) return problem(`At most ${MOST} stands can be planned for.`);
  const level = levelFromHeights(stands);
  if (!level.ok) return level;
  const fitted = stands.map((stand, i) => stand.height - (level.value.residuals[i]?.residual ?? 0));
  const twistAllowed = (level.value.twist ?? 0) + options.shim / 2;
  let best: Tried | null = null;
  for (const moves of candidateMoves(fitted, options)) {
    const after = levelFromHeights(
      stands.map((stand, i) => ({ ...stand, height: mm(stand.height + (moves[i] ?? 0)) })),
    );
    if (!after.ok) return after;
    if ((after.value.twist ?? 0) > twistAllowed + 1e-9) continue;
    const one = tried(moves, after.value, options.allowed);
    if (!best || isBetter(one, best)) best = one;
  }
  if (!best) return problem("No way to move these stands was found.");
  return ok(planOf(stands, best, options.unit ?? "in"));
}

type Tried = {
  moves: number[];
  after: LevelReading;
  isTrue: boolean;
  moved: number;
  slope: number;
  total: number;
};

/** All sets of moves to try: to each height, with every set of stands left alone that may be. */
function* candidateMoves(fitted: readonly number[], options: StandPlanOptions): Generator<number[]> {
  const { shim, mode } = options;
  const highest = Math.max(...fitted);
  const heights = mode === "raise" ? [highest] : [...new Set(fitted)];
  const parts = [-0.5, -0.375, -0.25, -0.125, 0, 0.125, 0.25, 0.375, 0.5];
  const seen = new Set<string>();
  for (const height of heights)
    for (const part of parts) {
      const full = fitted.map((f) => Math.round((height + part * shim - f) / shim + 1e-9) * shim + 0);
      if (mode === "raise" && full.some((move) => move < 0)) continue;
      for (const moves of fitted.length <= TRIED ? leavingOut(full, 2 * shim) : [full]) {
        const key = moves.map((move) => Math.round(move / shim)).join(" ");
        if (seen.has(key)) continue;
        seen.add(key);
        yield moves;
      }
    }
}

/** The moves as they are, and with every choice of the small ones left out. */
function* leavingOut(moves: readonly number[], small: number): Generator<number[]> {
  const may = moves.flatMap((move, i) => (move !== 0 && Math.abs(move) <= small + 1e-9 ? [i] : []));
  for (let choice = 0; choice < 2 ** may.length; choice++) {
    const left = new Set(may.filter((_, bit) => (choice >> bit) & 1));
    yield moves.map((move, i) => (left.has(i) ? 0 : move));
  }
}

function tried(moves: number[], after: LevelReading, allowed: Degrees): Tried {
  const slope = Math.max(Math.abs(after.noseHigh), Math.abs(after.rightHigh));
  return {
    moves,
    after,
    isTrue: slope <= allowed + 1e-9,
    moved: moves.filter((move) => move !== 0).length,
    slope,
    total: moves.reduce((sum, move) => sum + Math.abs(move), 0),
  };
}

function isBetter(one: Tried, best: Tried): boolean {
  if (one.isTrue !== best.isTrue) return one.isTrue;
  if (one.isTrue && one.moved !== best.moved) return one.moved < best.moved;
  if (Math.abs(one.slope - best.slope) > 1e-9) return one.slope < best.slope;
  if (one.moved !== best.moved) return one.moved < best.moved;
  return one.total < best.total - 1e-9;
}

function planOf(stands: readonly StandHeight[], best: Tried, unit: LengthUnit): StandPlan {
  const moves = stands.map((stand, i) => ({ id: stand.id, raise: mm(best.moves[i] ?? 0) }));
  const size = (value: number) =>
    unit === "in"
      ? `${formatInches(mm(Math.abs(value)), { denominator: 32 })} in`
      : formatLength(mm(Math.abs(value)), "mm");
  return {
    moves,
    untouched: moves.filter((move) => move.raise === 0).map((move) => move.id),
    after: best.after,
    isTrue: best.isTrue,
    words: moves
      .filter((move) => move.raise !== 0)
      .map((move) => `${move.raise > 0 ? "Raise" : "Lower"} ${move.id} ${size(move.raise)}.`),
  };
}
