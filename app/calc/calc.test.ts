import { describe, expect, it } from "vitest";
import { fieldLines } from "./fields";
import { jsonSchema, openApi } from "./openapi";
import { CALCS } from "./registry";
import { runCalc } from "./run-calc";

/** Numbers to 6 significant figures, whatever they lie in: the last digits are the machine's. */
const rounded = (value: unknown): unknown => {
  if (typeof value === "number") return Math.abs(value) < 1e-9 ? 0 : Number(value.toPrecision(6));
  if (Array.isArray(value)) return value.map(rounded);
  if (value && typeof value === "object")
    return Object.fromEntries(Object.entries(value).map(([key, one]) => [key, rounded(one)]));
  return value;
};

describe.each(CALCS.map((calc) => [calc.name, calc] as const))("%s", (_name, calc) => {
  it("has worked examples, and each comes out", () => {
    expect(calc.examples.length).toBeGreaterThanOrEqual(2);
    for (const { title, input, output } of calc.examples) {
      const answer = runCalc(calc, input);
      expect(answer.status, `${title}: ${JSON.stringify(answer.body)}`).toBe(200);
      expect(rounded((answer.body as { result: unknown }).result), title).toEqual(rounded(output));
    }
  });
  it("names the field when something cannot be read", () => {
    for (const nonsense of [null, 7, [], { nonsense: true }]) {
      const answer = runCalc(calc, nonsense);
      expect(answer.status).toBe(400);
      expect((answer.body as { fields: unknown[] }).fields.length).toBeGreaterThan(0);
    }
  });
  it("describes every field in words", () => {
    const silent = fieldLines(calc.input, "input").filter(
      (line) => line.words === "" && !line.type.startsWith('"'),
    );
    expect(silent.map((line) => line.path)).toEqual([]);
  });
  it("has schemas that can be written down", () => {
    const kinds = Object.keys(jsonSchema(calc.input, "input"));
    expect(kinds.some((kind) => ["type", "oneOf", "anyOf"].includes(kind))).toBe(true);
    expect(Object.keys(jsonSchema(calc.output, "output")).length).toBeGreaterThan(0);
  });
});

describe("the description", () => {
  it("lists every calculation once", () => {
    const { paths } = openApi("http://shop.example");
    expect(Object.keys(paths)).toEqual(CALCS.map((calc) => `/calc/${calc.name}`));
    expect(new Set(CALCS.map((calc) => calc.name)).size).toBe(CALCS.length);
  });
});
