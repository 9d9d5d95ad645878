import type { RunResult } from "#src/costing/run-result.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import { figuresOf, reckoned, workingOf } from "#src/costing/working.ts";
import type { FigureId, WorkingTree } from "#src/costing/working-tree.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { planFaults } from "./impossible-plan.ts";
import { Problem, wrongField } from "./problem.ts";

/** What `POST /api/costing` answers. */
export interface Reckoning {
  run: RunResult;
  /** Every run size, where it was asked for. */
  sweep: SweepResult | null;
  /** How the figures come about, where it was asked for: each as a tree of steps. */
  workings: WorkingTree[];
}

export interface Asked {
  /** Size of the run; left out: the plan's own. */
  kits?: number;
  sweep?: "1";
  /** "main", "all", or figures by name, parted by commas. */
  working?: string;
}

/** The figures of the strip and what they rest on. */
const MAIN: readonly FigureId[] = [
  "spent",
  "used",
  "per-kit-spent",
  "per-kit-used",
  "brings-per-kit",
  "earns-per-kit",
  "profit",
  "even-after",
  "earned-per-hour",
];

function workings(plan: Plan, kits: number, asked: string): { run: RunResult; trees: WorkingTree[] } {
  const context = reckoned(plan, kits);
  const named =
    asked === "" ? [] : asked === "main" ? MAIN : asked === "all" ? figuresOf(context) : asked.split(",");
  const trees = named.map((figure) => {
    const tree = workingOf(context, figure.trim() as FigureId);
    if (!tree) throw wrongField("working", `This run has no figure "${figure.trim()}".`);
    return tree;
  });
  return { run: context.result, trees };
}

/**
 * Reckons a plan that somebody sends: the run, on request every run size and the workings. Stateless.
 *
 * @throws Problem "wrong-input" with the path of each field that makes the plan impossible.
 */
export function reckon(plan: Plan, { kits = plan.run.kits, sweep, working = "main" }: Asked): Reckoning {
  const errors = planFaults(plan);
  if (errors.length > 0) throw new Problem("wrong-input", { errors });
  const { run, trees } = workings(plan, kits, working);
  return { run, sweep: sweep ? sweepRuns(plan) : null, workings: trees };
}
