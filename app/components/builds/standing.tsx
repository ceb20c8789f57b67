import { useEffect } from "react";
import { Link, useFetcher, useNavigate } from "react-router";
import { HOLD_LABEL, type HoldKind } from "../../domain/builds/stages";
import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import type { BoardLevel } from "../../domain/floor/board";
import { Button, buttonClass } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { ageInWords, whenInWords } from "../time";
import type { BuildPageProps } from "./build-view";

/** Where the vehicle stands and since when, what holds it, and its layout. */
export function Standing(props: BuildPageProps) {
  const { build, standing, bay, now, timeZone } = props;
  if (!standing)
    return (
      <section aria-label="Where it stands">
        <p className="font-label font-semibold text-3xl">
          {build.leftAt ? `Left ${whenInWords(build.leftAt, now, timeZone)}` : "It stands nowhere"}
        </p>
      </section>
    );
  return (
    <section aria-label="Where it stands" className="grid gap-4">
      <div>
        <p className="label">Stands</p>
        <p className="font-label font-semibold text-3xl leading-tight">
          {bay ? `Bay ${bay.number}, ${BAY_KIND_LABEL[bay.kind].toLowerCase()}` : "In the yard"}
        </p>
        <p className="text-concrete-700">
          since {whenInWords(standing.since, now, timeZone)} ({ageInWords(standing.since, now)}), put there by{" "}
          {standing.movedBy}
        </p>
      </div>
      <Holds holds={props.holds} now={now} timeZone={timeZone} />
      <LevelLine level={standing.level} now={now} />
      <LayoutLink {...props} />
    </section>
  );
}

function Holds({ holds, now, timeZone }: Pick<BuildPageProps, "holds" | "now" | "timeZone">) {
  return holds.map((hold) => (
    <div key={hold.id} className="flex gap-3 border-oxide border-l-4 bg-oxide-wash px-4 py-3">
      <Sign name="hold" size={24} />
      <p>
        <b className="font-semibold text-oxide">On hold: {HOLD_LABEL[hold.kind as HoldKind].toLowerCase()}</b>
        <span className="block">{hold.words}</span>
        <span className="block text-[15px] text-concrete-700">
          {hold.placedBy}, {ageInWords(hold.placedAt, now)} ago
          {hold.dueAt ? `; due ${whenInWords(hold.dueAt, now, timeZone)}` : ""}
        </span>
      </p>
    </div>
  ));
}

function LevelLine({ level, now }: { level: BoardLevel; now: string }) {
  if (level.state === "none") return null;
  if (level.state === "void")
    return (
      <p className="flex items-center gap-2 font-medium text-oxide">
        <Sign name="void" size={20} /> Level void, {ageInWords(level.voidedAt, now)}: {level.reason}
      </p>
    );
  const isTrue = level.state === "true";
  return (
    <p className={`flex items-center gap-2 font-medium ${isTrue ? "text-moss" : "text-oxide"}`}>
      <Sign name={isTrue ? "level" : "not-level"} size={20} />
      {isTrue ? "Level true" : "Not level"}, checked {ageInWords(level.checkedAt, now)} ago; {level.drops}{" "}
      {level.drops === 1 ? "drop" : "drops"} kept
    </p>
  );
}

function LayoutLink({ build, standing, bay, mayMeasure }: BuildPageProps) {
  if (!standing) return null;
  if (standing.layoutId !== null)
    return (
      <p>
        <Link to={`/layouts/${standing.layoutId}`} className={buttonClass("go", "m")}>
          {mayMeasure ? "Go on with the layout" : "See the layout"}
        </Link>
      </p>
    );
  if (!mayMeasure) return <p className="text-concrete-700">No layout was started yet.</p>;
  if (!bay?.ratedForLayout)
    return (
      <p className="text-concrete-700">
        No layout yet: it starts when the vehicle stands in a bay whose floor is rated for it.
      </p>
    );
  return <StartLayout buildId={build.id} nickname={build.nickname} />;
}

type Started = { ok: true; layoutId: number } | { ok: false; message: string };

function StartLayout({ buildId, nickname }: { buildId: number; nickname: string }) {
  const fetcher = useFetcher<Started>();
  const navigate = useNavigate();
  const started = fetcher.data?.ok ? fetcher.data.layoutId : null;
  useEffect(() => {
    if (started !== null) void navigate(`/layouts/${started}`);
  }, [started, navigate]);
  return (
    <fetcher.Form
      method="post"
      action={`/builds/${buildId}/layout`}
      className="grid justify-items-start gap-2"
    >
      <input type="hidden" name="fixedEye" value="ahead" />
      <Button tone="go" size="m" type="submit" busy={fetcher.state !== "idle" || started !== null}>
        Start layout
      </Button>
      <p
        role="status"
        className={fetcher.data && !fetcher.data.ok ? "font-medium text-oxide" : "text-concrete-700"}
      >
        {fetcher.data && !fetcher.data.ok
          ? fetcher.data.message
          : `The front end of ${nickname}, fixed eye ahead of the axle.`}
      </p>
    </fetcher.Form>
  );
}
