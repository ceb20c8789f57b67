import type { Actor } from "../auth/actor";
import { may } from "../auth/permissions";

export const boardRoom = (shopId: number) => `shop:${shopId}:board`;
export const sessionRoom = (sessionHash: string) => `session:${sessionHash}`;

/** The rooms an actor hears. Decided here on the server; a client cannot ask for a room. */
export function roomsFor(actor: Actor): string[] {
  const rooms = [sessionRoom(actor.sessionHash)];
  if (may(actor.role, "board:see")) rooms.push(boardRoom(actor.shopId));
  return rooms;
}
