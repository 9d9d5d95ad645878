import { divideDown } from "#src/costing/whole.ts";
import type { Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** Boards in columns and rows, all the same way round. */
export interface Block {
  columns: number;
  rows: number;
  /** Whether its boards are turned by a quarter. */
  turned: boolean;
}

/** One grid, or two that share a straight cut. Sizes in whole micrometres. */
export interface Arrangement {
  first: Block;
  second: Block | null;
  /** Where the second lies: right of the first, or below it. */
  lies: "beside" | "below";
  count: number;
  /** Of the boards with the gaps between them, without rails. */
  width: number;
  height: number;
}

/**
 * How many sides fit into a length with a gap between each two, all in micrometres.
 *
 * @example howMany(186_000, 42_000, 2_000) === 4, since 4 × 42 + 3 × 2 = 174 and a fifth would take 218
 */
export function howMany(room: number, side: number, gap: number): number {
  return room < side ? 0 : divideDown(room + gap, side + gap);
}

/**
 * Length of so many sides with a gap between each two; 0 for none.
 *
 * @example lengthOf(4, 42_000, 2_000) === 174_000
 */
export function lengthOf(count: number, side: number, gap: number): number {
  return count === 0 ? 0 : count * (side + gap) - gap;
}

/**
 * A board as it lies.
 *
 * @example asItLies({ width: 58_000, height: 42_000 }, true) → 42 000 × 58 000
 */
export function asItLies(board: Size, turned: boolean): Size {
  return turned ? { width: board.height, height: board.width } : board;
}

/**
 * Size of a block in micrometres.
 *
 * @example 4 columns and 3 rows of 58 × 42 mm with 2 mm between → 238 000 × 130 000
 */
export function blockSize({ columns, rows, turned }: Block, { board, gap }: PanelMeasures): Size {
  const { width, height } = asItLies(board, turned);
  return { width: lengthOf(columns, width, gap), height: lengthOf(rows, height, gap) };
}
