import type { BayMouth } from "../../domain/floor/bays";
import type { Board, BoardBay } from "../../domain/floor/board";

/*
 * The plan is drawn in feet of the building; the style sheet says how many pixels a foot is. x to the right, y down,
 * the building's own corner at 0, 0.
 */

const FT_MM = 304.8;
/** Feet to a tenth of a thousandth: finer than any drawing. */
export const feet = (lengthMm: number): number => Math.round((lengthMm / FT_MM) * 1e4) / 1e4;

export type Box = { x: number; y: number; w: number; h: number };

/** Where a bay lies on the plan. Its length runs from the mouth inwards. */
export function bayBox(bay: BoardBay): Box {
  const long = bay.mouth === "east" || bay.mouth === "west";
  const [w, h] = long ? [bay.lengthMm, bay.widthMm] : [bay.widthMm, bay.lengthMm];
  return { x: feet(bay.xMm), y: feet(bay.yMm), w: feet(w), h: feet(h) };
}

/** Room for the yard's row below the building: a vehicle with its words. */
const YARD_FT = 9.6;
const YARD_GAP_FT = 1.4;

export type PlanExtent = {
  building: { w: number; h: number };
  /** The yard's row. Its vehicles begin right of the bays that lie outside in the same strip. */
  yard: Box;
  /** Everything, from the building's corner. */
  w: number;
  h: number;
};

/** How much ground the plan shows: the building, the bays outside and the yard's row. */
export function planExtent(board: Board): PlanExtent {
  const building = { w: feet(board.building.lengthMm), h: feet(board.building.widthMm) };
  const outside = board.bays.filter((card) => card.bay.outside).map((card) => bayBox(card.bay));
  const top = building.h + YARD_GAP_FT;
  const bottom = Math.max(top + YARD_FT, ...outside.map((box) => box.y + box.h));
  const w = Math.max(building.w, ...outside.map((box) => box.x + box.w));
  const beside = outside.filter((box) => box.y + box.h > top && box.x + box.w < w * 0.75);
  const left = Math.max(0, ...beside.map((box) => box.x + box.w + 1));
  return { building, yard: { x: left, y: top, w: w - left, h: bottom - top }, w, h: bottom };
}

/** The strip between bays that open to each other: where the plan has room for words. Null when there is none. */
export function aisleOf(board: Board): { x: number; w: number } | null {
  const inside = board.bays.filter((card) => !card.bay.outside).map((card) => card.bay);
  const west = inside.filter((bay) => bay.mouth === "east").map((bay) => bayBox(bay));
  const east = inside.filter((bay) => bay.mouth === "west").map((bay) => bayBox(bay));
  const from = west.length > 0 ? Math.max(...west.map((box) => box.x + box.w)) : 0;
  const to = east.length > 0 ? Math.min(...east.map((box) => box.x)) : feet(board.building.lengthMm);
  return to - from >= 6 ? { x: from, w: to - from } : null;
}

/** A walk round the nose, and room at the mouth for the bay's number. Feet. */
const WALK_FT = 2.2;
const NUMBER_FT = 4.8;

/**
 * How far from a bay's closed end a vehicle is drawn: nose in with a walk round it where there is room, closer where
 * the number would be covered, against the end when it is too long.
 * @param spare how much longer the bay is than the vehicle, in feet; negative when it is shorter
 */
export function noseInset(spare: number): number {
  return Math.max(0, Math.min(WALK_FT, Math.max(spare - NUMBER_FT, Math.min(0.5, spare / 2))));
}

/** Three painted sides, open at the mouth, as an SVG path. */
export function paintPath(box: Box, mouth: BayMouth): string {
  const { x, y } = box;
  const right = x + box.w;
  const bottom = y + box.h;
  switch (mouth) {
    case "east":
      return `M${right} ${y}H${x}V${bottom}H${right}`;
    case "west":
      return `M${x} ${y}H${right}V${bottom}H${x}`;
    case "north":
      return `M${x} ${y}V${bottom}H${right}V${y}`;
    case "south":
      return `M${x} ${bottom}V${y}H${right}V${bottom}`;
  }
}

/** Degrees that turn a vehicle drawn nose left so that its nose points into the bay. */
export const NOSE_TURN: Record<BayMouth, number> = { east: 0, west: 180, south: 90, north: -90 };

/** A point of a bay's floor frame on the plan. The frame's A-B line is the bay's centre line; +x points into the bay. */
export function markPoint(bay: BoardBay, mark: { xMm: number; yMm: number }): { x: number; y: number } {
  const box = bayBox(bay);
  const centre = { x: box.x + box.w / 2, y: box.y + box.h / 2 };
  const along = mark.xMm - midOfMarks(bay);
  const left = mark.yMm;
  switch (bay.mouth) {
    case "east":
      return { x: centre.x - feet(along), y: centre.y + feet(left) };
    case "west":
      return { x: centre.x + feet(along), y: centre.y - feet(left) };
    case "south":
      return { x: centre.x - feet(left), y: centre.y - feet(along) };
    case "north":
      return { x: centre.x + feet(left), y: centre.y + feet(along) };
  }
}

/** The survey says where the marks lie to each other, not where in the bay: they are drawn about its middle. */
function midOfMarks(bay: BoardBay): number {
  const xs = bay.marks.map((mark) => mark.xMm);
  return xs.length === 0 ? 0 : (Math.min(...xs) + Math.max(...xs)) / 2;
}

export type Step = "next" | "before" | "left" | "right";
export type Stop = { key: string; x: number; y: number };

/**
 * The next place from one, by keyboard. Next and before go through the places in their order and round again; left and
 * right cross to the nearest place on that side, and stay when there is none.
 * @param stops the places in order, each with the middle of it on the screen
 * @param from the key of the place in hand; null or unknown starts at the first
 */
export function nextStop(stops: readonly Stop[], from: string | null, step: Step): Stop | null {
  const at = stops.findIndex((stop) => stop.key === from);
  const here = stops[at];
  if (!here) return stops[0] ?? null;
  if (step === "next" || step === "before") {
    const by = step === "next" ? 1 : -1;
    return stops[(at + by + stops.length) % stops.length] ?? null;
  }
  const side = step === "right" ? 1 : -1;
  const there = stops
    .filter((stop) => (stop.x - here.x) * side > Math.abs(stop.y - here.y) * 0.25 + 20)
    .sort(
      (a, b) => Math.hypot(a.x - here.x, 2 * (a.y - here.y)) - Math.hypot(b.x - here.x, 2 * (b.y - here.y)),
    );
  return there[0] ?? here;
}
