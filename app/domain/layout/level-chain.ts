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
  /** The true round before the newest in the same bay, whose drops a re-drop would carry over; null when there is none. */
  carryable: Round | null;
};

/**
 * Which drops stand, and which wait.
 * A drop stands under the level it was taken at, and under a later one that carries it: by itself when the later one
 * followed a level that still stood, else when one old point was dropped again and fell within tolerance. Nothing is
 * carried from one bay to another: the floor frame is another.
 * @param rounds oldest first
 */
export function levelGround(rounds: readonly Round[]): LevelGround {
  const newest = rounds.at(-1) ?? null;
  if (!newest) return { newest, state: "none", standing: new Set(), waiting: new Set(), carryable: null };
  const state = newest.isVoid ? "void" : newest.isTrue ? "true" : "not-true";
  const earlier = rounds.slice(0, -1).filter((round) => round.isTrue && round.bayId === newest.bayId);
  const before = earlier.at(-1) ?? null;
  const own = newest.isTrue ? chainOf(rounds, newest) : new Set<number>();
  const decided = newest.isTrue && (newest.carriesId !== null || newest.carryOffMm !== null);
  const older = before && !decided ? chainOf(rounds, before) : new Set<number>();
  if (state === "true") return { newest, state, standing: own, waiting: older, carryable: decided ? null : before };
  return { newest, state, standing: new Set(), waiting: new Set([...own, ...older]), carryable: null };
}
