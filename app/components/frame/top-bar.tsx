import { Form, NavLink } from "react-router";
import { Sign } from "../../ui/sign";
import { ToolCheck } from "../../ui/tool-check";
import { clock, dayAndDate } from "../time";
import { useNow } from "../wall/use-now";

type Props = {
  shopName: string;
  isDemo: boolean;
  areas: { to: string; label: string }[];
  person: { name: string; role: string; initials: string };
  timeZone: string;
  now: string;
  live?: "live" | "not-live" | "joining";
  lastHeard: number | null;
};

function BrandBob() {
  return (
    <svg width="22" height="34" viewBox="0 0 22 34" aria-hidden="true" className="flex-none">
      <path d="M11 0v12" stroke="var(--brass)" strokeWidth="1.8" />
      <path d="M6.500 12h9l1.300 5.500L11 29.500l-5.800-12z" fill="var(--brass)" stroke="var(--brass-ink)" />
      <path d="M1 30.500h7M14 30.500h7M11 31v3" stroke="var(--line)" strokeWidth="1.8" />
    </svg>
  );
}

/** Hangs at the area one is in. */
function AreaBob() {
  return (
    <svg
      viewBox="0 0 16 66"
      aria-hidden="true"
      className="pointer-events-none absolute top-0 left-1/2 z-10 -ml-2 h-[66px] w-4"
    >
      <path d="M8 0V44" stroke="var(--brass)" strokeWidth="1.6" />
      <path d="M5 44h6l1 4.500-4 12.500-4-12.500z" fill="var(--brass)" stroke="var(--brass-ink)" />
      <path d="M4.300 48.500h7.400" stroke="var(--brass-ink)" />
    </svg>
  );
}

const LIVE = {
  live: { sign: "live", words: "Live", tone: "text-moss" },
  "not-live": { sign: "stale", words: "Not live", tone: "text-oxide" },
  joining: { sign: "live", words: "Joining", tone: "text-concrete-500" },
} as const;

/** The bar over every signed-in page. */
export function TopBar({ shopName, isDemo, areas, person, timeZone, now: served, live, lastHeard }: Props) {
  const now = useNow(served, 5000);
  const badge = live ? LIVE[live] : null;
  return (
    <header className="no-print relative z-20 flex h-[52px] flex-none items-stretch gap-2 border-b border-concrete-300 bg-chalk pr-3 pl-3 md:pl-5">
      <div className="flex items-center gap-2">
        <BrandBob />
        <span className="font-label text-[22px] leading-none font-semibold">Plumbay</span>
        <span className="ml-1 hidden border-l border-concrete-300 pl-2.5 text-[13px] whitespace-nowrap text-concrete-500 xl:inline">
          {shopName}
          {isDemo ? (
            <b className="ml-2 rounded-xs bg-tape px-1.5 py-0.5 font-label font-semibold text-[#47453f]">
              demo shop
            </b>
          ) : null}
        </span>
      </div>
      <nav
        aria-label="Areas"
        className="ml-1 flex min-w-0 flex-1 overflow-x-auto overflow-y-hidden md:ml-4 md:overflow-visible"
      >
        {areas.map((area) => (
          <NavLink
            key={area.to}
            to={area.to}
            className="relative flex flex-none items-center px-2.5 font-medium text-concrete-700 no-underline aria-[current=page]:font-semibold aria-[current=page]:text-ink lg:px-3.5"
          >
            {({ isActive }) => (
              <>
                {area.label}
                {isActive ? <AreaBob /> : null}
              </>
            )}
          </NavLink>
        ))}
      </nav>
      <div className="flex flex-none items-center gap-3 whitespace-nowrap lg:gap-4">
        <Form action="/scan" method="get" role="search" className="relative hidden lg:block">
          <Sign name="scan-tag" size={16} className="absolute top-2 left-2.5 text-concrete-500" />
          <input
            name="code"
            aria-label="Scan or type a tag"
            placeholder="Scan or type a tag"
            autoComplete="off"
            className="h-8 w-44 rounded border border-paint-edge bg-white/50 pr-2 pl-8 text-[13px] placeholder:text-concrete-500"
          />
        </Form>
        {badge ? (
          <span className={`flex items-center gap-1.5 text-[13px] font-medium ${badge.tone}`} role="status">
            <Sign name={badge.sign} size={16} />
            {badge.words}
            {live === "not-live" && lastHeard !== null ? `, ${clock(new Date(lastHeard), timeZone)}` : null}
          </span>
        ) : null}
        <span className="hidden items-baseline gap-2 md:flex">
          <small className="hidden text-[13px] text-concrete-500 lg:inline">
            {dayAndDate(new Date(now), timeZone)}
          </small>
          <time className="font-label text-[22px] leading-none font-semibold">
            {clock(new Date(now), timeZone)}
          </time>
        </span>
        <details className="group relative">
          <summary
            className="flex min-h-11 list-none items-center gap-2 text-[13px] [&::-webkit-details-marker]:hidden"
            aria-label={`${person.name}, ${person.role}: sign out`}
          >
            <ToolCheck initials={person.initials} state="on" size={30} />
            <span className="hidden leading-tight xl:block">
              <b className="block font-semibold">{person.name}</b>
              <span className="text-xs text-concrete-500">{person.role}</span>
            </span>
          </summary>
          <div className="absolute top-12 right-0 z-30 w-52 rounded border border-concrete-700 bg-chalk p-3 shadow-lift">
            <p className="font-semibold">{person.name}</p>
            <p className="mb-3 text-sm text-concrete-500">{person.role}</p>
            <Form action="/sign-out" method="post" reloadDocument>
              <button
                type="submit"
                className="min-h-11 w-full rounded border border-paint-edge bg-chalk font-semibold"
              >
                Sign out
              </button>
            </Form>
          </div>
        </details>
      </div>
    </header>
  );
}
