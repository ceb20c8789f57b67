import { type Outcome, ok, problem } from "../outcome";
import { type Correlation, correlatedGroups, correlationMatrix } from "./correlations";
import { coverageFactor, coverageOf } from "./student";

export type { Correlation } from "./correlations";

/** Something measured or known that a result depends on. */
export type Input = {
  name: string;
  value: number;
  /** Standard uncertainty, in the value's own unit. */
  uncertainty: number;
  /** Degrees of freedom of that uncertainty; endless unless told. */
  freedom?: number | undefined;
};

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
/** A source with less than this share is not spoken of: it rounds to 0 %. */
const SPOKEN = 0.005;
/** The coverage that twice the standard uncertainty stands for. */
export const USUAL_COVERAGE = 0.95;

export type Propagation = {
  inputs: readonly Input[];
  correlations?: readonly Correlation[] | undefined;
  /** Coverage probability of the expanded uncertainty; 0.95 unless told. */
  coverage?: number | undefined;
  /** A coverage factor that was agreed on, 2 say: then the coverage follows from it. */
  coverageFactor?: number | undefined;
};

/**
 * The uncertainty of a result to first order, correlations counted: u² = Σ (cᵢuᵢ)² + 2 Σ cᵢcⱼuᵢuⱼrᵢⱼ, its effective
 * degrees of freedom, and the coverage factor of Student's t with those, cut to a whole number as the guide does.
 * Source: JCGM 100:2008, 5.1.2, 5.2.2, G.4.1 and G.4.2 (from memory); sensitivities by central differences.
 * @param of the result from the values, in the order of the inputs
 * @returns a problem when a figure is no number, a correlation is beyond ±1, or the correlations contradict each other
 * @example propagate(([v, i]) => v / i, { inputs: [{ name: "V", value: 5, uncertainty: 0.01 }, …] })
 */
export function propagate(
  of: (values: readonly number[]) => number,
  setting: Propagation,
): Outcome<Uncertain> {
  const { results, sensitivities } = byDifferences((values) => [of(values)], setting.inputs);
  return combine(results[0] ?? Number.NaN, sensitivities[0] ?? [], setting);
}

/**
 * What functions of the inputs come to, and by how much each moves per unit of each input.
 * @param of the results from the values, always as many
 * @returns sensitivities by result, then by input; 0 for an input that is sure
 * @example byDifferences(([x = 0]) => [x * x], [{ name: "x", value: 3, uncertainty: 0.1 }]).sensitivities // [[6]]
 */
export function byDifferences(
  of: (values: readonly number[]) => readonly number[],
  inputs: readonly Input[],
): { results: readonly number[]; sensitivities: number[][] } {
  const values = inputs.map((input) => input.value);
  const results = of(values);
  const moved = inputs.map((input, i) => {
    const step = Math.max(input.uncertainty * STEP, Math.abs(input.value) * LEAST_STEP);
    const at = (value: number) => of(values.map((own, k) => (k === i ? value : own)));
    if (input.uncertainty === 0) return results.map(() => 0);
    const [above, below] = [at(input.value + step), at(input.value - step)];
    return results.map((_, k) => ((above[k] ?? Number.NaN) - (below[k] ?? Number.NaN)) / (2 * step));
  });
  return { results, sensitivities: results.map((_, k) => moved.map((by) => by[k] ?? Number.NaN)) };
}

/**
 * The same as propagate where the sensitivities are known already.
 * @param sensitivities change of the result per unit of each input
 * @example combine(215, [1, 1, 1], { inputs }) // a sum
 */
export function combine(
  value: number,
  sensitivities: readonly number[],
  setting: Propagation,
): Outcome<Uncertain> {
  const { inputs, correlations = [], coverage, coverageFactor: agreed } = setting;
  const wrong = faultOf(value, sensitivities, setting);
  if (wrong) return problem(wrong);
  const matrix = correlationMatrix(
    inputs.map((input) => input.name),
    correlations,
  );
  if (!matrix.ok) return matrix;
  const moves = inputs.map((input, i) => (sensitivities[i] ?? 0) * input.uncertainty);
  const { variance, freedom } = combined(moves, inputs, matrix.value);
  const whole = Number.isFinite(freedom) ? Math.max(1, Math.floor(freedom)) : freedom;
  const factor = agreed ?? coverageFactor(coverage ?? USUAL_COVERAGE, whole);
  const uncertainty = Math.sqrt(variance);
  const contributions = contributionsOf(moves, inputs);
  return ok({
    value,
    uncertainty,
    freedom,
    coverage: agreed === undefined ? (coverage ?? USUAL_COVERAGE) : coverageOf(agreed, whole),
    coverageFactor: factor,
    expanded: factor * uncertainty,
    contributions,
    words: wordsFor(contributions),
  });
}

function faultOf(
  value: number,
  sensitivities: readonly number[],
  { inputs, coverage, coverageFactor: agreed }: Propagation,
): string | null {
  if (![value, ...sensitivities].every(Number.isFinite)) return "The result is no number with these values.";
  if (inputs.some(({ uncertainty }) => !(uncertainty >= 0 && Number.isFinite(uncertainty))))
    return "An uncertainty is nothing or more.";
  if (inputs.some(({ freedom = 1 }) => !(freedom > 0))) return "Degrees of freedom are more than nothing.";
  if (new Set(inputs.map((input) => input.name)).size < inputs.length)
    return "Two inputs have the same name.";
  if (coverage !== undefined && !(coverage > 0 && coverage < 1))
    return "A coverage is more than 0 and less than 1.";
  if (agreed !== undefined && !(agreed > 0 && Number.isFinite(agreed)))
    return "A coverage factor is more than nothing.";
  return null;
}

/**
 * Variance of the result, and its degrees of freedom after Welch and Satterthwaite. Their formula wants independent
 * parts: inputs that hang together by correlation count as one part, with the fewest degrees of freedom among them. That
 * is exact where they were read together, and cautious elsewhere.
 * Source: JCGM 100:2008, G.4.1 (from memory); the parts by correlation are of this library.
 */
function combined(
  moves: readonly number[],
  inputs: readonly Input[],
  matrix: readonly (readonly number[])[],
): { variance: number; freedom: number } {
  let variance = 0;
  let doubt = 0;
  for (const group of correlatedGroups(matrix)) {
    let part = 0;
    for (const i of group)
      for (const j of group) part += (matrix[i]?.[j] ?? 0) * (moves[i] ?? 0) * (moves[j] ?? 0);
    part = Math.max(0, part);
    const freedoms = group
      .filter((i) => moves[i] !== 0)
      .map((i) => inputs[i]?.freedom ?? Number.POSITIVE_INFINITY);
    variance += part;
    doubt += part ** 2 / Math.min(Number.POSITIVE_INFINITY, ...freedoms);
  }
  return { variance, freedom: doubt > 0 ? variance ** 2 / doubt : Number.POSITIVE_INFINITY };
}

function contributionsOf(moves: readonly number[], inputs: readonly Input[]): Contribution[] {
  const squares = moves.reduce((sum, move) => sum + move ** 2, 0);
  return inputs
    .map(({ name }, i) => ({
      name,
      moves: moves[i] ?? 0,
      share: squares > 0 ? (moves[i] ?? 0) ** 2 / squares : 0,
    }))
    .sort((a, b) => b.share - a.share || a.name.localeCompare(b.name));
}

function wordsFor(contributions: readonly Contribution[]): string {
  const [first, second] = contributions.filter((one) => one.share >= SPOKEN);
  const percent = (one: Contribution) => `${Math.round(one.share * 100)} %`;
  if (!first) return "Nothing is unsure.";
  const begin = first.share > MOSTLY ? "Mostly" : "The most comes from";
  return `${begin} ${first.name} (${percent(first)})${second ? `, then ${second.name} (${percent(second)})` : ""}.`;
}
