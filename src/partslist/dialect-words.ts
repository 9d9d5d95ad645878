import type { Delimiter, Dialect } from "./sheet.ts";

const PARTED: Readonly<Record<Delimiter, string>> = {
  comma: "Commas between cells",
  semicolon: "Semicolons between cells",
  tab: "Tabs between cells",
  pipe: "Upright strokes between cells",
  "tab-runs": "Columns set out with tabs",
  "fixed-width": "Columns set out with blanks",
  "drawn-table": "A drawn table",
  "first-word": "One part to a line",
  "one-column": "One column",
};

/** What the page says of how a file was read: "Semicolons between cells, decimal commas, read as such." */
export function dialectWords(dialect: Dialect): string {
  const decimals = dialect.decimalMark === null ? "" : `, decimal ${dialect.decimalMark}s`;
  const repaired = dialect.repaired ? " Cells torn apart by a sign inside them were joined again." : "";
  return `${PARTED[dialect.delimiter]}${decimals}, read as such.${repaired}`;
}
