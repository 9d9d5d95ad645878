import { allocate } from "./allocate.ts";
import { packingCost, taskMinutes, workCost } from "./kit-costs.ts";
import { partMoney } from "./part-lines.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import type { RunSheet } from "./run-sheet.ts";

export const DIRECT_COSTS = ["boards", "parts", "packing", "making", "replacements"] as const;
export type DirectCost = (typeof DIRECT_COSTS)[number];

/** The run's cost by edition, in grains: each list has an entry for every edition of the plan. */
export interface EditionCosts {
  direct: Record<DirectCost, bigint[]>;
  /** What the used view adds to parts: stock taken less what keeps on the shelf. */
  shelf: bigint[];
  /** Freight, one-off charges and setting up. */
  joint: { whole: bigint; spent: bigint[]; used: bigint[] };
  spent: bigint[];
  used: bigint[];
}

/**
 * The run's cost by edition (section 8). Direct: parts and boards by the pieces each edition needs,
 * packing and making by the kits that have them, replacements by kits. Joint: freight, one-off
 * charges and setting up, by value of direct cost. Every split is by largest remainder in grains, so
 * the editions add up to the run exactly.
 *
 * @example joint 30.00, direct costs 200 and 100 → 20.00 and 10.00 more
 */
export function editionCosts(prepared: PreparedPlan, sheet: RunSheet): EditionCosts {
  const direct = directCosts(prepared, sheet);
  const shelf = shelfByEdition(prepared, sheet);
  const ofEdition = (edition: number) =>
    DIRECT_COSTS.reduce((sum, head) => sum + (direct[head][edition] ?? 0n), 0n);
  const spent = sheet.kitsOf.map((_, edition) => ofEdition(edition));
  const used = spent.map((cost, edition) => cost + (shelf[edition] ?? 0n));
  const whole = sheet.money.freight + sheet.money.oneOff + setUpCost(prepared, sheet);
  const joint = {
    whole,
    spent: jointShares(whole, spent, sheet.kitsOf),
    used: jointShares(whole, used, sheet.kitsOf),
  };
  return { direct, shelf, joint, spent: added(spent, joint.spent), used: added(used, joint.used) };
}

/** Joint costs by value of direct cost; by kits where there is none. */
function jointShares(joint: bigint, direct: readonly bigint[], kitsOf: readonly number[]): bigint[] {
  const weights = direct.map((cost) => (cost > 0n ? cost : 0n));
  return allocate(joint, weights.every((weight) => weight === 0n) ? kitsOf.map(BigInt) : weights);
}

function added(a: readonly bigint[], b: readonly bigint[]): bigint[] {
  return a.map((value, index) => value + (b[index] ?? 0n));
}

function directCosts(prepared: PreparedPlan, sheet: RunSheet): Record<DirectCost, bigint[]> {
  const { kitsOf, money } = sheet;
  const none = kitsOf.map(() => 0n);
  return {
    boards: shared(money.boards, kitsOf, prepared.boardsPerKit),
    parts: prepared.parts
      .map(({ perKit }, index) => shared(partMoney(prepared, sheet, index).goods, kitsOf, perKit))
      .reduce(added, none),
    packing: prepared.packing
      .map((packing) => shared(packingCost(packing, kitsOf) ?? 0n, kitsOf, packing.applies.map(Number)))
      .reduce(added, none),
    making: prepared.tasks
      .map((task) => shared(makingCost(prepared, sheet, task), kitsOf, task.applies.map(Number)))
      .reduce(added, none),
    replacements: allocate(money.replacements, kitsOf.map(BigInt)),
  };
}

function makingCost(
  { hourRate }: PreparedPlan,
  { kitsOf }: RunSheet,
  task: PreparedPlan["tasks"][number],
): bigint {
  return workCost(hourRate, taskMinutes(task, kitsOf).making) ?? 0n;
}

/** Cost of setting up: what work costs beyond making. */
function setUpCost(prepared: PreparedPlan, sheet: RunSheet): bigint {
  return prepared.tasks.reduce((rest, task) => rest - makingCost(prepared, sheet, task), sheet.money.work);
}

function shelfByEdition(prepared: PreparedPlan, sheet: RunSheet): bigint[] {
  return prepared.parts
    .map(({ perKit }, index) => {
      const { kept, stock } = partMoney(prepared, sheet, index);
      return shared(stock - kept, sheet.kitsOf, perKit);
    })
    .reduce(
      added,
      sheet.kitsOf.map(() => 0n),
    );
}

/** An amount split by `kits × pieces per kit`. */
function shared(amount: bigint, kits: readonly number[], perKit: readonly number[]): bigint[] {
  return allocate(
    amount,
    kits.map((count, edition) => BigInt(count) * BigInt(perKit[edition] ?? 0)),
  );
}
