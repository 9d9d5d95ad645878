import { expect, type Locator, type Page, test } from "@playwright/test";
import { DESIGNER, OWNER, SELLER, signIn } from "./sign-in.ts";

/** Address of the demonstration's Dew Lantern. */
async function lantern(page: Page): Promise<string> {
  const href = await page
    .getByRole("link", { name: /Dew Lantern/ })
    .first()
    .getAttribute("href");
  return /^\/workshops\/\w+\/kits\/\w+/.exec(href ?? "")?.[0] ?? "";
}

const slider = (page: Page) => page.getByRole("slider", { name: "Run" });
const runNow = async (page: Page) => Number(await slider(page).getAttribute("aria-valuenow"));
const strip = (page: Page) => page.getByRole("region", { name: "The answers for this run" });

/** Waits until the strip answers: figures that open come with the plan. */
async function ready(page: Page): Promise<void> {
  await expect(
    strip(page)
      .getByRole("button", { name: /show the working/ })
      .first(),
  ).toBeVisible();
}

async function open(page: Page, who: string, rest: string): Promise<string> {
  await signIn(page, who);
  const kit = await lantern(page);
  await page.goto(`${kit}${rest}`);
  await ready(page);
  return kit;
}

/** Counts the questions the browser asks before a page is left, and answers them: it stays. */
function questions(page: Page): { asked: number } {
  const count = { asked: 0 };
  page.on("dialog", async (dialog) => {
    count.asked += 1;
    expect(dialog.type()).toBe("beforeunload");
    await dialog.dismiss();
  });
  return count;
}

async function patch(page: Page, path: string, fields: object, held: () => number): Promise<void> {
  const reply = await page.request.patch(`/api${path}`, {
    data: { ...fields, version: held() },
    headers: { origin: new URL(page.url()).origin },
  });
  expect(reply.status()).toBe(200);
}

async function versionOfRun(page: Page, kit: string): Promise<number> {
  return (await (await page.request.get(`/api${kit}/plan`)).json()).versions.run;
}

test("a run that is changed and left at once is kept, whichever way the page is left", async ({ page }) => {
  const kit = await open(page, OWNER, "/run");
  const asked = questions(page);
  const before = await runNow(page);
  await slider(page).press("PageDown");
  await page.reload();
  await ready(page);
  expect(await runNow(page)).toBe(before - 10);

  await slider(page).press("PageDown");
  await page
    .getByRole("link", { name: /^Boards/ })
    .first()
    .click();
  await page.waitForURL(/\/boards$/);
  await ready(page);
  expect(await runNow(page)).toBe(before - 20);

  await slider(page).press("PageUp");
  await page.goto(`${kit}/offers`);
  await page.goBack();
  await ready(page);
  await expect(slider(page)).toHaveAttribute("aria-valuenow", String(before - 10));

  await slider(page).press("PageUp");
  await expect(page.getByText(/^Saved \d\d:\d\d$/)).toBeVisible();
  expect(asked.asked).toBe(0);
});

test("an amount that is still being typed is kept", async ({ page }) => {
  await open(page, SELLER, "/run");
  const price = page.getByLabel("Price of Full kit");
  const before = await price.inputValue();
  await price.fill("41.50");
  await page.reload();
  await ready(page);
  await expect(price).toHaveValue("41.50");
  await price.fill(before);
  await price.press("Tab");
  await expect(page.getByText(/^Saved \d\d:\d\d$/)).toBeVisible();
});

function drawer(page: Page): Locator {
  return page.locator('.ag-row[row-index="0"] [col-id="drawer"]');
}

async function writeDrawer(page: Page, text: string): Promise<void> {
  await drawer(page).click();
  await page.keyboard.press("Enter");
  await expect(drawer(page).locator("input")).toBeFocused();
  await drawer(page).locator("input").fill(text);
}

test("a cell that is written and left at once is kept", async ({ page }) => {
  const kit = await open(page, DESIGNER, "/parts");
  const asked = questions(page);
  await expect(drawer(page)).toBeVisible();
  const before = (await drawer(page).textContent()) ?? "";
  await writeDrawer(page, "K7");
  await page.keyboard.press("Enter");
  await page
    .getByRole("link", { name: /^Boards/ })
    .first()
    .click();
  await page.waitForURL(/\/boards$/);
  await page.goto(`${kit}/parts`, { waitUntil: "networkidle" });
  await expect(drawer(page)).toHaveText("K7");

  // The editor is still open when another page is asked for.
  await ready(page);
  await writeDrawer(page, "K8");
  await page
    .getByRole("link", { name: /^Offers/ })
    .first()
    .click();
  await page.waitForURL(/\/offers$/);
  await page.goto(`${kit}/parts`, { waitUntil: "networkidle" });
  await expect(drawer(page)).toHaveText("K8");
  await ready(page);
  await writeDrawer(page, "K9");
  await page.reload({ waitUntil: "networkidle" });
  await expect(drawer(page)).toHaveText("K9");

  await ready(page);
  await writeDrawer(page, before);
  await page.keyboard.press("Enter");
  await expect(page.getByText(/^Saved \d\d:\d\d$/)).toBeVisible();
  expect(asked.asked).toBe(0);
});

test("without connection the browser asks, and what was left all the same is sent by the next page", async ({
  page,
  context,
}) => {
  const kit = await open(page, OWNER, "/run");
  const before = await runNow(page);
  const asked = questions(page);
  await context.setOffline(true);
  await slider(page).press("PageDown");
  await page.evaluate(() => setTimeout(() => location.reload()));
  await expect.poll(() => asked.asked).toBe(1);
  await expect(page.getByText(/^Not saved since \d\d:\d\d: no connection\.$/)).toBeVisible();
  expect(await runNow(page)).toBe(before - 10);

  page.removeAllListeners("dialog");
  page.on("dialog", (dialog) => dialog.accept());
  await page.goto(`${kit}/boards`).catch(() => undefined);
  await context.setOffline(false);
  await page.goto(`${kit}/boards`);
  await ready(page);
  await expect(slider(page)).toHaveAttribute("aria-valuenow", String(before - 10));
  const kept = async () => (await (await page.request.get(`/api${kit}/plan`)).json()).plan.run.kits;
  await expect.poll(kept).toBe(before - 10);
  await slider(page).press("PageUp");
  await expect.poll(kept).toBe(before);
});

test("a change refused after its page was left is shown by the next one, with both values", async ({
  page,
}) => {
  const kit = await open(page, OWNER, "/run");
  const before = await runNow(page);
  const version = await versionOfRun(page, kit);
  await patch(page, `${kit}/run`, { kits: before + 30 }, () => version);
  await slider(page).press("PageDown");
  await page.reload();
  await ready(page);
  const clash = page.getByRole("alert").filter({ hasText: "changed run" });
  await expect(clash).toContainText(/Ines Varga changed run at \d\d:\d\d\./);
  await expect(clash).toContainText(`Yours: ${before - 10}.`);
  expect(
    (await (await page.request.get(`/api${kit}/plan`)).json()).plan.run.kits,
    "nothing was overwritten",
  ).toBe(before + 30);
  await clash.getByRole("button", { name: `Take ${before + 30}` }).click();
  await expect(clash).toBeHidden();
  await expect(slider(page)).toHaveAttribute("aria-valuenow", String(before + 30));

  await page.reload();
  await ready(page);
  await expect(clash).toHaveCount(0);
  const after = await versionOfRun(page, kit);
  await patch(page, `${kit}/run`, { kits: before }, () => after);
});

test("the same field of an edition and of the board, changed by two people, is for one of them to choose", async ({
  page,
}) => {
  await signIn(page, DESIGNER);
  const workshop = new URL(page.url()).pathname;
  await page.goto(`${workshop}/kits/new`);
  await page.waitForLoadState("networkidle");
  await page.getByLabel("Name of the kit").fill("Teasel Lamp");
  await page.getByRole("button", { name: "Make the kit" }).click();
  await page.waitForURL(/\/parts$/);
  const kit = new URL(page.url()).pathname.replace(/\/parts$/, "");
  await page.goto(`${kit}/details`);
  await page.waitForLoadState("networkidle");
  const [edition] = await (await page.request.get(`/api${kit}/editions`)).json();

  await patch(page, `${kit}/editions/${edition.id}`, { weight: 4 }, () => edition.version);
  await page.getByLabel("Share of the run").fill("7");
  await page.getByLabel("Share of the run").press("Tab");
  const clash = page.getByRole("alert").filter({ hasText: "changed the share of the run" });
  await expect(clash).toContainText("Yours: 7.");
  await clash.getByRole("button", { name: "Keep 7" }).click();
  await expect(clash).toBeHidden();
  await expect(page.getByLabel("Share of the run")).toHaveValue("7");

  const board = page.getByRole("form", { name: "Board" });
  const version = Number(await board.locator('[name="version"]').inputValue());
  await patch(page, kit, { boardWidth: "44", summary: "A lamp." }, () => version);
  await board.getByLabel("Width in mm").fill("52");
  await board.getByLabel("Height in mm").fill("30");
  await board.getByRole("button", { name: "Save the board" }).click();
  const fault = board.getByRole("alert");
  await expect(fault).toContainText(/Milo .* changed this at \d\d:\d\d\./);
  await expect(fault).toContainText(/Width in mm\. Yours: 52(\.00)?\. Theirs: 44(\.00)?\./);
  await expect(fault).not.toContainText("Height");
  await fault.getByRole("button", { name: "Save mine over it" }).click();
  await expect(fault).toBeHidden();
  await expect(board.getByLabel("Width in mm")).toHaveValue(/^52(\.00)?$/);
  await page.waitForLoadState("networkidle");
  await expect(board.getByLabel("Height in mm")).toHaveValue(/^30(\.00)?$/);
  await expect(page.getByLabel("What it does, in one line")).toHaveValue("A lamp.");
});
