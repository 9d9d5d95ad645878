import { and, eq, gt, lte } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { oneTimeTokens, users } from "#db/schema/people.ts";
import type { OneTimePurpose } from "#src/shapes/limits.ts";
import type { UserRow } from "./session.ts";

export type OneTimeTokenRow = typeof oneTimeTokens.$inferSelect;

/** Adds a link's token; an older one of the same purpose stops working. */
export function addOneTimeToken(db: Db, row: OneTimeTokenRow): void {
  db.delete(oneTimeTokens)
    .where(and(eq(oneTimeTokens.userId, row.userId), eq(oneTimeTokens.purpose, row.purpose)))
    .run();
  db.insert(oneTimeTokens).values(row).run();
}

/** What a token would open, without using it up. */
export function oneTimeTokenBy(
  db: Db,
  tokenHash: string,
  purpose: OneTimePurpose,
  now: number,
): { token: OneTimeTokenRow; user: UserRow } | undefined {
  return db
    .select({ token: oneTimeTokens, user: users })
    .from(oneTimeTokens)
    .innerJoin(users, eq(users.id, oneTimeTokens.userId))
    .where(
      and(
        eq(oneTimeTokens.tokenHash, tokenHash),
        eq(oneTimeTokens.purpose, purpose),
        gt(oneTimeTokens.expiresAt, now),
      ),
    )
    .get();
}

/** Removes a token; true for the one request that did. */
export function takeOneTimeToken(db: Db, tokenHash: string): boolean {
  return db.delete(oneTimeTokens).where(eq(oneTimeTokens.tokenHash, tokenHash)).run().changes === 1;
}

export function dropTokensOf(db: Db, userId: string): void {
  db.delete(oneTimeTokens).where(eq(oneTimeTokens.userId, userId)).run();
}

export function dropEndedTokens(db: Db, now: number): void {
  db.delete(oneTimeTokens).where(lte(oneTimeTokens.expiresAt, now)).run();
}
