import { useDndContext, useDndMonitor } from "@dnd-kit/core";
import { useState } from "react";

/** The dotted thread from where a thing was to where it hangs in hand. */
export function Thread() {
  const { active, activeNodeRect, over } = useDndContext();
  const [by, setBy] = useState({ x: 0, y: 0 });
  useDndMonitor({
    onDragStart: () => setBy({ x: 0, y: 0 }),
    onDragMove: ({ delta }) => setBy(delta),
  });
  if (!active || !activeNodeRect) return null;
  const from = {
    x: activeNodeRect.left + activeNodeRect.width / 2,
    y: activeNodeRect.top + activeNodeRect.height / 2,
  };
  const to =
    over && over.id !== "place-yard" && over.id !== "place-free"
      ? { x: over.rect.left + over.rect.width / 2, y: over.rect.top + over.rect.height / 2 }
      : { x: from.x + by.x, y: from.y + by.y };
  if (Math.hypot(to.x - from.x, to.y - from.y) < 60) return null;
  const bend = (to.x - from.x) / 2;
  return (
    <svg className="hand-thread" aria-hidden="true">
      <path
        d={`M${from.x} ${from.y}C${from.x + bend} ${from.y} ${to.x - bend} ${to.y} ${to.x} ${to.y}`}
        className="fill-none stroke-brass"
        strokeWidth="1.6"
        strokeDasharray="1 6"
        strokeLinecap="round"
      />
    </svg>
  );
}
