import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { allocate } from "#src/costing/allocate.ts";
import { BOARDS_MOST, boardsToOrder } from "#src/costing/boards-to-order.ts";
import { chanceOfEnough } from "#src/costing/chance-of-enough.ts";
import { grainShare, grains, grainText } from "#src/costing/grains.ts";
import { factorSums, unitFactors } from "#src/costing/learning.ts";
import { needOf, spareOf } from "#src/costing/need.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import { divideBigHalfAway, divideHalfUp, divideUp, SAFE, upToMultiple } from "#src/costing/whole.ts";
import { addProduct, emptySum, sumOf } from "#src/costing/whole-sum.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { plainBoards, plainSplit } from "./plain-reckoning.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const D = Decimal.clone({ precision: 80, rounding: Decimal.ROUND_HALF_UP });

describe("allocate: largest remainder", () => {
  test("the parts add up to the whole, and none is a whole unit off its quota", () => {
    fc.assert(
      fc.property(
        fc.bigInt({ min: -(10n ** 30n), max: 10n ** 30n }),
        fc.array(fc.bigInt({ min: 0n, max: 10n ** 12n }), { minLength: 1, maxLength: 6 }),
        (amount, weights) => {
          const parts = allocate(amount, weights);
          expect(parts.reduce((a, b) => a + b, 0n)).toBe(amount);
          const total = weights.reduce((a, b) => a + b, 0n);
          if (total === 0n) return;
          parts.forEach((part, index) => {
            const off = part * total - amount * (weights[index] ?? 0n);
            expect(off < total && off > -total).toBe(true);
          });
        },
      ),
    );
  });

  test("ties go to the earlier; no weights at all split evenly", () => {
    expect(allocate(100n, [1n, 1n, 1n])).toEqual([34n, 33n, 33n]);
    expect(allocate(5n, [0n, 0n])).toEqual([3n, 2n]);
    expect(allocate(-100n, [1n, 1n, 1n])).toEqual([-34n, -33n, -33n]);
  });
});

describe("splitKits", () => {
  test("is the plain largest remainder, and adds up", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1100 }),
        fc.array(fc.integer({ min: 0, max: 40 }), { minLength: 1, maxLength: 5 }),
        (kits, weights) => {
          fc.pre(weights.some((weight) => weight > 0));
          const counts = splitKits(kits, weights);
          expect(counts).toEqual(plainSplit(kits, weights));
          expect(counts.reduce((a, b) => a + b, 0)).toBe(kits);
        },
      ),
    );
  });

  test("ties go to the earlier edition; without weights nobody gets any", () => {
    expect(splitKits(10, [1, 1, 1])).toEqual([4, 3, 3]);
    expect(splitKits(10, [0, 0])).toEqual([0, 0]);
  });
});

describe("need and spare", () => {
  const terms = (rate: string, leastSpare: number) => {
    const millionths = Math.round(Number(rate) * 1e6);
    return { spareWhole: Math.floor(millionths / 1e6), spareMillionths: millionths % 1e6, leastSpare };
  };

  test("2 % of 720 is 14.4, so 15; at least the least spare; nothing of what is not needed", () => {
    expect(spareOf(720, terms("0.02", 1))).toBe(15);
    expect(spareOf(720, terms("0.02", 20))).toBe(20);
    expect(spareOf(50, terms("0.02", 0))).toBe(1);
    expect(spareOf(0, terms("0.02", 20))).toBe(0);
    expect(needOf([60, 60], [6, 5])).toBe(660);
  });

  test("rounds up exactly where binary fractions would not", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 11_000_000 }),
        fc.integer({ min: 0, max: 999_999_999 }),
        (need, millionths) => {
          const exactly = (BigInt(millionths) * BigInt(need) + 999_999n) / 1_000_000n;
          const parts = { spareWhole: Math.floor(millionths / 1e6), spareMillionths: millionths % 1e6 };
          expect(spareOf(need, { ...parts, leastSpare: 0 })).toBe(Number(exactly));
        },
      ),
    );
  });
});

describe("boards to order", () => {
  test("is the smallest number by the binomial distribution, term by term", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 550_000, max: 1_000_000 }),
        fc.integer({ min: 0, max: 999_999 }),
        (required, good, sure) => {
          const [yieldShare, confidence] = [(good / 1e6).toFixed(6), (sure / 1e6).toFixed(6)];
          expect(boardsToOrder(required, yieldShare, confidence)).toBe(
            plainBoards(required, yieldShare, confidence),
          );
        },
      ),
      { numRuns: 150 },
    );
  });

  test("decides exactly where the chance equals the confidence", () => {
    // P(1 of 1 good) is 0.9; P(2 of 2) is 0.81; P(at least 1 of 2) is 0.99; P(at least 1 of 3 at 0.5) is 0.875.
    expect(boardsToOrder(1, "0.9", "0.9")).toBe(1);
    expect(boardsToOrder(1, "0.9", "0.900001")).toBe(2);
    expect(boardsToOrder(1, "0.9", "0.99")).toBe(2);
    expect(boardsToOrder(2, "0.9", "0.81")).toBe(2);
    expect(boardsToOrder(1, "0.5", "0.875")).toBe(3);
  });

  test("large runs do not underflow: 97 % of 5 000", () => {
    const boards = boardsToOrder(5000, "0.97", "0.95") ?? 0;
    // 0.97^5000 is far below the least number a computer's fraction holds.
    expect(Number(chanceOfEnough(5000, boards, "0.97"))).toBeGreaterThanOrEqual(0.95);
    expect(Number(chanceOfEnough(5000, boards - 1, "0.97"))).toBeLessThan(0.95);
  });

  test("a yield of 100 % needs none more, of 0 no number is enough, nor of far too little", () => {
    expect(boardsToOrder(120, "1", "0.99")).toBe(120);
    expect(boardsToOrder(120, "0", "0.5")).toBeNull();
    expect(boardsToOrder(BOARDS_MOST, "0.5", "0.5")).toBeNull();
    expect(boardsToOrder(0, "0", "0.9")).toBe(0);
    expect(boardsToOrder(7, "0.5", "0")).toBe(7);
  });
});

describe("learning", () => {
  test("each factor is i^(log2 slope) to 12 decimals, counted on from kits made before", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 999_999 }),
        fc.oneof(fc.integer({ min: 0, max: 300 }), fc.integer({ min: 0, max: 999_999_999 })),
        (slope, before) => {
          const text = (slope / 1e6).toFixed(6);
          const exponent = new D(text).ln().div(new D(2).ln());
          const factors = unitFactors(text, before, 3);
          factors.forEach((factor, index) => {
            const exactly = new D(before + index + 1).pow(exponent).times(1e12).toDecimalPlaces(0);
            expect(factor.toString()).toBe(exactly.toFixed());
          });
        },
      ),
      { numRuns: 60 },
    );
  });

  test("a thousand kits on, the running factor is still right to the last decimal", () => {
    const factors = unitFactors("0.87", 0, 1100);
    const exponent = new D("0.87").ln().div(new D(2).ln());
    for (const kit of [1, 2, 64, 500, 999, 1100]) {
      expect(factors[kit - 1]?.toString()).toBe(
        new D(kit).pow(exponent).times(1e12).toDecimalPlaces(0).toFixed(),
      );
    }
  });

  test("no learning counts kits; a slope of 0 leaves only the very first", () => {
    expect(factorSums("1", 5, 3)).toEqual([0n, 10n ** 12n, 2n * 10n ** 12n, 3n * 10n ** 12n]);
    expect(factorSums("0", 0, 3)).toEqual([0n, 10n ** 12n, 10n ** 12n, 10n ** 12n]);
    expect(factorSums("0", 1, 2)).toEqual([0n, 0n, 0n]);
  });
});

describe("exact sums and quotients", () => {
  test("text and grains go back and forth", () => {
    fc.assert(
      fc.property(fc.bigInt({ min: -(10n ** 40n), max: 10n ** 40n }), (value) => {
        expect(grains(grainText(value))).toBe(value);
        expect(new D(grainText(value)).times("1e24").toFixed()).toBe(value.toString());
      }),
    );
    expect([grainText(grains("34.50")), grainText(0n), grainText(-5n)]).toEqual([
      "34.5",
      "0",
      "-0.000000000000000000000005",
    ]);
  });

  test("a share is taken to the nearest grain, halves away from zero", () => {
    fc.assert(
      fc.property(
        fc.bigInt({ min: -(10n ** 30n), max: 10n ** 30n }),
        fc.bigInt({ min: 0n, max: 10n ** 9n }),
        fc.bigInt({ min: 1n, max: 10n ** 9n }),
        (value, part, whole) => {
          const exactly = new D(value.toString())
            .times(part.toString())
            .div(whole.toString())
            .toDecimalPlaces(0);
          expect(grainShare(value, part, whole).toString()).toBe(exactly.isZero() ? "0" : exactly.toFixed());
        },
      ),
    );
  });

  test("ordinary numbers divide exactly up to their stated bound", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: SAFE - 1 }),
        fc.oneof(fc.integer({ min: 1, max: 1_000_000 }), fc.integer({ min: 1, max: SAFE - 1 })),
        (a, b) => {
          const [big, by] = [BigInt(a), BigInt(b)];
          expect(divideHalfUp(a, b)).toBe(Number(divideBigHalfAway(big, by)));
          expect(divideUp(a, b)).toBe(Number((big + by - 1n) / by));
        },
      ),
      { numRuns: 2000 },
    );
    // The quotients nearest below a whole number are where floating point would first go wrong.
    for (const by of [2, 3, 10_000, 1_000_000]) {
      const a = Math.floor(SAFE / by) * by - 1;
      expect(divideUp(a, by) - 1).toBe(Number(BigInt(a) / BigInt(by)));
    }
    expect(upToMultiple(735, 100)).toBe(800);
    expect(upToMultiple(800, 100)).toBe(800);
  });

  test("a sum of products spills over into large numbers without loss", () => {
    const products = fc.array(
      fc.tuple(fc.integer({ min: 0, max: 1_000_000 }), fc.integer({ min: 0, max: 2 ** 48 })),
      { maxLength: 60 },
    );
    fc.assert(
      fc.property(products, (list) => {
        const sum = emptySum();
        let exactly = 0n;
        for (const [count, value] of list) {
          addProduct(sum, count, value, () => BigInt(value));
          exactly += BigInt(count) * BigInt(value);
        }
        expect(sumOf(sum)).toBe(exactly);
      }),
    );
  });
});
