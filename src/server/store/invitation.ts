import { and, asc, eq, gt, isNull, lte } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { invitations } from "#db/schema/guests.ts";
import { kits } from "#db/schema/kits.ts";
import { users } from "#db/schema/people.ts";
import { workshops } from "#db/schema/workshops.ts";
import type { WorkshopRow } from "./membership.ts";

export type InvitationRow = typeof invitations.$inferSelect;

/** An invitation with what its letter and page say. */
export interface FullInvitation {
  invitation: InvitationRow;
  workshop: WorkshopRow;
  /** Name of the kit a co-builder is asked to. */
  kit: string | null;
  /** Who asks; `null` where they are gone. */
  by: string | null;
}

function full(db: Db) {
  return db
    .select({ invitation: invitations, workshop: workshops, kit: kits.name, by: users.name })
    .from(invitations)
    .innerJoin(workshops, eq(workshops.id, invitations.workshopId))
    .leftJoin(kits, eq(kits.id, invitations.kitId))
    .leftJoin(users, eq(users.id, invitations.invitedBy));
}

/** An invitation that can still be taken. */
export function openInvitationByHash(db: Db, tokenHash: string, now: number): FullInvitation | undefined {
  return full(db)
    .where(
      and(
        eq(invitations.tokenHash, tokenHash),
        gt(invitations.expiresAt, now),
        isNull(invitations.acceptedAt),
      ),
    )
    .get();
}

/** A workshop's invitations that were not taken, also those that ran out, oldest first. */
export function invitationsOf(db: Db, workshopId: string): FullInvitation[] {
  return full(db)
    .where(and(eq(invitations.workshopId, workshopId), isNull(invitations.acceptedAt)))
    .orderBy(asc(invitations.createdAt))
    .all();
}

export function invitationOf(db: Db, workshopId: string, id: string): FullInvitation | undefined {
  return full(db)
    .where(
      and(eq(invitations.id, id), eq(invitations.workshopId, workshopId), isNull(invitations.acceptedAt)),
    )
    .get();
}

/** Adds an invitation in place of an open one to the same address. */
export function addInvitation(db: Db, row: InvitationRow): void {
  db.delete(invitations)
    .where(
      and(
        eq(invitations.workshopId, row.workshopId),
        eq(invitations.email, row.email),
        isNull(invitations.acceptedAt),
      ),
    )
    .run();
  db.insert(invitations).values(row).run();
}

/** Gives an invitation a new secret; the link of the earlier letter stops working. */
export function renewInvitation(db: Db, id: string, tokenHash: string, expiresAt: number): void {
  db.update(invitations).set({ tokenHash, expiresAt }).where(eq(invitations.id, id)).run();
}

export function removeInvitation(db: Db, id: string): void {
  db.delete(invitations).where(eq(invitations.id, id)).run();
}

/** Marks an invitation as taken; true for the one request that did. */
export function takeInvitation(db: Db, id: string, now: number): boolean {
  const taken = db
    .update(invitations)
    .set({ acceptedAt: now })
    .where(and(eq(invitations.id, id), isNull(invitations.acceptedAt)))
    .run();
  return taken.changes === 1;
}

/** Forgets invitations, taken or not, whose time ran out before a moment. */
export function dropInvitationsBefore(db: Db, expiredBefore: number): void {
  db.delete(invitations).where(lte(invitations.expiresAt, expiredBefore)).run();
}
