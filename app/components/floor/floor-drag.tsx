import {
  type Announcements,
  DndContext,
  type DragEndEvent,
  DragOverlay,
  type DragStartEvent,
  type DropAnimation,
  KeyboardSensor,
  MeasuringStrategy,
  MouseSensor,
  TouchSensor,
  useSensor,
  useSensors,
} from "@dnd-kit/core";
import { type ReactNode, useMemo, useRef, useState } from "react";
import { useFloorView } from "./floor-context";
import { type Hand, placeName, thingInHand, thingTitle, verdictsFor } from "./hand";
import { spokenVerdict } from "./hand-note";
import { Lifted } from "./lifted";
import { focusThing } from "./slide-home";
import { snapToStand } from "./snap";
import { Thread } from "./thread";
import { thingKey } from "./use-floor";
import { makeWalk } from "./walk";
import type { PlaceKey } from "./words";

const MOUSE = { activationConstraint: { distance: 5 } };
const TOUCH = { activationConstraint: { delay: 250, tolerance: 5 } };
const KEYS = { start: ["Space"], cancel: ["Escape"], end: ["Space", "Enter"] };
const MEASURING = { droppable: { strategy: MeasuringStrategy.WhileDragging } };
const HOME: DropAnimation = { duration: 240, easing: "ease-out" };
const SNAP = [snapToStand];
const INSTRUCTIONS = {
  draggable:
    "Press Space to pick up. Then the up and down arrows go through the places, left and right cross the aisle, Space puts down, Escape puts back. M opens the list of places.",
};

const still = () => window.matchMedia("(prefers-reduced-motion: reduce)").matches;
const handOf = (event: { active: DragStartEvent["active"] }) =>
  ({ ...event.active.data.current?.hand, by: "drag" }) as Hand;

/** Dragging on the Floor by mouse, finger and keyboard, with everything said for those who listen. */
export function FloorDrag({ children }: { children: ReactNode }) {
  const { floor, now, select } = useFloorView();
  const walk = useMemo(makeWalk, []);
  const keys = useMemo(
    () => ({ coordinateGetter: walk.getCoordinates, keyboardCodes: KEYS, scrollBehavior: "auto" as const }),
    [walk],
  );
  const sensors = useSensors(
    useSensor(MouseSensor, MOUSE),
    useSensor(TouchSensor, TOUCH),
    useSensor(KeyboardSensor, keys),
  );
  const [ft, setFt] = useState("13px");
  const [goesHome, setGoesHome] = useState(true);
  const latest = useRef({ floor, now });
  latest.current = { floor, now };

  const start = (event: DragStartEvent) => {
    const hand = handOf(event);
    const thing = thingInHand(floor.board, hand);
    const plan = document.querySelector(".slab");
    if (plan) setFt(getComputedStyle(plan).getPropertyValue("--ft"));
    if (thing) walk.begin(homePlace(thing));
    setGoesHome(true);
    select(null);
    floor.pickUp(hand);
  };
  const end = (event: DragEndEvent) => {
    const thing = thingInHand(floor.board, handOf(event));
    const place = event.over?.data.current?.place as PlaceKey | undefined;
    floor.letGo();
    if (!thing || place === undefined) return;
    const goes = floor.put(thing, place);
    setGoesHome(!goes);
    // The element that had the focus may be drawn elsewhere now.
    requestAnimationFrame(() => focusThing(thingKey(thing)));
  };
  const announcements = useMemo(() => announcing(latest), []);

  return (
    <DndContext
      id="floor"
      sensors={sensors}
      collisionDetection={walk.detect}
      measuring={MEASURING}
      accessibility={{ announcements, screenReaderInstructions: INSTRUCTIONS, restoreFocus: false }}
      onDragStart={start}
      onDragEnd={end}
      onDragCancel={(event) => {
        const thing = thingInHand(floor.board, handOf(event));
        floor.letGo();
        if (thing) requestAnimationFrame(() => focusThing(thingKey(thing)));
      }}
    >
      {children}
      <Thread />
      <DragOverlay
        modifiers={SNAP}
        dropAnimation={goesHome && typeof window !== "undefined" && !still() ? HOME : null}
        zIndex={50}
      >
        {floor.hand?.by === "drag" ? <Lifted ft={ft} /> : null}
      </DragOverlay>
    </DndContext>
  );
}

function homePlace(thing: NonNullable<ReturnType<typeof thingInHand>>): PlaceKey {
  if (thing.kind === "vehicle") return thing.bay?.id ?? "yard";
  return "free";
}

type Latest = { current: { floor: ReturnType<typeof useFloorView>["floor"]; now: string } };

function announcing(latest: Latest): Announcements {
  const titleOf = (event: { active: DragStartEvent["active"] }) => {
    const thing = thingInHand(latest.current.floor.board, handOf(event));
    return thing ? thingTitle(thing) : "It";
  };
  return {
    onDragStart: (event) => `${titleOf(event)} picked up.`,
    onDragOver(event) {
      const { floor, now } = latest.current;
      const thing = thingInHand(floor.board, handOf(event));
      const place = event.over?.data.current?.place as PlaceKey | undefined;
      if (!thing || place === undefined) return "Over no place.";
      const check = verdictsFor(floor.board, thing, now).get(place);
      const name = placeName(floor.board, place);
      return check ? spokenVerdict(name.charAt(0).toUpperCase() + name.slice(1), check) : undefined;
    },
    // What letting go did is said by the Floor itself, once it is known.
    onDragEnd: () => undefined,
    onDragCancel: (event) => `${titleOf(event)} put back.`,
  };
}
