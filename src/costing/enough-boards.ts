import { scaled, scaledText } from "./grains.ts";
import { divideBigHalfAway } from "./whole.ts";

const MILLION = 1_000_000n;

/**
 * Chance that at least `required` of `ordered` boards are good, each with chance `yieldShare` (section 6):
 * the upper tail of Binomial(ordered, yield). The number of faulty boards before the required-th good one is
 * negative binomial, so P = yield^r · Σ C(r + j − 1, j) · (1 − yield)^j, j = 0 … ordered − r; summed in whole
 * numbers, all over a power of a million. Text of 0 to 1 with 6 decimals, halves up.
 *
 * @example enoughGood(20, 21, "0.95") === "0.716972" (0.95^20 × (1 + 20 × 0.05))
 */
export function enoughGood(required: number, ordered: number, yieldShare: string): string {
  if (ordered < required) return "0";
  const good = scaled(yieldShare, 6);
  const faulty = MILLION - good;
  let term = 1n;
  let sum = 1n;
  for (let extra = 1; extra <= ordered - required; extra += 1) {
    term = (term * faulty * BigInt(required + extra - 1)) / BigInt(extra);
    sum = sum * MILLION + term;
  }
  const chance = divideBigHalfAway(good ** BigInt(required) * sum * MILLION, MILLION ** BigInt(ordered));
  return scaledText(chance, 6);
}
