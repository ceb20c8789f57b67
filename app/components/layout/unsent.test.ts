import { describe, expect, it } from "vitest";
import {
  dropUnsent,
  keepUnsent,
  parseUnsent,
  refuseUnsent,
  sendable,
  type Unsent,
  unsentKey,
  unsentOf,
  unsentWords,
} from "./unsent";

const reading = (clientKey: string, over: Partial<Unsent> = {}): Unsent => ({
  clientKey,
  to: "/layouts/3/drop",
  fields: { point: "axle-end", side: "left", "tape.A": "68 5/8" },
  what: "Axle end, left",
  subject: "axle-end.left",
  by: "Pilar Echeverri",
  keptAt: "2026-06-01T10:00:00.000Z",
  refused: null,
  ...over,
});

describe("readings kept on the tablet", () => {
  it("come back from store as they were kept", () => {
    const list = [reading("a"), reading("b", { refused: "Level void" })];
    expect(parseUnsent(JSON.stringify(list))).toEqual(list);
  });

  it("survive a torn store: what cannot be read is left out, the rest stays", () => {
    expect(parseUnsent("[{")).toEqual([]);
    expect(parseUnsent(null)).toEqual([]);
    expect(parseUnsent('{"a":1}')).toEqual([]);
    const torn = [{ clientKey: "x" }, null, reading("a"), { ...reading("b"), fields: { point: 3 } }];
    expect(parseUnsent(JSON.stringify(torn))).toEqual([reading("a")]);
  });

  it("count once by their key, and keep their order", () => {
    const first = keepUnsent(keepUnsent([], reading("a")), reading("b"));
    const again = keepUnsent(first, reading("a", { fields: { point: "axle-end", "tape.A": "68 9/16" } }));
    expect(again.map((one) => one.clientKey)).toEqual(["a", "b"]);
    expect(again[0]?.fields["tape.A"]).toBe("68 9/16");
  });

  it("leave the list only when confirmed or let go", () => {
    expect(dropUnsent([reading("a"), reading("b")], "a").map((one) => one.clientKey)).toEqual(["b"]);
    expect(dropUnsent([reading("a")], "never kept")).toHaveLength(1);
  });

  it("are never sent under another person's name, nor again once refused", () => {
    const list = refuseUnsent(
      [reading("a"), reading("b"), reading("c", { by: "Wes Tran" })],
      "a",
      "Level void",
    );
    expect(sendable(list, "Pilar Echeverri").map((one) => one.clientKey)).toEqual(["b"]);
    expect(list[0]?.refused).toBe("Level void");
  });

  it("are found by their cell, the newest first", () => {
    const list = [reading("a"), reading("b")];
    expect(unsentOf(list, "axle-end.left")?.clientKey).toBe("b");
    expect(unsentOf(list, "axle-end.right")).toBeNull();
  });

  it("are counted in words, refused ones apart", () => {
    expect(unsentWords([])).toBeNull();
    expect(unsentWords([reading("a")])).toBe("1 reading kept here, not sent");
    expect(unsentWords([reading("a"), reading("b"), reading("c", { refused: "no" })])).toBe(
      "2 readings kept here, not sent",
    );
  });

  it("are stored apart for each layout", () => {
    expect(unsentKey(3)).not.toBe(unsentKey(4));
  });
});
