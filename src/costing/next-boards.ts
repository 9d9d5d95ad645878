import type { PlanBoardQuote } from "#src/shapes/plan.ts";
import { scaled, scaledText } from "./grains.ts";
import { minorText } from "./money.ts";
import { totalOf } from "./panels/cost-pieces.ts";
import { orderPieces } from "./panels/order-pieces.ts";
import { pieceQuote } from "./panels/piece-quote.ts";
import { preparePieces } from "./panels/prepare-pieces.ts";
import { divideBigHalfAway, divideUp } from "./whole.ts";

/** More boards of a quote than are ordered, and what they really add (section 6). */
export interface NextBoards {
  /** Boards of the larger order, in how many single boards or panels, and how many more than ordered. */
  ordered: number;
  pieces: number;
  more: number;
  /** What the larger order costs in all, and what it adds, in the quote's currency. */
  total: string;
  adds: string;
  /** `adds ÷ more`, exact to 6 decimals, halves up; "0" where they cost nothing. */
  addsEach: string;
}

/**
 * The next larger orders of a board house's quote: each the cheapest that holds one board more than the
 * one before, or one panel more. Charges and freight stay, so only the boards' price differs. A quote without
 * a price, or of a size that cannot be reckoned, has none.
 *
 * @example lots of 50 for 90 and 100 for 140, 100 ordered → next 150 for 230, 50 more, adds 90, each 1.80
 */
export function nextBoards(quote: PlanBoardQuote, ordered: number, count: number): NextBoards[] {
  if (ordered === 0) return [];
  const { boardsPerPiece } = pieceQuote(quote);
  const largest = Math.max(1, ...quote.breaks.map(({ quantity }) => quantity)) * boardsPerPiece;
  const prepared = preparePieces(pieceQuote(quote), null, ordered + (count + 1) * largest);
  const now = orderPieces(prepared, ordered);
  const found: NextBoards[] = [];
  let at = now?.pieces ?? 0;
  while (now && found.length < count) {
    const next = orderPieces(prepared, stepUp(quote, at) * boardsPerPiece);
    if (!next || next.pieces <= at) break;
    const adds = minorText(next.goods - now.goods, quote.currency);
    const more = next.boards - now.boards;
    found.push({
      ordered: next.boards,
      pieces: next.pieces,
      more,
      total: minorText(totalOf(prepared, next), quote.currency),
      adds,
      addsEach: scaledText(divideBigHalfAway(scaled(adds, 6), BigInt(more)), 6),
    });
    at = next.pieces;
  }
  return found;
}

/** Pieces to ask for: single boards by the next break or a tenth more, since one more is no decision. */
function stepUp({ priceModel, breaks, boardsPerPanel }: PlanBoardQuote, at: number): number {
  if (priceModel === "lots" || boardsPerPanel !== null) return at + 1;
  const higher = breaks.map(({ quantity }) => quantity).filter((quantity) => quantity > at);
  return higher.length > 0 ? Math.min(...higher) : at + Math.max(1, divideUp(at, 10));
}
