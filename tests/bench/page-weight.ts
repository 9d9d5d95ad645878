import { get } from "node:http";
import { type Browser, chromium } from "@playwright/test";
import { seedId, WORKSHOP_ID } from "#db/seed/seed-id.ts";
import { CHROMIUM } from "#tests/support/chromium.ts";
import { demoPassword, startServer } from "#tests/support/running-server.ts";
import type { BenchRow } from "./bench-row.ts";

interface Script {
  url: string;
  /** Bytes of the script as it travels, compressed, without the headers of the reply. */
  body: number;
}

const WORKSHOP = `/workshops/${WORKSHOP_ID}`;
const KIT = `${WORKSHOP}/kits/${seedId("kit", "Dew Lantern")}`;
const FIRST_LINE = /\/offers\/[a-z0-9]+$/;

/** Pages that anybody may see: they load no library, and what they may weigh is meant in all. */
const OPEN_PAGES = ["/sign-in", "/forgotten"];
/** Pages behind the sign-in, weighed beside the libraries of grid, charts and React. */
const OWN_PAGES = [
  WORKSHOP,
  `${WORKSHOP}/suppliers`,
  `${WORKSHOP}/people`,
  `${WORKSHOP}/settings`,
  "/account",
  `${KIT}/parts`,
  `${KIT}/parts/bring-in`,
  `${KIT}/details`,
  `${KIT}/offers`,
  `${KIT}/boards`,
  `${KIT}/run`,
  `${KIT}/price`,
];
/** Pages whose address is found by following the first link of that kind on another. */
const LINKED_PAGES = [
  { on: `${KIT}/offers`, link: FIRST_LINE },
  { on: `${WORKSHOP}/suppliers`, link: /\/suppliers\/[a-z0-9]+$/ },
];
const OPEN_MOST = 30;
const OWN_MOST = 80;
/** Long enough for what a page fetches once it is idle. */
const IDLE_MS = 2000;

/** The files that hold libraries and nothing else; the build gives them these names. */
const LIBRARY = /\/(react|grid|charts)\.[\w-]+\.js$/;

/** What a script weighs that the page's own network log does not tell: that of a worker. */
function weighed(url: string): Promise<Script> {
  return new Promise((resolve, reject) => {
    get(url, { headers: { "accept-encoding": "br" } }, (reply) => {
      let body = 0;
      reply.on("data", (bytes: Buffer) => {
        body += bytes.length;
      });
      reply.on("end", () => resolve({ url, body }));
    }).on("error", reject);
  });
}

/** Every script a page fetches by itself, workers' included, with an empty cache and nobody touching it. */
async function scriptsOf(browser: Browser, origin: string, cookie: string, page: string): Promise<Script[]> {
  const context = await browser.newContext({ baseURL: origin, extraHTTPHeaders: cookie ? { cookie } : {} });
  const tab = await context.newPage();
  const devtools = await context.newCDPSession(tab);
  await devtools.send("Network.enable");
  const headers = new Map<string, { url: string; bytes: number }>();
  const scripts = new Map<string, Script>();
  devtools.on("Network.responseReceived", ({ requestId, type, response }) => {
    if (type === "Script") headers.set(requestId, { url: response.url, bytes: response.encodedDataLength });
  });
  devtools.on("Network.loadingFinished", ({ requestId, encodedDataLength }) => {
    const reply = headers.get(requestId);
    if (reply) scripts.set(reply.url, { url: reply.url, body: encodedDataLength - reply.bytes });
  });
  const workers = new Set<string>();
  tab.on("worker", (worker) => workers.add(worker.url()));
  await tab.goto(page);
  await tab.waitForLoadState("networkidle");
  await tab.waitForTimeout(IDLE_MS);
  for (const url of workers) scripts.set(url, await weighed(url));
  await context.close();
  return [...scripts.values()];
}

/** Address of the first link of a page that reads like this. */
async function linkOn(browser: Browser, origin: string, cookie: string, on: string, link: RegExp) {
  const context = await browser.newContext({ baseURL: origin, extraHTTPHeaders: { cookie } });
  const tab = await context.newPage();
  await tab.goto(on);
  await tab.waitForLoadState("networkidle");
  const hrefs = await tab
    .locator("a[href]")
    .evaluateAll((links) => links.map((one) => one.getAttribute("href") ?? ""));
  await context.close();
  const found = hrefs.find((href) => link.test(href));
  if (!found) throw new Error(`${on} has no link like ${link}.`);
  return found;
}

async function signIn(origin: string, dataFolder: string): Promise<string> {
  const email = "ines@example.org";
  const reply = await fetch(`${origin}/api/sign-in`, {
    method: "POST",
    headers: { origin, "content-type": "application/json" },
    body: JSON.stringify({ email, password: demoPassword(dataFolder, email) }),
  });
  return reply.headers.getSetCookie()[0]?.split(";")[0] ?? "";
}

/** Begins to bring in a short list, and gives the address of its desk. */
async function importDesk(origin: string, cookie: string): Promise<string> {
  const reply = await fetch(`${origin}/api${KIT}/imports`, {
    method: "POST",
    headers: { cookie, origin, "content-type": "application/octet-stream", "x-file-name": "list.csv" },
    body: "Designator,Value,Quantity\nR1,10k,1\n",
  });
  const { id } = (await reply.json()) as { id: string };
  return `${KIT}/parts/bring-in/${id}`;
}

const kilobytes = (scripts: readonly Script[]) => scripts.reduce((sum, { body }) => sum + body, 0) / 1000;

function rowOf(page: string, scripts: readonly Script[], isOpen: boolean): BenchRow {
  const most = isOpen ? OPEN_MOST : OWN_MOST;
  const [all, libraries] = [kilobytes(scripts), kilobytes(scripts.filter(({ url }) => LIBRARY.test(url)))];
  const value = isOpen ? all : all - libraries;
  return {
    what: `JavaScript of ${page}, compressed${isOpen ? "" : ", beside its libraries"}`,
    value: Math.round(value),
    unit: "kB",
    aim: `at most ${most} kB`,
    met: value <= most,
    note: `${Math.round(all)} kB in ${scripts.length} files, of which grid, charts and React ${Math.round(libraries)} kB.`,
  };
}

/** Weighs every kind of page of the built server once, with an empty cache. */
export async function run(): Promise<BenchRow[]> {
  const server = await startServer(4361);
  const browser = await chromium.launch(CHROMIUM);
  const { origin } = server;
  try {
    const cookie = await signIn(origin, server.dataFolder);
    const rows: BenchRow[] = [];
    for (const page of OPEN_PAGES) rows.push(rowOf(page, await scriptsOf(browser, origin, "", page), true));
    const own = [...OWN_PAGES, await importDesk(origin, cookie)];
    for (const { on, link } of LINKED_PAGES) own.push(await linkOn(browser, origin, cookie, on, link));
    for (const page of own) rows.push(rowOf(page, await scriptsOf(browser, origin, cookie, page), false));
    return rows;
  } finally {
    await browser.close();
    await server.stop();
  }
}
