import type { ActorRole } from "../domain/people/roles";

/** Everything that can be asked of the shop. Loaders, actions, sockets and screens ask with these words only. */
export const PERMISSIONS = [
  "board:see",
  "floor:see",
  "floor:move",
  "crew:assign",
  "holds:set",
  "scan:use",
  "counter:see",
  "builds:see",
  "builds:book-in",
  "tags:print",
  "layouts:see",
  "layouts:measure",
  "options:approve",
  "springs:see",
  "springs:edit",
  "wall:see",
  "setup:see",
  "setup:edit",
  "devices:pair",
  "tokens:make",
  "calc:use",
] as const;
export type Permission = (typeof PERMISSIONS)[number];

const MAY: Record<ActorRole, readonly Permission[]> = {
  owner: PERMISSIONS,
  foreman: [
    "board:see",
    "floor:see",
    "floor:move",
    "crew:assign",
    "holds:set",
    "scan:use",
    "counter:see",
    "builds:see",
    "builds:book-in",
    "tags:print",
    "layouts:see",
    "layouts:measure",
    "options:approve",
    "springs:see",
    "springs:edit",
    "wall:see",
    "setup:see",
    "devices:pair",
    "calc:use",
  ],
  tech: [
    "board:see",
    "floor:see",
    "holds:set",
    "scan:use",
    "builds:see",
    "tags:print",
    "layouts:see",
    "layouts:measure",
    "springs:see",
    "calc:use",
  ],
  counter: [
    "board:see",
    "floor:see",
    "scan:use",
    "counter:see",
    "builds:see",
    "builds:book-in",
    "tags:print",
    "layouts:see",
    "calc:use",
  ],
  display: ["board:see", "wall:see"],
  token: ["calc:use"],
};

/** May an actor in this role do that? The one place where it is decided. */
export function may(role: ActorRole, permission: Permission): boolean {
  return MAY[role].includes(permission);
}
