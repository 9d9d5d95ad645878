import { countAttempts, forgiveAttempts } from "./attempts.ts";
import { accountChangedLetter } from "./letters/account-changed.ts";
import { postLetter } from "./mail.ts";
import { makeSure } from "./make-sure.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Common, InPerson } from "./route.ts";
import {
  type AuthenticatorSetUp,
  authenticatorSetUp,
  newRecoveryCodes,
  newTotpSecret,
  recoveryCodeHash,
  takeTotp,
} from "./second-factor.ts";
import { dropRecoveryCodes, replaceRecoveryCodes } from "./store/recovery-code.ts";
import { endSessionsOf } from "./store/session.ts";
import { changeUser } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

type Given = Common & InPerson;

/** Shown once; only hashes are kept. */
export interface RecoveryCodes {
  recoveryCodes: string[];
}

/** Makes a secret for an authenticator. Signing in does not ask for it before it is confirmed. */
export async function beginSecondFactor(given: Given, password?: string): Promise<AuthenticatorSetUp> {
  const { db, user } = given;
  if (user.totpConfirmedAt !== null) throw new Problem("second-factor-on");
  await makeSure(given, password);
  const begun = changeUser(db, user.id, { totpSecret: newTotpSecret(user.id), totpLastStep: null });
  return authenticatorSetUp(begun ?? user);
}

function giveRecoveryCodes({ db, user }: Given): RecoveryCodes {
  const recoveryCodes = newRecoveryCodes();
  replaceRecoveryCodes(
    db,
    user.id,
    recoveryCodes.map((code) => recoveryCodeHash(user.id, code)),
  );
  return { recoveryCodes };
}

/**
 * Turns the second factor on, once the authenticator shows the right code, and ends every other sign-in:
 * they were begun without it.
 */
export async function confirmSecondFactor(given: Given, code: string): Promise<RecoveryCodes> {
  const { db, now, address, user, session } = given;
  if (user.totpConfirmedAt !== null) throw new Problem("second-factor-on");
  if (user.totpSecret === null) throw new Problem("second-factor-off");
  const trying = { account: user.id, address };
  countAttempts(db, "second-factor", trying, now);
  if (!(await takeTotp(db, user, code, now)))
    throw wrongField(
      "code",
      "This is not what the authenticator shows now. Check its clock and try the next.",
    );
  forgiveAttempts(db, "second-factor", trying);
  const codes = inTransaction(db, () => {
    changeUser(db, user.id, { totpConfirmedAt: now });
    endSessionsOf(db, user.id, session.tokenHash);
    return giveRecoveryCodes(given);
  });
  postLetter(accountChangedLetter(user.email, user.name, "second-factor-on"));
  return codes;
}

/** Turns the second factor off; its secret and the recovery codes are forgotten. */
export async function removeSecondFactor(given: Given, password?: string): Promise<void> {
  const { db, user } = given;
  await makeSure(given, password);
  inTransaction(db, () => {
    changeUser(db, user.id, { totpSecret: null, totpConfirmedAt: null, totpLastStep: null });
    dropRecoveryCodes(db, user.id);
  });
  if (user.totpConfirmedAt !== null)
    postLetter(accountChangedLetter(user.email, user.name, "second-factor-off"));
}

/** New recovery codes in place of all older ones. */
export async function renewRecoveryCodes(given: Given, password?: string): Promise<RecoveryCodes> {
  if (given.user.totpConfirmedAt === null) throw new Problem("second-factor-off");
  await makeSure(given, password);
  return inTransaction(given.db, () => giveRecoveryCodes(given));
}
