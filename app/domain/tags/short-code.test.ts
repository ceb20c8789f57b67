import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CODE_ALPHABET, CODE_LENGTH, codeFromBytes, readCode } from "./short-code";

describe("codeFromBytes", () => {
  it("uses only signs that are not taken for one another", () => {
    fc.assert(
      fc.property(fc.uint8Array({ minLength: 64, maxLength: 64 }), (bytes) => {
        const code = codeFromBytes(bytes);
        // Sixty-four bytes that are all at or above the limit do not happen by chance, but may here.
        if (code === null) return bytes.filter((byte) => byte < 253).length < CODE_LENGTH;
        return code.length === CODE_LENGTH && [...code].every((sign) => CODE_ALPHABET.includes(sign));
      }),
    );
  });
  it("answers null when too few bytes can be used", () => {
    expect(codeFromBytes(new Uint8Array([255, 254, 253, 0, 1, 2]))).toBeNull();
  });
  it("gives every sign the same chance over all usable bytes", () => {
    const counts = new Map<string, number>();
    for (let byte = 0; byte < 253; byte++) {
      const sign = codeFromBytes(new Uint8Array([byte, 0, 0, 0]))?.[0] ?? "";
      counts.set(sign, (counts.get(sign) ?? 0) + 1);
    }
    expect(new Set(counts.values())).toEqual(new Set([11]));
    expect(counts.size).toBe(CODE_ALPHABET.length);
  });
});

describe("readCode", () => {
  it.each([
    ["M3XF", "M3XF"],
    [" m3xf ", "M3XF"],
    ["m3-xf", "M3XF"],
    ["M3 XF", "M3XF"],
    ["http://192.168.1.20:3000/t/M3XF", "M3XF"],
    ["https://shop.example/t/m3xf?from=tag", "M3XF"],
  ])("reads %s", (typed, code) => expect(readCode(typed)).toBe(code));
  it.each(["", "M3X", "M3XFF", "M3X0", "M3XO", "https://elsewhere.example/x/M3XF/y", "<script>"])(
    "does not read %s",
    (typed) => expect(readCode(typed)).toBeNull(),
  );
});
