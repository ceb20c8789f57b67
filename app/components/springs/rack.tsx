import { useState } from "react";
import { useFetcher } from "react-router";
import { formatLength, type LengthUnit, mm } from "../../domain/units/length";
import { Button } from "../../ui/button";
import { Dialog } from "../../ui/dialog";
import { SortHead } from "../counter/sort-head";
import { SpringDrawing } from "./spring-drawing";
import { pinWords, type SpringQuery, type SpringRow, type SpringSort, springAddress } from "./spring-facts";

export type Spring = SpringRow & { id: number };
type RackProps = {
  springs: Spring[];
  query: SpringQuery;
  longestMm: number;
  mayEdit: boolean;
  unit: LengthUnit;
};

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

/** The springs, each drawn flat to one scale. */
export function Rack(props: RackProps) {
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
  "border-concrete-200 border-b max-lg:relative max-lg:flex max-lg:flex-wrap max-lg:items-center max-lg:gap-x-5 max-lg:py-3 max-lg:pl-14 sm:max-lg:pr-28";

function SpringLine({
  spring,
  unit,
  longestMm,
  mayEdit,
}: Omit<RackProps, "springs" | "query"> & { spring: Spring }) {
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
        <td
          className={`${CELL} text-right max-lg:ml-auto sm:max-lg:absolute sm:max-lg:top-3 sm:max-lg:right-0 lg:pr-0`}
        >
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
