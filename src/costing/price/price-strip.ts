import type { Figure } from "#src/costing/figure.ts";
import { grains, grainText } from "#src/costing/grains.ts";
import type { Scope } from "./edition-sale.ts";
import { evenAfterAt } from "./even-after-at.ts";
import type { PriceContext } from "./price-context.ts";
import { leftAt } from "./price-yields.ts";

/** One of several prices side by side: what it leaves per kit, and after how many sold the run is even. */
export interface StripPrice {
  price: string;
  asked: boolean;
  left: Figure;
  evenAfter: Figure;
}

/** Steps from the price asked: closer beside it, wider further off. Common practice, no source. */
const STEPS = [-5n, -3n, -1n, 0n, 1n, 3n, 5n];
const PARTS_OF_PRICE = 25n;

/**
 * Prices around one, in round steps: the largest of 1, 2 and 5 of a decimal place that is not more than
 * a twenty-fifth of the price, at least a minor unit. Grains; only prices above nothing.
 *
 * @example around 34.00: 29, 31, 33, 34, 35, 37, 39
 */
export function pricesAround(price: bigint, unit: bigint): bigint[] {
  const step = roundStep(price / PARTS_OF_PRICE, unit);
  return STEPS.map((steps) => price + steps * step).filter((one) => one > 0n);
}

function roundStep(most: bigint, unit: bigint): bigint {
  let tens = unit;
  while (tens * 10n <= most) tens *= 10n;
  const fitting = [5n, 2n].find((many) => tens * many <= most) ?? 1n;
  return tens * fitting;
}

/**
 * The strip of neighbouring prices in a scope. `prices` as decimal text where they are chosen; else
 * those around `price`.
 *
 * @example priceStrip(context, { edition: "full", channel: null }, "34.00")[3].asked === true
 */
export function priceStrip(
  context: PriceContext,
  scope: Scope,
  price: string,
  prices: readonly string[] = pricesAround(grains(price), context.unit).map(grainText),
): StripPrice[] {
  const asked = grains(price);
  return prices.map((text) => {
    const one = grains(text);
    return {
      price: text,
      asked: one === asked,
      left: leftAt(context, scope, one),
      evenAfter: evenAfterAt(context, { scope, price: one }),
    };
  });
}
