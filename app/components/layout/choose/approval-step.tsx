import { Link, useRevalidator } from "react-router";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import { formatDecimalInches } from "../../../domain/units/length";
import { Button, buttonClass } from "../../../ui/button";
import { Inches } from "../../../ui/length";
import { Sign, type SignName } from "../../../ui/sign";
import { Verdict } from "../../../ui/verdict";
import { clock, dayAndDate } from "../../time";
import { SideView } from "../drawings/side-view";
import type { May } from "../may";
import { usePost } from "../use-post";
import { Cautions } from "./cautions";
import { inHandDetail, shortName } from "./option-words";

/** What will be marked, whether its ground stands, and the foreman's signature. */
export function ApprovalStep({ view, may }: { view: LayoutView; may: May }) {
  const { revalidate } = useRevalidator();
  const sending = usePost(() => void revalidate());
  const option = view.options?.find((one) => one.key === view.choice?.key) ?? null;
  const approved = view.approval?.state === "approved";
  const when = (at: string) => `${dayAndDate(at, view.shop.timeZone)} ${clock(at, view.shop.timeZone)}`;
  return (
    <div className="grid gap-4 p-4 xl:grid-cols-2">
      <section aria-label="Approval" className="grid content-start gap-4">
        <State view={view} when={when} />
        {option ? (
          <>
            <dl className="grid grid-cols-2 gap-3 md:grid-cols-3">
              <Figure label="Axle line, ahead of the rear pair">
                <Inches mm={option.axleStation} /> in
              </Figure>
              <Figure label={`Hole ${option.hole.number}, ahead of the rear pair`}>
                <Inches mm={option.hole.station} /> in
              </Figure>
              <Figure label="Hole to axle line, flat">
                <Inches mm={option.half} /> in
              </Figure>
              <Figure label="From the opening's centre">
                <Inches mm={option.shift} signed /> in
              </Figure>
              {option.approach === null ? null : (
                <Figure label="Approach">{formatDegrees(option.approach)}</Figure>
              )}
              {option.wheelbase === null ? null : (
                <Figure label="Wheelbase">
                  <Inches mm={option.wheelbase} /> in
                </Figure>
              )}
            </dl>
            <p className="text-concrete-700">
              {shortName(option)}. {inHandDetail(option)} ± {formatDecimalInches(option.plusMinus)} in (k =
              2).
            </p>
          </>
        ) : null}
        <Ground view={view} when={when} />
        {approved ? (
          <>
            <Link className={buttonClass("go", "xl")} to={`/layouts/${view.id}/sheet`}>
              Layout sheet {view.approval?.sheetRevision}
            </Link>
            <Link className={buttonClass("plain", "l")} to={`/layouts/${view.id}/step/tack`}>
              Tacked: go to Tack and square
            </Link>
          </>
        ) : option && may.approve ? (
          <Button
            tone="go"
            size="xl"
            busy={sending.busy}
            onClick={() => sending.send(`/layouts/${view.id}/approve`, { key: option.key })}
          >
            Approve {formatDecimalInches(option.axleStation)}, hole {option.hole.number}
          </Button>
        ) : option ? (
          <Verdict
            tone="waiting"
            sign="question"
            title="Waiting for the foreman."
            detail="Nothing is welded before it is signed."
          />
        ) : null}
        {sending.trouble ? <Verdict tone="not-true" sign="off" title={sending.trouble} live /> : null}
        <Cautions step="approval" />
      </section>
      {option ? (
        <div className="h-80 xl:h-[32rem]">
          <SideView view={view} optionKey={option.key} />
        </div>
      ) : null}
    </div>
  );
}

function Figure({ label, children }: { label: string; children: React.ReactNode }) {
  return (
    <div className="rounded border border-concrete-300 bg-chalk px-4 py-3">
      <dt className="text-sm text-concrete-500">{label}</dt>
      <dd className="text-3xl font-semibold">{children}</dd>
    </div>
  );
}

function State({ view, when }: { view: LayoutView; when: (at: string) => string }) {
  const { approval, choice } = view;
  if (approval?.state === "approved")
    return (
      <Verdict
        tone="approved"
        sign="approve"
        size="l"
        title={`Approved: sheet ${approval.sheetRevision}.`}
        detail={`${approval.made.name}, ${when(approval.made.at)}. Mark from this sheet only, and scan it before you mark.`}
      />
    );
  if (approval?.state === "void")
    return (
      <Verdict
        tone="void"
        sign="void"
        size="l"
        title={`Approval void: ${approval.voided?.reason ?? "a number changed"}.`}
        detail={`${approval.made.name} signed sheet ${approval.sheetRevision} on ${when(approval.made.at)}. Mark nothing from it. ${choice ? "It has to be signed again." : "Put an option in hand again."}`}
        live
      />
    );
  return (
    <Verdict
      tone="in-hand"
      sign="approve"
      size="l"
      title="Look once more, then sign."
      detail="The signature makes the sheet that is marked from."
    />
  );
}

/** What the signature stands on. */
function Ground({ view, when }: { view: LayoutView; when: (at: string) => string }) {
  const { level } = view;
  const kept = view.drops.filter((drop) => drop.reading?.stands);
  const unchecked = kept.filter((drop) => drop.reading?.checked === false);
  const rows: { sign: SignName; good: boolean; words: string }[] = [
    {
      sign: level?.state === "true" ? "level" : "not-level",
      good: level?.state === "true",
      words: level
        ? `Level ${level.state === "true" ? "stands" : level.state === "void" ? "is void" : "is not true"}: read ${when(level.made.at)} by ${level.made.name}.`
        : "No level.",
    },
    {
      sign: "drop",
      good: kept.length > 0,
      words:
        kept.length === 0
          ? "No drop stands."
          : `${kept.length} drops by ${[...new Set(kept.map((drop) => drop.reading?.made.name))].join(", ")}.`,
    },
  ];
  if (unchecked.length > 0)
    rows.push({
      sign: "question",
      good: false,
      words: `Nothing checks ${unchecked.map((drop) => drop.label.toLowerCase()).join(", ")}: two tapes only.`,
    });
  return (
    <ul aria-label="What it stands on" className="grid gap-2">
      {rows.map(({ sign, good, words }) => (
        <li
          key={words}
          className={`flex items-center gap-3 font-medium ${good ? "text-moss" : "text-oxide"}`}
        >
          <Sign name={sign} size={24} />
          <span className="text-ink">{words}</span>
        </li>
      ))}
    </ul>
  );
}
