import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { type FloorHeight, surveyFloor } from "./survey";

export type StandPlace = { id: string; x: Millimetres; y: Millimetres };
export type StandShim = {
  id: string;
  /** The floor's height there, as the survey tells it. */
  floor: Millimetres;
  /** How far it lies under the highest of the stands' places, and the shim for it, rounded. */
  low: Millimetres;
  shim: Millimetres;
};

/** A stand further than this outside the surveyed heights is not surveyed. Common practice, no source. */
export const OUTSIDE = mm(300);
/** A height nearer than this to a stand is the stand's own. */
const SAME_PLACE = 1;

/**
 * The floor's height between surveyed heights: the best plane, and on it the deviations around, weighted by 1/d².
 * At a surveyed place it is the height read there. Source: inverse distance weighting, Shepard 1968 (from memory).
 * @returns a problem as surveyFloor, or where the place lies more than 300 mm outside what was surveyed
 * @example floorHeightAt(heights, { x: mm(500), y: mm(0) }) // half way between two heights of 0 and 2: 1
 */
export function floorHeightAt(
  heights: readonly FloorHeight[],
  place: { x: Millimetres; y: Millimetres },
): Outcome<Millimetres> {
  const survey = surveyFloor(heights);
  if (!survey.ok) return survey;
  const outside = (key: "x" | "y") =>
    place[key] < Math.min(...heights.map((one) => one[key])) - OUTSIDE ||
    place[key] > Math.max(...heights.map((one) => one[key])) + OUTSIDE;
  if (outside("x") || outside("y"))
    return problem("That place lies outside what was surveyed: take heights around it.");
  const { heightAtA, riseAlong, riseAcross, deviations } = survey.value;
  const plane = heightAtA + (riseAlong * place.x + riseAcross * place.y) / 1000;
  let [sum, weights] = [0, 0];
  for (const one of deviations) {
    const d = Math.hypot(one.x - place.x, one.y - place.y);
    if (d < SAME_PLACE) return ok(mm(one.height));
    sum += one.deviation / d ** 2;
    weights += 1 / d ** 2;
  }
  return ok(mm(plane + sum / weights));
}

/**
 * What to put under each stand so that all stand as high as the one on the highest floor, rounded to the shim.
 * @param shim the step: a sixteenth of an inch, a millimetre
 * @returns a problem as floorHeightAt, naming the stand, or when there is no stand
 * @example standShims(heights, stands, inches(1 / 16)) // the stand on the highest floor gets 0
 */
export function standShims(
  heights: readonly FloorHeight[],
  stands: readonly StandPlace[],
  shim: Millimetres,
): Outcome<StandShim[]> {
  if (!(shim > 0)) throw new RangeError(`${shim} mm is not a shim`);
  if (stands.length === 0) return problem("There is no stand yet.");
  const floors: { id: string; floor: Millimetres }[] = [];
  for (const { id, x, y } of stands) {
    const floor = floorHeightAt(heights, { x, y });
    if (!floor.ok) return problem(`${id}: ${floor.problem}`);
    floors.push({ id, floor: floor.value });
  }
  const highest = Math.max(...floors.map((one) => one.floor));
  return ok(
    floors.map(({ id, floor }) => {
      const low = highest - floor;
      return { id, floor, low: mm(low), shim: mm(Math.round(low / shim + 1e-9) * shim) };
    }),
  );
}
