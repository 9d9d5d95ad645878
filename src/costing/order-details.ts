import { convertMinor } from "./conversion.ts";
import { grainText } from "./grains.ts";
import { costOf, type Ladder, type Order, tierOf } from "./ladder.ts";
import { minorText } from "./money.ts";
import type { PreparedOffer } from "./prepared-plan.ts";
import type { BoughtUp, PartOrder, PricedOrder } from "./run-result.ts";
import { upToMultiple } from "./whole.ts";

type Breaks = readonly { quantity: number; price: string }[];

/** An order that covers so many pieces, as its offer states and prices it. */
export function pricedOrder(offer: PreparedOffer, covers: number, order: Order): PricedOrder {
  const { breaks, id, orderCode } = offer.offer;
  const { currency } = offer.worth;
  return {
    offer: id,
    supplier: offer.supplier.id,
    orderCode,
    currency,
    quantity: order.quantity,
    breakReached: breakReached(offer.ladder, breaks, order),
    lots: lotsTaken(offer.ladder, breaks, covers),
    extended: minorText(order.cost, currency),
    extendedConverted: grainText(convertMinor(order.cost, offer.worth)),
    boughtUp: boughtUp(offer.ladder, currency, covers, order),
  };
}

/** The break an order reaches, as its offer states it; null for lots. */
export function breakReached(ladder: Ladder, breaks: Breaks, { tier }: Order): PartOrder["breakReached"] {
  return ladder.model === "lots" ? null : (breaks.toSorted((a, b) => a.quantity - b.quantity)[tier] ?? null);
}

/**
 * The lots that cover a quantity, largest first; empty for other price models.
 *
 * @example 70 from lots of 10 and 50 → one of 50, two of 10
 */
export function lotsTaken(ladder: Ladder, breaks: Breaks, quantity: number): PartOrder["lots"] {
  const counts = ladder.lots?.taken(Math.max(quantity, ladder.minimum)) ?? [];
  const ascending = breaks.toSorted((a, b) => a.quantity - b.quantity);
  return ascending
    .map((lot, index) => ({ ...lot, count: counts[index] ?? 0 }))
    .filter(({ count }) => count > 0)
    .reverse();
}

/**
 * Whether an order goes past the least permitted quantity because a higher break costs less
 * (section 3): instead of how many, what those would cost, and what it saves.
 *
 * @example 84 would cost 9.90, 100 cost 8.00 → instead of 84, saves 1.90, 16 left over
 */
export function boughtUp(ladder: Ladder, currency: string, quantity: number, order: Order): BoughtUp | null {
  if (ladder.model !== "whole-order") return null;
  const insteadOf = upToMultiple(Math.max(quantity, ladder.minimum), ladder.multiple);
  if (insteadOf >= order.quantity) return null;
  const cost = costOf(ladder, tierOf(ladder, insteadOf), insteadOf);
  if (cost === Number.POSITIVE_INFINITY) return null;
  return {
    insteadOf,
    insteadOfCosts: minorText(cost, currency),
    saves: minorText(cost - order.cost, currency),
    leftOver: order.quantity - quantity,
  };
}
