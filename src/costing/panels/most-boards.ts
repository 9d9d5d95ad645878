import { divideDown } from "#src/costing/whole.ts";
import type { Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/**
 * A number of boards that no routed layout can pass, however boards lie. Each board takes its gap with it, so a
 * layout is one of boards larger by a gap in a room larger by a gap. Any layout can be pushed to the upper left
 * until every board touches another or the edge; then all right edges lie at sums of sides, so no more of the
 * room counts than its longest such sum (normal patterns: J. C. Herz, Recursive computational procedure for
 * two-dimensional stock cutting, IBM J. Res. Dev. 16, 1972; from memory).
 *
 * @example 49 × 28, boards of 8 × 3 without gap → 57
 */
export function mostByArea(room: Size, { board, gap }: Pick<PanelMeasures, "board" | "gap">): number {
  const [width, height] = [board.width + gap, board.height + gap];
  const across = longestSum(room.width + gap, width, height);
  const down = longestSum(room.height + gap, width, height);
  return Number((BigInt(across) * BigInt(down)) / (BigInt(width) * BigInt(height)));
}

/** The largest sum of the two sides that is at most a length. */
function longestSum(length: number, one: number, other: number): number {
  let best = 0;
  for (let ones = 0; ones * one <= length; ones += 1) {
    const rest = length - ones * one;
    best = Math.max(best, ones * one + divideDown(rest, other) * other);
  }
  return best;
}
