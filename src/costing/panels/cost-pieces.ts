import { convertMinor } from "#src/costing/conversion.ts";
import type { Figure } from "#src/costing/figure.ts";
import { figureOf, figurePer } from "#src/costing/figure-of.ts";
import { minorText } from "#src/costing/money.ts";
import type { Need } from "#src/costing/problem.ts";
import { need } from "#src/costing/run-needs.ts";
import { orderPieces, type PieceOrder } from "./order-pieces.ts";
import type { PreparedPieces } from "./prepare-pieces.ts";

/** What a quote delivers and costs at one run size. Texts are in its currency, figures in the plan's. */
export interface PieceCost {
  pieces: number;
  boards: number;
  /** Boards beyond those to order. */
  over: number;
  goods: string;
  engineering: string;
  stencil: string;
  freight: string | null;
  /** All the house charges; the partial sum where the freight is not known. */
  total: string;
  landed: Figure;
  /** Landed cost over the boards the kits need. */
  perGoodBoard: Figure;
}

/** Boards the kits need, and boards to order for the yield. */
export interface BoardsWanted {
  required: number;
  toOrder: number;
}

/**
 * Cost of the boards of a run by one quote. `null` where it cannot be ordered: no price, no rate, too large, or
 * nothing needed.
 *
 * @example 100 needed, 113 to order, panels of 12 at 26.20, engineering 30, freight 9 → 301.00, a good board 3.01
 */
export function costPieces(prepared: PreparedPieces, { required, toOrder }: BoardsWanted): PieceCost | null {
  const { quote, worth, engineering, stencil, freight } = prepared;
  const order = worth === null || required === 0 ? null : orderPieces(prepared, toOrder);
  if (worth === null || order === null) return null;
  const minor = (amount: number) => minorText(amount, quote.currency);
  const needs: Need[] = freight === null ? [need("no-board-freight", [{ quote: quote.id }])] : [];
  const landed = convertMinor(totalOf(prepared, order), worth);
  return {
    pieces: order.pieces,
    boards: order.boards,
    over: order.boards - toOrder,
    goods: minor(order.goods),
    engineering: minor(engineering),
    stencil: minor(stencil),
    freight: freight === null ? null : minor(freight),
    total: minor(totalOf(prepared, order)),
    landed: figureOf(landed, needs),
    perGoodBoard: figurePer(landed, required, needs),
  };
}

/**
 * Everything the house charges for an order, in minor units; freight that is not known is left out.
 *
 * @example goods 26 200, engineering 3 000, freight 900 → 30 100
 */
export function totalOf({ freight }: PreparedPieces, { charged }: PieceOrder): number {
  return charged + (freight ?? 0);
}
