import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, toRadians } from "../units/angle";
import { type Millimetres, mm } from "../units/length";

/** AISC 360, section J2.4: shear strength of the weld metal 0.60·FEXX, φ 0.75, Ω 2.00. */
const SHEAR_OF_ELECTRODE = 0.6;
const RESISTANCE_FACTOR = 0.75;
const SAFETY_FACTOR = 2;
/** A fillet shorter than four legs counts with a quarter of its length as leg: AISC 360, section J2.2b (from memory). */
const SHORTEST_IN_LEGS = 4;

export type WeldStrength = {
  /** Root to face, leg/√2. */
  throat: Millimetres;
  /** Newtons: nominal, by allowable strength (nominal/2.00), and by load and resistance factors (0.75·nominal). */
  nominal: number;
  allowable: number;
  design: number;
  /** Millimetres of leg that count: less than the leg when the weld is shorter than four legs. */
  countedLeg: Millimetres;
};

/** The throat of an equal-legged fillet: leg/√2. @example weldThroat(mm(6)) // 4.2426 */
export const weldThroat = (leg: Millimetres): Millimetres => mm(leg * Math.SQRT1_2);

/**
 * How much stronger a fillet is when pulled across its length than along it: 1 + 0.5·sin^1.5 θ.
 * Source: AISC 360, section J2.4. For one weld, or welds side by side in one direction, loaded in their own plane through their
 * middle; leave it at 0° when in doubt.
 * @param angle of the force to the weld's length, degrees 0 to 90
 * @returns a problem outside 0 to 90
 * @example loadAngleFactor(degrees(45)) // 1.297302; 90 gives 1.5
 */
export function loadAngleFactor(angle: Degrees): Outcome<number> {
  return angle >= 0 && angle <= 90
    ? ok(1 + 0.5 * Math.sin(toRadians(angle)) ** 1.5)
    : problem("The angle of the load to the weld is from 0° (along it) to 90° (across it).");
}

export type FilletWeld = {
  leg: Millimetres;
  length: Millimetres;
  /** Tensile strength of the electrode's metal, megapascals: about 482.6 for E70. */
  electrode: number;
  /** Force to the weld's length, degrees: 0 along, 90 across. */
  angle: Degrees;
};

/**
 * What an equal-legged fillet weld carries, by both methods: 0.60·FEXX·throat·length·(1 + 0.5·sin^1.5 θ). The older allowable
 * stress of 0.30·FEXX is the same figure at 0°. Only the weld metal, not the plates beside it, under steady load.
 * Source: AISC 360, section J2.4.
 * @returns newtons; a problem when a size is not above 0 or the angle is out of range
 * @example leg 3/4 in, 8 in long, E70 (70 ksi) along // design 594 474 N (133.64 kip)
 */
export function filletWeld({ leg, length, electrode, angle }: FilletWeld): Outcome<WeldStrength> {
  if (!(leg > 0 && length > 0 && electrode > 0))
    return problem("Leg, length and strength of the electrode are more than nothing.");
  const factor = loadAngleFactor(angle);
  if (!factor.ok) return factor;
  const countedLeg = mm(Math.min(leg, length / SHORTEST_IN_LEGS));
  const nominal = SHEAR_OF_ELECTRODE * electrode * weldThroat(countedLeg) * length * factor.value;
  return ok({
    throat: weldThroat(leg),
    nominal,
    allowable: nominal / SAFETY_FACTOR,
    design: nominal * RESISTANCE_FACTOR,
    countedLeg,
  });
}

/**
 * The smallest leg that carries a load, from filletWeld turned round.
 * @param load newtons: as it is for `allowable`, with its load factors for `design`
 * @returns millimetres, not rounded; a problem when the weld is too short for so much (no leg over a quarter of its length counts)
 * @example requiredLeg(53400, { length: 100, electrode: 482.6, angle: 0, method: "allowable" }) // 5.2161
 */
export function requiredLeg(
  load: number,
  weld: Omit<FilletWeld, "leg"> & { method: "allowable" | "design" },
): Outcome<Millimetres> {
  if (!(load > 0)) return problem("The load is more than nothing.");
  const oneMillimetre = filletWeld({ ...weld, leg: mm(1), length: mm(SHORTEST_IN_LEGS) });
  if (!oneMillimetre.ok) return oneMillimetre;
  if (!(weld.length > 0)) return problem("The weld is longer than nothing.");
  const perLength = oneMillimetre.value[weld.method] / SHORTEST_IN_LEGS;
  const leg = load / (perLength * weld.length);
  return leg > weld.length / SHORTEST_IN_LEGS
    ? problem("The weld is too short: its leg would be more than a quarter of its length. Make it longer.")
    : ok(mm(leg));
}

/** Up to which thickness of the thinner part which least leg, millimetres: AISC 360, table J2.4 (from memory). */
const SMALLEST_LEGS: readonly (readonly [number, number])[] = [
  [6.35, 3.175],
  [12.7, 4.7625],
  [19.05, 6.35],
];
const SMALLEST_LEG_OF_THICK = 7.9375;

/**
 * The smallest fillet leg to lay on a plate, whatever the load, so that it is not quenched by the cold plate.
 * Source: AISC 360, table J2.4 (from memory): 1/8 in up to 1/4 in, 3/16 up to 1/2, 1/4 up to 3/4, 5/16 over that.
 * @param thinner thickness of the thinner part joined
 * @returns a problem when the thickness is not above 0
 * @example smallestLeg(mm(6.35)) // 3.175
 */
export function smallestLeg(thinner: Millimetres): Outcome<Millimetres> {
  if (!(thinner > 0)) return problem("The plate's thickness is more than nothing.");
  const found = SMALLEST_LEGS.find(([upTo]) => thinner <= upTo + 1e-6);
  return ok(mm(found ? found[1] : SMALLEST_LEG_OF_THICK));
}
