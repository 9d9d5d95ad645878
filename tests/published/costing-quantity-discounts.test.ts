import { describe, expect, test } from "vitest";
import { cheapestOrder, costOf, type LadderTerms, prepareLadder, tierOf } from "#src/costing/ladder.ts";

/**
 * Quantity discounts of inventory texts. They add an order cost and a holding cost of which a kit's run
 * knows nothing, so the test adds them; what an order of Q costs, in both price models, is the ladder's.
 */
interface Example {
  fixed: number;
  holdingRate: number;
  demand: number;
  breaks: readonly (readonly [number, number])[];
}

function ladderOf({ breaks }: Example, priceModel: LadderTerms["priceModel"]) {
  const terms: LadderTerms = {
    priceModel,
    currency: "EUR",
    minimumOrder: 1,
    orderMultiple: 1,
    breaks: breaks.map(([quantity, price]) => ({ quantity, price: price.toString() })),
  };
  return prepareLadder(terms, Number.POSITIVE_INFINITY, 1);
}

function yearlyCost(example: Example, priceModel: LadderTerms["priceModel"], quantity: number): number {
  const ladder = ladderOf(example, priceModel);
  const order = costOf(ladder, tierOf(ladder, quantity), quantity) / 100;
  const { fixed, holdingRate, demand } = example;
  return (fixed * demand) / quantity + (order / quantity) * demand + (holdingRate * order) / 2;
}

function cheapest(example: Example, priceModel: LadderTerms["priceModel"], most: number): number {
  let best = 1;
  for (let quantity = 2; quantity <= most; quantity += 1) {
    if (yearlyCost(example, priceModel, quantity) < yearlyCost(example, priceModel, best)) best = quantity;
  }
  return best;
}

describe("whole-order price breaks (all-units discounts)", () => {
  // stockpyl (after Snyder and Shen, Fundamentals of Supply Chain Theory, 2nd ed., 2019), problem 3.12(a).
  const problem: Example = {
    fixed: 2250,
    holdingRate: 0.25,
    demand: 182_500,
    breaks: [
      [1, 1490],
      [1200, 1220],
      [2400, 1100],
    ],
  };

  test("Snyder and Shen, 2nd ed., problem 3.12(a): 2 400 at 201 251 093.75", () => {
    expect(cheapest(problem, "whole-order", 5000)).toBe(2400);
    expect(yearlyCost(problem, "whole-order", 2400)).toBeCloseTo(201_251_093.75, 2);
  });

  // stockpyl, example in the documentation of the function.
  test("stockpyl documentation, all-units example: 500 at 472 900", () => {
    const example: Example = {
      fixed: 200,
      holdingRate: 0.2,
      demand: 1000,
      breaks: [
        [1, 500],
        [200, 475],
        [500, 450],
      ],
    };
    expect(cheapest(example, "whole-order", 1200)).toBe(500);
    expect(yearlyCost(example, "whole-order", 500)).toBeCloseTo(472_900, 2);
  });

  // Worked exercise (secondary source, arithmetic rechecked): 800 a year, order 60, holding 30 %.
  test("exercise with five breaks: 100, 200 and 500 compared, 200 least", () => {
    const example: Example = {
      fixed: 60,
      holdingRate: 0.3,
      demand: 800,
      breaks: [
        [1, 53],
        [50, 51.5],
        [100, 49.5],
        [200, 48],
        [500, 47],
      ],
    };
    expect([100, 200, 500].map((quantity) => yearlyCost(example, "whole-order", quantity))).toEqual([
      40_822.5, 40_080, 41_221,
    ]);
    expect(cheapest(example, "whole-order", 700)).toBe(200);
  });

  // Exercise text, cost at 540 recomputed: price 20.95 from 500.
  test("exercise: 540 at the break from 500 cost 530 076.58 a year", () => {
    const example: Example = {
      fixed: 100,
      holdingRate: 0.3,
      demand: 25_000,
      breaks: [
        [1, 21.6],
        [500, 20.95],
        [1000, 20.9],
      ],
    };
    expect(yearlyCost(example, "whole-order", 540)).toBeCloseTo(530_076.58, 2);
  });

  test("and our own rule on the first: from 2 164 pieces on 2 400 cost less than what is needed", () => {
    const ladder = ladderOf(problem, "whole-order");
    // 2 400 × 1 100 = 2 640 000; 2 163 × 1 220 = 2 638 860 and 2 164 × 1 220 = 2 640 080.
    expect(cheapestOrder(ladder, 2163)?.quantity).toBe(2163);
    expect(cheapestOrder(ladder, 2164)?.quantity).toBe(2400);
  });
});

describe("prices by slice (incremental discounts)", () => {
  // In these texts the lower price holds for units beyond the break, so our break begins one unit later.
  // Snyder and Shen, 2nd ed., problem 3.12(b): Q 28 553.06, cost 208 678 591.68.
  test("Snyder and Shen, 2nd ed., problem 3.12(b): 28 553 at 208 678 591.68", () => {
    const example: Example = {
      fixed: 2250,
      holdingRate: 0.25,
      demand: 182_500,
      breaks: [
        [1, 1490],
        [1201, 1220],
        [2401, 1100],
      ],
    };
    expect(yearlyCost(example, "by-slice", 28_553)).toBeCloseTo(208_678_591.68, 1);
    expect(yearlyCost(example, "by-slice", 28_553)).toBeLessThan(yearlyCost(example, "by-slice", 28_400));
    expect(yearlyCost(example, "by-slice", 28_553)).toBeLessThan(yearlyCost(example, "by-slice", 28_700));
  });

  // stockpyl, example in the documentation of the function: Q 1 481.89, cost 222 762.81.
  test("stockpyl documentation, incremental example: 1 482 at 222 762.81", () => {
    const example: Example = {
      fixed: 150,
      holdingRate: 0.25,
      demand: 2400,
      breaks: [
        [1, 100],
        [301, 90],
        [601, 80],
      ],
    };
    expect(cheapest(example, "by-slice", 3000)).toBe(1482);
    expect(yearlyCost(example, "by-slice", 1482)).toBeCloseTo(222_762.81, 1);
  });
});
