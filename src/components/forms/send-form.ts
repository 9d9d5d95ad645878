import { CallFailed, call } from "#src/components/islands/call.ts";
import type { Route } from "#src/server/route.ts";
import { meetOther } from "./meet-other.ts";
import { readForm } from "./read-form.ts";
import { type CurrentRow, showClash } from "./show-clash.ts";
import { clearFaults, type Faults, showFaults } from "./show-faults.ts";

type AnyRoute = Route<unknown, unknown>;
type Method = "POST" | "PUT" | "PATCH" | "DELETE";

/** A form was taken by the server; `detail` is the reply. Whoever handles it calls `preventDefault`. */
export type Sent = CustomEvent<unknown>;

const NOT_ALL = { title: "Some of this cannot be taken as it is.", detail: "" };

function faultsOf(error: unknown): Faults {
  if (!(error instanceof CallFailed)) throw error;
  const { title, detail, errors = [] } = error.problem;
  return { title, detail, errors };
}

function showBusy(form: HTMLFormElement, busy: boolean): void {
  form.toggleAttribute("data-busy", busy);
  for (const button of form.elements) {
    if (!(button instanceof HTMLButtonElement) || button.type !== "submit") continue;
    if (busy) button.setAttribute("aria-disabled", "true");
    else button.removeAttribute("aria-disabled");
    const [label, working] = button.querySelectorAll(":scope > span > span");
    if (!working) continue;
    label?.classList.toggle("invisible", busy);
    working.classList.toggle("invisible", !busy);
  }
}

/** Where to go after the reply: a page, here again, or what the reply says comes next. */
function goOn(form: HTMLFormElement, reply: unknown): void {
  const { then = "reload", back = "/" } = form.dataset;
  const { next, location: elsewhere } = (reply ?? {}) as { next?: string; location?: string };
  if (then === "reload") location.reload();
  else if (then === "say") sayDone(form);
  else if (then === "location" && elsewhere) location.assign(elsewhere);
  else if (then === "step" && next === "second-factor")
    location.assign(`/sign-in/second-factor?back=${encodeURIComponent(back)}`);
  else location.assign(then === "step" ? back : then);
}

function sayDone(form: HTMLFormElement): void {
  const done = form.querySelector<HTMLElement>("[data-done]");
  done?.removeAttribute("hidden");
  done?.focus();
  for (const field of form.querySelectorAll<HTMLInputElement>('input[type="password"]')) field.value = "";
  showBusy(form, false);
}

/** Somebody was quicker. What only one of us changed is settled; what both changed is for the person to choose. */
function meet(form: HTMLFormElement, current: CurrentRow): void {
  const differences = meetOther(form, current);
  const again = () => void send(form);
  if (differences.length > 0) showClash(form, current, differences, again);
  else again();
}

async function send(form: HTMLFormElement): Promise<void> {
  clearFaults(form);
  form.querySelector("[data-done]")?.setAttribute("hidden", "");
  const { body, faults } = readForm(form);
  if (faults.length > 0) return showFaults(form, { ...NOT_ALL, errors: faults });
  const { pathname, search } = new URL(form.action);
  const path = pathname + search;
  const input = form.dataset.bodiless === undefined ? body : undefined;
  showBusy(form, true);
  try {
    const reply = await call<AnyRoute>(form.dataset.send as Method, path, input);
    const unhandled = form.dispatchEvent(
      new CustomEvent("sent", { detail: reply, bubbles: true, cancelable: true }),
    );
    if (unhandled) goOn(form, reply);
    else showBusy(form, false);
  } catch (error) {
    showBusy(form, false);
    if (error instanceof CallFailed && error.problem.code === "changed-meanwhile" && error.problem.current)
      meet(form, error.problem.current as CurrentRow);
    else showFaults(form, faultsOf(error));
  }
}

/** Lets every form with `data-send` go out as JSON and show what the server says. */
export function takeOverForms(page: Document): void {
  page.addEventListener("submit", (submit) => {
    const form = submit.target;
    if (!(form instanceof HTMLFormElement) || form.dataset.send === undefined) return;
    submit.preventDefault();
    if (!form.hasAttribute("data-busy")) void send(form);
  });
}

/** "Show" and "Hide" inside a password field. */
export function letPasswordsShow(page: Document): void {
  page.addEventListener("click", (press) => {
    const button = (press.target as Element).closest<HTMLElement>("[data-shows]");
    const field = button && page.getElementById(button.dataset.shows ?? "");
    if (!button || !(field instanceof HTMLInputElement)) return;
    const hidden = field.type === "password";
    field.type = hidden ? "text" : "password";
    button.textContent = hidden ? "Hide" : "Show";
  });
}

/** Buttons with `data-opens` open the dialog of that id; those with `data-closes` close theirs. */
export function letDialogsOpen(page: Document): void {
  page.addEventListener("click", (press) => {
    const button = (press.target as Element).closest<HTMLElement>("[data-opens], [data-closes]");
    const opened = button?.dataset.opens && page.getElementById(button.dataset.opens);
    if (opened instanceof HTMLDialogElement) opened.showModal();
    else if (button?.dataset.closes !== undefined) button.closest("dialog")?.close();
  });
}
