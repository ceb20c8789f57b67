import type { LayoutView } from "../../../domain/layout/view";
import { isWhole, nextLine } from "../../../domain/layout/work-list";
import { Verdict } from "../../../ui/verdict";
import { dayAndDate } from "../../time";
import type { May } from "../may";
import { failedLines, statesIn } from "./signed";
import { WorkDesk } from "./work-desk";

type Props = { view: LayoutView; may: May; person: string; shut: boolean; done: () => void };

/** Alignment, the road, torque again, and the last signature. */
export function FinishStep({ view, may, person, shut, done }: Props) {
  const due = nextDue(view);
  return (
    <>
      {shut ? null : <FinishVerdict view={view} />}
      <WorkDesk
        view={view}
        may={may}
        person={person}
        done={done}
        lists={["finish"]}
        caution={`${due ? `To be torqued again by ${due}. ` : ""}Steering and brakes are safety-critical: they want the inspection that local law asks for.`}
        next={null}
      />
    </>
  );
}

function FinishVerdict({ view }: { view: LayoutView }) {
  const { finish } = view.work.progress;
  const failed = failedLines(view, ["finish"]);
  const next = nextLine("finish", statesIn(view));
  if (failed)
    return (
      <Verdict tone="not-true" sign="off" size="l" title={failed} detail="It keeps this step open." live />
    );
  const last = view.work.signed["sign-off"]?.[0];
  if (isWhole(finish))
    return (
      <Verdict
        tone="approved"
        sign="finish"
        size="l"
        title="Finished and signed off."
        detail={last ? `${last.made.name}. The record is whole, from the level to the road.` : undefined}
        live
      />
    );
  return (
    <Verdict
      tone="kept"
      sign="finish"
      size="l"
      title={`${finish.done} of ${finish.of} signed.`}
      detail={next ? `Next: ${next.label}.` : undefined}
      live
    />
  );
}

/** The first day on which something has to be torqued again; null when none was said. */
function nextDue({ work, shop }: LayoutView): string | null {
  const days = Object.values(work.signed).flatMap(([newest]) =>
    newest?.state === "pass" && newest.dueAt ? [newest.dueAt] : [],
  );
  const [first] = days.sort();
  return first ? dayAndDate(first, shop.timeZone) : null;
}
