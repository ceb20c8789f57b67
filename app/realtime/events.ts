import { z } from "zod";
import type { Board, BoardPatch } from "../domain/floor/board";

/** What may be named as touched; ids only, so that everyone in the shop may hear it. */
export type TouchEvent = { kind: string; id?: number };

/** Sent by the server. */
export type ServerEvents = {
  /** Something changed: the changed parts of the board, and what was touched. */
  patch: (patch: BoardPatch, touches: TouchEvent[]) => void;
  /** Every few seconds: the shop is heard, and this is its revision. */
  beat: (beat: { revision: number; at: string }) => void;
};

/** Sent by a client, always checked with CatchUp below. */
export type ClientEvents = {
  /** "I show this revision": answers with the whole board, or null when that is the newest. */
  catchUp: (ask: { revision: number }, answer: (board: Board | null) => void) => void;
};

export const CatchUp = z.object({ revision: z.number().int().min(0) });

/** How often the shop is heard, and after how long without it a screen says that it is not live. */
export const BEAT_MS = 4000;
export const NOT_LIVE_AFTER_MS = 13_000;
