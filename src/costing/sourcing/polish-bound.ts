import { isBeaten, type Search } from "./search.ts";
import { evaluate, type SetNode } from "./set-node.ts";
import { lineOf, type Reach, type SupportLine } from "./support-line.ts";

const TURNS = 40;
const PATIENCE = 4;
/** Share of the way to the best plan so far below which steps are too small to matter. */
const LEAST_STEP = 1e-3;

/**
 * Raises a node's bound by all its lines together, where moving one by itself no longer helps: steps along the
 * subgradient (goods and weights brought less those at which the lines touch), of the length that would reach the
 * best plan so far if the bound rose evenly, halved whenever it does not rise (Polyak's rule; common practice, no
 * source). The lines of the highest bound are kept.
 */
export function polishBound(search: Search, node: SetNode): void {
  let best = node.lines.slice();
  let [highest, step, idle] = [evaluate(search, node), 1, 0];
  for (let turn = 0; turn < TURNS && step > LEAST_STEP && !isBeaten(search, highest); turn += 1) {
    if (!move(search, node, step * Math.min(search.bestScore - highest, Math.abs(highest)))) return;
    const value = evaluate(search, node);
    if (value > highest) {
      [highest, idle] = [value, 0];
      best = node.lines.slice();
      continue;
    }
    idle += 1;
    if (idle < PATIENCE) continue;
    [step, idle] = [step / 2, 0];
    node.lines = best.slice();
    evaluate(search, node);
  }
  node.lines = best;
}

/** Moves every line along its part of the subgradient; false: there is nowhere to go. */
function move(search: Search, node: SetNode, distance: number): boolean {
  const { goods, weight } = search.relaxed.baskets;
  const rises = node.reaches.map(({ supplier }, index) => {
    const line = node.lines[index] as SupportLine;
    const near = search.market.suppliers[supplier]?.near ?? 0;
    const byWeight = line.perWeight !== 0 || (line.cell !== null && line.cell.weightFrom > 0);
    return [
      ((goods[supplier] as number) - line.goods) * near,
      byWeight ? (weight[supplier] as number) - line.weight : 0,
    ] as const;
  });
  const square = rises.reduce((sum, [byGoods, byWeight]) => sum + byGoods ** 2 + byWeight ** 2, 0);
  if (square === 0) return false;
  node.lines = node.lines.map((line, index) => {
    const [byGoods, byWeight] = rises[index] as readonly [number, number];
    if (byGoods === 0 && byWeight === 0) return line;
    const along = distance / square;
    return lineOf(
      search,
      node.reaches[index] as Reach,
      line.perGoods + along * byGoods,
      line.perWeight + along * byWeight,
    );
  });
  return true;
}
