import { useDndContext } from "@dnd-kit/core";
import type { Check } from "../../domain/floor/move-check";
import { useFloorView } from "./floor-context";
import type { PlaceKey } from "./words";

export type PlaceState = {
  /** Null while nothing is in hand that could go here. */
  check: Check | null;
  /** Puts down what was picked up by a tap; null while dragging. */
  put: (() => void) | null;
  data: Record<`data-${string}`, string | boolean | undefined>;
};

/** Rules that every place but a few would say: they are worded, not shouted. */
const QUIET = new Set(["taken", "empty"]);

/** What a place says to the thing in hand, and how it is marked. */
export function usePlace(place: PlaceKey): PlaceState {
  const { floor } = useFloorView();
  const { over } = useDndContext();
  const { hand, thing, verdicts, put } = floor;
  const check = verdicts?.get(place) ?? null;
  const first = check?.reasons[0]?.rule;
  return {
    check,
    put: hand?.by === "tap" && thing ? () => void put(thing, place) : null,
    data: {
      "data-verdict": check?.verdict,
      "data-home": first === "same" || undefined,
      "data-quiet": (first !== undefined && QUIET.has(first)) || undefined,
      "data-over": (check !== null && over?.id === `place-${place}`) || undefined,
    },
  };
}
