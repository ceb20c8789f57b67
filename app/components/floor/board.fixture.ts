import type { BayCard, Board, BoardBay, BoardVehicle, CrewCard } from "../../domain/floor/board";

/* Small boards for the tests beside this file. */

const FT = 304.8;
export const NOW = "2026-12-01T17:42:00.000Z";
export const minutesAgo = (minutes: number) => new Date(Date.parse(NOW) - minutes * 60_000).toISOString();

export function aBay(number: number, more: Partial<BoardBay> = {}): BoardBay {
  return {
    id: 100 + number,
    number,
    kind: "general",
    xMm: 0,
    yMm: (number - 1) * 15 * FT,
    lengthMm: 28 * FT,
    widthMm: 14 * FT,
    mouth: "east",
    ratedForLayout: false,
    outside: false,
    marks: [],
    ...more,
  };
}

export function aVehicle(buildId: number, more: Partial<BoardVehicle> = {}): BoardVehicle {
  return {
    buildId,
    placementId: buildId * 10,
    nickname: `Vehicle ${buildId}`,
    code: "M3XF",
    kind: "long-bed-pickup",
    lengthMm: 230 * 25.4,
    widthMm: 76 * 25.4,
    since: minutesAgo(400),
    movedBy: "Ida Kestrel",
    stage: null,
    crew: [],
    level: { state: "none" },
    hold: null,
    endsAt: null,
    promisedAt: null,
    layoutId: null,
    ...more,
  };
}

export function aPerson(personId: number, more: Partial<CrewCard> = {}): CrewCard {
  return {
    personId,
    name: "Otis Lindqvist",
    initials: "OL",
    skills: ["strip"],
    on: null,
    awayUntil: null,
    ...more,
  };
}

export function aBoard(more: Partial<Board> & { bays?: BayCard[] } = {}): Board {
  return {
    revision: 1,
    building: { lengthMm: 90 * FT, widthMm: 53 * FT },
    bays: [],
    yard: [],
    crew: [],
    next: [],
    ...more,
  };
}
