import { clockTime } from "#src/components/clock-time.ts";
import { type FormDifference, takeTheirs } from "./meet-other.ts";
import { clearFaults, showFaults } from "./show-faults.ts";

/** The row as somebody else left it, with who and when. */
export type CurrentRow = Readonly<Record<string, unknown>> & {
  changedBy?: string | null;
  changedAt?: number | null;
};

/** Shows both values of every field that two people changed, and the two ways on. `again` sends the form as it is. */
export function showClash(
  form: HTMLFormElement,
  current: CurrentRow,
  differences: readonly FormDifference[],
  again: () => void,
): void {
  const { changedBy, changedAt } = current;
  const at = typeof changedAt === "number" ? ` at ${clockTime(changedAt)}` : "";
  const errors = differences.map(({ name, label, yours, theirs }) => ({
    at: `difference.${name}`,
    message: `${label}. Yours: ${yours}. Theirs: ${theirs}.`,
  }));
  showFaults(form, { title: `${changedBy ?? "Somebody"} changed this${at}.`, detail: "", errors });
  form.querySelector("[data-settle]")?.removeAttribute("hidden");
  const settle = (keep: "ours" | "theirs") => () => {
    clearFaults(form);
    if (keep === "theirs") takeTheirs(form, current, differences);
    else again();
  };
  for (const keep of ["ours", "theirs"] as const) {
    const button = form.querySelector<HTMLButtonElement>(`[data-keeps="${keep}"]`);
    if (button) button.onclick = settle(keep);
  }
}
