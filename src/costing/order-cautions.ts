import { OLD_PRICE_DAYS } from "#src/shapes/limits.ts";
import type { Plan, PlanOffer } from "#src/shapes/plan.ts";
import { daysBetween } from "./calendar/days.ts";
import type { Problem } from "./problem.ts";
import type { PartOrder, RunResult } from "./run-result.ts";

/**
 * Whether a price is old on a day; a price without a day is not known to be fresh.
 *
 * @example isOldPrice({ pricedOn: "2026-01-09" }, "2026-03-09") === true
 */
export function isOldPrice({ pricedOn }: Pick<PlanOffer, "pricedOn">, today: string): boolean {
  return pricedOn === null || daysBetween(pricedOn, today) > OLD_PRICE_DAYS;
}

/**
 * Pieces that the stock shown lacks for an order; 0 where no stock is shown.
 *
 * @example 1000 ordered, 640 shown → 360
 */
export function stockShort({ stockShown }: Pick<PlanOffer, "stockShown">, quantity: number | null): number {
  return stockShown === null || quantity === null ? 0 : Math.max(0, quantity - stockShown);
}

/**
 * What is doubtful about the offers that a run would order from, although their prices count: stock that
 * does not reach, and prices that are old on the plan's day. In the order of the plan's parts.
 */
export function orderCautions(plan: Plan, result: RunResult): Problem[] {
  return result.parts.flatMap(({ id, orders }) => {
    const offers = plan.parts.find((part) => part.id === id)?.offers ?? [];
    return orders.flatMap((order) => {
      const offer = offers.find((one) => one.id === order.offer);
      return offer ? cautionsOf(id, offer, order, plan.asOf) : [];
    });
  });
}

function cautionsOf(part: string, offer: PlanOffer, { quantity }: PartOrder, today: string): Problem[] {
  const at = { part, offer: offer.id, supplier: offer.supplier };
  const cautions: Problem[] = [];
  const lacks = stockShort(offer, quantity);
  if (lacks > 0) cautions.push({ code: "stock-short", at, facts: { by: lacks } });
  if (isOldPrice(offer, today))
    cautions.push({ code: "price-old", at, facts: offer.pricedOn === null ? {} : { day: offer.pricedOn } });
  return cautions;
}
