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

/** Times that a good set is looked for anew, near the best plan so far, before all sets are gone through. */
const ROUNDS = 4;
/** Share of the work that is kept for searching sets once they are found. */
const KEPT_FOR_NODES = 0.7;

/**
 * The best plan of a market, proven unless work ran out. `before`: the best plan of a market much like it, such as
 * that of the run size before, where the search then begins.
 */
export function findPlan(market: Market, limits: SearchLimits, before: HeldPlan | null): Search {
  const search = startSearch(market, limits);
  const queue = emptyQueue();
  let baskets = before === null ? startLines(search) : basketsOf(market, before.ways);
  const done = new Set<string>();
  for (let round = 0; round < (before === null ? ROUNDS : 1); round += 1) {
    const columns = columnsAt(search, baskets.goods, baskets.weight);
    const used = columns.filter(({ reach }) => (baskets.lines[reach.supplier] as number) > 0);
    const set = before === null ? nearSet(columns, used, limits.mostParcels) : used;
    const fits = set.length >= limits.leastParcels && set.length <= limits.mostParcels;
    if (!fits || done.has(setKey(set))) break;
    done.add(setKey(set));
    searchNode(search, queue, nodeOf(set, Number.NEGATIVE_INFINITY));
    if (search.best !== null) baskets = filledUp(basketsOf(market, search.best.ways), baskets);
  }
  const columns = columnsAt(search, baskets.goods, baskets.weight).sort(
    (a, b) =>
      (baskets.goods[b.reach.supplier] as number) * near(search, b) -
      (baskets.goods[a.reach.supplier] as number) * near(search, a),
  );
  search.workKept = search.workLeft * KEPT_FOR_NODES;
  searchManySets(search, queue, columns, done);
  search.workKept = 0;
  searchNodes(search, queue);
  return search;
}

/** A plan's baskets, and for suppliers that it does not use those they would have had before. */
function filledUp(own: Baskets, before: Baskets): Baskets {
  own.lines.forEach((lines, supplier) => {
    if (lines > 0) return;
    own.goods[supplier] = before.goods[supplier] as number;
    own.weight[supplier] = before.weight[supplier] as number;
  });
  return own;
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
