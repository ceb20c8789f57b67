import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";

/** What keeps the middle of the spring from bending. */
export type SpringSeat =
  | { kind: "none" }
  /** A band round the leaves: all of its width is stiff. Also U-bolts that are to count so. */
  | { kind: "band"; length: Millimetres }
  /** Two U-bolts: two thirds of the distance between them is stiff. */
  | { kind: "u-bolts"; length: Millimetres };

/** The share of the distance between U-bolts that does not bend. Khurmi & Gupta, A Textbook of Machine Design. */
export const U_BOLT_STIFF_SHARE = 2 / 3;

/** A semi-elliptic spring of leaves of one section, pin in the middle. */
export type LeafPack = {
  /** All leaves, the main leaf among them. */
  leaves: number;
  /** Leaves that reach from end to end, the main leaf among them; 1 or more. */
  fullLength: number;
  /**
   * Textbooks differ on the set to which the main leaf belongs in the formulas. "full-length" (as Khurmi & Gupta): all of
   * fullLength are full-length leaves. "graduated" (as Bhandari): only the extra ones are, the main leaf tops the
   * graduated stack.
   */
  mainLeafCountsAs: "full-length" | "graduated";
  width: Millimetres;
  thickness: Millimetres;
  /** Eye to eye, flat. */
  span: Millimetres;
  seat: SpringSeat;
  /** Young's modulus, newtons per square millimetre (MPa). */
  modulus: number;
  /**
   * Load on the whole spring, newtons, at which all leaves carry the same stress, because the full-length ones were given
   * less camber and the bolt draws the gap shut. Null: made without nip.
   */
  nippedFor?: number | null | undefined;
};

/** Young's modulus of spring steel, MPa: the round figure of textbooks (200 to 210 thousand). */
export const SPRING_STEEL_MODULUS = 206_000;

/** Thinner, narrower or shorter (mm), or softer (MPa), is a slip of the finger, and too little to divide by (ours, no source). */
export const LEAST_FIGURE = 0.1;

export type LeafStress = { fullLength: number | null; graduated: number | null; largest: number };

/** The numbers that the formulas want. */
type Figures = { full: number; graduated: number; half: number; stiff: number; section: number };

/**
 * The length that bends, both halves together: span less the band, or less two thirds of the distance between U-bolts.
 * Source: Khurmi & Gupta, A Textbook of Machine Design, leaf springs.
 * @returns a problem when nothing is left
 * @example effectiveSpan(mm(1100), { kind: "band", length: mm(80) }) // 1020 mm
 */
export function effectiveSpan(span: Millimetres, seat: SpringSeat): Outcome<Millimetres> {
  const stiff =
    seat.kind === "none" ? 0 : seat.kind === "band" ? seat.length : seat.length * U_BOLT_STIFF_SHARE;
  if (stiff < 0) return problem("The length held by the seat cannot be negative.");
  return span > stiff
    ? ok(mm(span - stiff))
    : problem("The seat holds the whole span: nothing is left to bend.");
}

/**
 * How many leaves stand in either set of the formulas, by the pack's own way of counting.
 * @returns full-length and graduated leaves; a problem when the counts cannot be
 * @example leafCounts({ leaves: 18, fullLength: 4, mainLeafCountsAs: "graduated" }) // 3 full-length, 15 graduated
 */
export function leafCounts(
  pack: Pick<LeafPack, "leaves" | "fullLength" | "mainLeafCountsAs">,
): Outcome<{ full: number; graduated: number }> {
  const { leaves, fullLength, mainLeafCountsAs } = pack;
  if (!Number.isInteger(leaves) || !Number.isInteger(fullLength) || fullLength < 1 || leaves < fullLength)
    return problem(
      "Leaves are whole ones, the main leaf is one of the full-length leaves, and those are no more than all.",
    );
  const full = mainLeafCountsAs === "full-length" ? fullLength : fullLength - 1;
  return ok({ full, graduated: leaves - full });
}

function figures(pack: LeafPack): Outcome<Figures> {
  const counts = leafCounts(pack);
  if (!counts.ok) return counts;
  const span = effectiveSpan(pack.span, pack.seat);
  if (!span.ok) return span;
  if (Math.min(pack.width, pack.thickness, pack.modulus, span.value) < LEAST_FIGURE)
    return problem("Width, thickness, effective span and modulus are more than nothing.");
  const { full, graduated } = counts.value;
  return ok({
    full,
    graduated,
    half: span.value / 2,
    stiff: 2 * graduated + 3 * full,
    section: pack.width * pack.thickness ** 2,
  });
}

/**
 * Rate of the whole spring, F/δ with δ = 12WL³/(Ebt³(2ng + 3nf)), W = F/2 and L half the effective span. Nip does not
 * change it.
 * Source: Bhandari, Design of Machine Elements, ch. 10; Khurmi & Gupta, A Textbook of Machine Design.
 * @returns newtons per millimetre; a problem when the pack cannot be
 * @example packRate({ 7 leaves, 2 full-length, main counts as full-length, 65 × 9 mm, span 1100, band 80, E 210000 }) // 200.04
 */
export function packRate(pack: LeafPack): Outcome<number> {
  const known = figures(pack);
  if (!known.ok) return known;
  const { half, stiff, section } = known.value;
  return ok((pack.modulus * section * pack.thickness * stiff) / (6 * half ** 3));
}

/**
 * How far a load bends the spring from free.
 * @param load newtons, on the whole spring
 * @returns millimetres; a problem as packRate
 * @example packDeflection(pack of packRate, 6000) // 29.9939 mm
 */
export function packDeflection(pack: LeafPack, load: number): Outcome<Millimetres> {
  const rate = packRate(pack);
  return rate.ok ? ok(mm(load / rate.value)) : rate;
}

/**
 * Stress at a load: σf = 18WL/(bt²(2ng + 3nf)) in the full-length leaves and two thirds of it in the graduated ones; with
 * nip the full-length leaves start below nothing by 3·Wb·L/(nf·bt²), the graduated above it, so that at the load for which
 * the nip was made every leaf carries 6WL/(nbt²).
 * Source: Bhandari, Design of Machine Elements, ch. 10.
 * @param load newtons, on the whole spring
 * @returns newtons per square millimetre; null for a set without leaves; a problem as packRate
 * @example packStress(pack of packRate, 6000) // full-length 326.92, graduated 217.95
 */
export function packStress(pack: LeafPack, load: number): Outcome<LeafStress> {
  const known = figures(pack);
  if (!known.ok) return known;
  const { full, graduated, half, stiff, section } = known.value;
  const together = (9 * load * half) / (section * stiff);
  const bolt = pack.nippedFor ? boltLoad(known.value, pack.nippedFor) : 0;
  const drawn = (leaves: number) => (3 * bolt * half) / (leaves * section);
  const inFull = full > 0 ? together - drawn(full) : null;
  const inGraduated = graduated > 0 ? (2 / 3) * together + drawn(graduated) : null;
  const largest = Math.max(Math.abs(inFull ?? 0), Math.abs(inGraduated ?? 0));
  return ok({ fullLength: inFull, graduated: inGraduated, largest });
}

/** Bolt load that shuts the gap, newtons: Wb = 2·nf·ng·W/(n(2ng + 3nf)), W = F/2. */
const boltLoad = ({ full, graduated, stiff }: Figures, load: number): number =>
  (full * graduated * load) / ((full + graduated) * stiff);

/**
 * The gap to leave between full-length and graduated leaves before the bolt is drawn, so that at a load all carry one
 * stress, and the bolt load that shuts it: C = 2WL³/(Enbt³), Wb = 2·nf·ng·W/(n(2ng + 3nf)).
 * Source: Bhandari, Design of Machine Elements, ch. 10.
 * @param load newtons, on the whole spring
 * @returns millimetres and newtons; a problem as packRate, or when all leaves are of one set
 * @example packNip({ 18 leaves, 4 full-length, main counts as graduated, 108 × 12 mm, span 1000, no seat, E 207000 }, 75000) // 13.482 mm, 4807.7 N
 */
export function packNip(pack: LeafPack, load: number): Outcome<{ gap: Millimetres; boltLoad: number }> {
  const known = figures(pack);
  if (!known.ok) return known;
  const { full, graduated, half, section } = known.value;
  if (full === 0 || graduated === 0)
    return problem("Nip is a gap between full-length and graduated leaves: this spring has only one kind.");
  const gap = (load * half ** 3) / (pack.modulus * (full + graduated) * section * pack.thickness);
  return ok({ gap: mm(gap), boltLoad: boltLoad(known.value, load) });
}
