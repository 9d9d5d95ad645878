import type { BasketCell } from "./basket-cells.ts";
import type { Baskets } from "./held-plan.ts";
import type { Market, MarketSupplier } from "./market.ts";
import type { OpenLine } from "./open-lines.ts";
import type { Search } from "./search.ts";

/** What one way brings to one supplier. */
export function broughtTo(market: Market, way: number, supplier: number) {
  const brought = { goods: 0, weight: 0, unweighed: 0, lines: 0 };
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1) {
    if (market.supplier[at] !== supplier) continue;
    const weight = market.weight[at] as number;
    brought.goods += market.cost[at] as number;
    if (Number.isNaN(weight)) brought.unweighed = 1;
    else brought.weight += weight;
    brought.lines = 1;
  }
  return brought;
}

/** The least and the most a basket may come to, and the line its charges then follow if there is only one. */
export interface Span {
  supplier: number;
  goods: [number, number];
  weight: [number, number];
  unweighed: [number, number];
  lines: number;
}

const MEASURED = ["goods", "weight", "unweighed"] as const;

/** Over what a basket may range while the lines are open. */
export function spanOf(market: Market, lines: readonly OpenLine[], baskets: Baskets, supplier: number): Span {
  const [goods, weight] = [baskets.goods[supplier] as number, baskets.weight[supplier] as number];
  const unweighed = baskets.unweighed[supplier] as number;
  const span: Span = {
    supplier,
    goods: [goods, goods],
    weight: [weight, weight],
    unweighed: [unweighed, unweighed],
    lines: baskets.lines[supplier] as number,
  };
  for (const { ways } of lines) {
    const never = Number.POSITIVE_INFINITY;
    const low = { goods: never, weight: never, unweighed: never, lines: never };
    const high = { goods: 0, weight: 0, unweighed: 0 };
    for (const { way } of ways) {
      const brought = broughtTo(market, way, supplier);
      for (const kind of MEASURED) {
        low[kind] = Math.min(low[kind], brought[kind]);
        high[kind] = Math.max(high[kind], brought[kind]);
      }
      low.lines = Math.min(low.lines, brought.lines);
    }
    for (const kind of MEASURED) {
      span[kind][0] += low[kind];
      span[kind][1] += high[kind];
    }
    span.lines += low.lines;
  }
  return span;
}

/** The one range that a span lies in; null: it may reach into several, or weights are partly known. */
export function cellOver(search: Search, { supplier, goods, weight, unweighed }: Span): BasketCell | null {
  const { cells } = search.market.suppliers[supplier] as MarketSupplier;
  const over = cells.filter(
    (cell) =>
      cell.goodsFrom <= goods[0] &&
      goods[1] <= cell.goodsTo &&
      (cell.anyWeight
        ? !cell.freightUnknown || unweighed[0] > 0 || !cells.some((other) => !other.anyWeight)
        : unweighed[1] === 0 && cell.weightFrom <= weight[0] && weight[1] <= cell.weightTo),
  );
  return over.length === 1 ? (over[0] as BasketCell) : null;
}
