import { GRAIN_PLACES } from "#src/costing/grains.ts";
import { cheapestOrder } from "#src/costing/ladder.ts";
import { minorDecimals } from "#src/costing/money.ts";
import { divideBigHalfAway, divideUp, ORDER_MOST } from "#src/costing/whole.ts";
import type { PreparedPieces } from "./prepare-pieces.ts";

/** An order of pieces, in minor units of the quote's currency. */
export interface PieceOrder {
  pieces: number;
  boards: number;
  /** The pieces with their depanelling. */
  goods: number;
  /** With engineering and stencil, without freight. */
  charged: number;
  /** Index of the price break reached; −1 for lots and formulas. */
  tier: number;
}

/**
 * The order for at least so many boards (section 6): the fewest pieces that hold them, then section 3's rule on
 * pieces, so that a lot or break above is taken where it costs less. A formula's price is rounded once, halves
 * away from zero. `null`: no price, or more than can be reckoned.
 *
 * @example 113 boards, panels of 12 at 26.20 → 10 panels, 120 boards, goods 26 200
 */
export function orderPieces(prepared: PreparedPieces, toOrder: number): PieceOrder | null {
  const { quote, engineering, stencil } = prepared;
  const order = price(prepared, divideUp(toOrder, quote.boardsPerPiece));
  if (order === null || order.cost > ORDER_MOST) return null;
  return {
    pieces: order.quantity,
    boards: order.quantity * quote.boardsPerPiece,
    goods: order.cost,
    charged: order.cost + engineering + stencil,
    tier: order.tier,
  };
}

function price({ quote, ladder, formula }: PreparedPieces, pieces: number) {
  if (ladder !== null) return cheapestOrder(ladder, pieces);
  if (formula === null) return null;
  const sum = formula.once + formula.perPiece * BigInt(pieces);
  const unit = 10n ** BigInt(GRAIN_PLACES - minorDecimals(quote.currency));
  return { quantity: pieces, cost: Number(divideBigHalfAway(sum, unit)), tier: -1 };
}
