import type { MinorWorth } from "#src/costing/conversion.ts";
import { minorWorth } from "#src/costing/conversion.ts";
import type { PieceQuote } from "#src/costing/panels/piece-quote.ts";
import { plan } from "#tests/costing/plans.ts";

/** An invented quote for single boards of 58 × 42 mm. */
export function quoteOf(over: Partial<PieceQuote> = {}): PieceQuote {
  return {
    id: "q",
    boardHouse: "Kilnside",
    currency: "EUR",
    boardsPerPiece: 1,
    pieceArea: "24.36",
    price: { model: "whole-order", breaks: [{ quantity: 1, price: "2" }] },
    depanelling: "0",
    engineeringCharge: "0",
    stencilCharge: "0",
    freight: "0",
    ...over,
  };
}

/** What a cent is worth in a plan in euro, where a dollar is half a euro. */
export function worthOf(currency: string): MinorWorth | null {
  const rates = [{ currency: "USD", perForeignUnit: "0.5", dated: "2026-03-09" }];
  return minorWorth({ ...plan({}), currency: "EUR", rates }, currency);
}
