import { convertMinor } from "#src/costing/conversion.ts";
import { compareBig } from "./held-plan.ts";
import { cellOver, type Span } from "./line-spans.ts";
import type { Market, MarketSupplier } from "./market.ts";
import type { OpenWay, Tracked } from "./open-lines.ts";
import { marginAt, type Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** How an order of a supplier may be compared with another: exactly, within bounds, or not by itself. */
export type Kind =
  | { kind: "plain" }
  | { kind: "rounded"; multiple: number; off: number }
  | { kind: "tracked" };

/** How each supplier's orders may be compared while its basket ranges over its span. */
export function kindsOf(
  search: Search,
  node: SetNode,
  spans: readonly Span[],
  tracked: readonly Tracked[],
): Map<number, Kind> {
  const kinds = new Map<number, Kind>();
  node.reaches.forEach(({ supplier }, index) => {
    const held = tracked.find((one) => one.supplier === supplier);
    const cell = cellOver(search, spans[index] as Span);
    if (held === undefined) kinds.set(supplier, { kind: "plain" });
    else if (cell === null || held.byUse) kinds.set(supplier, { kind: "tracked" });
    else kinds.set(supplier, { kind: "rounded", multiple: cell.multiple, off: 2 * cell.slack });
  });
  return kinds;
}

/** The ways of one part without those that another beats wherever the rest goes. */
export function undominated(
  search: Search,
  ways: readonly OpenWay[],
  kinds: ReadonlyMap<number, Kind>,
): OpenWay[] {
  const judged = ways.map((open) => ({ open, ...worthOf(search.market, open.way, kinds) }));
  return judged
    .filter(
      (one, at) =>
        !judged.some((other, index) => {
          if (one.low === null || other.low === null || index === at) return false;
          if (one.plain && other.plain) return beatsPlainly(search, other.open.way, one.open.way);
          return other.high < one.low - marginAt(search);
        }),
    )
    .map(({ open }) => open);
}

function worthOf(market: Market, way: number, kinds: ReadonlyMap<number, Kind>) {
  let [low, high, plain] = [0, 0, true];
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1) {
    const kind = kinds.get(market.supplier[at] as number) ?? { kind: "tracked" };
    if (kind.kind === "tracked") return { low: null, high: 0, plain: false };
    const near = market.near[at] as number;
    const [worth, off] = kind.kind === "plain" ? [near, 0] : [near * kind.multiple, kind.off];
    low += worth - off;
    high += worth + off;
    plain &&= kind.kind === "plain";
  }
  return { low, high, plain };
}

/** Whether one way goes before another of the same part, where nothing but their own worths differs. */
function beatsPlainly({ market, margin }: Search, a: number, b: number): boolean {
  const near = nearOf(market, a) - nearOf(market, b);
  if (Math.abs(near) > margin + 1e-11 * Math.abs(nearOf(market, a))) return near < 0;
  const exact =
    compareBig(exactOf(market, a), exactOf(market, b)) ||
    compareBig(market.leftWorth(a), market.leftWorth(b));
  return (exact || a - b) < 0;
}

function nearOf(market: Market, way: number): number {
  let sum = 0;
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1)
    sum += market.near[at] as number;
  return sum;
}

/** Goods of one way in grains, without those of some suppliers. */
export function exactOf(market: Market, way: number, without: ReadonlySet<number> = NONE): bigint {
  let sum = 0n;
  for (let at = market.orderFrom[way] as number; at < (market.orderTo[way] as number); at += 1) {
    const supplier = market.supplier[at] as number;
    if (without.has(supplier)) continue;
    sum += convertMinor(market.cost[at] as number, (market.suppliers[supplier] as MarketSupplier).worth);
  }
  return sum;
}

const NONE: ReadonlySet<number> = new Set();
