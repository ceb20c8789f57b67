import { describe, expect, it } from "vitest";
import { pagePath } from "./path";
import { safeReturn } from "./request.server";

describe("the page behind an address", () => {
  it.each([
    ["/", "/"],
    ["/_root.data", "/"],
    ["/_.data", "/"],
    ["/floor", "/floor"],
    ["/floor/", "/floor"],
    ["/floor//", "/floor"],
    ["/floor.data", "/floor"],
    ["/floor/_.data", "/floor"],
    ["/floor/.data", "/floor"],
    ["/%66loor", "/floor"],
    ["/api/v1/calc/leaf/_.data", "/api/v1/calc/leaf"],
  ])("%s is %s", (address, page) => expect(pagePath(address)).toBe(page));
  it("is none when the address cannot be read", () => expect(pagePath("/%E0%A4%A")).toBeNull());
});

describe("where one goes on after signing in", () => {
  it.each(["/floor", "/layouts/1/step/drops?x=1", "/springs?q=a%20b"])("%s is ours", (to) =>
    expect(safeReturn(to)).toBe(to),
  );
  it.each([
    null,
    "",
    "floor",
    "//evil.example",
    "/\\evil.example",
    "/\t/evil.example",
    "/\n/x",
    "/\u0000/x",
    "https://evil.example",
    "/floor?q=Ā",
    "/ x",
  ])("%j is not", (to) => expect(safeReturn(to)).toBe("/"));
});
