import type { Db } from "#db/client.ts";
import { networkOf } from "./network-of.ts";
import { Problem } from "./problem.ts";
import { tokenHash } from "./secret-token.ts";
import { countAttempt, forgetAttempts, takeBackAttempt } from "./store/attempt.ts";

const MINUTE = 60 * 1000;
const HOUR = 60 * MINUTE;

/**
 * How often something may be tried, counted by what the person gives and where they come from. `pair` is
 * one account from one address, so that a stranger's guesses from elsewhere do not lock its owner out before
 * `account`, which is wider, stops guesses from many addresses. The narrowest stands first.
 */
export const ATTEMPTS = {
  "sign-in": { pair: [5, 15 * MINUTE], account: [30, HOUR], address: [50, 15 * MINUTE] },
  "second-factor": { account: [5, 15 * MINUTE] },
  "send-link": { account: [4, HOUR], address: [20, HOUR] },
  "use-link": { address: [30, 15 * MINUTE] },
  invite: { account: [5, 24 * HOUR], address: [60, HOUR] },
  "first-owner": { address: [10, HOUR] },
  identity: { address: [40, 15 * MINUTE] },
} as const satisfies Record<
  string,
  Partial<Record<"pair" | "account" | "address", readonly [number, number]>>
>;

export type Attempted = keyof typeof ATTEMPTS;

/** Who tries: an account (an e-mail address or a person's id) and an IP address. */
export interface Trying {
  account?: string;
  address: string;
}

function inWords(milliseconds: number): string {
  const minutes = Math.ceil(milliseconds / MINUTE);
  if (minutes <= 1) return "a minute";
  return minutes < 120 ? `${minutes} minutes` : `${Math.ceil(minutes / 60)} hours`;
}

function keyOf(what: Attempted, by: string, { account = "", address }: Trying): string {
  const network = networkOf(address);
  const parts = { pair: [account, network], account: [account], address: [network] }[by] ?? [];
  return tokenHash([what, by, ...parts].join("\n"));
}

/**
 * Counts an attempt before it is made.
 *
 * @throws Problem "too-many-attempts", with Retry-After in seconds.
 */
export function countAttempts(db: Db, what: Attempted, trying: Trying, now: number): void {
  for (const [by, [most, lasts]] of Object.entries(ATTEMPTS[what])) {
    const { count, windowEndsAt } = countAttempt(db, keyOf(what, by, trying), lasts, now);
    if (count <= most) continue;
    throw new Problem("too-many-attempts", {
      parameters: { wait: inWords(windowEndsAt - now) },
      headers: { "retry-after": String(Math.ceil((windowEndsAt - now) / 1000)) },
    });
  }
}

/**
 * After a success: the narrowest count, which the person's own slips filled, begins anew; wider ones take
 * back this one attempt, so that only failures add up there.
 */
export function forgiveAttempts(db: Db, what: Attempted, trying: Trying): void {
  const [narrowest, ...wider] = Object.keys(ATTEMPTS[what]);
  forgetAttempts(db, keyOf(what, narrowest ?? "", trying));
  for (const by of wider) takeBackAttempt(db, keyOf(what, by, trying));
}
