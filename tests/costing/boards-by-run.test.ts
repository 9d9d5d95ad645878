import { expect, it } from "vitest";
import { boardsByRun } from "#src/costing/boards-by-run.ts";
import { costRun } from "#src/costing/cost-run.ts";
import type { Plan, PlanBoardQuote } from "#src/shapes/plan.ts";
import { smallPlan } from "#tests/support/small-plan.ts";

const quote = (over: Partial<PlanBoardQuote>): PlanBoardQuote => ({
  id: "lots",
  boardHouse: "Kilnside",
  currency: "EUR",
  priceModel: "lots",
  breaks: [{ quantity: 10, price: "20" }],
  boardsPerPanel: null,
  pieceSize: null,
  formula: null,
  depanelling: "0",
  engineeringCharge: "0",
  stencilCharge: "0",
  freight: "5",
  leadTimeDays: null,
  pricedOn: null,
  validUntil: null,
  ...over,
});

/** A board in each kit; one house sells lots of 10 at 20.00 with 5.00 freight, one each at 2.40 with 1.00. */
function withBoards(): Plan {
  const plan = smallPlan();
  const each = quote({
    id: "each",
    boardHouse: "Saltmarsh",
    priceModel: "whole-order",
    breaks: [{ quantity: 1, price: "2.40" }],
    freight: "1",
  });
  return {
    ...plan,
    editions: plan.editions.map((edition) => ({ ...edition, boardsPerKit: 1 })),
    boards: { ...plan.boards, needed: true, size: null, panelTerms: [], quotes: [quote({}), each] },
  };
}

it("gives each run size its boards, worked by hand", () => {
  const [ten, eleven] = boardsByRun(withBoards(), 10, 11);
  // 10 boards: a lot for 20 + 5 = 25, or 24 + 1 = 25; the lot's house comes first by name.
  expect(ten?.boards.chosen).toBe("lots");
  expect(ten?.boards.quotes.map(({ landed }) => landed)).toEqual([
    { known: true, value: "25" },
    { known: true, value: "25" },
  ]);
  // 11 boards: two lots for 40 + 5, or 26.40 + 1.
  expect(eleven?.boards.chosen).toBe("each");
  expect(eleven?.boards.quotes.map(({ landed }) => landed)).toEqual([
    { known: true, value: "45" },
    { known: true, value: "27.4" },
  ]);
});

it("says what the whole reckoning says of the same run", () => {
  const plan = { ...withBoards(), boards: { ...withBoards().boards, yield: "0.97" } };
  for (const { kits, boards } of boardsByRun(plan, 1, 60)) expect(boards).toEqual(costRun(plan, kits).boards);
});
