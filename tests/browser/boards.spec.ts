import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { DESIGNER, SELLER, signIn } from "./sign-in.ts";

/** Opens a kit's boards from the list of kits. */
async function openBoards(page: Page, email: string, kit: RegExp): Promise<void> {
  await signIn(page, email);
  const href = await page.getByRole("link", { name: kit }).first().getAttribute("href");
  const [place = ""] = /^\/workshops\/\w+\/kits\/\w+/.exec(href ?? "") ?? [];
  await page.goto(`${place}/boards`);
  await expect(page.locator("astro-island[ssr]")).toHaveCount(0);
}

async function faultless(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"])
    .analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
}

async function fill(page: Page, label: string, text: string): Promise<void> {
  const field = page.getByLabel(label, { exact: true });
  await field.fill(text);
  await field.press("Tab");
}

const main = (page: Page) => page.getByRole("main");
const drawing = (page: Page) => page.getByRole("img", { name: /^A panel of/ });

for (const width of [1440, 390])
  test(`at ${width} px a kit goes from single boards to panels and back`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 });
    await openBoards(page, DESIGNER, /Dew Lantern/);
    await expect(main(page)).toContainText("Hollow Mill, 125 boards: €184.92.");
    // 4 × 58 + 3 × 2 by 3 × 42 + 2 × 2 + 2 × 7 mm; 292.32 of 342.72 cm² is board.
    await expect(drawing(page)).toHaveAccessibleName(/^A panel of 12 boards, 4 × 3, 238\s×\s144\smm, routed/);
    await expect(main(page)).toContainText("85%of the panel is board.");
    await expect(main(page)).toContainText(
      "Panels cost less at runs of 10 to 11, 17 to 22, 121 to 138, 145 to 169, 242 to 278, 364 to 403, 486 to 500.",
    );
    await page.getByRole("radio", { name: "Always Kilnside, panels of 12" }).check();
    // 125 boards in 11 panels: 11 × (19.00 + 12 × 0.08) = 219.56, with 36.00 and 12.50 268.06; over 120 kits 2.23.
    await expect(main(page)).toContainText(
      "Kilnside, 11 panels of 12: €268.06. That is €2.23 for each board",
    );
    await expect(main(page)).toContainText("12 of them are spare.");
    // One panel more is 19.96 for 12 boards.
    await expect(page.getByRole("row", { name: /^12 panels, 144/ })).toContainText("€19.96");
    await faultless(page);
    await page.getByRole("button", { name: /Kilnside, panels of 12, landed/ }).click();
    const working = page.getByRole("dialog").or(page.getByRole("complementary", { name: /working/i }));
    await expect(working.first()).toContainText("Boards to a panel");
    await page.keyboard.press("Escape");
    await page.getByRole("radio", { name: /^The cheapest/ }).check();
    await expect(main(page)).toContainText("Hollow Mill, 125 boards: €184.92.");
  });

test("sizes of panel are gone through by arrow keys, at either house", async ({ page }) => {
  await openBoards(page, DESIGNER, /Dew Lantern/);
  const sizes = page.getByRole("group", { name: "Boards to a panel" });
  await sizes.getByRole("radio", { name: /^12 boards/ }).focus();
  await page.keyboard.press("ArrowRight");
  await expect(sizes.getByRole("radio", { name: /^14 boards/ })).toBeFocused();
  await expect(drawing(page)).toHaveAccessibleName(/^A panel of 14 boards/);
  await page.getByRole("button", { name: "Saltmarsh", exact: true }).click();
  // V-scored: 4 × 58 by 4 × 42 + 2 × 5.
  await expect(drawing(page)).toHaveAccessibleName(/^A panel of 16 boards, 4 × 4, 232\s×\s178\smm, V-scored/);
});

test("a panel that fits is printed alone and at true scale", async ({ page }) => {
  await page.addInitScript(() => {
    window.print = () => {};
  });
  await openBoards(page, DESIGNER, /Dew Lantern/);
  await page.getByRole("button", { name: "Print 1:1" }).click();
  await expect(page.locator("html")).toHaveAttribute("data-sheet", "lying");
  await page.emulateMedia({ media: "print" });
  const sheet = page.locator("[data-print-sheet] svg");
  const box = await sheet.boundingBox();
  // 238 mm and 3 at each side, at 96 px to the inch.
  expect(((box?.width ?? 0) / 96) * 25.4).toBeCloseTo(244, 1);
  await expect(main(page)).toBeHidden();
  const pdf = (await page.pdf({ preferCSSPageSize: true })).toString("latin1");
  // One page of A4, lying: 297 × 210 mm are 842 × 595 points.
  expect(pdf.match(/\/MediaBox \[0 0 (\d+)\S* (\d+)/)?.slice(1)).toEqual(["841", "594"]);
  expect(pdf.match(/\/MediaBox/g)).toHaveLength(1);
  await page.emulateMedia({ media: "screen" });
  await expect(page.locator("[data-print-sheet]")).toHaveCount(0);
});

test("panels are written down for a round board, refused where they contradict, and quoted for", async ({
  page,
}) => {
  test.setTimeout(120_000);
  await openBoards(page, DESIGNER, /Cricket Box/);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Who makes the boards, and how many?");
  await expect(main(page)).toContainText("Nothing yet. Write down what a board house makes panels like");
  await page.getByRole("button", { name: "Write down a house's panels" }).click();
  await expect(page.getByLabel("Board house", { exact: true })).toBeFocused();
  await expect(page.getByLabel("Board house", { exact: true })).toHaveValue("Saltmarsh");
  await fill(page, "Largest panel, one side", "45");
  await fill(page, "Largest panel, other side", "200");
  await page.getByLabel("Boards are parted by").selectOption("v-score");
  await fill(page, "Width of a rail", "5");
  await page.getByRole("button", { name: "Lay out its panels" }).click();
  await expect(page.getByRole("alert")).toContainText("A round board cannot be V-scored");
  await page.getByLabel("Boards are parted by").selectOption("routed");
  await fill(page, "Gap the router leaves", "2");
  await page.getByRole("button", { name: "Lay out its panels" }).click();
  // 200 × 45 less two gaps and rails of 7: 31 mm, and the board has 50.
  await page.getByRole("link", { name: /^A board of 50 × 50 mm does not fit into the 200 × 31 mm/ }).click();
  await expect(page.getByLabel("Largest panel, one side")).toBeFocused();
  await faultless(page);
  await fill(page, "Largest panel, one side", "250");
  await page.getByRole("button", { name: "Lay out its panels" }).click();
  // 4 × 50 + 3 × 2 by 3 × 50 + 2 × 2 + 2 × 7 mm.
  await expect(drawing(page)).toHaveAccessibleName(/^A panel of 12 boards, 4 × 3, 206\s×\s168\smm, routed/);
  await expect(main(page)).toContainText(/206\s×\s168\smm do not fit on A4/);

  await page.getByRole("button", { name: "Write down a quote for panels of 12" }).click();
  await expect(page.getByLabel("Board house", { exact: true })).toBeFocused();
  await expect(page.getByLabel("On a panel")).toHaveValue("12");
  await fill(page, "Panel, one side", "100");
  await page.getByLabel("Sold", { exact: true }).selectOption("whole-order");
  await fill(page, "From, break 1", "1");
  await fill(page, "Price each, break 1", "20");
  await fill(page, "Depanelling", "0.10");
  await fill(page, "Freight", "9");
  await page.getByRole("button", { name: /^Add the quote/ }).click();
  await expect(page.getByRole("alert")).toContainText(
    "12 boards of 50 × 50 mm do not fit on a panel of 100 × 168 mm",
  );
  await fill(page, "Panel, one side", "206");
  await page.getByRole("button", { name: /^Add the quote/ }).click();
  await page.getByRole("radio", { name: "Always Saltmarsh, panels of 12" }).check();
  // 60 boards in 5 panels: 5 × (20 + 1.20) + 9 = 115.00, 1.92 each; singly 60 × 2.10 + 9 = 135.00.
  await expect(main(page)).toContainText(
    "Saltmarsh, five panels of 12: €115.00. That is €1.92 for each board",
  );
  // Singly 105 for 31 to 50 boards, then 2.10 each, 172 from 82 on, then 1.72; panels 21.20 for each dozen begun.
  await expect(main(page)).toContainText("Panels cost less at runs of 1 to 48, 51 to 96.");
  await expect(main(page)).toContainText("Single boards cost less at runs of 49 to 50, 97 to 300.");
});

test("a seller sees the panel and chooses, and writes nothing down", async ({ page }) => {
  await openBoards(page, SELLER, /Dew Lantern/);
  await expect(drawing(page)).toBeVisible();
  await expect(page.getByRole("radio", { name: "Always Kilnside, panels of 12" })).toBeEnabled();
  await expect(page.getByRole("button", { name: /panels of Kilnside|another house/ })).toHaveCount(0);
  await page
    .getByRole("group", { name: "Boards to a panel" })
    .getByRole("radio", { name: /^17/ })
    .check({ force: true });
  await expect(page.getByRole("button", { name: /^Write down a quote/ })).toHaveCount(0);
});
