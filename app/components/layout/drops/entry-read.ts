import { type FloorPoint, floorPoint } from "../../../domain/geometry/point";
import {
  type DropSide,
  pointFromOffset,
  pointFromTies,
  type Tie,
  type TieFit,
} from "../../../domain/layout/drops";
import type { LayoutView } from "../../../domain/layout/view";
import { type Millimetres, mm } from "../../../domain/units/length";
import { lengthIn, withUnit } from "../lengths";
import type { Draft } from "../use-draft";

export type Method = "offset" | "ties";

/** What an entry comes to while it is typed. */
export type EntryRead = {
  /** Where it falls; null while that cannot be told. */
  at: FloorPoint | null;
  fit: TieFit | null;
  ties: Tie[];
  height: Millimetres | null;
  /** What keeps it from being kept: nothing yet (null), or words. */
  problem: string | null;
  /** Looks out of range: kept all the same when it is meant. */
  warning: string | null;
};

const NOTHING: EntryRead = { at: null, fit: null, ties: [], height: null, problem: null, warning: null };

/** How a point is measured: as typed before, else as the one before it; a point on the middle by offset only. */
export function methodOf(draft: Draft, usual: Method, side: DropSide): Method {
  if (side === "centre") return "offset";
  return draft.method === "offset" || draft.method === "ties" ? draft.method : usual;
}

/** Reads the entry of a drop: its place, how the tapes meet, and what looks odd about it. */
export function readEntry(
  view: LayoutView,
  side: DropSide,
  method: Method,
  draft: Draft,
  withHeight: boolean,
): EntryRead {
  const { unit, vehicle, settings } = view;
  const height = withHeight ? lengthIn(draft.height, unit) : null;
  const read = method === "offset" ? readOffset(view, side, draft) : readTies(view, side, draft);
  if (!read.at) return { ...read, height };
  const missing =
    withHeight && height === null ? "Its height above the ground at ride is asked for as well." : null;
  const far = Math.max(...view.bay.marks.map((mark) => mark.x)) + vehicle.lengthMm;
  const odd = oddPlace(read.at, { far, half: vehicle.widthMm * 0.75, back: -vehicle.lengthMm }, side, unit);
  const high =
    height !== null && (height <= 0 || height > 1500)
      ? `${withUnit(height, unit)} up is odd for this point: read it again.`
      : null;
  return {
    ...read,
    height,
    problem: read.problem ?? missing,
    warning: odd ?? high ?? smallHint(read.fit, settings.tapeSigma),
  };
}

function readOffset({ unit }: LayoutView, side: DropSide, draft: Draft): EntryRead {
  const station = lengthIn(draft.station, unit);
  const offset = lengthIn(draft.offset, unit);
  if (station === null || offset === null) return NOTHING;
  const point = pointFromOffset({ station, offset, side });
  return point.ok ? { ...NOTHING, at: point.value } : { ...NOTHING, problem: point.problem };
}

function readTies({ bay, unit, settings }: LayoutView, side: DropSide, draft: Draft): EntryRead {
  if (side === "centre") return NOTHING;
  const ties = bay.marks.flatMap((mark): Tie[] => {
    const distance = lengthIn(draft[`tape.${mark.label}`], unit);
    return distance === null ? [] : [{ mark: mark.label, at: floorPoint(mark.x, mark.y), distance }];
  });
  if (ties.length < 2) return { ...NOTHING, ties };
  const fit = pointFromTies(ties, side, settings.tapeSigma, unit);
  if (!fit.ok) return { ...NOTHING, ties, problem: fit.problem };
  return { ...NOTHING, ties, at: fit.value.point, fit: fit.value };
}

const smallHint = (fit: TieFit | null, sigma: Millimetres): string | null =>
  fit && fit.ellipse.major > sigma * 12
    ? "The tapes cross too flat to tell the place well: tape from a mark beside it."
    : null;

type Range = { far: number; half: number; back: number };

function oddPlace(at: FloorPoint, range: Range, side: DropSide, unit: LayoutView["unit"]): string | null {
  if (at.x < range.back || at.x > range.far)
    return `${withUnit(at.x, unit)} ahead of A is off this vehicle: read it again.`;
  if (Math.abs(at.y) > range.half)
    return `${withUnit(mm(Math.abs(at.y)), unit)} off the line is further out than this vehicle is wide: read it again.`;
  if ((side === "left" && at.y < 0) || (side === "right" && at.y > 0))
    return `This falls ${at.y > 0 ? "left" : "right"} of the line: left and right swapped?`;
  return null;
}

/** The fields as they are posted. */
export function postedDrop(
  view: LayoutView,
  spot: { point: string; side: DropSide },
  method: Method,
  draft: Draft,
  withHeight: boolean,
): Draft {
  const typed = (name: string) => draft[name]?.trim() ?? "";
  const fields: Draft = { point: spot.point, side: spot.side, method };
  if (method === "offset") {
    fields.station = typed("station");
    fields.offset = typed("offset");
  } else {
    for (const mark of view.bay.marks)
      if (typed(`tape.${mark.label}`)) fields[`tape.${mark.label}`] = typed(`tape.${mark.label}`);
  }
  if (withHeight) fields.height = typed("height");
  if (typed("reason")) fields.reason = typed("reason");
  return fields;
}
