/**
 * What the reckoning could not do, or did and wants known. A problem is data: a stable code, the
 * things it is about, and numbers for a sentence. `problem-words.ts` turns codes into sentences.
 */

/** What is missing or impossible; figures that depend on it are not known. */
export const NEED_CODES = [
  "no-parts",
  "no-mix",
  "unpriced-part",
  "short-part",
  "order-refused",
  "no-rate",
  "no-freight",
  "no-board-quote",
  "no-board-freight",
  "no-board-yield",
  "no-board-size",
  "no-packing-cost",
  "no-hourly-rate",
  "no-replacement-cost",
  "no-stock-cost",
  "no-price",
  "no-tax-rate",
  "no-fee-rate",
  "no-fixed-fee",
  "no-postage-charged",
  "no-postage-paid",
  "no-order-packing",
  "no-other-cost",
  "no-order-minutes",
  "not-sold",
  "costs-nothing",
  "no-work",
  "not-in-run",
  "nothing-made",
  "not-even",
  "amount-too-large",
] as const;
export type NeedCode = (typeof NEED_CODES)[number];

/** Worth knowing, and no figure waits for it. */
export const CAUTION_CODES = [
  "currency-not-listed",
  "offer-expired",
  "offer-without-price",
  "offer-other-currency",
  "offer-stock-not-known",
  "price-old",
  "stock-short",
  "offer-impossible-ladder",
  "offer-without-supplier",
  "supplier-shut-out",
  "pinned-offer-unusable",
  "below-minimum-fee",
  "minimum-not-reached",
  "quote-expired",
  "quote-without-price",
  "quote-without-size",
  "pinned-quote-unusable",
] as const;
export type CautionCode = (typeof CAUTION_CODES)[number];

/** The thing a problem is about: ids of the plan; `currency` for a missing rate. */
export interface Place {
  part?: string;
  offer?: string;
  supplier?: string;
  quote?: string;
  edition?: string;
  packing?: string;
  channel?: string;
  currency?: string;
}

/** `by`: pieces short; `amount`, `currency`: money as exact text, such as what a minimum order still lacks. */
export interface ProblemFacts {
  by?: number;
  amount?: string;
  currency?: string;
  day?: string;
}

export interface Problem {
  code: NeedCode | CautionCode;
  at: Place;
  facts: ProblemFacts;
}

/** Why a figure is not known: one code, every place it holds, and the page whose field settles it. */
export interface Need {
  code: NeedCode;
  at: Place[];
  page: SourcePage;
}

/** Why no price reaches an aim; which input stands in the way. */
export const AIM_PROBLEM_CODES = [
  "nothing-kept",
  "margin-too-high",
  "price-fixed",
  "price-too-large",
  "no-such-ending",
] as const;

/** `most`: no margin comes up to this share. `channel` null: over all channels. */
export interface AimProblem {
  code: (typeof AIM_PROBLEM_CODES)[number];
  /** The field in the way: of the aim, the ending asked for, or of the channels. */
  field: "aim" | "ending" | "feeRate" | "ownPrices";
  at: { edition: string; channel: string | null };
  most?: string;
}

/** Pages of a kit on which an input stands. */
export type SourcePage = "parts" | "offers" | "boards" | "run" | "price";
