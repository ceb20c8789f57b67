import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";

/** Standard gravity, millimetres per second squared. General Conference on Weights and Measures, 1901. */
export const GRAVITY = 9806.65;

/**
 * Ride frequency of a mass on a spring from its effective static deflection, that is load over rate at ride height:
 * f = √(g/δ)/2π.
 * Source: Gillespie, Fundamentals of Vehicle Dynamics, ch. 5 (from memory).
 * @param deflection millimetres
 * @returns hertz; a problem when the deflection is not above nothing
 * @example rideFrequency(inches(10)) // 0.98892 Hz
 */
export function rideFrequency(deflection: Millimetres): Outcome<number> {
  return deflection > 0
    ? ok(Math.sqrt(GRAVITY / deflection) / (2 * Math.PI))
    : problem("The load bends the spring by more than nothing.");
}

/**
 * The same from rate and load, for a spring whose rate at ride height is not that from free to ride.
 * @param rate newtons per millimetre, at ride height
 * @param load newtons, the sprung weight on this spring
 * @returns hertz; a problem when either is not above nothing
 * @example rideFrequencyOf(20, 2000) // 1.57613 Hz: 100 mm
 */
export function rideFrequencyOf(rate: number, load: number): Outcome<number> {
  return rate > 0 && load > 0
    ? rideFrequency(mm(load / rate))
    : problem("Rate and load are more than nothing.");
}
