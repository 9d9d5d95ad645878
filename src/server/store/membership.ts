import { and, asc, count, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { users } from "#db/schema/people.ts";
import { accessTokens, memberships, workshops } from "#db/schema/workshops.ts";
import type { Role } from "#src/shapes/limits.ts";

export type WorkshopRow = typeof workshops.$inferSelect;
export type MembershipRow = typeof memberships.$inferSelect;

/** A workshop with the role this person has in it, if they have one. */
export function membershipOf(
  db: Db,
  workshopId: string,
  userId: string,
): { workshop: WorkshopRow; membership: MembershipRow } | undefined {
  return db
    .select({ workshop: workshops, membership: memberships })
    .from(memberships)
    .innerJoin(workshops, eq(workshops.id, memberships.workshopId))
    .where(and(eq(memberships.workshopId, workshopId), eq(memberships.userId, userId)))
    .get();
}

/** All workshops of a person, by name. */
export function workshopsOf(db: Db, userId: string): { workshop: WorkshopRow; membership: MembershipRow }[] {
  return db
    .select({ workshop: workshops, membership: memberships })
    .from(memberships)
    .innerJoin(workshops, eq(workshops.id, memberships.workshopId))
    .where(eq(memberships.userId, userId))
    .orderBy(asc(workshops.name))
    .all();
}

/** The people of a workshop, by name, with their roles. */
export function peopleOf(db: Db, workshopId: string) {
  return db
    .select({
      id: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      version: memberships.version,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.workshopId, workshopId))
    .orderBy(asc(users.name))
    .all();
}

/** Whether a co-builder was asked to this kit. */
export function isGuestOf(db: Db, kitId: string, userId: string): boolean {
  const row = db
    .select({ kitId: kitGuests.kitId })
    .from(kitGuests)
    .where(and(eq(kitGuests.kitId, kitId), eq(kitGuests.userId, userId)))
    .get();
  return row !== undefined;
}

/** Makes a person one of a workshop's people; one who is already stays as they are. */
export function addMembership(db: Db, row: typeof memberships.$inferInsert): void {
  db.insert(memberships).values(row).onConflictDoNothing().run();
}

/** Gives a person another role if their membership still has this version. */
export function changeRole(
  db: Db,
  { workshopId, userId, version }: MembershipRow,
  role: Role,
): MembershipRow | undefined {
  return db
    .update(memberships)
    .set({ role, version: version + 1 })
    .where(
      and(
        eq(memberships.workshopId, workshopId),
        eq(memberships.userId, userId),
        eq(memberships.version, version),
      ),
    )
    .returning()
    .get();
}

/** Takes a person out of a workshop, with their access tokens and the kits they were asked to. */
export function removeMembership(db: Db, workshopId: string, userId: string): void {
  db.delete(kitGuests)
    .where(and(eq(kitGuests.workshopId, workshopId), eq(kitGuests.userId, userId)))
    .run();
  db.delete(accessTokens)
    .where(and(eq(accessTokens.workshopId, workshopId), eq(accessTokens.userId, userId)))
    .run();
  db.delete(memberships)
    .where(and(eq(memberships.workshopId, workshopId), eq(memberships.userId, userId)))
    .run();
}

/** How many owners a workshop has. */
export function ownersCounted(db: Db, workshopId: string): number {
  const owners = and(eq(memberships.workshopId, workshopId), eq(memberships.role, "owner"));
  return db.select({ owners: count() }).from(memberships).where(owners).get()?.owners ?? 0;
}
