import type { Market } from "./market.ts";
import { reachableCells, type Search } from "./search.ts";
import { lineAt, type Reach, type SupportLine } from "./support-line.ts";

/**
 * Each supplier by itself: the line below its charges, and for every part the least that it counts for there. A
 * set's cost is never less than the sum of its lines' floors and, part by part, the least of its columns.
 */
export interface Column {
  reach: Reach;
  line: SupportLine;
  /** By part; as a part not bought where the supplier does not sell it. */
  counts: Float64Array;
}

/** Columns with lines that are highest at about these baskets; suppliers whose basket is always refused are left out. */
export function columnsAt(search: Search, goods: Float64Array, weight: Float64Array): Column[] {
  const { market } = search;
  const columns: (Column | null)[] = market.suppliers.map((_, supplier) => {
    const reach = { supplier, cells: reachableCells(search, supplier) };
    if (reach.cells.length === 0) return null;
    const line = lineAt(search, reach, goods[supplier] as number, weight[supplier] as number);
    return { reach, line, counts: new Float64Array(market.parts).fill(search.omitted) };
  });
  for (let part = 0; part < market.parts; part += 1) fillPart(market, columns, part);
  return columns.filter((column) => column !== null);
}

function fillPart(market: Market, columns: readonly (Column | null)[], part: number): void {
  if (market.needed[part] === 0) {
    for (const column of columns) if (column !== null) column.counts[part] = 0;
    return;
  }
  const end = market.first[part + 1] as number;
  for (let way = market.first[part] as number; way < end; way += 1) {
    if (market.open[way] === 0) continue;
    const [from, to] = [market.orderFrom[way] as number, market.orderTo[way] as number];
    let count = 0;
    for (let at = from; at < to; at += 1) count += countAt(market, columns, at);
    for (let at = from; at < to; at += 1) {
      const column = columns[market.supplier[at] as number] as Column | null;
      if (column !== null && count < (column.counts[part] as number)) column.counts[part] = count;
    }
  }
}

function countAt(market: Market, columns: readonly (Column | null)[], at: number): number {
  const column = columns[market.supplier[at] as number] as Column | null;
  if (column === null) return Number.POSITIVE_INFINITY;
  const weight = market.weight[at] as number;
  const count = column.line.perGoods * (market.near[at] as number);
  return Number.isNaN(weight) ? count : count + column.line.perWeight * weight;
}
