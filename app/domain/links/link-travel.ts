import { type Outcome, ok, problem } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { type Degrees, degrees } from "../units/angle";
import { type Millimetres, mm } from "../units/length";
import { antiSquat } from "./anti-squat";
import { type FourLink, fourLinkAtRise } from "./four-link";
import { type InstantCentre, instantCentre } from "./instant-centre";
import { type LadderBar, ladderBarAtRise } from "./ladder-bar";

export type LinkedAxle = ({ kind: "fourLink" } & FourLink) | ({ kind: "ladderBar" } & LadderBar);

/** What holds of the vehicle at ride height, besides the links. */
export type LinkSetting = {
  /** From the axle's centre to the ground, loaded. */
  tyreRadius: Millimetres;
  cgHeight: Millimetres;
  wheelbase: Millimetres;
  /** Pinion to the level at ride height, nose up positive. */
  pinionAngle: Degrees;
};

export type LinkTravelRow = {
  rise: Millimetres;
  axle: SidePoint;
  /** Ahead of where the axle stands at ride height. */
  forward: Millimetres;
  /** Pinion to the frame's level, nose up positive. */
  pinionAngle: Degrees;
  centre: InstantCentre;
  /** The centre above the ground on which the tyre stands; null when the links are parallel. */
  centreAboveGround: Millimetres | null;
  /** The centre higher than at ride height, in the frame; null when there or at ride height the links are parallel. */
  centreRise: Millimetres | null;
  /** Percent; null when the centre stands straight above the contact. */
  antiSquat: number | null;
};

type Place = { axle: SidePoint; turn: Degrees; centre: InstantCentre };

function placeAt(axle: LinkedAxle, rise: Millimetres): Outcome<Place> {
  if (axle.kind === "ladderBar") {
    const at = ladderBarAtRise(axle, rise);
    return at.ok ? ok({ ...at.value, centre: { kind: "point", point: axle.pivot } }) : at;
  }
  const at = fourLinkAtRise(axle, rise);
  if (!at.ok) return at;
  const centre = instantCentre(at.value.lower, at.value.upper);
  return centre.ok ? ok({ axle: at.value.axle, turn: at.value.turn, centre: centre.value }) : centre;
}

/**
 * The axle at one rise against the frame: where it stands, how its pinion points, its instant centre and anti-squat there. The
 * vehicle is taken to go down level as a whole on its tyres: the ground comes up against the frame by the rise, and the centre
 * of gravity comes as much nearer to it.
 * Source: four-bar position, instant centre and anti-squat as in their own files.
 * @returns a problem when the links or bars cannot reach
 * @example linkPosition(ladder bar (900, 350) to (0, 350), …, mm(0)).forward // 0
 */
export function linkPosition(
  axle: LinkedAxle,
  setting: LinkSetting,
  rise: Millimetres,
): Outcome<LinkTravelRow> {
  const [at, ride] = [placeAt(axle, rise), placeAt(axle, mm(0))];
  if (!at.ok) return at;
  if (!ride.ok) return ride;
  const { centre } = at.value;
  const cgHeight = mm(setting.cgHeight - rise);
  if (!(cgHeight > 0)) return problem("The centre of gravity would be under the ground.");
  const position = at.value.axle;
  const contact = sidePoint(position.station, position.height - setting.tyreRadius);
  const forward = mm(position.station - axle.axle.station);
  const squat = antiSquat(centre, { contact, cgHeight, wheelbase: mm(setting.wheelbase - forward) });
  const height = heightOf(centre);
  const rideHeight = heightOf(ride.value.centre);
  return ok({
    rise,
    axle: position,
    forward,
    pinionAngle: degrees(setting.pinionAngle + at.value.turn),
    centre,
    centreAboveGround: height === null ? null : mm(height - contact.height),
    centreRise: height === null || rideHeight === null ? null : mm(height - rideHeight),
    antiSquat: squat.ok ? squat.value : null,
  });
}

const heightOf = (centre: InstantCentre): number | null =>
  centre.kind === "point" ? centre.point.height : null;

/**
 * The axle from droop through ride height to bump.
 * @param range droop and bump in millimetres, both positive; steps on either side of ride height
 * @returns 2·steps + 1 rows from droop to bump, or a problem as linkPosition
 * @throws RangeError when steps is not a whole number of 1 or more
 * @example linkTravel(axle, setting, { droop: mm(100), bump: mm(80), steps: 2 }) // rises −100, −50, 0, 40, 80
 */
export function linkTravel(
  axle: LinkedAxle,
  setting: LinkSetting,
  range: { droop: Millimetres; bump: Millimetres; steps: number },
): Outcome<LinkTravelRow[]> {
  const { droop, bump, steps } = range;
  if (!Number.isInteger(steps) || steps < 1) throw new RangeError(`${steps} is not a number of steps`);
  if (!(droop >= 0 && bump >= 0)) return problem("Droop and bump are given as positive lengths.");
  const rows: LinkTravelRow[] = [];
  for (let i = -steps; i <= steps; i++) {
    const row = linkPosition(axle, setting, mm(((i < 0 ? droop : bump) * i) / steps));
    if (!row.ok) return row;
    rows.push(row.value);
  }
  return ok(rows);
}
