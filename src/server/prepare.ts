import { mkdirSync } from "node:fs";
import { migrateDb, openDb } from "#db/client.ts";
import { now } from "./clock.ts";
import { type Config, lettersStayHere } from "./config.ts";
import { databasePath } from "./db.ts";
import { ensureDemonstration, passwordFile } from "./demonstration.ts";
import { startLetterBox } from "./fakes/letter-box.ts";

function tellPasswords(people: string[], dataFolder: string): void {
  if (people.length === 0) return;
  console.log(`The demonstration is loaded. Its people, with passwords made just now:\n${people.join("\n")}`);
  console.log(`They are printed this once and kept in ${passwordFile(dataFolder)}, which only you can read.`);
}

/** All that must stand before pages are served: folder, migrations, demonstration, letter box. */
export async function prepare(settings: Config): Promise<void> {
  mkdirSync(settings.dataFolder, { recursive: true, mode: 0o700 });
  const db = openDb(databasePath(settings.dataFolder));
  migrateDb(db);
  if (settings.demo)
    tellPasswords(await ensureDemonstration(db, settings.dataFolder, now()), settings.dataFolder);
  db.$client.close();
  if (lettersStayHere(settings)) await startLetterBox(settings.lettersPort, settings.dataFolder);
}
