import type { JoinOffer, RowCounts } from "#src/partslist/draft.ts";
import type { ColumnMapping } from "#src/partslist/mapping.ts";
import type { PricesFrom } from "#src/shapes/import.ts";
import { type DifferenceView, differenceView, seenStamp } from "./difference-view.ts";
import { type OffersRead, offersRead } from "./list-offers.ts";
import { type PartsReading, type PartsSource, readParts } from "./read-parts.ts";
import {
  type ColumnsView,
  columnsView,
  type QuestionsView,
  questionsView,
  type RecognisedView,
  recognisedView,
  type SheetView,
  type SkippedView,
  sheetView,
  skippedView,
} from "./view.ts";
import type { Terms } from "./wanted-offer.ts";

/** A reading in the size of a page: all counts, and of each kind of row as many as can be looked at. */
export interface PartsSummary {
  sheet: SheetView;
  columns: ColumnsView;
  counts: RowCounts;
  questions: QuestionsView;
  skipped: SkippedView[];
  recognised: RecognisedView;
  joinOffers: JoinOffer[];
  difference: DifferenceView;
  /** To be sent back when the list is taken. */
  seen: string;
}

export interface PartsSummaryJob {
  source: PartsSource;
  pricesFrom: PricesFrom | null;
  terms: Terms;
}

const JOINS_SHOWN = 50;

function summaryOf(source: PartsSource, reading: PartsReading): PartsSummary {
  const { draft, result, difference } = reading;
  return {
    sheet: sheetView(draft),
    columns: columnsView(draft, result.rows),
    counts: result.counts,
    questions: questionsView(result.rows),
    skipped: skippedView(result.rows),
    recognised: recognisedView(result.rows),
    joinOffers: result.joinOffers.slice(0, JOINS_SHOWN),
    difference: differenceView(source, reading),
    seen: seenStamp(difference),
  };
}

/** Reads a parts list for its page. */
export function summariseParts({
  source,
  pricesFrom,
  terms,
}: PartsSummaryJob): PartsSummary & { offers: OffersRead } {
  const reading = readParts(source);
  return { ...summaryOf(source, reading), offers: offersRead(reading.lines, pricesFrom, terms) };
}

/** What is written when a parts list is taken, and what its person had to see before. */
export interface PartsTaking {
  lines: PartsReading["lines"];
  difference: PartsReading["difference"];
  mapping: ColumnMapping;
  mustRows: number[];
  seen: string;
}

/** Reads a parts list for taking it. */
export function partsTaking(source: PartsSource): PartsTaking {
  const { draft, result, lines, difference } = readParts(source);
  const must = result.rows.flatMap(({ questions }) =>
    questions.filter(({ level, answer }) => level === "must" && answer === null),
  );
  return {
    lines,
    difference,
    mapping: draft.mapping,
    mustRows: must.map(({ row }) => row),
    seen: seenStamp(difference),
  };
}
