import type { MinorWorth } from "#src/costing/conversion.ts";
import { type BasketCell, basketCells } from "./basket-cells.ts";
import type { BasketTerms } from "./basket-terms.ts";
import type { SourcingInput, SourcingSupplier } from "./sourcing-input.ts";

/**
 * What is for sale at one run size, in arrays: part p may be bought in the ways first[p] … first[p + 1] − 1,
 * which stand in the order that settles ties; way w consists of the orders orderFrom[w] … orderTo[w] − 1.
 */
export interface Market {
  suppliers: readonly MarketSupplier[];
  parts: number;
  /** 0: nothing of the part is to buy. */
  needed: Uint8Array;
  first: Int32Array;
  /** 0: the way is not open at this size, or by a limit. */
  open: Uint8Array;
  orderFrom: Int32Array;
  orderTo: Int32Array;
  supplier: Int32Array;
  /** Minor units of the supplier's currency, and their worth in hundredths of the plan's, near enough for bounds. */
  cost: Float64Array;
  near: Float64Array;
  /** NaN: not known. */
  weight: Float64Array;
  /** NaN: not known. */
  leadDays: Float64Array;
  /** Worth of what a way leaves over, in grains; asked only where plans cost the same. */
  leftWorth: (way: number) => bigint;
}

export interface MarketSupplier {
  id: string;
  worth: MinorWorth;
  /** Worth of a minor unit in hundredths of the plan's currency. */
  near: number;
  terms: BasketTerms;
  /** Amounts as worths, goods in minor units. */
  cells: readonly BasketCell[];
}

/** Grains in a hundredth of the plan's currency. */
const HUNDREDTH = 1e22;

/** Prepares a supplier once for all run sizes. */
export function marketSupplier({ id, worth, terms }: SourcingSupplier): MarketSupplier {
  const near = worth.near / HUNDREDTH;
  const cells = basketCells(terms).map((cell) => ({
    ...cell,
    fixed: cell.fixed * near,
    slack: cell.slack * near,
  }));
  return { id, worth, near, terms, cells };
}

/** Arrays with room for so many parts, ways and orders. */
export function emptyMarket(suppliers: readonly MarketSupplier[], sizes: Sizes): Market {
  const { parts, ways, orders } = sizes;
  return {
    suppliers,
    parts,
    needed: new Uint8Array(parts),
    first: new Int32Array(parts + 1),
    open: new Uint8Array(ways),
    orderFrom: new Int32Array(ways),
    orderTo: new Int32Array(ways),
    supplier: new Int32Array(orders),
    cost: new Float64Array(orders),
    near: new Float64Array(orders),
    weight: new Float64Array(orders),
    leadDays: new Float64Array(orders),
    leftWorth: () => 0n,
  };
}

interface Sizes {
  parts: number;
  ways: number;
  orders: number;
}

/** The market of one run size from its plain statement. */
export function marketOf({ suppliers, parts }: SourcingInput): Market {
  const ways = parts.flatMap((part) => part.ways);
  const orders = ways.flatMap((way) => way.orders);
  const market = emptyMarket(suppliers.map(marketSupplier), {
    parts: parts.length,
    ways: ways.length,
    orders: orders.length,
  });
  parts.forEach((part, index) => {
    market.needed[index] = part.toBuy > 0 ? 1 : 0;
    market.first[index + 1] = (market.first[index] as number) + part.ways.length;
  });
  let at = 0;
  ways.forEach((way, index) => {
    market.open[index] = 1;
    market.orderFrom[index] = at;
    for (const order of way.orders) setOrder(market, at++, order.supplier, order);
    market.orderTo[index] = at;
  });
  market.leftWorth = (way) => ways[way]?.orders.reduce((sum, order) => sum + order.leftWorth, 0n) ?? 0n;
  return market;
}

/** Writes one order into its place. */
export function setOrder(
  market: Market,
  at: number,
  supplier: number,
  order: { cost: number; weight: number | null; leadDays: number | null },
): void {
  market.supplier[at] = supplier;
  market.cost[at] = order.cost;
  market.near[at] = order.cost * (market.suppliers[supplier] as MarketSupplier).near;
  market.weight[at] = order.weight ?? Number.NaN;
  market.leadDays[at] = order.leadDays ?? Number.NaN;
}

/** The same market with the ways closed that a limit forbids. */
export function narrowed(market: Market, without: readonly number[], latestDays: number | null): Market {
  if (without.length === 0 && latestDays === null) return market;
  const shut = new Set(without);
  const open = market.open.slice();
  for (let way = 0; way < open.length; way += 1) {
    for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1) {
      const late = latestDays !== null && !((market.leadDays[at] as number) <= latestDays);
      if (late || shut.has(market.supplier[at] as number)) open[way] = 0;
    }
  }
  return { ...market, open };
}
