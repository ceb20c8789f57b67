import { useEffect, useRef } from "react";
import { Link } from "react-router";
import type { StepId, StepState } from "../../domain/layout/steps";
import { Bob } from "../../ui/bob";

const STATE_WORDS: Record<StepState["state"], string> = {
  done: "done",
  "in-hand": "next",
  open: "open",
  shut: "shut",
  void: "void",
};

/** What stands under a step's name. The states that say the least say nothing. */
function noteOf(step: StepState): string {
  if (step.note) return step.note;
  return step.state === "void" ? STATE_WORDS.void : "";
}

const TONE: Record<StepState["state"], string> = {
  done: "text-moss",
  "in-hand": "text-brass-ink",
  open: "",
  shut: "",
  void: "text-oxide font-semibold",
};

/** The steps down a plumb line, the bob at the one in hand; a strip across on narrow screens. */
export function StepsRail({
  layoutId,
  steps,
  current,
}: {
  layoutId: number;
  steps: readonly StepState[];
  current: StepId;
}) {
  const here = steps.findIndex((step) => step.id === current);
  const currentRef = useRef<HTMLAnchorElement>(null);
  useEffect(() => {
    const strip = currentRef.current?.closest("ol");
    if (strip && strip.scrollWidth > strip.clientWidth && currentRef.current)
      strip.scrollLeft =
        currentRef.current.offsetLeft - strip.clientWidth / 2 + currentRef.current.clientWidth / 2;
  });
  return (
    <nav className="layout-rail" aria-label="Steps of this layout">
      <ol>
        {steps.map((step, i) => {
          const note = noteOf(step);
          const isHere = i === here;
          const marks = { "data-done": step.state === "done", "data-hung": i < here };
          return (
            <li key={step.id}>
              <Link
                ref={isHere ? currentRef : undefined}
                to={`/layouts/${layoutId}/step/${step.id}`}
                className="layout-step"
                aria-current={isHere ? "step" : undefined}
                {...marks}
              >
                {isHere ? <Bob key={step.id} size={44} className="layout-bob" /> : null}
                {step.label}
                <small className={TONE[step.state]}>
                  {note || <span className="sr-only">{STATE_WORDS[step.state]}</span>}
                </small>
              </Link>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
