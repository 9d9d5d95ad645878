import { divideUp } from "#src/costing/whole.ts";
import type { Arrangement } from "./arrangement.ts";
import type { FittedPanels } from "./fit-panels.ts";
import { outerOf } from "./panel-frame.ts";
import { panelsNeeded } from "./panels-needed.ts";

/**
 * A few counts worth a choice for a number of boards, ascending: the largest that fits, and those that no other
 * beats both in panels needed and in laminate (outer area × panels), fewest panels first. Counts below a quarter
 * of the largest are left out, and panels of one board where more fit. Common practice, no source.
 *
 * @example 17 at most, 120 boards, four choices → 8, 12, 15 and 17
 */
export function usefulPanels(fitted: FittedPanels, toOrder: number, choices: number): Arrangement[] {
  const { arrangements, most } = fitted;
  const least = Math.max(2, divideUp(most, 4));
  const weighed = arrangements
    .filter(({ count }) => count >= least)
    .map((arrangement) => weigh(arrangement, fitted, toOrder))
    .sort((a, b) => a.panels - b.panels || (a.laminate < b.laminate ? -1 : 1));
  const found = arrangements.slice(-1);
  let lightest: bigint | null = null;
  for (const { arrangement, laminate } of weighed) {
    if (lightest !== null && laminate >= lightest) continue;
    lightest = laminate;
    if (found.length < choices && arrangement.count < most) found.push(arrangement);
  }
  return found.sort((a, b) => a.count - b.count);
}

function weigh(arrangement: Arrangement, { measures }: FittedPanels, toOrder: number) {
  const { width, height } = outerOf(arrangement, measures);
  const { panels } = panelsNeeded(toOrder, arrangement.count);
  return { arrangement, panels, laminate: BigInt(width) * BigInt(height) * BigInt(panels) };
}
