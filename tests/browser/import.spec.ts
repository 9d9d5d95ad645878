import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { DESIGNER, signIn } from "./sign-in.ts";

/** The address of the empty kit of the demonstration: nothing that other tests look at is changed. */
async function mothLamp(page: Page): Promise<string> {
  await signIn(page, DESIGNER);
  const href = await page.getByRole("link", { name: "Moth Lamp" }).first().getAttribute("href");
  return (href ?? "").replace(/(\/kits\/\w+).*/, "$1");
}

/** Opens a page and waits until its islands answer. */
async function open(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await page.waitForLoadState("networkidle");
}

async function again(page: Page): Promise<void> {
  await page.reload();
  await page.waitForLoadState("networkidle");
}

async function choose(page: Page, name: string, content: string | Buffer): Promise<void> {
  const buffer = typeof content === "string" ? Buffer.from(content) : content;
  await page.locator('input[type="file"]').setInputFiles({ name, mimeType: "text/csv", buffer });
}

const LIST = `Ref,Qty,Value,Footprint,Supplier,Order code,Price
"R1, R2",3,10k,0805,Ebbing,EB-1003,0.011
C1,1,100nF,0805,Tamsin,T-E107,0.062
Total,4,,,,,
`;

test("a file that is no list says what it is and what to do, and changes nothing", async ({ page }) => {
  const kit = await mothLamp(page);
  await open(page, `${kit}/parts/bring-in`);
  await choose(page, "parts.xlsx", Buffer.from([0x50, 0x4b, 3, 4, 20, 0]));
  const fault = page.getByRole("alert").filter({ hasText: "parts.xlsx" });
  await expect(fault).toContainText("parts.xlsx is no workbook that can be read.");
  await expect(fault).toContainText("XLSX and ODS can.");
  await choose(page, "nothing.csv", "");
  await expect(page.getByRole("alert").filter({ hasText: "nothing.csv holds no rows." })).toBeVisible();
  await choose(page, "huge.csv", Buffer.alloc(6 * 1024 * 1024, 65));
  await expect(page.getByRole("alert").filter({ hasText: "At most 5 MB can be read." })).toBeVisible();
  await expect(page.getByRole("button", { name: "Choose a file" })).toBeVisible();
});

test("a list is settled by keyboard, survives a reload, is brought in and taken back", async ({ page }) => {
  const kit = await mothLamp(page);
  await open(page, `${kit}/parts/bring-in`);
  await page.getByRole("button", { name: "Paste from a spreadsheet" }).focus();
  await page.keyboard.press("Enter");
  await expect(page.getByLabel("Pasted cells")).toBeFocused();
  await page.keyboard.insertText(LIST);
  await page.keyboard.press("Tab");
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/bring-in\/\w{16}$/);
  await page.waitForLoadState("networkidle");

  const take = page.getByRole("button", { name: /^Bring in 2 lines/ });
  await expect(take).toHaveAttribute("aria-disabled", "true");
  await expect(page.getByText("Settle row 2 first.")).toBeVisible();
  await expect(page.getByText("4 rows: 1 line, 1 skipped, 2 to settle.")).toBeVisible();

  await page.getByRole("button", { name: "Use 2, as the designators say" }).focus();
  await page.keyboard.press("Enter");
  const next = page.getByRole("button", { name: "Leave the row out" });
  await expect(next).toBeFocused();
  await expect(page.getByText("Settle row 2 first.")).toBeHidden();
  await again(page);
  await expect(page.getByText("1 is worth a look")).toBeVisible();

  await page.getByLabel("What Footprint means").selectOption({ label: "Leave out" });
  await expect(page.getByText("6 matched, 1 left out").first()).toBeAttached();
  await again(page);
  await expect(page.getByLabel("What Footprint means")).toHaveValue("leave-out");

  await next.focus();
  await page.keyboard.press("Enter");
  await expect(page.getByText("nothing is left to settle")).toBeVisible();
  await expect(take).not.toHaveAttribute("aria-disabled", "true");
  await take.focus();
  await page.keyboard.press("Enter");
  await expect(page.getByRole("heading", { level: 1 })).toBeFocused();
  await expect(page.getByText("2 lines added")).toBeVisible();

  await open(page, `${kit}/parts/bring-in`);
  await page.getByRole("button", { name: /^Take back/ }).click();
  await expect(page.getByRole("button", { name: "Leave it as it is" })).toBeFocused();
  await page.getByRole("button", { name: "Take it back" }).click();
  await expect(page.getByText("taken back", { exact: true })).toBeVisible();
  await page.goto(`${kit}/parts`);
  await expect(page.getByText("Nothing yet.")).toBeVisible();
});

test("a draft that another window changed says so, and shows it as it is now", async ({ page, context }) => {
  const kit = await mothLamp(page);
  await open(page, `${kit}/parts/bring-in`);
  await choose(page, "two windows.csv", LIST);
  await page.waitForURL(/\/bring-in\/\w{16}$/);
  await page.waitForLoadState("networkidle");
  const other = await context.newPage();
  await open(other, page.url());
  const kept = other.waitForResponse((reply) => reply.request().method() === "PATCH" && reply.ok());
  await other.getByLabel("What Footprint means").selectOption({ label: "Note" });
  await kept;
  await page.getByRole("button", { name: "Leave the row out" }).click();
  await expect(page.getByRole("alert").filter({ hasText: "changed elsewhere" })).toBeVisible();
  await page.getByRole("button", { name: "Show it as it is now" }).click();
  await expect(page.getByLabel("What Footprint means")).toHaveValue("note");

  await open(page, `${kit}/parts/bring-in`);
  await page.getByRole("button", { name: "Drop two windows.csv" }).click();
  await page.getByRole("button", { name: "Drop it" }).click();
  await expect(page.getByRole("link", { name: "two windows.csv" })).toBeHidden();
});

for (const [width, theme] of [
  [1440, "light"],
  [390, "dark"],
] as const)
  test(`the page of a list is fit for everybody, ${width} wide, ${theme}`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 });
    await page.emulateMedia({ colorScheme: theme });
    const kit = await mothLamp(page);
    await open(page, `${kit}/parts/bring-in`);
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    await page.locator('input[type="file"]').setInputFiles("samples/stueckliste-dew-lantern-rev-c.csv");
    await page.waitForURL(/\/bring-in\/\w{16}$/);
    await page.waitForLoadState("networkidle");
    await expect(page.getByRole("button", { name: /^Take all/ })).toBeVisible();
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(wide).toBeLessThanOrEqual(0);
  });

test("a price list becomes ladders, and goes again", async ({ page }) => {
  const kit = await mothLamp(page);
  const prices = kit.replace(/\/kits\/.*/, "/suppliers/bring-in");
  await open(page, prices);
  await choose(page, "weir.csv", 'Order code,Value,Footprint,1,100\nW-10K,10 kΩ,"axial, 10 mm",0.03,0.02\n');
  await page.waitForURL(/\/bring-in\/\w{16}$/);
  await page.waitForLoadState("networkidle");
  await expect(page.getByText("Say first whose prices these are.")).toBeVisible();
  await page.getByLabel(/^Whose are the prices/).selectOption({ label: "A new supplier" });
  await page.getByLabel("Name of the supplier").fill("Weir Parts");
  await page.getByRole("button", { name: "Use this name" }).click();
  const part = page.getByLabel("The part of row 2");
  if (await part.isVisible()) await part.selectOption({ index: 1 });
  await page.getByRole("button", { name: "Bring in 1 price" }).click();
  await expect(page.getByText("1 offer added")).toBeVisible();
  await page.getByRole("button", { name: "Take it back" }).click();
  await page.getByRole("dialog").getByRole("button", { name: "Take it back" }).click();
  await expect(page.getByText("taken back", { exact: true })).toBeVisible();
});
