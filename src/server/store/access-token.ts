import { and, eq, gt } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { users } from "#db/schema/people.ts";
import { accessTokens } from "#db/schema/workshops.ts";
import type { UserRow } from "./session.ts";

export type AccessTokenRow = typeof accessTokens.$inferSelect;

export function accessTokenByHash(
  db: Db,
  tokenHash: string,
  now: number,
): { token: AccessTokenRow; user: UserRow } | undefined {
  return db
    .select({ token: accessTokens, user: users })
    .from(accessTokens)
    .innerJoin(users, eq(users.id, accessTokens.userId))
    .where(and(eq(accessTokens.tokenHash, tokenHash), gt(accessTokens.expiresAt, now)))
    .get();
}

export function touchAccessToken(db: Db, id: string, lastUsedAt: number): void {
  db.update(accessTokens).set({ lastUsedAt }).where(eq(accessTokens.id, id)).run();
}

export function addAccessToken(db: Db, row: AccessTokenRow): void {
  db.insert(accessTokens).values(row).run();
}

export function accessTokensOf(db: Db, workshopId: string, userId: string): AccessTokenRow[] {
  return db
    .select()
    .from(accessTokens)
    .where(and(eq(accessTokens.workshopId, workshopId), eq(accessTokens.userId, userId)))
    .all();
}

/** Whether there was such a token of this person in this workshop to remove. */
export function removeAccessToken(db: Db, workshopId: string, userId: string, id: string): boolean {
  const gone = db
    .delete(accessTokens)
    .where(
      and(eq(accessTokens.id, id), eq(accessTokens.workshopId, workshopId), eq(accessTokens.userId, userId)),
    )
    .run();
  return gone.changes > 0;
}
