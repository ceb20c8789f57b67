import { describe, expect, it } from "vitest";
import { CODE_ALPHABET } from "../../domain/tags/short-code";
import { readScan } from "./read-scan";

const wordsOf = (typed: string) => {
  const result = readScan(typed);
  return result.ok ? null : result.words;
};

describe("readScan", () => {
  it("takes a code however it was typed, and the address in the picture", () => {
    for (const typed of ["m3xf", " M3-XF ", "m3 xf", "http://192.168.1.20:3000/t/M3XF"])
      expect(readScan(typed)).toEqual({ ok: true, code: "M3XF" });
  });

  it("says what a sign that no tag carries may be", () => {
    expect(wordsOf("M3XO")).toBe("There is no O on our tags: is it C, D or Q?");
    expect(wordsOf("m3x8")).toBe("There is no 8 on our tags: is it 3, 6 or R?");
  });

  it("suggests only signs that tags carry", () => {
    for (const sign of "0O1IL2Z5S8BUV") {
      const suggested = /is it (.+)\?$/.exec(wordsOf(`M3X${sign}`) ?? "")?.[1] ?? "";
      const signs = suggested.split(/, | or /);
      expect(signs.length).toBeGreaterThan(0);
      for (const one of signs) expect(CODE_ALPHABET).toContain(one);
    }
  });

  it("counts the signs", () => {
    expect(wordsOf("M")).toBe("A tag has 4 signs; here is 1.");
    expect(wordsOf("M3X")).toBe("A tag has 4 signs; here are 3.");
    expect(wordsOf("M3XFF")).toBe("A tag has 4 signs; here are 5.");
    expect(wordsOf("  ")).toBe("Type the 4 signs under the picture on the tag.");
  });

  it("knows a picture that is not ours", () => {
    expect(wordsOf("https://example.org/menu")).toBe(
      "That picture is not one of our tags. Look for the tag that hangs on the vehicle.",
    );
    expect(wordsOf("M3X!")).toContain("There is no “!” on our tags");
  });
});
