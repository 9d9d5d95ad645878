import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Effort } from "#src/costing/sourcing/search.ts";
import type { SourcingLimits } from "#src/costing/sourcing/sourcing-input.ts";
import { foundPlan } from "./found-plan.ts";
import { plainBest } from "./plain-sourcing.ts";
import { sourcing } from "./random-sourcing.ts";

/** Nothing followed, everything parted; and the other way round. */
const PARTING: Effort = { dive: 1, wide: 0, narrow: 0, lines: 0 };
const FOLLOWING: Effort = { dive: 1, wide: 1e9, narrow: 1e9, lines: 1e9 };

const small = { suppliers: 3, parts: 4, ways: 4 };

describe("the best plan is the best of all choices, ties included", () => {
  const cases = [
    { name: "large sums", cost: 9000, gaps: false },
    { name: "small sums, where rounding decides", cost: 40, gaps: false },
    { name: "tiny sums, full of ties", cost: 3, gaps: false },
    { name: "refusals, unknown freight and weights", cost: 900, gaps: true },
    { name: "the same with ties", cost: 6, gaps: true },
  ];
  test.each(cases)("$name", (sizes) => {
    fc.assert(
      fc.property(sourcing({ ...small, ...sizes }), (input) => {
        const best = plainBest(input);
        expect(foundPlan(input)).toEqual(best);
        expect(foundPlan(input, {}, PARTING)).toEqual(best);
        expect(foundPlan(input, {}, FOLLOWING)).toEqual(best);
      }),
      { numRuns: 1500 },
    );
  });
});

describe("limits", () => {
  const limits: fc.Arbitrary<SourcingLimits> = fc.record({
    without: fc.subarray([0, 1, 2], { maxLength: 1 }),
    latestDays: fc.option(fc.nat({ max: 4 })),
    leastParcels: fc.nat({ max: 3 }),
    mostParcels: fc.integer({ min: 1, max: 3 }),
  });
  test.each([900, 6])("are kept at least cost, sums up to %i", (cost) => {
    fc.assert(
      fc.property(sourcing({ ...small, cost, gaps: true }), limits, (input, limit) => {
        expect(foundPlan(input, limit)).toEqual(plainBest(input, limit));
      }),
      { numRuns: 1500 },
    );
  });
});
