import { leastSquares } from "../geometry/least-squares";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, formatDegrees, toDegrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A stand under the frame with the height of the frame datum over it, by water level or laser. x forward, y left. */
export type StandHeight = { id: string; x: Millimetres; y: Millimetres; height: Millimetres };

/** How a frame stands. Negative means low: nose low, right side low. */
export type LevelReading = {
  method: "heights" | "gauge";
  noseHigh: Degrees;
  rightHigh: Degrees;
  /** The largest height left over the fitted plane: bend that no stand takes out. Null with the gauge. */
  twist: Millimetres | null;
  /** Height over the fitted plane at each stand; empty with the gauge. */
  residuals: { id: string; residual: Millimetres }[];
};

/**
 * Slope from a gauge read, turned end for end and read again: the gauge's own error cancels.
 * @returns slope = (first − turned)/2, the gauge's offset = (first + turned)/2
 * Source: reversal, as for any spirit level (common practice).
 * @example gaugeSlope(degrees(0.4), degrees(0.2)) // slope 0.1, the gauge's own error 0.3
 */
export function gaugeSlope(first: Degrees, turned: Degrees): { slope: Degrees; gaugeOffset: Degrees } {
  return { slope: degrees((first - turned) / 2), gaugeOffset: degrees((first + turned) / 2) };
}

/**
 * Level from heights at three stands or more: the plane z = c + a·x + b·y that fits them best, pitch = atan a,
 * roll = −atan b. Three stands always fit: twist shows from the fourth on.
 * @returns a problem when there are fewer than three, or all stand in one line
 * @example levelFromHeights(stands).value.noseHigh // 0.5968 where the front stands 1/8 in higher a foot
 */
export function levelFromHeights(stands: readonly StandHeight[]): Outcome<LevelReading> {
  if (stands.length < 3)
    return problem("Heights at three stands or more make a level; a fourth shows twist.");
  const fit = leastSquares(
    stands.map((stand) => [1, stand.x, stand.y]),
    stands.map((stand) => stand.height),
  );
  if (!fit) return problem("The stands are in one line: a height beside it is needed.");
  const [, a = 0, b = 0] = fit.solution;
  const residuals = stands.map((stand, i) => ({ id: stand.id, residual: mm(fit.residuals[i] ?? 0) }));
  return ok({
    method: "heights",
    noseHigh: toDegrees(Math.atan(a)),
    rightHigh: toDegrees(-Math.atan(b)),
    twist: mm(Math.max(...residuals.map((r) => Math.abs(r.residual)))),
    residuals,
  });
}

export type GaugePlace = "leftRail" | "rightRail" | "frontCross" | "rearCross";
export type GaugeReadings = Record<GaugePlace, { first: Degrees; turned: Degrees }>;
export type GaugeLevel = LevelReading & {
  gaugeOffset: Degrees;
  /** Rails against each other and cross-members against each other, whichever differs more. */
  twistDegrees: Degrees;
  /** The gauge's own error changed by more than its resolution between places: not to be trusted. */
  gaugeDoubt: boolean;
};

/** A digital gauge's usual resolution (common practice, no source). */
export const GAUGE_RESOLUTION = degrees(0.1);

/**
 * Level from an angle gauge, read both ways round on both rails (nose up positive) and on the front and the rear
 * cross-member (right side up positive).
 * @example levelFromAngles(readings).noseHigh // 0.1 where both rails read 0.4 and, turned, 0.2
 */
export function levelFromAngles(readings: GaugeReadings, resolution: Degrees = GAUGE_RESOLUTION): GaugeLevel {
  const at = (place: GaugePlace) => gaugeSlope(readings[place].first, readings[place].turned);
  const [left, right, front, rear] = [at("leftRail"), at("rightRail"), at("frontCross"), at("rearCross")];
  const offsets = [left, right, front, rear].map((reading) => reading.gaugeOffset);
  const [rails, crosses] = [left.slope - right.slope, front.slope - rear.slope];
  return {
    method: "gauge",
    noseHigh: degrees((left.slope + right.slope) / 2),
    rightHigh: degrees((front.slope + rear.slope) / 2),
    twist: null,
    residuals: [],
    gaugeOffset: degrees(offsets.reduce((sum, offset) => sum + offset, 0) / offsets.length),
    twistDegrees: degrees(Math.abs(rails) > Math.abs(crosses) ? rails : crosses),
    gaugeDoubt: Math.max(...offsets) - Math.min(...offsets) > resolution + 1e-9,
  };
}

/**
 * The slope at which a point so high lands so far out: asin(e/h).
 * @throws RangeError when e is not within h: slopeTolerance says it in words
 * @example allowedSlope(inches(0.524), inches(30)) // 1.0008
 */
export function allowedSlope(allowedError: Millimetres, height: Millimetres): Degrees {
  if (!(height > 0) || allowedError < 0 || allowedError > height)
    throw new RangeError(`No slope puts a point ${height} mm high out by ${allowedError} mm`);
  return toDegrees(Math.asin(allowedError / height));
}

/**
 * How far a point so high lands from where it would on a true frame: h·sin θ, sign of the slope kept.
 * @example landsOut(inches(30), degrees(1)) // 0.524 in
 */
export const landsOut = (height: Millimetres, slope: Degrees): Millimetres =>
  mm(height * Math.sin(toRadians(slope)));

export type LevelVerdict = { isTrue: boolean; headline: string; noseTrue: boolean; sideTrue: boolean };

/** Slopes below this are not spoken of: they round to 0.00°. */
const SPOKEN = 0.005;

/**
 * The verdict on a level in words: "Right side high 0.60°, nose high 0.10°." the larger first; "Level both ways."
 * True when neither direction exceeds what is allowed; compared unrounded, equal is true.
 * @example levelVerdict({ noseHigh: degrees(0.0977), rightHigh: degrees(0.5968) }, degrees(0.1)).isTrue // false
 */
export function levelVerdict(
  reading: Pick<LevelReading, "noseHigh" | "rightHigh">,
  allowed: Degrees,
): LevelVerdict {
  const { noseHigh, rightHigh } = reading;
  const parts = [
    {
      size: Math.abs(rightHigh),
      words: `${rightHigh > 0 ? "right" : "left"} side high ${formatDegrees(degrees(Math.abs(rightHigh)))}`,
    },
    {
      size: Math.abs(noseHigh),
      words: `nose ${noseHigh > 0 ? "high" : "low"} ${formatDegrees(degrees(Math.abs(noseHigh)))}`,
    },
  ]
    .filter((part) => part.size >= SPOKEN)
    .sort((a, b) => b.size - a.size);
  const words = parts.map((part) => part.words).join(", ");
  const noseTrue = Math.abs(noseHigh) <= allowed;
  const sideTrue = Math.abs(rightHigh) <= allowed;
  return {
    isTrue: noseTrue && sideTrue,
    noseTrue,
    sideTrue,
    headline: words === "" ? "Level both ways." : `${words.charAt(0).toUpperCase()}${words.slice(1)}.`,
  };
}

export type StandCorrections = {
  /** How far to raise each stand; negative: lower; 0: leave it. */
  moves: { id: string; raise: Millimetres }[];
  /** What will be left then. */
  after: LevelReading;
};

/**
 * What to do at each stand to bring the fitted plane level: the slope is taken out, twist is not. Every move is
 * rounded to the shim, halves up. `raise` lifts all to the highest point of the plane; `either` also lowers, and picks
 * the height at which the fewest stands move, then the least movement.
 * @returns a problem as levelFromHeights
 * @example standCorrections(stands, { mode: "raise", shim: inches(1 / 16) }).value.moves // 5/16, 0, 1/2 and 3/16 in
 */
export function standCorrections(
  stands: readonly StandHeight[],
  options: { mode: "raise" | "either"; shim: Millimetres },
): Outcome<StandCorrections> {
  if (!(options.shim > 0)) throw new RangeError(`${options.shim} mm is not a shim`);
  const level = levelFromHeights(stands);
  if (!level.ok) return level;
  const fitted = stands.map((stand, i) => stand.height - (level.value.residuals[i]?.residual ?? 0));
  const movesTo = (target: number) =>
    fitted.map((f) => Math.round((target - f) / options.shim + 1e-9) * options.shim);
  const targets = options.mode === "raise" ? [Math.max(...fitted)] : fitted;
  const cost = (moves: number[]) => [
    moves.filter((m) => m !== 0).length,
    moves.reduce((sum, m) => sum + Math.abs(m), 0),
  ];
  const best = targets.map(movesTo).reduce((a, b) => {
    const [[na = 0, sa = 0], [nb = 0, sb = 0]] = [cost(a), cost(b)];
    return nb < na || (nb === na && sb < sa - 1e-9) ? b : a;
  });
  const after = levelFromHeights(
    stands.map((stand, i) => ({ ...stand, height: mm(stand.height + (best[i] ?? 0)) })),
  );
  if (!after.ok) return after;
  return ok({
    moves: stands.map((stand, i) => ({ id: stand.id, raise: mm((best[i] ?? 0) + 0) })),
    after: after.value,
  });
}
