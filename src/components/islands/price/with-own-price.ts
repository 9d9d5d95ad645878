import type { PlanChannel } from "#src/shapes/plan.ts";

/** The own prices of a channel with another one for an edition, or without; in the order in which the server keeps them. */
export function withOwnPrice(
  ownPrices: PlanChannel["ownPrices"],
  edition: string,
  price: string | null,
): PlanChannel["ownPrices"] {
  const others = ownPrices.filter((one) => one.edition !== edition);
  const all = price === null ? others : [...others, { edition, price }];
  return all.sort((one, other) => (one.edition < other.edition ? -1 : 1));
}
