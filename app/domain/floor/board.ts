import type { HoldKind, StageKind, StageState } from "../builds/stages";
import type { VehicleKind } from "../builds/vehicle-kinds";
import type { Skill } from "../people/roles";
import type { BayKind, BayMouth } from "./bays";

/*
 * The board: the state of the floor as it is drawn on the Floor, the Post and the Wall, and sent over the live
 * channel. Lengths in millimetres, moments as ISO strings in UTC. Nothing about customers.
 */

export type BoardBay = {
  id: number;
  number: number;
  kind: BayKind;
  xMm: number;
  yMm: number;
  lengthMm: number;
  widthMm: number;
  mouth: BayMouth;
  ratedForLayout: boolean;
  outside: boolean;
  /** In the bay's own floor frame: A is the origin, A to B is +x, y to the left. */
  marks: { label: string; xMm: number; yMm: number }[];
};

export type BoardStage = {
  id: number;
  kind: StageKind;
  state: StageState;
  bayKinds: BayKind[];
  skill: Skill | null;
  heads: number;
  /** Null when the stage is not counted in pieces. */
  pieces: { done: number; of: number; word: string } | null;
};

/** `none`: no level was taken on this visit, or the stage in hand does not lean on it. */
export type BoardLevel =
  | { state: "none" }
  | {
      state: "true" | "not-true";
      noseHighDeg: number;
      rightHighDeg: number;
      checkedAt: string;
      drops: number;
    }
  | { state: "void"; reason: string; voidedAt: string; drops: number };

export type BoardHold = { id: number; kind: HoldKind; words: string; placedAt: string; dueAt: string | null };

export type BoardVehicle = {
  buildId: number;
  /** Which standing this is; a move says which one it saw. */
  placementId: number;
  nickname: string;
  code: string;
  kind: VehicleKind;
  lengthMm: number;
  widthMm: number;
  since: string;
  movedBy: string;
  /** The stage in hand, or the next open one; null when all are done. */
  stage: BoardStage | null;
  crew: { personId: number; name: string; initials: string; since: string }[];
  level: BoardLevel;
  hold: BoardHold | null;
  /** When the stage in hand should end by the plan. Null: not planned. */
  endsAt: string | null;
  promisedAt: string | null;
  layoutId: number | null;
};

export type BayCard = { bay: BoardBay; vehicle: BoardVehicle | null };

export type CrewCard = {
  personId: number;
  name: string;
  initials: string;
  skills: Skill[];
  /** Null: free. */
  on: { buildId: number; nickname: string; bayNumber: number | null; since: string } | null;
  awayUntil: string | null;
};

export type NextCard = { stintId: number; at: string; nickname: string; stage: StageKind; bayNumber: number };

export type Board = {
  /** The shop's revision that this board shows. */
  revision: number;
  building: { lengthMm: number; widthMm: number };
  bays: BayCard[];
  yard: BoardVehicle[];
  crew: CrewCard[];
  next: NextCard[];
};

/** What changed between two revisions. Parts that did not change are left out. */
export type BoardPatch = {
  /** The patch is whole for a board of this revision or a later one. */
  from: number;
  revision: number;
  bays: BayCard[];
  yard?: BoardVehicle[];
  crew?: CrewCard[];
  next?: NextCard[];
};

/**
 * Lays a patch over a board.
 * @returns the new board; the same board when it already shows that revision; null when changes between them are
 * missing, so that the whole board has to be fetched
 */
export function applyPatch(board: Board, patch: BoardPatch): Board | null {
  if (patch.revision <= board.revision) return board;
  if (patch.from > board.revision) return null;
  const changed = new Map(patch.bays.map((card) => [card.bay.id, card]));
  return {
    ...board,
    revision: patch.revision,
    bays: board.bays.map((card) => changed.get(card.bay.id) ?? card),
    yard: patch.yard ?? board.yard,
    crew: patch.crew ?? board.crew,
    next: patch.next ?? board.next,
  };
}

/** Every vehicle on the board with the bay it stands in; null for the yard. */
export function vehiclesOn(board: Board): { vehicle: BoardVehicle; bay: BoardBay | null }[] {
  return [
    ...board.bays.flatMap((card) => (card.vehicle ? [{ vehicle: card.vehicle, bay: card.bay }] : [])),
    ...board.yard.map((vehicle) => ({ vehicle, bay: null })),
  ];
}
