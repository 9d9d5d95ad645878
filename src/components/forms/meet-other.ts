import { readForm } from "./read-form.ts";

type Row = Readonly<Record<string, unknown>>;
type Control = HTMLInputElement | HTMLSelectElement | HTMLTextAreaElement;

/** A field that both we and another person changed, in words. */
export interface FormDifference {
  name: string;
  label: string;
  yours: string;
  theirs: string;
}

const same = (one: unknown, other: unknown) => JSON.stringify(one ?? null) === JSON.stringify(other ?? null);

function controlIn(form: HTMLFormElement, name: string): Control | null {
  return form.elements.namedItem(name) as Control | null;
}

/** What the form held when the page was made. */
function asMade(form: HTMLFormElement): HTMLFormElement {
  const copy = form.cloneNode(true) as HTMLFormElement;
  copy.reset();
  return copy;
}

/** The form filled in as the row now stands, so that both are read, and written, the same way. */
function asTheyHaveIt(form: HTMLFormElement, current: Row): HTMLFormElement {
  const copy = asMade(form);
  for (const [name, value] of Object.entries(current)) put(controlIn(copy, name), value);
  return copy;
}

function put(control: Control | null, value: unknown): void {
  if (control instanceof HTMLInputElement && control.type === "checkbox") control.checked = value === true;
  else if (control) control.value = value === null || value === undefined ? "" : String(value);
}

/** An entry as the form shows it: the words of a choice, yes and no of a check box. */
function inWords(control: Control | null): string {
  if (control instanceof HTMLInputElement && control.type === "checkbox")
    return control.checked ? "yes" : "no";
  const chosen = control instanceof HTMLSelectElement ? control.selectedOptions[0]?.text : control?.value;
  return chosen?.trim() || "nothing";
}

function labelOf(control: Control | null, name: string): string {
  return control?.labels?.[0]?.textContent?.trim() || name;
}

/**
 * Brings a form that met a newer row up to it: its version and every field that only they changed become theirs.
 * Returns the fields that both changed; with none left the form can be sent again.
 */
export function meetOther(form: HTMLFormElement, current: Row): FormDifference[] {
  const theirForm = asTheyHaveIt(form, current);
  const [ours, base, theirs] = [form, asMade(form), theirForm].map((one) => readForm(one).body as Row);
  const differences: FormDifference[] = [];
  for (const [name, yours] of Object.entries(ours ?? {})) {
    const control = controlIn(form, name);
    if (!(name in current) || same(yours, theirs?.[name])) continue;
    if (name === "version" || same(yours, base?.[name])) put(control, current[name]);
    else if (!same(theirs?.[name], base?.[name]))
      differences.push({
        name,
        label: labelOf(control, name),
        yours: inWords(control),
        theirs: inWords(controlIn(theirForm, name)),
      });
  }
  return differences;
}

/** Shows their values in the fields that both changed. */
export function takeTheirs(
  form: HTMLFormElement,
  current: Row,
  differences: readonly FormDifference[],
): void {
  for (const { name } of differences) put(controlIn(form, name), current[name]);
}
