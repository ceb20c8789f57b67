import type { BayCard, Board, BoardVehicle, CrewCard } from "../../domain/floor/board";
import { vehiclesOn } from "../../domain/floor/board";

/** A change that was let go of and is on its way to the server. */
export type Pending =
  | { key: string; kind: "vehicle"; buildId: number; placementId: number; toBayId: number | null }
  | { key: string; kind: "person"; personId: number; toBuildId: number | null };

/** Does the board show what was asked for, or something newer? Then the change needs no drawing of its own. */
export function isShown(board: Board, change: Pending): boolean {
  if (change.kind === "vehicle") {
    const standing = vehiclesOn(board).find(({ vehicle }) => vehicle.buildId === change.buildId);
    return standing?.vehicle.placementId !== change.placementId;
  }
  const person = board.crew.find((card) => card.personId === change.personId);
  return (person?.on?.buildId ?? null) === change.toBuildId;
}

function movedVehicle(board: Board, buildId: number, toBayId: number | null): Board {
  const standing = vehiclesOn(board).find(({ vehicle }) => vehicle.buildId === buildId);
  if (!standing) return board;
  const { vehicle } = standing;
  const lost = vehicle.level.state === "true" || vehicle.level.state === "not-true";
  const now: BoardVehicle = {
    ...vehicle,
    level: lost ? { state: "none" } : vehicle.level,
    crew: toBayId === null ? [] : vehicle.crew,
  };
  const without = (card: BayCard): BayCard =>
    card.vehicle?.buildId === buildId ? { ...card, vehicle: null } : card;
  return {
    ...board,
    bays: board.bays.map((card) => (card.bay.id === toBayId ? { ...card, vehicle: now } : without(card))),
    yard: toBayId === null ? [...board.yard, now] : board.yard.filter((other) => other.buildId !== buildId),
  };
}

function movedPerson(board: Board, personId: number, toBuildId: number | null): Board {
  const person = board.crew.find((card) => card.personId === personId);
  const target = vehiclesOn(board).find(({ vehicle }) => vehicle.buildId === toBuildId);
  if (!person || (toBuildId !== null && !target)) return board;
  const since = target?.vehicle.since ?? "";
  const crewOf = (vehicle: BoardVehicle): BoardVehicle => {
    const others = vehicle.crew.filter((one) => one.personId !== personId);
    if (vehicle.buildId === toBuildId)
      return {
        ...vehicle,
        crew: [...others, { personId, name: person.name, initials: person.initials, since }],
      };
    return others.length === vehicle.crew.length ? vehicle : { ...vehicle, crew: others };
  };
  const on: CrewCard["on"] = target
    ? {
        buildId: target.vehicle.buildId,
        nickname: target.vehicle.nickname,
        bayNumber: target.bay?.number ?? null,
        since,
      }
    : null;
  return {
    ...board,
    bays: board.bays.map((card) => (card.vehicle ? { ...card, vehicle: crewOf(card.vehicle) } : card)),
    crew: board.crew.map((card) => (card.personId === personId ? { ...card, on } : card)),
  };
}

/** The board as it will be when the changes on their way are kept. Those it shows already are passed over. */
export function withPending(board: Board, changes: readonly Pending[]): Board {
  return changes.reduce((shown, change) => {
    if (isShown(board, change)) return shown;
    return change.kind === "vehicle"
      ? movedVehicle(shown, change.buildId, change.toBayId)
      : movedPerson(shown, change.personId, change.toBuildId);
  }, board);
}
