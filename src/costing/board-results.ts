import { orderBoards } from "./board-choice.ts";
import { convertMinor, type MinorWorth } from "./conversion.ts";
import type { Figure } from "./figure.ts";
import { figureOf, figurePer, wholeFigure } from "./figure-of.ts";
import { scaled, scaledText } from "./grains.ts";
import { minorText } from "./money.ts";
import { boughtUp, breakReached, lotsTaken } from "./order-details.ts";
import type { PreparedPlan, PreparedQuote } from "./prepared-plan.ts";
import type { Need } from "./problem.ts";
import { need, needsOf } from "./run-needs.ts";
import type { BoardsResult, QuoteResult } from "./run-result.ts";
import { type BoardChoice, MISSING, type RunSheet } from "./run-sheet.ts";
import { divideUp } from "./whole.ts";

/** Boards of a run (section 6): how many, of which quote, and every quote compared at this run size. */
export function boardResults(prepared: PreparedPlan, sheet: RunSheet): BoardsResult {
  const { boards } = prepared.plan;
  const quotes = prepared.quotes.map((quote) => quoteResult(prepared, sheet, quote));
  const chosen = quotes.find((quote) => quote.chosen);
  const none = sheet.boardsToOrder === 0;
  const needs = needsOf(prepared, sheet, MISSING.boards | MISSING.boardFreight);
  const nothing: Figure = none ? { known: true, value: "0" } : wholeFigure(null, needs);
  return {
    needed: boards.needed,
    required: sheet.boardsRequired,
    toOrder: sheet.boardsToOrder,
    yield: boards.yield,
    confidence: boards.confidence,
    chosen: chosen?.id ?? null,
    quotes,
    landed: chosen?.landed ?? nothing,
    perGoodBoard: chosen?.perBoard ?? (none ? wholeFigure(null, [need("nothing-made", [{}])]) : nothing),
  };
}

function quoteResult(prepared: PreparedPlan, sheet: RunSheet, quote: PreparedQuote): QuoteResult {
  const { stated } = quote;
  const toOrder = sheet.boardsToOrder;
  const choice = toOrder === null || toOrder === 0 ? null : orderBoards(quote, toOrder);
  const minor = (amount: number) => minorText(amount, stated.currency);
  const needs = quoteNeeds(quote, choice, toOrder);
  const total = choice === null ? null : choice.charged + (quote.freight ?? 0);
  const converted = total === null ? 0n : convertMinor(total, quote.worth as MinorWorth);
  return {
    id: stated.id,
    boardHouse: stated.boardHouse,
    currency: stated.currency,
    chosen: sheet.boards?.quote === quote,
    standing: quote.standing === "usable" && choice === null && toOrder ? "amount-too-large" : quote.standing,
    boardsPerPiece: quote.quote.boardsPerPiece,
    pieces: choice?.order.pieces ?? null,
    ordered: choice?.order.boards ?? null,
    ...ladderDetails(quote, choice, toOrder ?? 0),
    goodExpected: choice && goodExpected(choice.order.boards, prepared.plan.boards.yield),
    extra: choice && choice.order.boards - sheet.boardsRequired,
    boards: choice && minor(choice.order.goods),
    engineering: minor(quote.engineering),
    stencil: minor(quote.stencil),
    freight: quote.freight === null ? null : minor(quote.freight),
    total: totalFigure(total, needs, minor),
    landed: choice === null ? wholeFigure(null, needs) : figureOf(converted, needs),
    perBoard: choice === null ? wholeFigure(null, needs) : figurePer(converted, sheet.boardsRequired, needs),
    leadTimeDays: stated.leadTimeDays,
  };
}

/** Lots or break of an order, and what it goes past because more cost less. */
function ladderDetails(
  { ladder, stated, quote: { boardsPerPiece } }: PreparedQuote,
  choice: BoardChoice | null,
  toOrder: number,
): Pick<QuoteResult, "lots" | "breakReached" | "boughtUp"> {
  if (choice === null || ladder === null) return { lots: [], breakReached: null, boughtUp: null };
  const { pieces, goods, tier, boards } = choice.order;
  const least = divideUp(toOrder, boardsPerPiece);
  const order = { quantity: pieces, cost: goods, tier };
  const up = boughtUp(ladder, stated.currency, least, order);
  return {
    lots: lotsTaken(ladder, stated.breaks, least),
    breakReached: breakReached(ladder, stated.breaks, order),
    boughtUp: up && { ...up, insteadOf: up.insteadOf * boardsPerPiece, leftOver: boards - toOrder },
  };
}

function totalFigure(total: number | null, needs: Need[], minor: (amount: number) => string): Figure {
  if (total === null) return { known: false, needs, without: null };
  return needs.length === 0
    ? { known: true, value: minor(total) }
    : { known: false, needs, without: minor(total) };
}

function quoteNeeds(quote: PreparedQuote, choice: BoardChoice | null, toOrder: number | null): Need[] {
  const at = { quote: quote.quote.id };
  if (toOrder === null) return [need("no-board-yield", [{}])];
  if (toOrder === 0) return [need("nothing-made", [{}])];
  if (quote.standing === "no-rate") return [need("no-rate", [{ currency: quote.quote.currency }])];
  if (quote.standing === "no-size") return [need("no-board-size", [at])];
  if (quote.standing !== "usable") return [need("no-board-quote", [at])];
  if (choice === null) return [need("amount-too-large", [at])];
  return quote.freight === null ? [need("no-board-freight", [at])] : [];
}

/** `boards × yield`, exact. */
function goodExpected(boards: number, yieldShare: string): string {
  return scaledText(BigInt(boards) * scaled(yieldShare, 6), 6);
}
