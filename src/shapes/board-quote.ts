import { z } from "zod";
import { checkMinorUnit, ListedCurrency } from "./currency.ts";
import { Amount, Day } from "./decimal-text.ts";
import { LeadTimeDays, Name, Note, ShortText, Version } from "./field.ts";
import { checkDays, checkRungs, Ladder } from "./ladder.ts";
import * as limits from "./limits.ts";

/** Millimetres: more than nothing. */
const Millimetres = Amount.refine((text) => /[1-9]/.test(text), "Write a measure of more than 0 mm.");

/** What a person may set of a board house's quote; `null` is not stated or not known. */
export const BoardQuoteFields = z.strictObject({
  boardHouse: Name,
  currency: ListedCurrency,
  width: Millimetres.nullable(),
  height: Millimetres.nullable(),
  layers: z.int("Write a whole number.").min(1, "A board has at least 1 layer.").max(64).nullable(),
  finish: ShortText,
  colour: ShortText,
  priceModel: z.enum(limits.BOARD_PRICE_MODELS),
  breaks: Ladder,
  engineeringCharge: Amount,
  stencilCharge: Amount,
  freight: Amount.nullable(),
  leadTimeDays: LeadTimeDays.nullable(),
  pricedOn: Day.nullable(),
  validUntil: Day.nullable(),
  note: Note,
});
export type BoardQuoteFields = z.infer<typeof BoardQuoteFields>;

const AMOUNTS = ["engineeringCharge", "stencilCharge", "freight"] as const;

/** A whole quote: each lot or break once, days in order, charges in whole minor units. */
export const BoardQuote = BoardQuoteFields.superRefine(checkMinorUnit<BoardQuoteFields>(AMOUNTS))
  .superRefine(checkRungs)
  .superRefine(checkDays);

export const NewBoardQuote = BoardQuoteFields;
export const BoardQuoteChange = BoardQuoteFields.partial().extend({ version: Version });
