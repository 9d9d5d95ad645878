import { type CellObject, read, SSF, type WorkBook, type WorkSheet } from "@e965/xlsx";
import { unzipSync, type Zippable, zipSync } from "fflate";
import { UPLOAD_COLUMNS, UPLOAD_ROWS, WORKBOOK_BYTES } from "#src/shapes/limits.ts";

export type WorkbookProblem = "upload-no-workbook" | "upload-too-packed" | "upload-empty";

/** A workbook as text: the cells of its first sheet that holds something, set out with tabs, a line to a row. */
export type WorkbookReading =
  | { ok: true; kind: "XLSX" | "ODS"; taken: string; others: string[]; text: string }
  | { ok: false; code: WorkbookProblem };

/** What tells of sheets and cells; pictures and the like are not even unpacked. */
const WANTED = /\.(xml|rels)$|^mimetype$/;

class TooPacked extends Error {}

/**
 * Unpacks what is wanted, at most as many bytes as are allowed, whatever the archive says of itself: a part that is
 * larger than it claims is cut off there.
 */
function unpacked(bytes: Uint8Array): Zippable {
  let total = 0;
  return unzipSync(bytes, {
    filter({ name, originalSize }) {
      if (!WANTED.test(name)) return false;
      total += originalSize;
      if (total > WORKBOOK_BYTES) throw new TooPacked();
      return true;
    },
  });
}

function kindOf(files: Zippable): "XLSX" | "ODS" | null {
  const names = Object.keys(files);
  if (names.some((name) => /^xl\/workbook\d*\.xml$/.test(name))) return "XLSX";
  return names.includes("content.xml") ? "ODS" : null;
}

/** The digits of a number without the noise of its binary form: 0.1 + 0.2 is 0.3. */
function digits(value: number): string {
  return String(Number(value.toPrecision(15)));
}

/**
 * A number as it is shown, with its currency or percent sign, but with all of its digits: a price of 0.0085 that the
 * sheet rounds to 0.01 is still 0.0085.
 */
function numberText(value: number, shown: string): string {
  const plain = shown.replaceAll(",", "");
  if (/^\d+(\.\d+)?$/.test(plain) && Number(plain) === value) return plain;
  const [, before = "", after = ""] =
    /^([\p{L}\p{Sc}\s]*)-?\d(?:[\d.,]*\d)?([\p{L}\p{Sc}%\s]*)$/u.exec(shown) ?? [];
  if (before + after === "" || /E[+-]?\d/i.test(shown)) return digits(value);
  return before + digits(after.includes("%") ? value * 100 : value) + after;
}

/** A day as 2026-03-09, whatever order its sheet shows it in; a time of day as it is shown. */
function cellText(cell: CellObject, date1904: boolean): string {
  const shown = cell.w ?? String(cell.v ?? "");
  if (cell.t !== "n" || typeof cell.v !== "number") return cell.t === "s" ? String(cell.v ?? "") : shown;
  if (cell.z !== undefined && SSF.is_date(String(cell.z)))
    return cell.v < 1 ? shown : SSF.format("yyyy-mm-dd", cell.v, { date1904 });
  return numberText(cell.v, shown);
}

/** One line each: the row keeps the number it has in the sheet. */
function field(text: string): string {
  const flat = text.replace(/[\r\n\t\v]+/g, " ").trim();
  return flat.includes('"') ? `"${flat.replaceAll('"', '""')}"` : flat;
}

function sheetText(sheet: WorkSheet | undefined, date1904: boolean): string {
  const rows = (sheet?.["!data"] ?? []) as (CellObject | undefined)[][];
  const lines: string[] = [];
  rows.slice(0, UPLOAD_ROWS + 1).forEach((row, at) => {
    const cells: string[] = [];
    row?.slice(0, UPLOAD_COLUMNS + 1).forEach((cell, column) => {
      if (cell) cells[column] = field(cellText(cell, date1904));
    });
    lines[at] = Array.from(cells, (cell) => cell ?? "").join("\t");
  });
  return Array.from(lines, (line) => (line ?? "").trimEnd())
    .join("\n")
    .trimEnd();
}

/** The sheets that hold letters or figures, those that can be seen before hidden ones. */
function filledSheets({ SheetNames, Sheets, Workbook }: WorkBook): { name: string; text: string }[] {
  const date1904 = Workbook?.WBProps?.date1904 === true;
  const isHidden = (at: number) => Boolean(Workbook?.Sheets?.[at]?.Hidden);
  return SheetNames.map((name, at) => ({
    name,
    text: sheetText(Sheets[name], date1904),
    hidden: isHidden(at),
  }))
    .filter(({ text }) => /[\p{L}\p{N}]/u.test(text))
    .sort((one, other) => Number(one.hidden) - Number(other.hidden));
}

/**
 * Reads an XLSX or ODS workbook: formulas by the values that were stored with them, numbers and days as plain text.
 * It trusts nothing, but it takes its time: call it in a thread that can be ended.
 */
export function readWorkbook(bytes: Uint8Array): WorkbookReading {
  try {
    const files = unpacked(bytes);
    const kind = kindOf(files);
    if (kind === null) return { ok: false, code: "upload-no-workbook" };
    // Packed again without compression, so that what is read next has the sizes that were checked.
    const plain = zipSync(files, { level: 0 });
    const book = read(plain, { type: "array", dense: true, cellNF: true, sheetRows: UPLOAD_ROWS + 1 });
    const [first, ...others] = filledSheets(book);
    if (!first) return { ok: false, code: "upload-empty" };
    return { ok: true, kind, taken: first.name, others: others.map(({ name }) => name), text: first.text };
  } catch (error) {
    return { ok: false, code: error instanceof TooPacked ? "upload-too-packed" : "upload-no-workbook" };
  }
}
