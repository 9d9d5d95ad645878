import { expect, test } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { edition, plan } from "./plans.ts";
import { channel } from "./price/channels.ts";

const terms = {
  taxRate: "0.21",
  feeRate: "0.029",
  feeFixed: "0.30",
  postageCharged: "4.50",
  postagePaid: "5.10",
  packingCost: "0.40",
  minutesPerOrder: "12",
};
const known = (value: string) => ({ known: true, value });
const work = { ratePerHour: "18.00", learningSlope: "1", kitsMadeBefore: 0, tasks: [] };

test("34.00 and 4.50 postage, 21 % inside, 2.9 % and 0.30, 5.10 and 0.40 paid: 24.90 kept, 21.30 brought", () => {
  // 38.50 × 0.21 ÷ 1.21 = 6.6818… → 6.68; 38.50 × 0.029 + 0.30 = 1.4165 → 1.42; 38.50 − 6.68 − 1.42 − 5.10 − 0.40.
  // 12 minutes at 18.00 an hour are 3.60.
  const run = costRun(
    plan({ editions: [edition({ price: "34.00" })], channels: [channel(terms)], work }),
    10,
  );
  expect(run.editions[0]).toMatchObject({ kept: known("24.9"), brings: known("21.3") });
  expect([run.kept, run.brings, run.bringsPerKit]).toEqual([known("249"), known("213"), known("21.3")]);
  // Nothing else is worked at and nothing costs: 249.00 for 120 minutes.
  expect([run.profit, run.earnedPerHour]).toEqual([known("213"), known("124.5")]);
  expect(run.work.sellingMinutes).toEqual(known("120"));
});

test("two channels by three to one: the mean, to the nearest grain", () => {
  const channels = [
    channel({ id: "a", weight: 2, feeFixed: "1.00" }),
    channel({ id: "b", name: "Stall", weight: 1 }),
  ];
  const run = costRun(plan({ editions: [edition({ price: "10" })], channels }), 3);
  // (2 × 9.00 + 10.00) ÷ 3 of each kit, and three kits bring 28.00 to the last digit.
  expect(run.brings).toEqual(known("28"));
  expect(run.bringsPerKit).toEqual(known("9.333333333333333333333333"));
});

test.each([
  ["taxRate", "no-tax-rate"],
  ["feeRate", "no-fee-rate"],
  ["feeFixed", "no-fixed-fee"],
  ["postageCharged", "no-postage-charged"],
  ["postagePaid", "no-postage-paid"],
  ["packingCost", "no-order-packing"],
] as const)("without %s nothing is kept, and %s says so", (term, code) => {
  const channels = [channel({ ...terms, [term]: null })];
  const run = costRun(plan({ editions: [edition({ price: "10" })], channels, work }));
  const at = [{ channel: "site" }];
  expect(run.kept).toEqual({ known: false, needs: [{ code, at, page: "price" }], without: null });
  expect(run.editions[0]?.kept.known).toBe(false);
  expect(run.problems).toContainEqual({ code, at: { channel: "site" }, facts: {} });
});

test("time to sell needs an hour's rate for what it costs, and none for what an hour earns", () => {
  const timed = plan({
    editions: [edition({ price: "10" })],
    channels: [channel({ minutesPerOrder: "30" })],
    work: { ...work, ratePerHour: null },
  });
  const run = costRun(timed);
  expect(run.brings).toMatchObject({ known: false, needs: [{ code: "no-hourly-rate" }] });
  expect(run.earnedPerHour).toEqual(known("20"));
});

test("without a price neither, and an edition that is not in the run is not asked for one", () => {
  const editions = [edition({ price: "10" }), edition({ id: "bare", name: "Bare", weight: 0 })];
  expect(costRun(plan({ editions })).kept).toEqual(known("100"));
  const both = editions.map((one) => ({ ...one, weight: 1 }));
  expect(costRun(plan({ editions: both })).kept).toMatchObject({
    needs: [{ code: "no-price", at: [{ edition: "bare" }] }],
  });
});
