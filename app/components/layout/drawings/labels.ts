import type { Spot } from "./viewport";

/** A rectangle of the drawing, in points. */
export type Box = { x: number; y: number; width: number; height: number };
/** A text that belongs to a spot; `lean` says which side is outward, as a direction in the drawing. */
export type Label = { key: string; text: string; spot: Spot; size: number; lean: Spot; weight?: number };
export type Placed = Label & { at: Spot; anchor: "start" | "middle" | "end"; box: Box };

/** Mean width of a figure or a letter of the condensed face, in ems. */
const EM = 0.44;
const GAP = 9;

export const textWidth = (text: string, size: number): number => text.length * size * EM;

export function overlap(a: Box, b: Box): number {
  const wide = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const high = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return wide > 0 && high > 0 ? wide * high : 0;
}

/** The eight places round a spot, the outward one first. */
function places(label: Label): Placed[] {
  const width = textWidth(label.text, label.size);
  const outward = Math.atan2(label.lean.y, label.lean.x);
  return [0, 1, -1, 2, -2, 3, -3, 4].map((turn) => {
    const angle = outward + (turn * Math.PI) / 4;
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const anchor = cos > 0.35 ? "start" : cos < -0.35 ? "end" : "middle";
    const at = {
      x: label.spot.x + cos * GAP,
      y: label.spot.y + sin * (GAP + label.size * 0.45) + label.size * 0.34,
    };
    const left = anchor === "start" ? at.x : anchor === "end" ? at.x - width : at.x - width / 2;
    const box = { x: left, y: at.y - label.size * 0.82, width, height: label.size };
    return { ...label, at, anchor, box };
  });
}

const outside = (box: Box, frame: Box): number => box.width * box.height - overlap(box, frame);

/**
 * Places texts beside their spots, one after the other: outward if that is free, else the place round the spot where it
 * covers least. What comes first in the list gets the better place.
 * @param taken rectangles that should stay free, such as the crosses themselves
 * @param frame the drawing's edge; a text that leaves it counts as covering
 */
export function placeLabels(labels: readonly Label[], taken: readonly Box[], frame: Box): Placed[] {
  const done: Placed[] = [];
  const full = [...taken];
  for (const label of labels) {
    let best: Placed | null = null;
    let least = Number.POSITIVE_INFINITY;
    for (const [rank, place] of places(label).entries()) {
      let cost = rank * 0.01 + outside(place.box, frame) * 3;
      for (const box of full) cost += overlap(place.box, box);
      if (cost < least) {
        least = cost;
        best = place;
      }
    }
    if (best) {
      done.push(best);
      full.push(best.box);
    }
  }
  return done;
}
