import { describe, expect, it } from "vitest";
import { workingTimeBefore } from "./working-time";

const at = (iso: string) => new Date(iso);

describe("working time before", () => {
  it("stays within the day", () =>
    expect(workingTimeBefore(at("2026-12-01T10:00:00Z"), 90, "UTC")).toEqual(at("2026-12-01T08:30:00Z")));
  it("skips the night", () =>
    expect(workingTimeBefore(at("2026-12-01T08:00:00Z"), 90, "UTC")).toEqual(at("2026-11-30T16:30:00Z")));
  it("counts from closing time in the evening and from the day before in the early morning", () => {
    expect(workingTimeBefore(at("2026-12-01T22:00:00Z"), 60, "UTC")).toEqual(at("2026-12-01T16:00:00Z"));
    expect(workingTimeBefore(at("2026-12-01T05:00:00Z"), 60, "UTC")).toEqual(at("2026-11-30T16:00:00Z"));
  });
  it("keeps the shop's own clock", () =>
    expect(workingTimeBefore(at("2026-12-01T15:00:00Z"), 120, "America/Denver")).toEqual(
      at("2026-11-30T23:00:00Z"),
    ));
});
