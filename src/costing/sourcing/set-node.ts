import { choicesNear, choicesWithin, type NodeChoices, relaxChoices } from "./node-choices.ts";
import { isBeaten, marginAt, offerPlan, type Search } from "./search.ts";
import type { Reach, SupportLine } from "./support-line.ts";

/**
 * A set of suppliers, the ranges open to the basket of each, the line below its charges that is in force, and the
 * ways that are left to the parts.
 */
export interface SetNode {
  reaches: Reach[];
  lines: SupportLine[];
  bound: number;
  /** Null until the node's turn comes: all ways through the set. */
  choices: NodeChoices | null;
  /** Whether plans near its bound were looked for already, in this node or the one it was parted from. */
  improved: boolean;
}

/** Whether every supplier of the set must get an order, for the sake of a least number of parcels. */
export function mustUseAll(search: Search): boolean {
  return search.leastParcels > 1;
}

/** The choices of a node, all of them when it is first looked at. */
export function choicesFor(search: Search, node: SetNode): NodeChoices {
  if (node.choices !== null) return node.choices;
  const inSet = new Uint8Array(search.market.suppliers.length);
  for (const { supplier } of node.reaches) inSet[supplier] = 1;
  node.choices = choicesWithin(search.market, inSet);
  return node.choices;
}

/**
 * Buys every part by itself at the node's lines, keeps the plan if it is good, and gives the bound at these lines; the
 * node keeps its highest.
 */
export function evaluate(search: Search, node: SetNode): number {
  const { market, omitted, prices, relaxed } = search;
  let floor = 0;
  for (let index = 0; index < node.reaches.length; index += 1) {
    const { supplier, cells } = node.reaches[index] as Reach;
    const line = node.lines[index] as SupportLine;
    prices.perGoods[supplier] = line.perGoods;
    prices.perWeight[supplier] = line.perWeight;
    prices.weighedOnly[supplier] = cells.every(({ anyWeight }) => !anyWeight) ? 1 : 0;
    floor += line.floor;
  }
  relaxChoices(market, omitted, prices, choicesFor(search, node), relaxed);
  const value = relaxed.sum + floor;
  if (!isBeaten(search, value)) offerPlan(search, relaxed.ways, relaxed.baskets);
  node.bound = Math.max(node.bound, value);
  return value;
}

/**
 * Leaves a node without the ways that cost more over its bound than the gap to the best plan. `value`: the bound at
 * the lines it was just evaluated at, whose counts go on to stand for the choices that are left.
 */
export function shrink(search: Search, node: SetNode, value: number): void {
  const gap = search.bestScore - value + 2 * marginAt(search);
  if (gap === Number.POSITIVE_INFINITY) return;
  node.choices = choicesNear(search.market, choicesFor(search, node), search.relaxed, gap);
}
