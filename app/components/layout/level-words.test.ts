import { describe, expect, it } from "vitest";
import type { LevelView } from "../../domain/layout/view";
import { degrees } from "../../domain/units/angle";
import { levelWords } from "./level-words";

const level = (over: Partial<LevelView>): LevelView => ({
  id: 1,
  method: "heights",
  state: "true",
  noseHighDeg: degrees(0.04),
  rightHighDeg: degrees(0),
  twistMm: null,
  twistDeg: null,
  allowedDeg: degrees(0.1),
  made: { name: "Wes Tran", initials: "WT", at: "2026-06-01T10:01:00.000Z" },
  voided: null,
  readings: [],
  redrop: { state: "none", offMm: null },
  ...over,
});

describe("a level in words", () => {
  it("says what it is and which way it leans", () => {
    expect(levelWords(level({}))).toBe("Level true, nose high 0.04°");
    expect(levelWords(level({ state: "not-true", rightHighDeg: degrees(0.6) }))).toBe(
      "Not true yet: right side high 0.60°, nose high 0.04°",
    );
    expect(levelWords(null)).toBe("Not levelled yet");
  });

  it("says what broke it", () => {
    const voided = { made: level({}).made, reason: "a stand was touched" };
    expect(levelWords(level({ state: "void", voided }))).toBe("Level void: a stand was touched");
  });
});
