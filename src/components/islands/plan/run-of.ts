import { costRun } from "#src/costing/cost-run.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { type Tally, tallyOf } from "#src/costing/tally.ts";
import type { Plan } from "#src/shapes/plan.ts";

interface Reckoned {
  kits: number;
  run: RunResult;
}

/** A plan object is never changed, only replaced, so what was reckoned from it stays right. */
const runs = new WeakMap<Plan, Reckoned[]>();

/** The run of a plan at a size, reckoned once for all islands of the page. */
export function runOf(plan: Plan, kits: number = plan.run.kits): RunResult {
  const known = runs.get(plan) ?? [];
  const found = known.find((one) => one.kits === kits);
  if (found) return found.run;
  const run = costRun(plan, kits);
  runs.set(plan, [...known, { kits, run }]);
  return run;
}

/** The figures of the strip for a plan. */
export function tallyAt(plan: Plan): Tally {
  return tallyOf(runOf(plan));
}
