import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { cheapestOrder, type LadderTerms, prepareLadder } from "#src/costing/ladder.ts";
import { ladderProblems, quantityProblems } from "#src/costing/ladder-problems.ts";
import { ORDER_MOST } from "#src/costing/whole.ts";
import { MANY_CASES } from "#tests/support/slow.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const ANY = Number.POSITIVE_INFINITY;

const terms = (over: Partial<LadderTerms> = {}): LadderTerms => ({
  priceModel: "whole-order",
  currency: "EUR",
  breaks: [
    { quantity: 1, price: "0.10" },
    { quantity: 100, price: "0.07" },
  ],
  minimumOrder: 1,
  orderMultiple: 1,
  ...over,
});

const anyTerms = fc
  .record({
    quantities: fc.uniqueArray(fc.integer({ min: 1, max: 60 }), { minLength: 1, maxLength: 4 }),
    prices: fc.array(fc.integer({ min: 0, max: 400_000 }), { minLength: 4, maxLength: 4 }),
    minimumOrder: fc.integer({ min: 1, max: 30 }),
    orderMultiple: fc.constantFrom(1, 2, 3, 10),
    currency: fc.constantFrom("EUR", "JPY", "KWD"),
  })
  .map(({ quantities, prices, ...rest }) => ({
    ...rest,
    breaks: quantities
      .sort((a, b) => a - b)
      .map((quantity, index) => ({ quantity, price: ((prices[index] ?? 0) / 1e6).toFixed(6) })),
  }));

/** Millionths as whole numbers, rounded to the minor unit with halves up: the rule said once more. */
function toMinor(millionths: number, currency: string): number {
  const unit = { EUR: 10_000, JPY: 1_000_000, KWD: 1_000 }[currency] ?? 10_000;
  return Math.floor((millionths * 2 + unit) / (unit * 2));
}

const millionths = (price: string) => Math.round(Number(price) * 1e6);

function costAt({ breaks, currency, priceModel }: LadderTerms, quantity: number): number {
  if (priceModel === "whole-order") {
    const reached = breaks.filter((step) => step.quantity <= quantity).at(-1);
    return toMinor(millionths(reached?.price ?? "0") * quantity, currency);
  }
  let sum = 0;
  for (let piece = 1; piece <= quantity; piece += 1) {
    const slice = breaks.filter((step) => step.quantity <= piece).at(-1) ?? breaks[0];
    sum += millionths(slice?.price ?? "0");
  }
  return toMinor(sum, currency);
}

/** Every permitted quantity up to far beyond the last break, one after the other. */
function bruteForce(ladder: LadderTerms, need: number, cap: number) {
  const least = Math.max(need, ladder.minimumOrder, ladder.breaks[0]?.quantity ?? 1);
  let best: { quantity: number; cost: number } | null = null;
  for (let quantity = least; quantity <= Math.min(cap, 200); quantity += 1) {
    if (quantity % ladder.orderMultiple !== 0) continue;
    const cost = costAt(ladder, quantity);
    if (best === null || cost < best.cost) best = { quantity, cost };
  }
  return best;
}

/** All combinations of lots: how many of the first, then of the rest. */
function bruteLots(
  ladder: LadderTerms,
  need: number,
  cap: number,
): { quantity: number; cost: number } | null {
  let best: { quantity: number; cost: number } | null = null;
  const least = Math.max(need, ladder.minimumOrder);
  const walk = (index: number, held: number, cost: number): void => {
    if (held > cap) return;
    if (held >= least) {
      if (best === null || cost < best.cost || (cost === best.cost && held < best.quantity)) {
        best = { quantity: held, cost };
      }
    }
    if (held >= least + 60) return;
    for (let lot = index; lot < ladder.breaks.length; lot += 1) {
      const { quantity = 1, price = "0" } = ladder.breaks[lot] ?? {};
      walk(lot, held + quantity, cost + toMinor(millionths(price), ladder.currency));
    }
  };
  walk(0, 0, 0);
  return best;
}

describe("the order quantity", () => {
  test("buys up past the need when the next break costs less: 100 instead of 84", () => {
    const ladder = prepareLadder(
      terms({
        breaks: [
          { quantity: 1, price: "0.10" },
          { quantity: 100, price: "0.065" },
        ],
      }),
      ANY,
      1,
    );
    expect(cheapestOrder(ladder, 84)).toEqual({ quantity: 100, cost: 650, tier: 1 });
  });

  test("on a tie the smaller order", () => {
    const ladder = prepareLadder(
      terms({
        breaks: [
          { quantity: 1, price: "0.10" },
          { quantity: 100, price: "0.08" },
        ],
      }),
      ANY,
      1,
    );
    expect(cheapestOrder(ladder, 80)?.quantity).toBe(80);
    expect(cheapestOrder(ladder, 81)?.quantity).toBe(100);
  });

  test.each(["whole-order", "by-slice"] as const)("%s: brute force over every quantity", (priceModel) => {
    fc.assert(
      fc.property(
        anyTerms,
        fc.integer({ min: 1, max: 80 }),
        fc.option(fc.integer({ min: 1, max: 90 })),
        (some, need, stock) => {
          const ladder = { ...some, priceModel };
          const cap = stock ?? ANY;
          const found = cheapestOrder(prepareLadder(ladder, cap, need), need);
          const best = bruteForce(ladder, need, cap);
          expect(found && { quantity: found.quantity, cost: found.cost }).toEqual(best);
        },
      ),
      { numRuns: 400 },
    );
  });

  test("lots: brute force over every combination, with and without a limit of stock", () => {
    const lots = fc
      .record({
        quantities: fc.uniqueArray(fc.integer({ min: 2, max: 25 }), { minLength: 1, maxLength: 3 }),
        prices: fc.array(fc.integer({ min: 0, max: 3000 }), { minLength: 3, maxLength: 3 }),
        minimumOrder: fc.integer({ min: 1, max: 12 }),
      })
      .map(({ quantities, prices, minimumOrder }) =>
        terms({
          priceModel: "lots",
          minimumOrder,
          breaks: quantities.map((quantity, index) => ({
            quantity,
            price: ((prices[index] ?? 0) / 100).toFixed(2),
          })),
        }),
      );
    fc.assert(
      fc.property(
        lots,
        fc.integer({ min: 1, max: 45 }),
        fc.option(fc.integer({ min: 1, max: 60 })),
        (ladder, need, stock) => {
          const cap = stock ?? ANY;
          const prepared = prepareLadder(ladder, cap, need);
          const found = cheapestOrder(prepared, need);
          expect(found && { quantity: found.quantity, cost: found.cost }).toEqual(
            bruteLots(ladder, need, cap),
          );
          if (found === null) return;
          const sorted = ladder.breaks.toSorted((a, b) => a.quantity - b.quantity);
          const counts = prepared.lots?.taken(Math.max(need, ladder.minimumOrder)) ?? [];
          expect(counts.reduce((sum, count, lot) => sum + count * (sorted[lot]?.quantity ?? 0), 0)).toBe(
            found.quantity,
          );
        },
      ),
      { numRuns: 300 },
    );
  });

  test("lots: on a tie those that hold less, with a limit of stock as well", () => {
    const breaks = [6, 10, 14].map((quantity) => ({ quantity, price: "5.00" }));
    const ladder = terms({ priceModel: "lots", breaks });
    for (const cap of [ANY, 60]) {
      expect(cheapestOrder(prepareLadder(ladder, cap, 30), 5)).toMatchObject({ quantity: 6, cost: 500 });
      expect(cheapestOrder(prepareLadder(ladder, cap, 30), 15)).toMatchObject({ quantity: 16, cost: 1000 });
    }
  });

  test("lots: a large number is the same whether it is looked up or reduced by whole lots", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 400, max: 900 }),
        fc.uniqueArray(fc.integer({ min: 3, max: 17 }), { minLength: 2, maxLength: 3 }),
        (need, sizes) => {
          const breaks = sizes.map((quantity, index) => ({
            quantity,
            price: (quantity * 0.11 + index * 0.37).toFixed(2),
          }));
          const ladder = terms({ priceModel: "lots", breaks });
          const reduced = cheapestOrder(prepareLadder(ladder, ANY, need), need);
          const exactly = cheapestOrder(prepareLadder(ladder, 10_000, need), need);
          expect(reduced).toEqual(exactly);
        },
      ),
      { numRuns: 60 },
    );
  });

  test("never costs less for more pieces: what the choice between offers relies on", () => {
    fc.assert(
      fc.property(anyTerms, fc.constantFrom("whole-order", "by-slice", "lots"), (some, priceModel) => {
        const ladder = prepareLadder(
          { ...some, orderMultiple: 1, priceModel: priceModel as LadderTerms["priceModel"] },
          ANY,
          120,
        );
        for (let need = 2; need <= 120; need += 1) {
          expect(cheapestOrder(ladder, need)?.cost).toBeGreaterThanOrEqual(
            cheapestOrder(ladder, need - 1)?.cost ?? ANY,
          );
        }
      }),
      { numRuns: 60 },
    );
  });

  test("is exact where price times quantity is beyond an ordinary number's whole numbers", () => {
    // 8 765.432109 × 1 234 567 is 10 821 513 213.511… : more than 2^53 millionths.
    const dear = terms({ breaks: [{ quantity: 1, price: "8765.432109" }] });
    const exactly = (8_765_432_109n * 1_234_567n + 5_000n) / 10_000n;
    expect(cheapestOrder(prepareLadder(dear, ANY, 1), 1_234_567)?.cost).toBe(Number(exactly));
  });

  test("an order beyond the bound is Infinity, never a wrong sum", () => {
    const dear = terms({ breaks: [{ quantity: 1, price: "999999999999" }] });
    expect(cheapestOrder(prepareLadder(dear, ANY, 1), 1000)?.cost).toBe(ANY);
    const justUnder = terms({ breaks: [{ quantity: 1, price: "10995116277.76" }] });
    expect(cheapestOrder(prepareLadder(justUnder, ANY, 1), 1)?.cost).toBe(ORDER_MOST);
  });
});

describe("ladderProblems", () => {
  const codes = (over: Partial<LadderTerms>) =>
    ladderProblems(terms(over)).map(({ code, at, refused }) => [code, at, refused]);

  test("a sound ladder has none", () => {
    expect(ladderProblems(terms())).toEqual([]);
  });

  test("quantities that repeat are refused at the second", () => {
    const breaks = [
      { quantity: 1, price: "0.1" },
      { quantity: 10, price: "0.09" },
      { quantity: 10, price: "0.08" },
    ];
    expect(codes({ breaks })).toEqual([["quantity-repeats", 2, true]]);
    expect(quantityProblems(terms({ breaks }))[0]?.with).toBe(1);
  });

  test("a break below the minimum order is refused; in lots it is not, since lots add up", () => {
    expect(codes({ minimumOrder: 25 })).toEqual([["break-below-minimum", 0, true]]);
    expect(codes({ minimumOrder: 25, priceModel: "lots" })).toEqual([]);
  });

  test("quantities out of order are refused, and a lot that is no multiple", () => {
    const breaks = [
      { quantity: 100, price: "0.07" },
      { quantity: 10, price: "0.1" },
    ];
    expect(codes({ breaks })).toEqual([["not-ascending", 1, true]]);
    expect(codes({ priceModel: "lots", orderMultiple: 10, breaks: [{ quantity: 25, price: "3" }] })).toEqual([
      ["lot-not-multiple", 0, true],
    ]);
  });

  test("a price that rises is only a caution; in lots the price per piece counts", () => {
    const rising = [
      { quantity: 1, price: "0.1" },
      { quantity: 10, price: "0.2" },
    ];
    expect(codes({ breaks: rising })).toEqual([["price-rises", 1, false]]);
    expect(codes({ priceModel: "lots", breaks: rising })).toEqual([]);
  });
});
