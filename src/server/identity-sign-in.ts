import { generateCodeVerifier, generateState } from "arctic";
import { countAttempts } from "./attempts.ts";
import { backPath } from "./back-path.ts";
import {
  authorizationAddress,
  identityBy,
  identityProvider,
  type OutsideIdentity,
} from "./identity-provider.ts";
import { emptyPendingCookie, type Pending, pendingCookie, pendingOf } from "./identity-state.ts";
import { invitationByToken } from "./invitations.ts";
import { accountChangedLetter } from "./letters/account-changed.ts";
import { postLetter } from "./mail.ts";
import { newId } from "./new-id.ts";
import { Problem } from "./problem.ts";
import type { Common } from "./route.ts";
import { sessionOf } from "./session.ts";
import { letIn } from "./sign-in.ts";
import { addIdentity, userByIdentity } from "./store/identity.ts";
import type { UserRow } from "./store/session.ts";
import { addUser, userByEmail } from "./store/user.ts";
import { joinBy } from "./take-invitation.ts";
import { inTransaction } from "./transaction.ts";

interface Beginning {
  back?: string;
  invitation?: string;
  connect?: string;
}

/** Begins a sign-in, or a connection, with the outside provider: where the browser has to go. */
export async function beginIdentity(
  given: Common,
  { back, invitation, connect }: Beginning,
): Promise<{ location: string }> {
  const { db, now, address, headers } = given;
  countAttempts(db, "identity", { address }, now);
  const challenge = { state: generateState(), nonce: generateState(), verifier: generateCodeVerifier() };
  const location = await authorizationAddress(challenge, now);
  const wanted = { back: backPath(back), invitation: invitation ?? null, connect: connect ?? null };
  headers.append("set-cookie", pendingCookie({ ...challenge, ...wanted }, now));
  return { location };
}

function refused(code: "identity-failed" | "identity-not-known" | "identity-taken"): Problem {
  return new Problem(code, { parameters: { provider: identityProvider().name } });
}

function rowOf(user: UserRow, { subject }: OutsideIdentity, now: number) {
  return { issuer: identityProvider().issuer, subject, userId: user.id, createdAt: now };
}

/** Connects an identity to the account of the person who asked for it and is still signed in. */
function connect(given: Common, identity: OutsideIdentity, userId: string): string {
  const { db, now, request } = given;
  const { session, user } = sessionOf(db, request, now);
  if (!session?.complete || user?.id !== userId) throw refused("identity-failed");
  const holder = userByIdentity(db, identityProvider().issuer, identity.subject);
  if (holder && holder.id !== user.id) throw refused("identity-taken");
  addIdentity(db, rowOf(user, identity, now));
  postLetter(accountChangedLetter(user.email, user.name, "identity"));
  return "/account";
}

/** Makes an account for somebody with an invitation: its letter reached them, so the address is theirs. */
function joinAsNewPerson(given: Common, identity: OutsideIdentity, token: string): string {
  const { db, now } = given;
  const found = invitationByToken(db, token, now);
  if (!found) throw new Problem("link-not-valid");
  const { email } = found.invitation;
  if (userByEmail(db, email)) throw new Problem("account-exists");
  const name = identity.name?.trim().slice(0, 120) || (email.split("@")[0] ?? email);
  const { user, place } = inTransaction(db, () => {
    const made = addUser(db, { id: newId(), email, name, emailConfirmedAt: now, createdAt: now });
    addIdentity(db, rowOf(made, identity, now));
    return { user: made, place: joinBy(db, found, made, now) };
  });
  letIn(given, user);
  return `/workshops/${place.workshop}`;
}

/** Who an identity belongs to: by an earlier connection, or by an address both sides have verified. */
function personBy(given: Common, identity: OutsideIdentity): UserRow | undefined {
  const { db, now } = given;
  const connected = userByIdentity(db, identityProvider().issuer, identity.subject);
  if (connected || identity.email === null) return connected;
  const user = userByEmail(db, identity.email);
  if (!user || user.emailConfirmedAt === null) return undefined;
  addIdentity(db, rowOf(user, identity, now));
  postLetter(accountChangedLetter(user.email, user.name, "identity"));
  return user;
}

function signIn(given: Common, identity: OutsideIdentity, { back, invitation }: Pending): string {
  const user = personBy(given, identity);
  if (!user && invitation) return joinAsNewPerson(given, identity, invitation);
  if (!user) throw refused("identity-not-known");
  const onwards = invitation ? `/invitation?token=${invitation}` : back;
  const { next } = letIn(given, user);
  return next === "done" ? onwards : `/sign-in/second-factor?back=${encodeURIComponent(onwards)}`;
}

/** What the provider sends a person back with. */
export interface IdentityReturn {
  code?: string;
  state?: string;
  error?: string;
  iss?: string;
}

async function finish(given: Common, pending: Pending | null, returned: IdentityReturn): Promise<string> {
  const { db, now, address } = given;
  countAttempts(db, "identity", { address }, now);
  const { code, state } = returned;
  if (!pending || !code || state !== pending.state) throw refused("identity-failed");
  const identity = await identityBy(code, pending, now);
  return pending.connect === null
    ? signIn(given, identity, pending)
    : connect(given, identity, pending.connect);
}

function pageOf(pending: Pending | null): string {
  if (pending?.connect) return "/account?";
  return pending?.invitation ? `/invitation?token=${pending.invitation}&` : "/sign-in?";
}

/** Finishes at the address the provider sends people back to; a failure is told on the page they came from. */
export async function finishIdentity(given: Common, returned: IdentityReturn): Promise<Response> {
  identityProvider();
  const pending = pendingOf(given.request, given.now);
  given.headers.append("set-cookie", emptyPendingCookie());
  let location: string;
  try {
    location = await finish(given, pending, returned);
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    location = `${pageOf(pending)}problem=${error.code}`;
  }
  return new Response(null, { status: 303, headers: { location, "cache-control": "no-store" } });
}
