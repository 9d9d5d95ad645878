import fc from "fast-check";
import { expect, test, vi } from "vitest";
import type { SourcingInput } from "#src/costing/sourcing/sourcing-input.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { linearProgram } from "./as-linear-program.ts";
import { foundPlan } from "./found-plan.ts";
import { plainPlan } from "./plain-sourcing.ts";
import { sourcing } from "./random-sourcing.ts";
import { glpk, highs, type Solver } from "./solvers.ts";

vi.setConfig({ testTimeout: 3 * MANY_CASES });

/** Hundredths of the plan's currency. */
const near = (grains: bigint) => Number(grains) / 1e22;

/** A general solver's optimum is ours to the cent, and its plan costs, worked out exactly, what ours does. */
function agrees(input: SourcingInput, solve: Solver): void {
  const own = foundPlan(input);
  const solved = solve(linearProgram(input));
  if (own === null || own.unbought > 0) {
    expect(solved.objective).toBeNull();
    return;
  }
  expect(Math.abs((solved.objective ?? Number.NaN) - near(own.total))).toBeLessThan(0.01);
  const ways = input.parts.map(({ ways: list }, part) =>
    list.findIndex((_, way) => solved.chosen(`x_${part}_${way}`)),
  );
  const plan = plainPlan(input, ways);
  expect(near((plan?.total ?? 0n) - own.total)).toBeCloseTo(0, 6);
}

const sizes = { suppliers: 3, parts: 6, ways: 4, gaps: false, wholePercent: true, refusals: true };

test("HiGHS gives the same total on 5 000 random statements", async () => {
  const solve = await highs();
  fc.assert(
    fc.property(
      fc.constantFrom(40, 900, 2000).chain((cost) => sourcing({ ...sizes, cost })),
      (input) => agrees(input, solve),
    ),
    { numRuns: 5000 },
  );
});

test("HiGHS gives the same total on 60 larger ones, with parts by the dozen", async () => {
  const solve = await highs();
  const large = { ...sizes, suppliers: 5, parts: 24, partsLeast: 12, ways: 5 };
  fc.assert(
    fc.property(
      fc.constantFrom(40, 900, 2000).chain((cost) => sourcing({ ...large, cost })),
      (input) => agrees(input, solve),
    ),
    { numRuns: Number(process.env.RUNS ?? 60) },
  );
});

test("GLPK gives the same total on 400 random statements", async () => {
  const solve = await glpk();
  fc.assert(
    fc.property(
      fc.constantFrom(40, 900, 2000).chain((cost) => sourcing({ ...sizes, cost })),
      (input) => agrees(input, solve),
    ),
    { numRuns: 400 },
  );
});
