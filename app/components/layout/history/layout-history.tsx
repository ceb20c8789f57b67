import { Link } from "react-router";
import { Sign, type SignName } from "../../../ui/sign";
import { clock, dayAndDate, sameDay } from "../../time";

export type HistoryRow = {
  id: number;
  at: string;
  verb: string;
  words: string;
  by: string | null;
  device: string | null;
};

/** What a line is about, by the verb it was journalled with. */
export const KINDS = [
  { id: "level", label: "Level", sign: "level", verbs: ["check-level", "void-level", "acknowledge-stands"] },
  {
    id: "drops",
    label: "Drops",
    sign: "drop",
    verbs: ["keep-drop", "confirm-marks", "second-look", "waive-second-look"],
  },
  {
    id: "choice",
    label: "Choice",
    sign: "pin",
    verbs: ["choose-axle-line", "choose-option", "approve-option"],
  },
  { id: "work", label: "Work", sign: "welded", verbs: ["check-tack", "sign-work", "fail-work"] },
] as const satisfies readonly { id: string; label: string; sign: SignName; verbs: readonly string[] }[];

const kindOf = (verb: string) =>
  KINDS.find((kind) => (kind.verbs as readonly string[]).includes(verb)) ?? null;

/** The lines of one kind, or all of them. */
export const linesOf = (lines: readonly HistoryRow[], what: string | null): HistoryRow[] =>
  KINDS.some((kind) => kind.id === what)
    ? lines.filter((line) => kindOf(line.verb)?.id === what)
    : [...lines];

type Props = { lines: readonly HistoryRow[]; what: string | null; timeZone: string };

/** Everything that was done to a layout, newest first: who, on which device, what. */
export function LayoutHistory({ lines, what, timeZone }: Props) {
  const shown = linesOf(lines, what);
  const here = KINDS.some((kind) => kind.id === what) ? what : null;
  return (
    <>
      <nav aria-label="Which lines" className="flex flex-wrap gap-2">
        {[{ id: null, label: "Everything" }, ...KINDS].map((kind) => (
          <Link
            key={kind.label}
            to={kind.id === null ? "?" : `?what=${kind.id}`}
            aria-current={here === kind.id ? "true" : undefined}
            className="flex min-h-12 items-center rounded border border-paint-edge bg-chalk px-4 font-medium no-underline aria-[current=true]:border-b-4 aria-[current=true]:border-b-ink aria-[current=true]:font-semibold"
          >
            {kind.label}
          </Link>
        ))}
      </nav>
      {shown.length === 0 ? <p>Nothing of the kind was done yet.</p> : null}
      <ol className="grid">
        {shown.map((line, i) => {
          const newDay = i === 0 || !sameDay(line.at, shown[i - 1]?.at ?? line.at, timeZone);
          return (
            <li key={line.id}>
              {newDay ? <h2 className="label pt-4 pb-1">{dayAndDate(line.at, timeZone)}</h2> : null}
              <p className="flex gap-4 border-concrete-200 border-t py-2">
                <time dateTime={line.at} className="w-12 flex-none text-concrete-500">
                  {clock(line.at, timeZone)}
                </time>
                <Sign name={kindOf(line.verb)?.sign ?? "start"} size={22} className="flex-none" />
                <span className="min-w-0 break-words">
                  {line.words}
                  <span className="block text-[15px] text-concrete-500">
                    {[line.by, line.device].filter(Boolean).join(", on ")}
                  </span>
                </span>
              </p>
            </li>
          );
        })}
      </ol>
    </>
  );
}
