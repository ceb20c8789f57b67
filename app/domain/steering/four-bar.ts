import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees, toRadians } from "../units/angle";

/** Lengths of a four-bar linkage, in one unit: ground, crank, coupler, rocker. */
export type FourBar = { ground: number; crank: number; coupler: number; rocker: number };
export type FourBarPosition = { coupler: Degrees; rocker: Degrees };

/**
 * Where coupler and rocker lie for a crank angle, both ways of putting the linkage together. Angles from the ground link,
 * to the left positive.
 * Source: intersection of two circles; Norton, Design of Machinery, ch. 4 (from memory).
 * @returns a problem when it cannot be put together there
 * @example fourBar({ ground: 100, crank: 40, coupler: 120, rocker: 80 }, degrees(40)).value.open // 20.298°, 57.325°
 */
export function fourBar(
  { ground, crank, coupler, rocker }: FourBar,
  angle: Degrees,
): Outcome<{ open: FourBarPosition; crossed: FourBarPosition }> {
  if (![ground, crank, coupler, rocker].every((length) => length > 0))
    return problem("Every link has a length.");
  const turn = toRadians(angle);
  const [ax, ay] = [crank * Math.cos(turn), crank * Math.sin(turn)];
  const [dx, dy] = [ground - ax, -ay];
  const apart = Math.hypot(dx, dy);
  if (apart > coupler + rocker || apart < Math.abs(coupler - rocker) || apart === 0)
    return problem("The links cannot be put together at this angle.");
  const along = (coupler ** 2 - rocker ** 2 + apart ** 2) / (2 * apart);
  const aside = Math.sqrt(Math.max(0, coupler ** 2 - along ** 2));
  const at = (side: 1 | -1): FourBarPosition => {
    const bx = ax + (along * dx - side * aside * dy) / apart;
    const by = ay + (along * dy + side * aside * dx) / apart;
    return {
      coupler: toDegrees(Math.atan2(by - ay, bx - ax)),
      rocker: toDegrees(Math.atan2(by, bx - ground)),
    };
  };
  return ok({ open: at(1), crossed: at(-1) });
}
