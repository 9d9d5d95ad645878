import { z } from "zod";
import * as limits from "./limits.ts";

/** Fields that many nouns have, with the sentence that says what is right. */

/** What a thing is called: not empty, spaces around it dropped. */
export const Name = z
  .string()
  .trim()
  .min(1, "Give it a name.")
  .max(limits.NAME_LENGTH, `Write at most ${limits.NAME_LENGTH} characters.`);

/** A short text that may be empty, such as an order code. */
export const ShortText = z
  .string()
  .trim()
  .max(limits.NAME_LENGTH, `Write at most ${limits.NAME_LENGTH} characters.`);

export const Note = z.string().max(limits.TEXT_LENGTH, `Write at most ${limits.TEXT_LENGTH} characters.`);

function pieces(least: number, sentence: string) {
  return z
    .int("Write a whole number.")
    .min(least, sentence)
    .max(limits.QUANTITY_MOST, "Write at most 1 000 000 000.");
}

/** A number of pieces; there may be none. */
export const Pieces = pieces(0, "A number of pieces is not negative.");

/** A number of pieces that is ordered or counted in: at least one. */
export const Quantity = pieces(1, "Write a whole number of at least 1.");

/** Days from the order to the parcel. */
export const LeadTimeDays = z
  .int("Write whole days.")
  .min(0, "Days are not negative.")
  .max(3650, "Write at most 3650 days.");

/** The version of a row that an edit has seen; if another is there now it is a clash (409). */
export const Version = z.int().min(1);

/** Query of a removal: the version that is removed. */
export const RemovalQuery = z.strictObject({ version: z.coerce.number().int().min(1) });

/** The letters and digits that name a row. */
export const RowId = z.string().regex(/^[\w-]{1,64}$/, "This names nothing.");
