import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { alphabet, generateRandomString } from "oslo/crypto";
import { Argon2id } from "oslo/password";
import type { Db } from "#db/client.ts";
import { loadDemonstration } from "#db/seed/load.ts";
import { PEOPLE } from "#db/seed/marsh-lane.ts";
import { inTransaction } from "./transaction.ts";

/** Letters and digits that nobody mistakes for one another on paper. */
const READABLE = alphabet("a-z", "0-9");

function password(): string {
  const letters = generateRandomString(48, READABLE).replace(/[il1o0]/g, "");
  return [0, 5, 10, 15].map((start) => letters.slice(start, start + 5)).join("-");
}

/** Where the demonstration's passwords are kept: outside version control, readable by their owner alone. */
export function passwordFile(dataFolder: string): string {
  return join(dataFolder, "demonstration-passwords.txt");
}

function anybodyHere(db: Db): boolean {
  return db.$client.prepare("select 1 from users limit 1").get() !== undefined;
}

/**
 * Loads the demonstration into an empty database, with a fresh random password for each of its people.
 *
 * @returns name, e-mail and password of each, to be printed this once; nothing where somebody is there already.
 */
export async function ensureDemonstration(db: Db, dataFolder: string, now: number): Promise<string[]> {
  if (anybodyHere(db)) return [];
  const argon = new Argon2id();
  const hashes: Record<string, string> = {};
  const words: string[] = [];
  for (const { key, name, email, role } of PEOPLE) {
    const secret = password();
    hashes[key] = await argon.hash(secret);
    words.push(`${email}  ${secret}  ${name}, ${role}`);
  }
  inTransaction(db, () => loadDemonstration(db, hashes, now));
  writeFileSync(passwordFile(dataFolder), `${words.join("\n")}\n`, { mode: 0o600 });
  return words;
}
