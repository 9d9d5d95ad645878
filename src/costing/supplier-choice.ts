import { compareWorth } from "./conversion.ts";
import { cheapestOrder, type Order } from "./ladder.ts";
import type { PreparedOffer, PreparedPart, PreparedSupplier } from "./prepared-plan.ts";

/** An offer with the order it would get for a quantity. */
export interface WeighedOffer {
  offer: PreparedOffer;
  order: Order;
  /** Extended price and freight as though the part came alone, in minor units; freight may be unknown. */
  alone: number;
  freightKnown: boolean;
}

/**
 * A supplier's freight for goods of so many minor units (section 4.2); 0 from its free value upward;
 * null where its terms are not known.
 */
export function freightFor(supplier: PreparedSupplier, goods: number): number | null {
  return goods >= supplier.freeFrom ? 0 : supplier.freight;
}

/** Weighs one offer for a quantity; null where it cannot cover it, or the sum is beyond all bounds. */
export function weigh(offer: PreparedOffer, quantity: number): WeighedOffer | null {
  const order = cheapestOrder(offer.ladder, quantity);
  if (order === null || order.cost === Number.POSITIVE_INFINITY) return null;
  const freight = freightFor(offer.supplier, order.cost);
  return { offer, order, alone: order.cost + (freight ?? 0), freightKnown: freight !== null };
}

/**
 * Chooses line by line: each part goes to the permitted offer whose extended price plus that
 * supplier's flat freight, as though the part came alone, is worth least. Offers of suppliers whose
 * freight is not known come after those whose is. Ties: fewer pieces left over, then the name of the
 * supplier. A pinned offer is the only one in `usable`. Minor units, compared exactly.
 *
 * The joint choice over all parts takes the same arguments for all parts at once and gives the same
 * answer per part.
 *
 * @param barred suppliers, by index, that turned the run's basket down (section 4.1)
 */
export function chooseOffer(
  part: PreparedPart,
  quantity: number,
  barred: ReadonlySet<number>,
): WeighedOffer | null {
  let best: WeighedOffer | null = null;
  for (const offer of part.usable) {
    if (barred.size > 0 && barred.has(offer.supplier.index)) continue;
    const weighed = weigh(offer, quantity);
    if (weighed !== null && (best === null || better(weighed, best))) best = weighed;
  }
  return best;
}

/** Whether `a` goes before `b`, which stands earlier in the order of names. */
export function better(a: WeighedOffer, b: WeighedOffer): boolean {
  if (a.freightKnown !== b.freightKnown) return a.freightKnown;
  const difference = compareWorth(a.alone, a.offer.worth, b.alone, b.offer.worth);
  return difference < 0 || (difference === 0 && a.order.quantity < b.order.quantity);
}
