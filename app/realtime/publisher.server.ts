import type { Db } from "../db/client.server";
import {
  readBayCards,
  readBoard,
  readCrew,
  readNext,
  readRevision,
  readTouchesSince,
  readYard,
  snapshot,
} from "../db/queries/board.server";
import type { Board, BoardPatch } from "../domain/floor/board";
import type { TouchEvent } from "./events";

type Emit = (shopId: number, patch: BoardPatch, touches: TouchEvent[]) => void;
type OnFault = (error: unknown) => void;

/**
 * Turns "this shop changed" into one patch for all who watch it.
 *
 * One reader a shop at a time: it reads, in one snapshot, what was touched since the revision it last sent and the
 * state of just those parts, and sends that once, however many watch. Changes that come in meanwhile are gathered
 * for the next round. A patch therefore holds every change up to its revision, and patches go out in order.
 */
export function makePublisher(db: Db, now: () => Date, emit: Emit, onFault: OnFault) {
  const sent = new Map<number, number>();
  const asked = new Set<number>();
  const running = new Map<number, Promise<void>>();
  const boards = new Map<number, Promise<Board>>();

  async function send(shopId: number): Promise<void> {
    const from = sent.get(shopId);
    const { patch, touches } = await snapshot(db, async (tx) => {
      const revision = await readRevision(tx, shopId);
      // A process that has sent nothing yet sends everything once.
      const touched: TouchEvent[] = from === undefined ? [] : await readTouchesSince(tx, shopId, from);
      const all = from === undefined;
      const has = (kind: string) => all || touched.some((touch) => touch.kind === kind);
      const bayIds = [
        ...new Set(touched.flatMap((t) => (t.kind === "bay" && t.id !== undefined ? [t.id] : []))),
      ];
      const patch: BoardPatch = {
        from: from ?? 0,
        revision,
        bays: await readBayCards(tx, shopId, all ? "all" : bayIds),
      };
      if (has("yard")) patch.yard = await readYard(tx, shopId);
      if (has("crew")) patch.crew = await readCrew(tx, shopId);
      if (has("bay") || has("yard") || has("plan")) patch.next = await readNext(tx, shopId, now());
      return { patch, touches: touched };
    });
    if (patch.revision === from) return;
    sent.set(shopId, patch.revision);
    boards.delete(shopId);
    emit(shopId, patch, touches);
  }

  async function run(shopId: number): Promise<void> {
    while (asked.delete(shopId)) {
      try {
        await send(shopId);
      } catch (error) {
        // The change itself is safe in the database; the next beat sends it.
        onFault(error);
      }
    }
    running.delete(shopId);
  }

  function publish(shopId: number): void {
    asked.add(shopId);
    if (!running.has(shopId)) running.set(shopId, run(shopId));
  }

  return {
    publish,
    /** The shop's revision now; sends what was not sent yet. */
    async beat(shopId: number): Promise<number> {
      const revision = await readRevision(db, shopId);
      const last = sent.get(shopId);
      if (last === undefined) sent.set(shopId, revision);
      else if (last < revision) publish(shopId);
      return revision;
    },
    /** The whole board, read once for everyone who asks at about the same time. */
    board(shopId: number): Promise<Board> {
      const known = boards.get(shopId);
      if (known) return known;
      const reading = readBoard(db, shopId, now());
      boards.set(shopId, reading);
      reading.catch(() => boards.delete(shopId));
      setTimeout(() => boards.delete(shopId), 500).unref();
      return reading;
    },
    /** Resolves when nothing is being sent. */
    async settled(): Promise<void> {
      await Promise.all(running.values());
    },
  };
}
export type Publisher = ReturnType<typeof makePublisher>;
