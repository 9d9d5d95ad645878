import type { BasketCell } from "./basket-cells.ts";
import { closeLines } from "./close-lines.ts";
import { improvePlan } from "./improve-plan.ts";
import { addNode, type NodeQueue, takeNode } from "./node-queue.ts";
import { openLines } from "./open-lines.ts";
import { partedLines } from "./part-lines.ts";
import { polishBound } from "./polish-bound.ts";
import { raiseBound } from "./raise-bound.ts";
import { isBeaten, marginAt, type Search, spend } from "./search.ts";
import { evaluate, type SetNode, shrink } from "./set-node.ts";
import { lineAt, lineOf, type Reach, type SupportLine } from "./support-line.ts";

/** Times that ranges are dropped and the node evaluated anew before it is parted. */
const SETTLINGS = 3;
/** Of nodes that are parted by a line, one in so many is looked around for better plans. */
const IMPROVED_EVERY = 16;
/** Times that one line of a node is raised by itself before all are together. */
const RAISES = 2;

/**
 * Searches nodes, that of the least bound first, until no bound leaves room for a plan as good as the best so far.
 * A node is a set of suppliers, each of which is used, and the ranges (`BasketCell`) their baskets may lie in. A
 * supplier's charges are bounded by a straight line below them, which makes every part a choice by itself; where the
 * line is too low for the basket that comes out, the ranges are parted there.
 */
export function searchNodes(search: Search, queue: NodeQueue): void {
  for (let node = takeNode(queue); node !== null; node = takeNode(queue)) {
    if (isBeaten(search, node.bound)) return;
    if (spend(search, node.reaches.length, node.bound)) searchNode(search, queue, node);
  }
}

/** Raises a node's bound as far as it goes, then searches its lines, or parts it. */
export function searchNode(search: Search, queue: NodeQueue, node: SetNode): void {
  let value = evaluate(search, node);
  if (isBeaten(search, node.bound)) return;
  shrink(search, node, value);
  for (let round = 0; round < SETTLINGS && dropRanges(search, node, value); round += 1) {
    value = evaluate(search, node);
    if (isBeaten(search, node.bound)) return;
    shrink(search, node, value);
  }
  let gaps = gapsOf(search, node);
  for (let round = 0; round < RAISES; round += 1) {
    const worst = widest(gaps);
    if (worst === null || partedAt(search, node, worst).length > 1) break;
    raiseBound(search, node, worst);
    if (isBeaten(search, node.bound)) return;
    gaps = gapsOf(search, node);
  }
  const parted = widest(gaps.map((gap, index) => (partedAt(search, node, index).length > 1 ? gap : 0)));
  if (parted !== null) {
    const children = partedAt(search, node, parted).map((cells) => childOf(search, node, parted, cells));
    for (const child of children) queueNode(search, queue, child);
    return;
  }
  if (widest(gaps) !== null) polishBound(search, node);
  value = evaluate(search, node);
  if (isBeaten(search, node.bound)) return;
  shrink(search, node, value);
  const open = openLines(search, node, search.bestScore - value + 2 * marginAt(search));
  if (closeLines(search, node, open, value)) return;
  if (search.parted % IMPROVED_EVERY === 0 || !node.improved) improvePlan(search, node, open);
  search.parted += 1;
  for (const choices of partedLines(search.market, open))
    queueNode(search, queue, { ...node, lines: node.lines.slice(), choices, improved: true });
}

/**
 * Leaves a node without the ranges in which the line in force lies so high that no plan as good as the best is left, and
 * draws the lines anew over those that remain. `value`: the bound at the lines in force. False: nothing was dropped.
 */
function dropRanges(search: Search, node: SetNode, value: number): boolean {
  const { goods, weight } = search.relaxed.baskets;
  let dropped = false;
  const reaches = node.reaches.map(({ supplier, cells }, index) => {
    if (cells.length === 1) return { supplier, cells };
    const line = node.lines[index] as SupportLine;
    const left = cells.filter((cell) => {
      const own = lineOf(search, { supplier, cells: [cell] }, line.perGoods, line.perWeight);
      return !isBeaten(search, value + own.floor - line.floor);
    });
    if (left.length === cells.length || left.length === 0) return { supplier, cells };
    dropped = true;
    return { supplier, cells: left };
  });
  if (!dropped) return false;
  node.lines = node.lines.map((line, index) => {
    const reach = reaches[index] as Reach;
    if (reach.cells.length === node.reaches[index]?.cells.length) return line;
    return lineAt(search, reach, goods[reach.supplier] as number, weight[reach.supplier] as number);
  });
  node.reaches = reaches;
  return true;
}

/** Evaluates a new node, and queues it unless it is beaten. */
function queueNode(search: Search, queue: NodeQueue, node: SetNode): void {
  evaluate(search, node);
  if (!isBeaten(search, node.bound)) addNode(queue, node);
}

function gapsOf(search: Search, node: SetNode): number[] {
  return node.reaches.map((reach, index) => gapOf(search, node, reach, index));
}

/** Index of the supplier whose line lies furthest below its basket; null: none by more than rounding. */
function widest(gaps: readonly number[]): number | null {
  const most = Math.max(0, ...gaps);
  return most > 0 ? gaps.indexOf(most) : null;
}

function gapOf(search: Search, node: SetNode, { supplier }: Reach, index: number): number {
  const line = node.lines[index] as SetNode["lines"][number];
  const { goods, weight } = search.relaxed.baskets;
  const cell = cellOf(search, node, index);
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
function cellOf(search: Search, node: SetNode, index: number): BasketCell | null {
  const { supplier, cells } = node.reaches[index] as Reach;
  const { goods, weight, unweighed } = search.relaxed.baskets;
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
function partedAt(search: Search, node: SetNode, index: number): BasketCell[][] {
  const { supplier, cells } = node.reaches[index] as Reach;
  const goods = search.relaxed.baskets.goods[supplier] as number;
  const weight = search.relaxed.baskets.weight[supplier] as number;
  const groups: BasketCell[][] = [[], [], [], [], [], []];
  for (const cell of cells) {
    const byGoods = goods < cell.goodsFrom ? 4 : goods > cell.goodsTo ? 3 : 0;
    const byWeight = weight < cell.weightFrom ? 2 : weight > cell.weightTo ? 1 : 0;
    groups[byGoods || byWeight || (cell.freightUnknown && cells.length > 1 ? 5 : 0)]?.push(cell);
  }
  return groups.filter((group) => group.length > 0);
}

function childOf(search: Search, node: SetNode, index: number, cells: BasketCell[]): SetNode {
  const { supplier } = node.reaches[index] as Reach;
  const { goods, weight } = search.relaxed.baskets;
  const reach = { supplier, cells };
  const line = lineAt(search, reach, goods[supplier] as number, weight[supplier] as number);
  return {
    ...node,
    reaches: node.reaches.with(index, reach),
    lines: node.lines.with(index, line),
  };
}
