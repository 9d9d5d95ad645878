import { type Arrangement, asItLies, howMany, lengthOf } from "./arrangement.ts";
import { waysRound } from "./grids.ts";
import type { Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/**
 * Every layout of two grids parted by one straight cut, the second turned against the first, each as tall
 * (or wide) as the room allows: one of them is the best two-block layout, since a shorter block holds fewer.
 * None for boards that look the same turned.
 *
 * @example 17 × 10, boards of 4 × 3 without gap: 2 columns of 3, then 3 turned columns of 2: 12; best of all 13
 */
export function twoBlocksIn(room: Size, measures: PanelMeasures): Arrangement[] {
  const ways = waysRound(measures);
  if (ways.length < 2) return [];
  return ways.flatMap((turned) => [
    ...besides(room, measures, turned),
    ...besides(standing(room), measures, !turned).map(below),
  ]);
}

/** The first block left, the second right of it. */
function besides(room: Size, { board, gap }: PanelMeasures, turned: boolean): Arrangement[] {
  const one = asItLies(board, turned);
  const other = asItLies(board, !turned);
  const rows = howMany(room.height, one.height, gap);
  const otherRows = howMany(room.height, other.height, gap);
  if (rows === 0 || otherRows === 0) return [];
  const found: Arrangement[] = [];
  for (let columns = 1; columns <= howMany(room.width, one.width, gap); columns += 1) {
    const taken = lengthOf(columns, one.width, gap) + gap;
    for (let others = howMany(room.width - taken, other.width, gap); others > 0; others -= 1)
      found.push({
        first: { columns, rows, turned },
        second: { columns: others, rows: otherRows, turned: !turned },
        lies: "beside",
        count: columns * rows + others * otherRows,
        width: taken + lengthOf(others, other.width, gap),
        height: Math.max(lengthOf(rows, one.height, gap), lengthOf(otherRows, other.height, gap)),
      });
  }
  return found;
}

/** The room seen from its side, in which beside is below. */
function standing({ width, height }: Size): Size {
  return { width: height, height: width };
}

function below({ first, second, count, width, height }: Arrangement): Arrangement {
  const back = ({ columns, rows, turned }: Arrangement["first"]) => ({
    columns: rows,
    rows: columns,
    turned: !turned,
  });
  return {
    first: back(first),
    second: second && back(second),
    lies: "below",
    count,
    width: height,
    height: width,
  };
}
