import { and, eq, sql } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { users } from "#db/schema/people.ts";
import type { UserRow } from "./session.ts";

/** A new person's row; what is not known yet may be left out. */
export type NewUser = typeof users.$inferInsert;
type Changes = Partial<Omit<NewUser, "id" | "version" | "createdAt">>;

/** Whether anybody has an account at all; before that the first owner may be made. */
export function anybody(db: Db): boolean {
  return db.select({ id: users.id }).from(users).limit(1).get() !== undefined;
}

export function userById(db: Db, id: string): UserRow | undefined {
  return db.select().from(users).where(eq(users.id, id)).get();
}

/** `email` in lower case, as it is stored. */
export function userByEmail(db: Db, email: string): UserRow | undefined {
  return db.select().from(users).where(eq(users.email, email)).get();
}

export function addUser(db: Db, row: NewUser): UserRow {
  return db.insert(users).values(row).returning().get();
}

export function changeUser(db: Db, id: string, changes: Changes): UserRow | undefined {
  return db
    .update(users)
    .set({ ...changes, version: sql`${users.version} + 1` })
    .where(eq(users.id, id))
    .returning()
    .get();
}

/** Notes the workshop a person is in now; nobody edits that, so the version stays. */
export function setLastWorkshop(db: Db, id: string, lastWorkshopId: string): void {
  db.update(users).set({ lastWorkshopId }).where(eq(users.id, id)).run();
}

/** Changes a person if they are still at the version seen; `undefined` where they are not. */
export function changeUserAt(db: Db, id: string, version: number, changes: Changes): UserRow | undefined {
  return db
    .update(users)
    .set({ ...changes, version: version + 1 })
    .where(and(eq(users.id, id), eq(users.version, version)))
    .returning()
    .get();
}

/** Takes a time step for one code: true for exactly one request per step, however many arrive at once. */
export function takeTotpStep(db: Db, id: string, step: number): boolean {
  const taken = db
    .update(users)
    .set({ totpLastStep: step })
    .where(and(eq(users.id, id), sql`(${users.totpLastStep} is null or ${users.totpLastStep} < ${step})`))
    .run();
  return taken.changes === 1;
}
