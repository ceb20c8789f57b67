import {
  formatInches,
  formatMillimetres,
  inches,
  type LengthUnit,
  type Millimetres,
  MM_PER_INCH,
  mm,
  toInches,
} from "../units/length";
import { adjustTies, isOnSide, isSuspect, type Tie } from "./tie-fit";

/** A slip of this trade that would make the tapes meet. */
export type Suggestion = {
  kind:
    | "inch-burnt"
    | "inch-lost"
    | "centimetres"
    | "digits-swapped"
    | "six-for-nine"
    | "marks-swapped"
    | "sides-swapped";
  words: string;
  /** The tape it concerns; null when it concerns no single one. */
  mark: string | null;
  /** What the tape would read then; null likewise. */
  reading: Millimetres | null;
  /** Largest residual that would be left. */
  within: Millimetres;
};

type Candidate = Omit<Suggestion, "words" | "within"> & { ties: Tie[]; side: 1 | -1; slip: string };

/**
 * Known blunders that would make all tapes agree: an inch burnt or lost, centimetres read for inches, two digits
 * swapped, 6 for 9, two marks' readings swapped, left for right. Each is tried alone, the best fit first.
 * Source of the list: common practice, no source.
 * @example suggestBlunders(ties, 1, inches(1 / 32), "in")[0].kind // "inch-burnt" where 64 3/16 was read for 63 3/16
 */
export function suggestBlunders(
  ties: readonly Tie[],
  side: 1 | -1,
  sigma: Millimetres,
  unit: LengthUnit,
): Suggestion[] {
  const found: Suggestion[] = [];
  for (const { ties: changed, side: on, slip, ...candidate } of candidates(ties, side, unit)) {
    const fit = adjustTies(changed, on, sigma);
    if (!fit.ok || isSuspect(fit.value) || !isOnSide(fit.value, on)) continue;
    const within = mm(Math.max(...fit.value.residuals.map((residual) => Math.abs(residual.residual))));
    const twin = found.find(
      (other) =>
        other.mark === candidate.mark &&
        candidate.mark !== null &&
        Math.abs((other.reading ?? 0) - (candidate.reading ?? 0)) < 0.01,
    );
    if (!twin) found.push({ ...candidate, within, words: wordsFor(slip, candidate.reading, within, unit) });
  }
  return found.sort((a, b) => a.within - b.within);
}

function wordsFor(slip: string, reading: Millimetres | null, within: Millimetres, unit: LengthUnit): string {
  const step = MM_PER_INCH / 32;
  const close =
    unit === "in"
      ? formatInches(mm(Math.max(step, Math.ceil(within / step - 1e-6) * step)), { denominator: 32 })
      : formatMillimetres(mm(Math.max(1, Math.ceil(within))));
  if (reading === null) return `Looks like ${slip}: then all fit within ${close}.`;
  const value = unit === "in" ? formatInches(reading, { denominator: 32 }) : formatMillimetres(reading, 1);
  return `Looks like ${slip}: ${value} fits within ${close}.`;
}

/** The whole inches (or millimetres) of a reading with two neighbouring digits swapped, or one 6 turned into a 9 and the other way. */
function misread(
  length: Millimetres,
  unit: LengthUnit,
): { kind: "digits-swapped" | "six-for-nine"; reading: Millimetres }[] {
  const total = unit === "in" ? toInches(length) : length;
  const whole = Math.floor(total + 1e-9);
  const readingOf = unit === "in" ? inches : mm;
  const digits = String(whole);
  const results: { kind: "digits-swapped" | "six-for-nine"; reading: Millimetres }[] = [];
  const add = (kind: "digits-swapped" | "six-for-nine", text: string) => {
    if (text !== digits && !text.startsWith("0"))
      results.push({ kind, reading: readingOf(Number(text) + total - whole) });
  };
  for (let i = 0; i + 1 < digits.length; i++)
    add("digits-swapped", `${digits.slice(0, i)}${digits[i + 1]}${digits[i]}${digits.slice(i + 2)}`);
  for (let i = 0; i < digits.length; i++) {
    if (digits[i] === "6") add("six-for-nine", `${digits.slice(0, i)}9${digits.slice(i + 1)}`);
    if (digits[i] === "9") add("six-for-nine", `${digits.slice(0, i)}6${digits.slice(i + 1)}`);
  }
  return results;
}

function candidates(ties: readonly Tie[], side: 1 | -1, unit: LengthUnit): Candidate[] {
  const list: Candidate[] = [];
  ties.forEach((tie, i) => {
    const one = (kind: Suggestion["kind"], reading: number, slip: string) => {
      if (reading > 0)
        list.push({
          kind,
          mark: tie.mark,
          reading: mm(reading),
          side,
          slip,
          ties: ties.map((other, j) => (j === i ? { ...other, distance: mm(reading) } : other)),
        });
    };
    const from = `on the tape from mark ${tie.mark}`;
    one("inch-burnt", tie.distance - MM_PER_INCH, `an inch burnt ${from}`);
    one("inch-lost", tie.distance + MM_PER_INCH, `an inch taken off twice ${from}`);
    one("centimetres", tie.distance / 2.54, `centimetres read for inches ${from}`);
    one("centimetres", tie.distance * 2.54, `inches read for centimetres ${from}`);
    for (const { kind, reading } of misread(tie.distance, unit))
      one(kind, reading, `${kind === "digits-swapped" ? "two digits swapped" : "a 6 for a 9"} ${from}`);
    ties.slice(i + 1).forEach((other) => {
      const swapped = ties.map((t) =>
        t === tie ? { ...t, distance: other.distance } : t === other ? { ...t, distance: tie.distance } : t,
      );
      list.push({
        kind: "marks-swapped",
        mark: null,
        reading: null,
        side,
        slip: `the tapes from marks ${tie.mark} and ${other.mark} swapped`,
        ties: swapped,
      });
    });
  });
  list.push({
    kind: "sides-swapped",
    mark: null,
    reading: null,
    side: side === 1 ? -1 : 1,
    slip: "left and right swapped",
    ties: [...ties],
  });
  return list;
}
