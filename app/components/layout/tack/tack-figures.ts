import type { AxleLine } from "../../../domain/layout/axle-line";
import { axlePoint } from "../../../domain/layout/axle-line";
import { type Millimetres, mm } from "../../../domain/units/length";

/** Pixels a millimetre, both ways. */
export const SCALE = 0.19;
export const SIZE = { width: 420, height: 400 };
/** Half the width of an axle that was not read yet, only for the length of the line. */
const HALF = mm(762);
/** The furthest that an error may be drawn from where it belongs. */
const ROOM_PX = 88;
const TIMES = [40, 20, 10, 5, 2, 1] as const;

/** An axle end as it is drawn, and how far ahead of its line it is. */
export type DrawnEnd = { x: number; y: number; lineX: number; ahead: Millimetres; isOut: boolean };

/** How many times too large errors are drawn, so that the largest still fits. */
export function timesDrawn(errors: readonly number[]): number {
  const worst = Math.max(...errors.map(Math.abs), 0);
  return TIMES.find((times) => worst * times * SCALE <= ROOM_PX) ?? 1;
}

/** Where a place on the frame lies on the picture: the nose to the right, left side up, the signed line in the middle. */
export function onPicture(wanted: AxleLine, station: number, offset: number): { x: number; y: number } {
  return {
    x: SIZE.width / 2 + (station - wanted.station) * SCALE,
    y: SIZE.height / 2 - offset * SCALE,
  };
}

type Built = { leftAhead: Millimetres; rightAhead: Millimetres; sideways: Millimetres };

/** Both ends of the tacked axle with their errors drawn larger, at the width of a usual axle. */
export function drawnEnds(
  wanted: AxleLine,
  built: Built,
  times: number,
  within: Millimetres,
): { left: DrawnEnd; right: DrawnEnd } {
  const end = (side: 1 | -1, ahead: Millimetres): DrawnEnd => {
    const offset = mm(side * HALF);
    const line = onPicture(wanted, axlePoint(wanted, offset).station, offset);
    return {
      x: line.x + ahead * times * SCALE,
      y: line.y - built.sideways * times * SCALE,
      lineX: line.x,
      ahead,
      isOut: Math.abs(ahead) > within,
    };
  };
  return { left: end(1, built.leftAhead), right: end(-1, built.rightAhead) };
}
