import fc from "fast-check";
import type { Aim } from "#src/costing/price/aims.ts";
import type { Plan, PlanChannel } from "#src/shapes/plan.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { channel } from "./channels.ts";

/** Arbitrary channels and small plans to price, in currencies with none, two and three decimals. */

const PLACES: Record<string, number> = { EUR: 2, JPY: 0, KWD: 3 };

export function placesOf(currency: string): number {
  return PLACES[currency] ?? 2;
}

const rate = (most: number) => fc.integer({ min: 0, max: most }).map((parts) => (parts / 10_000).toFixed(4));

function amount(places: number, most: number, least = 0): fc.Arbitrary<string> {
  return fc.integer({ min: least, max: most }).map((minor) => (minor / 10 ** places).toFixed(places));
}

function channelIn(places: number): fc.Arbitrary<PlanChannel> {
  return fc
    .record({
      weight: fc.integer({ min: 1, max: 60 }),
      discount: fc.constantFrom("0", "0", "0.25", "0.3333", "-0.05"),
      ownPrices: fc.oneof(
        { weight: 4, arbitrary: fc.constant<PlanChannel["ownPrices"]>([]) },
        amount(places, 900, 50).map((price) => [{ edition: "full", price }]),
      ),
      taxRate: fc.constantFrom("0", "0.21", "0.055", "0.255"),
      taxStated: fc.constantFrom("inside" as const, "on-top" as const),
      feeRate: rate(1500),
      feeFixed: amount(places, 60),
      feeOnPostage: fc.boolean(),
      feeOnTax: fc.boolean(),
      postageCharged: amount(places, 600),
      postagePaid: amount(places, 600),
      packingCost: amount(places, 120),
      other: fc.record({
        name: fc.constant("Hire"),
        amount: amount(places, 3000),
        sharedOver: fc.integer({ min: 1, max: 40 }),
      }),
      minutesPerOrder: fc.constantFrom("0", "7", "12.5"),
      kitsPerOrder: fc.constantFrom("1", "1", "2", "3", "1.25"),
    })
    .map((terms) => channel(terms));
}

/** Up to three channels with their ids. */
export function channelsIn(places: number): fc.Arbitrary<PlanChannel[]> {
  return fc
    .array(channelIn(places), { minLength: 1, maxLength: 3 })
    .map((list) => list.map((one, place) => ({ ...one, id: `c${place}`, name: `C${place}` })));
}

/** A plan of two editions whose costs are charges, packing and work, and its channels. */
export const pricedPlan: fc.Arbitrary<{ made: Plan; channels: PlanChannel[]; places: number }> = fc
  .constantFrom("EUR", "JPY", "KWD")
  .chain((currency) => {
    const places = placesOf(currency);
    return fc
      .record({
        channels: channelsIn(places),
        kits: fc.integer({ min: 3, max: 40 }),
        weights: fc.tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 0, max: 5 })),
        prices: fc.tuple(amount(places, 900, 50), amount(places, 900, 50)),
        packing: amount(places, 300),
        charge: amount(places, 2000),
        minutes: fc.constantFrom("0", "4", "6.5"),
        ratePerHour: amount(places, 1500),
      })
      .map(({ channels, kits, weights, prices, packing, charge, minutes, ratePerHour }) => ({
        places,
        channels,
        made: plan({
          currency,
          run: { kits, sweepTo: 40 },
          editions: [
            edition({ id: "full", name: "Full", weight: weights[0], price: prices[0] }),
            edition({ id: "bare", name: "Bare", weight: weights[1], price: prices[1] }),
          ],
          packing: [{ id: "p", name: "P", editions: null, costPerKit: packing }],
          charges: [{ id: "c", name: "C", amount: charge, spreadOver: null }],
          work: {
            ratePerHour,
            learningSlope: "0.9",
            kitsMadeBefore: 3,
            tasks: [{ id: "t", name: "T", editions: null, minutesPerKit: minutes, setUpMinutes: "0" }],
          },
        }),
      }));
  })
  .filter(({ made }) => made.run.kits >= made.editions.length);

/** Any aim, with targets near what such plans can do. */
export function aimIn(places: number): fc.Arbitrary<Aim> {
  return fc.oneof(
    fc.constant<Aim>({ aim: "next-kit" }),
    fc.constant<Aim>({ aim: "run-even" }),
    rate(4000).map((value): Aim => ({ aim: "margin", rate: value })),
    rate(15_000).map((value): Aim => ({ aim: "mark-up", rate: value })),
    fc
      .tuple(amount(places, 5000), fc.constantFrom(null, "0", "0.25", "0.4"))
      .map(([value, taxRate]): Aim => ({ aim: "profit", amount: value, taxRate })),
    amount(places, 2000).map((value): Aim => ({ aim: "hour", rate: value })),
  );
}
