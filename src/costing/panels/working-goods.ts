import { exact } from "#src/costing/decimal.ts";
import type { Ladder } from "#src/costing/ladder.ts";
import { minorDecimals } from "#src/costing/money.ts";
import { breakReached, lotsTaken } from "#src/costing/order-details.ts";
import { divideUp } from "#src/costing/whole.ts";
import { count, from, money, number, type Step, step } from "#src/costing/working-lines.ts";
import type { PieceCost } from "./cost-pieces.ts";
import type { PieceOrder } from "./order-pieces.ts";
import type { FormulaPrice, LadderPrice, PieceQuote } from "./piece-quote.ts";
import type { PreparedPieces } from "./prepare-pieces.ts";

/**
 * How the price of the pieces comes about: by break, lots or formula, with depanelling (section 6).
 *
 * @example 10 panels at 25.00, depanelling 12 boards at 0.10 → 25.00 + 1.20 = 26.20, × 10 = 262.00
 */
export function goodsSteps(
  prepared: PreparedPieces,
  order: PieceOrder,
  cost: PieceCost,
  toOrder: number,
): Step[] {
  const { quote, ladder } = prepared;
  const words = namesOf(quote);
  const goods = money(cost.goods, quote.currency);
  const result = step("=", words.many, goods, "1.3", { rounds: minorDecimals(quote.currency) });
  const { price, pieceArea } = quote;
  if (price?.model === "formula")
    return pieceArea === null ? [] : [...formulaSteps(prepared, order, price, pieceArea), result];
  if (ladder === null || price === null) return [];
  if (price.model === "lots") return [lotsStep(prepared, ladder, price.breaks, cost, toOrder)];
  return [...breakSteps(prepared, ladder, price.breaks, order), result];
}

function breakSteps(
  { quote }: PreparedPieces,
  ladder: Ladder,
  breaks: LadderPrice["breaks"],
  order: PieceOrder,
): Step[] {
  const reached = breakReached(ladder, breaks, { ...order, quantity: order.pieces, cost: order.goods });
  const price = reached?.price ?? "0";
  const words = namesOf(quote);
  const source = from("boards", quote.id);
  const unit = (amount: string) => money(amount, quote.currency, 6);
  const depanelling = exact(quote.depanelling).times(quote.boardsPerPiece);
  const whole = depanelling.plus(price).toFixed();
  return [
    step(null, `${words.one}, price from ${reached?.quantity ?? 1}`, unit(price), "3", { source }),
    ...(depanelling.isZero()
      ? []
      : [
          step("+", `Its ${depanellingWords(quote)}`, unit(depanelling.toFixed()), "6", { source }),
          step("=", `${words.one} with it`, unit(whole), "6"),
        ]),
    step("×", `${words.many} ordered`, count(order.pieces, words.many.toLowerCase()), "3"),
  ];
}

function lotsStep(
  { quote }: PreparedPieces,
  ladder: Ladder,
  breaks: LadderPrice["breaks"],
  cost: PieceCost,
  toOrder: number,
): Step {
  const lots = lotsTaken(ladder, breaks, divideUp(toOrder, quote.boardsPerPiece))
    .map((lot) => `${lot.count} of ${lot.quantity} for ${lot.price}`)
    .join(", ");
  const broken = /[1-9]/.test(quote.depanelling) ? ` and ${depanellingWords(quote)} for each panel` : "";
  return step(null, `Lots: ${lots}${broken}`, money(cost.goods, quote.currency), "3", {
    source: from("boards", quote.id),
  });
}

const AREA_NAMES = { dm2: "dm²", m2: "m²" };
const SQUARE_CENTIMETRES = { dm2: 100, m2: 10_000 };

function formulaSteps(
  { quote }: PreparedPieces,
  order: PieceOrder,
  price: FormulaPrice,
  pieceArea: string,
): Step[] {
  const source = from("boards", quote.id);
  const { currency } = quote;
  const words = namesOf(quote);
  const unit = AREA_NAMES[price.areaUnit];
  const each = exact(pieceArea).div(SQUARE_CENTIMETRES[price.areaUnit]);
  const area = each.times(order.pieces);
  const byArea = area.times(price.areaRate).toFixed();
  const boards = (rate: string) => money(exact(rate).times(order.boards).toFixed(), currency);
  const depanelled = `Depanelling of ${order.boards} boards at ${quote.depanelling}`;
  return [
    step(null, `Area of ${words.one.toLowerCase()}`, number(each.toFixed(), unit), "6", {
      source,
    }),
    step("×", `${words.many} ordered`, count(order.pieces, words.many.toLowerCase()), "3"),
    step("=", "Area in all", number(area.toFixed(), unit), "6"),
    step("×", `Rate for a ${unit}`, money(price.areaRate, currency, 6), "6", { source }),
    step("=", "By area", money(byArea, currency), "6"),
    step("+", "Set-up", money(price.setUp, currency), "6", { source }),
    step("+", `${order.boards} boards at ${price.perBoard}`, boards(price.perBoard), "6", { source }),
    ...(/[1-9]/.test(quote.depanelling)
      ? [step("+", depanelled, boards(quote.depanelling), "6", { source })]
      : []),
  ];
}

function namesOf({ boardsPerPiece }: PieceQuote) {
  return boardsPerPiece === 1 ? { one: "A board", many: "Boards" } : { one: "A panel", many: "Panels" };
}

function depanellingWords({ boardsPerPiece, depanelling }: PieceQuote): string {
  return `depanelling of ${boardsPerPiece} boards at ${depanelling}`;
}
