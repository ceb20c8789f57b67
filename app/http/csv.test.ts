import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import { csvOf } from "./csv";

describe("comma-separated values", () => {
  it("come back as they went in, commas, quotes and lines in them or not", () => {
    const rows = [
      ["Opening, front edge", "2' 2 1/2\"", "two\nlines"],
      ["", "26 1/2", "ü"],
    ];
    const text = csvOf(["point", "typed", "words"], rows);
    expect(text.startsWith("\uFEFF")).toBe(true);
    expect(Papa.parse<string[]>(text.slice(1).trimEnd()).data).toEqual([
      ["point", "typed", "words"],
      ...rows,
    ]);
    expect(text.split("\r\n")[0]).toBe("\uFEFFpoint,typed,words");
  });
  it("start no formula, and leave lengths alone", () => {
    const cell = (value: string) => csvOf(["a"], [[value]]).split("\r\n")[1];
    for (const evil of ["=1+1", "@SUM(A1)", "+cmd", "-cmd|x", "\t=1"]) expect(cell(evil)).toMatch(/^"?'/);
    for (const length of ["-1/8", "+26 1/2", "-3.2 mm", "-5"]) expect(cell(length)).toBe(length);
  });
});
