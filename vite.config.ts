import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig, type Plugin, type UserConfig } from "vite";

// React Router names every server entry index.js; give each entry its own name back.
const serverEntryNames: Plugin = {
  name: "server-entry-names",
  enforce: "post",
  config: (_config, { isSsrBuild }) =>
    isSsrBuild ? { build: { rollupOptions: { output: { entryFileNames: "[name].js" } } } } : undefined,
};

export default defineConfig(
  ({ isSsrBuild }) =>
    ({
      plugins: [tailwindcss(), reactRouter(), serverEntryNames],
      resolve: { tsconfigPaths: true },
      optimizeDeps: {
        include: [
          "@date-fns/tz",
          "@dnd-kit/core",
          "barcode-detector/ponyfill",
          "date-fns",
          "socket.io-client",
          "zod",
        ],
        exclude: ["bcryptjs", "drizzle-orm", "mysql2", "remix-auth", "remix-auth-form", "qrcode"],
      },
      build: {
        sourcemap: isSsrBuild === true,
        rollupOptions: isSsrBuild
          ? { input: { index: "./server/app.ts", migrate: "./server/migrate.ts", seed: "./server/seed.ts" } }
          : undefined,
      },
    }) as UserConfig,
);
