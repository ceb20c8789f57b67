import { isWhole, type Progress, type WorkListId } from "./work-list";

/** The steps of a layout, in order. */
export const LAYOUT_STEPS = [
  { id: "stands", label: "Set on stands" },
  { id: "level", label: "Level" },
  { id: "marks", label: "Control marks" },
  { id: "drops", label: "Drops" },
  { id: "axle-line", label: "Axle line" },
  { id: "options", label: "Options" },
  { id: "second-look", label: "Second look" },
  { id: "approval", label: "Approval" },
  { id: "tack", label: "Tack and square" },
  { id: "weld", label: "Weld and torque" },
  { id: "finish", label: "Finish" },
] as const;
export type StepId = (typeof LAYOUT_STEPS)[number]["id"];

export const isStepId = (id: string): id is StepId => LAYOUT_STEPS.some((step) => step.id === id);

/** What is known of a layout, as far as the steps depend on it. */
export type StepFacts = {
  standsAcknowledged: boolean;
  level: "none" | "not-true" | "true" | "void";
  /** What broke the level; null unless it is void. */
  levelVoidReason: string | null;
  /** Old drops wait for one of them to be dropped again under the new level. */
  redropWanted: boolean;
  marksConfirmed: boolean;
  /** Needed drops that stand, of how many. */
  dropsKept: number;
  dropsNeeded: number;
  dropsSuspect: number;
  axleLineChosen: boolean;
  /** Axle line and hole are known, so that there are options. */
  optionsKnown: boolean;
  optionChosen: boolean;
  /** Another person's readings of what weighs most: `apart` while two readings do not agree. */
  secondLook: "to-do" | "apart" | "agrees" | "waived";
  approval: "none" | "approved" | "void";
  /** The newest check of the tacked axle under the newest approval. */
  tack: "none" | "out" | "passes";
  /** How far the lists are that are signed after it. */
  work: Record<WorkListId, Progress>;
};

export type StepState = {
  id: StepId;
  label: string;
  /** `done`: true now. `in-hand`: the next to do. `open`: may be done. `shut`: not yet. `void`: was done, its ground has gone. */
  state: "done" | "in-hand" | "open" | "shut" | "void";
  note: string;
};

export const AFTER_APPROVAL: readonly StepId[] = ["tack", "weld", "finish"];

/** Every bracket is welded and signed: from here on a moved vehicle loses nothing. */
export const isWelded = (facts: StepFacts): boolean => facts.tack === "passes" && isWhole(facts.work.weld);

/**
 * Why a step may not be worked on, and how to get there; null when it may.
 * Everything after Level stays shut until a level stands and is true, up to the last weld: what is welded stays where it
 * is, and the vehicle has to roll for the rest.
 */
export function whyShut(step: StepId, facts: StepFacts): string | null {
  if (AFTER_APPROVAL.includes(step) && isWelded(facts)) return whyFinishShut(step, facts);
  if (step === "stands") return null;
  if (!facts.standsAcknowledged) return "Set the vehicle on stands first.";
  if (step === "level") return null;
  if (facts.level === "none") return "Level first: everything after depends on it.";
  if (facts.level === "not-true")
    return "Not level yet: raise the stands as the Level step says, and read again.";
  if (facts.level === "void")
    return `The level is void: ${facts.levelVoidReason ?? "it was broken"}. Level again${facts.dropsKept > 0 || facts.dropsSuspect > 0 ? ", then drop one old point again" : ""}.`;
  if (step === "marks") return null;
  if (!facts.marksConfirmed) return "Check the control marks first: tape A to B.";
  if (step === "drops") return null;
  if (facts.redropWanted)
    return "The level is new: drop one old point again, to see whether the old drops stand.";
  if (facts.dropsSuspect > 0) return "Tapes that do not meet have to be measured again first.";
  if (facts.dropsKept < facts.dropsNeeded) return `${facts.dropsNeeded - facts.dropsKept} drops are missing.`;
  if (step === "axle-line") return null;
  if (!facts.axleLineChosen) return "Choose the axle line first.";
  if (step === "options") return null;
  if (!facts.optionChosen && facts.approval === "none") return "Put an option in hand first.";
  if (step === "second-look") return null;
  if (facts.approval === "none") {
    if (facts.secondLook === "apart") return "Two people's readings are apart: a third one decides.";
    if (facts.secondLook === "to-do") return "A second person looks again first.";
  }
  return step === "approval" ? null : whyTackShut(step, facts);
}

function whyTackShut(step: StepId, facts: StepFacts): string | null {
  if (facts.approval === "none")
    return "The foreman signs first: nothing is tacked to a number nobody signed.";
  if (facts.approval === "void") return "The approval is void: it has to be signed again first.";
  if (step === "tack") return null;
  if (facts.tack === "none")
    return "Check the tacked axle first: no bracket is welded to a number nobody checked.";
  if (facts.tack === "out")
    return "The tacked axle is out: move it as Tack and square says, and check it again.";
  return step === "weld" ? null : whyFinishShut(step, facts);
}

function whyFinishShut(step: StepId, { work }: StepFacts): string | null {
  if (step !== "finish" || (isWhole(work.weld) && isWhole(work.torque))) return null;
  const left = (of: Progress) => of.of - of.done;
  const lines = left(work.weld) + left(work.torque);
  return `Weld and torque first: ${lines} ${lines === 1 ? "line is" : "lines are"} not signed.`;
}

const isDone = (step: StepId, facts: StepFacts): boolean => {
  switch (step) {
    case "stands":
      return facts.standsAcknowledged;
    case "level":
      return facts.level === "true";
    case "marks":
      return facts.marksConfirmed;
    case "drops":
      return facts.dropsKept >= facts.dropsNeeded && facts.dropsSuspect === 0 && !facts.redropWanted;
    case "axle-line":
      return facts.axleLineChosen;
    case "options":
      return facts.optionChosen;
    case "second-look":
      return facts.secondLook === "agrees" || facts.secondLook === "waived" || facts.approval === "approved";
    case "approval":
      return facts.approval === "approved";
    case "tack":
      return facts.tack === "passes";
    case "weld":
      return isWelded(facts) && isWhole(facts.work.torque);
    case "finish":
      return isWhole(facts.work.finish);
  }
};

/** The step to work on next; the last when all is done. Nobody levels again for what is welded. */
export function nextOpenStep(facts: StepFacts): StepId {
  const steps = LAYOUT_STEPS.filter(({ id }) => !isWelded(facts) || AFTER_APPROVAL.includes(id));
  return steps.find((step) => !isDone(step.id, facts))?.id ?? "finish";
}

const noteFor = (step: StepId, facts: StepFacts): string => {
  if (step === "level") {
    if (facts.level === "void") return "void";
    if (facts.level === "not-true") return "not true yet";
    return facts.level === "true" ? "true" : "";
  }
  if (step === "drops") {
    if (facts.dropsSuspect > 0) return "tapes do not meet";
    if (facts.redropWanted) return "drop one again";
    return facts.dropsKept > 0 ? `${facts.dropsKept} of ${facts.dropsNeeded} kept` : "";
  }
  if (step === "second-look")
    return { "to-do": "", apart: "readings apart", agrees: "agrees", waived: "waived" }[facts.secondLook];
  if (step === "approval")
    return facts.approval === "none" ? "" : facts.approval === "void" ? "void" : "signed";
  if (step === "tack") return { none: "", out: "out of true", passes: "true" }[facts.tack];
  if (step === "weld") return listNote([facts.work.weld, facts.work.torque]);
  return step === "finish" ? listNote([facts.work.finish]) : "";
};

/** "5 of 12", "1 failed"; empty while nothing is signed. */
function listNote(lists: readonly Progress[]): string {
  const sum = (of: (list: Progress) => number) => lists.reduce((total, list) => total + of(list), 0);
  const [done, failed] = [sum((list) => list.done), sum((list) => list.failed)];
  if (failed > 0) return `${failed} failed`;
  return done > 0 ? `${done} of ${sum((list) => list.of)}` : "";
}

/** What a step that was done waits for, its ground having gone. */
const waitsFor = (facts: StepFacts): string =>
  facts.level === "true" ? "waits for the approval" : "waits for the level";

/** Every step with its state and a note of a word or two. */
export function stepStates(facts: StepFacts): StepState[] {
  const next = nextOpenStep(facts);
  return LAYOUT_STEPS.map(({ id, label }) => {
    const note = noteFor(id, facts);
    if (id === "level" && facts.level === "void") return { id, label, state: "void", note };
    if (id === "approval" && facts.approval === "void") return { id, label, state: "void", note };
    const shut = whyShut(id, facts) !== null;
    if (isDone(id, facts))
      return { id, label, state: shut ? "void" : "done", note: shut ? waitsFor(facts) : note };
    if (id === next) return { id, label, state: "in-hand", note };
    return { id, label, state: shut ? "shut" : "open", note };
  });
}
