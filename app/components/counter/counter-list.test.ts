import { describe, expect, it } from "vitest";
import { type CounterRow, counterAddress, countShows, pickRows, readCounterQuery } from "./counter-list";

const NOW = "2026-03-03T12:00:00.000Z";
const row = (nickname: string, over: Partial<CounterRow> = {}): CounterRow => ({
  nickname,
  code: "M3XF",
  customer: "Rosa Lind",
  stage: { kind: "strip", state: "open" },
  bayNumber: null,
  hold: null,
  promisedAt: null,
  bookedInAt: "2026-03-01T08:00:00.000Z",
  ...over,
});
const rows = [
  row("Old Mule", {
    promisedAt: "2026-03-09T12:00:00.000Z",
    bayNumber: 5,
    stage: { kind: "layout", state: "under-way" },
  }),
  row("Biscuit", {
    promisedAt: "2026-03-02T12:00:00.000Z",
    bayNumber: 1,
    hold: { words: "level void" },
    code: "K7RD",
  }),
  row("Moth", { customer: "Abel Quist", stage: null }),
];
const names = (search: string) =>
  pickRows(rows, readCounterQuery(new URLSearchParams(search)), NOW).map((found) => found.nickname);

describe("the counter's list", () => {
  it("stands by promise, those without one last", () => {
    expect(names("")).toEqual(["Biscuit", "Old Mule", "Moth"]);
  });

  it("finds by nickname, code and customer, whatever the case", () => {
    expect(names("q=mule")).toEqual(["Old Mule"]);
    expect(names("q=k7rd")).toEqual(["Biscuit"]);
    expect(names("q=quist")).toEqual(["Moth"]);
    expect(names("q=nobody")).toEqual([]);
  });

  it("shows the late, the held, those in bays and those in the yard", () => {
    expect(names("show=late")).toEqual(["Biscuit"]);
    expect(names("show=hold")).toEqual(["Biscuit"]);
    expect(names("show=yard")).toEqual(["Moth"]);
    expect(names("show=bay&sort=-place")).toEqual(["Old Mule", "Biscuit"]);
    expect(countShows(rows, NOW)).toEqual({ all: 3, late: 1, hold: 1, bay: 2, yard: 1 });
  });

  it("sorts both ways", () => {
    expect(names("sort=nickname")).toEqual(["Biscuit", "Moth", "Old Mule"]);
    expect(names("sort=-nickname")).toEqual(["Old Mule", "Moth", "Biscuit"]);
    expect(names("sort=stage")).toEqual(["Biscuit", "Old Mule", "Moth"]);
  });

  it("takes an address with nonsense as one without", () => {
    expect(names("show=everything&sort=colour")).toEqual(names(""));
  });

  it("writes an address that reads back as the same list", () => {
    const query = { q: "mule & co", show: "bay", sort: "customer", down: true } as const;
    const address = counterAddress(query);
    expect(readCounterQuery(new URL(address, "http://shop").searchParams)).toEqual(query);
  });
});
