import type { Page } from "@playwright/test";
import { WORKSHOP_ID } from "#db/seed/seed-id.ts";
import { demoPassword } from "#tests/support/running-server.ts";

/** The people of the demonstration. */
export const OWNER = "ines@example.org";
export const DESIGNER = "milo@example.org";
export const SELLER = "tom@example.org";
export const CO_BUILDER = "ruth@example.org";

/**
 * Signs in through the page, as a person would, and goes to the kits of the demonstration: another test may have made
 * a workshop since, and signing in leads to the last one used.
 */
export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("Email").fill(email);
  await page
    .getByLabel("Password", { exact: true })
    .fill(demoPassword(process.env.TINPENNY_TEST_DATA as string, email));
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await page.waitForURL(/\/workshops\//);
  await page.goto(`/workshops/${WORKSHOP_ID}`);
}
