import { type RefObject, useMemo, useRef, useState } from "react";
import { Link } from "react-router";
import type { DropPointId, DropSide } from "../../../domain/layout/drops";
import type { DropView, LayoutView } from "../../../domain/layout/view";
import { Button, buttonClass } from "../../../ui/button";
import { Verdict } from "../../../ui/verdict";
import { FloorPlan } from "../drawings/floor-plan";
import { smallLength } from "../lengths";
import type { May } from "../may";
import { ShutStep } from "../shut-step";
import { unsentOf } from "../unsent";
import { usePad } from "../use-pad";
import type { Outbox } from "../use-unsent";
import { nextSpot, type Spot, sameSpot, spotLabel, subjectOf } from "./cells";
import { DropEntry } from "./drop-hand";
import { DropKept } from "./drop-kept";
import { DropList } from "./drop-list";
import type { EntryRead, Method } from "./entry-read";

type Props = { view: LayoutView; may: May; outbox: Outbox; shut: string | null };

/** Points carried to the floor: the list, the plan, and the one in hand. */
export function DropsStep({ view, may, outbox, shut }: Props) {
  const redrop = view.level?.redrop.state === "wanted";
  const [picked, setPicked] = useState<Spot | null>(() => nextSpot(view.drops, [], redrop));
  const [again, setAgain] = useState(false);
  const [field, setField] = useState<string | null>(null);
  const [read, setRead] = useState<EntryRead | null>(null);
  const pad = usePad();
  const drop = view.drops.find((one) => sameSpot(one, picked)) ?? null;
  const next = nextSpot(view.drops, outbox.list, redrop && !drop, picked);
  const goesOn = useRef(false);
  const pick = (spot: Spot | null) => {
    // Typing on the pad goes on with the next drop: no tap in between.
    goesOn.current = field !== null && pad.padUp;
    setPicked(spot);
    setAgain(false);
    setField(null);
    setRead(null);
  };
  const needed =
    !shut &&
    !redrop &&
    view.drops.every((one) => !one.needed || (one.reading?.stands && !one.reading.suspect));
  const typing = field !== null && pad.padUp;
  const preview = useMemo(
    () =>
      read?.at
        ? { at: read.at, ties: read.ties.map((tie) => tie.mark), suspect: read.fit?.suspect ?? false }
        : undefined,
    [read],
  );
  return (
    <div className="drops" data-typing={typing}>
      <DropList view={view} unsent={outbox.list} inHand={shut ? null : picked} onPick={pick} />
      <div className="drops-plan">
        <FloorPlan
          view={view}
          inHand={picked && !shut ? picked : undefined}
          onPick={(point: DropPointId, side: DropSide) => pick({ point, side })}
          previewReading={preview}
          compact={typing}
        />
      </div>
      <section className="drops-hand" aria-label="Drop in hand">
        {needed && drop ? (
          <Link to={`/layouts/${view.id}/step/axle-line`} className={buttonClass("go", "l")}>
            All that is needed is kept: go to Axle line
          </Link>
        ) : null}
        {shut ? (
          <ShutStep view={view} step="drops" why={shut} />
        ) : drop && may.measure ? (
          <Hand
            key={subjectOf(drop)}
            {...{
              view,
              drop,
              outbox,
              next,
              pad,
              field,
              setField,
              goesOn,
              again,
              setAgain,
              onRead: setRead,
              pick,
            }}
          />
        ) : drop?.reading ? (
          <DropKept view={view} drop={drop} again={null} goOn={null} />
        ) : drop ? (
          <Verdict tone="empty" sign="drop" title={`${spotLabel(drop)} is not dropped yet.`} />
        ) : (
          <AllKept view={view} />
        )}
      </section>
    </div>
  );
}

type HandProps = {
  view: LayoutView;
  drop: DropView;
  outbox: Outbox;
  next: Spot | null;
  pad: ReturnType<typeof usePad>;
  field: string | null;
  setField: (name: string | null) => void;
  goesOn: RefObject<boolean>;
  again: boolean;
  setAgain: (again: boolean) => void;
  onRead: (read: EntryRead) => void;
  pick: (spot: Spot | null) => void;
};

function Hand({ view, drop, outbox, next, again, setAgain, pick, ...rest }: HandProps) {
  // While it is being sent from here the entry stays: a refusal is said beside its fields.
  const [sending, setSending] = useState(false);
  const mine = sending ? null : unsentOf(outbox.list, subjectOf(drop));
  const { reading } = drop;
  if (mine && !again)
    return (
      <>
        <Verdict
          tone={mine.refused ? "not-true" : "unsent"}
          sign={mine.refused ? "off" : "unsent"}
          title={`${spotLabel(drop)}: ${mine.refused ? "not taken." : "kept here, not sent."}`}
          detail={
            mine.refused ?? `Read by ${mine.by}. It goes to the shop with the next signal; keep on measuring.`
          }
          live
        />
        <div className="flex flex-wrap gap-2.5">
          {next ? (
            <Button tone="go" size="l" className="flex-1" onClick={() => pick(next)}>
              Next drop
            </Button>
          ) : null}
          {mine.refused ? (
            <Button size="l" onClick={() => outbox.letGo(mine.clientKey)}>
              Let it go
            </Button>
          ) : (
            <Button size="l" onClick={outbox.retry}>
              Send now
            </Button>
          )}
        </div>
      </>
    );
  if (reading?.stands && !reading.suspect && !again)
    return (
      <DropKept view={view} drop={drop} again={() => setAgain(true)} goOn={next ? () => pick(next) : null} />
    );
  return (
    <>
      <RedropWords view={view} drop={drop} />
      <DropEntry
        key={`${reading?.id ?? 0}`}
        view={view}
        drop={drop}
        outbox={outbox}
        usual={usualMethod(view)}
        next={next}
        onKept={() => pick(next)}
        onSending={setSending}
        {...rest}
      />
    </>
  );
}

/** As most of this layout was measured. */
function usualMethod(view: LayoutView): Method {
  const newest = view.drops
    .flatMap((drop) => drop.reading ?? [])
    .sort((a, b) => b.made.at.localeCompare(a.made.at))[0];
  return newest?.method ?? "ties";
}

function RedropWords({ view, drop }: { view: LayoutView; drop: DropView }) {
  if (view.level?.redrop.state !== "wanted" || !drop.reading || drop.reading.stands) return null;
  return (
    <Verdict
      tone="waiting"
      sign="drop"
      title={`Drop ${spotLabel(drop)} again, under the new level.`}
      detail={`Within ${smallLength(view.settings.redropTolerance, view.unit)} of where it was, the old drops stand. Otherwise all are dropped again.`}
    />
  );
}

function AllKept({ view }: { view: LayoutView }) {
  return (
    <>
      <Verdict
        tone="true"
        sign="drop"
        size="l"
        title="Every drop is kept."
        detail="Pick one to see its reading, or to drop it again."
      />
      <Link to={`/layouts/${view.id}/step/axle-line`} className={buttonClass("go", "xl")}>
        Go to Axle line
      </Link>
    </>
  );
}
