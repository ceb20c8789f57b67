import { describe, expect, it } from "vitest";
import { topics } from "./topics";

/* Every check against work from outside, a table per topic. docs/checks.md lists them: `npm run checks`. */

for (const { topic, checks } of topics)
  describe(topic, () => {
    for (const check of checks)
      it(`${check.about} (${check.source.name}${check.source.place ? `, ${check.source.place}` : ""}; ${check.source.status})`, () => {
        const got = check.got();
        if (typeof check.want === "string") {
          expect(got).toBe(check.want);
          return;
        }
        const wants = typeof check.want === "number" ? [check.want] : check.want;
        const gots = typeof got === "number" ? [got] : got;
        expect(gots).toHaveLength(wants.length);
        if (check.within === undefined) throw new Error("A check of numbers says how near is near enough.");
        wants.forEach((want, i) => {
          expect(Math.abs(Number(gots[i]) - want), `${String(gots[i])} for ${want}`).toBeLessThanOrEqual(
            check.within as number,
          );
        });
      });
  });
