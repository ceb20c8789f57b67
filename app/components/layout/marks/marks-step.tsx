import { Link, useNavigate } from "react-router";
import type { LayoutView } from "../../../domain/layout/view";
import { mm } from "../../../domain/units/length";
import { buttonClass } from "../../../ui/button";
import { Verdict } from "../../../ui/verdict";
import { clock } from "../../time";
import { EntryDock } from "../entry-dock";
import { lengthIn, smallLength, withUnit } from "../lengths";
import type { May } from "../may";
import { ReadingField } from "../reading-field";
import { useDraft } from "../use-draft";
import { usePad } from "../use-pad";
import { usePost } from "../use-post";
import { MarksPlan } from "./marks-plan";

/** A to B taped against what the bay's marks were surveyed at: a wrong or worn tape shows here, before it costs anything. */
export function MarksStep({ view, may, done }: { view: LayoutView; may: May; done: () => void }) {
  const { bay, unit, settings, marks, shop } = view;
  const { draft, change, reset } = useDraft(`plumbay.layout.${view.id}.marks`, {
    taped: marks?.taped.typed ?? "",
  });
  const sending = usePost(done);
  const pad = usePad();
  const navigate = useNavigate();
  const [a, b] = ["A", "B"].map((label) => bay.marks.find((mark) => mark.label === label));
  const known = a && b ? mm(Math.hypot(a.x - b.x, a.y - b.y)) : null;
  const typed = lengthIn(draft.taped, unit);
  const dirty = (draft.taped ?? "").trim() !== (marks?.taped.typed ?? "");
  const off = dirty || !marks ? (typed !== null && known !== null ? mm(typed - known) : null) : marks.off;
  const fits = off !== null && Math.abs(off) <= settings.markTolerance;
  const keep = async () => {
    if (typed === null) return;
    const answer = await sending.send(`/layouts/${view.id}/marks`, { taped: (draft.taped ?? "").trim() });
    if (!answer?.ok) return;
    reset(draft);
    if (fits) void navigate(`/layouts/${view.id}/step/drops`);
  };
  const knownWords = known === null ? "" : withUnit(known, unit);
  return (
    <>
      {off === null ? (
        <Verdict
          tone="in-hand"
          sign="control-mark"
          size="l"
          title="Tape from mark A to mark B."
          detail={`The survey says ${knownWords}. Allowed ${smallLength(settings.markTolerance, unit)} either way.`}
          live
        />
      ) : (
        <Verdict
          tone={fits ? (dirty ? "in-hand" : "true") : "not-true"}
          sign={fits ? "control-mark" : "off"}
          size="l"
          title={
            fits
              ? `The tape agrees with the floor: ${agreeWords(off, unit)}.`
              : `${smallLength(off, unit)} ${off > 0 ? "longer" : "shorter"} than the survey. Not the same floor.`
          }
          detail={
            fits
              ? `Survey ${knownWords}. ${dirty || !marks ? "Not kept yet." : `Kept ${clock(marks.made.at, shop.timeZone)} by ${marks.made.name}.`}`
              : `Survey ${knownWords}. Hook on the nail, not the inch mark; pull straight; try the other tape.`
          }
          live
        />
      )}
      <div className="grid gap-4 p-4">
        <MarksPlan
          marks={bay.marks}
          spread={off === null ? knownWords : withUnit(typed ?? marks?.taped.mm ?? mm(0), unit)}
        />
        <div className="flex flex-wrap items-end gap-3">
          <div className="min-w-60 flex-1">
            <ReadingField
              label="Tape from A to B"
              name="taped"
              value={draft.taped ?? ""}
              onChange={(taped) => change({ taped })}
              onKeep={() => void keep()}
              padUp={pad.padUp}
              readOnly={!may.measure}
              error={sending.fields.taped ?? sending.trouble ?? undefined}
              size="l"
            />
          </div>
          {marks && !dirty ? (
            <Link to={`/layouts/${view.id}/step/drops`} className={`${buttonClass("go", "xl")} min-w-60`}>
              Go to Drops
            </Link>
          ) : null}
        </div>
      </div>
      {may.measure && (dirty || !marks) ? (
        <EntryDock
          what="Tape from A to B"
          hint={`survey ${knownWords}`}
          value={draft.taped ?? ""}
          onChange={(taped) => change({ taped })}
          onKeep={() => void keep()}
          unit={unit}
          next={fits ? "and go on to the drops" : "although it is off"}
          busy={sending.busy}
          {...pad}
        />
      ) : null}
    </>
  );
}

function agreeWords(off: ReturnType<typeof mm>, unit: LayoutView["unit"]): string {
  const words = smallLength(off, unit);
  return words.startsWith("under") ? "to the mark" : `${words} ${off > 0 ? "longer" : "shorter"}`;
}
