import type { BasketCell } from "./basket-cells.ts";
import { closeLines } from "./close-lines.ts";
import { isBeaten, type Search, spend } from "./search.ts";
import { evaluate, raiseBound, type SetNode } from "./set-node.ts";
import { lineAt, type Reach } from "./support-line.ts";

/** Rounds of raising the bound of one node before its lines are searched as they are. */
const ROUNDS = 8;
/** Parts left open up to which a node's lines are searched although its baskets' ranges are not settled. */
const FEW_OPEN = 6;

/**
 * Finds the best plan that uses the suppliers of one set, each of them, or shows that none is as good as the best
 * so far. Branch and bound over the ranges (`BasketCell`) that each basket may lie in: a supplier's charges are
 * bounded by a straight line below them, which makes every part a choice by itself; where the line is too low for
 * the basket that comes out, the ranges are parted there.
 */
export function fillSet(search: Search, node: SetNode): void {
  let { bound } = node;
  for (let round = 0; ; round += 1) {
    const value = evaluate(search, node);
    bound = Math.max(bound, value);
    if (isBeaten(search, bound) || !spend(search, node.reaches.length, bound)) return;
    const worst = widestGap(search, node);
    const parts = worst === null ? [] : partedAt(node, worst);
    const most = parts.length > 1 ? FEW_OPEN : Number.POSITIVE_INFINITY;
    const settled = worst === null || parts.length > 1 || round >= ROUNDS;
    if (settled && closeLines(search, node, value, most)) return;
    if (worst !== null && parts.length > 1) {
      const children = parts.map((cells) => childOf(search, node, worst, cells, bound));
      for (const child of children) fillSet(search, child);
      return;
    }
    if (worst !== null) raiseBound(search, node, worst);
  }
}

/** Index of the supplier whose line lies furthest below its basket; null: none by more than rounding. */
function widestGap(search: Search, node: SetNode): number | null {
  let [found, widest] = [-1, 0];
  node.reaches.forEach((reach, index) => {
    const gap = gapOf(search, node, reach, index);
    if (gap > widest) [found, widest] = [index, gap];
  });
  return found < 0 ? null : found;
}

function gapOf(search: Search, node: SetNode, { supplier }: Reach, index: number): number {
  const line = node.lines[index] as SetNode["lines"][number];
  const { goods, weight } = node.relaxed.baskets;
  const cell = cellOf(node, index);
  if (cell === null) return Number.POSITIVE_INFINITY;
  const near = search.market.suppliers[supplier]?.near ?? 0;
  const own = goods[supplier] as number;
  const real =
    cell.fixed - cell.slack + (cell.freightUnknown ? search.unknown : 0) + cell.multiple * near * own;
  const bounded = line.floor + line.perGoods * near * own + line.perWeight * (weight[supplier] as number);
  const gap = real - bounded;
  return gap > search.margin + Math.abs(real) * 1e-11 ? gap : 0;
}

/** The range a basket has come to lie in, of those still open to it; null: in none of them. */
function cellOf(node: SetNode, index: number): BasketCell | null {
  const { supplier, cells } = node.reaches[index] as Reach;
  const { goods, weight, unweighed } = node.relaxed.baskets;
  const inside = cells.filter((cell) => {
    const own = goods[supplier] as number;
    const heavy = weight[supplier] as number;
    if (own < cell.goodsFrom || own > cell.goodsTo) return false;
    if (unweighed[supplier] !== 0) return cell.anyWeight;
    return heavy >= cell.weightFrom && heavy <= cell.weightTo;
  });
  return inside.find(({ freightUnknown }) => !freightUnknown) ?? inside[0] ?? null;
}

/** Parts a supplier's ranges at its basket: the one it lies in, those below, those above, by goods, then weight. */
function partedAt(node: SetNode, index: number): BasketCell[][] {
  const { supplier, cells } = node.reaches[index] as Reach;
  const goods = node.relaxed.baskets.goods[supplier] as number;
  const weight = node.relaxed.baskets.weight[supplier] as number;
  const groups: BasketCell[][] = [[], [], [], [], [], []];
  for (const cell of cells) {
    const byGoods = goods < cell.goodsFrom ? 4 : goods > cell.goodsTo ? 3 : 0;
    const byWeight = weight < cell.weightFrom ? 2 : weight > cell.weightTo ? 1 : 0;
    groups[byGoods || byWeight || (cell.freightUnknown && cells.length > 1 ? 5 : 0)]?.push(cell);
  }
  return groups.filter((group) => group.length > 0);
}

function childOf(search: Search, node: SetNode, index: number, cells: BasketCell[], bound: number): SetNode {
  const { supplier } = node.reaches[index] as Reach;
  const { goods, weight } = node.relaxed.baskets;
  const reach = { supplier, cells };
  const line = lineAt(search, reach, goods[supplier] as number, weight[supplier] as number);
  return {
    ...node,
    bound,
    reaches: node.reaches.with(index, reach),
    lines: node.lines.with(index, line),
  };
}
