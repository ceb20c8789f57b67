import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** One axle on the scales, the other lifted by its hubs, springs locked so that nothing moves on the frame. */
export type AxleLift = {
  /** The whole vehicle, newtons. */
  weight: number;
  wheelbase: Millimetres;
  /** The axle left down, newtons: with the vehicle level, and with the other axle lifted. */
  levelLoad: number;
  liftedLoad: number;
  /** How far the centre of the lifted axle was raised. */
  lift: Millimetres;
  /** Loaded radius of the tyres of the axle left down, and of the lifted axle as it stood on the floor. */
  downRadius: Millimetres;
  liftedRadius: Millimetres;
};

export type CgHeight = {
  /** Above the floor, the vehicle standing on its tyres. */
  height: Millimetres;
  /** Above the line through both axle centres, at the centre of gravity. */
  aboveAxles: Millimetres;
  /** How far the vehicle was tilted. */
  tilt: Degrees;
  /** What one newton read wrong on the lifted axle load does to the height: the more, the less it was lifted. */
  heightPerNewton: Millimetres;
};

/**
 * Height of the centre of gravity from lifting one axle. With equal radii h = r + L·ΔW/(W·tan θ), sin θ = H/L; with unequal
 * ones the line of the axle centres is out of level by e = r(lifted) − r(down) to begin with, so that
 * (H + e) = L·sin θ + e·cos θ and h = r(down) + a·e/L + ΔW·(L/tan θ − e)/W, a from the axle left down to the centre of gravity.
 * Source: moments about the axle left down; the form for equal radii is the usual one, as in ISO 10392 (title from memory).
 * @returns millimetres; a problem when the lift or a load cannot be
 * @example in inches and pounds: L 110, W 4000, ΔW 90, H 20, r 15 // 28.3856 in
 */
export function cgHeightByLifting(lifting: AxleLift): Outcome<CgHeight> {
  const { weight, wheelbase, levelLoad, liftedLoad, lift, downRadius, liftedRadius } = lifting;
  if (!(weight > 0 && wheelbase > 0)) return problem("Weight and wheelbase are more than nothing.");
  if (!(levelLoad > 0 && levelLoad < weight && liftedLoad > 0 && liftedLoad < weight))
    return problem("The axle left down carries some of the weight, not none and not all.");
  if (!(downRadius > 0 && liftedRadius > 0)) return problem("A tyre's radius is more than nothing.");
  const step = liftedRadius - downRadius;
  const between = Math.hypot(wheelbase, step);
  if (!(lift > 0)) return problem("The axle is lifted by more than nothing.");
  if (!(lift + step < between)) return problem("The axle was lifted more than the wheelbase is long.");
  const tilt = Math.asin((lift + step) / between) - Math.atan2(step, wheelbase);
  const fromDown = wheelbase * (1 - levelLoad / weight);
  const arm = (wheelbase / Math.tan(tilt) - step) / weight;
  const aboveAxles = (liftedLoad - levelLoad) * arm;
  const height = downRadius + (fromDown * step) / wheelbase + aboveAxles;
  if (!(height > 0))
    return problem("The centre of gravity would be under the floor: the axle left down should gain load.");
  return ok({
    height: mm(height),
    aboveAxles: mm(aboveAxles),
    tilt: toDegrees(tilt),
    heightPerNewton: mm(arm),
  });
}
