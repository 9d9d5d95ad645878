import { allocate } from "#src/costing/allocate.ts";
import { editionCosts } from "#src/costing/edition-costs.ts";
import type { Figure } from "#src/costing/figure.ts";
import { figureOf, wholeFigure } from "#src/costing/figure-of.ts";
import { grainText } from "#src/costing/grains.ts";
import { taskMinutes } from "#src/costing/kit-costs.ts";
import { preparePlan } from "#src/costing/prepare-plan.ts";
import type { PreparedPlan } from "#src/costing/prepared-plan.ts";
import { reckonRun } from "#src/costing/reckon-run.ts";
import { joinNeeds, needsOf } from "#src/costing/run-needs.ts";
import { createSheet, type RunSheet, USED_NEEDS } from "#src/costing/run-sheet.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** What pricing needs to know of a run: its cost, and cost and time by edition. Plain JSON, used view. */
export interface RunCost {
  kits: number;
  used: Figure;
  editions: EditionCost[];
}

/** An edition's share of the run (section 8): the editions add up to the run exactly. */
export interface EditionCost {
  id: string;
  name: string;
  kits: number;
  used: Figure;
  /** The same with own work at nothing: what earned per hour is reckoned from (section 7). */
  withoutWork: Figure;
  /** What the run costs more with one kit more of this edition. */
  nextKit: Figure;
  /** Minutes of making, decimal text. */
  minutes: string;
}

/**
 * The cost of a run as pricing needs it (sections 7 to 9). `kits` as in `costRun`. A run of one more is
 * reckoned for every edition, each afresh with its own orders.
 *
 * @example runCost(plan, 120).editions[0].used → { known: true, value: "1793.65" }
 */
export function runCost(plan: Plan, kits: number = plan.run.kits): RunCost {
  const run = reckonedRun(preparePlan(plan, kits + 1), kits);
  const unpaid = { ...plan, work: { ...plan.work, ratePerHour: "0" } };
  const bare = reckonedRun(preparePlan(unpaid, kits), kits);
  const [costs, bareCosts] = [run, bare].map(({ prepared, sheet }) => editionCosts(prepared, sheet).used);
  const needs = needsOf(run.prepared, run.sheet, USED_NEEDS);
  const bareNeeds = needsOf(bare.prepared, bare.sheet, USED_NEEDS);
  const minutes = minutesByEdition(run.prepared, run.sheet);
  return {
    kits,
    used: figureOf(run.sheet.money.used, needs),
    editions: plan.editions.map(({ id, name }, index) => ({
      id,
      name,
      kits: run.sheet.kitsOf[index] ?? 0,
      used: figureOf(costs?.[index] ?? 0n, needs),
      withoutWork: figureOf(bareCosts?.[index] ?? 0n, bareNeeds),
      nextKit: oneMore(run, index),
      minutes: grainText(minutes[index] ?? 0n),
    })),
  };
}

interface Reckoned {
  prepared: PreparedPlan;
  sheet: RunSheet;
}

function reckonedRun(prepared: PreparedPlan, kits: number): Reckoned {
  const sheet = createSheet(prepared);
  reckonRun(prepared, kits, sheet);
  return { prepared, sheet };
}

/** What one kit more of an edition costs: a run by a mix that splits into the same kits and that one. */
function oneMore(run: Reckoned, edition: number): Figure {
  const { kits, kitsOf, money } = run.sheet;
  const weights = kitsOf.map((count, index) => count + (index === edition ? 1 : 0));
  const more = reckonedRun({ ...run.prepared, weights }, kits + 1);
  const needs = joinNeeds(
    needsOf(run.prepared, run.sheet, USED_NEEDS),
    needsOf(more.prepared, more.sheet, USED_NEEDS),
  );
  return wholeFigure(more.sheet.money.used - money.used, needs);
}

/** Minutes of making by edition, in grains: each task by the kits that have it, so that they add up. */
function minutesByEdition({ tasks }: PreparedPlan, { kitsOf }: RunSheet): bigint[] {
  return tasks.reduce(
    (sums, task) => {
      const kits = kitsOf.map((count, index) => (task.applies[index] ? BigInt(count) : 0n));
      const shares = allocate(taskMinutes(task, kitsOf).minutes, kits);
      return sums.map((sum, index) => sum + (shares[index] ?? 0n));
    },
    kitsOf.map(() => 0n),
  );
}
