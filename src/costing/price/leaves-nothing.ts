import { scaled } from "#src/costing/grains.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { MILLION } from "./charged.ts";

/**
 * Whether fee and tax of a channel take all of a price, however high: the fee is then taken on tax as
 * well, and `f · (1 + t) ≥ 1`. A fee below 100 % on sums without tax always leaves something. Terms that
 * are not known take nothing yet.
 *
 * @example 85 % fee on tax too, 21 % tax: 0.85 · 1.21 = 1.0285 → true
 */
export function leavesNothing({
  taxRate,
  feeRate,
  feeOnTax,
}: Pick<PlanChannel, "taxRate" | "feeRate" | "feeOnTax">): boolean {
  if (!feeOnTax) return false;
  const taxed = MILLION + scaled(taxRate ?? "0", 6);
  return scaled(feeRate ?? "0", 6) * taxed >= MILLION * MILLION;
}
