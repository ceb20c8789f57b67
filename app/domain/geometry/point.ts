import { type Degrees, degrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** A point on a bay's floor: A is the origin, A to B is +x, y to the left. */
export type FloorPoint = { readonly x: Millimetres; readonly y: Millimetres };
/** A point on the frame: how far ahead of the rear datum pair, how far left of the frame centre line. */
export type FramePoint = { readonly station: Millimetres; readonly offset: Millimetres };

export const floorPoint = (x: number, y: number): FloorPoint => ({ x: mm(x), y: mm(y) });
export const framePoint = (station: number, offset: number): FramePoint => ({
  station: mm(station),
  offset: mm(offset),
});

/** Distance between two floor points. */
export const distance = (a: FloorPoint, b: FloorPoint): Millimetres => mm(Math.hypot(a.x - b.x, a.y - b.y));
/** The point half way between. */
export const middle = (a: FloorPoint, b: FloorPoint): FloorPoint =>
  floorPoint((a.x + b.x) / 2, (a.y + b.y) / 2);

/** Turns a vector by an angle, positive to the left. */
export function turned(v: FloorPoint, by: Degrees): FloorPoint {
  const [c, s] = [Math.cos(toRadians(by)), Math.sin(toRadians(by))];
  return floorPoint(c * v.x - s * v.y, s * v.x + c * v.y);
}

/** The direction from one point to another, positive to the left of A to B. */
export const direction = (from: FloorPoint, to: FloorPoint): Degrees =>
  degrees((Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI);
