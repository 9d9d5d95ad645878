import type { BasketCell } from "./basket-cells.ts";
import { type Baskets, putWay } from "./held-plan.ts";
import { broughtTo, cellOver, type Span, spansOf } from "./line-spans.ts";
import type { Market, MarketSupplier } from "./market.ts";
import { copyBaskets, type NodeChoices } from "./node-choices.ts";
import type { Search } from "./search.ts";
import { choicesFor, mustUseAll, type SetNode } from "./set-node.ts";
import { kindsOf, undominated } from "./undominated.ts";

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
  /** Parts that are not bought whatever is chosen. */
  unbought: number;
  /** What the baskets cost that are not tracked, their settled orders included; parts not bought are counted. */
  plain: number;
}

/**
 * Sets aside the ways that cost more than a gap over the node's bound at the prices in force, then, among
 * those left, the ones that another way of the same part beats wherever the rest goes.
 */
export function openLines(search: Search, node: SetNode, gap: number): OpenLines {
  const { market } = search;
  const choices = choicesFor(search, node);
  const settled = choices.settled.slice();
  const baskets = copyBaskets(choices.baskets);
  let lines: OpenLine[] = [];
  let { unbought } = choices;
  choices.parts.forEach((part, index) => {
    const ways = waysWithin(search, choices, index, gap);
    const only = ways[0]?.way ?? (search.relaxed.ways[part] as number);
    if (ways.length > 1) lines.push({ part, ways });
    else if (only < 0) unbought += 1;
    else settle(market, settled, baskets, part, only);
  });
  const spans = spansOf(
    market,
    node.reaches.map(({ supplier }) => supplier),
    lines,
    baskets,
  );
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
    plain: unbought * search.omitted + plainOf(search, node, spans, tracked, baskets),
    unbought,
  };
}

function waysWithin({ relaxed }: Search, choices: NodeChoices, index: number, gap: number): OpenWay[] {
  const ways: OpenWay[] = [];
  const end = choices.from[index + 1] as number;
  for (let at = choices.from[index] as number; at < end; at += 1) {
    const way = choices.ways[at] as number;
    const excess = (relaxed.wayCounts[at] as number) - (relaxed.counts[index] as number);
    if (excess <= gap && excess < Number.POSITIVE_INFINITY) ways.push({ way, excess });
  }
  return ways;
}

function settle(market: Market, settled: Int32Array, baskets: Baskets, part: number, way: number): void {
  settled[part] = way;
  putWay(market, way, baskets);
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
  let [least, second] = [Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY];
  for (const { excess } of ways) {
    if (excess < least) [least, second] = [excess, least];
    else if (excess < second) second = excess;
  }
  return second;
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
    if (straight && line?.perWeight === 0 && !byUse) return [];
    const byWeight = terms.freight.model === "by-weight" && (cell === null || !cell.anyWeight);
    const steadyWeight = cell?.freightUnknown ? null : span.weight[0];
    const own = node.reaches[index]?.cells ?? [];
    const range = own.length === 1 ? (own[0] as BasketCell) : null;
    const pull = range === null || line === undefined ? 0 : (range.multiple - line.perGoods) * near;
    return [{ supplier, cells, byWeight, steadyWeight, range, pull, touch: line?.goods ?? 0, byUse }];
  });
}

function plainOf(
  search: Search,
  node: SetNode,
  spans: readonly Span[],
  tracked: readonly Tracked[],
  baskets: Baskets,
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
  return plain;
}
