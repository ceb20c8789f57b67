import {
  type Active,
  type CollisionDetection,
  type DroppableContainer,
  type KeyboardCoordinateGetter,
  pointerWithin,
} from "@dnd-kit/core";
import { nextStop, type Step } from "./geometry";
import type { PlaceKey } from "./words";

const STEP: Record<string, Step> = {
  ArrowDown: "next",
  ArrowUp: "before",
  ArrowLeft: "left",
  ArrowRight: "right",
};

const placeOf = (container: DroppableContainer) => container.data.current?.place as PlaceKey;

/** A vehicle goes to bays and to the yard, a person to bays and back to the rail. */
function aims(active: Active, container: DroppableContainer): boolean {
  const kind = active.data.current?.hand?.kind;
  return placeOf(container) !== (kind === "person" ? "yard" : "free");
}

/**
 * Keyboard dragging from place to place. The library moves a thing by so many pixels and asks what it hits; here the
 * place aimed at is remembered, so that a press is always a step to a place and never between two.
 */
export function makeWalk() {
  let aimed: string | null = null;

  const getCoordinates: KeyboardCoordinateGetter = (event, { context }) => {
    const step = STEP[event.code];
    const { active, collisionRect, droppableContainers, droppableRects } = context;
    if (!step || !active || !collisionRect) return undefined;
    event.preventDefault();
    const stops = droppableContainers
      .getEnabled()
      .filter((container) => aims(active, container))
      .sort((a, b) => Number(a.data.current?.order) - Number(b.data.current?.order))
      .flatMap((container) => {
        // Just picked up, the places are not measured yet: a quick key must not be lost.
        const rect = droppableRects.get(container.id) ?? container.node.current?.getBoundingClientRect();
        if (!rect || rect.width === 0) return [];
        return [{ key: String(container.id), x: rect.left + rect.width / 2, y: rect.top + rect.height / 2 }];
      });
    const next = nextStop(stops, aimed, step);
    if (!next) return undefined;
    aimed = next.key;
    return { x: next.x - collisionRect.width / 2, y: next.y - collisionRect.height / 2 };
  };

  const detect: CollisionDetection = (args) => {
    const containers = args.droppableContainers.filter((container) => aims(args.active, container));
    if (args.pointerCoordinates) return pointerWithin({ ...args, droppableContainers: containers });
    const container = containers.find((one) => one.id === aimed);
    return container ? [{ id: container.id, data: { droppableContainer: container, value: 0 } }] : [];
  };

  return {
    getCoordinates,
    detect,
    /** A drag by keyboard begins at the place where the thing is. */
    begin(home: PlaceKey) {
      aimed = `place-${home}`;
    },
  };
}
export type Walk = ReturnType<typeof makeWalk>;
