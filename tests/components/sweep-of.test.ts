// @vitest-environment happy-dom
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { SweepDone, SweepOrder } from "#src/components/islands/plan/costing.worker.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { smallPlan } from "#tests/support/small-plan.ts";

let started: FakeWorker[] = [];

/** Keeps the orders it gets; a test answers them when it is time. */
class FakeWorker {
  orders: SweepOrder[] = [];
  heard: (message: { data: SweepDone }) => void = () => {};
  constructor() {
    started.push(this);
  }
  addEventListener(_: string, heard: FakeWorker["heard"]): void {
    this.heard = heard;
  }
  postMessage(order: SweepOrder): void {
    this.orders.push(order);
  }
  answer(): void {
    const order = this.orders.at(-1) as SweepOrder;
    this.heard({ data: { number: order.number, sweep: sweepRuns(order.plan) } });
  }
}

let passes = 0;
let tookMs = 0;

beforeEach(() => {
  vi.resetModules();
  vi.useFakeTimers();
  vi.stubGlobal("Worker", FakeWorker);
  vi.stubGlobal("performance", { now: () => (passes++ % 2 === 0 ? 0 : tookMs) });
  started = [];
  passes = 0;
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const load = () => import("#src/components/islands/plan/sweep-of.ts");

/** The same plan at another price: every run size is to be reckoned again. */
function priced(price: string): Plan {
  const plan = smallPlan();
  return { ...plan, editions: plan.editions.map((edition) => ({ ...edition, price })) };
}

describe("the sweep of a plan", () => {
  it("stays in the page while it takes less than a frame, also after a slow beginning", async () => {
    const { sweepAtOnce } = await load();
    for (const ms of [60, 40, 9, 60, 40, 9]) {
      tookMs = ms;
      expect(sweepAtOnce(priced(`${10 + ms}`)), `${ms} ms`).not.toBeNull();
    }
    expect(started).toEqual([]);
  });

  it("is the worker's once three in a row took longer than a frame", async () => {
    const { sweepAtOnce } = await load();
    tookMs = 17;
    for (const price of ["10", "11", "12"]) expect(sweepAtOnce(priced(price))).not.toBeNull();
    expect(sweepAtOnce(priced("13"))).toBeNull();
  });

  it("is the worker's from the beginning where the plan is large", async () => {
    const { sweepAtOnce, sweepAway, sweepState } = await load();
    const plan = priced("10");
    const large = { ...plan, run: { ...plan.run, sweepTo: 20_000 } };
    expect(sweepAtOnce(large)).toBeNull();
    sweepAway({ ...plan, run: { ...plan.run } });
    started[0]?.answer();
    expect(sweepState.now().sweep).not.toBeNull();
  });

  it("keeps the last figures while it is waited for, and says so only when that lasts", async () => {
    const { sweepAtOnce, sweepAhead, sweepAway, sweepState } = await load();
    tookMs = 101;
    const first = sweepAtOnce(priced("10"));
    const next = priced("11");
    sweepAhead(next);
    expect(started, "no worker before a sweep was handed over").toEqual([]);
    sweepAway(next);
    sweepAway(next);
    expect(started[0]?.orders).toHaveLength(1);
    expect(sweepState.now()).toMatchObject({ sweep: first, workingOut: false });
    vi.advanceTimersByTime(151);
    expect(sweepState.now()).toMatchObject({ sweep: first, workingOut: true });
    started[0]?.answer();
    expect(sweepState.now()).toMatchObject({ plan: next, workingOut: false });
    expect(sweepAtOnce(next)).toBe(sweepState.now().sweep);

    const last = priced("12");
    sweepAhead(priced("13"));
    sweepAhead(last);
    expect(started[0]?.orders, "one sweep under way at a time").toHaveLength(2);
    started[0]?.answer();
    expect(started[0]?.orders.at(-1)?.plan).toBe(last);
    started[0]?.answer();
    expect(sweepState.now()).toMatchObject({ plan: last, workingOut: false });
  });
});
