import { STAGE_KINDS, STAGE_LABEL, type StageKind, type StageState } from "../../domain/builds/stages";

export type CounterRow = {
  nickname: string;
  code: string;
  customer: string;
  stage: { kind: StageKind; state: StageState } | null;
  bayNumber: number | null;
  hold: { words: string } | null;
  promisedAt: string | null;
  bookedInAt: string;
};

export const COUNTER_SORTS = ["promise", "nickname", "customer", "stage", "place", "booked"] as const;
export type CounterSort = (typeof COUNTER_SORTS)[number];
export const COUNTER_SHOWS = ["all", "late", "hold", "bay", "yard"] as const;
export type CounterShow = (typeof COUNTER_SHOWS)[number];
export const SHOW_LABEL: Record<CounterShow, string> = {
  all: "All here",
  late: "Late",
  hold: "On hold",
  bay: "In a bay",
  yard: "In the yard",
};

export type CounterQuery = { q: string; show: CounterShow; sort: CounterSort; down: boolean };

const oneOf = <T extends string>(list: readonly T[], value: string | null, otherwise: T): T =>
  list.find((item) => item === value) ?? otherwise;

/** Reads the list's state out of an address; what it does not know is as if it were not there. */
export function readCounterQuery(params: URLSearchParams): CounterQuery {
  const sort = params.get("sort") ?? "";
  return {
    q: (params.get("q") ?? "").trim().slice(0, 60),
    show: oneOf(COUNTER_SHOWS, params.get("show"), "all"),
    sort: oneOf(COUNTER_SORTS, sort.replace(/^-/, ""), "promise"),
    down: sort.startsWith("-"),
  };
}

/** The address of the list in that state; always with a `sort`, so that a bare address means "as I had it". */
export function counterAddress({ q, show, sort, down }: CounterQuery): string {
  const params = new URLSearchParams();
  if (q) params.set("q", q);
  if (show !== "all") params.set("show", show);
  params.set("sort", `${down ? "-" : ""}${sort}`);
  return `/counter?${params}`;
}

/** Is a build past its promise? A build that is ready but still here counts too: nobody has fetched it. */
export const isLate = (row: { promisedAt: string | null }, now: string) =>
  row.promisedAt !== null && row.promisedAt < now;

/** Where it stands, in words. */
export const placeOf = (row: { bayNumber: number | null }) =>
  row.bayNumber === null ? "Yard" : `Bay ${row.bayNumber}`;

const matches = (row: CounterRow, q: string) => {
  const needle = q.toLowerCase();
  return [row.nickname, row.code, row.customer].some((text) => text.toLowerCase().includes(needle));
};

const shows = (row: CounterRow, show: CounterShow, now: string) =>
  show === "all" ||
  (show === "late" && isLate(row, now)) ||
  (show === "hold" && row.hold !== null) ||
  (show === "bay" && row.bayNumber !== null) ||
  (show === "yard" && row.bayNumber === null);

const byText = (a: string, b: string) => a.localeCompare(b, "en", { sensitivity: "base", numeric: true });
/** Moments as ISO strings stand in the order of their signs; no moment comes last. */
const byMoment = (a: string | null, b: string | null) => {
  const [left, right] = [a ?? "9999", b ?? "9999"];
  return left === right ? 0 : left < right ? -1 : 1;
};
const stageRank = (row: CounterRow) => (row.stage ? STAGE_KINDS.indexOf(row.stage.kind) : STAGE_KINDS.length);

const ORDER: Record<CounterSort, (a: CounterRow, b: CounterRow) => number> = {
  promise: (a, b) => byMoment(a.promisedAt, b.promisedAt),
  nickname: (a, b) => byText(a.nickname, b.nickname),
  customer: (a, b) => byText(a.customer, b.customer),
  stage: (a, b) => stageRank(a) - stageRank(b),
  place: (a, b) => (a.bayNumber ?? Number.MAX_SAFE_INTEGER) - (b.bayNumber ?? Number.MAX_SAFE_INTEGER),
  booked: (a, b) => byMoment(a.bookedInAt, b.bookedInAt),
};

/** The rows that a query asks for, in its order; rows that are equal in it stand by nickname. */
export function pickRows<R extends CounterRow>(rows: readonly R[], query: CounterQuery, now: string): R[] {
  const order = ORDER[query.sort];
  return rows
    .filter((row) => shows(row, query.show, now) && (query.q === "" || matches(row, query.q)))
    .sort((a, b) => (query.down ? -1 : 1) * order(a, b) || byText(a.nickname, b.nickname));
}

/** How many builds each view of the list has. */
export function countShows(rows: readonly CounterRow[], now: string): Record<CounterShow, number> {
  const count = (show: CounterShow) => rows.filter((row) => shows(row, show, now)).length;
  return {
    all: rows.length,
    late: count("late"),
    hold: count("hold"),
    bay: count("bay"),
    yard: count("yard"),
  };
}

/** The stage in words. */
export function stageWords(stage: CounterRow["stage"]): string {
  if (stage === null) return "All done";
  if (stage.kind === "hand-over") return stage.state === "under-way" ? "Ready to go" : "Hand-over next";
  return `${STAGE_LABEL[stage.kind]}${stage.state === "under-way" ? ", under way" : ", next"}`;
}
