import { boardsToOrder } from "#src/costing/boards-to-order.ts";
import { compareWorth, type MinorWorth } from "#src/costing/conversion.ts";
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
 * Compares the cheapest way to buy boards singly with the cheapest in panels at every run size, landed, by exact
 * worth (section 6). All quotes get the same boards to order; those whose freight or rate is not known are left out.
 * A run size at which one of the two ways cannot be reckoned, or no board is needed, is in no range. `null` where
 * one way has no quote to compare.
 *
 * @example singly 10 + 2 a board, panels of 10 at 12 + 10: panels pay from 7 boards on, not yet at 11, 12 …
 */
export function comparePieces(
  singly: readonly PreparedPieces[],
  panelled: readonly PreparedPieces[],
  boards: RunBoards,
): PanelsPay | null {
  const [ones, others] = [singly.filter(isKnown), panelled.filter(isKnown)];
  if (ones.length === 0 || others.length === 0) return null;
  const ranges: CheaperRange[] = [];
  boards.required.forEach((required, index) => {
    const cheaper = cheaperFor(ones, others, boards, required);
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

/** A quote whose every charge is known and has a rate. */
type Known = PreparedPieces & { worth: MinorWorth };

function isKnown(prepared: PreparedPieces): prepared is Known {
  return prepared.freight !== null && prepared.worth !== null;
}

function cheaperFor(
  singly: readonly Known[],
  panelled: readonly Known[],
  boards: RunBoards,
  required: number,
): Cheaper | null {
  const toOrder = required === 0 ? null : boardsToOrder(required, boards.yield, boards.confidence);
  if (toOrder === null) return null;
  const [one, other] = [leastOf(singly, toOrder), leastOf(panelled, toOrder)];
  if (one === null || other === null) return null;
  const difference = compareWorth(one.total, one.worth, other.total, other.worth);
  return difference > 0 ? "panelled" : difference < 0 ? "singly" : "same";
}

interface Sum {
  total: number;
  worth: MinorWorth;
}

/** The least that so many boards cost by one of the quotes; null where none has them. */
function leastOf(quotes: readonly Known[], toOrder: number): Sum | null {
  let least: Sum | null = null;
  for (const prepared of quotes) {
    const order = orderPieces(prepared, toOrder);
    if (order === null) continue;
    const { worth } = prepared;
    const total = totalOf(prepared, order);
    if (least === null || compareWorth(total, worth, least.total, least.worth) < 0) least = { total, worth };
  }
  return least;
}
