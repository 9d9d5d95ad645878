import { OFFERS_PER_PART_MOST, SUPPLIERS_MOST } from "#src/shapes/limits.ts";
import { Offer } from "#src/shapes/offer.ts";
import { checked } from "../checked.ts";
import { wrongField } from "../problem.ts";
import { type OfferWithBreaks, offersOf } from "../store/offer.ts";
import { type SupplierRow, suppliersOf } from "../store/supplier.ts";
import type { Ledger } from "./ledger.ts";
import {
  changedFields,
  newFields,
  offerKey,
  supplierKey,
  type Terms,
  told,
  toldOf,
  type WantedOffer,
} from "./wanted-offer.ts";

export interface OfferCounts {
  added: number;
  changed: number;
  /** Priced as before, on a newer day. */
  confirmed: number;
  same: number;
  /** Names of the suppliers that were not there before. */
  newSuppliers: string[];
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
    if (byName.size >= SUPPLIERS_MOST)
      throw wrongField(wanted.at, `A workshop has at most ${SUPPLIERS_MOST} suppliers. Leave this row out.`);
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
  const perPart = new Map<string, number>();
  for (const { offer } of known.values()) perPart.set(offer.partId, (perPart.get(offer.partId) ?? 0) + 1);
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
    if (!old) refuseTooMany(perPart, one);
    known.set(
      key,
      old ? bringUpToDate(ledger, old, one, terms, counts) : add(ledger, one, supplier, terms, counts),
    );
  }
  return counts;
}

/** A part has only so many offers that a plan can weigh. */
function refuseTooMany(perPart: Map<string, number>, { partId, at }: WantedOffer): void {
  const offers = (perPart.get(partId) ?? 0) + 1;
  if (offers > OFFERS_PER_PART_MOST)
    throw wrongField(at, `A part has at most ${OFFERS_PER_PART_MOST} offers. Leave this row out.`);
  perPart.set(partId, offers);
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
