import type { Sent } from "#src/components/forms/send-form.ts";

/** Shows a token that was just made; it is in no address and gone with the page. */
export function showNewToken(page: Document): void {
  page.getElementById("make-token")?.addEventListener("sent", (event) => {
    event.preventDefault();
    const box = page.getElementById("new-token");
    const written = box?.querySelector("[data-token]");
    if (!box || !written) return;
    written.textContent = ((event as Sent).detail as { token: string }).token;
    box.hidden = false;
    page.getElementById("make-token")?.setAttribute("hidden", "");
    box.focus();
  });
}
