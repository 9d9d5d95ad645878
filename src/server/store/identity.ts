import { and, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { identities, users } from "#db/schema/people.ts";
import type { UserRow } from "./session.ts";

export type IdentityRow = typeof identities.$inferSelect;

/** The person who signs in with this account of an outside identity provider. */
export function userByIdentity(db: Db, issuer: string, subject: string): UserRow | undefined {
  return db
    .select({ user: users })
    .from(identities)
    .innerJoin(users, eq(users.id, identities.userId))
    .where(and(eq(identities.issuer, issuer), eq(identities.subject, subject)))
    .get()?.user;
}

export function addIdentity(db: Db, row: IdentityRow): void {
  db.insert(identities).values(row).onConflictDoNothing().run();
}

export function identitiesOf(db: Db, userId: string): IdentityRow[] {
  return db.select().from(identities).where(eq(identities.userId, userId)).all();
}

/** Removes what a person has with one provider. */
export function removeIdentities(db: Db, userId: string, issuer: string): void {
  db.delete(identities)
    .where(and(eq(identities.userId, userId), eq(identities.issuer, issuer)))
    .run();
}
