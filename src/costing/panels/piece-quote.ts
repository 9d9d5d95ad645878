import type { PlanBoardFormula, PlanBoardQuote, PriceBreak } from "#src/shapes/plan.ts";
import { micrometres, squareCentimetres } from "./micrometres.ts";

/** So many pieces at a price: lots at a total price, or each at the break reached; quantities are pieces. */
export interface LadderPrice {
  model: "lots" | "whole-order";
  breaks: readonly PriceBreak[];
}

/** A house's formula: set-up once, a rate for the area of all pieces, and a sum for every board. */
export interface FormulaPrice extends PlanBoardFormula {
  model: "formula";
}

/** A board house's quote (section 6) for pieces that hold one board, or for panels of several. Decimal text. */
export interface PieceQuote {
  id: string;
  boardHouse: string;
  currency: string;
  /** 1: boards come singly. */
  boardsPerPiece: number;
  /** Outer area of a piece in square centimetres; null: its size is not known. A formula needs it. */
  pieceArea: string | null;
  /** Null: not stated, or not to be used. */
  price: LadderPrice | FormulaPrice | null;
  /** For breaking a board out of its panel, for each board delivered. */
  depanelling: string;
  engineeringCharge: string;
  stencilCharge: string;
  /** null: not known. */
  freight: string | null;
}

/**
 * A quote of a plan as one for pieces: single boards, or panels.
 *
 * @example boardsPerPanel 12, pieceSize 238 × 144 mm → boardsPerPiece 12, pieceArea "342.72"
 */
export function pieceQuote(stated: PlanBoardQuote): PieceQuote {
  const { id, boardHouse, currency, boardsPerPanel, depanelling } = stated;
  const { engineeringCharge, stencilCharge, freight } = stated;
  return {
    ...{ id, boardHouse, currency, depanelling, engineeringCharge, stencilCharge, freight },
    boardsPerPiece: boardsPerPanel ?? 1,
    pieceArea: areaOf(stated),
    price: priceOf(stated),
  };
}

/** A size finer than a micrometre is none that can be made. */
function areaOf({ pieceSize }: PlanBoardQuote): string | null {
  if (pieceSize === null) return null;
  const [width, height] = [micrometres(pieceSize.width), micrometres(pieceSize.height)];
  return width === null || height === null ? null : squareCentimetres(BigInt(width) * BigInt(height));
}

function priceOf({ priceModel, breaks, formula }: PlanBoardQuote): PieceQuote["price"] {
  if (priceModel === "formula") return formula && { model: "formula", ...formula };
  return { model: priceModel, breaks };
}
