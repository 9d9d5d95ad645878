// @vitest-environment happy-dom
import { afterEach, describe, expect, it, vi } from "vitest";
import { type Unsaved, watchLeaving } from "#src/components/islands/plan/leaving.ts";

let stops: (() => void)[] = [];
afterEach(() => {
  for (const stop of stops) stop();
  stops = [];
  vi.restoreAllMocks();
  document.body.innerHTML = "";
});

function saver(given: Partial<Unsaved>): { flush: ReturnType<typeof vi.fn>; keep: ReturnType<typeof vi.fn> } {
  const calls = { flush: vi.fn(), keep: vi.fn() };
  stops.push(watchLeaving({ holds: () => true, atRisk: () => false, ...calls, ...given }));
  return calls;
}

/** Whether the browser would ask before the page is left. */
function asks(): boolean {
  const leave = new Event("beforeunload", { cancelable: true });
  window.dispatchEvent(leave);
  return leave.defaultPrevented;
}

describe("leaving a page", () => {
  it("sends what is held before the next page is asked for, and asks nothing if that brings it home", () => {
    const { flush } = saver({});
    expect(asks()).toBe(false);
    expect(flush).toHaveBeenCalledOnce();
  });

  it("asks where one saver holds what cannot be sent now", () => {
    saver({});
    saver({ atRisk: () => true });
    expect(asks()).toBe(true);
  });

  it("asks while the browser is offline, but only if something is held", () => {
    vi.spyOn(navigator, "onLine", "get").mockReturnValue(false);
    saver({ holds: () => false });
    expect(asks()).toBe(false);
    saver({});
    expect(asks()).toBe(true);
  });

  it("has a field that is saved when it is left take its entry first", () => {
    const order: string[] = [];
    document.body.innerHTML = "<input>";
    const field = document.querySelector("input") as HTMLInputElement;
    field.addEventListener("blur", () => order.push("entry taken"));
    field.focus();
    saver({ flush: () => order.push("sent") });
    asks();
    expect(order).toEqual(["entry taken", "sent"]);
  });

  it("puts by what was not answered when the page goes, and hears nothing once stopped", () => {
    const { flush, keep } = saver({});
    window.dispatchEvent(new Event("pagehide"));
    expect(keep).toHaveBeenCalledOnce();
    for (const stop of stops.splice(0)) stop();
    window.dispatchEvent(new Event("pagehide"));
    expect(flush).toHaveBeenCalledOnce();
  });
});
