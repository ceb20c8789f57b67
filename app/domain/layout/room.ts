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

/** An edge of an opening with its lip's height above the hub at full compression; null where it was not measured. */
export type LipEdge = { station: Millimetres; lip: Millimetres | null };
export type LipRoom = Room & {
  /** False: the tyre's whole radius was taken, so that there is more room than this. */
  lipMeasured: boolean;
};

/**
 * Room to one edge with the lip's height counted: at that height the tyre reaches only as far as its chord. Over the whole
 * steering sweep, not only at full lock.
 * @param side 1 for the front edge, −1 for the rear one
 * @returns null when the tyre stays wholly below the lip
 * @example roomToLip(mm(0), { station: inches(17), lip: inches(9) }, 1, tyre).straight // 17 − √(17.5² − 9²) = 1.99 in
 */
export function roomToLip(axleStation: Millimetres, edge: LipEdge, side: 1 | -1, tyre: Tyre): LipRoom | null {
  const { lip } = edge;
  if (lip !== null && lip >= tyre.freeRadius) return null;
  const chord = mm(lip === null ? tyre.freeRadius : Math.sqrt(tyre.freeRadius ** 2 - lip ** 2));
  const away = (edge.station - axleStation) * side;
  return {
    straight: mm(away - chord),
    atLock: mm(away - worstReach({ ...tyre, freeRadius: chord })),
    lipMeasured: lip !== null,
  };
}
