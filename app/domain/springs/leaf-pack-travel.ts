import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { type LeafPack, type LeafStress, packRate, packStress } from "./leaf-pack";
import { rideFrequency } from "./ride-frequency";

/** The spring at one place of its travel. */
export type PackState = {
  /** From free, millimetres. */
  deflection: Millimetres;
  /** What is left of the free arch; negative: bent over backwards. */
  arch: Millimetres;
  /** Newtons, on the whole spring. */
  load: number;
  /** Newtons per square millimetre. */
  stress: LeafStress;
};

export type PackTravel = {
  /** Newtons per millimetre. */
  rate: number;
  ride: PackState;
  flat: PackState;
  bump: PackState;
  /** Hertz, at ride load. */
  frequency: number;
};

/**
 * Load, stress and arch at ride height, flat and with the bump stop home, and the ride frequency.
 * Source: linear rate as packRate.
 * @param freeArch off the vehicle
 * @param rideLoad newtons on this spring: the sprung part of the wheel load
 * @param bumpTravel from ride until the stop is home
 * @returns a problem as packRate, or when the load is not above nothing or the travel is below
 * @example packTravel(pack of packRate, { freeArch: mm(90), rideLoad: 6000, bumpTravel: mm(70) }) // flat 18003.7 N, 2.8777 Hz
 */
export function packTravel(
  pack: LeafPack,
  { freeArch, rideLoad, bumpTravel }: { freeArch: Millimetres; rideLoad: number; bumpTravel: Millimetres },
): Outcome<PackTravel> {
  if (bumpTravel < 0) return problem("Bump travel is up from ride height: not below nothing.");
  const rate = packRate(pack);
  if (!rate.ok) return rate;
  const frequency = rideFrequency(mm(rideLoad / rate.value));
  if (!frequency.ok) return frequency;
  const state = (deflection: number): Outcome<PackState> => {
    const load = rate.value * deflection;
    const stress = packStress(pack, load);
    if (!stress.ok) return stress;
    return ok({ deflection: mm(deflection), arch: mm(freeArch - deflection), load, stress: stress.value });
  };
  const atRide = rideLoad / rate.value;
  const [ride, flat, bump] = [state(atRide), state(freeArch), state(atRide + bumpTravel)];
  if (!ride.ok) return ride;
  if (!flat.ok) return flat;
  if (!bump.ok) return bump;
  return ok({
    rate: rate.value,
    ride: ride.value,
    flat: flat.value,
    bump: bump.value,
    frequency: frequency.value,
  });
}
