import { findPlan } from "./find-plan.ts";
import { type Market, marketOf, narrowed } from "./market.ts";
import { resultOf } from "./plan-result.ts";
import type { Search } from "./search.ts";
import type { SourcingInput, SourcingLimits } from "./sourcing-input.ts";
import type { SourcingResult } from "./sourcing-result.ts";

/** Steps of search after which the best plan so far is given with its gap: a few seconds. */
export const WORK = 60_000;

/**
 * Chooses for every part how it is bought so that all baskets together, landed, cost least (section 5): fixed freight,
 * thresholds, bands, minimum orders, duty and tax make this one joint choice. Of plans that cost the same to the last
 * digit the one of fewer suppliers is taken, then of less left over by worth, then the suppliers' order, then the
 * earlier way part by part. As many parts as possible are bought, and as few baskets as possible have a freight that
 * is not known, before cost is looked at. The same input gives the same plan.
 *
 * @example two suppliers, freight 4.90 each, goods 6.00 and 2.00 or both at the first for 8.40: all at the first, 13.30
 */
export function chooseSuppliers(input: SourcingInput, limits: SourcingLimits = {}): SourcingResult {
  return resultOf(searchMarket(marketOf(input), limits));
}

/** The same for a market at hand. */
export function searchMarket(market: Market, limits: SourcingLimits): Search {
  const { without = [], latestDays = null, leastParcels = 0, mostParcels, work = WORK } = limits;
  return findPlan(
    narrowed(market, without, latestDays),
    { leastParcels, mostParcels: mostParcels ?? market.suppliers.length, work },
    null,
  );
}
