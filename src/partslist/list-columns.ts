import type { ColumnMapping, ColumnMeaning } from "./mapping.ts";
import type { Meaning } from "./meanings.ts";
import type { DecimalMark } from "./sheet.ts";

/** The columns of a list by what they mean, looked up once for all rows. */
export interface ListColumns {
  first: (meaning: Meaning) => number | null;
  all: (meaning: Meaning) => readonly ColumnMeaning[];
  mark: (column: number) => DecimalMark | null;
  currency: string | null;
  headerRecord: number | null;
}

export function listColumns(mapping: ColumnMapping): ListColumns {
  const byMeaning = new Map<Meaning, ColumnMeaning[]>();
  const marks = new Map<number, DecimalMark | null>();
  for (const column of mapping.columns) {
    marks.set(column.column, column.decimalMark);
    const known = byMeaning.get(column.meaning);
    if (known) known.push(column);
    else byMeaning.set(column.meaning, [column]);
  }
  return {
    first: (meaning) => byMeaning.get(meaning)?.[0]?.column ?? null,
    all: (meaning) => byMeaning.get(meaning) ?? [],
    mark: (column) => marks.get(column) ?? null,
    currency: mapping.currency,
    headerRecord: mapping.headerRecord,
  };
}

/** The text of a cell, trimmed; "" where the column or cell is missing. */
export function cellAt(cells: readonly string[], column: number | null): string {
  return column === null ? "" : (cells[column] ?? "").trim();
}

/** The text of a cell, or `null` where it is empty or only a stroke that stands for "nothing". */
export function textAt(cells: readonly string[], column: number | null): string | null {
  const cell = cellAt(cells, column);
  const text = /\s\s|[\t\r\n]/.test(cell) ? cell.replace(/\s+/g, " ") : cell;
  return text === "" || /^(?:[~\-–—]+|n\/a|\?+)$/i.test(text) ? null : text;
}
