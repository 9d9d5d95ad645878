import type { Column } from "./columns.ts";
import { dualAscent } from "./dual-ascent.ts";
import type { NodeQueue } from "./node-queue.ts";
import { isBeaten, type Search, spend } from "./search.ts";
import { nobodyTaken, searchSets } from "./supplier-sets.ts";

/**
 * The same as `searchSets` from nobody taken, where suppliers may be too many to go through their sets one by one: every branch is bounded by
 * a dual ascent, which also tells which suppliers would be too dear to take; of the others the one that most parts lean
 * on is decided next.
 */
export function searchManySets(
  search: Search,
  queue: NodeQueue,
  columns: readonly Column[],
  done: ReadonlySet<string>,
): void {
  visit(search, queue, [], columns, nobodyTaken(search), done);
}

/** Suppliers up to which all sets are gone through one by one. */
const FEW = 10;

function visit(
  search: Search,
  queue: NodeQueue,
  taken: readonly Column[],
  undecided: readonly Column[],
  least: Float64Array,
  done: ReadonlySet<string>,
): void {
  if (undecided.length <= FEW) {
    searchSets(search, queue, taken, undecided, least, done);
    return;
  }
  if (taken.length > search.mostParcels || taken.length + undecided.length < search.leastParcels) return;
  const floors =
    taken.reduce((sum, { line }) => sum + line.floor, 0) +
    undecided.reduce((sum, { line }) => sum + Math.min(0, line.floor), 0);
  const ascent = dualAscent(least, undecided);
  const bound = floors + ascent.bound;
  if (isBeaten(search, bound) || !spend(search, 1 + undecided.length, bound)) return;
  const left = undecided.filter((_, index) => !isBeaten(search, bound + (ascent.slacks[index] as number)));
  const next = leanedOn(least, left);
  if (next === null) {
    searchSets(search, queue, taken, left, least, done);
    return;
  }
  const others = left.filter((column) => column !== next);
  const with_ = least.map((held, part) => Math.min(held, next.counts[part] as number));
  visit(search, queue, [...taken, next], others, with_, done);
  visit(search, queue, taken, others, least, done);
}

/** The supplier that saves the parts most against the next best of those left. */
function leanedOn(least: Float64Array, left: readonly Column[]): Column | null {
  const saved = left.map(() => 0);
  for (let part = 0; part < least.length; part += 1) {
    let [first, second, at] = [least[part] as number, least[part] as number, -1];
    for (let index = 0; index < left.length; index += 1) {
      const count = left[index]?.counts[part] as number;
      if (count < first) [first, second, at] = [count, first, index];
      else if (count < second) second = count;
    }
    if (at >= 0) saved[at] = (saved[at] as number) + second - first;
  }
  const most = Math.max(...saved);
  return left[saved.indexOf(most)] ?? null;
}
