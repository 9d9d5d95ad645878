import { type ColumnCells, lookAtColumn } from "./column-cells.ts";
import { findHeading } from "./find-heading.ts";
import { currencyOf, type HeadingMatch, matchHeading, plainHeading } from "./headings.ts";
import type { ColumnGuess, ColumnGuesses, ColumnMapping, ColumnMeaning } from "./mapping.ts";
import { MEANINGS, type Meaning, REPEATABLE_MEANINGS } from "./meanings.ts";
import { decimalMarkOf } from "./numbers.ts";
import { agreements, type Scored, scoreColumn } from "./score-columns.ts";
import type { SheetRecord } from "./sheet.ts";

const ROWS_LOOKED_AT = 250;
/** Least score at which a meaning is given to a column. */
const LEAST = 2.5;

/** The rows under the heading that show what a column holds. */
function sampleRows(records: readonly SheetRecord[], header: number | null): string[][] {
  const rows: string[][] = [];
  const heading = header === null ? "" : key(records[header]?.cells ?? []);
  for (const { record, cells } of records) {
    if (header !== null && record <= header) continue;
    const filled = cells.filter((cell) => cell.trim() !== "").length;
    if (filled > 1 && key(cells) !== heading) rows.push(cells);
    if (rows.length >= ROWS_LOOKED_AT) break;
  }
  return rows;
}

function key(cells: readonly string[]): string {
  return cells.map((cell) => cell.trim().toLowerCase()).join("\u001f");
}

function assign(scored: Scored[], columns: number): (Scored | null)[] {
  const given: (Scored | null)[] = Array.from({ length: columns }, () => null);
  const taken = new Set<Meaning>();
  const order = [...scored].sort(
    (a, b) =>
      b.score - a.score ||
      a.column - b.column ||
      MEANINGS.indexOf(a.match.meaning) - MEANINGS.indexOf(b.match.meaning),
  );
  for (const one of order) {
    const { meaning } = one.match;
    if (one.score < LEAST || given[one.column]) continue;
    if (taken.has(meaning) && !REPEATABLE_MEANINGS.includes(meaning)) continue;
    if (taken.has(meaning) && one.reason === "cells" && meaning !== "order-code") continue;
    given[one.column] = one;
    taken.add(meaning);
  }
  return given;
}

/** Guesses the heading row and what each column means, from its heading and from its cells. */
export function guessColumns(
  records: readonly SheetRecord[],
  header: number | null = findHeading(records),
): ColumnGuesses {
  const headings = header === null ? [] : (records[header]?.cells ?? []);
  const rows = sampleRows(records, header);
  let columns = headings.length;
  for (const row of rows) columns = Math.max(columns, row.length);
  const cells = Array.from({ length: columns }, (_, column) =>
    lookAtColumn(
      rows.map((row) => row[column] ?? ""),
      (headings[column] ?? "").trim() !== "",
    ),
  );
  const designators = bestDesignators(headings, cells);
  const agree = designators === null ? [] : agreements(rows, designators, columns);
  const scored = cells.flatMap((look, column) =>
    scoreColumn(column, headings[column] ?? "", look, agree[column] ?? 0),
  );
  const given = needsName(assign(scored, columns), scored, cells);
  const currency = currencyIn(headings, given, cells);
  return {
    headerRecord: header,
    currency,
    columns: cells.map((look, column) =>
      guess(column, headings[column] ?? "", look, given[column] ?? null, rows),
    ),
    fingerprint: headerFingerprint(headings),
  };
}

function bestDesignators(headings: readonly string[], cells: readonly ColumnCells[]): number | null {
  let best: { column: number; score: number } | null = null;
  cells.forEach((look, column) => {
    const named = matchHeading(headings[column] ?? "").some((match) => match.meaning === "designators");
    const score = look.designators + (named ? 0.5 : 0);
    if (look.designators >= 0.5 && (best === null || score > best.score)) best = { column, score };
  });
  return best === null ? null : (best as { column: number }).column;
}

/** A list needs a column that names the part: where neither value nor description was found, the fullest text column is taken. */
function needsName(
  given: (Scored | null)[],
  scored: readonly Scored[],
  cells: readonly ColumnCells[],
): (Scored | null)[] {
  const has = (meaning: Meaning) => given.some((one) => one?.match.meaning === meaning);
  if (has("value") || has("description") || has("part-number")) return given;
  const free = cells
    .map((look, column) => ({ look, column }))
    .filter(
      ({ look, column }) =>
        given[column] === null &&
        look.filled > 0 &&
        look.flags < 0.5 &&
        look.urls < 0.5 &&
        look.integers < 0.8,
    )
    .sort((a, b) => b.look.fill - a.look.fill || a.column - b.column)[0];
  const demoted = free ?? demotable(given, scored, cells);
  if (!demoted) return given;
  const match: HeadingMatch = { meaning: "description", weight: 0, supplier: null, breakQuantity: null };
  return given.map((one, column) =>
    column === demoted.column ? { column, match, score: LEAST, reason: "cells" } : one,
  );
}

/** Where only one text column exists it must be the name, whatever else its heading may mean. */
function demotable(
  given: readonly (Scored | null)[],
  scored: readonly Scored[],
  cells: readonly ColumnCells[],
): { column: number } | null {
  const kinds: Meaning[] = ["class", "designators", "note", "line-number"];
  const found = given.findIndex(
    (one, column) =>
      one !== null &&
      kinds.includes(one.match.meaning) &&
      (cells[column]?.designators ?? 0) < 0.5 &&
      scored.some(
        (other) =>
          other.column === column &&
          (other.match.meaning === "description" || other.match.meaning === "value"),
      ),
  );
  return found < 0 ? null : { column: found };
}

function currencyIn(
  headings: readonly string[],
  given: readonly (Scored | null)[],
  cells: readonly ColumnCells[],
): string | null {
  for (let column = 0; column < given.length; column++) {
    const meaning = given[column]?.match.meaning;
    if (meaning !== "price-each" && meaning !== "price-break" && meaning !== "line-total") continue;
    const found =
      currencyOf(headings[column] ?? "") ??
      cells[column]?.examples.map(currencyOf).find((code) => code !== null) ??
      null;
    if (found !== null) return found;
  }
  return null;
}

function guess(
  column: number,
  heading: string,
  look: ColumnCells,
  given: Scored | null,
  rows: readonly string[][],
): ColumnGuess {
  const meaning = given?.match.meaning ?? "leave-out";
  const score = given?.score ?? 0;
  return {
    column,
    heading: heading.replace(/\s+/g, " ").trim(),
    meaning,
    breakQuantity: given?.match.breakQuantity ?? null,
    supplier: given?.match.supplier ?? null,
    decimalMark: decimalMarkOf(rows.slice(0, ROWS_LOOKED_AT).map((row) => row[column] ?? "")),
    confidence: score >= 7 ? "sure" : score >= 4 ? "likely" : "weak",
    reason: given?.reason ?? "nothing",
    examples: look.examples,
  };
}

/** Equal for two lists with the same headings in the same order, however spelled in case, blanks or signs. */
export function headerFingerprint(headings: readonly string[]): string {
  return headings.map(plainHeading).join("|").replace(/\|+$/, "");
}

/** A guess with what a person settled for a list of the same shape put over it. */
export function applyRemembered(guesses: ColumnGuesses, remembered: readonly ColumnMeaning[]): ColumnGuesses {
  const columns = guesses.columns.map((one): ColumnGuess => {
    const settled = remembered.find(
      (other) => other.column === one.column && plainHeading(other.heading) === plainHeading(one.heading),
    );
    if (!settled) return one;
    const { meaning, breakQuantity, supplier } = settled;
    return { ...one, meaning, breakQuantity, supplier, confidence: "sure", reason: "remembered" };
  });
  return { ...guesses, columns };
}

/** The part of a guess that the row stage reads. */
export function mappingOf(guesses: ColumnGuesses): ColumnMapping {
  return {
    headerRecord: guesses.headerRecord,
    currency: guesses.currency,
    columns: guesses.columns.map(({ column, heading, meaning, breakQuantity, supplier, decimalMark }) => ({
      column,
      heading,
      meaning,
      breakQuantity,
      supplier,
      decimalMark,
    })),
  };
}
