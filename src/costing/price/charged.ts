import { divideBigHalfAway } from "#src/costing/whole.ts";

/**
 * What an outsider takes of a sale, rounded once as it is charged, halves away from zero (section 1.3).
 * Sums in grains, rates in millionths; `unit` is the minor unit in grains. With `unit` 1 the same
 * formulas give the sum before it is rounded, to the nearest grain.
 */

/** Rates have six decimals. */
export const MILLION = 1_000_000n;

/**
 * `amount ÷ divisor`, rounded to whole units.
 *
 * @example 4.905 to cents: 4.91
 */
export function toUnit(amount: bigint, divisor: bigint, unit: bigint): bigint {
  return divideBigHalfAway(amount, divisor * unit) * unit;
}

/**
 * Tax inside a sum that includes it, `sum · t/(1 + t)`.
 *
 * @example 38.95 at 21 %: 6.76
 */
export function taxInside(sum: bigint, rate: bigint, unit: bigint): bigint {
  return toUnit(sum * rate, MILLION + rate, unit);
}

/**
 * Tax added to a sum that is stated without it, `sum · t`.
 *
 * @example 20.50 at 21 %: 4.31
 */
export function taxOnTop(sum: bigint, rate: bigint, unit: bigint): bigint {
  return toUnit(sum * rate, MILLION, unit);
}

/**
 * Fee on a sum, `f · sum + k`, rounded together.
 *
 * @example 2.9 % and 0.30 on 38.50: 1.42
 */
export function feeOn(sum: bigint, rate: bigint, fixed: bigint, unit: bigint): bigint {
  return toUnit(sum * rate + fixed * MILLION, MILLION, unit);
}
