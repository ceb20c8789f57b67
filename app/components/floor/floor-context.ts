import { createContext, useContext } from "react";
import type { NextCard } from "../../domain/floor/board";
import type { Thing } from "./hand";
import type { Floor } from "./use-floor";

export type FloorMay = {
  move: boolean;
  assign: boolean;
  hold: boolean;
  measure: boolean;
  bookIn: boolean;
  seeLayouts: boolean;
  seeBuilds: boolean;
  printTags: boolean;
};

/** What every part of the Floor needs to know. */
export type FloorView = {
  floor: Floor;
  /** The shop's clock, as an ISO string. */
  now: string;
  timeZone: string;
  may: FloorMay;
  /** What somebody else changed a moment ago, by build. */
  changed: ReadonlyMap<number, string>;
  selected: number | null;
  select: (buildId: number | null) => void;
  /** Opens the list of places for a thing. */
  openMove: (thing: Thing) => void;
  next: readonly NextCard[];
};

const FloorContext = createContext<FloorView | null>(null);
export const FloorProvider = FloorContext.Provider;

export function useFloorView(): FloorView {
  const view = useContext(FloorContext);
  if (!view) throw new Error("A part of the Floor is drawn outside of it");
  return view;
}
