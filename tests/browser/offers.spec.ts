import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { CO_BUILDER, DESIGNER, SELLER, signIn } from "./sign-in.ts";

/** Address of the demonstration's Dew Lantern and of its workshop. */
async function places(page: Page): Promise<{ kit: string; workshop: string }> {
  const link = page.getByRole("link", { name: /Dew Lantern/ }).first();
  const href = (await link.getAttribute("href")) ?? "";
  const [, workshop = "", kit = ""] = /^(\/workshops\/\w+)\/kits\/(\w+)/.exec(href) ?? [];
  return { workshop, kit: `${workshop}/kits/${kit}` };
}

async function faultless(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"])
    // A sheet of a thousand cells takes minutes; the small sheet of suppliers has the same cells.
    .exclude("#every-offer .ag-root-wrapper")
    .analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
}

/** Waits until the page answers: its islands have taken over from what the server drew. */
async function ready(page: Page): Promise<void> {
  await expect(page.locator("astro-island[ssr]")).toHaveCount(0);
}

async function fill(page: Page, label: string, text: string): Promise<void> {
  const field = page.getByLabel(label, { exact: true });
  await field.fill(text);
  await field.press("Tab");
}

async function openLeds(page: Page, kit: string): Promise<void> {
  await page.goto(`${kit}/offers`);
  await page
    .getByRole("link", { name: /^LED, warm white/ })
    .first()
    .click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Who supplies the LEDs, and how many?");
  await expect(page.locator(".recharts-surface").first()).toBeVisible();
  await ready(page);
}

test("a supplier and its offer are added, refused where wrong, and taken when cheapest", async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, DESIGNER);
  const { kit, workshop } = await places(page);
  await page.goto(`${workshop}/suppliers`);
  await ready(page);
  await page.getByRole("button", { name: "Add a supplier" }).click();
  await page.getByRole("button", { name: /^Add the supplier/ }).click();
  await page.getByRole("link", { name: "Give it a name." }).click();
  await expect(page.getByLabel("Name", { exact: true })).toBeFocused();
  await page.keyboard.type("Quarrywell");
  await page.getByLabel("Freight", { exact: true }).selectOption("none");
  await page.getByRole("button", { name: /^Add the supplier/ }).click();
  await expect(page.getByRole("gridcell", { name: "Quarrywell" })).toBeVisible();

  await openLeds(page, kit);
  const before = await page
    .getByRole("button", { name: /^Cost per kit/ })
    .first()
    .getAttribute("aria-label");
  await page.getByRole("button", { name: "Add an offer" }).click();
  await page.getByLabel("Supplier", { exact: true }).selectOption({ label: "Quarrywell" });
  await fill(page, "From, break 1", "500");
  await fill(page, "Price each, break 1", "0,05");
  await page.getByRole("button", { name: "Add a break" }).click();
  await expect(page.getByLabel("From, break 2", { exact: true })).toBeFocused();
  await page.keyboard.type("500");
  await fill(page, "Price each, break 2", "0.03");
  await fill(page, "Minimum order", "500");
  // The demonstration buys its LEDs from the stock shown alone.
  await fill(page, "Stock shown", "5000");
  await page.getByRole("button", { name: /^Add the offer/ }).click();
  await page.getByRole("link", { name: /stands twice in the ladder/ }).click();
  await expect(page.getByLabel("From, break 2", { exact: true })).toBeFocused();
  await page.keyboard.press("ControlOrMeta+A");
  await page.keyboard.type("1000");
  await page.getByRole("button", { name: /^Add the offer/ }).click();

  // 674 at 0.05 are 33.70; 1 000 at 0.03 are 30.00, so 1 000 are bought: 3.70 less, 326 left.
  await expect(page.getByRole("main")).toContainText(/Buy 1\s000 from Quarrywell for €30\.00\./);
  await expect(page.getByRole("main")).toContainText("€3.70 less than the 674");
  await expect(page.getByRole("main")).toContainText("601 to 999");
  await expect(async () => {
    const after = await page
      .getByRole("button", { name: /^Cost per kit/ })
      .first()
      .getAttribute("aria-label");
    expect(after).not.toBe(before);
  }).toPass();

  await page.getByRole("radio", { name: /^Always Lumenhof/ }).press("Space");
  await expect(page.getByRole("main")).toContainText(/Buy 1\s000 from Lumenhof for €62\.00\./);
  await page.reload();
  await expect(page.getByRole("radio", { name: /^Always Lumenhof/ })).toBeChecked();
  await page.getByRole("radio", { name: /^The cheapest/ }).check({ force: true });
  await expect(page.getByRole("main")).toContainText("from Quarrywell");
});

test("cells are edited, pasted and undone by keyboard; what is wrong stays where it was typed", async ({
  page,
  context,
}) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await signIn(page, DESIGNER);
  const { workshop } = await places(page);
  await page.goto(`${workshop}/suppliers`);
  await ready(page);
  const cell = (row: number, column: string) => page.locator(`[row-index="${row}"] [col-id="${column}"]`);
  await cell(0, "freight").click();
  const first = (await cell(0, "freight").textContent()) ?? "";
  await page.keyboard.press("Enter");
  await page.keyboard.press("ControlOrMeta+A");
  await page.keyboard.type("8,40");
  await page.keyboard.press("Enter");
  await expect(cell(0, "freight")).toHaveText("€8.40");
  await cell(0, "freight").click();
  await page.keyboard.press("ControlOrMeta+Z");
  await expect(cell(0, "freight")).toHaveText(first);

  await page.evaluate(() => navigator.clipboard.writeText("5.10\t80\nsoon\t90\n"));
  await cell(0, "freight").click();
  await page.keyboard.press("ControlOrMeta+V");
  await expect(cell(0, "freight")).toHaveText("€5.10");
  await expect(cell(1, "freeFreightFrom")).toHaveText("€90.00");
  await expect(cell(1, "freight")).toHaveText("soon");
  await expect(page.getByRole("alert")).toContainText("One cell is not saved");
  await page.getByRole("button", { name: "Leave it as it was" }).click();
  await expect(page.getByRole("alert")).toHaveCount(0);
});

test("a block pasted below the last offer adds offers, or names the cells that keep all of it out", async ({
  page,
  context,
}) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await signIn(page, DESIGNER);
  const { kit } = await places(page);
  await page.goto(`${kit}/offers`);
  await ready(page);
  const next = page.locator('[row-id="next"] [col-id="part"]');
  const paste = async (block: string) => {
    await page.evaluate((text) => navigator.clipboard.writeText(text), block);
    await next.click();
    await page.keyboard.press("ControlOrMeta+V");
  };
  await page.locator('[row-index="0"] [col-id="orderCode"]').click();
  await page.keyboard.press("ControlOrMeta+ArrowDown");
  await expect(next).toHaveText("Paste new offers here");

  await paste("LED1\tTamsin\tT-NEW-1\nX99\tNobody\tT-NEW-2\n");
  const alert = page.getByRole("alert");
  await expect(alert).toContainText("No offer is added: 2 cells are not right");
  await expect(alert).toContainText("It says “X99”.");
  await alert.getByRole("button", { name: "Close" }).click();
  await expect(page.getByText("T-NEW-1")).toHaveCount(0);

  await paste("LED1\tTamsin\tT-NEW-1\nD1\tTamsin\tT-NEW-2\n");
  await expect(page.getByText("2 offers added.")).toBeVisible();
  await page.getByRole("button", { name: "Undo" }).click();
  await page.reload();
  await ready(page);
  const offers = await page.evaluate(() => document.documentElement.innerHTML);
  expect(offers).not.toContain("T-NEW-1");
});

test("boards: a quote with lots, refused where wrong, and the yield that needs more of them", async ({
  page,
}) => {
  await signIn(page, DESIGNER);
  const { kit } = await places(page);
  await page.goto(`${kit}/boards`);
  await ready(page);
  await page.getByRole("button", { name: "Add a quote" }).click();
  await fill(page, "Board house", "Cold Harbour");
  await fill(page, "Lot of, lot 1", "100");
  await fill(page, "Costs, lot 1", "20");
  await fill(page, "Valid until", "2020-01-01");
  await page.getByRole("button", { name: /^Add the quote/ }).click();
  await expect(page.getByRole("link", { name: /It ends before the day of the price/ })).toBeVisible();
  await fill(page, "Valid until", "");
  await page.getByRole("button", { name: /^Add the quote/ }).click();
  const row = page.getByRole("row", { name: /^Always Cold Harbour/ });
  await expect(row).toContainText("Freight not known");
  await row
    .getByRole("button", { name: /^Change/ })
    .first()
    .click();
  await fill(page, "Freight", "0");
  await page.getByRole("button", { name: /^Save the quote/ }).click();
  // 123 boards (99 of 100 good, sure in 95 of 100 runs) from lots of 100: two lots for 40.00.
  await expect(page.getByRole("main")).toContainText("Cold Harbour, 200 boards: €40.00.");
  await expect(page.getByRole("main")).toContainText("80 of them are spare.");
  await fill(page, "Good boards of a hundred", "100");
  await expect(page.getByRole("main")).toContainText("120 boards go into the kits, and as many are ordered.");
});

test("a seller sees prices and may choose, but changes no offer; a co-builder sees none of it", async ({
  page,
}) => {
  await signIn(page, SELLER);
  const { kit, workshop } = await places(page);
  await openLeds(page, kit);
  await expect(page.getByRole("radio", { name: /^The cheapest/ })).toBeVisible();
  await expect(page.getByRole("button", { name: "Add an offer" })).toHaveCount(0);
  await page.goto(`${kit}/boards`);
  await ready(page);
  await expect(page.getByRole("button", { name: "Add a quote" })).toHaveCount(0);
  await page.context().clearCookies();
  await signIn(page, CO_BUILDER);
  for (const path of [`${kit}/offers`, `${kit}/boards`, `${workshop}/suppliers`]) {
    const reply = await page.goto(path);
    expect(reply?.status()).toBe(403);
    expect(await page.content()).not.toMatch(/€\d/);
  }
});

for (const scheme of ["light", "dark"] as const)
  for (const width of [1440, 390])
    test(`supply pages are without faults, ${scheme}, ${width} wide`, async ({ page }) => {
      test.setTimeout(120_000);
      await page.emulateMedia({ colorScheme: scheme });
      await page.setViewportSize({ width, height: width === 390 ? 844 : 900 });
      await signIn(page, DESIGNER);
      const { kit, workshop } = await places(page);
      await openLeds(page, kit);
      const leds = new URL(page.url()).pathname;
      for (const path of [leds, `${kit}/offers`, `${kit}/boards`, `${workshop}/suppliers`]) {
        await page.goto(path);
        await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
        const sheets = path.endsWith("/boards") || path === leds ? 0 : 1;
        if (sheets > 0) await expect(page.locator(".ag-row").first()).toBeVisible();
        const past = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
        expect(past, `${path} reaches past the screen`).toBeLessThanOrEqual(0);
        await faultless(page);
      }
    });
