/** The steps of a layout, in order. */
export const LAYOUT_STEPS = [
  { id: "stands", label: "Set on stands", later: false },
  { id: "level", label: "Level", later: false },
  { id: "marks", label: "Control marks", later: false },
  { id: "drops", label: "Drops", later: false },
  { id: "axle-line", label: "Axle line", later: false },
  { id: "options", label: "Options", later: false },
  { id: "second-look", label: "Second look", later: false },
  { id: "approval", label: "Approval", later: false },
  { id: "tack", label: "Tack and square", later: true },
  { id: "weld", label: "Weld and torque", later: true },
  { id: "finish", label: "Finish", later: true },
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
};

export type StepState = {
  id: StepId;
  label: string;
  /** `done`: true now. `in-hand`: the next to do. `open`: may be done. `shut`: not yet. `void`: was done, its ground has gone. `later`: not in this version. */
  state: "done" | "in-hand" | "open" | "shut" | "void" | "later";
  note: string;
};

const AFTER_LEVEL: readonly StepId[] = ["marks", "drops", "axle-line", "options", "second-look", "approval"];

/**
 * Why a step may not be worked on, and how to get there; null when it may.
 * Everything after Level stays shut until a level stands and is true.
 */
export function whyShut(step: StepId, facts: StepFacts): string | null {
  if (LAYOUT_STEPS.some((known) => known.id === step && known.later))
    return "This step is kept on paper for now: it is not in this version.";
  if (step === "stands") return null;
  if (!facts.standsAcknowledged) return "Set the vehicle on stands first.";
  if (step === "level") return null;
  if (AFTER_LEVEL.includes(step)) {
    if (facts.level === "none") return "Level first: everything after depends on it.";
    if (facts.level === "not-true")
      return "Not level yet: raise the stands as the Level step says, and read again.";
    if (facts.level === "void")
      return `The level is void: ${facts.levelVoidReason ?? "it was broken"}. Level again${facts.dropsKept > 0 || facts.dropsSuspect > 0 ? ", then drop one old point again" : ""}.`;
  }
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
  if (step === "second-look" || facts.approval !== "none") return null;
  if (facts.secondLook === "apart") return "Two people's readings are apart: a third one decides.";
  return facts.secondLook === "to-do" ? "A second person looks again first." : null;
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
    default:
      return false;
  }
};

/** The step to work on next; the last of this version when all is done. */
export function nextOpenStep(facts: StepFacts): StepId {
  const steps = LAYOUT_STEPS.filter((step) => !step.later);
  return steps.find((step) => !isDone(step.id, facts))?.id ?? "approval";
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
  return "";
};

/** Every step with its state and a note of a word or two. */
export function stepStates(facts: StepFacts): StepState[] {
  const next = nextOpenStep(facts);
  return LAYOUT_STEPS.map(({ id, label, later }) => {
    const note = noteFor(id, facts);
    if (later) return { id, label, state: "later", note: "" };
    if (id === "level" && facts.level === "void") return { id, label, state: "void", note };
    if (id === "approval" && facts.approval === "void") return { id, label, state: "void", note };
    const shut = whyShut(id, facts) !== null;
    if (isDone(id, facts))
      return { id, label, state: shut ? "void" : "done", note: shut ? "waits for the level" : note };
    if (id === next) return { id, label, state: "in-hand", note };
    return { id, label, state: shut ? "shut" : "open", note };
  });
}
