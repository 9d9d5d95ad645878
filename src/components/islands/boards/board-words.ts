import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { numberWord } from "#src/components/count-words.ts";
import type { Answer } from "#src/components/islands/offers/offer-answer.ts";
import type { Mark } from "#src/components/islands/offers/offer-words.ts";
import { shortDayWords } from "#src/costing/day-words.ts";
import { isOldPrice } from "#src/costing/order-cautions.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { BoardsResult, QuoteResult, QuoteStanding } from "#src/costing/run-result.ts";
import type { BoardQuoteView } from "#src/server/board-changes.ts";

/** "2 lots of 50 and one of 100", "120 at €1.900", "10 panels of 12 at €25.000", "2 lots of 5 panels of 12". */
export function orderWords(quote: QuoteResult): string {
  const { lots, pieces, boardsPerPiece, breakReached, currency } = quote;
  if (pieces === null) return "";
  const panels = (count: number) =>
    `${countText(count)}${boardsPerPiece > 1 ? ` ${count === 1 ? "panel" : "panels"} of ${countText(boardsPerPiece)}` : ""}`;
  if (breakReached) return `${panels(pieces)} at ${unitPriceText(breakReached.price, currency)}`;
  if (lots.length === 0) return `${panels(pieces)} by formula`;
  return lots
    .map(
      ({ quantity, count }) => `${count === 1 ? "a lot" : `${countText(count)} lots`} of ${panels(quantity)}`,
    )
    .join(" and ");
}

/** A quote among others of the same house: "Kilnside", "Kilnside, panels of 12". */
export function quoteName({
  boardHouse,
  boardsPerPiece,
}: Pick<QuoteResult, "boardHouse" | "boardsPerPiece">): string {
  return boardsPerPiece === 1 ? boardHouse : `${boardHouse}, panels of ${countText(boardsPerPiece)}`;
}

const WORDS: Partial<Record<QuoteStanding, Mark>> = {
  "no-price": { kind: "bad", word: "No price" },
  "no-size": { kind: "bad", word: "No size" },
  "impossible-ladder": { kind: "bad", word: "Lots repeat" },
  "amount-too-large": { kind: "bad", word: "Too large" },
};

/** The chip of a quote. */
export function quoteMark(quote: BoardQuoteView, result: QuoteResult, today: string): Mark {
  const { standing, chosen } = result;
  if (standing === "expired")
    return { kind: "bad", word: quote.validUntil ? `Ended ${shortDayWords(quote.validUntil)}` : "Ended" };
  if (standing === "no-rate") return { kind: "bad", word: `No rate for ${quote.currency}` };
  const said = WORDS[standing];
  if (said) return said;
  if (quote.freight === null) return { kind: "caution", word: "Freight not known" };
  if (chosen) return { kind: "good", word: "Chosen" };
  return isOldPrice(quote, today) ? { kind: "caution", word: "Old price" } : { kind: "plain", word: "Fits" };
}

/** "58 × 42 mm, 2 layers, lead-free tin, petrol". */
export function boardWords({ width, height, layers, finish, colour }: BoardQuoteView): string {
  const size = width !== null && height !== null ? `${width} × ${height}\u00a0mm` : "size not stated";
  const copper = layers === null ? "" : layers === 1 ? "1 layer" : `${layers} layers`;
  return [size, copper, finish, colour].filter(Boolean).join(", ");
}

/** "120 boards", "ten panels of 12". */
function piecesWords({ pieces, boardsPerPiece }: QuoteResult): string {
  if (boardsPerPiece === 1) return `${countText(pieces ?? 0)} boards`;
  const count = pieces ?? 0;
  return `${count > 10 ? countText(count) : numberWord(count)} ${count === 1 ? "panel" : "panels"} of ${countText(boardsPerPiece)}`;
}

/** Who makes the boards, and how many, in one or two sentences. */
export function boardsAnswer(boards: BoardsResult, currency: string): Answer {
  if (boards.required === 0) return { deciding: "None are needed in this run.", rest: "" };
  const chosen = boards.quotes.find(({ id }) => id === boards.chosen);
  if (boards.toOrder === null)
    return { deciding: "Not known yet.", rest: "With this yield no number of boards is enough." };
  if (!chosen || chosen.ordered === null || chosen.pieces === null)
    return {
      deciding: "Nobody yet.",
      rest: `${countText(boards.toOrder)} boards wait for a quote that can be used.`,
    };
  const ordered = `${chosen.boardHouse}, ${piecesWords(chosen)}`;
  if (!chosen.landed.known)
    return { deciding: `${ordered}.`, rest: `What they cost ${needWords(chosen.landed.needs)}.` };
  const each = chosen.perBoard.known ? moneyText(chosen.perBoard.value, currency) : "";
  const spare = chosen.ordered - boards.required;
  const left =
    spare === 0
      ? "There is no spare board in it."
      : `${countText(spare)} of them ${spare === 1 ? "is" : "are"} spare.`;
  return {
    deciding: `${ordered}: ${moneyText(chosen.landed.value, currency)}.`,
    rest: `That is ${each} for each board in a kit, with freight. ${left}`,
  };
}
