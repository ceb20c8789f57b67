import { useRef, useState } from "react";
import type { LayoutView, LookView } from "../../../domain/layout/view";
import { Button } from "../../../ui/button";
import { EntryDock } from "../entry-dock";
import { lengthIn } from "../lengths";
import { newKey } from "../new-key";
import { ReadingField } from "../reading-field";
import { useDraft } from "../use-draft";
import { usePad } from "../use-pad";
import { usePost } from "../use-post";

const EMPTY = { station: "", offset: "" };
type Name = keyof typeof EMPTY;

/** Along the line and off it, as the second person reads it. */
export function LookEntry({ view, item, done }: { view: LayoutView; item: LookView; done: () => void }) {
  const { draft, change, reset } = useDraft(
    `plumbay.layout.${view.id}.look.${item.point}.${item.side}`,
    EMPTY,
  );
  const sending = usePost(done);
  const pad = usePad();
  const [inHand, setInHand] = useState<Name | null>(null);
  const key = useRef<string | null>(null);
  const read = (name: Name) => lengthIn(draft[name] ?? "", view.unit);
  const ready = read("station") !== null && read("offset") !== null;
  const keep = async () => {
    if (!ready) return;
    key.current ??= newKey();
    const answer = await sending.send(`/layouts/${view.id}/look`, {
      point: item.point,
      side: item.side,
      station: draft.station ?? "",
      offset: draft.offset ?? "",
      clientKey: key.current,
    });
    if (!answer) return;
    key.current = null;
    if (answer.ok) {
      reset(EMPTY);
      setInHand(null);
    }
  };
  const field = (name: Name, label: string, hint: string) => (
    <ReadingField
      label={label}
      quietLabel={item.label}
      name={name}
      value={draft[name] ?? ""}
      onChange={(value) => change({ [name]: value })}
      onHand={() => setInHand(name)}
      onKeep={() => void keep()}
      padUp={pad.padUp}
      error={sending.fields[name]}
      hint={hint}
      size="l"
    />
  );
  return (
    <div className="grid gap-3">
      <div className="look-fields">
        {field("station", "Ahead of A", "along the line")}
        {field("offset", "Off the line", `to the ${item.side}`)}
        <Button tone="go" size="xl" busy={sending.busy} disabled={!ready} onClick={() => void keep()}>
          Keep my reading
        </Button>
      </div>
      {sending.trouble ? (
        <p role="alert" className="font-medium text-oxide">
          {sending.trouble}
        </p>
      ) : null}
      {inHand && pad.padUp ? (
        <EntryDock
          what={`${item.label}: ${inHand === "station" ? "ahead of A" : "off the line"}`}
          value={draft[inHand] ?? ""}
          onChange={(value) => change({ [inHand]: value })}
          onKeep={() => {
            if (inHand === "station" && read("offset") === null) setInHand("offset");
            else void keep();
          }}
          unit={view.unit}
          next={inHand === "station" ? "and go to off the line" : null}
          busy={sending.busy}
          {...pad}
        />
      ) : null}
    </div>
  );
}
