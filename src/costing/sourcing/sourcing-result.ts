import type { BasketBill } from "./basket-bill.ts";

/** The best plan there is, and whether that is proven. Money in grains of the plan's currency unless stated. */
export interface SourcingResult {
  /** Null: no plan keeps to the limits. */
  plan: SourcingPlan | null;
  /** By how much a plan that was not looked at could be cheaper: 0 where the plan is proven to be the best. */
  gap: bigint;
  /** False: work ran out before it was even certain that no more parts can be bought. */
  complete: boolean;
}

export interface SourcingPlan {
  /** Per part the way it is bought, an index into its ways; −1: not bought. */
  ways: number[];
  /** Everything known, landed; freight that is not known is left out. */
  total: bigint;
  baskets: SourcedBasket[];
  /** Worth of what is left over. */
  leftWorth: bigint;
  /** Days until the last order arrives; null: some lead time is not known. */
  arrivesIn: number | null;
  /** Parts that are not bought, by index. */
  unbought: number[];
}

export interface SourcedBasket {
  /** Index of the supplier. */
  supplier: number;
  /** In minor units of the supplier's currency. */
  bill: BasketBill;
  /** What it costs, converted. */
  total: bigint;
  /** Null: not known. */
  weight: number | null;
}
