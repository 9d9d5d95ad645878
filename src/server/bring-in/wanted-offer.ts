import type { Rung } from "#src/shapes/ladder.ts";
import { Offer, type OfferFields } from "#src/shapes/offer.ts";
import type { OfferRow, OfferWithBreaks } from "../store/offer.ts";
import type { SupplierRow } from "../store/supplier.ts";

/** An offer as a list states it; `null` is "the list does not say". */
export interface WantedOffer {
  partId: string;
  supplier: { id: string } | { name: string };
  orderCode: string;
  currency: string | null;
  breaks: readonly Rung[];
  minimumOrder: number | null;
  orderMultiple: number | null;
  stockShown: number | null;
  leadTimeDays: number | null;
  /** Path of the row, for naming a field that cannot be taken: `rows.15`. */
  at: string;
}

export interface Terms {
  /** The day the list was taken, ISO 8601. */
  today: string;
  /** Of prices whose currency neither the list nor the supplier states. */
  currency: string;
  /** Whether an unchanged price counts as read anew today. */
  confirms: boolean;
}

/** "Ebbing " and "EBBING" are one supplier. */
export function supplierKey(name: string): string {
  return name.trim().toLowerCase().replace(/\s+/g, " ");
}

/** An offer is known by its part, its supplier and the supplier's code. */
export function offerKey({
  partId,
  supplierId,
  orderCode,
}: Pick<OfferRow, "partId" | "supplierId" | "orderCode">): string {
  return JSON.stringify([partId, supplierId, orderCode]);
}

/**
 * A ladder as it can be bought from: nothing below the least order, and the price that holds there. "1: 0.10, 10:
 * 0.08" with at least 25 is "25: 0.08", which says the same.
 */
function ladderFrom(least: number, breaks: readonly Rung[]): Rung[] {
  const rising = [...breaks].sort((a, b) => a.quantity - b.quantity);
  const below = rising.filter(({ quantity }) => quantity <= least).at(-1);
  const above = rising.filter(({ quantity }) => quantity > least);
  return below ? [{ quantity: least, price: below.price }, ...above] : above;
}

function leastOrder(wanted: WantedOffer, multiple: number): number {
  if (wanted.minimumOrder !== null) return wanted.minimumOrder;
  const first = Math.min(...wanted.breaks.map(({ quantity }) => quantity));
  return Number.isFinite(first) ? Math.ceil(first / multiple) * multiple : multiple;
}

export function newFields(
  wanted: WantedOffer,
  supplier: Pick<SupplierRow, "id" | "currency">,
  terms: Terms,
): OfferFields {
  const orderMultiple = wanted.orderMultiple ?? 1;
  const minimumOrder = leastOrder(wanted, orderMultiple);
  return {
    supplierId: supplier.id,
    orderCode: wanted.orderCode,
    currency: wanted.currency ?? supplier.currency,
    priceModel: "whole-order",
    breaks: ladderFrom(minimumOrder, wanted.breaks),
    minimumOrder,
    orderMultiple,
    stockShown: wanted.stockShown,
    leadTimeDays: wanted.leadTimeDays,
    pricedOn: wanted.breaks.length > 0 ? terms.today : null,
    validUntil: null,
    note: "",
  };
}

/** What the list says put over what is there; a list without prices leaves the ladder and its day alone. */
export function changedFields(
  { offer, breaks }: OfferWithBreaks,
  wanted: WantedOffer,
  terms: Terms,
): OfferFields {
  const { supplierId, orderCode, priceModel, validUntil, note } = offer;
  const priced = wanted.breaks.length > 0;
  const orderMultiple = wanted.orderMultiple ?? offer.orderMultiple;
  const kept = priced ? Math.max(offer.minimumOrder, leastOrder(wanted, orderMultiple)) : offer.minimumOrder;
  const minimumOrder = wanted.minimumOrder ?? kept;
  return {
    ...{ supplierId, orderCode, note, minimumOrder, orderMultiple },
    currency: priced ? (wanted.currency ?? offer.currency) : offer.currency,
    priceModel: priced ? "whole-order" : priceModel,
    breaks: priced ? ladderFrom(minimumOrder, wanted.breaks) : breaks,
    stockShown: wanted.stockShown ?? offer.stockShown,
    leadTimeDays: wanted.leadTimeDays ?? offer.leadTimeDays,
    pricedOn: priced ? terms.today : offer.pricedOn,
    validUntil: priced ? null : validUntil,
  };
}

/** Everything but the day, in one text: equal where nothing changes. */
export function told({ pricedOn, validUntil, note, ...rest }: OfferFields): string {
  return JSON.stringify(rest, Object.keys(rest).sort().concat("quantity", "price"));
}

export function toldOf(offer: OfferWithBreaks): string {
  return told(asFields(offer));
}

function asFields({ offer, breaks }: OfferWithBreaks): OfferFields {
  const { supplierId, orderCode, currency, priceModel, minimumOrder, orderMultiple } = offer;
  const { stockShown, leadTimeDays, pricedOn, validUntil, note } = offer;
  return {
    ...{ supplierId, orderCode, currency, priceModel, breaks, minimumOrder, orderMultiple },
    ...{ stockShown, leadTimeDays, pricedOn, validUntil, note },
  };
}

/** An offer of a list that cannot be as it stands: its row, and what would be right. */
export interface OfferFault {
  at: string;
  message: string;
}

/** What of a list's offers cannot be taken, told before anybody tries. */
export function offerFaults(wanted: readonly WantedOffer[], terms: Terms, most: number): OfferFault[] {
  const faults: OfferFault[] = [];
  for (const one of wanted) {
    if (faults.length >= most) break;
    const { currency } = terms;
    const fields = newFields(one, { id: "x", currency }, terms);
    const read = Offer.safeParse(fields);
    for (const { path, message } of read.error?.issues ?? [])
      faults.push({ at: [one.at, ...path].join("."), message });
  }
  return faults;
}
