import type { ColumnMapping } from "#src/partslist/mapping.ts";
import type { KnownPart } from "#src/partslist/price-draft.ts";
import type { DraftDecisions, DraftEdit, PricesFrom } from "#src/shapes/import.ts";
import { beginDraft } from "./bring-in/begin-draft.ts";
import { draftAt, dropDraft, pricesFromAfter, writeDraft } from "./bring-in/import-at.ts";
import { pricesFromOf } from "./bring-in/list-offers.ts";
import { type ListedImport, listedImports } from "./bring-in/listed-imports.ts";
import type { Supply } from "./bring-in/offer-difference.ts";
import type { PriceSummary, PriceSummaryJob } from "./bring-in/price-summary.ts";
import { readAside } from "./bring-in/read-aside.ts";
import { type FileView, fileView } from "./bring-in/view.ts";
import type { Changing } from "./note-change.ts";
import { rememberedMapping } from "./store/column-memory.ts";
import { type ImportPlace, type ImportRow, lastTaken } from "./store/import.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { type OfferWithBreaks, offersOf } from "./store/offer.ts";
import { type PartRow, partsOf } from "./store/part.ts";
import { suppliersOf } from "./store/supplier.ts";

/** Bringing in suppliers' price lists: the same drafts as parts lists, but their rows become offers of known parts. */

export interface InWorkshop extends Changing {
  workshop: WorkshopRow;
}

/** A price list being brought in, as its page shows it. */
export type PriceImportView = Omit<PriceSummary, "sheet" | "unnamed" | "newSuppliers" | "faults"> & {
  kind: "price-list";
  file: FileView;
  prices: PriceListView;
  /** Parts of the workshop, for saying what a row is for. */
  parts: { id: string; name: string }[];
};

export interface PriceListView {
  /** Offers whose supplier nobody has named. */
  unnamed: number;
  pricesFrom: PricesFrom | null;
  suppliers: { id: string; name: string; currency: string }[];
  newSuppliers: string[];
  currency: string;
  faults: PriceSummary["faults"];
}

export function pricesPlace({ workshop }: Pick<InWorkshop, "workshop">): ImportPlace {
  return { workshopId: workshop.id, kind: "price-list", kitId: null };
}

/** What a person calls a part in a list of many. */
function partName({ name, package: body, manufacturerPartNumber }: PartRow): string {
  return [name, body, manufacturerPartNumber].filter(Boolean).join(", ");
}

function knownParts(parts: readonly PartRow[], offers: readonly OfferWithBreaks[]): KnownPart[] {
  const codes = new Map<string, string[]>();
  for (const { offer } of offers)
    if (offer.orderCode !== "")
      codes.set(offer.partId, [...(codes.get(offer.partId) ?? []), offer.orderCode]);
  return parts.map((part) => ({
    id: part.id,
    name: partName(part),
    class: part.class,
    value: part.name,
    package: part.package || null,
    manufacturer: part.manufacturer || null,
    partNumber: part.manufacturerPartNumber || null,
    orderCodes: codes.get(part.id) ?? [],
  }));
}

function supplierNameOf({ db, workshop }: InWorkshop, from: PricesFrom | null): string | null {
  if (from === null) return null;
  if ("name" in from) return from.name;
  return suppliersOf(db, workshop.id).find(({ id }) => id === from.id)?.name ?? null;
}

/** Everything a price list is read from and compared with. A list that was taken before confirms nothing. */
export function pricesJob(given: InWorkshop, row: ImportRow): PriceSummaryJob {
  const { db, workshop, now } = given;
  const parts = partsOf(db, workshop.id);
  const offers = offersOf(db, workshop.id);
  const remembered = rememberedMapping(db, workshop.id, row.kind, row.fingerprint);
  const supply: Supply = {
    suppliers: suppliersOf(db, workshop.id).map(({ id, name, currency }) => ({ id, name, currency })),
    offers,
    parts: Object.fromEntries(parts.map((part) => [part.id, partName(part)])),
  };
  return {
    source: {
      id: row.id,
      kind: row.kind,
      text: row.content,
      mapping: row.mapping as ColumnMapping | null,
      remembered: (remembered as ColumnMapping | undefined) ?? null,
      decisions: row.answers as DraftDecisions,
      parts: knownParts(parts, offers),
      supplier: supplierNameOf(given, pricesFromOf(row)),
    },
    supply,
    terms: {
      today: new Date(now).toISOString().slice(0, 10),
      currency: workshop.currency,
      confirms: lastTaken(db, pricesPlace(given))?.contentHash !== row.contentHash,
    },
  };
}

function viewOf(
  given: InWorkshop,
  row: ImportRow,
  job: PriceSummaryJob,
  summary: PriceSummary,
): PriceImportView {
  const { sheet, unnamed, newSuppliers, faults, ...rest } = summary;
  const { suppliers, parts } = job.supply;
  return {
    ...rest,
    kind: "price-list",
    file: fileView(row, sheet, lastTaken(given.db, pricesPlace(given))),
    prices: {
      unnamed,
      pricesFrom: pricesFromOf(row),
      suppliers: [...suppliers],
      newSuppliers,
      currency: given.workshop.currency,
      faults,
    },
    parts: Object.entries(parts).map(([id, name]) => ({ id, name })),
  };
}

/** Begins to bring in a price list. */
export function beginPriceImport(
  given: InWorkshop,
  name: string,
  bytes: Uint8Array,
): Promise<{ id: string }> {
  return beginDraft(given, { kind: "price-list", kitId: null }, name, bytes);
}

export function priceImports(given: InWorkshop): ListedImport[] {
  return listedImports(given, pricesPlace(given));
}

/** A draft as it reads now. */
export async function priceImport(given: InWorkshop, id: string): Promise<PriceImportView> {
  const row = draftAt(given, pricesPlace(given), id);
  const job = pricesJob(given, row);
  return viewOf(given, row, job, await readAside("prices-summary", job, row.rowCount));
}

/** Changes what columns mean, answers questions, says whose the list is; and how it then reads. */
export async function editPriceImport(
  given: InWorkshop,
  id: string,
  edit: DraftEdit,
): Promise<PriceImportView> {
  const row = draftAt(given, pricesPlace(given), id, edit.version);
  const from = pricesFromAfter(given, row, edit.pricesFrom);
  const job = pricesJob(given, { ...row, ...from });
  const { mapping, decisions, summary } = await readAside("prices-edit", { ...job, edit }, row.rowCount);
  const change = { ...from, mapping, answers: decisions };
  writeDraft(given, row, change);
  return viewOf(given, { ...row, ...change, version: row.version + 1 }, job, summary);
}

export function dropPriceImport(given: InWorkshop, id: string, seen: number): void {
  dropDraft(given, pricesPlace(given), id, seen);
}
