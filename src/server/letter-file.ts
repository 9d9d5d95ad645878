import { mkdirSync, readdirSync, readFileSync, unlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/** A letter the local letter box received. */
export interface KeptLetter {
  /** Milliseconds since 1970. */
  at: number;
  from: string;
  to: string[];
  subject: string;
  text: string;
}

const KEPT = 200;

function folderOf(dataFolder: string): string {
  return join(dataFolder, "letters");
}

/** File names of the kept letters, newest first: they begin with the time. */
function names(folder: string): string[] {
  return readdirSync(folder)
    .filter((name) => name.endsWith(".json"))
    .sort()
    .reverse();
}

/** Keeps a letter in the data folder, readable by its owner only; the newest 200 stay. */
export function keepLetter(dataFolder: string, id: string, letter: KeptLetter): void {
  const folder = folderOf(dataFolder);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const name = `${String(letter.at).padStart(15, "0")}-${id}.json`;
  writeFileSync(join(folder, name), JSON.stringify(letter), { mode: 0o600 });
  for (const old of names(folder).slice(KEPT)) unlinkSync(join(folder, old));
}

/** The kept letters, newest first. */
export function keptLetters(dataFolder: string): KeptLetter[] {
  const folder = folderOf(dataFolder);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  return names(folder).map((name) => JSON.parse(readFileSync(join(folder, name), "utf8")) as KeptLetter);
}
