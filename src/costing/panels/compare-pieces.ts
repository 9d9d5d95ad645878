import { boardsToOrder } from "#src/costing/boards-to-order.ts";
import { compareWorth } from "#src/costing/conversion.ts";
import { totalOf } from "./cost-pieces.ts";
import { orderPieces } from "./order-pieces.ts";
import type { PreparedPieces } from "./prepare-pieces.ts";

export type Cheaper = "singly" | "panelled" | "same";

/** Run sizes from one to another, both included, at which the same is cheaper. */
export interface CheaperRange {
  from: number;
  to: number;
  cheaper: Cheaper;
}

/** Where panels pay, over a range of run sizes. Where one range ends and the next begins the costs cross. */
export interface PanelsPay {
  ranges: CheaperRange[];
  /** The first run at which panels cost less; null: none. */
  first: number | null;
  /** The run from which panels cost less at every larger one up to the end; null: none. */
  safe: number | null;
}

/** Boards of runs by size, and the share of them that are good. */
export interface RunBoards {
  /** Boards the kits need, for runs of 1, 2, 3 … kits. */
  required: readonly number[];
  /** Decimal text, 0 to 1. */
  yield: string;
  confidence: string;
}

/**
 * Compares boards bought singly with panels at every run size, landed, by exact worth (section 6). Both quotes get
 * the same boards to order. A run size at which either cannot be reckoned, or no board is needed, is in no range.
 * `null` where a freight is not known, or a currency has no rate: then nothing can be said.
 *
 * @example singly 10 + 2 a board, panels of 10 at 12 + 10: panels pay from 7 boards on, not yet at 11, 12 …
 */
export function comparePieces(
  singly: PreparedPieces,
  panelled: PreparedPieces,
  boards: RunBoards,
): PanelsPay | null {
  if (singly.freight === null || panelled.freight === null) return null;
  if (singly.worth === null || panelled.worth === null) return null;
  const ranges: CheaperRange[] = [];
  boards.required.forEach((required, index) => {
    const cheaper = cheaperFor(singly, panelled, boards, required);
    const last = ranges.at(-1);
    if (cheaper === null) return;
    if (last?.cheaper === cheaper && last.to === index) last.to = index + 1;
    else ranges.push({ from: index + 1, to: index + 1, cheaper });
  });
  const end = ranges.at(-1);
  const whole = end !== undefined && end.to === boards.required.length && end.cheaper === "panelled";
  return {
    ranges,
    first: ranges.find(({ cheaper }) => cheaper === "panelled")?.from ?? null,
    safe: whole ? end.from : null,
  };
}

function cheaperFor(
  singly: PreparedPieces,
  panelled: PreparedPieces,
  boards: RunBoards,
  required: number,
): Cheaper | null {
  const toOrder = required === 0 ? null : boardsToOrder(required, boards.yield, boards.confidence);
  if (toOrder === null || singly.worth === null || panelled.worth === null) return null;
  const one = orderPieces(singly, toOrder);
  const other = orderPieces(panelled, toOrder);
  if (one === null || other === null) return null;
  const difference = compareWorth(
    totalOf(singly, one),
    singly.worth,
    totalOf(panelled, other),
    panelled.worth,
  );
  return difference > 0 ? "panelled" : difference < 0 ? "singly" : "same";
}
