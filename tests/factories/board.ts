import type { BayCard, Board, BoardVehicle, CrewCard } from "~/domain/floor/board";

/* Pieces of a board for tests of pure code: sensible values, overridden where the test cares. */

const FT = 304.8;

export const boardBay = (over: Partial<BayCard["bay"]> = {}): BayCard["bay"] => ({
  id: 1,
  number: 1,
  kind: "level-pad",
  xMm: 0,
  yMm: 0,
  lengthMm: 28 * FT,
  widthMm: 14 * FT,
  mouth: "east",
  ratedForLayout: true,
  outside: false,
  marks: [],
  ...over,
});

export const boardVehicle = (over: Partial<BoardVehicle> = {}): BoardVehicle => ({
  buildId: 10,
  placementId: 100,
  nickname: "Old Mule",
  code: "M3XF",
  kind: "long-bed-pickup",
  lengthMm: 230 * 25.4,
  widthMm: 76 * 25.4,
  since: "2026-12-01T08:00:00.000Z",
  movedBy: "Ida Kestrel",
  stage: {
    id: 1,
    kind: "layout",
    state: "under-way",
    bayKinds: ["level-pad"],
    skill: "layout",
    heads: 2,
    pieces: null,
  },
  crew: [],
  level: { state: "none" },
  hold: null,
  endsAt: null,
  promisedAt: null,
  layoutId: null,
  ...over,
});

export const levelTrue = (drops: number): BoardVehicle["level"] => ({
  state: "true",
  noseHighDeg: 0.04,
  rightHighDeg: 0.01,
  checkedAt: "2026-12-01T09:00:00.000Z",
  drops,
});

export const bayCard = (bay: Partial<BayCard["bay"]> = {}, vehicle: BoardVehicle | null = null): BayCard => ({
  bay: boardBay(bay),
  vehicle,
});

export const crewCard = (over: Partial<CrewCard> = {}): CrewCard => ({
  personId: 5,
  name: "Wes Tolliver",
  initials: "WT",
  skills: ["level", "layout"],
  on: null,
  awayUntil: null,
  ...over,
});

export const board = (over: Partial<Board> = {}): Board => ({
  revision: 7,
  building: { lengthMm: 90 * FT, widthMm: 53 * FT },
  bays: [],
  yard: [],
  crew: [],
  next: [],
  ...over,
});
