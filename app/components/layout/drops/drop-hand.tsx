import { type RefObject, useEffect, useRef } from "react";
import { dropPoint } from "../../../domain/layout/drops";
import type { DropView, LayoutView } from "../../../domain/layout/view";
import { mm } from "../../../domain/units/length";
import { Button } from "../../../ui/button";
import { EntryDock } from "../entry-dock";
import { offLine, withinLength, withUnit } from "../lengths";
import { type Draft, useDraft } from "../use-draft";
import type { Outbox } from "../use-unsent";
import { type Spot, spotLabel, subjectOf } from "./cells";
import { EntryFields, fieldsOf } from "./entry-fields";
import { type EntryRead, type Method, methodOf, postedDrop, readEntry } from "./entry-read";
import { type Correction, Trouble } from "./trouble";
import { useKeepDrop } from "./use-keep-drop";

export type HandProps = {
  view: LayoutView;
  drop: DropView;
  outbox: Outbox;
  usual: Method;
  next: Spot | null;
  pad: { padUp: boolean; setPad: (up: boolean) => void };
  field: string | null;
  setField: (name: string | null) => void;
  /** Set when the drop before was typed on the pad: this one begins in its first field. */
  goesOn: RefObject<boolean>;
  onRead: (read: EntryRead) => void;
  onKept: () => void;
  onSending: (on: boolean) => void;
};

/** The texts that an entry begins with: tapes that do not meet stand there, so that one can be taped again. */
function firstTexts(drop: DropView, redrop: boolean): Draft {
  const { reading } = drop;
  if (!reading) return { reason: "" };
  if (!reading.stands) return { reason: redrop ? "First point under the new level" : "Under the new level" };
  if (!reading.suspect) return { reason: "Measured again" };
  return {
    reason: "Taped again",
    method: "ties",
    ...Object.fromEntries(reading.ties.map((tie) => [`tape.${tie.mark}`, tie.distance.typed])),
  };
}

/** The drop in hand: where to hang the bob, what is read, what that comes to. */
export function DropEntry({
  view,
  drop,
  outbox,
  usual,
  next,
  pad,
  field,
  setField,
  goesOn,
  onRead,
  onKept,
  onSending,
}: HandProps) {
  const point = dropPoint(drop.point);
  const withHeight = point?.withHeight ?? false;
  const redrop = view.level?.redrop.state === "wanted";
  const { draft, change, reset } = useDraft(
    `plumbay.layout.${view.id}.drop.${subjectOf(drop)}`,
    firstTexts(drop, redrop),
  );
  const method = methodOf(draft, usual, drop.side);
  const read = readEntry(view, drop.side, method, draft, withHeight);
  const { keep, busy, refused } = useKeepDrop(view, outbox, drop);
  const root = useRef<HTMLDivElement>(null);
  const fields = fieldsOf(view, drop, method, withHeight);
  useEffect(() => {
    if (!goesOn.current) return;
    goesOn.current = false;
    root.current?.querySelector("input")?.focus();
  }, [goesOn]);
  const posted = postedDrop(view, drop, method, draft, withHeight);
  const focusOn = (name: string) =>
    root.current?.querySelector<HTMLInputElement>(`[name="${name}"]`)?.focus();
  const edit = (changes: Draft) => {
    change(changes);
    onRead(readEntry(view, drop.side, method, { ...draft, ...changes }, withHeight));
  };
  const finish = async (readings: Draft[], suspect: boolean) => {
    onSending(true);
    const kept = await keep(readings);
    onSending(false);
    if (kept === null || kept === "refused") return;
    reset(suspect ? draft : { reason: "" });
    if (!suspect) onKept();
  };
  const keepDrop = () => {
    if (read.at && !read.problem) void finish([posted], read.fit?.suspect ?? false);
  };
  const keepField = () => {
    const at = fields.findIndex((one) => one.name === field);
    const empty = [...fields.slice(at + 1), ...fields.slice(0, at)].find(
      (one) => one.wanted && !draft[one.name]?.trim(),
    );
    if (empty) focusOn(empty.name);
    else keepDrop();
  };
  // The shop has these very tapes already: keeping them once more would say nothing.
  const known =
    drop.reading?.suspect === true &&
    drop.reading.ties.length === read.ties.length &&
    drop.reading.ties.every((tie) => tie.distance.typed === posted[`tape.${tie.mark}`]);
  const again = (mark: string | null) => {
    const names = mark
      ? [`tape.${mark}`]
      : fields.filter((one) => one.name.startsWith("tape.")).map((one) => one.name);
    edit({
      ...Object.fromEntries(names.map((name) => [name, ""])),
      reason: mark ? `Tape ${mark} again` : "Taped again",
    });
    focusOn(names[0] ?? "");
  };
  const correct = ({ mark, typed, reason }: Correction) => {
    const corrected = { ...posted, [`tape.${mark}`]: typed, reason };
    void finish(known ? [corrected] : [posted, corrected], false);
  };
  const inHand = fields.find((one) => one.name === field) ?? null;
  const nextField = inHand
    ? fields.slice(fields.indexOf(inHand) + 1).find((one) => one.wanted && !draft[one.name]?.trim())
    : null;
  return (
    <>
      <div className="drop-hand-head">
        <h2>{spotLabel(drop)}</h2>
        {drop.side === "centre" || read.fit?.suspect ? null : (
          <MethodChoice method={method} pick={(to) => edit({ method: to })} />
        )}
        {read.fit?.suspect ? (
          <p className="font-label text-lg font-semibold text-oxide">
            the {COUNT[read.ties.length] ?? ""} tapes do not meet
          </p>
        ) : (
          <p className="w-full text-[15px] text-concrete-700">{point?.where}</p>
        )}
      </div>
      <EntryFields
        view={view}
        spot={drop}
        fields={fields}
        draft={draft}
        read={read}
        errors={refused?.fields ?? {}}
        inHand={field}
        padUp={pad.padUp}
        rootRef={root}
        change={edit}
        onHand={setField}
        onKeep={keepField}
      />
      {refused ? (
        <p role="alert" className="font-medium text-oxide">
          {refused.message}
        </p>
      ) : null}
      <ReadWords view={view} read={read} />
      {read.fit?.suspect ? (
        <Trouble fit={read.fit} unit={view.unit} busy={busy} again={again} correct={correct} />
      ) : null}
      {drop.reading && !known ? (
        <label className="grid gap-1 text-[15px] font-semibold text-concrete-700">
          Why it is taken again
          <input
            className="layout-reading"
            name="reason"
            maxLength={160}
            autoComplete="off"
            value={draft.reason ?? ""}
            onChange={(event) => change({ reason: event.target.value })}
          />
        </label>
      ) : null}
      <div className="flex flex-wrap gap-2.5">
        {known ? null : (
          <Button
            tone={read.fit?.suspect ? "plain" : "go"}
            size={read.fit?.suspect ? "l" : "xl"}
            className="flex-1 flex-col gap-1"
            busy={busy}
            disabled={!read.at || read.problem !== null}
            onClick={keepDrop}
          >
            {read.fit?.suspect ? "Keep as taped, to look at later" : "Keep this drop"}
            {read.fit?.suspect || !next ? null : (
              <span className="text-base font-medium">and go to {spotLabel(next)}</span>
            )}
          </Button>
        )}
        <Button size="l" tone="quiet" aria-pressed={pad.padUp} onClick={() => pad.setPad(!pad.padUp)}>
          {pad.padUp ? "Type on keys" : "Number pad"}
        </Button>
      </div>
      {inHand && pad.padUp ? (
        <EntryDock
          what={inHand.what}
          hint={point?.where}
          value={draft[inHand.name] ?? ""}
          onChange={(value) => edit({ [inHand.name]: value })}
          onKeep={keepField}
          unit={view.unit}
          next={nextField ? `and go to ${nextField.short}` : "and keep this drop"}
          busy={busy}
          padUp
          setPad={() => setField(null)}
        />
      ) : null}
    </>
  );
}

const COUNT: Record<number, string> = { 3: "three", 4: "four", 5: "five" };

function MethodChoice({ method, pick }: { method: Method; pick: (method: Method) => void }) {
  return (
    <div className="level-ways" role="group" aria-label="Measured by">
      {(["ties", "offset"] as const).map((id) => (
        <button key={id} type="button" aria-pressed={method === id} onClick={() => pick(id)}>
          {id === "ties" ? "Tape ties" : "Along and off"}
        </button>
      ))}
    </div>
  );
}

/** What the entry comes to: where it falls, how well, and what looks odd. */
function ReadWords({ view, read }: { view: LayoutView; read: EntryRead }) {
  const { unit } = view;
  const residual = read.fit?.checked
    ? mm(Math.max(...read.fit.residuals.map((one) => Math.abs(one.residual))))
    : null;
  const meets =
    residual === null || read.fit?.suspect ? null : `The tapes meet within ${withinLength(residual, unit)}.`;
  return (
    <div role="status" className="grid gap-1">
      {read.at && !read.fit?.suspect ? (
        <p className="text-[17px]">
          Falls <b className="font-semibold">{withUnit(read.at.x, unit)}</b> ahead of A,{" "}
          <b className="font-semibold">{offLine(read.at.y, unit)}</b>. {meets}
          {read.fit && !read.fit.checked ? <span className="text-brass-ink">{read.fit.advice}</span> : null}
        </p>
      ) : null}
      {read.problem ? <p className="font-medium text-oxide">{read.problem}</p> : null}
      {read.warning ? <p className="font-medium text-brass-ink">{read.warning}</p> : null}
    </div>
  );
}
