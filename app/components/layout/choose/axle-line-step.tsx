import { useState } from "react";
import { Link, useRevalidator } from "react-router";
import type { AxleLine, AxleMethod } from "../../../domain/layout/axle-line";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import {
  formatDecimalInches,
  type LengthUnit,
  type Millimetres,
  mm,
  parseLength,
} from "../../../domain/units/length";
import { Button, buttonClass } from "../../../ui/button";
import { Field } from "../../../ui/field";
import { Verdict } from "../../../ui/verdict";
import { FloorPlan } from "../drawings/floor-plan";
import { smallLength } from "../lengths";
import type { May } from "../may";
import { usePost } from "../use-post";
import { Cautions } from "./cautions";

const NAME: Record<AxleMethod, string> = {
  square: "Square to the frame",
  "through-centres": "Through both centres",
  asked: "At an offset asked for",
};

/** "on it", "1/32 in ahead of it". */
function offset(residual: Millimetres, unit: LengthUnit): string {
  if (Math.abs(residual) < 0.4) return "on it";
  return `${smallLength(residual, unit)} ${residual > 0 ? "ahead of" : "behind"} it`;
}

const WHY: Record<AxleMethod, string> = {
  square: "Drives straight. The usual way.",
  "through-centres": "Looks centred on both sides; drives a little askew when the body sits askew.",
  asked: "Square, so far ahead of the centre as the customer wants.",
};

/** " Sure to 1/16 in. Mostly the bob (54 %), then …" */
function surenessWords({ axle, unit }: LayoutView): string {
  return axle?.sureness
    ? ` Sure to ${smallLength(axle.sureness.plusMinus, unit)} (k = 2). ${axle.sureness.words}`
    : "";
}

/** How the axle line is laid: three ways with what each gives. */
export function AxleLineStep({ view, may }: { view: LayoutView; may: May }) {
  const { revalidate } = useRevalidator();
  const sending = usePost(() => void revalidate());
  const [method, setMethod] = useState<AxleMethod>(view.axle?.line.method ?? "square");
  const [asked, setAsked] = useState(view.axle?.asked?.typed ?? "");
  const square = view.axleWays.find((way) => way.method === "square");
  if (!view.openings || !square)
    return (
      <Verdict tone="empty" sign="drop" title="The openings are not known yet." detail={view.missing[0]} />
    );
  const keep = () =>
    sending.send(`/layouts/${view.id}/axle-line`, { method, ...(method === "asked" ? { asked } : {}) });
  return (
    <div className="grid gap-4 p-4 xl:grid-cols-2">
      <section className="grid content-start gap-4" aria-label="Axle line">
        {view.axle ? (
          <Verdict
            tone="true"
            sign="finish"
            title={`Axle line at ${formatDecimalInches(view.axle.line.station)}, ${NAME[view.axle.line.method].toLowerCase()}.`}
            detail={`Inches ahead of the rear datum pair. Chosen by ${view.axle.made.name}.${surenessWords(view)}`}
          />
        ) : (
          <Verdict
            tone="in-hand"
            sign="plan"
            title="Choose how the axle line is laid."
            detail={view.openings.words}
          />
        )}
        {view.axle ? <p className="text-concrete-700">{view.openings.words}</p> : null}
        <div role="radiogroup" aria-label="How the axle line is laid" className="grid gap-2">
          {(["square", "through-centres", "asked"] as const).map((way) => (
            <Way
              key={way}
              way={way}
              line={lineFor(way, view, asked, square)}
              chosen={method === way}
              unit={view.unit}
              onChoose={() => may.measure && setMethod(way)}
            />
          ))}
        </div>
        {method === "asked" ? (
          <Field
            label="Ahead of the centre"
            hint="As on the tape; a minus is behind."
            scale="tablet"
            value={asked}
            onChange={(event) => setAsked(event.target.value)}
            error={sending.fields.asked}
            disabled={!may.measure}
          />
        ) : null}
        {may.measure ? (
          <div className="flex flex-wrap gap-3">
            <Button tone="go" size="xl" className="flex-1" busy={sending.busy} onClick={keep}>
              {view.axle ? "Lay it this way" : `Lay it ${NAME[method].toLowerCase()}`}
            </Button>
            {view.axle ? (
              <Link className={buttonClass("plain", "xl")} to={`/layouts/${view.id}/step/options`}>
                Go to Options
              </Link>
            ) : null}
          </div>
        ) : null}
        {sending.trouble ? <Verdict tone="not-true" sign="off" title={sending.trouble} live /> : null}
        <Cautions step="axle-line" />
      </section>
      <div className="min-h-80 xl:min-h-[32rem]">
        <FloorPlan view={view} />
      </div>
    </div>
  );
}

/** What a way gives; an offset that is being typed is followed at once. */
function lineFor(way: AxleMethod, view: LayoutView, asked: string, square: AxleLine): AxleLine | null {
  if (way !== "asked") return view.axleWays.find((line) => line.method === way) ?? null;
  const read = parseLength(asked, view.unit);
  if (!read.ok) return null;
  return {
    ...square,
    method: "asked",
    station: mm(square.station + read.value),
    residualLeft: mm(square.residualLeft - read.value),
    residualRight: mm(square.residualRight - read.value),
  };
}

type WayProps = {
  way: AxleMethod;
  line: AxleLine | null;
  chosen: boolean;
  unit: LengthUnit;
  onChoose: () => void;
};

function Way({ way, line, chosen, unit, onChoose }: WayProps) {
  return (
    <button
      type="button"
      role="radio"
      aria-checked={chosen}
      onClick={onChoose}
      className={`grid min-h-20 grid-cols-[1fr_auto] items-center gap-x-4 rounded border-[1.5px] px-4 py-3 text-left ${chosen ? "border-brass-ink bg-brass-wash" : "border-paint-edge bg-chalk"}`}
    >
      <b className="text-lg font-semibold">{NAME[way]}</b>
      <span className="row-span-2 text-right font-label text-3xl font-semibold">
        {line ? formatDecimalInches(line.station) : "–"}
      </span>
      <span className="text-[15px] text-concrete-700">
        {line
          ? `${line.turn === 0 ? "Square" : `${formatDegrees(line.turn)} from square`}; left centre ${offset(line.residualLeft, unit)}, right centre ${offset(line.residualRight, unit)}.`
          : "Type how far."}{" "}
        {WHY[way]}
      </span>
    </button>
  );
}
