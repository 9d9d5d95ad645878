import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import type { Figure } from "#src/costing/figure.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { edition, frozen, offer, part, plan, quote, supplier } from "./plans.ts";
import { completePlan } from "./random-plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const D = Decimal.clone({ precision: 80 });
const value = (figure: Figure | undefined) => (figure?.known ? figure.value : "not known");
const sum = (figures: readonly (Figure | undefined)[]) =>
  figures
    .reduce((total, figure) => total.plus(figure?.known ? figure.value : Number.NaN), new D(0))
    .toFixed();

describe("sums of a run", () => {
  test("heads, editions, landed lines and baskets add up exactly", () => {
    fc.assert(
      fc.property(completePlan, fc.integer({ min: 1, max: 60 }), (made, kits) => {
        const run = costRun(frozen(made), kits);
        expect(sum(run.heads.map(({ spent }) => spent))).toBe(value(run.spent));
        expect(sum(run.heads.map(({ used }) => used))).toBe(value(run.used));
        expect(sum(run.editions.map(({ cost }) => cost.spent))).toBe(value(run.spent));
        expect(sum(run.editions.map(({ cost }) => cost.used))).toBe(value(run.used));
        expect(run.editions.reduce((all, one) => all + one.kits, 0)).toBe(kits);
        expect(sum(run.parts.map(({ goods }) => goods))).toBe(value(run.heads[1]?.spent));
        expect(sum(run.parts.map(({ landed }) => landed))).toBe(
          sum(run.baskets.map(({ converted }) => converted.total)),
        );
        for (const basket of run.baskets) {
          expect(sum(basket.lines.map(({ landed }) => landed))).toBe(value(basket.converted.total));
        }
        for (const head of run.heads.filter(({ lines }) => lines.length > 0)) {
          expect(sum(head.lines.map(({ amount }) => amount)), head.id).toBe(value(head.spent));
        }
        const { spent, keptOnShelf, stockTaken, used } = run;
        expect(new D(value(spent)).minus(value(keptOnShelf)).plus(value(stockTaken)).toFixed()).toBe(
          value(used),
        );
      }),
      { numRuns: 25 },
    );
  });

  test("the order of parts, offers, breaks and suppliers does not matter", () => {
    const shuffled = (made: Plan): Plan => ({
      ...made,
      parts: made.parts.toReversed().map((one) => ({
        ...one,
        offers: one.offers.toReversed().map((each) => ({ ...each, breaks: each.breaks.toReversed() })),
      })),
      suppliers: made.suppliers.toReversed(),
      boards: { ...made.boards, quotes: made.boards.quotes.toReversed() },
      rates: made.rates.toReversed(),
    });
    fc.assert(
      fc.property(completePlan, fc.integer({ min: 1, max: 40 }), (made, kits) => {
        const [run, turned] = [costRun(made, kits), costRun(shuffled(made), kits)];
        const orders = ({ parts }: typeof run) =>
          parts
            .map(({ id, orders: of }) => [id, of.map(({ offer: chosen, quantity }) => [chosen, quantity])])
            .sort();
        expect(orders(turned)).toEqual(orders(run));
        expect([turned.spent, turned.used, turned.kept, turned.parcels, turned.perKit]).toEqual([
          run.spent,
          run.used,
          run.kept,
          run.parcels,
          run.perKit,
        ]);
      }),
      { numRuns: 25 },
    );
  });

  test("comes out as the same JSON it was made as, and the same plan gives the same bytes", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const run = costRun(frozen(made));
        expect(JSON.parse(JSON.stringify(run))).toEqual(run);
        expect(JSON.stringify(costRun(made))).toBe(JSON.stringify(run));
      }),
      { numRuns: 20 },
    );
  });
});

describe("choosing an offer line by line", () => {
  const two = (over: Partial<Plan>, ...offers: Parameters<typeof offer>[0][]) =>
    plan({
      suppliers: [supplier({ id: "ebbing", name: "Ebbing" }), supplier({ id: "tamsin", name: "Tamsin" })],
      parts: [part({ offers: offers.map((one, index) => offer({ id: `o${index}`, ...one })) })],
      ...over,
    });
  const chosen = (made: Plan, kits = 10) => costRun(made, kits).parts[0]?.orders.map(({ offer: id }) => id);

  test("freight counts as though the part came alone, and is then charged once a parcel", () => {
    const suppliers = [
      supplier({ id: "ebbing", name: "Ebbing", freight: { model: "flat", amount: "5.00" } }),
      supplier({ id: "tamsin", name: "Tamsin" }),
    ];
    const cheap = { supplier: "ebbing", breaks: [{ quantity: 1, price: "0.10" }] };
    const dear = { supplier: "tamsin", breaks: [{ quantity: 1, price: "0.50" }] };
    expect(chosen(two({ suppliers }, cheap, dear), 10)).toEqual(["o1"]);
    expect(chosen(two({ suppliers }, cheap, dear), 13)).toEqual(["o0"]);
    const made = two({ suppliers }, cheap);
    made.parts.push(part({ id: "other", offers: [offer(cheap)] }));
    const run = costRun(made, 20);
    expect([run.parcels, value(run.heads[2]?.spent)]).toEqual([1, "5"]);
  });

  test("free freight is respected, for one part as for the basket", () => {
    const suppliers = [
      supplier({
        id: "ebbing",
        name: "Ebbing",
        freight: { model: "flat", amount: "5.00" },
        freeFreightFrom: "2.00",
      }),
      supplier({ id: "tamsin", name: "Tamsin" }),
    ];
    const made = two(
      { suppliers },
      { supplier: "ebbing", breaks: [{ quantity: 1, price: "0.20" }] },
      { supplier: "tamsin", breaks: [{ quantity: 1, price: "0.21" }] },
    );
    expect(chosen(made, 9)).toEqual(["o1"]);
    expect(chosen(made, 10)).toEqual(["o0"]);
    expect(costRun(made, 10).baskets[0]).toMatchObject({
      freeFreightReached: true,
      freight: { value: "0.00" },
    });
  });

  test("ties: fewer left over, then the supplier's name", () => {
    const same = [{ quantity: 1, price: "0.10" }];
    expect(
      chosen(two({}, { supplier: "tamsin", breaks: same }, { supplier: "ebbing", breaks: same })),
    ).toEqual(["o1"]);
    const pack = { supplier: "ebbing", orderMultiple: 20, breaks: [{ quantity: 1, price: "0.05" }] };
    expect(chosen(two({}, pack, { supplier: "tamsin", breaks: same }))).toEqual(["o1"]);
  });

  test("in two currencies the dearer by a grain is the dearer", () => {
    const suppliers = [
      supplier({ id: "ebbing", name: "Ebbing", currency: "USD" }),
      supplier({ id: "tamsin", name: "Tamsin" }),
    ];
    const offers = [
      { supplier: "ebbing", currency: "USD", breaks: [{ quantity: 1, price: "1.00" }] },
      { supplier: "tamsin", breaks: [{ quantity: 1, price: "0.50" }] },
    ];
    const rate = (perForeignUnit: string) => [{ currency: "USD", perForeignUnit, dated: "2026-03-01" }];
    expect(chosen(two({ suppliers, rates: rate("0.5000000001") }, ...offers))).toEqual(["o1"]);
    expect(chosen(two({ suppliers, rates: rate("0.4999999999") }, ...offers))).toEqual(["o0"]);
    expect(chosen(two({ suppliers, rates: rate("0.5") }, ...offers))).toEqual(["o0"]);
  });

  test("a pinned offer is taken though it is dearer; shut out, expired or unpriced it leaves the part open", () => {
    const offers = [
      { supplier: "ebbing", breaks: [{ quantity: 1, price: "0.10" }] },
      { supplier: "tamsin", breaks: [{ quantity: 1, price: "0.90" }] },
    ];
    const made = two({}, ...offers);
    const pinned = { ...made, parts: made.parts.map((one) => ({ ...one, pinnedOffer: "o1" })) };
    expect(chosen(pinned)).toEqual(["o1"]);
    expect(costRun(pinned).parts[0]?.considered.map(({ offer: id, pinned: is }) => [id, is])).toEqual([
      ["o0", false],
      ["o1", true],
    ]);
    const out = costRun({ ...pinned, shutOutSuppliers: ["tamsin"] });
    expect(out.parts[0]?.state).toBe("unpriced");
    expect(out.problems.map(({ code }) => code)).toEqual([
      "unpriced-part",
      "no-price",
      "supplier-shut-out",
      "pinned-offer-unusable",
    ]);
  });

  test("an offer past its day is not used and the run says so; on its last day it is", () => {
    const made = (validUntil: string) => two({}, { validUntil });
    expect(costRun(made("2026-03-09")).parts[0]?.state).toBe("settled");
    const expired = costRun(made("2026-03-08"));
    expect(expired.parts[0]?.considered[0]?.standing).toBe("expired");
    expect(expired.problems).toContainEqual({
      code: "offer-expired",
      at: { part: "part", offer: "o0", supplier: "tamsin", currency: "EUR" },
      facts: { day: "2026-03-08" },
    });
  });

  test("only from stock: an offer whose stock is not known is no promise", () => {
    const made = two({}, { stockShown: null });
    const strict = { ...made, parts: made.parts.map((one) => ({ ...one, onlyFromStock: true })) };
    expect(costRun(strict).parts[0]?.considered[0]?.standing).toBe("stock-not-known");
    expect(costRun(made).parts[0]?.state).toBe("settled");
  });

  test("freight that is not known is never taken for none", () => {
    const suppliers = [
      supplier({ id: "ebbing", name: "Ebbing", freight: { model: "not-known" } }),
      supplier({ id: "tamsin", name: "Tamsin" }),
    ];
    const cheap = { supplier: "ebbing", breaks: [{ quantity: 1, price: "0.01" }] };
    expect(
      chosen(two({ suppliers }, cheap, { supplier: "tamsin", breaks: [{ quantity: 1, price: "9" }] })),
    ).toEqual(["o1"]);
    const only = costRun(two({ suppliers }, cheap));
    expect(only.spent).toEqual({
      known: false,
      needs: [{ code: "no-freight", at: [{ supplier: "ebbing" }], page: "offers" }],
      without: "0.1",
    });
    expect(value(only.parts[0]?.goods)).toBe("0.1");
    expect(only.parts[0]?.landed).toMatchObject({ known: false, without: "0.1" });
  });

  test("no rate for a currency is said by its name, and never counts as zero", () => {
    const suppliers = [supplier({ id: "ebbing", name: "Ebbing", currency: "USD" })];
    const run = costRun(two({ suppliers }, { supplier: "ebbing", currency: "USD" }));
    expect(run.used).toMatchObject({ known: false, needs: [{ code: "no-rate", at: [{ currency: "USD" }] }] });
  });
});

describe("terms of a supplier", () => {
  const made = (over: Partial<Parameters<typeof supplier>[0]>, price = "0.50") =>
    plan({
      suppliers: [supplier({ minimumOrderValue: "20", ...over }), supplier({ id: "dear", name: "Dear" })],
      parts: [part({ offers: [offer({ breaks: [{ quantity: 1, price }] })] })],
    });

  test("below the minimum a small-order fee is added and said", () => {
    const run = costRun(made({ belowMinimum: { term: "fee", fee: "4.00" }, handlingFee: "1.25" }), 10);
    expect(run.baskets[0]).toMatchObject({
      goods: "5.00",
      smallOrderFee: "4.00",
      handling: "1.25",
      total: { value: "10.25" },
    });
    expect(run.problems).toContainEqual({
      code: "below-minimum-fee",
      at: { supplier: "tamsin" },
      facts: { amount: "15.00", currency: "EUR" },
    });
    expect(costRun(made({ belowMinimum: { term: "fee", fee: "4.00" } }), 40).baskets[0]?.smallOrderFee).toBe(
      "0.00",
    );
  });

  test("a supplier that refuses is left out, and its parts are bought elsewhere", () => {
    const plan_ = made({ belowMinimum: { term: "refused" } });
    plan_.parts[0]?.offers.push(
      offer({ id: "elsewhere", supplier: "dear", breaks: [{ quantity: 1, price: "0.80" }] }),
    );
    const run = costRun(plan_, 10);
    expect(run.parts[0]?.orders[0]?.offer).toBe("elsewhere");
    expect(run.parts[0]?.considered.find(({ offer: id }) => id === "offer")?.standing).toBe(
      "minimum-not-reached",
    );
    expect(run.problems).toContainEqual({
      code: "minimum-not-reached",
      at: { supplier: "tamsin" },
      facts: { amount: "15.00", currency: "EUR" },
    });
    expect(costRun(plan_, 40).parts[0]?.orders[0]?.offer).toBe("offer");
  });

  test("a part that only such a supplier sells stays open, with what is lacking", () => {
    const run = costRun(made({ belowMinimum: { term: "refused" } }), 10);
    expect(run.parts[0]?.state).toBe("refused");
    expect(run.problems[0]).toEqual({
      code: "order-refused",
      at: { part: "part", supplier: "tamsin" },
      facts: { amount: "15.00", currency: "EUR" },
    });
    expect(run.used).toMatchObject({ known: false, without: "0" });
  });
});

describe("the shelf", () => {
  const led = part({
    id: "led",
    offers: [offer({ orderMultiple: 100, breaks: [{ quantity: 1, price: "0.062" }] })],
    freeStock: { quantity: 4, bookCost: "0.05" },
    keepShare: "0.5",
  });

  test("used is spent less what keeps plus stock taken at book cost, by hand", () => {
    // 10 needed, 4 on the shelf, 100 bought for 6.20; 94 left worth 5.828, half of it keeps; 4 × 0.05 taken.
    const run = costRun(plan({ parts: [led] }), 10);
    expect(run.parts[0]).toMatchObject({ toBuy: 6, ordered: 100, leftOver: 94 });
    expect([run.leftOver, run.keptOnShelf, run.stockTaken, run.spent, run.used].map(value)).toEqual([
      "5.828",
      "2.914",
      "0.2",
      "6.2",
      "3.486",
    ]);
    expect([value(run.perKit.spent), value(run.perKit.used)]).toEqual(["0.62", "0.3486"]);
  });

  test("stock without a book cost leaves used not known and spent known", () => {
    const run = costRun(plan({ parts: [{ ...led, freeStock: { quantity: 4, bookCost: null } }] }), 10);
    expect(value(run.spent)).toBe("6.2");
    expect(run.used).toMatchObject({
      known: false,
      needs: [{ code: "no-stock-cost", at: [{ part: "led" }] }],
    });
  });

  test("in lots and by slice what is left is worth the mean price paid", () => {
    const priced = (priceModel: "lots" | "by-slice") =>
      plan({
        parts: [
          part({
            keepShare: "1",
            offers: [
              offer({
                priceModel,
                orderMultiple: priceModel === "lots" ? 1 : 10,
                breaks: [
                  {
                    quantity: priceModel === "lots" ? 10 : 1,
                    price: priceModel === "lots" ? "3.00" : "0.30",
                  },
                ],
              }),
            ],
          }),
        ],
      });
    expect(value(costRun(priced("lots"), 7).leftOver)).toBe("0.9");
    expect(value(costRun(priced("by-slice"), 7).leftOver)).toBe("0.9");
  });
});

describe("boards, work and the rest", () => {
  const boards = {
    needed: true,
    size: null,
    panelTerms: [],
    yield: "0.95",
    confidence: "0.95",
    chosenQuote: null,
  };

  test("every quote is compared at the run's size, and the extra boards of the next lot show at their cost", () => {
    const quotes = [
      quote({
        id: "lots",
        priceModel: "lots",
        breaks: [
          { quantity: 10, price: "14" },
          { quantity: 30, price: "24" },
        ],
        engineeringCharge: "20",
        stencilCharge: "2",
        freight: "9",
      }),
      quote({ id: "each", boardHouse: "Saltmarsh", breaks: [{ quantity: 1, price: "3.10" }], freight: null }),
    ];
    const run = costRun(plan({ boards: { ...boards, quotes } }), 20);
    expect(run.boards).toMatchObject({
      required: 20,
      toOrder: 23,
      chosen: "lots",
      landed: { value: "55" },
      perGoodBoard: { value: "2.75" },
    });
    expect(run.boards.quotes[0]).toMatchObject({
      ordered: 30,
      lots: [{ quantity: 30, count: 1 }],
      extra: 10,
      goodExpected: "28.5",
      boards: "24.00",
      total: { value: "55.00" },
    });
    expect(run.boards.quotes[1]).toMatchObject({
      ordered: 23,
      freight: null,
      landed: { known: false, without: "71.3" },
    });
    expect([value(run.heads[0]?.spent), value(run.heads[2]?.spent), run.parcels]).toEqual(["46", "9", 1]);
    const chosen = costRun(plan({ boards: { ...boards, quotes, chosenQuote: "each" } }), 20);
    expect(chosen.spent).toMatchObject({
      known: false,
      needs: [{ code: "no-board-freight", at: [{ quote: "each" }] }],
      without: "71.3",
    });
  });

  test("no quote, a quote past its day, a yield of nothing: boards are not known", () => {
    const codes = (over: Partial<Plan["boards"]>) => {
      const run = costRun(plan({ boards: { ...boards, quotes: [], ...over } }));
      return run.spent.known ? [] : run.spent.needs.map(({ code }) => code);
    };
    expect(codes({})).toEqual(["no-board-quote"]);
    expect(codes({ quotes: [quote({ validUntil: "2026-03-08" })] })).toEqual(["no-board-quote"]);
    expect(codes({ quotes: [quote()], chosenQuote: "gone" })).toEqual(["no-board-quote"]);
    expect(codes({ quotes: [quote()], yield: "0" })).toEqual(["no-board-yield"]);
    expect(codes({ quotes: [quote({ currency: "USD" })] })).toEqual(["no-rate"]);
    expect(codes({ quotes: [quote()] })).toEqual([]);
  });

  test("hours are counted at a rate of nothing, and earn what is left", () => {
    const tasks = [{ id: "count", name: "Counting", editions: null, minutesPerKit: "6", setUpMinutes: "60" }];
    const work = { ratePerHour: "0", learningSlope: "1", kitsMadeBefore: 0, tasks };
    const made = plan({ editions: [edition({ price: "5" })], work });
    const run = costRun(made, 10);
    expect([run.work.minutes, run.work.hours, value(run.work.cost), value(run.earnedPerHour)]).toEqual([
      "120",
      "2",
      "0",
      "25",
    ]);
    expect(value(costRun({ ...made, work: { ...work, ratePerHour: "18" } }, 10).earnedPerHour)).toBe("25");
    const open = costRun({ ...made, work: { ...work, ratePerHour: null } }, 10);
    expect([value(open.earnedPerHour), value(open.used)]).toEqual(["25", "not known"]);
    expect(costRun({ ...made, work: { ...work, tasks: [] } }, 10).earnedPerHour).toMatchObject({
      needs: [{ code: "no-work" }],
    });
  });

  test("a charge spread over 120 kits is borne by a run of 40 for its third, and never for more than all", () => {
    const made = plan({ charges: [{ id: "proto", name: "Prototypes", amount: "240.00", spreadOver: 120 }] });
    expect([40, 120, 400].map((kits) => value(costRun(made, kits).spent))).toEqual(["80", "240", "240"]);
  });

  test("replacements: the expected share of kits times what one costs", () => {
    const made = (costEach: string | null) => plan({ replacements: { share: "0.02", costEach } });
    expect(value(costRun(made("3.50"), 120).spent)).toBe("8.4");
    expect(costRun(made(null), 120).spent).toMatchObject({
      needs: [{ code: "no-replacement-cost" }],
      without: "0",
    });
  });

  test("packing for some editions only, and not asked for where none of them is made", () => {
    const editions = [edition({ id: "full", weight: 3 }), edition({ id: "bare", name: "Bare", weight: 1 })];
    const packing = (costPerKit: string | null, of: string[]) => [
      { id: "box", name: "Box", editions: of, costPerKit },
    ];
    expect(value(costRun(plan({ editions, packing: packing("1.20", ["full"]) }), 40).spent)).toBe("36");
    expect(costRun(plan({ editions, packing: packing(null, ["full"]) }), 40).spent).toMatchObject({
      needs: [{ code: "no-packing-cost", at: [{ packing: "box" }] }],
    });
    expect(value(costRun(plan({ editions, packing: packing(null, []) }), 40).spent)).toBe("0");
  });

  test("without any share in the mix nothing can be said", () => {
    const run = costRun(
      plan({
        editions: [edition({ weight: 0 })],
        packing: [{ id: "box", name: "Box", editions: null, costPerKit: "1" }],
      }),
    );
    expect(run.spent).toMatchObject({ known: false, needs: [{ code: "no-mix", at: [{ edition: "kit" }] }] });
  });

  test("an amount beyond all bounds is refused by name, not reckoned wrongly", () => {
    const run = costRun(
      plan({ parts: [part({ offers: [offer({ breaks: [{ quantity: 1, price: "999999999999" }] })] })] }),
      1000,
    );
    expect(run.used).toMatchObject({
      known: false,
      needs: [{ code: "amount-too-large", at: [{ part: "part" }] }],
    });
    expect(run.parts[0]?.considered[0]?.standing).toBe("amount-too-large");
  });
});
