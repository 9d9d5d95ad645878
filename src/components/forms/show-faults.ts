import type { EntryFault } from "./read-form.ts";

/** What a form could not do, in sentences. */
export interface Faults {
  title: string;
  detail: string;
  errors: readonly EntryFault[];
}

const WRONG = ["border-2!", "border-bad!"];

function controlOf(form: HTMLFormElement, at: string): HTMLElement | undefined {
  const name = at.split(".")[0] ?? "";
  const found = form.elements.namedItem(name);
  if (found instanceof RadioNodeList) return found[0] as HTMLElement | undefined;
  return found instanceof HTMLElement ? found : undefined;
}

function tie(control: HTMLElement, id: string, on: boolean): void {
  const others = (control.getAttribute("aria-describedby") ?? "")
    .split(" ")
    .filter((one) => one && one !== id);
  const ids = on ? [id, ...others] : others;
  if (ids.length > 0) control.setAttribute("aria-describedby", ids.join(" "));
  else control.removeAttribute("aria-describedby");
}

/** Takes away what an earlier sending said; entries stay as they are. */
export function clearFaults(form: HTMLFormElement): void {
  for (const sentence of form.querySelectorAll("[data-wrong]")) sentence.remove();
  for (const control of form.querySelectorAll<HTMLElement>("[aria-invalid]")) {
    control.removeAttribute("aria-invalid");
    control.classList.remove(...WRONG);
    tie(control, `${control.id}-wrong`, false);
  }
  for (const box of form.querySelectorAll("[data-fault], [data-settle]")) box.setAttribute("hidden", "");
}

/** The sentence below a field, tied to it. Its sign is that of the box above. */
function sayBelow(form: HTMLFormElement, control: HTMLElement, message: string): void {
  const sentence = document.createElement("p");
  sentence.id = `${control.id}-wrong`;
  sentence.dataset.wrong = "";
  sentence.className = "type-label mt-1 flex gap-2 font-semibold text-bad";
  const sign = form.querySelector("[data-fault] svg")?.cloneNode(true);
  if (sign instanceof SVGElement) {
    sign.setAttribute("class", "mt-px size-[18px] shrink-0 [--cut:var(--color-sheet)]");
    sentence.append(sign);
  }
  sentence.append(message);
  const box = control.closest("fieldset") ?? control.closest("label, span.relative") ?? control;
  box.insertAdjacentElement("afterend", sentence);
  control.setAttribute("aria-invalid", "true");
  control.classList.add(...WRONG);
  tie(control, sentence.id, true);
}

function linkTo(control: HTMLElement, message: string): HTMLLIElement {
  const item = document.createElement("li");
  const link = document.createElement("a");
  link.href = `#${control.id}`;
  link.textContent = message;
  link.addEventListener("click", (press) => {
    press.preventDefault();
    control.focus();
  });
  item.append(link);
  return item;
}

/** Says above the form what could not be done, with links to the fields, and below each field what is right. */
export function showFaults(form: HTMLFormElement, { title, detail, errors }: Faults): void {
  const box = form.querySelector<HTMLElement>("[data-fault]");
  if (!box) return;
  const list = box.querySelector("ul");
  const items = errors.map(({ at, message }) => {
    const control = controlOf(form, at);
    if (!control) return Object.assign(document.createElement("li"), { textContent: message });
    if (!control.hasAttribute("aria-invalid")) sayBelow(form, control, message);
    return linkTo(control, message);
  });
  list?.replaceChildren(...items);
  const [heading, sentence] = [box.querySelector("[data-title]"), box.querySelector("[data-detail]")];
  if (heading) heading.textContent = title;
  if (sentence) sentence.textContent = items.length > 0 ? "" : detail;
  box.removeAttribute("hidden");
  box.focus();
}
