import { type Floor, floorAt, isBelow, leastRival, setFloor } from "./choice-memory.ts";
import { compareWorth } from "./conversion.ts";
import { findOrder, type Order } from "./ladder.ts";
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
 *
 * @example flat 490, free from 5000: 490 for goods of 4999, 0 for 5000
 */
export function freightFor(supplier: PreparedSupplier, goods: number): number | null {
  return goods >= supplier.freeFrom ? 0 : supplier.freight;
}

/**
 * Weighs one offer for a quantity; null where it cannot cover it, or the sum is beyond all bounds.
 *
 * @example 1000 LEDs for 6200 cents with freight 490 → alone 6690
 */
export function weigh(offer: PreparedOffer, quantity: number): WeighedOffer | null {
  const weighed = unweighed(offer);
  return weighInto(weighed, offer, quantity) ? weighed : null;
}

function unweighed(offer: PreparedOffer): WeighedOffer {
  return { offer, order: { quantity: 0, cost: 0, tier: -1 }, alone: 0, freightKnown: false };
}

function weighInto(into: WeighedOffer, offer: PreparedOffer, quantity: number): boolean {
  const { order } = into;
  if (!findOrder(offer.ladder, quantity, order) || order.cost === Number.POSITIVE_INFINITY) return false;
  const freight = freightFor(offer.supplier, order.cost);
  into.offer = offer;
  into.alone = order.cost + (freight ?? 0);
  into.freightKnown = freight !== null;
  return true;
}

/**
 * Chooses line by line: each part goes to the permitted offer whose extended price plus that
 * supplier's flat freight, as though the part came alone, is worth least. Offers of suppliers whose
 * freight is not known come after those whose is. Ties: fewer pieces left over, then the name of the
 * supplier. A pinned offer is the only one in `usable`. Minor units, compared exactly.
 *
 * The joint choice over all parts takes the same arguments for all parts at once and gives the same
 * answer per part. What is answered is written over by the next choice for the same part.
 *
 * @param barred suppliers, by index, that turned the run's basket down (section 4.1)
 *
 * @example 10 at 0.10 + 5.00 freight against 10 at 0.50 without: the second, 5.00 against 6.00
 */
export function chooseOffer(
  part: PreparedPart,
  quantity: number,
  barred: ReadonlySet<number>,
): WeighedOffer | null {
  if (barred.size > 0) {
    return bestOf(
      part.usable.filter(({ supplier }) => !barred.has(supplier.index)),
      quantity,
    );
  }
  const { choice } = part;
  const winner = choice.best === null ? null : weighAgain(choice.best, choice.quantity, quantity);
  const holds = winner?.freightKnown && quantity >= choice.rivalsFrom && isBelow(winner, choice.rivals);
  choice.best = holds ? winner : chooseAnew(part, quantity, winner);
  choice.quantity = quantity;
  return choice.best;
}

/** An order that already holds a larger quantity is still the cheapest for it: it was so among more. */
function weighAgain(last: WeighedOffer, lastQuantity: number, quantity: number): WeighedOffer | null {
  if (quantity >= lastQuantity && quantity <= last.order.quantity) return last;
  return weighInto(last, last.offer, quantity) ? last : null;
}

function bestOf(offers: readonly PreparedOffer[], quantity: number): WeighedOffer | null {
  let best: WeighedOffer | null = null;
  for (const offer of offers) {
    const weighed = weigh(offer, quantity);
    if (weighed !== null && (best === null || better(weighed, best))) best = weighed;
  }
  return best;
}

/** Whether `a` goes before `b`. */
export function better(a: WeighedOffer, b: WeighedOffer): boolean {
  if (a.freightKnown !== b.freightKnown) return a.freightKnown;
  const byWorth = compareWorth(a.alone, a.offer.worth, b.alone, b.offer.worth);
  return (byWorth || a.order.quantity - b.order.quantity || a.offer.rank - b.offer.rank) < 0;
}

/** Weighs anew only those offers whose floor does not keep them above the best. */
function chooseAnew(part: PreparedPart, quantity: number, winner: WeighedOffer | null): WeighedOffer | null {
  const { choice, usable } = part;
  let best = winner;
  if (winner !== null) setFloor(choice.floors[winner.offer.rank] as Floor, winner.offer, quantity, winner);
  for (const offer of usable) {
    if (offer === winner?.offer) continue;
    const floor = choice.floors[offer.rank] as Floor;
    if (best?.freightKnown && isBelow(best, floorAt(floor, quantity))) continue;
    const rival = choice.spare ?? unweighed(offer);
    const covers = weighInto(rival, offer, quantity);
    setFloor(floor, offer, quantity, covers ? rival : null);
    if (covers && (best === null || better(rival, best))) {
      choice.spare = best;
      best = rival;
    } else choice.spare = rival;
  }
  choice.rivalsFrom = quantity;
  choice.rivals = leastRival(choice, quantity, best?.offer.rank);
  return best;
}
