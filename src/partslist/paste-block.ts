import { readTabbed } from "./cells.ts";

/**
 * A block pasted from a spreadsheet: rows of cells, all of one width. Tabs part the cells; a cell with a
 * line break or tab stands in quotes. The line end that spreadsheets put last is no row. Text without a
 * tab is one column of lines; a comma in it parts nothing.
 */
export function pasteBlock(text: string): string[][] {
  const rows = readTabbed(text.replace(/(?:\r\n|\n|\r)$/, ""));
  const width = Math.max(1, ...rows.map((row) => row.length));
  return rows.map((row) => [...row, ...new Array<string>(width - row.length).fill("")]);
}
