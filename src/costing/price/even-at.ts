import { marginOfSafety } from "#src/costing/break-even.ts";
import { evenRuns } from "#src/costing/even-runs.ts";
import { grains, grainText } from "#src/costing/grains.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import type { Crossing } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { PriceContext } from "./price-context.ts";
import { bringsPerKit, kitsSold, type Tried } from "./run-sold.ts";
import { takingsFrom } from "./takings.ts";

/** Break-even at a price (section 11), over run sizes 1 … `upTo`; as `BreakEven`, without what stepped. */
export interface EvenAt {
  /** Profit of a run of n at place n − 1; null from where it is not known. */
  profit: (string | null)[];
  known: boolean;
  crossings: Omit<Crossing, "changes">[];
  first: number | null;
  safe: number | null;
  upTo: number;
  marginOfSafety: string | null;
}

/**
 * profit(n) = what n kits bring by the mix of editions and channels − `used[n − 1]`, the sweep's column
 * of used cost, which does not depend on prices. A price may be tried in place of the plan's.
 *
 * @example evenAt(context, sweepRuns(plan).columns.used).first === 56
 */
export function evenAt(
  context: PriceContext,
  used: readonly (string | null)[],
  tried: Tried | null = null,
): EvenAt {
  const takings = bringsPerKit(kitsSold(context, tried));
  const weights = context.plan.editions.map(({ weight }) => weight);
  const mixed = weights.some((weight) => weight > 0);
  const profits = [0n];
  for (const cost of mixed ? used : []) {
    const brought = takingsFrom(takings, splitKits(profits.length, weights));
    if (cost === null || brought === null) break;
    profits.push(brought - grains(cost));
  }
  const upTo = profits.length - 1;
  const profit = (kits: number) => profits[kits] as bigint;
  const { turns, first, safe } = evenRuns(profit, upTo);
  return {
    profit: used.map((_, place) => (place < upTo ? grainText(profit(place + 1)) : null)),
    known: upTo > 0,
    crossings: turns.map(({ kits, way }) => ({
      kits,
      way,
      profitBefore: grainText(profit(kits - 1)),
      profit: grainText(profit(kits)),
    })),
    first,
    safe,
    upTo,
    marginOfSafety: marginOfSafety(context.cost.kits, safe),
  };
}

/**
 * A plan of one edition alone, for its own sweep and its own break-even (section 11): the others keep
 * their prices and are not made.
 *
 * @example evenAt(priceContext(onlyEdition(plan, "bare"), channels), sweepRuns(onlyEdition(plan, "bare")).columns.used)
 */
export function onlyEdition(plan: Plan, edition: string): Plan {
  return { ...plan, editions: plan.editions.map((one) => ({ ...one, weight: one.id === edition ? 1 : 0 })) };
}
