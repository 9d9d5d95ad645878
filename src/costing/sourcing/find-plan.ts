import { basketBill } from "./basket-bill.ts";
import { type Column, columnsAt } from "./columns.ts";
import { type Baskets, basketsOf, type HeldPlan } from "./held-plan.ts";
import type { Market } from "./market.ts";
import { emptyQueue } from "./node-queue.ts";
import { emptyLines, noPrices, relaxLines } from "./relaxed-lines.ts";
import { offerPlan, type Search, startSearch } from "./search.ts";
import { queueNode, searchNodes } from "./search-nodes.ts";
import { nodeOf, searchSets, setKey } from "./supplier-sets.ts";

/** What a plan must keep to, in the terms of the search. */
export interface SearchLimits {
  leastParcels: number;
  mostParcels: number;
  work: number;
}

/**
 * The best plan of a market, proven unless work ran out. `before`: the best plan of a market much like it, such as
 * that of the run size before, where the search then begins.
 */
export function findPlan(market: Market, limits: SearchLimits, before: HeldPlan | null): Search {
  const search = startSearch(market, limits.leastParcels, limits.mostParcels, limits.work);
  const start = before === null ? startLines(search) : basketsOf(market, before.ways);
  const columns = columnsAt(search, start.goods, start.weight).sort(
    (a, b) =>
      (start.goods[b.reach.supplier] as number) * near(search, b) -
      (start.goods[a.reach.supplier] as number) * near(search, a),
  );
  const first = columns.filter(({ reach }) => (start.lines[reach.supplier] as number) > 0);
  const queue = emptyQueue();
  let done: string | null = null;
  if (first.length >= limits.leastParcels && first.length <= limits.mostParcels) {
    queueNode(search, queue, nodeOf(first, Number.NEGATIVE_INFINITY));
    done = setKey(first);
  }
  searchSets(search, queue, columns, done);
  searchNodes(search, queue);
  return search;
}

function near(search: Search, { reach }: Column): number {
  return search.market.suppliers[reach.supplier]?.near ?? 0;
}

/**
 * Every part where its goods alone are cheapest; suppliers that refuse their basket are left out one after the
 * other, so that a first plan is found.
 */
function startLines(search: Search): Baskets {
  const { market } = search;
  const prices = noPrices(market.suppliers.length);
  prices.inSet.fill(1);
  const lines = emptyLines(market);
  for (;;) {
    relaxLines(market, search.omitted, prices, lines);
    offerPlan(search, lines.ways, lines.baskets);
    const refused = market.suppliers.findIndex(
      ({ terms }, index) =>
        (lines.baskets.lines[index] as number) > 0 &&
        basketBill(terms, lines.baskets.goods[index] as number, null).refused,
    );
    if (refused < 0) return lines.baskets;
    prices.inSet[refused] = 0;
  }
}
