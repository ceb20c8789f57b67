import { STAGE_LABEL } from "../builds/stages";
import type { Skill } from "../people/roles";
import { formatFeet, mm } from "../units/length";
import type { BayKind } from "./bays";
import type { BayCard, BoardBay, BoardVehicle, CrewCard } from "./board";

/** `takes`: nothing against it. `asks`: possible, but it costs something. `refuses`: it will not go. */
export type Verdict = "takes" | "asks" | "refuses";

export type Reason = {
  /** Which rule spoke; the screen picks the sign by it. */
  rule:
    | "taken"
    | "too-long"
    | "too-wide"
    | "bay-kind"
    | "floor-not-rated"
    | "voids-level"
    | "safety-hold"
    | "elsewhere"
    | "skill"
    | "away"
    | "empty"
    | "same";
  verdict: Exclude<Verdict, "takes">;
  words: string;
};

export type Check = {
  verdict: Verdict;
  reasons: Reason[];
  /** How far the vehicle would stand out of the bay; 0 when it fits. Millimetres. */
  overMm: number;
  /** True when letting go would void a standing level. */
  voidsLevel: boolean;
};

const SKILL_WORDS: Record<Skill, string> = {
  strip: "strip",
  level: "level",
  layout: "layout",
  fabricate: "fabrication",
  weld: "weld",
  torque: "torque",
  brakes: "brake",
};

const KIND_WORDS: Record<BayKind, string> = {
  "level-pad": "a level pad",
  lift: "a lift",
  weld: "a weld bay",
  general: "a general bay",
  apron: "the apron",
};

const plural = (n: number, one: string) => `${n} ${one}${n === 1 ? "" : "s"}`;

const decide = (reasons: Reason[], overMm = 0): Check => ({
  verdict: reasons.some((r) => r.verdict === "refuses") ? "refuses" : reasons.length > 0 ? "asks" : "takes",
  reasons: [...reasons].sort((a, b) => Number(b.verdict === "refuses") - Number(a.verdict === "refuses")),
  overMm,
  voidsLevel: reasons.some((r) => r.rule === "voids-level"),
});

/** What a move would void, in words: "the level and 6 drops". Null when no level stands. */
export function wouldVoid(vehicle: BoardVehicle): string | null {
  const { level } = vehicle;
  if (level.state !== "true" && level.state !== "not-true") return null;
  return level.drops > 0 ? `the level and ${plural(level.drops, "drop")}` : "the level";
}

/**
 * May this vehicle be moved there, and what does it cost?
 * Every reason is given at once; the hardest decides. Moving to where it stands is refused as `same`.
 * @param vehicle the vehicle as it stands
 * @param from the bay it stands in, null for the yard
 * @param to the bay with what stands in it, or the yard
 */
export function checkMove(vehicle: BoardVehicle, from: BoardBay | null, to: BayCard | "yard"): Check {
  const reasons: Reason[] = [];
  const toBay = to === "yard" ? null : to.bay;
  if ((toBay?.id ?? null) === (from?.id ?? null)) {
    const where = toBay ? `in Bay ${toBay.number}` : "in the yard";
    return decide([{ rule: "same", verdict: "refuses", words: `It stands ${where} already.` }]);
  }
  let overMm = 0;
  if (to !== "yard") {
    const { bay, vehicle: occupant } = to;
    if (occupant)
      reasons.push({
        rule: "taken",
        verdict: "refuses",
        words: `Bay ${bay.number} is taken by ${occupant.nickname}.`,
      });
    if (vehicle.lengthMm > bay.lengthMm) {
      overMm = vehicle.lengthMm - bay.lengthMm;
      reasons.push({
        rule: "too-long",
        verdict: "refuses",
        words: `Bay ${bay.number} is ${formatFeet(mm(bay.lengthMm))}: vehicle is ${formatFeet(mm(vehicle.lengthMm))}.`,
      });
    }
    if (vehicle.widthMm > bay.widthMm)
      reasons.push({
        rule: "too-wide",
        verdict: "refuses",
        words: `Bay ${bay.number} is ${formatFeet(mm(bay.widthMm))} wide: vehicle is ${formatFeet(mm(vehicle.widthMm))}.`,
      });
    const { stage } = vehicle;
    if (stage && stage.bayKinds.length > 0 && !stage.bayKinds.includes(bay.kind)) {
      const needed = stage.bayKinds.map((kind) => KIND_WORDS[kind]).join(" or ");
      reasons.push({
        rule: "bay-kind",
        verdict: "asks",
        words: `${STAGE_LABEL[stage.kind]} needs ${needed}; Bay ${bay.number} is ${KIND_WORDS[bay.kind]}.`,
      });
    } else if (stage && (stage.kind === "level" || stage.kind === "layout") && !bay.ratedForLayout)
      reasons.push({
        rule: "floor-not-rated",
        verdict: "asks",
        words: `The floor of Bay ${bay.number} is not rated for layout.`,
      });
  }
  const lost = wouldVoid(vehicle);
  if (lost) reasons.push({ rule: "voids-level", verdict: "asks", words: `Voids ${lost}.` });
  if (vehicle.hold?.kind === "safety")
    reasons.push({
      rule: "safety-hold",
      verdict: "asks",
      words: `On hold for safety: ${vehicle.hold.words}`,
    });
  return decide(reasons, overMm);
}

/**
 * May this person be put on what stands in that bay?
 * A missing weld skill refuses; any other missing skill asks, since a second pair of hands needs none.
 */
export function checkAssign(person: CrewCard, target: BayCard, now: Date): Check {
  const { vehicle, bay } = target;
  if (!vehicle)
    return decide([{ rule: "empty", verdict: "refuses", words: `Nothing stands in Bay ${bay.number}.` }]);
  if (person.on?.buildId === vehicle.buildId)
    return decide([
      { rule: "same", verdict: "refuses", words: `${person.name} is on ${vehicle.nickname} already.` },
    ]);
  const reasons: Reason[] = [];
  if (person.awayUntil && new Date(person.awayUntil) > now)
    reasons.push({ rule: "away", verdict: "refuses", words: `${person.name} is away.` });
  if (person.on) {
    const where = person.on.bayNumber === null ? "in the yard" : `in Bay ${person.on.bayNumber}`;
    reasons.push({
      rule: "elsewhere",
      verdict: "asks",
      words: `${person.name} is on ${person.on.nickname} ${where}.`,
    });
  }
  const skill = vehicle.stage?.skill;
  if (skill && !person.skills.includes(skill)) {
    const anybody = vehicle.crew.length > 0;
    reasons.push({
      rule: "skill",
      verdict: skill === "weld" ? "refuses" : "asks",
      words: `${person.name} has no ${SKILL_WORDS[skill]} skill${anybody ? "" : ", and nobody else is on it"}.`,
    });
  }
  return decide(reasons);
}
