import { useCallback, useEffect, useMemo, useRef, useSyncExternalStore } from "react";
import { type Posted, post } from "./post";
import {
  dropUnsent,
  keepUnsent,
  parseUnsent,
  refuseUnsent,
  sendable,
  type Unsent,
  unsentKey,
} from "./unsent";

const NONE: Unsent[] = [];
const RETRY_MS = 8000;
const CHANGED = "plumbay:unsent";

/** The stored list of one layout. What is stored is read afresh each time: another tab of this tablet may have changed it. */
function storeOf(layoutId: number) {
  const key = unsentKey(layoutId);
  let text: string | null = null;
  let list = NONE;
  const read = () => {
    const stored = localStorage.getItem(key);
    if (stored !== text) {
      text = stored;
      list = parseUnsent(stored);
    }
    return list;
  };
  const write = (next: Unsent[]) => {
    if (next.length === 0) localStorage.removeItem(key);
    else localStorage.setItem(key, JSON.stringify(next));
    window.dispatchEvent(new Event(CHANGED));
  };
  return { read, write };
}

function subscribe(changed: () => void): () => void {
  window.addEventListener(CHANGED, changed);
  window.addEventListener("storage", changed);
  return () => {
    window.removeEventListener(CHANGED, changed);
    window.removeEventListener("storage", changed);
  };
}

export type Outbox = {
  list: Unsent[];
  /** Keeps a reading on this tablet, then sends it. Resolves when it is known how that went; kept it is at once. */
  keep: (reading: Omit<Unsent, "by" | "keptAt" | "refused">) => Promise<Posted>;
  /** Tries what waits, now. */
  retry: () => void;
  /** Lets a reading go that the shop did not take. */
  letGo: (clientKey: string) => void;
};

/**
 * The readings of a layout that wait for the shop: kept first, sent in order, tried again when the link is back.
 * @param person who is signed in; others' readings wait for them
 * @param linked whether the shop is heard: turning true tries again at once
 * @param confirmed called after the shop took something
 */
export function useUnsent(layoutId: number, person: string, linked: boolean, confirmed: () => void): Outbox {
  const store = useMemo(() => storeOf(layoutId), [layoutId]);
  const list = useSyncExternalStore(subscribe, store.read, () => NONE);
  const told = useRef(confirmed);
  told.current = confirmed;
  const onTheWay = useRef(new Set<string>());

  const send = useCallback(
    async (reading: Unsent): Promise<Posted> => {
      onTheWay.current.add(reading.clientKey);
      const posted = await post(reading.to, { ...reading.fields, clientKey: reading.clientKey });
      onTheWay.current.delete(reading.clientKey);
      if (posted.state === "answered") {
        const { read, write } = store;
        write(
          posted.answer.ok
            ? dropUnsent(read(), reading.clientKey)
            : refuseUnsent(read(), reading.clientKey, posted.answer.message),
        );
        told.current();
      }
      return posted;
    },
    [store],
  );

  const retrying = useRef(false);
  const retry = useCallback(async () => {
    if (retrying.current) return;
    retrying.current = true;
    try {
      for (const reading of sendable(store.read(), person)) {
        if (onTheWay.current.has(reading.clientKey)) continue;
        if ((await send(reading)).state !== "answered") break;
      }
    } finally {
      retrying.current = false;
    }
  }, [person, send, store]);

  useEffect(() => {
    if (linked) void retry();
    const again = () => void retry();
    window.addEventListener("online", again);
    const timer = setInterval(again, RETRY_MS);
    return () => {
      window.removeEventListener("online", again);
      clearInterval(timer);
    };
  }, [linked, retry]);

  const keep = useCallback<Outbox["keep"]>(
    async (reading) => {
      const { read, write } = store;
      const whole = { ...reading, by: person, keptAt: new Date().toISOString(), refused: null };
      write(keepUnsent(read(), whole));
      return send(whole);
    },
    [person, send, store],
  );
  const letGo = useCallback(
    (clientKey: string) => {
      const { read, write } = store;
      write(dropUnsent(read(), clientKey));
    },
    [store],
  );
  return { list, keep, retry: () => void retry(), letGo };
}
