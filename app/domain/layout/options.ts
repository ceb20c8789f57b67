import { axleFromFixedEye, type FixedEye, halves, isCentred, type LeafSpring } from "../springs/leaf-spring";
import { type Degrees, degrees, formatDegrees } from "../units/angle";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../units/length";
import { type LowPoint, lowestApproach } from "./approach";
import { type Room, roomInOpening, type Tyre } from "./room";

export type HangerHole = { id: number; number: number; station: Millimetres };

export type Constraints = {
  approachAtLeast?: Degrees;
  /** Wheelbase, or the opening's centre, within so much. */
  shiftWithin?: Millimetres;
  /** Needs the tyre and the opening. */
  noRub?: boolean;
};

export type OptionInput = {
  springs: readonly LeafSpring[];
  holes: readonly HangerHole[];
  fixedEye: FixedEye;
  /** Station of the axle line: the centre that was chosen. */
  openingCentre: Millimetres;
  /** The wheelbase as it came and the station at which the axle stood then. */
  stock?: { axleStation: Millimetres; wheelbase: Millimetres } | null;
  loadedRadius?: Millimetres | null;
  lowPoints?: readonly LowPoint[];
  tyre?: Tyre | null;
  /** The edges that are nearest to the tyre on either side. */
  opening?: { front: Millimetres; rear: Millimetres } | null;
  constraints?: Constraints;
  /** Standard uncertainties: of a hole's station, of a half measured flat on the bench. */
  sigma: { hole: Millimetres; half: Millimetres };
  unit?: LengthUnit;
};

export type Option = {
  /** spring id : turned 0 or 1 : hole id */
  key: string;
  spring: LeafSpring;
  /** Turned end for end. */
  turned: boolean;
  hole: HangerHole;
  /** The half between the fixed eye and the pin. */
  half: Millimetres;
  axleStation: Millimetres;
  /** Ahead of the opening's centre. */
  shift: Millimetres;
  wheelbase: Millimetres | null;
  approach: Degrees | null;
  frontRoom: Room | null;
  rearRoom: Room | null;
  /** k = 2. */
  plusMinus: Millimetres;
  /** Meets everything that was asked for. */
  stands: boolean;
  /** Why not, in words. */
  reasons: string[];
  /** What was asked for and cannot be told, for want of a reading: "Approach". It fails nothing and proves nothing. */
  unknown: string[];
};

export const optionKey = (springId: number, turned: boolean, holeId: number) =>
  `${springId}:${turned ? 1 : 0}:${holeId}`;

/**
 * Every spring in every hole, also turned end for end where its halves differ: where the axle comes to stand at full
 * compression (spring flat), what that changes, and whether it meets what was asked for. Nearest to the centre first;
 * equal ones by spring and hole.
 * First-order uncertainty as in JCGM 100, k = 2: hole and half are independent.
 */
export function optionTable(input: OptionInput): Option[] {
  const options: Option[] = [];
  for (const spring of input.springs)
    for (const turned of isCentred(spring) ? [false] : [false, true])
      for (const hole of input.holes) options.push(oneOption(input, spring, turned, hole));
  return options.sort(
    (a, b) =>
      Math.abs(a.shift) - Math.abs(b.shift) ||
      a.spring.rackNumber - b.spring.rackNumber ||
      Number(a.turned) - Number(b.turned) ||
      a.hole.number - b.hole.number,
  );
}

function oneOption(input: OptionInput, spring: LeafSpring, turned: boolean, hole: HangerHole): Option {
  const { fixedEye, stock, loadedRadius, lowPoints, tyre, opening, sigma } = input;
  const both = halves(spring, turned);
  const half = fixedEye === "ahead" ? both.front : both.rear;
  const axleStation = axleFromFixedEye(hole.station, half, fixedEye);
  const room = tyre && opening ? roomInOpening(axleStation, opening, tyre) : null;
  const option: Option = {
    key: optionKey(spring.id, turned, hole.id),
    spring,
    turned,
    hole,
    half,
    axleStation,
    shift: mm(axleStation - input.openingCentre),
    wheelbase: stock ? mm(stock.wheelbase + axleStation - stock.axleStation) : null,
    approach:
      loadedRadius && lowPoints?.length
        ? (lowestApproach(loadedRadius, axleStation, lowPoints)?.angle ?? null)
        : null,
    frontRoom: room?.front ?? null,
    rearRoom: room?.rear ?? null,
    plusMinus: mm(2 * Math.hypot(sigma.hole, sigma.half)),
    stands: true,
    reasons: [],
    unknown: [],
  };
  option.unknown = unknownOf(option, input.constraints ?? {});
  const reasons = reasonsAgainst(option, input);
  return { ...option, reasons, stands: reasons.length === 0 };
}

const unknownOf = ({ approach, frontRoom }: Option, { approachAtLeast, noRub }: Constraints): string[] => [
  ...(approachAtLeast !== undefined && approach === null ? ["Approach"] : []),
  ...(noRub && frontRoom === null ? ["Room"] : []),
];

function reasonsAgainst(option: Option, { constraints = {}, opening, unit = "in" }: OptionInput): string[] {
  const reasons: string[] = [];
  const size = (value: number) => formatLength(mm(Math.abs(value)), unit);
  if (opening && (option.axleStation > opening.front || option.axleStation < opening.rear))
    reasons.push("The axle would stand outside the wheel opening.");
  const { approachAtLeast, shiftWithin, noRub } = constraints;
  if (approachAtLeast !== undefined && option.approach !== null && option.approach < approachAtLeast)
    reasons.push(
      `Approach ${formatDegrees(option.approach)}, asked at least ${formatDegrees(approachAtLeast, Number.isInteger(approachAtLeast) ? 0 : 1)}.`,
    );
  if (shiftWithin !== undefined && Math.abs(option.shift) > shiftWithin)
    reasons.push(
      `${size(option.shift)} ${option.shift > 0 ? "ahead of" : "behind"} the centre, asked within ${size(shiftWithin)}.`,
    );
  if (noRub)
    for (const [edge, room] of [
      ["front", option.frontRoom],
      ["rear", option.rearRoom],
    ] as const) {
      if (!room) continue;
      const parts: string[] = [];
      if (room.straight < 0) parts.push(`at full compression by ${size(room.straight)}`);
      if (room.atLock < 0) parts.push(`at lock by ${size(room.atLock)}`);
      if (parts.length > 0) reasons.push(`Rubs the ${edge} edge ${parts.join(", ")}.`);
    }
  return reasons;
}

/** Can the two not be told apart by where they put the axle? They share the frame, so only hole and half count. */
export function notDistinguishable(
  a: Pick<Option, "axleStation" | "plusMinus">,
  b: Pick<Option, "axleStation" | "plusMinus">,
): boolean {
  return Math.abs(a.axleStation - b.axleStation) <= Math.hypot(a.plusMinus, b.plusMinus);
}

/** Full steering lock while it was not measured (common practice, no source). */
export const USUAL_LOCK = degrees(32);
