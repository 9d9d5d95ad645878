import type { Plan, PlanEdition, PlanSale } from "#src/shapes/plan.ts";
import { grains, ONE, scaled } from "./grains.ts";
import { minorDecimals } from "./money.ts";
import { feeOn, taxInside } from "./price/charged.ts";
import type { NeedCode } from "./problem.ts";

/** One sale in grains of the plan's currency; null where a term it needs is not known. */
export interface Sale {
  charged: bigint | null;
  taxInside: bigint | null;
  fee: bigint | null;
  postagePaid: bigint | null;
  kept: bigint | null;
}

/** Which code says that a term of sale is missing. */
export const SALE_NEEDS: Record<keyof PlanSale, NeedCode> = {
  taxRate: "no-tax-rate",
  feeRate: "no-fee-rate",
  feeFixed: "no-fixed-fee",
  postageCharged: "no-postage-charged",
  postagePaid: "no-postage-paid",
};

/**
 * Kept per order (section 10): `(P + s)/(1 + t) − f(P + s) − k − c`. The tax inside the sale,
 * `(P + s) · t/(1 + t)`, and the fee, `f(P + s) + k`, are each rounded to the minor unit as the
 * outsider charges them (section 1.3). Prices and postage are taken as they stand.
 *
 * @example P 34.00, s 4.50, t 21 %, f 2.9 %, k 0.30, c 5.10:
 * tax 6.68, fee 1.42, kept 38.50 − 6.68 − 1.42 − 5.10 = 25.30
 */
export function saleOf(plan: Plan, edition: Pick<PlanEdition, "price">): Sale {
  const { taxRate, feeRate, feeFixed, postageCharged, postagePaid } = plan.sale;
  const minorUnit = ONE / 10n ** BigInt(minorDecimals(plan.currency));
  const charged =
    edition.price === null || postageCharged === null ? null : grains(edition.price) + grains(postageCharged);
  const tax = charged === null || taxRate === null ? null : taxInside(charged, scaled(taxRate, 6), minorUnit);
  const fee =
    charged === null || feeRate === null || feeFixed === null
      ? null
      : feeOn(charged, scaled(feeRate, 6), grains(feeFixed), minorUnit);
  const paid = postagePaid === null ? null : grains(postagePaid);
  const kept =
    charged === null || tax === null || fee === null || paid === null ? null : charged - tax - fee - paid;
  return { charged, taxInside: tax, fee, postagePaid: paid, kept };
}
