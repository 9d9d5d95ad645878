import type { Question, RecognisedProperty, Row, SkipReason } from "#src/partslist/draft.ts";
import type { ColumnGuess } from "#src/partslist/mapping.ts";
import type { Dialect } from "#src/partslist/sheet.ts";
import type { ImportState } from "#src/shapes/limits.ts";
import type { ImportHead } from "../store/import.ts";
import type { ListDraft } from "./list-draft.ts";

/** Most of each kind of row that is sent at once: a page shows what can be read, and says how many more there are. */
const QUESTIONS_SHOWN = 150;
const SETTLED_SHOWN = 100;
const ROWS_SHOWN = 100;
const SAMPLE_ROWS = 3;
const SAMPLE_FAULTY = 3;
const HEADING_ROWS = 15;

/** How the text of a list was understood. */
export interface SheetView {
  rows: number;
  columns: number;
  dialect: Dialect;
}

/** The file of a list, as the page names it. */
export interface FileView extends SheetView {
  id: string;
  version: number;
  state: ImportState;
  name: string;
  bytes: number;
  encoding: string;
  /** Of a workbook: the sheet that was read, and the others that hold something. */
  sheets: { taken: string; others: string[] } | null;
  /** The list that was taken last, where this is the same text. */
  sameAs: { name: string; takenAt: number | null } | null;
}

export interface ColumnView extends ColumnGuess {
  /** Set by the person, against the guess. */
  said: boolean;
}

export interface SampleRow {
  row: number;
  cells: string[];
  /** Columns whose cells are in question. */
  faulty: number[];
}

export interface ColumnsView {
  columns: ColumnView[];
  headerRecord: number | null;
  /** Records that could be the heading, for choosing another. */
  headings: { record: number; row: number; text: string }[];
  currency: string | null;
  sample: SampleRow[];
}

export interface QuestionsView {
  /** Open ones, those that must be settled first; the first of them only where there are very many. */
  open: Question[];
  must: number;
  look: number;
  settled: Question[];
  settledCount: number;
}

export interface SkippedView {
  reason: SkipReason;
  count: number;
  rows: { row: number; text: string }[];
}

export interface RecognisedView {
  count: number;
  rows: { row: number; subject: string; properties: RecognisedProperty[] }[];
}

export function sheetView({ sheet }: ListDraft): SheetView {
  return { rows: sheet.records.length, columns: sheet.columns, dialect: sheet.dialect };
}

/** The file of a list; `last` is the list that was taken last in the same place. */
export function fileView(row: ImportHead, sheet: SheetView, last: ImportHead | undefined): FileView {
  const same = last !== undefined && last.contentHash === row.contentHash && last.id !== row.id;
  return {
    ...sheet,
    id: row.id,
    version: row.version,
    state: row.state,
    name: row.fileName,
    bytes: row.byteLength,
    encoding: row.encoding,
    sheets: row.sheets,
    sameAs: same ? { name: last.fileName, takenAt: last.takenAt } : null,
  };
}

function columnViews({ guesses, mapping }: ListDraft): ColumnView[] {
  return guesses.columns.map((guess) => {
    const column = mapping.columns.find((one) => one.column === guess.column);
    if (!column) return { ...guess, said: false };
    const said = column.meaning !== guess.meaning || column.supplier !== guess.supplier;
    return { ...guess, ...column, said };
  });
}

function cellsOf(draft: ListDraft, record: number): string[] {
  const cells = draft.sheet.records[record]?.cells ?? [];
  return draft.guesses.columns.map(({ column }) => (cells[column] ?? "").trim().slice(0, 120));
}

/** The first rows of a list, and with them the first ones in question, whose faulty cells are marked. */
function sampleRows(
  draft: ListDraft,
  rows: readonly { row: number; record: number; kind: string; questions: readonly Question[] }[],
): SampleRow[] {
  const plain = rows.filter(({ kind }) => kind !== "skipped").slice(0, SAMPLE_ROWS);
  const open = (question: Question) => question.answer === null && question.columns.length > 0;
  const faulty = rows
    .filter(({ questions }) => questions.some(open))
    .sort((a, b) => worst(b.questions) - worst(a.questions) || a.row - b.row)
    .slice(0, SAMPLE_FAULTY);
  const shown = [...new Map([...plain, ...faulty].map((row) => [row.record, row])).values()];
  return shown
    .sort((a, b) => a.record - b.record)
    .map(({ row, record, questions }) => ({
      row,
      cells: cellsOf(draft, record),
      faulty: [...new Set(questions.filter(open).flatMap(({ columns }) => columns))],
    }));
}

function worst(questions: readonly Question[]): number {
  return questions.some(({ level, answer }) => level === "must" && answer === null) ? 1 : 0;
}

export function columnsView(
  draft: ListDraft,
  rows: readonly { row: number; record: number; kind: string; questions: readonly Question[] }[],
): ColumnsView {
  const filled = draft.sheet.records.filter(({ cells }) => cells.some((cell) => cell.trim() !== ""));
  const near = filled.filter(
    ({ record }, place) => place < HEADING_ROWS || record === draft.mapping.headerRecord,
  );
  return {
    columns: columnViews(draft),
    headerRecord: draft.mapping.headerRecord,
    headings: near.map(({ record, row, cells }) => ({
      record,
      row,
      text: cells
        .map((cell) => cell.trim())
        .filter(Boolean)
        .join(" · ")
        .slice(0, 80),
    })),
    currency: draft.mapping.currency,
    sample: sampleRows(draft, rows),
  };
}

export function questionsView(rows: readonly { questions: readonly Question[] }[]): QuestionsView {
  const all = rows.flatMap(({ questions }) => questions);
  const open = all.filter(({ answer }) => answer === null);
  const must = open.filter(({ level }) => level === "must");
  const look = open.filter(({ level }) => level === "look");
  const settled = all.filter(({ answer }) => answer !== null);
  return {
    open: [...must, ...look].slice(0, QUESTIONS_SHOWN),
    must: must.length,
    look: look.length,
    settled: settled.slice(0, SETTLED_SHOWN),
    settledCount: settled.length,
  };
}

export function skippedView(
  rows: readonly { row: number; text: string; kind: string; reason?: SkipReason | null }[],
): SkippedView[] {
  const byReason = new Map<SkipReason, SkippedView>();
  for (const { row, text, kind, reason } of rows) {
    if (kind !== "skipped" || !reason) continue;
    const group = byReason.get(reason) ?? { reason, count: 0, rows: [] };
    group.count++;
    if (group.rows.length < ROWS_SHOWN) group.rows.push({ row, text });
    byReason.set(reason, group);
  }
  return [...byReason.values()];
}

export function recognisedView(rows: readonly Row[]): RecognisedView {
  const view: RecognisedView = { count: 0, rows: [] };
  for (const row of rows) {
    const line = row.kind === "line" || row.kind === "question" ? row.line : null;
    if (!line || line.recognised.length === 0) continue;
    view.count++;
    if (view.rows.length >= ROWS_SHOWN) continue;
    const subject = line.designatorText || line.value || line.description || row.text;
    view.rows.push({ row: row.row, subject: subject.slice(0, 60), properties: line.recognised });
  }
  return view;
}
