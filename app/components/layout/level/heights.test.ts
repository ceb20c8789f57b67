import { describe, expect, it } from "vitest";
import { formatInches, inches } from "../../../domain/units/length";
import { acrossOf, extrasIn, firstTexts, heightsNow, nextUnread, placesOf, postedHeights } from "./heights";

const places = placesOf(0);
const stands = {
  "x.left-front": "108",
  "x.right-front": "108",
  "x.left-rear": "0",
  "x.right-rear": "0",
  "y.left-front": "15",
  "y.right-front": "15",
  "y.left-rear": "15",
  "y.right-rear": "15",
};
const heights = {
  "height.left-front": "24 1/16",
  "height.right-front": "24 5/16",
  "height.left-rear": "23 13/16",
  "height.right-rear": "24 3/16",
};
const shim = inches(1 / 16);

describe("a level by the heights that are typed", () => {
  it("leans as the numbers say, and tells each stand what to do", () => {
    const now = heightsNow(places, { ...stands, ...heights }, "in", shim);
    expect(now.missing).toBeNull();
    expect(now.level?.rightHigh).toBeCloseTo(0.6, 2);
    expect(now.level?.noseHigh).toBeCloseTo(0.1, 2);
    expect([...now.moves].map(([id, raise]) => [id, formatInches(raise)])).toEqual([
      ["left-front", "5/16"],
      ["right-front", "0"],
      ["left-rear", "1/2"],
      ["right-rear", "3/16"],
    ]);
    expect(Math.abs(now.after?.rightHigh ?? 1)).toBeLessThan(0.005);
  });

  it("waits for what is missing, in words", () => {
    expect(heightsNow(places, heights, "in", shim).missing).toBe("Say where the stands are first.");
    const { "height.left-rear": _, ...three } = heights;
    expect(heightsNow(places, { ...stands, ...three }, "in", shim).missing).toBe(
      "One stand is still to be read.",
    );
    expect(heightsNow(places, { ...stands, "height.left-front": "24 1/" }, "in", shim).missing).toBe(
      "4 stands are still to be read.",
    );
  });

  it("knows the side of a corner by its name, of another stand by its sign", () => {
    expect(places.map((place) => Math.sign(acrossOf(place, stands, "in") ?? 0))).toEqual([1, -1, 1, -1]);
    const extra = placesOf(1)[4];
    if (!extra) throw new Error("no extra stand");
    expect(acrossOf(extra, { "y.extra-1": "-4" }, "in")).toBe(inches(-4));
  });
});

describe("what is posted", () => {
  it("leaves out stands that were not read, and signs the right side", () => {
    const fields = postedHeights(places, { ...stands, "height.right-rear": " 24 3/16 " });
    expect(fields).toEqual({
      method: "heights",
      "height.right-rear": "24 3/16",
      "x.right-rear": "0",
      "y.right-rear": "-15",
    });
  });
});

describe("a check begins with", () => {
  it("nothing, before the first one", () => expect(firstTexts(null)).toEqual({}));

  it("counts the stands beyond the corners", () => {
    expect(extrasIn(["left-front", "height.extra-2", "extra-1"])).toBe(2);
    expect(extrasIn(["left-front"])).toBe(0);
  });
});

describe("the next stand to read", () => {
  it("goes round the frame to the first that is empty", () => {
    expect(nextUnread(places, { "height.right-front": "24" }, "left-front")?.id).toBe("left-rear");
    expect(nextUnread(places, heights, "left-front")).toBeNull();
    expect(nextUnread(places, { ...heights, "height.left-front": "" }, "right-rear")?.id).toBe("left-front");
  });
});
