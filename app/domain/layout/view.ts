import type { VehicleKind } from "../builds/vehicle-kinds";
import type { FloorPoint } from "../geometry/point";
import type { Degrees } from "../units/angle";
import type { LengthUnit, Millimetres } from "../units/length";
import type { AxleLine, OpeningComparison } from "./axle-line";
import type { DropPointId, DropSide, TieFit } from "./drops";
import type { Frame } from "./frame";
import type { Option } from "./options";
import type { StepFacts, StepId, StepState } from "./steps";
import type { Progress, WorkListId, WorkState } from "./work-list";

/*
 * One layout as its screens, its sheet and its drawings are handed it: what was typed, what it came to, who did it.
 * Made on the server (services/read-layout), whole; lengths in millimetres, moments as ISO strings in UTC.
 */

/** A length with the entry as it was typed. */
export type TypedLength = { mm: Millimetres; typed: string };
/** Who did it and when. */
export type Made = { name: string; initials: string; at: string };

export type LevelView = {
  id: number;
  method: "heights" | "gauge";
  state: "true" | "not-true" | "void";
  noseHighDeg: Degrees;
  rightHighDeg: Degrees;
  /** Null where the method cannot tell. */
  twistMm: Millimetres | null;
  twistDeg: Degrees | null;
  allowedDeg: Degrees;
  made: Made;
  voided: { made: Made; reason: string } | null;
  readings: {
    place: string;
    x: TypedLength | null;
    y: TypedLength | null;
    height: TypedLength | null;
    firstDeg: Degrees | null;
    turnedDeg: Degrees | null;
  }[];
  /** `none`: no older drops wait. `wanted`: one old point has to be dropped again. `stands` / `void`: it was, and the old drops stand or are void. */
  redrop: { state: "none" | "wanted" | "stands" | "void"; offMm: Millimetres | null };
};

export type DropReadingView = {
  id: number;
  method: "offset" | "ties";
  stationTyped: string | null;
  offsetTyped: string | null;
  ties: { mark: string; distance: TypedLength }[];
  at: FloorPoint;
  height: TypedLength | null;
  /** The tapes do not meet. */
  suspect: boolean;
  /** False: two tapes only, nothing checks it. */
  checked: boolean;
  /** The adjustment, worked out again from the tapes; null for offsets. */
  fit: TieFit | null;
  /** Taken under a level that stands, or carried over to it by a re-drop. */
  stands: boolean;
  reason: string | null;
  made: Made;
};

export type DropView = {
  point: DropPointId;
  side: DropSide;
  label: string;
  needed: boolean;
  /** Null: not dropped yet. */
  reading: DropReadingView | null;
  /** Older readings that this one took the place of, newest first. */
  superseded: { typed: string; made: Made; reason: string | null }[];
};

export type ChoiceView = {
  id: number;
  /** The option's key, as in Option. */
  key: string;
  made: Made;
  /** True when the figures of today differ from those it was chosen by. */
  changed: boolean;
};

/** How sure the axle line's station is (k = 2), and what weighs most in that, in words. */
export type AxleSureness = { plusMinus: Millimetres; words: string };

/** A drop to be looked at again. What the first person read is null until somebody else has read it too. */
export type LookView = {
  point: DropPointId;
  side: DropSide;
  label: string;
  where: string;
  /** Its share of what is unsure in the result. */
  share: number;
  state: "to-do" | "apart" | "agrees";
  /** Who read it first: they cannot look again at their own. */
  firstBy: string;
  first: { typed: string; made: Made } | null;
  looks: { typed: string; made: Made; apart: Millimetres; agrees: boolean }[];
  /** Readings that a third one set aside, with why. */
  setAside: { typed: string; made: Made; reason: string }[];
};
export type SecondLookView = {
  state: "to-do" | "apart" | "agrees" | "waived";
  /** How far two readings may be apart. */
  within: Millimetres;
  items: LookView[];
  waived: { made: Made; reason: string } | null;
};

export type ApprovalView = {
  state: "approved" | "void";
  sheetRevision: number;
  made: Made;
  /** What was signed, with the figures as they were then: a void sheet shows these, never today's sums. */
  signed: Option;
  voided: { at: string; reason: string } | null;
};

/** A check of the tacked axle as it was kept: what was typed and what was said then. */
export type TackCheckView = {
  id: number;
  passes: boolean;
  /** Of the approval that is the newest now; another one wanted a check of its own. */
  counts: boolean;
  leftTyped: string;
  rightTyped: string;
  leftAhead: Millimetres;
  rightAhead: Millimetres;
  outOfSquare: Millimetres;
  sideways: Millimetres;
  headline: string;
  moves: string[];
  made: Made;
};
export type TackView = {
  state: StepFacts["tack"];
  within: Millimetres;
  /** The line that was signed; null before anything was. */
  wanted: AxleLine | null;
  /** Newest first. */
  checks: TackCheckView[];
};

/** A signature under a line of the weld, torque or finish list. */
export type SignatureView = {
  state: WorkState;
  wanted: string;
  read: string;
  tool: string;
  words: string;
  /** When it has to be torqued again; null: not said. */
  dueAt: string | null;
  /** Alignment figures as typed, by id. */
  figures: { id: string; typed: string }[];
  made: Made;
};
export type WorkView = {
  progress: Record<WorkListId, Progress>;
  /** Lines that were signed, by their id, newest signature first. */
  signed: Record<string, SignatureView[]>;
};

export type LayoutView = {
  id: number;
  /** The shop's revision this was read at. */
  revision: number;
  shop: { name: string; timeZone: string; isDemo: boolean };
  unit: LengthUnit;
  vehicle: {
    buildId: number;
    nickname: string;
    code: string;
    kind: VehicleKind;
    lengthMm: number;
    widthMm: number;
    tyreTyped: string | null;
    wanted: string;
  };
  bay: { id: number; number: number; marks: { label: string; x: Millimetres; y: Millimetres }[] };
  /** False: the vehicle is not in the bay it was laid out in. */
  standsInBay: boolean;
  fixedEye: "ahead" | "behind";
  hanger: { name: string; holes: { id: number; number: number; ahead: Millimetres }[] };
  asked: {
    loadedRadius: Millimetres | null;
    tyreRadius: Millimetres | null;
    tyreWidth: Millimetres | null;
    wheelbase: Millimetres | null;
    approachAtLeast: Degrees | null;
  };
  settings: {
    allowedSlopeDeg: Degrees;
    shim: Millimetres;
    redropTolerance: Millimetres;
    markTolerance: Millimetres;
    tapeSigma: Millimetres;
    dropSigma: Millimetres;
    springSigma: Millimetres;
  };
  steps: StepState[];
  next: StepId;
  stands: Made | null;
  /** The newest level; null before the first. */
  level: LevelView | null;
  /** The round before, to say what a re-drop refers to. Null: there was none. */
  levelRounds: number;
  marks: { made: Made; taped: TypedLength; off: Millimetres } | null;
  drops: DropView[];
  /** Null until both datum pairs stand. */
  frame: Frame | null;
  /** Null until frame and all four opening drops stand. */
  openings: OpeningComparison | null;
  /** What each method gives, to choose from. Empty until openings are known. `asked` only when an offset was asked for. */
  axleWays: AxleLine[];
  axle: {
    line: AxleLine;
    asked: TypedLength | null;
    made: Made;
    /** Null when it cannot be told. */
    sureness: AxleSureness | null;
  } | null;
  /** Stations of the holes on the frame, from the dropped hole. Empty until it was dropped on both sides. */
  holes: { id: number; number: number; station: Millimetres }[];
  /** Null until axle line and holes are known. */
  options: Option[] | null;
  choice: ChoiceView | null;
  secondLook: SecondLookView;
  approval: ApprovalView | null;
  tack: TackView;
  work: WorkView;
  /** What is missing for options to be whole, in words: "Drop hanger hole 1 on both sides". */
  missing: string[];
};
