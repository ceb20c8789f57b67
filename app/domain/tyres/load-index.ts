/**
 * Load a tyre carries by its load index, kilograms. Source: ISO 4000-1 and UN R30, annex 4: those below were read in
 * tables or excerpts of it; the index is not filled in between.
 */
const KILOGRAMS: Readonly<Record<number, number>> = {
  81: 462,
  82: 475,
  85: 515,
  86: 530,
  87: 545,
  90: 600,
  91: 615,
  92: 630,
  95: 690,
  96: 710,
  98: 750,
  100: 800,
  104: 900,
  110: 1060,
  112: 1120,
  115: 1215,
  116: 1250,
  120: 1400,
  121: 1450,
  125: 1650,
};

/**
 * Kilograms that a tyre of a load index carries at its pressure.
 * @returns null for an index that is not in our list
 * @example loadOf(112) // 1120
 */
export const loadOf = (index: number): number | null => KILOGRAMS[index] ?? null;

/** Highest speed by speed symbol, km/h. Source: ISO 4000-1 (read in a copy of the table). */
const SPEEDS: Readonly<Record<string, number>> = {
  N: 140,
  P: 150,
  Q: 160,
  R: 170,
  S: 180,
  T: 190,
  U: 200,
  H: 210,
  V: 240,
  W: 270,
  Y: 300,
};

/**
 * Highest speed of a speed symbol, km/h.
 * @returns null for a symbol that is not in our list
 * @example speedOf("Q") // 160
 */
export const speedOf = (symbol: string): number | null => SPEEDS[symbol.toUpperCase()] ?? null;
