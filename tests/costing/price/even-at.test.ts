import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { grains, grainText, ONE } from "#src/costing/grains.ts";
import { evenAfterAt } from "#src/costing/price/even-after-at.ts";
import { evenAt, onlyEdition } from "#src/costing/price/even-at.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { priceStrip, pricesAround } from "#src/costing/price/price-strip.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { plainSplit } from "#tests/costing/plain-reckoning.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { completePlan } from "#tests/costing/random-plans.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { channel } from "./channels.ts";
import { D, plainKit } from "./plain-pricing.ts";
import { pricedPlan } from "./random-channels.ts";

vi.setConfig({ testTimeout: MANY_CASES });

describe("break-even over channels", () => {
  test("the plan's own channels: the figures of the sweep and of the run, to the last digit", () => {
    fc.assert(
      fc.property(completePlan, fc.integer({ min: 1, max: 25 }), (made, kits) => {
        const swept = sweepRuns(made);
        const context = priceContext(made, kits);
        const even = evenAt(priceContext(made), swept.columns.used);
        expect(even.profit).toEqual(swept.columns.profit);
        expect(even.crossings).toEqual(swept.breakEven.crossings.map(({ changes, ...rest }) => rest));
        expect([even.first, even.safe, even.upTo, even.marginOfSafety]).toEqual([
          swept.breakEven.first,
          swept.breakEven.safe,
          swept.breakEven.upTo,
          swept.breakEven.marginOfSafety,
        ]);
        const run = costRun(made, kits);
        expect(evenAfterAt(context)).toEqual(run.evenAfter);
        run.editions.forEach(({ id, kits: count }) => {
          if (count === 0) return;
          expect(yieldsAt(context, { edition: id, channel: null }).profit).toEqual(run.profit);
        });
      }),
      { numRuns: 25 },
    );
  });

  test("several channels and editions: brute force over every size and every number sold", () => {
    fc.assert(
      fc.property(pricedPlan, ({ made, channels, places }) => {
        const { columns } = sweepRuns(made);
        const context = priceContext({ ...made, channels });
        const even = evenAt(context, columns.used);
        const rate = new D(made.work.ratePerHour ?? 0);
        const each = made.editions.map(({ id, price }) => {
          const { kept, minutes } = plainKit(channels, id, new D(price ?? 0), places, null);
          return kept.minus(minutes.times(rate).div(60));
        });
        const brought = (sold: number) =>
          plainSplit(
            sold,
            made.editions.map(({ weight }) => weight),
          ).reduce((sum, count, index) => sum.plus(each[index]?.times(count) ?? 0), new D(0));
        const pays = columns.used.map((used, index) =>
          brought(index + 1)
            .minus(used ?? 0)
            .gte("-1e-24"),
        );
        expect([even.first, even.safe]).toEqual([
          pays.indexOf(true) < 0 ? null : pays.indexOf(true) + 1,
          pays.lastIndexOf(false) === pays.length - 1 ? null : pays.lastIndexOf(false) + 2,
        ]);
        const cost = new D(columns.used[made.run.kits - 1] ?? 0);
        let least = "none";
        for (let sold = made.run.kits; sold >= 0; sold -= 1) {
          if (brought(sold).minus(cost).gte("-1e-24")) least = sold.toString();
        }
        const after = evenAfterAt(context);
        expect(after.known ? after.value : "none").toBe(least);
      }),
      { numRuns: 150 },
    );
  });

  test("one edition alone has a sweep of its own", () => {
    const made = plan({
      run: { kits: 20, sweepTo: 30 },
      editions: [edition({ id: "full", price: "10" }), edition({ id: "bare", name: "Bare", price: "4" })],
      charges: [{ id: "c", name: "C", amount: "50", spreadOver: null }],
      packing: [{ id: "p", name: "P", editions: null, costPerKit: "1.50" }],
    });
    const first = (edition: string) => {
      const alone = onlyEdition(made, edition);
      return evenAt(priceContext({ ...alone, channels: [channel()] }), sweepRuns(alone).columns.used).first;
    };
    // 50 ÷ 8.50 = 5.88…; 50 ÷ 2.50 = 20; nine kits are five and four: 42.50 + 10.00, eight bring 44.00.
    expect([first("full"), first("bare")]).toEqual([6, 20]);
    expect(evenAt(priceContext({ ...made, channels: [channel()] }), sweepRuns(made).columns.used).first).toBe(
      9,
    );
  });

  test("where nothing is known nothing is said", () => {
    const made = plan({ editions: [edition()] });
    expect(evenAt(priceContext({ ...made, channels: [channel()] }), ["1", "2"])).toMatchObject({
      known: false,
      upTo: 0,
      first: null,
    });
    expect(evenAfterAt(priceContext({ ...made, channels: [channel()] }))).toMatchObject({
      needs: [{ code: "no-price" }],
    });
  });
});

describe("the strip of prices", () => {
  test.each([
    ["34", ["29", "31", "33", "34", "35", "37", "39"]],
    ["20.5", ["18", "19", "20", "20.5", "21", "22", "23"]],
    ["0.02", ["0.01", "0.02", "0.03", "0.05", "0.07"]],
    ["149", ["124", "134", "144", "149", "154", "164", "174"]],
  ])("around %s", (price, expected) => {
    expect(pricesAround(grains(price), ONE / 100n).map(grainText)).toEqual(expected);
  });

  test("each price leaves and pays after what it would if it were asked", () => {
    const made = plan({
      run: { kits: 20, sweepTo: 20 },
      editions: [edition({ price: "10" })],
      charges: [{ id: "c", name: "C", amount: "100", spreadOver: null }],
    });
    const strip = priceStrip(
      priceContext({ ...made, channels: [channel()] }),
      { edition: "kit", channel: null },
      "10",
      ["4", "8", "10"],
    );
    // 100 ÷ 20 = 5.00 a kit; 100 ÷ 8 = 12.5.
    expect(strip).toMatchObject([
      {
        price: "4",
        asked: false,
        left: { value: "-1" },
        evenAfter: { known: false, needs: [{ code: "not-even" }] },
      },
      { price: "8", asked: false, left: { value: "3" }, evenAfter: { value: "13" } },
      { price: "10", asked: true, left: { value: "5" }, evenAfter: { value: "10" } },
    ]);
  });
});
