import { type BasketBill, basketBill } from "./basket-bill.ts";
import { MEASURES } from "./line-labels.ts";
import type { MarketSupplier } from "./market.ts";
import type { OpenLines, Tracked } from "./open-lines.ts";
import type { Search } from "./search.ts";

/**
 * What the tracked baskets cost, filled as stated from `from` on, freight not known counted as more than any total;
 * Infinity where one is refused.
 */
export function basketScore(
  search: Search,
  { tracked }: OpenLines,
  filled: ArrayLike<number>,
  from: number,
): number {
  let score = 0;
  for (let index = 0; index < tracked.length; index += 1) {
    const own = tracked[index] as Tracked;
    const bill = trackedBill(search, own, filled, from + MEASURES * index);
    if (bill.refused) return Number.POSITIVE_INFINITY;
    const near = search.market.suppliers[own.supplier]?.near ?? 0;
    score += bill.total * near + (bill.freight === null ? search.unknown : 0);
  }
  return score;
}

/** The bill of one tracked basket, its measures stated from `at` on. */
export function trackedBill(
  { market }: Search,
  { supplier, byWeight, steadyWeight }: Tracked,
  filled: ArrayLike<number>,
  at: number,
): BasketBill {
  const { terms } = market.suppliers[supplier] as MarketSupplier;
  const weighed = (filled[at + 2] as number) > 0 ? null : (filled[at + 1] as number);
  return basketBill(terms, filled[at] as number, byWeight ? weighed : steadyWeight);
}
