import { Cookie, parseCookies } from "oslo/cookie";
import { z } from "zod";
import { config } from "./config.ts";
import type { Challenge } from "./identity-provider.ts";
import { seal, unseal } from "./own-key.ts";

const LASTS = 10 * 60 * 1000;

/** What a person was about to do when they were sent to the provider; kept, sealed, in their own browser. */
const Pending = z.object({
  state: z.string(),
  nonce: z.string(),
  verifier: z.string(),
  /** A path of ours to go on to. */
  back: z.string(),
  /** The token of an invitation they want to take. */
  invitation: z.string().nullable(),
  /** The person who connects an identity to their account; `null`: somebody signs in. */
  connect: z.string().nullable(),
  until: z.number(),
});
export type Pending = Challenge & Omit<z.infer<typeof Pending>, "until">;

function secure(): boolean {
  return config().origin.startsWith("https:");
}

function cookieName(): string {
  return secure() ? "__Host-tinpenny-identity" : "tinpenny-identity";
}

function cookie(value: string, seconds: number): string {
  return new Cookie(cookieName(), value, {
    httpOnly: true,
    secure: secure(),
    // Not strict: the person comes back from the provider's site, and the cookie has to come with them.
    sameSite: "lax",
    path: "/",
    maxAge: seconds,
  }).serialize();
}

/** The cookie that keeps what is pending, for ten minutes. */
export function pendingCookie(pending: Pending, now: number): string {
  return cookie(seal(JSON.stringify({ ...pending, until: now + LASTS }), "identity"), LASTS / 1000);
}

export function emptyPendingCookie(): string {
  return cookie("", 0);
}

/** What is pending in the browser a request comes from. */
export function pendingOf(request: Request, now: number): Pending | null {
  const sealed = parseCookies(request.headers.get("cookie") ?? "").get(cookieName());
  const text = sealed ? unseal(sealed, "identity") : null;
  if (text === null) return null;
  const { until, ...pending } = Pending.parse(JSON.parse(text));
  return until > now ? pending : null;
}
