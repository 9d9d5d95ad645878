import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { figuresOf, reckoned, working, workingOf } from "#src/costing/working.ts";
import type { WorkingTree } from "#src/costing/working-tree.ts";
import { bigPlan } from "#tests/bench/big-plan.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { edition, frozen, offer, part, plan, quote, supplier } from "./plans.ts";
import { completePlan } from "./random-plans.ts";
import { redo } from "./redo-working.ts";

vi.setConfig({ testTimeout: MANY_CASES });

describe("working", () => {
  test("every figure of a run can be redone by hand from its lines", () => {
    fc.assert(
      fc.property(completePlan, fc.integer({ min: 1, max: 25 }), (made, kits) => {
        const context = reckoned(frozen(made), kits);
        for (const figure of figuresOf(context)) {
          const tree = workingOf(context, figure);
          expect(tree, figure).not.toBeNull();
          if (tree) redo(tree);
        }
      }),
      { numRuns: 20 },
    );
  });

  test("the same on a plan of full size", () => {
    const context = reckoned(bigPlan(30, 4, 6, 60), 57);
    const results = figuresOf(context).map((figure) => redo(workingOf(context, figure) as WorkingTree));
    expect(results.filter((sums) => sums > 0).length).toBe(results.length - 2);
  });

  test("ends in the very figure it explains", () => {
    const made = bigPlan(12, 3, 4, 80);
    const context = reckoned(made, 40);
    const { result } = context;
    const last = (figure: Parameters<typeof workingOf>[1]) => {
      const line = workingOf(context, figure)?.lines.find((one) => one.result);
      return line?.amount?.kind === "money" || line?.amount?.kind === "count" ? line.amount.value : null;
    };
    const known = (figure: typeof result.used) => (figure.known ? figure.value : null);
    expect(last("spent")).toBe(known(result.spent));
    expect(last("used")).toBe(known(result.used));
    expect(last("per-kit-used")).toBe(known(result.perKit.used));
    expect(last("profit")).toBe(known(result.profit));
    expect(last("earns-per-kit")).toBe(known(result.earnsPerKit));
    expect(last("earned-per-hour")).toBe(known(result.earnedPerHour));
    expect(last("left-over")).toBe(known(result.keptOnShelf));
    expect(last("edition:chip")).toBe(known(result.editions[2]?.perKit.used ?? result.used));
    expect(last("quote:lots")).toBe(known(result.boards.quotes[0]?.perBoard ?? result.used));
  });

  test("a line whose figure is not known says what it needs", () => {
    const made = plan({ parts: [part({ id: "led", offers: [] })] });
    const tree = working(made, 10, "per-kit-used");
    expect(tree?.lines.at(-1)?.amount).toEqual({
      kind: "not-known",
      needs: [{ code: "unpriced-part", at: [{ part: "led" }], page: "offers" }],
    });
  });

  test("how 735 comes about: need, spare, order, what buying up saves, the parcel", () => {
    const made = plan({
      run: { kits: 120, sweepTo: 120 },
      suppliers: [supplier({ id: "lumenhof", name: "Lumenhof", freight: { model: "flat", amount: "4.90" } })],
      parts: [
        part({
          id: "led",
          name: "LED, warm white",
          quantities: [{ edition: "kit", perKit: 6 }],
          spareRate: "0.02",
          offers: [
            offer({
              supplier: "lumenhof",
              minimumOrder: 100,
              orderMultiple: 100,
              breaks: [
                { quantity: 100, price: "0.118" },
                { quantity: 500, price: "0.094" },
                { quantity: 1000, price: "0.062" },
              ],
            }),
          ],
        }),
      ],
    });
    const lines = working(made, 120, "part:led")?.lines ?? [];
    const read = lines.map(({ sign, label, amount }) => [
      sign,
      label,
      amount && "value" in amount ? amount.value : null,
    ]);
    expect(read).toEqual([
      [null, "Full kit, 120 kits with 6 each", "720"],
      ["=", "Needed", "720"],
      ["+", "Spare, 2\u00a0% of 720 rounded up, at least 0", "15"],
      ["−", "From the shelf", "0"],
      ["=", "To buy", "735"],
      [null, "Ordered from Lumenhof", "1000"],
      ["×", "Price each from 1000", "0.062"],
      ["=", "Lumenhof charges", "62.00"],
      [null, "With its share of the parcel, by value", "66.9"],
      [null, "800 would cost", "75.20"],
      ["−", "1000 cost less by", "13.20"],
      ["=", "1000 cost; 265 stay on the shelf", "62.00"],
      [null, "Parts for the run, without freight", "62"],
      ["÷", "Kits in the run", "120"],
      ["=", "In one kit", "0.516666666666666666666667"],
    ]);
  });

  test("a crossing shows profit on both sides and what stands between", () => {
    const made = plan({
      editions: [edition({ price: "10" })],
      charges: [{ id: "photo", name: "Photographs", amount: "35", spreadOver: null }],
    });
    const tree = working(made, 10, "crossing:4");
    expect(tree && redo(tree)).toBe(2);
    expect(tree?.lines.filter(({ sign }) => sign === "=").map(({ label }) => label)).toEqual([
      "Loss",
      "No loss",
    ]);
    const known = working(made, 10, "first-even");
    expect(known?.title).toBe("First run without a loss: 4");
  });

  test("no such figure, no working", () => {
    const made = plan({
      boards: {
        needed: false,
        size: null,
        panelTerms: [],
        yield: "1",
        confidence: "0.9",
        quotes: [quote()],
        chosenQuote: null,
      },
    });
    expect(working(made, 10, "basket:tamsin")).toBeNull();
    expect(working(made, 10, "part:nothing")).toBeNull();
    expect(working(made, 10, "quote:quote")).not.toBeNull();
  });
});
