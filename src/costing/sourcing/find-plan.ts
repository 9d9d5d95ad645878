import { basketBill } from "./basket-bill.ts";
import { type Column, columnsAt } from "./columns.ts";
import { type Baskets, basketsOf, type HeldPlan } from "./held-plan.ts";
import { searchManySets } from "./many-sets.ts";
import type { Market } from "./market.ts";
import { nearSet } from "./near-set.ts";
import { choicesWithin, emptyLines, relaxChoices } from "./node-choices.ts";
import { emptyQueue } from "./node-queue.ts";
import { plainPrices } from "./prices.ts";
import { offerPlan, type Search, type SearchLimits, startSearch } from "./search.ts";
import { searchNode, searchNodes } from "./search-nodes.ts";
import { nodeOf, setKey } from "./supplier-sets.ts";

/**
 * The best plan of a market, proven unless work ran out. `before`: the best plan of a market much like it, such as
 * that of the run size before, where the search then begins.
 */
export function findPlan(market: Market, limits: SearchLimits, before: HeldPlan | null): Search {
  const search = startSearch(market, limits);
  const start = before === null ? startLines(search) : basketsOf(market, before.ways);
  const columns = columnsAt(search, start.goods, start.weight).sort(
    (a, b) =>
      (start.goods[b.reach.supplier] as number) * near(search, b) -
      (start.goods[a.reach.supplier] as number) * near(search, a),
  );
  const used = columns.filter(({ reach }) => (start.lines[reach.supplier] as number) > 0);
  const first = before === null ? nearSet(columns, used, limits.mostParcels) : used;
  const queue = emptyQueue();
  let done: string | null = null;
  if (first.length >= limits.leastParcels && first.length <= limits.mostParcels) {
    const node = nodeOf(first, Number.NEGATIVE_INFINITY);
    searchNode(search, queue, node);
    done = setKey(first);
  }
  searchManySets(search, queue, columns, done);
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
  const prices = plainPrices(market.suppliers.length);
  const inSet = new Uint8Array(market.suppliers.length).fill(1);
  const lines = emptyLines(market);
  for (;;) {
    relaxChoices(market, search.omitted, prices, choicesWithin(market, inSet), lines);
    offerPlan(search, lines.ways, lines.baskets);
    const refused = market.suppliers.findIndex(
      ({ terms }, index) =>
        (lines.baskets.lines[index] as number) > 0 &&
        basketBill(terms, lines.baskets.goods[index] as number, null).refused,
    );
    if (refused < 0) return lines.baskets;
    inSet[refused] = 0;
  }
}
