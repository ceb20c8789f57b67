import type { Config } from "@react-router/dev/config";

export default {
  ssr: true,
  // The whole route list ships with the page: no manifest endpoint to attack or to lose when the link drops.
  routeDiscovery: { mode: "initial" },
  future: {
    v8_middleware: true,
    v8_splitRouteModules: true,
    v8_trailingSlashAwareDataRequests: true,
  },
} satisfies Config;
