import { countOf } from "./prices.ts";
import { marginAt, type Search } from "./search.ts";
import { choicesFor, evaluate, type SetNode } from "./set-node.ts";
import { lineOf, type Reach, type SupportLine } from "./support-line.ts";

type Slope = "perGoods" | "perWeight";

/** The bound along one slope: every part's ways as lines in it. */
interface Course {
  /** Per choice: the least count among ways that the slope does not touch, and the range of its others in the lists. */
  rest: Float64Array;
  from: Int32Array;
  /** Count of a touched way at slope 0, and what the slope is multiplied by. */
  base: number[];
  by: number[];
  /** The same for the settled parts together. */
  settled: number;
}

interface Tried {
  at: number;
  value: number;
  rise: number;
}

const WIDENINGS = 40;
const MEETINGS = 20;

/**
 * Raises a node's bound by the slope of one supplier's line: the bound is a concave function of it, straight between
 * breakpoints, whose rise is the goods (or weight) that the lines bring less those at which the line touches. The
 * maximum is where two straight pieces from either side meet. Leaves the node evaluated there.
 */
export function raiseBound(search: Search, node: SetNode, index: number): void {
  const { supplier } = node.reaches[index] as Reach;
  const slope = slopeToMove(search, node, index);
  const held = node.lines[index] as SupportLine;
  const course = courseOf(search, node, supplier, slope, held[slope]);
  const along = (at: number) => tryAt(search, node, index, slope, course, at);
  let here = along(held[slope]);
  const sign = Math.sign(here.rise);
  if (sign === 0) return;
  let step = slope === "perGoods" ? 0.02 : weightStep(search, supplier);
  let there = here;
  for (let turn = 0; turn < WIDENINGS && Math.sign(there.rise) === sign; turn += 1) {
    here = there;
    there = along(here.at + sign * step);
    step *= 2;
  }
  const best = meet(search, here, there, along);
  const beyond = Math.sign(best.rise) === sign ? there.at : best.at;
  for (const at of beyond === best.at ? [best.at] : [beyond, best.at]) {
    node.lines[index] = lineTo(search, node, index, slope, at);
    evaluate(search, node);
  }
}

function meet(search: Search, one: Tried, other: Tried, along: (at: number) => Tried): Tried {
  let [here, there] = [one, other];
  for (let turn = 0; turn < MEETINGS && here.rise !== there.rise; turn += 1) {
    const at =
      (there.value - here.value + here.rise * here.at - there.rise * there.at) / (here.rise - there.rise);
    const height = here.value + here.rise * (at - here.at);
    const middle = along(at);
    if (height - middle.value <= marginAt(search) || middle.rise === 0) return middle;
    if (Math.sign(middle.rise) === Math.sign(here.rise)) here = middle;
    else there = middle;
  }
  return here.value >= there.value ? here : there;
}

function courseOf(search: Search, node: SetNode, supplier: number, slope: Slope, now: number): Course {
  const { market, prices } = search;
  const { parts, from, ways, baskets } = choicesFor(search, node);
  const settled =
    slope === "perGoods"
      ? (baskets.goods[supplier] as number) * (market.suppliers[supplier]?.near ?? 0)
      : (baskets.weight[supplier] as number);
  const course: Course = {
    rest: new Float64Array(parts.length).fill(search.omitted),
    from: new Int32Array(parts.length + 1),
    base: [],
    by: [],
    settled,
  };
  for (let line = 0; line < parts.length; line += 1) {
    const end = from[line + 1] as number;
    for (let at = from[line] as number; at < end; at += 1) {
      const way = ways[at] as number;
      const count = countOf(market, prices, way);
      if (count === Number.POSITIVE_INFINITY) continue;
      const by = broughtBy(search, way, supplier, slope);
      if (by === 0) {
        if (count < (course.rest[line] as number)) course.rest[line] = count;
      } else {
        course.base.push(count - now * by);
        course.by.push(by);
      }
    }
    course.from[line + 1] = course.base.length;
  }
  return course;
}

function broughtBy({ market }: Search, way: number, supplier: number, slope: Slope): number {
  const end = market.orderTo[way] as number;
  let sum = 0;
  for (let at = market.orderFrom[way] as number; at < end; at += 1) {
    if (market.supplier[at] !== supplier) continue;
    sum += slope === "perGoods" ? (market.near[at] as number) : (market.weight[at] as number) || 0;
  }
  return sum;
}

/** The part of the bound that moves with the slope, and its rise. */
function tryAt(
  search: Search,
  node: SetNode,
  index: number,
  slope: Slope,
  { rest, from, base, by, settled }: Course,
  at: number,
): Tried {
  const line = lineTo(search, node, index, slope, at);
  const { supplier } = node.reaches[index] as Reach;
  const near = search.market.suppliers[supplier]?.near ?? 0;
  let [value, brought] = [line.floor + settled * at, settled];
  for (let choice = 0; choice < rest.length; choice += 1) {
    let [least, brings] = [rest[choice] as number, 0];
    const end = from[choice + 1] as number;
    for (let way = from[choice] as number; way < end; way += 1) {
      const count = (base[way] as number) + at * (by[way] as number);
      if (count < least) {
        least = count;
        brings = by[way] as number;
      }
    }
    value += least;
    brought += brings;
  }
  return { at, value, rise: brought - (slope === "perGoods" ? line.goods * near : line.weight) };
}

function lineTo(search: Search, node: SetNode, index: number, slope: Slope, at: number): SupportLine {
  const held = node.lines[index] as SupportLine;
  const reach = node.reaches[index] as Reach;
  return slope === "perGoods"
    ? lineOf(search, reach, at, held.perWeight)
    : lineOf(search, reach, held.perGoods, at);
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
function weightStep(search: Search, supplier: number): number {
  const { goods, weight } = search.relaxed.baskets;
  const near = search.market.suppliers[supplier]?.near ?? 0;
  const worth = Math.max(goods[supplier] as number, 1) * near;
  return worth / Math.max(weight[supplier] as number, 1) / 20;
}
