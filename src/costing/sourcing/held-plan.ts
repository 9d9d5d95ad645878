import { convertMinor } from "#src/costing/conversion.ts";
import { basketBill } from "./basket-bill.ts";
import type { Market, MarketSupplier } from "./market.ts";

/** A whole plan with what it is judged by. */
export interface HeldPlan {
  /** Per part the way it is bought; −1: not bought. */
  ways: Int32Array;
  unbought: number;
  /** Baskets whose freight is not known. */
  freightUnknown: number;
  /** Worth of all that is known, in hundredths of the plan's currency, near enough to tell plans apart mostly. */
  near: number;
  /** Suppliers used, ascending by index. */
  used: number[];
  /** Per used supplier its total in minor units. */
  totals: number[];
}

/** What the orders of a plan put into each basket, by index of supplier. */
export interface Baskets {
  goods: Float64Array;
  weight: Float64Array;
  /** Orders whose weight is not known. */
  unweighed: Int32Array;
  lines: Int32Array;
}

/** Empty baskets for so many suppliers. */
export function emptyBaskets(suppliers: number): Baskets {
  return {
    goods: new Float64Array(suppliers),
    weight: new Float64Array(suppliers),
    unweighed: new Int32Array(suppliers),
    lines: new Int32Array(suppliers),
  };
}

/** Puts the orders of one way into the baskets. */
export function putWay(market: Market, way: number, baskets: Baskets): void {
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1) {
    const supplier = market.supplier[at] as number;
    const weight = market.weight[at] as number;
    baskets.goods[supplier] = (baskets.goods[supplier] as number) + (market.cost[at] as number);
    if (Number.isNaN(weight)) baskets.unweighed[supplier] = (baskets.unweighed[supplier] as number) + 1;
    else baskets.weight[supplier] = (baskets.weight[supplier] as number) + weight;
    baskets.lines[supplier] = (baskets.lines[supplier] as number) + 1;
  }
}

/** Weighs a choice of ways exactly; null where a supplier refuses its basket. `ways` is taken over as it is. */
export function weighPlan(market: Market, ways: Int32Array, baskets: Baskets): HeldPlan | null {
  let unbought = 0;
  for (let part = 0; part < market.parts; part += 1) {
    if (market.needed[part] === 1 && (ways[part] as number) < 0) unbought += 1;
  }
  const held: HeldPlan = { ways, unbought, freightUnknown: 0, near: 0, used: [], totals: [] };
  for (let index = 0; index < market.suppliers.length; index += 1) {
    if (baskets.lines[index] === 0) continue;
    const { terms, near } = market.suppliers[index] as MarketSupplier;
    const weight = baskets.unweighed[index] === 0 ? (baskets.weight[index] as number) : null;
    const bill = basketBill(terms, baskets.goods[index] as number, weight);
    if (bill.refused) return null;
    if (bill.freight === null) held.freightUnknown += 1;
    held.near += bill.total * near;
    held.used.push(index);
    held.totals.push(bill.total);
  }
  return held;
}

/** The baskets of a choice of ways. */
export function basketsOf(market: Market, ways: Int32Array): Baskets {
  const baskets = emptyBaskets(market.suppliers.length);
  for (const way of ways) if (way >= 0) putWay(market, way, baskets);
  return baskets;
}

/**
 * Which of two plans is better (section 5): below 0 when `a` is. Fewer parts not bought, fewer baskets of unknown
 * freight, then the least total, exactly; ties by fewer suppliers, less left over by worth, the suppliers in their
 * order, then per part the earlier way. `margin`: totals further apart than this are told apart in floating point.
 */
export function comparePlans(market: Market, a: HeldPlan, b: HeldPlan, margin: number): number {
  const levels = a.unbought - b.unbought || a.freightUnknown - b.freightUnknown;
  if (levels !== 0) return levels;
  if (Math.abs(a.near - b.near) > margin) return a.near - b.near;
  const total = compareBig(exactTotal(market, a), exactTotal(market, b));
  return (
    total ||
    a.used.length - b.used.length ||
    compareBig(leftWorth(market, a.ways), leftWorth(market, b.ways)) ||
    compareLists(a.used, b.used) ||
    compareWays(a.ways, b.ways)
  );
}

/** Total landed cost in grains, what is not known left out. */
export function exactTotal(market: Market, { used, totals }: HeldPlan): bigint {
  return used.reduce(
    (sum, supplier, at) =>
      sum + convertMinor(totals[at] as number, (market.suppliers[supplier] as MarketSupplier).worth),
    0n,
  );
}

/** Worth of all that is left over, in grains. */
export function leftWorth(market: Market, ways: Int32Array): bigint {
  let sum = 0n;
  for (const way of ways) if (way >= 0) sum += market.leftWorth(way);
  return sum;
}

/** Below 0, 0 or above, as numbers compare. */
export function compareBig(a: bigint, b: bigint): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

/** The first part bought otherwise decides: the earlier way wins, and any way goes before none. */
export function compareWays(a: Int32Array, b: Int32Array): number {
  for (let part = 0; part < a.length; part += 1) {
    const [one, other] = [a[part] as number, b[part] as number];
    if (one === other) continue;
    return one < 0 ? 1 : other < 0 ? -1 : one - other;
  }
  return 0;
}

function compareLists(a: readonly number[], b: readonly number[]): number {
  const at = a.findIndex((value, index) => value !== b[index]);
  return at < 0 ? 0 : (a[at] as number) - (b[at] as number);
}
