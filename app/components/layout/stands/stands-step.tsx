import { Link, useNavigate } from "react-router";
import { cautionFor } from "../../../domain/layout/caution";
import type { LayoutView } from "../../../domain/layout/view";
import { Button, buttonClass } from "../../../ui/button";
import { Sign } from "../../../ui/sign";
import { Verdict } from "../../../ui/verdict";
import { dayAndClock } from "../../time";
import type { May } from "../may";
import { usePost } from "../use-post";

const TOOLS = [
  "Four rated stands, and chocks",
  "Jack with a flat head",
  "Water level, laser or angle gauge",
  "Plumb bob and line",
  "Two tapes that agree, and chalk",
];

/** Before anything is read: the vehicle hangs safe, its weight off the suspension. */
export function StandsStep({ view, may, done }: { view: LayoutView; may: May; done: () => void }) {
  const { busy, trouble, send } = usePost(done);
  const navigate = useNavigate();
  const { stands, shop, bay } = view;
  const standing = async () => {
    const answer = await send(`/layouts/${view.id}/stands`, {});
    if (answer?.ok) void navigate(`/layouts/${view.id}/step/level`);
  };
  return (
    <>
      {stands ? (
        <Verdict
          tone="true"
          sign="stand"
          size="l"
          title="On stands, wheels chocked."
          detail={`${stands.name}, ${dayAndClock(stands.at, shop.timeZone)}. Whoever touches a stand voids the level.`}
        />
      ) : (
        <Verdict
          tone="empty"
          sign="stand"
          size="l"
          title={`Set ${view.vehicle.nickname} on stands in Bay ${bay.number}.`}
          detail="Weight off the suspension, frame clear of the jack, high enough to hang a bob under every point."
        />
      )}
      <div className="grid gap-6 p-4 sm:grid-cols-[3fr_2fr] sm:p-6">
        <section aria-labelledby="stands-safe">
          <h2 id="stands-safe" className="mb-2 font-label text-lg font-semibold text-concrete-700">
            So that nobody gets hurt
          </h2>
          <ul className="grid gap-3">
            {cautionFor("stands").map((words) => (
              <li key={words} className="flex gap-3 text-lg leading-snug">
                <Sign name="caution" size={26} className="mt-0.5 text-oxide" />
                {words}
              </li>
            ))}
          </ul>
        </section>
        <section aria-labelledby="stands-tools">
          <h2 id="stands-tools" className="mb-2 font-label text-lg font-semibold text-concrete-700">
            Lay out beside you
          </h2>
          <ul className="grid gap-1.5">
            {TOOLS.map((tool) => (
              <li key={tool} className="flex gap-2.5 text-[17px]">
                <Sign name="todo" size={22} className="text-concrete-500" />
                {tool}
              </li>
            ))}
          </ul>
        </section>
      </div>
      <div className="mt-auto grid gap-3 p-4 sm:p-6">
        {trouble ? (
          <p role="alert" className="font-medium text-oxide">
            {trouble}
          </p>
        ) : null}
        {stands ? (
          <Link to={`/layouts/${view.id}/step/level`} className={buttonClass("go", "xl")}>
            Go to Level
          </Link>
        ) : may.measure ? (
          <Button tone="go" size="xl" busy={busy} onClick={() => void standing()}>
            On stands, wheels chocked
          </Button>
        ) : (
          <p className="text-concrete-700">Somebody who measures has to set it on stands.</p>
        )}
      </div>
    </>
  );
}
