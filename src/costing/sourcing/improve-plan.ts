import { basketBill } from "./basket-bill.ts";
import { type Baskets, basketsOf } from "./held-plan.ts";
import type { MarketSupplier } from "./market.ts";
import type { OpenLines } from "./open-lines.ts";
import { offerPlan, type Search } from "./search.ts";
import type { SetNode } from "./set-node.ts";

/** One way a line may be changed to. */
interface Move {
  line: number;
  way: number;
}

/** Lines tried two at a time, those whose change costs least by the bound. */
const PAIRED = 48;
const TURNS = 12;

/**
 * Looks for a better plan near the one that a node's bound suggests: changes one line, or two at a time, as long as the
 * whole then really costs less.
 */
export function improvePlan(search: Search, node: SetNode, open: OpenLines): void {
  const ways = search.relaxed.ways.slice();
  for (const part of open.lines) ways[part.part] = leastOf(part.ways);
  open.settled.forEach((way, part) => {
    if (way >= 0) ways[part] = way;
  });
  const baskets = basketsOf(search.market, ways);
  const moves = open.lines
    .flatMap(({ part, ways: own }) => own.map(({ way, excess }) => ({ line: part, way, excess })))
    .sort((a, b) => a.excess - b.excess);
  let score = scoreOf(search, node, baskets);
  for (let turn = 0; turn < TURNS; turn += 1) {
    const found =
      bestOf(search, node, ways, baskets, moves, score) ??
      bestPair(search, node, ways, baskets, moves, score);
    if (found === null) break;
    for (const move of found.moves) change(search, ways, baskets, move);
    score = found.score;
  }
  offerPlan(search, ways, basketsOf(search.market, ways));
}

function leastOf(ways: OpenLines["lines"][number]["ways"]): number {
  return ways.reduce((best, one) => (one.excess < best.excess ? one : best)).way;
}

interface Found {
  moves: Move[];
  score: number;
}

function bestOf(
  search: Search,
  node: SetNode,
  ways: Int32Array,
  baskets: Baskets,
  moves: readonly Move[],
  score: number,
): Found | null {
  let found: Found | null = null;
  for (const move of moves) {
    const before = ways[move.line] as number;
    if (before === move.way) continue;
    change(search, ways, baskets, move);
    const now = scoreOf(search, node, baskets);
    change(search, ways, baskets, { line: move.line, way: before });
    if (now < (found?.score ?? score) - search.margin) found = { moves: [move], score: now };
  }
  return found;
}

function bestPair(
  search: Search,
  node: SetNode,
  ways: Int32Array,
  baskets: Baskets,
  moves: readonly Move[],
  score: number,
): Found | null {
  const tried = moves.filter(({ line, way }) => ways[line] !== way).slice(0, PAIRED);
  let found: Found | null = null;
  tried.forEach((first, index) => {
    const before = ways[first.line] as number;
    change(search, ways, baskets, first);
    const others = tried.slice(index + 1).filter(({ line }) => line !== first.line);
    const best = bestOf(search, node, ways, baskets, others, found?.score ?? score);
    if (best !== null) found = { moves: [first, ...best.moves], score: best.score };
    change(search, ways, baskets, { line: first.line, way: before });
  });
  return found;
}

/** Changes one line; the baskets follow. */
function change({ market }: Search, ways: Int32Array, baskets: Baskets, { line, way }: Move): void {
  for (const [one, sign] of [
    [ways[line] as number, -1],
    [way, 1],
  ] as const) {
    for (let at = market.orderFrom[one] as number; at < (market.orderTo[one] as number); at += 1) {
      const supplier = market.supplier[at] as number;
      const weight = market.weight[at] as number;
      baskets.goods[supplier] = (baskets.goods[supplier] as number) + sign * (market.cost[at] as number);
      baskets.lines[supplier] = (baskets.lines[supplier] as number) + sign;
      if (Number.isNaN(weight)) baskets.unweighed[supplier] = (baskets.unweighed[supplier] as number) + sign;
      else baskets.weight[supplier] = (baskets.weight[supplier] as number) + sign * weight;
    }
  }
  ways[line] = way;
}

function scoreOf(search: Search, { reaches }: SetNode, baskets: Baskets): number {
  let score = 0;
  for (const { supplier } of reaches) {
    if (baskets.lines[supplier] === 0) continue;
    const { terms, near } = search.market.suppliers[supplier] as MarketSupplier;
    const weight = baskets.unweighed[supplier] === 0 ? (baskets.weight[supplier] as number) : null;
    const bill = basketBill(terms, baskets.goods[supplier] as number, weight);
    if (bill.refused) return Number.POSITIVE_INFINITY;
    score += bill.total * near + (bill.freight === null ? search.unknown : 0);
  }
  return score;
}
