import { z } from "zod";
import { ListedCurrency } from "./currency.ts";
import { Day } from "./decimal-text.ts";
import { LeadTimeDays, Note, Pieces, Quantity, RowId, ShortText, Version } from "./field.ts";
import { checkDays, checkRungs, Ladder } from "./ladder.ts";
import * as limits from "./limits.ts";

const Written = Day.nullable();

/** What a person may set of an offer; `null` is not known or not shown. */
export const OfferFields = z.strictObject({
  supplierId: RowId,
  orderCode: ShortText,
  currency: ListedCurrency,
  priceModel: z.enum(limits.PRICE_MODELS),
  breaks: Ladder,
  minimumOrder: Quantity,
  orderMultiple: Quantity,
  stockShown: Pieces.nullable(),
  leadTimeDays: LeadTimeDays.nullable(),
  pricedOn: Written,
  validUntil: Written,
  note: Note,
});
export type OfferFields = z.infer<typeof OfferFields>;

/** Why nobody can order the quantity of a break; `null` where somebody can. Lots are ordered whole and add up. */
function notOrderable(offer: OfferFields, quantity: number): string | null {
  const { minimumOrder, orderMultiple, priceModel } = offer;
  if (priceModel === "lots")
    return quantity % orderMultiple === 0
      ? null
      : `A lot of ${quantity} is not a multiple of the ${orderMultiple} it is sold in.`;
  return quantity >= minimumOrder
    ? null
    : `${quantity} is below the minimum order of ${minimumOrder}, so nobody can buy at this price.`;
}

function checkOrderQuantities(offer: OfferFields, context: z.RefinementCtx): void {
  const { minimumOrder, orderMultiple, breaks } = offer;
  if (minimumOrder % orderMultiple !== 0) {
    const below = minimumOrder - (minimumOrder % orderMultiple);
    const fitting = [below, below + orderMultiple].filter((quantity) => quantity > 0).join(" or ");
    const message = `${minimumOrder} is not a multiple of ${orderMultiple}. Write ${fitting}.`;
    context.addIssue({ code: "custom", path: ["minimumOrder"], message });
  }
  for (const [place, { quantity }] of breaks.entries()) {
    const message = notOrderable(offer, quantity);
    if (message) context.addIssue({ code: "custom", path: ["breaks", place, "quantity"], message });
  }
}

/** A whole offer: its ladder can be climbed and its days are in order. */
export const Offer = OfferFields.superRefine(checkRungs)
  .superRefine(checkOrderQuantities)
  .superRefine(checkDays);

export const NewOffer = OfferFields;
export const OfferChange = OfferFields.partial().extend({ version: Version });

/** Many edits of the offers grid at once, such as a pasted block: all of it is taken, or nothing. */
export const OfferBatch = z
  .strictObject({
    change: z.array(OfferChange.extend({ id: RowId })).max(limits.PARTS_MOST),
    add: z.array(OfferFields.extend({ partId: RowId })).max(limits.PARTS_MOST),
    remove: z.array(z.strictObject({ id: RowId, version: Version })).max(limits.PARTS_MOST),
  })
  .partial();
export type OfferBatch = z.infer<typeof OfferBatch>;
