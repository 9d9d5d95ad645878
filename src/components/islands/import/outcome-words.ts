import { countText } from "#src/components/amount-text.ts";
import type { Outcome } from "#src/server/bring-in/outcome.ts";

function counted(count: number, one: string, many: string): string[] {
  return count === 0 ? [] : [`${countText(count)} ${count === 1 ? one : many}`];
}

/** "21 lines added, 2 changed; 12 prices": what taking a list did. */
export function outcomeWords(outcome: Outcome | null): string {
  if (outcome === null) return "";
  const { lines, offers } = outcome;
  const ofLines = lines
    ? [
        ...counted(lines.added, "line added", "lines added"),
        ...counted(lines.changed, "changed", "changed"),
        ...counted(lines.removed, "removed", "removed"),
      ].join(", ")
    : "";
  const ofOffers = [
    ...counted(offers.added, "offer added", "offers added"),
    ...counted(offers.changed, "offer changed", "offers changed"),
    ...counted(offers.confirmed, "price confirmed", "prices confirmed"),
    ...counted(offers.newSuppliers.length, "supplier added", "suppliers added"),
  ].join(", ");
  return [ofLines, ofOffers].filter(Boolean).join("; ") || "nothing changed";
}
