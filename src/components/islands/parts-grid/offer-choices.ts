import { unitPriceText } from "#src/components/amount-text.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { OfferChoice } from "./grid-context.ts";

/** The offers a part can be pinned to, as they stand in a list: "Ebbing EB-1003, from €0.011". */
export function offerChoices(plan: Plan, part: string): OfferChoice[] {
  const offers = plan.parts.find(({ id }) => id === part)?.offers ?? [];
  return offers.map((offer) => {
    const supplier =
      plan.suppliers.find(({ id }) => id === offer.supplier)?.name ?? "A supplier that is gone";
    const lowest = offer.breaks.at(-1);
    const price =
      lowest === undefined
        ? "no price"
        : offer.priceModel === "lots"
          ? "in lots"
          : `from ${unitPriceText(lowest.price, offer.currency)}`;
    return { id: offer.id, words: `${[supplier, offer.orderCode].filter(Boolean).join(" ")}, ${price}` };
  });
}
