import { existsSync } from "node:fs";
import type { LaunchOptions } from "@playwright/test";

/** How Chromium is started everywhere: Debian's, headless, silent towards the network. */
export const CHROMIUM: LaunchOptions = {
  executablePath:
    process.env.TINPENNY_CHROMIUM ??
    ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"].find(existsSync),
  args: [
    "--no-sandbox",
    "--disable-dev-shm-usage",
    "--disable-gpu",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
  ],
};
