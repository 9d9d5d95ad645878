import { describe, expect, test } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { NEED_CODES } from "#src/costing/problem.ts";
import {
  needsInShort,
  needWords,
  priceNeeds,
  problemSentence,
  withoutWords,
} from "#src/costing/problem-words.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { tally } from "#src/costing/tally.ts";
import { edition, offer, part, plan, quote, supplier } from "./plans.ts";

const TASK = { id: "t", name: "Counting", editions: null, minutesPerKit: "5", setUpMinutes: "0" };

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

  test("a list that is not begun needs parts, whatever else is open; a price needs itself", () => {
    const boards = { ...made.boards, needed: true };
    const empty = tally(plan({ lines: 0, boards, work: { ...made.work, tasks: [TASK] } }), 50);
    const cells = [empty.costPerKit, empty.earnsPerKit, empty.evenAfter, empty.cashNeeded].map((figure) =>
      figure.known ? "" : needsInShort(figure.needs),
    );
    expect(cells).toEqual(["needs parts", "needs both", "needs both", "needs parts"]);
    expect(empty.price.known ? "" : priceNeeds(empty.price.needs)).toBe("not set");
    const priced = tally(plan({ lines: 0, editions: [edition({ price: "9" })] }));
    expect(priced.earnsPerKit.known ? "" : needsInShort(priced.earnsPerKit.needs)).toBe("needs parts");
  });

  test("a quote alone makes no cost of a kit without a list", () => {
    const quoted = plan({ lines: 0, boards: { ...made.boards, needed: true, quotes: [quote()] } });
    const run = costRun(quoted);
    expect(run.perKit.used.known ? [] : run.perKit.used.needs.map(({ code, page }) => [code, page])).toEqual([
      ["no-parts", "parts"],
    ]);
    expect(run.problems[0]).toEqual({ code: "no-parts", at: {}, facts: {} });
    const { columns, sweetSpots } = sweepRuns(quoted);
    expect(columns.used.every((used) => used === null)).toBe(true);
    expect(sweetSpots).toEqual([]);
    expect(costRun({ ...quoted, lines: 1 }).perKit.used).toEqual({ known: true, value: "2" });
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
      "The offer of Tamsin for LED, warm white was valid until 28 February 2026 and is not used. Ask again, or write the new date.",
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
