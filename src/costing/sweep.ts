import type { Plan } from "#src/shapes/plan.ts";
import { breakEvenOf } from "./break-even.ts";
import { preparePlan } from "./prepare-plan.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import type { Need } from "./problem.ts";
import { reckonRun } from "./reckon-run.ts";
import { joinNeeds, needsOf } from "./run-needs.ts";
import { BRINGS_NEEDS, createSheet, type RunSheet, USED_NEEDS } from "./run-sheet.ts";
import { changesBetween } from "./step-changes.ts";
import { fellByStep, stepDowns, sweetSpots, windowOf } from "./steps.ts";
import { columnsOf } from "./sweep-columns.ts";
import type { Change, SweepResult } from "./sweep-result.ts";
import type { Swept } from "./swept.ts";

/**
 * Every run size from 1 to the plan's end of sweep (sections 9 and 11), each reckoned as a run of its
 * own: costs in both views, takings, profit, parcels, what is left over and what one kit more costs;
 * step-downs, sweet spots and break-even with what stepped. Plain JSON; figures are the very ones
 * `costRun` gives at each size.
 *
 * A little beyond the end is reckoned too, so that the last sizes know what their next kit costs
 * and whether a run a tenth larger beats them.
 *
 * @example sweepRuns(plan).columns.perKitUsed[39] // one kit of a run of 40
 */
export function sweepRuns(plan: Plan): SweepResult {
  const to = plan.run.sweepTo;
  const beyond = windowOf(to);
  const prepared = preparePlan(plan, beyond);
  const { swept, needs } = reckonAll(prepared, to, beyond);
  const begun = plan.lines > 0;
  const complete = swept.missing.every((bits, kits) => bits === 0 || kits > to);
  return {
    currency: plan.currency,
    to,
    columns: columnsOf(prepared, swept, true),
    without: complete ? null : columnsOf(prepared, swept, false),
    needs,
    stepDowns: begun ? stepDowns(swept) : [],
    sweetSpots: begun ? sweetSpots(swept, beyond) : [],
    breakEven: breakEvenOf(swept, plan.run.kits),
  };
}

function reckonAll(prepared: PreparedPlan, to: number, beyond: number): { swept: Swept; needs: Need[] } {
  const swept: Swept = {
    to,
    spent: [0n],
    used: [0n],
    brings: [0n],
    leftOver: [0n],
    parcels: [0],
    missing: [0],
    steps: [[], []],
    changesAt: (kits) => changesAt(prepared, kits),
  };
  let needs: Need[] = [];
  let [sheet, before] = [createSheet(prepared), createSheet(prepared)];
  for (let kits = 1; kits <= beyond; kits += 1) {
    [sheet, before] = [before, sheet];
    reckonRun(prepared, kits, sheet);
    const { money, missing, parcels } = sheet;
    swept.spent.push(money.spent);
    swept.used.push(money.used);
    swept.brings.push(money.brings);
    swept.leftOver.push(money.leftOver);
    swept.parcels.push(parcels);
    swept.missing.push(missing);
    if (kits > 1) {
      const fell = fellByStep(swept.used[kits - 1] as bigint, money.used, kits);
      swept.steps.push(fell ? changesBetween(prepared, before, sheet, false) : []);
    }
    if (missing !== 0 && kits <= to && !sameGaps(before, sheet)) {
      needs = joinNeeds(needs, needsOf(prepared, sheet, USED_NEEDS | BRINGS_NEEDS));
    }
  }
  return { swept, needs };
}

/** Whether two runs lack the same things, so that what one needs need not be listed again for the other. */
function sameGaps(before: RunSheet, after: RunSheet): boolean {
  const sameSigns = (a: ArrayLike<number>, b: ArrayLike<number>) => {
    for (let index = 0; index < b.length; index += 1) if ((a[index] === 0) !== (b[index] === 0)) return false;
    return a.length === b.length;
  };
  const sameStates = before.state.every((state, index) => state === after.state[index]);
  const samePlaces = sameSigns(before.orders, after.orders) && sameSigns(before.kitsOf, after.kitsOf);
  return (
    before.missing === after.missing &&
    sameStates &&
    samePlaces &&
    before.boards?.quote === after.boards?.quote
  );
}

/** Everything that changes between a run of `kits` − 1 and one of `kits`. */
function changesAt(prepared: PreparedPlan, kits: number): Change[] {
  const [before, after] = [createSheet(prepared), createSheet(prepared)];
  reckonRun(prepared, kits - 1, before);
  reckonRun(prepared, kits, after);
  return changesBetween(prepared, before, after, true);
}
