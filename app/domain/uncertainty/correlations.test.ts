import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { correlatedGroups, correlationMatrix } from "./correlations";

describe("correlationMatrix", () => {
  it("writes what is given on both sides", () =>
    expect(correlationMatrix(["a", "b"], [{ a: "a", b: "b", r: 0.5 }])).toEqual({
      ok: true,
      value: [
        [1, 0.5],
        [0.5, 1],
      ],
    }));
  it("takes every matrix that comes from common causes", () => {
    const causes = fc.array(fc.integer({ min: -9, max: 9 }), { minLength: 3, maxLength: 3 });
    fc.assert(
      fc.property(fc.array(causes, { minLength: 2, maxLength: 6 }), (things) => {
        const size = (v: number[]) => Math.hypot(...v);
        const names = things.map((_, i) => `x${i}`);
        const pairs = things.flatMap((v, i) =>
          things.slice(i + 1).flatMap((w, k) => {
            const scale = size(v) * size(w);
            const r = v.reduce((sum, one, c) => sum + one * (w[c] ?? 0), 0) / scale;
            return scale > 0 ? [{ a: `x${i}`, b: `x${i + 1 + k}`, r: Math.max(-1, Math.min(1, r)) }] : [];
          }),
        );
        return correlationMatrix(names, pairs).ok;
      }),
    );
  });
  it.each([-0.6, -1])("refuses three things that each go against the others by %d", (r) =>
    expect(
      correlationMatrix(
        ["a", "b", "c"],
        [
          { a: "a", b: "b", r },
          { a: "b", b: "c", r },
          { a: "a", b: "c", r },
        ],
      ),
    ).toEqual({ ok: false, problem: "These correlations contradict each other." }),
  );
  it("refuses what is no number", () =>
    expect(correlationMatrix(["a", "b"], [{ a: "a", b: "b", r: Number.NaN }]).ok).toBe(false));
});

describe("correlatedGroups", () => {
  it("puts together what hangs together, also through a third", () => {
    expect(
      correlatedGroups([
        [1, 0.5, 0],
        [0.5, 1, 0],
        [0, 0, 1],
      ]),
    ).toEqual([[0, 1], [2]]);
    expect(
      correlatedGroups([
        [1, 0, 0, 0.1],
        [0, 1, 0, 0],
        [0, 0, 1, 0.1],
        [0.1, 0, 0.1, 1],
      ]),
    ).toEqual([[0, 2, 3], [1]]);
  });
});
