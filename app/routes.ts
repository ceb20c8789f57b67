import { index, type RouteConfig, route } from "@react-router/dev/routes";

export default [
  index("routes/home.tsx"),
  route("sign-in", "routes/sign-in.tsx"),
  route("sign-out", "routes/resources/sign-out.ts"),
  route("pair", "routes/pair.tsx"),

  route("floor", "routes/floor/floor.tsx"),
  route("floor/move-vehicle", "routes/resources/move-vehicle.ts"),
  route("floor/assign-person", "routes/resources/assign-person.ts"),
  route("floor/undo", "routes/resources/undo-floor.ts"),
  route("floor/hold", "routes/resources/hold-build.ts"),
  route("wall", "routes/wall/wall.tsx"),

  route("counter", "routes/counter/counter.tsx"),
  route("counter/book-in", "routes/counter/book-in.tsx"),
  route("builds/:buildId", "routes/builds/build.tsx"),
  route("builds/:buildId/asked", "routes/builds/asked.tsx"),
  route("builds/:buildId/tag", "routes/builds/tag.tsx"),
  route("builds/:buildId/stage", "routes/resources/set-stage.ts"),
  route("builds/:buildId/layout", "routes/resources/start-layout.ts"),

  route("scan", "routes/scan/scan.tsx"),
  route("t/:code", "routes/scan/tag.tsx"),

  route("layouts/:layoutId", "routes/layouts/layout.tsx"),
  route("layouts/:layoutId/step/:step", "routes/layouts/step.tsx"),
  route("layouts/:layoutId/history", "routes/layouts/history.tsx"),
  route("layouts/:layoutId/readings.csv", "routes/layouts/readings.ts"),
  route("layouts/:layoutId/sheet", "routes/layouts/sheet.tsx"),
  route("layouts/:layoutId/stands", "routes/resources/layout/stands.ts"),
  route("layouts/:layoutId/level", "routes/resources/layout/level.ts"),
  route("layouts/:layoutId/void-level", "routes/resources/layout/void-level.ts"),
  route("layouts/:layoutId/marks", "routes/resources/layout/marks.ts"),
  route("layouts/:layoutId/drop", "routes/resources/layout/drop.ts"),
  route("layouts/:layoutId/axle-line", "routes/resources/layout/axle-line.ts"),
  route("layouts/:layoutId/option", "routes/resources/layout/option.ts"),
  route("layouts/:layoutId/look", "routes/resources/layout/look.ts"),
  route("layouts/:layoutId/waive-look", "routes/resources/layout/waive-look.ts"),
  route("layouts/:layoutId/approve", "routes/resources/layout/approve.ts"),
  route("layouts/:layoutId/tack", "routes/resources/layout/tack.ts"),
  route("layouts/:layoutId/work", "routes/resources/layout/work.ts"),

  route("springs", "routes/springs/springs.tsx"),
  route("setup", "routes/setup/setup.tsx"),
  route("devices", "routes/setup/devices.tsx"),

  route("tokens", "routes/setup/tokens.tsx"),

  route("api/v1/board", "routes/api/board.ts"),
  route("api/v1/calc/:name", "routes/api/calc.ts"),
  route("api/v1/openapi.json", "routes/api/openapi.ts"),
  route("api/docs", "routes/api/docs.tsx"),
  route("*", "routes/not-found.tsx"),
] satisfies RouteConfig;
