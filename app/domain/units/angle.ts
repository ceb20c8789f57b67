/** An angle in degrees, decimal. */
export type Degrees = number & { readonly __unit: "degrees" };

/** Marks a number as degrees. @throws RangeError when it is not finite */
export function degrees(n: number): Degrees {
  if (!Number.isFinite(n)) throw new RangeError(`${n} is not an angle`);
  return n as Degrees;
}

export const toRadians = (angle: Degrees): number => (angle * Math.PI) / 180;
export const toDegrees = (radians: number): Degrees => degrees((radians * 180) / Math.PI);

/** "0.60°", "−0.18°": a true minus sign, and no minus on a zero. */
export function formatDegrees(angle: Degrees, places = 2): string {
  const size = Math.abs(angle).toFixed(places);
  return `${angle < 0 && Number(size) !== 0 ? "−" : ""}${size}°`;
}
