import { DROP_POINTS, type DropPoint, type DropPointId, type DropSide } from "../../../domain/layout/drops";
import type { DropView, LayoutView } from "../../../domain/layout/view";
import type { LengthUnit } from "../../../domain/units/length";
import type { SignName } from "../../../ui/sign";
import { offLine, onTape } from "../lengths";
import { type Unsent, unsentOf } from "../unsent";

export type Spot = { point: DropPointId; side: DropSide };
export const subjectOf = ({ point, side }: Spot): string => `${point}.${side}`;
export const sameSpot = (a: Spot | null, b: Spot | null): boolean =>
  a !== null && b !== null && a.point === b.point && a.side === b.side;

const POINTS = new Map<string, DropPoint>(DROP_POINTS.map((point) => [point.id, point]));

/** "Axle end, as it came, left"; a point on the middle has no side to it. */
export function spotLabel({ point, side }: Spot): string {
  const label = POINTS.get(point)?.label ?? point;
  return side === "centre" ? label : `${label}, ${side}`;
}

export type CellState = "to-drop" | "kept" | "kept-here" | "not-taken" | "not-meeting" | "waiting";
export type Cell = {
  state: CellState;
  sign: SignName;
  words: string;
  detail: string;
};

/**
 * What a cell of the list says of its drop. What is kept on this tablet counts before what the shop has.
 * @param gone the level stands, and old drops are not carried over to it any more
 */
export function cellOf(drop: DropView, unsent: readonly Unsent[], unit: LengthUnit, gone = false): Cell {
  const mine = unsentOf(unsent, subjectOf(drop));
  if (mine?.refused) return { state: "not-taken", sign: "off", words: "not taken", detail: mine.refused };
  if (mine) return { state: "kept-here", sign: "unsent", words: "kept here", detail: "not sent" };
  const { reading } = drop;
  if (!reading)
    return { state: "to-drop", sign: "todo", words: "to drop", detail: drop.needed ? "" : "if wanted" };
  const words = onTape(reading.at.x, unit);
  const detail = offLine(reading.at.y, unit);
  if (!reading.stands)
    return {
      state: "waiting",
      sign: "void",
      words,
      detail: gone ? "void: drop it again" : "waits for the level",
    };
  if (reading.suspect) return { state: "not-meeting", sign: "off", words, detail: "tapes do not meet" };
  return { state: "kept", sign: "drop", words, detail: reading.checked ? detail : `${detail}, unchecked` };
}

/** The points with their drops beside each other, in the order of dropping. */
export function rowsOf(drops: readonly DropView[]): { point: DropPoint; drops: DropView[] }[] {
  return DROP_POINTS.flatMap((point) => {
    const own = drops.filter((drop) => drop.point === point.id);
    return own.length > 0 ? [{ point, drops: own }] : [];
  });
}

const isSettled = (drop: DropView, unsent: readonly Unsent[]): boolean =>
  unsentOf(unsent, subjectOf(drop))?.refused === null ||
  (drop.reading?.stands === true && !drop.reading.suspect);

/**
 * The drop to take in hand: under a new level an old one, then tapes that do not meet, then what is needed, then the
 * rest; in the order of dropping, from `after` on. Null when all are taken.
 */
export function nextSpot(
  drops: readonly DropView[],
  unsent: readonly Unsent[],
  redropWanted: boolean,
  after: Spot | null = null,
): Spot | null {
  const at = drops.findIndex((drop) => sameSpot(drop, after));
  const order = [...drops.slice(at + 1), ...drops.slice(0, at + 1)].filter((drop) => !sameSpot(drop, after));
  const old = redropWanted
    ? order.find((drop) => drop.reading !== null && !drop.reading.stands && drop.needed)
    : undefined;
  const found =
    old ??
    order.find((drop) => drop.reading?.suspect && !isSettled(drop, unsent)) ??
    order.find((drop) => drop.needed && !isSettled(drop, unsent)) ??
    order.find((drop) => !isSettled(drop, unsent));
  return found ? { point: found.point, side: found.side } : null;
}

/** Old drops are void for good: the level stands without them, and no re-drop can bring them back. */
export const oldDropsGone = ({ level, standsInBay }: Pick<LayoutView, "level" | "standsInBay">): boolean =>
  standsInBay && level?.state === "true" && level.redrop.state !== "wanted";
