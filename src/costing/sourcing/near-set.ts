import type { Column } from "./columns.ts";

/**
 * A good set of suppliers to begin with: one is taken in, left out or exchanged for another as long as the sum of floors
 * and least counts falls.
 */
export function nearSet(columns: readonly Column[], start: readonly Column[], most: number): Column[] {
  let set = start.slice(0, most);
  let value = sumWithin(columns, set);
  for (;;) {
    const better = neighbours(columns, set, most)
      .map((next) => ({ next, sum: sumWithin(columns, next) }))
      .reduce((best, one) => (one.sum < best.sum ? one : best), { next: set, sum: value });
    if (better.sum >= value) return set;
    [set, value] = [better.next, better.sum];
  }
}

function neighbours(columns: readonly Column[], set: readonly Column[], most: number): Column[][] {
  const out = columns.filter((column) => !set.includes(column));
  return [
    ...(set.length < most ? out.map((column) => [...set, column]) : []),
    ...set.map((left) => set.filter((column) => column !== left)),
    ...set.flatMap((left) => out.map((column) => set.map((one) => (one === left ? column : one)))),
  ];
}

/** Floors of a set and the least counts within it; Infinity for none, which buys nothing. */
function sumWithin(columns: readonly Column[], set: readonly Column[]): number {
  const parts = columns[0]?.counts.length ?? 0;
  if (set.length === 0) return Number.POSITIVE_INFINITY;
  let sum = set.reduce((floors, { line }) => floors + line.floor, 0);
  for (let part = 0; part < parts; part += 1) {
    let least = Number.POSITIVE_INFINITY;
    for (const { counts } of set) least = Math.min(least, counts[part] as number);
    sum += least;
  }
  return sum;
}
