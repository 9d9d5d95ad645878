import { readDesignators } from "./designators.ts";
import type { SkipReason } from "./draft.ts";
import { isFrameLine } from "./drawn-table.ts";
import { cellAt, type ListColumns } from "./list-columns.ts";
import type { Meaning } from "./meanings.ts";
import type { SheetRecord } from "./sheet.ts";

/** What a record is: a part, a part only at second sight, or no part. */
export type RowKind =
  | { kind: "part" }
  | { kind: "skip"; reason: SkipReason }
  | { kind: "doubtful"; code: "looks-like-total" | "looks-like-remark" | "hardly-a-part" | "commented-out" };

/** Facts about the whole list that a single row is judged by. */
export interface ListShape {
  columns: ListColumns;
  heading: readonly string[] | null;
  /** Share of the rows that name a part in which a quantity stands. */
  quantityFill: number;
  /** True where most rows hold designators. */
  designated: boolean;
}

const NAMING: readonly Meaning[] = ["value", "description", "part-number", "class", "order-code", "package"];
const TOTAL =
  /^(?:(?:grand |sub ?|sub-)?totals?|total (?:cost|price|parts|components|qty|quantity|bom|eur|usd|ht|ttc)|sum(?:me)?|(?:gesamt|zwischen)(?:summe|preis|kosten|betrag)?|summa|suma|razem|łącznie|celkem|součet|totale?|totaal|subtotale?|montant total|importe total|total geral|итого|всего|сумма|合計|合计|总计|总价|小計|小计)\s*[:：.]?(?:\s*[€$£]?\s*[\d.,]+\s*[€$£]?)?$/i;
const REMARK =
  /^(?:notes?|remarks?|hinweise?|anmerkung(?:en)?|bemerkung(?:en)?|achtung|remarques?|notas?|observa\w+|avvertenz\w+|opmerking\w*|uwag[ai]|poznámk[ay]|anm(?:ärkning)?|примечани[ея]|備考|备注|注)\b\s*[:：]?|^\*+\s*\S|^\(?\d\)\s+\S.{20,}/i;
const COMMENT = /^(?:\/\/|#(?!\d*$)|--(?!-)|;)\s*\S/;
const TITLE_LENGTH = 60;

/** Frees the common case of any doubt: the list as a whole is looked at once. */
export function listShape(records: readonly SheetRecord[], columns: ListColumns): ListShape {
  const designators = columns.first("designators");
  const quantity = columns.first("quantity");
  const heading = columns.headerRecord === null ? null : (records[columns.headerRecord]?.cells ?? null);
  let named = 0;
  let counted = 0;
  let designated = 0;
  for (const { record, cells } of records) {
    if (columns.headerRecord !== null && record <= columns.headerRecord) continue;
    const hasDesignators = cellAt(cells, designators) !== "";
    if (!hasDesignators && !names(cells, columns)) continue;
    named++;
    if (hasDesignators) designated++;
    if (cellAt(cells, quantity) !== "") counted++;
  }
  return {
    columns,
    heading: heading === null ? null : heading.map((cell) => cell.trim().toLowerCase()),
    quantityFill: named === 0 ? 0 : counted / named,
    designated: designated > named * 0.5,
  };
}

function names(cells: readonly string[], columns: ListColumns): boolean {
  return NAMING.some((meaning) => columns.all(meaning).some((one) => cellAt(cells, one.column) !== ""));
}

/** Judges one record. Nothing is dropped: what is no part gets its reason, what may be one becomes a question. */
export function rowKind(record: SheetRecord, shape: ListShape): RowKind {
  const filled = record.cells.filter((cell) => cell.trim() !== "");
  if (filled.length === 0) return { kind: "skip", reason: "blank" };
  const first = (filled[0] ?? "").trim();
  if (filled.every((cell) => isFrameLine(cell.trim()))) return { kind: "skip", reason: "separator" };
  const { headerRecord } = shape.columns;
  if (headerRecord !== null && record.record < headerRecord)
    return { kind: "skip", reason: "above-the-heading" };
  if (record.record === headerRecord) return { kind: "skip", reason: "heading" };
  if (repeatsHeading(record.cells, shape)) return { kind: "skip", reason: "repeated-heading" };
  if (COMMENT.test(first)) return filled.length > 1 ? doubtful("commented-out") : skip("remark");
  return partOrText(record, filled, shape);
}

function doubtful(code: (RowKind & { kind: "doubtful" })["code"]): RowKind {
  return { kind: "doubtful", code };
}

function skip(reason: SkipReason): RowKind {
  return { kind: "skip", reason };
}

function partOrText(record: SheetRecord, filled: readonly string[], shape: ListShape): RowKind {
  const { cells } = record;
  const { columns } = shape;
  const designators = cellAt(cells, columns.first("designators"));
  const read = readDesignators(designators);
  if (read.numbered > 0 && (filled.length > 1 || read.unclear.length === 0))
    return unnamedObject(read.designators);
  if (filled.length <= 4 && filled.some((cell) => TOTAL.test(cell.trim())))
    return doubtful("looks-like-total");
  if (designators !== "" && filled.length > 1)
    return namedOrEmpty(cells, designators, read.designators, shape);
  const quantity = cellAt(cells, columns.first("quantity"));
  if (!names(cells, columns) && designators === "") return withoutName(cells, filled, columns);
  if (quantity !== "") return { kind: "part" };
  if (filled.length === 1) return loneText((filled[0] ?? "").trim(), cells, shape);
  if (shape.quantityFill < 0.6) return { kind: "part" };
  return filled.some((cell) => REMARK.test(cell.trim()) || cell.trim().length > TITLE_LENGTH * 1.5)
    ? skip("remark")
    : { kind: "part" };
}

/** "REF**" and a cell of commas are objects of a drawing that nobody named. */
function unnamedObject(names: readonly string[]): RowKind {
  return names.every((name) => /\*\*$/.test(name)) ? doubtful("hardly-a-part") : { kind: "part" };
}

function namedOrEmpty(
  cells: readonly string[],
  designators: string,
  read: readonly string[],
  shape: ListShape,
): RowKind {
  if (/^[\s,;.*?-]+$/.test(designators)) {
    return names(cells, shape.columns) && cellAt(cells, shape.columns.first("value")) !== ""
      ? { kind: "part" }
      : doubtful("hardly-a-part");
  }
  if (read.length > 0) return unnamedObject(read);
  if (REMARK.test(designators)) return skip("remark");
  if (designators.length > TITLE_LENGTH && shape.designated) return doubtful("looks-like-remark");
  return { kind: "part" };
}

/** Rows that name no part: sums under the columns, a remark, or a number nobody explains. */
function withoutName(cells: readonly string[], filled: readonly string[], columns: ListColumns): RowKind {
  const note = columns.all("note").some((one) => cellAt(cells, one.column) !== "");
  if (filled.some((cell) => /\d/.test(cell) && /^[^\p{L}]*(?:\p{L}{1,3})?[^\p{L}]*$/u.test(cell.trim())))
    return doubtful("looks-like-total");
  return note && filled.length === 1 ? skip("remark") : doubtful("looks-like-remark");
}

/** One text alone in its row: a section title, a remark, or a part that needs no more than its name. */
function loneText(text: string, cells: readonly string[], shape: ListShape): RowKind {
  const { columns } = shape;
  const column = cells.findIndex((cell) => cell.trim() !== "");
  const first = firstFilledColumn(columns);
  const naming = NAMING.some((meaning) => columns.all(meaning).some((one) => one.column === column));
  const mapped = columns.first("designators") !== null || columns.first("quantity") !== null;
  if (REMARK.test(text) || text.length > TITLE_LENGTH) return skip("remark");
  if (!mapped && naming) return { kind: "part" };
  if (/[:：]$/.test(text)) return skip("section-title");
  if (column === first || !naming) return skip("section-title");
  if (shape.quantityFill < 0.6 || text.split(/\s+/).length <= 3) return { kind: "part" };
  return doubtful("looks-like-remark");
}

function firstFilledColumn(columns: ListColumns): number {
  return columns.first("designators") === 0 || columns.first("line-number") === 0
    ? 0
    : Math.min(...NAMING.map((meaning) => columns.first(meaning) ?? 99));
}

function repeatsHeading(cells: readonly string[], { heading }: ListShape): boolean {
  if (heading === null) return false;
  let same = 0;
  let filled = 0;
  cells.forEach((cell, column) => {
    if (cell.trim() === "") return;
    filled++;
    if (heading[column] === cell.trim().toLowerCase()) same++;
  });
  return filled >= 2 && same >= 2 && same >= filled * 0.7;
}
