import { convertMinor } from "#src/costing/conversion.ts";
import { cheapestOrder, type Ladder, type Order } from "#src/costing/ladder.ts";
import { QUANTITY_MOST } from "#src/shapes/limits.ts";
import { basketBill } from "./basket-bill.ts";
import { type Baskets, basketsOf } from "./held-plan.ts";
import type { MarketSupplier } from "./market.ts";
import type { OfferForSale, PartForSale, SaleMarket } from "./sale-market.ts";

/** Pieces more than needed that make an order cheaper, because its basket then reaches a threshold. */
export interface TopUp {
  /** Index of the supplier. */
  supplier: number;
  /** Goods from which its charges are lower, and what the basket lacks of it; minor units of its currency. */
  threshold: number;
  lacks: number;
  /** The part of this kit whose extra pieces cost least, its offer, and the order in place of the one planned. */
  part: number;
  offer: string;
  order: Order;
  extraPieces: number;
  /** Minor units of the supplier's currency. */
  extraCost: number;
  /** What the whole plan costs less for it, in grains. */
  saves: bigint;
}

/**
 * The cheapest useful top-up of each basket that falls short of a threshold by less than reaching it would save (section
 * 5): extra pieces of one part of the kit at this supplier, bought on the same terms. For each basket the one that saves
 * most.
 */
export function topUps(sale: SaleMarket, ways: Int32Array): TopUp[] {
  const baskets = basketsOf(sale.market, ways);
  return sale.market.suppliers.flatMap((supplier, index) => {
    if (baskets.lines[index] === 0) return [];
    const found = thresholdsOver(supplier, baskets.goods[index] as number).flatMap(
      (threshold) => topUpTo(sale, ways, baskets, index, threshold) ?? [],
    );
    const best = found.reduce<TopUp | null>(
      (held, one) => (held === null || one.saves > held.saves ? one : held),
      null,
    );
    return best === null ? [] : [best];
  });
}

/** Goods above those of a basket at which its charges may fall, ascending. */
function thresholdsOver({ cells }: MarketSupplier, goods: number): number[] {
  const steps = cells.map(({ goodsFrom }) => goodsFrom).filter((from) => from > goods);
  return [...new Set(steps)].sort((a, b) => a - b);
}

function topUpTo(
  sale: SaleMarket,
  ways: Int32Array,
  baskets: Baskets,
  supplier: number,
  threshold: number,
): TopUp | null {
  const lacks = threshold - (baskets.goods[supplier] as number);
  if (costOf(sale, baskets, supplier, lacks, 0) >= costOf(sale, baskets, supplier, 0, 0)) return null;
  let best: TopUp | null = null;
  sale.parts.forEach((part, index) => {
    if (sale.market.needed[index] === 0) return;
    part.offers.forEach((offer, at) => {
      if (offer.supplier !== supplier) return;
      const way = (sale.market.first[index] as number) + at;
      const held = ways[index] === way ? (sale.orders[way] ?? null) : null;
      const found = extraOf(sale, baskets, { supplier, threshold, lacks }, { part, index, offer, held });
      if (found !== null && (best === null || found.extraCost < best.extraCost)) best = found;
    });
  });
  return best;
}

interface Target {
  supplier: number;
  threshold: number;
  lacks: number;
}

interface Candidate {
  part: PartForSale;
  index: number;
  offer: OfferForSale;
  /** The order in the plan, to be made larger; null: this offer is not in it. */
  held: Order | null;
}

function extraOf(
  sale: SaleMarket,
  baskets: Baskets,
  { supplier, threshold, lacks }: Target,
  { part, index, offer, held }: Candidate,
): TopUp | null {
  const order = orderWorth(offer.ladder, (held?.cost ?? 0) + lacks, (held?.quantity ?? 0) + 1);
  if (order === null) return null;
  const extraPieces = order.quantity - (held?.quantity ?? 0);
  const extraCost = order.cost - (held?.cost ?? 0);
  const weight = part.weightEach === null ? Number.NaN : part.weightEach * extraPieces;
  const [before, after] = [
    costOf(sale, baskets, supplier, 0, 0),
    costOf(sale, baskets, supplier, extraCost, weight),
  ];
  if (!(after < before)) return null;
  const { worth } = sale.market.suppliers[supplier] as MarketSupplier;
  const saves = convertMinor(before - after, worth);
  return { supplier, threshold, lacks, part: index, offer: offer.id, order, extraPieces, extraCost, saves };
}

/** A basket's total with so much more in it; Infinity where it is refused or its freight then not known. */
function costOf(
  sale: SaleMarket,
  { goods, weight, unweighed }: Baskets,
  supplier: number,
  more: number,
  heavier: number,
): number {
  const { terms } = sale.market.suppliers[supplier] as MarketSupplier;
  const heavy = (weight[supplier] as number) + heavier;
  const known = unweighed[supplier] === 0 && !Number.isNaN(heavy) ? heavy : null;
  const bill = basketBill(terms, (goods[supplier] as number) + more, known);
  return bill.refused || bill.freight === null ? Number.POSITIVE_INFINITY : bill.total;
}

/** The order of fewest pieces, at least so many, that costs at least so much; a larger order never costs less. */
function orderWorth(ladder: Ladder, cost: number, pieces: number): Order | null {
  const costs = (quantity: number) => cheapestOrder(ladder, quantity);
  let high = pieces;
  for (let order = costs(high); order !== null && order.cost < cost; order = costs(high)) {
    if (high >= QUANTITY_MOST) return null;
    high = Math.min(QUANTITY_MOST, 2 * high);
  }
  let [low, top] = [pieces, costs(high) === null ? lastOf(ladder, pieces, high) : high];
  if ((costs(top)?.cost ?? -1) < cost) return null;
  while (low < top) {
    const middle = Math.floor((low + top) / 2);
    if ((costs(middle)?.cost ?? Number.POSITIVE_INFINITY) < cost) low = middle + 1;
    else top = middle;
  }
  return costs(top);
}

/** The largest quantity between two that can be ordered. */
function lastOf(ladder: Ladder, from: number, to: number): number {
  let [low, high] = [from, to];
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (cheapestOrder(ladder, middle) === null) high = middle - 1;
    else low = middle;
  }
  return low;
}
