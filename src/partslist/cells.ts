import Papa from "papaparse";
import { alignedColumns } from "./aligned-text.ts";
import { drawnTable } from "./drawn-table.ts";
import { firstWordColumns } from "./first-word.ts";
import { decimalMarkOf } from "./numbers.ts";
import type { Delimiter, Sheet, SheetRecord } from "./sheet.ts";
import { joinStrayCells } from "./stray-delimiters.ts";

const SIGNS = { comma: ",", semicolon: ";", tab: "\t", pipe: "|" } as const;
type Sign = keyof typeof SIGNS;

const SAMPLE_LINES = 400;
/** Characters in which a habit of writing blanks before quotes shows. */
const SPACED_QUOTES_SOUGHT = 20_000;
/** How often an unclosed quote may be taken as a plain character before quotes are given up. */
const QUOTE_REPAIRS_MOST = 40;

interface Grid {
  delimiter: Delimiter;
  rows: string[][];
  /** Physical line of each row, from 0, where it is not simply counted from the cells. */
  lines?: number[];
}

/** RFC 4180 by PapaParse; an unclosed quote is taken as a character of its line and the rest read anew. */
function parse(text: string, sign: string): string[][] {
  const rows: string[][] = [];
  let rest = text;
  for (let repairs = 0; ; repairs++) {
    const quotes = repairs < QUOTE_REPAIRS_MOST;
    const parsed = Papa.parse<string[]>(rest, {
      delimiter: sign,
      newline: newlineOf(rest),
      quoteChar: quotes ? '"' : "\u0000",
    });
    const unclosed = unclosedRow(parsed);
    if (unclosed === undefined) return append(rows, parsed.data);
    append(rows, parsed.data.slice(0, unclosed));
    const lines = rest.split("\n");
    const at = parsed.data.slice(0, unclosed).reduce((sum, row) => sum + linesOf(row), 0);
    rows.push((lines[at] ?? "").replace(/\r$/, "").split(sign));
    rest = lines.slice(at + 1).join("\n");
    if (at + 1 >= lines.length) return rows;
  }
}

/** The first row whose quote is not closed, or is closed only by a quote of a later line. */
function unclosedRow(parsed: Papa.ParseResult<string[]>): number | undefined {
  return parsed.errors.find(
    ({ code, row }) =>
      code === "MissingQuotes" ||
      (code === "InvalidQuotes" && parsed.data[row ?? -1]?.some((cell) => cell.includes("\n"))),
  )?.row;
}

function append(rows: string[][], more: string[][]): string[][] {
  for (const row of more) rows.push(row);
  return rows;
}

function newlineOf(text: string): "\r\n" | "\n" | "\r" {
  if (text.includes("\r\n")) return "\r\n";
  return !text.includes("\n") && text.includes("\r") ? "\r" : "\n";
}

/** Line ends of one kind, so that a file put together from several reads as one. */
function oneLineEnd(text: string): string {
  const crlf = text.includes("\r\n");
  if (!crlf || !/(?:^|[^\r])\n/.test(text)) return text;
  return text.replace(/\r\n/g, "\n");
}

function linesOf(row: readonly string[]): number {
  let lines = 1;
  for (const cell of row) if (cell.includes("\n")) lines += cell.split("\n").length - 1;
  return lines;
}

/** Share of the rows that have the commonest width, and that width; the measure of a delimiter. */
function evenness(rows: readonly string[][]): { width: number; share: number; score: number } {
  const widths = new Map<number, number>();
  let filled = 0;
  for (const row of rows) {
    if (row.every((cell) => cell.trim() === "")) continue;
    filled++;
    widths.set(row.length, (widths.get(row.length) ?? 0) + 1);
  }
  let width = 1;
  let most = 0;
  for (const [columns, count] of widths) if (columns > 1 && count > most) [width, most] = [columns, count];
  const share = filled === 0 ? 0 : most / filled;
  return { width, share, score: share * Math.log2(width + 1) };
}

function bestSign(sample: string): { sign: Sign; width: number; share: number; score: number } | null {
  let best: { sign: Sign; width: number; share: number; score: number } | null = null;
  for (const sign of Object.keys(SIGNS) as Sign[]) {
    if (!sample.includes(SIGNS[sign])) continue;
    const rows = parse(sample, SIGNS[sign]);
    const even = evenness(rows);
    // A heading parted by another sign than its rows is not this sign's doing.
    const first = rows.find((row) => row.some((cell) => cell.trim() !== ""));
    const score = first && first.length === 1 ? even.score * 0.8 : even.score;
    if (even.width > 1 && (best === null || score > best.score)) best = { sign, ...even, score };
  }
  return best;
}

/** `"R1", "R2"` with a blank after the comma: the blank hides the quote from the grammar. */
function closeUpQuotes(text: string, sign: string): string {
  const escaped = sign === "|" ? "\\|" : sign;
  const spaced = new RegExp(`(^|${escaped}) +(?="[^"\\r\\n]*" *(?:${escaped}|\\r?$))`, "gm");
  const seen = sign !== "\t" && spaced.test(text.slice(0, SPACED_QUOTES_SOUGHT));
  return seen ? text.replace(spaced, "$1") : text;
}

function delimited(text: string, sign: Sign): Grid {
  const grid = { delimiter: sign, rows: parse(text, SIGNS[sign]) };
  const closed = closeUpQuotes(text, SIGNS[sign]);
  if (closed === text) return grid;
  const again = { delimiter: sign, rows: parse(closed, SIGNS[sign]) };
  return evenness(again.rows).share > evenness(grid.rows).share ? again : grid;
}

/** Each whole line in quotes of its own, as a spreadsheet writes a list that was pasted into one column. */
function unwrapLines(text: string): string {
  if (!text.startsWith('"')) return text;
  const lines = text.split(/\r?\n/);
  const filled = lines.filter((line) => line.trim() !== "");
  const wrapped = filled.filter((line) => /^"(?:[^"]|"")*[,;\t](?:[^"]|"")*"[,;]*$/.test(line));
  if (filled.length < 2 || wrapped.length < filled.length * 0.8) return text;
  return lines
    .map((line) =>
      /^"(?:[^"]|"")*"[,;]*$/.test(line) ? line.replace(/^"|"[,;]*$/g, "").replace(/""/g, '"') : line,
    )
    .join("\n");
}

/** Tabs that set columns out stand in runs of different length; tabs that part cells stand alone. */
function tabsAreRuns(sample: string): boolean {
  const lines = sample.split("\n").filter((line) => /\S\t+\S/.test(line));
  const runs = lines.filter((line) => /\S\t{2,}\S/.test(line)).length;
  const counts = new Set(lines.map((line) => line.split("\t").length));
  return runs > lines.length * 0.3 && counts.size > 1;
}

function chooseGrid(text: string): Grid {
  const declared = /^(?:\s*)"?sep=(.)"?\s*?(?:\r?\n|$)/i.exec(text)?.[1];
  for (const sign of Object.keys(SIGNS) as Sign[]) if (SIGNS[sign] === declared) return delimited(text, sign);
  const sample = text.split("\n", SAMPLE_LINES).join("\n");
  const drawn = drawnTable(sample) === null ? null : drawnTable(text);
  if (drawn) return { delimiter: "drawn-table", rows: drawn.rows, lines: drawn.lines };
  const best = bestSign(sample);
  if (best && best.width >= 3 && best.share >= 0.6) {
    const tabs = best.sign === "tab" && tabsAreRuns(sample) ? alignedColumns(text) : null;
    return tabs ?? delimited(text, best.sign);
  }
  if (best?.sign === "tab" && best.share >= 0.4 && !tabsAreRuns(sample)) return delimited(text, "tab");
  const aligned = alignedColumns(text);
  const alignedScore = aligned ? evenness(aligned.rows).score : 0;
  if (aligned && alignedScore > (best?.score ?? 0)) return aligned;
  if (best && best.share >= 0.45) return delimited(text, best.sign);
  const words = firstWordColumns(text);
  if (words) return { delimiter: "first-word", rows: words };
  if (best && best.share >= 0.3) return delimited(text, best.sign);
  return { delimiter: "one-column", rows: text.split(/\r?\n|\r/).map((line) => [line]) };
}

function number(grid: Grid): SheetRecord[] {
  let line = 1;
  return grid.rows.map((cells, record) => {
    const row = grid.lines ? (grid.lines[record] ?? 0) + 1 : line;
    line += linesOf(cells);
    return { record, row, cells };
  });
}

/**
 * Reads a text into records of cells: finds the delimiter (or fixed columns, runs of tabs, a drawn
 * table), keeps quoted line breaks, and joins cells again that a delimiter inside them tore apart where
 * the neighbouring columns leave only one way. Cells are as written, blanks included. Never fails: a
 * text without columns gives records of one cell.
 *
 * CSV grammar: RFC 4180, section 2, by PapaParse.
 */
export function readCells(text: string): Sheet {
  const clean = oneLineEnd(unwrapLines(text.replace(/^\uFEFF/, "").replaceAll("\u0000", ""))).replace(
    /(?:\r\n|\n|\r)$/,
    "",
  );
  if (clean === "")
    return {
      records: [],
      dialect: { delimiter: "one-column", decimalMark: null, repaired: false },
      columns: 0,
    };
  const grid = chooseGrid(clean);
  const sign = grid.delimiter in SIGNS ? SIGNS[grid.delimiter as Sign] : null;
  const repaired = sign === null ? false : joinStrayCells(grid.rows, sign);
  const records = number(grid);
  let columns = 0;
  for (const record of records) columns = Math.max(columns, record.cells.length);
  const decimalMark = decimalMarkOf(
    records.slice(0, SAMPLE_LINES).flatMap((record) => record.cells.filter(isShort)),
  );
  return { records, dialect: { delimiter: grid.delimiter, decimalMark, repaired }, columns };
}

/** A cell that is a number with perhaps a sign or unit round it; part numbers say nothing of the decimal mark. */
function isShort(cell: string): boolean {
  return cell.length < 16 && /^\s*[^\d\s]{0,3}\s*\d*[.,]\d+\s*[^\d\s]{0,4}\s*$/.test(cell);
}

/** Rows of a block parted by tabs and nothing else; for pasting. */
export function readTabbed(text: string): string[][] {
  return parse(oneLineEnd(text), "\t");
}
