import type { ActorRole } from "../domain/people/roles";
import { may, type Permission } from "./permissions";

/** Who asks: proved by the session, never by the request's own words. */
export type Actor = {
  shopId: number;
  role: ActorRole;
  /** NULL for a paired display on its own. */
  personId: number | null;
  /** NULL in a browser that is not a paired device. */
  deviceId: number | null;
  name: string;
  initials: string;
  sessionHash: string;
};

/** A person who is signed in, with the permission that was asked for. */
export type PersonActor = Actor & { personId: number };

export const actorMay = (actor: Actor | null, permission: Permission): boolean =>
  actor !== null && may(actor.role, permission);
