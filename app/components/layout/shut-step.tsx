import { Link } from "react-router";
import { AFTER_APPROVAL, isWelded, type StepId } from "../../domain/layout/steps";
import type { LayoutView } from "../../domain/layout/view";
import { buttonClass } from "../../ui/button";
import { Verdict } from "../../ui/verdict";
import { factsOf, wayBack } from "./facts";

/** Why a step cannot be worked on, and the press that leads back to where it can. */
export function ShutStep({ view, step, why }: { view: LayoutView; step: StepId; why: string }) {
  const state = view.steps.find((one) => one.id === step);
  const back = wayBack(view, step);
  const welded = AFTER_APPROVAL.includes(step) && isWelded(factsOf(view));
  const isVoid = !welded && (view.level?.state === "void" || !view.standsInBay);
  return (
    <section aria-label={`${state?.label ?? "Step"} is shut`}>
      <Verdict
        tone={isVoid ? "void" : "waiting"}
        sign={isVoid ? "void" : "lock"}
        title={why}
        detail={
          state?.state === "void"
            ? "Nothing that was read is lost: it waits until its ground is true again."
            : undefined
        }
        live={!isVoid}
      />
      {back ? (
        <div className="p-4">
          <Link
            to={`/layouts/${view.id}/step/${back.id}`}
            className={`${buttonClass("go", "xl")} w-full max-w-xl`}
          >
            Go to {back.label}
          </Link>
        </div>
      ) : null}
    </section>
  );
}
