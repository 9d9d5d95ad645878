/** How the cells of a text are parted; words for the page come from `dialect-words.ts`. */
export const DELIMITERS = [
  "comma",
  "semicolon",
  "tab",
  "pipe",
  "tab-runs",
  "fixed-width",
  "drawn-table",
  "first-word",
  "one-column",
] as const;
export type Delimiter = (typeof DELIMITERS)[number];

export type DecimalMark = "point" | "comma";

/** One record of a list: its cells, and where in the file it stands. */
export interface SheetRecord {
  /** Counted from 0 over all records, blank ones too. */
  record: number;
  /** The line of the file on which it begins, counted from 1 as a text editor does. */
  row: number;
  cells: string[];
}

export interface Dialect {
  delimiter: Delimiter;
  /** `null` where no cell holds a decimal fraction. */
  decimalMark: DecimalMark | null;
  /** True where a cell was put together again because a delimiter stood in it without quotes. */
  repaired: boolean;
}

export interface Sheet {
  records: SheetRecord[];
  dialect: Dialect;
  /** The widest record. */
  columns: number;
}
