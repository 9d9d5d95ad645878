import { compareBig, compareWays } from "./held-plan.ts";
import type { Market } from "./market.ts";
import { broughtTo, exactOf, type OpenLine, type OpenLines } from "./open-lines.ts";
import type { Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** Measures of a tracked basket: goods, weight, whether any weight is unknown, whether it has an order. */
const MEASURES = 4;

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

interface Choice {
  before: number;
  part: number;
  way: number;
}

interface Ahead {
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
function bringsTo(market: Market, { tracked }: OpenLines, way: number): number[] {
  return tracked.flatMap(({ supplier, byWeight }) => {
    const { goods, weight, unweighed, lines } = broughtTo(market, way, supplier);
    return [goods, byWeight ? weight : 0, byWeight ? unweighed : 0, lines];
  });
}

/** Worth of what a way brings to baskets that are not tracked. */
function plainOf(market: Market, { tracked }: OpenLines, way: number): number {
  let sum = 0;
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1)
    if (!tracked.some(({ supplier }) => supplier === market.supplier[at])) sum += market.near[at] as number;
  return sum;
}

/** Every label followed by every open way of the next line, within the gap and the baskets' ranges. */
export function nextLayer(
  search: Search,
  open: OpenLines,
  labels: Labels,
  layer: number,
  gap: number,
): Labels {
  const { market } = search;
  const { part, ways } = open.lines[layer] as OpenLine;
  const next: Labels = { ...labels, count: 0, excess: [], plain: [], filled: [], last: [] };
  const places = new Map<string, number>();
  const ahead = labels.ahead[layer + 1] as Ahead;
  const steps = ways.map(({ way, excess }) => ({
    way,
    excess,
    plain: plainOf(market, open, way),
    brings: bringsTo(market, open, way),
  }));
  for (let from = 0; from < labels.count; from += 1) {
    for (const step of steps) {
      const excess = (labels.excess[from] as number) + step.excess;
      if (excess > gap) continue;
      const filled = step.brings.map((amount, at) =>
        at % MEASURES < 2
          ? (labels.filled[from * labels.width + at] as number) + amount
          : Math.max(labels.filled[from * labels.width + at] as number, amount),
      );
      if (!fits(filled, ahead, labels.limits)) continue;
      const plain = (labels.plain[from] as number) + step.plain;
      const choice = { before: labels.last[from] as number, part, way: step.way };
      addLabel(search, next, places, { excess, plain, filled, choice });
    }
  }
  return next;
}

function fits(filled: readonly number[], ahead: Ahead, limits: Ahead): boolean {
  for (let at = 0; at < filled.length; at += 1) {
    const value = filled[at] as number;
    if (value + (ahead.most[at] as number) < (limits.least[at] as number)) return false;
    if (value + (at % MEASURES < 2 ? (ahead.least[at] as number) : 0) > (limits.most[at] as number))
      return false;
  }
  return true;
}

interface Label {
  excess: number;
  plain: number;
  filled: number[];
  choice: Choice;
}

function addLabel(search: Search, labels: Labels, places: Map<string, number>, label: Label): void {
  const key = label.filled.join();
  const held = places.get(key);
  if (held === undefined) {
    places.set(key, labels.count);
    labels.excess.push(label.excess);
    labels.plain.push(label.plain);
    labels.filled.push(...label.filled);
    labels.last.push(labels.trail.push(label.choice) - 1);
    labels.count += 1;
    return;
  }
  if (!goesBefore(search, labels, label, held)) return;
  labels.excess[held] = label.excess;
  labels.plain[held] = label.plain;
  labels.last[held] = labels.trail.push(label.choice) - 1;
}

/** Whether a label goes before one that fills the tracked baskets alike. */
function goesBefore(search: Search, labels: Labels, label: Label, held: number): boolean {
  const off = label.plain - (labels.plain[held] as number);
  if (Math.abs(off) > search.margin + 1e-11 * Math.abs(label.plain)) return off < 0;
  const own = [...pathFrom(labels, label.choice.before), label.choice];
  const other = pathOf(labels, held);
  const sums = (path: readonly Choice[], of: (way: number) => bigint) =>
    path.reduce((sum, { way }) => sum + of(way), 0n);
  const { market } = search;
  const byWorth = compareBig(
    sums(own, (way) => exactOf(market, way)),
    sums(other, (way) => exactOf(market, way)),
  );
  const byLeft = () => compareBig(sums(own, market.leftWorth), sums(other, market.leftWorth));
  const inOrder = (path: readonly Choice[]) =>
    Int32Array.from(path.toSorted((a, b) => a.part - b.part).map(({ way }) => way));
  return (byWorth || byLeft() || compareWays(inOrder(own), inOrder(other))) < 0;
}

/** The choices that led to a label, the first first. */
export function pathOf(labels: Labels, at: number): Choice[] {
  return pathFrom(labels, labels.last[at] as number);
}

function pathFrom(labels: Labels, last: number): Choice[] {
  const path: Choice[] = [];
  for (let at = last; at >= 0; at = (labels.trail[at] as Choice).before)
    path.push(labels.trail[at] as Choice);
  return path.reverse();
}
