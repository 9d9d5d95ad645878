import type { PlanBoardQuote } from "#src/shapes/plan.ts";
import { BOARDS_MOST, boardsToOrder } from "./boards-to-order.ts";
import { prepareLadder } from "./ladder.ts";
import { quantityProblems } from "./ladder-problems.ts";
import { toMinor } from "./money.ts";
import type { Preparing } from "./prepare-plan.ts";
import type { PreparedQuote } from "./prepared-plan.ts";
import type { OfferStanding } from "./run-result.ts";

/** A board quote made ready (section 6): the same ladders as parts, ordered in ones. */
export function prepareQuote(quote: PlanBoardQuote, preparing: Preparing): PreparedQuote {
  const worth = preparing.worthOf(quote.currency);
  const terms = { ...quote, minimumOrder: 1, orderMultiple: 1 };
  const standing = standingOf(quote, worth === null, preparing);
  if (standing !== "usable") say(quote, standing, preparing);
  const perKitMost = Math.max(0, ...preparing.plan.editions.map(({ boardsPerKit }) => boardsPerKit));
  const minor = (amount: string) => Number(toMinor(amount, quote.currency));
  return {
    quote,
    standing,
    worth,
    ladder:
      standing === "usable"
        ? prepareLadder(terms, Number.POSITIVE_INFINITY, boardsMost(preparing, perKitMost))
        : null,
    engineering: minor(quote.engineeringCharge),
    stencil: minor(quote.stencilCharge),
    freight: quote.freight === null ? null : minor(quote.freight),
  };
}

/** Boards to order never fall as the run grows, so the largest run asks for most. */
function boardsMost({ plan, kitsMost }: Preparing, perKitMost: number): number {
  return boardsToOrder(kitsMost * perKitMost, plan.boards.yield, plan.boards.confidence) ?? BOARDS_MOST;
}

function standingOf(quote: PlanBoardQuote, noRate: boolean, { plan }: Preparing): OfferStanding {
  if (quote.breaks.length === 0) return "no-price";
  if (quote.validUntil !== null && quote.validUntil < plan.asOf) return "expired";
  if (noRate) return "no-rate";
  const repeats = quantityProblems({ ...quote, minimumOrder: 1, orderMultiple: 1 });
  return repeats.some(({ code }) => code === "quantity-repeats") ? "impossible-ladder" : "usable";
}

function say(quote: PlanBoardQuote, standing: OfferStanding, { problems }: Preparing): void {
  const at = { quote: quote.id, currency: quote.currency };
  if (standing === "expired")
    problems.push({ code: "quote-expired", at, facts: { day: quote.validUntil ?? "" } });
  if (standing === "no-price") problems.push({ code: "quote-without-price", at, facts: {} });
  if (standing === "no-rate") problems.push({ code: "no-rate", at, facts: {} });
  if (standing === "impossible-ladder") problems.push({ code: "offer-impossible-ladder", at, facts: {} });
}
