import { defineConfig, devices } from "@playwright/test";

const asRoot = process.getuid?.() === 0;
// Debian's Chromium refuses its sandbox to root, and has errands of its own on the network.
const rootFlags = ["--no-sandbox"];
const quietFlags = [
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

const browser = {
  ...devices["Desktop Chrome"],
  launchOptions: {
    executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
    args: asRoot ? [...rootFlags, ...quietFlags] : quietFlags,
  },
};

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results/e2e",
  workers: 2,
  fullyParallel: true,
  forbidOnly: true,
  // The machine is small and the whole product runs beside the browsers.
  timeout: 90_000,
  expect: { timeout: 15_000 },
  retries: 1,
  reporter: [["list"], ["json", { outputFile: process.env.TEST_REPORT ?? "test-results/playwright.json" }]],
  use: {
    ...(process.env.APP_URL && { baseURL: process.env.APP_URL }),
    screenshot: "only-on-failure",
    // Without a film of each test, which would cost as much time as the test.
    trace: { mode: "retain-on-failure", screenshots: false },
  },
  projects: [
    { name: "desk", use: { ...browser, viewport: { width: 1440, height: 900 } } },
    { name: "phone", use: { ...browser, viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } },
  ],
});
