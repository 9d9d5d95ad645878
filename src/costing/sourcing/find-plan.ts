import { type Column, columnsAt } from "./columns.ts";
import { fillSet } from "./fill-set.ts";
import { basketsOf, type HeldPlan } from "./held-plan.ts";
import type { Market } from "./market.ts";
import { emptyLines, noPrices, relaxLines } from "./relaxed-lines.ts";
import { offerPlan, type Search, startSearch } from "./search.ts";
import { setNode } from "./set-node.ts";
import { searchSets, setKey } from "./supplier-sets.ts";

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
  let done: string | null = null;
  if (first.length >= limits.leastParcels && first.length <= limits.mostParcels) {
    const sorted = first.toSorted((a, b) => a.reach.supplier - b.reach.supplier);
    fillSet(
      search,
      setNode(
        search,
        sorted.map(({ reach }) => reach),
        sorted.map(({ line }) => line),
        -1,
      ),
    );
    done = setKey(first);
  }
  searchSets(search, columns, done);
  return search;
}

function near(search: Search, { reach }: Column): number {
  return search.market.suppliers[reach.supplier]?.near ?? 0;
}

/** Every part where its goods alone are cheapest. */
function startLines(search: Search) {
  const { market } = search;
  const prices = noPrices(market.suppliers.length);
  prices.inSet.fill(1);
  const lines = emptyLines(market);
  relaxLines(search, prices, lines);
  offerPlan(search, lines.ways, lines.baskets);
  return lines.baskets;
}
