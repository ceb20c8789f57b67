import { useEffect, useRef, useState } from "react";
import { Form, Link, useFetcher, useSubmit } from "react-router";
import { formatLength, type LengthUnit, type Millimetres, mm } from "../../domain/units/length";
import { Button } from "../../ui/button";
import { Dialog } from "../../ui/dialog";
import { SortHead } from "../counter/sort-head";
import { AddSpring } from "./add-spring";
import { type HangerCard, Hangers } from "./hangers";
import { SpringDrawing } from "./spring-drawing";
import { pinWords, type SpringQuery, type SpringRow, type SpringSort, springAddress } from "./spring-facts";

type Spring = SpringRow & { id: number };
export type SpringsPageProps = {
  springs: Spring[];
  query: SpringQuery;
  rackCount: number;
  lengths: Millimetres[];
  longestMm: number;
  nextRack: number;
  hangers: HangerCard[];
  mayEdit: boolean;
  unit: LengthUnit;
};

/** The rack: the shop's springs, measured flat, and its hangers. */
export function SpringsPage(props: SpringsPageProps) {
  const { springs, query, rackCount, hangers, mayEdit, unit } = props;
  const [adding, setAdding] = useState(false);
  return (
    <main className="mx-auto grid w-full max-w-[88rem] content-start gap-6 p-4 sm:p-6">
      <header className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div>
          <h1 className="font-label font-semibold text-3xl">Spring rack</h1>
          <p className="text-concrete-700">Measured flat on the bench. Front is to the right.</p>
        </div>
        {mayEdit && !adding ? (
          <Button tone="go" size="m" type="button" onClick={() => setAdding(true)}>
            Add a spring
          </Button>
        ) : null}
      </header>
      {adding ? <AddSpring unit={unit} nextRack={props.nextRack} onClose={() => setAdding(false)} /> : null}
      {rackCount === 0 ? (
        <EmptyRack mayEdit={mayEdit} />
      ) : (
        <section aria-label="Springs" className="grid gap-4">
          <Filters {...props} />
          {springs.length > 0 ? (
            <Rack {...props} />
          ) : (
            <p className="py-6 text-lg">
              No spring in the rack is like that.{" "}
              <Link
                className="font-medium text-line underline"
                to={springAddress({ ...query, q: "", length: null })}
              >
                Show the whole rack
              </Link>
            </p>
          )}
        </section>
      )}
      <Hangers hangers={hangers} unit={unit} />
    </main>
  );
}

function Filters({ query, lengths, unit }: SpringsPageProps) {
  const submit = useSubmit();
  const wait = useRef<ReturnType<typeof setTimeout>>(undefined);
  const field = useRef<HTMLInputElement>(null);
  // A way on that clears the search clears the field too, but never under somebody's typing.
  useEffect(() => {
    if (field.current && document.activeElement !== field.current) field.current.value = query.q;
  }, [query.q]);
  const chip = (here: boolean) =>
    `inline-flex min-h-11 items-center border-b-[3px] px-2.5 ${here ? "border-brass font-semibold" : "border-transparent text-concrete-700 hover:border-concrete-300"}`;
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-3 border-concrete-200 border-b pb-3">
      <Form
        role="search"
        aria-label="Find a spring"
        className="min-w-0 grow sm:grow-0"
        onChange={(event) => {
          const form = event.currentTarget;
          clearTimeout(wait.current);
          wait.current = setTimeout(() => void submit(form, { replace: true }), 250);
        }}
      >
        <input type="hidden" name="sort" value={`${query.down ? "-" : ""}${query.sort}`} />
        {query.length === null ? null : <input type="hidden" name="length" value={query.length} />}
        <input
          ref={field}
          type="search"
          name="q"
          aria-label="Rack number, pin or note"
          placeholder="Rack number, pin or note"
          defaultValue={query.q}
          maxLength={60}
          className="h-11 w-full rounded-[3px] border border-paint-edge bg-chalk px-3 sm:w-64"
        />
      </Form>
      <nav aria-label="Length" className="flex flex-wrap gap-1">
        <Link
          replace
          to={springAddress({ ...query, length: null })}
          className={chip(query.length === null)}
          aria-current={query.length === null ? "true" : undefined}
        >
          Every length
        </Link>
        {lengths.map((length) => {
          const here = query.length !== null && Math.abs(query.length - length) < 0.5;
          return (
            <Link
              key={length}
              replace
              to={springAddress({ ...query, length })}
              className={chip(here)}
              aria-current={here ? "true" : undefined}
            >
              {formatLength(length, unit, { denominator: 16, decimals: 0 })}
            </Link>
          );
        })}
      </nav>
    </div>
  );
}

const HEADS: { sort: SpringSort | null; label: string; numeric?: boolean }[] = [
  { sort: "rack", label: "Rack" },
  { sort: null, label: "Flat, to scale" },
  { sort: "length", label: "Length", numeric: true },
  { sort: "front", label: "Front + rear half", numeric: true },
  { sort: "pin", label: "Pin" },
  { sort: "leaves", label: "Leaves", numeric: true },
  { sort: "width", label: "Width", numeric: true },
  { sort: null, label: "Note" },
];

function Rack(props: SpringsPageProps) {
  const { springs, query, mayEdit } = props;
  return (
    <table className="w-full border-collapse text-left max-lg:block">
      <caption className="sr-only">Springs in the rack</caption>
      <thead className="max-lg:sr-only">
        <tr className="border-concrete-300 border-b">
          {HEADS.map(({ sort, label, numeric }) => (
            <SortHead
              key={label}
              label={label}
              numeric={numeric}
              state={sort === null ? "none" : query.sort !== sort ? "off" : query.down ? "down" : "up"}
              to={
                sort === null
                  ? ""
                  : springAddress({ ...query, sort, down: query.sort === sort && !query.down })
              }
            />
          ))}
          {mayEdit ? (
            <th scope="col">
              <span className="sr-only">Take out</span>
            </th>
          ) : null}
        </tr>
      </thead>
      <tbody className="max-lg:block">
        {springs.map((spring) => (
          <SpringLine key={spring.id} spring={spring} {...props} />
        ))}
      </tbody>
    </table>
  );
}

const CELL = "py-2 pr-4 align-middle max-lg:py-0 max-lg:pr-0";
const NUMBER = `${CELL} whitespace-nowrap text-right`;
/** Below a table's width a spring is a drawing with its figures in a line under it. */
const LINE =
  "border-concrete-200 border-b max-lg:relative max-lg:flex max-lg:flex-wrap max-lg:items-center max-lg:gap-x-5 max-lg:py-3 max-lg:pl-14";

function SpringLine({ spring, unit, longestMm, mayEdit }: SpringsPageProps & { spring: Spring }) {
  const size = (length: number) => formatLength(mm(length), unit, { denominator: 32 });
  const bare = (length: number) => size(length).replace(/ (in|mm)$/, "");
  const pin = pinWords(spring.lengthMm, spring.frontHalfMm, unit);
  const rear = spring.lengthMm - spring.frontHalfMm;
  return (
    <tr className={LINE}>
      <th
        scope="row"
        className={`${CELL} font-label font-semibold text-2xl max-lg:absolute max-lg:top-3 max-lg:left-0`}
      >
        {spring.rackNumber}
      </th>
      <td className={`${CELL} max-lg:w-full lg:w-[26%] lg:min-w-52 xl:w-[30%]`}>
        <SpringDrawing
          lengthMm={spring.lengthMm}
          frontHalfMm={spring.frontHalfMm}
          leaves={spring.leaves}
          longestMm={longestMm}
          name={`Spring ${spring.rackNumber} flat: ${size(spring.lengthMm)}, ${pin}`}
        />
      </td>
      <td className={`${NUMBER} font-semibold text-lg`}>{size(spring.lengthMm)}</td>
      <td className={NUMBER}>
        {bare(spring.frontHalfMm)} + {bare(rear)}
      </td>
      <td className={CELL}>{pin}</td>
      <td className={NUMBER}>
        {spring.leaves}
        <span className="lg:sr-only"> {spring.leaves === 1 ? "leaf" : "leaves"}</span>
      </td>
      <td className={NUMBER}>
        {size(spring.leafWidthMm)}
        <span className="lg:hidden"> wide</span>
      </td>
      <td className={`${CELL} text-concrete-700`}>{spring.note}</td>
      {mayEdit ? (
        <td className={`${CELL} text-right max-lg:ml-auto lg:pr-0`}>
          <TakeOut spring={spring} />
        </td>
      ) : null}
    </tr>
  );
}

type Done = { ok: true; words: string } | { ok: false; message: string };

/** Asks once more: a spring that was taken out does not come back under its number. */
function TakeOut({ spring }: { spring: Spring }) {
  const [asked, setAsked] = useState(false);
  const fetcher = useFetcher<Done>();
  const refused = fetcher.data && !fetcher.data.ok ? fetcher.data.message : null;
  return (
    <>
      <Button
        size="m"
        tone="quiet"
        className="whitespace-nowrap"
        aria-label={`Take spring ${spring.rackNumber} out…`}
        busy={fetcher.state !== "idle"}
        onClick={() => setAsked(true)}
      >
        Take out…
      </Button>
      {refused ? (
        <span role="alert" className="block font-medium text-oxide">
          {refused}
        </span>
      ) : null}
      <Dialog
        open={asked}
        onClose={() => setAsked(false)}
        title={`Take spring ${spring.rackNumber} out of the rack?`}
        sign="spring-flat"
        tone="ask"
        actions={
          <>
            <Button data-autofocus onClick={() => setAsked(false)}>
              Keep it
            </Button>
            <Button
              tone="stop"
              onClick={() => {
                setAsked(false);
                void fetcher.submit({ do: "take-out", springId: String(spring.id) }, { method: "post" });
              }}
            >
              Take it out
            </Button>
          </>
        }
      >
        <p className="text-left">
          Layouts no longer offer it. Sheets that name it keep their figures, so number {spring.rackNumber} is
          not given out again.
        </p>
      </Dialog>
    </>
  );
}

function EmptyRack({ mayEdit }: { mayEdit: boolean }) {
  return (
    <div className="grid max-w-xl gap-2 py-8">
      <p className="font-label font-semibold text-2xl">The rack is empty.</p>
      <p className="text-lg">
        {mayEdit
          ? "Add the springs that the shop has: length and front half, measured flat on the bench. Layouts choose from them."
          : "The foreman adds the shop's springs; layouts choose from them."}
      </p>
    </div>
  );
}
