import { Link } from "react-router";
import { VEHICLE_KIND } from "../../domain/builds/vehicle-kinds";
import { isWelded } from "../../domain/layout/steps";
import type { LayoutView } from "../../domain/layout/view";
import type { LiveStatus } from "../../realtime/live-status";
import { Sign, type SignName } from "../../ui/sign";
import { Stencil } from "../../ui/stencil";
import { Tape } from "../../ui/tape";
import { ageInWords, whenInWords } from "../time";
import { factsOf } from "./facts";
import { levelWords } from "./level-words";
import { unsentWords } from "./unsent";
import type { Outbox } from "./use-unsent";

/** A number of upright strokes only: a bridge down the middle would take it away. */
const STROKES = /^1+$/;

type Props = { view: LayoutView; person: string; now: number; live: LiveStatus; outbox: Outbox };

/** Whose layout this is, how the level stands, and whether everything typed has reached the shop. */
export function LayoutHead({ view, person, now, live, outbox }: Props) {
  const { vehicle, bay, fixedEye } = view;
  return (
    <section className="layout-head" aria-label="This layout">
      <div className="layout-bay">
        <span className="sr-only">Bay</span>
        <Stencil n={bay.number} size={40} cut={STROKES.test(String(bay.number)) ? "h" : "v"} />
      </div>
      <div className="min-w-0 py-1.5">
        <h1 className="flex items-baseline gap-2.5">
          <Tape name={vehicle.nickname} code={vehicle.code} size="m" />
          <span className="hidden truncate text-concrete-700 sm:inline">
            {VEHICLE_KIND[vehicle.kind].label.toLowerCase()}
          </span>
        </h1>
        <p className="truncate font-label text-[15px] text-concrete-700">
          Front end, fixed eye {fixedEye} · {person} ·{" "}
          <Link className="text-line underline" to={`/layouts/${view.id}/history`}>
            History
          </Link>
        </p>
      </div>
      <div className="layout-facts">
        <LevelFact view={view} now={now} />
        <SentFact view={view} live={live} outbox={outbox} />
      </div>
    </section>
  );
}

function Fact({ sign, tone, children }: { sign: SignName; tone: string; children: React.ReactNode }) {
  return (
    <p className="flex min-w-0 items-center gap-2 font-label text-[15px] leading-[1.15] text-concrete-700">
      <Sign name={sign} size={22} className={`shrink-0 ${tone}`} />
      <span className="min-w-0">{children}</span>
    </p>
  );
}

function LevelFact({ view, now }: { view: LayoutView; now: number }) {
  const { level, shop, standsInBay, bay } = view;
  if (isWelded(factsOf(view)))
    return (
      <Fact sign="welded" tone="text-moss">
        <b className="font-semibold text-moss">Welded as signed</b>
        <br />
        nothing hangs on the level now
      </Fact>
    );
  if (!standsInBay)
    return (
      <Fact sign="void" tone="text-oxide">
        <b className="font-semibold text-oxide">Not in Bay {bay.number}</b>
        <br />
        the level does not stand
      </Fact>
    );
  const at = level?.voided?.made.at ?? level?.made.at;
  const by = (level?.voided?.made ?? level?.made)?.name.split(" ")[0];
  const isTrue = level?.state === "true";
  return (
    <Fact
      sign={isTrue ? "level" : level?.state === "void" ? "void" : "not-level"}
      tone={isTrue ? "text-moss" : "text-oxide"}
    >
      <b className={`line-clamp-1 font-semibold ${isTrue ? "text-moss" : level ? "text-oxide" : ""}`}>
        {levelWords(level)}
      </b>
      {at ? (
        <>
          {level?.voided ? "since" : "read"} {whenInWords(at, new Date(now), shop.timeZone)},{" "}
          {ageInWords(at, new Date(now))} ago
          {by ? `, ${by}` : ""}
        </>
      ) : (
        "level it before anything is dropped"
      )}
    </Fact>
  );
}

function SentFact({ view, live, outbox }: { view: LayoutView; live: LiveStatus; outbox: Outbox }) {
  const waiting = unsentWords(outbox.list);
  const refused = outbox.list.filter((one) => one.refused !== null).length;
  const heard =
    live.lastHeard === null ? null : whenInWords(new Date(live.lastHeard), new Date(), view.shop.timeZone);
  if (waiting)
    return (
      <div role="status" className="flex items-center gap-2">
        <Fact sign="unsent" tone="text-brass-ink">
          <b className="font-semibold text-brass-ink">{waiting}</b>
          <br />
          {live.state === "not-live" ? "no signal; keep on measuring" : "sending"}
        </Fact>
        <button type="button" className="layout-quiet" onClick={outbox.retry}>
          Send now
        </button>
      </div>
    );
  return (
    <div role="status">
      <Fact
        sign={live.state === "not-live" ? "unsent" : "sent"}
        tone={live.state === "not-live" ? "text-brass-ink" : "text-moss"}
      >
        {refused > 0 ? (
          <b className="text-oxide">{refused} not taken</b>
        ) : (
          <b className="font-semibold">All sent</b>
        )}
        <br />
        {live.state === "live"
          ? "live"
          : live.state === "joining"
            ? "joining"
            : heard
              ? `no signal since ${heard}`
              : "no signal"}
      </Fact>
    </div>
  );
}
