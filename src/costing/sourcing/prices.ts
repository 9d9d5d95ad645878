import type { Market } from "./market.ts";

/** What each supplier's orders count for while every part is bought where it is cheapest by itself. */
export interface Prices {
  /** By supplier: what a unit of an order's worth, and of its weight, counts for. */
  perGoods: Float64Array;
  perWeight: Float64Array;
  /** 1: only orders whose weight is known. */
  weighedOnly: Uint8Array;
}

/** Prices at which goods count for their worth. */
export function plainPrices(suppliers: number): Prices {
  return {
    perGoods: new Float64Array(suppliers).fill(1),
    perWeight: new Float64Array(suppliers),
    weighedOnly: new Uint8Array(suppliers),
  };
}

/** What a way counts for at these prices; Infinity where the weight of an order is missing and must be known. */
export function countOf(market: Market, prices: Prices, way: number): number {
  const end = market.orderTo[way] as number;
  let count = 0;
  for (let at = market.orderFrom[way] as number; at < end; at += 1) {
    const supplier = market.supplier[at] as number;
    const perWeight = prices.perWeight[supplier] as number;
    count += (prices.perGoods[supplier] as number) * (market.near[at] as number);
    if (perWeight === 0 && prices.weighedOnly[supplier] === 0) continue;
    const weight = market.weight[at] as number;
    if (!Number.isNaN(weight)) count += perWeight * weight;
    else if (prices.weighedOnly[supplier] === 1) return Number.POSITIVE_INFINITY;
  }
  return count;
}
