import { useState } from "react";
import { Link } from "react-router";
import { isWelded } from "../../../domain/layout/steps";
import { burntInch, checkTack, type TackCheck } from "../../../domain/layout/tack-check";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDecimalInches } from "../../../domain/units/length";
import { Button, buttonClass } from "../../../ui/button";
import { Verdict } from "../../../ui/verdict";
import { dayAndClock } from "../../time";
import { Cautions } from "../choose/cautions";
import { factsOf } from "../facts";
import { lengthIn, smallLength } from "../lengths";
import type { May } from "../may";
import { type Draft, useDraft } from "../use-draft";
import { TackEntry } from "./tack-entry";
import { TackHistory } from "./tack-history";
import { TackPlan } from "./tack-plan";
import "./tack.css";

const EMPTY = { leftStation: "", leftOffset: "", rightStation: "", rightOffset: "" };

type Props = { view: LayoutView; may: May; shut: boolean; done: () => void };

/** The axle as it was tacked: both ends read again, held against the line that was signed, before anything is welded. */
export function TackStep({ view, may, shut, done }: Props) {
  const { draft, change, reset } = useDraft(`plumbay.layout.${view.id}.tack`, EMPTY);
  const [said, setSaid] = useState("");
  const typed = typedCheck(view, draft);
  const [again, setAgain] = useState(false);
  const welded = isWelded(factsOf(view));
  const begun = Object.values(draft).some((text) => text !== "");
  const settled = !shut && view.tack.state === "passes" && !again && !begun;
  const newest = view.tack.checks.find((check) => check.counts) ?? null;
  const shown = typed?.ok ? typed.value.built : newest;
  return (
    <>
      {shut ? null : <TackVerdict view={view} typed={typed} />}
      <p role="status" className="sr-only">
        {said}
      </p>
      <div className="tack">
        <section className="grid content-start gap-4" aria-label="Both ends of the tacked axle">
          {settled ? (
            <>
              <Link to={`/layouts/${view.id}/step/weld`} className={`${buttonClass("go", "xl")} w-full`}>
                Go to Weld and torque
              </Link>
              {may.measure && !welded ? (
                <Button size="l" onClick={() => setAgain(true)}>
                  Check it again
                </Button>
              ) : null}
            </>
          ) : may.measure && !welded ? (
            <TackEntry
              view={view}
              draft={draft}
              change={change}
              problem={typed && !typed.ok ? typed.problem : null}
              kept={(words) => {
                reset(EMPTY);
                setAgain(false);
                setSaid(words);
                done();
              }}
            />
          ) : null}
          <p className="text-[15px] text-concrete-700">
            The signed line is where the axle stands with the spring flat. Tack it to a straight bar or the
            main leaf clamped flat: an arched pack holds it nearer to the fixed eye.
          </p>
          <Cautions step="tack" />
        </section>
        <div className="grid content-start gap-4">
          <TackPlan view={view} built={shown} kept={!typed} />
          <TackHistory view={view} />
        </div>
      </div>
    </>
  );
}

type Checked = ReturnType<typeof checkTack>;

/** What is typed, checked at once; null while it is not whole. */
function typedCheck(view: LayoutView, draft: Draft): Checked | null {
  const at = (name: keyof typeof EMPTY) => lengthIn(draft[name], view.unit);
  const [ls, lo, rs, ro] = [at("leftStation"), at("leftOffset"), at("rightStation"), at("rightOffset")];
  if (ls === null || lo === null || rs === null || ro === null || !view.frame || !view.tack.wanted)
    return null;
  return checkTack(
    view.frame,
    view.tack.wanted,
    { left: { station: ls, offset: lo }, right: { station: rs, offset: ro } },
    { tolerance: view.tack.within, unit: view.unit },
  );
}

function TackVerdict({ view, typed }: { view: LayoutView; typed: Checked | null }) {
  const { tack, unit, shop } = view;
  const within = `Allowed ${smallLength(tack.within, unit)} each way, common practice.`;
  if (typed?.ok) return <Typed check={typed.value} within={within} />;
  const newest = tack.checks.find((check) => check.counts);
  if (!newest)
    return (
      <Verdict
        tone="in-hand"
        sign="tacked"
        size="l"
        title="Read both ends of the tacked axle."
        detail={`Signed: ${tack.wanted ? formatDecimalInches(tack.wanted.station) : "no line"} in ahead of the rear datum pair. ${within}`}
        live
      />
    );
  const by = `${newest.made.name}, ${dayAndClock(newest.made.at, shop.timeZone)}.`;
  return (
    <Verdict
      tone={newest.passes ? "true" : "not-true"}
      sign={newest.passes ? "tacked" : "off"}
      size="l"
      title={newest.passes ? newest.headline : newest.moves.join(" ")}
      detail={newest.passes ? `${by} It may be welded.` : `${newest.headline} ${by} ${within}`}
      live
    />
  );
}

function Typed({ check, within }: { check: TackCheck; within: string }) {
  const { built, verdict } = check;
  const slip = burntInch(built);
  return (
    <Verdict
      tone={built.isTrue ? "true" : "not-true"}
      sign={built.isTrue ? "tacked" : "off"}
      size="l"
      title={built.isTrue ? verdict.headline : verdict.moves.map((move) => move.words).join(" ")}
      detail={
        built.isTrue ? `Not kept yet. ${within}` : `${slip ?? verdict.headline} Not kept yet. ${within}`
      }
      live
    />
  );
}
