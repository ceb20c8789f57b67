import { sampleCorrelation, standardDeviation } from "simple-statistics";
import type { Outcome } from "../../app/domain/outcome";
import { propagate, type Uncertain } from "../../app/domain/uncertainty/propagate";
import { correlation, repeated } from "../../app/domain/uncertainty/readings";
import { propagateSeveral } from "../../app/domain/uncertainty/several";
import type { Check, Source } from "./check";

const of = <T>(came: Outcome<T>): T => {
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};

/* JCGM 100, H.2: resistance and reactance, five readings taken together. */
const V = [5.007, 4.994, 5.005, 4.99, 4.999];
const I = [19.663e-3, 19.639e-3, 19.64e-3, 19.685e-3, 19.678e-3];
const PHI = [1.0456, 1.0438, 1.0468, 1.0428, 1.0433];
const H2 = (status: Source["status"]): Source => ({
  name: "JCGM 100:2008",
  place: "H.2, resistance and reactance",
  status,
});
const reading = (list: number[]) => {
  const came = repeated(list);
  if (!came) throw new Error("Too few readings");
  return came;
};
const rs = () => [
  { a: "V", b: "I", r: correlation(V, I) ?? Number.NaN },
  { a: "V", b: "phi", r: correlation(V, PHI) ?? Number.NaN },
  { a: "I", b: "phi", r: correlation(I, PHI) ?? Number.NaN },
];
const known = (name: string, list: number[]) => {
  const { mean, ofMean, freedom } = reading(list);
  return { name, value: mean, uncertainty: ofMean, freedom };
};
/** Resistance, reactance and impedance of one set of figures. */
const rxz = ([v = 0, i = 0, phi = 0]: readonly number[]) => [
  (v * Math.cos(phi)) / i,
  (v * Math.sin(phi)) / i,
  v / i,
];
const all = () =>
  of(
    propagateSeveral(rxz, {
      inputs: [known("V", V), known("I", I), known("phi", PHI)],
      correlations: rs(),
    }),
  );
const one = (k: 0 | 1 | 2): Uncertain => {
  const result = all().results[k];
  if (!result) throw new Error("There are three results.");
  return result;
};
const [R, X, Z] = [() => one(0), () => one(1), () => one(2)];
const r = (i: number, j: number) => all().correlation[i]?.[j] ?? Number.NaN;
/** The guide's second way: the results of each set of readings, and their mean. */
const setBySet = (k: 0 | 1 | 2) => reading(V.map((v, n) => rxz([v, I[n] ?? 0, PHI[n] ?? 0])[k] ?? 0));

export const IMPEDANCE: Check[] = [
  {
    about: "means of V, I (mA) and phase",
    source: H2("read"),
    got: () => [reading(V).mean, 1000 * reading(I).mean, reading(PHI).mean],
    want: [4.999, 19.661, 1.04446],
    within: 5e-6,
  },
  {
    about: "standard uncertainties of the means of V, I (mA) and phase",
    source: H2("recomputed"),
    got: () => [reading(V).ofMean, 1000 * reading(I).ofMean, reading(PHI).ofMean],
    want: [0.00320936, 0.00947101, 0.000752064],
    within: 5e-8,
  },
  {
    about: "correlations V–I, V–phase, I–phase",
    source: H2("read"),
    got: () => rs().map((one) => one.r),
    want: [-0.36, 0.86, -0.65],
    within: 0.005,
  },
  {
    about: "resistance: 127.732 with u 0.071",
    source: H2("read"),
    got: () => [R().value, R().uncertainty],
    want: [127.732, 0.071],
    within: 0.0005,
  },
  {
    about: "reactance: 219.847",
    source: H2("read"),
    got: () => X().value,
    want: 219.847,
    within: 0.0005,
  },
  {
    about: "reactance: u 0.295 (0.29558 unrounded)",
    source: H2("recomputed"),
    got: () => X().uncertainty,
    want: 0.2955817,
    within: 5e-7,
  },
  {
    about: "impedance: 254.260 with u 0.236",
    source: H2("read"),
    got: () => [Z().value, Z().uncertainty],
    want: [254.26, 0.236],
    within: 0.0005,
  },
  {
    about: "correlations of the results R–X, R–Z, X–Z",
    source: H2("recomputed"),
    got: () => [r(0, 1), r(0, 2), r(1, 2)],
    want: [-0.58843, -0.485259, 0.992512],
    within: 5e-6,
  },
  {
    about: "resistance with the correlation forgotten, from the printed rounded inputs: 0.19412, not 0.070",
    source: H2("derived"),
    got: () =>
      of(
        propagate(([v = 0, i = 0, phi = 0]) => (v * Math.cos(phi)) / i, {
          inputs: [
            { name: "V", value: 4.999, uncertainty: 0.0032 },
            { name: "I", value: 19.661e-3, uncertainty: 0.0095e-3 },
            { name: "phi", value: 1.04446, uncertainty: 0.00075 },
          ],
        }),
      ).uncertainty,
    want: 0.19412,
    within: 5e-6,
  },
  {
    about:
      "the three results set by set, then their mean: the same u and degrees of freedom, and values but for the second order (0.0005)",
    source: { ...H2("derived"), place: "H.2.4, second way" },
    got: () => [R(), X(), Z()].flatMap((result) => [result.value, result.uncertainty, result.freedom]),
    want: ([0, 1, 2] as const).flatMap((k) => {
      const own = setBySet(k);
      return [own.mean, own.ofMean, own.freedom];
    }),
    within: 1e-3,
  },
  {
    about: "standard deviation of H.2's voltages",
    source: {
      name: "simple-statistics",
      place: "standardDeviation, population form scaled",
      status: "library",
    },
    got: () => reading(V).standardDeviation,
    want: standardDeviation(V) * Math.sqrt(5 / 4),
    within: 1e-12,
  },
  {
    about: "correlation of H.2's voltages and phases",
    source: { name: "simple-statistics", place: "sampleCorrelation", status: "library" },
    got: () => correlation(V, PHI) ?? Number.NaN,
    want: sampleCorrelation(V, PHI),
    within: 1e-12,
  },
];
