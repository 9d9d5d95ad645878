import { relaxLines } from "./relaxed-lines.ts";
import { isBeaten, marginAt, offerPlan, type Search } from "./search.ts";
import { lineOf, type Reach, type SupportLine } from "./support-line.ts";

/** A set of suppliers, the ranges open to the basket of each, and the line below its charges that is in force. */
export interface SetNode {
  reaches: readonly Reach[];
  lines: SupportLine[];
  /** What each order of a supplier is let off; only where every supplier of the set must be used. */
  bonus: readonly number[];
  bound: number;
  /** How far above its bound every choice of lines has been followed; 0: none has. */
  followed: number;
}

/** The first node of a set. */
export function setNode(reaches: readonly Reach[], lines: SupportLine[], bound: number): SetNode {
  return { reaches, lines, bonus: reaches.map(() => 0), bound, followed: 0 };
}

/** Whether every supplier of the set must get an order, for the sake of a least number of parcels. */
export function mustUseAll(search: Search): boolean {
  return search.leastParcels > 1;
}

/** Buys every part by itself at the node's lines, keeps the plan if it is good, and gives the node's bound. */
export function evaluate(search: Search, node: SetNode): number {
  const { market, omitted, prices, relaxed } = search;
  let floor = 0;
  prices.inSet.fill(0);
  node.reaches.forEach(({ supplier, cells }, index) => {
    const line = node.lines[index] as SupportLine;
    prices.inSet[supplier] = 1;
    prices.perGoods[supplier] = line.perGoods;
    prices.perWeight[supplier] = line.perWeight;
    prices.bonus[supplier] = node.bonus[index] as number;
    prices.weighedOnly[supplier] = cells.every(({ anyWeight }) => !anyWeight) ? 1 : 0;
    floor += line.floor + (node.bonus[index] as number);
  });
  relaxLines(market, omitted, prices, relaxed);
  if (relaxed.sum < Number.POSITIVE_INFINITY) offerPlan(search, relaxed.ways, relaxed.baskets);
  return relaxed.sum + floor;
}

type Slope = "perGoods" | "perWeight";

interface Tried {
  at: number;
  value: number;
  rise: number;
}

const WIDENINGS = 24;
const HALVINGS = 10;

/**
 * Raises a node's bound by the slope of one supplier's line: the bound is a concave function of it, straight between
 * breakpoints, whose rise is the goods (or weight) that the lines bring less those at which the line touches. The
 * maximum is where two straight pieces from either side meet.
 */
export function raiseBound(search: Search, node: SetNode, index: number): void {
  const { supplier } = node.reaches[index] as Reach;
  const slope = slopeToMove(search, node, index);
  let here = tryAt(search, node, index, slope, (node.lines[index] as SupportLine)[slope]);
  if (here.rise === 0) return;
  const sign = Math.sign(here.rise);
  let step = slope === "perGoods" ? 0.02 : weightStep(search, node, supplier);
  let there = here;
  for (let turn = 0; turn < WIDENINGS && Math.sign(there.rise) === sign; turn += 1) {
    here = there;
    there = tryAt(search, node, index, slope, here.at + sign * step);
    if (isBeaten(search, there.value)) return;
    step *= 2;
  }
  const best = meet(search, node, index, slope, here, there);
  tryAt(search, node, index, slope, best.at);
}

/** The slope that leaves the wider gap between line and basket: a range left comes first. */
function slopeToMove(search: Search, node: SetNode, index: number): Slope {
  const { supplier } = node.reaches[index] as Reach;
  const { cell, goods, weight, perGoods, perWeight } = node.lines[index] as SupportLine;
  if (cell === null) return "perGoods";
  const own = search.relaxed.baskets.goods[supplier] as number;
  const heavy = search.relaxed.baskets.weight[supplier] as number;
  if (own < cell.goodsFrom || own > cell.goodsTo) return "perGoods";
  if (heavy < cell.weightFrom || heavy > cell.weightTo) return "perWeight";
  const near = search.market.suppliers[supplier]?.near ?? 0;
  const byGoods = Math.abs((cell.multiple - perGoods) * near * (own - goods));
  return byGoods >= Math.abs(perWeight * (heavy - weight)) ? "perGoods" : "perWeight";
}

/** A twentieth of what a unit of weight is worth in this basket. */
function weightStep(search: Search, node: SetNode, supplier: number): number {
  const { goods, weight } = search.relaxed.baskets;
  const near = search.market.suppliers[supplier]?.near ?? 0;
  const worth = Math.max(goods[supplier] as number, 1) * near;
  return worth / Math.max(weight[supplier] as number, 1) / 20;
}

function meet(search: Search, node: SetNode, index: number, slope: Slope, one: Tried, other: Tried): Tried {
  let [here, there] = [one, other];
  for (let turn = 0; turn < HALVINGS && here.rise !== there.rise; turn += 1) {
    const at =
      (there.value - here.value + here.rise * here.at - there.rise * there.at) / (here.rise - there.rise);
    const height = here.value + here.rise * (at - here.at);
    const middle = tryAt(search, node, index, slope, at);
    if (isBeaten(search, middle.value)) return middle;
    if (height - middle.value <= marginAt(search) || middle.rise === 0) return middle;
    if (Math.sign(middle.rise) === Math.sign(here.rise)) here = middle;
    else there = middle;
  }
  return here.value >= there.value ? here : there;
}

function tryAt(search: Search, node: SetNode, index: number, slope: Slope, at: number): Tried {
  const reach = node.reaches[index] as Reach;
  const held = node.lines[index] as SupportLine;
  const line = lineOf(
    search,
    reach,
    slope === "perGoods" ? at : held.perGoods,
    slope === "perWeight" ? at : held.perWeight,
  );
  node.lines[index] = line;
  const value = evaluate(search, node);
  const { goods, weight } = search.relaxed.baskets;
  const near = search.market.suppliers[reach.supplier]?.near ?? 0;
  const rise =
    slope === "perGoods"
      ? ((goods[reach.supplier] as number) - line.goods) * near
      : (weight[reach.supplier] as number) - line.weight;
  return { at, value, rise };
}
