import { createContext } from "react-router";
import type { Actor } from "./auth/actor";
import type { Db } from "./db/client.server";

/** What the process lends to every request. */
export type App = {
  db: Db;
  publish: (shopId: number) => void;
  /** Cuts the live channel of a session that has ended. */
  dropSession: (sessionHash: string) => void;
  now: () => Date;
};

export const appContext = createContext<App>();
/** NULL: nobody is signed in. Set by the root middleware. */
export const actorContext = createContext<Actor | null>(null);
/** True: this address tried too often lately; the action answers so in words. */
export const tooManyContext = createContext(false);
/** Undefined in development, where the dev server's own scripts carry no nonce. */
export const nonceContext = createContext<string | undefined>(undefined);
