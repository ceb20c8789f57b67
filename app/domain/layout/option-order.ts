import type { OptionColumns, OptionSearch } from "./option-types";

const known = (...values: (number | undefined)[]) =>
  values.find((value) => value !== undefined && !Number.isNaN(value)) ?? Number.NaN;

/** What an order sorts by, smallest first; NaN when it is not known. */
function keyOf(search: OptionSearch, columns: OptionColumns, i: number): number {
  switch (search.order ?? "centre") {
    case "centre":
      return Math.abs(known(columns.shift[i]));
    case "angle":
      return -known(columns.approach[i], columns.departure[i]);
    case "room":
      return -Math.min(
        known(columns.frontRoomAtLock[i], columns.frontRoom[i]),
        known(columns.rearRoomAtLock[i], columns.rearRoom[i]),
      );
    case "wheelbase":
      return Math.abs(known(columns.wheelbase[i]) - (search.stock?.wheelbase ?? Number.NaN));
  }
}

/** Keys are compared to a millionth, so that equal options keep the rack's order whatever the last digits say. */
const grain = (key: number) => (Number.isNaN(key) ? Number.POSITIVE_INFINITY : Math.round(key * 1e6));

/**
 * The options in the order asked for: those that stand first, what is not known last; equal ones by spring, way round, pin
 * offset and hole as they came.
 */
export function orderOptions(search: OptionSearch, columns: OptionColumns): Uint32Array {
  const keys = Float64Array.from({ length: columns.count }, (_, i) => grain(keyOf(search, columns, i)));
  return Uint32Array.from({ length: columns.count }, (_, i) => i).sort((a, b) => {
    const stands = Number((columns.rejected[a] ?? 0) !== 0) - Number((columns.rejected[b] ?? 0) !== 0);
    if (stands !== 0) return stands;
    const [one, other] = [keys[a] ?? 0, keys[b] ?? 0];
    return one === other ? a - b : one - other;
  });
}

/**
 * The options that cannot be told apart from option i by where they put the axle: nearer than the uncertainties of both
 * together. They share the frame, so only hole and spring count.
 * @returns indices, nearest first
 * Source: JCGM 100, uncertainty of a difference of independent values.
 */
export function alikeTo(columns: OptionColumns, i: number): number[] {
  const here = columns.flat[i] ?? Number.NaN;
  const apart = (k: number) => Math.abs((columns.flat[k] ?? Number.NaN) - here);
  return Array.from({ length: columns.count }, (_, k) => k)
    .filter((k) => k !== i && apart(k) <= Math.hypot(columns.plusMinus[i] ?? 0, columns.plusMinus[k] ?? 0))
    .sort((a, b) => apart(a) - apart(b) || a - b);
}
