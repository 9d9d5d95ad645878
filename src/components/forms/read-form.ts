import { readMoney } from "#src/components/money-entry.ts";

type Control = HTMLInputElement | HTMLSelectElement | HTMLTextAreaElement;

/** An entry that cannot be read as its kind, told before anything is sent. */
export interface EntryFault {
  at: string;
  message: string;
}

function isControl(element: Element): element is Control {
  return /^(INPUT|SELECT|TEXTAREA)$/.test(element.tagName);
}

/** An empty field: `data-empty` says whether it is left out, null, or sent as it is. */
function whenEmpty(control: Control): unknown {
  if (control.dataset.empty === "omit") return undefined;
  return control.dataset.empty === "null" ? null : "";
}

function entryOf(control: Control, faults: EntryFault[]): unknown {
  const text = control.value;
  if (text.trim() === "" && control.dataset.as !== "flag") return whenEmpty(control);
  switch (control.dataset.as) {
    case "flag":
      return (control as HTMLInputElement).checked;
    case "number":
      return Number(text);
    case "money": {
      const read = readMoney(text);
      if (!read.ok) faults.push({ at: control.name, message: read.sentence });
      return read.ok ? read.value : text;
    }
    default:
      return text;
  }
}

/**
 * What a form holds, as the JSON its route takes. `data-as` of a control says what it is: text (unless told),
 * `number`, `money`, `flag` (a check box), or `list` (check boxes of one name: the values that are checked).
 */
export function readForm(form: HTMLFormElement): { body: Record<string, unknown>; faults: EntryFault[] } {
  const body: Record<string, unknown> = {};
  const faults: EntryFault[] = [];
  for (const control of [...form.elements].filter(isControl)) {
    if (control.name === "" || control.disabled) continue;
    const checked = "checked" in control && control.checked;
    if (control.type === "radio" && !checked) continue;
    if (control.dataset.as === "list") {
      const before = (body[control.name] as string[] | undefined) ?? [];
      body[control.name] = checked ? [...before, control.value] : before;
      continue;
    }
    const value = entryOf(control, faults);
    if (value !== undefined) body[control.name] = value;
  }
  return { body, faults };
}
