import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm, toInches } from "../units/length";
import { leafOf, mainLeaf, turnedLeaf } from "./main-leaf";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const near = (...values: number[]) => values.map((n) => expect.closeTo(n, 9));

describe("mainLeaf", () => {
  it("takes a spring either way round", () => {
    const spring = { id: 1, rackNumber: 7, length: inches(52), frontHalf: inches(24) };
    const [as, turned] = [value(leafOf(spring)), value(leafOf(spring, { turned: true }))];
    expect([as.front, as.rear, as.clamped].map((length) => length / 25.4)).toEqual(near(24, 28, 0));
    expect([turned.front, turned.rear].map(toInches)).toEqual(near(28, 24));
    const moved = value(leafOf(spring, { pinAhead: inches(1) }));
    expect([toInches(moved.front), toInches(moved.rear)]).toEqual(near(23, 29));
    const eyes = { front: mm(20), rear: mm(0) };
    expect(value(leafOf(spring, { turned: true, eyeOffset: eyes })).eyeOffset).toEqual({
      front: 0,
      rear: 20,
    });
    expect(turnedLeaf(value(leafOf(spring, { eyeOffset: eyes })))).toEqual(
      value(leafOf(spring, { turned: true, eyeOffset: eyes })),
    );
  });
  it.each([
    [{ front: mm(0), rear: mm(600) }, /Both halves/],
    [{ front: mm(600), rear: mm(600), clamped: mm(-1) }, /negative/],
    [{ front: mm(60), rear: mm(600), clamped: mm(120) }, /nothing is left/],
    [{ front: mm(100), rear: mm(600), eyeOffset: { rear: mm(26) } }, /too far off/],
  ])("says what is wrong with %j", (input, words) => expect(fault(mainLeaf(input))).toMatch(words));
});
