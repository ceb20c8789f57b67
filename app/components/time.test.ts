import { describe, expect, it } from "vitest";
import { ageInWords, clock, dayAndClock, dayAndDate, sameDay, spanInWords, whenInWords } from "./time";

const MIN = 60_000;
const ZONE = "America/Denver";

describe("spanInWords", () => {
  it.each([
    [-5 * MIN, "under a minute"],
    [59_999, "under a minute"],
    [MIN, "1 min"],
    [44.9 * MIN, "44 min"],
    [60 * MIN, "1 h 00"],
    [130 * MIN, "2 h 10"],
    [23 * 60 * MIN + 59 * MIN, "23 h 59"],
    [24 * 60 * MIN, "1 day"],
    [48 * 60 * MIN, "2 days"],
  ])("%d ms is %s", (ms, words) => expect(spanInWords(ms)).toBe(words));

  it("counts back from a moment", () => {
    expect(ageInWords("2026-12-01T15:00:00Z", "2026-12-01T15:41:30Z")).toBe("41 min");
  });
});

describe("moments in the shop's zone", () => {
  it("shows the shop's clock, not the reader's", () => {
    expect(clock("2026-12-01T22:30:00Z", ZONE)).toBe("15:30");
    expect(dayAndClock("2026-12-02T14:00:00Z", ZONE)).toBe("Wed 07:00");
    expect(dayAndDate("2026-12-02T06:59:00Z", ZONE)).toBe("Tue 1 Dec");
  });

  it("shows midnight as 00:00", () => expect(clock("2026-12-01T07:00:00Z", ZONE)).toBe("00:00"));

  it("follows the clock change", () => {
    expect(clock("2026-11-01T07:30:00Z", ZONE)).toBe("01:30");
    expect(clock("2026-11-01T08:30:00Z", ZONE)).toBe("01:30");
  });

  it("cuts days at the shop's midnight", () => {
    expect(sameDay("2026-12-01T07:00:00Z", "2026-12-02T06:59:00Z", ZONE)).toBe(true);
    expect(sameDay("2026-12-01T07:00:00Z", "2026-12-02T07:00:00Z", ZONE)).toBe(false);
  });

  it("shortens what is near", () => {
    const now = "2026-12-01T17:42:00Z";
    expect(whenInWords("2026-12-01T22:30:00Z", now, ZONE)).toBe("15:30");
    expect(whenInWords("2026-12-02T14:00:00Z", now, ZONE)).toBe("Wed 07:00");
    expect(whenInWords("2026-12-09T14:00:00Z", now, ZONE)).toBe("Wed 9 Dec 07:00");
    expect(whenInWords("2027-09-09T14:00:00Z", now, ZONE)).toBe("Thu 9 Sep 08:00");
  });
});
