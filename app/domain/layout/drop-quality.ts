import { minimalDetectableBias } from "../geometry/snooping";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";
import {
  type Adjusted,
  CRITICAL_W,
  crossing,
  type Ellipse,
  ellipseFactor,
  ellipseOf,
  meetings,
  type Tie,
  tieSigma,
} from "./tie-fit";

export type DropQuality = {
  /** Standard uncertainty along the A–B line and across it. */
  along: Millimetres;
  across: Millimetres;
  /** The ellipse that holds the drop with the stated chance. */
  ellipse: Ellipse & { coverage: number };
  /** A standardized residual above this is not chance. */
  criticalResidual: number;
  /** The smallest blunder in each tape that would show; null where nothing checks it. */
  detectable: { mark: string; bias: Millimetres | null }[];
  /** What the marks' places make weak, in sentences. */
  notes: string[];
};

/** Share of drops that fall within the ellipse unless another is asked. Common practice in surveying. */
export const ELLIPSE_COVERAGE = 0.95;
/** Tapes that cross at less than this are called weak. Common practice, no source. */
export const WEAK_CROSSING_DEGREES = 30;
/** A tape that lets a blunder of this size pass is barely checked: the burnt inch is the blunder to find. */
export const BLUNDER_TO_FIND = mm(25.4);
/** Marks nearer than this to one line count as in line. */
const IN_LINE = mm(10);

/**
 * How good a drop from tape ties is: standard errors, the error ellipse at a coverage, what blunder in each tape would
 * show, and what is weak about where the marks lie. Sources: tie-fit's and snooping's.
 * @param fit the adjustment of these ties
 * @param sigma standard uncertainty of a tape that says nothing else
 * @example dropQuality(ties, fit, "left", mm(0.8)).ellipse // { major: …, minor: …, angle: …, coverage: 0.95 }
 */
export function dropQuality(
  ties: readonly Tie[],
  fit: Adjusted,
  side: "left" | "right",
  sigma: Millimetres,
  options: { coverage?: number; unit?: LengthUnit } = {},
): DropQuality {
  const coverage = options.coverage ?? ELLIPSE_COVERAGE;
  const detectable = ties.map((tie, i) => {
    const checked = fit.redundancy > 0 ? (fit.residuals[i]?.redundancyNumber ?? 0) : 0;
    const bias = minimalDetectableBias(tieSigma(tie, sigma), checked);
    return { mark: tie.mark, bias: bias === null ? null : mm(bias) };
  });
  return {
    along: mm(Math.sqrt(fit.covariance.xx)),
    across: mm(Math.sqrt(fit.covariance.yy)),
    ellipse: { ...ellipseOf(fit.covariance, ellipseFactor(coverage)), coverage },
    criticalResidual: CRITICAL_W,
    detectable,
    notes: [
      ...crossingNote(ties, fit),
      ...sideNote(ties, side, fit),
      ...checkNotes(detectable, fit, options.unit ?? "in"),
    ],
  };
}

/** The tapes that cross most squarely still cross flatly. */
function crossingNote(ties: readonly Tie[], fit: Adjusted): string[] {
  const best = Math.max(...ties.flatMap((a, i) => ties.slice(i + 1).map((b) => crossing(a, b, fit.point))));
  const angle = (Math.asin(Math.min(1, best)) * 180) / Math.PI;
  if (angle >= WEAK_CROSSING_DEGREES) return [];
  return [
    `The tapes cross at ${Math.round(angle)}° at most: the point is near the line of the marks or far from them, and a small error moves it a lot. Tape from a mark to the side as well.`,
  ];
}

/** Marks in one line, or two that leave two places on the named side. */
function sideNote(ties: readonly Tie[], side: "left" | "right", fit: Adjusted): string[] {
  const [a, b] = ties;
  if (!a || !b) return [];
  const sign = side === "left" ? 1 : -1;
  if (ties.length === 2) {
    const places = meetings(a, b).filter((point) => point.y * sign > 0);
    return places.length === 2
      ? [
          `The tapes from ${a.mark} and ${b.mark} meet in two places on the ${side}: a third tape would tell which.`,
        ]
      : [];
  }
  if (fit.redundancy === 0 || !inLine(ties)) return [];
  return [
    `The marks lie in one line, so the tapes check the lengths but not the side: only that the ${side} was named does.`,
  ];
}

/** Are all marks within a little of the line through the two furthest apart? */
function inLine(ties: readonly Tie[]): boolean {
  let [from, to, longest] = [ties[0]?.at, ties[1]?.at, 0];
  for (const a of ties)
    for (const b of ties) {
      const length = Math.hypot(b.at.x - a.at.x, b.at.y - a.at.y);
      if (length > longest) [from, to, longest] = [a.at, b.at, length];
    }
  if (!from || !to || longest === 0) return true;
  const [ux, uy] = [(to.x - from.x) / longest, (to.y - from.y) / longest];
  const origin = from;
  return ties.every(({ at }) => Math.abs((at.x - origin.x) * uy - (at.y - origin.y) * ux) <= IN_LINE);
}

function checkNotes(detectable: DropQuality["detectable"], fit: Adjusted, unit: LengthUnit): string[] {
  if (fit.redundancy === 0) return ["Nothing checks this point: a blunder in either tape would not show."];
  return detectable
    .filter(({ bias }) => bias === null || bias > BLUNDER_TO_FIND)
    .map(({ mark, bias }) =>
      bias === null
        ? `Nothing checks the tape from mark ${mark}.`
        : `Little checks the tape from mark ${mark}: a blunder under ${formatLength(bias, unit)} may not show.`,
    );
}
