import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { edition, offer, part, plan, quote, supplier } from "./plans.ts";
import { completePlan } from "./random-plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const D = Decimal.clone({ precision: 60 });

describe("step-downs", () => {
  test("are where used cost per kit falls by half a per cent and something but growth changed", () => {
    const made = plan({
      run: { kits: 10, sweepTo: 120 },
      suppliers: [supplier({ freight: { model: "flat", amount: "6" }, freeFreightFrom: "40" })],
      parts: [
        part({
          id: "led",
          offers: [
            offer({
              breaks: [
                { quantity: 1, price: "0.50" },
                { quantity: 60, price: "0.45" },
              ],
            }),
          ],
        }),
      ],
    });
    // 54 cost 27.00, as much as 60 at 0.45: from 55 on sixty are bought. 89 × 0.45 = 40.05 comes without freight.
    const steps = sweepRuns(made).stepDowns;
    expect(steps.map(({ kits, changes }) => [kits, changes])).toEqual([
      [55, [{ what: "break", part: "led", offer: "offer", from: 1, to: 60 }]],
      [89, [{ what: "free-freight", supplier: "tamsin", reached: true }]],
    ]);
    expect(steps[0]).toMatchObject({ perKit: "0.6" });
  });

  test("half a per cent exactly is a step, a hair less is none", () => {
    const priced = (price: string) =>
      plan({
        run: { kits: 10, sweepTo: 205 },
        parts: [
          part({
            offers: [
              offer({
                breaks: [
                  { quantity: 1, price: "1.00" },
                  { quantity: 200, price },
                ],
              }),
            ],
          }),
        ],
      });
    expect(sweepRuns(priced("0.995")).stepDowns.map(({ kits, fellBy }) => [kits, fellBy])).toEqual([
      [200, "0.005"],
    ]);
    expect(sweepRuns(priced("0.99505")).stepDowns).toEqual([]);
  });

  test("never where the fall is less, and always with a name", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const { stepDowns, columns } = sweepRuns(made);
        for (const { kits, perKit, fellBy, changes } of stepDowns) {
          const before = new D(columns.perKitUsed[kits - 2] ?? 0);
          expect(changes.length).toBeGreaterThan(0);
          expect(before.minus(perKit).eq(fellBy)).toBe(true);
          expect(new D(fellBy).gte(before.times("0.005").minus("1e-20"))).toBe(true);
        }
      }),
      { numRuns: 20 },
    );
  });
});

describe("sweet spots", () => {
  test("are record lows that no run up to a tenth larger beats: brute force", () => {
    fc.assert(
      fc.property(completePlan, (made) => {
        const perKit = (kits: number) => {
          const { used } = costRun(made, kits);
          return new D(used.known ? used.value : Number.NaN).div(kits);
        };
        const lows = Array.from({ length: 30 }, (_, index) => perKit(index + 1));
        const at = (kits: number) => lows[kits - 1] as Decimal;
        const expected: number[] = [];
        for (let kits = 1; kits <= made.run.sweepTo; kits += 1) {
          const record = lows.slice(0, kits - 1).every((low) => at(kits).lt(low));
          let beaten = false;
          for (let more = kits + 1; more <= Math.max(kits + 1, Math.floor((kits * 11) / 10)); more += 1)
            beaten ||= at(more).lt(at(kits));
          if (record && !beaten) expected.push(kits);
        }
        expect(sweepRuns(made).sweetSpots.map(({ kits }) => kits)).toEqual(expected);
      }),
      { numRuns: 20 },
    );
  });

  test("say what the next kit costs and what it sets off", () => {
    const made = plan({
      run: { kits: 60, sweepTo: 125 },
      editions: [edition()],
      boards: {
        needed: true,
        size: null,
        panelTerms: [],
        yield: "1",
        confidence: "0.9",
        chosenQuote: null,
        quotes: [
          quote({
            id: "lots",
            priceModel: "lots",
            breaks: [{ quantity: 60, price: "180" }],
            freight: "9.68",
          }),
        ],
      },
    });
    const { sweetSpots } = sweepRuns(made);
    expect(sweetSpots).toMatchObject([
      {
        kits: 60,
        perKit: "3.161333333333333333333333",
        nextKit: "180",
        changes: [{ what: "board-lots", quote: "lots", from: 60, to: 120 }],
      },
      { kits: 120, nextKit: "180" },
    ]);
  });
});
