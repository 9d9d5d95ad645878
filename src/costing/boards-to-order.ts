import { scaled } from "./grains.ts";

/** Yields that would need more boards than this are taken for a slip of the pen. */
export const BOARDS_MOST = 200_000;
/** Two probabilities nearer than this are compared with exact fractions. */
const TOO_NEAR = 1e-9;
const MILLION = 1_000_000;

/**
 * Boards to order (section 6): the smallest B ≥ required with
 * P(good boards ≥ required) ≥ confidence, good ~ Binomial(B, yield).
 *
 * B = required + k, where k is the least number of faulty boards allowed for: the number of faulty
 * ones before the required-th good one is negative binomial, so
 * P = yield^r · Σ_{j ≤ k} C(r + j − 1, j) · (1 − yield)^j. The sum runs in floating point only while
 * it is plainly below or above the confidence; where it is near, exact fractions decide.
 *
 * Counts of boards; yield and confidence decimal text of 0 to 1. `null` where the yield is 0, or so
 * low that more than 200 000 boards would be expected.
 *
 * @example boardsToOrder(20, "0.95", "0.95") === 23
 */
export function boardsToOrder(required: number, yieldShare: string, confidence: string): number | null {
  const good = Number(scaled(yieldShare, 6));
  const sure = Number(scaled(confidence, 6));
  if (required === 0 || good === MILLION || sure === 0) return required;
  if (good === 0 || required * MILLION > BOARDS_MOST * good) return null;
  const wanted = Math.log(sure / MILLION);
  const first = required * Math.log(good / MILLION);
  const faulty = 1 - good / MILLION;
  let [term, sum, shift] = [1, 1, 0];
  for (let allowed = 0; ; allowed += 1) {
    const difference = first + Math.log(sum) + shift - wanted;
    const near = difference < TOO_NEAR && difference > -TOO_NEAR;
    if (near ? surelyEnough(required, allowed, good, sure) : difference > 0) return required + allowed;
    term *= (faulty * (required + allowed)) / (allowed + 1);
    sum += term;
    if (sum > 1e250) {
      [term, sum, shift] = [term / 1e250, sum / 1e250, shift + Math.log(1e250)];
    }
  }
}

/** The same comparison in whole numbers: both sides times a power of ten that clears all fractions. */
function surelyEnough(required: number, allowed: number, good: number, sure: number): boolean {
  const million = BigInt(MILLION);
  const faulty = BigInt(MILLION - good);
  let term = 1n;
  let sum = 0n;
  for (let j = 0n; j <= BigInt(allowed); j += 1n) {
    sum = sum * million + term;
    term = (term * faulty * (BigInt(required) + j)) / (j + 1n);
  }
  const probability = BigInt(good) ** BigInt(required) * sum;
  return probability * million >= BigInt(sure) * million ** BigInt(required + allowed);
}
