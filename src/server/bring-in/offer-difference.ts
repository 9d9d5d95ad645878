import type { Rung } from "#src/shapes/ladder.ts";
import type { OfferWithBreaks } from "../store/offer.ts";
import type { SupplierRow } from "../store/supplier.ts";
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

/** One offer of a price list beside what stands: `was` is `null` for a new one. */
export interface OfferDifference {
  row: number;
  supplier: string;
  part: string;
  orderCode: string;
  currency: string;
  was: { currency: string; breaks: Rung[] } | null;
  becomes: Rung[];
}

export interface OfferDifferences {
  counts: { added: number; changed: number; confirmed: number; same: number };
  /** The first of each where there are very many. */
  added: OfferDifference[];
  changed: OfferDifference[];
}

/** What offers are compared with. */
export interface Supply {
  suppliers: Pick<SupplierRow, "id" | "name" | "currency">[];
  offers: OfferWithBreaks[];
  /** Names of parts by id. */
  parts: Record<string, string>;
}

const SHOWN = 200;

function differenceOf(
  one: WantedOffer,
  supplier: string,
  fields: ReturnType<typeof newFields>,
  old: OfferWithBreaks | undefined,
  part: string,
): OfferDifference {
  return {
    row: Number(one.at.split(".")[1] ?? 0),
    supplier,
    part,
    orderCode: one.orderCode,
    currency: fields.currency,
    was: old ? { currency: old.offer.currency, breaks: old.breaks } : null,
    becomes: fields.breaks,
  };
}

/** What a price list would do to the offers there are, without doing it. */
export function offerDifferences(
  wanted: readonly WantedOffer[],
  supply: Supply,
  terms: Terms,
): OfferDifferences {
  const byName = new Map(supply.suppliers.map((row) => [supplierKey(row.name), row]));
  const known = new Map(supply.offers.map((row) => [offerKey(row.offer), row]));
  const found: OfferDifferences = {
    counts: { added: 0, changed: 0, confirmed: 0, same: 0 },
    added: [],
    changed: [],
  };
  const seen = new Set<string>();
  for (const one of wanted) {
    const name = "name" in one.supplier ? one.supplier.name.trim() : "";
    const supplier = byName.get(supplierKey(name)) ?? {
      id: `new ${supplierKey(name)}`,
      name,
      currency: terms.currency,
    };
    const key = offerKey({ partId: one.partId, supplierId: supplier.id, orderCode: one.orderCode });
    if (seen.has(key)) continue;
    if (one.breaks.length > 0) seen.add(key);
    const old = known.get(key);
    const fields = old ? changedFields(old, one, terms) : newFields(one, supplier, terms);
    const kind = kindOf(old, fields, terms);
    found.counts[kind]++;
    if ((kind === "added" || kind === "changed") && found[kind].length < SHOWN)
      found[kind].push(differenceOf(one, supplier.name, fields, old, supply.parts[one.partId] ?? ""));
  }
  return found;
}

function kindOf(
  old: OfferWithBreaks | undefined,
  fields: ReturnType<typeof newFields>,
  terms: Terms,
): keyof OfferDifferences["counts"] {
  if (!old) return "added";
  if (told(fields) !== toldOf(old)) return "changed";
  return terms.confirms && fields.pricedOn !== old.offer.pricedOn ? "confirmed" : "same";
}
