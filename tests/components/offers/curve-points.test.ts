import { expect, it } from "vitest";
import { curveEnd, curveRows, priceStretches } from "#src/components/islands/offers/curve-points.ts";
import type { LadderTerms } from "#src/costing/ladder.ts";

/** LEDs in bags of 100, as in DESIGN's picture of the offers. */
const BAGS: LadderTerms = {
  priceModel: "whole-order",
  currency: "EUR",
  breaks: [
    { quantity: 100, price: "0.118" },
    { quantity: 500, price: "0.094" },
    { quantity: 1000, price: "0.062" },
  ],
  minimumOrder: 100,
  orderMultiple: 100,
};

it("has a point for every number that can be bought, and only for those", () => {
  const rows = curveRows(BAGS, 1200);
  expect(rows.map(({ quantity }) => quantity)).toEqual(
    Array.from({ length: 12 }, (_, place) => (place + 1) * 100),
  );
  // By hand: 700 at 0.094 are 65.80 by the list, and 1 000 at 0.062 are 62.00.
  expect(rows[6]).toMatchObject({ order: 1000, paysText: "62.00", listedText: "65.80", saved: [62, 65.8] });
  // The area begins where the list still is what is paid: 600 at 0.094 are 56.40.
  expect(rows[5]).toMatchObject({ order: 600, paysText: "56.40", saved: [56.4, 56.4] });
  expect(rows[9]).toMatchObject({ order: 1000, saved: null });
});

it("names a price where pieces are bought at it one by one", () => {
  // 400 at 0.118 are 47.20, more than 500 at 0.094 for 47.00; from 700 on 1 000 are cheaper.
  expect(priceStretches(BAGS, curveRows(BAGS, 1200))).toEqual([
    { price: "0.118", from: 100, to: 300 },
    { price: "0.094", from: 500, to: 600 },
    { price: "0.062", from: 1000, to: 1200 },
  ]);
});

it("goes past what is needed and what is ordered", () => {
  expect(curveEnd(674, 1000)).toBe(1600);
  expect(curveEnd(0, 0)).toBe(10);
});
