import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { sinc, solveBetween, versinc } from "./small-angle";

/** A piece of a circle. Rise, radius, angle and area share one sign: negative is an arch turned over. */
export type CircularSegment = {
  arc: Millimetres;
  chord: Millimetres;
  rise: Millimetres;
  /** Null when flat: the radius has grown beyond all bounds. */
  radius: Millimetres | null;
  /** At the centre, between the ends. */
  angle: Degrees;
  /** Square millimetres between arc and chord. */
  area: number;
};

export type SegmentGiven = {
  arc?: Millimetres | undefined;
  chord?: Millimetres | undefined;
  rise?: Millimetres | undefined;
  radius?: Millimetres | undefined;
  angle?: Degrees | undefined;
};

/** Half angles below this (radians) are flat: over 100 m of arc the rise would be a millionth of a millimetre. */
const FLAT = 1e-11;
/** Half the angle at which rise over arc is largest: tan(φ/2) = φ. */
const STEEPEST = 2.331122370414423;

/** Half the angle at the centre, radians with the sign of the rise, and the arc. */
type HalfAngle = { half: number; arc: number };
type Pair = (first: number, second: number) => Outcome<HalfAngle>;

const found = (half: number, arc: number): Outcome<HalfAngle> => ok({ half, arc });

const PAIRS: Record<string, Pair> = {
  "arc+chord": (arc, chord) => {
    if (chord > arc) return problem("The chord is longer than the arc: one of the two was read wrongly.");
    return found(solveBetween(sinc, chord / arc, 0, Math.PI, 1, 0) ?? Math.PI, arc);
  },
  "arc+rise": (arc, rise) => {
    const half = solveBetween((x) => versinc(x) / 2, Math.abs(rise) / arc, 0, STEEPEST, 1, 0);
    return half === null
      ? problem("No circle rises so far with so short an arc.")
      : found(Math.sign(rise) * half, arc);
  },
  "arc+radius": (arc, radius) => found(arc / (2 * radius), arc),
  "arc+angle": (arc, angle) => found(angle / 2, arc),
  "chord+rise": (chord, rise) => {
    const half = 2 * Math.atan((2 * rise) / chord);
    return found(half, chord / sinc(half));
  },
  "chord+radius": (chord, radius) => {
    if (chord > 2 * Math.abs(radius)) return problem("The chord is longer than the circle is wide.");
    const half = Math.asin(chord / (2 * radius));
    return found(half, 2 * half * radius);
  },
  "chord+angle": (chord, angle) => found(angle / 2, chord / sinc(angle / 2)),
  "rise+radius": (rise, radius) => {
    const share = rise / radius;
    if (share < 0) return problem("Rise and radius have opposite signs.");
    if (share === 0) return problem("A rise of nothing with a radius leaves no arc.");
    if (share >= 2) return problem("The rise is as much as the circle is high, or more.");
    const half = Math.sign(radius) * 2 * Math.asin(Math.sqrt(share / 2));
    return found(half, 2 * half * radius);
  },
  "rise+angle": (rise, angle) => {
    if (rise === 0 || angle === 0) return problem("Flat, rise and angle say nothing about the length.");
    if (rise > 0 !== angle > 0) return problem("Rise and angle have opposite signs.");
    return found(angle / 2, (2 * rise) / versinc(angle / 2));
  },
  "radius+angle": (radius, angle) => {
    if (angle === 0) return problem("An angle of nothing with a radius leaves no arc.");
    if (radius > 0 !== angle > 0) return problem("Radius and angle have opposite signs.");
    return found(angle / 2, radius * angle);
  },
};

/**
 * A circular arc from any two of arc, chord, rise, radius and angle: the leaf from what could be measured of it.
 * Arc α·r, chord 2r·sin(α/2), rise r(1 − cos(α/2)), area r²(α − sin α)/2; near flat by their limits, so that a flat leaf is
 * an arc like any other. Arc with chord leaves the side open: the rise is given positive. Chord with radius is the shorter
 * of the two arcs; arc with rise the flatter, where there are two (only past a half circle).
 * Source: Machinery's Handbook, 31st edition, pp. 79 and 83.
 * @param given exactly two; millimetres and degrees; negative rise, radius or angle: reverse arch
 * @returns a problem when not two are given, or no arc less than a full circle has them
 * @example segmentFrom({ chord: inches(48), rise: inches(6) }) // radius 51 in, angle 56.145°, arc 49.97565 in
 */
export function segmentFrom(given: SegmentGiven): Outcome<CircularSegment> {
  const { arc, chord, rise, radius, angle } = given;
  const radians = angle === undefined ? undefined : toRadians(angle);
  const known = Object.entries({ arc, chord, rise, radius, angle: radians }).filter(
    (entry): entry is [string, number] => entry[1] !== undefined,
  );
  const [first, second] = known;
  if (!first || !second || known.length > 2)
    return problem("Give two of arc, chord, rise, radius and angle: no more, no less.");
  if ((arc !== undefined && arc <= 0) || (chord !== undefined && chord <= 0))
    return problem("Arc and chord are longer than nothing.");
  if (radius === 0) return problem("A radius of nothing is no arc.");
  const pair = PAIRS[`${first[0]}+${second[0]}`];
  if (!pair) throw new RangeError(`${first[0]} and ${second[0]} are not a pair`);
  const answer = pair(first[1], second[1]);
  return answer.ok ? segment(answer.value) : answer;
}

function segment({ half, arc }: HalfAngle): Outcome<CircularSegment> {
  if (Math.abs(half) >= Math.PI) return problem("That would be a full circle or more.");
  const flat = Math.abs(half) < FLAT;
  const size = {
    arc,
    chord: arc * sinc(half),
    rise: (arc * versinc(half)) / 2,
    area: arc * arc * bulge(half),
  };
  const radius = flat ? 0 : arc / (2 * half);
  if (![...Object.values(size), radius].every(Number.isFinite) || !(arc > 0))
    return problem("No leaf is as large or as small as these figures.");
  return ok({
    arc: mm(size.arc),
    chord: mm(size.chord),
    rise: mm(flat ? 0 : size.rise),
    radius: flat ? null : mm(radius),
    angle: toDegrees(flat ? 0 : 2 * half),
    area: flat ? 0 : size.area,
  });
}

/** (α − sin α)/(2α²) with α = 2·half; by its series α/12 − α³/240 near zero. */
function bulge(half: number): number {
  const angle = 2 * half;
  return Math.abs(angle) < 1e-2
    ? angle / 12 - angle ** 3 / 240 + angle ** 5 / 10080
    : (angle - Math.sin(angle)) / (2 * angle * angle);
}

/**
 * Arc length by Huygens's rule, (8·chord of half the arc − chord)/3, good for a rise up to four tenths of the chord: kept
 * beside the exact sum because it can be done at the bench with a tape alone.
 * Source: Building Trades Pocketbook, mensuration.
 * @param chord end to end, millimetres
 * @param rise millimetres, either sign
 * @returns millimetres; always a number
 * @example arcByHuygens(inches(48), inches(6)) // 49.96969 in
 */
export const arcByHuygens = (chord: Millimetres, rise: Millimetres): Millimetres =>
  mm((8 * Math.hypot(chord / 2, rise) - chord) / 3);

/**
 * Arc length as of a flat parabola: chord + 8·rise²/(3·chord).
 * Source: first term of the series of the arc length (any calculus text).
 * @param chord more than 0, millimetres
 * @param rise millimetres, either sign
 * @throws RangeError when the chord is 0
 * @example arcByParabola(inches(48), inches(6)) // 50 in
 */
export const arcByParabola = (chord: Millimetres, rise: Millimetres): Millimetres =>
  mm(chord + (8 * rise * rise) / (3 * chord));
