import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";

/** Standard gravity, millimetres per second squared. General Conference on Weights and Measures, 1901. */
export const GRAVITY = 9806.65;
/** A deflection below this (mm) is no spring, and too little to divide by (ours, no source). */
export const LEAST_DEFLECTION = 1e-3;
/** And one above this neither. */
export const LARGEST_DEFLECTION = 1e6;

/**
 * Ride frequency of a mass on a spring from its effective static deflection, that is load over rate at ride height:
 * f = √(g/δ)/2π.
 * Source: Gillespie, Fundamentals of Vehicle Dynamics, ch. 5 (from memory).
 * @param deflection millimetres
 * @returns hertz; a problem when the deflection is next to nothing, or a kilometre
 * @example rideFrequency(inches(10)) // 0.98892 Hz
 */
export function rideFrequency(deflection: Millimetres): Outcome<number> {
  return deflection >= LEAST_DEFLECTION && deflection <= LARGEST_DEFLECTION
    ? ok(Math.sqrt(GRAVITY / deflection) / (2 * Math.PI))
    : problem("The load bends the spring by more than nothing and less than a kilometre.");
}

/**
 * The same from rate and load, for a spring whose rate at ride height is not that from free to ride.
 * @param rate newtons per millimetre, at ride height
 * @param load newtons, the sprung weight on this spring
 * @returns hertz; a problem when either is not above nothing
 * @example rideFrequencyOf(20, 2000) // 1.57613 Hz: 100 mm
 */
export function rideFrequencyOf(rate: number, load: number): Outcome<number> {
  if (!(rate > 0 && load > 0)) return problem("Rate and load are more than nothing.");
  return rideFrequency(mm(Math.min(load / rate, 2 * LARGEST_DEFLECTION)));
}
