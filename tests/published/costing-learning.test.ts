import { describe, expect, test } from "vitest";
import { FACTOR_PLACES, factorSums, unitFactors } from "#src/costing/learning.ts";
import { LEARNING_TABLE } from "./learning-table.ts";

const asNumber = (factor: bigint | undefined) => Number(factor ?? 0n) / 10 ** FACTOR_PLACES;

describe("learning curve, Crawford's unit model", () => {
  test.each(LEARNING_TABLE)(
    "Heizer and Render, Operations Management, table E.3, slope $slope",
    ({ slope, unit, total }) => {
      const factors = unitFactors(slope, 0, unit.length);
      const sums = factorSums(slope, 0, total.length);
      unit.forEach((printed, index) => {
        expect(Math.abs(asNumber(factors[index]) - printed), `unit ${index + 1}`).toBeLessThanOrEqual(0.0006);
      });
      total.forEach((printed, index) => {
        expect(Math.abs(asNumber(sums[index + 1]) - printed), `total ${index + 1}`).toBeLessThanOrEqual(
          0.0006,
        );
      });
    },
  );

  // learningCurve 1.1.2 for R (Boehmke and Freels, AFIT), tests/testthat/test_unit_models.R:
  // unit 100 takes 100 hours, slope 85 %: unit 125 takes 94.903.
  test("learningCurve 1.1.2, test_unit_models.R: unit 125 from unit 100 at 85 %", () => {
    const [at100] = unitFactors("0.85", 99, 1);
    const [at125] = unitFactors("0.85", 124, 1);
    expect((asNumber(at125) / asNumber(at100)) * 100).toBeCloseTo(94.903, 3);
  });

  // The same package, test_delta_error_models.R: unit time less cumulative-average time, first unit 50, slope 88.5 %.
  test("learningCurve 1.1.2, test_delta_error_models.R: unit model less cumulative average at 88.5 %", () => {
    const factors = unitFactors("0.885", 0, 5).map(asNumber);
    // Wright: the mean of the first n is 50 · n^b, so unit n takes 50 · (n · n^b − (n − 1) · (n − 1)^b).
    const wright = (n: number) => 50 * (n * (factors[n - 1] ?? 0) - (n - 1) * (factors[n - 2] ?? 0));
    [0, 5.75, 6.1, 6.11, 6.04].forEach((printed, index) => {
      const difference = 50 * (factors[index] ?? 0) - wright(index + 1);
      expect(Math.abs(difference - printed)).toBeLessThanOrEqual(0.006);
    });
  });
});
