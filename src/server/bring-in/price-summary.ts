import type { Question } from "#src/partslist/draft.ts";
import type { ColumnMapping } from "#src/partslist/mapping.ts";
import type { PriceReadResult } from "#src/partslist/price-draft.ts";
import type { DraftDecisions, DraftEdit } from "#src/shapes/import.ts";
import { seenStamp } from "./difference-view.ts";
import { editedDecisions, editedMapping, editsColumns } from "./edit-draft.ts";
import { openList } from "./list-draft.ts";
import { type OfferDifferences, offerDifferences, type Supply } from "./offer-difference.ts";
import { type PricesReading, type PricesSource, readPriceList } from "./read-price-list.ts";
import {
  type ColumnsView,
  columnsView,
  type QuestionsView,
  questionsView,
  type SheetView,
  type SkippedView,
  sheetView,
  skippedView,
} from "./view.ts";
import { type OfferFault, offerFaults, supplierKey, type Terms, type WantedOffer } from "./wanted-offer.ts";

/** A reading of a price list in the size of a page. */
export interface PriceSummary {
  sheet: SheetView;
  columns: ColumnsView;
  counts: PriceReadResult["counts"];
  questions: QuestionsView;
  skipped: SkippedView[];
  difference: OfferDifferences;
  unnamed: number;
  /** Suppliers that will be added. */
  newSuppliers: string[];
  faults: OfferFault[];
  seen: string;
}

export interface PriceSummaryJob {
  source: PricesSource;
  supply: Supply;
  terms: Terms;
}

const FAULTS_SHOWN = 50;

function newNames(wanted: readonly WantedOffer[], { suppliers }: Supply): string[] {
  const known = new Set(suppliers.map(({ name }) => supplierKey(name)));
  const names = new Map<string, string>();
  for (const { supplier } of wanted)
    if ("name" in supplier && !known.has(supplierKey(supplier.name)))
      names.set(supplierKey(supplier.name), supplier.name.trim());
  return [...names.values()].sort((a, b) => a.localeCompare(b, "en"));
}

function summaryOf(reading: PricesReading, supply: Supply, terms: Terms): PriceSummary {
  const { draft, result, wanted, unnamed } = reading;
  const difference = offerDifferences(wanted, supply, terms);
  return {
    sheet: sheetView(draft),
    columns: columnsView(draft, result.rows),
    counts: result.counts,
    questions: questionsView(result.rows),
    skipped: skippedView(result.rows),
    difference,
    unnamed,
    newSuppliers: newNames(wanted, supply),
    faults: offerFaults(wanted, terms, FAULTS_SHOWN),
    seen: seenStamp(difference),
  };
}

/** Reads a price list for its page. */
export function summarisePrices({ source, supply, terms }: PriceSummaryJob): PriceSummary {
  return summaryOf(readPriceList(source), supply, terms);
}

export interface EditPricesJob extends PriceSummaryJob {
  edit: DraftEdit;
}

export interface EditedPrices {
  mapping: ColumnMapping | null;
  decisions: DraftDecisions;
  summary: PriceSummary;
}

function openQuestionsOf(source: PricesSource): Question[] {
  const { result } = readPriceList(source);
  return result.rows.flatMap(({ questions }) => questions.filter(({ answer }) => answer === null));
}

/** An edit of a price list in draft: what it decides, and how the list then reads. */
export function editPrices({ edit, source, ...rest }: EditPricesJob): EditedPrices {
  const draft = openList(source);
  const mapping = editsColumns(edit) ? editedMapping(source.kind, draft, edit) : source.mapping;
  const open = edit.takeSuggestions ? openQuestionsOf({ ...source, mapping }) : [];
  const decisions = editedDecisions(source.decisions, edit, open);
  return {
    mapping,
    decisions,
    summary: summarisePrices({ ...rest, source: { ...source, mapping, decisions } }),
  };
}

/** What is written when a price list is taken, and what its person had to see before. */
export interface PricesTaking {
  wanted: WantedOffer[];
  unnamed: number;
  mapping: ColumnMapping;
  mustRows: number[];
  seen: string;
}

/** Reads a price list for taking it. */
export function pricesTaking({ source, supply, terms }: PriceSummaryJob): PricesTaking {
  const { draft, result, wanted, unnamed } = readPriceList(source);
  const must = result.rows.flatMap(({ questions }) =>
    questions.filter(({ level, answer }) => level === "must" && answer === null),
  );
  return {
    wanted,
    unnamed,
    mapping: draft.mapping,
    mustRows: must.map(({ row }) => row),
    seen: seenStamp(offerDifferences(wanted, supply, terms)),
  };
}
