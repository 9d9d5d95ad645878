import { shiftDecimal } from "#src/partslist/exact-decimal.ts";
import { readNumber } from "#src/partslist/numbers.ts";
import { QUANTITY_MOST } from "#src/shapes/limits.ts";

/** An entry as its value; empty is "not set". */
export type Entry<T> = { ok: true; value: T | null } | { ok: false; message: string };

/** "0.062", "0,062", "€0.062" as exact decimal text. */
export function amountOrNothing(text: string, message: string): Entry<string> {
  const plain = text.replace(/[\s\u00a0€$£¥]/g, "");
  if (plain === "") return { ok: true, value: null };
  const value = readNumber(plain, null);
  return value !== null && /^\d{1,12}(\.\d{1,6})?$/.test(value)
    ? { ok: true, value }
    : { ok: false, message };
}

/** "2", "2.5 %" as a share: "0.02", "0.025". */
export function percentOrNothing(text: string, most: number): Entry<string> {
  const plain = text.replace(/[\s\u00a0%]/g, "");
  if (plain === "") return { ok: true, value: null };
  const value = readNumber(plain, null);
  const message = `Write per cent from 0 to ${most}, at most four decimals.`;
  if (value === null || !/^\d{1,3}(\.\d{1,4})?$/.test(value) || Number(value) > most)
    return { ok: false, message };
  return { ok: true, value: shiftDecimal(value, -2) };
}

/** A share as per cent: "0.025" is "2.5". */
export function percentWords(share: string | null): string {
  return share === null ? "" : shiftDecimal(share, 2);
}

/** A number of pieces. */
export function wholeOrNothing(text: string): Entry<number> {
  const plain = text.replace(/[\s\u00a0]/g, "");
  if (plain === "") return { ok: true, value: null };
  if (!/^\d{1,10}$/.test(plain) || Number(plain) > QUANTITY_MOST)
    return { ok: false, message: "Write a whole number of pieces." };
  return { ok: true, value: Number(plain) };
}
