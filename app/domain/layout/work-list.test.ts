import { describe, expect, it } from "vitest";
import { meetsTorque } from "./torque-reading";
import { degreesTyped, entryFaults, type WorkEntry } from "./work-entry";
import {
  ALIGNMENT_FIGURES,
  linesOf,
  nextLine,
  progressOf,
  WORK_LINES,
  type WorkState,
  whyNotYet,
  workLine,
} from "./work-list";

const line = (id: string) => {
  const found = workLine(id);
  if (!found) throw new Error(`There is no line ${id}`);
  return found;
};
const passed = (...ids: string[]) => new Map(ids.map((id) => [id, "pass" as WorkState]));
const welds = linesOf("weld").map(({ id }) => id);
const entry = (over: Partial<WorkEntry> = {}): WorkEntry => ({
  state: "pass",
  wanted: "",
  read: "",
  tool: "",
  words: "",
  figures: [],
  ...over,
});

describe("the lists", () => {
  it("name every line once, short enough for their column", () => {
    const ids = WORK_LINES.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    const stored = [...ids, ...ALIGNMENT_FIGURES.map(({ id }) => `alignment.${id}`)];
    expect(Math.max(...stored.map((id) => id.length))).toBeLessThanOrEqual(40);
  });

  it("count what is signed, not that the place is ready, nor what failed", () => {
    expect(progressOf("weld", passed("ready", "hanger.left"))).toEqual({ done: 1, of: 10, failed: 0 });
    expect(progressOf("weld", new Map([["hanger.left", "fail"]]))).toEqual({ done: 0, of: 10, failed: 1 });
  });

  it("have one next line: the first that did not pass", () => {
    expect(nextLine("weld", new Map())?.id).toBe("ready");
    expect(nextLine("weld", passed("ready", "hanger.right"))?.id).toBe("hanger.left");
    expect(nextLine("weld", new Map([...passed(...welds), ["perch.left", "fail"]]))?.id).toBe("perch.left");
    expect(nextLine("weld", passed(...welds))).toBeNull();
  });

  it("keep their order: cautions, welds, torque, and the last signature last", () => {
    expect(whyNotYet(line("ready"), new Map())).toBeNull();
    expect(whyNotYet(line("hanger.left"), new Map())).toContain("First the cautions");
    expect(whyNotYet(line("hanger.left"), passed("ready"))).toBeNull();
    expect(whyNotYet(line("u-bolts.left"), passed("ready"))).toContain("First the weld list");
    expect(whyNotYet(line("u-bolts.left"), passed(...welds))).toBeNull();
    expect(whyNotYet(line("sign-off"), passed("alignment", "re-torque"))).toBe("First: road test.");
    expect(whyNotYet(line("sign-off"), passed("alignment", "re-torque", "road-test"))).toBeNull();
  });
});

describe("a signature", () => {
  it("that says no says why, and needs nothing else", () => {
    expect(entryFaults(line("eye-bolt.left"), entry({ state: "fail" }))).toHaveProperty("words");
    expect(entryFaults(line("eye-bolt.left"), entry({ state: "fail", words: "thread pulled" }))).toEqual({});
  });

  it("under a weld names what the welder is qualified by", () => {
    expect(Object.keys(entryFaults(line("perch.left"), entry()))).toEqual(["tool"]);
    expect(entryFaults(line("perch.left"), entry({ tool: "Card 12, all positions" }))).toEqual({});
  });

  it("under a bolt has the torque that is asked for, the reading and the wrench", () => {
    expect(Object.keys(entryFaults(line("u-bolts.left"), entry())).sort()).toEqual([
      "read",
      "tool",
      "wanted",
    ]);
    const typed = { wanted: "100-120 ft lb", read: "110 ft lb", tool: "Wrench 4" };
    expect(entryFaults(line("u-bolts.left"), entry(typed))).toEqual({});
    expect(entryFaults(line("u-bolts.left"), entry({ ...typed, read: "90" })).read).toContain("Under the");
    expect(entryFaults(line("u-bolts.left"), entry({ ...typed, read: "140" })).read).toContain("Over the");
  });

  it("under the alignment takes any figures, or none, but only degrees", () => {
    expect(entryFaults(line("alignment"), entry())).toEqual({});
    const figures = [
      { id: "toe", typed: "0,12" },
      { id: "camber-left", typed: "-0.5°" },
    ];
    expect(entryFaults(line("alignment"), entry({ figures }))).toEqual({});
    const wrong = [{ id: "toe", typed: "1/8 in" }];
    expect(entryFaults(line("alignment"), entry({ figures: wrong }))).toHaveProperty(["figure.toe"]);
    expect(degreesTyped("−1.25")).toBe(-1.25);
    expect(degreesTyped("45")).toBeNull();
  });
});

describe("a torque", () => {
  it.each([
    ["110 ft lb", "110", "meets"],
    ["110 ft lb", "115 lb-ft", "meets"],
    ["110 lbf·ft", "110 ft lb", "meets"],
    ["110 ft lb", "109.5", "low"],
    ["100–120 Nm", "121 N·m", "high"],
    ["100 to 120 Nm", "100 Nm", "meets"],
    ["110 ft lb", "149 Nm", "unknown"],
    ["70 ft lb + 90°", "70 ft lb", "unknown"],
    ["by the book", "110", "unknown"],
  ] as const)("asked %s, read %s: %s", (wanted, read, outcome) => {
    expect(meetsTorque(wanted, read)).toBe(outcome);
  });
});
