import { describe, expect, it } from "vitest";
import { boardsToOrder } from "#src/costing/boards-to-order.ts";
import { enoughGood } from "#src/costing/enough-boards.ts";
import { nextBoards } from "#src/costing/next-boards.ts";
import type { PlanBoardQuote } from "#src/shapes/plan.ts";

const LOTS: PlanBoardQuote = {
  id: "q",
  boardHouse: "Kilnside",
  currency: "EUR",
  priceModel: "lots",
  breaks: [
    { quantity: 50, price: "90.00" },
    { quantity: 100, price: "140.00" },
  ],
  boardsPerPanel: null,
  pieceSize: null,
  formula: null,
  depanelling: "0",
  engineeringCharge: "25",
  stencilCharge: "0",
  freight: "12.50",
  leadTimeDays: 12,
  pricedOn: null,
  validUntil: null,
};

describe("the next larger orders of boards", () => {
  it("of lots are whole lots, with what they add: worked by hand", () => {
    // 100 cost 140 + 37.50. The next are 150 = 140 + 90 and 200 = 2 × 140.
    expect(nextBoards(LOTS, 100, 2)).toEqual([
      { ordered: 150, pieces: 150, more: 50, total: "267.50", adds: "90.00", addsEach: "1.8" },
      { ordered: 200, pieces: 200, more: 100, total: "317.50", adds: "140.00", addsEach: "1.4" },
    ]);
  });

  it("begin at the lot that the need fills", () => {
    expect(nextBoards(LOTS, 60, 1)[0]).toMatchObject({ ordered: 150, more: 50 });
  });

  it("at a price each are the next break", () => {
    const each = {
      ...LOTS,
      priceModel: "whole-order" as const,
      breaks: [
        { quantity: 10, price: "3" },
        { quantity: 200, price: "2" },
      ],
    };
    expect(nextBoards(each, 120, 1)).toEqual([
      { ordered: 200, pieces: 200, more: 80, total: "437.50", adds: "40.00", addsEach: "0.5" },
    ]);
  });

  it("in panels are the next panel", () => {
    const breaks = [
      { quantity: 1, price: "25" },
      { quantity: 11, price: "20" },
    ];
    const panels = { ...LOTS, boardsPerPanel: 12, priceModel: "whole-order" as const, breaks };
    // Nine panels are 225, ten 250; with charges and freight of 37.50. From eleven on 20 each: twelve are 240.
    expect(nextBoards({ ...panels, breaks: [{ quantity: 1, price: "25" }] }, 108, 1)).toEqual([
      { ordered: 120, pieces: 10, more: 12, total: "287.50", adds: "25.00", addsEach: "2.083333" },
    ]);
    expect(nextBoards(panels, 132, 1)).toEqual([
      { ordered: 144, pieces: 12, more: 12, total: "277.50", adds: "20.00", addsEach: "1.666667" },
    ]);
  });

  it("by formula add their area and their boards", () => {
    const formula = { setUp: "40", areaRate: "2", areaUnit: "dm2" as const, perBoard: "0.05" };
    const pieceSize = { width: "200", height: "150" };
    const area = {
      ...LOTS,
      boardsPerPanel: 12,
      priceModel: "formula" as const,
      breaks: [],
      formula,
      pieceSize,
    };
    // A panel of 3 dm² is 6, its boards 0.60. Ten 66 + 40 + 37.50; the eleventh adds 6.60.
    expect(nextBoards(area, 120, 1)).toEqual([
      { ordered: 132, pieces: 11, more: 12, total: "150.10", adds: "6.60", addsEach: "0.55" },
    ]);
  });

  it("are none without a price", () => {
    expect(nextBoards({ ...LOTS, breaks: [] }, 100, 2)).toEqual([]);
  });
});

describe("the chance that enough boards are good", () => {
  // Binomial tail, worked from its formula: 0.9^10 = 0.348678; with one spare 0.9^10 × (1 + 10 × 0.1) = 0.697357.
  it("is the binomial tail", () => {
    expect(enoughGood(10, 10, "0.9")).toBe("0.348678");
    expect(enoughGood(10, 11, "0.9")).toBe("0.697357");
    expect(enoughGood(10, 9, "0.9")).toBe("0");
    expect(enoughGood(113, 113, "1")).toBe("1");
    expect(enoughGood(5, 9, "0")).toBe("0");
  });

  it.each([
    [20, "0.95", "0.95"],
    [113, "0.97", "0.9"],
    [500, "0.99", "0.999"],
  ])("agrees with the boards to order for %i at %s, sure to %s", (required, yieldShare, confidence) => {
    const ordered = boardsToOrder(required, yieldShare, confidence) ?? 0;
    expect(Number(enoughGood(required, ordered, yieldShare))).toBeGreaterThanOrEqual(Number(confidence));
    expect(Number(enoughGood(required, ordered - 1, yieldShare))).toBeLessThan(Number(confidence));
  });
});
