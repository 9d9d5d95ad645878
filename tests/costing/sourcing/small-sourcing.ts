import type { BasketTerms } from "#src/costing/sourcing/basket-terms.ts";
import type { SourcingSupplier, SourcingWay } from "#src/costing/sourcing/sourcing-input.ts";

/** Terms under which nothing is charged, but for what a test names. */
export function termsOf(over: Partial<BasketTerms> = {}): BasketTerms {
  return {
    minimum: 0,
    belowMinimum: { term: "none" },
    freight: { model: "none" },
    freeFrom: null,
    handling: 0,
    customs: null,
    ...over,
  };
}

/** A supplier that charges euros. */
export function oneOf(id: string, terms: Partial<BasketTerms> = {}): SourcingSupplier {
  const worth = { currency: "EUR", grains: 10n ** 22n, millionth: 10n ** 18n, near: 1e22, rate: null };
  return { id, worth, terms: termsOf(terms) };
}

/** Ways of one order each: supplier, cost in cents, days. */
export function waysOf(
  ...orders: [supplier: number, cost: number, leadDays: number | null][]
): SourcingWay[] {
  return orders.map(([supplier, cost, leadDays], at) => ({
    orders: [
      { offer: `o${at}`, supplier, pieces: 10, cost, leftOver: 0, leftWorth: 0n, weight: null, leadDays },
    ],
  }));
}
