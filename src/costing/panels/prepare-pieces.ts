import { BOARDS_MOST } from "#src/costing/boards-to-order.ts";
import type { MinorWorth } from "#src/costing/conversion.ts";
import { GRAIN_PLACES, grains, grainText, scaled } from "#src/costing/grains.ts";
import { type Ladder, prepareLadder } from "#src/costing/ladder.ts";
import { toMinor } from "#src/costing/money.ts";
import { divideUp } from "#src/costing/whole.ts";
import type { FormulaPrice, LadderPrice, PieceQuote } from "./piece-quote.ts";

/** A quote with every text read once, so that every run size can be asked of it. */
export interface PreparedPieces {
  quote: PieceQuote;
  /** Null: its currency has no rate. */
  worth: MinorWorth | null;
  /** Of pieces, each with its depanelling; null for a formula, or where no price is stated. */
  ladder: Ladder | null;
  /** In grains of the quote's currency: once, and for each piece with its boards; null where its size is not known. */
  formula: { once: bigint; perPiece: bigint } | null;
  /** Minor units of the quote's currency; `freight` null: not known. */
  engineering: number;
  stencil: number;
  freight: number | null;
}

/** Square centimetres in a unit of area, as a power of ten. */
const UNIT_PLACES = { dm2: 2, m2: 4 };

/**
 * Makes a quote ready for orders of up to `boardsMost` boards. Depanelling is part of a piece's price: a house
 * breaks out all boards it delivers, and charges one sum a line.
 *
 * @example panels of 12 at 25.00, depanelling 0.10 a board → a ladder at 26.20 a panel
 */
export function preparePieces(
  quote: PieceQuote,
  worth: MinorWorth | null,
  boardsMost: number = BOARDS_MOST,
): PreparedPieces {
  const { price, currency, boardsPerPiece, freight } = quote;
  const minor = (amount: string) => Number(toMinor(amount, currency));
  const terms = { currency, minimumOrder: 1, orderMultiple: 1 };
  return {
    quote,
    worth,
    ladder:
      price === null || price.model === "formula" || price.breaks.length === 0
        ? null
        : prepareLadder(
            { ...terms, priceModel: price.model, breaks: withDepanelling(price, quote) },
            Number.POSITIVE_INFINITY,
            divideUp(boardsMost, boardsPerPiece),
          ),
    formula: price?.model === "formula" ? formulaOf(price, quote) : null,
    engineering: minor(quote.engineeringCharge),
    stencil: minor(quote.stencilCharge),
    freight: freight === null ? null : minor(freight),
  };
}

function withDepanelling(
  { model, breaks }: LadderPrice,
  { boardsPerPiece, depanelling }: PieceQuote,
): LadderPrice["breaks"] {
  return breaks.map(({ quantity, price }) => {
    const boards = model === "lots" ? quantity * boardsPerPiece : boardsPerPiece;
    return { quantity, price: grainText(grains(depanelling) * BigInt(boards) + grains(price)) };
  });
}

/** Rate and area have 6 and 8 decimals, the unit 2 or 4 more: a whole number of grains. */
function formulaOf(
  { setUp, areaRate, areaUnit, perBoard }: FormulaPrice,
  { boardsPerPiece, pieceArea, depanelling }: PieceQuote,
): PreparedPieces["formula"] {
  if (pieceArea === null) return null;
  const places = 6 + 8 + UNIT_PLACES[areaUnit];
  const byArea = scaled(areaRate, 6) * scaled(pieceArea, 8) * 10n ** BigInt(GRAIN_PLACES - places);
  const byBoard = (grains(perBoard) + grains(depanelling)) * BigInt(boardsPerPiece);
  return { once: grains(setUp), perPiece: byArea + byBoard };
}
