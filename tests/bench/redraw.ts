import { type Browser, chromium, type Page } from "@playwright/test";
import { seedId, WORKSHOP_ID } from "#db/seed/seed-id.ts";
import { CHROMIUM } from "#tests/support/chromium.ts";
import { demoPassword, startServer } from "#tests/support/running-server.ts";
import type { BenchRow } from "./bench-row.ts";
import { bigPlan } from "./big-plan.ts";

const RUN_PAGE = `/workshops/${WORKSHOP_ID}/kits/${seedId("kit", "Dew Lantern")}/run`;
const AIM_MS = 100;
const TIMES = 15;

/** The chart an edit is seen in, by its place on the page: costs by run size; what a run takes and costs. */
const CHART = { run: 0, price: 1 } as const;
const PARTS = 200;
const SIZES = 1000;

async function openRun(browser: Browser, origin: string, dataFolder: string, isBig: boolean): Promise<Page> {
  const context = await browser.newContext({ baseURL: origin, viewport: { width: 1440, height: 900 } });
  const email = "ines@example.org";
  await context.request.post("/api/sign-in", {
    headers: { origin },
    data: { email, password: demoPassword(dataFolder, email) },
  });
  const page = await context.newPage();
  if (isBig) await giveBigPlan(page);
  await page.goto(RUN_PAGE);
  await page.getByRole("application").first().waitFor();
  return page;
}

/** The page gets the plan of the size section 15 names in place of the demonstration's; what it saves is taken. */
async function giveBigPlan(page: Page): Promise<void> {
  const plan = bigPlan(PARTS, 5, 8, SIZES);
  const rows = Object.fromEntries(plan.editions.map(({ id }) => [id, 1]));
  const held = { plan, spare: { rate: "0", own: [] }, versions: { run: 1, workshop: 1, rows } };
  await page.route("**/kits/*/plan", (route) => route.fulfill({ json: held }));
  await page.route(/\/kits\/\w+\/(run|editions\/.*)$/, (route) =>
    route.request().method() === "PATCH" ? route.fulfill({ json: { version: 1 } }) : route.continue(),
  );
}

/**
 * Milliseconds from a key on the ruler or in a field to the frame in which the chart is drawn anew, measured
 * inside the page: an observer sees the chart's line change, and the next frame has it on the screen.
 */
async function timesOf(page: Page, edit: "run" | "price"): Promise<number[]> {
  const times: number[] = [];
  for (let time = 0; time < TIMES; time++) {
    const drawn = page.evaluate(
      (place) =>
        new Promise<number>((done) => {
          const chart = document.querySelectorAll(".recharts-surface")[place] as SVGElement;
          let began = 0;
          addEventListener(
            "keydown",
            (press) => {
              began ||= press.timeStamp;
            },
            { capture: true, once: true },
          );
          const seen = new MutationObserver(() => {
            seen.disconnect();
            requestAnimationFrame(() => setTimeout(() => done(performance.now() - began)));
          });
          seen.observe(chart, { subtree: true, childList: true, attributes: true, characterData: true });
        }),
      CHART[edit],
    );
    await page.evaluate(() => undefined);
    if (edit === "run")
      await page.getByRole("slider", { name: "Run" }).press(time % 2 ? "ArrowLeft" : "ArrowRight");
    else await page.getByLabel("Price of Full kit").press(time % 2 ? "ArrowDown" : "ArrowUp");
    times.push(await drawn);
    await page.waitForTimeout(100);
  }
  return times;
}

function median(times: readonly number[]): number {
  const sorted = [...times].sort((one, other) => one - other);
  return sorted[Math.floor(sorted.length / 2)] ?? 0;
}

const EDITS = [
  ["run", "run size changed to chart redrawn"],
  ["price", "price changed to chart redrawn, every run size reckoned again"],
] as const;

async function rowsOf(page: Page, kit: string): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  for (const [edit, what] of EDITS) {
    const value = median(await timesOf(page, edit));
    rows.push({
      what: `${what}: ${kit}`,
      value: Math.round(value),
      unit: "ms",
      aim: `under ${AIM_MS} ms`,
      met: value < AIM_MS,
      note: `median of ${TIMES}, Chromium at 1440 wide, from the key to the frame after the chart changed`,
    });
  }
  return rows;
}

/** From an edit to the redrawn chart: on the demonstration's Dew Lantern, and on a plan of the size section 15 names. */
export async function run(): Promise<BenchRow[]> {
  const server = await startServer(4365);
  const browser = await chromium.launch(CHROMIUM);
  try {
    const small = await openRun(browser, server.origin, server.dataFolder, false);
    const rows = await rowsOf(small, "23 parts, every run up to 500");
    await small.close();
    const big = await openRun(browser, server.origin, server.dataFolder, true);
    return [
      ...rows,
      ...(await rowsOf(big, `${PARTS} parts × 5 offers × 8 breaks, every run up to ${SIZES}`)),
    ];
  } finally {
    await browser.close();
    await server.stop();
  }
}
