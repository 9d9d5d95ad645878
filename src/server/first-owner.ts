import type { FirstOwner, SignInStep } from "#src/shapes/person.ts";
import { countAttempts } from "./attempts.ts";
import { newId } from "./new-id.ts";
import { hashPassword } from "./password.ts";
import { Problem } from "./problem.ts";
import type { Common } from "./route.ts";
import { letIn } from "./sign-in.ts";
import { sendConfirmation } from "./sign-in-link.ts";
import { addUser, anybody } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";
import { beginWorkshop } from "./workshop.ts";

/** Makes the first owner and their workshop, while there is nobody at all, and signs them in. */
export async function makeFirstOwner(given: Common, input: FirstOwner): Promise<SignInStep> {
  const { db, now, address } = given;
  countAttempts(db, "first-owner", { address }, now);
  if (anybody(db)) throw new Problem("already-set-up");
  const passwordHash = await hashPassword(input.password);
  const user = inTransaction(db, () => {
    if (anybody(db)) throw new Problem("already-set-up");
    const { name, email, workshop, currency } = input;
    const owner = addUser(db, { id: newId(), name, email, passwordHash, createdAt: now });
    beginWorkshop({ db, now, user: owner }, { name: workshop, currency });
    return owner;
  });
  sendConfirmation(db, user, user.email, now);
  return letIn(given, user);
}
