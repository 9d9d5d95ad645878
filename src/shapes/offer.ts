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

/** A lot is ordered whole and lots add up, so only prices per piece are held against the minimum order. */
function checkOrderQuantities(offer: OfferFields, context: z.RefinementCtx): void {
  const { minimumOrder, orderMultiple, priceModel, breaks } = offer;
  if (minimumOrder % orderMultiple !== 0) {
    const below = minimumOrder - (minimumOrder % orderMultiple);
    const fitting = [below, below + orderMultiple].filter((quantity) => quantity > 0).join(" or ");
    context.addIssue({
      code: "custom",
      path: ["minimumOrder"],
      message: `${minimumOrder} is not a multiple of ${orderMultiple}. Write ${fitting}.`,
    });
  }
  for (const [place, { quantity }] of breaks.entries())
    if (priceModel !== "lots" && quantity < minimumOrder)
      context.addIssue({
        code: "custom",
        path: ["breaks", place, "quantity"],
        message: `${quantity} is below the minimum order of ${minimumOrder}, so nobody can buy at this price.`,
      });
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
