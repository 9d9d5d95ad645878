import { mkdirSync } from "node:fs";
import type { RequestListener } from "node:http";
import { migrateDb, openDb } from "#db/client.ts";
import { now } from "./clock.ts";
import { config, lettersStayHere } from "./config.ts";
import { databasePath } from "./db.ts";
import { ensureDemonstration, passwordFile } from "./demonstration.ts";
import { startLetterBox } from "./fakes/letter-box.ts";
import { httpServer } from "./http-server.ts";

function tellPasswords(people: string[], dataFolder: string): void {
  if (people.length === 0) return;
  console.log(`The demonstration is loaded. Its people, with passwords made just now:\n${people.join("\n")}`);
  console.log(`They are printed this once and kept in ${passwordFile(dataFolder)}, which only you can read.`);
}

/** The production entry: settings, folder, migrations, demonstration, letters, then the server. */
async function main(): Promise<void> {
  const settings = config();
  mkdirSync(settings.dataFolder, { recursive: true, mode: 0o700 });
  const db = openDb(databasePath(settings.dataFolder));
  migrateDb(db);
  if (settings.demo)
    tellPasswords(await ensureDemonstration(db, settings.dataFolder, now()), settings.dataFolder);
  db.$client.close();
  if (lettersStayHere(settings)) await startLetterBox(settings.lettersPort, settings.dataFolder);

  process.env.ASTRO_NODE_AUTOSTART = "disabled";
  const entry = new URL("../../dist/server/entry.mjs", import.meta.url);
  const { handler } = (await import(entry.href)) as { handler: RequestListener };
  const server = httpServer(handler, settings);
  server.listen(settings.port, settings.host, () => {
    console.log(`Tinpenny is at ${settings.origin}`);
    if (lettersStayHere(settings)) console.log(`Letters stay here: ${settings.origin}/letters`);
    else if (!settings.smtpUrl) console.log("No mail goes out: set TINPENNY_SMTP_URL.");
  });
  for (const signal of ["SIGINT", "SIGTERM"] as const)
    process.on(signal, () => {
      server.close(() => process.exit(0));
      server.closeIdleConnections();
    });
}

await main();
