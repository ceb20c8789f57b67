/**
 * Who may know whom. Knowledge flows one way:
 *   domain <- validation <- db <- auth <- services <- routes
 *   domain <- validation <- calc <- routes
 *   ui <- components <- routes;  domain, validation, realtime/events <- components
 */
const layer = (name, from, to, comment, extra = {}) => ({
  name,
  comment,
  severity: "error",
  from: { path: from, pathNot: "\\.test\\.tsx?$", ...extra },
  to: { path: to },
});

module.exports = {
  forbidden: [
    { name: "no-circular", severity: "error", from: {}, to: { circular: true } },
    {
      name: "not-to-unresolvable",
      severity: "error",
      from: {},
      to: {
        couldNotResolve: true,
        pathNot: "build/server/index\\.js$|^virtual:|\\?url$|^\\./\\+types/|/\\+types/",
      },
    },
    {
      name: "domain-is-pure",
      comment: "app/domain knows nothing but itself: no React, database, env, clock, framework.",
      severity: "error",
      from: { path: "^app/domain/", pathNot: "\\.test\\.ts$" },
      to: { pathNot: "^app/domain/" },
    },
    layer(
      "validation-knows-domain",
      "^app/validation/",
      "^app/(?!domain|validation)",
      "validation may use the domain only",
    ),
    layer(
      "calc-knows-domain",
      "^app/calc/",
      "^app/(?!domain|validation|calc)",
      "a calculation asked for from outside is a schema over the domain",
    ),
    layer(
      "db-knows-validation",
      "^app/db/",
      "^app/(?!domain|validation|db|env\\.server)",
      "db may use domain and validation",
    ),
    layer(
      "auth-knows-db",
      "^app/auth/",
      "^app/(?!domain|validation|db|auth|env\\.server|context)",
      "auth may use db and below",
    ),
    layer(
      "services-know-auth",
      "^app/services/",
      "^app/(?!domain|validation|db|auth|services|realtime/events|env\\.server)",
      "services may use auth and below; they are handed publish",
    ),
    layer(
      "services-no-framework",
      "^app/services/",
      "node_modules/(react-router|@react-router|socket\\.io|react)/",
      "services do not know the web framework",
    ),
    layer(
      "realtime-knows-db",
      "^app/realtime/",
      "^app/(?!domain|validation|db|auth|realtime|env\\.server)",
      "realtime reads the database and checks permissions",
    ),
    layer("ui-knows-nothing", "^app/ui/", "^app/(?!ui|domain/units)", "the kit knows nothing of the product"),
    layer(
      "components-know-ui",
      "^app/components/",
      "^app/(?!ui|components|domain|validation|realtime/(events|live-status|use-live)|auth/permissions)",
      "components are handed their data",
    ),
    layer(
      "http-knows-services",
      "^app/http/",
      "^app/(?!domain|validation|calc|db|auth|services|http|context|env\\.server|components/frame/areas)",
      "the web glue may use services and below",
    ),
    layer("nobody-imports-a-route", "^app/(?!routes|routes\\.ts)", "^app/routes/", "routes are the top"),
    {
      name: "only-db-and-services-touch-drizzle",
      severity: "error",
      from: { path: "^app/(?!db|services|auth/)", pathNot: "\\.test\\.ts$" },
      to: { path: "node_modules/(drizzle-orm|mysql2)/" },
    },
    {
      name: "no-server-code-in-the-browser",
      comment: ".server modules are for loaders, actions and services.",
      severity: "error",
      from: { path: "^app/(ui|components|domain|validation)/|^app/realtime/use-live" },
      to: { path: "\\.server\\.tsx?$" },
    },
    {
      name: "server-uses-app-only-through-the-bridge",
      severity: "error",
      from: { path: "^server/launch" },
      to: { path: "^app/" },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    enhancedResolveOptions: {
      exportsFields: ["exports"],
      conditionNames: ["import", "require", "node", "default", "types"],
    },
  },
};
