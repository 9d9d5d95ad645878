import type { Db } from "#db/client.ts";
import type { SeenInvitation, TakenInvitation } from "#src/shapes/invitation.ts";
import { countAttempts } from "./attempts.ts";
import { invitationByToken, seenInvitation } from "./invitations.ts";
import { newId } from "./new-id.ts";
import { noteChange } from "./note-change.ts";
import { hashPassword } from "./password.ts";
import { type FieldError, Problem } from "./problem.ts";
import type { Common } from "./route.ts";
import { sessionOf } from "./session.ts";
import { letIn } from "./sign-in.ts";
import { type FullInvitation, takeInvitation } from "./store/invitation.ts";
import { addGuest } from "./store/kit-guest.ts";
import { addMembership, membershipOf } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { addUser, userByEmail } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

function openInvitation({ db, now, address }: Common, token: string): FullInvitation {
  countAttempts(db, "use-link", { address }, now);
  const found = invitationByToken(db, token, now);
  if (!found) throw new Problem("link-not-valid");
  return found;
}

/** What an invitation says, for the one who holds its link. */
export function seeInvitation(given: Common, token: string): SeenInvitation {
  return seenInvitation(given.db, openInvitation(given, token));
}

/** Makes a person one of the workshop's people, with the role of the invitation. Call it inside a transaction. */
export function joinBy(
  db: Db,
  { invitation, workshop }: FullInvitation,
  user: UserRow,
  now: number,
): { workshop: string } {
  if (!takeInvitation(db, invitation.id, now)) throw new Problem("link-not-valid");
  const { role, kitId } = invitation;
  const before = membershipOf(db, workshop.id, user.id)?.membership.role ?? null;
  addMembership(db, { workshopId: workshop.id, userId: user.id, role, createdAt: now });
  if (kitId !== null && (before ?? role) === "co-builder")
    addGuest(db, { workshopId: workshop.id, kitId, userId: user.id });
  noteChange(
    { db, now, user, workshop },
    {
      action: "person.join",
      ...{ subjectId: user.id, subjectName: user.name, detail: { role: [before, before ?? role] } },
    },
  );
  return { workshop: workshop.id };
}

function missing({ name, password }: TakenInvitation): FieldError[] {
  return [
    ...(name ? [] : [{ at: "name", message: "Write your name." }]),
    ...(password ? [] : [{ at: "password", message: "Choose a password." }]),
  ];
}

/** Makes an account for the address of the invitation: its letter reached them, so the address is theirs. */
async function takeAsNewPerson(
  given: Common,
  found: FullInvitation,
  input: TakenInvitation,
): Promise<{ workshop: string }> {
  const { db, now } = given;
  const { email } = found.invitation;
  if (userByEmail(db, email)) throw new Problem("account-exists");
  const errors = missing(input);
  if (errors.length > 0) throw new Problem("wrong-input", { errors });
  const passwordHash = await hashPassword(input.password ?? "");
  const { user, place } = inTransaction(db, () => {
    if (userByEmail(db, email)) throw new Problem("account-exists");
    const row = { id: newId(), email, name: input.name ?? "", passwordHash };
    const made = addUser(db, { ...row, emailConfirmedAt: now, createdAt: now });
    return { user: made, place: joinBy(db, found, made, now) };
  });
  letIn(given, user);
  return place;
}

/** Takes an invitation: as the person who is signed in, or with a new account, which is then signed in. */
export async function acceptInvitation(given: Common, input: TakenInvitation): Promise<{ workshop: string }> {
  const { db, now, request } = given;
  const found = openInvitation(given, input.token);
  const { session, user } = sessionOf(db, request, now);
  if (!session?.complete) return takeAsNewPerson(given, found, input);
  return inTransaction(db, () => joinBy(db, found, user, now));
}
