import { describe, expect, it } from "vitest";
import { blankQuote } from "#src/components/islands/boards/blank-quote.ts";
import { boardsAnswer, orderWords, quoteName } from "#src/components/islands/boards/board-words.ts";
import { boardsPoints } from "#src/components/islands/boards/boards-points.ts";
import { blankTerms, termsFields } from "#src/components/islands/boards/panel-terms-draft.ts";
import { paysSentence, runsWords } from "#src/components/islands/boards/pays-words.ts";
import { quoteDraft, quoteFields } from "#src/components/islands/boards/quote-draft.ts";
import { costRun } from "#src/costing/cost-run.ts";
import type { PanelsPay } from "#src/costing/panels/compare-pieces.ts";
import { singlyOrPanels } from "#src/costing/singly-or-panels.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { edition, plan, quote } from "#tests/costing/plans.ts";
import { QUOTE } from "#tests/support/supply.ts";

const plain = (text: string) => text.replace(/\u00a0/g, " ");

function of(quotes: Plan["boards"]["quotes"], kits = 100): Plan {
  const boards = { ...plan({}).boards, needed: true, quotes };
  return plan({ editions: [edition()], run: { kits, sweepTo: 60 }, boards });
}

const TWELVE = quote({
  id: "twelve",
  boardsPerPanel: 12,
  breaks: [{ quantity: 1, price: "25" }],
  engineeringCharge: "30",
  freight: "9",
});

describe("what is ordered, in words", () => {
  const words = (over = {}) => {
    const [result] = costRun(of([{ ...TWELVE, ...over }]), 100).boards.quotes;
    return result ? [plain(orderWords(result)), quoteName(result)] : [];
  };

  it("panels, in lots of panels, by formula, singly", () => {
    expect(words()).toEqual(["9 panels of 12 at €25.000", "Kilnside, panels of 12"]);
    expect(words({ priceModel: "lots", breaks: [{ quantity: 5, price: "90" }] })[0]).toBe(
      "2 lots of 5 panels of 12",
    );
    expect(words({ priceModel: "lots", breaks: [{ quantity: 1, price: "90" }] })[0]).toBe(
      "9 lots of 1 panel of 12",
    );
    const formula = { setUp: "1", areaRate: "1", areaUnit: "dm2", perBoard: "0" };
    const size = { width: "100", height: "100" };
    expect(words({ priceModel: "formula", breaks: [], formula, pieceSize: size })[0]).toBe(
      "9 panels of 12 by formula",
    );
    expect(words({ boardsPerPanel: null })).toEqual(["100 at €25.000", "Kilnside"]);
  });

  it("and as the answer: 9 × 25 + 39 = 264, 2.64 a board, 8 spare", () => {
    const { deciding, rest } = boardsAnswer(costRun(of([TWELVE]), 100).boards, "EUR");
    expect(plain(deciding)).toBe("Kilnside, nine panels of 12: €264.00.");
    expect(plain(rest)).toBe("That is €2.64 for each board in a kit, with freight. 8 of them are spare.");
    expect(boardsAnswer(costRun(of([TWELVE]), 132).boards, "EUR").deciding).toContain("11 panels of 12");
  });

  it("names at the ends of lines leave room for the boards of a panel", () => {
    const named = of([TWELVE, { ...TWELVE, id: "long", boardHouse: "Old Copper Wharf" }]);
    const { lines } = boardsPoints(named, { from: 90, to: 100 });
    expect(lines.map(({ label, name }) => [label, name])).toEqual([
      ["Kilnside × 12", "Kilnside, panels of 12"],
      ["Old Coppe … × 12", "Old Copper Wharf, panels of 12"],
    ]);
  });
});

describe("where panels pay", () => {
  const pays = (first: number | null, safe: number | null): PanelsPay => ({ ranges: [], first, safe });

  it("is one sentence", () => {
    expect(paysSentence(pays(null, null), 500)).toBe("Single boards cost no more at any run up to 500.");
    expect(paysSentence(pays(1, 1), 500)).toBe("Panels cost less at every run up to 500.");
    expect(paysSentence(pays(48, 48), 500)).toBe("Panels cost less from a run of 48 on.");
    expect(paysSentence(pays(48, 61), 500)).toBe(
      "Panels first cost less at a run of 48, and from 61 on at every run up to 500.",
    );
    expect(paysSentence(pays(48, null), 500)).toBe(
      "Panels first cost less at a run of 48, but not at every run after it, as far as 500.",
    );
  });

  // 9 + 2.40 a board against 39 + 21.20 a panel of 12: 4 panels 123.80, singly 123.00 at 47.5; 5: 145, 56.67; 49 to 56 singly.
  it("lists every run at which either is cheaper, worked by hand", () => {
    const singly = quote({ id: "singly", breaks: [{ quantity: 1, price: "2.40" }], freight: "9" });
    const panels = { ...TWELVE, breaks: [{ quantity: 1, price: "20" }], depanelling: "0.1" };
    const found = singlyOrPanels(of([singly, panels]), 60);
    expect(
      found && [runsWords(found, "panelled"), runsWords(found, "singly"), runsWords(found, "same")],
    ).toEqual(["48, 57 to 60", "1 to 47, 49 to 56", null]);
    expect(singlyOrPanels(of([panels]), 60)).toBeNull();
    // A quote that is not chosen is compared all the same.
    const pinned = of([singly, panels]);
    expect(singlyOrPanels({ ...pinned, boards: { ...pinned.boards, chosenQuote: "singly" } }, 60)).toEqual(
      found,
    );
  });
});

describe("forms send what applies, and nothing else", () => {
  const draft = quoteDraft({ ...QUOTE, breaks: [...QUOTE.breaks] });

  it("a quote for panels, singly, and by formula", () => {
    const panels = {
      ...draft,
      boardsPerPanel: "12",
      panelWidth: "238",
      panelHeight: "144",
      depanelling: "0.08",
    };
    expect(quoteFields(panels)).toEqual({
      ...QUOTE,
      boardsPerPanel: 12,
      panelWidth: "238",
      panelHeight: "144",
      depanelling: "0.08",
    });
    expect(quoteFields({ ...panels, boardsPerPanel: null })).toEqual(QUOTE);
    const formula = {
      ...draft,
      priceModel: "formula",
      setUp: "40",
      areaRate: "1.3",
      perBoard: null,
    } as const;
    expect(quoteFields(formula)).toMatchObject({
      breaks: [],
      setUp: "40",
      areaRate: "1.3",
      areaUnit: "dm2",
      perBoard: null,
    });
    expect(quoteFields({ ...formula, priceModel: "lots" })).toMatchObject({ setUp: null, areaUnit: null });
  });

  it("panels whose number is not written are not taken for single boards", () => {
    expect(quoteFields({ ...draft, boardsPerPanel: "" }).boardsPerPanel).toBe(0);
    expect(blankQuote("EUR", "2026-03-09", null, null).boardsPerPanel).toBeNull();
  });

  it("panel terms without a gap for scores and without a width for no rails", () => {
    const typed = {
      ...blankTerms("Kilnside"),
      largestWidth: "250",
      largestHeight: "200",
      gap: "2",
      railWidth: "5",
    };
    expect(termsFields(typed)).toEqual({
      boardHouse: "Kilnside",
      largestWidth: "250",
      largestHeight: "200",
      leastWidth: null,
      leastHeight: null,
      separation: "routed",
      gap: "2",
      railSides: "long",
      railWidth: "5",
    });
    expect(termsFields({ ...typed, separation: "v-score", railSides: "none" })).toMatchObject({
      gap: "0",
      railWidth: "0",
    });
  });
});
