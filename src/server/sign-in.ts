import type { SignInStep } from "#src/shapes/person.ts";
import { countAttempts, forgiveAttempts } from "./attempts.ts";
import { accountChangedLetter } from "./letters/account-changed.ts";
import { postLetter } from "./mail.ts";
import { isPassword } from "./password.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Common, InPerson } from "./route.ts";
import { takeSecondFactor } from "./second-factor.ts";
import { beginSession, sessionOf } from "./session.ts";
import { endSession, type UserRow } from "./store/session.ts";
import { userByEmail } from "./store/user.ts";

/** Begins a session in place of the one the request came with, and puts its cookie into the reply. */
function replaceSession(given: Common, user: UserRow, complete: boolean): void {
  const { db, request, now, headers } = given;
  const { session } = sessionOf(db, request, now);
  if (session) endSession(db, session.tokenHash);
  const browser = request.headers.get("user-agent") ?? "";
  headers.append("set-cookie", beginSession(db, user.id, browser, complete, now));
}

/** Lets a person in who showed who they are; with a second factor set up, that is asked next. */
export function letIn(given: Common, user: UserRow): SignInStep {
  const complete = user.totpConfirmedAt === null;
  replaceSession(given, user, complete);
  return { next: complete ? "done" : "second-factor" };
}

/** Signs in with address and password. The answer and its time are the same for an address nobody has. */
export async function signInWithPassword(
  given: Common,
  { email, password }: { email: string; password: string },
): Promise<SignInStep> {
  const { db, now, address } = given;
  const trying = { account: email, address };
  countAttempts(db, "sign-in", trying, now);
  const user = userByEmail(db, email);
  const right = await isPassword(user?.passwordHash, password);
  if (!user || !right) throw new Problem("wrong-credentials");
  forgiveAttempts(db, "sign-in", trying);
  return letIn(given, user);
}

/** Finishes a sign-in with an authenticator's code or a recovery code. */
export async function finishSignIn(given: Common & InPerson, code: string): Promise<SignInStep> {
  const { db, now, address, user, session } = given;
  if (session.complete) return { next: "done" };
  const trying = { account: user.id, address };
  countAttempts(db, "second-factor", trying, now);
  const factor = await takeSecondFactor(db, user, code, now);
  if (factor === null) throw wrongField("code", "This code is not right, or it was used already.");
  forgiveAttempts(db, "second-factor", trying);
  replaceSession(given, user, true);
  if (factor === "recovery-code") postLetter(accountChangedLetter(user.email, user.name, "recovery-code"));
  return { next: "done" };
}
