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

const desk = { width: 1440, height: 900 };
const phone = { width: 360, height: 740 };
const EVERY = "**/*.every.spec.ts";
const PHONE = "**/*.phone.spec.ts";

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: ".local/test-results/e2e",
  // The journeys change one shared register: one at a time, in order.
  workers: 1,
  fullyParallel: false,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  forbidOnly: true,
  reporter: [["list"], ["json"]],
  use: {
    baseURL: process.env.BYSSUS_E2E_URL,
    trace: "retain-on-failure",
    serviceWorkers: "block",
    launchOptions: { executablePath: "/usr/bin/chromium", args },
  },
  // *.every.spec.ts runs at both widths in both themes, *.phone.spec.ts on the phone, all others at the desk.
  projects: [
    { name: "desk light", testIgnore: PHONE, use: { viewport: desk, colorScheme: "light" } },
    { name: "desk dark", testMatch: EVERY, use: { viewport: desk, colorScheme: "dark" } },
    {
      name: "phone light",
      testMatch: [EVERY, PHONE],
      use: { viewport: phone, colorScheme: "light", hasTouch: true, isMobile: true },
    },
    {
      name: "phone dark",
      testMatch: EVERY,
      use: { viewport: phone, colorScheme: "dark", hasTouch: true, isMobile: true },
    },
  ],
});
