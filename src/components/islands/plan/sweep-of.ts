import { marginOfSafety } from "#src/costing/break-even.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { SweepDone, SweepOrder } from "./costing.worker.ts";
import { moduleStore } from "./module-store.ts";

/** A frame; where sweeps keep taking longer, the worker does the next. */
const FRAME_MS = 16;
/** The first sweeps of a page are slow while the browser still compiles them; so many in a row are no chance. */
const SLOW_IN_A_ROW = 3;
/** One sweep that holds the page up so long is enough. */
const TOO_LONG_MS = 100;
/** Before anything was timed: parts times run sizes that surely fit into a frame. */
const SURELY_QUICK = 20_000;
/** Waiting that is shorter than this is not shown. */
const NOTICED_MS = 150;

export interface SweepState {
  /** The last sweep reckoned, and the plan it belongs to; null before the first. */
  plan: Plan | null;
  sweep: SweepResult | null;
  /** The plan in view has no sweep yet, and that takes a while. */
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
/** Runs while an answer is waited for. */
let noticed: ReturnType<typeof setTimeout> | undefined;
/** The last sweep of all, wherever it was reckoned. */
let last: { plan: Plan; sweep: SweepResult } | null = null;
/** How many sweeps in a row took longer than a frame; none was timed yet: null. */
let slow: number | null = null;

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
  if (slow === null) return (plan.parts.length + 1) * plan.run.sweepTo < SURELY_QUICK;
  return slow < SLOW_IN_A_ROW;
}

function timed(tookMs: number): void {
  if (tookMs < FRAME_MS) slow = 0;
  else slow = tookMs > TOO_LONG_MS ? SLOW_IN_A_ROW : (slow ?? 0) + 1;
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
    timed(performance.now() - began);
  } else return null;
  return last.sweep;
}

function startWorker(): Worker {
  const started = new Worker(new URL("./costing.worker.ts", import.meta.url), { type: "module" });
  started.addEventListener("message", ({ data }: MessageEvent<SweepDone>) => {
    busy = false;
    if (data.number !== ordered || !orderedPlan) return orderedPlan ? send(orderedPlan) : undefined;
    last = { plan: orderedPlan, sweep: forRun(data.sweep, orderedPlan) };
    clearTimeout(noticed);
    noticed = undefined;
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

/** Shows the last figures while new ones are waited for, and says so once that takes long enough to be noticed. */
function wait(): void {
  const shown = { plan: last?.plan ?? null, sweep: last?.sweep ?? null };
  if (sweepState.now().sweep !== shown.sweep) sweepState.put({ ...shown, workingOut: false });
  noticed ??= setTimeout(() => sweepState.change((now) => ({ ...now, workingOut: true })), NOTICED_MS);
}

/** Has the worker reckon the sweep of a plan; the last figures stay meanwhile. Asked again it changes nothing. */
export function sweepAway(plan: Plan): void {
  if (orderedPlan === plan) return;
  const same = noticed !== undefined && orderedPlan !== null && sameButRun(orderedPlan, plan);
  orderedPlan = plan;
  if (same) return;
  ordered += 1;
  wait();
  if (!busy) send(plan);
}

/**
 * Has the worker begin on a plan that was edited, before the page draws anything of it: what the page reckons and
 * draws meanwhile is no loss. Only where a sweep has been handed over before.
 */
export function sweepAhead(plan: Plan): void {
  if (worker && sweepAtOnce(plan) === null) sweepAway(plan);
}
