import { basketBill } from "./basket-bill.ts";
import { basketsOf } from "./held-plan.ts";
import { type Labels, nextLayer, pathOf, startLabels } from "./line-labels.ts";
import type { MarketSupplier } from "./market.ts";
import { type OpenLines, openLines } from "./open-lines.ts";
import { marginAt, offerPlan, type Search, spend } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/**
 * Searches the lines of a node whose suppliers are settled: every choice of ways that leaves room for a better
 * plan is followed, part by part; choices that fill the tracked baskets alike are merged, the better staying. At
 * the end each is weighed exactly. False: more than `most` parts are open, and nothing was done.
 *
 * @param value the node's bound at the prices in force
 */
export function closeLines(search: Search, node: SetNode, value: number, most: number): boolean {
  const open = openLines(search, node, value);
  if (open.lines.length > most) return false;
  if (open.lines.length === 0) {
    offerPlan(search, open.settled, open.baskets);
    return true;
  }
  const gap = search.bestScore - value + 2 * marginAt(search);
  let labels = startLabels(search, node, open);
  for (let layer = 0; layer < open.lines.length; layer += 1) {
    if (!spend(search, labels.count, value)) return true;
    labels = nextLayer(search, open, labels, layer, gap);
  }
  offerLabels(search, open, labels);
  return true;
}

/** Weighs what came through, the least first, until the rest is plainly dearer than the best plan. */
function offerLabels(search: Search, open: OpenLines, labels: Labels): void {
  const scores = Array.from({ length: labels.count }, (_, at) => scoreOf(search, open, labels, at));
  const order = scores.map((_, at) => at).sort((a, b) => (scores[a] as number) - (scores[b] as number));
  for (const at of order) {
    if (!((scores[at] as number) <= search.bestScore + marginAt(search))) return;
    const ways = open.settled.slice();
    for (const { part, way } of pathOf(labels, at)) ways[part] = way;
    offerPlan(search, ways, basketsOf(search.market, ways));
  }
}

function scoreOf(search: Search, open: OpenLines, labels: Labels, at: number): number {
  let score = open.plain + (labels.plain[at] as number);
  open.tracked.forEach(({ supplier, byWeight, steadyWeight }, index) => {
    const { terms, near } = search.market.suppliers[supplier] as MarketSupplier;
    const from = at * labels.width + 4 * index;
    const unweighed = labels.filled[from + 2] as number;
    const weight = byWeight ? (unweighed > 0 ? null : (labels.filled[from + 1] as number)) : steadyWeight;
    const bill = basketBill(terms, labels.filled[from] as number, weight);
    score += bill.refused
      ? Number.POSITIVE_INFINITY
      : bill.total * near + (bill.freight === null ? search.unknown : 0);
  });
  return score;
}
