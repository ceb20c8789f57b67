import { type Outcome, ok, problem } from "../outcome";
import type { Millimetres } from "../units/length";

/** AISC 360, section J3.10 (from memory): bearing 2.4·d·t·Fu, tear-out 1.2·lc·t·Fu; φ 0.75, Ω 2.00. */
const BEARING = 2.4;
const TEAR_OUT = 1.2;
const SAFETY_FACTOR = 2;
const RESISTANCE_FACTOR = 0.75;

export type BracketHole = {
  bolt: Millimetres;
  hole: Millimetres;
  thickness: Millimetres;
  /** From the hole's centre to the bracket's edge in the direction of the force; null: well away from any edge. */
  edgeDistance: Millimetres | null;
  /** Tensile strength of the bracket's steel, megapascals. */
  tensile: number;
};

export type HoleStrength = {
  /** Newtons: the force at which the hole is stretched out, or torn out to the edge. */
  bearing: number;
  tearOut: number | null;
  nominal: number;
  governs: "bearing" | "tearOut";
  /** By allowable strength (nominal/2), and by load and resistance factors (0.75·nominal, for factored loads). */
  allowable: number;
  design: number;
};

/**
 * What a bolt hole in one bracket plate carries across the bolt: the smaller of bearing and of tearing out to the edge.
 * Source: AISC 360, section J3.10 (from memory); a static rule for buildings: a shaken vehicle needs more in hand.
 * @returns newtons for one plate; a problem when the hole is smaller than the bolt or reaches the edge
 * @example bolt 19.05, hole 20.64, 25.4 thick, no edge near, 399.9 MPa (58 ksi) // design 348 296 N (78.3 kip)
 */
export function bracketHole(of: BracketHole): Outcome<HoleStrength> {
  const { bolt, hole, thickness, edgeDistance, tensile } = of;
  if (!(bolt > 0 && thickness > 0 && tensile > 0))
    return problem("Bolt, thickness and tensile strength are more than nothing.");
  if (hole < bolt) return problem("The hole is smaller than the bolt.");
  const clear = edgeDistance === null ? null : edgeDistance - hole / 2;
  if (clear !== null && !(clear > 0)) return problem("The hole reaches the edge of the bracket.");
  const bearing = BEARING * bolt * thickness * tensile;
  const tearOut = clear === null ? null : TEAR_OUT * clear * thickness * tensile;
  const governs = tearOut !== null && tearOut < bearing ? "tearOut" : "bearing";
  const nominal = Math.min(bearing, tearOut ?? bearing);
  return ok({
    bearing,
    tearOut,
    nominal,
    governs,
    allowable: nominal / SAFETY_FACTOR,
    design: nominal * RESISTANCE_FACTOR,
  });
}
