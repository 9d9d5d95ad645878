import { basketsOf } from "./held-plan.ts";
import { type Ahead, bringsTo, MEASURES, plainOf, startLabels } from "./line-labels.ts";
import { basketScore } from "./line-score.ts";
import type { OpenLines } from "./open-lines.ts";
import { marginAt, offerPlan, type Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** One way of an open line, with what it adds. */
interface Step {
  way: number;
  excess: number;
  plain: number;
  brings: number[];
}

/** A search in depth under way. */
interface Dive {
  search: Search;
  open: OpenLines;
  value: number;
  steps: Step[][];
  ahead: readonly Ahead[];
  limits: Ahead;
  /** By layer: what the tracked baskets hold before it. */
  filled: Float64Array[];
  ways: Int32Array;
  left: number;
}

/**
 * Goes through the open lines in depth, each line's least way first and the lines with the closest ways last: good
 * plans come early, and the gap closes on the rest. False: it was given up after `most` steps.
 */
export function diveLines(
  search: Search,
  node: SetNode,
  value: number,
  open: OpenLines,
  most: number,
): boolean {
  const start = startLabels(search, node, open);
  const dive: Dive = {
    search,
    open,
    value,
    steps: open.lines.map(({ ways }) =>
      ways
        .map(({ way, excess }) => ({
          way,
          excess,
          plain: plainOf(search.market, open, way),
          brings: bringsTo(search.market, open, way),
        }))
        .sort((a, b) => a.excess - b.excess || a.way - b.way),
    ),
    ahead: start.ahead,
    limits: start.limits,
    filled: Array.from({ length: open.lines.length + 1 }, () => Float64Array.from(start.filled)),
    ways: open.settled.slice(),
    left: most,
  };
  visit(dive, 0, 0, 0);
  search.workLeft -= most - dive.left;
  return dive.left > 0;
}

function visit(dive: Dive, layer: number, excess: number, plain: number): void {
  const { steps, open } = dive;
  const own = steps[layer];
  const held = dive.filled[layer] as Float64Array;
  if (own === undefined) {
    offerDive(dive, held, plain);
    return;
  }
  const next = dive.filled[layer + 1] as Float64Array;
  for (const step of own) {
    dive.left -= 1;
    if (dive.left <= 0) return;
    const sum = excess + step.excess;
    if (sum > roomLeft(dive)) return;
    for (let at = 0; at < held.length; at += 1) {
      const [before, brought] = [held[at] as number, step.brings[at] as number];
      next[at] = at % MEASURES < 2 ? before + brought : Math.max(before, brought);
    }
    if (!leavesRoom(dive, next, layer + 1, sum)) continue;
    dive.ways[open.lines[layer]?.part ?? 0] = step.way;
    visit(dive, layer + 1, sum, plain + step.plain);
  }
}

/** Whether the baskets can still end in their ranges, and near enough to where the lines touch. */
function leavesRoom(dive: Dive, filled: Float64Array, layer: number, excess: number): boolean {
  const { least, most } = dive.ahead[layer] as Ahead;
  const { limits, open } = dive;
  let sum = excess;
  for (let at = 0; at < filled.length; at += 1) {
    const value = filled[at] as number;
    const high = value + (most[at] as number);
    const low = at % MEASURES < 2 ? value + (least[at] as number) : value;
    if (high < (limits.least[at] as number) || low > (limits.most[at] as number)) return false;
    if (at % MEASURES !== 0) continue;
    const { pull, touch } = open.tracked[at / MEASURES] as OpenLines["tracked"][number];
    if (pull > 0) sum += pull * Math.max(0, Math.max(low, limits.least[at] as number) - touch);
    else if (pull < 0) sum += pull * Math.min(0, Math.min(high, limits.most[at] as number) - touch);
  }
  return sum <= roomLeft(dive);
}

function roomLeft({ search, value }: Dive): number {
  return search.bestScore - value + 2 * marginAt(search);
}

function offerDive({ search, open, ways }: Dive, filled: Float64Array, plain: number): void {
  const score = open.plain + plain + basketScore(search, open, filled, 0);
  if (!(score <= search.bestScore + marginAt(search))) return;
  offerPlan(search, ways, basketsOf(search.market, ways));
}
