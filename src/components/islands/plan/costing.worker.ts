import { sweepRuns } from "#src/costing/sweep.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

export interface SweepOrder {
  number: number;
  plan: Plan;
}
export interface SweepDone {
  number: number;
  sweep: SweepResult;
}

/** Reckons every run size away from the page, where it would take longer than a frame. */
addEventListener("message", ({ data }: MessageEvent<SweepOrder>) => {
  const done: SweepDone = { number: data.number, sweep: sweepRuns(data.plan) };
  postMessage(done);
});
