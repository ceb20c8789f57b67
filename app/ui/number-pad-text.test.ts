import { describe, expect, it } from "vitest";
import { asFeet, fractionSteps, readPad, setFraction, setTenth, typeDigit, wipe } from "./number-pad-text";

const type = (keys: string, unit: "in" | "mm" = "in", from = "") =>
  [...keys].reduce((text, key) => typeDigit(text, Number(key), unit), from);

describe("the number pad's entry", () => {
  it("grows by digits and takes one fraction", () => {
    expect(type("23")).toBe("23");
    expect(setFraction("23", 13, 16)).toBe("23 13/16");
    expect(setFraction("23 13/16", 8, 16)).toBe("23 1/2");
    expect(setFraction("23 1/2", 0, 16)).toBe("23");
    expect(setFraction("", 1, 16)).toBe("1/16");
    expect(setFraction("23", 27, 32)).toBe("23 27/32");
  });
  it("begins anew when a digit follows a fraction", () => {
    expect(type("4", "in", "23 13/16")).toBe("4");
  });
  it("knows feet", () => {
    expect(asFeet("2")).toBe("2'");
    expect(setFraction(type("2", "in", "2'"), 1, 2)).toBe("2' 2 1/2");
    expect(asFeet("2' 2")).toBe("2' 2");
    expect(asFeet("")).toBe("");
  });
  it("wipes piece by piece", () => {
    expect(wipe("2' 23 1/2", "in")).toBe("2' 23");
    expect(wipe("2' 23", "in")).toBe("2' 2");
    expect(wipe("2'", "in")).toBe("");
    expect(wipe("nonsense", "in")).toBe("");
  });
  it("does not lead with noughts, nor grow without end", () => {
    expect(type("007")).toBe("7");
    expect(type("123456")).toBe("1234");
  });
  it("keeps centimetres with tenths", () => {
    expect(type("67", "mm")).toBe("67 cm");
    expect(setTenth("67 cm", 3)).toBe("67.3 cm");
    expect(type("5", "mm", "67.3 cm")).toBe("5 cm");
    expect(wipe("67.3 cm", "mm")).toBe("67 cm");
    expect(wipe("6 cm", "mm")).toBe("");
  });
  it("reads a fraction in steps", () => {
    expect(fractionSteps("23 13/16", 16)).toBe(13);
    expect(fractionSteps("23 1/2", 32)).toBe(16);
    expect(readPad("1/2")).toMatchObject({ whole: "", numerator: 1, denominator: 2 });
  });
});
