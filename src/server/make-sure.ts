import { countAttempts, forgiveAttempts } from "./attempts.ts";
import { isPassword } from "./password.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Common, InPerson } from "./route.ts";

const FRESH = 15 * 60 * 1000;

/**
 * Makes sure, before their way in changes, that it is the person and not somebody at their open screen: by
 * the password, or, for a person without one, by a sign-in of the last quarter of an hour.
 */
export async function makeSure(given: Common & InPerson, password: string | undefined): Promise<void> {
  const { db, now, address, user, session } = given;
  if (user.passwordHash === null) {
    if (now - session.createdAt > FRESH) throw new Problem("sign-in-again");
    return;
  }
  const trying = { account: user.email, address };
  countAttempts(db, "sign-in", trying, now);
  if (!(await isPassword(user.passwordHash, password ?? "")))
    throw wrongField("password", "This is not your password.");
  forgiveAttempts(db, "sign-in", trying);
}
