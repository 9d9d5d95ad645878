import type { Answer, DraftLine, Facts, Question, QuestionLevel, SkipReason } from "./draft.ts";
import type { QuestionCode } from "./question-codes.ts";
import type { ReadLine } from "./read-line.ts";
import type { SheetRecord } from "./sheet.ts";

/** A row while the list is being read. */
export interface RowWork {
  record: SheetRecord;
  /** The line it will be, or `null` for a row that is skipped. */
  line: DraftLine | null;
  reason: SkipReason | null;
  read: ReadLine | null;
  questions: Question[];
  /** The row whose designators this one carries on. */
  into?: number;
}

export type Answers = ReadonlyMap<string, Answer>;

export function indexAnswers(answers: readonly Answer[]): Answers {
  return new Map(answers.map((answer) => [`${answer.row} ${answer.code}`, answer]));
}

export interface Asking {
  code: QuestionCode;
  level: QuestionLevel;
  columns: number[];
  facts: Facts;
  /** Choices in the order shown; the first is the suggestion. */
  choices: readonly string[];
}

/** Puts a question to a row, with the answer already given to it, if any. An answer that is no choice of it is ignored. */
export function ask(work: RowWork, asking: Asking, answers: Answers): Question {
  const given = answers.get(`${work.record.row} ${asking.code}`)?.choice ?? null;
  const [suggested = "", ...alternatives] = asking.choices;
  const question: Question = {
    code: asking.code,
    level: asking.level,
    row: work.record.row,
    subject: subjectOf(work),
    columns: asking.columns,
    facts: asking.facts,
    suggested: { choice: suggested, facts: asking.facts },
    alternatives: alternatives.map((choice) => ({ choice, facts: asking.facts })),
    alsoRows: [],
    answer: given !== null && asking.choices.includes(given) ? given : null,
  };
  work.questions.push(question);
  return question;
}

/** The designators of the row as written, else its first words. */
export function subjectOf(work: RowWork): string {
  const designators = work.line?.designatorText ?? "";
  if (designators !== "") return shorten(designators);
  return shorten(
    work.record.cells.map((cell) => cell.trim()).find((cell) => cell !== "" && /\p{L}/u.test(cell)) ?? "",
  );
}

function shorten(text: string): string {
  const plain = text.replace(/\s+/g, " ");
  return plain.length > 40 ? `${plain.slice(0, 39)}…` : plain;
}
