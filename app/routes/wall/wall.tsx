import "~/components/wall/wall.css";
import { clock, dayAndDate, spanInWords, whenInWords } from "~/components/time";
import { useNow } from "~/components/wall/use-now";
import { WallCell } from "~/components/wall/wall-cell";
import { burnInShift, wallPages } from "~/components/wall/wall-words";
import { appContext } from "~/context";
import { readBoard } from "~/db/queries/board.server";
import { readShop } from "~/db/queries/shop.server";
import { STAGE_LABEL } from "~/domain/builds/stages";
import type { Board, NextCard } from "~/domain/floor/board";
import { requireActor } from "~/http/request.server";
import type { LiveStatus } from "~/realtime/live-status";
import { useLiveBoard } from "~/realtime/use-live";
import { Sign } from "~/ui/sign";
import type { Route } from "./+types/wall";

export const meta: Route.MetaFunction = () => [{ title: "Wall · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "wall:see");
  const { db, now } = context.get(appContext);
  const shop = await readShop(db, actor.shopId);
  return {
    shopName: shop.name,
    isDemo: shop.isDemo,
    timeZone: shop.timeZone,
    now: now().toISOString(),
    board: await readBoard(db, actor.shopId, now()),
  };
}

/** The channel brings what changes; a second read of the page would only show the same. */
export const shouldRevalidate = () => false;

const PAGE_MS = 12_000;
/** As many as the last line holds. */
const NEXT_SHOWN = 3;

export default function Wall({ loaderData }: Route.ComponentProps) {
  const { timeZone, isDemo } = loaderData;
  const { board, status } = useLiveBoard(loaderData.board);
  const now = useNow(loaderData.now);
  const live = status.state !== "not-live";
  const pages = wallPages(board.bays, board.building.lengthMm);
  const page = pages[Math.floor(now / PAGE_MS) % pages.length] ?? { west: [], east: [] };
  const shift = burnInShift(now);
  return (
    <main className="wall wall-page" data-live={status.state} data-revision={board.revision}>
      <div className="wall-sheet" style={{ transform: `translate(${shift.x}px, ${shift.y}px)` }}>
        <h1 className="sr-only">{loaderData.shopName}: the floor now</h1>
        {live ? (
          <LiveHead now={now} zone={timeZone} status={status} isDemo={isDemo} board={board} />
        ) : (
          <StaleHead now={now} zone={timeZone} status={status} servedAt={loaderData.now} />
        )}
        <div className="wall-cells">
          {(["west", "east"] as const).map((side) =>
            page[side].map((card, i) => (
              <WallCell
                key={card.bay.id}
                card={card}
                side={side}
                last={i === page[side].length - 1}
                live={live}
                now={now}
                zone={timeZone}
                next={board.next.find((next) => next.bayNumber === card.bay.number) ?? null}
              />
            )),
          )}
        </div>
        <p className="wall-next wall-50 font-medium">
          {live ? (
            <NextMoves next={board.next} now={now} zone={timeZone} />
          ) : (
            <>
              <span className="text-line">What to do</span>
              <span>Ask the foreman before you move or weld. This screen tries again by itself.</span>
            </>
          )}
        </p>
      </div>
    </main>
  );
}

type HeadProps = { now: number; zone: string; status: LiveStatus };

function LiveHead({ now, zone, status, isDemo, board }: HeadProps & { isDemo: boolean; board: Board }) {
  const voids = board.bays
    .filter((card) => card.vehicle?.level.state === "void")
    .map((card) => card.bay.number);
  const heard =
    status.lastHeard === null ? null : Math.max(0, Math.round((Date.now() - status.lastHeard) / 1000));
  return (
    <header className="wall-head">
      <time className="wall-clock">{clock(new Date(now), zone)}</time>
      <span className="wall-46 text-concrete-700">{dayAndDate(new Date(now), zone)}</span>
      {isDemo ? <span className="wall-46 text-concrete-500">Demo shop</span> : null}
      {voids.length > 0 ? (
        <span className="wall-call" role="status">
          <Sign name="void" size="calc(70 * var(--u))" />
          <b className="wall-79 font-bold">Level void in Bay {voids.join(" and ")}</b>
        </span>
      ) : (
        <span className="flex-1" />
      )}
      <span className="wall-line wall-50 text-moss">
        <Sign name="live" size="calc(52 * var(--u))" />
        <span>{status.state === "joining" ? "Joining" : "Live"}</span>
        {heard === null ? null : <small className="wall-46 text-concrete-500">{heard} s ago</small>}
      </span>
    </header>
  );
}

function StaleHead({ now, zone, status, servedAt }: HeadProps & { servedAt: string }) {
  const heard = status.lastHeard ?? Date.parse(servedAt);
  return (
    <div className="wall-head stale" role="alert">
      <Sign name="stale" size="calc(84 * var(--u))" />
      <b className="wall-clock">NOT LIVE</b>
      <span className="wall-50">
        Last heard {clock(new Date(heard), zone)}, {spanInWords(Math.max(0, now - heard))} ago
      </span>
      <time className="wall-79 ml-auto font-semibold">{clock(new Date(now), zone)}</time>
    </div>
  );
}

function NextMoves({ next, now, zone }: { next: NextCard[]; now: number; zone: string }) {
  if (next.length === 0) return <span className="text-concrete-500">Nothing more is planned.</span>;
  return (
    <>
      <span className="text-line">Next</span>
      {next.slice(0, NEXT_SHOWN).map((card) => (
        <span key={card.stintId}>
          <b className="font-semibold">{whenInWords(card.at, new Date(now), zone)}</b> {card.nickname}{" "}
          {STAGE_LABEL[card.stage].toLowerCase()}, Bay {card.bayNumber}
        </span>
      ))}
    </>
  );
}
