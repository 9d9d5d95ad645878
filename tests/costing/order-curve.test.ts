import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LadderTerms } from "#src/costing/ladder.ts";
import { neverWorthBuying, orderCurve, orderPerKit, rungOrders } from "#src/costing/order-curve.ts";

/** Light-emitting diodes in bags of a hundred; worked by hand. */
const LEDS: LadderTerms = {
  priceModel: "whole-order",
  currency: "EUR",
  minimumOrder: 100,
  orderMultiple: 100,
  breaks: [
    { quantity: 100, price: "0.118" },
    { quantity: 500, price: "0.094" },
    { quantity: 1000, price: "0.062" },
    { quantity: 2500, price: "0.055" },
  ],
};

describe("what any number costs", () => {
  it("is the cheapest order, beside what the list asks", () => {
    // 735 need 800 at 0.094 = 75.20; 1000 at 0.062 = 62.00 are cheaper. 400 at 0.118 = 47.20; 500 cost 47.00.
    expect(orderCurve(LEDS, [100, 400, 735, 1000])).toEqual([
      { quantity: 100, order: 100, pays: "11.80", listed: "11.80" },
      { quantity: 400, order: 500, pays: "47.00", listed: "47.20" },
      { quantity: 735, order: 1000, pays: "62.00", listed: "75.20" },
      { quantity: 1000, order: 1000, pays: "62.00", listed: "62.00" },
    ]);
  });

  it("leaves out what costs more than can be reckoned", () => {
    const dear = { ...LEDS, breaks: [{ quantity: 100, price: "999999999999" }] };
    expect(orderCurve(dear, [100])).toEqual([]);
  });

  it("of lots is what the lots cost", () => {
    const lots = { ...LEDS, priceModel: "lots" as const, breaks: [{ quantity: 100, price: "9" }] };
    expect(orderCurve(lots, [150])).toEqual([{ quantity: 150, order: 200, pays: "18.00", listed: "18.00" }]);
  });
});

describe("numbers never worth buying", () => {
  it("are those above which a break costs less", () => {
    // In bags: 400 costs 47.20 > 47.00. 660 at 0.094 is 62.04 > 62.00, so of the bags 700, 800, 900.
    // At 0.062, 2500 at 0.055 is 137.50: 2218 × 0.062 = 137.52, so 2300 and 2400.
    expect(neverWorthBuying(LEDS)).toEqual([
      { from: 400, to: 400 },
      { from: 700, to: 900 },
      { from: 2300, to: 2400 },
    ]);
    expect(neverWorthBuying({ ...LEDS, orderMultiple: 1 })).toEqual([
      { from: 399, to: 499 },
      { from: 660, to: 999 },
      { from: 2218, to: 2499 },
    ]);
  });

  it("are none by slice, with one price, or where prices do not fall enough", () => {
    expect(neverWorthBuying({ ...LEDS, priceModel: "by-slice" })).toEqual([]);
    expect(neverWorthBuying({ ...LEDS, breaks: LEDS.breaks.slice(0, 1) })).toEqual([]);
  });

  const ladders = fc.record({
    multiple: fc.constantFrom(1, 2, 5, 10),
    steps: fc.array(fc.tuple(fc.integer({ min: 1, max: 60 }), fc.integer({ min: 1, max: 400 })), {
      minLength: 2,
      maxLength: 5,
    }),
  });

  it("are exactly those for which some larger order costs less: brute force", () => {
    fc.assert(
      fc.property(ladders, ({ multiple, steps }) => {
        let from = 0;
        const breaks = steps.map(([step, cents]) => {
          from += step;
          return { quantity: from, price: (cents / 100).toFixed(2) };
        });
        const terms = { ...LEDS, minimumOrder: 1, orderMultiple: multiple, breaks };
        const end = Math.ceil((from + multiple) / multiple) * multiple;
        const cost = (quantity: number) => {
          const reached = breaks.filter((rung) => rung.quantity <= quantity).at(-1);
          return reached ? Math.round(Number(reached.price) * 100) * quantity : Number.POSITIVE_INFINITY;
        };
        const permitted: number[] = [];
        for (let quantity = multiple; quantity <= end; quantity += multiple)
          if (quantity >= (breaks[0]?.quantity ?? 0)) permitted.push(quantity);
        const never = permitted.filter((quantity) =>
          permitted.some((more) => more > quantity && cost(more) < cost(quantity)),
        );
        const said = permitted.filter((quantity) =>
          neverWorthBuying(terms).some((range) => range.from <= quantity && quantity <= range.to),
        );
        expect(said).toEqual(never);
      }),
    );
  });
});

describe("rungs for a number that is needed", () => {
  it("say what would be ordered on each", () => {
    expect(rungOrders(LEDS, 735)).toEqual([
      { quantity: 100, price: "0.118", order: null, costs: null, over: null },
      { quantity: 500, price: "0.094", order: 800, costs: "75.20", over: 65 },
      { quantity: 1000, price: "0.062", order: 1000, costs: "62.00", over: 265 },
      { quantity: 2500, price: "0.055", order: 2500, costs: "137.50", over: 1765 },
    ]);
  });

  it("come to so much in one kit, in the reporting currency", () => {
    expect(orderPerKit("75.20", "1", 120)).toMatch(/^0\.62666/);
    expect(orderPerKit("10", "0.92", 8)).toBe("1.15");
  });
});
