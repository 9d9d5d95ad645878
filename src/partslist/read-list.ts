import type { PartClass } from "#src/shapes/limits.ts";
import { classFromColumn } from "./classes.ts";
import { joinContinuations } from "./continuation-rows.ts";
import { askAboutTwoRows } from "./cross-questions.ts";
import type { Answer, ExistingLine, Question, ReadResult, Row, RowCounts } from "./draft.ts";
import { joinEqualLines, joinOffers } from "./join-lines.ts";
import { askAboutLine, type QuestionContext } from "./line-questions.ts";
import { listColumns } from "./list-columns.ts";
import { askAboutTables } from "./list-tables.ts";
import type { ColumnMapping } from "./mapping.ts";
import { settle } from "./question-effects.ts";
import { readLine } from "./read-line.ts";
import { type ListShape, listShape, type RowKind, rowKind } from "./row-kind.ts";
import { type Answers, ask, indexAnswers, type RowWork } from "./row-work.ts";
import type { SheetRecord } from "./sheet.ts";
import type { ReadValues } from "./value-cell.ts";

/** Longest text of a row shown in one line. */
const ROW_TEXT_LENGTH = 200;

export interface ReadListInput {
  records: readonly SheetRecord[];
  mapping: ColumnMapping;
  answers: readonly Answer[];
  /** Lines of the list as it stands, for recognising them again. */
  existingLines?: readonly ExistingLine[];
  /** Rows of the join offers that were accepted, by the first row of each; "all" for every offer. */
  join?: readonly number[] | "all";
}

/**
 * Reads the rows of a parts list. Every record ends as a line, as a skipped row with its reason, as a row
 * with an open question, or joined into another; `counts.rows` is the number of records and the sum of the
 * four. While a question is open its suggestion is carried out for show. The same input gives the same
 * result; nothing is looked up elsewhere.
 */
export function readList(input: ReadListInput): ReadResult {
  const columns = listColumns(input.mapping);
  const answers = indexAnswers(input.answers);
  const { records, into } = joinContinuations(input.records, columns);
  const shape = listShape(records, columns);
  const values: ReadValues = new Map();
  const reading: Reading = { shape, values, answers, section: null };
  const works = records.map((record) => startRow(record, into.get(record.record), reading));
  const context: QuestionContext = {
    answers,
    columns,
    existing: byValue(input.existingLines ?? []),
    asked: new Map(),
  };
  askAboutTables(works, context);
  const kept = works.filter((work) => work.line !== null);
  for (const work of kept) if (work.read) askAboutLine(work, work.read, context);
  if (!keptBothTables(works)) askAboutTwoRows(kept, context);
  const rows = new Map(works.map((work) => [work.record.row, work]));
  for (const work of works)
    for (const question of [...work.questions])
      settle(question, answers.get(`${question.row} ${question.code}`), rows);
  return finish(works, input.join ?? []);
}

function byValue(lines: readonly ExistingLine[]): Map<string, ExistingLine> {
  const index = new Map<string, ExistingLine>();
  for (const line of lines) if (line.value !== null && !index.has(line.value)) index.set(line.value, line);
  return index;
}

/** Two builds kept side by side share designators on purpose. */
function keptBothTables(works: readonly RowWork[]): boolean {
  return works.some((work) =>
    work.questions.some(
      (question) =>
        question.code === "alternative-tables" &&
        (question.answer ?? question.suggested.choice) === "take-both",
    ),
  );
}

/** What the rows of a list have in common while they are read one after the other. */
interface Reading {
  shape: ListShape;
  values: ReadValues;
  answers: Answers;
  /** The class that the last section title names: what stands under "Resistors" is one. */
  section: PartClass | null;
}

function startRow(record: SheetRecord, into: number | undefined, reading: Reading): RowWork {
  if (into !== undefined) return { record, line: null, reason: null, read: null, questions: [], into };
  const kind = rowKind(record, reading.shape);
  if (kind.kind === "skip") {
    if (kind.reason === "section-title") reading.section = classFromColumn(rowText(record));
    return { record, line: null, reason: kind.reason, read: null, questions: [] };
  }
  const read = readLine(record.cells, reading.shape.columns, reading.values, reading.section);
  const work: RowWork = { record, line: read.line, reason: null, read, questions: [] };
  if (kind.kind === "doubtful") askWhetherAPart(work, kind, reading.answers);
  return work;
}

/** A row that may be no part asks only that, unless it is to be kept. */
function askWhetherAPart(work: RowWork, kind: RowKind & { kind: "doubtful" }, answers: Answers): void {
  const text = rowText(work.record);
  const asked = ask(
    work,
    { code: kind.code, level: "look", columns: [], facts: { text }, choices: ["leave-row-out", "keep-row"] },
    answers,
  );
  if (asked.answer !== "keep-row") work.read = null;
}

function rowText(record: SheetRecord): string {
  let text = "";
  for (const cell of record.cells) {
    const trimmed = cell.trim();
    if (trimmed === "") continue;
    text = text === "" ? trimmed : `${text} · ${trimmed}`;
    if (text.length > ROW_TEXT_LENGTH) break;
  }
  const plain = /\s\s|[\t\r\n]/.test(text) ? text.replace(/\s+/g, " ") : text;
  return plain.length > ROW_TEXT_LENGTH ? `${plain.slice(0, ROW_TEXT_LENGTH - 1)}…` : plain;
}

function finish(works: readonly RowWork[], join: readonly number[] | "all"): ReadResult {
  const rows = works.map(rowOf);
  const offers = joinOffers(rows);
  const accepted = join === "all" ? offers : offers.filter((offer) => join.includes(offer.rows[0] ?? -1));
  const joined = accepted.length === 0 ? rows : joinEqualLines(rows, accepted);
  return { rows: joined, counts: countRows(joined), joinOffers: offers };
}

function rowOf(work: RowWork): Row {
  const { line, questions } = work;
  const { row, record } = work.record;
  const text = rowText(work.record);
  if (work.into !== undefined) return { row, record, text, questions, kind: "joined", into: work.into };
  if (questions.some((question) => question.answer === null))
    return { row, record, text, questions, kind: "question", line, reason: work.reason };
  if (line !== null) return { row, record, text, questions, kind: "line", line };
  return { row, record, text, questions, kind: "skipped", reason: work.reason ?? "left-out" };
}

/** Counts the rows by how they end; rows = lines + skipped + questions + joined. */
export function countRows(rows: readonly Row[]): RowCounts {
  const counts: RowCounts = {
    rows: rows.length,
    lines: 0,
    skipped: 0,
    questions: 0,
    joined: 0,
    must: 0,
    look: 0,
    linesWithSuggestions: 0,
  };
  for (const row of rows) {
    if (row.kind === "line") counts.lines++;
    else if (row.kind === "skipped") counts.skipped++;
    else if (row.kind === "joined") counts.joined++;
    else counts.questions++;
    if (row.kind === "line" || (row.kind === "question" && row.line !== null)) counts.linesWithSuggestions++;
    for (const question of row.questions) if (question.answer === null) counts[question.level]++;
  }
  return counts;
}

/** All questions of a reading, in row order, those that must be settled first. */
export function openQuestions(rows: readonly Row[]): Question[] {
  const open = rows.flatMap((row) => row.questions.filter((question) => question.answer === null));
  return [
    ...open.filter((question) => question.level === "must"),
    ...open.filter((question) => question.level === "look"),
  ];
}
