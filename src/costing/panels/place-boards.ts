import { type Arrangement, asItLies, type Block, blockSize } from "./arrangement.ts";
import type { Rect } from "./micrometres.ts";
import { margins } from "./panel-frame.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** A board at its place on the panel, in whole micrometres. */
export interface PlacedBoard extends Rect {
  turned: boolean;
}

/**
 * Every board of a layout at its place: the first block at the upper left, rows from the top, then the second.
 *
 * @example 4 × 3 boards of 58 × 42 mm, gap 2 mm, rails above: the first at 0, 7 000, the next at 60 000, 7 000
 */
export function placeBoards({ first, second, lies }: Arrangement, measures: PanelMeasures): PlacedBoard[] {
  const { x, y } = margins(measures);
  const taken = blockSize(first, measures);
  const beyond =
    lies === "beside" ? { x: x + taken.width + measures.gap, y } : { x, y: y + taken.height + measures.gap };
  return [...placeBlock(first, { x, y }, measures), ...(second ? placeBlock(second, beyond, measures) : [])];
}

function placeBlock(
  { columns, rows, turned }: Block,
  from: { x: number; y: number },
  { board, gap }: PanelMeasures,
): PlacedBoard[] {
  const { width, height } = asItLies(board, turned);
  return Array.from({ length: columns * rows }, (_, place) => {
    const column = place % columns;
    const row = (place - column) / columns;
    return { x: from.x + column * (width + gap), y: from.y + row * (height + gap), width, height, turned };
  });
}
