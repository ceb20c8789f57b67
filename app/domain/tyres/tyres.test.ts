import { describe, expect, it } from "vitest";
import { mm, toInches } from "../units/length";
import { ruleDiameter, turnsPerKilometre, tyreSize } from "./designation";
import { loadOf, speedOf } from "./load-index";

const size = (text: string) => {
  const read = tyreSize(text);
  if (!read.ok) throw new Error(read.problem);
  return read.value;
};

describe("a tyre's size", () => {
  it("is read in every way it is written", () => {
    expect(size("lt285/75r16 126/123q")).toMatchObject({
      service: "LT",
      width: 285,
      aspect: 0.75,
      rimInches: 16,
      loadIndex: 126,
      speedSymbol: "Q",
    });
    expect(size("P205/60R15").service).toBe("P");
    expect(size(" 265/70 R17 ").diameter).toBeCloseTo(802.8, 9);
    const flotation = size("35 × 12,50 R15 LT");
    expect(flotation).toMatchObject({ system: "flotation", aspect: null, service: "LT" });
    expect(toInches(flotation.diameter)).toBeCloseTo(35, 9);
    expect(toInches(flotation.sectionHeight)).toBeCloseTo(10, 9);
  });
  it.each(["", "big", "265/70", "26570R17", "999/70R17", "265/70R99", "15x12.50R35"])(
    "%j is none, in words",
    (text) => expect(tyreSize(text)).toMatchObject({ ok: false, problem: expect.stringMatching(/\w+/) }),
  );
  it("has a rule diameter only where the rule has one", () => {
    expect(ruleDiameter(size("265/70R17"))).toBe(804);
    expect(ruleDiameter(size("35x12.50R15"))).toBeNull();
    expect(ruleDiameter(size("265/70R24"))).toBeNull();
  });
  it("turns so often in a kilometre", () => {
    expect(turnsPerKilometre(mm(400))).toBeCloseTo(397.887, 3);
    expect(() => turnsPerKilometre(mm(0))).toThrow(RangeError);
  });
  it("does not guess what its index or symbol means", () => {
    expect([loadOf(112), loadOf(113), speedOf("q"), speedOf("Z")]).toEqual([1120, null, 160, null]);
  });
});
