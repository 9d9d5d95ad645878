import { compareWorth } from "./conversion.ts";
import { cheapestOrder, type Order } from "./ladder.ts";
import type { ChoiceMemory, PreparedOffer, PreparedPart, PreparedSupplier } from "./prepared-plan.ts";

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
  const holds = winner?.freightKnown && quantity >= choice.rivalsFrom && isBelow(winner, choice.rivalsFloor);
  choice.best = holds ? winner : chooseAnew(part, quantity, winner);
  choice.quantity = quantity;
  return choice.best;
}

/** An order that already holds a larger quantity is still the cheapest for it: it was so among more. */
function weighAgain(last: WeighedOffer, lastQuantity: number, quantity: number): WeighedOffer | null {
  if (quantity >= lastQuantity && quantity <= last.order.quantity) return last;
  return weigh(last.offer, quantity);
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

/**
 * An order of more pieces never costs less, so what an offer cost at some quantity holds for all
 * larger ones. From one run size to the next quantities grow a little, and most offers stay too dear
 * for many sizes: they are passed over without being weighed again.
 */
function chooseAnew(part: PreparedPart, quantity: number, winner: WeighedOffer | null): WeighedOffer | null {
  const { choice, usable } = part;
  let best = winner;
  if (winner !== null) setFloor(choice, winner.offer, quantity, winner);
  for (const offer of usable) {
    if (offer === winner?.offer) continue;
    const holds = quantity >= (choice.from[offer.rank] as number);
    if (holds && best?.freightKnown && isBelow(best, choice.floor[offer.rank] as number)) continue;
    const weighed = weigh(offer, quantity);
    setFloor(choice, offer, quantity, weighed);
    if (weighed !== null && (best === null || better(weighed, best))) best = weighed;
  }
  rememberRivals(choice, best);
  return best;
}

/** Plainly below, with a billionth of margin for the rounding of the comparison. */
function isBelow({ alone, offer }: WeighedOffer, floor: number): boolean {
  return alone * offer.worth.near < floor * (1 - 1e-9);
}

/** At least goods and freight, unless more goods reach the value from which freight is free. */
function setFloor(
  choice: ChoiceMemory,
  offer: PreparedOffer,
  quantity: number,
  weighed: WeighedOffer | null,
): void {
  const { supplier, worth, rank } = offer;
  const goods = weighed === null ? Number.POSITIVE_INFINITY : weighed.order.cost;
  const least = Math.min(goods + (supplier.freight ?? 0), Math.max(goods, supplier.freeFrom));
  choice.from[rank] = quantity;
  choice.floor[rank] = least * worth.near;
}

function rememberRivals(choice: ChoiceMemory, best: WeighedOffer | null): void {
  choice.rivalsFrom = 0;
  choice.rivalsFloor = Number.POSITIVE_INFINITY;
  for (let rank = 0; rank < choice.from.length; rank += 1) {
    if (rank === best?.offer.rank) continue;
    choice.rivalsFrom = Math.max(choice.rivalsFrom, choice.from[rank] as number);
    choice.rivalsFloor = Math.min(choice.rivalsFloor, choice.floor[rank] as number);
  }
}
