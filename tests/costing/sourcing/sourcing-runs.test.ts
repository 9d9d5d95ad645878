import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { prepareLadder } from "#src/costing/ladder.ts";
import { chooseSuppliers } from "#src/costing/sourcing/choose-suppliers.ts";
import { resultOf } from "#src/costing/sourcing/plan-result.ts";
import { ordersOfWay, type PartForSale, saleMarket } from "#src/costing/sourcing/sale-market.ts";
import type { SourcingInput } from "#src/costing/sourcing/sourcing-input.ts";
import { type SourcingRuns, sourceRun, sourcingRuns } from "#src/costing/sourcing/sourcing-runs.ts";
import { topUps } from "#src/costing/sourcing/top-ups.ts";
import { ascending } from "#tests/costing/random-plans.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { linearProgram } from "./as-linear-program.ts";
import { plainBill } from "./plain-sourcing.ts";
import { sourcing } from "./random-sourcing.ts";
import { oneOf } from "./small-sourcing.ts";
import { highs } from "./solvers.ts";

vi.setConfig({ testTimeout: MANY_CASES });

interface Ladders {
  supplier: number;
  breaks: { quantity: number; price: string }[];
  minimumOrder: number;
  orderMultiple: number;
}

function offerOf(
  id: string,
  { supplier, ...terms }: Ladders,
  currency: string,
): PartForSale["offers"][number] {
  return {
    id,
    supplier,
    leadDays: null,
    ladder: prepareLadder({ priceModel: "whole-order", currency, ...terms }, Number.POSITIVE_INFINITY, 1),
    leftWorth: (_, left) => BigInt(left) * 10n ** 20n,
  };
}

const ladder: fc.Arbitrary<Ladders> = fc.record({
  supplier: fc.nat({ max: 2 }),
  breaks: ascending(3, 120).chain((quantities) =>
    fc
      .array(fc.integer({ min: 1, max: 300 }), { minLength: 3, maxLength: 3 })
      .map((prices) =>
        quantities.map((quantity, at) => ({ quantity, price: ((prices[at] ?? 1) / 1000).toFixed(3) })),
      ),
  ),
  minimumOrder: fc.integer({ min: 1, max: 30 }),
  orderMultiple: fc.constantFrom(1, 1, 5, 10),
});

interface Case {
  suppliers: SourcingInput["suppliers"];
  parts: PartForSale[];
  perKit: number[];
}

const runsCase: fc.Arbitrary<Case> = fc
  .record({
    input: sourcing({
      suppliers: 3,
      parts: 0,
      ways: 1,
      cost: 1500,
      gaps: false,
      wholePercent: true,
      refusals: true,
    }),
    parts: fc.array(
      fc.record({
        offers: fc.array(ladder, { minLength: 1, maxLength: 4 }),
        perKit: fc.integer({ min: 0, max: 4 }),
        weightEach: fc.nat({ max: 9 }),
      }),
      { minLength: 1, maxLength: 5 },
    ),
  })
  .map(({ input, parts }) => ({
    suppliers: input.suppliers,
    perKit: parts.map(({ perKit }) => perKit),
    parts: parts.map(({ offers, weightEach }, part) => ({
      id: `p${part}`,
      weightEach,
      split: () => null,
      offers: offers.map((one, at) =>
        offerOf(`p${part}o${at}`, one, input.suppliers[one.supplier]?.worth.currency ?? "EUR"),
      ),
    })),
  }));

/** The same run stated anew, every order asked of its ladder again. */
function statedAnew({ sale }: SourcingRuns, suppliers: SourcingInput["suppliers"]): SourcingInput {
  const { market, parts, toBuy } = sale;
  return {
    suppliers,
    parts: parts.map(({ id, offers }, part) => ({
      id,
      toBuy: toBuy[part] ?? 0,
      coverable: 0,
      ways: offers.map((_, at) => ({ orders: ordersOfWay(sale, (market.first[part] ?? 0) + at) })),
    })),
  };
}

describe("one run size after another", () => {
  test("every size gives what it gives by itself, HiGHS's total among others", async () => {
    const solve = await highs();
    fc.assert(
      fc.property(
        runsCase,
        fc.shuffledSubarray([1, 2, 3, 5, 8, 13, 21, 34], { minLength: 3 }),
        (made, sizes) => {
          const runs = sourcingRuns(made.suppliers, made.parts);
          for (const kits of sizes) {
            const search = sourceRun(
              runs,
              made.perKit.map((each) => each * kits),
            );
            const warm = resultOf(search);
            const anew = statedAnew(runs, made.suppliers);
            expect(warm).toEqual(chooseSuppliers(anew));
            if (warm.plan === null || warm.plan.unbought.length > 0 || kits > 3) continue;
            const objective = solve(linearProgram(anew)).objective ?? Number.NaN;
            expect(Math.abs(objective - Number(warm.plan.total) / 1e22)).toBeLessThan(0.01);
          }
        },
      ),
      { numRuns: 150 },
    );
  });
});

describe("topping up", () => {
  const part = (id: string, price: string, perKit: number) => ({
    id,
    weightEach: null,
    split: () => null,
    perKit,
    offers: [
      offerOf(
        `${id}-offer`,
        { supplier: 0, breaks: [{ quantity: 1, price }], minimumOrder: 1, orderMultiple: 1 },
        "EUR",
      ),
    ],
  });

  test("48.20 of goods, freight 4.90, free from 50.00: 18 more at 0.10 cost 1.80 and save 3.10", () => {
    const parts = [part("lamp", "0.10", 82), part("case", "4.00", 10)];
    const runs = sourcingRuns(
      [oneOf("Ada", { freight: { model: "flat", amount: 490 }, freeFrom: 5000 })],
      parts,
    );
    const { best } = sourceRun(
      runs,
      parts.map(({ perKit }) => perKit),
    );
    expect(topUps(runs.sale, best?.ways ?? new Int32Array(2))).toEqual([
      {
        supplier: 0,
        threshold: 5000,
        lacks: 180,
        part: 0,
        offer: "lamp-offer",
        order: { quantity: 100, cost: 1000, tier: 0 },
        extraPieces: 18,
        extraCost: 180,
        saves: 31n * 10n ** 23n,
      },
    ]);
  });

  test("nothing is said where reaching the threshold costs as much as it saves", () => {
    const parts = [part("lamp", "0.10", 51), part("case", "4.00", 10)];
    const runs = sourcingRuns(
      [oneOf("Ada", { freight: { model: "flat", amount: 490 }, freeFrom: 5000 })],
      parts,
    );
    const { best } = sourceRun(
      runs,
      parts.map(({ perKit }) => perKit),
    );
    // 45.10 lack 4.90, which is what freight costs.
    expect(topUps(runs.sale, best?.ways ?? new Int32Array(2))).toEqual([]);
  });

  test("what is said is true: the basket with the extra pieces costs so much less", () => {
    fc.assert(
      fc.property(runsCase, fc.integer({ min: 1, max: 20 }), (made, kits) => {
        const runs = sourcingRuns(made.suppliers, made.parts);
        const { best } = sourceRun(
          runs,
          made.perKit.map((each) => each * kits),
        );
        if (best === null) return;
        for (const found of topUps(runs.sale, best.ways)) {
          const own = [...best.ways].flatMap((way, at) =>
            way < 0 ? [] : ordersOfWay(runs.sale, way).map((order) => ({ ...order, at })),
          );
          const basket = own.filter(({ supplier }) => supplier === found.supplier);
          const sum = (of: (order: (typeof own)[number]) => number) =>
            basket.reduce((total, order) => total + of(order), 0);
          const each = made.parts[found.part]?.weightEach ?? 0;
          const { terms, worth } = made.suppliers[found.supplier] as SourcingInput["suppliers"][number];
          const before = plainBill(
            terms,
            sum(({ cost }) => cost),
            sum(({ weight }) => weight ?? 0),
          );
          const after = plainBill(
            terms,
            sum(({ cost }) => cost) + found.extraCost,
            sum(({ weight }) => weight ?? 0) + each * found.extraPieces,
          );
          expect((before.total - after.total) * worth.grains).toBe(found.saves);
          expect(found.saves > 0n && sum(({ cost }) => cost) + found.extraCost >= found.threshold).toBe(true);
        }
      }),
      { numRuns: 400 },
    );
  });
});

test("a market with room for splits keeps the ways of its parts apart", () => {
  const capped = {
    supplier: 0,
    ladder: prepareLadder(
      {
        priceModel: "whole-order",
        currency: "EUR",
        breaks: [{ quantity: 1, price: "1" }],
        minimumOrder: 1,
        orderMultiple: 1,
      },
      7,
      10,
    ),
    id: "o",
    leadDays: null,
    leftWorth: () => 0n,
  };
  const order = {
    offer: "o",
    supplier: 0,
    pieces: 7,
    cost: 700,
    leftOver: 0,
    leftWorth: 0n,
    weight: null,
    leadDays: null,
  };
  const parts: PartForSale[] = [
    {
      id: "a",
      weightEach: null,
      offers: [capped],
      split: () => ({ orders: [order, { ...order, supplier: 1, pieces: 3, cost: 450 }] }),
    },
    { id: "b", weightEach: null, offers: [{ ...capped, supplier: 1 }], split: () => null },
  ];
  const runs = sourcingRuns([oneOf("Ada"), oneOf("Ben")], parts);
  expect(saleMarket([], parts).market.first).toEqual(Int32Array.from([0, 2, 4]));
  const few = resultOf(sourceRun(runs, [5, 5]));
  expect(few.plan?.ways).toEqual([0, 0]);
  const many = resultOf(sourceRun(runs, [10, 10]));
  expect(many.plan?.ways).toEqual([1, -1]);
  expect(many.plan?.baskets.map(({ supplier, bill }) => [supplier, bill.goods])).toEqual([
    [0, 700],
    [1, 450],
  ]);
});
