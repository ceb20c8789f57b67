import { describe, expect, it } from "vitest";
import { inches, mm } from "../../domain/units/length";
import { lengthIn, offLine, onTape, smallLength, understood, withinLength, withUnit } from "./lengths";

describe("lengths in words", () => {
  it("stand as on the tape, in the shop's unit", () => {
    expect(onTape(inches(82.375), "in")).toBe("82 3/8");
    expect(onTape(inches(82.375), "mm")).toBe("2092 mm");
    expect(withUnit(inches(0.5), "in")).toBe("1/2 in");
  });

  it("say the side of the line in a word", () => {
    expect(offLine(inches(30.25), "in")).toBe("30 1/4 left");
    expect(offLine(inches(-14), "in")).toBe("14 right");
    expect(offLine(mm(0.2), "in")).toBe("on the line");
    expect(offLine(mm(0.2), "mm")).toBe("on the line");
  });

  it("meet within a thirty-second at best", () => {
    expect(withinLength(mm(0.1), "in")).toBe("1/32 in");
    expect(withinLength(mm(0.8), "mm")).toBe("0.8 mm");
  });

  it("are finer where two are compared", () => {
    expect(smallLength(mm(0.8), "in")).toBe("1/32 in");
    expect(smallLength(mm(-0.1), "in")).toBe("under 1/32 in");
    expect(smallLength(mm(-0.84), "mm")).toBe("0.8 mm");
  });
});

describe("what an entry is understood as", () => {
  it("is said back in both units, the shop's first", () => {
    expect(understood("26 1/2", "in")).toEqual({ mm: inches(26.5), words: "26 1/2 in, 673.1 mm" });
    expect(understood("673.1", "mm")).toMatchObject({ words: "673.1 mm, 26 1/2 in" });
  });

  it("is nothing while nothing is typed, and words while it cannot be read", () => {
    expect(understood("  ", "in")).toBeNull();
    expect(understood("26 1/", "in")).toHaveProperty("problem");
    expect(lengthIn("26 1/", "in")).toBeNull();
    expect(lengthIn("26", "in")).toBe(inches(26));
  });
});
