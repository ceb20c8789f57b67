import { type Outcome, ok, problem } from "../outcome";
import type { Millimetres } from "../units/length";

export type AxleLoads = { front: number; rear: number };

export type LoadTransfer = AxleLoads & {
  /** Newtons from the front axle to the rear: positive under power, negative under braking. */
  toRear: number;
  /** The acceleration, in g, at which the lightened axle would leave the ground; null when nothing is transferred. */
  liftsAt: number | null;
};

/**
 * Axle loads under steady acceleration or braking on level ground: W·(a/g)·h/L goes from one axle to the other, whatever the
 * springs and links do. Air forces left out.
 * Source: moments; Gillespie, Fundamentals of Vehicle Dynamics, chapter 1 (from memory).
 * @param loads standing, newtons @param acceleration in g, braking negative
 * @returns a problem when an axle leaves the ground, or a figure cannot be
 * @example front 2400, rear 1600, h/L 24/108, 0.5 g // 444.44 N to the rear: 1955.56 and 2044.44
 */
export function loadTransfer(
  loads: AxleLoads,
  cgHeight: Millimetres,
  wheelbase: Millimetres,
  acceleration: number,
): Outcome<LoadTransfer> {
  if (!(loads.front >= 0 && loads.rear >= 0 && loads.front + loads.rear > 0))
    return problem("An axle carries no less than nothing, and both together something.");
  if (!(cgHeight > 0 && wheelbase > 0))
    return problem("Height of the centre of gravity and wheelbase are more than nothing.");
  const perG = ((loads.front + loads.rear) * cgHeight) / wheelbase;
  const toRear = perG * acceleration;
  const [front, rear] = [loads.front - toRear, loads.rear + toRear];
  if (front < 0 || rear < 0)
    return problem(
      `The ${front < 0 ? "front" : "rear"} axle would leave the ground: at ${(acceleration > 0 ? loads.front / perG : loads.rear / perG).toFixed(2)} g it carries nothing.`,
    );
  const liftsAt = acceleration === 0 ? null : acceleration > 0 ? loads.front / perG : -loads.rear / perG;
  return ok({ front, rear, toRear, liftsAt });
}
