import { divideBigHalfAway, divideHalfUp, SAFE } from "#src/costing/whole.ts";
import type { BasketTerms, FreightBand } from "./basket-terms.ts";

const MILLION = 1_000_000;

/** What one order to one supplier costs, in minor units of its currency, each charge rounded by itself. */
export interface BasketBill {
  goods: number;
  /** Null: not known, because of the terms or because a part's weight is missing. */
  freight: number | null;
  fee: number;
  handling: number;
  customsValue: number;
  duty: number;
  importTax: number;
  broker: number;
  /** The supplier does not take an order as small as this. */
  refused: boolean;
  /** All that is a cost and known: import tax that is reclaimed and freight not known are left out. */
  total: number;
}

/**
 * The bill for goods of so many minor units and so much weight (sections 4.1 to 4.3); `weight` null: not known.
 * Freight that is not known is left out of the customs value too, so the total is one "without freight".
 *
 * @example goods 10000, freight 500 counted in, duty 2.5 %, tax 20 %: duty 263, tax 2153, total 12916
 */
export function basketBill(terms: BasketTerms, goods: number, weight: number | null): BasketBill {
  const below = goods < terms.minimum;
  const { belowMinimum, handling, customs } = terms;
  const freight = freightOf(terms, goods, weight);
  const fee = below && belowMinimum.term === "fee" ? belowMinimum.fee : 0;
  let [customsValue, duty, importTax, broker, cost] = [0, 0, 0, 0, 0];
  if (customs !== null) {
    customsValue = goods + (customs.withFreight ? (freight ?? 0) : 0);
    duty = customsValue > customs.dutyOver ? shareOf(customsValue, customs.dutyMillionths) : 0;
    importTax = shareOf(customsValue + duty, customs.taxMillionths);
    broker = customs.broker;
    cost = duty + broker + (customs.taxReclaimed ? 0 : importTax);
  }
  return {
    goods,
    freight,
    fee,
    handling,
    customsValue,
    duty,
    importTax,
    broker,
    refused: below && belowMinimum.term === "refused",
    total: goods + (freight ?? 0) + fee + handling + cost,
  };
}

/**
 * Freight of an order (section 4.2); 0 from the free value upward; null: not known.
 *
 * @example bands 0: 490, 5000: 290; goods 5000 → 290
 */
export function freightOf(terms: BasketTerms, goods: number, weight: number | null): number | null {
  const { freight, freeFrom } = terms;
  if (freeFrom !== null && goods >= freeFrom) return 0;
  if (freight.model === "none") return 0;
  if (freight.model === "flat") return freight.amount;
  if (freight.model === "by-goods") return bandAt(freight.bands, goods);
  if (freight.model === "by-weight") return weight === null ? null : bandAt(freight.bands, weight);
  return null;
}

function bandAt(bands: readonly FreightBand[], measure: number): number {
  let reached = 0;
  while ((bands[reached + 1]?.from ?? Number.POSITIVE_INFINITY) <= measure) reached += 1;
  return bands[reached]?.amount ?? 0;
}

function shareOf(amount: number, millionths: number): number {
  const product = amount * millionths;
  if (product < SAFE) return divideHalfUp(product, MILLION);
  return Number(divideBigHalfAway(BigInt(amount) * BigInt(millionths), BigInt(MILLION)));
}
