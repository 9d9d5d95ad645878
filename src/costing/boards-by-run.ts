import type { Plan } from "#src/shapes/plan.ts";
import { chooseBoards } from "./board-choice.ts";
import { boardResults } from "./board-results.ts";
import { preparePlan } from "./prepare-plan.ts";
import type { BoardsResult } from "./run-result.ts";
import { createSheet } from "./run-sheet.ts";
import { splitKits } from "./split-kits.ts";

/**
 * The boards of every run size from `from` to `to` kits, both included (section 6): what `costRun` says of
 * them, without reckoning the rest of the run. Amounts as in `BoardsResult`; a size that cannot be known says
 * what it needs.
 *
 * @example lots of 10 at 20.00 and no freight: at 20 kits a board of the house costs "2"
 */
export function boardsByRun(plan: Plan, from: number, to: number): { kits: number; boards: BoardsResult }[] {
  const prepared = preparePlan({ ...plan, parts: [] }, to);
  const sheet = createSheet(prepared);
  const sizes = Array.from({ length: Math.max(0, to - from + 1) }, (_, place) => from + place);
  return sizes.map((kits) => {
    sheet.kits = kits;
    sheet.kitsOf = splitKits(kits, prepared.weights);
    sheet.missing = 0;
    chooseBoards(prepared, sheet);
    return { kits, boards: boardResults(prepared, sheet) };
  });
}
