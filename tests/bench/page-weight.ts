import { type Browser, chromium } from "@playwright/test";
import { seedId, WORKSHOP_ID } from "#db/seed/load.ts";
import { CHROMIUM } from "#tests/support/chromium.ts";
import { demoPassword, startServer } from "#tests/support/running-server.ts";

/** JavaScript that a page makes the browser fetch, compressed, in kB, by script. */
export interface PageWeight {
  page: string;
  kilobytes: number;
  libraries: number;
  aim: string;
  met: boolean;
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

async function weigh(
  browser: Browser,
  origin: string,
  cookie: string,
  page: string,
): Promise<{ all: number; libraries: number }> {
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

/** Measures every page of the built server once, with an empty cache. */
export async function weighPages(): Promise<PageWeight[]> {
  const server = await startServer(4361);
  const browser = await chromium.launch(CHROMIUM);
  try {
    const cookie = await signIn(server.origin, server.dataFolder);
    const weights: PageWeight[] = [];
    for (const { page, most, besideLibraries, stranger } of PAGES) {
      const { all, libraries } = await weigh(browser, server.origin, stranger ? "" : cookie, page);
      const counted = besideLibraries ? all - libraries : all;
      weights.push({
        page,
        kilobytes: Math.round(all),
        libraries: Math.round(libraries),
        aim: besideLibraries ? `libraries + ${most} kB` : `${most} kB`,
        met: counted <= most,
      });
    }
    return weights;
  } finally {
    await browser.close();
    await server.stop();
  }
}
