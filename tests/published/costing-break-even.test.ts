import { describe, expect, test } from "vitest";
import { marginOfSafety } from "#src/costing/break-even.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { profitBeforeTax, runsForProfit } from "#src/costing/target-profit.ts";
import { edition, plan } from "#tests/costing/plans.ts";

/** Cost-volume-profit examples as plans: fixed cost is a one-off charge, variable cost is packing. */
function cvpPlan(
  fixed: number,
  products: readonly { price: number; variable: number; mix: number }[],
  sweepTo: number,
) {
  return plan({
    run: { kits: sweepTo, sweepTo },
    editions: products.map(({ price, mix }, index) =>
      edition({ id: `e${index}`, name: `E${index}`, weight: mix, price: price.toString() }),
    ),
    packing: products.map(({ variable }, index) => ({
      id: `v${index}`,
      name: "Variable",
      editions: [`e${index}`],
      costPerKit: variable.toString(),
    })),
    charges: [{ id: "fixed", name: "Fixed", amount: fixed.toString(), spreadOver: null }],
  });
}

const single = (fixed: number, price: number, variable: number, sweepTo: number) =>
  sweepRuns(cvpPlan(fixed, [{ price, variable, mix: 1 }], sweepTo));

describe("break-even of open textbooks and worked answers", () => {
  // Accounting 211, Penn State (Pressbooks), 7.2 Breakeven Analysis, introductory example
  // (adapts OpenStax, Principles of Accounting, vol. 2, ch. 3.2): fixed 20 000, price 400, variable 250.
  test("Penn State Accounting 211, 7.2: 133.33 units, so 134; contribution 150", () => {
    const swept = single(20_000, 400, 250, 200);
    expect([swept.breakEven.first, swept.breakEven.safe]).toEqual([134, 134]);
    expect(swept.columns.profit[0]).toBe("-19850");
    expect(swept.breakEven.crossings).toMatchObject([
      { kits: 134, way: "up", profitBefore: "-50", profit: "100" },
    ]);
  });

  // Heisinger and Hoyle, Accounting for Managers (open textbook), snowboard company.
  test("Accounting for Managers, snowboard company: 500 units; 800 for a profit of 30 000", () => {
    const swept = single(50_000, 250, 150, 900);
    expect(swept.breakEven.first).toBe(500);
    expect(runsForProfit(swept, "30000")).toEqual({ first: 800, safe: 800 });
  });

  // Garrison-style exercise 6-14, solution (secondary source, arithmetic rechecked).
  test("stove exercise: 6 000 units; profit 36 000 at 8 000 and 22 000 at 10 000 for 45", () => {
    const swept = single(108_000, 50, 32, 8000);
    expect(swept.breakEven.first).toBe(6000);
    expect(swept.columns.profit[7999]).toBe("36000");
    const proposed = costRun(cvpPlan(108_000, [{ price: 45, variable: 32, mix: 1 }], 1), 10_000);
    expect(proposed.profit).toEqual({ known: true, value: "22000" });
  });

  // Blackmon Manufacturing, equation method (secondary source, arithmetic rechecked).
  test("Blackmon: fixed 189 000 and 141 000, price 50, variable 14 and 6: 11 000 units", () => {
    expect(single(330_000, 50, 20, 11_100).breakEven.first).toBe(11_000);
  });

  // Fundamental Accounting Principles, 22nd ed., ch. 21, problem 7B: composite units of 6, 4 and 2.
  test("Fundamental Accounting Principles, 22nd ed., 21-7B: 11 250, 7 500 and 3 750 of a mix 6:4:2", () => {
    const products = [
      { price: 40, variable: 30, mix: 6 },
      { price: 30, variable: 15, mix: 4 },
      { price: 20, variable: 8, mix: 2 },
    ];
    const made = cvpPlan(270_000, products, 1);
    expect(costRun(made, 22_500).profit).toEqual({ known: true, value: "0" });
    expect(costRun(made, 22_500).editions.map(({ kits }) => kits)).toEqual([11_250, 7500, 3750]);
    expect(costRun(made, 22_499).profit).toMatchObject({ known: true, value: "-10" });
  });

  // Boise Company exercise, answers recomputed: mix 30, 50, 20 %, weighted contribution 195.
  test("Boise: 17 000 units in all, 18 200 for a profit of 234 000", () => {
    const products = [
      { price: 250, variable: 100, mix: 3 },
      { price: 350, variable: 150, mix: 5 },
      { price: 500, variable: 250, mix: 2 },
    ];
    const made = cvpPlan(3_315_000, products, 1);
    expect(costRun(made, 17_000).profit).toEqual({ known: true, value: "0" });
    expect(costRun(made, 17_000).editions.map(({ kits }) => kits)).toEqual([5100, 8500, 3400]);
    expect(costRun(made, 18_200).profit).toEqual({ known: true, value: "234000" });
  });

  // Texas-Q grills, mix 4:9:1 (secondary source). Its three numbers, each rounded down, add to 31 252 and
  // leave fixed cost uncovered; whole kits in that mix pay from 31 254 on.
  test("Texas-Q grills: rounding each product down would leave a loss that whole kits by the mix do not hide", () => {
    const products = [
      { price: 86, variable: 49, mix: 4 },
      { price: 199, variable: 125, mix: 9 },
      { price: 253, variable: 136, mix: 1 },
    ];
    const made = cvpPlan(2_078_310, products, 1);
    const profit = (kits: number) => {
      const figure = costRun(made, kits).profit;
      return figure.known ? Number(figure.value) : Number.NaN;
    };
    expect(profit(31_252)).toBeLessThan(0);
    expect(profit(31_253)).toBe(8930 * 37 + 20_091 * 74 + 2232 * 117 - 2_078_310);
    expect(profit(31_254)).toBeGreaterThanOrEqual(0);
  });

  // CMA/CIA-style questions with answers: 540 000 after 40 % tax is 900 000 before; 25 000 units.
  test("target profit after tax: 900 000 before tax, 25 000 units", () => {
    const before = profitBeforeTax("540000", "0.4");
    expect(before).toBe("900000");
    expect(costRun(cvpPlan(6_600_000, [{ price: 900, variable: 600, mix: 1 }], 1), 25_000).profit).toEqual({
      known: true,
      value: before,
    });
  });

  // The second of them prints three wrong answers: no gross-up, division by the tax rate, variable cost as margin.
  test("target profit after tax: 540 000 units, and not the three slips", () => {
    const before = profitBeforeTax("1188000", "0.4");
    expect(before).toBe("1980000");
    const units = (9_900_000 + Number(before)) / (40 - 18);
    expect(units).toBe(540_000);
    expect([20_160_000, 23_400_000, 26_400_000]).not.toContain(units * 40);
  });

  // Managerial accounting answer page: sales 5 000 000, break-even 4 000 000: 20 %.
  test("margin of safety: 20 %", () => {
    expect(marginOfSafety(5_000_000, 4_000_000)).toBe("0.2");
  });
});

describe("product cost sheets", () => {
  // Job 599, job-order cost sheet (secondary source, arithmetic rechecked): material 40 610, 1 147 hours
  // at 11, overhead 20 an hour, 3 100 units.
  test("job 599: labour 12 617, total 76 167, 24.57 a unit", () => {
    const made = plan({
      packing: [{ id: "material", name: "Material", editions: null, costPerKit: "13.1" }],
      work: {
        ratePerHour: "11",
        learningSlope: "1",
        kitsMadeBefore: 0,
        tasks: [
          {
            id: "job",
            name: "Job",
            editions: null,
            minutesPerKit: "0",
            setUpMinutes: (1147 * 60).toString(),
          },
        ],
      },
      charges: [{ id: "overhead", name: "Overhead", amount: (1147 * 20).toString(), spreadOver: null }],
    });
    const run = costRun(made, 3100);
    expect(run.work.cost).toEqual({ known: true, value: "12617" });
    expect(run.used).toEqual({ known: true, value: "76167" });
    expect(run.perKit.used).toEqual({ known: true, value: "24.57" });
  });

  // Barron's business dictionary, cost-plus pricing: fixed 300 000, variable 100 000, 50 000 units: 8 each.
  test("Barron's, cost-plus pricing: 8 a unit", () => {
    const made = plan({
      packing: [{ id: "variable", name: "Variable", editions: null, costPerKit: "2" }],
      charges: [{ id: "fixed", name: "Fixed", amount: "300000", spreadOver: null }],
    });
    expect(costRun(made, 50_000).perKit.used).toEqual({ known: true, value: "8" });
  });

  // Job Costing chapter, example 1, job 21: material 1 200, labour 1 300, direct expense 500, overhead 900.
  test("job 21: production cost 3 900, with administration 4 290", () => {
    const amounts = [600, 400, 200, 40 * 10, 50 * 15, 15 * 10, 500, 100, 500, 300, 390];
    const made = plan({
      charges: amounts.map((amount, index) => ({
        id: `c${index}`,
        name: "Cost",
        amount: amount.toString(),
        spreadOver: null,
      })),
    });
    expect(costRun(made, 1).used).toEqual({ known: true, value: "4290" });
    expect(costRun({ ...made, charges: made.charges.slice(0, 10) }, 1).used).toEqual({
      known: true,
      value: "3900",
    });
  });
});
