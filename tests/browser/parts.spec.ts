import AxeBuilder from "@axe-core/playwright";
import { type Browser, expect, type Locator, type Page, test } from "@playwright/test";
import { CO_BUILDER, DESIGNER, OWNER, signIn } from "./sign-in.ts";

/** A kit of this test's own, made through the page for a new kit; returns the address of its parts. */
async function newKit(page: Page, name: string): Promise<string> {
  await signIn(page, DESIGNER);
  const workshop = new URL(page.url()).pathname;
  await page.goto(`${workshop}/kits/new`);
  await page.waitForLoadState("networkidle");
  await page.getByLabel("Name of the kit").fill(name);
  await page.getByRole("button", { name: "Make the kit" }).click();
  await page.waitForURL(/\/parts$/);
  await page.waitForLoadState("networkidle");
  return new URL(page.url()).pathname;
}

/** A cell by the line's number and the column. */
function cell(page: Page, place: number, column: string): Locator {
  return page.locator(`.ag-row[row-index="${place - 1}"] [col-id="${column}"]`);
}

/** Writes into the cell that is focused or given, as a person with a keyboard does. */
async function write(page: Page, at: Locator, text: string): Promise<void> {
  await at.click();
  await page.keyboard.press("Enter");
  await expect(at.locator("input")).toBeFocused();
  await at.locator("input").fill(text);
  await page.keyboard.press("Enter");
}

async function firstLine(page: Page, designators: string, part: string): Promise<void> {
  await page.getByLabel("Designators").fill(designators);
  await page.getByLabel("Part", { exact: true }).fill(part);
  await page.keyboard.press("Enter");
  await expect(cell(page, 1, "part")).toBeVisible();
}

async function saved(page: Page): Promise<void> {
  await expect(page.getByText(/^Saved \d\d:\d\d$/)).toBeVisible();
}

test("the first line is written, edited, undone, redone, and stands after a reload", async ({ page }) => {
  await newKit(page, "Fen Beacon");
  await expect(page.getByText("Nothing yet.")).toBeVisible();
  await firstLine(page, "R1-R3", "4k7, 5 %");
  await expect(page.getByText("1 line, 3 pieces.")).toBeVisible();
  await expect(cell(page, 1, "designators")).toHaveText("R1–R3");
  await expect(cell(page, 1, "part")).toHaveText("4.7 kΩ 5 %");
  await expect(
    cell(page, 1, "bands").getByRole("img", { name: "bands yellow, violet, red, gold" }),
  ).toBeVisible();

  await write(page, cell(page, 1, "drawer"), "A4");
  await expect(cell(page, 1, "drawer")).toHaveText("A4");
  await cell(page, 1, "drawer").click();
  await page.keyboard.press("Control+z");
  await expect(cell(page, 1, "drawer")).toHaveText("");
  await page.keyboard.press("Control+y");
  await expect(cell(page, 1, "drawer")).toHaveText("A4");
  await saved(page);
  await page.reload();
  await expect(cell(page, 1, "drawer")).toHaveText("A4");
});

test("lines are added, chosen, moved and removed with the keyboard alone", async ({ page }) => {
  await newKit(page, "Reed Chime");
  await firstLine(page, "R1", "10k");
  await page.getByRole("button", { name: "Add a line" }).focus();
  await page.keyboard.press("Enter");
  const draft = page.locator('.ag-row[row-id="draft"]');
  await expect(draft.locator('[col-id="designators"] input')).toBeFocused();
  await page.keyboard.type("C1, C2");
  await page.keyboard.press("Tab");
  await expect(draft.locator('[col-id^="quantity:"] input')).toBeFocused();
  await page.keyboard.press("Tab");
  await expect(draft.locator('[col-id="part"] input')).toBeFocused();
  await page.keyboard.type("100n, ceramic");
  await page.keyboard.press("Enter");
  await expect(cell(page, 2, "designators")).toHaveText("C1, C2");
  await expect(cell(page, 2, "part")).toHaveText("100 nF ceramic");
  await expect(draft.locator('[col-id="designators"] input')).toBeFocused();

  await page.keyboard.press("Escape");
  await expect(draft.locator('[col-id="designators"]')).toBeFocused();
  await page.keyboard.press("ArrowUp");
  await expect(cell(page, 2, "designators")).toBeFocused();
  await page.keyboard.press("Alt+ArrowUp");
  await expect(cell(page, 1, "designators")).toHaveText("C1, C2");
  await expect(cell(page, 1, "designators")).toBeFocused();
  await page.keyboard.press("ArrowLeft");
  await expect(cell(page, 1, "place")).toBeFocused();
  await page.keyboard.press("Delete");
  await expect(page.getByText("1 line, 1 piece.")).toBeVisible();
  await expect(cell(page, 1, "designators")).toHaveText("R1");
});

test("a block is pasted whole or not at all, and copied with units", async ({ page, context }) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await newKit(page, "Sedge Lamp");
  await firstLine(page, "R1", "10k, 5 %");
  const paste = async (text: string, at: Locator) => {
    await page.evaluate((block) => navigator.clipboard.writeText(block), text);
    await at.click();
    await page.keyboard.press("Control+v");
  };
  await paste("R1\t1\t22k, 5 %\nR2, R3\t2\t47k", cell(page, 1, "designators"));
  await expect(cell(page, 2, "part")).toHaveText("47 kΩ");
  await expect(cell(page, 1, "part")).toHaveText("22 kΩ 5 %");

  await paste("R9\tmany", cell(page, 1, "designators"));
  const misfits = page.getByRole("alert").filter({ hasText: "Nothing was pasted" });
  await expect(misfits).toContainText("“many” is not a number of pieces. Write a whole number.");
  await expect(cell(page, 1, "designators")).toHaveText("R1");
  await misfits.getByRole("button", { name: "Close" }).click();

  await cell(page, 1, "designators").click();
  await page.keyboard.press("Shift+ArrowDown");
  await page.keyboard.press("Control+c");
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe("R1\nR2, R3");
});

test("an entry that cannot be taken stays in its cell with what would be right", async ({ page }) => {
  await newKit(page, "Bulrush Meter");
  await firstLine(page, "R1", "10k");
  const quantity = page.locator('.ag-row[row-index="0"] [col-id^="quantity:"]');
  await write(page, quantity, "12o");
  const fault = page.getByRole("alert").filter({ hasText: "One cell is not saved" });
  await expect(fault).toContainText("“12o” is not a number of pieces. Write a whole number.");
  await expect(quantity).toHaveText("12o");
  await fault.getByRole("button", { name: "Leave it as it was" }).click();
  await expect(quantity).toHaveText("1");
});

async function second(browser: Browser, email: string, address: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await signIn(page, email);
  await page.goto(address);
  await expect(cell(page, 1, "part")).toBeVisible();
  return page;
}

test("two people change one cell: both values are shown, and one is chosen", async ({ page, browser }) => {
  const address = await newKit(page, "Mallow Switch");
  await firstLine(page, "R1", "10k");
  await saved(page);
  const other = await second(browser, OWNER, address);
  await write(other, cell(other, 1, "drawer"), "C3");
  await saved(other);
  await write(page, cell(page, 1, "drawer"), "B2");
  const clash = page.getByRole("alert").filter({ hasText: "changed the drawer of R1" });
  await expect(clash).toContainText("Ines Varga changed the drawer of R1");
  await expect(clash).toContainText("Yours: B2.");
  await clash.getByRole("button", { name: "Keep B2" }).click();
  await expect(cell(page, 1, "drawer")).toHaveText("B2");
  await expect(clash).toBeHidden();
  await other.reload();
  await expect(cell(other, 1, "drawer")).toHaveText("B2");
});

test("several lines are marked at once, and an edition is added with their quantities", async ({ page }) => {
  const address = await newKit(page, "Osier Clock");
  await firstLine(page, "R1, R2", "10k");
  await page.locator('.ag-row[row-index="0"] input[type="checkbox"]').check();
  const bar = page.getByRole("region", { name: "Chosen lines" });
  await bar.getByLabel("Mark").selectOption("Do not place");
  await expect(cell(page, 1, "state")).toHaveText("Do not place");
  await saved(page);

  await page.goto(address.replace(/parts$/, "details"));
  await page.waitForLoadState("networkidle");
  await page.getByLabel("Another edition").fill("Bare board");
  await page.getByLabel("Begins with").selectOption("nothing");
  await page.getByRole("button", { name: "Add the edition" }).click();
  await expect(page.getByRole("textbox", { name: "Name", exact: true })).toHaveCount(2);
  await page.goto(address);
  await expect(page.getByRole("columnheader", { name: "Bare board" })).toBeVisible();
});

test("a co-builder reads the list without money, and can change nothing", async ({ page }) => {
  await signIn(page, CO_BUILDER);
  const replies: string[] = [];
  page.on("response", async (response) => {
    if (response.url().includes("/api/") || response.request().resourceType() === "document")
      replies.push(await response.text().catch(() => ""));
  });
  await page.getByRole("link", { name: "Dew Lantern", exact: true }).click();
  await expect(cell(page, 1, "part")).toBeVisible();
  await expect(page.getByRole("columnheader", { name: "Per kit" })).toHaveCount(0);
  await expect(page.getByRole("button", { name: "Add a line" })).toHaveCount(0);
  await cell(page, 1, "drawer").dblclick();
  await expect(page.locator(".ag-cell-inline-editing")).toHaveCount(0);
  await page.waitForLoadState("networkidle");
  expect(replies.join("\n")).not.toMatch(/€|stockCost|unitPrice|EB-1003/);
});

for (const scheme of ["light", "dark"] as const)
  test(`the list has no faults that a checker finds, ${scheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme: scheme });
    await signIn(page, DESIGNER);
    await page.getByRole("link", { name: "Dew Lantern", exact: true }).click();
    await page.goto(page.url().replace(/(kits\/\w+).*/, "$1/parts"));
    await expect(cell(page, 1, "part")).toBeVisible();
    await page.waitForLoadState("networkidle");
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(" | ")}`)).toEqual(
      [],
    );
  });

/** The parts page of the demonstration's Dew Lantern, with its list loaded. */
async function dewLantern(page: Page): Promise<void> {
  await signIn(page, DESIGNER);
  const kit = page.getByRole("link", { name: "Dew Lantern", exact: true });
  await page.goto(`${await kit.getAttribute("href")}/parts`);
  await expect(cell(page, 1, "part")).toBeVisible();
}

test("price and state stay in view on a tablet, and at 400 % nothing is fixed over the page", async ({
  page,
}) => {
  await dewLantern(page);
  for (const width of [1440, 1024, 768]) {
    await page.setViewportSize({ width, height: 900 });
    for (const column of ["perKit", "state"]) {
      await expect(cell(page, 1, column)).toBeVisible();
      const box = await cell(page, 1, column).boundingBox();
      expect((box?.x ?? width) + (box?.width ?? 0)).toBeLessThanOrEqual(width);
    }
  }
  await page.setViewportSize({ width: 360, height: 225 });
  await expect(page.locator("[data-tally]")).toHaveCSS("position", "static");
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(360);
});

test("on paper the list is a table of all its lines, with colours written", async ({ page }) => {
  await dewLantern(page);
  await page.emulateMedia({ media: "print" });
  const list = page.getByRole("table", { name: "Parts list of Dew Lantern" });
  // 23 lines between a head and a total.
  await expect(list.getByRole("row")).toHaveCount(25);
  await expect(list.getByRole("row").nth(1)).toContainText("brown, black, orange, gold");
  await expect(page.locator(".ag-root-wrapper")).toBeHidden();
  await page.emulateMedia({ media: "screen" });
  await expect(list).toHaveCount(0);
});
