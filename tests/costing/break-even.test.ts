import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { preparePlan } from "#src/costing/prepare-plan.ts";
import { takingsFrom } from "#src/costing/price/takings.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { runsForProfit } from "#src/costing/target-profit.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { edition, offer, part, plan, quote } from "./plans.ts";
import { completePlan } from "./random-plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

/** Sizes at which a run pays, tried one after the other. */
function paying(made: Parameters<typeof costRun>[0]): boolean[] {
  return Array.from({ length: made.run.sweepTo }, (_, index) => {
    const { profit } = costRun(made, index + 1);
    return profit.known && !profit.value.startsWith("-");
  });
}

describe("break-even", () => {
  test("crossings, first and safe: brute force", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const pays = paying(made);
        const { breakEven } = sweepRuns(made);
        const turns = pays.flatMap((now, index) =>
          index > 0 && now !== pays[index - 1] ? [[index + 1, now ? "up" : "down"]] : [],
        );
        expect(breakEven.crossings.map(({ kits, way }) => [kits, way])).toEqual(turns);
        const first = pays.indexOf(true);
        expect(breakEven.first).toBe(first < 0 ? null : first + 1);
        const lastLoss = pays.lastIndexOf(false);
        expect(breakEven.safe).toBe(lastLoss === pays.length - 1 ? null : lastLoss + 2);
      }),
      { numRuns: 25 },
    );
  });

  test("a second lot of boards puts a run back at a loss, and is named as what stepped", () => {
    const made = plan({
      run: { kits: 40, sweepTo: 60 },
      editions: [edition({ price: "10" })],
      boards: {
        needed: true,
        size: null,
        panelTerms: [],
        yield: "1",
        confidence: "0.9",
        chosenQuote: null,
        quotes: [
          quote({ id: "lots", priceModel: "lots", breaks: [{ quantity: 30, price: "280" }], freight: "0" }),
        ],
      },
    });
    const { breakEven } = sweepRuns(made);
    expect(breakEven.crossings.map(({ kits, way }) => [kits, way])).toEqual([
      [28, "up"],
      [31, "down"],
      [56, "up"],
    ]);
    expect(breakEven.crossings[1]?.changes).toEqual([
      { what: "board-lots", quote: "lots", from: 30, to: 60 },
    ]);
    expect([breakEven.first, breakEven.safe, breakEven.marginOfSafety]).toEqual([28, 56, "-0.4"]);
  });

  test("none up to the end of the sweep", () => {
    const made = plan({
      run: { kits: 5, sweepTo: 20 },
      editions: [edition({ price: "1" })],
      charges: [{ id: "c", name: "C", amount: "100", spreadOver: null }],
    });
    expect(sweepRuns(made).breakEven).toEqual({
      known: true,
      crossings: [],
      first: null,
      safe: null,
      upTo: 20,
      marginOfSafety: null,
    });
  });

  test("ends where profit is no longer known: stock that runs out", () => {
    const made = plan({
      run: { kits: 5, sweepTo: 20 },
      editions: [edition({ price: "10" })],
      parts: [part({ onlyFromStock: true, offers: [offer({ stockShown: 12 })] })],
      charges: [{ id: "c", name: "C", amount: "45", spreadOver: null }],
    });
    const { breakEven, columns } = sweepRuns(made);
    expect([breakEven.first, breakEven.safe, breakEven.upTo]).toEqual([5, 5, 12]);
    expect([columns.used[11], columns.used[12]]).toEqual(["46.2", null]);
  });
});

describe("a run that is made, of which some sell", () => {
  test("the least number that pays: brute force over every number sold, by the mix", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const { columns } = sweepRuns(made);
        const prepared = preparePlan(made, 1);
        const weights = made.editions.map(({ weight }) => weight);
        for (let kits = 1; kits <= made.run.sweepTo; kits += 4) {
          const used = BigInt(
            (columns.used[kits - 1] ?? "0").replace(
              /^(-?\d+)\.?(\d*)$/,
              (_, whole, part) => whole + part.padEnd(24, "0"),
            ),
          );
          let least: number | null = null;
          for (let sold = kits; sold >= 0; sold -= 1) {
            if ((takingsFrom(prepared.takings.brings, splitKits(sold, weights)) ?? 0n) >= used) least = sold;
          }
          expect(columns.soldToPay[kits - 1]).toBe(least);
        }
      }),
      { numRuns: 25 },
    );
  });

  test("72 sold pay for a run of 120 that costs 1 793.65, when one keeps 25.19", () => {
    const made = plan({
      editions: [edition({ price: "25.19" })],
      charges: [{ id: "c", name: "All", amount: "1793.65", spreadOver: null }],
    });
    expect(costRun(made, 120).evenAfter).toEqual({ known: true, value: "72" });
    const even = plan({ ...made, editions: [edition({ price: "1793.65" })] });
    expect(costRun(even, 120).evenAfter).toEqual({ known: true, value: "1" });
    expect(sweepRuns(even).columns.soldToPay[9]).toBe(1);
    expect(costRun(made, 71).evenAfter).toMatchObject({ known: false, needs: [{ code: "not-even" }] });
  });
});

describe("a target profit", () => {
  test("the first run that reaches it, and from where every larger one does", () => {
    fc.assert(
      fc.property(completePlan, fc.integer({ min: -200, max: 300 }), (made, target) => {
        const swept = sweepRuns(made);
        const reaches = swept.columns.profit.map((profit) => Number(profit) >= target);
        fc.pre(swept.columns.profit.every((profit) => Math.abs(Number(profit) - target) > 1e-6));
        const [first, lastMiss] = [reaches.indexOf(true), reaches.lastIndexOf(false)];
        expect(runsForProfit(swept, target.toString())).toEqual({
          first: first < 0 ? null : first + 1,
          safe: lastMiss === reaches.length - 1 ? null : lastMiss + 2,
        });
      }),
      { numRuns: 25 },
    );
  });
});
