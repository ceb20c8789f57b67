import type { Server, Socket } from "socket.io";
import type { Actor } from "../auth/actor";
import { sessionSecret } from "../auth/cookie.server";
import { may } from "../auth/permissions";
import { actorFromSecret } from "../auth/sessions.server";
import type { Db } from "../db/client.server";
import { BEAT_MS, CatchUp, type ClientEvents, type ServerEvents } from "./events";
import { makePublisher, type Publisher } from "./publisher.server";
import { boardRoom, roomsFor, sessionRoom } from "./rooms";

export type LiveServer = Server<ClientEvents, ServerEvents, Record<string, never>, { actor: Actor }>;
type LiveSocket = Socket<ClientEvents, ServerEvents, Record<string, never>, { actor: Actor }>;

/** A session is looked at again this often while its socket stays open. */
const RECHECK_MS = 60_000;

export type Realtime = {
  publish: Publisher["publish"];
  dropSession: (hash: string) => void;
  close: () => Promise<void>;
};

/**
 * Opens the live channel on a socket server: the handshake carries the page's own session, rooms follow from what
 * the actor may see, a beat goes out every few seconds, and a session that has ended is cut off.
 */
export function startRealtime(
  io: LiveServer,
  deps: { db: Db; now: () => Date; onFault: (error: unknown, what: string) => void },
): Realtime {
  const { db, now, onFault } = deps;
  const publisher = makePublisher(
    db,
    now,
    (shopId, patch, touches) => {
      io.to(boardRoom(shopId)).emit("patch", patch, touches);
    },
    (error) => onFault(error, "publish"),
  );

  io.use(async (socket, next) => {
    try {
      const secret = await sessionSecret(socket.handshake.headers.cookie);
      const actor = await actorFromSecret(db, secret, now(), { used: false });
      if (!actor) return next(new Error("sign-in"));
      socket.data.actor = actor;
      next();
    } catch (error) {
      onFault(error, "handshake");
      next(new Error("try-again"));
    }
  });

  io.on("connection", (socket: LiveSocket) => {
    const { actor } = socket.data;
    void socket.join(roomsFor(actor));
    let answering = false;
    socket.on("catchUp", async (ask, answer) => {
      if (typeof answer !== "function") return;
      const parsed = CatchUp.safeParse(ask);
      // One question at a time from each screen; it asks again at the next beat.
      if (!parsed.success || answering || !may(actor.role, "board:see")) return;
      answering = true;
      try {
        const board = await publisher.board(actor.shopId);
        answer(board.revision > parsed.data.revision ? board : null);
      } catch (error) {
        onFault(error, "catch-up");
      } finally {
        answering = false;
      }
    });
  });

  const shopsListening = () => {
    const shops = new Set<number>();
    for (const socket of io.sockets.sockets.values()) shops.add((socket as LiveSocket).data.actor.shopId);
    return shops;
  };
  const beat = setInterval(async () => {
    for (const shopId of shopsListening()) {
      try {
        const revision = await publisher.beat(shopId);
        io.to(boardRoom(shopId)).emit("beat", { revision, at: now().toISOString() });
      } catch (error) {
        // No beat: the screens will say by themselves that they are not live.
        onFault(error, "beat");
      }
    }
  }, BEAT_MS);

  const recheck = setInterval(async () => {
    for (const socket of io.sockets.sockets.values()) {
      try {
        const secret = await sessionSecret(socket.handshake.headers.cookie);
        if (!(await actorFromSecret(db, secret, now(), { used: false }))) socket.disconnect(true);
      } catch (error) {
        onFault(error, "recheck");
      }
    }
  }, RECHECK_MS);

  return {
    publish: publisher.publish,
    dropSession: (hash) => {
      io.in(sessionRoom(hash)).disconnectSockets(true);
    },
    async close() {
      clearInterval(beat);
      clearInterval(recheck);
      await publisher.settled();
      await io.close();
    },
  };
}
