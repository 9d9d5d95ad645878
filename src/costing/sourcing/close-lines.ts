import { diveLines } from "./dive-lines.ts";
import { basketsOf } from "./held-plan.ts";
import { type Labels, pathOf, startLabels } from "./line-labels.ts";
import { basketScore } from "./line-score.ts";
import { nextLayer } from "./next-layer.ts";
import type { OpenLines } from "./open-lines.ts";
import { marginAt, offerPlan, type Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/**
 * Searches the lines of a node whose ranges are settled: every choice of ways that leaves room for a better plan is
 * followed, part by part, and weighed exactly at the end; first in depth, then in breadth, where choices that go on
 * alike are merged. False: there are too many, and the node is to be parted first.
 *
 * @param value the node's bound at the prices in force
 */
export function closeLines(search: Search, node: SetNode, open: OpenLines, value: number): boolean {
  if (open.lines.length === 0) {
    offerPlan(search, open.settled, open.baskets);
    return true;
  }
  const rounding = open.tracked.reduce((sum, { range }) => sum + (range?.slack ?? 0), 0);
  const narrow = search.bestScore - value <= 4 * rounding + 2 * marginAt(search);
  const { dive, wide, narrow: many, lines } = search.effort;
  if (!narrow && open.lines.length > lines) return false;
  const most = narrow ? many : wide;
  return diveLines(search, node, value, open, dive) || followLines(search, node, value, open, most);
}

function followLines(search: Search, node: SetNode, value: number, open: OpenLines, most: number): boolean {
  let labels = startLabels(search, node, open);
  let made = 0;
  for (let layer = 0; layer < open.lines.length; layer += 1) {
    const gap = search.bestScore - value + 2 * marginAt(search);
    labels = nextLayer(search, open, labels, layer, gap);
    made += labels.count;
    search.workLeft -= labels.count;
    if (made > most && layer < open.lines.length - 1) return false;
  }
  offerLabels(search, open, labels);
  return true;
}

/** Weighs what came through, the least first, until the rest is plainly dearer than the best plan. */
function offerLabels(search: Search, open: OpenLines, labels: Labels): void {
  const scores = Array.from(
    { length: labels.count },
    (_, at) =>
      open.plain + (labels.plain[at] as number) + basketScore(search, open, labels.filled, at * labels.width),
  );
  const order = scores.map((_, at) => at).sort((a, b) => (scores[a] as number) - (scores[b] as number));
  for (const at of order) {
    if (!((scores[at] as number) <= search.bestScore + marginAt(search))) return;
    const ways = open.settled.slice();
    for (const { part, way } of pathOf(labels, at)) ways[part] = way;
    offerPlan(search, ways, basketsOf(search.market, ways));
  }
}
