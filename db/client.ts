import { fileURLToPath } from "node:url";
import Database from "better-sqlite3";
import { type BetterSQLite3Database, drizzle } from "drizzle-orm/better-sqlite3";
import { migrate } from "drizzle-orm/better-sqlite3/migrator";

export type Db = BetterSQLite3Database & { $client: Database.Database };

/**
 * Opens a database file (or `":memory:"`, or the bytes of a serialised one) with the settings everything
 * relies on: write-ahead log, foreign keys on, and five seconds' patience when another process writes.
 */
export function openDb(source: string | Buffer): Db {
  const sqlite = new Database(source);
  sqlite.pragma("journal_mode = WAL");
  sqlite.pragma("synchronous = FULL");
  sqlite.pragma("busy_timeout = 5000");
  sqlite.pragma("foreign_keys = ON");
  return drizzle(sqlite) as Db;
}

/**
 * Applies the generated migrations. Foreign keys are off meanwhile: a table that SQLite has to rebuild would
 * otherwise take its children with it, since the pragma inside the migration's transaction does nothing.
 *
 * @throws when a migration leaves a row that points at nothing.
 */
export function migrateDb(
  db: Db,
  folder: string = fileURLToPath(new URL("migrations", import.meta.url)),
): void {
  db.$client.pragma("foreign_keys = OFF");
  migrate(db, { migrationsFolder: folder });
  const broken = db.$client.pragma("foreign_key_check") as unknown[];
  if (broken.length > 0) throw new Error(`The migrations left ${broken.length} rows that point at nothing.`);
  db.$client.pragma("foreign_keys = ON");
}
