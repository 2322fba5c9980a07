import { defineConfig } from "@playwright/test";

// The server is started by the runner, with data made for the run: `npm run e2e`, which hands its address over.
const baseURL = process.env.E2E_BASE_URL;
if (!baseURL) throw new Error("E2E_BASE_URL is not set: start the end-to-end tests with `npm run e2e`.");

const chromium = {
  executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium",
  args: [
    ...(process.getuid?.() === 0 ? ["--no-sandbox"] : []), // Chromium refuses its sandbox to root
    "--disable-quic",
    "--no-first-run",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
    // WebGL in software, said outright: found by itself it logs a warning for each picture read back.
    "--use-gl=angle",
    "--use-angle=swiftshader",
    "--enable-unsafe-swiftshader",
    "--ignore-gpu-blocklist",
  ],
};

export default defineConfig({
  testDir: "specs",
  outputDir: "../test-results/e2e",
  forbidOnly: Boolean(process.env.CI),
  retries: 0, // a test that needs a second try is a defect
  workers: 1, // the browser draws 3-D in software and takes both cores
  timeout: 60_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL,
    browserName: "chromium",
    launchOptions: chromium,
    locale: "en-GB",
    timezoneId: "UTC",
    trace: "retain-on-failure",
    screenshot: "only-on-failure",
  },
  projects: [
    {
      name: "phone",
      use: { viewport: { width: 390, height: 844 }, deviceScaleFactor: 2, isMobile: true, hasTouch: true },
    },
    { name: "wide", use: { viewport: { width: 1440, height: 900 } } },
  ],
});
