import { type ColumnCells, holdsDesignators, lookAtColumn } from "./column-cells.ts";
import { suits } from "./column-fit.ts";
import { readDesignators } from "./designators.ts";
import { currencyOf, type HeadingMatch, matchHeading, plainHeading } from "./headings.ts";
import type { ColumnGuess, ColumnGuesses, ColumnMapping, ColumnMeaning, GuessReason } from "./mapping.ts";
import { MEANINGS, type Meaning, REPEATABLE_MEANINGS } from "./meanings.ts";
import { decimalMarkOf } from "./numbers.ts";
import type { SheetRecord } from "./sheet.ts";

const HEADING_SEARCHED = 400;
const ROWS_LOOKED_AT = 250;
/** Least score at which a meaning is given to a column. */
const LEAST = 2.5;

/**
 * The heading row: the record whose cells the vocabulary knows best. Without one, a record of short words
 * over rows of another kind. `null` where the list begins with parts at once.
 */
export function findHeading(records: readonly SheetRecord[]): number | null {
  let best: { record: number; score: number } | null = null;
  let searched = 0;
  for (const { record, cells } of records) {
    if (searched++ > HEADING_SEARCHED) break;
    const score = headingScore(cells);
    if (score >= 2 && (best === null || score > best.score)) best = { record, score };
    // A heading stands over its table: once a good one is found, only a clearly better one replaces it.
    else if (best && searched - best.record > 60) break;
  }
  return best ? best.record : unknownHeading(records);
}

function headingScore(cells: readonly string[]): number {
  const filled = cells.filter((cell) => cell.trim() !== "");
  if (filled.length < 2 || filled.some((cell) => cell.length > 80 && !cell.includes("\n"))) return 0;
  const breaks = risingBreaks(filled);
  let known = 0;
  let unlikely = 0;
  const seen = new Set<Meaning>();
  for (const cell of filled) {
    const match = matchHeading(cell)[0];
    if (match && !seen.has(match.meaning)) {
      known += match.weight >= 5 ? 1.5 : 1;
      seen.add(match.meaning);
    } else if ((!breaks && /^[\d.,\s€$£%]+$/.test(cell)) || (!match && holdsDesignators(cell.trim())))
      unlikely++;
  }
  return seen.size < 2 ? 0 : known - unlikely * 1.5 - (filled.length - known > known * 2 ? 1 : 0);
}

/** Headings such as 1, 10, 100: two and more bare whole numbers that rise. */
function risingBreaks(filled: readonly string[]): boolean {
  const numbers = filled
    .filter((cell) => /^\s*\d{1,6}\s*\+?\s*$/.test(cell))
    .map((cell) => Number.parseInt(cell, 10));
  return numbers.length > 1 && numbers.every((number, at) => at === 0 || number > (numbers[at - 1] ?? 0));
}

/** A heading in words the vocabulary does not know, told from the rows under it. */
function unknownHeading(records: readonly SheetRecord[]): number | null {
  const filled = records
    .filter(({ cells }) => cells.filter((cell) => cell.trim() !== "").length > 1)
    .slice(0, 40);
  const first = filled[0];
  if (!first || filled.length < 3) return null;
  const below = filled.slice(1);
  let differs = 0;
  first.cells.forEach((heading, column) => {
    const cells = lookAtColumn(below.map((record) => record.cells[column] ?? ""));
    const head = lookAtColumn([heading]);
    if (head.filled && cells.designators >= 0.6 && head.designators === 0) differs++;
    if (
      head.filled &&
      cells.integers + cells.decimals + cells.money >= 0.8 &&
      head.integers + head.decimals + head.money === 0
    )
      differs++;
  });
  const plain = first.cells.every((cell) => cell.length < 30 && !/^\d/.test(cell.trim()));
  return plain && differs > 0 && !first.cells.some((cell) => holdsDesignators(cell.trim()))
    ? first.record
    : null;
}

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

interface Scored {
  column: number;
  match: HeadingMatch;
  score: number;
  reason: GuessReason;
}

function scoreColumn(column: number, heading: string, cells: ColumnCells, agreement: number): Scored[] {
  const matches = matchHeading(heading);
  const scored: Scored[] = [];
  for (const meaning of MEANINGS) {
    const match = matches.find((one) => one.meaning === meaning);
    const fit = suits(meaning, cells, agreement);
    const weight = match?.weight ?? 0;
    if (
      weight === 0 &&
      (fit.alone === 0 || (matches.some((one) => one.weight >= 5) && heading.trim() !== ""))
    )
      continue;
    const score = weight === 0 ? fit.alone : weight + fit.fit;
    const reason: GuessReason = weight === 0 ? "cells" : fit.fit > 1 ? "heading-and-cells" : "heading";
    scored.push({
      column,
      match: match ?? { meaning, weight, supplier: null, breakQuantity: null },
      score,
      reason,
    });
  }
  const code = codeUnderAName(column, heading, cells, matches);
  if (code) scored.push(code);
  return scored;
}

/** A column of codes under a name the vocabulary does not know: order codes of the supplier of that name. */
function codeUnderAName(
  column: number,
  heading: string,
  cells: ColumnCells,
  matches: readonly HeadingMatch[],
): Scored | null {
  const name = heading.trim();
  if (matches.length > 0 || !/^[\p{L}][\p{L}\p{N} .&'-]{1,29}$/u.test(name) || cells.filled < 1) return null;
  if (/^[A-Z]{0,3}PN$/i.test(name)) return null;
  if (cells.codes + cells.integers < 0.6 || cells.distinct < 0.5 || cells.flags > 0.3 || cells.sequence)
    return null;
  if (
    cells.designators > 0.5 ||
    cells.packages > 0.5 ||
    (cells.integers > 0.8 && cells.examples.every((cell) => cell.length < 4))
  )
    return null;
  return {
    column,
    match: { meaning: "order-code", weight: 0, supplier: name, breakQuantity: null },
    score: 3,
    reason: "cells",
  };
}

/** How often the number in one column counts the designators of another: a quantity is known by this. */
function agreements(rows: readonly string[][], designators: number, columns: number): number[] {
  const counts = rows.map((cells) => readDesignators(cells[designators] ?? "").designators.length);
  const telling = counts.some((count) => count > 1);
  return Array.from({ length: columns }, (_, column) => {
    if (!telling || column === designators) return 0;
    let agree = 0;
    let filled = 0;
    rows.forEach((cells, at) => {
      const text = (cells[column] ?? "").trim();
      if (text === "" || counts[at] === 0) return;
      filled++;
      if (/^\d+$/.test(text) && Number(text) === counts[at]) agree++;
    });
    return filled < 2 ? 0 : agree / filled;
  });
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
