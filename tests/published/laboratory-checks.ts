import type { Outcome } from "../../app/domain/outcome";
import { combine, type Input, propagate, type Uncertain } from "../../app/domain/uncertainty/propagate";
import { fromExpanded, fromHalfWidth, repeated } from "../../app/domain/uncertainty/readings";
import { coverageFactor } from "../../app/domain/uncertainty/student";
import type { Check, Source } from "./check";

/* Worked examples of guides: the short ones of JCGM 100, a mass, a solution, a titration. */

const of = <T>(came: Outcome<T>): T => {
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};
const input = (name: string, value: number, uncertainty: number, freedom?: number): Input => ({
  name,
  value,
  uncertainty,
  freedom,
});
const guide = (place: string): Source => ({ name: "JCGM 100:2008", place, status: "recomputed" });

const TEMPERATURES = [
  96.9, 98.18, 98.25, 98.61, 99.03, 99.49, 99.56, 99.74, 99.89, 100.07, 100.33, 100.42, 100.68, 100.95,
  101.11, 101.2, 101.57, 101.84, 102.36, 102.72,
];
const temperature = () => {
  const came = repeated(TEMPERATURES);
  if (!came) throw new Error("Twenty readings have a mean.");
  return came;
};

/** Ten resistors of 1000 Ω, 100 mΩ each, end to end; all alike (r = 1) or independent. */
const resistors = (r: number): Uncertain => {
  const inputs = Array.from({ length: 10 }, (_, i) => input(`R${i}`, 1000, 0.1));
  const correlations = inputs.flatMap((a, i) =>
    inputs.slice(i + 1).map((b) => ({ a: a.name, b: b.name, r })),
  );
  return of(
    combine(
      10_000,
      inputs.map(() => 1),
      { inputs, correlations },
    ),
  );
};

/** A product of three, in percent. */
const product = () =>
  of(
    propagate(([a = 0, b = 0, c = 0]) => a * b * c, {
      inputs: [input("X1", 1, 0.0025, 9), input("X2", 1, 0.0057, 4), input("X3", 1, 0.0082, 14)],
    }),
  );

/** EA-4/02, S2: a weight of 10 kg against a standard; grams, deviations from nominal. */
const weight = () =>
  of(
    combine(10_000.025, [1, 1, 1, 1, 1], {
      inputs: [
        input("standard", 10_000.005, fromExpanded(0.045, 2)),
        input("drift", 0, fromHalfWidth(0.015, "rectangular")),
        input("difference", 0.02, 0.025 / Math.sqrt(3)),
        input("comparator", 0, fromHalfWidth(0.01, "rectangular")),
        input("air", 0, fromHalfWidth(0.01, "rectangular")),
      ],
      coverageFactor: 2,
    }),
  );
const EA: Source = { name: "EA-4/02", place: "S2, weight of 10 kg", status: "recomputed" };

/** Eurachem/CITAC guide, A1: cadmium in a flask; mg, ml, mg/l. */
const flask = () => Math.hypot(fromHalfWidth(0.1, "triangular"), 0.02, fromHalfWidth(0.084, "rectangular"));
const cadmium = () =>
  of(
    propagate(([m = 0, p = 0, v = 0]) => (1000 * m * p) / v, {
      inputs: [
        input("mass", 100.28, 0.05),
        input("purity", 0.9999, fromHalfWidth(0.0001, "rectangular")),
        input("volume", 100, flask()),
      ],
      coverageFactor: 2,
    }),
  );
/** The same, A2: sodium hydroxide by titration. */
const titration = () =>
  of(
    propagate(([rep = 0, m = 0, p = 0, mol = 0, v = 0]) => (rep * 1000 * m * p) / (mol * v), {
      inputs: [
        input("repeatability", 1, 0.0005),
        input("mass", 0.3888, 0.00013),
        input("purity", 1, 0.00029),
        input("molar mass", 204.2212, 0.0038),
        input("volume", 18.64, 0.013),
      ],
      coverageFactor: 2,
    }),
  );
const EURACHEM = (place: string): Source => ({
  name: "Eurachem/CITAC guide CG 4, Quantifying Uncertainty",
  place,
  status: "recomputed",
});

const one = (
  about: string,
  source: Source,
  got: () => number | number[],
  want: number | number[],
  within: number,
) => ({
  about,
  source,
  got,
  want,
  within,
});

export const LABORATORY: Check[] = [
  one("twenty temperatures: mean, °C", guide("4.4.3"), () => temperature().mean, 100.145, 0.0005),
  one(
    "twenty temperatures: standard deviation, °C",
    guide("4.4.3"),
    () => temperature().standardDeviation,
    1.489,
    0.0005,
  ),
  one("twenty temperatures: of the mean, °C", guide("4.4.3"), () => temperature().ofMean, 0.333, 0.0005),
  one("within ± 4 °C, evenly: u", guide("4.4.5"), () => fromHalfWidth(4, "rectangular"), 2.3, 0.05),
  one("within ± 4 °C, triangular: u", guide("4.4.6"), () => fromHalfWidth(4, "triangular"), 1.6, 0.05),
  one(
    "mass standard, 240 µg at three standard deviations: u, µg",
    guide("4.3.3"),
    () => fromExpanded(240, 3),
    80,
    0,
  ),
  one(
    "resistor, ± 129 µΩ at 99 %: u, µΩ",
    guide("4.3.4"),
    () => fromExpanded(129, coverageFactor(0.99, Number.POSITIVE_INFINITY)),
    50,
    0.5,
  ),
  one(
    "a length even odds within ± 0.04 mm: u, mm",
    guide("4.3.5"),
    () => fromExpanded(0.04, coverageFactor(0.5, Number.POSITIVE_INFINITY)),
    0.06,
    0.005,
  ),
  one(
    "copper's expansion within ± 0.40: u, 10⁻⁶/°C",
    guide("4.3.7"),
    () => fromHalfWidth(0.4, "rectangular"),
    0.23,
    0.005,
  ),
  one(
    "temperature of H.1 within ± 0.5 °C by a wave: u, °C",
    guide("H.1.3.4"),
    () => fromHalfWidth(0.5, "arcsine"),
    0.35,
    0.005,
  ),
  one(
    "ten resistors against one standard (r = 1): u 1 Ω",
    guide("5.2.2, example"),
    () => resistors(1).uncertainty,
    1,
    1e-9,
  ),
  one(
    "ten resistors as if independent: u 0.32 Ω",
    guide("5.2.2, example"),
    () => resistors(0).uncertainty,
    0.32,
    0.005,
  ),
  one(
    "product of three, 0.25, 0.57 and 0.82 %: u, percent",
    guide("G.4.1, example"),
    () => 100 * product().uncertainty,
    1.03,
    0.005,
  ),
  one(
    "the same: effective degrees of freedom (printed 19.0; a hair below unrounded, so that 18 are taken)",
    guide("G.4.1, example"),
    () => product().freedom,
    19,
    0.05,
  ),
  one(
    "the same: t for 95 % and 19 degrees of freedom",
    guide("G.4.1, example"),
    () => coverageFactor(0.95, 19),
    2.09,
    0.005,
  ),
  one("the same: U95, percent", guide("G.4.1, example"), () => 100 * product().expanded, 2.2, 0.05),
  one(
    "weight: contributions of standard, difference and drift, mg",
    EA,
    () =>
      weight()
        .contributions.slice(0, 3)
        .map((part) => 1000 * part.moves),
    [22.5, 14.4, 8.7],
    0.05,
  ),
  one("weight: standard uncertainty, mg", EA, () => 1000 * weight().uncertainty, 29.3, 0.05),
  one("weight: expanded uncertainty, mg", EA, () => 1000 * weight().expanded, 59, 0.5),
  one("flask of 100 ml: u, ml", EURACHEM("A1, table A1.2"), flask, 0.07, 0.005),
  one("purity of cadmium: u", EURACHEM("A1"), () => fromHalfWidth(0.0001, "rectangular"), 0.000058, 5e-7),
  one("cadmium: concentration, mg/l", EURACHEM("A1"), () => cadmium().value, 1002.7, 0.05),
  one("sodium hydroxide: concentration, mol/l", EURACHEM("A2"), () => titration().value, 0.10214, 5e-6),
  one("sodium hydroxide: u, mol/l", EURACHEM("A2"), () => titration().uncertainty, 0.0001, 5e-6),
  one("sodium hydroxide: U, mol/l", EURACHEM("A2"), () => titration().expanded, 0.0002, 5e-6),
];
