import type { Db } from "#db/client.ts";
import type { OneTimePurpose } from "#src/shapes/limits.ts";
import type { SignInStep } from "#src/shapes/person.ts";
import { countAttempts } from "./attempts.ts";
import { backPath } from "./back-path.ts";
import { later } from "./later.ts";
import { accountChangedLetter } from "./letters/account-changed.ts";
import { confirmEmailLetter } from "./letters/confirm-email.ts";
import { resetPasswordLetter } from "./letters/reset-password.ts";
import { signInLinkLetter } from "./letters/sign-in-link.ts";
import { postLetter } from "./mail.ts";
import { hashPassword } from "./password.ts";
import { Problem } from "./problem.ts";
import type { Common } from "./route.ts";
import { newSecretToken, tokenHash } from "./secret-token.ts";
import { letIn } from "./sign-in.ts";
import { addOneTimeToken, dropTokensOf, oneTimeTokenBy, takeOneTimeToken } from "./store/one-time-token.ts";
import { endSessionsOf, type UserRow } from "./store/session.ts";
import { changeUser, userByEmail } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

const MINUTE = 60 * 1000;
/** How long a link works; the letters say the same. */
const WORKS: Record<OneTimePurpose, number> = {
  "sign-in": 15 * MINUTE,
  "reset-password": 60 * MINUTE,
  "confirm-email": 2 * 24 * 60 * MINUTE,
};

function newLink(db: Db, user: UserRow, purpose: OneTimePurpose, email: string, now: number): string {
  const token = newSecretToken();
  const expiresAt = now + WORKS[purpose];
  addOneTimeToken(db, { tokenHash: tokenHash(token), purpose, userId: user.id, email, expiresAt });
  return token;
}

/** Sends a link that signs in, if anybody has this address. The reply does not tell. */
export function sendSignInLink(given: Common, email: string, back: string | undefined): void {
  const { db, now, address } = given;
  countAttempts(db, "send-link", { account: email, address }, now);
  later(() => {
    const user = userByEmail(db, email);
    if (!user) return;
    const token = newLink(db, user, "sign-in", email, now);
    postLetter(signInLinkLetter(email, user.name, token, backPath(back)));
  });
}

/** Sends a link to choose a new password, if anybody has this address. The reply does not tell. */
export function sendReset(given: Common, email: string): void {
  const { db, now, address } = given;
  countAttempts(db, "send-link", { account: email, address }, now);
  later(() => {
    const user = userByEmail(db, email);
    if (!user) return;
    postLetter(resetPasswordLetter(email, user.name, newLink(db, user, "reset-password", email, now)));
  });
}

/** Sends a link that confirms an address: a person's own, or one they change to. */
export function sendConfirmation(db: Db, user: UserRow, email: string, now: number): void {
  postLetter(confirmEmailLetter(email, user.name, newLink(db, user, "confirm-email", email, now)));
}

/** Who a link speaks for, without using it up; `null` if it does not work. */
export function linkOf(
  db: Db,
  token: string,
  purpose: OneTimePurpose,
  now: number,
): { user: UserRow; email: string } | null {
  const found = oneTimeTokenBy(db, tokenHash(token), purpose, now);
  if (!found) return null;
  const moved = purpose !== "confirm-email" && found.token.email !== found.user.email;
  return moved ? null : { user: found.user, email: found.token.email };
}

/** Uses a link up: only the first of two requests gets it. */
function takeLink(given: Common, token: string, purpose: OneTimePurpose): { user: UserRow; email: string } {
  const { db, now, address } = given;
  countAttempts(db, "use-link", { address }, now);
  const link = linkOf(db, token, purpose, now);
  if (!link || !takeOneTimeToken(db, tokenHash(token))) throw new Problem("link-not-valid");
  return link;
}

/** Signs in with a link from a letter; that also shows the address is theirs. */
export function signInWithLink(given: Common, token: string): SignInStep {
  const { user } = takeLink(given, token, "sign-in");
  if (user.emailConfirmedAt === null) changeUser(given.db, user.id, { emailConfirmedAt: given.now });
  return letIn(given, user);
}

/** Sets a new password through a link from a letter, and signs out every other sign-in of the person. */
export async function resetPassword(given: Common, token: string, password: string): Promise<SignInStep> {
  const { db, now } = given;
  const { user } = takeLink(given, token, "reset-password");
  const passwordHash = await hashPassword(password);
  inTransaction(db, () => {
    changeUser(db, user.id, { passwordHash, emailConfirmedAt: user.emailConfirmedAt ?? now });
    endSessionsOf(db, user.id);
    dropTokensOf(db, user.id);
  });
  postLetter(accountChangedLetter(user.email, user.name, "password"));
  return letIn(given, user);
}

/**
 * Confirms an address through a link from a letter. An address somebody changes to becomes theirs now; if
 * somebody else has it by now, the link is as good as used.
 */
export function confirmEmail(given: Common, token: string): { email: string } {
  const { db, now } = given;
  const { user, email } = takeLink(given, token, "confirm-email");
  const holder = userByEmail(db, email);
  if (holder && holder.id !== user.id) throw new Problem("link-not-valid");
  changeUser(db, user.id, { email, emailConfirmedAt: now });
  if (email !== user.email) {
    dropTokensOf(db, user.id);
    postLetter(accountChangedLetter(user.email, user.name, "email"));
  }
  return { email };
}
