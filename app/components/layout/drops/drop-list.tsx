import { Fragment, type KeyboardEvent } from "react";
import type { DropView, LayoutView } from "../../../domain/layout/view";
import { Sign } from "../../../ui/sign";
import type { Unsent } from "../unsent";
import { cellOf, oldDropsGone, rowsOf, type Spot, sameSpot, spotLabel } from "./cells";

type Props = {
  view: LayoutView;
  unsent: readonly Unsent[];
  inHand: Spot | null;
  onPick: (spot: Spot) => void;
};

/** Arrow keys walk the cells: across by one, down by a row. */
function walk(event: KeyboardEvent<HTMLElement>) {
  const step = { ArrowLeft: -1, ArrowRight: 1, ArrowUp: -2, ArrowDown: 2 }[event.key];
  if (!step) return;
  const cells = [...event.currentTarget.querySelectorAll<HTMLButtonElement>("button")];
  const at = cells.indexOf(document.activeElement as HTMLButtonElement);
  const to = cells[Math.min(cells.length - 1, Math.max(0, at + step))];
  if (at < 0 || !to) return;
  event.preventDefault();
  to.focus();
}

/** Every point with its left and right drop: the text twin of the floor plan. */
export function DropList({ view, unsent, inHand, onPick }: Props) {
  const needed = view.drops.filter((drop) => drop.needed);
  const kept = needed.filter((drop) =>
    ["kept", "kept-here"].includes(cellOf(drop, unsent, view.unit).state),
  ).length;
  return (
    <section className="drop-list" aria-label="Drops" onKeyDown={walk}>
      <div className="drop-list-head" aria-hidden="true">
        <span>
          Left <small>from A, then off the line</small>
        </span>
        <span>Right</span>
      </div>
      <p className="sr-only" role="status">
        {kept} of {needed.length} needed drops kept
      </p>
      {rowsOf(view.drops).map(({ point, drops }) => (
        <Fragment key={point.id}>
          <div className="drop-row">
            <h2>{point.label}</h2>
            <div className="grid flex-1 grid-cols-2">
              {drops.map((drop) => (
                <DropCell
                  key={drop.side}
                  drop={drop}
                  unsent={unsent}
                  unit={view.unit}
                  gone={oldDropsGone(view)}
                  isInHand={sameSpot(drop, inHand)}
                  onPick={onPick}
                />
              ))}
            </div>
          </div>
          {point.id === "opening-rear" && view.openings ? (
            <p className="drop-note">{view.openings.words}</p>
          ) : null}
        </Fragment>
      ))}
    </section>
  );
}

type CellProps = {
  drop: DropView;
  unsent: readonly Unsent[];
  unit: LayoutView["unit"];
  gone: boolean;
  isInHand: boolean;
  onPick: (spot: Spot) => void;
};

function DropCell({ drop, unsent, unit, gone, isInHand, onPick }: CellProps) {
  const cell = cellOf(drop, unsent, unit, gone);
  const fresh = isInHand && cell.state === "to-drop";
  return (
    <button
      type="button"
      className={`drop-cell ${drop.side === "centre" ? "col-span-2" : ""}`}
      data-state={cell.state}
      aria-current={isInHand ? "true" : undefined}
      onClick={() => onPick({ point: drop.point, side: drop.side })}
    >
      <Sign name={fresh ? "drop" : cell.sign} size={22} />
      <span className="min-w-0">
        <span className="sr-only">{spotLabel(drop)}: </span>
        {fresh ? "in hand" : cell.words}
        {cell.detail ? <small>{cell.detail}</small> : null}
      </span>
    </button>
  );
}
