import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { alternativesTo } from "#src/costing/sourcing/alternatives.ts";
import { chooseSuppliers } from "#src/costing/sourcing/choose-suppliers.ts";
import { lineReasons } from "#src/costing/sourcing/line-reasons.ts";
import { marketOf } from "#src/costing/sourcing/market.ts";
import type { SourcingInput, SourcingPart } from "#src/costing/sourcing/sourcing-input.ts";
import { frozen } from "#tests/costing/plans.ts";
import { plainBest } from "./plain-sourcing.ts";
import { sourcing } from "./random-sourcing.ts";
import { oneOf, waysOf } from "./small-sourcing.ts";

const random = fc
  .constantFrom(6, 900)
  .chain((cost) => sourcing({ suppliers: 3, parts: 4, ways: 4, cost, gaps: true }));

const totalOf = (input: SourcingInput) => {
  const { plan } = chooseSuppliers(input);
  return plan === null ? null : { unbought: plan.unbought.length, total: plan.total };
};

describe("what changes the total, and what does not", () => {
  test("the order of suppliers and parts does not matter, nor does asking twice", () => {
    fc.assert(
      fc.property(random, (input) => {
        const last = input.suppliers.length - 1;
        const turned: SourcingInput = {
          suppliers: input.suppliers.toReversed(),
          parts: input.parts.toReversed().map((part) => ({
            ...part,
            ways: part.ways.map(({ orders }) => ({
              orders: orders.map((order) => ({ ...order, supplier: last - order.supplier })),
            })),
          })),
        };
        const first = chooseSuppliers(frozen(input));
        expect(chooseSuppliers(input)).toEqual(first);
        expect(totalOf(turned)).toEqual(totalOf(input));
      }),
    );
  });

  test("one more way never raises it, and never leaves more parts unbought", () => {
    fc.assert(
      fc.property(random, fc.nat({ max: 3 }), fc.nat({ max: 3 }), (input, at, way) => {
        const part = input.parts[at];
        fc.pre(part !== undefined && way < part.ways.length);
        const fewer = input.parts.with(at, {
          ...(part as SourcingPart),
          ways: (part as SourcingPart).ways.filter((_, index) => index !== way),
        });
        const [less, more] = [plainBest({ ...input, parts: fewer }), totalOf(input)];
        expect(more?.unbought).toBeLessThanOrEqual(less?.unbought ?? 0);
        const same = chooseSuppliers({ ...input, parts: fewer });
        const levels = (one: SourcingInput) =>
          chooseSuppliers(one).plan?.baskets.filter(({ bill }) => bill.freight === null).length;
        if (
          same.plan?.unbought.length !== more?.unbought ||
          levels(input) !== levels({ ...input, parts: fewer })
        )
          return;
        expect((more?.total ?? 0n) <= (same.plan?.total ?? 0n)).toBe(true);
      }),
    );
  });

  test("a dearer order never lowers it where nothing but its price hangs on it", () => {
    const flat = sourcing({ suppliers: 3, parts: 4, ways: 4, cost: 900, gaps: false }).map((input) => ({
      ...input,
      suppliers: input.suppliers.map((supplier) => ({
        ...supplier,
        terms: {
          ...supplier.terms,
          minimum: 0,
          freeFrom: null,
          freight: { model: "flat" as const, amount: supplier.terms.handling },
        },
      })),
    }));
    fc.assert(
      fc.property(
        flat,
        fc.nat({ max: 3 }),
        fc.nat({ max: 3 }),
        fc.nat({ max: 90 }),
        (input, at, way, more) => {
          const part = input.parts[at];
          const raised = part?.ways[way];
          fc.pre(part !== undefined && raised !== undefined);
          const orders = raised?.orders.map((order) => ({ ...order, cost: order.cost + more })) ?? [];
          const dearer = {
            ...input,
            parts: input.parts.with(at, {
              ...(part as SourcingPart),
              ways: part?.ways.with(way, { orders }) ?? [],
            }),
          };
          expect((totalOf(dearer)?.total ?? 0n) >= (totalOf(input)?.total ?? 0n)).toBe(true);
        },
      ),
    );
  });
});

describe("a plan worked by hand", () => {
  // Two parts; Ada has both dearer by 2.10 in all, Ben the second only. Freight 4.90 and 6.90.
  const input: SourcingInput = {
    suppliers: [
      oneOf("Ada", { freight: { model: "flat", amount: 490 } }),
      oneOf("Ben", { freight: { model: "flat", amount: 690 } }),
    ],
    parts: [
      { id: "resistor", toBuy: 10, coverable: 10, ways: waysOf([0, 600, 3]) },
      { id: "lamp", toBuy: 10, coverable: 10, ways: waysOf([0, 410, 9], [1, 200, 2]) },
      { id: "case", toBuy: 4, coverable: 1, ways: [] },
    ],
  };

  test("all at one supplier: 6.00 + 4.10 + 4.90 = 15.00 against 6.00 + 2.00 + 4.90 + 6.90 = 19.80", () => {
    const { plan, gap, complete } = chooseSuppliers(input);
    expect({ gap, complete, ways: plan?.ways, unbought: plan?.unbought }).toEqual({
      gap: 0n,
      complete: true,
      ways: [0, 0, -1],
      unbought: [2],
    });
    expect(plan?.total).toBe(15n * 10n ** 24n);
    expect(plan?.arrivesIn).toBe(9);
    expect(plan?.baskets).toHaveLength(1);
    expect(plan?.baskets[0]?.bill).toMatchObject({ goods: 1010, freight: 490, total: 1500 });
  });

  test("why: the lamp is 2.10 dearer there but saves a parcel of 6.90; moved, the plan costs 4.80 more", () => {
    const market = marketOf(input);
    expect(lineReasons(market, Int32Array.from([0, 1, -1]))).toEqual([
      { part: 0, cheapest: 0, dearer: 0n, parcels: 0n, moved: 0n },
      { part: 1, cheapest: 1, dearer: 21n * 10n ** 23n, parcels: 69n * 10n ** 23n, moved: 48n * 10n ** 23n },
    ]);
  });

  test("beside it: soonest in 3 days for 19.80; without Ada the resistor is not to be had", () => {
    const { plan } = chooseSuppliers(input);
    if (plan === null) throw new Error("no plan");
    const beside = alternativesTo(marketOf(input), plan);
    expect(beside.byParcels.map((one) => one.plan?.total)).toEqual([15n * 10n ** 24n]);
    expect(beside.fewest?.plan?.baskets).toHaveLength(1);
    expect(beside.soonest?.days).toBe(3);
    expect(beside.soonest?.result.plan?.total).toBe(198n * 10n ** 23n);
    expect(beside.without.map(({ supplier, result }) => [supplier, result.plan?.unbought])).toEqual([
      [0, [0, 2]],
    ]);
  });
});

test("alternatives are the best under their limits: brute force", () => {
  fc.assert(
    fc.property(random, (input) => {
      const { plan } = chooseSuppliers(input);
      if (plan === null) return;
      const beside = alternativesTo(marketOf(input), plan);
      beside.byParcels.forEach((result, index) => {
        expect(result.plan?.total).toBe(plainBest(input, { mostParcels: index + 1 })?.total);
      });
      for (const { supplier, result } of beside.without)
        expect(result.plan?.total).toBe(plainBest(input, { without: [supplier] })?.total);
      if (plan.baskets.length === 0) {
        expect(beside.soonest).toBeNull();
        return;
      }
      const days = [0, 1, 2, 3, 4].find(
        (latestDays) => plainBest(input, { latestDays })?.unbought === plan.unbought.length,
      );
      const soonest = days === undefined ? undefined : plainBest(input, { latestDays: days });
      expect(beside.soonest?.result.plan?.total).toBe(soonest?.total);
    }),
    { numRuns: 300 },
  );
});

test("where work runs out the gap is stated, and the best is within it", () => {
  const wide = sourcing({ suppliers: 3, parts: 4, ways: 4, cost: 900, gaps: false });
  fc.assert(
    fc.property(wide, fc.integer({ min: 1, max: 30 }), (input, work) => {
      const { plan, gap, complete } = chooseSuppliers(input, { work });
      const best = plainBest(input);
      if (plan === null || best === null || !complete || plan.unbought.length > best.unbought) return;
      expect(plan.total >= best.total && plan.total - gap <= best.total).toBe(true);
    }),
    { numRuns: 500 },
  );
});
