import { readCells } from "#src/partslist/cells.ts";
import { applyRemembered, guessColumns, mappingOf } from "#src/partslist/columns.ts";
import type { ColumnGuesses, ColumnMapping } from "#src/partslist/mapping.ts";
import { guessPriceColumns } from "#src/partslist/read-prices.ts";
import type { Sheet } from "#src/partslist/sheet.ts";
import type { DraftDecisions } from "#src/shapes/import.ts";
import type { ImportKind } from "#src/shapes/limits.ts";

/** What a list is read from: its text and what people decided. Plain data, so that another thread can read it. */
export interface ListSource {
  id: string;
  kind: ImportKind;
  text: string;
  /** Column meanings a person has set; `null` leaves the guess. */
  mapping: ColumnMapping | null;
  /** What was settled for an earlier list of the same shape. */
  remembered: ColumnMapping | null;
  decisions: DraftDecisions;
}

/** A list as far as its columns. */
export interface ListDraft {
  sheet: Sheet;
  /** What the columns would be taken for if nobody had said anything, under the heading that holds. */
  guesses: ColumnGuesses;
  mapping: ColumnMapping;
}

export const NO_DECISIONS: DraftDecisions = { answers: [], join: [] };

/** Sheets read lately: one list is looked at many times while it is settled, and its text never changes. */
const sheets = new Map<string, Sheet>();
const SHEETS_KEPT = 4;

function sheetOf({ id, text }: ListSource): Sheet {
  const sheet = sheets.get(id) ?? readCells(text);
  sheets.delete(id);
  sheets.set(id, sheet);
  for (const oldest of sheets.keys()) {
    if (sheets.size <= SHEETS_KEPT) break;
    sheets.delete(oldest);
  }
  return sheet;
}

/** What the columns of a sheet mean by the look of them; under another heading row where one is given. */
export function guessFor(kind: ImportKind, sheet: Sheet, header?: number | null): ColumnGuesses {
  return kind === "price-list"
    ? guessPriceColumns(sheet.records, header)
    : guessColumns(sheet.records, header);
}

/** How large a list is, and which lists are of its shape. */
export interface ListShape {
  rows: number;
  columns: number;
  fingerprint: string;
}

/** The shape of a text that has just come. */
export function shapeOfList({ kind, text }: { kind: ImportKind; text: string }): ListShape {
  const sheet = readCells(text);
  return {
    rows: sheet.records.length,
    columns: sheet.columns,
    fingerprint: guessFor(kind, sheet).fingerprint,
  };
}

/** Opens a list: reads its cells and says what its columns mean. */
export function openList(source: ListSource): ListDraft {
  const sheet = sheetOf(source);
  const { kind, mapping, remembered } = source;
  const guesses = guessFor(kind, sheet, mapping?.headerRecord);
  const shown = !mapping && remembered ? applyRemembered(guesses, remembered.columns) : guesses;
  return { sheet, guesses: shown, mapping: mapping ?? mappingOf(shown) };
}
