import {
  formatInches,
  formatMillimetres,
  type LengthUnit,
  type Millimetres,
  mm,
  parseLength,
} from "../../domain/units/length";

/** A length as it stands on the tape, without its unit in inches: "26 1/2", "673 mm". */
export function onTape(length: Millimetres, unit: LengthUnit): string {
  return unit === "in" ? formatInches(length) : formatMillimetres(length);
}

/** With its unit: "26 1/2 in", "673 mm". */
export function withUnit(length: Millimetres, unit: LengthUnit): string {
  return unit === "in" ? `${formatInches(length)} in` : formatMillimetres(length);
}

/** A difference, finer than a reading: "1/32 in", "0.8 mm"; "under 1/32 in" below that. */
export function smallLength(length: Millimetres, unit: LengthUnit): string {
  const size = mm(Math.abs(length));
  if (unit === "mm") return formatMillimetres(size, 1);
  const words = formatInches(size, { denominator: 32 });
  return words === "0" ? "under 1/32 in" : `${words} in`;
}

/** How closely something meets, for after "within": never finer than 1/32 in or 0.1 mm. */
export const withinLength = (length: Millimetres, unit: LengthUnit): string =>
  smallLength(length, unit).replace(/^under /, "");

/** A place across the vehicle: "30 1/4 left", "on the line". */
export function offLine(y: Millimetres, unit: LengthUnit): string {
  const words = onTape(mm(Math.abs(y)), unit);
  if (words === "0" || words === "0 mm") return "on the line";
  return `${words} ${y > 0 ? "left" : "right"}`;
}

/** What an entry was understood as, or what is wrong with it. Null: nothing is typed. */
export type Understood = { mm: Millimetres; words: string } | { problem: string } | null;

/** Reads an entry while it is typed, and says it back in both units: "26 1/2 in, 673.1 mm". */
export function understood(typed: string, unit: LengthUnit): Understood {
  if (typed.trim() === "") return null;
  const read = parseLength(typed, unit);
  if (!read.ok) return { problem: read.problem };
  const both = [`${formatInches(read.value, { denominator: 32 })} in`, formatMillimetres(read.value, 1)];
  return { mm: read.value, words: (unit === "in" ? both : both.reverse()).join(", ") };
}

/** The length in an entry, or null while it cannot be read. */
export function lengthIn(typed: string | undefined, unit: LengthUnit): Millimetres | null {
  const read = understood(typed ?? "", unit);
  return read && "mm" in read ? read.mm : null;
}
