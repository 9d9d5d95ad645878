import { broughtTo } from "./line-spans.ts";
import type { Market } from "./market.ts";
import type { OpenLine, OpenLines } from "./open-lines.ts";
import type { Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** Measures of a tracked basket: goods, weight, whether any weight is unknown, whether it has an order. */
export const MEASURES = 4;

/** Choices of the open lines up to some layer, one entry each. */
export interface Labels {
  count: number;
  excess: number[];
  /** Worth of the orders in baskets that are not tracked. */
  plain: number[];
  /** Tracked baskets, `width` measures to a label. */
  width: number;
  filled: number[];
  /** Place in `trail` of each label's last choice; −1: none. */
  last: number[];
  trail: Choice[];
  /** What the lines from each layer on bring at most and at least, by measure. */
  ahead: Ahead[];
  limits: Ahead;
}

export interface Choice {
  before: number;
  part: number;
  way: number;
}

export interface Ahead {
  least: number[];
  most: number[];
}

/** The one label before any open line is chosen. */
export function startLabels(search: Search, node: SetNode, open: OpenLines): Labels {
  const { goods, weight, unweighed, lines } = open.baskets;
  const filled = open.tracked.flatMap(({ supplier, byWeight }) => [
    goods[supplier] as number,
    byWeight ? (weight[supplier] as number) : 0,
    byWeight ? Math.min(1, unweighed[supplier] as number) : 0,
    Math.min(1, lines[supplier] as number),
  ]);
  const ahead: Ahead[] = [{ least: filled.map(() => 0), most: filled.map(() => 0) }];
  for (const line of open.lines.toReversed())
    ahead.unshift(aheadOf(search.market, open, line, ahead[0] as Ahead));
  return {
    count: 1,
    excess: [0],
    plain: [0],
    width: filled.length,
    filled,
    last: [-1],
    trail: [],
    ahead,
    limits: limitsOf(node, open),
  };
}

function aheadOf(market: Market, open: OpenLines, { ways }: OpenLine, after: Ahead): Ahead {
  const brought = ways.map(({ way }) => bringsTo(market, open, way));
  return {
    least: after.least.map((sum, at) => sum + Math.min(...brought.map((one) => one[at] as number))),
    most: after.most.map((sum, at) => sum + Math.max(...brought.map((one) => one[at] as number))),
  };
}

/** The ranges a tracked basket has to end in. */
function limitsOf(node: SetNode, open: OpenLines): Ahead {
  const limits: Ahead = { least: [], most: [] };
  for (const { supplier, byWeight, byUse } of open.tracked) {
    const cells = node.reaches.find((reach) => reach.supplier === supplier)?.cells ?? [];
    const weighed = byWeight && cells.every(({ anyWeight }) => !anyWeight);
    const never = Number.POSITIVE_INFINITY;
    limits.least.push(
      Math.min(...cells.map(({ goodsFrom }) => goodsFrom)),
      weighed ? Math.min(...cells.map(({ weightFrom }) => weightFrom)) : 0,
      0,
      byUse ? 1 : 0,
    );
    limits.most.push(
      Math.max(...cells.map(({ goodsTo }) => goodsTo)),
      weighed ? Math.max(...cells.map(({ weightTo }) => weightTo)) : never,
      weighed ? 0 : never,
      never,
    );
  }
  return limits;
}

/** What a way brings to the tracked baskets. */
export function bringsTo(market: Market, { tracked }: OpenLines, way: number): number[] {
  return tracked.flatMap(({ supplier, byWeight }) => {
    const { goods, weight, unweighed, lines } = broughtTo(market, way, supplier);
    return [goods, byWeight ? weight : 0, byWeight ? unweighed : 0, lines];
  });
}

/** Worth of what a way brings to baskets that are not tracked. */
export function plainOf(market: Market, { tracked }: OpenLines, way: number): number {
  let sum = 0;
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1)
    if (!tracked.some(({ supplier }) => supplier === market.supplier[at])) sum += market.near[at] as number;
  return sum;
}

/** Whether a label can still end in the ranges of its node. */
export function fits(filled: readonly number[], ahead: Ahead, limits: Ahead): boolean {
  for (let at = 0; at < filled.length; at += 1) {
    const value = filled[at] as number;
    if (value + (ahead.most[at] as number) < (limits.least[at] as number)) return false;
    const least = at % MEASURES < 2 ? (ahead.least[at] as number) : 0;
    if (value + least > (limits.most[at] as number)) return false;
  }
  return true;
}

/** The choices that led to a label, the first first. */
export function pathOf(labels: Labels, at: number): Choice[] {
  return pathFrom(labels, labels.last[at] as number);
}

/** The choices that led to a place in the trail. */
export function pathFrom(labels: Labels, last: number): Choice[] {
  const path: Choice[] = [];
  for (let at = last; at >= 0; at = (labels.trail[at] as Choice).before)
    path.push(labels.trail[at] as Choice);
  return path.reverse();
}
