import { useEffect, useRef, useState } from "react";
import type { Board } from "../../domain/floor/board";
import { changesBetween } from "./changes";

/** How long the words about somebody else's change stay. */
const STAY_MS = 8000;

/** What others changed within the last seconds, by build. */
export function useChanges(board: Board, me: string): ReadonlyMap<number, string> {
  const [changed, setChanged] = useState<ReadonlyMap<number, string>>(new Map());
  const before = useRef(board);
  useEffect(() => {
    const changes = changesBetween(before.current, board, me);
    before.current = board;
    if (changes.length === 0) return;
    setChanged((all) => new Map([...all, ...changes.map((one) => [one.buildId, one.words] as const)]));
    setTimeout(() => {
      setChanged((all) => {
        const rest = new Map(all);
        for (const one of changes) if (rest.get(one.buildId) === one.words) rest.delete(one.buildId);
        return rest;
      });
    }, STAY_MS);
  }, [board, me]);
  return changed;
}
