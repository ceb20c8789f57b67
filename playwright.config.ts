import { defineConfig } from "@playwright/test";

const port = Number(process.env.E2E_PORT ?? 3105);

/** Debian's Chromium, kept off the network; nothing of a browser is downloaded. */
const CHROMIUM = {
  executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium",
  args: [
    "--no-sandbox",
    "--disable-gpu",
    "--disable-quic",
    "--no-first-run",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
  ],
};

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: ".test/e2e",
  fullyParallel: true,
  workers: 2,
  timeout: 120_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  retries: 0,
  reporter: [["list"]],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    launchOptions: CHROMIUM,
    actionTimeout: 15_000,
    trace: "off",
    video: "off",
    screenshot: "only-on-failure",
  },
  webServer: {
    command: "node server/launch.js",
    url: `http://127.0.0.1:${port}/healthz`,
    reuseExistingServer: false,
    gracefulShutdown: { signal: "SIGTERM", timeout: 15_000 },
    env: {
      NODE_ENV: "production",
      HOST: "127.0.0.1",
      PORT: String(port),
      DATABASE_URL: process.env.E2E_DATABASE_URL ?? "",
      SESSION_SECRET: process.env.SESSION_SECRET ?? "",
      LOG_LEVEL: "error",
      SIGN_IN_PER_MINUTE: "1000",
    },
  },
});
