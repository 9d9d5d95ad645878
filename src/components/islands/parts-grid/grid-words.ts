import type { Plan } from "#src/shapes/plan.ts";

/** The keys of the grid, for the line below it. */
export function keyWords(canOpen: boolean, canEdit: boolean): string {
  const words = ["Arrow keys move. Shift and arrow select. Ctrl and C copies with units."];
  if (canEdit) words.unshift("Enter edits a cell.");
  if (canOpen) words.push("Enter on a line’s number opens all of its fields.");
  if (canEdit)
    words.push(
      "Ctrl and V pastes a block, Ctrl and D fills down. Insert begins a line, Alt and arrow moves one, Delete empties cells.",
    );
  return words.join(" ");
}

/** What the prices of the list stand for. */
export function basisWords(plan: Plan): string {
  const spare = plan.parts.some(({ spareRate, leastSpare }) => spareRate !== "0" || leastSpare > 0);
  return `Prices without tax and freight, for ${plan.run.kits} kits${spare ? " and their spares" : ""}`;
}
