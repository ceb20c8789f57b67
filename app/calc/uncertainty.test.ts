import { describe, expect, it } from "vitest";
import { runCalc } from "./run-calc";
import { uncertaintyCalc } from "./uncertainty";

const ask = (input: unknown) => {
  const { status, body } = runCalc(uncertaintyCalc, input);
  return { status, words: JSON.stringify(body) };
};
const sum = (inputs: unknown[], rest: object = {}) => ask({ model: "sum", inputs, ...rest });

describe("what the calculation of uncertainty refuses", () => {
  it.each([
    ["nothing of how unsure it is", { name: "a", value: 1 }, "a needs one of these"],
    [
      "two ways of saying it",
      { name: "a", value: 1, uncertainty: 1, readings: [1, 2] },
      "a needs one of these",
    ],
    ["a value besides readings", { name: "a", value: 1, readings: [1, 2] }, "follow from them"],
    ["no value", { name: "a", uncertainty: 1 }, "a needs a value or readings"],
  ])("%s", (_what, input, words) => {
    const came = sum([input]);
    expect(came.status).not.toBe(200);
    expect(came.words).toContain(words);
  });
  it("two inputs of one name, and both a coverage and a factor", () => {
    const a = { name: "a", value: 1, uncertainty: 1 };
    expect(sum([a, a]).words).toContain("Two inputs have the same name");
    expect(sum([a], { coverage: 0.9, coverageFactor: 2 }).words).toContain("one or the other");
  });
  it("readings said to be taken together that cannot be", () => {
    const a = { name: "a", readings: [1, 2, 4] };
    expect(sum([a], { readTogether: true }).words).toContain("two inputs need readings");
    expect(sum([a, { name: "b", readings: [1, 2] }], { readTogether: true }).words).toContain(
      "as many readings",
    );
  });
  it("a product that is no number", () => {
    const came = ask({ model: "product", inputs: [{ name: "a", value: 0, uncertainty: 1, power: -1 }] });
    expect(came.words).toContain("no number with these values");
  });
  it("a correlation from readings that is given besides", () => {
    const read = [
      { name: "a", readings: [1, 2, 4] },
      { name: "b", readings: [2, 1, 3] },
    ];
    const besides = { readTogether: true, correlations: [{ a: "a", b: "b", r: 0.1 }] };
    expect(sum(read, besides).words).toContain("given twice");
  });
});

it("lets what was read together and never varied stand alone", () => {
  const read = [
    { name: "a", readings: [1, 2, 4] },
    { name: "b", readings: [2, 2, 2] },
  ];
  expect(sum(read, { readTogether: true }).status).toBe(200);
});
