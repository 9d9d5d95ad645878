import type { Column } from "./columns.ts";

/** A bound on what all parts cost, and by how much more each undecided supplier would have to raise it to be taken. */
export interface Ascent {
  bound: number;
  slacks: Float64Array;
}

const ROUNDS = 40;

/**
 * Bounds what parts cost where some suppliers are taken and others, at a floor each, may be: every part offers a price,
 * raised step by step to the next supplier's, as long as what the parts offer above a supplier's counts does not exceed
 * its floor. The prices then sum to a lower bound (the dual ascent of D. Erlenkotter, "A dual-based procedure for
 * uncapacitated facility location", Operations Research 26 (1978) 992–1009; from memory).
 *
 * @param least per part the least count among the suppliers taken
 */
export function dualAscent(least: Float64Array, undecided: readonly Column[]): Ascent {
  const slacks = Float64Array.from(undecided, ({ line }) => Math.max(0, line.floor));
  const offered = least.map((held, part) =>
    undecided.reduce((low, { counts }) => Math.min(low, counts[part] as number), held),
  );
  for (let round = 0; round < ROUNDS; round += 1) {
    let raised = false;
    for (let part = 0; part < least.length; part += 1)
      if (raise(part, least[part] as number, undecided, offered, slacks)) raised = true;
    if (!raised) break;
  }
  return { bound: offered.reduce((sum, price) => sum + price, 0), slacks };
}

/** Raises one part's price to the next count above it, or as far as the suppliers below it leave room. */
function raise(
  part: number,
  most: number,
  undecided: readonly Column[],
  offered: Float64Array,
  slacks: Float64Array,
): boolean {
  const price = offered[part] as number;
  if (price >= most) return false;
  let [next, room] = [most, Number.POSITIVE_INFINITY];
  for (let index = 0; index < undecided.length; index += 1) {
    const count = undecided[index]?.counts[part] as number;
    if (count > price) next = Math.min(next, count);
    else room = Math.min(room, slacks[index] as number);
  }
  const by = Math.min(next - price, room);
  if (by <= 0) return false;
  for (let index = 0; index < undecided.length; index += 1)
    if ((undecided[index]?.counts[part] as number) <= price) slacks[index] = (slacks[index] as number) - by;
  offered[part] = price + by;
  return true;
}
