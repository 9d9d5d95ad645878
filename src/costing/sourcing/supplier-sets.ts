import type { Column } from "./columns.ts";
import { addNode, type NodeQueue } from "./node-queue.ts";
import { isBeaten, type Search, spend } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** Work that looking at one set takes, against that of a step of the search within one. */
const SET_STEP = 1 / 16;

/**
 * Queues the sets of suppliers that may hold the best plan: goes through them depth first, passing over every branch
 * whose bound leaves no room for a better plan: the least count of each part among the suppliers taken and those still
 * to be decided, and the floors of those taken (and, where they lie below nothing, of those still to be decided).
 *
 * @param taken suppliers that are in every set; `least` is the least count of each part among them
 * @param done sets, as lists of suppliers ascending, that are searched or queued already
 */
export function searchSets(
  search: Search,
  queue: NodeQueue,
  taken: readonly Column[],
  columns: readonly Column[],
  least: Float64Array,
  done: ReadonlySet<string>,
): void {
  const rest = restMinima(search, columns);
  const rows = columns.map(() => new Float64Array(least.length));
  const spare = columns.map((_, depth) =>
    columns.slice(depth).reduce((sum, { line }) => sum + Math.min(0, line.floor), 0),
  );
  const chosen = [...taken];
  const visit = (depth: number, held: Float64Array, floor: number, bound: number): void => {
    if (chosen.length + columns.length - depth < search.leastParcels) return;
    if (isBeaten(search, bound) || !spend(search, SET_STEP, bound)) return;
    const column = columns[depth];
    if (column === undefined) {
      if (!done.has(setKey(chosen))) addNode(queue, nodeOf(chosen, bound));
      return;
    }
    const next = rows[depth] as Float64Array;
    const later = floor + (spare[depth + 1] ?? 0);
    const ahead = rest[depth + 1] as Float64Array;
    if (chosen.length < search.mostParcels) {
      chosen.push(column);
      const withIt = takeColumn(held, column.counts, ahead, next);
      visit(depth + 1, next, floor + column.line.floor, later + column.line.floor + withIt);
      chosen.pop();
    }
    visit(depth + 1, held, floor, later + sumOfLeast(held, ahead));
  };
  const floors = taken.reduce((sum, { line }) => sum + line.floor, 0);
  visit(0, least, floors, floors + (spare[0] ?? 0) + sumOfLeast(least, rest[0] as Float64Array));
}

/** What every part counts for while no supplier is taken. */
export function nobodyTaken({ market, omitted }: Search): Float64Array {
  return Float64Array.from(market.needed, (needed) => (needed === 1 ? omitted : 0));
}

/** From each depth on, the least count of every part among the suppliers still to be decided. */
function restMinima(search: Search, columns: readonly Column[]): Float64Array[] {
  const rest = [new Float64Array(search.market.parts).fill(search.omitted)];
  for (const { counts } of columns.toReversed()) {
    const after = rest[0] as Float64Array;
    rest.unshift(after.map((least, part) => Math.min(least, counts[part] as number)));
  }
  return rest;
}

/** Adds a column to the least counts so far, and gives the sum of the least with those still to come. */
function takeColumn(
  least: Float64Array,
  counts: Float64Array,
  rest: Float64Array,
  next: Float64Array,
): number {
  let sum = 0;
  for (let part = 0; part < least.length; part += 1) {
    const now = Math.min(least[part] as number, counts[part] as number);
    next[part] = now;
    sum += Math.min(now, rest[part] as number);
  }
  return sum;
}

function sumOfLeast(least: Float64Array, rest: Float64Array): number {
  let sum = 0;
  for (let part = 0; part < least.length; part += 1)
    sum += Math.min(least[part] as number, rest[part] as number);
  return sum;
}

/** The node in which a set of suppliers is searched. */
export function nodeOf(columns: readonly Column[], bound: number): SetNode {
  const sorted = columns.toSorted((a, b) => a.reach.supplier - b.reach.supplier);
  return {
    reaches: sorted.map(({ reach }) => reach),
    lines: sorted.map(({ line }) => line),
    bound,
    choices: null,
    improved: false,
  };
}

/** A set by its suppliers, ascending. */
export function setKey(columns: readonly Column[]): string {
  return columns
    .map(({ reach }) => reach.supplier)
    .sort((a, b) => a - b)
    .join();
}
