import { useDraggable } from "@dnd-kit/core";
import { useRef } from "react";
import type { CrewCard } from "../../domain/floor/board";
import { ToolCheck } from "../../ui/tool-check";
import { useFloorView } from "./floor-context";
import { isAway, personName } from "./words";

/**
 * One of the crew as a tool check that can be taken in hand. The same person hangs in several places, so each check
 * says where it hangs.
 */
export function PersonCheck({
  person,
  hangs,
  size,
}: {
  person: CrewCard;
  hangs: "rail" | "strip" | "bay";
  size?: number;
}) {
  const { floor, may, now, openMove } = useFloorView();
  const away = isAway(person, now);
  const movable = may.assign && !away;
  const touch = useRef(false);
  const { setNodeRef, listeners, attributes } = useDraggable({
    id: `${hangs}-person-${person.personId}`,
    data: { hand: { kind: "person", personId: person.personId } },
    disabled: !movable,
  });
  const state = away ? "away" : person.on ? "on" : "free";
  const check = <ToolCheck initials={person.initials} state={state} size={size ?? 30} />;
  const inHand = floor.hand?.kind === "person" && floor.hand.personId === person.personId;
  const sending = floor.pending.some((one) => one.kind === "person" && one.personId === person.personId);
  if (!movable)
    return (
      <span className="person-check" role="img" aria-label={personName(person, now)}>
        {check}
      </span>
    );
  const thing = { kind: "person", person } as const;
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...listeners}
      aria-describedby={attributes["aria-describedby"]}
      aria-pressed={inHand || undefined}
      className="person-check"
      data-thing={`person-${person.personId}`}
      data-in-hand={inHand}
      data-sending={sending}
      aria-label={personName(person, now)}
      title={person.name}
      onPointerDown={(event) => {
        touch.current = event.pointerType === "touch";
      }}
      onContextMenu={(event) => touch.current && event.preventDefault()}
      onClick={() =>
        touch.current
          ? floor.pickUp({ kind: "person", personId: person.personId, by: "tap" })
          : openMove(thing)
      }
    >
      {check}
    </button>
  );
}
