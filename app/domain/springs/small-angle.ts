/** Below this the next term of the series is smaller than a double can hold. */
const TINY = 1e-4;

/**
 * sin x / x, and its limit 1 at x = 0: what a chord loses against its arc.
 * @param x radians
 * Source: Taylor series of the sine (any calculus text).
 * @example sinc(Math.PI / 2) // 0.636620, that is 2/π
 */
export const sinc = (x: number): number => (Math.abs(x) < TINY ? 1 - (x * x) / 6 : Math.sin(x) / x);

/**
 * (1 − cos x) / x, and its limit 0 at x = 0: the rise of an arc against its length. Written as sin(x/2)·sinc(x/2), which
 * loses no digits near zero.
 * @param x radians
 * Source: half-angle identity.
 * @example versinc(Math.PI) // 0.636620, that is 2/π
 */
export const versinc = (x: number): number => Math.sin(x / 2) * sinc(x / 2);

/**
 * The x between two bounds at which a function that only grows (or only falls) comes to a wanted value, by secants kept
 * within a bracket that always shrinks.
 * @param start first guess, anywhere
 * @param tolerance how near the value must come
 * @returns null when the wanted value is not between those at the bounds
 * Source: safeguarded secant method (any text on numerical analysis).
 * @example solveBetween((x) => x * x, 2, 0, 2, 1, 1e-12) // 1.41421
 */
export function solveBetween(
  value: (x: number) => number,
  wanted: number,
  low: number,
  high: number,
  start: number,
  tolerance: number,
): number | null {
  let [a, b] = [low, high];
  let [fa, fb] = [value(a) - wanted, value(b) - wanted];
  if (Math.abs(fa) <= tolerance) return a;
  if (Math.abs(fb) <= tolerance) return b;
  if (fa > 0 === fb > 0) return null;
  let x = start > low && start < high ? start : (a + b) / 2;
  let [before, fBefore] = [a, fa];
  for (let i = 0; i < MOST_STEPS; i++) {
    const fx = value(x) - wanted;
    if (Math.abs(fx) <= tolerance) return x;
    if (fx > 0 === fa > 0) [a, fa] = [x, fx];
    else [b, fb] = [x, fx];
    const secant = x - (fx * (x - before)) / (fx - fBefore);
    [before, fBefore] = [x, fx];
    const next = secant > a && secant < b && i < SECANT_STEPS ? secant : (a + b) / 2;
    if (next === a || next === b) return next;
    x = next;
  }
  return x;
}
/** A dozen secants settle any leaf; halving takes over from a function that resists them. */
const SECANT_STEPS = 20;
const MOST_STEPS = 1200;
