import { grainShare } from "./grains.ts";
import { FACTOR_PLACES } from "./learning.ts";
import type {
  PreparedCharge,
  PreparedPacking,
  PreparedPlan,
  PreparedReplacements,
  PreparedTask,
} from "./prepared-plan.ts";
import { takingsFrom } from "./price/takings.ts";
import { MISSING, type RunSheet } from "./run-sheet.ts";

const FACTOR_UNIT = 10n ** BigInt(FACTOR_PLACES);
const MILLION = 1_000_000n;

/** Packing, work, one-off charges and replacements of the run (sections 7 and 8), in grains. */
export function kitCosts(prepared: PreparedPlan, sheet: RunSheet): void {
  const { money } = sheet;
  money.packing = 0n;
  for (const packing of prepared.packing) {
    const cost = packingCost(packing, sheet.kitsOf);
    if (cost === null) sheet.missing |= MISSING.packing;
    else money.packing += cost;
  }
  money.minutes = 0n;
  money.work = 0n;
  for (const task of prepared.tasks) {
    const { minutes } = taskMinutes(task, sheet.kitsOf);
    money.minutes += minutes;
    money.work += workCost(prepared.hourRate, minutes) ?? 0n;
  }
  if (money.minutes > 0n && prepared.hourRate === null) sheet.missing |= MISSING.rate;
  money.oneOff = prepared.charges.reduce((sum, charge) => sum + chargeShare(charge, sheet.kits), 0n);
  const replacements = replacementCost(prepared.replacements, sheet.kits);
  if (replacements === null) sheet.missing |= MISSING.replacement;
  money.replacements = replacements ?? 0n;
}

/** Kits of the run that have a packing item or a task, by which editions it applies to. */
export function kitsWith(applies: readonly boolean[], kitsOf: readonly number[]): number {
  return kitsOf.reduce((sum, count, index) => sum + (applies[index] ? count : 0), 0);
}

/**
 * `cost per kit × kits that have it`; null: the cost is not known and some kit has it.
 *
 * @example 1.20 a kit, 30 kits → 36.00
 */
export function packingCost(
  { applies, costPerKit }: PreparedPacking,
  kitsOf: readonly number[],
): bigint | null {
  const kits = kitsWith(applies, kitsOf);
  if (kits === 0) return 0n;
  return costPerKit === null ? null : costPerKit * BigInt(kits);
}

/**
 * Minutes of one task in grains (section 7): `minutes of a first kit × Σ learning factors`, and the
 * set-up where any kit needs the task. Each task counts its own kits of the run on from the kits
 * made before.
 *
 * @example 6 minutes, 10 kits, no learning, 60 to set up → 120 minutes
 */
export function taskMinutes(task: PreparedTask, kitsOf: readonly number[]) {
  const kits = kitsWith(task.applies, kitsOf);
  const factorSum = task.factorSums[kits] ?? 0n;
  const making = (task.minutesPerKit * factorSum) / FACTOR_UNIT;
  const settingUp = kits === 0 ? 0n : task.setUpMinutes;
  return { kits, factorSum, making, settingUp, minutes: making + settingUp };
}

/**
 * `minutes ÷ 60 × rate`, to the nearest grain; null while the rate is not decided.
 *
 * @example 120 minutes at 18.00 an hour → 36.00
 */
export function workCost(hourRate: PreparedPlan["hourRate"], minutes: bigint): bigint | null {
  return hourRate === null ? null : grainShare(minutes, hourRate, 60n * MILLION);
}

/**
 * The run's share of a one-off charge (section 8): all of it, or `kits ÷ planned kits` of it, and
 * never more than all.
 *
 * @example 240.00 spread over 120 kits, run of 40: 80.00
 */
export function chargeShare({ charge, amount }: PreparedCharge, kits: number): bigint {
  if (charge.spreadOver === null || kits >= charge.spreadOver) return amount;
  return grainShare(amount, BigInt(kits), BigInt(charge.spreadOver));
}

/**
 * `kits × expected share × cost of one re-sent part`; null: a share is expected and its cost not known.
 *
 * @example 120 kits, 2 %, 3.50 each → 8.40
 */
export function replacementCost(
  { shareMillionths, costEach }: PreparedReplacements,
  kits: number,
): bigint | null {
  const expected = shareMillionths * BigInt(kits);
  if (expected === 0n) return 0n;
  return costEach === null ? null : (expected * costEach) / MILLION;
}

/**
 * What the run brings if every kit sells (sections 10 and 11): `Σ kits of the edition × brought by one`,
 * that is kept over its channels less the time to sell it.
 */
export function takings(prepared: PreparedPlan, sheet: RunSheet): void {
  const brings = takingsFrom(prepared.takings.brings, sheet.kitsOf);
  if (brings === null) sheet.missing |= MISSING.sale;
  sheet.money.brings = brings ?? 0n;
}
