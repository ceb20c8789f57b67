import type { BayCard, Board, BoardBay, BoardVehicle, CrewCard } from "../../domain/floor/board";
import { vehiclesOn } from "../../domain/floor/board";
import { type Check, checkAssign, checkMove } from "../../domain/floor/move-check";
import type { PlaceKey } from "./words";

/** What a person has in hand: a vehicle or one of the crew, by dragging or by tapping. */
export type Hand =
  | { kind: "vehicle"; buildId: number; by: "drag" | "tap" }
  | { kind: "person"; personId: number; by: "drag" | "tap" };

export type Thing =
  | { kind: "vehicle"; vehicle: BoardVehicle; bay: BoardBay | null }
  | { kind: "person"; person: CrewCard };

/** What is in hand as the board knows it; null when it has left meanwhile. */
export function thingInHand(board: Board, hand: Hand | null): Thing | null {
  if (hand?.kind === "vehicle") {
    const standing = vehiclesOn(board).find(({ vehicle }) => vehicle.buildId === hand.buildId);
    return standing ? { kind: "vehicle", ...standing } : null;
  }
  if (hand?.kind === "person") {
    const person = board.crew.find((card) => card.personId === hand.personId);
    return person ? { kind: "person", person } : null;
  }
  return null;
}

export const thingTitle = (thing: Thing) =>
  thing.kind === "vehicle" ? thing.vehicle.nickname : thing.person.name;

const FREE: Check = { verdict: "takes", reasons: [], overMm: 0, voidsLevel: false };

function checkFree(person: CrewCard): Check {
  if (person.on) return FREE;
  const words = `${person.name} is free already.`;
  return { ...FREE, verdict: "refuses", reasons: [{ rule: "same", verdict: "refuses", words }] };
}

/** The bay card or the yard behind a place's key; null for the rail and for a bay that is not there. */
export function cardAt(board: Board, place: PlaceKey): BayCard | "yard" | null {
  if (place === "yard") return "yard";
  return board.bays.find((card) => card.bay.id === place) ?? null;
}

/** The verdict of one place on what is in hand; null when it is no place for such a thing. */
export function checkPlace(board: Board, thing: Thing, place: PlaceKey, now: string): Check | null {
  const target = cardAt(board, place);
  if (thing.kind === "vehicle") return target ? checkMove(thing.vehicle, thing.bay, target) : null;
  if (place === "free") return checkFree(thing.person);
  return target && target !== "yard" ? checkAssign(thing.person, target, new Date(now)) : null;
}

/** Every place that can be aimed at, in walking order, with its verdict. */
export function verdictsFor(board: Board, thing: Thing, now: string): Map<PlaceKey, Check> {
  const bays: PlaceKey[] = board.bays.map((card) => card.bay.id);
  const places: PlaceKey[] = thing.kind === "vehicle" ? ["yard", ...bays] : ["free", ...bays];
  const verdicts = new Map<PlaceKey, Check>();
  for (const place of places) {
    const check = checkPlace(board, thing, place, now);
    if (check) verdicts.set(place, check);
  }
  return verdicts;
}

/** A place's name as it is said after "in" or "to". */
export function placeName(board: Board, place: PlaceKey): string {
  if (place === "yard") return "the yard";
  if (place === "free") return "free";
  const card = board.bays.find((one) => one.bay.id === place);
  return card ? `Bay ${card.bay.number}` : "that bay";
}

/** What letting go over a place does, in one line. */
export function lettingGo(board: Board, thing: Thing, place: PlaceKey | null, check: Check | null): string {
  const home = homeOf(thing);
  if (place === null || check === null) return `Let go and it stays ${home}.`;
  if (check.verdict === "refuses") return `Let go and it stays ${home}.`;
  if (check.verdict === "asks") return "Let go and you are asked first.";
  if (thing.kind === "person")
    return place === "free" ? "Let go and they are free." : "Let go and they are on it.";
  return place === "yard"
    ? "Let go and it stands in the yard."
    : `Let go and it stands in ${placeName(board, place)}.`;
}

function homeOf(thing: Thing): string {
  if (thing.kind === "vehicle") return thing.bay ? `in Bay ${thing.bay.number}` : "in the yard";
  return thing.person.on ? `on ${thing.person.on.nickname}` : "free";
}

/** The places that take a vehicle as it is, in words, for the note beside a refusal. */
export function wherePossible(board: Board, verdicts: ReadonlyMap<PlaceKey, Check>): string {
  const names = [...verdicts]
    .filter(([, check]) => check.verdict !== "refuses")
    .map(([place]) => placeName(board, place));
  if (names.length === 0) return "No other place takes it now.";
  if (names.length === 1) return `It would go: ${names[0]} only.`;
  return `It would go: ${names.slice(0, -1).join(", ")} or ${names.at(-1)}.`;
}
