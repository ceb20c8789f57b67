import { type Degrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

export type Tyre = { freeRadius: Millimetres; width: Millimetres; lock: Degrees };

/**
 * How far a tyre reaches ahead of (and behind) its centre in plan, at a steer angle: r·cos δ + (w/2)·sin δ.
 * This takes the tyre's whole radius. The lip of an opening meets it higher up, where it reaches less: pessimistic
 * while lip heights are not measured.
 */
export const planReach = (tyre: Pick<Tyre, "freeRadius" | "width">, steer: Degrees): Millimetres =>
  mm(tyre.freeRadius * Math.cos(toRadians(steer)) + (tyre.width / 2) * Math.sin(toRadians(steer)));

/** The furthest plan reach over the whole sweep from straight ahead to full lock; its greatest is at atan(w/2r). */
export function worstReach(tyre: Tyre): Millimetres {
  const peak = Math.atan2(tyre.width / 2, tyre.freeRadius);
  const steer = Math.min(peak, toRadians(tyre.lock));
  return mm(tyre.freeRadius * Math.cos(steer) + (tyre.width / 2) * Math.sin(steer));
}

/** Room between a tyre at an axle station and the two edges of an opening; negative where it rubs. */
export type Room = { straight: Millimetres; atLock: Millimetres };

export function roomInOpening(
  axleStation: Millimetres,
  opening: { front: Millimetres; rear: Millimetres },
  tyre: Tyre,
): { front: Room; rear: Room } {
  const [straight, lock] = [tyre.freeRadius, worstReach(tyre)];
  const [ahead, behind] = [opening.front - axleStation, axleStation - opening.rear];
  return {
    front: { straight: mm(ahead - straight), atLock: mm(ahead - lock) },
    rear: { straight: mm(behind - straight), atLock: mm(behind - lock) },
  };
}
