import { allocate } from "./allocate.ts";
import { packingCost, taskMinutes, workCost } from "./kit-costs.ts";
import { partMoney } from "./part-lines.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import type { RunSheet } from "./run-sheet.ts";

/** Cost of all kits of each edition in both views, in grains. */
export interface EditionCosts {
  spent: bigint[];
  used: bigint[];
}

/**
 * The run's cost by edition (section 8). Direct: parts and boards by the pieces each edition needs,
 * packing and making by the kits that have them, replacements by kits. Joint: freight, one-off
 * charges and setting up, by value of direct cost. Every split is by largest remainder in grains, so
 * the editions add up to the run exactly.
 */
export function editionCosts(prepared: PreparedPlan, sheet: RunSheet): EditionCosts {
  const spent = directCosts(prepared, sheet);
  const shelf = shelfByEdition(prepared, sheet);
  const used = spent.map((cost, edition) => cost + (shelf[edition] ?? 0n));
  const joint = sheet.money.freight + sheet.money.oneOff + setUpCost(prepared, sheet);
  return { spent: withJoint(spent, joint, sheet.kitsOf), used: withJoint(used, joint, sheet.kitsOf) };
}

/** Joint costs by value of direct cost; by kits where no direct cost is known. */
function withJoint(direct: readonly bigint[], joint: bigint, kitsOf: readonly number[]): bigint[] {
  const weights = direct.map((cost) => (cost > 0n ? cost : 0n));
  const byKits = weights.every((weight) => weight === 0n);
  const shares = allocate(joint, byKits ? kitsOf.map(BigInt) : weights);
  return direct.map((cost, edition) => cost + (shares[edition] ?? 0n));
}

function directCosts(prepared: PreparedPlan, sheet: RunSheet): bigint[] {
  const { plan } = prepared;
  const sums = plan.editions.map(() => 0n);
  const add = (amount: bigint, weights: readonly number[]) => addShares(sums, amount, weights);
  prepared.parts.forEach(({ perKit }, index) => {
    add(partMoney(prepared, sheet, index).goods, times(sheet.kitsOf, perKit));
  });
  add(sheet.money.boards, times(sheet.kitsOf, prepared.boardsPerKit));
  for (const item of plan.packing) {
    const has = plan.editions.map(({ id }) => Number(item.editions === null || item.editions.includes(id)));
    add(packingCost(plan, item, sheet.kitsOf) ?? 0n, times(sheet.kitsOf, has));
  }
  for (const task of prepared.tasks) {
    const { making } = taskMinutes(task, sheet.kitsOf);
    add(workCost(plan, making) ?? 0n, times(sheet.kitsOf, task.applies.map(Number)));
  }
  add(sheet.money.replacements, sheet.kitsOf);
  return sums;
}

/** What the used view adds to the spent one, by the edition that needs the part. */
function shelfByEdition(prepared: PreparedPlan, sheet: RunSheet): bigint[] {
  const sums = prepared.plan.editions.map(() => 0n);
  prepared.parts.forEach(({ perKit }, index) => {
    const { kept, stock } = partMoney(prepared, sheet, index);
    if (kept !== stock) addShares(sums, stock - kept, times(sheet.kitsOf, perKit));
  });
  return sums;
}

/** Cost of setting up: what work costs beyond making. */
export function setUpCost(prepared: PreparedPlan, sheet: RunSheet): bigint {
  const making = prepared.tasks.reduce(
    (sum, task) => sum + (workCost(prepared.plan, taskMinutes(task, sheet.kitsOf).making) ?? 0n),
    0n,
  );
  return sheet.money.work - making;
}

function addShares(sums: bigint[], amount: bigint, weights: readonly number[]): void {
  allocate(amount, weights.map(BigInt)).forEach((share, edition) => {
    sums[edition] = (sums[edition] ?? 0n) + share;
  });
}

function times(kits: readonly number[], perKit: readonly number[]): number[] {
  return kits.map((count, edition) => count * (perKit[edition] ?? 0));
}
