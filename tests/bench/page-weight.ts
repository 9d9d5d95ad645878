import { type Browser, chromium } from "@playwright/test";
import { seedId, WORKSHOP_ID } from "#db/seed/seed-id.ts";
import { CHROMIUM } from "#tests/support/chromium.ts";
import { demoPassword, startServer } from "#tests/support/running-server.ts";
import type { BenchRow } from "./bench-row.ts";

interface Weight {
  /** Kilobytes of script the page makes the browser fetch, compressed. */
  all: number;
  libraries: number;
}

const KIT = `/workshops/${WORKSHOP_ID}/kits/${seedId("kit", "Dew Lantern")}`;

/** Pages, and what they may weigh: in all, or beside the grid and chart libraries. */
const PAGES = [
  { page: "/sign-in", most: 30, besideLibraries: false, stranger: true },
  { page: "/forgotten", most: 30, besideLibraries: false, stranger: true },
  { page: `/workshops/${WORKSHOP_ID}`, most: 80, besideLibraries: true, stranger: false },
  { page: `${KIT}/parts`, most: 80, besideLibraries: true, stranger: false },
  { page: `${KIT}/offers`, most: 80, besideLibraries: true, stranger: false },
  { page: `${KIT}/boards`, most: 80, besideLibraries: true, stranger: false },
  { page: `${KIT}/run`, most: 80, besideLibraries: true, stranger: false },
] as const;

/** Chunks that hold the grid, the charts and React are told by what is written in them. */
const LIBRARY = /ag-grid|recharts|react\.transitional\.element|ModuleRegistry/;

async function weigh(browser: Browser, origin: string, cookie: string, page: string): Promise<Weight> {
  const context = await browser.newContext({ baseURL: origin, extraHTTPHeaders: cookie ? { cookie } : {} });
  const tab = await context.newPage();
  const devtools = await context.newCDPSession(tab);
  await devtools.send("Network.enable");
  const scripts = new Map<string, boolean>();
  const sizes = new Map<string, number>();
  devtools.on("Network.responseReceived", ({ requestId, type }) => {
    if (type === "Script") scripts.set(requestId, false);
  });
  devtools.on("Network.loadingFinished", ({ requestId, encodedDataLength }) =>
    sizes.set(requestId, encodedDataLength),
  );
  await tab.goto(page);
  await tab.waitForLoadState("networkidle");
  for (const id of scripts.keys()) {
    const { body } = await devtools.send("Network.getResponseBody", { requestId: id });
    scripts.set(id, LIBRARY.test(body));
  }
  await context.close();
  const sum = (ids: string[]) => ids.reduce((total, id) => total + (sizes.get(id) ?? 0), 0) / 1000;
  return {
    all: sum([...scripts.keys()]),
    libraries: sum([...scripts].filter(([, is]) => is).map(([id]) => id)),
  };
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

function rowOf({ page, most, besideLibraries }: (typeof PAGES)[number], weight: Weight): BenchRow {
  const counted = besideLibraries ? weight.all - weight.libraries : weight.all;
  return {
    what: `JavaScript of ${page}, compressed${besideLibraries ? ", beside its libraries" : ""}`,
    value: Math.round(counted),
    unit: "kB",
    aim: `at most ${most} kB`,
    met: counted <= most,
    note: `${Math.round(weight.all)} kB in all, of which grid, chart and React libraries ${Math.round(weight.libraries)} kB.`,
  };
}

/** Weighs every page of the built server once, with an empty cache. */
export async function run(): Promise<BenchRow[]> {
  const server = await startServer(4361);
  const browser = await chromium.launch(CHROMIUM);
  try {
    const cookie = await signIn(server.origin, server.dataFolder);
    const rows: BenchRow[] = [];
    for (const page of PAGES)
      rows.push(rowOf(page, await weigh(browser, server.origin, page.stranger ? "" : cookie, page.page)));
    return rows;
  } finally {
    await browser.close();
    await server.stop();
  }
}
