import type { Db } from "#db/client.ts";
import type { Account, AccountChange, OwnSession } from "#src/shapes/account.ts";
import { countAttempts } from "./attempts.ts";
import { config } from "./config.ts";
import { later } from "./later.ts";
import { accountChangedLetter } from "./letters/account-changed.ts";
import { postLetter } from "./mail.ts";
import { makeSure } from "./make-sure.ts";
import { hashPassword } from "./password.ts";
import { Problem } from "./problem.ts";
import type { Common, InPerson } from "./route.ts";
import { sendConfirmation } from "./sign-in-link.ts";
import { identitiesOf } from "./store/identity.ts";
import { dropTokensOf } from "./store/one-time-token.ts";
import { recoveryCodesLeft } from "./store/recovery-code.ts";
import { endSession, endSessionsOf, type SessionRow, sessionsOf, type UserRow } from "./store/session.ts";
import { changeUser, changeUserAt, userByEmail, userById } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

type Given = Common & InPerson;

/** A person's account as they see it themselves: no hash, no secret. */
export function accountOf(db: Db, user: UserRow): Account {
  const provider = config().identityProvider;
  const connected = identitiesOf(db, user.id).some(({ issuer }) => issuer === provider?.issuer);
  return {
    id: user.id,
    name: user.name,
    email: user.email,
    emailConfirmed: user.emailConfirmedAt !== null,
    hasPassword: user.passwordHash !== null,
    secondFactor: user.totpConfirmedAt !== null,
    recoveryCodesLeft: recoveryCodesLeft(db, user.id),
    singleKeys: user.singleKeys,
    identity: provider && { provider: provider.name, connected },
    version: user.version,
  };
}

/** Changes name or keys. */
export function changeAccount({ db, user }: Given, { version, ...fields }: AccountChange): Account {
  const changed = changeUserAt(db, user.id, version, fields);
  if (changed) return accountOf(db, changed);
  const current = userById(db, user.id);
  throw new Problem("changed-meanwhile", { current: current && accountOf(db, current) });
}

/**
 * Sends a letter to an address a person wants to change to; it becomes theirs when they confirm it. The
 * reply does not tell whether somebody else has it.
 */
export async function askForEmail(given: Given, email: string, password: string | undefined): Promise<void> {
  const { db, now, address, user } = given;
  await makeSure(given, password);
  countAttempts(db, "send-link", { account: email, address }, now);
  later(() => {
    const holder = userByEmail(db, email);
    if (!holder || holder.id === user.id) sendConfirmation(db, user, email, now);
  });
}

/** Sends the letter that confirms a person's own address once more. */
export function confirmAgain({ db, now, address, user }: Given): void {
  if (user.emailConfirmedAt !== null) return;
  countAttempts(db, "send-link", { account: user.email, address }, now);
  sendConfirmation(db, user, user.email, now);
}

/** Sets a password, and ends every other sign-in and link of the person. */
export async function changePassword(
  given: Given,
  { password, newPassword }: { password?: string; newPassword: string },
): Promise<void> {
  const { db, user, session } = given;
  await makeSure(given, password);
  const passwordHash = await hashPassword(newPassword);
  inTransaction(db, () => {
    changeUser(db, user.id, { passwordHash });
    endSessionsOf(db, user.id, session.tokenHash);
    dropTokensOf(db, user.id);
  });
  postLetter(accountChangedLetter(user.email, user.name, "password"));
}

/** Names a session without giving its hash away. */
function sessionId({ tokenHash }: SessionRow): string {
  return tokenHash.slice(0, 16);
}

/** A person's own sign-ins that last, the newest in use first. `session` is the one that asks. */
export function ownSessions(db: Db, user: UserRow, session: SessionRow, now: number): OwnSession[] {
  return sessionsOf(db, user.id, now)
    .filter(({ complete }) => complete)
    .sort((a, b) => b.lastSeenAt - a.lastSeenAt)
    .map((row) => ({
      id: sessionId(row),
      browser: row.browser,
      createdAt: row.createdAt,
      lastSeenAt: row.lastSeenAt,
      current: row.tokenHash === session.tokenHash,
    }));
}

/** Ends one of a person's own sign-ins; another person's is not found. */
export function endOwnSession({ db, user, now }: Given, id: string): void {
  const row = sessionsOf(db, user.id, now).find((candidate) => sessionId(candidate) === id);
  if (!row) throw new Problem("not-found");
  endSession(db, row.tokenHash);
}
