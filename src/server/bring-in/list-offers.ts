import type { DraftLine, ReadOffer } from "#src/partslist/draft.ts";
import type { PricesFrom } from "#src/shapes/import.ts";
import type { Changing } from "../note-change.ts";
import type { ImportRow } from "../store/import.ts";
import { suppliersOf } from "../store/supplier.ts";
import { type OfferFault, offerFaults, supplierKey, type Terms, type WantedOffer } from "./wanted-offer.ts";

/** A line of a list with the row it stands in. */
export interface OfferedLine {
  row: number;
  line: DraftLine;
}

/** Prices of a list, as the page speaks of them. */
export interface PricesView {
  /** Offers that will be taken. */
  offers: number;
  /** Offers whose supplier no column names; they stay out until somebody says whose they are. */
  unnamed: number;
  pricesFrom: PricesFrom | null;
  suppliers: { id: string; name: string; currency: string }[];
  /** Suppliers that will be added, with their freight not known. */
  newSuppliers: string[];
  /** Of prices whose currency the list does not say. */
  currency: string;
  faults: OfferFault[];
}

const FAULTS_SHOWN = 50;

/** Whose the prices are where no column says, as it was chosen. */
export function pricesFromOf(row: Pick<ImportRow, "supplierId" | "supplierName">): PricesFrom | null {
  if (row.supplierId !== null) return { id: row.supplierId };
  return row.supplierName === null ? null : { name: row.supplierName };
}

function isSaid({ supplier, orderCode, prices }: ReadOffer): boolean {
  return supplier !== null || orderCode !== null || prices.length > 0;
}

function wantedOffer(offer: ReadOffer, from: WantedOffer["supplier"], row: number): WantedOffer {
  return {
    partId: "",
    supplier: from,
    orderCode: offer.orderCode ?? "",
    currency: offer.prices.find(({ currency }) => currency !== null)?.currency ?? null,
    breaks: offer.prices.map(({ quantity, amount }) => ({ quantity, price: amount })),
    minimumOrder: null,
    orderMultiple: null,
    stockShown: null,
    leadTimeDays: null,
    at: `rows.${row}`,
  };
}

/** The offers of a list's lines, with how many name nobody. `partIds` are those of the lines, once they are known. */
export function wantedOffers(
  lines: readonly OfferedLine[],
  from: PricesFrom | null,
  partIds?: readonly string[],
): { wanted: WantedOffer[]; unnamed: number } {
  const wanted: WantedOffer[] = [];
  let unnamed = 0;
  for (const [place, { row, line }] of lines.entries())
    for (const offer of line.offers.filter(isSaid)) {
      const supplier = offer.supplier !== null ? { name: offer.supplier } : from;
      if (supplier === null) unnamed++;
      else wanted.push({ ...wantedOffer(offer, supplier, row), partId: partIds?.[place] ?? "" });
    }
  return { wanted, unnamed };
}

/** What a list's offers come to, without asking the database. */
export interface OffersRead {
  offers: number;
  unnamed: number;
  /** Names of suppliers, as the list writes them, each once. */
  names: string[];
  faults: OfferFault[];
}

export function offersRead(lines: readonly OfferedLine[], from: PricesFrom | null, terms: Terms): OffersRead {
  const { wanted, unnamed } = wantedOffers(lines, from);
  const names = new Map<string, string>();
  for (const { supplier } of wanted)
    if ("name" in supplier && !names.has(supplierKey(supplier.name)))
      names.set(supplierKey(supplier.name), supplier.name.trim());
  return {
    offers: wanted.length,
    unnamed,
    names: [...names.values()],
    faults: offerFaults(wanted, terms, FAULTS_SHOWN),
  };
}

/** The offers of a list beside the suppliers of the workshop. */
export function pricesView(
  { db, workshop }: Pick<Changing, "db" | "workshop">,
  read: OffersRead,
  pricesFrom: PricesFrom | null,
  currency: string,
): PricesView {
  const suppliers = suppliersOf(db, workshop.id);
  const known = new Set(suppliers.map(({ name }) => supplierKey(name)));
  return {
    offers: read.offers,
    unnamed: read.unnamed,
    pricesFrom,
    suppliers: suppliers.map(({ id, name, currency: own }) => ({ id, name, currency: own })),
    newSuppliers: read.names
      .filter((name) => !known.has(supplierKey(name)))
      .sort((a, b) => a.localeCompare(b, "en")),
    currency,
    faults: read.faults,
  };
}
