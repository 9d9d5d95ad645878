import { holdsDesignators, lookAtColumn } from "./column-cells.ts";
import { matchHeading } from "./headings.ts";
import type { Meaning } from "./meanings.ts";
import type { SheetRecord } from "./sheet.ts";

const HEADING_SEARCHED = 400;

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
