import type { MinorWorth } from "#src/costing/conversion.ts";
import type { BasketTerms } from "./basket-terms.ts";

/** Everything the joint choice of suppliers (section 5) looks at, for one run size. Plain data. */
export interface SourcingInput {
  /** In the order that settles ties: by name, then id. */
  suppliers: readonly SourcingSupplier[];
  parts: readonly SourcingPart[];
}

export interface SourcingSupplier {
  id: string;
  worth: MinorWorth;
  terms: BasketTerms;
}

export interface SourcingPart {
  id: string;
  /** Pieces to buy; a part of which none is needed is left alone. */
  toBuy: number;
  /** Pieces that all its offers together cover; what is short where there is no way to buy it. */
  coverable: number;
  /**
   * The ways to buy it, in the order that settles ties. One order each, but for a part that no single offer
   * covers, whose ways are splits. Offers that may not be used are left out; a pinned offer is the only way.
   */
  ways: readonly SourcingWay[];
}

export interface SourcingWay {
  orders: readonly SourcingOrder[];
}

/** One order of one offer, as section 3 gives it for the quantity. */
export interface SourcingOrder {
  offer: string;
  /** Index into `suppliers`. */
  supplier: number;
  pieces: number;
  /** Extended price, in minor units of the supplier's currency, rounded. */
  cost: number;
  /** Pieces beyond what is to buy, and what they are worth, in grains of the plan's currency. */
  leftOver: number;
  leftWorth: bigint;
  /** Weight of the whole order; null: not known. */
  weight: number | null;
  leadDays: number | null;
}

/** What a plan has to keep to, beside the terms. */
export interface SourcingLimits {
  /** Suppliers, by index, that may not be used. */
  without?: readonly number[];
  /** Every order arrives within so many days; offers whose lead time is not known are left out. */
  latestDays?: number | null;
  leastParcels?: number;
  mostParcels?: number;
  /** Steps of search after which the best plan so far is given with its proven gap. */
  work?: number;
}
