import { Cookie, parseCookies } from "oslo/cookie";
import type { Db } from "#db/client.ts";
import { config } from "./config.ts";
import { newSecretToken, tokenHash } from "./secret-token.ts";
import {
  addSession,
  endSession,
  type SessionRow,
  sessionByHash,
  touchSession,
  type UserRow,
} from "./store/session.ts";

const DAY = 24 * 60 * 60 * 1000;
const LASTS = 30 * DAY;
const UNFINISHED_LASTS = DAY / 144;

/** Either both or neither: nobody can use one and forget the other. */
export type SignedIn = { session: SessionRow; user: UserRow } | { session: null; user: null };

function secure(): boolean {
  return config().origin.startsWith("https:");
}

/** `__Host-` keeps a neighbouring site from setting our cookie, but browsers take it over HTTPS only. */
export function sessionCookieName(): string {
  return secure() ? "__Host-tinpenny" : "tinpenny";
}

function cookie(value: string, seconds: number): string {
  return new Cookie(sessionCookieName(), value, {
    httpOnly: true,
    secure: secure(),
    sameSite: "lax",
    path: "/",
    maxAge: seconds,
  }).serialize();
}

/**
 * Begins a session and returns its `Set-Cookie` header. A session that still waits for the second factor is
 * not complete: it opens nothing but that one question, and for ten minutes only.
 */
export function beginSession(
  db: Db,
  userId: string,
  browser: string,
  complete: boolean,
  now: number,
): string {
  const token = newSecretToken();
  const lasts = complete ? LASTS : UNFINISHED_LASTS;
  addSession(db, {
    tokenHash: tokenHash(token),
    userId,
    createdAt: now,
    lastSeenAt: now,
    expiresAt: now + lasts,
    complete,
    browser: browser.slice(0, 200),
  });
  return cookie(token, lasts / 1000);
}

/** Who a request's cookie speaks for. A session in use lasts thirty days more, counted at most once a day. */
export function sessionOf(db: Db, request: Request, now: number): SignedIn {
  const token = parseCookies(request.headers.get("cookie") ?? "").get(sessionCookieName());
  const found = token ? sessionByHash(db, tokenHash(token), now) : undefined;
  if (!found) return { session: null, user: null };
  if (found.session.complete && now - found.session.lastSeenAt > DAY)
    touchSession(db, found.session.tokenHash, now, now + LASTS);
  return found;
}

/** Ends the session and returns the header that empties the cookie. */
export function leaveSession(db: Db, session: SessionRow): string {
  endSession(db, session.tokenHash);
  return cookie("", 0);
}
