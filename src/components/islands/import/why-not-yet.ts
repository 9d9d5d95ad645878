import { PARTS_MOST } from "#src/shapes/limits.ts";
import { rowNumbers } from "./count-words.ts";
import type { ImportView } from "./use-import.ts";

function linesOf(view: ImportView): number {
  return view.kind === "parts-list" ? view.counts.linesWithSuggestions : changesOf(view);
}

function changesOf(view: ImportView): number {
  const { counts } = view.difference;
  if ("revalued" in counts) return counts.added + counts.removed + counts.changed + counts.revalued;
  return counts.added + counts.changed + counts.confirmed;
}

function nothingNew(view: ImportView): boolean {
  return changesOf(view) === 0 && (view.kind === "price-list" || view.prices.offers === 0);
}

/** Why a list cannot be brought in yet, as the reason beside its button; `undefined` where it can. */
export function whyNotYet(view: ImportView): string | undefined {
  const must = view.questions.open.filter(({ level }) => level === "must").map(({ row }) => row);
  if (view.questions.must > 0) {
    const rows = rowNumbers(must);
    return view.questions.must === 1 ? `Settle row ${rows} first.` : `Settle rows ${rows} first.`;
  }
  if (view.kind === "price-list" && view.prices.unnamed > 0) return "Say first whose prices these are.";
  if (view.prices.faults.length > 0) return "Put the prices right that are named above.";
  if (view.kind === "parts-list" && linesOf(view) === 0)
    return "No row is a line yet. Look at what the columns mean.";
  if (view.kind === "parts-list" && linesOf(view) > PARTS_MOST)
    return `A kit's list holds at most ${PARTS_MOST} lines. Leave rows out, or join equal ones.`;
  if (nothingNew(view)) return "Everything in this list stands so already.";
  return undefined;
}

/** What the button does: "Bring in 23 lines". */
export function takeWords(view: ImportView): string {
  if (view.kind === "parts-list") {
    const lines = linesOf(view);
    return `Bring in ${lines} ${lines === 1 ? "line" : "lines"}`;
  }
  const offers = changesOf(view);
  return `Bring in ${offers} ${offers === 1 ? "price" : "prices"}`;
}

/** "21 lines match rev B, 2 are new, 1 leaves the list." */
export function thenWords(view: ImportView, revision: string): string {
  const { counts } = view.difference;
  if (!("revalued" in counts)) {
    const stay = counts.same + counts.confirmed;
    return `Then: ${counts.added} offers are new, ${counts.changed} have another price, ${stay} stay as they are.`;
  }
  const match = counts.unchanged + counts.changed + counts.revalued;
  const standing = match + counts.removed;
  const are = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;
  if (standing === 0) return `Then: ${are(counts.added, "line is new", "lines are new")}.`;
  const differ = counts.changed + counts.revalued;
  const parts = [
    `${are(match, "line matches", "lines match")} rev ${revision}`,
    ...(differ > 0 ? [are(differ, "of them changes", "of them change")] : []),
    are(counts.added, "is new", "are new"),
    are(counts.removed, "leaves the list", "leave the list"),
  ];
  return `Then: ${parts.join(", ")}.`;
}
