import { describe, expect, test } from "vitest";
import { boardsToOrder } from "#src/costing/boards-to-order.ts";
import { chanceOfEnough } from "#src/costing/chance-of-enough.ts";

describe("how many to start, and the binomial behind it", () => {
  // SciPy 1.17.1 documentation, scipy.stats.binomtest: 3 of 15 at p = 0.1, alternative greater.
  test("SciPy binomtest example: P(at least 3 of 15 at 0.1) is 0.184061069106391", () => {
    expect(Number(chanceOfEnough(3, 15, "0.1"))).toBeCloseTo(0.18406106910639114, 14);
  });

  // Tompkins et al., Facilities Planning, reject allowance problem of four castings (tutorial solution):
  // 4 good needed, each good with 0.9. With 4 poured, P(4 good) = 0.6561; with 5, P(loss) = 0.08146.
  test("Tompkins et al., Facilities Planning, four castings: chance of enough with 4 and with 5", () => {
    expect(chanceOfEnough(4, 4, "0.9")).toBe("0.6561");
    expect(1 - Number(chanceOfEnough(4, 5, "0.9"))).toBeCloseTo(0.08146, 5);
    // Profit 120 000 if enough, less 15 000 a casting: best with 5, and these expected profits.
    const profits = [4, 5, 6, 7, 8].map(
      (poured) => Number(chanceOfEnough(4, poured, "0.9")) * 120_000 - 15_000 * poured,
    );
    [18732.0, 35224.8, 28098.0, 14672.64, -51.798].forEach((printed, index) => {
      expect(profits[index]).toBeCloseTo(printed, 2);
    });
  });

  // No outside source: worked out apart from this code with exact fractions and SciPy.
  // Rows: good boards needed; columns: yield 0.8, 0.9, 0.95, 0.98, 0.99; confidence 0.95.
  test.each([
    [1, [2, 2, 1, 1, 1]],
    [5, [9, 7, 6, 6, 5]],
    [10, [16, 13, 12, 11, 11]],
    [20, [29, 25, 23, 22, 21]],
    [25, [36, 31, 28, 27, 26]],
    [50, [69, 60, 56, 53, 52]],
    [100, [135, 117, 109, 105, 103]],
  ])(
    "boards to order for %i good ones with 95 %% confidence (exact fractions, own computation)",
    (needed, expected) => {
      expect(
        ["0.8", "0.9", "0.95", "0.98", "0.99"].map((share) => boardsToOrder(needed, share, "0.95")),
      ).toEqual(expected);
    },
  );
});
