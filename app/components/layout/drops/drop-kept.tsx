import type { DropView, LayoutView } from "../../../domain/layout/view";
import { Button } from "../../../ui/button";
import { Verdict } from "../../../ui/verdict";
import { dayAndClock } from "../../time";
import { offLine, withinLength, withUnit } from "../lengths";
import { spotLabel } from "./cells";

/** A drop that stands: its reading, who read it, and what it took the place of. */
export function DropKept({
  view,
  drop,
  again,
  goOn,
}: {
  view: LayoutView;
  drop: DropView;
  again: (() => void) | null;
  goOn: (() => void) | null;
}) {
  const { reading } = drop;
  const { unit, shop } = view;
  if (!reading) return null;
  const off = reading.fit?.checked
    ? Math.max(...reading.fit.residuals.map((one) => Math.abs(one.residual)))
    : null;
  const how =
    reading.method === "offset"
      ? `${reading.stationTyped} ahead of A, ${reading.offsetTyped} off the line`
      : reading.ties.map((tie) => `${tie.mark} ${tie.distance.typed}`).join(", ");
  return (
    <>
      <Verdict
        tone="true"
        sign="drop"
        title={`${spotLabel(drop)}: ${withUnit(reading.at.x, unit)} ahead of A, ${offLine(reading.at.y, unit)}.`}
        detail={`${reading.made.name}, ${dayAndClock(reading.made.at, shop.timeZone)}.${off === null ? "" : ` Tapes meet within ${withinLength(off as typeof reading.at.x, unit)}.`}`}
      />
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 text-[16px]">
        <dt className="text-concrete-500">As read</dt>
        <dd className="font-medium">{how}</dd>
        {reading.height ? (
          <>
            <dt className="text-concrete-500">Height at ride</dt>
            <dd className="font-medium">{withUnit(reading.height.mm, unit)}</dd>
          </>
        ) : null}
        {reading.reason ? (
          <>
            <dt className="text-concrete-500">Taken again</dt>
            <dd>{reading.reason}</dd>
          </>
        ) : null}
        {drop.superseded.map((older) => (
          <div key={older.made.at} className="col-span-2 grid grid-cols-subgrid text-concrete-500">
            <dt>Before it</dt>
            <dd>
              <s>{older.typed}</s> {older.made.name}, {dayAndClock(older.made.at, shop.timeZone)}
            </dd>
          </div>
        ))}
      </dl>
      <div className="flex flex-wrap gap-2.5">
        {goOn ? (
          <Button tone="go" size="l" className="flex-1" onClick={goOn}>
            Next drop
          </Button>
        ) : null}
        {again ? (
          <Button size="l" onClick={again}>
            Drop it again
          </Button>
        ) : null}
      </div>
    </>
  );
}
