import { describe, expect, it } from "vitest";
import { answeredAtOnce } from "#src/components/islands/import/answered-at-once.ts";
import type { PartsImportView } from "#src/server/parts-import.ts";
import { partsView, question } from "./parts-view.ts";

const view = partsView({
  open: [question(15, "must"), question(21, "must"), question(9, "look")],
  must: 2,
  look: 1,
  settled: [],
  settledCount: 0,
});

function open({ questions }: PartsImportView): number[] {
  return questions.open.map(({ row }) => row);
}

describe("an answer shows at once", () => {
  it("moves its question to the settled ones and leaves the others", () => {
    const after = answeredAtOnce(view, {
      answers: [{ row: 15, code: "quantity-mismatch", choice: "keep-quantity" }],
    });
    expect(open(after)).toEqual([21, 9]);
    expect(after.questions).toMatchObject({ must: 1, look: 1, settledCount: 1 });
    expect(after.questions.settled[0]?.answer).toBe("keep-quantity");
    expect(open(view)).toEqual([15, 21, 9]);
  });

  it("takes every suggestion, those beyond the page too", () => {
    const many = partsView({ ...view.questions, must: 40, look: 60 });
    const after = answeredAtOnce(many, { takeSuggestions: true });
    expect(after.questions).toMatchObject({ open: [], must: 0, look: 0 });
    expect(after.questions.settled.map(({ answer }) => answer)).toEqual(Array(3).fill("use-designators"));
  });

  it("keeps count of the questions that are not on the page", () => {
    const many = partsView({ ...view.questions, must: 40, look: 60 });
    const answers = [{ row: 9, code: "quantity-mismatch" as const, choice: "keep-quantity" }];
    expect(answeredAtOnce(many, { answers }).questions).toMatchObject({ must: 40, look: 59 });
  });

  it("opens a question again at its place of urgency", () => {
    const settled = answeredAtOnce(view, { takeSuggestions: true });
    const after = answeredAtOnce(settled, { reopen: [{ row: 21, code: "quantity-mismatch" }] });
    expect(open(after)).toEqual([21]);
    expect(after.questions).toMatchObject({ must: 1, look: 0, settledCount: 2 });
  });
});
