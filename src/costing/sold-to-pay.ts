import type { PreparedPlan } from "./prepared-plan.ts";
import { takingsFrom } from "./price/takings.ts";
import { BRINGS_NEEDS, USED_NEEDS } from "./run-sheet.ts";
import { splitKits } from "./split-kits.ts";
import type { Swept } from "./swept.ts";

/**
 * The second question of section 11: a run of N is made and m of them sell, by the mix. For each N
 * the least m from 0 to N whose takings are at least the run's used cost; null where even all N do
 * not pay, or where it is not known. Kits that do not sell count as worth nothing.
 */
export function soldToPayFor(prepared: PreparedPlan, swept: Swept, known: boolean): (number | null)[] {
  const highest = highestTakings(prepared, swept.to);
  const bits = known ? USED_NEEDS | BRINGS_NEEDS : BRINGS_NEEDS;
  const answers: (number | null)[] = [];
  for (let kits = 1; kits <= swept.to; kits += 1) {
    const hidden = ((swept.missing[kits] as number) & bits) !== 0 || highest === null;
    answers.push(hidden ? null : leastSold(highest, swept.used[kits] as bigint, kits));
  }
  return answers;
}

function highestTakings(prepared: PreparedPlan, to: number): bigint[] | null {
  return highestOf((sold) => takingsFrom(prepared.takings.brings, splitKits(sold, prepared.weights)), to);
}

/**
 * Highest takings from at most 0, 1 … `to` sales, where `brings` is what so many bring: by the mix one
 * sale more can bring less, where an edition loses. Null where takings are not known.
 */
export function highestOf(brings: (sold: number) => bigint | null, to: number): bigint[] | null {
  const highest: bigint[] = [0n];
  for (let sold = 1; sold <= to; sold += 1) {
    const kept = brings(sold);
    if (kept === null) return null;
    const before = highest[sold - 1] as bigint;
    highest.push(kept > before ? kept : before);
  }
  return highest;
}

/**
 * The same for one run: least number sold that pays for `cost`; null: not even all, or not known.
 *
 * @example cost 1793.65, 25.19 kept a sale, 120 made → 72
 */
export function soldToPay(prepared: PreparedPlan, cost: bigint, kits: number): number | null {
  const highest = highestTakings(prepared, kits);
  return highest === null ? null : leastSold(highest, cost, kits);
}

/**
 * Least number sold of `kits` made that pays for `cost`; null: not even all of them.
 *
 * @example leastSold([0n, 10n, 20n], 15n, 2) === 2
 */
export function leastSold(highest: readonly bigint[], cost: bigint, kits: number): number | null {
  if ((highest[kits] as bigint) < cost) return null;
  let [low, high] = [0, kits];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((highest[middle] as bigint) >= cost) high = middle;
    else low = middle + 1;
  }
  return low;
}
