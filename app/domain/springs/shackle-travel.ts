import { type Outcome, ok, problem } from "../outcome";
import type { Degrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { flatArch, leafAtArch } from "./leaf-shape";
import { archSteps } from "./leaf-travel";
import type { MainLeaf } from "./main-leaf";
import { NEAR_STRAIGHT, type ShackleMounting } from "./shackle";
import { type ShacklePosition, shacklePosition } from "./shackle-position";
import { placeWarnings, type ShackleWarning, wayWarnings } from "./shackle-warnings";

export type ShackleTravel = {
  /** Null where the shackle binds. Flat, bump and droop may fall together. */
  droop: ShacklePosition | null;
  ride: ShacklePosition | null;
  flat: ShacklePosition | null;
  bump: ShacklePosition | null;
  /** From droop to bump, without the places where it binds. */
  path: ShacklePosition[];
  /** The spring at its longest in the travel; with straight leaf ends that is flat. */
  longest: Millimetres;
  /** How much longer the spring could get before the shackle lay straight; negative: it binds. */
  lengthLeft: Millimetres;
  /** How far the moving eye goes away from the fixed eye between ride and its furthest place: room to keep clear. */
  eyeGoesOut: Millimetres | null;
  /** Least room between moving eye and frame; null when nothing was said of the frame. */
  frameRoom: Millimetres | null;
  warnings: ShackleWarning[];
};

export type ShackleTravelInput = {
  leaf: MainLeaf;
  mounting: ShackleMounting;
  /** Arches of the pin below the line of the eyes. Bump is flat unless told. */
  droop: Millimetres;
  ride: Millimetres;
  bump?: Millimetres | undefined;
  steps: number;
  /** Nearer to straight than this is warned of. */
  nearStraight?: Degrees | undefined;
  /** Height of the frame's underside over the moving eye, and the radius round the eye's centre that must stay clear. */
  frame?: { underside: Millimetres; eyeRadius: Millimetres } | undefined;
};

/**
 * The shackle through the whole travel: angle, moving eye and axle at droop, ride, flat and bump and between, and what to
 * beware of: a shackle near straight or binding, an eye that fouls the frame.
 * Source: two circles as movingEye, the leaf as leafAtArch.
 * @returns a problem when the leaf cannot bend so, droop is no more arched than ride, or bump more arched than ride; a
 *   shackle that binds is an answer, with a warning
 * @throws RangeError as archSteps
 * @example shackleTravel({ leaf of 26 and 26 in, 4 in shackle square at ride, droop: inches(6), ride: inches(4), steps: 12 }) // angle at flat 78.1°
 */
export function shackleTravel(input: ShackleTravelInput): Outcome<ShackleTravel> {
  const { leaf, mounting, droop, ride, steps, frame } = input;
  const flat = flatArch(leaf);
  const bump = input.bump ?? flat;
  const near = input.nearStraight ?? NEAR_STRAIGHT;
  if (droop < ride || ride < bump)
    return problem("The spring has more arch at droop than at ride height, and more there than at bump.");
  const arches = [
    ...new Set([...archSteps(droop, bump, steps), ride, ...(flat >= bump && flat <= droop ? [flat] : [])]),
  ];
  let longest = 0;
  const [path, lost]: [ShacklePosition[], Millimetres[]] = [[], []];
  for (const arch of arches.sort((a, b) => b - a)) {
    const shape = leafAtArch(leaf, arch);
    if (!shape.ok) return shape;
    longest = Math.max(longest, shape.value.eyeDistance);
    const position = shacklePosition(leaf, mounting, arch);
    if (position.ok) path.push(position.value);
    else lost.push(arch);
  }
  const at = (arch: Millimetres): Outcome<ShacklePosition> => shacklePosition(leaf, mounting, arch);
  const places = { droop: at(droop), ride: at(ride), flat: at(flat), bump: at(bump) };
  const { eye, hanger, shackle } = mounting;
  const base = Math.hypot(hanger.station - eye.station, hanger.height - eye.height);
  const out = (p: ShacklePosition) => Math.abs(p.movingEye.station - eye.station);
  const atRide = places.ride.ok ? places.ride.value : null;
  const frameRoom =
    frame && path.length > 0
      ? mm(Math.min(...path.map((p) => frame.underside - p.movingEye.height - frame.eyeRadius)))
      : null;
  return ok({
    droop: places.droop.ok ? places.droop.value : null,
    ride: atRide,
    flat: places.flat.ok ? places.flat.value : null,
    bump: places.bump.ok ? places.bump.value : null,
    path,
    longest: mm(longest),
    lengthLeft: mm(base + shackle - longest),
    eyeGoesOut: atRide ? mm(Math.max(...path.map(out)) - out(atRide)) : null,
    frameRoom,
    warnings: [
      // A flat that the bump stop never lets the spring reach is not warned of.
      ...placeWarnings(flat >= bump ? places : { ...places, flat: null }, near),
      ...wayWarnings(path, lost, [droop, ride, flat, bump], near),
      ...(frameRoom !== null && frameRoom < 0 ? [FOULS] : []),
    ],
  });
}

const FOULS: ShackleWarning = { at: "between", words: "The moving eye fouls the frame on its way." };
