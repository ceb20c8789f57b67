import { describe, expect, it } from "vitest";
import { nextOpenStep, type StepFacts, type StepId, stepStates, whyShut } from "./steps";

const NONE = {
  weld: { done: 0, of: 10, failed: 0 },
  torque: { done: 0, of: 10, failed: 0 },
  finish: { done: 0, of: 4, failed: 0 },
};
/** Signed, nothing tacked yet. */
const facts = (over: Partial<StepFacts> = {}): StepFacts => ({
  standsAcknowledged: true,
  level: "true",
  levelVoidReason: null,
  redropWanted: false,
  marksConfirmed: true,
  dropsKept: 8,
  dropsNeeded: 8,
  dropsSuspect: 0,
  axleLineChosen: true,
  optionsKnown: true,
  optionChosen: true,
  secondLook: "agrees",
  approval: "approved",
  tack: "none",
  work: NONE,
  ...over,
});
const signed = (weld: number, torque = 0, finish = 0): StepFacts["work"] => ({
  weld: { ...NONE.weld, done: weld },
  torque: { ...NONE.torque, done: torque },
  finish: { ...NONE.finish, done: finish },
});
const AFTER: readonly StepId[] = ["tack", "weld", "finish"];
const shut = (over: Partial<StepFacts>) => AFTER.map((step) => whyShut(step, facts(over)) !== null);
const stateOf = (step: StepId, over: Partial<StepFacts>) =>
  stepStates(facts(over)).find((one) => one.id === step);

describe("the steps after approval", () => {
  it("want a signature that stands", () => {
    expect(whyShut("tack", facts({ approval: "none" }))).toContain("The foreman signs first");
    expect(whyShut("tack", facts({ approval: "void" }))).toBe(
      "The approval is void: it has to be signed again first.",
    );
    expect(shut({ approval: "approved" })).toEqual([false, true, true]);
  });

  it("let nobody weld to a number that nobody checked", () => {
    expect(whyShut("weld", facts())).toBe(
      "Check the tacked axle first: no bracket is welded to a number nobody checked.",
    );
    expect(whyShut("weld", facts({ tack: "out" }))).toContain("The tacked axle is out");
    expect(shut({ tack: "passes" })).toEqual([false, false, true]);
  });

  it("finish only what is welded and torqued, and say how much is left", () => {
    expect(whyShut("finish", facts({ tack: "passes", work: signed(9) }))).toBe(
      "Weld and torque first: 11 lines are not signed.",
    );
    expect(whyShut("finish", facts({ tack: "passes", work: signed(10, 9) }))).toBe(
      "Weld and torque first: 1 line is not signed.",
    );
    expect(shut({ tack: "passes", work: signed(10, 10) })).toEqual([false, false, false]);
  });

  it("are shut by a void level or approval, with the way back, until the last bracket is welded", () => {
    const gone = { level: "void", levelVoidReason: "rolled out", approval: "void", tack: "passes" } as const;
    expect(shut({ ...gone, work: signed(9) })).toEqual([true, true, true]);
    expect(whyShut("weld", facts({ ...gone, work: signed(9) }))).toBe(
      "The level is void: rolled out. Level again, then drop one old point again.",
    );
    expect(whyShut("weld", facts({ ...gone, level: "true", work: signed(9) }))).toContain(
      "The approval is void",
    );
    expect(shut({ ...gone, work: signed(10) })).toEqual([false, false, true]);
    expect(shut({ ...gone, work: signed(10, 10) })).toEqual([false, false, false]);
  });

  it("follow one another, and nobody levels again for what is welded", () => {
    expect(nextOpenStep(facts())).toBe("tack");
    expect(nextOpenStep(facts({ tack: "out" }))).toBe("tack");
    expect(nextOpenStep(facts({ tack: "passes" }))).toBe("weld");
    expect(nextOpenStep(facts({ tack: "passes", work: signed(10, 3) }))).toBe("weld");
    expect(nextOpenStep(facts({ tack: "passes", work: signed(10, 10), level: "void" }))).toBe("finish");
    expect(nextOpenStep(facts({ tack: "passes", work: signed(9), level: "void" }))).toBe("level");
  });

  it("say how far they are", () => {
    expect(stateOf("weld", { tack: "passes", work: signed(4) })).toMatchObject({
      state: "in-hand",
      note: "4 of 20",
    });
    expect(stateOf("tack", { tack: "out" })).toMatchObject({ state: "in-hand", note: "out of true" });
    expect(stateOf("finish", {})).toMatchObject({ state: "shut", note: "" });
    const failed = { ...signed(4), torque: { done: 0, of: 10, failed: 2 } };
    expect(stateOf("weld", { tack: "passes", work: failed })?.note).toBe("2 failed");
    expect(stateOf("tack", { tack: "passes", approval: "void" })).toMatchObject({
      state: "void",
      note: "waits for the approval",
    });
  });
});
