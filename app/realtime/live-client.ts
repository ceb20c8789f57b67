import { io, type Socket } from "socket.io-client";
import { applyPatch, type Board } from "../domain/floor/board";
import { type ClientEvents, NOT_LIVE_AFTER_MS, type ServerEvents, type TouchEvent } from "./events";
import type { LiveStatus } from "./live-status";

type Listener = () => void;

/**
 * One live channel a tab. It keeps the newest board, notices gaps by revision and fetches the whole board then, and
 * says how live it is: silence counts as not live even while the connection looks open.
 */
class LiveChannel {
  private socket: Socket<ServerEvents, ClientEvents> | null = null;
  private users = 0;
  private board: Board | null = null;
  private status: LiveStatus = { state: "joining", lastHeard: null };
  private listeners = new Set<Listener>();
  private touchListeners = new Set<(touches: TouchEvent[]) => void>();
  private silence: ReturnType<typeof setTimeout> | undefined;
  private asking = false;
  private newestHeard = 0;

  subscribe = (listener: Listener) => {
    this.listeners.add(listener);
    return () => void this.listeners.delete(listener);
  };
  onTouch(listener: (touches: TouchEvent[]) => void) {
    this.touchListeners.add(listener);
    return () => void this.touchListeners.delete(listener);
  }
  getBoard = () => this.board;
  getStatus = () => this.status;

  /** Takes a board that the page was served with, unless a newer one is known. */
  seed(board: Board) {
    if (!this.board || board.revision > this.board.revision) {
      this.board = board;
      this.tell();
    }
  }

  /** Opens the channel for one more user; the answer lets go of it. */
  use() {
    this.users++;
    if (this.users === 1) this.open();
    return () => {
      this.users--;
      // A page that is being replaced lets go a moment before the next one takes hold.
      setTimeout(() => {
        if (this.users === 0) this.close();
      }, 1000);
    };
  }

  private open() {
    if (this.socket) return;
    this.socket = io({
      transports: ["websocket"],
      reconnectionDelay: 500,
      reconnectionDelayMax: 4000,
      randomizationFactor: 0.5,
    });
    this.socket.on("connect", () => {
      this.heard();
      this.catchUp(true);
    });
    this.socket.on("disconnect", (reason) => {
      this.fell();
      // The server let go of us (sign-out, revoked): the library does not try again by itself.
      if (reason === "io server disconnect") setTimeout(() => this.socket?.connect(), 4000);
    });
    this.socket.on("connect_error", () => {
      this.fell();
      if (this.socket && !this.socket.active) setTimeout(() => this.socket?.connect(), 4000);
    });
    this.socket.on("beat", ({ revision }) => {
      this.heard();
      this.newestHeard = Math.max(this.newestHeard, revision);
      if (this.board && revision > this.board.revision) this.catchUp();
    });
    this.socket.on("patch", (patch, touches) => {
      this.heard();
      this.newestHeard = Math.max(this.newestHeard, patch.revision);
      if (this.board) {
        const next = applyPatch(this.board, patch);
        if (next === null) this.catchUp();
        else if (next !== this.board) {
          this.board = next;
          this.tell();
        }
      }
      for (const listener of this.touchListeners) listener(touches);
    });
    // A connection that was never made must not look as if it were still being made.
    this.silence = setTimeout(() => this.fell(), NOT_LIVE_AFTER_MS);
  }

  private close() {
    clearTimeout(this.silence);
    this.socket?.close();
    this.socket = null;
    this.status = { state: "joining", lastHeard: null };
  }

  /** @param reconnected changes may have passed unheard: those who watch single things must look again */
  private catchUp(reconnected = false) {
    if (!this.socket || this.asking) return;
    this.asking = true;
    this.socket.timeout(8000).emit("catchUp", { revision: this.board?.revision ?? 0 }, (error, board) => {
      this.asking = false;
      if (error) return;
      this.heard();
      if (board && board.revision > (this.board?.revision ?? -1)) {
        this.board = board;
        this.tell();
      }
      if (this.board && this.newestHeard > this.board.revision) this.catchUp();
      if (reconnected) for (const listener of this.touchListeners) listener([{ kind: "all" }]);
    });
  }

  private heard() {
    clearTimeout(this.silence);
    this.silence = setTimeout(() => this.fell(), NOT_LIVE_AFTER_MS);
    this.status = { state: "live", lastHeard: Date.now() };
    this.tell();
  }
  private fell() {
    if (this.status.state === "not-live") return;
    this.status = { state: "not-live", lastHeard: this.status.lastHeard };
    this.tell();
  }
  private tell() {
    for (const listener of this.listeners) listener();
  }
}

let channel: LiveChannel | undefined;
/** The tab's channel; made on first use, in the browser only. */
export function liveChannel(): LiveChannel {
  channel ??= new LiveChannel();
  return channel;
}
