import { costRun } from "#src/costing/cost-run.ts";
import { exact } from "#src/costing/decimal.ts";
import type { Figure } from "#src/costing/figure.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** What a change does to the cost of one kit at the planned run: used view, exact text, reporting currency. */
export interface CostEffect {
  kits: number;
  currency: string;
  now: Figure;
  then: Figure;
  /** `then − now`; `null` where either is not known. */
  change: string | null;
}

/** The cost per kit before and after, each by the same reckoning as the run page. */
export function costEffect(before: Plan, after: Plan): CostEffect {
  const now = costRun(before).perKit.used;
  const then = costRun(after).perKit.used;
  const known = now.known && then.known;
  return {
    kits: before.run.kits,
    currency: before.currency,
    now,
    then,
    change: known ? exact(then.value).minus(exact(now.value)).toFixed() : null,
  };
}
