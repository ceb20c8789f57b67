import type { ShaftAngles } from "../driveline/joint";
import type { FixedEye, LeafSpring } from "../springs/leaf-spring";
import type { BothEnds, MainLeaf } from "../springs/main-leaf";
import type { ShackleLoad } from "../springs/shackle";
import type { Degrees } from "../units/angle";
import type { Millimetres } from "../units/length";
import type { LowPoint } from "./approach";
import type { HangerHole } from "./options";
import type { Tyre } from "./room";

/** What comes first: nearest to the opening's centre, steepest own angle, most room at lock, least changed wheelbase. */
export type OptionOrder = "centre" | "angle" | "room" | "wheelbase";

/** A spring with what its travel needs. */
export type SearchSpring = LeafSpring & {
  /** The pin below the line of the eyes, hanging and at ride height; null: not measured, then only flat is known. */
  arch: { droop: Millimetres; ride: Millimetres } | null;
  /** Length that the U-bolts keep straight; 0 unless told. */
  clamped?: Millimetres | undefined;
  /** Eye centres above the leaf, of the spring's own ends; in line unless told. */
  eyeOffset?: BothEnds | undefined;
};

/** A point in space: station ahead of the rear datum pair, offset to the left, height over the ground. */
export type SpacePoint = { station: Millimetres; offset: Millimetres; height: Millimetres };

/** An edge of the opening; its lip's height above the hub at full compression, null where it was not measured. */
export type OpeningEdge = { station: Millimetres; lip: Millimetres | null };

export type Limits = {
  approachAtLeast?: Degrees | undefined;
  departureAtLeast?: Degrees | undefined;
  rampAtLeast?: Degrees | undefined;
  /** From the opening's centre. */
  shiftWithin?: Millimetres | undefined;
  /** Of the wheelbase as it came. */
  wheelbaseWithin?: Millimetres | undefined;
  /** Straight ahead, through the whole travel. */
  noRub?: boolean | undefined;
  /** Over the whole steering sweep and travel. */
  noRubAtLock?: boolean | undefined;
  dragLinkWithin?: Millimetres | undefined;
};

export type OptionSearch = {
  springs: readonly SearchSpring[];
  holes: readonly HangerHole[];
  fixedEye: FixedEye;
  /** The axle located so far ahead of the spring's pin: other holes in the perch. [0] unless told. */
  pinOffsets?: readonly Millimetres[] | undefined;
  /** Steps of the travel from droop to flat that are looked at for rubbing. */
  travelSteps?: number | undefined;
  /** Which axle is re-hung: its own angle is the approach (front) or the departure (rear). */
  axle: "front" | "rear";
  openingCentre: Millimetres;
  opening?: { front: OpeningEdge; rear: OpeningEdge } | undefined;
  tyre?: Tyre | undefined;
  loadedRadius?: Millimetres | undefined;
  stock?: { axleStation: Millimetres; wheelbase: Millimetres } | undefined;
  /** The axle that stays, for the ramp angle. */
  otherAxle?: { station: Millimetres; loadedRadius: Millimetres } | undefined;
  /** Points under the vehicle, anywhere along it. */
  lowPoints?: readonly LowPoint[] | undefined;
  /** The steering box's ball, and the axle's ball with the axle where it was. */
  dragLink?: { box: SpacePoint; axle: SpacePoint } | undefined;
  /** The joint at the gearbox, and the one at the axle with the axle where it was, at ride height. */
  propshaft?:
    | {
        box: SpacePoint;
        axle: SpacePoint;
        /** How the gearbox's shaft and the pinion point, taken ahead; for the joints' angles. */
        output?: ShaftAngles | undefined;
        pinion?: ShaftAngles | undefined;
      }
    | undefined;
  /** For the second hanger: where it goes so that the shackle has its angle at ride height. */
  shackle?:
    | {
        length: Millimetres;
        load: ShackleLoad;
        /** Square to the line of the eyes unless told. */
        angle?: Degrees | undefined;
        movingEyeHigher?: Millimetres | undefined;
      }
    | undefined;
  limits?: Limits | undefined;
  /** Standard uncertainties: of a hole's station, of a half measured flat, of the arch at ride. */
  sigma: { hole: Millimetres; half: Millimetres; arch?: Millimetres | undefined };
  order?: OptionOrder | undefined;
};

/** A spring one way round with one pin offset: what every hole shares. */
export type Hang = {
  spring: SearchSpring;
  turned: boolean;
  pinOffset: Millimetres;
  /** Null when the leaf cannot be reckoned with. */
  leaf: MainLeaf | null;
  problem: string | null;
};

/**
 * Every option in columns, one place an option; numbers are NaN where a thing was not asked for or is not known. Option i
 * hangs spring and way hang[i / holes] in hole i % holes.
 */
export type OptionColumns = {
  count: number;
  hangs: readonly Hang[];
  holes: readonly HangerHole[];
  /** Axle station at full compression, at ride height and hanging. */
  flat: Float64Array;
  ride: Float64Array;
  droop: Float64Array;
  /** At full compression, ahead of the opening's centre. */
  shift: Float64Array;
  wheelbase: Float64Array;
  approach: Float64Array;
  departure: Float64Array;
  ramp: Float64Array;
  frontRoom: Float64Array;
  rearRoom: Float64Array;
  frontRoomAtLock: Float64Array;
  rearRoomAtLock: Float64Array;
  /** New length less the old. */
  dragLinkChange: Float64Array;
  propshaftRide: Float64Array;
  /** Longest less shortest of droop, ride and flat. */
  propshaftSlip: Float64Array;
  /** k = 2, of the station at full compression. */
  plusMinus: Float64Array;
  /** Bits of the limits that an option does not keep: see Rejection. */
  rejected: Uint16Array;
  /** Options in the order asked for, those that stand first. */
  order: Uint32Array;
};
