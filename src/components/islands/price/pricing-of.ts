import { type PriceContext, priceContext } from "#src/costing/price/price-context.ts";
import { type RunCost, runCost } from "#src/costing/price/run-cost.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** Plans that were reckoned with last, one for each set of editions, and what their runs cost. */
const costs = new Map<string, { plan: Plan; cost: RunCost }>();

/** A plan object is never changed, only replaced, so what was reckoned from it stays right. */
const contexts = new WeakMap<Plan, PriceContext>();

/** Whether two plans differ at most in what is sold how: what a run costs depends on no price and no channel. */
function costSame(one: Plan, other: Plan): boolean {
  const names = Object.keys(one) as (keyof Plan)[];
  return (
    names.every((name) => name === "editions" || name === "channels" || one[name] === other[name]) &&
    one.editions.length === other.editions.length &&
    one.editions.every(({ price: _, ...edition }, place) => {
      const { price: __, ...same } = other.editions[place] as Plan["editions"][number];
      return JSON.stringify(edition) === JSON.stringify(same);
    })
  );
}

/**
 * A plan ready for pricing. While prices and channels are typed the cost of the run stays as it was reckoned.
 * `of` names what is priced where a page prices several plans: each keeps its own cost.
 */
export function pricingOf(plan: Plan, of = ""): PriceContext {
  const known = contexts.get(plan);
  if (known) return known;
  const held = costs.get(of);
  const cost = held && costSame(held.plan, plan) ? held.cost : runCost(plan);
  costs.set(of, { plan, cost });
  const context = priceContext(plan, plan.run.kits, cost);
  contexts.set(plan, context);
  return context;
}
