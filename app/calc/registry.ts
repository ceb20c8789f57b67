import { axleLineCalc } from "./axle-line";
import type { Calc } from "./calc";
import { dimensionsCalc } from "./dimensions";
import { drivelineCalc } from "./driveline";
import { dropsCalc } from "./drops";
import { fourLinkCalc } from "./four-link";
import { hardwareCalc } from "./hardware";
import { leafCalc } from "./leaf";
import { leafPackCalc } from "./leaf-pack";
import { levelCalc } from "./level";
import { loadsCalc } from "./loads";
import { optionsCalc } from "./options";
import { shackleCalc } from "./shackle";
import { steeringCalc } from "./steering";
import { surveyCalc } from "./survey";
import { tyreCalc } from "./tyre";
import { uncertaintyCalc } from "./uncertainty";

/** Every calculation that can be asked for, in the order of the page. */
export const CALCS = [
  levelCalc,
  surveyCalc,
  dropsCalc,
  axleLineCalc,
  leafCalc,
  leafPackCalc,
  shackleCalc,
  optionsCalc,
  dimensionsCalc,
  tyreCalc,
  steeringCalc,
  drivelineCalc,
  fourLinkCalc,
  loadsCalc,
  hardwareCalc,
  uncertaintyCalc,
] as readonly Calc[];

export const findCalc = (name: string): Calc | undefined => CALCS.find((calc) => calc.name === name);
