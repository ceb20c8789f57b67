import { describe, expect, it } from "vitest";
import { springForm } from "./spring";

const good = { rackNumber: "14", length: "52", frontHalf: "24 1/2", leaves: "5", leafWidth: "2.5", note: "" };
const faultsOf = (raw: Record<string, unknown>) => {
  const result = springForm("in").safeParse(raw);
  return Object.fromEntries(
    (result.error?.issues ?? []).map((issue) => [issue.path.join("."), issue.message]),
  );
};

describe("the spring form", () => {
  it("reads a spring as it was measured", () => {
    const read = springForm("in").parse(good);
    expect(read.frontHalf).toEqual({ mm: 24.5 * 25.4, typed: "24 1/2" });
    expect(read.rackNumber).toBe(14);
  });

  it("does not take a front half that is the whole spring or more", () => {
    for (const frontHalf of ["52", "60"])
      expect(faultsOf({ ...good, frontHalf }).frontHalf).toMatch(/shorter than the spring/);
    expect(faultsOf({ ...good, frontHalf: "51 63/64" })).toEqual({});
  });

  it("names every fault at once", () => {
    const faults = faultsOf({ rackNumber: "0", length: "5", frontHalf: "", leaves: "many", leafWidth: "9" });
    expect(Object.keys(faults).sort()).toEqual(["frontHalf", "leafWidth", "leaves", "length", "rackNumber"]);
    expect(faults.length).toContain("This reads 5 in. A leaf spring is between");
  });
});
