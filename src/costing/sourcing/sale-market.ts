import { cheapestOrder, type Ladder, type Order } from "#src/costing/ladder.ts";
import { emptyMarket, type Market, type MarketSupplier, setOrder } from "./market.ts";
import type { SourcingOrder, SourcingWay } from "./sourcing-input.ts";

/** One part as it is offered, whatever the quantity. */
export interface PartForSale {
  id: string;
  /** In the order that settles ties. */
  offers: readonly OfferForSale[];
  /** Weight of one piece; null: not known. */
  weightEach: number | null;
  /** The cheapest split over offers for a quantity that none covers by itself; null: there is none. */
  split: (quantity: number) => SourcingWay | null;
}

export interface OfferForSale {
  id: string;
  supplier: number;
  ladder: Ladder;
  leadDays: number | null;
  /** Worth of so many pieces left over of an order, in grains. */
  leftWorth: (order: Order, left: number) => bigint;
}

/** A market that is filled anew for each run size, and remembers what it held for the last. */
export interface SaleMarket {
  market: Market;
  parts: readonly PartForSale[];
  /** By part: pieces to buy at the size it is filled for. */
  toBuy: Float64Array;
  /** By way: the order it stands for, the quantity it was asked for. */
  orders: (Order | null)[];
  asked: Float64Array;
  splits: Map<number, SourcingWay>;
}

/** Room for a way that splits a part: only where stock may not reach. */
function splitRoom(offers: readonly OfferForSale[]): number {
  return offers.some(({ ladder }) => ladder.cap < Number.POSITIVE_INFINITY) ? offers.length : 0;
}

/** Lays the market out once: every offer is a way of its part, and a split is one more. */
export function saleMarket(suppliers: readonly MarketSupplier[], parts: readonly PartForSale[]): SaleMarket {
  const sum = (of: (part: PartForSale) => number) => parts.reduce((total, part) => total + of(part), 0);
  const ways = sum(({ offers }) => offers.length + (splitRoom(offers) > 0 ? 1 : 0));
  const orders = sum(({ offers }) => offers.length + splitRoom(offers));
  const market = emptyMarket(suppliers, { parts: parts.length, ways, orders });
  let [way, at] = [0, 0];
  parts.forEach(({ offers }, part) => {
    for (const { supplier } of offers) {
      market.orderFrom[way] = at;
      market.supplier[at] = supplier;
      market.orderTo[way++] = ++at;
    }
    if (splitRoom(offers) > 0) {
      market.orderFrom[way] = at;
      market.orderTo[way++] = at;
      at += offers.length;
    }
    market.first[part + 1] = way;
  });
  const sale: SaleMarket = {
    market,
    parts,
    toBuy: new Float64Array(parts.length),
    orders: new Array(ways).fill(null),
    asked: new Float64Array(ways),
    splits: new Map(),
  };
  market.leftWorth = (asked) => leftWorthOf(sale, asked);
  return sale;
}

/** Fills the market for the pieces to buy of each part: the orders of section 3, each offer's own. */
export function fillMarket(sale: SaleMarket, toBuy: ArrayLike<number>): void {
  const { market, parts } = sale;
  for (let part = 0; part < parts.length; part += 1) {
    const quantity = toBuy[part] as number;
    if (quantity === sale.toBuy[part]) continue;
    sale.toBuy[part] = quantity;
    market.needed[part] = quantity > 0 ? 1 : 0;
    if (quantity > 0) fillPart(sale, part, quantity);
  }
}

function fillPart(sale: SaleMarket, part: number, quantity: number): void {
  const { market } = sale;
  const { offers, weightEach, split } = sale.parts[part] as PartForSale;
  const first = market.first[part] as number;
  let covered = false;
  for (let index = 0; index < offers.length; index += 1) {
    const way = first + index;
    if (!stillHolds(sale, way, quantity))
      fillOffer(sale, way, offers[index] as OfferForSale, weightEach, quantity);
    covered ||= market.open[way] === 1;
  }
  const splitWay = first + offers.length;
  if (splitWay === market.first[part + 1]) return;
  market.open[splitWay] = 0;
  sale.splits.delete(splitWay);
  const found = covered ? null : split(quantity);
  if (found === null) return;
  sale.splits.set(splitWay, found);
  market.open[splitWay] = 1;
  const from = market.orderFrom[splitWay] as number;
  found.orders.forEach((order, index) => {
    setOrder(market, from + index, order.supplier, order);
  });
  market.orderTo[splitWay] = from + found.orders.length;
}

/** An order that already holds a larger quantity is still the cheapest for it: it was so among more. */
function stillHolds({ orders, asked, market }: SaleMarket, way: number, quantity: number): boolean {
  const order = orders[way] ?? null;
  if (market.open[way] === 0 || order === null) return false;
  return quantity >= (asked[way] as number) && quantity <= order.quantity;
}

function fillOffer(
  { market, orders, asked }: SaleMarket,
  way: number,
  { ladder, leadDays }: OfferForSale,
  weightEach: number | null,
  quantity: number,
): void {
  const order = cheapestOrder(ladder, quantity);
  const usable = order !== null && order.cost < Number.POSITIVE_INFINITY;
  orders[way] = usable ? order : null;
  asked[way] = quantity;
  market.open[way] = usable ? 1 : 0;
  if (!usable) return;
  const at = market.orderFrom[way] as number;
  const weight = weightEach === null ? null : weightEach * order.quantity;
  setOrder(market, at, market.supplier[at] as number, { cost: order.cost, weight, leadDays });
}

function leftWorthOf({ market, parts, toBuy, orders, splits }: SaleMarket, way: number): bigint {
  const split = splits.get(way);
  if (split !== undefined) return split.orders.reduce((sum, { leftWorth }) => sum + leftWorth, 0n);
  const order = orders[way] ?? null;
  if (order === null) return 0n;
  const part = partOf(market, way);
  const offer = parts[part]?.offers[way - (market.first[part] as number)];
  const left = order.quantity - (toBuy[part] as number);
  return left > 0 && offer !== undefined ? offer.leftWorth(order, left) : 0n;
}

/** The part a way belongs to. */
export function partOf({ first }: Market, way: number): number {
  let [low, high] = [0, first.length - 1];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((first[middle] as number) <= way) low = middle;
    else high = middle;
  }
  return low;
}

/** The orders of a way as they stand. */
export function ordersOfWay(sale: SaleMarket, way: number): SourcingOrder[] {
  const split = sale.splits.get(way);
  if (split !== undefined) return [...split.orders];
  const { market, parts, toBuy, orders } = sale;
  const part = partOf(market, way);
  const offer = parts[part]?.offers[way - (market.first[part] as number)];
  const order = orders[way] ?? null;
  if (offer === undefined || order === null) return [];
  const weight = market.weight[market.orderFrom[way] as number] as number;
  return [
    {
      offer: offer.id,
      supplier: offer.supplier,
      pieces: order.quantity,
      cost: order.cost,
      leftOver: order.quantity - (toBuy[part] as number),
      leftWorth: leftWorthOf(sale, way),
      weight: Number.isNaN(weight) ? null : weight,
      leadDays: offer.leadDays,
    },
  ];
}
