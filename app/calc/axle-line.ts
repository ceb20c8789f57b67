import { z } from "zod";
import { type FloorPoint, floorPoint } from "../domain/geometry/point";
import { AXLE_METHODS, type AxleLine, compareOpenings } from "../domain/layout/axle-line";
import { AXLE_DROPS, type AxleDrop, axleUncertainty, eachDrop } from "../domain/layout/axle-uncertainty";
import { bobShifts, type Shift, tieShifts, type UncertainDrop } from "../domain/layout/drop-shifts";
import { pointFromTies } from "../domain/layout/drops";
import { type Frame, frameFromDatums, toFrame } from "../domain/layout/frame";
import {
  type AxleEnds,
  compareAsBuilt,
  SQUARE_TOLERANCE,
  type Wheelbases,
  wheelbases,
} from "../domain/layout/square";
import { squareVerdict } from "../domain/layout/square-words";
import { type Outcome, ok, problem } from "../domain/outcome";
import { mm } from "../domain/units/length";
import { AXLE_LINE_EXAMPLES } from "./axle-line-examples";
import { defineCalc } from "./calc";

const coordinate = (words: string) => z.number().min(-100_000).max(100_000).describe(`${words}, mm`);
const point = z.strictObject({ x: coordinate("Along A–B from A"), y: coordinate("To the left of A–B") });
const taped = z.strictObject({
  tapes: z
    .array(
      z.strictObject({
        mark: z.string().min(1).max(20).describe("Name of a mark in marks"),
        distance: z.number().positive().max(100_000).describe("Taped distance, mm"),
      }),
    )
    .min(2)
    .max(8)
    .describe("Tapes from marks; left drops are taken to lie left of A–B, right ones right of it"),
});
const drop = (words: string) => z.union([point, taped]).describe(words);
const ends = (words: string) =>
  z
    .strictObject({ left: drop("Middle of the left hub face"), right: drop("Middle of the right hub face") })
    .describe(words);

const input = z.strictObject({
  marks: z
    .array(
      z.strictObject({
        name: z.string().min(1).max(20).describe("Name of the mark"),
        x: coordinate("Along A–B from A"),
        y: coordinate("To the left of A–B"),
        sigma: z.number().min(0).max(100).default(0).describe("Standard uncertainty of where it lies, mm"),
      }),
    )
    .max(20)
    .default([])
    .describe("Control marks, for drops that were taped"),
  datumFrontLeft: drop("Front frame datum, left"),
  datumFrontRight: drop("Front frame datum, right"),
  datumRearLeft: drop("Rear frame datum, left"),
  datumRearRight: drop("Rear frame datum, right"),
  openingFrontLeft: drop("Front edge of the left wheel opening"),
  openingFrontRight: drop("Front edge of the right wheel opening"),
  openingRearLeft: drop("Rear edge of the left wheel opening"),
  openingRearRight: drop("Rear edge of the right wheel opening"),
  method: z
    .enum(AXLE_METHODS)
    .default("square")
    .describe("Square to the frame, through both opening centres, or square at an offset asked for"),
  asked: z
    .number()
    .min(-2000)
    .max(2000)
    .default(0)
    .describe("How far ahead of the square line, with asked, mm"),
  tapeSigma: z.number().min(0.01).max(100).default(0.8).describe("Standard uncertainty of a tape, mm"),
  dropSigma: z
    .number()
    .min(0.01)
    .max(100)
    .default(0.4)
    .describe("Standard uncertainty of a drop itself each way, mm"),
  built: ends("Axle ends dropped after tacking").optional(),
  otherAxle: ends("Ends of the vehicle's other axle").optional(),
  tolerance: z.number().min(0.1).max(50).default(SQUARE_TOLERANCE).describe("How far an end may be out, mm"),
});

const share = z.strictObject({ name: z.string(), share: z.number().describe("Of the variance, 0 to 1") });
const output = z.strictObject({
  frameAngle: z.number().describe("Frame centre line against A–B, to the left, degrees"),
  openingsWords: z.string(),
  leftCentre: z.number().describe("Station of the left opening's centre, mm ahead of the rear datums"),
  rightCentre: z.number().describe("Station of the right one's, mm"),
  station: z
    .number()
    .describe("Where the axle line crosses the frame centre line, mm ahead of the rear datums"),
  turn: z.number().describe("From square, degrees; positive: the left end stands back"),
  residualLeft: z.number().describe("Left centre ahead of the line, mm"),
  residualRight: z.number().describe("Right centre ahead of the line, mm"),
  sigma: z.number().describe("Standard uncertainty of the station, mm"),
  expanded: z.number().describe("Twice that (k = 2), mm"),
  turnSigma: z.number().describe("Standard uncertainty of the turn, degrees"),
  contributors: z.array(share).describe("What makes the station unsure, the largest first"),
  contributorWords: z.string(),
  built: z
    .strictObject({
      leftAhead: z.number().describe("mm"),
      rightAhead: z.number().describe("mm"),
      outOfSquare: z.number().describe("Left minus right, mm"),
      sideways: z.number().describe("Middle left of the frame centre line, mm"),
      isTrue: z.boolean(),
      headline: z.string(),
      moves: z.array(z.string()).describe("Which end to move, which way, how far"),
    })
    .nullable()
    .describe("What was built; null when not asked"),
  wheelbases: z
    .strictObject({
      left: z.number().describe("mm"),
      right: z.number().describe("mm"),
      leftDiagonal: z.number().describe("Front left to rear right, mm"),
      rightDiagonal: z.number().describe("Front right to rear left, mm"),
      thrust: z.number().describe("Where the rear axle points, degrees; positive: to the right"),
    })
    .nullable()
    .describe("Of both axles as they stand; null without both"),
});

type Input = z.output<typeof input>;
type Drop = z.output<ReturnType<typeof drop>>;

const NAMES: Record<AxleDrop, string> = {
  datumFrontLeft: "the left front datum",
  datumFrontRight: "the right front datum",
  datumRearLeft: "the left rear datum",
  datumRearRight: "the right rear datum",
  openingFrontLeft: "the left opening's front edge",
  openingFrontRight: "the right opening's front edge",
  openingRearLeft: "the left opening's rear edge",
  openingRearRight: "the right opening's rear edge",
};

/** A drop on the floor with what makes it unsure. */
function dropOf(body: Input, one: Drop, name: string, side: "left" | "right"): Outcome<UncertainDrop> {
  const bob = bobShifts(name, mm(body.dropSigma));
  if ("x" in one) return ok({ name, point: floorPoint(one.x, one.y), shifts: bob });
  const ties = [];
  for (const { mark, distance } of one.tapes) {
    const found = body.marks.find((other) => other.name === mark);
    if (!found) return problem(`Mark ${mark} is not among the marks.`);
    const { x, y, sigma } = found;
    ties.push({ mark, at: floorPoint(x, y), distance: mm(distance), markSigma: mm(sigma) });
  }
  const sigma = mm(body.tapeSigma);
  const fit = pointFromTies(ties, side, sigma);
  if (!fit.ok) return problem(`${name}: ${fit.problem}`);
  if (fit.value.suspect) return problem(`${name}: ${fit.value.advice ?? "the tapes do not meet."}`);
  const shifts: Shift[] = [...tieShifts(name, ties, fit.value, sigma), ...bob];
  return ok({ name, point: fit.value.point, shifts });
}

function endsOf(
  body: Input,
  frame: Frame,
  pair: NonNullable<Input["built"]>,
  what: string,
): Outcome<AxleEnds> {
  const left = dropOf(body, pair.left, `the ${what}'s left end`, "left");
  if (!left.ok) return left;
  const right = dropOf(body, pair.right, `the ${what}'s right end`, "right");
  if (!right.ok) return right;
  return ok({ left: toFrame(frame, left.value.point), right: toFrame(frame, right.value.point) });
}

/** Wheelbases of two axles, whichever of them is the front one. */
function wheelbasesOf(one: AxleEnds, other: AxleEnds): Outcome<Wheelbases> {
  const sum = ({ left, right }: AxleEnds) => left.station + right.station;
  return sum(one) > sum(other) ? wheelbases(one, other) : wheelbases(other, one);
}

type Built = Pick<z.input<typeof output>, "built" | "wheelbases">;

function builtOf(body: Input, frame: Frame, line: AxleLine): Outcome<Built> {
  const tolerance = mm(body.tolerance);
  const built = body.built ? endsOf(body, frame, body.built, "axle") : null;
  if (built && !built.ok) return built;
  const other = body.otherAxle ? endsOf(body, frame, body.otherAxle, "other axle") : null;
  if (other && !other.ok) return other;
  const compared = built ? compareAsBuilt(built.value, line, { tolerance }) : null;
  if (compared && !compared.ok) return compared;
  const bases = built && other ? wheelbasesOf(built.value, other.value) : null;
  if (bases && !bases.ok) return bases;
  const verdict = compared ? squareVerdict(compared.value, tolerance) : null;
  return ok({
    built:
      compared && verdict
        ? {
            leftAhead: compared.value.leftAhead,
            rightAhead: compared.value.rightAhead,
            outOfSquare: compared.value.outOfSquare,
            sideways: compared.value.sideways,
            isTrue: verdict.isTrue,
            headline: verdict.headline,
            moves: verdict.moves.map((move) => move.words),
          }
        : null,
    wheelbases: bases
      ? {
          left: bases.value.left,
          right: bases.value.right,
          leftDiagonal: bases.value.leftDiagonal,
          rightDiagonal: bases.value.rightDiagonal,
          thrust: bases.value.thrust,
        }
      : null,
  });
}

function dropsOf(body: Input): Outcome<Record<AxleDrop, UncertainDrop>> {
  const drops = eachDrop((name) =>
    dropOf(body, body[name], NAMES[name], name.endsWith("Left") ? "left" : "right"),
  );
  for (const name of AXLE_DROPS) {
    const one = drops[name];
    if (!one.ok) return one;
  }
  const none: UncertainDrop = { name: "", point: floorPoint(0, 0), shifts: [] };
  return ok(eachDrop((name) => (drops[name].ok ? drops[name].value : none)));
}

function run(body: Input): Outcome<z.input<typeof output>> {
  const drops = dropsOf(body);
  if (!drops.ok) return drops;
  const unsure = axleUncertainty(drops.value, body.method, mm(body.asked));
  if (!unsure.ok) return unsure;
  const at = (name: AxleDrop): FloorPoint => drops.value[name].point;
  const frame = frameFromDatums({
    frontLeft: at("datumFrontLeft"),
    frontRight: at("datumFrontRight"),
    rearLeft: at("datumRearLeft"),
    rearRight: at("datumRearRight"),
  });
  if (!frame.ok) return frame;
  const openings = compareOpenings(frame.value, {
    left: { front: at("openingFrontLeft"), rear: at("openingRearLeft") },
    right: { front: at("openingFrontRight"), rear: at("openingRearRight") },
  });
  if (!openings.ok) return openings;
  const { line } = unsure.value;
  const built = builtOf(body, frame.value, line);
  if (!built.ok) return built;
  return ok({
    frameAngle: frame.value.angle,
    openingsWords: openings.value.words,
    leftCentre: openings.value.left.centre.station,
    rightCentre: openings.value.right.centre.station,
    station: line.station,
    turn: line.turn,
    residualLeft: line.residualLeft,
    residualRight: line.residualRight,
    sigma: unsure.value.station,
    expanded: unsure.value.stationExpanded,
    turnSigma: unsure.value.turn,
    contributors: unsure.value.groups,
    contributorWords: unsure.value.words,
    ...built.value,
  });
}

export const axleLineCalc = defineCalc({
  name: "axle-line",
  title: "Frame centre line, wheel openings and axle line",
  summary:
    "From the drops of the frame datums and the wheel openings: frame centre line, how the openings differ, the axle line in one of three ways with its uncertainty and what makes it unsure; and, after tacking, which end to move and how far, wheelbase left and right, diagonals and thrust angle. The uncertainty is carried through to first order as in JCGM 100.",
  input,
  output,
  run,
  cautions: [
    "These figures help with layout and certify nothing: frame and suspension welding is for qualified welders, and the vehicle maker's instructions and local law come first.",
  ],
  examples: AXLE_LINE_EXAMPLES,
});
