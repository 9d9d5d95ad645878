import { grainShare, grains, grainText, ONE } from "./grains.ts";

/**
 * An amount in another currency, shared among `count`: `amount × rate ÷ count`, to the nearest grain. `rate` is in
 * reporting units per unit of the amount's currency; "1" where they are the same.
 *
 * @example convertedEach("10", "0.92", 8) === "1.15"
 */
export function convertedEach(amount: string, rate: string, count: number): string {
  return grainText(grainShare(grains(amount), grains(rate), ONE * BigInt(count)));
}
