import { and, eq, isNull } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { recoveryCodes } from "#db/schema/people.ts";

/** Puts new codes in place of all older ones. */
export function replaceRecoveryCodes(db: Db, userId: string, codeHashes: readonly string[]): void {
  dropRecoveryCodes(db, userId);
  for (const codeHash of codeHashes) db.insert(recoveryCodes).values({ userId, codeHash }).run();
}

/** Uses a code up; true for the one request that did. */
export function takeRecoveryCode(db: Db, userId: string, codeHash: string, now: number): boolean {
  const taken = db
    .update(recoveryCodes)
    .set({ usedAt: now })
    .where(
      and(
        eq(recoveryCodes.userId, userId),
        eq(recoveryCodes.codeHash, codeHash),
        isNull(recoveryCodes.usedAt),
      ),
    )
    .run();
  return taken.changes === 1;
}

/** How many codes are left to use. */
export function recoveryCodesLeft(db: Db, userId: string): number {
  return db
    .select()
    .from(recoveryCodes)
    .where(and(eq(recoveryCodes.userId, userId), isNull(recoveryCodes.usedAt)))
    .all().length;
}

export function dropRecoveryCodes(db: Db, userId: string): void {
  db.delete(recoveryCodes).where(eq(recoveryCodes.userId, userId)).run();
}
