import type { Meaning } from "./meanings.ts";
import type { DecimalMark } from "./sheet.ts";

/** What one column of the list is taken to mean; the part of a guess that a person may change. */
export interface ColumnMeaning {
  /** Counted from 0. */
  column: number;
  heading: string;
  meaning: Meaning;
  /** For `price-break`: the quantity the price holds from. */
  breakQuantity: number | null;
  /** For `order-code` and `price-each` under a supplier's name ("… part number"): that name as the heading writes it. */
  supplier: string | null;
  /** For numbers and prices; `null` where the cells do not tell. */
  decimalMark: DecimalMark | null;
}

/** The input of the row stage: where the heading stands and what each column means. */
export interface ColumnMapping {
  /** `null`: the list has no heading. */
  headerRecord: number | null;
  /** Column headings and currency signs may name a currency; `null` where none is seen. */
  currency: string | null;
  columns: ColumnMeaning[];
}

export type GuessReason = "heading" | "heading-and-cells" | "cells" | "remembered" | "nothing";

export interface ColumnGuess extends ColumnMeaning {
  confidence: "sure" | "likely" | "weak";
  reason: GuessReason;
  /** The first few cells that are not empty, for the page. */
  examples: string[];
}

export interface ColumnGuesses {
  headerRecord: number | null;
  currency: string | null;
  columns: ColumnGuess[];
  /** Equal for two lists of the same shape; the key under which a settled mapping is remembered. */
  fingerprint: string;
}
