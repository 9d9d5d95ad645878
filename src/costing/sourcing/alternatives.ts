import { searchMarket } from "./choose-suppliers.ts";
import type { Market } from "./market.ts";
import { resultOf } from "./plan-result.ts";
import type { SourcingLimits } from "./sourcing-input.ts";
import type { SourcingPlan, SourcingResult } from "./sourcing-result.ts";

/** What stands beside the best plan (section 5). */
export interface Alternatives {
  /** The cheapest with at most 1, 2, 3 … parcels, up to those of the best plan, which is the last. */
  byParcels: SourcingResult[];
  /** The cheapest of those with the fewest parcels that buy as many parts as the best plan; null: none does. */
  fewest: SourcingResult | null;
  /** The cheapest of those that arrive soonest and buy as many parts; null: too many lead times are not known, or nothing is bought. */
  soonest: { days: number; result: SourcingResult } | null;
  /** For each supplier of the best plan, by index: the best plan without it. */
  without: { supplier: number; result: SourcingResult }[];
}

/**
 * The plans beside the best one: by number of parcels, soonest, and without each supplier. Leaving out a supplier that
 * the best plan does not use changes nothing and is not listed.
 */
export function alternativesTo(
  market: Market,
  best: SourcingPlan,
  limits: SourcingLimits = {},
): Alternatives {
  const search = (more: SourcingLimits) => resultOf(searchMarket(market, { ...limits, ...more }));
  const parcels = best.baskets.map((_, index) => index + 1);
  const byParcels = parcels.map((most) => search({ mostParcels: most }));
  return {
    byParcels,
    fewest: byParcels.find((result) => buysAsMuch(result, best)) ?? null,
    soonest: soonest(market, best, search),
    without: best.baskets.map(({ supplier }) => ({
      supplier,
      result: search({ without: [...(limits.without ?? []), supplier] }),
    })),
  };
}

function buysAsMuch({ plan }: SourcingResult, best: SourcingPlan): boolean {
  return plan !== null && plan.unbought.length === best.unbought.length;
}

/** The least lead time within which as many parts can be bought; later ones can only do better. */
function soonest(
  market: Market,
  best: SourcingPlan,
  search: (more: SourcingLimits) => SourcingResult,
): Alternatives["soonest"] {
  if (best.baskets.length === 0) return null;
  const known = [...market.leadDays].filter((days) => !Number.isNaN(days));
  const days = [...new Set(known)].sort((a, b) => a - b);
  let [low, high] = [0, days.length - 1];
  let found: Alternatives["soonest"] = null;
  while (low <= high) {
    const middle = (low + high) >> 1;
    const latestDays = days[middle] as number;
    const result = search({ latestDays });
    if (buysAsMuch(result, best)) {
      found = { days: latestDays, result };
      high = middle - 1;
    } else low = middle + 1;
  }
  return found;
}
