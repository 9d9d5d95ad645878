import { convertMinor } from "#src/costing/conversion.ts";
import { basketBill } from "./basket-bill.ts";
import { basketsOf, exactTotal, type HeldPlan, leftWorth } from "./held-plan.ts";
import type { Market, MarketSupplier } from "./market.ts";
import type { Search } from "./search.ts";
import type { SourcedBasket, SourcingPlan, SourcingResult } from "./sourcing-result.ts";

/** Bounds are hundredths of the plan's currency in floating point: a gap is stated in millionths of those, upward. */
const GAP_STEPS = 1e6;
const GRAINS_PER_STEP = 10n ** 16n;

/** What a search found, as plain data. */
export function resultOf(search: Search): SourcingResult {
  const { market, best, bestScore, unsearched, omitted, unknown } = search;
  if (best === null) return { plan: null, gap: 0n, complete: unsearched === Number.POSITIVE_INFINITY };
  const open = Math.max(0, bestScore - Math.min(bestScore, unsearched));
  const complete = open < Math.min(omitted, unknown) / 2;
  return {
    plan: planOf(market, best),
    gap: complete ? BigInt(Math.ceil(open * GAP_STEPS)) * GRAINS_PER_STEP : 0n,
    complete,
  };
}

/** A plan with its baskets' bills. */
export function planOf(market: Market, held: HeldPlan): SourcingPlan {
  const { goods, weight, unweighed } = basketsOf(market, held.ways);
  const baskets = held.used.map((supplier): SourcedBasket => {
    const { terms, worth } = market.suppliers[supplier] as MarketSupplier;
    const known = unweighed[supplier] === 0 ? (weight[supplier] as number) : null;
    const bill = basketBill(terms, goods[supplier] as number, known);
    return { supplier, bill, total: convertMinor(bill.total, worth), weight: known };
  });
  const parts = [...held.ways.keys()];
  return {
    ways: parts.map((part) => {
      const way = held.ways[part] as number;
      return way < 0 ? -1 : way - (market.first[part] as number);
    }),
    total: exactTotal(market, held),
    baskets,
    leftWorth: leftWorth(market, held.ways),
    arrivesIn: arrivalOf(market, held.ways),
    unbought: parts.filter((part) => market.needed[part] === 1 && (held.ways[part] as number) < 0),
  };
}

function arrivalOf(market: Market, ways: Int32Array): number | null {
  let latest = 0;
  for (const way of ways) {
    if (way < 0) continue;
    for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1)
      latest = Math.max(latest, market.leadDays[at] as number);
  }
  return Number.isNaN(latest) ? null : latest;
}
