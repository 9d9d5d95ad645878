import type { QuestionContext } from "./line-questions.ts";
import { ask, type RowWork } from "./row-work.ts";

interface Table {
  /** The row of its heading. */
  heading: RowWork | null;
  rows: RowWork[];
  names: Set<string>;
  counted: number;
}

/**
 * A file may hold several tables under headings of their own: the same parts ungrouped and grouped, or
 * two builds of one board. Adding them up would count parts twice, so the person is asked which to take.
 */
export function askAboutTables(works: readonly RowWork[], context: QuestionContext): void {
  if (!works.some((work) => work.reason === "repeated-heading")) return;
  const tables = split(works);
  const [first, ...others] = tables;
  if (first === undefined) return;
  for (const other of others) if (other.heading !== null) compare(first, other, other.heading, context);
}

function split(works: readonly RowWork[]): Table[] {
  const tables: Table[] = [{ heading: null, rows: [], names: new Set(), counted: 0 }];
  for (const work of works) {
    if (work.reason === "repeated-heading")
      tables.push({ heading: work, rows: [], names: new Set(), counted: 0 });
    const table = tables.at(-1);
    if (work.line === null || table === undefined) continue;
    table.rows.push(work);
    for (const name of work.line.designators) table.names.add(name.toUpperCase());
    if (work.line.quantityFrom === "column") table.counted++;
  }
  return tables;
}

function compare(first: Table, other: Table, heading: RowWork, context: QuestionContext): void {
  const common = [...other.names].filter((name) => first.names.has(name));
  if (common.length < 3 || common.length < Math.min(first.names.size, other.names.size) * 0.4) return;
  const same = common.length >= Math.max(first.names.size, other.names.size) * 0.95;
  const facts = {
    first: span(first),
    second: span(other),
    firstRows: first.rows.length,
    secondRows: other.rows.length,
    parts: other.names.size,
    common: common.length,
    designators: common,
  };
  const grouped = other.counted > first.counted || other.rows.length < first.rows.length;
  const choices = same
    ? grouped
      ? ["take-second", "take-first", "take-both"]
      : ["take-first", "take-second", "take-both"]
    : ["take-both", "take-first", "take-second"];
  const question = ask(
    heading,
    {
      code: same ? "same-parts-twice" : "alternative-tables",
      level: same ? "look" : "must",
      columns: [],
      facts,
      choices,
    },
    context.answers,
  );
  const choice = question.answer ?? question.suggested.choice;
  if (choice === "take-second") leaveTable(first);
  if (choice === "take-first") leaveTable(other);
}

function span(table: Table): number[] {
  return [table.rows[0]?.record.row ?? 0, table.rows.at(-1)?.record.row ?? 0];
}

/** Rows of a table that is not taken raise no further questions. */
function leaveTable(table: Table): void {
  for (const work of table.rows) {
    work.line = null;
    work.reason = "other-table";
    work.questions = [];
  }
}
