import type { Rung } from "#src/shapes/ladder.ts";
import { Offer, type OfferFields } from "#src/shapes/offer.ts";
import { checked } from "../checked.ts";
import { type OfferRow, type OfferWithBreaks, offersOf } from "../store/offer.ts";
import { type SupplierRow, suppliersOf } from "../store/supplier.ts";
import type { Ledger } from "./ledger.ts";

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

export interface OfferCounts {
  added: number;
  changed: number;
  /** Priced as before, on a newer day. */
  confirmed: number;
  same: number;
  /** Names of the suppliers that were not there before. */
  newSuppliers: string[];
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

function supplierFinder(ledger: Ledger, counts: OfferCounts, terms: Terms) {
  const rows = suppliersOf(ledger.by.db, ledger.by.workshop.id);
  const byId = new Map(rows.map((row) => [row.id, row]));
  const byName = new Map(rows.map((row) => [supplierKey(row.name), row]));
  return (wanted: WantedOffer): SupplierRow | undefined => {
    if ("id" in wanted.supplier) return byId.get(wanted.supplier.id);
    const name = wanted.supplier.name.trim();
    const known = byName.get(supplierKey(name));
    if (known) return known;
    const made = ledger.addSupplier(name, wanted.currency ?? terms.currency);
    byName.set(supplierKey(name), made);
    counts.newSuppliers.push(name);
    return made;
  };
}

/**
 * Takes the offers of a list: new ones are added, those with the same part, supplier and order code are brought up to
 * date. A supplier nobody knows yet is added with its freight not known.
 *
 * @throws Problem wrong-input that names the row and field of an offer that cannot be.
 */
export function takeOffers(ledger: Ledger, wanted: readonly WantedOffer[], terms: Terms): OfferCounts {
  const counts: OfferCounts = { added: 0, changed: 0, confirmed: 0, same: 0, newSuppliers: [] };
  if (wanted.length === 0) return counts;
  const known = new Map(
    offersOf(ledger.by.db, ledger.by.workshop.id).map((row) => [offerKey(row.offer), row]),
  );
  const supplierFor = supplierFinder(ledger, counts, terms);
  const seen = new Set<string>();
  for (const one of wanted) {
    const supplier = supplierFor(one);
    if (!supplier) continue;
    const key = offerKey({ partId: one.partId, supplierId: supplier.id, orderCode: one.orderCode });
    // Two rows of one list with the same part and code state the same offer; the first with a price counts.
    if (seen.has(key)) continue;
    if (one.breaks.length > 0) seen.add(key);
    const old = known.get(key);
    if (old) known.set(key, bringUpToDate(ledger, old, one, terms, counts));
    else known.set(key, add(ledger, one, supplier, terms, counts));
  }
  return counts;
}

function add(ledger: Ledger, wanted: WantedOffer, supplier: SupplierRow, terms: Terms, counts: OfferCounts) {
  const { breaks, ...fields } = checked(Offer, newFields(wanted, supplier, terms), wanted.at);
  counts.added++;
  return ledger.addOffer({ ...fields, partId: wanted.partId }, breaks);
}

function bringUpToDate(
  ledger: Ledger,
  old: OfferWithBreaks,
  wanted: WantedOffer,
  terms: Terms,
  counts: OfferCounts,
): OfferWithBreaks {
  const fields = checked(Offer, changedFields(old, wanted, terms), wanted.at);
  const equal = told(fields) === toldOf(old);
  if (equal && !(terms.confirms && fields.pricedOn !== old.offer.pricedOn)) {
    counts.same++;
    return old;
  }
  if (equal) counts.confirmed++;
  else counts.changed++;
  const { breaks, ...change } = fields;
  return ledger.changeOffer(old, change, breaks);
}
