import { WORK } from "./choose-suppliers.ts";
import { findPlan } from "./find-plan.ts";
import type { HeldPlan } from "./held-plan.ts";
import { marketSupplier } from "./market.ts";
import { fillMarket, type PartForSale, type SaleMarket, saleMarket } from "./sale-market.ts";
import type { Search } from "./search.ts";
import type { SourcingSupplier } from "./sourcing-input.ts";

/** The joint choice for one run size after another: each begins where the last one ended. */
export interface SourcingRuns {
  sale: SaleMarket;
  last: HeldPlan | null;
  /** Pieces bought in all when it was found. */
  pieces: number;
}

/** A size that buys at most so much more or less than the last is begun from there; others are begun anew. */
const ALIKE = 0.08;
/** Steps after which what the last size led to has not helped, and the size is begun anew. */
const WARM_WORK = 2000;

/** Suppliers and offers made ready for any run size. */
export function sourcingRuns(
  suppliers: readonly SourcingSupplier[],
  parts: readonly PartForSale[],
): SourcingRuns {
  return { sale: saleMarket(suppliers.map(marketSupplier), parts), last: null, pieces: 0 };
}

/**
 * The best plan for the pieces to buy of each part, as `chooseSuppliers` gives it: what the last size led to only makes it
 * quicker, and a plan that could not be proven from there is sought anew as it would be by itself.
 *
 * @example for (kits of 1 … 1000) sourceRun(runs, toBuyFor(kits)).best
 */
export function sourceRun(runs: SourcingRuns, toBuy: ArrayLike<number>, work: number = WORK): Search {
  fillMarket(runs.sale, toBuy);
  const { market } = runs.sale;
  const limits = { leastParcels: 0, mostParcels: market.suppliers.length, work };
  const pieces = runs.sale.toBuy.reduce((sum, quantity) => sum + quantity, 0);
  const alike = runs.last !== null && Math.abs(pieces - runs.pieces) <= ALIKE * runs.pieces;
  const warm = alike ? findPlan(market, { ...limits, work: WARM_WORK }, runs.last) : null;
  const proven = warm !== null && warm.unsearched === Number.POSITIVE_INFINITY;
  const search = proven ? warm : findPlan(market, limits, null);
  runs.pieces = pieces;
  runs.last = search.best;
  return search;
}
