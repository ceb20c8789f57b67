/** The lists that are signed after the tack check. The torque list is worked on at the step of the weld list. */
export const WORK_LISTS = ["weld", "torque", "finish"] as const;
export type WorkListId = (typeof WORK_LISTS)[number];
export type WorkStep = "weld" | "finish";

/** `ready`: the place is safe to weld in. `weld`: a bracket. `bolt`: torqued. `check`: looked at. `figures`: alignment. */
export type WorkKind = "ready" | "weld" | "bolt" | "check" | "figures" | "sign-off";
export type WorkLine = {
  id: string;
  list: WorkListId;
  step: WorkStep;
  kind: WorkKind;
  label: string;
  /** What has to be so before it is signed. */
  where: string;
};
export type WorkState = "pass" | "fail";
/** How each line that was signed stands: the newest signature of each. */
export type WorkStates = ReadonlyMap<string, WorkState>;
export type Progress = { done: number; of: number; failed: number };

const both = (
  id: string,
  list: WorkListId,
  kind: WorkKind,
  label: string,
  where: string,
): readonly WorkLine[] =>
  (["left", "right"] as const).map((side) => ({
    id: `${id}.${side}`,
    list,
    step: "weld",
    kind,
    label: `${label}, ${side}`,
    where,
  }));
const one = (
  id: string,
  list: WorkListId,
  kind: WorkKind,
  label: string,
  where: string,
): readonly WorkLine[] => [{ id, list, step: list === "finish" ? "finish" : "weld", kind, label, where }];

const WHOLE = "Every pass of the bead laid, cleaned and looked at from both sides.";
const AT_RIDE = "Bushings at ride height, clean dry threads unless the maker says otherwise.";

/** Every line of a front leaf-spring job, in the order in which it is worked off. */
export const WORK_LINES: readonly WorkLine[] = [
  ...one("ready", "weld", "ready", "The place is ready to weld in", "Every caution above is met."),
  ...both("hanger", "weld", "weld", "Spring hanger", WHOLE),
  ...both("shackle-hanger", "weld", "weld", "Shackle hanger", WHOLE),
  ...both("perch", "weld", "weld", "Spring perch", WHOLE),
  ...both("bump-bracket", "weld", "weld", "Bump-stop bracket", WHOLE),
  ...both("damper-bracket", "weld", "weld", "Damper bracket", WHOLE),
  ...both("eye-bolt", "torque", "bolt", "Spring eye bolt", AT_RIDE),
  ...both("shackle-bolts", "torque", "bolt", "Shackle bolts", AT_RIDE),
  ...both(
    "u-bolts",
    "torque",
    "bolt",
    "U-bolts",
    "Crosswise, a little at a time, the pin seated in its hole.",
  ),
  ...one(
    "brake-hose",
    "torque",
    "check",
    "Brake hoses at full droop",
    "Slack left, no twist, clear of tyre and frame.",
  ),
  ...one(
    "wiring",
    "torque",
    "check",
    "Wiring at full droop",
    "Slack left, clipped, clear of what moves and what is hot.",
  ),
  ...one("bump-stops", "torque", "check", "Bump stops", "They meet their pads before anything else touches."),
  ...one(
    "steering",
    "torque",
    "check",
    "Steering lock to lock",
    "At ride and at droop: nothing binds, rubs or pulls a hose.",
  ),
  ...one("alignment", "finish", "figures", "Alignment", "The figures as the rack or the strings gave them."),
  ...one("road-test", "finish", "check", "Road test", "Brakes straight, wheel centred, no knock, no rub."),
  ...one(
    "re-torque",
    "finish",
    "check",
    "Torque again after the first miles",
    "Every bolt of the torque list, by the same figures.",
  ),
  ...one("sign-off", "finish", "sign-off", "Sign off", "All of it stands as it is written here."),
];

/** Alignment figures in degrees; each may be left out. */
export const ALIGNMENT_FIGURES = [
  { id: "toe", label: "Toe, both together" },
  { id: "caster-left", label: "Caster, left" },
  { id: "caster-right", label: "Caster, right" },
  { id: "camber-left", label: "Camber, left" },
  { id: "camber-right", label: "Camber, right" },
] as const;

export const workLine = (id: string): WorkLine | null => WORK_LINES.find((line) => line.id === id) ?? null;
export const linesOf = (list: WorkListId): readonly WorkLine[] =>
  WORK_LINES.filter((line) => line.list === list);

/**
 * How far a list is. That the place is ready is no piece of work and does not count.
 * @example progressOf("weld", new Map([["hanger.left", "pass"]])) // { done: 1, of: 10, failed: 0 }
 */
export function progressOf(list: WorkListId, states: WorkStates): Progress {
  const lines = linesOf(list).filter((line) => line.kind !== "ready");
  const in_ = (state: WorkState) => lines.filter((line) => states.get(line.id) === state).length;
  return { done: in_("pass"), of: lines.length, failed: in_("fail") };
}

export const isWhole = ({ done, of }: Progress): boolean => of > 0 && done >= of;

/** The one line to work on next; null when the list is signed. */
export const nextLine = (list: WorkListId, states: WorkStates): WorkLine | null =>
  linesOf(list).find((line) => states.get(line.id) !== "pass") ?? null;

/** Why a line may not be signed as good yet, in words; null when it may. */
export function whyNotYet(line: WorkLine, states: WorkStates): string | null {
  if (line.kind === "weld" && states.get("ready") !== "pass")
    return "First the cautions: somebody signs that the place is ready to weld in.";
  if (line.list === "torque" && !isWhole(progressOf("weld", states)))
    return "First the weld list: nothing is torqued on a bracket that is not signed.";
  if (line.kind !== "sign-off") return null;
  const open = linesOf("finish").filter((one) => one.id !== line.id && states.get(one.id) !== "pass");
  return open.length > 0 ? `First: ${open.map((one) => one.label.toLowerCase()).join(", ")}.` : null;
}
