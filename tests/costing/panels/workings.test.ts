import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { PieceQuote } from "#src/costing/panels/piece-quote.ts";
import { preparePieces } from "#src/costing/panels/prepare-pieces.ts";
import { panelSheet } from "#src/costing/panels/working-panel.ts";
import { piecesSheet } from "#src/costing/panels/working-pieces.ts";
import type { Sheet } from "#src/costing/working-lines.ts";
import { BOARD, bare, board, fitted, panelOf, ROUTED, SCORED } from "./panel-cases.ts";
import { quoteOf, worthOf } from "./piece-quotes.ts";

const D = Decimal.clone({ precision: 60, rounding: Decimal.ROUND_HALF_UP });

/** Redoes a sheet by hand, carrying each sum down: every "=" must say what comes out. How many did. */
function redo({ steps, title }: Sheet): number {
  let carried = new D(0);
  let results = 0;
  for (const { sign, amount, label, rounds } of steps) {
    if (amount === null || !("value" in amount) || amount.kind === "words") continue;
    const figure = new D(amount.value);
    if (sign === null) carried = figure;
    else if (sign === "+") carried = carried.plus(figure);
    else if (sign === "−") carried = carried.minus(figure);
    else if (sign === "×") carried = carried.times(figure);
    else if (sign === "÷") carried = carried.div(figure);
    else {
      const made = rounds === null ? carried : carried.toDecimalPlaces(rounds);
      expect(made.minus(figure).abs().lt("1e-19"), `${title}, ${label}: ${made} and ${figure}`).toBe(true);
      carried = figure;
      results += 1;
    }
  }
  return results;
}

/** Sign, label and value of each line, as on paper. */
function paper({ steps }: Sheet): string[] {
  return steps.map(
    ({ sign, label, amount }) => `${sign ?? " "} ${label} ${amount && "value" in amount ? amount.value : ""}`,
  );
}

describe("how a panel comes to its size", () => {
  it("is written side by side, worked by hand", () => {
    const sheet = panelSheet(panelOf(BOARD, ROUTED), fitted(BOARD, ROUTED));
    expect(sheet.title).toBe("A panel of 17 boards, 250 × 192 mm");
    expect(paper(sheet)).toEqual([
      "  2 boards of 58 mm 116",
      "+ 3 boards of 42 mm 126",
      "+ 4 gaps of 2 mm 8",
      "= Panel, long side 250",
      "  Largest panel, long side 250",
      "  3 boards of 58 mm 174",
      "+ 2 gaps of 2 mm 4",
      "+ 2 rails of 5 mm, each with a gap 14",
      "= Panel, short side 192",
      "  Largest panel, short side 200",
      "  2 × 4 boards as drawn 8",
      "+ 3 × 3 boards turned by a quarter 9",
      "= Boards to a panel 17",
      "  Boards 414.12",
      "+ Rails 25",
      "+ Gaps and what is left between 40.88",
      "= The panel 480",
      "  Boards 414.12",
      "÷ The panel 480",
      "= Share of the panel that is board 0.8628",
    ]);
    expect(sheet.notes).toContain("No other layout of these boards holds more.");
  });

  it("says what its count claims", () => {
    const notes = (terms = ROUTED, of = BOARD, count?: number) =>
      panelSheet(panelOf(of, terms, count), fitted(of, terms)).notes.join(" ");
    expect(notes(ROUTED, BOARD, 12)).toContain("The largest panel would hold 17.");
    expect(notes(SCORED)).toContain("no other layout than a grid");
    expect(notes(ROUTED, { shape: "round", width: "50", height: "50" })).toContain("honeycomb");
    const open = bare(49, 28, { separation: "routed", gap: "0.001" });
    expect(notes(open, board("7.999", "2.999"))).toContain("The most of all grids and layouts in two blocks");
  });

  it("can be redone for any panel", () => {
    const side = (least: number, most: number) => fc.integer({ min: least, max: most });
    fc.assert(
      fc.property(
        side(60, 200),
        side(60, 200),
        side(5, 50),
        side(5, 50),
        fc.nat(),
        fc.boolean(),
        (width, height, w, h, which, routed) => {
          const terms = bare(width, height, {
            separation: routed ? "routed" : "v-score",
            gap: routed ? "1.6" : "0",
            rails: { sides: which % 2 ? "all" : "none", width: "4" },
          });
          const fit = fitted(board(w, h), terms);
          const { count } = fit.arrangements[which % fit.arrangements.length] ?? { count: 1 };
          expect(redo(panelSheet(panelOf(board(w, h), terms, count), fit))).toBe(5);
        },
      ),
    );
  });
});

const TWELVE = quoteOf({
  boardsPerPiece: 12,
  pieceArea: "342.72",
  price: { model: "whole-order", breaks: [{ quantity: 1, price: "25" }] },
  depanelling: "0.1",
  engineeringCharge: "30",
  freight: "9",
});

function sheetOf(quote: PieceQuote, required = 100, toOrder = 113): Sheet | null {
  return piecesSheet(preparePieces(quote, worthOf(quote.currency), 1000), { required, toOrder }, "EUR");
}

describe("how the cost of a good board comes about", () => {
  it("is written line by line, worked by hand", () => {
    const sheet = sheetOf(TWELVE);
    expect(sheet && paper(sheet)).toEqual([
      "  Panels ordered 10",
      "× Boards to a panel 12",
      "= Boards in them 120",
      "− Boards to order 113",
      "= Boards over 7",
      "  A panel, price from 1 25",
      "+ Its depanelling of 12 boards at 0.1 1.2",
      "= A panel with it 26.2",
      "× Panels ordered 10",
      "= Panels 262.00",
      "+ Engineering 30.00",
      "+ Freight 9.00",
      "= In all 301.00",
      "÷ Boards in the kits 100",
      "= One good board 3.01",
    ]);
  });

  it("names the lots, and what is not known", () => {
    const lots = { model: "lots" as const, breaks: [{ quantity: 5, price: "90" }] };
    const sheet = sheetOf({ ...TWELVE, price: lots, freight: null });
    expect(sheet && paper(sheet).slice(5)).toEqual([
      "  Lots: 2 of 5 for 90 and depanelling of 12 boards at 0.1 for each panel 192.00",
      "+ Engineering 30.00",
      "= All but the freight 222.00",
      "÷ Boards in the kits 100",
      "= One good board ",
    ]);
    expect(sheetOf({ ...TWELVE, currency: "GBP" })).toBeNull();
  });

  it("can be redone for any quote", () => {
    const amount = fc.integer({ min: 1, max: 9_999_999 }).map((value) => (value / 1e4).toFixed(4));
    const formula = fc.record({
      setUp: amount,
      areaRate: amount,
      areaUnit: fc.constantFrom("dm2" as const, "m2" as const),
      perBoard: amount,
    });
    const ladder = fc.tuple(fc.constantFrom("lots" as const, "whole-order" as const), amount, amount);
    const price = fc.oneof(
      formula.map((made) => ({ model: "formula" as const, ...made })),
      ladder.map(([model, one, five]) => ({
        model,
        breaks: [
          { quantity: 1, price: one },
          { quantity: 5, price: five },
        ],
      })),
    );
    const quotes = fc.record({
      price,
      boardsPerPiece: fc.integer({ min: 1, max: 30 }),
      depanelling: fc.oneof(fc.constant("0"), amount),
      engineeringCharge: fc.oneof(fc.constant("0"), amount),
      currency: fc.constantFrom("EUR", "USD"),
    });
    fc.assert(
      fc.property(quotes, fc.integer({ min: 1, max: 300 }), (over, required) => {
        const sheet = sheetOf(quoteOf(over), required, required + 5);
        expect(sheet).not.toBeNull();
        if (sheet) expect(redo(sheet)).toBeGreaterThanOrEqual(3);
      }),
    );
  });
});
