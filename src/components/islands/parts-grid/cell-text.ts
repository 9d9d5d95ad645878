import { countText } from "#src/components/amount-text.ts";
import { CLASS_WORDS, MARK_WORDS } from "#src/components/part-words.ts";
import type { LineRow } from "./grid-rows.ts";
import { type CellColumn, partText } from "./read-cell.ts";

/** Every column of the grid: those one writes in, and those that are worked out. */
export type ColumnKey =
  | CellColumn
  | "place"
  | "bands"
  | "supplier"
  | "buy"
  | "each"
  | "perKit"
  | "state"
  | "stock";

/** Columns that say what something costs: only for those who may see money. */
export const MONEY_COLUMNS: readonly ColumnKey[] = ["supplier", "buy", "each", "perKit"];

const EDITABLE: readonly string[] = [
  "designators",
  "part",
  "package",
  "drawer",
  "class",
  "mark",
  "note",
  "partNumber",
];

export function isCellColumn(key: string): key is CellColumn {
  return EDITABLE.includes(key) || key.startsWith("quantity:");
}

/** The columns of a list in their order. */
export function columnKeys(
  editions: readonly { id: string }[],
  money: boolean,
  more: readonly ColumnKey[],
): ColumnKey[] {
  const quantities = editions.map(({ id }): ColumnKey => `quantity:${id}`);
  const all: ColumnKey[] = [
    "place",
    "designators",
    ...quantities,
    "part",
    "bands",
    "package",
    "drawer",
    "supplier",
    "buy",
    "each",
    "perKit",
    "state",
    ...more,
  ];
  return all.filter((key) => money || !MONEY_COLUMNS.includes(key));
}

/** What stands in a cell as text: for copying with units, for the editor, and to see whether it changed. */
export function cellText({ line, money, ...row }: LineRow, key: ColumnKey): string {
  if (key.startsWith("quantity:")) return String(line.quantities[key.slice(9)] || "");
  switch (key) {
    case "place":
      return String(row.place);
    case "designators":
      return row.designators;
    case "part":
      return partText(line.part);
    case "bands":
      return row.bands?.colours.join(" ") ?? "";
    case "package":
      return line.part.package;
    case "drawer":
      return line.part.drawer;
    case "class":
      return CLASS_WORDS[line.part.class].one;
    case "mark":
      return MARK_WORDS[line.mark];
    case "note":
      return line.note;
    case "partNumber":
      return line.part.manufacturerPartNumber;
    case "stock":
      return line.part.freeStock === 0 ? "" : countText(line.part.freeStock);
    case "state":
      return row.state.word;
    case "supplier":
      return money === null ? "" : [money.supplier, money.orderCode].filter(Boolean).join(" ");
    case "buy":
      if (money?.boughtWith) return `with ${money.boughtWith}`;
      return money === null || money.buy === 0 ? "" : countText(money.buy);
    case "each":
      return money?.boughtWith ? "" : (money?.each ?? "");
    case "perKit":
      return money?.boughtWith ? "" : (money?.perKit ?? "");
    default:
      return "";
  }
}
