import { defineConfig } from "@playwright/test";

/** Debian's Chromium against the served application; `npm test` sets the address and the database. */
export default defineConfig({
  testDir: "tests/browser",
  outputDir: "test-results",
  forbidOnly: true,
  workers: 1,
  timeout: 180_000,
  expect: { timeout: 15_000 },
  use: {
    baseURL: process.env.APP_ORIGIN,
    actionTimeout: 15_000,
    navigationTimeout: 30_000,
    locale: "en-GB",
    timezoneId: "UTC",
    viewport: { width: 1440, height: 900 },
    acceptDownloads: true,
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: "/usr/bin/chromium",
      args: [
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
      ],
    },
  },
});
