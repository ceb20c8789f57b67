import { z } from "zod";
import { AXLE_METHODS } from "../domain/layout/axle-line";
import { DROP_SIDES, type DropPointId, dropPoint } from "../domain/layout/drops";
import type { GaugePlace } from "../domain/layout/level";
import { degrees } from "../domain/units/angle";
import { type LengthUnit, type Millimetres, mm, parseLength } from "../domain/units/length";

/*
 * The forms of the layout steps. A form has fields of its own for each stand, gauge place and tape, so it is first
 * gathered by name and then read; every fault is told beside its own field.
 */

export type Typed = { mm: Millimetres; typed: string };
type Fields = Record<string, string>;
/** What was read, or what is wrong beside which field. */
export type FormRead<T> = { ok: true; value: T } | { ok: false; fields: Fields };

const MAX_TYPED = 40;

export class Faults {
  readonly fields: Fields = {};
  add(name: string, words: string) {
    this.fields[name] ??= words;
  }
  get any() {
    return Object.keys(this.fields).length > 0;
  }
}

/** Reads one length; a fault is added and 0 answered when it cannot be. */
export function length(form: FormData, name: string, unit: LengthUnit, faults: Faults, most = 20_000): Typed {
  const typed = String(form.get(name) ?? "").trim();
  const read =
    typed.length > MAX_TYPED
      ? ({ ok: false, problem: "That is too long for a length." } as const)
      : parseLength(typed, unit);
  if (!read.ok) faults.add(name, read.problem);
  else if (Math.abs(read.value) > most)
    faults.add(name, "That is further than any shop floor: read the tape again.");
  return { mm: read.ok ? read.value : mm(0), typed };
}

function angle(form: FormData, name: string, faults: Faults) {
  const typed = String(form.get(name) ?? "")
    .trim()
    .replace(",", ".")
    .replace("−", "-");
  const value = Number(typed);
  if (typed === "" || !Number.isFinite(value))
    faults.add(name, "Type the gauge's reading in degrees, for example 0.35 or -0.1.");
  else if (Math.abs(value) > 15) faults.add(name, "More than 15°: is the gauge set to degrees?");
  return degrees(Number.isFinite(value) ? value : 0);
}

/** The places of a field that is repeated as `name.place`. */
const placesOf = (form: FormData, name: string) => [
  ...new Set(
    [...form.keys()].filter((key) => key.startsWith(`${name}.`)).map((key) => key.slice(name.length + 1)),
  ),
];

const GAUGE_PLACES: readonly GaugePlace[] = ["leftRail", "rightRail", "frontCross", "rearCross"];
const MAX_STANDS = 12;
/** No frame stands on a narrower base than this, mm (common practice, no source). */
const NARROWEST_STANDS = 250;
/** What a stand may be called. */
const PLACE = /^[a-z0-9-]{1,20}$/i;

export type LevelForm =
  | { method: "heights"; stands: { place: string; x: Typed; y: Typed; height: Typed }[] }
  | {
      method: "gauge";
      readings: Record<GaugePlace, { first: ReturnType<typeof degrees>; turned: ReturnType<typeof degrees> }>;
    };

/** Heights at stands (`x.`, `y.`, `height.` and the place) or gauge readings (`first.`, `turned.` and the place). */
export function readLevelForm(form: FormData, unit: LengthUnit): FormRead<LevelForm> {
  const faults = new Faults();
  if (form.get("method") === "gauge") {
    const at = (place: GaugePlace) => ({
      first: angle(form, `first.${place}`, faults),
      turned: angle(form, `turned.${place}`, faults),
    });
    const [leftRail, rightRail, frontCross, rearCross] = GAUGE_PLACES.map(at);
    if (faults.any || !leftRail || !rightRail || !frontCross || !rearCross)
      return { ok: false, fields: faults.fields };
    return { ok: true, value: { method: "gauge", readings: { leftRail, rightRail, frontCross, rearCross } } };
  }
  const places = placesOf(form, "height").slice(0, MAX_STANDS);
  if (places.length < 3)
    faults.add("form", "Heights at three stands or more make a level; a fourth shows twist.");
  if (places.some((place) => !PLACE.test(place)))
    faults.add("form", "A stand has a name of letters and dashes.");
  if (new Set(places.map((place) => place.toLowerCase())).size < places.length)
    faults.add("form", "Two stands have the same name.");
  const stands = places.map((place) => ({
    place,
    x: length(form, `x.${place}`, unit, faults),
    y: length(form, `y.${place}`, unit, faults),
    height: length(form, `height.${place}`, unit, faults, 3000),
  }));
  for (const [axis, words] of [
    ["x", "one behind the other"],
    ["y", "side by side"],
  ] as const) {
    const along = stands.map((stand) => stand[axis].mm);
    if (!faults.any && Math.max(...along) - Math.min(...along) < NARROWEST_STANDS)
      faults.add("form", `Stands so close ${words} tell no slope: type where they are.`);
  }
  for (const stand of stands)
    if (stand.height.mm < 0)
      faults.add(`height.${stand.place}`, "A height is measured up from the level line: no minus.");
  return faults.any
    ? { ok: false, fields: faults.fields }
    : { ok: true, value: { method: "heights", stands } };
}

export function readMarksForm(form: FormData, unit: LengthUnit): FormRead<Typed> {
  const faults = new Faults();
  const taped = length(form, "taped", unit, faults);
  if (!faults.any && taped.mm <= 0) faults.add("taped", "A tape reads more than nothing.");
  return faults.any ? { ok: false, fields: faults.fields } : { ok: true, value: taped };
}

export const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

export type DropForm = {
  point: DropPointId;
  side: (typeof DROP_SIDES)[number];
  clientKey: string;
  height: Typed | null;
  reason: string | null;
} & (
  | { method: "offset"; station: Typed; offset: Typed }
  | { method: "ties"; ties: { mark: string; distance: Typed }[] }
);

/** A drop by offset (`station`, `offset`) or by tapes (`tape.` and the mark); an empty tape was not measured. */
export function readDropForm(form: FormData, unit: LengthUnit): FormRead<DropForm> {
  const faults = new Faults();
  const text = (name: string) => String(form.get(name) ?? "").trim();
  const point = dropPoint(text("point"));
  const side = DROP_SIDES.find((one) => one === text("side"));
  if (!point) faults.add("point", "There is no such point.");
  else if (!side || !point.sides.includes(side)) faults.add("side", "Choose the side.");
  const clientKey = text("clientKey").toLowerCase();
  if (!UUID.test(clientKey)) faults.add("form", "The reading has no key of its own: load the page again.");
  const height =
    point?.withHeight || text("height") !== "" ? length(form, "height", unit, faults, 5000) : null;
  if (height && height.mm < 0) faults.add("height", "A height above the ground has no minus.");
  const reason = text("reason").slice(0, 160) || null;
  const common = {
    point: point?.id ?? "opening-front",
    side: side ?? "left",
    clientKey,
    height,
    reason,
  } as const;
  if (text("method") === "ties") {
    const ties = placesOf(form, "tape")
      .filter((mark) => text(`tape.${mark}`) !== "")
      .map((mark) => ({ mark: mark.slice(0, 2), distance: length(form, `tape.${mark}`, unit, faults) }));
    if (ties.length < 2) faults.add("form", "Tape from two marks at least; a third checks the other two.");
    for (const tie of ties)
      if (tie.distance.mm <= 0) faults.add(`tape.${tie.mark}`, "A tape reads more than nothing.");
    return faults.any
      ? { ok: false, fields: faults.fields }
      : { ok: true, value: { ...common, method: "ties", ties } };
  }
  const station = length(form, "station", unit, faults);
  const offset = length(form, "offset", unit, faults);
  return faults.any
    ? { ok: false, fields: faults.fields }
    : { ok: true, value: { ...common, method: "offset", station, offset } };
}

export function readAxleForm(
  form: FormData,
  unit: LengthUnit,
): FormRead<{ method: (typeof AXLE_METHODS)[number]; asked: Typed | null }> {
  const faults = new Faults();
  const method = AXLE_METHODS.find((one) => one === form.get("method"));
  if (!method) faults.add("method", "Choose one of the three ways.");
  const asked = method === "asked" ? length(form, "asked", unit, faults, 1500) : null;
  return faults.any || !method
    ? { ok: false, fields: faults.fields }
    : { ok: true, value: { method, asked } };
}

export const VoidForm = z.object({
  reason: z
    .string()
    .trim()
    .min(3, "Say in a few words what happened: stand 3 touched, engine lifted out …")
    .max(160, "Keep it under 160 letters."),
});
export const OptionForm = z.object({
  key: z.string().regex(/^\d+:[01]:\d+$/, "Choose an option from the table."),
});
export const ApproveForm = z.object({ key: z.string().optional() });
export const StartLayoutForm = z.object({
  fixedEye: z
    .enum(
      ["ahead", "behind"],
      "Which eye of the spring is fixed: the one ahead of the axle or the one behind?",
    )
    .default("ahead"),
});

export type LookForm = {
  point: DropPointId;
  side: (typeof DROP_SIDES)[number];
  station: Typed;
  offset: Typed;
  clientKey: string;
};

/** A second look at a point, along and off the line. */
export function readLookForm(form: FormData, unit: LengthUnit): FormRead<LookForm> {
  const faults = new Faults();
  const text = (name: string) => String(form.get(name) ?? "").trim();
  const point = dropPoint(text("point"));
  const side = DROP_SIDES.find((one) => one === text("side"));
  if (!point) faults.add("point", "There is no such point.");
  if (!side || (point && !point.sides.includes(side))) faults.add("side", "Choose the side.");
  const clientKey = text("clientKey").toLowerCase();
  if (!UUID.test(clientKey)) faults.add("form", "The reading has no key of its own: load the page again.");
  const station = length(form, "station", unit, faults);
  const offset = length(form, "offset", unit, faults);
  return faults.any || !point || !side
    ? { ok: false, fields: faults.fields }
    : { ok: true, value: { point: point.id, side, station, offset, clientKey } };
}

export function readWaiverForm(form: FormData): FormRead<string> {
  const reason = String(form.get("reason") ?? "").trim();
  if (reason.length < 4) return { ok: false, fields: { reason: "Say why: the sheet prints it." } };
  if (reason.length > 160) return { ok: false, fields: { reason: "Keep the reason under 160 letters." } };
  return { ok: true, value: reason };
}
