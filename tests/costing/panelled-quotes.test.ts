import { describe, expect, it } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import { figuresOf, reckoned, working } from "#src/costing/working.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { edition, plan, quote } from "./plans.ts";

/** Single boards at 2.40, freight 9.00; panels of 12 at 20.00 with 0.10 a board to break out, set up for 30.00, freight 9.00. */
const SINGLY = quote({ id: "singly", breaks: [{ quantity: 1, price: "2.40" }], freight: "9" });
const TWELVE = quote({
  id: "twelve",
  boardsPerPanel: 12,
  pieceSize: { width: "238", height: "144" },
  breaks: [{ quantity: 1, price: "20" }],
  depanelling: "0.1",
  engineeringCharge: "30",
  freight: "9",
});

const TERMS = {
  boardHouse: "Kilnside",
  largest: { width: "250", height: "200" },
  least: null,
  separation: "routed",
  gap: "2",
  rails: { sides: "long", width: "5" },
} as const;

function withQuotes(quotes: Plan["boards"]["quotes"], over: Partial<Plan["boards"]> = {}): Plan {
  const boards = { ...plan({}).boards, needed: true, quotes, ...over };
  return plan({ editions: [edition({ price: "10" })], run: { kits: 20, sweepTo: 60 }, boards });
}

describe("single boards and panels at every run size", () => {
  // Panels: 30 + 9 + 21.20 each. Singly 9 + 2.40 a board.
  // 24: singly 66.60; two panels 81.40. 36: 95.40 and 102.60. 48: 123.80 (four panels) and 124.20: panels.
  // 49: 126.60 and five panels, 145.00: singly. 60: 153.00 and 145.00: panels.
  it("are compared by what they cost landed, worked by hand", () => {
    const at = (kits: number) => costRun(withQuotes([SINGLY, TWELVE]), kits).boards;
    expect([24, 36, 48, 49, 60].map((kits) => at(kits).chosen)).toEqual([
      "singly",
      "singly",
      "twelve",
      "singly",
      "twelve",
    ]);
    expect(at(49).quotes[1]).toMatchObject({
      boardsPerPiece: 12,
      pieces: 5,
      ordered: 60,
      extra: 11,
      breakReached: { quantity: 1, price: "20" },
      boards: "106.00",
      engineering: "30.00",
      landed: { value: "145" },
    });
    expect(at(48).perGoodBoard).toEqual({ known: true, value: "2.579166666666666666666667" });
    expect(at(48).quotes[0]).toMatchObject({ boardsPerPiece: 1, pieces: 48, ordered: 48 });
  });

  it("keep what is charged apart by head", () => {
    const run = costRun(withQuotes([TWELVE]), 48);
    // 84.80 of panels and 30 of engineering are boards; 9 is freight.
    expect(run.heads[0]).toMatchObject({
      spent: { value: "114.8" },
      lines: [{ amount: { value: "84.8" } }, { amount: { value: "30" } }],
    });
    expect(run.heads[2]).toMatchObject({ spent: { value: "9" } });
  });

  it("go up to more panels where those cost less, told in boards", () => {
    const breaks = [
      { quantity: 1, price: "20" },
      { quantity: 5, price: "15" },
    ];
    // Four panels 84.80, five at 16.20 are 81.00.
    const { boards } = costRun(withQuotes([{ ...TWELVE, breaks }]), 40);
    expect(boards.quotes[0]).toMatchObject({
      pieces: 5,
      ordered: 60,
      boards: "81.00",
      boughtUp: { insteadOf: 48, insteadOfCosts: "84.80", saves: "3.80", leftOver: 20 },
    });
  });
});

describe("a formula", () => {
  const formula = { setUp: "12", areaRate: "1.25", areaUnit: "dm2", perBoard: "0.2" } as const;
  const byArea = (over = {}) =>
    quote({
      id: "area",
      priceModel: "formula",
      breaks: [],
      formula,
      pieceSize: { width: "80", height: "50" },
      ...over,
    });

  it("prices single boards by their own area, rounded once", () => {
    // 0.4 dm² at 1.25 is 0.50, with 0.20 a board 0.70: 20 boards 14.00, with set-up 26.00.
    expect(costRun(withQuotes([byArea()]), 20).boards.quotes[0]).toMatchObject({
      pieces: 20,
      boards: "26.00",
      breakReached: null,
      lots: [],
    });
  });

  it("needs the size of what it prices, and says so", () => {
    const made = withQuotes([byArea({ pieceSize: null })]);
    const run = costRun(made, 20);
    expect(run.spent).toMatchObject({
      known: false,
      needs: [{ code: "no-board-size", at: [{ quote: "area" }] }],
    });
    expect(run.boards.quotes[0]).toMatchObject({ standing: "no-size", pieces: null });
    expect(run.problems.map((problem) => problemSentence(problem, made))).toContain(
      "The quote of Kilnside is a formula, and the size of what it prices is not known. Write it in.",
    );
    // Another quote that can be used settles it; the formula stays a caution.
    const beside = costRun(withQuotes([byArea({ pieceSize: null }), SINGLY]), 20);
    expect(beside.spent.known).toBe(true);
    expect(beside.problems.map(({ code }) => code)).toContain("quote-without-size");
  });

  it("without its terms is a quote without a price", () => {
    expect(costRun(withQuotes([byArea({ formula: null })]), 20).boards.quotes[0]?.standing).toBe("no-price");
  });
});

describe("the working of a panel", () => {
  const size = { shape: "rectangle", width: "58", height: "42" } as const;
  const made = withQuotes([SINGLY, TWELVE], { size, panelTerms: [TERMS] });

  it("opens from its quote, laid out as quoted", () => {
    // 12 boards need 174 × 192 mm at least; the quote is for 238 × 144: 4 × 58 + 3 × 2 by 3 × 42 + 2 × 2 + 2 × 7.
    expect(working(made, 48, "panel:twelve")?.title).toBe("A panel of 12 boards, 238 × 144 mm");
    const other = withQuotes([{ ...TWELVE, pieceSize: null }], { size, panelTerms: [TERMS] });
    expect(working(other, 48, "panel:twelve")?.title).toBe("A panel of 12 boards, 174 × 192 mm");
    expect(
      working(made, 48, "quote:twelve")?.lines.find(({ opens }) => opens === "panel:twelve")?.label,
    ).toBe("Boards to a panel");
    expect(figuresOf(reckoned(made, 48)).filter((figure) => figure.startsWith("panel:"))).toEqual([
      "panel:twelve",
    ]);
  });

  it("is not there for single boards, without size or terms, or for more boards than fit", () => {
    expect(working(made, 48, "panel:singly")).toBeNull();
    expect(working(withQuotes([TWELVE], { panelTerms: [TERMS] }), 48, "panel:twelve")).toBeNull();
    expect(working(withQuotes([TWELVE], { size }), 48, "panel:twelve")).toBeNull();
    const many = { ...TWELVE, boardsPerPanel: 18, pieceSize: null };
    expect(working(withQuotes([many], { size, panelTerms: [TERMS] }), 48, "panel:twelve")).toBeNull();
    expect(working(made, 48, "panel:gone")).toBeNull();
  });
});
