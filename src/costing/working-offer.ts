import { convertMinor } from "./conversion.ts";
import { grainText } from "./grains.ts";
import { minorText } from "./money.ts";
import { pricedOrder } from "./order-details.ts";
import { need } from "./run-needs.ts";
import type { ConsideredOffer, PartLine, PricedOrder } from "./run-result.ts";
import { type WeighedOffer, weigh } from "./supplier-choice.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, type Sheet, type Step, step } from "./working-lines.ts";
import { boughtUpSteps, CHOICE_RULE, pricedSteps, rateSteps, supplierOf } from "./working-order.ts";

/**
 * What one offer would charge for what is to buy, and with its freight as though the part came alone, by
 * which it is compared (section 5). `id`: the part's and the offer's, joined by a colon. Null: no such offer,
 * or it cannot cover what is to buy.
 */
export function offerSheet(context: WorkingContext, id: string): Sheet | null {
  const part = context.result.parts.find((one) => id.startsWith(`${one.id}:`));
  const prepared = context.prepared.parts.find((one) => one.part.id === part?.id);
  const offer = prepared?.offers
    .flatMap(({ prepared: usable }) => usable ?? [])
    .find((one) => `${part?.id}:${one.offer.id}` === id);
  if (part === undefined || offer === undefined || part.toBuy === 0) return null;
  const weighed = weigh(offer, part.toBuy);
  const considered = part.considered.find((one) => one.offer === offer.offer.id);
  if (weighed === null || considered === undefined) return null;
  const order = pricedOrder(offer, part.toBuy, weighed.order);
  const [last, ...before] = pricedSteps(context, part, order).toReversed();
  return {
    title: `${part.name} from ${offer.supplier.terms.name}, for a run of ${context.result.kits}`,
    steps: [
      step(null, "To buy", count(part.toBuy, "pieces"), "2", { opens: `part:${part.id}` }),
      ...before.toReversed(),
      { ...(last as Step), result: true },
      ...aloneSteps(context, order, weighed),
      ...boughtUpSteps(order),
    ],
    notes: notesOf(context, part, considered),
    basis: `In ${order.currency}, without VAT`,
  };
}

/** Freight as though the part came alone, and both together in the plan's currency. */
function aloneSteps(context: WorkingContext, order: PricedOrder, weighed: WeighedOffer): Step[] {
  const { currency } = context.result;
  const source = from("offers", order.supplier);
  const label = "Freight, as though the part came alone";
  if (!weighed.freightKnown)
    return [
      step(null, label, notKnown([need("no-freight", [{ supplier: order.supplier }])]), "4.2", { source }),
    ];
  const freight = minorText(weighed.alone - weighed.order.cost, order.currency);
  const rate = rateSteps(context, order);
  const converted = grainText(convertMinor(weighed.alone, weighed.offer.worth));
  return [
    step("+", label, money(freight, order.currency), "4.2", { source }),
    step("=", "Alone", money(minorText(weighed.alone, order.currency), order.currency), "5"),
    ...(rate.length > 0 ? [...rate, step("=", "Converted", money(converted, currency), "1.4")] : []),
  ];
}

function notesOf(context: WorkingContext, part: PartLine, considered: ConsideredOffer): string[] {
  const names = part.orders.map((order) => supplierOf(context, order)?.terms.name ?? order.supplier);
  const taken = considered.chosen
    ? "This offer is taken."
    : `Not taken in this run: the part is bought from ${names.join(" and ")}.`;
  return [CHOICE_RULE, ...(considered.chosen || names.length > 0 ? [taken] : [])];
}
