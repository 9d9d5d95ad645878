import { currencyDecimals } from "./currencies.ts";
import { scaled, scaledText } from "./grains.ts";
import { divideBigHalfAway } from "./whole.ts";

/**
 * Decimals an amount of a currency is charged in. A code that is not on the ISO list is reckoned
 * with two, which most have, and the run says so (`currency-not-listed`).
 *
 * @example minorDecimals("JPY") === 0
 */
export function minorDecimals(currency: string): number {
  return currencyDecimals(currency) ?? 2;
}

/**
 * An amount a supplier charges, in minor units of its currency: rounded once, halves away from zero
 * (section 1.3). Text has at most 12 decimals.
 *
 * @example toMinor("4.905", "EUR") === 491n; toMinor("4.905", "JPY") === 5n
 */
export function toMinor(amount: string, currency: string): bigint {
  const decimals = minorDecimals(currency);
  return divideBigHalfAway(scaled(amount, 12), 10n ** BigInt(12 - decimals));
}

/**
 * The least whole number of minor units that reaches a threshold. Goods are whole minor units, the
 * threshold need not be: 4 yen do not reach free freight from 4.10.
 *
 * @example minorReaching("4.10", "JPY") === 5n; minorReaching("75", "EUR") === 7500n
 */
export function minorReaching(threshold: string, currency: string): bigint {
  const unit = 10n ** BigInt(12 - minorDecimals(currency));
  return (scaled(threshold, 12) + unit - 1n) / unit;
}

/**
 * Minor units as decimal text with all the currency's decimals.
 *
 * @example minorText(6200, "EUR") === "62.00"
 */
export function minorText(minor: number | bigint, currency: string): string {
  const decimals = minorDecimals(currency);
  const [whole = "0", fraction = ""] = scaledText(BigInt(minor), decimals).split(".");
  return decimals === 0 ? whole : `${whole}.${fraction.padEnd(decimals, "0")}`;
}
