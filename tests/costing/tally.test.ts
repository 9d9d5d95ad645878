import { describe, expect, test } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { NEED_CODES } from "#src/costing/problem.ts";
import { needWords, problemSentence, withoutWords } from "#src/costing/problem-words.ts";
import { tally } from "#src/costing/tally.ts";
import { edition, offer, part, plan, supplier } from "./plans.ts";

describe("the figures of the strip", () => {
  const made = plan({
    editions: [
      edition({ price: "34.00", weight: 2 }),
      edition({ id: "bare", name: "Bare", price: "10.00", weight: 1 }),
    ],
    charges: [{ id: "c", name: "All", amount: "300", spreadOver: null }],
  });

  test("cost, mean price, earnings, even after and cash of a run of 30", () => {
    // 20 at 34 and 10 at 10 bring 780; the mean price is 26. With 12 sold, 8 and 4, the run takes 312; with 11, 278.
    expect(tally(made, 30)).toEqual({
      currency: "EUR",
      run: 30,
      costPerKit: { known: true, value: "10" },
      price: { known: true, value: "26" },
      earnsPerKit: { known: true, value: "16" },
      evenAfter: { known: true, value: "12" },
      cashNeeded: { known: true, value: "300" },
    });
  });

  test("each says what it needs while it is not known", () => {
    const open = tally(
      {
        ...made,
        parts: [part({ id: "led", offers: [] }), part({ id: "chip", offers: [] })],
        editions: [edition()],
      },
      30,
    );
    const words = [open.costPerKit, open.price, open.earnsPerKit, open.cashNeeded].map((figure) =>
      figure.known ? "" : needWords(figure.needs),
    );
    expect(words).toEqual([
      "needs 2 prices",
      "needs a price",
      "needs 2 prices and 1 thing more",
      "needs 2 prices",
    ]);
    expect(open.costPerKit.known ? "" : withoutWords(open.costPerKit.needs)).toBe("without 2 unpriced lines");
  });
});

describe("words for needs and cautions", () => {
  test("every need has short words", () => {
    for (const code of NEED_CODES)
      expect(needWords([{ code, at: [{ currency: "USD" }], page: "run" }]), code).toMatch(/^[a-z0-9]/);
    expect(
      needWords([{ code: "no-rate", at: [{ currency: "USD" }, { currency: "JPY" }], page: "offers" }]),
    ).toBe("no rate for USD, JPY");
  });

  test("a problem names its things and says what to do", () => {
    const made = plan({
      suppliers: [supplier({ minimumOrderValue: "20", belowMinimum: { term: "fee", fee: "4" } })],
      parts: [
        part({ name: "LED, warm white", offers: [offer(), offer({ id: "old", validUntil: "2026-02-28" })] }),
      ],
      editions: [edition({ price: "3" })],
    });
    expect(costRun(made).problems.map((problem) => problemSentence(problem, made))).toEqual([
      "The offer of Tamsin for LED, warm white was valid until 2026-02-28 and is not used. Ask again, or write the new date.",
      "The order to Tamsin is 19.00 EUR below its minimum, so a small-order fee is added.",
    ]);
  });

  test("a partial total is labelled with all it leaves out", () => {
    expect(
      withoutWords([
        { code: "unpriced-part", at: [{ part: "a" }, { part: "b" }, { part: "c" }], page: "offers" },
        { code: "no-hourly-rate", at: [{}], page: "run" },
      ]),
    ).toBe("without 3 unpriced lines and work");
  });
});
