/** Whole-number arithmetic in ordinary numbers; every bound under which it is exact is stated here. */

/**
 * Bound for the functions below. Whole numbers and their sums are exact below 2^53, and the quotient
 * of two whole numbers below 2^52 never rounds up to the next whole number, since it lies at least
 * 1/b below it while the spacing of numbers there is at most 1/(2b).
 */
export const SAFE = 2 ** 50;

/**
 * Most that one part may cost in one order, in minor units of its currency (10 995 116 277.76 in a
 * currency with two decimals). With at most 2 000 parts every sum of orders stays below 2^53, so
 * that sums of minor units are exact as ordinary numbers. Dearer orders are refused by name.
 */
export const ORDER_MOST = 2 ** 40;

/**
 * Quotient of two whole numbers, halves up: `0 ≤ a < 2^50`, `1 ≤ b < 2^50`.
 *
 * @example divideHalfUp(4905, 10) === 491
 */
export function divideHalfUp(a: number, b: number): number {
  return Math.floor((2 * a + b) / (2 * b));
}

/**
 * Quotient rounded up: `0 ≤ a < 2^50`, `1 ≤ b < 2^50`.
 *
 * @example divideUp(735, 100) === 8
 */
export function divideUp(a: number, b: number): number {
  return Math.floor((a + b - 1) / b);
}

/**
 * Quotient rounded down: `0 ≤ a < 2^50`, `1 ≤ b < 2^50`.
 *
 * @example divideDown(735, 100) === 7
 */
export function divideDown(a: number, b: number): number {
  return Math.floor(a / b);
}

/**
 * The smallest multiple of `multiple` that is at least `least`. Pieces, whole numbers below 2^50.
 *
 * @example upToMultiple(735, 100) === 800
 */
export function upToMultiple(least: number, multiple: number): number {
  return multiple === 1 ? least : divideUp(least, multiple) * multiple;
}

/**
 * Exact quotient of whole numbers of any size, halves away from zero; `b > 0`.
 *
 * @example divideBigHalfAway(-5n, 2n) === -3n
 */
export function divideBigHalfAway(a: bigint, b: bigint): bigint {
  const doubled = 2n * (a < 0n ? -a : a) + b;
  const quotient = doubled / (2n * b);
  return a < 0n ? -quotient : quotient;
}
