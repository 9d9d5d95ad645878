import type { ColumnCells } from "./column-cells.ts";
import { suits } from "./column-fit.ts";
import { readDesignators } from "./designators.ts";
import { type HeadingMatch, matchHeading } from "./headings.ts";
import type { GuessReason } from "./mapping.ts";
import { MEANINGS } from "./meanings.ts";

/** How well a meaning suits a column, and what speaks for it. */
export interface Scored {
  column: number;
  match: HeadingMatch;
  score: number;
  reason: GuessReason;
}

/** Every meaning a column may have, with its score: the heading's weight and what the cells add or take away. */
export function scoreColumn(
  column: number,
  heading: string,
  cells: ColumnCells,
  agreement: number,
): Scored[] {
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
export function agreements(rows: readonly string[][], designators: number, columns: number): number[] {
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
