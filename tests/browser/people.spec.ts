import AxeBuilder from "@axe-core/playwright";
import { type Browser, expect, type Page, test } from "@playwright/test";
import { base32 } from "oslo/encoding";
import { generateHOTP } from "oslo/otp";
import { demoPassword } from "#tests/support/running-server.ts";
import { OWNER, SELLER, signIn } from "./sign-in.ts";

const PASSWORD = "seven green kettles on a shelf";

async function withoutFaults(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"])
    .analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
}

/** The link of the newest letter to an address, from the page where letters stay. */
async function linkTo(page: Page, email: string): Promise<string> {
  const letter = page
    .locator("article")
    .filter({ hasText: `To ${email},` })
    .first();
  await expect(async () => {
    await page.goto("/letters");
    await expect(letter).toBeVisible({ timeout: 500 });
  }).toPass();
  return (await letter.getByRole("link").first().getAttribute("href")) ?? "";
}

async function elsewhere(browser: Browser): Promise<Page> {
  return (await browser.newContext()).newPage();
}

test("An owner asks somebody in by letter, who makes an account and is given another role", async ({
  page,
  browser,
}) => {
  test.slow();
  await signIn(page, OWNER);
  await page.getByRole("link", { name: "People" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(
    "Who works on the kits of Marsh Lane Workshop?",
  );
  await withoutFaults(page);
  await page.getByLabel("Email").fill("mara@example.org");
  await page.getByRole("radio", { name: /^Co-builder/ }).check();
  await page.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByRole("alert")).toContainText("Choose the kit a co-builder is asked to");
  await page.getByLabel("Kit", { exact: true }).selectOption({ label: "Dew Lantern" });
  await page.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByText("mara@example.org")).toBeVisible();

  const other = await elsewhere(browser);
  await other.goto(await linkTo(page, "mara@example.org"));
  await expect(other.getByRole("heading", { level: 1 })).toHaveText("Will you come to Marsh Lane Workshop?");
  await withoutFaults(other);
  await other.getByLabel("Your name").fill("Mara Lund");
  await other.getByLabel("Password", { exact: true }).fill(PASSWORD);
  await other.getByRole("button", { name: "Make an account and take it" }).click();
  await other.waitForURL(/\/workshops\//);

  await page.goBack();
  await page.reload();
  await page.getByRole("button", { name: "Role of Mara Lund" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog.getByRole("button", { name: "Leave it as it is" })).toBeFocused();
  await withoutFaults(page);
  await dialog.getByRole("radio", { name: /^Seller/ }).check();
  await dialog.getByRole("button", { name: "Give this role" }).click();
  await expect(page.getByRole("row", { name: /Mara Lund/ })).toContainText("Seller");
});

test("A person sets up a second factor, signs in with it and with a recovery code", async ({ page }) => {
  test.slow();
  await signIn(page, SELLER);
  await page.goto("/account");
  await withoutFaults(page);
  const section = page
    .locator("section")
    .filter({ has: page.getByRole("heading", { name: "Second factor" }) });
  const password = demoPassword(process.env.TINPENNY_TEST_DATA as string, SELLER);
  await section.getByLabel("Your password").fill(password);
  await section.getByRole("button", { name: "Set up an authenticator" }).click();
  const written = section.locator("[data-secret]");
  await expect(written).toHaveText(/^([A-Z2-7]{4} ?){8}$/);
  const secret = ((await written.textContent()) ?? "").replaceAll(" ", "");
  const key = base32.decode(secret, { strict: false });
  const codeAt = (step: number) => generateHOTP(key, Math.floor(Date.now() / 30_000) + step);
  await section.getByLabel("What it shows now").fill(await codeAt(0));
  await section.getByRole("button", { name: "Turn the second factor on" }).click();
  await expect(section.getByRole("heading", { name: "Your recovery codes" })).toBeVisible();
  const codes = await section.getByRole("listitem").allTextContents();
  expect(codes).toHaveLength(10);
  await withoutFaults(page);

  for (const code of [await codeAt(1), codes[0] ?? ""]) {
    await page.getByRole("button", { name: /you: menu/ }).click();
    await page.locator("#your-menu").getByRole("button", { name: "Sign out" }).click();
    await page.waitForURL(/\/sign-in/);
    await page.getByLabel("Email").fill(SELLER);
    await page.getByLabel("Password", { exact: true }).fill(password);
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    await page.waitForURL(/\/second-factor/);
    await withoutFaults(page);
    await page.getByLabel("Code").fill(code);
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    await page.waitForURL(/\/workshops\//);
  }

  await page.goto("/account");
  await section.getByRole("button", { name: "Turn the second factor off" }).click();
  await page.getByRole("dialog").getByLabel("Your password").fill(password);
  await page.getByRole("dialog").getByRole("button", { name: "Turn it off" }).click();
  await expect(section.getByRole("button", { name: "Set up an authenticator" })).toBeVisible();
});

test("A wrong password is told beside the form, which keeps what was written", async ({ page }) => {
  await page.goto("/sign-in?back=/account");
  await withoutFaults(page);
  await page.getByLabel("Email").fill("nobody@example.org");
  await page.getByLabel("Password", { exact: true }).fill("not it at all");
  await page.keyboard.press("Enter");
  const alert = page.getByRole("alert");
  await expect(alert).toBeFocused();
  await expect(alert).toContainText("do not go together");
  await expect(page.getByLabel("Email")).toHaveValue("nobody@example.org");
  await withoutFaults(page);
});

test("Ways in load no React: less than 30 kB of script, compressed, and nothing the policy blocks", async ({
  page,
}) => {
  const blocked: string[] = [];
  page.on("console", (message) => {
    if (/content security policy/i.test(message.text())) blocked.push(message.text());
  });
  for (const path of ["/sign-in", "/forgotten", "/sign-in/send-link"]) {
    const reply = await page.goto(path, { waitUntil: "networkidle" });
    expect(reply?.headers()["cache-control"]).toBe("no-store");
    const bytes = await page.evaluate(() =>
      performance
        .getEntriesByType("resource")
        .filter(({ name }) => /\.js$/.test(new URL(name).pathname))
        .reduce((sum, entry) => sum + (entry as PerformanceResourceTiming).encodedBodySize, 0),
    );
    expect(bytes).toBeGreaterThan(0);
    expect(bytes).toBeLessThan(30 * 1024);
  }
  expect(blocked).toEqual([]);
});
