import { marginOfSafety } from "#src/costing/break-even.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { SweepDone, SweepOrder } from "./costing.worker.ts";
import { moduleStore } from "./module-store.ts";

/** A frame, less what drawing takes; a sweep that took longer goes to the worker the next time. */
const FRAME_MS = 10;
/** Before anything was timed: parts times run sizes that surely fit into a frame. */
const SURELY_QUICK = 20_000;

export interface SweepState {
  /** The last sweep reckoned, and the plan it belongs to; null before the first. */
  plan: Plan | null;
  sweep: SweepResult | null;
  /** The plan in view has no sweep yet. */
  workingOut: boolean;
}

export const NO_SWEEP: SweepState = { plan: null, sweep: null, workingOut: false };

/** What the worker reckoned last, and whether it is at work. */
export const sweepState = moduleStore<SweepState>(NO_SWEEP);

let worker: Worker | undefined;
/** Number of the newest sweep asked of the worker, and its plan; null when none is waited for. */
let ordered = 0;
let orderedPlan: Plan | null = null;
let busy = false;
/** The last sweep of all, wherever it was reckoned. */
let last: { plan: Plan; sweep: SweepResult } | null = null;
let tookMs: number | null = null;

/** Whether two plans differ at most in the size of the run, on which no other run size depends. */
function sameButRun(one: Plan, other: Plan): boolean {
  if (one.run.sweepTo !== other.run.sweepTo) return false;
  const names = Object.keys(one) as (keyof Plan)[];
  return names.every((name) => name === "run" || one[name] === other[name]);
}

/** The margin of safety is the one figure of a sweep that the planned run decides. */
function forRun(sweep: SweepResult, plan: Plan): SweepResult {
  const { breakEven } = sweep;
  const margin = breakEven.known ? marginOfSafety(plan.run.kits, breakEven.safe) : null;
  return { ...sweep, breakEven: { ...breakEven, marginOfSafety: margin } };
}

function isQuick(plan: Plan): boolean {
  return tookMs === null ? (plan.parts.length + 1) * plan.run.sweepTo < SURELY_QUICK : tookMs < FRAME_MS;
}

/**
 * The sweep of a plan, if it is at hand or can be reckoned within a frame; else null, and it is the worker's.
 * A plan object is never changed, only replaced, so this may be called while a page is rendered.
 */
export function sweepAtOnce(plan: Plan): SweepResult | null {
  if (last?.plan === plan) return last.sweep;
  if (last && sameButRun(last.plan, plan)) last = { plan, sweep: forRun(last.sweep, plan) };
  else if (isQuick(plan)) {
    const began = performance.now();
    last = { plan, sweep: sweepRuns(plan) };
    tookMs = performance.now() - began;
  } else return null;
  return last.sweep;
}

function startWorker(): Worker {
  const started = new Worker(new URL("./costing.worker.ts", import.meta.url), { type: "module" });
  started.addEventListener("message", ({ data }: MessageEvent<SweepDone>) => {
    busy = false;
    if (data.number !== ordered || !orderedPlan) return orderedPlan ? send(orderedPlan) : undefined;
    last = { plan: orderedPlan, sweep: forRun(data.sweep, orderedPlan) };
    sweepState.put({ ...last, workingOut: false });
  });
  return started;
}

/** One sweep is under way at a time; of those asked for meanwhile only the last is worked out. */
function send(plan: Plan): void {
  worker ??= startWorker();
  busy = true;
  const order: SweepOrder = { number: ordered, plan };
  worker.postMessage(order);
}

/** Has the worker reckon the sweep of a plan; the last figures stay meanwhile. */
export function sweepAway(plan: Plan): void {
  const { workingOut } = sweepState.now();
  const same = workingOut && orderedPlan !== null && sameButRun(orderedPlan, plan);
  orderedPlan = plan;
  if (same) return;
  ordered += 1;
  sweepState.put({ plan: last?.plan ?? null, sweep: last?.sweep ?? null, workingOut: true });
  if (!busy) send(plan);
}
