import { useRef, useState } from "react";
import type { LayoutView } from "../../../domain/layout/view";
import { Button } from "../../../ui/button";
import { EntryDock } from "../entry-dock";
import { lengthIn } from "../lengths";
import { newKey } from "../new-key";
import { ReadingField } from "../reading-field";
import type { Draft } from "../use-draft";
import { usePad } from "../use-pad";
import { usePost } from "../use-post";

const FIELDS = [
  { name: "leftStation", end: "Left end", what: "Ahead of A", hint: "along the line" },
  { name: "leftOffset", end: "Left end", what: "Off the line", hint: "to the left" },
  { name: "rightStation", end: "Right end", what: "Ahead of A", hint: "along the line" },
  { name: "rightOffset", end: "Right end", what: "Off the line", hint: "to the right" },
] as const;
type Name = (typeof FIELDS)[number]["name"];

type Props = {
  view: LayoutView;
  draft: Draft;
  change: (changes: Draft) => void;
  /** Why what is typed cannot be so; null when nothing is wrong. */
  problem: string | null;
  kept: (words: string) => void;
};

/** Along and off the line at both hub faces, as typed from the tape; Enter and the pad go on to the next that is empty. */
export function TackEntry({ view, draft, change, problem, kept }: Props) {
  const sending = usePost(() => {});
  const pad = usePad();
  const [inHand, setInHand] = useState<Name | null>(null);
  const form = useRef<HTMLDivElement>(null);
  const key = useRef<string | null>(null);
  const isRead = (name: Name) => lengthIn(draft[name], view.unit) !== null;
  const ready = FIELDS.every(({ name }) => isRead(name)) && problem === null;
  const next = (from: Name) => FIELDS.find(({ name }) => name !== from && !isRead(name)) ?? null;

  const keep = async () => {
    if (!ready) return;
    key.current ??= newKey();
    const answer = await sending.send(`/layouts/${view.id}/tack`, {
      ...Object.fromEntries(FIELDS.map(({ name }) => [name, (draft[name] ?? "").trim()])),
      sheet: String(view.approval?.sheetRevision ?? ""),
      clientKey: key.current,
    });
    if (!answer) return;
    key.current = null;
    if (!answer.ok) return;
    setInHand(null);
    kept(typeof answer.words === "string" ? answer.words : "");
  };
  const goOn = (from: Name) => {
    const to = next(from);
    if (to) form.current?.querySelector<HTMLInputElement>(`[name=${to.name}]`)?.focus();
    else void keep();
  };
  const held = FIELDS.find(({ name }) => name === inHand);
  const trouble = problem ?? sending.fields.form ?? sending.trouble;
  return (
    <div className="grid gap-3" ref={form}>
      {(["Left end", "Right end"] as const).map((end) => (
        <fieldset key={end} className="tack-end">
          <legend>{end}, middle of the hub face</legend>
          {FIELDS.filter((field) => field.end === end).map(({ name, what, hint }) => (
            <ReadingField
              key={name}
              label={what}
              quietLabel={end}
              name={name}
              value={draft[name] ?? ""}
              onChange={(value) => change({ [name]: value })}
              onHand={() => setInHand(name)}
              onKeep={() => goOn(name)}
              padUp={pad.padUp}
              error={sending.fields[name]}
              hint={hint}
              size="l"
            />
          ))}
        </fieldset>
      ))}
      {trouble ? (
        <p role="alert" className="font-medium text-oxide">
          {trouble}
        </p>
      ) : null}
      <Button tone="go" size="xl" busy={sending.busy} disabled={!ready} onClick={() => void keep()}>
        Keep this check
      </Button>
      {held && pad.padUp ? (
        <EntryDock
          what={`${held.end}: ${small(held.what)}`}
          hint={held.hint}
          value={draft[held.name] ?? ""}
          onChange={(value) => change({ [held.name]: value })}
          onKeep={() => goOn(held.name)}
          unit={view.unit}
          next={nextWords(next(held.name))}
          busy={sending.busy}
          {...pad}
        />
      ) : null}
    </div>
  );
}

/** Within a sentence; mark A keeps its capital. */
const small = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);

const nextWords = (to: (typeof FIELDS)[number] | null): string =>
  to ? `and go to ${small(to.end)}, ${small(to.what)}` : "and keep the check";
