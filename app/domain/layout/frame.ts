import {
  direction,
  distance,
  type FloorPoint,
  type FramePoint,
  floorPoint,
  framePoint,
  middle,
  turned,
} from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees } from "../units/angle";
import { mm } from "../units/length";

/** The frame's own axes on the floor: origin in the middle of the rear datum pair, +station ahead along the centre line. */
export type Frame = { origin: FloorPoint; angle: Degrees };

export type DatumPairs = {
  frontLeft: FloorPoint;
  frontRight: FloorPoint;
  rearLeft: FloorPoint;
  rearRight: FloorPoint;
};

/** Datum pairs nearer to each other than this say nothing about the frame's direction. */
const NEAREST = mm(300);

/**
 * The frame centre line through the middles of the front and the rear datum pair.
 * @returns a problem when the pairs lie on each other or left and right are swapped
 * @example frameFromDatums(pairs).value.angle // −0.179 for the pairs of the measured case
 */
export function frameFromDatums(pairs: DatumPairs): Outcome<Frame> {
  const front = middle(pairs.frontLeft, pairs.frontRight);
  const rear = middle(pairs.rearLeft, pairs.rearRight);
  if (distance(front, rear) < NEAREST)
    return problem("The front and rear datum pairs are too near each other to give the frame's direction.");
  const frame: Frame = { origin: rear, angle: direction(rear, front) };
  for (const [left, right, which] of [
    [pairs.frontLeft, pairs.frontRight, "front"],
    [pairs.rearLeft, pairs.rearRight, "rear"],
  ] as const)
    if (toFrame(frame, left).offset <= toFrame(frame, right).offset)
      return problem(`The ${which} datum points look swapped: the left one lies right of the other.`);
  return ok(frame);
}

/**
 * A floor point in the frame's axes.
 * @example toFrame({ origin: floorPoint(500, 0), angle: degrees(90) }, floorPoint(500, 1000)) // station 1000, offset 0
 */
export function toFrame(frame: Frame, point: FloorPoint): FramePoint {
  const v = turned(floorPoint(point.x - frame.origin.x, point.y - frame.origin.y), degrees(-frame.angle));
  return framePoint(v.x, v.y);
}

/**
 * A point of the frame's axes on the floor.
 * @example toFloor({ origin: floorPoint(500, 0), angle: degrees(90) }, framePoint(1000, 0)) // (500, 1000)
 */
export function toFloor(frame: Frame, point: FramePoint): FloorPoint {
  const v = turned(floorPoint(point.station, point.offset), frame.angle);
  return floorPoint(frame.origin.x + v.x, frame.origin.y + v.y);
}
