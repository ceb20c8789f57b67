import { type Degrees, formatDegrees } from "../units/angle";
import { formatLength, type LengthUnit, mm } from "../units/length";
import type { OptionColumns, OptionSearch } from "./option-types";

/** The limits that an option can fail, each a bit of OptionColumns.rejected. */
export const Rejection = {
  spring: 1,
  approach: 2,
  departure: 4,
  ramp: 8,
  shift: 16,
  wheelbase: 32,
  rub: 64,
  rubAtLock: 128,
  dragLink: 256,
} as const;
export type Rejection = (typeof Rejection)[keyof typeof Rejection];

/** Compared unrounded; equal keeps the limit. What is not known fails nothing: a limit is only as good as its readings. */
const below = (value: number | undefined, least: number | undefined) =>
  least !== undefined && value !== undefined && value < least;
const beyond = (value: number | undefined, most: number | undefined) =>
  most !== undefined && value !== undefined && Math.abs(value) > most;

/** The limits that option i does not keep, as bits; 0 when it stands. */
export function rejectionsOf(
  { limits = {}, stock }: OptionSearch,
  columns: OptionColumns,
  i: number,
): number {
  if (Number.isNaN(columns.flat[i])) return Rejection.spring;
  const longer = stock ? (columns.wheelbase[i] ?? Number.NaN) - stock.wheelbase : undefined;
  let bits = 0;
  if (below(columns.approach[i], limits.approachAtLeast)) bits |= Rejection.approach;
  if (below(columns.departure[i], limits.departureAtLeast)) bits |= Rejection.departure;
  if (below(columns.ramp[i], limits.rampAtLeast)) bits |= Rejection.ramp;
  if (beyond(columns.shift[i], limits.shiftWithin)) bits |= Rejection.shift;
  if (beyond(longer, limits.wheelbaseWithin)) bits |= Rejection.wheelbase;
  if (beyond(columns.dragLinkChange[i], limits.dragLinkWithin)) bits |= Rejection.dragLink;
  if (limits.noRub && (below(columns.frontRoom[i], 0) || below(columns.rearRoom[i], 0)))
    bits |= Rejection.rub;
  if (limits.noRubAtLock && (below(columns.frontRoomAtLock[i], 0) || below(columns.rearRoomAtLock[i], 0)))
    bits |= Rejection.rubAtLock;
  return bits;
}

/**
 * Why option i does not stand, a sentence a limit; none when it stands.
 * @example reasonsAgainst(search, columns, 0) // ["Approach 38.40°, asked at least 40.00°."]
 */
export function reasonsAgainst(
  search: OptionSearch,
  columns: OptionColumns,
  i: number,
  unit: LengthUnit = "in",
): string[] {
  const bits = columns.rejected[i] ?? 0;
  const { limits = {}, stock, holes } = search;
  const angle = (value: number | undefined) => formatDegrees((value ?? 0) as Degrees);
  const length = (value: number | undefined) => formatLength(mm(Math.abs(value ?? 0)), unit);
  const reasons: string[] = [];
  const say = (bit: Rejection, words: () => string) => {
    if (bits & bit) reasons.push(words());
  };
  const atLeast = (name: string, value: number | undefined, least: number | undefined) =>
    `${name} ${angle(value)}, asked at least ${angle(least)}.`;
  const shift = columns.shift[i] ?? 0;
  const longer = (columns.wheelbase[i] ?? 0) - (stock?.wheelbase ?? 0);
  const edges = (front: number | undefined, rear: number | undefined, when: string) =>
    [
      (front ?? 0) < 0 ? `the front edge by ${length(front)}` : "",
      (rear ?? 0) < 0 ? `the rear edge by ${length(rear)}` : "",
    ]
      .filter((words) => words !== "")
      .join(" and ")
      .concat(when);
  say(
    Rejection.spring,
    () => columns.hangs[Math.floor(i / holes.length)]?.problem ?? "The spring does not go.",
  );
  say(Rejection.approach, () => atLeast("Approach", columns.approach[i], limits.approachAtLeast));
  say(Rejection.departure, () => atLeast("Departure", columns.departure[i], limits.departureAtLeast));
  say(Rejection.ramp, () => atLeast("Ramp", columns.ramp[i], limits.rampAtLeast));
  say(
    Rejection.shift,
    () =>
      `${length(shift)} ${shift > 0 ? "ahead of" : "behind"} the centre, asked within ${length(limits.shiftWithin)}.`,
  );
  say(
    Rejection.wheelbase,
    () =>
      `Wheelbase ${length(longer)} ${longer > 0 ? "longer" : "shorter"}, asked within ${length(limits.wheelbaseWithin)}.`,
  );
  say(Rejection.rub, () => `Rubs ${edges(columns.frontRoom[i], columns.rearRoom[i], " straight ahead.")}`);
  say(
    Rejection.rubAtLock,
    () => `Rubs ${edges(columns.frontRoomAtLock[i], columns.rearRoomAtLock[i], " at lock.")}`,
  );
  say(
    Rejection.dragLink,
    () =>
      `Drag link ${length(columns.dragLinkChange[i])} ${(columns.dragLinkChange[i] ?? 0) > 0 ? "longer" : "shorter"}, asked within ${length(limits.dragLinkWithin)}.`,
  );
  return reasons;
}
