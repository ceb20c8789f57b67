import { clock, dayAndDate, sameDay } from "../time";

/** `by` null: the shop's own doing. */
export type StoryRow = { id: number; at: string; by: string | null; words: string };

/** What happened to the build, newest first. */
export function Story({ rows, now, timeZone }: { rows: readonly StoryRow[]; now: string; timeZone: string }) {
  return (
    <section aria-labelledby="story-head" className="grid gap-3">
      <h2 id="story-head" className="label">
        Story
      </h2>
      {rows.length === 0 ? <p className="text-concrete-700">Nothing is written down yet.</p> : null}
      <ol className="grid">
        {rows.map((row, index) => {
          const newDay = index === 0 || !sameDay(row.at, rows[index - 1]?.at ?? row.at, timeZone);
          return (
            <li key={row.id} className="grid gap-x-3 border-concrete-200 border-t py-1.5 first:border-t-0">
              {newDay ? (
                <span className="label pt-1">
                  {sameDay(row.at, now, timeZone) ? "Today" : dayAndDate(row.at, timeZone)}
                </span>
              ) : null}
              <p className="flex gap-3">
                <time dateTime={row.at} className="w-11 shrink-0 text-concrete-500">
                  {clock(row.at, timeZone)}
                </time>
                <span className="min-w-0 break-words">
                  {row.words}
                  {row.by ? <span className="text-concrete-500"> · {row.by}</span> : null}
                </span>
              </p>
            </li>
          );
        })}
      </ol>
    </section>
  );
}
