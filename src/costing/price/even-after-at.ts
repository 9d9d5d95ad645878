import type { Figure } from "#src/costing/figure.ts";
import { wholeFigure } from "#src/costing/figure-of.ts";
import { grains } from "#src/costing/grains.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { highestOf, leastSold } from "#src/costing/sold-to-pay.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import { needsIn } from "./edition-kit.ts";
import type { PriceContext } from "./price-context.ts";
import { bringsPerKit, kitsSold, type Tried } from "./run-sold.ts";
import { takingsFrom } from "./takings.ts";

/**
 * How many of the run's kits must sell for no loss (section 11), by the mix, with a price tried in place
 * of the plan's. Kits that do not sell count as worth nothing, and take no time to sell.
 *
 * @example run of 120 that used 1793.65, 25.1885 brought by each: 72
 */
export function evenAfterAt(context: PriceContext, tried: Tried | null = null): Figure {
  const { cost, plan } = context;
  const kits = kitsSold(context, tried);
  const made = cost.editions.map(({ kits: count }) => count);
  const needs = joinNeeds(
    needsIn(cost.used),
    ...kits.map((kit, index) => (made[index] === 0 ? [] : kit.needs.brings)),
  );
  if (needs.length > 0 || !cost.used.known) return wholeFigure(null, needs);
  const takings = bringsPerKit(kits);
  const weights = plan.editions.map(({ weight }) => weight);
  const highest = highestOf((sold) => takingsFrom(takings, splitKits(sold, weights)), cost.kits);
  const least = highest === null ? null : leastSold(highest, grains(cost.used.value), cost.kits);
  if (least === null) return wholeFigure(null, [need("not-even", [{}])]);
  return { known: true, value: least.toString() };
}
