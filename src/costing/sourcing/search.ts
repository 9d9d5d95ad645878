import type { BasketCell } from "./basket-cells.ts";
import { type Baskets, comparePlans, compareWays, type HeldPlan, weighPlan } from "./held-plan.ts";
import type { Market, MarketSupplier } from "./market.ts";
import { emptyLines, type RelaxedLines } from "./node-choices.ts";
import { type Prices, plainPrices } from "./prices.ts";

/** One search for the best plan at one run size: what is sought, the best so far, and what was left unsearched. */
export interface Search {
  market: Market;
  leastParcels: number;
  mostParcels: number;
  effort: Effort;
  /** By index of supplier: the most goods, in minor units, and weight that its basket can come to. */
  goodsMost: Float64Array;
  weightMost: Float64Array;
  /** Added to a bound for a part not bought and for a basket of unknown freight: more than any total. */
  omitted: number;
  unknown: number;
  /** Bounds and totals nearer than this are held equal, and then compared exactly. */
  margin: number;
  best: HeldPlan | null;
  /** `best` as one number: its total and what is added for parts not bought and freight unknown. */
  bestScore: number;
  workLeft: number;
  /** Work kept back for what comes after: the sets are gone through with the rest. */
  workKept: number;
  /** Nodes parted by a line so far. */
  parted: number;
  /** Room in which nodes are evaluated, one after the other. */
  prices: Prices;
  relaxed: RelaxedLines;
  /** Least bound of what was left unsearched for want of work; Infinity: nothing was. */
  unsearched: number;
}

/** How far the lines of a node are followed before it is parted instead; the answer does not depend on it. */
export interface Effort {
  /** Steps in depth. */
  dive: number;
  /** Labels in breadth: where the bound leaves room, and where it leaves room for ties and rounding only. */
  wide: number;
  narrow: number;
  /** Open lines above which a node is parted at once unless its bound leaves room for ties and rounding only. */
  lines: number;
}

/** What was quickest on the plans measured. */
export const EFFORT: Effort = { dive: 1500, wide: 200, narrow: 20_000, lines: 24 };

/** What a search must keep to. */
export interface SearchLimits {
  leastParcels: number;
  mostParcels: number;
  work: number;
  effort?: Effort;
}

/** A search over a market that has found nothing yet. */
export function startSearch(market: Market, limits: SearchLimits): Search {
  const { suppliers } = market;
  const search: Search = {
    market,
    leastParcels: limits.leastParcels,
    mostParcels: limits.mostParcels,
    effort: limits.effort ?? EFFORT,
    goodsMost: new Float64Array(suppliers.length),
    weightMost: new Float64Array(suppliers.length),
    omitted: 0,
    unknown: 0,
    margin: 0,
    best: null,
    bestScore: Number.POSITIVE_INFINITY,
    workLeft: limits.work,
    workKept: 0,
    parted: 0,
    prices: plainPrices(suppliers.length),
    relaxed: emptyLines(market),
    unsearched: Number.POSITIVE_INFINITY,
  };
  measure(search);
  return search;
}

/** Sets the reach of every basket and the penalties that follow from it. */
function measure(search: Search): void {
  const { market, goodsMost, weightMost } = search;
  const [goods, weight] = [new Float64Array(goodsMost.length), new Float64Array(goodsMost.length)];
  for (let part = 0; part < market.parts; part += 1) {
    if (market.needed[part] === 0) continue;
    for (let way = market.first[part] as number; way < (market.first[part + 1] as number); way += 1) {
      if (market.open[way] === 1) raise(market, way, goods, weight);
    }
    for (let supplier = 0; supplier < goods.length; supplier += 1) {
      goodsMost[supplier] = (goodsMost[supplier] as number) + (goods[supplier] as number);
      weightMost[supplier] = (weightMost[supplier] as number) + (weight[supplier] as number);
    }
    goods.fill(0);
    weight.fill(0);
  }
  setPenalties(search);
}

/** Raises the most that one part can bring to each supplier's basket to what this way brings. */
function raise(market: Market, way: number, goods: Float64Array, weight: Float64Array): void {
  const [from, to] = [market.orderFrom[way] as number, market.orderTo[way] as number];
  for (let at = from; at < to; at += 1) {
    const supplier = market.supplier[at] as number;
    let [cost, heavy] = [0, 0];
    for (let other = from; other < to; other += 1) {
      if (market.supplier[other] !== supplier) continue;
      cost += market.cost[other] as number;
      heavy += (market.weight[other] as number) || 0;
    }
    if (cost > (goods[supplier] as number)) goods[supplier] = cost;
    if (heavy > (weight[supplier] as number)) weight[supplier] = heavy;
  }
}

function setPenalties(search: Search): void {
  let most = 1;
  search.market.suppliers.forEach(({ cells, near }, index) => {
    const charges = cells.reduce((high, { fixed, slack }) => Math.max(high, fixed + slack), 0);
    const multiple = cells.reduce((high, cell) => Math.max(high, cell.multiple), 1);
    most += charges + multiple * near * (search.goodsMost[index] as number);
  });
  search.unknown = 2 * most;
  search.omitted = 2 * (search.market.suppliers.length + 2) * most;
  search.margin = most * 1e-12;
}

/** Whether a bound leaves no room for a plan as good as the best so far. */
export function isBeaten(search: Search, bound: number): boolean {
  return bound > search.bestScore + marginAt(search);
}

/** How far floating point may be off near the best plan so far. */
export function marginAt(search: Search): number {
  return search.best === null ? search.margin : search.margin + search.bestScore * 1e-11;
}

/** Weighs a choice of ways and keeps it if it is the best so far; the array is copied. */
export function offerPlan(search: Search, ways: Int32Array, baskets: Baskets): boolean {
  if (search.best !== null && compareWays(ways, search.best.ways) === 0) return false;
  const held = weighPlan(search.market, ways, baskets);
  if (held === null) return false;
  const parcels = held.used.length;
  if (parcels < search.leastParcels || parcels > search.mostParcels) return false;
  if (search.best !== null && comparePlans(search.market, held, search.best, marginAt(search)) >= 0)
    return false;
  search.best = { ...held, ways: ways.slice() };
  search.bestScore = held.near + held.unbought * search.omitted + held.freightUnknown * search.unknown;
  return true;
}

/** Counts steps; false once there is no work left, and then `bound` is noted as unsearched. */
export function spend(search: Search, steps: number, bound: number): boolean {
  search.workLeft -= steps;
  if (search.workLeft > search.workKept) return true;
  search.unsearched = Math.min(search.unsearched, bound);
  return false;
}

/** Cells a supplier's basket can reach at this size. */
export function reachableCells(search: Search, supplier: number): BasketCell[] {
  const { cells } = search.market.suppliers[supplier] as MarketSupplier;
  return cells.filter(
    ({ goodsFrom, weightFrom }) =>
      goodsFrom <= (search.goodsMost[supplier] as number) &&
      weightFrom <= (search.weightMost[supplier] as number),
  );
}
