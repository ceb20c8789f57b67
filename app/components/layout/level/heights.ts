import {
  type LevelReading,
  levelFromHeights,
  type StandHeight,
  standCorrections,
} from "../../../domain/layout/level";
import type { LevelView } from "../../../domain/layout/view";
import { type LengthUnit, type Millimetres, mm } from "../../../domain/units/length";
import { lengthIn } from "../lengths";
import type { Draft } from "../use-draft";

export type Place = { id: string; label: string; side: "left" | "right" };

const CORNERS: readonly Place[] = [
  { id: "left-front", label: "Left front", side: "left" },
  { id: "right-front", label: "Right front", side: "right" },
  { id: "left-rear", label: "Left rear", side: "left" },
  { id: "right-rear", label: "Right rear", side: "right" },
];

/** The four corners, and as many stands more as were put under. */
export function placesOf(extras: number): Place[] {
  const more = Array.from(
    { length: extras },
    (_, i): Place => ({ id: `extra-${i + 1}`, label: `Extra stand ${i + 1}`, side: "left" }),
  );
  return [...CORNERS, ...more];
}

/** How many stands beyond the corners a draft or an older reading names. */
export function extrasIn(names: readonly string[]): number {
  const numbers = names.flatMap((name) => /^(?:\w+\.)?extra-(\d+)$/.exec(name)?.[1] ?? []);
  return Math.max(0, ...numbers.map(Number));
}

const unsigned = (typed: string): string => typed.replace(/^\s*[-−–]\s*/, "");

/**
 * The texts that a check begins with: where the stands were the last time, and the heights as last read, unless the
 * level was broken since: then they have to be read anew.
 */
export function firstTexts(level: LevelView | null): Draft {
  const texts: Draft = {};
  for (const reading of level?.readings ?? []) {
    if (level?.state !== "void" && reading.firstDeg !== null)
      texts[`first.${reading.place}`] = String(reading.firstDeg);
    if (level?.state !== "void" && reading.turnedDeg !== null)
      texts[`turned.${reading.place}`] = String(reading.turnedDeg);
    if (reading.x) texts[`x.${reading.place}`] = reading.x.typed;
    if (reading.y)
      texts[`y.${reading.place}`] = placesOf(0).some((one) => one.id === reading.place)
        ? unsigned(reading.y.typed)
        : reading.y.typed;
    if (reading.height && level?.state !== "void") texts[`height.${reading.place}`] = reading.height.typed;
  }
  return texts;
}

/** Across the frame, left positive. A corner's side is in its name, so it is typed without a sign. */
export function acrossOf(place: Place, draft: Draft, unit: LengthUnit): Millimetres | null {
  const typed = lengthIn(draft[`y.${place.id}`], unit);
  if (typed === null) return null;
  return mm(place.id.startsWith("extra") ? typed : Math.abs(typed) * (place.side === "left" ? 1 : -1));
}

export type HeightsNow = {
  /** Null until three heights and their places can be read. */
  level: LevelReading | null;
  moves: ReadonlyMap<string, Millimetres>;
  after: LevelReading | null;
  /** What is missing, in words; null when the level can be told. */
  missing: string | null;
};

/** The level by what is typed now, and what to do at each stand. */
export function heightsNow(
  places: readonly Place[],
  draft: Draft,
  unit: LengthUnit,
  shim: Millimetres,
): HeightsNow {
  const none = { level: null, moves: new Map<string, Millimetres>(), after: null };
  const stands: StandHeight[] = [];
  let placeless = 0;
  let unread = 0;
  for (const place of places) {
    const height = lengthIn(draft[`height.${place.id}`], unit);
    const x = lengthIn(draft[`x.${place.id}`], unit);
    const y = acrossOf(place, draft, unit);
    if (x === null || y === null) placeless++;
    else if (height === null) unread++;
    else stands.push({ id: place.id, x, y, height });
  }
  if (placeless > 0) return { ...none, missing: "Say where the stands are first." };
  if (unread > 0)
    return {
      ...none,
      missing: unread === 1 ? "One stand is still to be read." : `${unread} stands are still to be read.`,
    };
  const level = levelFromHeights(stands);
  if (!level.ok) return { ...none, missing: level.problem };
  const todo = standCorrections(stands, { mode: "raise", shim });
  return {
    level: level.value,
    moves: new Map(todo.ok ? todo.value.moves.map((move) => [move.id, move.raise]) : []),
    after: todo.ok ? todo.value.after : null,
    missing: null,
  };
}

/** The fields as they are posted: only stands that were read; across with its sign. */
export function postedHeights(places: readonly Place[], draft: Draft): Draft {
  const fields: Draft = { method: "heights" };
  for (const place of places) {
    const height = draft[`height.${place.id}`]?.trim();
    if (!height) continue;
    const across = draft[`y.${place.id}`]?.trim() ?? "";
    fields[`height.${place.id}`] = height;
    fields[`x.${place.id}`] = draft[`x.${place.id}`]?.trim() ?? "";
    fields[`y.${place.id}`] = place.side === "right" && across !== "" ? `-${unsigned(across)}` : across;
  }
  return fields;
}

/** The next stand without a reading after the one in hand, round the frame; null when all are read. */
export function nextUnread(places: readonly Place[], draft: Draft, after: string): Place | null {
  const at = places.findIndex((place) => place.id === after);
  const round = [...places.slice(at + 1), ...places.slice(0, at + 1)];
  return round.find((place) => place.id !== after && !draft[`height.${place.id}`]?.trim()) ?? null;
}
