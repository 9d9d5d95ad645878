import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { defineConfig } from "@playwright/test";
import { CHROMIUM } from "#tests/support/chromium.ts";

const PORT = 4381;

// One fresh data folder a run: the demonstration is loaded into it, with its passwords in a file beside it.
process.env.TINPENNY_TEST_DATA ??= mkdtempSync(join(tmpdir(), "tinpenny-browser-"));

export default defineConfig({
  testDir: "tests/browser",
  outputDir: "test-results/browser",
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: `http://127.0.0.1:${PORT}`,
    viewport: { width: 1440, height: 900 },
    launchOptions: CHROMIUM,
  },
  webServer: {
    command: "node --import tsx src/server/main.ts",
    url: `http://127.0.0.1:${PORT}/sign-in`,
    reuseExistingServer: false,
    env: {
      TINPENNY_PORT: String(PORT),
      TINPENNY_LETTERS_PORT: "4382",
      TINPENNY_DATA: process.env.TINPENNY_TEST_DATA,
    },
  },
});
