/**
 * Student's t and the normal law: coverage factors for a coverage probability.
 */

const LANCZOS = [
  676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905,
  -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
];

/** ln Γ(x) for x > 0. Source: Lanczos 1964, g = 7, n = 9 coefficients (from memory). */
function logGamma(x: number): number {
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x);
  const z = x - 1;
  const sum = LANCZOS.reduce((so, c, i) => so + c / (z + i + 1), 0.99999999999980993);
  const t = z + 7.5;
  return 0.5 * Math.log(2 * Math.PI) + (z + 0.5) * Math.log(t) - t + Math.log(sum);
}

/**
 * The regularised incomplete beta function I_x(a, b), by its continued fraction.
 * Source: Lentz's method as in Press et al., Numerical Recipes, 6.4 (from memory).
 * @param x 0 to 1
 * @example incompleteBeta(0.5, 2, 2) // 0.5
 */
export function incompleteBeta(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  const front = Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log(1 - x));
  return x < (a + 1) / (a + b + 2)
    ? (front * betaFraction(x, a, b)) / a
    : 1 - (front * betaFraction(1 - x, b, a)) / b;
}

const MOST_TERMS = 10_000;
const TINY = 1e-300;

function betaFraction(x: number, a: number, b: number): number {
  const notNothing = (value: number) => (Math.abs(value) < TINY ? TINY : value);
  let c = 1;
  let d = 1 / notNothing(1 - ((a + b) * x) / (a + 1));
  let fraction = d;
  for (let m = 1; m < MOST_TERMS; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / notNothing(1 + even * d);
    c = notNothing(1 + even / c);
    fraction *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / notNothing(1 + odd * d);
    c = notNothing(1 + odd / c);
    const step = d * c;
    fraction *= step;
    if (Math.abs(step - 1) < 1e-15) break;
  }
  return fraction;
}

/**
 * The share of Student's t with so many degrees of freedom that lies within ±t.
 * @param freedom above 0; Infinity is the normal law
 * @example coverageOf(2.228139, 10) // 0.95
 */
export function coverageOf(t: number, freedom: number): number {
  if (freedom > LARGE) return 2 * normalBelow(Math.abs(t)) - 1;
  return 1 - incompleteBeta(freedom / (freedom + t * t), freedom / 2, 0.5);
}

/** Beyond this t is the normal law to every figure that matters here. */
const LARGE = 1e7;

/** Φ(z) through the incomplete gamma's relative: erfc by continued fraction and series. */
function normalBelow(z: number): number {
  if (z < 0) return 1 - normalBelow(-z);
  const density = Math.exp((-z * z) / 2) / Math.sqrt(2 * Math.PI);
  if (z < 4) {
    // Φ = 1/2 + φ(z)·(z + z³/3 + z⁵/15 + …), Abramowitz and Stegun 26.2.11 (from memory).
    let [term, sum] = [z, z];
    for (let k = 3; term > sum * 1e-17 && k < 400; k += 2) {
      term *= (z * z) / k;
      sum += term;
    }
    return 0.5 + density * sum;
  }
  let tail = 0;
  for (let k = 60; k > 0; k--) tail = k / (z + tail);
  return 1 - density / (z + tail);
}

/**
 * The coverage factor: the t within which the coverage lies.
 * Source: JCGM 100:2008, annex G (from memory); solved by halving, to the last figure.
 * @param coverage above 0 and below 1
 * @param freedom above 0; Infinity is the normal law. Not whole numbers are taken as they are
 * @throws RangeError outside those
 * @example coverageFactor(0.95, Infinity) // 1.959964
 */
export function coverageFactor(coverage: number, freedom: number): number {
  if (!(coverage > 0 && coverage < 1)) throw new RangeError(`${coverage} is not a coverage`);
  if (!(freedom > 0)) throw new RangeError(`${freedom} is not a number of degrees of freedom`);
  let [low, high] = [0, 2];
  while (coverageOf(high, freedom) < coverage) [low, high] = [high, high * 2];
  for (let i = 0; i < 200 && high - low > 1e-13 * high; i++) {
    const middle = (low + high) / 2;
    if (coverageOf(middle, freedom) < coverage) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
