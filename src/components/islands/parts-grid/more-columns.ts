import { moduleStore } from "#src/components/islands/plan/module-store.ts";
import type { ColumnKey } from "./cell-text.ts";

/** Columns that are shown on request, in their order. */
export const MORE_COLUMNS: readonly { key: ColumnKey; label: string }[] = [
  { key: "mark", label: "Mark" },
  { key: "class", label: "Kind" },
  { key: "partNumber", label: "Maker’s part number" },
  { key: "note", label: "Note" },
  { key: "stock", label: "On the shelf" },
];

const REMEMBERED = "tinpenny.parts-columns";

function remembered(): ColumnKey[] {
  if (typeof localStorage === "undefined") return [];
  const named = (localStorage.getItem(REMEMBERED) ?? "").split(" ");
  return MORE_COLUMNS.map(({ key }) => key).filter((key) => named.includes(key));
}

/** The columns this browser shows besides the usual ones. */
export const moreColumns = moduleStore<readonly ColumnKey[]>(remembered());

export function showColumn(key: ColumnKey, shown: boolean): void {
  const now = moreColumns.now();
  const next = MORE_COLUMNS.map((one) => one.key).filter((one) => (one === key ? shown : now.includes(one)));
  localStorage.setItem(REMEMBERED, next.join(" "));
  moreColumns.put(next);
}
