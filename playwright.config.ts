import { defineConfig, devices } from "@playwright/test";
import { appUrl } from "./tests/support/session";

const launchOptions = {
  executablePath: process.env["CHROMIUM_PATH"] ?? "/usr/bin/chromium",
  args: ["--no-sandbox", "--disable-dev-shm-usage", "--disable-gpu", "--disable-background-networking"],
};

/**
 * The app and its services run already: scripts/test.ts starts them and says where. What is tagged @phone or @desk
 * runs at that width only; the access project asks over HTTP and opens no browser.
 */
export default defineConfig({
  testMatch: "**/*.spec.ts",
  workers: 2,
  fullyParallel: true,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  outputDir: "test-results",
  reporter: "list",
  use: { baseURL: appUrl, launchOptions, locale: "en-GB", timezoneId: "Europe/Lisbon", trace: "off" },
  projects: [
    { name: "access", testDir: "tests/access" },
    {
      name: "desk",
      testDir: "tests/browser",
      grepInvert: /@phone/,
      use: { ...devices["Desktop Chrome"], viewport: { width: 1400, height: 900 } },
    },
    {
      name: "phone",
      testDir: "tests/browser",
      grepInvert: /@desk/,
      use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 },
    },
  ],
});
