import { z } from "zod";
import { MEANINGS } from "#src/partslist/meanings.ts";
import { QUESTION_CODES } from "#src/partslist/question-codes.ts";
import { CurrencyCode } from "./decimal-text.ts";
import * as limits from "./limits.ts";

/** What a person sends while a list is brought in. */

const Version = z.int().min(1);
const Id = z.string().min(1).max(64);
/** A row as it is called on the page: a line of the file, counted from 1. */
const Row = z.int().min(1).max(10_000_000);
const Code = z.enum(QUESTION_CODES);

/** Cells copied from a spreadsheet or a mail, as text. */
export const PastedList = z.strictObject({
  text: z.string().trim().min(1, "Paste at least one row.").max(limits.UPLOAD_BYTES),
  name: z.string().trim().min(1).max(limits.NAME_LENGTH).optional(),
});
export type PastedList = z.infer<typeof PastedList>;

/** What one column means; a field left out stays. */
export const ColumnChange = z.strictObject({
  column: z
    .int()
    .min(0)
    .max(limits.UPLOAD_COLUMNS - 1),
  meaning: z.enum(MEANINGS).optional(),
  breakQuantity: z.int().min(1).max(limits.QUANTITY_MOST).nullable().optional(),
  supplier: z.string().trim().min(1).max(limits.NAME_LENGTH).nullable().optional(),
  decimalMark: z.enum(["point", "comma"]).nullable().optional(),
});
export type ColumnChange = z.infer<typeof ColumnChange>;

/** The choice made on a question of a row. */
export const AnswerEntry = z.strictObject({
  row: Row,
  code: Code,
  choice: z.string().min(1).max(64),
  typed: z.string().max(limits.TEXT_LENGTH).optional(),
});

/** What a draft keeps of a person's decisions about its rows. */
export const DraftDecisions = z.strictObject({
  answers: z.array(AnswerEntry),
  join: z.union([z.literal("all"), z.array(Row)]),
});
export type DraftDecisions = z.infer<typeof DraftDecisions>;

/** Whose the prices are where no column says. */
export const PricesFrom = z.union([
  z.strictObject({ id: Id }),
  z.strictObject({ name: z.string().trim().min(1, "Give the supplier a name.").max(limits.NAME_LENGTH) }),
]);
export type PricesFrom = z.infer<typeof PricesFrom>;

/** Fields left out stay as they are; the version is the one the person has seen. */
export const DraftEdit = z.strictObject({
  version: Version,
  /** `null`: the list has no heading. */
  headerRecord: z.int().min(0).max(limits.UPLOAD_ROWS).nullable().optional(),
  currency: CurrencyCode.nullable().optional(),
  columns: z.array(ColumnChange).max(limits.UPLOAD_COLUMNS).optional(),
  answers: z.array(AnswerEntry).max(1000).optional(),
  /** Questions that are to be open again. */
  reopen: z
    .array(z.strictObject({ row: Row, code: Code }))
    .max(1000)
    .optional(),
  /** Answers every open question by its suggestion. */
  takeSuggestions: z.literal(true).optional(),
  /** Equal lines that are to stand as one, by the first row of each offer. */
  join: z.union([z.literal("all"), z.array(Row).max(limits.UPLOAD_ROWS)]).optional(),
  /** Forgets what was said about columns and guesses them anew. */
  guessAgain: z.literal(true).optional(),
  pricesFrom: PricesFrom.nullable().optional(),
});
export type DraftEdit = z.infer<typeof DraftEdit>;

/** Taking a list: what the person saw of the difference must still be so. */
export const TakeList = z.strictObject({ version: Version, seen: z.string().length(64) });

/** Taking it back; `evenSo` after being told what changed since. */
export const TakeBack = z.strictObject({ version: Version, evenSo: z.literal(true).optional() });
