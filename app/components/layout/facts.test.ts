import { describe, expect, it } from "vitest";
import { DROP_POINTS } from "../../domain/layout/drops";
import type { Option } from "../../domain/layout/options";
import { stepStates } from "../../domain/layout/steps";
import type { LayoutView, LevelView } from "../../domain/layout/view";
import { degrees } from "../../domain/units/angle";
import { factsOf, wayBack, whyShutIn } from "./facts";

const made = { name: "Wes Tran", initials: "WT", at: "2026-06-01T10:01:00.000Z" };
const level = (over: Partial<LevelView> = {}): LevelView => ({
  id: 1,
  method: "heights",
  state: "true",
  noseHighDeg: degrees(0),
  rightHighDeg: degrees(0),
  twistMm: null,
  twistDeg: null,
  allowedDeg: degrees(0.1),
  made,
  voided: null,
  readings: [],
  redrop: { state: "none", offMm: null },
  ...over,
});

const NONE_SIGNED = {
  weld: { done: 0, of: 10, failed: 0 },
  torque: { done: 0, of: 10, failed: 0 },
  finish: { done: 0, of: 4, failed: 0 },
};

function view(over: Partial<LayoutView>): LayoutView {
  const drops = DROP_POINTS.flatMap((point) =>
    point.sides.map((side) => ({
      point: point.id,
      side,
      label: point.label,
      needed: point.needed,
      reading: null,
      superseded: [],
    })),
  );
  const whole = {
    bay: { id: 5, number: 5, marks: [] },
    standsInBay: true,
    stands: made,
    level: level(),
    marks: null,
    drops,
    axle: null,
    options: null,
    choice: null,
    secondLook: { state: "to-do", within: 3, items: [], waived: null },
    approval: null,
    tack: { state: "none", within: 3.175, wanted: null, checks: [] },
    work: { progress: NONE_SIGNED, signed: {} },
    steps: [],
    ...over,
  };
  const made1 = whole as unknown as LayoutView;
  return { ...made1, steps: stepStates(factsOf(made1)) };
}

describe("what a layout's steps depend on", () => {
  it("shuts all after Level while the vehicle is not in its bay", () => {
    const moved = view({ standsInBay: false });
    expect(whyShutIn(moved, "drops")).toContain("the vehicle is not in Bay 5");
    expect(wayBack(moved, "drops")?.id).toBe("level");
  });

  it("says what broke the level, and the way back", () => {
    const broken = view({ level: level({ state: "void", voided: { made, reason: "a stand was touched" } }) });
    expect(whyShutIn(broken, "marks")).toContain("a stand was touched");
    expect(whyShutIn(broken, "level")).toBeNull();
  });

  it("leads to the first step that is not done", () => {
    expect(wayBack(view({ stands: null, level: null }), "drops")?.id).toBe("stands");
    expect(wayBack(view({}), "drops")?.id).toBe("marks");
    expect(whyShutIn(view({}), "marks")).toBeNull();
  });

  it("goes on in another bay once all is welded, and not before", () => {
    const approval = {
      state: "approved",
      sheetRevision: 1,
      // The steps do not look at the figures.
      signed: {} as Option,
      made,
      voided: null,
    } as const;
    const tack = {
      state: "passes",
      within: 3.175,
      wanted: null,
      checks: [],
    } as unknown as LayoutView["tack"];
    const work = (done: number) => ({
      progress: { ...NONE_SIGNED, weld: { done, of: 10, failed: 0 } },
      signed: {},
    });
    const rolledOut = { standsInBay: false, approval, tack, marks: { made } as LayoutView["marks"] };
    expect(whyShutIn(view({ ...rolledOut, work: work(9) }), "weld")).toContain("the vehicle is not in Bay 5");
    const welded = view({ ...rolledOut, work: work(10) });
    expect(whyShutIn(welded, "weld")).toBeNull();
    expect(whyShutIn(welded, "finish")).toContain("Weld and torque first");
    expect(wayBack(welded, "finish")?.id).toBe("weld");
    expect(wayBack(view({ ...rolledOut, work: work(9) }), "finish")?.id).toBe("level");
  });
});
