import { grains, grainText, scaled } from "#src/costing/grains.ts";
import { MILLION } from "#src/costing/price/charged.ts";
import { fraction, nearest, over } from "#src/costing/price/fraction.ts";

/**
 * Amounts of one order as one amount of one kit, to the nearest grain; `kits` as in a channel, above 0.
 *
 * @example perKit(["4.10", "0.95"], "1") === "5.05"
 */
export function perKit(amounts: readonly string[], kits: string): string {
  const sum = amounts.reduce((all, amount) => all + grains(amount), 0n);
  return grainText(nearest(over(fraction(sum), fraction(scaled(kits, 6), MILLION))));
}
