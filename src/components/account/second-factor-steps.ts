import type { Sent } from "#src/components/forms/send-form.ts";

interface SetUp {
  secret: string;
  link: string;
  picture: string;
}

/** Letters in groups of four, for typing over. */
function inFours(secret: string): string {
  return secret.match(/.{1,4}/g)?.join(" ") ?? secret;
}

function show(page: Document, id: string): HTMLElement | null {
  for (const part of ["second-factor", "factor-secret", "recovery-codes"])
    page.getElementById(part)?.toggleAttribute("hidden", part !== id);
  const shown = page.getElementById(id);
  shown?.focus();
  return shown;
}

function showSecret(page: Document, { secret, link, picture }: SetUp): void {
  const part = show(page, "factor-secret");
  const drawing = new DOMParser().parseFromString(picture, "image/svg+xml").documentElement;
  drawing.setAttribute("role", "img");
  drawing.setAttribute("aria-label", "The secret as a square code to scan");
  part?.querySelector("[data-picture]")?.replaceChildren(drawing);
  const written = part?.querySelector("[data-secret]");
  if (written) written.textContent = inFours(secret);
  part?.querySelector("[data-link]")?.setAttribute("href", link);
}

function showCodes(page: Document, codes: string[]): void {
  const part = show(page, "recovery-codes");
  const items = codes.map((code) => Object.assign(page.createElement("li"), { textContent: code }));
  part?.querySelector("[data-codes]")?.replaceChildren(...items);
}

/** Leads through setting up the second factor on the account page; what is shown once never gets an address. */
export function followSecondFactor(page: Document): void {
  page.addEventListener("sent", (event) => {
    const sent = event as Sent;
    const form = (event.target as HTMLElement).id;
    if (form === "begin-factor") showSecret(page, sent.detail as SetUp);
    else if (form === "confirm-factor" || form === "renew-codes")
      showCodes(page, (sent.detail as { recoveryCodes: string[] }).recoveryCodes);
    else return;
    sent.preventDefault();
  });
}
