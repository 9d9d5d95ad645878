import { z } from "zod";
import { Amount } from "./decimal-text.ts";
import { Quantity } from "./field.ts";
import { BREAKS_PER_OFFER_MOST } from "./limits.ts";

/** One rung of a ladder as it is written: from this quantity on, this price each; or this lot at this price. */
export const Rung = z.strictObject({ quantity: Quantity, price: Amount });
export type Rung = z.infer<typeof Rung>;

/** A ladder; none at all is an offer whose price is not known yet. */
export const Ladder = z
  .array(Rung)
  .max(BREAKS_PER_OFFER_MOST, `A ladder has at most ${BREAKS_PER_OFFER_MOST} breaks.`);

/** Refuses a ladder in which a quantity stands twice, naming the later one. */
export function checkRungs({ breaks }: { breaks: readonly Rung[] }, context: z.RefinementCtx): void {
  const seen = new Set<number>();
  for (const [place, { quantity }] of breaks.entries()) {
    if (seen.has(quantity))
      context.addIssue({
        code: "custom",
        path: ["breaks", place, "quantity"],
        message: `The quantity ${quantity} stands twice in the ladder. Each break has its own.`,
      });
    seen.add(quantity);
  }
}

/** Refuses a price that ends before it began. */
export function checkDays(
  { pricedOn, validUntil }: { pricedOn: string | null; validUntil: string | null },
  context: z.RefinementCtx,
): void {
  if (pricedOn !== null && validUntil !== null && validUntil < pricedOn)
    context.addIssue({
      code: "custom",
      path: ["validUntil"],
      message: `It ends before the day of the price, ${pricedOn}.`,
    });
}
