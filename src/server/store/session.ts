import { and, eq, gt, lte, ne } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { sessions, users } from "#db/schema/people.ts";

export type SessionRow = typeof sessions.$inferSelect;
export type UserRow = typeof users.$inferSelect;

export function addSession(db: Db, row: SessionRow): void {
  db.insert(sessions).values(row).run();
}

/** The session with this token hash, if it has not ended, with its person. */
export function sessionByHash(
  db: Db,
  tokenHash: string,
  now: number,
): { session: SessionRow; user: UserRow } | undefined {
  return db
    .select({ session: sessions, user: users })
    .from(sessions)
    .innerJoin(users, eq(users.id, sessions.userId))
    .where(and(eq(sessions.tokenHash, tokenHash), gt(sessions.expiresAt, now)))
    .get();
}

export function touchSession(db: Db, tokenHash: string, lastSeenAt: number, expiresAt: number): void {
  db.update(sessions).set({ lastSeenAt, expiresAt }).where(eq(sessions.tokenHash, tokenHash)).run();
}

export function sessionsOf(db: Db, userId: string, now: number): SessionRow[] {
  return db
    .select()
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expiresAt, now)))
    .all();
}

export function endSession(db: Db, tokenHash: string): void {
  db.delete(sessions).where(eq(sessions.tokenHash, tokenHash)).run();
}

/** Signs a person out everywhere, or everywhere but in one session. */
export function endSessionsOf(db: Db, userId: string, butHash = ""): void {
  db.delete(sessions)
    .where(and(eq(sessions.userId, userId), ne(sessions.tokenHash, butHash)))
    .run();
}

export function dropEndedSessions(db: Db, now: number): void {
  db.delete(sessions).where(lte(sessions.expiresAt, now)).run();
}
