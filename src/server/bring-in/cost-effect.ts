import { costRun } from "#src/costing/cost-run.ts";
import type { Figure } from "#src/costing/figure.ts";
import { figureLess } from "#src/costing/figure-less.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** What a change does to the cost of one kit at the planned run: used view, exact text, reporting currency. */
export interface CostEffect {
  kits: number;
  currency: string;
  before: Figure;
  after: Figure;
  /** `after − before`; `null` where either is not known. */
  change: string | null;
}

/** The cost per kit before and after, each by the same reckoning as the run page. */
export function costEffect(before: Plan, after: Plan): CostEffect {
  const [was, is] = [costRun(before).perKit.used, costRun(after).perKit.used];
  const change = figureLess(is, was);
  return {
    kits: after.run.kits,
    currency: after.currency,
    before: was,
    after: is,
    change: change.known ? change.value : null,
  };
}
