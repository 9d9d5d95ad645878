import { scaled } from "./grains.ts";
import { divideBigHalfAway } from "./whole.ts";

/**
 * Crawford's unit learning curve (section 7): the kit made as number i takes
 * T(i) = T(1) · i^(log2 slope), so that each doubling of the number takes `slope` of the time.
 * Reckoned in fixed point with 110 binary places and rounded to 12 decimals, because the powers of
 * binary floating point may differ between machines and the same input must give the same bytes.
 */

/** Decimals of a factor. */
export const FACTOR_PLACES = 12;
const BITS = 110n;
const UNIT = 1n << BITS;
const LN2 = 2n * areaTangent(UNIT / 3n);
const FACTOR_UNIT = 10n ** BigInt(FACTOR_PLACES);

/** atanh(x) for 0 ≤ x < ½ in fixed point: x + x³/3 + x⁵/5 … */
function areaTangent(x: bigint): bigint {
  const square = (x * x) >> BITS;
  let power = x;
  let sum = 0n;
  for (let odd = 1n; power > 0n; odd += 2n) {
    sum += power / odd;
    power = (power * square) >> BITS;
  }
  return sum;
}

/** ln(a ÷ b) in fixed point for whole a, b > 0: twos are taken out first, then atanh. */
function logarithm(a: bigint, b: bigint): bigint {
  let twos = 0n;
  let [over, under] = [a, b];
  for (; over > 2n * under; twos += 1n) under *= 2n;
  for (; over < under; twos -= 1n) over *= 2n;
  const x = ((over - under) * UNIT) / (over + under);
  return twos * LN2 + 2n * areaTangent(x);
}

/** e^(−x) in fixed point for x ≥ 0: whole twos by shifting, the rest by the series of e^(−r/64), squared. */
function decay(x: bigint): bigint {
  const twos = x / LN2;
  const rest = (x - twos * LN2) >> 6n;
  let term = UNIT;
  let sum = UNIT;
  for (let k = 1n; term !== 0n; k += 1n) {
    term = -((term * rest) >> BITS) / k;
    sum += term;
  }
  for (let squared = 0; squared < 6; squared += 1) sum = (sum * sum) >> BITS;
  return sum >> twos;
}

/**
 * Running sums of the unit factors after `before` kits: entry m is the sum over the next m kits, in
 * 10^-12 (a first kit counts 1). Slope is decimal text from 0 to 1; "1" means no learning.
 *
 * @example factorSums("0.8", 0, 2) → [0n, 1_000_000_000_000n, 1_800_000_000_000n]
 */
export function factorSums(slope: string, before: number, kits: number): bigint[] {
  const sums = [0n];
  let sum = 0n;
  const factor = unitFactor(slope);
  for (let made = 1; made <= kits; made += 1) {
    sum += factor(before + made);
    sums.push(sum);
  }
  return sums;
}

/**
 * The factor of kit number i in 10^-12.
 *
 * @example unitFactor("0.8")(3) === 702_103_705_427n // 0.702 in printed tables
 */
export function unitFactor(slope: string): (number: number) => bigint {
  const parts = scaled(slope, 6);
  if (parts >= 1_000_000n) return () => FACTOR_UNIT;
  if (parts === 0n) return (number) => (number === 1 ? FACTOR_UNIT : 0n);
  const steepness = (logarithm(1_000_000n, parts) * UNIT) / LN2;
  return (number) => {
    const exponent = (steepness * logarithm(BigInt(number), 1n)) >> BITS;
    return divideBigHalfAway(decay(exponent) * FACTOR_UNIT, UNIT);
  };
}
