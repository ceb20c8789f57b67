import { z } from "zod";
import type { WorkEntry } from "../domain/layout/work-entry";
import { ALIGNMENT_FIGURES, type WorkLine, workLine } from "../domain/layout/work-list";
import type { LengthUnit } from "../domain/units/length";
import { Faults, type FormRead, length, type Typed, UUID } from "./layout";

/* The forms of the steps after approval, and what was kept of them. */

export type TackForm = {
  left: { station: Typed; offset: Typed };
  right: { station: Typed; offset: Typed };
  /** The sheet that the person had before them; null when the screen did not say. */
  sheet: number | null;
  clientKey: string;
};

/** Both ends of the tacked axle (`leftStation`, `leftOffset`, `rightStation`, `rightOffset`). */
export function readTackForm(form: FormData, unit: LengthUnit): FormRead<TackForm> {
  const faults = new Faults();
  const clientKey = String(form.get("clientKey") ?? "")
    .trim()
    .toLowerCase();
  if (!UUID.test(clientKey)) faults.add("form", "The reading has no key of its own: load the page again.");
  const end = (side: "left" | "right") => {
    const offset = length(form, `${side}Offset`, unit, faults);
    if (offset.mm < 0)
      faults.add(`${side}Offset`, "The offset is typed without a sign: left or right says which way.");
    return { station: length(form, `${side}Station`, unit, faults), offset };
  };
  const [left, right] = [end("left"), end("right")];
  const sheet = /^\d{1,6}$/.test(String(form.get("sheet") ?? "")) ? Number(form.get("sheet")) : null;
  return faults.any
    ? { ok: false, fields: faults.fields }
    : { ok: true, value: { left, right, sheet, clientKey } };
}

export type WorkForm = {
  line: WorkLine;
  entry: WorkEntry;
  due: { year: number; month: number; day: number } | null;
};

const LONGEST = { wanted: 40, read: 40, tool: 80, words: 160 } as const;
const TOO_LONG = "That is longer than the paper has room for.";

/** A signature under a line (`item`, `state`, and what was typed with it). */
export function readWorkForm(form: FormData): FormRead<WorkForm> {
  const faults = new Faults();
  const text = (name: string) => String(form.get(name) ?? "").trim();
  const line = workLine(text("item"));
  if (!line) faults.add("item", "There is no such line on this list.");
  const state = (["pass", "fail"] as const).find((one) => one === text("state"));
  if (!state) faults.add("state", "Sign it as good, or say that it is not.");
  for (const [name, most] of Object.entries(LONGEST))
    if (text(name).length > most) faults.add(name, TOO_LONG);
  const figures = ALIGNMENT_FIGURES.map(({ id }) => ({ id, typed: text(`figure.${id}`) })).filter(
    ({ typed }) => typed !== "",
  );
  for (const { id, typed } of figures) if (typed.length > LONGEST.read) faults.add(`figure.${id}`, TOO_LONG);
  const due = readDay(text("due"), faults);
  if (faults.any || !line || !state) return { ok: false, fields: faults.fields };
  const entry = {
    state,
    wanted: text("wanted"),
    read: text("read"),
    tool: text("tool"),
    words: text("words"),
    figures,
  };
  return { ok: true, value: { line, entry, due } };
}

/** A day as a date field sends it; null when it was left empty. */
function readDay(typed: string, faults: Faults): WorkForm["due"] {
  if (typed === "") return null;
  const [, year, month, day] = (/^(\d{4})-(\d{2})-(\d{2})$/.exec(typed) ?? []).map(Number);
  const date = new Date(Date.UTC(year ?? Number.NaN, (month ?? 0) - 1, day));
  if (Number.isNaN(date.getTime()) || date.getUTCDate() !== day || date.getUTCMonth() + 1 !== month) {
    faults.add("due", "That is no day of the calendar.");
    return null;
  }
  return { year: date.getUTCFullYear(), month: date.getUTCMonth() + 1, day: date.getUTCDate() };
}

/** What was shown when a tack check was kept. */
export const TackFigures = z.object({
  wantedStationMm: z.number(),
  leftAheadMm: z.number(),
  rightAheadMm: z.number(),
  outOfSquareMm: z.number(),
  sidewaysMm: z.number(),
  headline: z.string(),
  moves: z.array(z.string()),
});
export type TackFigures = z.infer<typeof TackFigures>;
