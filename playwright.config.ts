import { defineConfig, devices, type Project } from "@playwright/test";

const port = Number(process.env.E2E_PORT ?? 3100);
const isGallery = process.env.GALLERY === "1";
const hasSandbox = process.env.E2E_SANDBOX === "on";

const QUIET = [
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

const PHONE = { viewport: { width: 390, height: 844 } };
const DESK = { viewport: { width: 1280, height: 900 } };
const GALLERY: Project[] = [
  { name: "phone-light", use: { ...PHONE, colorScheme: "light" } },
  { name: "phone-dark", use: { ...PHONE, colorScheme: "dark" } },
  { name: "desk-light", use: { ...DESK, colorScheme: "light" } },
  { name: "desk-dark", use: { ...DESK, colorScheme: "dark" } },
];

/** `src/test.mjs` starts the application first; see `npm run e2e` and `npm run gallery`. */
export default defineConfig({
  testDir: "e2e",
  testMatch: isGallery ? "**/*.gallery.ts" : "**/*.spec.ts",
  outputDir: `test-results/${port}`,
  workers: 1,
  forbidOnly: !!process.env.CI,
  reporter: [["list"], ["json", { outputFile: process.env.E2E_REPORT ?? ".data/e2e.json" }]],
  projects: isGallery ? GALLERY : [{ name: "stories", use: DESK }],
  use: {
    ...devices["Desktop Chrome"],
    channel: undefined,
    baseURL: `http://127.0.0.1:${port}`,
    locale: "en-GB",
    timezoneId: "Europe/London",
    trace: "retain-on-failure",
    actionTimeout: 12_000,
    navigationTimeout: 20_000,
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
      chromiumSandbox: hasSandbox,
      args: QUIET,
    },
  },
});
