import { describe, expect, test } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { isOldPrice, orderCautions, stockShort } from "#src/costing/order-cautions.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import { toSettle, worthKnowing } from "#src/costing/to-settle.ts";
import type { Plan, PlanPart } from "#src/shapes/plan.ts";
import { edition, offer, part, plan, quote, supplier } from "./plans.ts";

const FRESH = { pricedOn: "2026-03-07" };

/** A run of ten on 9 March 2026, one of each part in a kit, every other thing settled. */
const made = (parts: PlanPart[], over: Partial<Plan> = {}) =>
  plan({ parts, editions: [edition({ price: "3", boardsPerKit: 0 })], ...over });

const open = (of: Plan) =>
  toSettle(of, costRun(of)).map(({ page, key, problems }) => [page, key, problems.map(({ code }) => code)]);

describe("what is to settle", () => {
  test("nothing where every part has a fresh price and stock", () => {
    expect(open(made([part({ offers: [offer({ ...FRESH, stockShown: 10 })] })]))).toEqual([]);
  });

  test("a price that is missing, has expired, is old or without its day; stock that lacks or is not known", () => {
    const parts = [
      part({ id: "unpriced", offers: [] }),
      part({
        id: "expired",
        offers: [offer(FRESH), offer({ id: "ended", validUntil: "2026-03-08", pricedOn: "2026-02-01" })],
      }),
      part({ id: "old", offers: [offer({ pricedOn: "2026-02-06" })] }),
      part({ id: "dayless", offers: [offer()] }),
      part({ id: "lacks", offers: [offer({ ...FRESH, stockShown: 9 })] }),
      part({ id: "unseen", onlyFromStock: true, offers: [offer(FRESH)] }),
    ];
    expect(open(made(parts))).toEqual([
      ["offers", "unpriced", ["unpriced-part"]],
      ["offers", "unseen", ["unpriced-part", "offer-stock-not-known"]],
      ["offers", "expired", ["offer-expired"]],
      ["offers", "old", ["price-old"]],
      ["offers", "dayless", ["price-old"]],
      ["offers", "lacks", ["stock-short"]],
    ]);
  });

  test("a part with two problems is one thing; things stand in the order of the pages", () => {
    const of = made([part({ offers: [offer({ pricedOn: null, stockShown: 3 })] })], {
      boards: {
        needed: true,
        size: null,
        panelTerms: [],
        yield: "1",
        confidence: "0.95",
        quotes: [quote()],
        chosenQuote: null,
      },
      editions: [edition({ price: null })],
    });
    const ended = { ...of.boards, quotes: [quote(), quote({ id: "ended", validUntil: "2026-03-01" })] };
    expect(open({ ...of, boards: ended })).toEqual([
      ["offers", "part", ["stock-short", "price-old"]],
      ["boards", "ended", ["quote-expired"]],
      ["price", "no-price", ["no-price"]],
    ]);
  });

  test("what the reckoning did by itself is worth knowing and no more; who is left out on purpose is not said", () => {
    const of = made([part({ offers: [offer(FRESH), offer({ id: "none", breaks: [] })] })], {
      suppliers: [
        supplier({ minimumOrderValue: "20", belowMinimum: { term: "fee", fee: "4" } }),
        supplier({ id: "out", name: "Out" }),
      ],
      shutOutSuppliers: ["out"],
    });
    const shut = {
      ...of,
      parts: of.parts.map((one) => ({
        ...one,
        offers: [...one.offers, offer({ id: "s", supplier: "out" })],
      })),
    };
    expect(open(shut)).toEqual([]);
    expect(worthKnowing(costRun(shut)).map(({ code }) => code)).toEqual([
      "offer-without-price",
      "below-minimum-fee",
    ]);
  });
});

describe("what is doubtful about an order", () => {
  test("30 days are not old, 31 are", () => {
    expect(isOldPrice({ pricedOn: "2026-02-07" }, "2026-03-09")).toBe(false);
    expect(isOldPrice({ pricedOn: "2026-02-06" }, "2026-03-09")).toBe(true);
    expect(isOldPrice({ pricedOn: null }, "2026-03-09")).toBe(true);
  });

  test("stock lacks only where it is shown, and only for what is ordered", () => {
    expect([stockShort({ stockShown: 640 }, 1000), stockShort({ stockShown: null }, 1000)]).toEqual([360, 0]);
    expect([stockShort({ stockShown: 640 }, 640), stockShort({ stockShown: 0 }, null)]).toEqual([0, 0]);
  });

  test("is said with its supplier, its number and its day", () => {
    const of = made([
      part({ name: "LED", offers: [offer({ pricedOn: "2026-01-15", stockShown: 8 })] }),
      part({ id: "chip", name: "Chip", offers: [offer({ id: "c" })] }),
    ]);
    expect(orderCautions(of, costRun(of)).map((problem) => problemSentence(problem, of))).toEqual([
      "Tamsin shows 2 fewer of LED than are ordered. Ask when more come, or take another offer.",
      "The price of Tamsin for LED is of 15 January 2026. Ask again, or write the new day.",
      "The price of Tamsin for Chip has no day. Ask again, or write when it was seen.",
    ]);
  });
});
