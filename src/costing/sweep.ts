import type { Plan } from "#src/shapes/plan.ts";
import { breakEvenOf } from "./break-even.ts";
import { grainShare, grainText } from "./grains.ts";
import { preparePlan } from "./prepare-plan.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import type { Need } from "./problem.ts";
import { reckonRun } from "./reckon-run.ts";
import { joinNeeds, needsOf } from "./run-needs.ts";
import { createSheet, KEPT_NEEDS, MISSING, type RunSheet, SPENT_NEEDS, USED_NEEDS } from "./run-sheet.ts";
import { soldToPayFor } from "./sold-to-pay.ts";
import { changesBetween } from "./step-changes.ts";
import type { Change, StepDown, SweepColumns, SweepResult, SweetSpot } from "./sweep-result.ts";
import { divideDown } from "./whole.ts";

/** The sweep in grains; entry n belongs to a run of n, entry 0 is empty. */
export interface Swept {
  to: number;
  spent: bigint[];
  used: bigint[];
  kept: bigint[];
  leftOver: bigint[];
  parcels: number[];
  missing: number[];
  /** What makes a kit of n cheaper than one of n − 1 by a step; found only where it is that much cheaper. */
  steps: Change[][];
  /** All that changed from n − 1 to n, reckoned again when it is asked. */
  changesAt: (kits: number) => Change[];
}

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
  const complete = swept.missing.every((bits, kits) => bits === 0 || kits > to);
  return {
    currency: plan.currency,
    to,
    columns: columnsOf(prepared, swept, true),
    without: complete ? null : columnsOf(prepared, swept, false),
    needs,
    stepDowns: stepDowns(swept),
    sweetSpots: sweetSpots(swept, beyond),
    breakEven: breakEvenOf(swept, plan.run.kits),
  };
}

/**
 * Largest run a sweet spot at `kits` must not be beaten by: a tenth more (section 9), and at least
 * the next kit, since below ten a tenth more is no whole kit.
 */
function windowOf(kits: number): number {
  return Math.max(kits + 1, divideDown(11 * kits, 10));
}

function reckonAll(prepared: PreparedPlan, to: number, beyond: number): { swept: Swept; needs: Need[] } {
  const swept: Swept = {
    to,
    spent: [0n],
    used: [0n],
    kept: [0n],
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
    swept.kept.push(money.kept);
    swept.leftOver.push(money.leftOver);
    swept.parcels.push(parcels);
    swept.missing.push(missing);
    if (kits > 1) {
      const fell = fellByStep(swept.used[kits - 1] as bigint, money.used, kits);
      swept.steps.push(fell ? changesBetween(prepared, before, sheet, false) : []);
    }
    if (missing !== 0 && kits <= to && !sameGaps(before, sheet)) {
      needs = joinNeeds(needs, needsOf(prepared, sheet, USED_NEEDS | KEPT_NEEDS));
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

/** Cost per kit falls by at least half a per cent: `C(n)/n ≤ 0.995 · C(n − 1)/(n − 1)`. */
function fellByStep(earlier: bigint, now: bigint, kits: number): boolean {
  return now * BigInt(kits - 1) * 1000n <= 995n * earlier * BigInt(kits);
}

function stepDowns({ used, steps, to }: Swept): StepDown[] {
  const found: StepDown[] = [];
  for (let kits = 2; kits <= to; kits += 1) {
    const changes = steps[kits] ?? [];
    if (changes.length === 0) continue;
    const perKit = perKitOf(used[kits] as bigint, kits);
    const before = perKitOf(used[kits - 1] as bigint, kits - 1);
    found.push({ kits, perKit: grainText(perKit), fellBy: grainText(before - perKit), changes });
  }
  return found;
}

function sweetSpots({ used, changesAt, to }: Swept, beyond: number): SweetSpot[] {
  const found: SweetSpot[] = [];
  const cheaper = (a: number, b: number) => (used[a] as bigint) * BigInt(b) < (used[b] as bigint) * BigInt(a);
  let lowest = 0;
  for (let kits = 1; kits <= to; kits += 1) {
    if (lowest > 0 && !cheaper(kits, lowest)) continue;
    lowest = kits;
    let beaten = false;
    for (let more = kits + 1; more <= Math.min(windowOf(kits), beyond); more += 1)
      beaten ||= cheaper(more, kits);
    if (beaten) continue;
    const nextKit = (used[kits + 1] as bigint) - (used[kits] as bigint);
    found.push({
      kits,
      perKit: grainText(perKitOf(used[kits] as bigint, kits)),
      nextKit: grainText(nextKit),
      changes: changesAt(kits + 1),
    });
  }
  return found;
}

function perKitOf(value: bigint, kits: number): bigint {
  return grainShare(value, 1n, BigInt(kits));
}

/** Columns as text: where `known` only what is known at that size, else everything that can be reckoned. */
function columnsOf(prepared: PreparedPlan, swept: Swept, known: boolean): SweepColumns {
  const { spent, used, kept, leftOver, missing, to } = swept;
  const column = (bits: number, value: (kits: number) => bigint) => {
    const texts: (string | null)[] = [];
    for (let kits = 1; kits <= to; kits += 1) {
      const hidden = ((missing[kits] as number) & (known ? bits : bits & NEVER_PARTIAL)) !== 0;
      texts.push(hidden ? null : grainText(value(kits)));
    }
    return texts;
  };
  const at = (of: readonly bigint[], kits: number) => of[kits] as bigint;
  return {
    spent: column(SPENT_NEEDS, (kits) => at(spent, kits)),
    used: column(USED_NEEDS, (kits) => at(used, kits)),
    perKitSpent: column(SPENT_NEEDS, (kits) => perKitOf(at(spent, kits), kits)),
    perKitUsed: column(USED_NEEDS, (kits) => perKitOf(at(used, kits), kits)),
    kept: column(KEPT_NEEDS, (kits) => at(kept, kits)),
    profit: column(USED_NEEDS | KEPT_NEEDS, (kits) => at(kept, kits) - at(used, kits)),
    leftOver: column(MISSING.mix | MISSING.goods, (kits) => at(leftOver, kits)),
    nextKitSpent: column(SPENT_NEEDS, (kits) => at(spent, kits + 1) - at(spent, kits)),
    nextKitUsed: column(USED_NEEDS, (kits) => at(used, kits + 1) - at(used, kits)),
    parcels: swept.parcels.slice(1, to + 1),
    soldToPay: soldToPayFor(prepared, swept, known),
  };
}

/** Without a mix or a price there are no takings, not even partial ones. */
const NEVER_PARTIAL = MISSING.mix | MISSING.sale;
