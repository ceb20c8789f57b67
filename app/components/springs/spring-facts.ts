import { formatLength, type LengthUnit, type Millimetres, mm } from "../../domain/units/length";

/** Below this a pin counts as centred: half the finest mark on a tape. */
const CENTRED_WITHIN_MM = 0.4;

/**
 * Where a spring's pin sits, in words: "pin centred", "pin 2 in ahead of centre".
 * @param length eye to eye, flat
 * @param frontHalf front eye to pin, flat: shorter than half means that the pin is ahead
 */
export function pinWords(length: number, frontHalf: number, unit: LengthUnit): string {
  const ahead = length / 2 - frontHalf;
  if (Math.abs(ahead) <= CENTRED_WITHIN_MM) return "pin centred";
  return `pin ${formatLength(mm(Math.abs(ahead)), unit, { denominator: 32 })} ${ahead > 0 ? "ahead of" : "behind"} centre`;
}

export type SpringRow = {
  rackNumber: number;
  lengthMm: number;
  frontHalfMm: number;
  leaves: number;
  leafWidthMm: number;
  note: string;
};

export const SPRING_SORTS = ["rack", "length", "front", "pin", "leaves", "width"] as const;
export type SpringSort = (typeof SPRING_SORTS)[number];
export type SpringQuery = { q: string; length: number | null; sort: SpringSort; down: boolean };

/** Reads the rack's state out of an address; what it does not know is as if it were not there. */
export function readSpringQuery(params: URLSearchParams): SpringQuery {
  const sort = params.get("sort") ?? "";
  const length = Number(params.get("length"));
  return {
    q: (params.get("q") ?? "").trim().slice(0, 60),
    length: Number.isFinite(length) && length > 0 ? length : null,
    sort: SPRING_SORTS.find((known) => known === sort.replace(/^-/, "")) ?? "rack",
    down: sort.startsWith("-"),
  };
}

/** The address of the rack in that state; always with a `sort`, so that a bare address means "as I had it". */
export function springAddress({ q, length, sort, down }: SpringQuery): string {
  const params = new URLSearchParams();
  if (q) params.set("q", q);
  if (length !== null) params.set("length", String(length));
  params.set("sort", `${down ? "-" : ""}${sort}`);
  return `/springs?${params}`;
}

const VALUE: Record<SpringSort, (spring: SpringRow) => number> = {
  rack: (spring) => spring.rackNumber,
  length: (spring) => spring.lengthMm,
  front: (spring) => spring.frontHalfMm,
  pin: (spring) => spring.frontHalfMm - spring.lengthMm / 2,
  leaves: (spring) => spring.leaves,
  width: (spring) => spring.leafWidthMm,
};

/** Two springs of one length differ by less than a tape shows. */
const sameLength = (a: number, b: number) => Math.abs(a - b) < 0.5;

/** The springs that a query asks for, in its order; equal ones stand by rack number. */
export function pickSprings<S extends SpringRow>(
  rack: readonly S[],
  query: SpringQuery,
  unit: LengthUnit,
): S[] {
  const needle = query.q.toLowerCase();
  const text = (spring: S) =>
    `rack ${spring.rackNumber} ${spring.note} ${pinWords(spring.lengthMm, spring.frontHalfMm, unit)}`.toLowerCase();
  const value = VALUE[query.sort];
  return rack
    .filter(
      (spring) =>
        (query.length === null || sameLength(spring.lengthMm, query.length)) &&
        (needle === "" || text(spring).includes(needle)),
    )
    .sort((a, b) => (query.down ? -1 : 1) * (value(a) - value(b)) || a.rackNumber - b.rackNumber);
}

/** The different lengths in the rack, shortest first. */
export function lengthsOf(rack: readonly SpringRow[]): Millimetres[] {
  const lengths: Millimetres[] = [];
  for (const { lengthMm } of [...rack].sort((a, b) => a.lengthMm - b.lengthMm))
    if (!lengths.some((known) => sameLength(known, lengthMm))) lengths.push(mm(lengthMm));
  return lengths;
}
