import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { effectiveSpan, type LeafPack, leafCounts } from "./leaf-pack";

/** A pack of which the section is still to be found. */
export type UnsizedPack = Omit<LeafPack, "width" | "thickness" | "nippedFor"> & {
  /** Made with nip for this load, so that all leaves carry one stress. */
  nipped: boolean;
  /** A width, or so many thicknesses. */
  width: { millimetres: Millimetres } | { thicknesses: number };
};

/**
 * The leaf thickness at which a load brings the most stressed leaf to a stress: from 18WL/(bt²(2ng + 3nf)), or with nip
 * from 6WL/(nbt²). Round up to the next section that is rolled.
 * Source: Khurmi & Gupta, A Textbook of Machine Design; Bhandari, Design of Machine Elements, ch. 10.
 * @param load newtons on the whole spring
 * @param stress allowed, newtons per square millimetre
 * @returns millimetres; a problem when a figure is not above nothing
 * @example thicknessFor({ 18 leaves, 4 full-length, main counts as graduated, nipped, 9 thicknesses wide, span 1000 }, 75000, 450) // 11.5560 mm
 */
export function thicknessFor(pack: UnsizedPack, load: number, stress: number): Outcome<Millimetres> {
  const counts = leafCounts(pack);
  if (!counts.ok) return counts;
  const span = effectiveSpan(pack.span, pack.seat);
  if (!span.ok) return span;
  const width = "millimetres" in pack.width ? pack.width.millimetres : pack.width.thicknesses;
  if (!(load > 0 && stress > 0 && width > 0)) return problem("Load, stress and width are more than nothing.");
  const { full, graduated } = counts.value;
  // With nip all leaves share alike; without, the full-length ones carry half as much again, where there are any.
  const share = pack.nipped || full === 0 ? 6 / (full + graduated) : 18 / (2 * graduated + 3 * full);
  const section = (share * (load / 2) * (span.value / 2)) / stress;
  return ok(mm("millimetres" in pack.width ? Math.sqrt(section / width) : Math.cbrt(section / width)));
}

/**
 * Lengths to cut, shortest first: each graduated leaf is longer by the same step, and the steps end at full length. The
 * main leaf's is without its eyes.
 * Source: Khurmi & Gupta, A Textbook of Machine Design, for two full-length leaves; even steps to any other number are
 * the same rule carried on.
 * @returns millimetres, as many as there are leaves; a problem as effectiveSpan and leafCounts
 * @example leafLengths({ 7 leaves, 2 full-length, span 1100, band 80 }) // 250, 420, 590, 760, 930, 1100, 1100
 */
export function leafLengths(
  pack: Pick<LeafPack, "leaves" | "fullLength" | "mainLeafCountsAs" | "span" | "seat">,
): Outcome<Millimetres[]> {
  const counts = leafCounts(pack);
  if (!counts.ok) return counts;
  const span = effectiveSpan(pack.span, pack.seat);
  if (!span.ok) return span;
  const graduated = pack.leaves - pack.fullLength;
  const stiff = pack.span - span.value;
  return ok(
    Array.from({ length: pack.leaves }, (_, i) =>
      mm(i < graduated ? ((i + 1) * span.value) / (graduated + 1) + stiff : pack.span),
    ),
  );
}

/**
 * Length of the main leaf before its eyes are rolled: span + 2π(eye bore + thickness).
 * Source: Khurmi & Gupta, A Textbook of Machine Design.
 * @param eyeBore inside of the rolled eye
 * @returns millimetres; always a number
 * @example mainLeafBlank(mm(1100), mm(20), mm(9)) // 1282.21 mm
 */
export const mainLeafBlank = (span: Millimetres, eyeBore: Millimetres, thickness: Millimetres): Millimetres =>
  mm(span + 2 * Math.PI * (eyeBore + thickness));
