import { AFTER_APPROVAL, isWelded, type StepFacts, type StepId, whyShut } from "../../domain/layout/steps";
import type { LayoutView } from "../../domain/layout/view";

/** What the steps depend on, as a layout's screens know it. */
export function factsOf(view: LayoutView): StepFacts {
  const { level, standsInBay, bay } = view;
  // Old drops count while they may still be carried over to a new level.
  const waiting = level?.state !== "true" || level.redrop.state === "wanted";
  const needed = view.drops.filter((drop) => drop.needed);
  const moved = level !== null && level.state !== "void" && !standsInBay;
  return {
    standsAcknowledged: view.stands !== null,
    level: moved ? "void" : (level?.state ?? "none"),
    levelVoidReason: moved ? `the vehicle is not in Bay ${bay.number}` : (level?.voided?.reason ?? null),
    redropWanted: level?.redrop.state === "wanted",
    marksConfirmed: view.marks !== null,
    dropsKept: needed.filter((drop) => drop.reading !== null && (drop.reading.stands || waiting)).length,
    dropsNeeded: needed.length,
    dropsSuspect: view.drops.filter((drop) => drop.reading?.suspect).length,
    axleLineChosen: view.axle !== null,
    optionsKnown: view.options !== null,
    optionChosen: view.choice !== null && !view.choice.changed,
    secondLook: view.secondLook.state,
    approval: view.approval?.state ?? "none",
    tack: view.tack.state,
    work: view.work.progress,
  };
}

/** Why a step of this layout may not be worked on, in words; null when it may. */
export const whyShutIn = (view: LayoutView, step: StepId): string | null => whyShut(step, factsOf(view));

/** The step that opens a shut one: the first before it that is not done. Nobody goes back before Tack once all is welded. */
export function wayBack(view: LayoutView, step: StepId): { id: StepId; label: string } | null {
  const welded = isWelded(factsOf(view));
  const before = view.steps
    .slice(
      0,
      view.steps.findIndex((one) => one.id === step),
    )
    .filter(({ id }) => !welded || AFTER_APPROVAL.includes(id));
  return before.find((one) => one.state !== "done" && whyShutIn(view, one.id) === null) ?? null;
}
