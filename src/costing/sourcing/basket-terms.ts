/**
 * One supplier's terms for a basket (section 4), read once: amounts in whole minor units of its currency, rates
 * in millionths, weights in whole units of any one kind (milligrams, say) as long as bands and parts agree.
 */
export interface BasketTerms {
  /** Least goods that reach the minimum order value; 0: none. */
  minimum: number;
  belowMinimum: { term: "none" } | { term: "fee"; fee: number } | { term: "refused" };
  freight: FreightTerms;
  /** Least goods from which freight is free; null: never. */
  freeFrom: number | null;
  handling: number;
  /** Null: the order crosses no customs border. */
  customs: CustomsTerms | null;
}

export type FreightTerms =
  | { model: "none" }
  | { model: "flat"; amount: number }
  | { model: "by-goods"; bands: readonly FreightBand[] }
  | { model: "by-weight"; bands: readonly FreightBand[] }
  | { model: "not-known" };

/** Ascending; the first holds from 0 whatever its `from` says, the last has no upper end. */
export interface FreightBand {
  from: number;
  amount: number;
}

export interface CustomsTerms {
  /** Whether the country counts freight in the customs value. */
  withFreight: boolean;
  dutyMillionths: number;
  /** Duty is due on a customs value over this, not at it. */
  dutyOver: number;
  taxMillionths: number;
  /** A workshop that reclaims import tax pays it and gets it back: it is charged, but no cost. */
  taxReclaimed: boolean;
  broker: number;
}
