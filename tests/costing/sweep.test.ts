import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import type { Figure } from "#src/costing/figure.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { bigPlan } from "#tests/bench/big-plan.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { plainBoards, plainRun } from "./plain-reckoning.ts";
import { frozen, part, plan } from "./plans.ts";
import { completePlan } from "./random-plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const value = (figure: Figure) => (figure.known ? figure.value : null);

describe("sweepRuns", () => {
  test("gives the very figures of costRun at every size", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const { columns } = sweepRuns(frozen(made));
        for (let kits = 1; kits <= made.run.sweepTo; kits += 1) {
          const run = costRun(made, kits);
          const at = kits - 1;
          expect({
            spent: columns.spent[at],
            used: columns.used[at],
            perKitSpent: columns.perKitSpent[at],
            perKitUsed: columns.perKitUsed[at],
            brings: columns.brings[at],
            profit: columns.profit[at],
            leftOver: columns.leftOver[at],
            parcels: columns.parcels[at],
            sold: columns.soldToPay[at]?.toString() ?? null,
          }).toEqual({
            spent: value(run.spent),
            used: value(run.used),
            perKitSpent: value(run.perKit.spent),
            perKitUsed: value(run.perKit.used),
            brings: value(run.brings),
            profit: value(run.profit),
            leftOver: value(run.leftOver),
            parcels: run.parcels,
            sold: value(run.evenAfter),
          });
        }
      }),
      { numRuns: 25 },
    );
  });

  test("gives the figures of the plain reckoning at every size", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const { columns } = sweepRuns(made);
        for (let kits = 1; kits <= made.run.sweepTo; kits += 1) {
          const run = plainRun(made, kits);
          const at = kits - 1;
          expect([
            columns.spent[at],
            columns.used[at],
            columns.brings[at],
            columns.leftOver[at],
            columns.parcels[at],
          ]).toEqual([run.spent, run.used, run.brings, run.leftOver, run.parcels]);
        }
      }),
      { numRuns: 25 },
    );
  });

  test("gives them on a plan of full size as well", () => {
    const big = bigPlan(60, 5, 8, 400);
    const { columns } = sweepRuns(big);
    for (const kits of [1, 2, 9, 40, 41, 120, 333, 400]) {
      const run = plainRun(big, kits, plainBoards);
      expect([columns.spent[kits - 1], columns.used[kits - 1]]).toEqual([run.spent, run.used]);
    }
  });

  test("the next kit costs the difference of two runs, at the last size too", () => {
    const made = bigPlan(5, 2, 3, 20);
    const { columns } = sweepRuns(made);
    for (const kits of [1, 7, 20]) {
      const [now, more] = [plainRun(made, kits), plainRun(made, kits + 1)];
      expect(Number(columns.nextKitUsed[kits - 1])).toBeCloseTo(Number(more.used) - Number(now.used), 9);
    }
  });

  test("the same plan gives the same bytes, whatever was reckoned in between", () => {
    const made = frozen(bigPlan(20, 3, 4, 60));
    const first = JSON.stringify(sweepRuns(made));
    sweepRuns(bigPlan(3, 1, 1, 10));
    expect(JSON.stringify(sweepRuns(made))).toBe(first);
  });

  test("says which line keeps a column unknown and offers the rest under its label", () => {
    const made = plan({
      packing: [{ id: "bag", name: "Bag", editions: null, costPerKit: "1.50" }],
      parts: [part({ id: "led", offers: [] })],
    });
    const swept = sweepRuns(made);
    expect(swept.columns.used[9]).toBeNull();
    expect(swept.without?.used[9]).toBe("15");
    expect(swept.needs).toEqual([
      { code: "unpriced-part", at: [{ part: "led" }], page: "offers" },
      { code: "no-price", at: [{ edition: "kit" }], page: "price" },
    ]);
    expect(swept.breakEven.known).toBe(false);
  });
});
