import { quantile } from "simple-statistics";
import type { Outcome } from "../../app/domain/outcome";
import { combine, propagate, type Uncertain } from "../../app/domain/uncertainty/propagate";
import { fromHalfWidth } from "../../app/domain/uncertainty/readings";
import { coverageFactor } from "../../app/domain/uncertainty/student";
import type { Source, Topic } from "./check";
import { IMPEDANCE } from "./impedance-checks";
import { LABORATORY } from "./laboratory-checks";
import { STUDENT } from "./student-checks";

const of = <T>(came: Outcome<T>): T => {
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};

/* JCGM 100, H.1: a 50 mm end gauge against a standard; nanometres. */
const H1: Source = { name: "JCGM 100:2008", place: "H.1, end gauge", status: "read" };
const H1_MEMORY: Source = { ...H1, status: "from memory" };
const difference = () =>
  of(
    combine(215, [1, 1, 1], {
      inputs: [
        { name: "repeated readings", value: 215, uncertainty: 5.8, freedom: 24 },
        { name: "comparator, random", value: 0, uncertainty: 3.9, freedom: 5 },
        { name: "comparator, systematic", value: 0, uncertainty: 6.7, freedom: 8 },
      ],
      coverage: 0.99,
    }),
  );
const LS = 50_000_623;
const ALPHA = 11.5e-6;
const endGauge = (): Uncertain => {
  const d = difference();
  // l = ls + d − ls(δα·θ + αs·δθ) at δα = 0, δθ = 0, θ = −0.1.
  return of(
    propagate(([ls = 0, dd = 0, da = 0, dt = 0]) => ls + dd - ls * (da * -0.1 + ALPHA * dt), {
      inputs: [
        { name: "standard", value: LS, uncertainty: 25, freedom: 18 },
        { name: "difference", value: 215, uncertainty: d.uncertainty, freedom: 25.6 },
        { name: "expansion", value: 0, uncertainty: fromHalfWidth(1e-6, "rectangular"), freedom: 50 },
        { name: "temperature", value: 0, uncertainty: fromHalfWidth(0.05, "rectangular"), freedom: 2 },
      ],
      coverage: 0.99,
    }),
  );
};

export default {
  topic: "Measurement uncertainty",
  checks: [
    ...LABORATORY,
    ...STUDENT,
    {
      about: "end gauge: u of the difference, nm",
      source: H1,
      got: () => difference().uncertainty,
      want: 9.7,
      within: 0.05,
    },
    {
      about:
        "end gauge: effective degrees of freedom of the difference (25.6 from the rounded 9.7, 25.447 unrounded)",
      source: { ...H1, status: "recomputed" },
      got: () => difference().freedom,
      want: 25.447,
      within: 0.0005,
    },
    {
      about: "end gauge: length, nm",
      source: H1,
      got: () => endGauge().value,
      want: 50_000_838,
      within: 0.5,
    },
    {
      about: "end gauge: contributions 25, 16.6, 9.7 and 2.9 nm",
      source: H1,
      got: () => endGauge().contributions.map((one) => Math.abs(one.moves)),
      want: [25, 16.6, 9.7, 2.9],
      within: 0.05,
    },
    {
      about: "end gauge: combined standard uncertainty, nm",
      source: H1,
      got: () => endGauge().uncertainty,
      want: 32,
      within: 0.5,
    },
    {
      about: "end gauge: effective degrees of freedom (printed 16.7 from rounded figures, 16.752 unrounded)",
      source: { ...H1, status: "recomputed" },
      got: () => endGauge().freedom,
      want: 16.752,
      within: 0.02,
    },
    {
      about: "end gauge: t for 99 % and 16 degrees of freedom",
      source: H1_MEMORY,
      got: () => endGauge().coverageFactor,
      want: 2.92,
      within: 0.005,
    },
    {
      about: "end gauge: U99, nm (93 from u = 32; 92.5 unrounded)",
      source: { ...H1, status: "recomputed" },
      got: () => endGauge().expanded,
      want: 92.5,
      within: 0.05,
    },
    ...IMPEDANCE,
    {
      about: "Welch and Satterthwaite: u 0.57 with 9, u 0.25 with endless degrees of freedom",
      source: {
        name: "Open-source uncertainty calculator's tests",
        place: "degrees of freedom",
        status: "read",
      },
      got: () =>
        of(
          combine(0, [1, 1], {
            inputs: [
              { name: "a", value: 0, uncertainty: 0.57, freedom: 9 },
              { name: "b", value: 0, uncertainty: 0.25 },
            ],
          }),
        ).freedom,
      want: 12.8,
      within: 0.05,
    },
    {
      about: "sum of four normal inputs of u 1: ± 3.92 at 95 %",
      source: { name: "JCGM 101:2008", place: "9.2.2", status: "read" },
      got: () => fourOf(1).expanded,
      want: 3.92,
      within: 0.005,
    },
    {
      about: "sum of four evenly spread inputs of u 1: ± 3.92 by first order, where drawing gives ± 3.88",
      source: { name: "JCGM 101:2008", place: "9.2.3", status: "read" },
      got: () => {
        const inputs = [1, 2, 3, 4].map((i) => ({
          name: `x${i}`,
          value: 0,
          uncertainty: fromHalfWidth(Math.sqrt(3), "rectangular"),
        }));
        return of(combine(0, [1, 1, 1, 1], { inputs })).expanded;
      },
      want: 3.92,
      within: 0.005,
    },
    {
      about: "sum of four, one of u 10: u 10.1 and ± 19.9 by first order",
      source: { name: "JCGM 101:2008", place: "9.2.4", status: "from memory" },
      got: () => [fourOf(10).uncertainty, fourOf(10).expanded],
      want: [10.1, 19.9],
      within: 0.05,
    },
    {
      about:
        "ln x with x between 0.1 and 1.1: first order gives −0.511 and u 0.481, where the truth is −0.665 and 0.606",
      source: { name: "NPL report DEM-ES-011", place: "table 9.2", status: "read" },
      got: () => {
        const came = of(
          propagate(([x = 0]) => Math.log(x), {
            inputs: [{ name: "x", value: 0.6, uncertainty: fromHalfWidth(0.5, "rectangular") }],
          }),
        );
        return [came.value, came.uncertainty];
      },
      want: [-0.511, 0.481],
      within: 0.0005,
    },
    {
      about: "a limit of ± 1/64 in, evenly spread, is a standard uncertainty of 0.009021 in",
      source: { name: "JCGM 100:2008", place: "4.3.7", status: "derived" },
      got: () => fromHalfWidth(1 / 64, "rectangular"),
      want: 0.009021,
      within: 5e-7,
    },
    {
      about: "two-sided limits of the normal law at 5, 1, 0.5 and 0.1 %",
      source: { name: "Normal law", place: "tables of it", status: "recomputed" },
      got: () =>
        [0.95, 0.99, 0.995, 0.999].map((coverage) => coverageFactor(coverage, Number.POSITIVE_INFINITY)),
      want: [1.96, 2.5758, 2.807, 3.2905],
      within: 5e-5,
    },
    {
      about:
        "coverage of the expanded uncertainty over 200 000 drawn cases of a product (share within, 0.95)",
      source: { name: "simple-statistics", place: "quantile of drawn cases", status: "library" },
      got: () => drawnHalfWidth(),
      want: of(
        propagate(([a = 0, b = 0]) => a * b, {
          inputs: [
            { name: "a", value: 52, uncertainty: 0.03 },
            { name: "b", value: 26, uncertainty: 0.03 },
          ],
        }),
      ).expanded,
      within: 0.02,
    },
  ],
} satisfies Topic;

function fourOf(last: number): Uncertain {
  return of(
    combine(0, [1, 1, 1, 1], {
      inputs: [1, 1, 1, last].map((uncertainty, i) => ({ name: `x${i}`, value: 0, uncertainty })),
    }),
  );
}

/** Half the width of the middle 95 % of a product of two normal lengths, drawn with a fixed seed. */
function drawnHalfWidth(): number {
  let state = 20_261_201;
  const uniform = () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return (state + 0.5) / 4_294_967_296;
  };
  const normal = () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
  const drawn = Array.from({ length: 200_000 }, () => (52 + 0.03 * normal()) * (26 + 0.03 * normal()));
  return (quantile(drawn, 0.975) - quantile(drawn, 0.025)) / 2;
}
