import { readNumber } from "#src/partslist/numbers.ts";

/** What people write into cells, read as exact text or whole numbers. An empty entry is `null`: not known. */
export type Entry<T> = { ok: true; value: T | null } | { ok: false; sentence: string };

/** An amount of money or a measure: "4.90", "4,90", "€4.90", with at most so many decimals. */
export function readAmount(entry: string, places: number, example = "4.90"): Entry<string> {
  const bare = entry.replace(/[€$£¥]|^[A-Z]{3}\b|\b[A-Z]{3}$/g, "").trim();
  if (bare === "") return { ok: true, value: null };
  const read = readNumber(bare, null);
  if (read === null || (read.split(".")[0] ?? "").length > 12)
    return { ok: false, sentence: `Write an amount such as ${example}, not below zero.` };
  if ((read.split(".")[1]?.length ?? 0) > places)
    return { ok: false, sentence: `Write at most ${places} decimals.` };
  return { ok: true, value: read };
}

/** A whole number of pieces or days: "1 000", "1000". */
export function readWhole(entry: string, least: number): Entry<number> {
  if (entry.trim() === "") return { ok: true, value: null };
  const read = readNumber(entry, null);
  const value = read === null || read.includes(".") ? Number.NaN : Number(read);
  if (!Number.isSafeInteger(value) || value < least)
    return { ok: false, sentence: `Write a whole number of at least ${least}.` };
  return { ok: true, value };
}

/** A day: "2026-03-09" or "9.3.2026". */
export function readDay(entry: string): Entry<string> {
  const text = entry.trim();
  if (text === "") return { ok: true, value: null };
  const dotted = /^(\d{1,2})\.\s?(\d{1,2})\.\s?(\d{4})$/.exec(text);
  const day = dotted ? `${dotted[3]}-${dotted[2]?.padStart(2, "0")}-${dotted[1]?.padStart(2, "0")}` : text;
  const moment = /^\d{4}-\d{2}-\d{2}$/.test(day) ? Date.parse(`${day}T00:00:00Z`) : Number.NaN;
  if (Number.isNaN(moment) || new Date(moment).toISOString().slice(0, 10) !== day)
    return { ok: false, sentence: "Write a day such as 2026-03-09." };
  return { ok: true, value: day };
}
