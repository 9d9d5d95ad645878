import { readFileSync } from "node:fs";
import AxeBuilder from "@axe-core/playwright";
import { type Download, expect, type Page, test } from "@playwright/test";
import { OWNER, SELLER, signIn } from "./sign-in.ts";

/** The run page of the demonstration's Dew Lantern, with its figures there. */
async function openRun(page: Page, who = OWNER): Promise<void> {
  await signIn(page, who);
  await page
    .getByRole("link", { name: /Dew Lantern/ })
    .first()
    .click();
  await page.waitForURL(/\/kits\/\w+/);
  await page.goto(`${page.url().replace(/(\/kits\/\w+).*$/, "$1")}/run`);
  await expect(page.getByRole("application").first()).toBeVisible();
}

const strip = (page: Page) => page.getByRole("region", { name: "The answers for this run" });
const figure = (page: Page, label: string) =>
  strip(page)
    .getByRole("button", { name: new RegExp(`^${label} .*show the working`) })
    .first();

/** Waits until the server has answered a change of the plan. */
async function saved(page: Page, change: () => Promise<void>): Promise<void> {
  const reply = page.waitForResponse((response) => response.request().method() === "PATCH" && response.ok());
  await change();
  await reply;
}

async function textOf(download: Promise<Download>): Promise<string> {
  return readFileSync(await (await download).path(), "utf8");
}

test("the run can be changed, shows what that did, is saved and can be taken back", async ({ page }) => {
  await openRun(page);
  const before = await figure(page, "Cost per kit").textContent();
  const run = Number(await strip(page).getByRole("slider").getAttribute("aria-valuenow"));
  await saved(page, async () => page.getByRole("slider", { name: "Run" }).press("PageDown"));
  await expect(strip(page)).toContainText(`Run changed from ${run} to ${run - 10}.`);
  await expect(figure(page, "Cost per kit")).not.toHaveText(before ?? "");
  await expect(page.getByRole("heading", { name: `One kit of ${run - 10}, built up` })).toBeVisible();
  await saved(page, async () => strip(page).getByRole("button", { name: "Undo" }).click());
  await expect(figure(page, "Cost per kit")).toHaveText(before ?? "");
  await expect(strip(page)).not.toContainText("Run changed");
  await saved(page, async () => page.keyboard.press("Alt+="));
  await page.reload({ waitUntil: "networkidle" });
  await expect(page.getByRole("application").first()).toBeVisible();
  await expect(page.getByRole("slider", { name: "Run" })).toHaveAttribute("aria-valuenow", String(run + 1));
  await saved(page, async () => page.keyboard.press("Alt+-"));
});

test("a working opens from its figure, follows edits, and gives the focus back", async ({ page }) => {
  await openRun(page);
  await figure(page, "Cost per kit").press("Enter");
  const panel = page.getByRole("dialog", { name: "The working" });
  await expect(panel).toContainText("Spent on the run");
  const heading = await panel.getByText(/^Cost per kit at a run of/).textContent();
  await saved(page, async () => page.keyboard.press("Alt+="));
  await expect(panel.getByText(/^Cost per kit at a run of/)).not.toHaveText(heading ?? "");
  await panel.getByRole("button", { name: /^Parts .*show the working/ }).click();
  await expect(panel).not.toContainText("Spent on the run");
  await page.keyboard.press("Escape");
  await expect(panel).toBeHidden();
  await saved(page, async () => page.keyboard.press("Alt+-"));
});

test("figures follow a price while it is typed; what cannot be taken is refused in words", async ({
  page,
}) => {
  await openRun(page, SELLER);
  const price = page.getByLabel("Price of Full kit");
  const earns = await figure(page, "Earns per kit").textContent();
  await price.fill("39");
  await expect(figure(page, "Earns per kit")).not.toHaveText(earns ?? "");
  await saved(page, async () => price.press("Escape"));
  await expect(figure(page, "Earns per kit")).toHaveText(earns ?? "");

  await price.fill("-5");
  await price.press("Tab");
  await expect(page.getByText("An amount here is never below zero.")).toBeVisible();
  await expect(price).toHaveValue("-5");
  await expect(figure(page, "Earns per kit")).toHaveText(earns ?? "");
  await price.press("Escape");
  const sure = page.getByLabel("Sure of enough boards");
  await sure.fill("100");
  await expect(figure(page, "Earns per kit")).toHaveText(earns ?? "");
  await sure.press("Tab");
  await expect(page.getByText("Write less than 100 %.")).toBeVisible();
  await sure.press("Escape");
});

test("a task is added, counted and removed by keyboard, and put back", async ({ page }) => {
  await openRun(page);
  const tasks = page.getByRole("table", { name: "Tasks" });
  const rows = await tasks.getByRole("row").count();
  const name = page.getByLabel("Add a task");
  await name.fill("Printing the sheet");
  await name.press("Enter");
  await expect(tasks.getByRole("row")).toHaveCount(rows + 1);
  const cost = await figure(page, "Cost per kit").textContent();
  await saved(page, async () => page.getByLabel("Minutes for a kit of Printing the sheet").fill("30"));
  await expect(figure(page, "Cost per kit")).not.toHaveText(cost ?? "");
  await page.getByRole("button", { name: "Remove Printing the sheet" }).press("Enter");
  await expect(tasks.getByRole("row")).toHaveCount(rows);
  await strip(page).getByRole("button", { name: "Undo" }).click();
  await expect(tasks.getByRole("row")).toHaveCount(rows + 1);
  await page.getByRole("button", { name: "Remove Printing the sheet" }).click();
  await expect(tasks.getByRole("row")).toHaveCount(rows);
});

test("charts are read by keyboard, as tables and as files", async ({ page }) => {
  await openRun(page);
  const chart = page.getByRole("application", { name: /What one kit costs/ });
  await chart.focus();
  await chart.press("ArrowRight");
  await chart.press("ArrowRight");
  const spoken = page.getByRole("status").filter({ hasText: "One kit, used" });
  await expect(spoken).toBeVisible();
  const first = await spoken.textContent();
  await chart.press("ArrowRight");
  await expect(spoken).not.toHaveText(first ?? "");

  await page.getByRole("button", { name: "As a table" }).first().click();
  const table = page.getByRole("table", { name: "What one kit costs, by run size" });
  await expect(table.getByRole("columnheader", { name: "Used per kit" })).toBeVisible();

  const name = "What one kit costs, by run size";
  const csv = page.waitForEvent("download");
  await page.getByRole("button", { name: `Save as CSV: ${name}` }).click();
  expect(await textOf(csv)).toMatch(/^\uFEFFRun,Used per kit,Spent per kit/);
  const svg = page.waitForEvent("download");
  await page.getByRole("button", { name: `Save as SVG: ${name}` }).click();
  const drawing = await textOf(svg);
  expect(drawing).toMatch(/^<svg [^>]*viewBox="0 0 \d+ \d+"/);
  expect(drawing).toContain(`<title>${name}</title>`);
  expect(drawing).not.toContain("var(--");
  const png = page.waitForEvent("download");
  await page.getByRole("button", { name: `Save as PNG: ${name}` }).click();
  expect(
    readFileSync(await (await png).path())
      .subarray(1, 4)
      .toString(),
  ).toBe("PNG");
});

test("two people who change the same price see both values, and one is chosen", async ({ page, browser }) => {
  await openRun(page);
  const other = await (await browser.newContext()).newPage();
  await openRun(other, SELLER);
  const before = await page.getByLabel("Price of Full kit").inputValue();
  await saved(other, async () => other.getByLabel("Price of Full kit").fill("35"));
  await page.getByLabel("Price of Full kit").fill("36");
  const clash = page.getByRole("alert").filter({ hasText: "Tom Aldis changed price of Full kit" });
  await expect(clash).toContainText("Yours: €36.00. Tom Aldis’s: €35.00.");
  await clash.getByRole("button", { name: "Take €35.00" }).click();
  await expect(page.getByLabel("Price of Full kit")).toHaveValue("35.00");
  await expect(clash).toBeHidden();
  await saved(page, async () => page.getByLabel("Price of Full kit").fill(before));
  await other.context().close();
});

test("the plan goes out as a file and its figures come back the same", async ({ page }) => {
  await openRun(page);
  const cost = await figure(page, "Cost per kit").textContent();
  const file = page.waitForEvent("download");
  await page.getByRole("link", { name: "Download this plan" }).click();
  const plan = JSON.parse(await textOf(file));
  const feed = async (content: unknown) =>
    page.locator("#plan-file input[type=file]").setInputFiles({
      name: "mine-plan.json",
      mimeType: "application/json",
      buffer: Buffer.from(JSON.stringify(content)),
    });
  await feed(plan);
  await expect(page.getByRole("table", { name: "Figures of mine-plan.json" })).toContainText(cost ?? "");
  await feed({ ...plan, channels: [{ ...plan.channels[0], feeRate: "1" }] });
  await expect(page.getByRole("region", { name: "mine-plan.json cannot be worked out" })).toContainText(
    "channels.0.feeRate",
  );
});

for (const [width, scheme] of [
  [1440, "light"],
  [1440, "dark"],
  [390, "light"],
  [390, "dark"],
] as const)
  test(`nothing is in anybody's way, ${width} wide, ${scheme}`, async ({ page }) => {
    const complaints: string[] = [];
    page.on("console", (message) => message.type() === "error" && complaints.push(message.text()));
    page.on("pageerror", (error) => complaints.push(String(error)));
    await page.emulateMedia({ colorScheme: scheme });
    await openRun(page);
    await page.setViewportSize({ width, height: 844 });
    await expect(page.getByRole("application").first()).toBeVisible();
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wide).toBeLessThanOrEqual(0);
    expect(complaints).toEqual([]);
  });

test("on a phone all figures stand in a sheet", async ({ page }) => {
  await openRun(page);
  await page.setViewportSize({ width: 390, height: 844 });
  await page.getByRole("button", { name: "Show all figures" }).click();
  const sheet = page.getByRole("dialog", { name: /All figures for a run of/ });
  await expect(sheet).toContainText("Cash needed");
  await sheet.getByRole("button", { name: /^Even after .*show the working/ }).click();
  await expect(page.getByRole("dialog", { name: "The working" })).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(page.getByRole("dialog", { name: "The working" })).toBeHidden();
});
