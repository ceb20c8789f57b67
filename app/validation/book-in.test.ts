import { describe, expect, it } from "vitest";
import { BUILD_TEMPLATES } from "../domain/builds/stages";
import { bookInForm } from "./book-in";

const good = {
  customerId: "",
  customerName: " Rosa Lind ",
  customerPhone: "555 0142",
  customerEmail: "",
  kind: "short-bed-pickup",
  nickname: "Old Mule",
  length: "15' 9",
  width: "75",
  wanted: "Front axle forward",
  tyre: "",
  loadedRadius: "16 1/2",
  tyreRadius: "",
  approach: "40°",
  promiseDate: "2026-03-09",
  promiseTime: "",
  template: "springs-only",
  "stage-0": "on",
  "stage-2": "on",
  "hours-0": "2,5",
  "hours-2": "1",
};
const faultsOf = (raw: Record<string, unknown>) => {
  const result = bookInForm("in").safeParse(raw);
  return Object.fromEntries(
    (result.error?.issues ?? []).map((issue) => [issue.path.join("."), issue.message]),
  );
};

describe("the book-in form", () => {
  it("reads lengths as on the tape, keeps them as typed, and leaves out what was not asked for", () => {
    const read = bookInForm("in").parse(good);
    expect(read.length).toEqual({ mm: 189 * 25.4, typed: "15' 9" });
    expect(read.loadedRadius).toEqual({ mm: 16.5 * 25.4, typed: "16 1/2" });
    expect(read.tyreRadius).toBeNull();
    expect(read.wheelbase).toBeNull();
    expect(read.approach).toBe(40);
    expect(read.promise).toEqual({ date: "2026-03-09", time: "17:00" });
    expect(read.customer).toEqual({ id: null, name: "Rosa Lind", phone: "555 0142", email: "" });
  });

  it("takes a bare number in the shop's unit", () => {
    expect(bookInForm("mm").parse({ ...good, length: "4800", width: "1900" }).length.mm).toBe(4800);
  });

  it("keeps the ticked stages in their order with the hours as typed", () => {
    expect(bookInForm("in").parse(good).stages).toEqual([
      { index: 0, hours: 2.5 },
      { index: 2, hours: 1 },
    ]);
  });

  it("ignores ticks beyond the chosen list", () => {
    const last = BUILD_TEMPLATES["springs-only"].stages.length;
    expect(bookInForm("in").parse({ ...good, [`stage-${last}`]: "on" }).stages).toHaveLength(2);
  });

  it("names every fault at once, in a sentence", () => {
    const faults = faultsOf({
      customerEmail: "rosa at home",
      kind: "boat",
      nickname: "  ",
      length: "15 feet and a bit",
      width: "5",
      wanted: "",
      loadedRadius: "3",
      approach: "steep",
      promiseTime: "15:00",
      template: "none",
      "hours-1": "many",
    });
    expect(Object.keys(faults).sort()).toEqual(
      [
        "approach",
        "customerEmail",
        "customerName",
        "hours-1",
        "kind",
        "length",
        "loadedRadius",
        "nickname",
        "promiseDate",
        "template",
        "wanted",
        "width",
      ].sort(),
    );
    expect(faults.width).toBe("This reads 5 in. A vehicle is between 15 3/4 in and 16 ft 5 in.");
    for (const words of Object.values(faults)) expect(words).toMatch(/[.?]$/);
  });

  it("names what an empty form lacks", () => {
    expect(Object.keys(faultsOf({})).sort()).toEqual(
      ["customerName", "kind", "length", "nickname", "template", "wanted", "width"].sort(),
    );
  });

  it("does not take a customer's number that is none", () => {
    expect(bookInForm("in").parse({ ...good, customerId: "1 or 1" }).customer).toEqual({ id: 0 });
  });
});
