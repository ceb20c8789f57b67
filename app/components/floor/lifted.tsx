import { useDndContext } from "@dnd-kit/core";
import type { CSSProperties } from "react";
import type { BoardBay } from "../../domain/floor/board";
import type { Check } from "../../domain/floor/move-check";
import { formatFeet, mm } from "../../domain/units/length";
import { ToolCheck } from "../../ui/tool-check";
import { useFloorView } from "./floor-context";
import { feet } from "./geometry";
import { HandNote } from "./hand-note";
import { VehicleDrawing, vehicleStyle } from "./standing-vehicle";
import type { PlaceKey } from "./words";

/** What is in hand, drawn over everything: brass, raised, with the reasons of the place it is over. */
export function Lifted({ ft }: { ft: string }) {
  const { floor } = useFloorView();
  const { over } = useDndContext();
  const { thing, verdicts, board } = floor;
  if (!thing) return null;
  const place = (over?.data.current?.place ?? null) as PlaceKey | null;
  const check = place === null ? null : (verdicts?.get(place) ?? null);
  const bay = board.bays.find((card) => card.bay.id === place)?.bay ?? null;
  const note =
    place !== null && check ? (
      <div className="hand-note" data-side={noteSide(bay, over?.rect)} aria-hidden="true">
        <HandNote thing={thing} place={place} check={check} />
      </div>
    ) : null;
  if (thing.kind === "person")
    return (
      <div className="lifted lifted-person">
        <ToolCheck initials={thing.person.initials} state={thing.person.on ? "on" : "free"} size={34} />
        {note}
      </div>
    );
  const facing = bay ?? thing.bay;
  return (
    <div className="lifted" style={{ "--ft": ft, ...vehicleStyle(thing.vehicle, facing) } as CSSProperties}>
      <VehicleDrawing vehicle={thing.vehicle} tone="hand" />
      {check && bay && check.overMm > 0 && !isTaken(check) ? <Overhang check={check} bay={bay} /> : null}
      {note}
    </div>
  );
}

const isTaken = (check: Check) => check.reasons.some((reason) => reason.rule === "taken");

/** The part that would stand out of the bay: hatched, with its length. */
function Overhang({ check, bay }: { check: Check; bay: BoardBay }) {
  const width = `calc(var(--ft) * ${feet(check.overMm)})`;
  const edge = bay.mouth === "west" ? { left: 0 } : { right: 0 };
  return (
    <>
      <span className="lifted-overhang" style={{ width, ...edge }} />
      <span className="lifted-over" style={{ width, ...edge }}>
        <span>{formatFeet(mm(check.overMm))} over</span>
      </span>
    </>
  );
}

/** The note goes where there is floor: into the aisle, and away from the edge of the screen. */
function noteSide(bay: BoardBay | null, rect: { top: number; height: number } | undefined): string {
  if (!bay || bay.outside) return "above";
  const low = rect !== undefined && rect.top + rect.height / 2 > window.innerHeight / 2;
  return `${bay.mouth === "west" ? "left" : "right"}-${low ? "low" : "high"}`;
}
