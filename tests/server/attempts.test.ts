import { describe, expect, it } from "vitest";
import { attemptCounts } from "#db/schema/people.ts";
import { type Attempted, countAttempts, forgiveAttempts, type Trying } from "#src/server/attempts.ts";
import { Problem } from "#src/server/problem.ts";
import { testApp } from "#tests/support/app.ts";

const app = testApp();
const MINUTE = 60_000;
const HERE = { account: "ines@example.org", address: "192.0.2.1" };

/** The problem of one more attempt; `null` where it may be made. */
function refused(what: Attempted, trying: Trying): Problem | null {
  try {
    countAttempts(app.db, what, trying, app.now);
    return null;
  } catch (error) {
    if (error instanceof Problem) return error;
    throw error;
  }
}

/** How many attempts pass before one is refused; `each` says who makes which. */
function passing(what: Attempted, each: (attempt: number) => Trying): number {
  for (let attempt = 0; attempt < 200; attempt++) if (refused(what, each(attempt))) return attempt;
  return 200;
}

describe("limits on attempts", () => {
  it("count an account from one address, then from many, then many accounts from one", () => {
    expect(passing("sign-in", () => HERE)).toBe(5);
    expect(passing("sign-in", (i) => ({ account: "tom@example.org", address: `198.51.100.${i}` }))).toBe(30);
    expect(passing("sign-in", (i) => ({ account: `${i}@example.org`, address: "203.0.113.5" }))).toBe(50);
  });

  it("take the addresses of one IPv6 network together", () => {
    const each = (i: number) => ({ account: `${i}@example.org`, address: `2001:db8:1:2::${i.toString(16)}` });
    expect(passing("sign-in", each)).toBe(50);
  });

  it("say how long to wait, in words and in seconds", () => {
    passing("sign-in", () => HERE);
    app.pass(MINUTE);
    const problem = refused("sign-in", HERE);
    expect(problem?.details.headers).toEqual({ "retry-after": "840" });
    expect(problem?.body().detail).toBe("Wait 14 minutes, then try again.");
    app.pass(14 * MINUTE - 1000);
    expect(refused("sign-in", HERE)?.body().detail).toBe("Wait a minute, then try again.");
    app.pass(1000);
    expect(refused("sign-in", HERE)).toBeNull();
  });

  it("forget a person's own slips after a success, and add up only failures elsewhere", () => {
    for (let i = 0; i < 100; i++) {
      expect(refused("sign-in", HERE)).toBeNull();
      forgiveAttempts(app.db, "sign-in", HERE);
    }
    expect(passing("sign-in", () => HERE)).toBe(5);
  });

  it("are kept apart by what is tried", () => {
    passing("sign-in", () => HERE);
    expect(refused("send-link", HERE)).toBeNull();
  });

  it("store neither address nor account", () => {
    refused("sign-in", HERE);
    const stored = JSON.stringify(app.db.select().from(attemptCounts).all());
    expect(stored).not.toContain("ines");
    expect(stored).not.toContain("192.0.2.1");
  });
});
