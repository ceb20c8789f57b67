import { jointAngle } from "../driveline/joint";
import { leafAtArch } from "../springs/leaf-shape";
import { sidePoint } from "../springs/leaf-travel";
import { placeHanger } from "../springs/shackle";
import { shackleTravel } from "../springs/shackle-travel";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import type { OptionColumns, OptionSearch } from "./option-types";

export type ShackleDetail = {
  /** Pivot of the second hanger: station along the frame, height over the fixed eye. */
  hanger: { station: Millimetres; height: Millimetres };
  /** Between shackle and the line to the fixed eye; null where the shackle binds. */
  droop: Degrees | null;
  ride: Degrees | null;
  flat: Degrees | null;
  /** What to beware of, in words. */
  warnings: string[];
};
/** Joints at ride height: at the gearbox and at the axle. */
export type JointDetail = { first: Degrees; second: Degrees };

/** Steps of the travel in which a shackle is looked at for binding. */
const STEPS = 12;

/**
 * Where option i's second hanger goes and what its shackle does through the travel.
 * @returns null when no shackle was given, the spring's arch is not known, or the spring does not go; a problem of the
 *   shackle itself stands among the warnings
 * @example shackleOf({ …search, shackle: { length: inches(4), load: "compression" } }, columns, 0).ride // 90
 */
export function shackleOf(search: OptionSearch, columns: OptionColumns, i: number): ShackleDetail | null {
  const hang = columns.hangs[Math.floor(i / columns.holes.length)];
  const hole = columns.holes[i % columns.holes.length];
  const { shackle, fixedEye } = search;
  if (!shackle || !hang?.leaf || !hang.spring.arch || !hole) return null;
  const { droop, ride } = hang.spring.arch;
  const shape = leafAtArch(hang.leaf, ride);
  if (!shape.ok) return null;
  const eye = sidePoint(hole.station, 0);
  const placed = placeHanger({
    fixedEye,
    eye,
    eyeDistance: shape.value.eyeDistance,
    movingEyeHigher: shackle.movingEyeHigher ?? mm(0),
    shackle: shackle.length,
    load: shackle.load,
    angle: shackle.angle,
  });
  if (!placed.ok) return null;
  const { hanger } = placed.value;
  const none: ShackleDetail = { hanger: { ...hanger }, droop: null, ride: null, flat: null, warnings: [] };
  const travel = shackleTravel({
    leaf: hang.leaf,
    mounting: { fixedEye, eye, hanger, shackle: shackle.length, load: shackle.load },
    droop,
    ride,
    steps: STEPS,
  });
  if (!travel.ok) return { ...none, warnings: [travel.problem] };
  const { value } = travel;
  return {
    ...none,
    droop: value.droop?.shackleAngle ?? null,
    ride: value.ride?.shackleAngle ?? null,
    flat: value.flat?.shackleAngle ?? null,
    warnings: value.warnings.map((warning) => warning.words),
  };
}

/**
 * The propshaft's joint angles with option i, at ride height, in space.
 * @returns null when the shafts' directions were not given, or where the axle comes to stand is not known
 * @example jointsOf({ …search, propshaft: { box, axle, output, pinion } }, columns, 0).first
 */
export function jointsOf(search: OptionSearch, columns: OptionColumns, i: number): JointDetail | null {
  const { propshaft, stock } = search;
  if (!propshaft?.output || !propshaft.pinion || !stock) return null;
  const station = Number.isNaN(columns.ride[i] ?? Number.NaN) ? columns.flat[i] : columns.ride[i];
  if (station === undefined || Number.isNaN(station)) return null;
  const { box, axle, output, pinion } = propshaft;
  const along = axle.station + station - stock.axleStation - box.station;
  if (along === 0) return null;
  const shaft = {
    plan: toDegrees(Math.atan((axle.offset - box.offset) / along)),
    side: toDegrees(Math.atan((axle.height - box.height) / along)),
  };
  return { first: degrees(jointAngle(output, shaft)), second: degrees(jointAngle(shaft, pinion)) };
}
