import { type ReactNode, useEffect, useRef, useState } from "react";
import { isWelded, type StepId } from "../../domain/layout/steps";
import type { LayoutView } from "../../domain/layout/view";
import { workLine } from "../../domain/layout/work-list";
import type { LiveStatus } from "../../realtime/live-status";
import { useNow } from "../wall/use-now";
import { ApprovalStep } from "./choose/approval-step";
import { AxleLineStep } from "./choose/axle-line-step";
import { OptionsStep } from "./choose/options-step";
import { DropsStep } from "./drops/drops-step";
import { factsOf, whyShutIn } from "./facts";
import { LayoutHead } from "./layout-head";
import { LevelStep } from "./level/level-step";
import { MarksStep } from "./marks/marks-step";
import type { May } from "./may";
import { SecondLookStep } from "./second-look/second-look-step";
import { ShutStep } from "./shut-step";
import { FinishStep } from "./signing/finish-step";
import { WeldStep } from "./signing/weld-step";
import { StandsStep } from "./stands/stands-step";
import { StepsRail } from "./steps-rail";
import { TackStep } from "./tack/tack-step";
import { useUnsent } from "./use-unsent";
import "./layout.css";
import "./reading.css";
import "./level/level.css";
import "./drops/drops.css";

type Props = {
  view: LayoutView;
  step: StepId;
  may: May;
  person: string;
  servedAt: string;
  live: LiveStatus;
  /** Reads the layout again. */
  refresh: () => void;
};

/** A layout with one of its steps in hand. */
export function LayoutPage({ view, step, may, person, servedAt, live, refresh }: Props) {
  const now = useNow(servedAt, 10_000);
  const outbox = useUnsent(view.id, person, live.state === "live", refresh);
  const shut = whyShutIn(view, step);
  return (
    <>
      <LayoutHead view={view} person={person} now={now} live={live} outbox={outbox} />
      <LevelNews view={view} />
      <div className="layout-body">
        <StepsRail layoutId={view.id} steps={view.steps} current={step} />
        <main className="layout-work" aria-label={view.steps.find((one) => one.id === step)?.label}>
          {step === "drops" ? (
            <DropsStep view={view} may={may} outbox={outbox} shut={shut} />
          ) : (
            <>
              {shut ? <ShutStep view={view} step={step} why={shut} /> : null}
              {stepIn({ view, step, may: shut ? NOTHING : may, person, shut: shut !== null, refresh })}
            </>
          )}
        </main>
      </div>
    </>
  );
}

const NOTHING: May = { measure: false, approve: false, whyNoWeld: null };

type StepProps = Pick<Props, "view" | "step" | "may" | "person" | "refresh"> & { shut: boolean };

/** The step's own screen. A shut one shows only what was done there before, and takes nothing. */
function stepIn({ view, step, may, person, shut, refresh }: StepProps): ReactNode {
  switch (step) {
    case "stands":
      return <StandsStep view={view} may={may} done={refresh} />;
    case "level":
      return shut ? null : <LevelStep view={view} may={may} done={refresh} />;
    case "marks":
      return shut ? null : <MarksStep view={view} may={may} done={refresh} />;
    case "axle-line":
      return shut && !view.axle ? null : <AxleLineStep view={view} may={may} />;
    case "options":
      return shut && !view.options ? null : <OptionsStep view={view} may={may} />;
    case "second-look":
      return shut ? null : <SecondLookStep view={view} may={may} person={person} done={refresh} />;
    case "approval":
      return shut && !view.approval ? null : <ApprovalStep view={view} may={may} />;
    case "tack":
      return shut && view.tack.checks.length === 0 ? null : (
        <TackStep view={view} may={may} shut={shut} done={refresh} />
      );
    case "weld":
      return shut && nothingSigned(view, "weld") ? null : (
        <WeldStep view={view} may={may} person={person} shut={shut} done={refresh} />
      );
    case "finish":
      return shut && nothingSigned(view, "finish") ? null : (
        <FinishStep view={view} may={may} person={person} shut={shut} done={refresh} />
      );
    default:
      return null;
  }
}

const nothingSigned = ({ work }: LayoutView, step: "weld" | "finish") =>
  !Object.keys(work.signed).some((id) => workLine(id)?.step === step);

/** Says it at once, to those who listen, when a level that stood is void: on this tablet or by somebody else. */
function LevelNews({ view }: { view: LayoutView }) {
  const welded = isWelded(factsOf(view));
  const state = welded ? "none" : view.standsInBay ? (view.level?.state ?? "none") : "void";
  const before = useRef(state);
  const [news, setNews] = useState("");
  const reason = view.standsInBay
    ? (view.level?.voided?.reason ?? "it was broken")
    : `the vehicle left Bay ${view.bay.number}`;
  useEffect(() => {
    if (before.current === "true" && state === "void")
      setNews(`The level is void: ${reason}. Stop measuring.`);
    else if (state === "true") setNews("");
    before.current = state;
  }, [state, reason]);
  return (
    <p role="alert" className="sr-only">
      {news}
    </p>
  );
}
