import { z } from "zod";
import { checkMinorUnit, ListedCurrency } from "./currency.ts";
import { Amount, Day, Side } from "./decimal-text.ts";
import { LeadTimeDays, Name, Note, ShortText, Version } from "./field.ts";
import { checkDays, checkRungs, Ladder } from "./ladder.ts";
import * as limits from "./limits.ts";

/** What a person may set of a board house's quote; `null` is not stated or not known. */
export const BoardQuoteFields = z.strictObject({
  boardHouse: Name,
  currency: ListedCurrency,
  width: Side.nullable(),
  height: Side.nullable(),
  /** `null`: the boards come singly. */
  boardsPerPanel: z
    .int("Write a whole number.")
    .min(2, "A panel holds at least 2 boards.")
    .max(limits.BOARDS_PER_PANEL_MOST, `A panel holds at most ${limits.BOARDS_PER_PANEL_MOST} boards.`)
    .nullable(),
  panelWidth: Side.nullable(),
  panelHeight: Side.nullable(),
  depanelling: Amount,
  layers: z.int("Write a whole number.").min(1, "A board has at least 1 layer.").max(64).nullable(),
  finish: ShortText,
  colour: ShortText,
  priceModel: z.enum(limits.BOARD_PRICE_MODELS),
  breaks: Ladder,
  /** The terms of a formula; `null` for the other price models. */
  setUp: Amount.nullable(),
  areaRate: Amount.nullable(),
  areaUnit: z.enum(limits.AREA_UNITS).nullable(),
  perBoard: Amount.nullable(),
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
const FORMULA = ["setUp", "areaRate", "areaUnit", "perBoard"] as const;

/** Refuses a formula that is not whole or has breaks as well, and its terms where another model prices. */
function checkFormula(quote: BoardQuoteFields, context: z.RefinementCtx): void {
  const refuse = (field: keyof BoardQuoteFields, message: string) =>
    context.addIssue({ code: "custom", path: [field], message });
  const formula = quote.priceModel === "formula";
  for (const field of FORMULA) {
    if (formula && quote[field] === null)
      refuse(field, "A formula needs it. Write 0 where nothing is charged.");
    if (!formula && quote[field] !== null) refuse(field, "Only a formula has this.");
  }
  if (formula && quote.breaks.length > 0) refuse("breaks", "A formula has no breaks. Leave them out.");
}

/** Refuses what only a panel has where boards come singly, and half a panel's size. */
function checkPanel(quote: BoardQuoteFields, context: z.RefinementCtx): void {
  const { boardsPerPanel, panelWidth, panelHeight, depanelling } = quote;
  const refuse = (field: keyof BoardQuoteFields, message: string) =>
    context.addIssue({ code: "custom", path: [field], message });
  if (boardsPerPanel === null) {
    if (panelWidth !== null) refuse("panelWidth", "Single boards come on no panel. Leave it out.");
    if (panelHeight !== null) refuse("panelHeight", "Single boards come on no panel. Leave it out.");
    if (/[1-9]/.test(depanelling)) refuse("depanelling", "Single boards are not broken out. Write 0.");
  }
  if (boardsPerPanel !== null && panelWidth !== null && panelHeight === null)
    refuse("panelHeight", "Write both sides of the panel, or neither.");
  if (boardsPerPanel !== null && panelWidth === null && panelHeight !== null)
    refuse("panelWidth", "Write both sides of the panel, or neither.");
}

/** A whole quote: each lot or break once, days in order, charges in whole minor units, formula and panel whole. */
export const BoardQuote = BoardQuoteFields.superRefine(checkMinorUnit<BoardQuoteFields>(AMOUNTS))
  .superRefine(checkRungs)
  .superRefine(checkDays)
  .superRefine(checkFormula)
  .superRefine(checkPanel);

export const NewBoardQuote = BoardQuoteFields;
export const BoardQuoteChange = BoardQuoteFields.partial().extend({ version: Version });
