import { ordersOfWay } from "#src/costing/sourcing/sale-market.ts";
import type { SourcingInput } from "#src/costing/sourcing/sourcing-input.ts";
import { type SourcingRuns, sourceRun, sourcingRuns } from "#src/costing/sourcing/sourcing-runs.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { linearProgram } from "#tests/costing/sourcing/as-linear-program.ts";
import { highs } from "#tests/costing/sourcing/solvers.ts";
import type { BenchRow } from "./bench-row.ts";
import { bigPlan } from "./big-plan.ts";
import { type SourcingPlan, sourcingPlan } from "./sourcing-plan.ts";

const TO = 1000;
/** Sizes HiGHS is asked for; its time for all sizes is reckoned from them. */
const SAMPLE = [2, 10, 40, 120, 500, 900];

interface Swept {
  processor: number;
  /** Hundredths of the plan's currency, by size; entry 0 is empty. */
  totals: number[];
  unproven: number;
  /** The widest gap that is left, as a share of the total. */
  gap: number;
  slowest: { kits: number; processor: number };
}

function processorOf<T>(work: () => T): { result: T; processor: number } {
  const used = process.cpuUsage();
  const result = work();
  const { user, system } = process.cpuUsage(used);
  return { result, processor: (user + system) / 1000 };
}

function sweptBy(plan: SourcingPlan, to: number): Swept {
  const needs = Array.from({ length: to }, (_, at) => plan.toBuy(at + 1));
  const runs = sourcingRuns(plan.suppliers, plan.parts);
  const swept: Swept = { processor: 0, totals: [0], unproven: 0, gap: 0, slowest: { kits: 0, processor: 0 } };
  needs.forEach((toBuy, at) => {
    const { result, processor } = processorOf(() => sourceRun(runs, toBuy));
    swept.processor += processor;
    swept.totals.push(result.best?.near ?? Number.NaN);
    if (result.unsearched < Number.POSITIVE_INFINITY) {
      swept.unproven += 1;
      swept.gap = Math.max(swept.gap, 1 - result.unsearched / result.bestScore);
    }
    if (processor > swept.slowest.processor) swept.slowest = { kits: at + 1, processor };
  });
  return swept;
}

/** One size stated as plain data, for the general solver. */
function statedFor(plan: SourcingPlan, kits: number): SourcingInput {
  const runs: SourcingRuns = sourcingRuns(plan.suppliers, plan.parts);
  sourceRun(runs, plan.toBuy(kits), 1);
  const { market, toBuy } = runs.sale;
  return {
    suppliers: plan.suppliers,
    parts: plan.parts.map(({ id, offers }, part) => ({
      id,
      toBuy: toBuy[part] ?? 0,
      coverable: 0,
      ways: offers.map((_, at) => ({ orders: ordersOfWay(runs.sale, (market.first[part] ?? 0) + at) })),
    })),
  };
}

/**
 * The joint choice of suppliers at every run size, 200 parts × 8 suppliers × 5 offers × 8 breaks under terms of every
 * kind: its time, HiGHS's for the same, the line-by-line sweep's, and how it grows. Processor time: other work on the
 * machine disturbs that less. Totals are compared with HiGHS's first.
 */
export async function run(): Promise<BenchRow[]> {
  const usual = sourcingPlan(200, 8, false);
  sweptBy(usual, 60);
  const swept = sweptBy(usual, TO);
  const hard = sweptBy(sourcingPlan(200, 8, true), TO);
  const plan = bigPlan(200, 5, 8, TO);
  for (let warm = 0; warm < 10; warm += 1) sweepRuns(plan);
  const lines = Math.min(...Array.from({ length: 9 }, () => processorOf(() => sweepRuns(plan)).processor));
  const solver = await general(usual, swept);
  const size = "200 parts × 8 suppliers × 5 offers × 8 breaks, n = 1 … 1 000";
  return [
    row(
      "joint choice: totals that differ from HiGHS's",
      solver.differing,
      "sizes",
      "0",
      solver.differing === 0,
      `n = ${SAMPLE.join(", ")}`,
    ),
    row(
      "joint choice, all sizes",
      swept.processor,
      "ms",
      "under 1 000 ms",
      swept.processor < 1000,
      noteOn(size, swept),
    ),
    row(
      "joint choice, all sizes, with customs and refusals",
      hard.processor,
      "ms",
      "under 1 000 ms",
      hard.processor < 1000,
      noteOn(size, hard),
    ),
    row(
      "joint choice: sizes not proven",
      swept.unproven + hard.unproven,
      "sizes",
      "0",
      swept.unproven + hard.unproven === 0,
      `of both; the widest gap left is ${(100 * Math.max(swept.gap, hard.gap)).toFixed(3)} % of the total`,
    ),
    row(
      "HiGHS ÷ joint choice",
      (solver.processor * TO) / swept.processor,
      "times",
      "at least 200",
      solver.processor * TO >= 200 * swept.processor,
      `HiGHS ${Math.round(solver.processor)} ms a size, reckoned from ${SAMPLE.length}`,
    ),
    row(
      "joint choice ÷ line-by-line sweep",
      swept.processor / lines,
      "times",
      "at most 10",
      swept.processor <= 10 * lines,
      `the sweep, whole runs: ${Math.round(lines)} ms`,
    ),
    ...growth(),
  ];
}

function noteOn(size: string, { slowest }: Swept): string {
  return `${size}; slowest n = ${slowest.kits}: ${Math.round(slowest.processor)} ms`;
}

async function general(plan: SourcingPlan, { totals }: Swept) {
  const solve = await highs();
  let [differing, processor] = [0, 0];
  for (const kits of SAMPLE) {
    const program = linearProgram(statedFor(plan, kits));
    const solved = processorOf(() => solve(program));
    processor += solved.processor / SAMPLE.length;
    const off = Math.abs((solved.result.objective ?? Number.NaN) - (totals[kits] ?? Number.NaN));
    if (!(off < 0.01)) differing += 1;
  }
  return { differing, processor };
}

/** Time a size at n = 101 … 200, for fewer and more parts and suppliers. */
function growth(): BenchRow[] {
  return [
    [50, 8],
    [100, 8],
    [400, 8],
    [200, 4],
    [60, 12],
  ].map(([parts = 0, suppliers = 0]) => {
    const plan = sourcingPlan(parts, suppliers, false);
    const times = Array.from({ length: 2 }, () => {
      const runs = sourcingRuns(plan.suppliers, plan.parts);
      sourceRun(runs, plan.toBuy(100));
      return processorOf(() => {
        for (let kits = 101; kits <= 200; kits += 1) sourceRun(runs, plan.toBuy(kits));
      }).processor;
    });
    const each = Math.min(...times) / 100;
    return row(
      `joint choice, one size, ${parts} parts × ${suppliers} suppliers`,
      each,
      "ms",
      "",
      true,
      "mean of n = 101 … 200",
    );
  });
}

function row(what: string, value: number, unit: string, aim: string, met: boolean, note: string): BenchRow {
  return { what, value: Math.round(value * 100) / 100, unit, aim, met, note };
}
