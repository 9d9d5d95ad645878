import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { boardsToOrder } from "#src/costing/boards-to-order.ts";
import { comparePieces, type RunBoards } from "#src/costing/panels/compare-pieces.ts";
import { costPieces } from "#src/costing/panels/cost-pieces.ts";
import { orderPieces } from "#src/costing/panels/order-pieces.ts";
import type { PieceQuote } from "#src/costing/panels/piece-quote.ts";
import { preparePieces } from "#src/costing/panels/prepare-pieces.ts";
import { quoteOf, worthOf } from "./piece-quotes.ts";

const prepared = (over: Partial<PieceQuote>) => {
  const quote = quoteOf(over);
  return preparePieces(quote, worthOf(quote.currency), 2000);
};

/** Panels of 12 at 25.00, depanelling 0.10 a board, engineering 30, freight 9. */
const TWELVE: Partial<PieceQuote> = {
  boardsPerPiece: 12,
  pieceArea: "342.72",
  price: { model: "whole-order", breaks: [{ quantity: 1, price: "25" }] },
  depanelling: "0.1",
  engineeringCharge: "30",
  freight: "9",
};

describe("an order of panels, worked by hand", () => {
  it("is the fewest that hold the boards, each with its depanelling", () => {
    // 113 ÷ 12 → 10 panels at 25 + 12 × 0.10 = 26.20: 262.00; with 30 and 9, 301.00; over 100 good boards 3.01.
    expect(costPieces(prepared(TWELVE), { required: 100, toOrder: 113 })).toEqual({
      pieces: 10,
      boards: 120,
      over: 7,
      goods: "262.00",
      engineering: "30.00",
      stencil: "0.00",
      freight: "9.00",
      total: "301.00",
      landed: { known: true, value: "301" },
      perGoodBoard: { known: true, value: "3.01" },
    });
  });

  it("goes up to a higher break where that costs less, depanelling counted", () => {
    const breaks = [
      { quantity: 1, price: "25" },
      { quantity: 10, price: "22" },
    ];
    // 9 × 26.20 = 235.80; 10 × 23.20 = 232.00. With 0.50 a board: 9 × 31 = 279, 10 × 28 = 280.
    const at = (depanelling: string) =>
      orderPieces(prepared({ ...TWELVE, price: { model: "whole-order", breaks }, depanelling }), 108);
    expect(at("0.1")).toMatchObject({ pieces: 10, goods: 23_200 });
    expect(at("0.5")).toMatchObject({ pieces: 9, goods: 27_900 });
  });

  it("combines lots of panels", () => {
    const breaks = [
      { quantity: 5, price: "90" },
      { quantity: 10, price: "150" },
    ];
    const lots = prepared({ ...TWELVE, price: { model: "lots", breaks } });
    // 14 panels for 160 boards: a lot of 10 and one of 5, 150 + 120 × 0.10 and 90 + 60 × 0.10: 258.00.
    expect(orderPieces(lots, 160)).toEqual({
      pieces: 15,
      boards: 180,
      goods: 25_800,
      charged: 28_800,
      tier: -1,
    });
  });

  it("by formula is set-up, area and boards, rounded once", () => {
    const price = {
      model: "formula",
      setUp: "40",
      areaRate: "1.335",
      areaUnit: "dm2",
      perBoard: "0.03",
    } as const;
    // 10 panels of 3.4272 dm² at 1.335: 45.75312; 120 boards at 0.03 + 0.10: 15.60; with 40: 101.35312.
    expect(orderPieces(prepared({ ...TWELVE, price }), 113)).toMatchObject({ pieces: 10, goods: 10_135 });
    const metres = { ...price, areaRate: "133.5", areaUnit: "m2" } as const;
    expect(orderPieces(prepared({ ...TWELVE, price: metres }), 113)?.goods).toBe(10_135);
    // Halves away from zero: one board of 24.36 cm² at 0 a dm², set-up 0.005.
    const half = { ...price, setUp: "0.005", areaRate: "0", perBoard: "0" };
    expect(orderPieces(prepared({ price: half }), 1)?.goods).toBe(1);
    expect(orderPieces(prepared({ price: half, currency: "JPY" }), 1)?.goods).toBe(0);
  });

  it("is told what it lacks", () => {
    const wanted = { required: 100, toOrder: 113 };
    const open = costPieces(prepared({ ...TWELVE, freight: null }), wanted);
    expect(open).toMatchObject({
      total: "292.00",
      freight: null,
      perGoodBoard: {
        known: false,
        needs: [{ code: "no-board-freight", at: [{ quote: "q" }] }],
        without: "2.92",
      },
    });
    expect(costPieces(prepared({ ...TWELVE, currency: "GBP" }), wanted)).toBeNull();
    expect(costPieces(prepared({ price: { model: "lots", breaks: [] } }), wanted)).toBeNull();
    expect(costPieces(prepared(TWELVE), { required: 0, toOrder: 0 })).toBeNull();
    const dear = { model: "whole-order", breaks: [{ quantity: 1, price: "999999999999" }] } as const;
    expect(orderPieces(prepared({ price: dear }), 100)).toBeNull();
  });
});

const upTo = (most: number) => Array.from({ length: most }, (_, index) => index + 1);
const ALL_GOOD: Omit<RunBoards, "required"> = { yield: "1", confidence: "0.95" };

describe("singly or panelled, at every run size", () => {
  // Singly 10 + 2 a board. Panels of ten at 12, freight 10. Runs 1 … 35 with a board each.
  // 1–10: one panel 22; singly 22 at 6 boards: singly to 5, same at 6, panels 7–10.
  // 11–20: two panels 34; singly 34 at 12: singly at 11, same at 12, panels from 13. 21–30: 46 against 52 at 21.
  it("lists every crossing, the first run that pays and the safe one, worked by hand", () => {
    const singly = prepared({ freight: "10" });
    const breaks = [{ quantity: 1, price: "12" }];
    const panelled = prepared({ boardsPerPiece: 10, price: { model: "whole-order", breaks }, freight: "10" });
    expect(comparePieces([singly], [panelled], { ...ALL_GOOD, required: upTo(35) })).toEqual({
      ranges: [
        { from: 1, to: 5, cheaper: "singly" },
        { from: 6, to: 6, cheaper: "same" },
        { from: 7, to: 10, cheaper: "panelled" },
        { from: 11, to: 11, cheaper: "singly" },
        { from: 12, to: 12, cheaper: "same" },
        { from: 13, to: 35, cheaper: "panelled" },
      ],
      first: 7,
      safe: 13,
    });
    const short = comparePieces([singly], [panelled], { ...ALL_GOOD, required: upTo(11) });
    expect(short).toMatchObject({ first: 7, safe: null });
  });

  it("compares currencies by worth, and says nothing where a freight or rate is missing", () => {
    const boards = { ...ALL_GOOD, required: [10] };
    const breaks = [{ quantity: 1, price: "39.98" }];
    // Ten single boards 20.00 EUR; a panel 39.98 USD is 19.99 EUR.
    const dollars = { boardsPerPiece: 10, price: { model: "whole-order" as const, breaks }, currency: "USD" };
    expect(comparePieces([prepared({})], [prepared(dollars)], boards)?.ranges).toEqual([
      { from: 1, to: 1, cheaper: "panelled" },
    ]);
    const against = (...panelled: PieceQuote[]) =>
      comparePieces(
        [prepared({})],
        panelled.map((quote) => prepared(quote)),
        boards,
      );
    const open = quoteOf({ ...dollars, freight: null });
    expect(against(open)).toBeNull();
    expect(against(quoteOf({ ...dollars, currency: "GBP" }))).toBeNull();
    // A quote that cannot be reckoned does not hide another that can.
    expect(against(open, quoteOf(dollars))?.first).toBe(1);
  });

  it("takes the cheapest quote of each way at every run", () => {
    // Singly 3 each, or 20 and 1 each: 3, 6 … 27 to 9 boards, 30 at 10, then 31, 32 …. A panel of ten 25, or 29 alone.
    const breaks = (price: string) => ({ model: "whole-order" as const, breaks: [{ quantity: 1, price }] });
    const singly = [prepared({ price: breaks("3") }), prepared({ price: breaks("1"), freight: "20" })];
    const panel = (price: string) => prepared({ boardsPerPiece: 10, price: breaks(price) });
    const pays = comparePieces(singly, [panel("29"), panel("25")], { ...ALL_GOOD, required: upTo(20) });
    // Singly to 8 (24), panels at 9 and 10 (25 against 27 and 30); from 11 on two panels are 50, singly 31 … 40.
    expect(pays?.ranges.map(({ to, cheaper }) => [to, cheaper])).toEqual([
      [8, "singly"],
      [10, "panelled"],
      [20, "singly"],
    ]);
    expect(pays).toMatchObject({ first: 9, safe: null });
  });

  it("leaves out runs without boards", () => {
    const pays = comparePieces([prepared({})], [prepared(TWELVE)], { ...ALL_GOOD, required: [0, 1, 0, 2] });
    expect(pays?.ranges.map(({ from, to }) => [from, to])).toEqual([
      [2, 2],
      [4, 4],
    ]);
  });

  it("agrees with plain reckoning of both quotes, for any prices, yields and panels", () => {
    const cents = (most: number) =>
      fc.integer({ min: 1, max: most }).map((value) => (value / 100).toFixed(2));
    const terms = fc.record({ each: cents(400), panel: cents(4000), hold: fc.integer({ min: 2, max: 20 }) });
    const charges = fc.record({
      fixed: cents(5000),
      depanelling: cents(50),
      share: fc.constantFrom("1", "0.97", "0.9"),
    });
    fc.assert(
      fc.property(terms, charges, ({ each, panel, hold }, { fixed, depanelling, share }) => {
        const singly = prepared({ price: { model: "whole-order", breaks: [{ quantity: 1, price: each }] } });
        const price = { model: "whole-order" as const, breaks: [{ quantity: 1, price: panel }] };
        const panelled = prepared({ boardsPerPiece: hold, price, depanelling, engineeringCharge: fixed });
        const boards = { yield: share, confidence: "0.95", required: upTo(60) };
        const ranges = comparePieces([singly], [panelled], boards)?.ranges ?? [];
        for (const kits of boards.required) {
          const toOrder = boardsToOrder(kits, share, "0.95") ?? 0;
          const panels = Math.ceil(toOrder / hold);
          const one = new Decimal(each).times(toOrder);
          const other = new Decimal(panel)
            .plus(new Decimal(depanelling).times(hold))
            .times(panels)
            .plus(fixed);
          const plainly = other.lt(one) ? "panelled" : other.gt(one) ? "singly" : "same";
          expect(ranges.filter(({ from, to }) => from <= kits && kits <= to)).toMatchObject([
            { cheaper: plainly },
          ]);
        }
      }),
    );
  });
});
