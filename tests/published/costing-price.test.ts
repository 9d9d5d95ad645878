import { describe, expect, test } from "vitest";
import type { Figure } from "#src/costing/figure.ts";
import type { Aim } from "#src/costing/price/aims.ts";
import { channelTable } from "#src/costing/price/channel-table.ts";
import { evenAt } from "#src/costing/price/even-at.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { priceForAim } from "#src/costing/price/price-for-aim.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import { profitAfterTax } from "#src/costing/target-profit.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { channel } from "#tests/costing/price/channels.ts";

const SCOPE = { edition: "e0", channel: null };

interface Product {
  price?: number;
  variable: number;
  mix: number;
}

/** A run with a fixed cost and products with variable costs, sold where nothing is taken off. */
function made(
  fixed: string,
  kits: number,
  products: readonly Product[] = [{ variable: 0, mix: 1 }],
  channels: PlanChannel[] = [channel()],
) {
  const run = plan({
    run: { kits, sweepTo: 1 },
    editions: products.map(({ price, mix }, index) =>
      edition({ id: `e${index}`, name: `E${index}`, weight: mix, price: price?.toString() ?? null }),
    ),
    packing: products.map(({ variable }, index) => ({
      id: `v${index}`,
      name: "Variable",
      editions: [`e${index}`],
      costPerKit: variable.toString(),
    })),
    charges: [{ id: "fixed", name: "Fixed", amount: fixed, spreadOver: null }],
  });
  return priceContext({ ...run, channels });
}

function priceFor(context: ReturnType<typeof made>, aim: Aim): string | null {
  const answer = priceForAim(context, SCOPE, aim);
  return answer.found ? answer.price : null;
}

const share = (figure: Figure, places: number) =>
  figure.known ? Number(figure.value).toFixed(places) : null;

describe("margin and mark-up", () => {
  // Job Costing chapter (Malaysian accounting text), example 2, job 21: cost 4 290, 20 % both ways.
  test("job 21: the same 20 % are 5 148 as a mark-up and 5 362.50 as a margin", () => {
    expect(priceFor(made("4290", 1), { aim: "mark-up", rate: "0.2" })).toBe("5148");
    expect(priceFor(made("4290", 1), { aim: "margin", rate: "0.2" })).toBe("5362.5");
    expect(share(yieldsAt(made("4290", 1), SCOPE, "5148").profit, 0)).toBe("858");
    expect(share(yieldsAt(made("4290", 1), SCOPE, "5362.5").profit, 1)).toBe("1072.5");
  });

  // Barron's business dictionary, cost-plus pricing: 300 000 fixed, 2 a unit, 50 000 units, 20 % of sales.
  test("Barron's: a unit cost of 8 and a return of 20 % on sales ask 10", () => {
    expect(priceFor(made("300000", 50_000, [{ variable: 2, mix: 1 }]), { aim: "margin", rate: "0.2" })).toBe(
      "10",
    );
  });

  // Mark-up pages of two calculators (secondary sources, arithmetic rechecked).
  test("40 and a half are 60, a margin of 33.33 %; 29.99 and a quarter are 37.49", () => {
    expect(priceFor(made("40", 1), { aim: "mark-up", rate: "0.5" })).toBe("60");
    expect(share(yieldsAt(made("40", 1), SCOPE, "60").margin, 4)).toBe("0.3333");
    expect(priceFor(made("29.99", 1), { aim: "mark-up", rate: "0.25" })).toBe("37.49");
  });

  // Mark-up definition answer: cost 100, price 125.
  test("125 on 100: mark-up 25 %, margin 20 %", () => {
    const yields = yieldsAt(made("100", 1), SCOPE, "125");
    expect([share(yields.markUp, 2), share(yields.margin, 2)]).toEqual(["0.25", "0.20"]);
  });

  // Cost-plus pricing answer, mark-up from a desired return (inputs printed, arithmetic rechecked): 544 000
  // units, variable 32.64, fixed 4 944 960, return 23 % of 27 351 000.
  test("a return of 6 290 730 on 41.73 a unit is a mark-up of 27.71 %", () => {
    const context = made("4944960", 544_000, [{ variable: 32.64, mix: 1 }]);
    const price = priceFor(context, { aim: "profit", amount: "6290730", taxRate: null });
    // 41.73 + 11.563842… = 53.293842…, so 53.30 to the cent.
    expect(price).toBe("53.3");
    expect(share(yieldsAt(made("4173", 100), SCOPE, "53.293842").markUp, 4)).toBe("0.2771");
  });
});

describe("a price for a profit", () => {
  // Heisinger and Hoyle, Accounting for Managers, snowboard company; Blanchard, Orth and Menlo exercises: the
  // price of each is what its own units and target ask for.
  test.each([
    ["snowboard company", "50000", 150, 800, "30000", "250"],
    ["Blanchard", "400400", 112, 39_300, "700000", "140"],
    ["Orth", "1200000", 14.4, 99_840, "48000", "26.9"],
    ["Menlo", "216000", 12, 17_000, "90000", "30"],
  ])("%s", (_, fixed, variable, units, amount, price) => {
    const context = made(fixed, units, [{ variable, mix: 1 }]);
    expect(priceFor(context, { aim: "profit", amount, taxRate: null })).toBe(price);
  });

  // Heisinger and Hoyle, Blackmon and Blanchard: break-even units give back the price.
  test.each([
    ["snowboard company", "50000", 150, 500, "250"],
    ["Blackmon", "330000", 20, 11_000, "50"],
    ["Blanchard", "400400", 112, 14_300, "140"],
  ])("break-even of %s", (_, fixed, variable, units, price) => {
    expect(priceFor(made(fixed, units, [{ variable, mix: 1 }]), { aim: "run-even" })).toBe(price);
  });

  // CMA/CIA-style questions with answers: 540 000 and 1 188 000 after 40 % tax.
  test.each([
    ["6600000", 600, 25_000, "540000", "900"],
    ["9900000", 18, 540_000, "1188000", "40"],
  ])("after tax: fixed %s, variable %i, %i units, %s left", (fixed, variable, units, amount, price) => {
    const context = made(fixed, units, [{ variable, mix: 1 }]);
    expect(priceFor(context, { aim: "profit", amount, taxRate: "0.4" })).toBe(price);
  });

  test("the profit before tax leaves what was aimed at; a loss is not taxed", () => {
    expect([profitAfterTax("900000", "0.4"), profitAfterTax("1980000", "0.4")]).toEqual([
      "540000",
      "1188000",
    ]);
    expect(profitAfterTax("-100", "0.4")).toBe("-100");
  });

  // Fundamental Accounting Principles, 22nd ed., 21-7B, mix 6:4:2; Boise, mix 3:5:2 (answers recomputed).
  test("of one product in a mix, the others at their prices", () => {
    const composite = made("270000", 22_500, [
      { variable: 30, mix: 6 },
      { price: 30, variable: 15, mix: 4 },
      { price: 20, variable: 8, mix: 2 },
    ]);
    expect(priceFor(composite, { aim: "run-even" })).toBe("40");
    const boise = made("3315000", 18_200, [
      { variable: 100, mix: 3 },
      { price: 350, variable: 150, mix: 5 },
      { price: 500, variable: 250, mix: 2 },
    ]);
    expect(priceFor(boise, { aim: "profit", amount: "234000", taxRate: null })).toBe("250");
  });
});

describe("a sales mix as channels of one product", () => {
  const sold = (shares: readonly number[], margins: readonly number[]) =>
    shares.map((weight, index) =>
      channel({
        id: `c${index}`,
        weight,
        ownPrices: [{ edition: "e0", price: (margins[index] ?? 0).toString() }],
      }),
    );

  // Weighted-average margin answer: 30, 40 and 30 % with margins 44, 18 and 40, fixed 583 200.
  test("weighted margin 32.40, even at 18 000 units", () => {
    const context = made("583200", 18_000, undefined, sold([3, 4, 3], [44, 18, 40]));
    expect(share(yieldsAt(context, SCOPE).kept, 2)).toBe("32.40");
    const even = evenAt(context, new Array(18_100).fill("583200"));
    expect([even.first, even.safe]).toEqual([18_000, 18_000]);
  });

  // ABC sales-mix answer: fixed 35 000 over a weighted margin of 3.05 is 11 475.41. The source rounds to 11 475,
  // which leaves 1.25 uncovered; whole units pay from 11 476 on.
  test("11 475.41 units are 11 476, not 11 475", () => {
    const context = made("35000", 11_476, undefined, sold([25, 40, 35], [3.05, 3.05, 3.05]));
    const even = evenAt(context, new Array(11_500).fill("35000"));
    expect(even.first).toBe(11_476);
    expect(even.profit[11_474]).toBe("-1.25");
  });
});

describe("tax of a sale", () => {
  const order = (over: Partial<PlanChannel>, price: string) => {
    const context = made("1", 1, [{ price: Number(price), variable: 0, mix: 1 }], [channel(over)]);
    return channelTable(context, "e0").map(({ taxInside, taxOnTop, comesIn }) =>
      [taxInside, taxOnTop, comesIn].map((figure) => share(figure, 2)),
    )[0];
  };

  // VAT rates and fractions table: 17.5 % is 7/47 of the gross, 15 % is 3/23.
  test("VAT fractions: 17.50 in 117.50, 15.00 in 115.00", () => {
    expect(order({ taxRate: "0.175" }, "117.5")).toEqual(["17.50", "0.00", "100.00"]);
    expect(order({ taxRate: "0.15" }, "115")).toEqual(["15.00", "0.00", "100.00"]);
    // 7/47 of 34.00 is 5.0638…, 3/23 of it 4.4347….
    expect(order({ taxRate: "0.175" }, "34")?.[0]).toBe("5.06");
    expect(order({ taxRate: "0.15" }, "34")?.[0]).toBe("4.43");
  });

  // Textbook example quoted in a forum of accounting students: 704.88 at 20 % is 140.976, halves up 140.98.
  test("140.98 on 704.88", () => {
    const own = {
      taxRate: "0.2",
      taxStated: "on-top" as const,
      ownPrices: [{ edition: "e0", price: "704.88" }],
    };
    expect(order(own, "704.88")).toEqual(["0.00", "140.98", "704.88"]);
  });

  // Own arithmetic: three at 0.33 and 20 %. By line 0.07 three times, of the order 0.198.
  test("an order is taxed once, not kit by kit: 0.20, not 0.21", () => {
    const three = {
      taxRate: "0.2",
      taxStated: "on-top" as const,
      kitsPerOrder: "3",
      ownPrices: [{ edition: "e0", price: "0.33" }],
    };
    expect(order(three, "0.33")?.[1]).toBe("0.20");
  });
});
