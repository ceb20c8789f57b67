import { STAGE_LABEL } from "../../domain/builds/stages";
import type { BayKind } from "../../domain/floor/bays";
import type { BayCard, BoardVehicle } from "../../domain/floor/board";
import { spanInWords, whenInWords } from "../time";

/** What the second line of a cell says, and in which tone. */
export type LevelLine = {
  tone: "true" | "stop" | "quiet";
  sign: "level" | "not-level" | "void";
  words: string;
} | null;

/** The level in words for the wall; null when none was taken. */
export function levelLine(vehicle: BoardVehicle, now: number): LevelLine {
  const { level } = vehicle;
  if (level.state === "none") return null;
  if (level.state === "void") return { tone: "stop", sign: "void", words: `Level void: ${level.reason}` };
  const age = spanInWords(now - Date.parse(level.checkedAt));
  return level.state === "true"
    ? { tone: "true", sign: "level", words: `Level true, ${age}` }
    : { tone: "stop", sign: "not-level", words: `Not true yet, ${age}` };
}

/** "hangers 2 of 4", or "" when the stage is not counted. */
export function piecesWords(vehicle: BoardVehicle): string {
  const pieces = vehicle.stage?.pieces;
  if (pieces) {
    const count = `${pieces.done} of ${pieces.of}`;
    // A long name and stage leave no room for the word; the count alone still says how far it is.
    return vehicle.nickname.length + stageWords(vehicle).length > 17 ? count : `${pieces.word} ${count}`;
  }
  const { level, stage } = vehicle;
  return stage?.kind === "layout" && level.state !== "none" && level.drops > 0 ? `${level.drops} drops` : "";
}

export const stageWords = (vehicle: BoardVehicle) =>
  vehicle.stage ? STAGE_LABEL[vehicle.stage.kind] : "Done";

/** Where a vehicle stands, when there is no level to speak of. */
export const PLACE_WORDS: Record<BayKind, string> = {
  "level-pad": "On the level pad",
  lift: "On the lift",
  weld: "In the weld bay",
  general: "In the bay",
  apron: "On the apron",
};

/** When it ends by the plan, or by how much it is late; null when it is not planned. */
export function endWords(
  vehicle: BoardVehicle,
  now: number,
  zone: string,
): { late: boolean; words: string } | null {
  if (!vehicle.endsAt || vehicle.stage?.state !== "under-way") return null;
  const ends = Date.parse(vehicle.endsAt);
  if (ends < now) return { late: true, words: `${spanInWords(now - ends)} late` };
  // Nobody works on what is held: an end by the plan would say nothing.
  if (vehicle.hold) return null;
  return { late: false, words: `ends ${whenInWords(vehicle.endsAt, new Date(now), zone)}` };
}

/**
 * The bays as the building lies: those on its west side in the left column, the others right, four rows a page.
 * A held bay is on every page. Columns that are too long spill into the other one.
 */
export function wallPages(
  bays: readonly BayCard[],
  buildingLengthMm: number,
): { west: BayCard[]; east: BayCard[] }[] {
  const ROWS = 4;
  const middle = buildingLengthMm / 2;
  const isWest = (card: BayCard) => !card.bay.outside && card.bay.xMm + card.bay.lengthMm / 2 < middle;
  const deal = (cards: readonly BayCard[]) => {
    const west = cards.filter(isWest);
    const east = cards.filter((card) => !isWest(card));
    while (west.length > ROWS && east.length < ROWS) east.push(...west.splice(ROWS, 1));
    while (east.length > ROWS && west.length < ROWS) west.push(...east.splice(ROWS, 1));
    return { west, east };
  };
  if (bays.length <= ROWS * 2) return [deal(bays)];
  const pinned = bays.filter((card) => card.vehicle?.hold).slice(0, ROWS);
  const rest = bays.filter((card) => !pinned.includes(card));
  const room = ROWS * 2 - pinned.length;
  const pages: { west: BayCard[]; east: BayCard[] }[] = [];
  for (let from = 0; from < rest.length; from += room)
    pages.push(
      deal([...pinned, ...rest.slice(from, from + room)].sort((a, b) => a.bay.number - b.bay.number)),
    );
  return pages;
}

/** Where the whole picture stands by now: it walks a small ring so that nothing burns in. */
export function burnInShift(now: number): { x: number; y: number } {
  const STEP_MS = 3 * 60_000;
  const ring = [
    [0, 0],
    [4, 0],
    [4, 4],
    [0, 4],
    [-4, 4],
    [-4, 0],
    [-4, -4],
    [0, -4],
  ] as const;
  const [x, y] = ring[Math.floor(now / STEP_MS) % ring.length] ?? [0, 0];
  return { x, y };
}
