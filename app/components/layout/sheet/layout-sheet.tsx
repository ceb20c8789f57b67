import type { ReactNode } from "react";
import { VEHICLE_KIND } from "../../../domain/builds/vehicle-kinds";
import { cautionFor } from "../../../domain/layout/caution";
import type { Option } from "../../../domain/layout/options";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import { formatInches, type Millimetres } from "../../../domain/units/length";
import { Inches } from "../../../ui/length";
import { Sign } from "../../../ui/sign";
import { Stencil } from "../../../ui/stencil";
import { clock, dayAndDate } from "../../time";
import { shortName } from "../choose/option-words";
import { levelWords } from "../level-words";
import "./sheet.css";
import { SheetDrawing } from "./sheet-drawing";

type Props = { view: LayoutView; option: Option; qr: ReactNode; printedAt: string };

/** Why the sheet is dead, in words; null while it is good. */
export function voidReason(view: LayoutView): string | null {
  if (view.approval?.state === "void") {
    const reason = view.approval.voided?.reason ?? "a number changed";
    return `${reason.charAt(0).toUpperCase()}${reason.slice(1)}.`;
  }
  if (view.level?.state !== "true")
    return `The level does not stand${view.level?.voided ? `: ${view.level.voided.reason}` : ""}.`;
  if (!view.standsInBay) return `The vehicle left Bay ${view.bay.number}.`;
  return null;
}

/** One page to tape to the windscreen: what to mark, on what it stands, who signed. Black only. */
export function LayoutSheet({ view, option, qr, printedAt }: Props) {
  const zone = view.shop.timeZone;
  const dead = voidReason(view);
  const { approval, level } = view;
  const when = (at: string) => `${dayAndDate(at, zone)} ${clock(at, zone)}`;
  const crew = [
    ...new Set(view.drops.flatMap((drop) => (drop.reading?.stands ? [drop.reading.made.name] : []))),
  ];
  const kept = view.drops.filter((drop) => drop.reading?.stands).length;
  return (
    <article className={`sheet ${dead ? "sheet-dead" : ""}`} aria-label="Layout sheet">
      <p className="sheet-tapes" aria-hidden="true">
        <span>tape here</span>
        <span>tape here</span>
      </p>
      <header className="sheet-head">
        <span className="sheet-bay">
          <Stencil n={view.bay.number} size={112} />
        </span>
        <div>
          <h1>
            {view.vehicle.nickname} <small>{view.vehicle.code}</small>
          </h1>
          <p>
            {VEHICLE_KIND[view.vehicle.kind].label}, front axle
            {view.vehicle.tyreTyped ? `, ${view.vehicle.tyreTyped} tyres` : ""}
          </p>
          <p>Spring {shortName(option)}</p>
          <p className="sheet-revision">
            <b>Layout sheet · revision {approval?.sheetRevision ?? 0}</b>
            {approval && approval.sheetRevision > 1 ? (
              <span>replaces {approval.sheetRevision - 1}</span>
            ) : null}
            <span>printed {when(printedAt)}</span>
          </p>
        </div>
        <figure className="sheet-qr">
          {qr}
          <figcaption>scan before you mark</figcaption>
        </figure>
      </header>
      <p className="sheet-good">
        <Sign name="level" size={30} />
        Good only while the level stands. Vehicle moved or a stand touched: this sheet is void.
      </p>
      <SheetDrawing view={view} option={option} />
      <div className="sheet-numbers">
        <Mark
          n={1}
          title="Axle line, ahead of rear datum pair"
          value={option.axleStation}
          within={option.plusMinus}
          detail="Square to the frame centre line, at full compression with the spring flat."
        />
        <Mark
          n={2}
          title={`Hanger hole ${option.hole.number}, both sides`}
          value={option.hole.station}
          within={option.plusMinus}
          detail={`Ahead of the rear datum pair. ${holeWords(view, option)}`}
        />
        <Mark
          n={3}
          title={`Hole ${option.hole.number} back to the axle line, flat`}
          value={option.half}
          within={option.plusMinus}
          detail="Then square: both diagonals alike within 1/8 in."
        />
        <Mark
          n={4}
          title="From the opening's centre"
          value={option.shift}
          within={option.plusMinus}
          signed
          detail={
            option.approach === null
              ? "Ahead of it is +."
              : `Ahead of it is +. Approach ${formatDegrees(option.approach)}.`
          }
        />
      </div>
      <div className="sheet-ground">
        <div>
          <p className="sheet-ground-head">
            <Sign name={level?.state === "true" ? "level" : "void"} size={28} />
            {level?.state === "true" ? "Level true" : "Level void"}
          </p>
          {level ? (
            <p>
              {levelWords(level)}. Allowed {formatDegrees(level.allowedDeg)}. Read {when(level.made.at)} by{" "}
              {level.made.name}. {kept} drops by {crew.join(", ")}.
            </p>
          ) : null}
        </div>
        <div className="sheet-signed">
          <p className="sheet-line">{approval?.made.initials}</p>
          <p>
            <b>{approval?.made.name}</b>
          </p>
          <p>approved {approval ? when(approval.made.at) : ""}</p>
        </div>
        <div className="sheet-signed">
          <SecondPerson view={view} when={when} />
        </div>
      </div>
      <footer className="sheet-cautions">
        <Sign name="caution" size={34} />
        <p>
          {[
            ...cautionFor("stands"),
            ...cautionFor("weld"),
            ...cautionFor("tack"),
            ...cautionFor("approval"),
          ].join(" ")}{" "}
          Brake and steering changes are inspected as local law asks. These figures are an aid to layout, not
          an engineering certificate.
          {view.shop.isDemo ? " Demo shop: made-up figures." : ""}
        </p>
      </footer>
      {dead ? (
        <section className="sheet-void" role="alert">
          <b>VOID</b>
          <p>{dead} Mark nothing from this sheet. Level again, then drop one old point again.</p>
        </section>
      ) : null}
    </article>
  );
}

function holeWords(view: LayoutView, option: Option): string {
  const place =
    view.holes.length < 2
      ? ""
      : option.hole.number === 1
        ? "The rearmost hole. "
        : option.hole.number === view.holes.length
          ? "The foremost hole. "
          : "";
  const first =
    view.hanger.holes.find((hole) => hole.number === option.hole.number)?.ahead ?? (0 as Millimetres);
  return first > 0 ? `${place}${formatInches(first)} in ahead of hole 1.` : place;
}

type MarkProps = {
  n: number;
  title: string;
  value: Millimetres;
  within: Millimetres;
  detail: string;
  signed?: boolean;
};

function Mark({ n, title, value, within, detail, signed = false }: MarkProps) {
  return (
    <section className="sheet-mark">
      <span className="sheet-disc">{n}</span>
      <div>
        <h2>{title}</h2>
        <p className="sheet-value">
          <Inches mm={value} signed={signed} /> <small>in</small>{" "}
          <small>± {formatInches(within, { denominator: 32 })}</small>
        </p>
        <p>{detail}</p>
      </div>
    </section>
  );
}

/** Who read again what weighs most, or who let it go on without, and why. */
function SecondPerson({ view, when }: { view: LayoutView; when: (at: string) => string }) {
  const { waived, items } = view.secondLook;
  const looks = items.flatMap((item) => item.looks.filter((look) => look.agrees));
  const last = looks.at(-1);
  if (waived)
    return (
      <>
        <p className="sheet-line">{waived.made.initials}</p>
        <p>
          <b>No second look</b>
        </p>
        <p>
          {waived.made.name}: {waived.reason}
        </p>
      </>
    );
  return (
    <>
      <p className="sheet-line">{last?.made.initials}</p>
      <p>
        <b>{last ? [...new Set(looks.map((look) => look.made.name))].join(", ") : "Second person"}</b>
      </p>
      <p>{last ? `read again, agrees, ${when(last.made.at)}` : "reads again before welding"}</p>
    </>
  );
}
