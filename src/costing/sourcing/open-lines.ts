import { convertMinor } from "#src/costing/conversion.ts";
import type { BasketCell } from "./basket-cells.ts";
import { type Baskets, compareBig, emptyBaskets, putWay } from "./held-plan.ts";
import type { Market, MarketSupplier } from "./market.ts";
import { countOf } from "./relaxed-lines.ts";
import { marginAt, type Search } from "./search.ts";
import { mustUseAll, type SetNode } from "./set-node.ts";

/** A way that a part may still be bought, and by how much its count exceeds the part's least. */
export interface OpenWay {
  way: number;
  excess: number;
}

/** A part for which more than one way is still open. */
export interface OpenLine {
  part: number;
  ways: OpenWay[];
}

/** A supplier whose basket matters beyond the sum of its orders' worths. */
export interface Tracked {
  supplier: number;
  cells: readonly BasketCell[];
  byWeight: boolean;
  /** Where freight does not go by weight, or by none that is open: a weight to reckon with; null: not known. */
  steadyWeight: number | null;
  /** The one range the node leaves its basket; null: several. */
  range: BasketCell | null;
  /** Within that range: what each unit of goods beyond the place where the node's line touches adds to the bound. */
  pull: number;
  touch: number;
  /** Whether it is still to be seen that it gets an order at all, and must. */
  byUse: boolean;
}

/** What is left to be chosen in a node once every way is set aside that leaves no room for a better plan. */
export interface OpenLines {
  lines: OpenLine[];
  /** Per part the way settled on; −1 where open or not bought. */
  settled: Int32Array;
  /** Baskets of the settled lines. */
  baskets: Baskets;
  tracked: Tracked[];
  /** What the baskets cost that are not tracked, their settled orders included; parts not bought are counted. */
  plain: number;
}

/**
 * Sets aside the ways that cost more than a gap over the node's bound at the prices in force, then, among
 * those left, the ones that another way of the same part beats wherever the rest goes.
 */
export function openLines(search: Search, node: SetNode, gap: number): OpenLines {
  const { market } = search;
  const settled = new Int32Array(market.parts).fill(-1);
  const baskets = emptyBaskets(market.suppliers.length);
  let lines: OpenLine[] = [];
  for (let part = 0; part < market.parts; part += 1) {
    if (market.needed[part] === 0) continue;
    const ways = waysWithin(search, part, gap);
    if (ways.length > 1) lines.push({ part, ways });
    else settle(market, settled, baskets, part, ways[0]?.way ?? (search.relaxed.ways[part] as number));
  }
  const spans = node.reaches.map(({ supplier }) => spanOf(market, lines, baskets, supplier));
  const tracked = trackedOf(search, node, spans, lines, baskets);
  const kinds = kindsOf(search, node, spans, tracked);
  const stillOpen: OpenLine[] = [];
  for (const line of lines) {
    const ways = line.ways.length > 1 ? undominated(search, line.ways, kinds) : line.ways;
    if (ways.length > 1) stillOpen.push({ part: line.part, ways });
    else settle(market, settled, baskets, line.part, (ways[0] as OpenWay).way);
  }
  lines = basketByBasket(market, stillOpen, tracked);
  return {
    lines,
    settled,
    baskets,
    tracked,
    plain: plainOf(search, node, spans, tracked, { lines, settled, baskets }),
  };
}

function waysWithin({ market, prices, relaxed }: Search, part: number, gap: number): OpenWay[] {
  const ways: OpenWay[] = [];
  const least = relaxed.counts[part] as number;
  const end = market.first[part + 1] as number;
  for (let way = market.first[part] as number; way < end; way += 1) {
    if (market.open[way] === 0) continue;
    const excess = countOf(market, prices, way) - least;
    if (excess <= gap && excess < Number.POSITIVE_INFINITY) ways.push({ way, excess });
  }
  return ways;
}

function settle(market: Market, settled: Int32Array, baskets: Baskets, part: number, way: number): void {
  settled[part] = way;
  if (way >= 0) putWay(market, way, baskets);
}

/**
 * Open lines in the order in which they are best followed: all that may touch one tracked basket, the one with the
 * fewest, then all that may touch the next, so that one basket after the other is done with; in each, the lines
 * whose second way is dearest first.
 */
function basketByBasket(market: Market, lines: readonly OpenLine[], tracked: readonly Tracked[]): OpenLine[] {
  const ordered: OpenLine[] = [];
  let rest = lines.toSorted((a, b) => secondOf(b) - secondOf(a) || a.part - b.part);
  let baskets = tracked.map(({ supplier }) => ({
    supplier,
    touching: rest.filter(({ ways }) => ways.some(({ way }) => broughtTo(market, way, supplier).lines > 0)),
  }));
  while (baskets.length > 0) {
    const left = new Set(rest);
    const open = baskets.map((basket) => ({
      ...basket,
      touching: basket.touching.filter((line) => left.has(line)),
    }));
    const next = open.reduce((best, basket) =>
      basket.touching.length < best.touching.length ? basket : best,
    );
    ordered.push(...next.touching);
    rest = rest.filter((line) => !next.touching.includes(line));
    baskets = open.filter(({ supplier }) => supplier !== next.supplier);
  }
  return [...ordered, ...rest];
}

function secondOf({ ways }: OpenLine): number {
  const excesses = ways.map(({ excess }) => excess).sort((a, b) => a - b);
  return excesses[1] ?? 0;
}

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
interface Span {
  supplier: number;
  goods: [number, number];
  weight: [number, number];
  unweighed: [number, number];
  lines: number;
}

function spanOf(market: Market, lines: readonly OpenLine[], baskets: Baskets, supplier: number): Span {
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
    const brought = ways.map(({ way }) => broughtTo(market, way, supplier));
    for (const kind of ["goods", "weight", "unweighed"] as const) {
      const amounts = brought.map((one) => one[kind]);
      span[kind][0] += Math.min(...amounts);
      span[kind][1] += Math.max(...amounts);
    }
    span.lines += Math.min(...brought.map((one) => one.lines));
  }
  return span;
}

/** The one range that a span lies in; null: it may reach into several, or weights are partly known. */
function cellOver(search: Search, { supplier, goods, weight, unweighed }: Span): BasketCell | null {
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

function trackedOf(
  search: Search,
  node: SetNode,
  spans: readonly Span[],
  lines: readonly OpenLine[],
  baskets: Baskets,
): Tracked[] {
  if (lines.length === 0) return [];
  return node.reaches.flatMap(({ supplier }, index): Tracked[] => {
    const span = spans[index] as Span;
    const { cells, terms, near } = search.market.suppliers[supplier] as MarketSupplier;
    const cell = cellOver(search, span);
    const line = node.lines[index];
    const byUse = mustUseAll(search) && baskets.lines[supplier] === 0 && span.lines === 0;
    const straight = cell !== null && cell.slack === 0 && cell.multiple === line?.perGoods;
    if (straight && line?.perWeight === 0 && node.bonus[index] === 0 && !byUse) return [];
    const byWeight = terms.freight.model === "by-weight" && (cell === null || !cell.anyWeight);
    const steadyWeight = cell?.freightUnknown ? null : span.weight[0];
    const own = node.reaches[index]?.cells ?? [];
    const range = own.length === 1 ? (own[0] as BasketCell) : null;
    const pull = range === null || line === undefined ? 0 : (range.multiple - line.perGoods) * near;
    return [{ supplier, cells, byWeight, steadyWeight, range, pull, touch: line?.goods ?? 0, byUse }];
  });
}

/** How an order of a supplier may be compared with another: exactly, within bounds, or not by itself. */
type Kind = { kind: "plain" } | { kind: "rounded"; multiple: number; off: number } | { kind: "tracked" };

function kindsOf(
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

function undominated(search: Search, ways: readonly OpenWay[], kinds: ReadonlyMap<number, Kind>): OpenWay[] {
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

function plainOf(
  search: Search,
  node: SetNode,
  spans: readonly Span[],
  tracked: readonly Tracked[],
  { lines, settled, baskets }: Pick<OpenLines, "lines" | "settled" | "baskets">,
): number {
  const { market } = search;
  let plain = 0;
  node.reaches.forEach(({ supplier }, index) => {
    if (tracked.some((one) => one.supplier === supplier)) return;
    const cell = cellOver(search, spans[index] as Span);
    if (cell === null) return;
    const { near } = market.suppliers[supplier] as MarketSupplier;
    plain +=
      cell.fixed + (cell.freightUnknown ? search.unknown : 0) + (baskets.goods[supplier] as number) * near;
  });
  const open = new Set(lines.map(({ part }) => part));
  for (let part = 0; part < market.parts; part += 1) {
    const unbought = market.needed[part] === 1 && (settled[part] as number) < 0 && !open.has(part);
    if (unbought) plain += search.omitted;
  }
  return plain;
}
