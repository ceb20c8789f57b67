/** A round of levelling, as far as it decides which drops stand. */
export type Round = {
  id: number;
  bayId: number;
  isTrue: boolean;
  isVoid: boolean;
  /** The older round whose drops stand under this one too; null when none do. */
  carriesId: number | null;
  /** How far the old point fell from where it was; null when none was dropped again. */
  carryOffMm: number | null;
};

/** A round and the older ones that it carries. */
export function chainOf(rounds: readonly Round[], round: Round): Set<number> {
  const chain = new Set<number>();
  for (let at: Round | undefined = round; at && !chain.has(at.id); ) {
    chain.add(at.id);
    const next: number | null = at.carriesId;
    at = next === null ? undefined : rounds.find((one) => one.id === next);
  }
  return chain;
}

export type LevelGround = {
  /** The newest round; null before the first. */
  newest: Round | null;
  state: "none" | "not-true" | "true" | "void";
  /** Rounds whose drops stand now. Empty unless the newest is true and not void. */
  standing: Set<number>;
  /** Rounds whose drops wait: for a new level, or for one old point to be dropped again. */
  waiting: Set<number>;
};

/** Was it settled under this round whether the older drops stand? */
const isSettled = (round: Round) => round.carriesId !== null || round.carryOffMm !== null;

/** The rounds before one whose drops still wait under it: back to, and with, the last one that was settled. */
function unsettledBefore(rounds: readonly Round[], round: Round): Set<number> {
  const waiting = new Set<number>();
  if (round.isTrue && isSettled(round)) return waiting;
  const earlier = rounds
    .filter((one) => one.id < round.id && one.isTrue && one.bayId === round.bayId)
    .reverse();
  for (const one of earlier) {
    for (const id of chainOf(rounds, one)) waiting.add(id);
    if (isSettled(one)) break;
  }
  return waiting;
}

/**
 * Which drops stand, and which wait.
 * A drop stands under the level it was taken at, and under a later one that carries it: by itself when the later one
 * followed a level that still stood, else when one old point was dropped again and fell within tolerance. Rounds under
 * which nothing was dropped again leave it open. Nothing is carried from one bay to another: the floor frame is another.
 * @param rounds oldest first
 */
export function levelGround(rounds: readonly Round[]): LevelGround {
  const newest = rounds.at(-1) ?? null;
  if (!newest) return { newest, state: "none", standing: new Set(), waiting: new Set() };
  const state = newest.isVoid ? "void" : newest.isTrue ? "true" : "not-true";
  const own = newest.isTrue ? chainOf(rounds, newest) : new Set<number>();
  const older = unsettledBefore(rounds, newest);
  if (state === "true") return { newest, state, standing: own, waiting: older };
  return { newest, state, standing: new Set(), waiting: new Set([...own, ...older]) };
}

/** The newest round before this one that has the drops of that round: the one to carry them over from. */
export function carrierOf(rounds: readonly Round[], before: Round, roundId: number): Round | null {
  return (
    rounds.filter((one) => one.id < before.id && one.isTrue && chainOf(rounds, one).has(roundId)).at(-1) ??
    null
  );
}
