import type { Db } from "#db/client.ts";
import type { NewInvitation, OpenInvitation, SeenInvitation } from "#src/shapes/invitation.ts";
import { countAttempts } from "./attempts.ts";
import { invitationLetter } from "./letters/invitation.ts";
import { sendLetter } from "./mail.ts";
import { newId } from "./new-id.ts";
import { noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Common } from "./route.ts";
import { newSecretToken, tokenHash } from "./secret-token.ts";
import {
  addInvitation,
  type FullInvitation,
  invitationOf,
  invitationsOf,
  openInvitationByHash,
  removeInvitation,
  renewInvitation,
} from "./store/invitation.ts";
import { kitOf } from "./store/kit.ts";
import { membershipOf, type WorkshopRow } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { userByEmail } from "./store/user.ts";
import { inTransaction } from "./transaction.ts";

/** How long an invitation can be taken; its letter says the same. */
const WORKS = 7 * 24 * 60 * 60 * 1000;

type Given = Common & { user: UserRow; workshop: WorkshopRow };

function asOwnersSee({ invitation, kit, by }: FullInvitation, now: number): OpenInvitation {
  const { id, email, role, kitId, createdAt, expiresAt } = invitation;
  const ofKit = kitId !== null && kit !== null ? { id: kitId, name: kit } : null;
  return { id, email, role, kit: ofKit, by, sentAt: createdAt, expiresAt, ended: expiresAt <= now };
}

/** Invitations of a workshop that were not taken. */
export function openInvitations({
  db,
  workshop,
  now,
}: Pick<Given, "db" | "workshop" | "now">): OpenInvitation[] {
  return invitationsOf(db, workshop.id).map((row) => asOwnersSee(row, now));
}

/** Sends the letter; only the one it goes to learns the link, since it proves the address is theirs. */
async function send(given: Given, id: string, token: string): Promise<OpenInvitation> {
  const { db, user, workshop, now } = given;
  const row = invitationOf(db, workshop.id, id);
  if (!row) throw new Problem("not-found");
  const { email, role } = row.invitation;
  const words = { to: email, by: user.name, workshop: workshop.name, role, kit: row.kit, token };
  await sendLetter(invitationLetter(words));
  return asOwnersSee(row, now);
}

function requireNotHere(db: Db, workshop: WorkshopRow, email: string, role: string): void {
  const known = userByEmail(db, email);
  const here = known && membershipOf(db, workshop.id, known.id)?.membership;
  if (!known || !here || (here.role === "co-builder" && role === "co-builder")) return;
  throw new Problem("already-in-workshop", { parameters: { name: known.name } });
}

/** Asks somebody into the workshop by letter; an open invitation to the same address is replaced. */
export async function invite(given: Given, { email, role, kit }: NewInvitation): Promise<OpenInvitation> {
  const { db, now, address, user, workshop } = given;
  if (kit !== null && !kitOf(db, workshop.id, kit))
    throw wrongField("kit", "There is no such kit in this workshop.");
  requireNotHere(db, workshop, email, role);
  countAttempts(db, "invite", { account: email, address }, now);
  const [id, token] = [newId(), newSecretToken()];
  inTransaction(db, () => {
    addInvitation(db, {
      ...{ id, workshopId: workshop.id, email, role, kitId: kit, tokenHash: tokenHash(token) },
      ...{ invitedBy: user.id, createdAt: now, expiresAt: now + WORKS, acceptedAt: null },
    });
    noteChange(given, { action: "invitation.send", subjectId: id, subjectName: role });
  });
  return send(given, id, token);
}

/** Sends an invitation once more, with a new link and a new week; the earlier link stops working. */
export async function inviteAgain(given: Given, id: string): Promise<OpenInvitation> {
  const { db, now, address, workshop } = given;
  const row = invitationOf(db, workshop.id, id);
  if (!row) throw new Problem("not-found");
  countAttempts(db, "invite", { account: row.invitation.email, address }, now);
  const token = newSecretToken();
  renewInvitation(db, id, tokenHash(token), now + WORKS);
  return send(given, id, token);
}

/** Takes an invitation back; its link stops working. */
export function withdrawInvitation(given: Given, id: string): void {
  const { db, workshop } = given;
  inTransaction(db, () => {
    const row = invitationOf(db, workshop.id, id);
    if (!row) throw new Problem("not-found");
    removeInvitation(db, id);
    noteChange(given, { action: "invitation.withdraw", subjectId: id, subjectName: row.invitation.role });
  });
}

/** The open invitation of a link; `null` where it does not work. */
export function invitationByToken(db: Db, token: string, now: number): FullInvitation | null {
  return openInvitationByHash(db, tokenHash(token), now) ?? null;
}

/** What the holder of a link sees. */
export function seenInvitation(db: Db, { invitation, workshop, kit, by }: FullInvitation): SeenInvitation {
  const { email, role } = invitation;
  const hasAccount = userByEmail(db, email) !== undefined;
  return { workshop: workshop.name, by, email, role, kit, hasAccount };
}
