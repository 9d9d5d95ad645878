import type { Figure } from "#src/costing/figure.ts";
import { evenAfterAt } from "#src/costing/price/even-after-at.ts";
import { evenAt, onlyEdition } from "#src/costing/price/even-at.ts";
import type { PriceContext } from "#src/costing/price/price-context.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { pricingOf } from "./pricing-of.ts";

/** Where an edition sold alone breaks even; null figures: not known, or never. */
export interface EvenRow {
  id: string;
  name: string;
  /** Kits of it in the run, against which safety is measured. */
  kits: number;
  known: boolean;
  first: number | null;
  safe: number | null;
  upTo: number;
  marginOfSafety: string | null;
  evenAfter: Figure;
}

/** What runs of one edition cost does not depend on prices: kept until something else changes. */
const columns = new Map<string, { cost: PriceContext["cost"]; used: readonly (string | null)[] }>();

function usedOf(plan: Plan, context: PriceContext, edition: string): readonly (string | null)[] {
  const held = columns.get(edition);
  if (held?.cost === context.cost) return held.used;
  const { used } = sweepRuns(plan).columns;
  columns.set(edition, { cost: context.cost, used });
  return used;
}

/** Break-even of each edition of a run by itself (section 11): only it is made, as many as the run has of it. */
export function evenRows(context: PriceContext): EvenRow[] {
  const { plan, cost } = context;
  return cost.editions.flatMap(({ id, name, kits }): EvenRow[] => {
    if (kits === 0) return [];
    const alone = onlyOf(plan, id, kits);
    const priced = pricingOf(alone, id);
    const { known, first, safe, upTo, marginOfSafety } = evenAt(priced, usedOf(alone, priced, id));
    return [{ id, name, kits, known, first, safe, upTo, marginOfSafety, evenAfter: evenAfterAt(priced) }];
  });
}

const alones = new WeakMap<Plan, Map<string, Plan>>();

/** The plan of one edition alone, the same object for the same plan. */
function onlyOf(plan: Plan, edition: string, kits: number): Plan {
  const of = alones.get(plan) ?? new Map<string, Plan>();
  alones.set(plan, of);
  const known = of.get(edition);
  if (known) return known;
  const alone = { ...onlyEdition(plan, edition), run: { ...plan.run, kits } };
  of.set(edition, alone);
  return alone;
}
