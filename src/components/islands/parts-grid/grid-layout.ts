import type { ColumnKey } from "./cell-text.ts";

/** How the columns stand in the room there is. */
export interface GridLayout {
  keys: readonly ColumnKey[];
  /** Part and offer on two lines each. */
  folded: boolean;
  width: (key: ColumnKey) => number;
}

/** What a column takes in pixels where each row is one line: its longest usual words and the padding. */
const ONE_LINE: Partial<Record<ColumnKey, number>> = {
  place: 42,
  designators: 92,
  part: 240,
  bands: 66,
  package: 140,
  drawer: 62,
  supplier: 186,
  buy: 50,
  each: 58,
  perKit: 72,
  state: 106,
  mark: 110,
  class: 150,
  note: 180,
  partNumber: 170,
  stock: 90,
};

/** With two lines to a row the long ones need less. */
const TWO_LINES: Partial<Record<ColumnKey, number>> = { part: 156, package: 104, supplier: 112 };

const QUANTITY = 51;
/** The column of check boxes before the others. */
export const CHECK_BOX = 32;

/** What can be read on the line's own form, the most easily missed last. */
const GIVES_WAY: readonly ColumnKey[] = ["each", "package", "buy", "drawer", "bands", "supplier"];

function oneLine(key: ColumnKey): number {
  return ONE_LINE[key] ?? QUANTITY;
}

function twoLines(key: ColumnKey): number {
  return TWO_LINES[key] ?? oneLine(key);
}

/**
 * The columns that find room in so many pixels: first in full, then with part and offer on two lines, then without
 * what the line's own form shows, so that "Per kit" and "State" stay in view. Columns asked for besides the usual
 * ones never give way; the grid then scrolls.
 */
export function gridLayout(keys: readonly ColumnKey[], room: number): GridLayout {
  const taken = (some: readonly ColumnKey[], width: (key: ColumnKey) => number) =>
    some.reduce((sum, key) => sum + width(key), CHECK_BOX);
  if (taken(keys, oneLine) <= room) return { keys, folded: false, width: oneLine };
  let left = keys;
  for (const key of GIVES_WAY) {
    if (taken(left, twoLines) <= room) break;
    left = left.filter((one) => one !== key);
  }
  return { keys: left, folded: true, width: twoLines };
}
