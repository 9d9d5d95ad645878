import fc from "fast-check";
import { expect, test } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { grainText } from "#src/costing/grains.ts";
import { saleOf } from "#src/costing/kept-per-sale.ts";
import { edition, plan } from "./plans.ts";

const sale = {
  taxRate: "0.21",
  feeRate: "0.029",
  feeFixed: "0.30",
  postageCharged: "4.50",
  postagePaid: "5.10",
};

test("34.00 and 4.50 postage, 21 % inside, 2.9 % and 0.30, 5.10 paid: by hand 25.30", () => {
  // 38.50 × 0.21 ÷ 1.21 = 6.6818… → 6.68; 38.50 × 0.029 + 0.30 = 1.4165 → 1.42; 38.50 − 6.68 − 1.42 − 5.10.
  const kept = saleOf(plan({ sale }), { price: "34.00" });
  expect(Object.values(kept).map((value) => value !== null && grainText(value))).toEqual([
    "38.5",
    "6.68",
    "1.42",
    "5.1",
    "25.3",
  ]);
});

test("rounds tax and fee in the minor unit of the plan's currency", () => {
  const yen = saleOf(
    plan({
      currency: "JPY",
      sale: { ...sale, taxRate: "0.1", feeFixed: "0", postageCharged: "0", postagePaid: "0" },
    }),
    { price: "1234" },
  );
  // 1234 × 0.1 ÷ 1.1 = 112.18… → 112; 1234 × 0.029 = 35.786 → 36.
  expect([yen.taxInside, yen.fee, yen.kept].map((value) => grainText(value ?? 0n))).toEqual([
    "112",
    "36",
    "1086",
  ]);
});

test("what is charged is kept, taken or paid: nothing is lost", () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 100_000 }), (cents) => {
      const one = saleOf(plan({ sale }), { price: (cents / 100).toFixed(2) });
      const parts = [one.taxInside, one.fee, one.postagePaid, one.kept].map((value) => value ?? 0n);
      expect(parts.reduce((a, b) => a + b, 0n)).toBe(one.charged);
    }),
  );
});

test.each([
  ["taxRate", "no-tax-rate"],
  ["feeRate", "no-fee-rate"],
  ["feeFixed", "no-fixed-fee"],
  ["postageCharged", "no-postage-charged"],
  ["postagePaid", "no-postage-paid"],
] as const)("without %s nothing is kept, and %s says so", (term, code) => {
  const run = costRun(plan({ editions: [edition({ price: "10" })], sale: { ...sale, [term]: null } }));
  expect(run.kept).toEqual({ known: false, needs: [{ code, at: [{}], page: "price" }], without: null });
  expect(run.editions[0]?.sale.kept.known).toBe(false);
});

test("without a price neither, and an edition that is not in the run is not asked for one", () => {
  const editions = [edition({ price: "10" }), edition({ id: "bare", name: "Bare", weight: 0 })];
  expect(costRun(plan({ editions })).kept).toEqual({ known: true, value: "100" });
  const both = editions.map((one) => ({ ...one, weight: 1 }));
  expect(costRun(plan({ editions: both })).kept).toMatchObject({
    needs: [{ code: "no-price", at: [{ edition: "bare" }] }],
  });
});
