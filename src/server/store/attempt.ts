import { eq, lte, sql } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { attemptCounts } from "#db/schema/people.ts";

export type AttemptRow = typeof attemptCounts.$inferSelect;

/** Counts one more attempt under a key, in one statement; a window that has ended begins anew. */
export function countAttempt(db: Db, key: string, windowLasts: number, now: number): AttemptRow {
  const ended = sql`${attemptCounts.windowEndsAt} <= ${now}`;
  return db
    .insert(attemptCounts)
    .values({ key, count: 1, windowEndsAt: now + windowLasts })
    .onConflictDoUpdate({
      target: attemptCounts.key,
      set: {
        count: sql`case when ${ended} then 1 else ${attemptCounts.count} + 1 end`,
        windowEndsAt: sql`case when ${ended} then ${now + windowLasts} else ${attemptCounts.windowEndsAt} end`,
      },
    })
    .returning()
    .get();
}

export function forgetAttempts(db: Db, key: string): void {
  db.delete(attemptCounts).where(eq(attemptCounts.key, key)).run();
}

/** Takes one attempt back that turned out to be no failure. */
export function takeBackAttempt(db: Db, key: string): void {
  db.update(attemptCounts)
    .set({ count: sql`max(${attemptCounts.count} - 1, 0)` })
    .where(eq(attemptCounts.key, key))
    .run();
}

export function dropEndedAttempts(db: Db, now: number): void {
  db.delete(attemptCounts).where(lte(attemptCounts.windowEndsAt, now)).run();
}
