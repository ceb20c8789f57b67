import type { Board, BoardBay, BoardVehicle } from "../../domain/floor/board";
import { vehiclesOn } from "../../domain/floor/board";
import { firstName } from "./words";

export type Change = { buildId: number; words: string };

type Standing = { vehicle: BoardVehicle; bay: BoardBay | null };

function wordsFor(was: Standing | undefined, is: Standing, me: string): string | null {
  const { vehicle } = is;
  if (!was) return "Booked in, now";
  if (was.vehicle.placementId !== vehicle.placementId)
    return vehicle.movedBy === me ? null : `Moved by ${firstName(vehicle.movedBy)}, now`;
  if (was.vehicle.hold?.id !== vehicle.hold?.id)
    return vehicle.hold ? "Put on hold, now" : "Hold lifted, now";
  if (was.vehicle.level.state !== vehicle.level.state)
    return vehicle.level.state === "void" ? "Level void, now" : "Level checked, now";
  if (was.vehicle.stage?.id !== vehicle.stage?.id || was.vehicle.stage?.state !== vehicle.stage?.state)
    return "Stage changed, now";
  const crew = (v: BoardVehicle) => v.crew.map((one) => one.personId).join();
  return crew(was.vehicle) === crew(vehicle) ? null : "Crew changed, now";
}

/**
 * What changed between two boards, for each vehicle that still stands: one line in words.
 * A move of one's own is left out: the person saw it happen.
 * @param me the name of the person who watches
 */
export function changesBetween(was: Board, is: Board, me: string): Change[] {
  if (was.revision === is.revision) return [];
  const before = new Map(vehiclesOn(was).map((standing) => [standing.vehicle.buildId, standing]));
  return vehiclesOn(is).flatMap((standing) => {
    const { buildId } = standing.vehicle;
    const words = wordsFor(before.get(buildId), standing, me);
    return words ? [{ buildId, words }] : [];
  });
}
