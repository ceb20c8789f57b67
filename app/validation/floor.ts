import { z } from "zod";
import { HOLD_KINDS } from "../domain/builds/stages";

/** The id of a row, as a form sends it. */
export const idField = z
  .string("Something is missing: load the page again.")
  .regex(/^[1-9]\d{0,14}$/, "There is no such thing here: load the page again.")
  .transform(Number);
const id = idField;
/** A tick that a person or a screen gives: "1" is yes, anything else is no. */
const yes = z
  .string()
  .optional()
  .transform((value) => value === "1");
/** Empty is a place of its own: the yard, or free. */
const idOrNone = z.union(
  [z.literal("").transform(() => null), id],
  "There is no such place here: load the page again.",
);

export const MoveVehicleForm = z.object({ buildId: id, placementId: id, toBayId: idOrNone, confirmed: yes });

export const AssignPersonForm = z.object({ personId: id, toBuildId: idOrNone, confirmed: yes });

const HOLD_WORDS = "Say why in a few words: the next person has to understand it.";

export const HoldForm = z.discriminatedUnion(
  "action",
  [
    z.object({ action: z.literal("lift"), buildId: id }),
    z.object({
      action: z.literal("place"),
      buildId: id,
      kind: z.enum(HOLD_KINDS, "Choose what it waits for."),
      words: z.string(HOLD_WORDS).trim().min(3, HOLD_WORDS).max(160, "Keep it under 160 letters."),
    }),
  ],
  "Place a hold or lift it.",
);

export const SetStageForm = z.object({
  stageId: id,
  state: z.enum(["under-way", "done"], "A stage is started or finished."),
});
