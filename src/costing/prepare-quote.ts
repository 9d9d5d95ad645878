import type { PlanBoardQuote } from "#src/shapes/plan.ts";
import { BOARDS_MOST, boardsToOrder } from "./boards-to-order.ts";
import { quantityProblems } from "./ladder-problems.ts";
import { pieceQuote } from "./panels/piece-quote.ts";
import { preparePieces } from "./panels/prepare-pieces.ts";
import type { Preparing } from "./prepare-plan.ts";
import type { PreparedQuote } from "./prepared-plan.ts";
import type { QuoteStanding } from "./run-result.ts";

/** A board quote made ready (section 6): the same ladders as parts, of single boards or panels, ordered in ones. */
export function prepareQuote(stated: PlanBoardQuote, preparing: Preparing): PreparedQuote {
  const worth = preparing.worthOf(stated.currency);
  const quote = pieceQuote(stated);
  const standing = standingOf(stated, quote.pieceArea, worth === null, preparing);
  if (standing !== "usable") say(stated, standing, preparing);
  const perKitMost = Math.max(0, ...preparing.plan.editions.map(({ boardsPerKit }) => boardsPerKit));
  const priced = standing === "usable" ? quote : { ...quote, price: null };
  return { ...preparePieces(priced, worth, boardsMost(preparing, perKitMost)), stated, standing };
}

/** Boards to order never fall as the run grows, so the largest run asks for most. */
function boardsMost({ plan, kitsMost }: Preparing, perKitMost: number): number {
  return boardsToOrder(kitsMost * perKitMost, plan.boards.yield, plan.boards.confidence) ?? BOARDS_MOST;
}

function standingOf(
  quote: PlanBoardQuote,
  area: string | null,
  noRate: boolean,
  { plan }: Preparing,
): QuoteStanding {
  if (quote.priceModel === "formula" ? quote.formula === null : quote.breaks.length === 0) return "no-price";
  if (quote.validUntil !== null && quote.validUntil < plan.asOf) return "expired";
  if (noRate) return "no-rate";
  if (quote.priceModel === "formula") return area === null ? "no-size" : "usable";
  const { priceModel, breaks } = quote;
  const repeats = quantityProblems({ priceModel, breaks, minimumOrder: 1, orderMultiple: 1 });
  return repeats.some(({ code }) => code === "quantity-repeats") ? "impossible-ladder" : "usable";
}

function say(quote: PlanBoardQuote, standing: QuoteStanding, { problems }: Preparing): void {
  const at = { quote: quote.id, currency: quote.currency };
  if (standing === "expired")
    problems.push({ code: "quote-expired", at, facts: { day: quote.validUntil ?? "" } });
  if (standing === "no-price") problems.push({ code: "quote-without-price", at, facts: {} });
  if (standing === "no-rate") problems.push({ code: "no-rate", at, facts: {} });
  if (standing === "no-size") problems.push({ code: "quote-without-size", at, facts: {} });
  if (standing === "impossible-ladder") problems.push({ code: "offer-impossible-ladder", at, facts: {} });
}
