import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { users } from "#db/schema/people.ts";
import { memberships, workshops } from "#db/schema/workshops.ts";

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
