import { grainShare, grains, grainText, scaled } from "./grains.ts";
import { beforeTax } from "./price/aims.ts";
import { MILLION } from "./price/charged.ts";
import { nearest } from "./price/fraction.ts";
import type { SweepColumns } from "./sweep-result.ts";

/** Runs that reach a profit: the first that does, and the one from which every larger one does. */
export interface TargetRuns {
  first: number | null;
  safe: number | null;
}

/**
 * Profit before tax that leaves `afterTax` when so much of it is taxed away (section 11):
 * `after ÷ (1 − rate)`, to the nearest grain. Money as decimal text; rate below 1.
 *
 * @example profitBeforeTax("540000", "0.4") === "900000"
 */
export function profitBeforeTax(afterTax: string, taxRate: string): string {
  return grainText(nearest(beforeTax(afterTax, taxRate)));
}

/**
 * What a profit leaves after tax: `profit × (1 − rate)`, to the nearest grain; a loss is not taxed and
 * stays as it is.
 *
 * @example profitAfterTax("900000", "0.4") === "540000"
 */
export function profitAfterTax(profit: string, taxRate: string): string {
  const before = grains(profit);
  return grainText(before < 0n ? before : grainShare(before, MILLION - scaled(taxRate, 6), MILLION));
}

/**
 * Run sizes with at least a target profit before tax, from a sweep; null: none up to its end, or
 * profit is not known. As with break-even, costs go up in steps, so a larger run may miss it again.
 *
 * @example fixed 50 000, price 250, variable 150: runsForProfit(sweep, "30000").first === 800
 */
export function runsForProfit(sweep: { columns: Pick<SweepColumns, "profit"> }, target: string): TargetRuns {
  const wanted = grains(target);
  const { profit } = sweep.columns;
  const end = profit.indexOf(null);
  const known = end < 0 ? profit : profit.slice(0, end);
  const reaches = known.map((value) => value !== null && grains(value) >= wanted);
  const first = reaches.indexOf(true);
  const lastMiss = reaches.lastIndexOf(false);
  return {
    first: first < 0 ? null : first + 1,
    safe: lastMiss === reaches.length - 1 ? null : lastMiss + 2,
  };
}
