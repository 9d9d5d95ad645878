import { divideDown } from "./whole.ts";

/**
 * Kits of each edition in a run (section 2): the run split by the mix's weights with largest
 * remainder, ties to the earlier edition. Weights are whole numbers up to 1 000 000, kits up to
 * 1 100, so products stay exact. All weights zero: no kits anywhere, the mix is not decided.
 *
 * @example splitKits(10, [1, 1, 1]) → [4, 3, 3]
 */
export function splitKits(kits: number, weights: readonly number[]): number[] {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  if (total === 0) return weights.map(() => 0);
  const counts = weights.map((weight) => divideDown(kits * weight, total));
  let left = kits - counts.reduce((sum, count) => sum + count, 0);
  const order = weights.map((weight, index) => ({ index, rest: (kits * weight) % total }));
  order.sort((a, b) => b.rest - a.rest || a.index - b.index);
  for (const { index } of order) {
    if (left === 0) break;
    counts[index] = (counts[index] ?? 0) + 1;
    left -= 1;
  }
  return counts;
}
