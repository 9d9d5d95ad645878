import type { Plan } from "#src/shapes/plan.ts";
import { type RunCost, runCost } from "./run-cost.ts";
import { type SaleContext, saleContext } from "./sale-context.ts";

/** A run ready for pricing: what it costs, and every channel's terms. Prices are those of the plan. */
export interface PriceContext extends SaleContext {
  cost: RunCost;
}

/**
 * Reads a plan once, for every figure of the price page. `kits` as in `costRun`; `cost` from `runCost`
 * where it is at hand, since it does not depend on prices or channels.
 *
 * @example channelTable(priceContext(plan), "full")
 */
export function priceContext(
  plan: Plan,
  kits: number = plan.run.kits,
  cost: RunCost = runCost(plan, kits),
): PriceContext {
  return { ...saleContext(plan), cost };
}
