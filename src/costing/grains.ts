import { divideBigHalfAway } from "./whole.ts";

/**
 * Exact sums of money. One grain is 10^-24 of the plan's currency: every price (6 decimals), minor
 * unit times conversion rate (up to 4 + 10), share of a price (6 + 6) and learning factor times
 * minutes times rate (12 + 6 + 6) is a whole number of grains, so sums are exact and their order
 * does not matter. A quotient that does not end is taken to the nearest grain. Sums up to 10^16
 * thus carry the 40 significant digits of section 1.1.
 */
export const GRAIN_PLACES = 24;
export const ONE = 10n ** BigInt(GRAIN_PLACES);

/**
 * Decimal text as grains. Text has at most 24 decimals.
 *
 * @example grains("0.062") === 62_000_000_000_000_000_000_000n
 */
export function grains(text: string): bigint {
  return scaled(text, GRAIN_PLACES);
}

/**
 * Decimal text times 10^places as a whole number; the text has at most so many decimals.
 *
 * @example scaled("0.062", 6) === 62_000n
 */
export function scaled(text: string, places: number): bigint {
  const negative = text.startsWith("-");
  const value = BigInt(scaledDigits(negative ? text.slice(1) : text, places));
  return negative ? -value : value;
}

/**
 * The digits of decimal text without sign times 10^places.
 *
 * @example scaledDigits("0.062", 6) === "0062000"
 */
export function scaledDigits(text: string, places: number): string {
  const point = text.indexOf(".");
  if (point < 0) return text + "0".repeat(places);
  return text.slice(0, point) + text.slice(point + 1).padEnd(places, "0");
}

/**
 * Grains as the shortest exact decimal text.
 *
 * @example grainText(grains("34.50")) === "34.5"
 */
export function grainText(value: bigint): string {
  return scaledText(value, GRAIN_PLACES);
}

/**
 * A whole number of 10^-places as the shortest exact decimal text.
 *
 * @example scaledText(48_500_000n, 6) === "48.5"
 */
export function scaledText(value: bigint, places: number): string {
  const negative = value < 0n;
  const digits = (negative ? -value : value).toString().padStart(places + 1, "0");
  const point = digits.length - places;
  let end = digits.length;
  while (end > point && digits.charCodeAt(end - 1) === 48) end -= 1;
  const text =
    end === point ? digits.slice(0, point) : `${digits.slice(0, point)}.${digits.slice(point, end)}`;
  return negative ? `-${text}` : text;
}

/**
 * `value × part ÷ whole`, to the nearest grain; `whole > 0`.
 *
 * @example grainShare(100n, 1n, 3n) === 33n
 */
export function grainShare(value: bigint, part: bigint, whole: bigint): bigint {
  return divideBigHalfAway(value * part, whole);
}
