import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { type Db, openDb } from "#db/client.ts";
import { config } from "./config.ts";

let open: Db | undefined;

/** Where the database of an installation lies. */
export function databasePath(dataFolder: string): string {
  return join(dataFolder, "tinpenny.db");
}

/** This process's database, opened at the first use; `main.ts` has migrated it before. */
export function serverDb(): Db {
  if (!open) {
    mkdirSync(config().dataFolder, { recursive: true, mode: 0o700 });
    open = openDb(databasePath(config().dataFolder));
  }
  return open;
}

/** Puts another database in its place, for tests. */
export function setDb(db: Db): void {
  open = db;
}
