import type { ColumnMapping } from "#src/partslist/mapping.ts";
import type { DraftDecisions, DraftEdit } from "#src/shapes/import.ts";
import { beginDraft } from "./bring-in/begin-draft.ts";
import { existingLines } from "./bring-in/existing-lines.ts";
import { draftAt, dropDraft, pricesFromAfter, writeDraft } from "./bring-in/import-at.ts";
import { type PricesView, pricesFromOf, pricesView } from "./bring-in/list-offers.ts";
import { type ListedImport, listedImports } from "./bring-in/listed-imports.ts";
import type { PartsSummary, PartsSummaryJob, summariseParts } from "./bring-in/parts-summary.ts";
import { readAside } from "./bring-in/read-aside.ts";
import type { PartsSource } from "./bring-in/read-parts.ts";
import { type FileView, fileView } from "./bring-in/view.ts";
import type { Terms } from "./bring-in/wanted-offer.ts";
import type { Changing } from "./note-change.ts";
import { rememberedMapping } from "./store/column-memory.ts";
import { type ImportPlace, type ImportRow, lastTaken } from "./store/import.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";

/** Bringing in parts lists: a draft is read anew from its text and its decisions whenever it is looked at. */

export interface InKit extends Changing {
  workshop: WorkshopRow;
  kit: KitRow;
}

/** A parts list being brought in, as its page shows it. */
export type PartsImportView = Omit<PartsSummary, "sheet"> & {
  kind: "parts-list";
  file: FileView;
  prices: PricesView;
};

export function partsPlace({ workshop, kit }: Pick<InKit, "workshop" | "kit">): ImportPlace {
  return { workshopId: workshop.id, kind: "parts-list", kitId: kit.id };
}

/** Where prices stand that a parts list states. They do not count as read anew: a list is no price list. */
export function partsTerms({ workshop, now }: InKit): Terms {
  return { today: new Date(now).toISOString().slice(0, 10), currency: workshop.currency, confirms: false };
}

/** What a draft is read from, and what it is compared with. */
export function partsSource({ db, workshop, kit }: InKit, row: ImportRow): PartsSource {
  return {
    id: row.id,
    kind: row.kind,
    text: row.content,
    mapping: row.mapping as ColumnMapping | null,
    remembered:
      (rememberedMapping(db, workshop.id, row.kind, row.fingerprint) as ColumnMapping | undefined) ?? null,
    decisions: row.answers as DraftDecisions,
    existing: existingLines(db, kit.id),
  };
}

function summaryJob(given: InKit, row: ImportRow): PartsSummaryJob {
  return { source: partsSource(given, row), pricesFrom: pricesFromOf(row), terms: partsTerms(given) };
}

function viewOf(given: InKit, row: ImportRow, read: ReturnType<typeof summariseParts>): PartsImportView {
  const { sheet, offers, ...summary } = read;
  return {
    ...summary,
    kind: "parts-list",
    file: fileView(row, sheet, lastTaken(given.db, partsPlace(given))),
    prices: pricesView(given, offers, pricesFromOf(row), given.workshop.currency),
  };
}

/** Begins to bring in a parts list. */
export function beginPartsImport(given: InKit, name: string, bytes: Uint8Array): Promise<{ id: string }> {
  return beginDraft(given, { kind: "parts-list", kitId: given.kit.id }, name, bytes);
}

export function partsImports(given: InKit): ListedImport[] {
  return listedImports(given, partsPlace(given));
}

/** A draft as it reads now. */
export async function partsImport(given: InKit, id: string): Promise<PartsImportView> {
  const row = draftAt(given, partsPlace(given), id);
  return viewOf(given, row, await readAside("parts-summary", summaryJob(given, row), row.rowCount));
}

/** Changes what columns mean, answers questions, says whose prices are; and how the list then reads. */
export async function editPartsImport(given: InKit, id: string, edit: DraftEdit): Promise<PartsImportView> {
  const row = draftAt(given, partsPlace(given), id, edit.version);
  const from = pricesFromAfter(given, row, edit.pricesFrom);
  const job = { ...summaryJob(given, { ...row, ...from }), edit };
  const { mapping, decisions, summary } = await readAside("parts-edit", job, row.rowCount);
  const change = { ...from, mapping, answers: decisions };
  writeDraft(given, row, change);
  return viewOf(given, { ...row, ...change, version: row.version + 1 }, summary);
}

export function dropPartsImport(given: InKit, id: string, seen: number): void {
  dropDraft(given, partsPlace(given), id, seen);
}
