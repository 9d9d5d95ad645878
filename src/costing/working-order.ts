import { dayWords } from "./day-words.ts";
import type { PartLine, PartOrder, PricedOrder } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, number, type Step, step } from "./working-lines.ts";

/** How an offer is chosen, for the foot of a working. */
export const CHOICE_RULE =
  "Of several offers the one that is cheapest with its freight, as though the part came alone, is taken; on a tie the one with fewer left over, then by name.";

/** One order of a part: price, conversion, its share of the parcel, and what buying up saved (section 3). */
export function orderSteps(context: WorkingContext, part: PartLine, order: PartOrder): Step[] {
  const { currency } = context.result;
  const rate = rateSteps(context, order);
  const converted = step("=", "Converted", money(order.extendedConverted, currency), "1.4");
  return [
    ...pricedSteps(context, part, order),
    ...(rate.length > 0 ? [...rate, converted] : []),
    ...landedSteps(currency, order),
    ...boughtUpSteps(order),
  ];
}

/** What a supplier charges for an order, by the break it reaches, slice by slice, or in lots. */
export function pricedSteps(context: WorkingContext, part: PartLine, order: PricedOrder): Step[] {
  const { breakReached, quantity, currency } = order;
  const name = supplierOf(context, order)?.terms.name ?? order.supplier;
  const source = from("offers", part.id);
  const rounds = order.extended.split(".")[1]?.length ?? 0;
  const charged = money(order.extended, currency);
  if (breakReached === null || isSliced(context.prepared, part, order)) {
    const taken = order.lots.map((lot) => `${lot.count} of ${lot.quantity} for ${lot.price}`).join(", ");
    const label = taken === "" ? `${quantity} from ${name}, each slice at its price` : `${name}: ${taken}`;
    return [step(null, label, charged, "3", { source, rounds })];
  }
  const { price } = breakReached;
  return [
    step(null, `Ordered from ${name}`, count(quantity, "pieces"), "3", { source }),
    step("×", `Price each from ${breakReached.quantity}`, money(price, currency, 6), "3", { source }),
    step("=", `${name} charges`, charged, "1.3", { rounds }),
  ];
}

/** The rate of the supplier's currency; nothing where it is the plan's own. */
export function rateSteps(context: WorkingContext, order: PricedOrder): Step[] {
  const rate = supplierOf(context, order)?.worth?.rate;
  if (!rate) return [];
  const unit = `${context.result.currency} for one ${order.currency}`;
  return [
    step("×", `Rate of ${dayWords(rate.dated)}`, number(rate.perForeignUnit, unit), "1.4", {
      source: from("offers"),
    }),
  ];
}

/** The supplier of an order, with its terms and what its currency is worth. */
export function supplierOf({ prepared }: WorkingContext, { supplier }: PricedOrder) {
  return prepared.suppliers.find(({ id }) => id === supplier);
}

function isSliced({ plan }: WorkingContext["prepared"], part: PartLine, order: PricedOrder): boolean {
  const offers = plan.parts.find(({ id }) => id === part.id)?.offers ?? [];
  return offers.some(({ id, priceModel }) => id === order.offer && priceModel === "by-slice");
}

function landedSteps(currency: string, order: PartOrder): Step[] {
  if (!order.landed.known)
    return [
      step(null, "With its share of the parcel", notKnown(order.landed.needs), "4.4", {
        opens: `basket:${order.supplier}`,
      }),
    ];
  return [
    step(null, "With its share of the parcel, by value", money(order.landed, currency), "4.4", {
      opens: `basket:${order.supplier}`,
    }),
  ];
}

/** What the least permitted order would have cost, where a larger one costs less. */
export function boughtUpSteps({ boughtUp, quantity, currency }: PricedOrder): Step[] {
  if (boughtUp === null) return [];
  const cost = `${boughtUp.insteadOf} would cost`;
  return [
    step(null, cost, money(boughtUp.insteadOfCosts, currency), "3"),
    step("−", `${quantity} cost less by`, money(boughtUp.saves, currency), "3"),
    step(
      "=",
      `${quantity} cost; ${boughtUp.leftOver} stay on the shelf`,
      money(difference(boughtUp.insteadOfCosts, boughtUp.saves), currency),
      "3",
    ),
  ];
}

/** Two amounts with the same number of decimals, subtracted digit for digit. */
function difference(a: string, b: string): string {
  const places = a.split(".")[1]?.length ?? 0;
  const digits = (BigInt(a.replace(".", "")) - BigInt(b.replace(".", "")))
    .toString()
    .padStart(places + 1, "0");
  return places === 0 ? digits : `${digits.slice(0, -places)}.${digits.slice(-places)}`;
}
