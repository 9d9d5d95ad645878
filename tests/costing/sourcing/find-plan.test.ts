import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findPlan } from "#src/costing/sourcing/find-plan.ts";
import { exactTotal, leftWorth } from "#src/costing/sourcing/held-plan.ts";
import { marketOf, narrowed } from "#src/costing/sourcing/market.ts";
import { EFFORT, type Effort } from "#src/costing/sourcing/search.ts";
import type { SourcingInput, SourcingLimits } from "#src/costing/sourcing/sourcing-input.ts";
import { type PlainPlan, plainBest } from "./plain-sourcing.ts";
import { sourcing } from "./random-sourcing.ts";

/** Nothing followed, everything parted; and the other way round. */
const PARTING: Effort = { dive: 1, wide: 0, narrow: 0, lines: 0 };
const FOLLOWING: Effort = { dive: 1, wide: 1e9, narrow: 1e9, lines: 1e9 };

function found(input: SourcingInput, limits: SourcingLimits = {}, effort = EFFORT): PlainPlan | null {
  const market = narrowed(marketOf(input), limits.without ?? [], limits.latestDays ?? null);
  const search = findPlan(
    market,
    { leastParcels: limits.leastParcels ?? 0, mostParcels: limits.mostParcels ?? 99, work: 1e6, effort },
    null,
  );
  expect(search.unsearched).toBe(Number.POSITIVE_INFINITY);
  if (search.best === null) return null;
  const { unbought, freightUnknown, used, ways } = search.best;
  return {
    ways: [...ways].map((way, part) => (way < 0 ? -1 : way - (market.first[part] ?? 0))),
    unbought,
    freightUnknown,
    used,
    total: exactTotal(market, search.best),
    left: leftWorth(market, ways),
  };
}

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
        expect(found(input)).toEqual(best);
        expect(found(input, {}, PARTING)).toEqual(best);
        expect(found(input, {}, FOLLOWING)).toEqual(best);
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
        expect(found(input, limit)).toEqual(plainBest(input, limit));
      }),
      { numRuns: 1500 },
    );
  });
});
