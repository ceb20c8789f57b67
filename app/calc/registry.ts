import type { Calc } from "./calc";

/** Every calculation that can be asked for, in the order of the page. */
export const CALCS: readonly Calc[] = [];

export const findCalc = (name: string): Calc | undefined => CALCS.find((calc) => calc.name === name);
