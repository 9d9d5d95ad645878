import { counted, listed } from "#src/components/count-words.ts";
import type { EditionLoss } from "#src/server/edition-changes.ts";

/** What goes with an edition, in sentences. */
export function lossWords({ lines, onlyHere, forNothing }: EditionLoss): string {
  const told = [
    lines === 0
      ? "No line has a quantity in it."
      : `The quantities of ${counted(lines, "line", "lines").toLowerCase()} in it go with it.`,
    onlyHere > 0 &&
      `${counted(onlyHere, "line is", "lines are")} in no other edition and will have no quantity.`,
    forNothing.length > 0 &&
      `${listed(forNothing)} ${forNothing.length === 1 ? "was" : "were"} for this edition alone and will be for none.`,
    "This cannot be taken back.",
  ];
  return told.filter(Boolean).join(" ");
}
