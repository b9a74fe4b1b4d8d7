import { defineConfig } from "@playwright/test";

const port = 4310;

/** The browser of the system: nothing is downloaded. */
const launchOptions = {
  executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
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
  outputDir: ".cache/test-results/playwright",
  timeout: 60_000,
  expect: { timeout: 10_000 },
  workers: 1,
  forbidOnly: true,
  reporter: [["list"], ["json", { outputFile: ".cache/test-results/playwright.json" }]],
  use: { baseURL: `http://localhost:${port}`, launchOptions, trace: "retain-on-failure" },
  projects: [{ name: "chromium", use: { browserName: "chromium" } }],
  webServer: {
    command: "node --import tsx tests/setup/e2e-server.ts",
    url: `http://localhost:${port}/api/health`,
    env: { PORT: String(port), UPLOADS_DIR: ".cache/e2e-uploads", NODE_ENV: "production", LOG_LEVEL: "warn" },
    timeout: 60_000,
    reuseExistingServer: false,
  },
});
