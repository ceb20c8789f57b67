import { type Outcome, ok, problem } from "../outcome";
import { coverageFactor } from "./student";

/** Something measured or known that a result depends on. */
export type Input = {
  name: string;
  value: number;
  /** Standard uncertainty, in the value's own unit. */
  uncertainty: number;
  /** Degrees of freedom of that uncertainty; endless unless told. */
  freedom?: number | undefined;
};

/** Correlation of two inputs by their names; what is not named is independent. */
export type Correlation = { a: string; b: string; r: number };

export type Contribution = {
  name: string;
  /** Change of the result for one standard uncertainty, with its sign. */
  moves: number;
  /** Share of the variance of the independent parts; 1 is all. */
  share: number;
};

export type Uncertain = {
  value: number;
  /** Combined standard uncertainty. */
  uncertainty: number;
  /** Effective degrees of freedom. */
  freedom: number;
  coverage: number;
  coverageFactor: number;
  expanded: number;
  /** The largest first. */
  contributions: Contribution[];
  /** "Mostly the tape tie to mark B (62 %)." */
  words: string;
};

/** A value moves by so much of its own uncertainty each way to see what follows. */
const STEP = 1e-3;
/** What is surer than this share of its value is moved by that much of it. */
const LEAST_STEP = 1e-7;
/** A source with more than this share is "mostly". */
const MOSTLY = 0.5;
/** The coverage that twice the standard uncertainty stands for. */
export const USUAL_COVERAGE = 0.95;

export type Propagation = {
  inputs: readonly Input[];
  correlations?: readonly Correlation[] | undefined;
  /** Coverage probability of the expanded uncertainty; 0.95 unless told. */
  coverage?: number | undefined;
};

/**
 * The uncertainty of a result to first order, correlations counted: u² = Σ (cᵢuᵢ)² + 2 Σ cᵢcⱼuᵢuⱼrᵢⱼ, its effective
 * degrees of freedom after Welch and Satterthwaite, and the coverage factor of Student's t with those, cut to a whole
 * number as the guide does.
 * Source: JCGM 100:2008, 5.1.2, 5.2.2, G.4.1 and G.4.2 (from memory); sensitivities by central differences.
 * @param of the result from the values, in the order of the inputs
 * @returns a problem when a figure is no number, a correlation is beyond ±1, or the correlations contradict each other
 * @example propagate(([v, i]) => v / i, { inputs: [{ name: "V", value: 5, uncertainty: 0.01 }, …] })
 */
export function propagate(
  of: (values: readonly number[]) => number,
  setting: Propagation,
): Outcome<Uncertain> {
  const values = setting.inputs.map((input) => input.value);
  const sensitivities = setting.inputs.map((input, i) => {
    const step = Math.max(input.uncertainty * STEP, Math.abs(input.value) * LEAST_STEP, Number.MIN_VALUE);
    const at = (moved: number) => of(values.map((value, k) => (k === i ? moved : value)));
    return (at(input.value + step) - at(input.value - step)) / (2 * step);
  });
  return combine(of(values), sensitivities, setting);
}

/**
 * The same where the sensitivities are known already.
 * @param sensitivities change of the result per unit of each input
 * @example combine(215, [1, 1, 1], { inputs }) // a sum
 */
export function combine(
  value: number,
  sensitivities: readonly number[],
  { inputs, correlations = [], coverage = USUAL_COVERAGE }: Propagation,
): Outcome<Uncertain> {
  if (![value, ...sensitivities].every(Number.isFinite))
    return problem("The result is no number with these values.");
  if (inputs.some((input) => !(input.uncertainty >= 0))) return problem("An uncertainty is nothing or more.");
  const moves = inputs.map((input, i) => (sensitivities[i] ?? 0) * input.uncertainty);
  const squares = moves.reduce((sum, move) => sum + move ** 2, 0);
  let variance = squares;
  for (const { a, b, r } of correlations) {
    const [i, j] = [a, b].map((name) => inputs.findIndex((input) => input.name === name));
    if (i === undefined || j === undefined || i < 0 || j < 0 || i === j)
      return problem(`A correlation is between two different inputs: ${a} and ${b} are not.`);
    if (!(Math.abs(r) <= 1)) return problem("A correlation is from −1 to 1.");
    variance += 2 * r * (moves[i] ?? 0) * (moves[j] ?? 0);
  }
  if (variance < -1e-12 * squares) return problem("These correlations contradict each other.");
  const uncertainty = Math.sqrt(Math.max(0, variance));
  const freedom = effectiveFreedom(uncertainty, moves, inputs);
  const factor = coverageFactor(
    coverage,
    Number.isFinite(freedom) ? Math.max(1, Math.floor(freedom)) : freedom,
  );
  const contributions = inputs
    .map((input, i) => ({
      name: input.name,
      moves: moves[i] ?? 0,
      share: squares > 0 ? (moves[i] ?? 0) ** 2 / squares : 0,
    }))
    .sort((a, b) => b.share - a.share || a.name.localeCompare(b.name));
  return ok({
    value,
    uncertainty,
    freedom,
    coverage,
    coverageFactor: factor,
    expanded: factor * uncertainty,
    contributions,
    words: wordsFor(contributions),
  });
}

/** Welch and Satterthwaite's formula; endless when every input's is. Source: JCGM 100:2008, G.4.1 (from memory). */
function effectiveFreedom(uncertainty: number, moves: readonly number[], inputs: readonly Input[]): number {
  const sum = inputs.reduce((so, { freedom = Number.POSITIVE_INFINITY }, i) => {
    return so + (moves[i] ?? 0) ** 4 / freedom;
  }, 0);
  return sum > 0 ? uncertainty ** 4 / sum : Number.POSITIVE_INFINITY;
}

function wordsFor(contributions: readonly Contribution[]): string {
  const [first, second] = contributions.filter((one) => one.share >= 0.005);
  const percent = (one: Contribution) => `${Math.round(one.share * 100)} %`;
  if (!first) return "Nothing is unsure.";
  const begin = first.share > MOSTLY ? "Mostly" : "The most comes from";
  return `${begin} ${first.name} (${percent(first)})${second ? `, then ${second.name} (${percent(second)})` : ""}.`;
}

/**
 * Covariance of two results of the same inputs, from their contributions.
 * Source: JCGM 100:2008, H.2.3 (from memory).
 * @returns the correlation of the results as well; null when one of them is sure
 */
export function covarianceOf(
  a: Uncertain,
  b: Uncertain,
  correlations: readonly Correlation[] = [],
): { covariance: number; correlation: number | null } {
  const moved = (of: Uncertain, name: string) =>
    of.contributions.find((one) => one.name === name)?.moves ?? 0;
  let covariance = a.contributions.reduce((sum, one) => sum + one.moves * moved(b, one.name), 0);
  for (const { a: p, b: q, r } of correlations)
    covariance += r * (moved(a, p) * moved(b, q) + moved(a, q) * moved(b, p));
  const scale = a.uncertainty * b.uncertainty;
  return { covariance, correlation: scale > 0 ? covariance / scale : null };
}
