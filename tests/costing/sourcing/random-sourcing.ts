import fc from "fast-check";
import { minorWorth } from "#src/costing/conversion.ts";
import type { BasketTerms, FreightTerms } from "#src/costing/sourcing/basket-terms.ts";
import type { SourcingInput, SourcingPart, SourcingWay } from "#src/costing/sourcing/sourcing-input.ts";
import { plan } from "#tests/costing/plans.ts";

/** Arbitrary statements of what is for sale, with every term of section 4, small enough to try every choice. */
export interface Sizes {
  suppliers: number;
  parts: number;
  partsLeast?: number;
  ways: number;
  /** Costs are at most this many minor units; small ones make ties and near ties. */
  cost: number;
  /** Rates of duty and tax in whole percent, as general solvers need them. */
  wholePercent?: boolean;
  /** Whether weights and lead times may be unknown, freight too, and orders refused. */
  gaps: boolean;
  /** Whether orders may be refused although nothing else is missing. */
  refusals?: boolean;
}

/** Decimals and odd rates: none, two, three decimals. */
export const RATES: Record<string, string> = {
  EUR: "1",
  USD: "0.8797395971",
  JPY: "0.005538",
  KWD: "2.8612",
};

const worths = plan({
  rates: Object.entries(RATES)
    .filter(([currency]) => currency !== "EUR")
    .map(([currency, perForeignUnit]) => ({ currency, perForeignUnit, dated: "2026-03-06" })),
});

const amount = (most: number) => fc.integer({ min: 0, max: Math.max(1, Math.trunc(most)) });

function bands(cost: number) {
  return fc
    .array(fc.tuple(amount(3 * cost), amount(cost)), { minLength: 1, maxLength: 3 })
    .map((list) =>
      list
        .map(([from, charge], index) => ({ from: index === 0 ? 0 : from + index, amount: charge }))
        .sort((a, b) => a.from - b.from),
    );
}

function freight({ cost, gaps }: Sizes): fc.Arbitrary<FreightTerms> {
  return fc.oneof(
    fc.constant({ model: "none" as const }),
    amount(cost).map((flat) => ({ model: "flat" as const, amount: flat })),
    bands(cost).map((list) => ({ model: "by-goods" as const, bands: list })),
    bands(cost).map((list) => ({ model: "by-weight" as const, bands: list })),
    ...(gaps ? [fc.constant({ model: "not-known" as const })] : []),
  );
}

function terms(sizes: Sizes): fc.Arbitrary<BasketTerms> {
  const { cost, gaps } = sizes;
  const rates = sizes.wholePercent
    ? { duty: [0, 30_000, 120_000], tax: [0, 200_000, 250_000] }
    : { duty: [0, 27_000, 125_000, 370_001], tax: [0, 200_000, 255_000, 81_003] };
  return fc.record({
    minimum: fc.oneof(fc.constant(0), amount(2 * cost)),
    belowMinimum: fc.oneof(
      fc.constant({ term: "none" as const }),
      amount(cost / 2).map((fee) => ({ term: "fee" as const, fee })),
      ...(gaps || sizes.refusals ? [fc.constant({ term: "refused" as const })] : []),
    ),
    freight: freight(sizes),
    freeFrom: fc.option(amount(3 * cost)),
    handling: fc.oneof(fc.constant(0), amount(cost / 4)),
    customs: fc.option(
      fc.record({
        withFreight: fc.boolean(),
        dutyMillionths: fc.constantFrom(...rates.duty),
        dutyOver: fc.oneof(fc.constant(0), amount(2 * cost)),
        taxMillionths: fc.constantFrom(...rates.tax),
        taxReclaimed: fc.boolean(),
        broker: fc.oneof(fc.constant(0), amount(cost / 4)),
      }),
      { freq: 2 },
    ),
  });
}

function way({ suppliers, cost, gaps }: Sizes): fc.Arbitrary<SourcingWay> {
  const order = fc
    .record({
      supplier: fc.nat({ max: suppliers - 1 }),
      cost: amount(cost),
      leftOver: fc.nat({ max: 2 }),
      weight: gaps ? fc.option(amount(cost), { freq: 6 }) : amount(cost),
      leadDays: gaps ? fc.option(fc.nat({ max: 4 }), { freq: 6 }) : fc.nat({ max: 4 }),
    })
    .map((made) => ({
      ...made,
      offer: "",
      pieces: 10 + made.leftOver,
      leftWorth: BigInt(made.leftOver) * 10n ** 22n,
    }));
  return fc
    .array(order, { minLength: 1, maxLength: 2 })
    .chain((orders) =>
      fc.constantFrom({ orders: orders.slice(0, 1) }, { orders: orders.slice(0, 1) }, { orders }),
    );
}

/** The same worth object for the same currency, as a prepared plan has it. */
const worthOf = new Map(
  Object.keys(RATES).map((currency) => [currency, minorWorth(worths, currency)] as const),
);

export function sourcing(sizes: Sizes): fc.Arbitrary<SourcingInput> {
  const suppliers = fc.array(
    fc.record({ terms: terms(sizes), currency: fc.constantFrom(...Object.keys(RATES)) }),
    {
      minLength: sizes.suppliers,
      maxLength: sizes.suppliers,
    },
  );
  const parts = fc.array(fc.array(way(sizes), { minLength: sizes.gaps ? 0 : 1, maxLength: sizes.ways }), {
    minLength: sizes.partsLeast ?? 0,
    maxLength: sizes.parts,
  });
  return fc.record({ suppliers, parts, oneCurrency: fc.boolean() }).map((made) => ({
    suppliers: made.suppliers.map(({ terms: own, currency }, index) => {
      const worth = worthOf.get(made.oneCurrency ? "EUR" : currency);
      if (!worth) throw new Error(currency);
      return { id: `s${index}`, worth, terms: own };
    }),
    parts: made.parts.map(
      (ways, index): SourcingPart => ({
        id: `p${index}`,
        toBuy: 10,
        coverable: 0,
        ways: ways.map(({ orders }, at) => ({
          orders: orders.map((order) => ({ ...order, offer: `p${index}w${at}` })),
        })),
      }),
    ),
  }));
}
