import { findPlan } from "#src/costing/sourcing/find-plan.ts";
import { exactTotal, leftWorth } from "#src/costing/sourcing/held-plan.ts";
import { marketOf, narrowed } from "#src/costing/sourcing/market.ts";
import { EFFORT } from "#src/costing/sourcing/search.ts";
import type { SourcingInput, SourcingLimits } from "#src/costing/sourcing/sourcing-input.ts";
import type { PlainPlan } from "./plain-sourcing.ts";

/** The plan the search finds and proves, stated as the plain reckoning states one; null where there is none. */
export function foundPlan(
  input: SourcingInput,
  limits: SourcingLimits = {},
  effort = EFFORT,
): PlainPlan | null {
  const market = narrowed(marketOf(input), limits.without ?? [], limits.latestDays ?? null);
  const search = findPlan(
    market,
    { leastParcels: limits.leastParcels ?? 0, mostParcels: limits.mostParcels ?? 99, work: 1e6, effort },
    null,
  );
  if (search.unsearched < Number.POSITIVE_INFINITY) throw new Error("not proven");
  if (search.best === null) return null;
  const { unbought, freightUnknown, used, ways } = search.best;
  return {
    ways: [...ways].map((way, part) => (way < 0 ? -1 : way - (market.first[part] ?? 0))),
    unbought,
    freightUnknown,
    used,
    total: exactTotal(market, search.best),
    left: leftWorth(market, ways),
  };
}
