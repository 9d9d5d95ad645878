import type { Need } from "#src/costing/problem.ts";
import { need } from "#src/costing/run-needs.ts";
import { MILLION, toUnit } from "./charged.ts";
import type { PreparedChannel } from "./prepared-channel.ts";

/**
 * What a channel asks for a kit of an edition, in grains, stated as its prices are: its own price, or
 * the list price less the discount, without the tax where prices are stated without it. The list price
 * includes tax. A price worked out is rounded to `unit`, since it is asked and paid (section 1.3); a
 * price that somebody wrote is taken as it stands. Null where `askedNeeds` says why.
 *
 * @example list price 34.00, 27 % off, stated without 21 % tax: 34 · 0.73 ÷ 1.21 = 20.51
 */
export function askedPrice(
  prepared: PreparedChannel,
  edition: string,
  listPrice: bigint | null,
  unit: bigint,
): bigint | null {
  const { ownPrices, ofListPrice, taxOnTop, taxRate, needs } = prepared;
  const own = ownPrices.get(edition);
  if (own !== undefined) return own;
  if (listPrice === null || (taxOnTop && needs.tax.length > 0)) return null;
  if (ofListPrice === MILLION && !taxOnTop) return listPrice;
  return toUnit(listPrice * ofListPrice, MILLION + (taxOnTop ? taxRate : 0n), unit);
}

/**
 * Why what a channel asks is not known: no list price to follow, or no tax rate to take off it.
 *
 * @example a shop's prices without tax, tax rate not set → no-tax-rate
 */
export function askedNeeds(prepared: PreparedChannel, edition: string, listed: boolean): Need[] {
  if (prepared.ownPrices.has(edition)) return [];
  const price = listed ? [] : [need("no-price", [{ edition }])];
  return prepared.taxOnTop ? [...price, ...prepared.needs.tax] : price;
}
