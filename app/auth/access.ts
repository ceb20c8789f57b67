import type { Permission } from "./permissions";

/** `anyone`: no sign-in needed. `signed-in`: any actor. Otherwise the permission asked for. */
export type Need = "anyone" | "signed-in" | Permission;

/**
 * Every route of the application and what it asks for, by method. A route or a method that is not written here is
 * refused: the root middleware looks a request up here before any loader or action runs, and a test holds this table
 * against routes.ts, both ways.
 */
export const ACCESS: readonly { path: string; GET?: Need; POST?: Need }[] = [
  { path: "/", GET: "anyone" },
  { path: "/sign-in", GET: "anyone", POST: "anyone" },
  { path: "/sign-out", POST: "signed-in" },
  { path: "/pair", GET: "anyone" },

  { path: "/floor", GET: "floor:see" },
  { path: "/floor/move-vehicle", POST: "floor:move" },
  { path: "/floor/assign-person", POST: "crew:assign" },
  { path: "/floor/undo", POST: "floor:move" },
  { path: "/floor/hold", POST: "holds:set" },
  { path: "/wall", GET: "wall:see" },

  { path: "/counter", GET: "counter:see" },
  { path: "/counter/book-in", GET: "builds:book-in", POST: "builds:book-in" },
  { path: "/builds/:buildId", GET: "builds:see" },
  { path: "/builds/:buildId/asked", GET: "builds:book-in", POST: "builds:book-in" },
  { path: "/builds/:buildId/tag", GET: "tags:print", POST: "tags:print" },
  { path: "/builds/:buildId/stage", POST: "layouts:measure" },
  { path: "/builds/:buildId/layout", POST: "layouts:measure" },

  { path: "/scan", GET: "scan:use" },
  { path: "/t/:code", GET: "scan:use" },

  { path: "/layouts/:layoutId", GET: "layouts:see" },
  { path: "/layouts/:layoutId/step/:step", GET: "layouts:see" },
  { path: "/layouts/:layoutId/history", GET: "layouts:see" },
  { path: "/layouts/:layoutId/readings.csv", GET: "layouts:see" },
  { path: "/layouts/:layoutId/sheet", GET: "layouts:see" },
  { path: "/layouts/:layoutId/stands", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/level", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/void-level", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/marks", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/drop", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/axle-line", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/option", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/look", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/waive-look", POST: "options:approve" },
  { path: "/layouts/:layoutId/approve", POST: "options:approve" },
  { path: "/layouts/:layoutId/tack", POST: "layouts:measure" },
  { path: "/layouts/:layoutId/work", POST: "layouts:measure" },

  { path: "/springs", GET: "springs:see", POST: "springs:edit" },
  { path: "/setup", GET: "setup:see", POST: "setup:edit" },
  { path: "/devices", GET: "devices:pair", POST: "devices:pair" },

  { path: "/tokens", GET: "tokens:make", POST: "tokens:make" },

  { path: "/api/v1/board", GET: "board:see" },
  { path: "/api/v1/calc/:name", POST: "calc:use" },
  { path: "/api/v1/openapi.json", GET: "anyone" },
  { path: "/api/docs", GET: "anyone" },
  // What is not found is said to anyone, in words, and looks the same to all.
  { path: "/*", GET: "anyone" },
];
