import { type Arrangement, asItLies, howMany, lengthOf } from "./arrangement.ts";
import type { Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/**
 * Which ways round a board may lie: a square or circle has one.
 *
 * @example 58 × 42 mm → as drawn, and turned
 */
export function waysRound({ board }: PanelMeasures): boolean[] {
  return board.width === board.height ? [false] : [false, true];
}

/**
 * Every grid of one orientation that fits into a room, the widest first: all a V-scored panel can be.
 *
 * @example 250 × 186 mm, boards of 58 × 42 mm, gap 2 mm: 4 × 4 … 1 × 1, then turned 5 × 3 … 1 × 1
 */
export function gridsIn(room: Size, measures: PanelMeasures): Arrangement[] {
  const { board, gap } = measures;
  return waysRound(measures).flatMap((turned) => {
    const { width, height } = asItLies(board, turned);
    const found: Arrangement[] = [];
    for (let columns = howMany(room.width, width, gap); columns > 0; columns -= 1)
      for (let rows = howMany(room.height, height, gap); rows > 0; rows -= 1)
        found.push({
          first: { columns, rows, turned },
          second: null,
          lies: "beside",
          count: columns * rows,
          width: lengthOf(columns, width, gap),
          height: lengthOf(rows, height, gap),
        });
    return found;
  });
}
