import type { Delimiter } from "./sheet.ts";

const TAB_STOP = 8;
/** Share of the lines that may write across a gap without hiding it: a title set over the table, a long cell. */
const ACROSS = 0.04;
/** The same where a word of the heading stands after a gap of its own. */
const ACROSS_HEADED = 0.15;

/**
 * Columns of a text set out with blanks or runs of tabs, found from the places that stay empty from top to
 * bottom. `null` where fewer than two columns show.
 */
export function alignedColumns(text: string): { delimiter: Delimiter; rows: string[][] } | null {
  const raw = text.split(/\r?\n|\r/);
  const tabbed = raw.filter((line) => /\S\t+\S/.test(line)).length;
  const lines = raw.map((line) => expandTabs(line).trimEnd());
  const filled = lines.filter((line) => line !== "");
  const table = filled.filter((line) => /\S {2,}\S/.test(line) || (tabbed > 0 && /\S +\S/.test(line)));
  if (table.length < 3 || table.length < filled.length * 0.6) return null;
  const starts = columnStarts(table);
  if (starts.length < 2) return null;
  return {
    delimiter: tabbed > table.length * 0.5 ? "tab-runs" : "fixed-width",
    rows: lines.map((line) => cut(line, starts)),
  };
}

function expandTabs(line: string): string {
  if (!line.includes("\t")) return line;
  let wide = "";
  for (const letter of line)
    wide += letter === "\t" ? " ".repeat(TAB_STOP - (wide.length % TAB_STOP)) : letter;
  return wide;
}

/** A column begins after a gap of two places, or of one where a word of the first line begins there too. */
function columnStarts(table: readonly string[]): number[] {
  const width = Math.max(...table.map((line) => line.length));
  const used = new Array<number>(width + 1).fill(0);
  for (const line of table)
    for (let at = 0; at < line.length; at++) if (line[at] !== " ") used[at] = (used[at] ?? 0) + 1;
  const across = Math.floor(table.length * ACROSS);
  const acrossHeaded = Math.max(1, Math.floor(table.length * ACROSS_HEADED));
  const heading = table[0] ?? "";
  const starts: number[] = [];
  let gap = 2;
  for (let at = 0; at <= width; at++) {
    const begins = /\S/.test(heading[at] ?? "") && (heading[at - 1] ?? " ") === " ";
    const apart = begins && (heading[at - 2] ?? " ") === " ";
    if ((used[at] ?? 0) <= across && !begins) {
      gap++;
      continue;
    }
    if (apart && gap === 0 && (used[at - 1] ?? 0) <= acrossHeaded) gap = 2;
    if (gap >= 2 || (gap > 0 && begins)) starts.push(at);
    gap = 0;
  }
  return starts;
}

/** Cuts a line at the columns. A text that runs across a column's beginning stays whole in the column where it starts. */
function cut(line: string, starts: readonly number[]): string[] {
  if (line.trim() === "") return [""];
  const bounds = starts.filter((start, at) => at === 0 || !runsAcross(line, start));
  const cells = starts.map(() => "");
  bounds.forEach((start, at) => {
    const from = at === 0 ? 0 : start;
    cells[starts.indexOf(start)] = line.slice(from, bounds[at + 1] ?? line.length).trim();
  });
  return cells.filter((cell) => cell !== "").length === 1 && !/\S {2,}\S/.test(line)
    ? whole(line, cells)
    : partList(cells);
}

/** A cell longer than its column, or a list that goes on: "R11, R12". */
function runsAcross(line: string, start: number): boolean {
  if (start >= line.length) return false;
  return (line[start - 1] ?? " ") !== " " || /[,;]$/.test(line.slice(Math.max(0, start - 2), start - 1));
}

/** Words behind a list of designators that ran into the next column belong there: "R11, R12 RESISTOR". */
function partList(cells: string[]): string[] {
  cells.forEach((cell, column) => {
    const found = /^((?:[A-Za-z]{1,4}\d+[,;] ?)+[A-Za-z]{1,4}\d+) (\S.*)$/.exec(cell);
    if (!found || cells[column + 1] !== "") return;
    cells[column] = found[1] ?? "";
    cells[column + 1] = found[2] ?? "";
  });
  return cells;
}

/** A line of one text: in its column if it is short, else a title over the table. */
function whole(line: string, cells: string[]): string[] {
  return /^\S/.test(line) && (cells[0] ?? "") !== "" ? [line.trim()] : cells;
}
