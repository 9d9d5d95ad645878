import { boardsToOrder } from "./boards-to-order.ts";
import { byText } from "./by-name.ts";
import { compareWorth, type MinorWorth } from "./conversion.ts";
import { needOf } from "./need.ts";
import { orderPieces } from "./panels/order-pieces.ts";
import type { PreparedPlan, PreparedQuote } from "./prepared-plan.ts";
import { type BoardChoice, MISSING, type RunSheet } from "./run-sheet.ts";

/**
 * Boards of the run (section 6): how many to order for the yield, and of which quote, singly or in panels.
 * The quote the user chose, or the one whose landed cost (boards, engineering, stencil, freight) is worth
 * least; quotes without freight come after those with. Ties: fewer boards over, then the house's name.
 *
 * @example 20 boards, yield 95 %, confidence 95 % → 23; lots of 10 and 30 → 30
 */
export function chooseBoards(prepared: PreparedPlan, sheet: RunSheet): void {
  const { boards } = prepared.plan;
  sheet.boards = null;
  sheet.boardsRequired = boards.needed ? needOf(sheet.kitsOf, prepared.boardsPerKit) : 0;
  sheet.boardsToOrder = boardsToOrder(sheet.boardsRequired, boards.yield, boards.confidence);
  if (sheet.boardsToOrder === 0) return;
  if (sheet.boardsToOrder !== null) sheet.boards = cheapestBoards(prepared, sheet.boardsToOrder);
  if (sheet.boards === null) sheet.missing |= MISSING.boards;
}

function cheapestBoards(prepared: PreparedPlan, toOrder: number): BoardChoice | null {
  const { chosenQuote } = prepared.plan.boards;
  let best: BoardChoice | null = null;
  for (const quote of prepared.quotes) {
    if (chosenQuote !== null && quote.quote.id !== chosenQuote) continue;
    const choice = orderBoards(quote, toOrder);
    if (choice !== null && (best === null || better(choice, best))) best = choice;
  }
  return best;
}

/** What a quote would deliver and charge for so many boards; null where it may not be used. */
export function orderBoards(quote: PreparedQuote, toOrder: number): BoardChoice | null {
  const order = orderPieces(quote, toOrder);
  return order === null ? null : { quote, order, charged: order.charged };
}

function better(a: BoardChoice, b: BoardChoice): boolean {
  if ((a.quote.freight === null) !== (b.quote.freight === null)) return a.quote.freight !== null;
  const byCost = compareWorth(
    a.charged + (a.quote.freight ?? 0),
    a.quote.worth as MinorWorth,
    b.charged + (b.quote.freight ?? 0),
    b.quote.worth as MinorWorth,
  );
  return (byCost || a.order.boards - b.order.boards || byHouse(a.quote, b.quote)) < 0;
}

function byHouse(a: PreparedQuote, b: PreparedQuote): number {
  return byText(a.quote.boardHouse, b.quote.boardHouse) || byText(a.quote.id, b.quote.id);
}
