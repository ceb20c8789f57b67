import { type FloorPoint, type FramePoint, framePoint, middle } from "../geometry/point";
import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees, toDegrees } from "../units/angle";
import { formatInches, type Millimetres, mm } from "../units/length";
import { type Frame, toFrame } from "./frame";

export type OpeningDrops = { front: FloorPoint; rear: FloorPoint };
export type Opening = {
  /** Station of the front and the rear edge, and the length between, along the frame. */
  front: Millimetres;
  rear: Millimetres;
  length: Millimetres;
  centre: FramePoint;
};
export type OpeningComparison = {
  left: Opening;
  right: Opening;
  /** Left minus right. */
  lengthDifference: Millimetres;
  /** Left centre ahead of the right one, along the frame and as it lies on the floor. */
  centreDifference: Millimetres;
  floorDifference: Millimetres;
  words: string;
};

/**
 * Centre of a wheel opening: the middle of its front and rear drop.
 * @example openingCentre(floorPoint(2000, 760), floorPoint(1200, 764)) // (1600, 762)
 */
export const openingCentre = (front: FloorPoint, rear: FloorPoint): FloorPoint => middle(front, rear);

/** Differences below a sixteenth's half are not spoken of. */
const SPOKEN = 25.4 / 32;

/**
 * Both wheel openings in the frame's axes, and how they differ: bodies shift on frames and sheet metal gets repaired.
 * @returns a problem when an edge lies on the wrong side of its other edge, or the left opening right of the right one
 * @example compareOpenings(frame, drops).value.lengthDifference // 3.2 where the left opening is 1/8 in longer
 */
export function compareOpenings(
  frame: Frame,
  drops: { left: OpeningDrops; right: OpeningDrops },
): Outcome<OpeningComparison> {
  const opening = ({ front, rear }: OpeningDrops): Opening => {
    const [f, r] = [toFrame(frame, front), toFrame(frame, rear)];
    return {
      front: f.station,
      rear: r.station,
      length: mm(f.station - r.station),
      centre: toFrame(frame, openingCentre(front, rear)),
    };
  };
  const [left, right] = [opening(drops.left), opening(drops.right)];
  for (const [side, one] of [["left", left] as const, ["right", right] as const])
    if (one.length <= 0)
      return problem(`The ${side} opening's front edge lies behind its rear edge: were the two swapped?`);
  if (left.centre.offset <= right.centre.offset)
    return problem("The openings look swapped: the left one lies right of the other.");
  const floorDifference = mm(
    openingCentre(drops.left.front, drops.left.rear).x - openingCentre(drops.right.front, drops.right.rear).x,
  );
  const lengthDifference = mm(left.length - right.length);
  const centreDifference = mm(left.centre.station - right.centre.station);
  return ok({
    left,
    right,
    lengthDifference,
    centreDifference,
    floorDifference,
    words: differenceWords(lengthDifference, floorDifference, centreDifference),
  });
}

function differenceWords(length: number, onFloor: number, onFrame: number): string {
  const size = (value: number) => formatInches(mm(Math.abs(value)));
  const first =
    Math.abs(length) < SPOKEN
      ? "Both openings are equally long."
      : `${length > 0 ? "Left" : "Right"} opening ${size(length)} in longer.`;
  const on = (value: number, where: string) =>
    Math.abs(value) < SPOKEN
      ? `level with the right on the ${where}`
      : `${size(value)} in ${value > 0 ? "ahead of" : "behind"} the right on the ${where}`;
  return `${first} The left one's centre is ${on(onFloor, "floor")}, ${on(onFrame, "frame")}.`;
}

export const AXLE_METHODS = ["square", "through-centres", "asked"] as const;
export type AxleMethod = (typeof AXLE_METHODS)[number];

export type AxleLine = {
  method: AxleMethod;
  /** Where the line crosses the frame centre line. */
  station: Millimetres;
  /** How far it is from square to the frame; positive: the left wheel stands back. 0 when square. */
  turn: Degrees;
  /** How far each opening's centre lies ahead of the line. */
  residualLeft: Millimetres;
  residualRight: Millimetres;
};

/**
 * The axle line at full compression: square to the frame and as near to both centres as can be, through both centres,
 * or square at an offset ahead of the middle that was asked for.
 * @param centres as compareOpenings gives them: the left one lies left of the right one
 * @param asked how far ahead of the square line; only with `asked`
 * @example axleLine({ left: framePoint(1010, 760), right: framePoint(990, -760) }, "square").station // 1000
 */
export function axleLine(
  centres: { left: FramePoint; right: FramePoint },
  method: AxleMethod,
  asked: Millimetres = mm(0),
): AxleLine {
  const { left, right } = centres;
  const mean = (left.station + right.station) / 2;
  if (method === "through-centres") {
    const slope = (left.station - right.station) / (left.offset - right.offset);
    return {
      method,
      station: mm(left.station - slope * left.offset),
      turn: toDegrees(-Math.atan(slope)),
      residualLeft: mm(0),
      residualRight: mm(0),
    };
  }
  const station = method === "asked" ? mean + asked : mean;
  return {
    method,
    station: mm(station),
    turn: degrees(0),
    residualLeft: mm(left.station - station),
    residualRight: mm(right.station - station),
  };
}

/**
 * Where the line passes at an offset from the frame centre line.
 * @example axlePoint({ ...line, station: mm(1000), turn: degrees(0.7162) }, mm(800)).station // 990
 */
export const axlePoint = (line: AxleLine, offset: Millimetres): FramePoint =>
  framePoint(line.station - Math.tan((line.turn * Math.PI) / 180) * offset, offset);
