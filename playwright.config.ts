import { defineConfig } from "@playwright/test";

/** Debian's Chromium with software WebGL, and no calls home. */
const args = [
  "--no-sandbox",
  "--use-angle=swiftshader",
  "--enable-unsafe-swiftshader",
  "--ignore-gpu-blocklist",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--no-first-run",
  "--disable-quic",
];

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: ".local/e2e-results",
  // The journeys change one shared register: one at a time, in order.
  workers: 1,
  fullyParallel: false,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  forbidOnly: true,
  reporter: [["list"], ["json"]],
  use: {
    baseURL: process.env.BYSSUS_E2E_URL,
    viewport: { width: 1440, height: 900 },
    colorScheme: "light",
    trace: "retain-on-failure",
    launchOptions: { executablePath: "/usr/bin/chromium", args },
  },
});
