import { mappingOf } from "#src/partslist/columns.ts";
import type { Answer, Question } from "#src/partslist/draft.ts";
import { breakQuantityOf } from "#src/partslist/headings.ts";
import type { ColumnMapping, ColumnMeaning } from "#src/partslist/mapping.ts";
import { REPEATABLE_MEANINGS } from "#src/partslist/meanings.ts";
import type { ColumnChange, DraftDecisions, DraftEdit } from "#src/shapes/import.ts";
import type { ImportKind } from "#src/shapes/limits.ts";
import { guessFor, type ListDraft } from "./list-draft.ts";

function changed(column: ColumnMeaning, change: ColumnChange): ColumnMeaning {
  const meaning = change.meaning ?? column.meaning;
  const guessed =
    meaning === "price-break" ? (column.breakQuantity ?? breakQuantityOf(column.heading)) : null;
  return {
    ...column,
    meaning,
    breakQuantity: change.breakQuantity === undefined ? guessed : change.breakQuantity,
    supplier: change.supplier === undefined ? column.supplier : change.supplier,
    decimalMark: change.decimalMark === undefined ? column.decimalMark : change.decimalMark,
  };
}

/** A meaning that only one column can have is taken from the column that had it. */
function withColumn(columns: ColumnMeaning[], change: ColumnChange): ColumnMeaning[] {
  const given = change.meaning;
  const alone = given !== undefined && !REPEATABLE_MEANINGS.includes(given);
  return columns.map((column) => {
    if (column.column === change.column) return changed(column, change);
    return alone && column.meaning === given ? { ...column, meaning: "leave-out" as const } : column;
  });
}

/**
 * The mapping after an edit, `null` to guess anew. Another heading row makes a new guess, over which the edit's own
 * columns stand.
 */
export function editedMapping(
  kind: ImportKind,
  { sheet, mapping }: ListDraft,
  edit: DraftEdit,
): ColumnMapping | null {
  if (edit.guessAgain) return null;
  const moved = edit.headerRecord !== undefined && edit.headerRecord !== mapping.headerRecord;
  const base = moved ? mappingOf(guessFor(kind, sheet, edit.headerRecord)) : mapping;
  return {
    headerRecord: base.headerRecord,
    currency: edit.currency === undefined ? base.currency : edit.currency,
    columns: (edit.columns ?? []).reduce(withColumn, base.columns),
  };
}

/** Whether an edit says anything about columns. */
export function editsColumns(edit: DraftEdit): boolean {
  const { headerRecord, currency, columns, guessAgain } = edit;
  return [headerRecord, currency, columns, guessAgain].some((field) => field !== undefined);
}

/** The decisions after an edit; `open` are the questions that still wait, for taking all suggestions. */
export function editedDecisions(
  { answers, join }: DraftDecisions,
  edit: DraftEdit,
  open: readonly Question[],
): DraftDecisions {
  const keyOf = ({ row, code }: Pick<Answer, "row" | "code">) => `${row} ${code}`;
  const kept = new Map(answers.map((answer) => [keyOf(answer), answer]));
  for (const question of edit.reopen ?? []) kept.delete(keyOf(question));
  if (edit.takeSuggestions)
    for (const { row, code, suggested } of open)
      kept.set(keyOf({ row, code }), { row, code, choice: suggested.choice });
  for (const answer of edit.answers ?? []) kept.set(keyOf(answer), answer);
  return { answers: [...kept.values()], join: edit.join ?? join };
}
