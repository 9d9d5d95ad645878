import { scaled } from "./grains.ts";
import { divideBigHalfAway } from "./whole.ts";

/**
 * Crawford's unit learning curve (section 7): the kit made as number i takes
 * T(i) = T(1) · i^(log2 slope), so that each doubling of the number takes `slope` of the time.
 * Reckoned in fixed point with 128 binary places and rounded to 12 decimals, because the powers of
 * binary floating point may differ between machines and the same input must give the same bytes.
 */

/** Decimals of a factor. */
export const FACTOR_PLACES = 12;
const FACTOR_UNIT = 10n ** BigInt(FACTOR_PLACES);
const BITS = 128n;
const UNIT = 1n << BITS;
const LN2 = 2n * areaTangent(1n, 3n);

/**
 * Running sums of the unit factors after `before` kits: entry m is the sum over the next m kits, in
 * 10^-12 (a first kit counts 1). Slope is decimal text from 0 to 1; "1" means no learning.
 *
 * @example factorSums("0.8", 0, 2) → [0n, 1_000_000_000_000n, 1_800_000_000_000n]
 */
export function factorSums(slope: string, before: number, kits: number): bigint[] {
  const sums = [0n];
  let sum = 0n;
  for (const factor of unitFactors(slope, before, kits)) {
    sum += factor;
    sums.push(sum);
  }
  return sums;
}

/**
 * Factors of the kits number before + 1 … before + kits, in 10^-12.
 *
 * @example unitFactors("0.8", 0, 3) → [1…, 0.8, 0.702103705427] × 10^12 // 0.702 in printed tables
 */
export function unitFactors(slope: string, before: number, kits: number): bigint[] {
  const share = scaled(slope, 6);
  if (share >= 1_000_000n) return new Array(kits).fill(FACTOR_UNIT);
  if (share === 0n)
    return Array.from({ length: kits }, (_, index) => (before + index === 0 ? FACTOR_UNIT : 0n));
  const steepness = (logarithm(1_000_000n, share) << BITS) / LN2;
  let number = BigInt(before + 1);
  let factor = decay((steepness * logarithm(number, 1n)) >> BITS);
  return Array.from({ length: kits }, () => {
    const rounded = divideBigHalfAway(factor * FACTOR_UNIT, UNIT);
    factor = (factor * decay((steepness * nextLogarithm(number)) >> BITS)) >> BITS;
    number += 1n;
    return rounded;
  });
}

/** ln((n + 1) ÷ n) in fixed point. */
function nextLogarithm(n: bigint): bigint {
  return 2n * areaTangent(1n, 2n * n + 1n);
}

/** ln(a ÷ b) in fixed point for whole a ≥ b > 0: twos are taken out first. */
function logarithm(a: bigint, b: bigint): bigint {
  let twos = 0n;
  let under = b;
  for (; a > 2n * under; twos += 1n) under *= 2n;
  return twos * LN2 + 2n * areaTangent(a - under, a + under);
}

/** atanh(a ÷ b) for 0 ≤ a ÷ b < ½ in fixed point: x + x³/3 + x⁵/5 … */
function areaTangent(a: bigint, b: bigint): bigint {
  const x = (a << BITS) / b;
  const square = (x * x) >> BITS;
  let power = x;
  let sum = 0n;
  for (let odd = 1n; power > 0n; odd += 2n) {
    sum += power / odd;
    power = (power * square) >> BITS;
  }
  return sum;
}

/** e^(−x) in fixed point for x ≥ 0: whole twos by shifting, the rest by its series. */
function decay(x: bigint): bigint {
  const twos = x / LN2;
  const rest = x - twos * LN2;
  let term = UNIT;
  let sum = UNIT;
  for (let k = 1n; term !== 0n && term !== -1n; k += 1n) {
    term = -((term * rest) >> BITS) / k;
    sum += term;
  }
  return sum >> twos;
}
