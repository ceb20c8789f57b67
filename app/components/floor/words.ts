import { STAGE_LABEL } from "../../domain/builds/stages";
import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import type { BoardBay, BoardLevel, BoardVehicle, CrewCard } from "../../domain/floor/board";
import { type Check, type Reason, type Verdict, wouldVoid } from "../../domain/floor/move-check";
import { formatFeet, mm } from "../../domain/units/length";
import type { SignName } from "../../ui/signs";
import { ageInWords } from "../time";

/** A place on the floor as a target: a bay by its id, or the yard (vehicles), or nowhere (people: free). */
export type PlaceKey = number | "yard" | "free";

export const bayName = (bay: BoardBay | null) => (bay ? `Bay ${bay.number}` : "the yard");
export const bayTitle = (bay: BoardBay) =>
  `Bay ${bay.number}, ${BAY_KIND_LABEL[bay.kind]}, ${formatFeet(mm(bay.lengthMm))}`;
export const firstName = (name: string) => name.split(" ")[0] ?? name;

export const VERDICT_WORDS: Record<Verdict, string> = {
  takes: "takes it",
  asks: "asks first",
  refuses: "will not go",
};

const SHORT: Partial<Record<Reason["rule"], string>> = {
  taken: "taken",
  "too-long": "too short",
  "too-wide": "too narrow",
  empty: "empty",
  same: "stands here",
  away: "away",
};

/** The word at a place's mouth: the rule that refuses in one word, or the verdict. */
export function mouthWord(check: Check): string {
  if (check.verdict !== "refuses") return VERDICT_WORDS[check.verdict];
  const [first] = check.reasons;
  return (first && SHORT[first.rule]) ?? VERDICT_WORDS.refuses;
}

const RULE_SIGN: Record<Reason["rule"], SignName> = {
  taken: "vehicle",
  "too-long": "vehicle",
  "too-wide": "vehicle",
  "bay-kind": "bay",
  "floor-not-rated": "not-level",
  "voids-level": "void",
  "safety-hold": "hold",
  elsewhere: "person-on-it",
  skill: "person",
  away: "person",
  empty: "bay",
  same: "bay",
};
export const ruleSign = (rule: Reason["rule"]) => RULE_SIGN[rule];

export const VERDICT_SIGN: Record<Verdict, SignName> = { takes: "bay", asks: "question", refuses: "hold" };

/** The level's state in words; null when none was taken. */
export function levelWords(level: BoardLevel, now: string): string | null {
  switch (level.state) {
    case "none":
      return null;
    case "void":
      return `Level void ${ageInWords(level.voidedAt, now)}: ${level.reason}`;
    default:
      return `${level.state === "true" ? "Level true" : "Not level"}${slopeWords(level)}, checked ${ageInWords(level.checkedAt, now)} ago`;
  }
}

function slopeWords(level: Extract<BoardLevel, { noseHighDeg: number }>): string {
  const nose = level.noseHighDeg;
  const right = level.rightHighDeg;
  const [angle, words] =
    Math.abs(nose) >= Math.abs(right)
      ? [nose, nose > 0 ? "nose high" : "nose low"]
      : [right, right > 0 ? "right high" : "left high"];
  const shown = Math.abs(angle).toFixed(2);
  return shown === "0.00" ? "" : `, ${shown}° ${words}`;
}

const LEVEL_NAME: Record<BoardLevel["state"], string | null> = {
  none: null,
  true: "level true",
  "not-true": "not level",
  void: "level void",
};

/** What a vehicle is called by a screen reader: "Old Mule, M3XF, Bay 5, Layout, level true". */
export function vehicleName(vehicle: BoardVehicle, bay: BoardBay | null): string {
  return [
    vehicle.nickname,
    vehicle.code,
    bay ? `Bay ${bay.number}` : "Yard",
    vehicle.stage ? STAGE_LABEL[vehicle.stage.kind] : "All stages done",
    LEVEL_NAME[vehicle.level.state],
    vehicle.hold ? `on hold: ${vehicle.hold.words}` : null,
  ]
    .filter(Boolean)
    .join(", ");
}

/** What a person is called by a screen reader: "Otis Lindqvist, free". */
export function personName(person: CrewCard, now: string): string {
  if (isAway(person, now)) return `${person.name}, away`;
  if (!person.on) return `${person.name}, free`;
  return `${person.name}, on ${person.on.nickname}${person.on.bayNumber === null ? "" : `, Bay ${person.on.bayNumber}`}`;
}

export const isAway = (person: CrewCard, now: string) => person.awayUntil !== null && person.awayUntil > now;

export type Question = { title: string; loss: string[]; keep: string; go: string };

/** The question before a move that costs something: what is lost, and the safe answer first. */
export function moveQuestion(
  vehicle: BoardVehicle,
  from: BoardBay | null,
  to: BoardBay | null,
  check: Check,
  now: string,
): Question {
  const { level } = vehicle;
  const others = check.reasons
    .filter((reason) => reason.rule !== "voids-level")
    .map((reason) => reason.words);
  const lost = wouldVoid(vehicle);
  const loss = [...others];
  if (lost && level.state !== "none" && level.state !== "void") {
    const state = level.state === "true" ? "true" : "not true";
    const aged = lost.replace("the level", `The level (${state}, ${ageInWords(level.checkedAt, now)})`);
    loss.unshift(`${aged} ${level.drops > 0 ? "are" : "is"} void once it moves.`);
  }
  return {
    title: `Move ${vehicle.nickname} to ${bayName(to)}?`,
    loss,
    keep: `Keep it in ${bayName(from)}`,
    go: check.voidsLevel ? "Move and void" : "Move it anyway",
  };
}

/** The question before a person is put on a vehicle against something. */
export function assignQuestion(person: CrewCard, vehicle: BoardVehicle, check: Check): Question {
  const first = firstName(person.name);
  return {
    title: `Put ${first} on ${vehicle.nickname}?`,
    loss: check.reasons.map((reason) => reason.words),
    keep: person.on ? `Leave ${first} on ${person.on.nickname}` : `Leave ${first} free`,
    go: `Put ${first} on it`,
  };
}
