import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";

/** A shaft's direction: in plan to the left positive, from the side up positive, both against straight ahead. */
export type ShaftAngles = { plan: Degrees; side: Degrees };
type Vector = readonly [number, number, number];

/** Unit vector of a shaft whose plan and side views lie at these angles. */
function directionOf({ plan, side }: ShaftAngles): Vector {
  const [y, z] = [Math.tan(toRadians(plan)), Math.tan(toRadians(side))];
  const length = Math.hypot(1, y, z);
  return [1 / length, y / length, z / length];
}

/**
 * The operating angle of a universal joint: the angle in space between its two shafts, from plan and side views.
 * Source: solid geometry; two small angles nearly add by squares, which is the makers' rule of thumb.
 * @param a, b shafts within 90° of straight ahead
 * @throws RangeError for a shaft across the vehicle or beyond
 * @example jointAngle({ plan: degrees(0), side: degrees(0) }, { plan: degrees(3), side: degrees(4) }) // 4.99417
 */
export function jointAngle(a: ShaftAngles, b: ShaftAngles): Degrees {
  for (const { plan, side } of [a, b])
    if (Math.abs(plan) >= 90 || Math.abs(side) >= 90) throw new RangeError("A shaft lies along the vehicle");
  const [[ax, ay, az], [bx, by, bz]] = [directionOf(a), directionOf(b)];
  const across = Math.hypot(ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx);
  return toDegrees(Math.atan2(across, ax * bx + ay * by + az * bz));
}

/**
 * Speed of the driven shaft for one of the driving one: cos β/(1 − sin²β·cos²θ).
 * Source: any text on the single universal joint, e.g. Khurmi & Gupta, Theory of Machines, ch. 9.
 * @param turned of the driving fork, from the plane of the shafts
 * @example velocityRatio(degrees(30), degrees(0)) // 1.154701
 */
export function velocityRatio(joint: Degrees, turned: Degrees): number {
  const [b, t] = [toRadians(joint), toRadians(turned)];
  return Math.cos(b) / (1 - (Math.sin(b) * Math.cos(t)) ** 2);
}

/** How unevenly a joint drives: (fastest − slowest)/mean = tan β·sin β. @example unevenness(degrees(3)) // 0.002743 */
export const unevenness = (joint: Degrees): number => Math.tan(toRadians(joint)) * Math.sin(toRadians(joint));

/** The furthest that the driven shaft lags or leads: asin((1 − cos β)/(1 + cos β)). @example mostLag(degrees(30)) // 4.1172 */
export function mostLag(joint: Degrees): Degrees {
  const cos = Math.cos(toRadians(joint));
  return toDegrees(Math.asin((1 - cos) / (1 + cos)));
}

/**
 * Peak angular acceleration of the driven shaft, rad/s², at a steady speed, near enough β²·ω² for the angles of a
 * propshaft; taken at the turn where it is greatest.
 * @param rpm of the driving shaft
 * @example peakAcceleration(degrees(3), 3000) // 270.7
 */
export function peakAcceleration(joint: Degrees, rpm: number): number {
  const omega = (rpm * 2 * Math.PI) / 60;
  const b = toRadians(joint);
  const s = Math.sin(b) ** 2;
  if (s === 0) return 0;
  // d/dθ of the ratio is greatest where cos 2θ = (√((2 − s)² + 8s²) − (2 − s))/(2s), from setting the next to nothing.
  const c2 = (Math.sqrt((2 - s) ** 2 + 8 * s * s) - (2 - s)) / (2 * s);
  const sin2 = Math.sqrt(Math.max(0, 1 - c2 * c2));
  return (omega * omega * Math.cos(b) * s * sin2) / (1 - (s * (1 + c2)) / 2) ** 2;
}

/**
 * What two joints leave together: the angle of the one joint that would drive as unevenly.
 * In phase their squares subtract, with the forks a quarter turn apart they add; between, they add as vectors of twice
 * the phase.
 * Source: joints in series to first order; makers' handbooks give the two ends.
 * @param phase how far the second joint's fork is turned from being in phase with the first's
 * @example residualAngle(degrees(5), degrees(4), degrees(0)) // 3
 */
export function residualAngle(first: Degrees, second: Degrees, phase: Degrees): Degrees {
  const [a, b] = [first ** 2, second ** 2];
  const squared = Math.hypot(a - b * Math.cos(2 * toRadians(phase)), b * Math.sin(2 * toRadians(phase)));
  return degrees(Math.sqrt(squared));
}

/** How sure a limit is: makers' handbooks, read in part, or from memory. */
export type SpeedLimit = { rpm: number; angle: Degrees; status: "read" | "from memory" };

/** Largest operating angle by speed. Source: driveshaft makers' handbooks: guidance, no standard. */
export const SPEED_LIMITS: readonly SpeedLimit[] = (
  [
    [5000, 3.2, "read"],
    [4500, 3.7, "read"],
    [4000, 4.2, "read"],
    [3500, 5.0, "read"],
    [3000, 5.8, "from memory"],
    [2500, 7.0, "from memory"],
    [2000, 8.7, "from memory"],
    [1500, 11.5, "from memory"],
  ] as const
).map(([rpm, angle, status]) => ({ rpm, angle: degrees(angle), status }));

/** Each at least this, so that the needles roll; at most that; and within that of each other, at ride height. Common practice. */
export const USUAL_JOINTS = { least: degrees(0.5), most: degrees(3), apart: degrees(1) };

/**
 * The guidance for a speed: the limit at the next higher speed of the table, which is on the safe side.
 * @returns null above the table
 * @example limitAt(2800) // 5.8 at 3000
 */
export const limitAt = (rpm: number): SpeedLimit | null =>
  [...SPEED_LIMITS].reverse().find((limit) => limit.rpm >= rpm) ?? null;

/**
 * What is to be said of a pair of joints, in words; nothing when all is within the usual.
 * @example jointWords(degrees(0.2), degrees(2)) // ["The first joint works at 0.20°: under 0.5° its needles do not roll.", …]
 */
export function jointWords(first: Degrees, second: Degrees, rpm: number | null = null): string[] {
  const words: string[] = [];
  for (const [name, angle] of [
    ["first", first],
    ["second", second],
  ] as const) {
    const shown = `${angle.toFixed(2)}°`;
    if (angle < USUAL_JOINTS.least)
      words.push(`The ${name} joint works at ${shown}: under 0.5° its needles do not roll.`);
    const limit = rpm === null ? null : limitAt(rpm);
    if (limit && angle > limit.angle)
      words.push(
        `The ${name} joint works at ${shown}: makers advise at most ${limit.angle}° at ${limit.rpm} rpm.`,
      );
    else if (angle > USUAL_JOINTS.most)
      words.push(`The ${name} joint works at ${shown}: over 3° it is felt.`);
  }
  if (Math.abs(first - second) > USUAL_JOINTS.apart)
    words.push(`The joints differ by ${Math.abs(first - second).toFixed(2)}°: more than 1° is felt.`);
  return words;
}
