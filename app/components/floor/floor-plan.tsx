import type { CSSProperties } from "react";
import { Bay } from "./bay";
import { useFloorView } from "./floor-context";
import { aisleOf, planExtent } from "./geometry";
import { NextMoves } from "./next-moves";
import { Slab } from "./slab";
import { VehiclePanel } from "./vehicle-panel";
import { Yard } from "./yard";

/** The plan of the building with everything that stands in it, to scale. */
export function FloorPlan() {
  const { floor, next } = useFloorView();
  const { board } = floor;
  const extent = planExtent(board);
  const aisle = aisleOf(board);
  return (
    <section className="floor-plan" aria-label="Floor plan">
      <div className="slab" style={{ "--w": extent.w, "--h": extent.h } as CSSProperties}>
        <Slab board={board} extent={extent} />
        {aisle ? <NextMoves next={next} x={aisle.x + 1.2} y={2.6} /> : null}
        <Yard extent={extent} />
        {board.bays.map((card) => (
          <Bay key={card.bay.id} card={card} />
        ))}
        <VehiclePanel extent={extent} />
      </div>
    </section>
  );
}
