import { costRun } from "#src/costing/cost-run.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { plainBoards, plainRun } from "#tests/costing/plain-reckoning.ts";
import type { BenchRow } from "./bench-row.ts";
import { bigPlan } from "./big-plan.ts";

const TO = 1000;
/** Sizes the plain loop is timed on, spread evenly; its time for all sizes is reckoned from them. */
const SAMPLE = Array.from({ length: 20 }, (_, index) => 25 + index * 50);
const WARM_UPS = 30;
const TIMES = 31;

/**
 * The sweep of section 15, 200 parts × 5 offers × 8 breaks, n = 1 … 1 000: warm time, the same in
 * processor time, and its ratio to a plain decimal.js loop that gives the same figures. The figures
 * are compared first: a fast wrong answer is no answer.
 */
export async function run(): Promise<BenchRow[]> {
  const plan = bigPlan(200, 5, 8, TO);
  const swept = sweepRuns(plan);
  const boards = boardsOnce();
  const plainRuns = () => SAMPLE.map((kits) => plainRun(plan, kits, boards));
  plainRuns();
  const plain = timed(plainRuns);
  const differing = SAMPLE.filter((kits, index) => {
    const { spent, used, brings, leftOver } = swept.columns;
    const one = plain.result[index];
    return (
      [spent, used, brings, leftOver].map((column) => column[kits - 1]).join() !==
      [one?.spent, one?.used, one?.brings, one?.leftOver].join()
    );
  });
  for (let round = 0; round < WARM_UPS; round += 1) sweepRuns(plan);
  const rounds = Array.from({ length: TIMES }, () => timed(() => sweepRuns(plan)));
  const wall = median(rounds.map((round) => round.wall));
  const processor = median(rounds.map((round) => round.processor));
  const plainTime = (plain.processor / SAMPLE.length) * TO;
  const single = median(Array.from({ length: TIMES }, () => timed(() => costRun(plan, 120)).wall));
  const size = "200 parts × 5 offers × 8 breaks, 4 editions, n = 1 … 1 000";
  return [
    row(
      "sweep: sizes that differ from the plain loop",
      differing.length,
      "sizes",
      "0",
      differing.length === 0,
      `${SAMPLE.length} sizes compared`,
    ),
    row("sweep, warm", wall, "ms", "under 50 ms", wall < 50, size),
    row(
      "sweep, warm, processor time",
      processor,
      "ms",
      "under 50 ms",
      processor < 50,
      "the same runs; less disturbed by what else the machine does",
    ),
    row(
      "plain decimal.js loop, all sizes",
      plainTime,
      "ms",
      "",
      true,
      `reckoned from ${SAMPLE.length} sizes`,
    ),
    row(
      "plain loop ÷ sweep",
      plainTime / processor,
      "times",
      "at least 20",
      plainTime / processor >= 20,
      "processor time over processor time",
    ),
    row("one run with every detail", single, "ms", "under 100 ms", single < 100, "200 parts, 120 kits"),
  ];
}

/**
 * The plain loop's boards to order, kept from an untimed round, as it keeps its learning factors: the
 * time compared is that of costing, not of probability and powers, which would flatter the sweep.
 */
function boardsOnce(): typeof plainBoards {
  const known = new Map<number, number>();
  return (required, yieldShare, confidence) => {
    const found = known.get(required) ?? plainBoards(required, yieldShare, confidence);
    known.set(required, found);
    return found;
  };
}

function row(what: string, value: number, unit: string, aim: string, met: boolean, note: string): BenchRow {
  return { what, value: Math.round(value * 10) / 10, unit, aim, met, note };
}

function timed<T>(work: () => T): { result: T; wall: number; processor: number } {
  const [start, used] = [performance.now(), process.cpuUsage()];
  const result = work();
  const { user, system } = process.cpuUsage(used);
  return { result, wall: performance.now() - start, processor: (user + system) / 1000 };
}

function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
}
