import { diveLines } from "./dive-lines.ts";
import { basketsOf } from "./held-plan.ts";
import { type Labels, pathOf, startLabels } from "./line-labels.ts";
import { basketScore } from "./line-score.ts";
import { nextLayer } from "./next-layer.ts";
import { type OpenLines, openLines } from "./open-lines.ts";
import { marginAt, offerPlan, type Search, spend } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** Open lines up to which a node is searched to the end at once. */
const FEW = 10;
/** How much of the gap the lines of a node are followed within at first, and by how much it is then widened. */
const FIRST_SHARE = 1 / 16;
const WIDER = 2;
/** Steps in depth after which lines are followed in breadth, where alike choices are merged. */
const DIVE = 10_000;

/**
 * Searches the lines of a node whose ranges are settled: every choice of ways within some distance of its bound is
 * followed, part by part, and weighed exactly at the end. The distance is a part of the gap to the best plan at
 * first: what is found there is often so good that nothing else is left; otherwise the node goes back into the
 * queue with so much higher a bound.
 *
 * @param value the node's bound at the prices in force
 * @returns the node to be searched further; null: it is done
 */
export function closeLines(search: Search, node: SetNode, value: number): SetNode | null {
  const gap = search.bestScore - value + 2 * marginAt(search);
  const first = gap < Number.POSITIVE_INFINITY ? gap * FIRST_SHARE : Math.abs(value) / 1000 + 1;
  const within = node.followed === 0 ? first : node.followed * WIDER;
  let [open, limit] = [openLines(search, node, gap), gap];
  if (open.lines.length > FEW && within < gap) [open, limit] = [openLines(search, node, within), within];
  if (open.lines.length === 0) offerPlan(search, open.settled, open.baskets);
  else if (
    !diveLines(search, node, value, open, limit, DIVE) &&
    !followLines(search, node, value, open, limit)
  )
    return null;
  return limit === gap ? null : { ...node, bound: Math.max(node.bound, value + limit), followed: limit };
}

/** False: work ran out. */
function followLines(search: Search, node: SetNode, value: number, open: OpenLines, gap: number): boolean {
  let labels = startLabels(search, node, open);
  for (let layer = 0; layer < open.lines.length; layer += 1) {
    if (!spend(search, labels.count, value)) return false;
    labels = nextLayer(search, open, labels, layer, gap);
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
