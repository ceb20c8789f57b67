import type { HoldKind } from "../../domain/builds/stages";
import type { Board, BoardBay, BoardVehicle } from "../../domain/floor/board";
import { vehiclesOn } from "../../domain/floor/board";
import type { SignName } from "../../ui/signs";
import { whenInWords } from "../time";

export type Need = {
  buildId: number;
  sign: SignName;
  tone: "stop" | "ask";
  title: string;
  words: string;
  /** Since when it waits. */
  since: string;
};

const WAITS_FOR: Record<HoldKind, string> = {
  parts: "parts",
  customer: "customer",
  "level-void": "level void",
  safety: "safety",
};

function needOf(vehicle: BoardVehicle, bay: BoardBay | null, now: string, timeZone: string): Need | null {
  const { hold, level, nickname, buildId } = vehicle;
  const where = bay ? `Bay ${bay.number}` : "Yard";
  if (level.state === "void" && (hold === null || hold.kind === "level-void"))
    return {
      buildId,
      sign: "void",
      tone: "stop",
      title: `${nickname}, level void`,
      words: level.drops > 0 ? `${where}: level again, re-drop one point` : `${where}: level again`,
      since: level.voidedAt,
    };
  if (hold) {
    const due = hold.dueAt ? `, due ${whenInWords(hold.dueAt, now, timeZone)}` : "";
    const asks = hold.kind === "customer";
    return {
      buildId,
      sign: asks ? "question" : "hold",
      tone: asks ? "ask" : "stop",
      title: `${nickname}, ${WAITS_FOR[hold.kind]}`,
      words: `${where}: ${hold.words}${due}`,
      since: hold.placedAt,
    };
  }
  if (vehicle.promisedAt && vehicle.promisedAt < now)
    return {
      buildId,
      sign: "promise",
      tone: "stop",
      title: `${nickname}, past its promise`,
      words: `${where}: promised ${whenInWords(vehicle.promisedAt, now, timeZone)}`,
      since: vehicle.promisedAt,
    };
  return null;
}

const RANK: Record<string, number> = { void: 1, hold: 0, promise: 2, question: 3 };

/** What waits for the foreman, the hardest first, then the longest waiting. */
export function needsOn(board: Board, now: string, timeZone: string): Need[] {
  return vehiclesOn(board)
    .flatMap(({ vehicle, bay }) => needOf(vehicle, bay, now, timeZone) ?? [])
    .sort((a, b) => (RANK[a.sign] ?? 9) - (RANK[b.sign] ?? 9) || a.since.localeCompare(b.since));
}
