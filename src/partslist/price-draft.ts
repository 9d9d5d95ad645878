import type { PartClass } from "#src/shapes/limits.ts";
import type { Question, ReadPrice, SkipReason } from "./draft.ts";

/** A part of the workshop that a price can be matched to. */
export interface KnownPart {
  id: string;
  /** What the page calls it, for sentences. */
  name: string;
  class: PartClass;
  value: string | null;
  package: string | null;
  manufacturer: string | null;
  partNumber: string | null;
  /** Order codes already known for it, of any supplier. */
  orderCodes: string[];
}

export type MatchedBy = "order-code" | "part-number" | "value-and-package" | "answer";

/** One offer of a price list, put together from one row or from one row for each break. */
export interface PriceDraft {
  /** Rows of the file it was read from. */
  rows: number[];
  supplier: string | null;
  orderCode: string | null;
  manufacturer: string | null;
  partNumber: string | null;
  description: string | null;
  value: string | null;
  package: string | null;
  currency: string | null;
  /** Rising by quantity. */
  breaks: ReadPrice[];
  minimumOrder: number | null;
  orderMultiple: number | null;
  stockShown: number | null;
  leadTimeDays: number | null;
  /** The part it is taken to be for; `null` where none is known. */
  part: string | null;
  matchedBy: MatchedBy | null;
}

interface PriceRowPlace {
  row: number;
  record: number;
  text: string;
  questions: Question[];
}
export type PriceRow =
  | (PriceRowPlace & { kind: "offer"; offer: PriceDraft })
  | (PriceRowPlace & { kind: "break"; into: number })
  | (PriceRowPlace & { kind: "question"; offer: PriceDraft | null })
  | (PriceRowPlace & { kind: "skipped"; reason: SkipReason });

export interface PriceReadResult {
  rows: PriceRow[];
  counts: {
    rows: number;
    offers: number;
    breaks: number;
    skipped: number;
    questions: number;
    must: number;
    look: number;
  };
}
