import type { LengthUnit } from "../../domain/units/length";

/** A length as it was typed, with the unit that a bare number means in this shop. */
export function asMeasured(typed: string | null, unit: LengthUnit): string | null {
  if (typed === null) return null;
  return /[a-z'"′″’”]\s*$/i.test(typed) ? typed : `${typed} ${unit}`;
}
