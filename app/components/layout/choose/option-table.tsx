import { Fragment, type KeyboardEvent } from "react";
import type { Option } from "../../../domain/layout/options";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import { formatDecimalInches } from "../../../domain/units/length";
import { Sign } from "../../../ui/sign";
import { roomWords, signed, springHead } from "./option-words";

export type SortBy = "spring" | "centre" | "approach";

const SORT: Record<SortBy, (a: Option, b: Option) => number> = {
  spring: (a, b) =>
    a.spring.rackNumber - b.spring.rackNumber ||
    Number(a.turned) - Number(b.turned) ||
    a.hole.number - b.hole.number,
  centre: (a, b) => Math.abs(a.shift) - Math.abs(b.shift),
  approach: (a, b) => (b.approach ?? -1) - (a.approach ?? -1),
};
export const sortOptions = (options: readonly Option[], by: SortBy): Option[] => [...options].sort(SORT[by]);

type Props = {
  view: LayoutView;
  options: readonly Option[];
  inHand: string | null;
  looked: string | null;
  pinned: string | null;
  sort: SortBy;
  onSort: (by: SortBy) => void;
  onLook: (key: string) => void;
  onPin: (key: string) => void;
};

const HEAD = "px-2 py-2 text-right font-label text-sm leading-tight font-semibold";
const CELL = "px-2 py-1.5 text-right whitespace-nowrap";

function SortButton({
  label,
  by,
  sort,
  onSort,
}: {
  label: string;
  by: SortBy;
  sort: SortBy;
  onSort: (by: SortBy) => void;
}) {
  return (
    <button
      type="button"
      aria-pressed={sort === by}
      onClick={() => onSort(by)}
      className="min-h-10 font-label text-sm font-semibold underline decoration-concrete-300 underline-offset-4 aria-pressed:decoration-ink"
    >
      {label}
    </button>
  );
}

/** Every option with its figures; those that do not stand keep their place with the reason in words. */
export function OptionTable({ view, options, inHand, looked, pinned, sort, onSort, onLook, onPin }: Props) {
  const walk = (event: KeyboardEvent<HTMLTableElement>) => {
    const step = event.key === "ArrowDown" ? 1 : event.key === "ArrowUp" ? -1 : 0;
    if (step === 0) return;
    const at = options.findIndex((option) => option.key === looked);
    const next = options[Math.min(options.length - 1, Math.max(0, at + step))];
    if (!next) return;
    event.preventDefault();
    onLook(next.key);
    document.getElementById(`option-${next.key}`)?.focus();
  };
  return (
    <div className="relative overflow-x-auto bg-chalk">
      <table className="w-full border-collapse text-[16.5px]" onKeyDown={walk}>
        <caption className="sr-only">Springs of the rack in the holes of the hanger</caption>
        <thead className="border-b border-concrete-300">
          <tr>
            <th scope="col" className={`${HEAD} text-left`}>
              <SortButton label="Hole" by="spring" sort={sort} onSort={onSort} />
            </th>
            <th scope="col" className={`${HEAD} hidden text-left md:table-cell`}>
              <span className="text-line">centre</span> <span className="text-concrete-500">ahead →</span>
            </th>
            <th scope="col" className={HEAD}>
              Axle line
              <br />
              <span className="font-medium text-concrete-500">
                ± {options[0] ? formatDecimalInches(options[0].plusMinus) : ""}
              </span>
            </th>
            <th scope="col" className={HEAD}>
              <SortButton label="From centre" by="centre" sort={sort} onSort={onSort} />
            </th>
            <th scope="col" className={HEAD}>
              <SortButton label="Approach" by="approach" sort={sort} onSort={onSort} />
            </th>
            <th scope="col" className={HEAD}>
              Wheelbase
            </th>
            <th scope="col" className={`${HEAD} hidden lg:table-cell`}>
              Front room
              <br />
              <span className="font-medium text-concrete-500">straight · at lock</span>
            </th>
            <th scope="col" className={`${HEAD} hidden lg:table-cell`}>
              Rear room
              <br />
              <span className="font-medium text-concrete-500">straight · at lock</span>
            </th>
            <th scope="col" className={HEAD}>
              <span className="sr-only">Compare</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {options.map((option, i) => {
            const before = options[i - 1];
            const group =
              sort === "spring" &&
              (before?.spring.id !== option.spring.id || before.turned !== option.turned);
            return (
              <Fragment key={option.key}>
                {group || sort !== "spring" ? <GroupRow option={option} small={sort !== "spring"} /> : null}
                <Row
                  {...{ view, option, onLook, onPin }}
                  inHand={inHand === option.key}
                  looked={looked === option.key}
                  pinned={pinned === option.key}
                />
              </Fragment>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function GroupRow({ option, small }: { option: Option; small: boolean }) {
  const { title, detail } = springHead(option);
  return (
    <tr className={`border-t border-concrete-300 ${small ? "" : "bg-concrete-100"}`}>
      <th
        scope="rowgroup"
        colSpan={9}
        className={`px-4 text-left ${small ? "pt-2 text-sm" : "py-2"} font-semibold`}
      >
        {title} <span className="font-label font-medium text-concrete-500">{detail}</span>
      </th>
    </tr>
  );
}

type RowProps = Pick<Props, "view" | "onLook" | "onPin"> & {
  option: Option;
  inHand: boolean;
  looked: boolean;
  pinned: boolean;
};

function Row({ view, option, inHand, looked, pinned, onLook, onPin }: RowProps) {
  const ground = inHand ? "bg-brass-wash" : pinned ? "bg-concrete-200" : looked ? "bg-line-wash" : "";
  const faded = option.stands ? "" : "text-concrete-500";
  const sign = inHand ? "pin" : !option.stands ? "off" : option.unknown.length > 0 ? "question" : "finish";
  return (
    <>
      <tr className={`border-t border-concrete-200 ${ground} ${faded}`}>
        <th scope="row" className="px-2 text-left font-normal">
          <button
            type="button"
            id={`option-${option.key}`}
            aria-pressed={looked}
            onClick={() => onLook(option.key)}
            className="flex min-h-12 w-full items-center gap-3 px-2"
            aria-label={`Hole ${option.hole.number}, axle line ${formatDecimalInches(option.axleStation)}, ${springHead(option).title}${inHand ? ", in hand" : !option.stands ? ", does not stand" : option.unknown.length > 0 ? `, ${option.unknown.join(" and ").toLowerCase()} not known` : ""}`}
          >
            <Sign
              name={sign}
              size={20}
              className={
                inHand || (option.stands && option.unknown.length > 0)
                  ? "text-brass-ink"
                  : option.stands
                    ? "text-moss"
                    : "text-oxide"
              }
            />
            <b className="font-label text-2xl font-bold">{option.hole.number}</b>
          </button>
        </th>
        <td className="hidden px-2 md:table-cell">
          <Strip view={view} option={option} />
        </td>
        <td className={`${CELL} text-lg font-semibold`}>{formatDecimalInches(option.axleStation)}</td>
        <td className={CELL}>{signed(option.shift)}</td>
        <td className={CELL}>{option.approach === null ? "–" : formatDegrees(option.approach)}</td>
        <td className={CELL}>{option.wheelbase === null ? "–" : formatDecimalInches(option.wheelbase)}</td>
        <td className={`${CELL} hidden lg:table-cell`}>{roomWords(option.frontRoom)}</td>
        <td className={`${CELL} hidden lg:table-cell`}>{roomWords(option.rearRoom)}</td>
        <td className="px-2">
          <button
            type="button"
            aria-pressed={pinned}
            onClick={() => onPin(option.key)}
            className="min-h-12 px-2 text-sm font-medium text-line underline"
            aria-label={`${pinned ? "Do not compare" : "Compare"} hole ${option.hole.number} of rack ${option.spring.rackNumber}${option.turned ? " turned" : ""}`}
          >
            {pinned ? "unpin" : "compare"}
          </button>
        </td>
      </tr>
      {option.reasons.length > 0 ? (
        <tr className={ground}>
          <td />
          <td colSpan={8} className="px-2 pb-2 text-[15px] font-medium text-oxide">
            {option.reasons.join(" ")}
          </td>
        </tr>
      ) : null}
    </>
  );
}

/** Where the axle comes to stand against the opening's centre (chalk line): a small drawing to scale. */
function Strip({ view, option }: { view: LayoutView; option: Option }) {
  const WIDTH = 120;
  const shifts = (view.options ?? []).map((one) => one.shift);
  const reach = Math.max(50, ...shifts.map(Math.abs));
  const at = (shift: number) => WIDTH / 2 + (shift / reach) * (WIDTH / 2 - 8);
  const ink = option.stands ? "var(--concrete-700)" : "var(--concrete-300)";
  return (
    <svg width={WIDTH} height="36" viewBox={`0 0 ${WIDTH} 36`} aria-hidden="true">
      <path d={`M${at(0)} 0V36`} stroke="var(--line)" strokeWidth="2" />
      <path d={`M${at(0)} 20H${at(option.shift)}`} stroke={ink} strokeWidth="2" />
      <path d={`M${at(option.shift)} 4V16`} stroke={ink} />
      <path
        d={`M${at(option.shift) - 4} 16h8l1 3-5 11-5-11z`}
        fill={option.stands ? ink : "none"}
        stroke={ink}
      />
    </svg>
  );
}
