import { type Baskets, emptyBaskets, putWay } from "./held-plan.ts";
import type { Market } from "./market.ts";

/** What each supplier's orders count for while every part is bought where it is cheapest by itself. */
export interface Prices {
  /** 1: the supplier may be used. */
  inSet: Uint8Array;
  /** By supplier: what a unit of an order's worth, and of its weight, counts for. */
  perGoods: Float64Array;
  perWeight: Float64Array;
  /** By supplier: what each order is let off, so that a supplier which must be used gets one. */
  bonus: Float64Array;
  /** 1: only orders whose weight is known. */
  weighedOnly: Uint8Array;
}

/** Every part bought the way that counts least, by itself. */
export interface RelaxedLines {
  ways: Int32Array;
  /** Per part what its way counts for, and their sum. */
  counts: Float64Array;
  sum: number;
  baskets: Baskets;
}

/** Prices at which nobody is open yet. */
export function noPrices(suppliers: number): Prices {
  return {
    inSet: new Uint8Array(suppliers),
    perGoods: new Float64Array(suppliers).fill(1),
    perWeight: new Float64Array(suppliers),
    bonus: new Float64Array(suppliers),
    weighedOnly: new Uint8Array(suppliers),
  };
}

/** Room for relaxed lines, to be filled again and again. */
export function emptyLines({ parts, suppliers }: Market): RelaxedLines {
  return {
    ways: new Int32Array(parts),
    counts: new Float64Array(parts),
    sum: 0,
    baskets: emptyBaskets(suppliers.length),
  };
}

/** What a way counts for at these prices; Infinity where one of its suppliers may not be used. */
export function countOf(market: Market, prices: Prices, way: number): number {
  const end = market.orderTo[way] as number;
  let count = 0;
  for (let at = market.orderFrom[way] as number; at < end; at += 1) {
    const supplier = market.supplier[at] as number;
    if (prices.inSet[supplier] === 0) return Number.POSITIVE_INFINITY;
    const weight = market.weight[at] as number;
    const weighed = !Number.isNaN(weight);
    if (!weighed && prices.weighedOnly[supplier] === 1) return Number.POSITIVE_INFINITY;
    count +=
      (prices.perGoods[supplier] as number) * (market.near[at] as number) -
      (prices.bonus[supplier] as number);
    if (weighed) count += (prices.perWeight[supplier] as number) * weight;
  }
  return count;
}

/** Buys every part by itself at these prices; a part none of them sells counts as one not bought. */
export function relaxLines(market: Market, omitted: number, prices: Prices, lines: RelaxedLines): void {
  const { baskets } = lines;
  baskets.goods.fill(0);
  baskets.weight.fill(0);
  baskets.unweighed.fill(0);
  baskets.lines.fill(0);
  lines.sum = 0;
  for (let part = 0; part < market.parts; part += 1) {
    lines.ways[part] = -1;
    lines.counts[part] = 0;
    if (market.needed[part] === 0) continue;
    let [best, least] = [-1, omitted];
    const end = market.first[part + 1] as number;
    for (let way = market.first[part] as number; way < end; way += 1) {
      if (market.open[way] === 0) continue;
      const count = countOf(market, prices, way);
      if (count < least) {
        least = count;
        best = way;
      }
    }
    lines.ways[part] = best;
    lines.counts[part] = least;
    lines.sum += least;
    if (best >= 0) putWay(market, best, baskets);
  }
}
