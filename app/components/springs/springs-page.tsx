import { useEffect, useRef, useState } from "react";
import { Form, Link, useSubmit } from "react-router";
import { formatLength, type LengthUnit, type Millimetres } from "../../domain/units/length";
import { Button } from "../../ui/button";
import { AddSpring } from "./add-spring";
import { type HangerCard, Hangers } from "./hangers";
import { Rack, type Spring } from "./rack";
import { type SpringQuery, springAddress } from "./spring-facts";

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
