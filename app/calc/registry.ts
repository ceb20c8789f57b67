import type { Calc } from "./calc";
import { leafCalc } from "./leaf";
import { leafPackCalc } from "./leaf-pack";
import { optionsCalc } from "./options";
import { shackleCalc } from "./shackle";

/** Every calculation that can be asked for, in the order of the page. */
export const CALCS: readonly Calc[] = [leafCalc, leafPackCalc, shackleCalc, optionsCalc] as readonly Calc[];

export const findCalc = (name: string): Calc | undefined => CALCS.find((calc) => calc.name === name);
