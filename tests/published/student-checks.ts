import { cumulativeStdNormalProbability } from "simple-statistics";
import { coverageFactor, coverageOf, incompleteBeta } from "../../app/domain/uncertainty/student";
import type { Check, Source } from "./check";

/* Student's t and what stands behind it. */

const ENDLESS = Number.POSITIVE_INFINITY;
const G2: Source = { name: "JCGM 100:2008", place: "table G.2", status: "recomputed" };
/** The coverages at the head of the table: three of them are those of one, two and three normal deviations. */
const head = () => {
  const within = (z: number) => coverageOf(z, ENDLESS);
  return [within(1), 0.9, 0.95, within(2), 0.99, within(3)];
};
/** A row of the table, as printed to two places. */
const row = (freedom: number, want: readonly number[]): Check => ({
  about: `t for 68.27, 90, 95, 95.45, 99 and 99.73 %, ${freedom === ENDLESS ? "endless" : freedom} degree${freedom === 1 ? "" : "s"} of freedom`,
  source: G2,
  got: () => head().map((coverage) => coverageFactor(coverage, freedom)),
  want,
  within: 0.005,
});

/** Student's t where it has a closed form. */
const closed = (freedom: 1 | 2 | 4, of: (coverage: number) => number, form: string): Check => {
  const coverages = [0.5, 0.9, 0.95, 0.99, 0.999];
  return {
    about: `t for 50, 90, 95, 99 and 99.9 % and ${freedom} degrees of freedom in closed form: ${form}; ratios`,
    source: { name: "Student's t in closed form", place: `${freedom} degrees of freedom`, status: "derived" },
    got: () => coverages.map((coverage) => coverageFactor(coverage, freedom) / of(coverage)),
    want: coverages.map(() => 1),
    within: 1e-10,
  };
};

/** Share of Student's t within ±t by adding up its density, with Simpson's rule. */
function byArea(t: number, freedom: number): number {
  const density = (x: number) => (1 + (x * x) / freedom) ** (-(freedom + 1) / 2);
  const area = (f: (s: number) => number, end: number) => {
    const n = 4000;
    const h = end / n;
    let sum = f(0) + f(end);
    for (let i = 1; i < n; i++) sum += f(i * h) * (i % 2 === 1 ? 4 : 2);
    return (sum * h) / 3;
  };
  // x = s/(1 − s) brings the endless tail in; at its end the density is nothing.
  const whole = area((s) => (s >= 1 ? 0 : density(s / (1 - s)) / (1 - s) ** 2), 1);
  return area(density, t) / whole;
}

/** Ways to hit so often in ten. */
const TEN = [1, 10, 45, 120, 210, 252, 210, 120, 45, 10, 1];

export const STUDENT: Check[] = [
  row(1, [1.84, 6.31, 12.71, 13.97, 63.66, 235.8]),
  row(2, [1.32, 2.92, 4.3, 4.53, 9.92, 19.21]),
  row(3, [1.2, 2.35, 3.18, 3.31, 5.84, 9.22]),
  row(4, [1.14, 2.13, 2.78, 2.87, 4.6, 6.62]),
  row(5, [1.11, 2.02, 2.57, 2.65, 4.03, 5.51]),
  row(6, [1.09, 1.94, 2.45, 2.52, 3.71, 4.9]),
  row(8, [1.07, 1.86, 2.31, 2.37, 3.36, 4.28]),
  row(10, [1.05, 1.81, 2.23, 2.28, 3.17, 3.96]),
  row(16, [1.03, 1.75, 2.12, 2.17, 2.92, 3.54]),
  row(20, [1.03, 1.72, 2.09, 2.13, 2.85, 3.42]),
  row(50, [1.01, 1.68, 2.01, 2.05, 2.68, 3.16]),
  row(ENDLESS, [1, 1.645, 1.96, 2, 2.576, 3]),
  closed(1, (p) => Math.tan((Math.PI * p) / 2), "tan(πp/2)"),
  closed(2, (p) => p * Math.sqrt(2 / (1 - p * p)), "p√(2/(1 − p²))"),
  closed(
    4,
    (p) => {
      const a = 1 - p * p;
      return 2 * Math.sqrt(Math.cos(Math.acos(Math.sqrt(a)) / 3) / Math.sqrt(a) - 1);
    },
    "2√(cos(⅓ arccos √α)/√α − 1), α = 1 − p²",
  ),
  {
    about: "share within ±1, ±2 and ±3 for 3, 7 and 30 degrees of freedom by adding up the density",
    source: { name: "Simpson's rule", place: "on Student's density", status: "derived" },
    got: () => [3, 7, 30].flatMap((freedom) => [1, 2, 3].map((t) => coverageOf(t, freedom))),
    want: [3, 7, 30].flatMap((freedom) => [1, 2, 3].map((t) => byArea(t, freedom))),
    within: 1e-9,
  },
  {
    about: "incomplete beta function I(0.3; k, 11 − k) as the chance of k hits or more in ten at 0.3",
    source: { name: "Binomial law", place: "added up", status: "derived" },
    got: () => [1, 3, 5, 8].map((k) => incompleteBeta(0.3, k, 11 - k)),
    want: [1, 3, 5, 8].map((k) =>
      TEN.slice(k).reduce((sum, ways, i) => sum + ways * 0.3 ** (k + i) * 0.7 ** (10 - k - i), 0),
    ),
    within: 1e-12,
  },
  {
    about: "normal law within ±0.5, ±1, ±1.5, ±2, ±3; the library's is a table of four places",
    source: { name: "simple-statistics", place: "cumulativeStdNormalProbability", status: "library" },
    got: () => [0.5, 1, 1.5, 2, 3].map((z) => coverageOf(z, ENDLESS)),
    want: [0.5, 1, 1.5, 2, 3].map((z) => 2 * cumulativeStdNormalProbability(z) - 1),
    within: 2e-4,
  },
  {
    about: "normal law within one, two and three standard deviations, in percent",
    source: { name: "Normal law", place: "tables of it", status: "recomputed" },
    got: () => [1, 2, 3].map((z) => 100 * coverageOf(z, ENDLESS)),
    want: [68.27, 95.45, 99.73],
    within: 0.005,
  },
];
