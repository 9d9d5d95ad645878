import { mkdirSync, rmSync } from "node:fs";
import { type Browser, chromium, type Page } from "@playwright/test";
import { CHROMIUM } from "#tests/support/chromium.ts";
import { demoPassword, type RunningServer, startServer } from "#tests/support/running-server.ts";
import { ensureBuilt } from "../../src/server/ready.mjs";
import { PAGES } from "./pages.ts";

/** `npm run screens`: a picture of every page at both widths and in both themes, into `screens/`. */

const FOLDER = "screens";
const WIDTHS = [1440, 390] as const;
const THEMES = ["light", "dark"] as const;

async function signedIn(
  browser: Browser,
  server: RunningServer,
  width: number,
  theme: "light" | "dark",
): Promise<Page> {
  const viewport = { width, height: width > 720 ? 900 : 844 };
  const context = await browser.newContext({ viewport, colorScheme: theme, baseURL: server.origin });
  const email = "ines@example.org";
  const data = { email, password: demoPassword(server.dataFolder, email) };
  const reply = await context.request.post("/api/sign-in", { data, headers: { origin: server.origin } });
  if (!reply.ok()) throw new Error(`Signing in failed: ${reply.status()} ${await reply.text()}`);
  return context.newPage();
}

async function take(
  browser: Browser,
  server: RunningServer,
  width: number,
  theme: "light" | "dark",
): Promise<void> {
  const inside = await signedIn(browser, server, width, theme);
  const outside = await (
    await browser.newContext({ viewport: { width, height: 900 }, colorScheme: theme, baseURL: server.origin })
  ).newPage();
  for (const { name, path, stranger } of PAGES) {
    const page = stranger ? outside : inside;
    const reply = await page.goto(path);
    await page.waitForLoadState("networkidle");
    await page.waitForTimeout(1000);
    await page.screenshot({ path: `${FOLDER}/${name}-${width}-${theme}.png`, fullPage: true });
    console.log(`${name} ${width} ${theme}: ${reply?.status()}`);
  }
}

ensureBuilt();
rmSync(FOLDER, { recursive: true, force: true });
mkdirSync(FOLDER);
const server = await startServer(4371);
const browser = await chromium.launch(CHROMIUM);
try {
  for (const width of WIDTHS) for (const theme of THEMES) await take(browser, server, width, theme);
} finally {
  await browser.close();
  await server.stop();
}
