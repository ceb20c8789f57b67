import { useState } from "react";
import { Link } from "react-router";
import type { LayoutView } from "../../../domain/layout/view";
import { Button, buttonClass } from "../../../ui/button";
import { LevelViews } from "../drawings/level-views";
import type { May } from "../may";
import { useDraft } from "../use-draft";
import { usePad } from "../use-pad";
import { usePost } from "../use-post";
import { gaugeNow, postedGauge } from "./gauge";
import { GaugeWay } from "./gauge-way";
import { extrasIn, firstTexts, heightsNow, placesOf, postedHeights } from "./heights";
import { HeightsWay } from "./heights-way";
import { LevelVerdict } from "./level-verdict";
import type { LevelWay } from "./level-way";
import { StandPlaces } from "./stand-places";
import { VoidLevel } from "./void-level";

type Props = { view: LayoutView; may: May; done: () => void };

const WAYS = [
  { id: "heights", label: "Heights at the stands" },
  { id: "gauge", label: "Angle gauge" },
] as const;

/** A new check, by whoever made it, begins the fields anew; what is typed meanwhile on this tablet stays. */
export function LevelStep(props: Props) {
  const { level } = props.view;
  return <LevelCheck key={`${level?.id ?? 0} ${level?.state ?? "none"}`} {...props} />;
}

function LevelCheck({ view, may, done }: Props) {
  const { level, unit, settings } = view;
  const first = firstTexts(level);
  const { draft, change, reset } = useDraft(`plumbay.layout.${view.id}.level`, first);
  const [extras, setExtras] = useState(() => extrasIn(Object.keys(first)));
  const way =
    draft.method === "gauge" || draft.method === "heights" ? draft.method : (level?.method ?? "heights");
  const pad = usePad();
  const sending = usePost(done);
  const places = placesOf(Math.max(extras, extrasIn(Object.keys(draft))));
  const heights = heightsNow(places, draft, unit, settings.shim);
  const gauge = gaugeNow(draft);
  const typed = way === "heights" ? heights.level : gauge;
  const posted = way === "heights" ? postedHeights(places, draft) : postedGauge(draft);
  const dirty =
    isDirty(posted, way === "heights" ? postedHeights(places, first) : postedGauge(first)) &&
    (way === "gauge" ? gauge !== null : true);
  const shown =
    dirty || level?.state === "void"
      ? typed
      : level && { noseHigh: level.noseHighDeg, rightHigh: level.rightHighDeg };
  const check = async () => {
    const answer = await sending.send(`/layouts/${view.id}/level`, posted);
    if (answer?.ok) reset(draft);
  };
  const readAgain = () =>
    change(
      Object.fromEntries(
        Object.keys(draft).flatMap((name) => (/^(height|first|turned)\./.test(name) ? [[name, ""]] : [])),
      ),
    );
  const props: LevelWay = {
    view,
    draft,
    change,
    fields: sending.fields,
    readOnly: !may.measure,
    busy: sending.busy,
    check: () => void check(),
    pad,
  };
  const isTrue = level?.state === "true" && !dirty;
  return (
    <>
      <div className="level-verdict">
        <LevelVerdict
          view={view}
          typed={typed}
          dirty={dirty}
          missing={way === "heights" ? heights.missing : null}
          allowed={settings.allowedSlopeDeg}
        />
      </div>
      <div className="level-ways" role="group" aria-label="Read with">
        {WAYS.map(({ id, label }) => (
          <button key={id} type="button" aria-pressed={way === id} onClick={() => change({ method: id })}>
            {label}
          </button>
        ))}
        <p className="ml-auto font-label text-[15px] text-concrete-700">
          {view.levelRounds === 0
            ? "First round"
            : `${level?.state === "void" || dirty ? "After round" : "Round"} ${view.levelRounds}`}
        </p>
      </div>
      <div className="level-main">
        {way === "heights" ? (
          <HeightsWay {...props} places={places} now={heights} />
        ) : (
          <GaugeWay {...props} now={gauge} />
        )}
        {shown ? (
          <LevelViews
            noseHighDeg={shown.noseHigh}
            rightHighDeg={shown.rightHigh}
            allowedDeg={level?.allowedDeg ?? settings.allowedSlopeDeg}
          />
        ) : null}
      </div>
      <div className="level-acts">
        {sending.trouble ? (
          <p role="alert" className="w-full font-medium text-oxide">
            {sending.trouble}
          </p>
        ) : null}
        {may.measure && (dirty || !level || level.state === "void") ? (
          <Button
            tone={typed ? "go" : "plain"}
            size="l"
            busy={sending.busy}
            disabled={!typed}
            onClick={props.check}
          >
            Check level
          </Button>
        ) : null}
        {isTrue ? <NextAfter view={view} /> : null}
        {may.measure && level && level.state !== "void" ? (
          dirty ? (
            <Button size="l" onClick={() => reset(first)}>
              Back to the last reading
            </Button>
          ) : (
            <Button tone={level.state === "not-true" ? "go" : "plain"} size="l" onClick={readAgain}>
              Read again
            </Button>
          )
        ) : null}
        {may.measure && level?.state === "true" ? (
          <VoidLevel
            layoutId={view.id}
            dropsKept={view.drops.filter((drop) => drop.reading?.stands).length}
            done={done}
          />
        ) : null}
      </div>
      {way === "heights" ? (
        <StandPlaces
          places={places}
          draft={draft}
          openAtFirst={heights.missing?.startsWith("Say where") ?? false}
          readOnly={!may.measure}
          fields={sending.fields}
          change={change}
          addStand={may.measure ? () => setExtras(extras + 1) : null}
        />
      ) : null}
    </>
  );
}

/** Do the posted fields differ from what the shop has? */
function isDirty(now: Record<string, string>, before: Record<string, string>): boolean {
  const names = new Set([...Object.keys(now), ...Object.keys(before)]);
  return [...names].some((name) => (now[name] ?? "") !== (before[name] ?? ""));
}

function NextAfter({ view }: { view: LayoutView }) {
  const redrop = view.level?.redrop.state === "wanted";
  const next =
    redrop || view.marks
      ? { id: "drops", label: redrop ? "Drop one old point again" : "Go to Drops" }
      : { id: "marks", label: "Go to Control marks" };
  return (
    <Link to={`/layouts/${view.id}/step/${next.id}`} className={buttonClass("go", "l")}>
      {next.label}
    </Link>
  );
}
