import type { FloorPoint } from "../../../domain/geometry/point";
import { framePoint } from "../../../domain/geometry/point";
import { axlePoint } from "../../../domain/layout/axle-line";
import type { DropPointId, DropSide, Ellipse } from "../../../domain/layout/drops";
import { toFloor } from "../../../domain/layout/frame";
import type { Option } from "../../../domain/layout/options";
import type { DropReadingView, DropView, LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import { formatDecimalInches, formatInches, type Millimetres, mm } from "../../../domain/units/length";
import { type Span, spanOf, widened } from "./viewport";

/** How much larger than they are the uncertainty ellipses are drawn. */
export const ELLIPSE_DRAWN = 40;
/** Half a tyre's breadth while it was not given, only for the outline of the plan. */
const AROUND = 260;

export const dropAt = (view: LayoutView, point: DropPointId, side: DropSide): DropView | null =>
  view.drops.find((drop) => drop.point === point && drop.side === side) ?? null;

/** The place of a drop that counts in the figures; null when it is missing, void or suspect. */
export function standing(view: LayoutView, point: DropPointId, side: DropSide): FloorPoint | null {
  const reading = dropAt(view, point, side)?.reading;
  return reading && !reading.suspect ? reading.at : null;
}

/** The piece of floor that holds everything. */
export function planSpan(view: LayoutView): Span {
  const points = [
    ...view.bay.marks.map((mark) => ({ x: mark.x as number, y: mark.y as number })),
    ...view.drops.flatMap((drop) => (drop.reading ? [drop.reading.at] : [])),
  ];
  return widened(spanOf(points) ?? { minX: 0, maxX: 3000, minY: -800, maxY: 800 }, AROUND);
}

/** What is typed beside a cross: the station, then the offset in the list; tapes have their place in decimal inches. */
export function dropLabel(reading: DropReadingView): string {
  return reading.stationTyped ?? formatInches(reading.at.x);
}

/** The ellipse of a reading: of its adjustment with tapes, a circle of the shop's bob and tape with offsets. */
export function ellipseFor(view: LayoutView, reading: DropReadingView): Ellipse {
  if (reading.fit) return reading.fit.ellipse;
  const radius = mm(2 * Math.hypot(view.settings.tapeSigma, view.settings.dropSigma));
  return { major: radius, minor: radius, angle: 0 as Ellipse["angle"] };
}

/** An option by its key; null when there is none. */
export const optionOf = (view: LayoutView, key: string | null): Option | null =>
  view.options?.find((option) => option.key === key) ?? null;

/** The axle line across the floor, between two offsets of the frame. */
export function axleEnds(
  view: LayoutView,
  option: Option | null,
  reach: Millimetres,
): [FloorPoint, FloorPoint] | null {
  if (!view.frame || !view.axle) return null;
  const { frame } = view;
  if (option)
    return [
      toFloor(frame, framePoint(option.axleStation, reach)),
      toFloor(frame, framePoint(option.axleStation, -reach)),
    ];
  return [
    toFloor(frame, axlePoint(view.axle.line, reach)),
    toFloor(frame, axlePoint(view.axle.line, mm(-reach))),
  ];
}

/** The four corners of a rectangle on the frame, as places on the floor. */
export function frameBox(
  view: LayoutView,
  from: Millimetres,
  to: Millimetres,
  offset: number,
  half: number,
): FloorPoint[] {
  if (!view.frame) return [];
  const { frame } = view;
  return [
    framePoint(from, offset - half),
    framePoint(to, offset - half),
    framePoint(to, offset + half),
    framePoint(from, offset + half),
  ].map((corner) => toFloor(frame, corner));
}

/** The plan in words, for those who do not see it. */
export function planWords(view: LayoutView): string {
  const kept = view.drops.filter((drop) => drop.reading).length;
  const parts = [`${kept} of ${view.drops.length} points dropped.`];
  if (view.frame)
    parts.push(`The frame centre line is turned ${formatDegrees(view.frame.angle)} from A to B.`);
  if (view.openings) parts.push(view.openings.words);
  if (view.axle)
    parts.push(
      `The axle line crosses it ${formatDecimalInches(view.axle.line.station)} inches ahead of the rear datum pair.`,
    );
  const suspect = view.drops.filter((drop) => drop.reading?.suspect).map((drop) => drop.label);
  if (suspect.length > 0) parts.push(`The tapes do not meet at ${suspect.join(" and ")}.`);
  return parts.join(" ");
}
