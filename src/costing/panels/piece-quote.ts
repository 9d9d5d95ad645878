import type { AreaUnit } from "#src/shapes/limits.ts";
import type { PriceBreak } from "#src/shapes/plan.ts";

/** So many pieces at a price: lots at a total price, or each at the break reached; quantities are pieces. */
export interface LadderPrice {
  model: "lots" | "whole-order";
  breaks: readonly PriceBreak[];
}

/** A house's formula: set-up once, a rate for the area of all pieces, and a sum for every board. */
export interface FormulaPrice {
  model: "formula";
  setUp: string;
  areaRate: string;
  areaUnit: AreaUnit;
  perBoard: string;
}

/** A board house's quote (section 6) for pieces that hold one board, or for panels of several. Decimal text. */
export interface PieceQuote {
  id: string;
  boardHouse: string;
  currency: string;
  /** 1: boards come singly. */
  boardsPerPiece: number;
  /** Outer area of a piece in square centimetres. */
  pieceArea: string;
  price: LadderPrice | FormulaPrice;
  /** For breaking a board out of its panel, for each board delivered. */
  depanelling: string;
  engineeringCharge: string;
  stencilCharge: string;
  /** null: not known. */
  freight: string | null;
}
