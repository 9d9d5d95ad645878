/** Looks of ruled tables as classes, for React and Astro. Numbers stand right, text left, nothing is centred. */
export const TABLE = "type-table w-full border-collapse";

/** Column head: bottom-aligned, over a line of ink. */
export const HEAD_ROW = "rule-head type-label text-ink-2";
export const HEAD_CELL = "px-2 pb-2 align-bottom font-semibold first:pl-2 last:pr-2";

export type RowHeight = "dense" | "ordinary" | "two-lines";
const HEIGHTS: Record<RowHeight, string> = { dense: "h-[37px]", ordinary: "h-10", "two-lines": "h-[54px]" };

/** A row: a hairline below; the chosen one on petrol-wash with a bar at its left. */
export function rowLook(height: RowHeight = "ordinary", chosen = false): string {
  const ground = chosen ? "bg-petrol-wash [box-shadow:inset_4px_0_0_var(--color-petrol)]" : "hover:bg-sheet";
  return `hairline-b ${HEIGHTS[height]} ${ground}`;
}

export const CELL = "px-2 py-1";
export const NUMBER = "text-right whitespace-nowrap";

/** The total: a line of ink above; its own figure takes `rule-result`. */
export const TOTAL_ROW = "h-11 border-t-[1.5px] border-ink font-semibold";
