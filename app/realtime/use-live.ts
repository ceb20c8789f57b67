import { useEffect, useRef, useState, useSyncExternalStore } from "react";
import type { Board } from "../domain/floor/board";
import type { TouchEvent } from "./events";
import { liveChannel } from "./live-client";
import type { LiveStatus } from "./live-status";

const JOINING: LiveStatus = { state: "joining", lastHeard: null };
const nothing = () => () => {};

/** Keeps the tab's live channel open and says how live it is. */
export function useLiveStatus(): LiveStatus {
  const [mounted, setMounted] = useState(false);
  useEffect(() => {
    setMounted(true);
    return liveChannel().use();
  }, []);
  return useSyncExternalStore(
    mounted ? liveChannel().subscribe : nothing,
    mounted ? liveChannel().getStatus : () => JOINING,
    () => JOINING,
  );
}

/**
 * The board, kept up to date from the one the page was served with.
 * @param held while true (a drag, a dirty form) the board stays as it is; the newest is shown afterwards
 */
export function useLiveBoard(served: Board, held = false): { board: Board; status: LiveStatus } {
  const status = useLiveStatus();
  const [board, setBoard] = useState(served);
  const heldNow = useRef(held);
  heldNow.current = held;
  useEffect(() => {
    const channel = liveChannel();
    channel.seed(served);
    const show = () => {
      const newest = channel.getBoard();
      if (newest && !heldNow.current) setBoard(newest);
    };
    show();
    return channel.subscribe(show);
  }, [served]);
  useEffect(() => {
    const newest = liveChannel().getBoard();
    if (!held && newest) setBoard(newest);
  }, [held]);
  return { board, status };
}

/**
 * Calls back when something that matters to this page was touched, at most once in a short while: a burst of changes
 * is one look, and nothing is looked at while held.
 */
export function useLiveTouch(
  matters: (touch: TouchEvent) => boolean,
  look: () => void,
  held = false,
): LiveStatus {
  const status = useLiveStatus();
  const latest = useRef({ matters, look, held });
  latest.current = { matters, look, held };
  const missed = useRef(false);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const stop = liveChannel().onTouch((touches) => {
      if (!touches.some((touch) => touch.kind === "all" || latest.current.matters(touch))) return;
      if (latest.current.held) {
        missed.current = true;
        return;
      }
      clearTimeout(timer);
      timer = setTimeout(() => latest.current.look(), 150);
    });
    return () => {
      clearTimeout(timer);
      stop();
    };
  }, []);
  useEffect(() => {
    if (!held && missed.current) {
      missed.current = false;
      latest.current.look();
    }
  }, [held]);
  return status;
}
