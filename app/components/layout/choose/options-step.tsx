import { useMemo, useState } from "react";
import { Link, useRevalidator } from "react-router";
import type { Option } from "../../../domain/layout/options";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDecimalInches } from "../../../domain/units/length";
import { Button, buttonClass } from "../../../ui/button";
import { Sign } from "../../../ui/sign";
import { Verdict } from "../../../ui/verdict";
import { SideView } from "../drawings/side-view";
import type { May } from "../may";
import { usePost } from "../use-post";
import { Cautions } from "./cautions";
import { OptionTable, type SortBy, sortOptions } from "./option-table";
import { compareWords, inHandDetail, shortName } from "./option-words";

/** Springs of the rack in the hanger's holes: what each gives, and the one to put in hand. */
export function OptionsStep({ view, may }: { view: LayoutView; may: May }) {
  const { revalidate } = useRevalidator();
  const sending = usePost(() => void revalidate());
  const options = view.options ?? [];
  const chosen = options.find((option) => option.key === view.choice?.key) ?? null;
  const [lookedAt, setLookedAt] = useState<string | null>(null);
  const [pinned, setPinned] = useState<string | null>(null);
  const [sort, setSort] = useState<SortBy>("spring");
  const [standing, setStanding] = useState(false);
  const shown = useMemo(
    () => sortOptions(standing ? options.filter((option) => option.stands) : options, sort),
    [options, standing, sort],
  );
  const looked =
    options.find((option) => option.key === lookedAt) ??
    chosen ??
    options.find((option) => option.stands) ??
    null;
  const other = options.find((option) => option.key === pinned) ?? null;
  if (!view.options)
    return (
      <Verdict
        tone="empty"
        sign="spring-flat"
        title="There are no options yet."
        detail={view.missing.join(" ")}
      />
    );
  const stand = options.filter((option) => option.stands && option.unknown.length === 0).length;
  const unknown = options.filter((option) => option.stands && option.unknown.length > 0).length;
  const approachKnown = options.some((option) => option.approach !== null);
  const after = view.steps.find((step) => step.id === view.next && step.id !== "options") ??
    view.steps.find((step) => step.id === "second-look") ?? { id: "second-look", label: "Second look" };
  const put = (option: Option) => sending.send(`/layouts/${view.id}/option`, { key: option.key });
  return (
    <div className="grid min-h-0 grid-cols-[minmax(0,1fr)] xl:grid-cols-[minmax(0,1fr)_minmax(26rem,34rem)]">
      <section aria-label="Options" className="order-2 grid min-w-0 content-start xl:order-1">
        <Head view={view} chosen={chosen} />
        <div className="flex flex-wrap items-center gap-2 border-b-2 border-ink bg-chalk px-4 py-3">
          <span className="font-label font-semibold">Asked for</span>
          <span className="inline-flex min-h-11 items-center gap-2 rounded border border-paint-edge px-3 font-medium">
            <Sign
              name={view.asked.approachAtLeast === null ? "leave" : approachKnown ? "finish" : "question"}
              size={18}
              className={
                view.asked.approachAtLeast === null
                  ? "text-concrete-500"
                  : approachKnown
                    ? "text-moss"
                    : "text-brass-ink"
              }
            />
            {view.asked.approachAtLeast === null
              ? "No approach angle asked for"
              : `Approach ${view.asked.approachAtLeast}° or more${approachKnown ? "" : ": not known yet"}`}
          </span>
          <label className="inline-flex min-h-11 items-center gap-2 rounded border border-paint-edge px-3 font-medium">
            <input
              type="checkbox"
              className="size-5 accent-(--brass-ink)"
              checked={standing}
              onChange={(event) => setStanding(event.target.checked)}
            />
            Only those that stand
          </label>
          <span className="ml-auto font-label font-semibold">
            {stand} of {options.length} stand{unknown > 0 ? `, ${unknown} not known` : ""}
          </span>
        </div>
        <OptionTable
          view={view}
          options={shown}
          inHand={chosen?.key ?? null}
          looked={looked?.key ?? null}
          pinned={pinned}
          sort={sort}
          onSort={setSort}
          onLook={setLookedAt}
          onPin={(key) => setPinned(key === pinned ? null : key)}
        />
        <p className="px-4 py-3 text-sm text-concrete-700">
          Inches ahead of the rear datum pair, at full compression with the spring flat. ± is k = 2: tape, bob
          and spring together. Springs measured flat on the bench.{" "}
          {options.some((option) => option.frontRoom)
            ? "Lip heights were not measured: room is the plan reach of the whole tyre, which is pessimistic."
            : ""}
        </p>
        {view.missing.length > 0 ? (
          <p className="px-4 pb-3 text-sm text-concrete-700">
            Not known: {view.missing.join(" ")}{" "}
            <Link className="font-medium text-line underline" to={`/builds/${view.vehicle.buildId}/asked`}>
              Put right what was given at booking in
            </Link>
          </p>
        ) : null}
      </section>
      <aside
        aria-label="The option looked at"
        className="order-1 grid content-start border-b border-concrete-300 bg-concrete-100 xl:order-2 xl:border-b-0 xl:border-l"
      >
        {looked ? (
          <>
            <div className="h-80">
              <SideView
                view={view}
                optionKey={looked.key}
                pinnedKey={other && other.key !== looked.key ? other.key : null}
              />
            </div>
            <div className="grid gap-3 border-t border-concrete-300 bg-chalk p-4">
              <h2 className="text-lg font-semibold">
                {shortName(looked)}: {formatDecimalInches(looked.axleStation)}
              </h2>
              <p className="text-concrete-700">{inHandDetail(looked)}</p>
              {looked.reasons.map((reason) => (
                <p key={reason} className="flex items-center gap-2 font-medium text-oxide">
                  <Sign name="off" size={20} />
                  {reason}
                </p>
              ))}
              {other && other.key !== looked.key ? (
                <ul aria-label="Compared" className="grid gap-1">
                  {compareWords(looked, other, view.unit).map(({ same, words }) => (
                    <li key={words} className="flex items-center gap-2">
                      <Sign name={same ? "same" : "turn"} size={20} />
                      {words}
                    </li>
                  ))}
                </ul>
              ) : null}
              {may.measure ? (
                <div className="flex flex-wrap gap-3">
                  <Button
                    tone="go"
                    size="l"
                    className="flex-1"
                    busy={sending.busy}
                    disabled={!looked.stands || looked.key === chosen?.key}
                    onClick={() => put(looked)}
                  >
                    {looked.key === chosen?.key
                      ? "In hand"
                      : `Put in hand: ${formatDecimalInches(looked.axleStation)}, hole ${looked.hole.number}`}
                  </Button>
                  {chosen ? (
                    <Link className={buttonClass("plain", "l")} to={`/layouts/${view.id}/step/${after.id}`}>
                      Go to {after.label}
                    </Link>
                  ) : null}
                </div>
              ) : null}
              {sending.trouble ? <Verdict tone="not-true" sign="off" title={sending.trouble} live /> : null}
              <Cautions step="options" />
            </div>
          </>
        ) : (
          <p className="p-4">No option meets what was asked for. The reasons stand in the table.</p>
        )}
      </aside>
    </div>
  );
}

function Head({ view, chosen }: { view: LayoutView; chosen: Option | null }) {
  if (chosen && view.choice?.changed)
    return (
      <Verdict
        tone="not-true"
        sign="off"
        title="The numbers under the option in hand have changed."
        detail="Look again, and put one in hand."
        size="l"
        live
      />
    );
  if (chosen)
    return (
      <Verdict
        tone="in-hand"
        sign="pin"
        title={`In hand: ${shortName(chosen)}. Axle line ${formatDecimalInches(chosen.axleStation)}.`}
        detail={inHandDetail(chosen)}
        size="l"
      />
    );
  return (
    <Verdict
      tone="empty"
      sign="spring-flat"
      title="Nothing is in hand yet."
      detail={
        view.axle
          ? `The axle line lies at ${formatDecimalInches(view.axle.line.station)}. Look at a row, then put it in hand.`
          : undefined
      }
      size="l"
    />
  );
}
