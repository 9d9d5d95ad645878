import { broughtTo } from "./line-spans.ts";
import type { Market } from "./market.ts";
import { choicesOf, copyBaskets, type NodeChoices } from "./node-choices.ts";
import type { OpenLine, OpenLines } from "./open-lines.ts";

/** Ways this much above their line's least, as a share of the widest, still count as equals. */
const NEARLY = 0.05;

/**
 * Parts the choices that are still open by one line: its least way on one side, its other ways on the other. The line
 * is the one that moves most between tracked baskets among those whose second way hardly costs more: how such a line
 * is bought is what the bound leaves open.
 */
export function partedLines(market: Market, open: OpenLines): NodeChoices[] {
  const line = pivotOf(market, open);
  const ways = line.ways.toSorted((a, b) => a.excess - b.excess || a.way - b.way).map(({ way }) => way);
  return [ways.slice(0, 1), ways.slice(1)].map((side) =>
    choicesOf(
      market,
      open.lines.map((one) =>
        one === line
          ? { part: one.part, ways: side }
          : { part: one.part, ways: one.ways.map(({ way }) => way) },
      ),
      open.settled.slice(),
      copyBaskets(open.baskets),
      open.unbought,
    ),
  );
}

function pivotOf(market: Market, open: OpenLines): OpenLine {
  const judged = open.lines.map((line) => {
    const excesses = line.ways.map(({ excess }) => excess).sort((a, b) => a - b);
    return { line, second: excesses[1] ?? 0, moves: movesOf(market, open, line) };
  });
  const seconds = judged.map(({ second }) => second);
  const [least, most] = [Math.min(...seconds), Math.max(...seconds)];
  const near = judged.filter(({ second }) => second <= least + (most - least) * NEARLY);
  return near.reduce((best, one) => (one.moves > best.moves ? one : best)).line;
}

/** By how much a line's ways differ in what they bring to the tracked baskets, in worth. */
function movesOf(market: Market, { tracked }: OpenLines, { ways }: OpenLine): number {
  return tracked.reduce((sum, { supplier }) => {
    const near = market.suppliers[supplier]?.near ?? 0;
    const goods = ways.map(({ way }) => broughtTo(market, way, supplier).goods * near);
    return sum + Math.max(...goods) - Math.min(...goods);
  }, 0);
}
