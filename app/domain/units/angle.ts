import { decimals } from "./rounding";

/** An angle in degrees, decimal. */
export type Degrees = number & { readonly __unit: "degrees" };

/** Marks a number as degrees. @throws RangeError when it is not finite */
export function degrees(n: number): Degrees {
  if (!Number.isFinite(n)) throw new RangeError(`${n} is not an angle`);
  return n as Degrees;
}

export const toRadians = (angle: Degrees): number => (angle * Math.PI) / 180;
export const toDegrees = (radians: number): Degrees => degrees((radians * 180) / Math.PI);

/**
 * "0.60°", "−0.18°": a true minus sign, and no minus on a zero; halves away from zero.
 * @example formatDegrees(degrees(-0.175)) // "−0.18°"
 */
export function formatDegrees(angle: Degrees, places = 2): string {
  const { sign, size } = decimals(angle, places);
  return `${sign}${size}°`;
}

/**
 * "12° 30′": whole minutes of arc, as on a protractor with a vernier.
 * @example formatDegreesAndMinutes(degrees(-0.5)) // "−0° 30′"
 */
export function formatDegreesAndMinutes(angle: Degrees): string {
  const { sign, size } = decimals(angle * 60, 0);
  const minutes = Number(size);
  return `${sign}${Math.floor(minutes / 60)}° ${String(minutes % 60).padStart(2, "0")}′`;
}
