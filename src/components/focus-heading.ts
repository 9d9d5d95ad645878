/**
 * After a page change inside the site, focus goes to the h1, so that a screen reader starts at the question.
 * A first visit, a reload, a link into the page and a field with autofocus are left alone.
 */
export function focusHeading(page: Document, arrivedBy: string | undefined): void {
  const fromHere = page.referrer !== "" && new URL(page.referrer).origin === page.location.origin;
  if (!fromHere || arrivedBy !== "navigate" || page.location.hash !== "") return;
  if (page.activeElement !== null && page.activeElement !== page.body) return;
  const heading = page.querySelector("h1");
  if (heading === null) return;
  heading.tabIndex = -1;
  heading.focus({ preventScroll: true });
}
