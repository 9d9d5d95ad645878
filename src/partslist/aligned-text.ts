import type { Delimiter } from "./sheet.ts";

const TAB_STOP = 8;

interface Piece {
  start: number;
  end: number;
  text: string;
}

/** Columns of a text set out with blanks or runs of tabs, found from where the pieces of its lines stand. */
export function alignedColumns(text: string): { delimiter: Delimiter; rows: string[][] } | null {
  const lines = text.split(/\r?\n|\r/);
  const tabbed = lines.some((line) => /\S\t+\S/.test(line));
  const pieces = lines.map((line) => piecesOf(expandTabs(line), tabbed ? line : null));
  const table = pieces.filter((line) => line.length > 1);
  const filled = pieces.filter((line) => line.length > 0);
  if (table.length < 3 || table.length < filled.length * 0.6) return null;
  const delimiter = tabbed ? "tab-runs" : "fixed-width";
  const columns = columnsOf(table);
  if (columns.length < 2) return null;
  return { delimiter, rows: pieces.map((line) => place(line, columns)) };
}

function expandTabs(line: string): string {
  if (!line.includes("\t")) return line;
  let wide = "";
  for (const letter of line)
    wide += letter === "\t" ? " ".repeat(TAB_STOP - (wide.length % TAB_STOP)) : letter;
  return wide;
}

/** Pieces parted by two blanks or more; in a text with tabs, by tabs only, so that names keep their blanks. */
function piecesOf(wide: string, tabbed: string | null): Piece[] {
  if (tabbed?.includes("\t")) return tabPieces(tabbed);
  return [...wide.matchAll(/\S+(?: \S+)*/g)].map((found) => ({
    start: found.index,
    end: found.index + found[0].length,
    text: found[0],
  }));
}

function tabPieces(line: string): Piece[] {
  const found: Piece[] = [];
  let at = 0;
  for (const part of line.split(/(\t+)/)) {
    if (part.startsWith("\t")) at += TAB_STOP - (at % TAB_STOP) + (part.length - 1) * TAB_STOP;
    else {
      if (part.trim() !== "") found.push({ start: at, end: at + part.length, text: part.trim() });
      at += part.length;
    }
  }
  return found;
}

/**
 * Where the columns begin: after each gap that at most a few lines write across, two places wide.
 * A heading or note set over the table does not hide a gap.
 */
function columnsOf(table: readonly Piece[][]): number[] {
  const width = Math.max(...table.map((line) => line.at(-1)?.end ?? 0));
  const used = new Array<number>(width + 1).fill(0);
  for (const line of table)
    for (const piece of line) for (let at = piece.start; at < piece.end; at++) used[at] = (used[at] ?? 0) + 1;
  const across = Math.floor(table.length * 0.04);
  const starts: number[] = [];
  let gap = 2;
  for (let at = 0; at <= width; at++) {
    if ((used[at] ?? 0) <= across) gap++;
    else {
      if (gap >= 2) starts.push(at);
      gap = 0;
    }
  }
  return starts;
}

function place(line: readonly Piece[], columns: readonly number[]): string[] {
  if (line.length === 0) return [""];
  const cells: string[] = [];
  for (const piece of line) {
    let column = 0;
    while (column + 1 < columns.length && (columns[column + 1] ?? 0) < piece.end) {
      if ((columns[column + 1] ?? 0) > piece.start && piece.end - (columns[column + 1] ?? 0) < 1) break;
      if ((columns[column + 1] ?? 0) > piece.start) break;
      column++;
    }
    while (cells.length < column) cells.push("");
    cells[column] = cells[column] ? `${cells[column]} ${piece.text}` : piece.text;
  }
  if (line.length > 1) while (cells.length < columns.length) cells.push("");
  return cells;
}
