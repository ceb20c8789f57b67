import type { LayoutView } from "../../../domain/layout/view";
import { Sign } from "../../../ui/sign";
import { dayAndClock } from "../../time";

/** Every check that was kept, newest first, with what was typed and what was said. */
export function TackHistory({ view }: { view: LayoutView }) {
  const { checks } = view.tack;
  if (checks.length === 0) return null;
  return (
    <section aria-labelledby="tack-history">
      <h2 id="tack-history" className="mb-1 font-label text-lg font-semibold text-concrete-700">
        Checks
      </h2>
      <ol className="tack-history">
        {checks.map((check) => (
          <li key={check.id} data-counts={check.counts}>
            <Sign
              name={check.passes ? "tacked" : "off"}
              size={24}
              className={check.passes ? "text-moss" : "text-oxide"}
            />
            <div className="min-w-0">
              <p className="font-semibold">{check.headline}</p>
              <p className="text-[15px] text-concrete-700">
                {check.made.name}, {dayAndClock(check.made.at, view.shop.timeZone)}. Left {check.leftTyped},
                right {check.rightTyped}.{check.counts ? "" : " Of an earlier approval."}
              </p>
            </div>
          </li>
        ))}
      </ol>
    </section>
  );
}
