/**
 * Splits a whole amount by weights so that the parts add up to it exactly: each part is rounded
 * down and what remains goes one unit each to the largest remainders, ties to the earlier weight
 * (largest remainder, also called Hamilton's method; sections 2, 4.4 and 8). With all weights zero
 * the split is even. Weights are not negative; a negative amount is split as its mirror image.
 *
 * @example allocate(100n, [1n, 1n, 1n]) → [34n, 33n, 33n]
 */
export function allocate(amount: bigint, weights: readonly bigint[]): bigint[] {
  if (amount < 0n) return allocate(-amount, weights).map((part) => -part);
  const total = weights.reduce((sum, weight) => sum + weight, 0n);
  if (weights.length === 0) return [];
  if (total === 0n)
    return allocate(
      amount,
      weights.map(() => 1n),
    );
  const parts = weights.map((weight) => (amount * weight) / total);
  const remainders = weights.map((weight, index) => ({ index, rest: (amount * weight) % total }));
  remainders.sort((a, b) => (a.rest === b.rest ? a.index - b.index : a.rest < b.rest ? 1 : -1));
  let left = Number(amount - parts.reduce((sum, part) => sum + part, 0n));
  for (const { index } of remainders) {
    if (left === 0) break;
    parts[index] = (parts[index] ?? 0n) + 1n;
    left -= 1;
  }
  return parts;
}
