import { useEffect, useRef } from "react";
import { Form, Link, useSubmit } from "react-router";
import { VEHICLE_KIND, type VehicleKind } from "../../domain/builds/vehicle-kinds";
import { buttonClass } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { Tape } from "../../ui/tape";
import { spanInWords, whenInWords } from "../time";
import { VehiclePlan } from "../vehicle-plan";
import {
  COUNTER_SHOWS,
  type CounterQuery,
  type CounterRow,
  type CounterShow,
  type CounterSort,
  counterAddress,
  isLate,
  placeOf,
  SHOW_LABEL,
  stageWords,
} from "./counter-list";
import { SortHead } from "./sort-head";

type Row = CounterRow & { buildId: number; kind: VehicleKind; lengthMm: number; widthMm: number };
/** Pixels a millimetre: every vehicle of the list is drawn to one scale. */
const LIST_SCALE = 0.0165;
type Props = {
  rows: Row[];
  query: CounterQuery;
  counts: Record<CounterShow, number>;
  mayBookIn: boolean;
  now: string;
  timeZone: string;
};

const HEADS: { sort: CounterSort | null; label: string }[] = [
  { sort: "nickname", label: "Vehicle" },
  { sort: null, label: "Kind" },
  { sort: "customer", label: "Customer" },
  { sort: "stage", label: "Stage" },
  { sort: "place", label: "Stands" },
  { sort: "promise", label: "Promised" },
];

/** The builds that are here. */
export function CounterPage({ rows, query, counts, mayBookIn, now, timeZone }: Props) {
  return (
    <main className="mx-auto grid w-full max-w-[88rem] content-start gap-4 p-4 sm:p-6">
      <header className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <h1 className="font-label font-semibold text-3xl">Counter</h1>
        {mayBookIn ? (
          <Link to="/counter/book-in" className={buttonClass("go", "m")}>
            Book in
          </Link>
        ) : null}
      </header>
      {counts.all === 0 ? (
        <NobodyHere mayBookIn={mayBookIn} />
      ) : (
        <>
          <Filters query={query} counts={counts} />
          {rows.length === 0 ? <NothingFound query={query} /> : <List {...{ rows, query, now, timeZone }} />}
        </>
      )}
    </main>
  );
}

function Filters({ query, counts }: { query: CounterQuery; counts: Record<CounterShow, number> }) {
  const submit = useSubmit();
  const wait = useRef<ReturnType<typeof setTimeout>>(undefined);
  const field = useRef<HTMLInputElement>(null);
  // A way on that clears the search clears the field too, but never under somebody's typing.
  useEffect(() => {
    if (field.current && document.activeElement !== field.current) field.current.value = query.q;
  }, [query.q]);
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-3 border-concrete-200 border-b pb-3">
      <Form
        role="search"
        aria-label="Find a build"
        className="flex min-w-0 grow items-center gap-2 sm:grow-0"
        onChange={(event) => {
          const form = event.currentTarget;
          clearTimeout(wait.current);
          wait.current = setTimeout(() => void submit(form, { replace: true }), 250);
        }}
      >
        <input type="hidden" name="sort" value={`${query.down ? "-" : ""}${query.sort}`} />
        {query.show === "all" ? null : <input type="hidden" name="show" value={query.show} />}
        <input
          ref={field}
          type="search"
          name="q"
          aria-label="Nickname, code or customer"
          placeholder="Nickname, code or customer"
          defaultValue={query.q}
          maxLength={60}
          className="h-11 w-full min-w-0 rounded-[3px] border border-paint-edge bg-chalk px-3 sm:w-72"
        />
      </Form>
      <nav aria-label="Show" className="flex flex-wrap gap-x-1 gap-y-1">
        {COUNTER_SHOWS.map((show) => {
          const here = show === query.show;
          return (
            <Link
              key={show}
              to={counterAddress({ ...query, show })}
              replace
              aria-current={here ? "true" : undefined}
              className={`inline-flex min-h-11 items-center gap-1.5 border-b-[3px] px-2.5 ${here ? "border-brass font-semibold" : "border-transparent text-concrete-700 hover:border-concrete-300"}`}
            >
              {SHOW_LABEL[show]}
              <span
                className={`font-label ${show === "late" && counts.late > 0 ? "text-oxide" : "text-concrete-500"}`}
              >
                {counts[show]}
              </span>
            </Link>
          );
        })}
      </nav>
    </div>
  );
}

function List({ rows, query, now, timeZone }: Pick<Props, "rows" | "query" | "now" | "timeZone">) {
  return (
    <table className="w-full border-collapse text-left max-md:block">
      <caption className="sr-only">Builds that are here</caption>
      <thead className="max-md:sr-only">
        <tr className="border-concrete-300 border-b">
          {HEADS.map(({ sort, label }) => (
            <SortHead
              key={label}
              label={label}
              state={sort === null ? "none" : query.sort !== sort ? "off" : query.down ? "down" : "up"}
              to={
                sort === null
                  ? ""
                  : counterAddress({ ...query, sort, down: query.sort === sort && !query.down })
              }
            />
          ))}
        </tr>
      </thead>
      <tbody className="max-md:block">
        {rows.map((row) => (
          <BuildLine key={row.buildId} row={row} now={now} timeZone={timeZone} />
        ))}
      </tbody>
    </table>
  );
}

const CELL = "py-2 pr-4 align-middle max-md:block max-md:py-0.5 max-md:pr-0";

function BuildLine({ row, now, timeZone }: { row: Row; now: string; timeZone: string }) {
  return (
    <tr className="relative border-concrete-200 border-b hover:bg-chalk max-md:grid max-md:grid-cols-2 max-md:gap-x-4 max-md:py-3">
      <td className={`${CELL} max-md:col-span-2 max-md:pb-1.5`}>
        <Link
          to={`/builds/${row.buildId}`}
          className="inline-flex min-h-11 items-center after:absolute after:inset-0"
        >
          <Tape name={row.nickname} code={row.code} />
        </Link>
      </td>
      <td className={`${CELL} text-concrete-700`}>
        <span className="flex items-center gap-4">
          <span className="hidden w-28 xl:block">
            <VehiclePlan kind={row.kind} lengthMm={row.lengthMm} widthMm={row.widthMm} scale={LIST_SCALE} />
          </span>
          {VEHICLE_KIND[row.kind].label}
        </span>
      </td>
      <td className={CELL}>{row.customer}</td>
      <td className={CELL}>
        {stageWords(row.stage)}
        {row.hold ? (
          <span className="flex items-center gap-1.5 font-medium text-[15px] text-oxide">
            <Sign name="hold" /> Hold: {row.hold.words}
          </span>
        ) : null}
      </td>
      <td className={`${CELL} whitespace-nowrap`}>{placeOf(row)}</td>
      <td className={`${CELL} whitespace-nowrap max-md:col-span-2`}>
        <PromiseCell row={row} now={now} timeZone={timeZone} />
      </td>
    </tr>
  );
}

function PromiseCell({ row, now, timeZone }: { row: Row; now: string; timeZone: string }) {
  if (row.promisedAt === null) return <span className="text-concrete-500">no promise</span>;
  const late = isLate(row, now);
  const away = Math.abs(Date.parse(row.promisedAt) - Date.parse(now));
  return (
    <>
      <span className="text-concrete-700 md:hidden">Promised </span>
      <time dateTime={row.promisedAt} className={late ? "font-semibold" : ""}>
        {whenInWords(row.promisedAt, now, timeZone)}
      </time>
      {late ? (
        <span className="flex items-center gap-1.5 font-medium text-[15px] text-oxide">
          <Sign name="promise" /> {spanInWords(away)} late
        </span>
      ) : null}
    </>
  );
}

function NobodyHere({ mayBookIn }: { mayBookIn: boolean }) {
  return (
    <div className="grid max-w-xl gap-3 py-12">
      <p className="font-label font-semibold text-2xl">No vehicle is here.</p>
      <p className="text-lg">
        {mayBookIn
          ? "Book in the first one: it gets a tag, its stages, and a place in the yard."
          : "The counter books vehicles in; they stand here from then on."}
      </p>
    </div>
  );
}

function NothingFound({ query }: { query: CounterQuery }) {
  const what = [
    query.show === "all" ? "" : SHOW_LABEL[query.show].toLowerCase(),
    query.q ? `with “${query.q}”` : "",
  ];
  return (
    <div className="grid max-w-xl gap-3 py-10">
      <p className="font-label font-semibold text-2xl">No build {what.filter(Boolean).join(" ")}.</p>
      <p>
        <Link
          to={counterAddress({ ...query, q: "", show: "all" })}
          className="font-medium text-line underline"
        >
          Show all that are here
        </Link>
      </p>
    </div>
  );
}
