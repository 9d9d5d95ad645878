import type { PlanBoardQuote } from "#src/shapes/plan.ts";
import { exact } from "./decimal.ts";
import { cheapestOrder, prepareLadder } from "./ladder.ts";
import { minorText, toMinor } from "./money.ts";

/** More boards of a quote than are ordered, and what they really add (section 6). */
export interface NextBoards {
  /** Boards of the larger order, and how many more than ordered. */
  ordered: number;
  more: number;
  /** What the larger order costs in all, and what it adds, in the quote's currency. */
  total: string;
  adds: string;
  /** `adds ÷ more`, exact to 6 decimals, halves up; "0" where they cost nothing. */
  addsEach: string;
}

const ANY = Number.POSITIVE_INFINITY;

/**
 * The next larger orders of a board house's quote: each the cheapest that holds one board more than the
 * one before. Charges and freight stay, so only the boards' price differs. A quote without a price, or of
 * a size that cannot be reckoned, has none.
 *
 * @example lots of 50 for 90 and 100 for 140, 100 ordered → next 150 for 230, 50 more, adds 90, each 1.80
 */
export function nextBoards(quote: PlanBoardQuote, ordered: number, count: number): NextBoards[] {
  if (quote.breaks.length === 0 || ordered === 0) return [];
  const largest = Math.max(...quote.breaks.map(({ quantity }) => quantity));
  const terms = { ...quote, minimumOrder: 1, orderMultiple: 1 };
  const ladder = prepareLadder(terms, ANY, ordered + (count + 1) * largest);
  const now = cheapestOrder(ladder, ordered);
  const fixed = [quote.engineeringCharge, quote.stencilCharge, quote.freight ?? "0"]
    .map((amount) => Number(toMinor(amount, quote.currency)))
    .reduce((sum, amount) => sum + amount, 0);
  const found: NextBoards[] = [];
  let at = now?.quantity ?? ordered;
  while (now && found.length < count) {
    const next = cheapestOrder(ladder, stepUp(quote, at));
    if (!next || next.cost === ANY || next.quantity <= at) break;
    const adds = minorText(next.cost - now.cost, quote.currency);
    const more = next.quantity - now.quantity;
    found.push({
      ordered: next.quantity,
      more,
      total: minorText(next.cost + fixed, quote.currency),
      adds,
      addsEach: exact(adds).div(more).toDecimalPlaces(6).toFixed(),
    });
    at = next.quantity;
  }
  return found;
}

/** Boards sold singly are asked for by the next break, since one more is no decision. */
function stepUp({ priceModel, breaks }: PlanBoardQuote, at: number): number {
  if (priceModel === "lots") return at + 1;
  const higher = breaks.map(({ quantity }) => quantity).filter((quantity) => quantity > at);
  return higher.length > 0 ? Math.min(...higher) : at + Math.max(1, Math.ceil(at / 10));
}
