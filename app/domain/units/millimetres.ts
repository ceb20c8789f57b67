/** A length in millimetres. */
export type Millimetres = number & { readonly __unit: "millimetres" };
/** What a number without a unit means, and what lengths are shown in. */
export type LengthUnit = "in" | "mm";

/** One inch is 25.4 mm exactly (international yard and pound agreement, 1959). */
export const MM_PER_INCH = 25.4;

/** Marks a number as millimetres. @throws RangeError when it is not finite */
export function mm(n: number): Millimetres {
  if (!Number.isFinite(n)) throw new RangeError(`${n} is not a length`);
  return n as Millimetres;
}
export const inches = (n: number): Millimetres => mm(n * MM_PER_INCH);
export const toInches = (length: Millimetres): number => length / MM_PER_INCH;
