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

/** Over what each basket of some suppliers may range while the lines are open. */
export function spansOf(
  market: Market,
  suppliers: readonly number[],
  lines: readonly OpenLine[],
  baskets: Baskets,
): Span[] {
  const spans = market.suppliers.map((_, supplier) => settledSpan(baskets, supplier));
  const seen = new Int32Array(spans.length);
  const [low, high] = [spans.map(emptySpan), spans.map(emptySpan)];
  for (const { ways } of lines) {
    seen.fill(0);
    for (const { way } of ways) {
      const end = market.orderTo[way] as number;
      const from = market.orderFrom[way] as number;
      for (let at = from; at < end; at += 1) {
        const supplier = market.supplier[at] as number;
        if (end - from > 1 && seenBefore(market, from, at)) continue;
        widen(low[supplier] as Measures, high[supplier] as Measures, seen[supplier] === 0, market, way, at);
        seen[supplier] = (seen[supplier] as number) + 1;
      }
    }
    for (let supplier = 0; supplier < spans.length; supplier += 1)
      if (seen[supplier] !== 0)
        addRange(
          spans[supplier] as Span,
          low[supplier] as Measures,
          high[supplier] as Measures,
          seen[supplier] === ways.length,
        );
  }
  return suppliers.map((supplier) => spans[supplier] as Span);
}

interface Measures {
  goods: number;
  weight: number;
  unweighed: number;
}

function emptySpan(): Measures {
  return { goods: 0, weight: 0, unweighed: 0 };
}

function settledSpan({ goods, weight, unweighed, lines }: Baskets, supplier: number): Span {
  const [own, heavy] = [goods[supplier] as number, weight[supplier] as number];
  const unknown = unweighed[supplier] as number;
  return {
    supplier,
    goods: [own, own],
    weight: [heavy, heavy],
    unweighed: [unknown, unknown],
    lines: lines[supplier] as number,
  };
}

/** Whether an earlier order of the same way goes to the same supplier: a way counts once, with all its orders. */
function seenBefore(market: Market, from: number, at: number): boolean {
  for (let other = from; other < at; other += 1)
    if (market.supplier[other] === market.supplier[at]) return true;
  return false;
}

function widen(low: Measures, high: Measures, first: boolean, market: Market, way: number, at: number): void {
  const single = (market.orderTo[way] as number) - (market.orderFrom[way] as number) === 1;
  const weighed = market.weight[at] as number;
  let [goods, weight, unweighed] = [market.cost[at] as number, weighed || 0, Number.isNaN(weighed) ? 1 : 0];
  if (!single) ({ goods, weight, unweighed } = broughtTo(market, way, market.supplier[at] as number));
  low.goods = first ? goods : Math.min(low.goods, goods);
  low.weight = first ? weight : Math.min(low.weight, weight);
  low.unweighed = first ? unweighed : Math.min(low.unweighed, unweighed);
  high.goods = first ? goods : Math.max(high.goods, goods);
  high.weight = first ? weight : Math.max(high.weight, weight);
  high.unweighed = first ? unweighed : Math.max(high.unweighed, unweighed);
}

/** Adds what one line may bring; `always`: each of its ways brings something. */
function addRange(span: Span, low: Measures, high: Measures, always: boolean): void {
  if (always) {
    span.goods[0] += low.goods;
    span.weight[0] += low.weight;
    span.unweighed[0] += low.unweighed;
    span.lines += 1;
  }
  span.goods[1] += high.goods;
  span.weight[1] += high.weight;
  span.unweighed[1] += high.unweighed;
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
