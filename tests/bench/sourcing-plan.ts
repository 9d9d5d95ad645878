import { minorWorth } from "#src/costing/conversion.ts";
import { prepareLadder } from "#src/costing/ladder.ts";
import type { BasketTerms } from "#src/costing/sourcing/basket-terms.ts";
import type { PartForSale } from "#src/costing/sourcing/sale-market.ts";
import type { SourcingSupplier } from "#src/costing/sourcing/sourcing-input.ts";
import { bigPlan } from "./big-plan.ts";

/** The big plan's parts and offers as the joint choice sees them, under terms that make it one. */
export interface SourcingPlan {
  suppliers: SourcingSupplier[];
  parts: PartForSale[];
  toBuy: (kits: number) => number[];
}

const NONE = { term: "none" as const };
const FEE = (fee: number) => ({ term: "fee" as const, fee });
const bands = (...list: [number, number][]) => list.map(([from, amount]) => ({ from, amount }));

/** Free freight, bands by goods and by weight, minimum orders with a fee. Minor units; weights in milligrams. */
const USUAL: BasketTerms[] = [
  {
    minimum: 2500,
    belowMinimum: FEE(500),
    freight: { model: "flat", amount: 390 },
    freeFrom: 5000,
    handling: 0,
    customs: null,
  },
  {
    minimum: 0,
    belowMinimum: NONE,
    freight: { model: "by-goods", bands: bands([0, 690], [5000, 490], [20_000, 290], [50_000, 0]) },
    freeFrom: null,
    handling: 100,
    customs: null,
  },
  {
    minimum: 4000,
    belowMinimum: FEE(1000),
    freight: { model: "flat", amount: 590 },
    freeFrom: 15_000,
    handling: 0,
    customs: null,
  },
  {
    minimum: 0,
    belowMinimum: NONE,
    freight: { model: "flat", amount: 1200 },
    freeFrom: 10_000,
    handling: 0,
    customs: null,
  },
  {
    minimum: 2500,
    belowMinimum: FEE(800),
    freight: {
      model: "by-weight",
      bands: bands([0, 490], [500_000, 690], [2_000_000, 990], [10_000_000, 1490], [30_000_000, 2900]),
    },
    freeFrom: null,
    handling: 150,
    customs: null,
  },
  {
    minimum: 0,
    belowMinimum: NONE,
    freight: { model: "by-goods", bands: bands([0, 890], [10_000, 590]) },
    freeFrom: 40_000,
    handling: 0,
    customs: null,
  },
  {
    minimum: 5000,
    belowMinimum: FEE(1500),
    freight: { model: "flat", amount: 1800 },
    freeFrom: null,
    handling: 0,
    customs: null,
  },
  {
    minimum: 2500,
    belowMinimum: FEE(500),
    freight: { model: "flat", amount: 990 },
    freeFrom: 30_000,
    handling: 0,
    customs: null,
  },
];

/** The same with two suppliers that refuse small orders and two across a customs border. */
const HARD: BasketTerms[] = USUAL.map((terms, at) => ({
  ...terms,
  belowMinimum: at === 2 || at === 6 ? { term: "refused" } : terms.belowMinimum,
  customs:
    at === 3 || at === 6
      ? {
          withFreight: true,
          dutyMillionths: 30_000,
          dutyOver: 15_000,
          taxMillionths: 210_000,
          taxReclaimed: at === 6,
          broker: at === 6 ? 500 : 0,
        }
      : null,
}));

/** So many parts at so many suppliers, 5 offers of 8 breaks a part; more than eight suppliers repeat the terms. */
export function sourcingPlan(parts: number, suppliers: number, hard: boolean): SourcingPlan {
  const plan = bigPlan(parts, 5, 8, 1000);
  const terms = hard ? HARD : USUAL;
  const currencies = plan.suppliers.map(({ currency }) => currency);
  const own = Array.from({ length: suppliers }, (_, at): SourcingSupplier => {
    const worth = minorWorth(plan, currencies[at % currencies.length] ?? "EUR");
    if (worth === null) throw new Error("no rate");
    return { id: `s${at}`, worth, terms: terms[at % terms.length] as BasketTerms };
  });
  return {
    suppliers: own,
    parts: plan.parts.map((part, index) => ({
      id: part.id,
      weightEach: 100 + ((index * 7919) % 3000),
      split: () => null,
      offers: part.offers.map((offer, nth) => {
        const supplier = (index + nth) % suppliers;
        const currency = own[supplier]?.worth.currency ?? "EUR";
        return {
          id: offer.id,
          supplier,
          ladder: prepareLadder({ ...offer, currency }, Number.POSITIVE_INFINITY, 1),
          leadDays: null,
          leftWorth: (_, left) => BigInt(left) * 10n ** 20n,
        };
      }),
    })),
    toBuy: (kits) =>
      plan.parts.map(({ quantities, spareRate, leastSpare }) => {
        const need = kits * (quantities[0]?.perKit ?? 0);
        return need + Math.max(leastSpare, Math.ceil(Math.round(Number(spareRate) * 100 * need) / 100));
      }),
  };
}
