import { SAFE } from "./whole.ts";

/** A sum of products of whole numbers that stays exact: in an ordinary number while it fits, else in a big one. */
export interface WholeSum {
  small: number;
  big: bigint;
}

/** A sum of nothing yet. */
export function emptySum(): WholeSum {
  return { small: 0, big: 0n };
}

/**
 * Adds `count × value`; `exactValue` gives the same value where it is too large for an ordinary number.
 *
 * @example addProduct(sum, 265, 62_000, () => 62_000n) adds 16_430_000 millionths
 */
export function addProduct(sum: WholeSum, count: number, value: number, exactValue: () => bigint): void {
  const total = sum.small + count * value;
  if (total < SAFE) {
    sum.small = total;
    return;
  }
  sum.big += BigInt(sum.small) + BigInt(count) * exactValue();
  sum.small = 0;
}

/** The whole sum, exact. */
export function sumOf(sum: WholeSum): bigint {
  return sum.big + BigInt(sum.small);
}

/** Back to nothing, without making a new sum. */
export function clearSum(sum: WholeSum): void {
  sum.small = 0;
  sum.big = 0n;
}
