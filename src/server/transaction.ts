import type { Db } from "#db/client.ts";

/**
 * Runs `change` so that all of it is kept or nothing. It writes through the same connection, so the store
 * functions inside take the same `db`; it must not await.
 */
export function inTransaction<T>(db: Db, change: () => T): T {
  return db.$client.transaction(change).immediate();
}
