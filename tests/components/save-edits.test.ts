// @vitest-environment happy-dom
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { kitKeys } from "#src/components/islands/kit-address.ts";
import { editRow, heldPlan, takeUpEdits, watchPage } from "#src/components/islands/plan/save-edits.ts";
import { NOTHING_SAVED, saving } from "#src/components/islands/plan/saving.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import { heldSmallPlan } from "#tests/support/small-plan.ts";

const RUN = { kind: "run" } as const;
const ADDRESS = { workshop: "w", kit: "k" };

type Sent = { path: string; body: Record<string, unknown>; keepalive: boolean };
let sent: Sent[] = [];
let replies: (() => Response | Promise<Response>)[] = [];
let stop: () => void;

const ok = (version: number) => () => Response.json({ version });
const never = () => new Promise<Response>(() => {});
const changed = (current: object) => () =>
  Response.json({ code: "changed-meanwhile", title: "Changed.", detail: "", current }, { status: 409 });

beforeEach(() => {
  vi.stubGlobal("fetch", async (path: string, init: RequestInit) => {
    sent.push({ path, body: JSON.parse(String(init.body)), keepalive: init.keepalive === true });
    return (replies.shift() ?? never)();
  });
  sessionStorage.clear();
  queryClient.setQueryData(kitKeys.plan("k"), heldSmallPlan());
  stop = watchPage(ADDRESS);
});
afterEach(() => {
  stop();
  vi.unstubAllGlobals();
  vi.resetModules();
  sent = [];
  replies = [];
  saving.put(NOTHING_SAVED);
});

const settled = () => new Promise((done) => setTimeout(done, 20));
const kits = () => heldPlan(ADDRESS)?.plan.run.kits;
const leave = () => {
  const event = new Event("beforeunload", { cancelable: true });
  window.dispatchEvent(event);
  window.dispatchEvent(new Event("pagehide"));
  return event.defaultPrevented;
};

describe("an edit that is under way when the page is left", () => {
  it("is sent at once, outlives the page, and is put by until somebody hears the answer", async () => {
    replies = [ok(2)];
    editRow(ADDRESS, RUN, { kits: 55 });
    expect(sent).toEqual([]);
    expect(leave()).toBe(false);
    expect(sent).toMatchObject([
      { path: "/api/workshops/w/kits/k/run", body: { kits: 55, version: 1 }, keepalive: true },
    ]);
    expect(sessionStorage.length).toBe(1);
    await settled();

    // The next page finds it arrived.
    takeUpEdits(ADDRESS);
    await settled();
    expect(sent).toHaveLength(1);
    expect(sessionStorage.length).toBe(0);
  });

  it("is sent again by the next page where it did not arrive, with the version it had seen", async () => {
    replies = [ok(2)];
    editRow(ADDRESS, RUN, { kits: 55 });
    leave();
    await settled();
    queryClient.setQueryData(kitKeys.plan("k"), { ...heldSmallPlan() });
    replies = [ok(2)];
    takeUpEdits(ADDRESS);
    expect(kits()).toBe(55);
    await settled();
    expect(sent[1]?.body).toEqual({ kits: 55, version: 1 });
  });

  it("asks the person where somebody was quicker, and overwrites nothing", async () => {
    replies = [ok(2)];
    editRow(ADDRESS, RUN, { kits: 55 });
    leave();
    await settled();
    const fresh = heldSmallPlan();
    const theirs = { ...fresh, plan: { ...fresh.plan, run: { ...fresh.plan.run, kits: 90 } } };
    theirs.versions = { ...theirs.versions, run: 2 };
    queryClient.setQueryData(kitKeys.plan("k"), theirs);
    replies = [changed({ kits: 90, version: 2, changedBy: "Tom", changedAt: 1 })];
    takeUpEdits(ADDRESS);
    await settled();
    expect(sent[1]?.body).toEqual({ kits: 55, version: 1 });
    expect(sent).toHaveLength(2);
    expect(saving.now().clashes).toMatchObject([{ field: "kits", yours: 55, theirs: 90, by: "Tom" }]);
  });

  it("is put by also where the refusal came while the page was going", async () => {
    const theirs = { kits: 90, version: 2, changedBy: "Tom", changedAt: 1 };
    replies = [changed(theirs)];
    editRow(ADDRESS, RUN, { kits: 55 });
    window.dispatchEvent(new Event("beforeunload", { cancelable: true }));
    await settled();
    expect(saving.now().clashes).toHaveLength(1);
    window.dispatchEvent(new Event("pagehide"));

    saving.put(NOTHING_SAVED);
    const fresh = heldSmallPlan();
    const plan = { ...fresh.plan, run: { ...fresh.plan.run, kits: 90 } };
    queryClient.setQueryData(kitKeys.plan("k"), { ...fresh, plan });
    replies = [changed(theirs)];
    takeUpEdits(ADDRESS);
    await settled();
    expect(sent[1]?.body).toEqual({ kits: 55, version: 1 });
    expect(saving.now().clashes).toMatchObject([{ field: "kits", yours: 55, theirs: 90, by: "Tom" }]);
  });

  it("has the browser ask where a second edit waits for its version", async () => {
    let answer = (_: Response) => {};
    replies = [
      () =>
        new Promise((done) => {
          answer = done;
        }),
      ok(3),
    ];
    editRow(ADDRESS, RUN, { kits: 55 });
    expect(leave()).toBe(false);
    editRow(ADDRESS, RUN, { kits: 56 });
    expect(leave()).toBe(true);
    answer(Response.json({ version: 2 }));
    await settled();
    expect(sent.map(({ body }) => body)).toEqual([
      { kits: 55, version: 1 },
      { kits: 56, version: 2 },
    ]);
    expect(leave()).toBe(false);
  });
});
