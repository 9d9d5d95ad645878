import fc from "fast-check";
import type { Plan, PlanOffer, PlanPart } from "#src/shapes/plan.ts";
import { channel } from "#tests/costing/price/channels.ts";
import { edition, offer, part, plan, quote, supplier } from "./plans.ts";

/** Arbitrary complete plans: everything known, no stock limits, no refusals; small enough for plain reckoning. */

const cents = (most: number) => fc.integer({ min: 0, max: most }).map((value) => (value / 100).toFixed(2));
const unitPrice = fc.integer({ min: 0, max: 3_000_000 }).map((value) => (value / 1e6).toFixed(6));
const share = fc.constantFrom("0", "0.25", "0.333333", "1");
const currency = fc.constantFrom("EUR", "USD", "JPY", "KWD");

export const ascending = (length: number, most: number) =>
  fc
    .uniqueArray(fc.integer({ min: 1, max: most }), { minLength: 1, maxLength: length })
    .map((quantities) => quantities.sort((a, b) => a - b));

const breaks = ascending(4, 300).chain((quantities) =>
  fc
    .array(unitPrice, { minLength: quantities.length, maxLength: quantities.length })
    .map((prices) => quantities.map((quantity, index) => ({ quantity, price: prices[index] ?? "0" }))),
);

const suppliers = fc.array(
  fc.record({
    currency,
    freight: fc.oneof(
      fc.constant({ model: "none" as const }),
      cents(900).map((amount) => ({ model: "flat" as const, amount })),
    ),
    freeFreightFrom: fc.option(cents(6000)),
    handlingFee: cents(200),
    minimumOrderValue: fc.option(cents(3000)),
    belowMinimum: fc.oneof(
      fc.constant({ term: "none" as const }),
      cents(500).map((fee) => ({ term: "fee" as const, fee })),
    ),
  }),
  { minLength: 1, maxLength: 4 },
);

function partOf(count: number): fc.Arbitrary<Omit<PlanPart, "id">> {
  return fc
    .record({
      perKit: fc.array(fc.integer({ min: 0, max: 7 }), { minLength: 2, maxLength: 2 }),
      spareRate: fc.constantFrom("0", "0.02", "0.1", "1.5"),
      leastSpare: fc.integer({ min: 0, max: 5 }),
      stock: fc.integer({ min: 0, max: 40 }),
      keepShare: share,
      offers: fc.array(
        fc.record({
          at: fc.nat({ max: count - 1 }),
          breaks,
          minimumOrder: fc.integer({ min: 1, max: 60 }),
          orderMultiple: fc.constantFrom(1, 1, 5, 7, 100),
        }),
        { minLength: 1, maxLength: 4 },
      ),
    })
    .map(({ perKit, stock, offers, ...rest }) =>
      part({
        ...rest,
        quantities: [
          { edition: "full", perKit: perKit[0] ?? 0 },
          { edition: "bare", perKit: perKit[1] ?? 0 },
        ],
        freeStock: { quantity: stock, bookCost: "0.017" },
        offers: offers.map(
          ({ at, ...terms }, index): PlanOffer => offer({ id: `o${index}`, supplier: `s${at}`, ...terms }),
        ),
      }),
    );
}

export const completePlan: fc.Arbitrary<Plan> = suppliers.chain((list) =>
  fc
    .record({
      parts: fc.array(partOf(list.length), { maxLength: 5 }),
      weights: fc.array(fc.integer({ min: 1, max: 9 }), { minLength: 2, maxLength: 2 }),
      boardsPerKit: fc.integer({ min: 0, max: 2 }),
      yieldShare: fc.constantFrom("1", "0.97", "0.8"),
      quotePrices: fc.array(cents(3000), { minLength: 3, maxLength: 3 }),
      hold: fc.integer({ min: 2, max: 13 }),
      formulaHold: fc.option(fc.integer({ min: 2, max: 6 })),
      areaUnit: fc.constantFrom("dm2" as const, "m2" as const),
      slope: fc.constantFrom("1", "0.9", "0.735"),
      madeBefore: fc.constantFrom(0, 3, 250),
      minutes: fc.array(cents(2000), { minLength: 2, maxLength: 2 }),
      ratePerHour: cents(3000),
      packing: cents(300),
      charge: cents(40_000),
      spreadOver: fc.option(fc.integer({ min: 1, max: 90 })),
      replacements: fc.record({ share, costEach: cents(500) }),
      prices: fc.array(cents(6000), { minLength: 2, maxLength: 2 }),
      channels: fc.array(
        fc.record({
          weight: fc.integer({ min: 1, max: 9 }),
          taxRate: fc.constantFrom("0", "0.21", "0.255"),
          feeRate: fc.constantFrom("0", "0.029"),
          feeFixed: cents(60),
          postageCharged: cents(700),
          postagePaid: cents(700),
          minutesPerOrder: fc.constantFrom("0", "12", "7.5"),
          kitsPerOrder: fc.constantFrom("1", "1.4"),
        }),
        { minLength: 1, maxLength: 3 },
      ),
    })
    .map((made) =>
      plan({
        rates: [
          { currency: "USD", perForeignUnit: "0.8797395971", dated: "2026-03-06" },
          { currency: "JPY", perForeignUnit: "0.005538", dated: "2026-03-06" },
          { currency: "KWD", perForeignUnit: "2.86", dated: "2026-03-06" },
        ],
        run: { kits: 10, sweepTo: 25 },
        editions: [
          edition({
            id: "full",
            weight: made.weights[0] ?? 1,
            boardsPerKit: made.boardsPerKit,
            price: made.prices[0] ?? "0",
          }),
          edition({
            id: "bare",
            name: "Bare",
            weight: made.weights[1] ?? 1,
            boardsPerKit: 1,
            price: made.prices[1] ?? "0",
          }),
        ],
        suppliers: list.map((terms, index) =>
          supplier({ id: `s${index}`, name: `Supplier ${index}`, ...terms }),
        ),
        parts: made.parts.map((one, index) => ({
          ...one,
          id: `p${index}`,
          offers: one.offers.map((each) => ({
            ...each,
            currency: list[Number(each.supplier.slice(1))]?.currency ?? "EUR",
          })),
        })),
        boards: {
          needed: true,
          size: null,
          panelTerms: [],
          yield: made.yieldShare,
          confidence: "0.9",
          chosenQuote: null,
          quotes: [
            quote({
              id: "lots",
              priceModel: "lots",
              currency: "USD",
              breaks: [5, 10, 30].map((quantity, index) => ({
                quantity,
                price: made.quotePrices[index] ?? "0",
              })),
              engineeringCharge: "9.50",
              freight: "6",
            }),
            quote({
              id: "each",
              boardHouse: "Saltmarsh",
              breaks: [
                { quantity: 1, price: "2.4" },
                { quantity: 20, price: "1.1" },
              ],
              freight: "4",
            }),
            quote({
              id: "panels",
              boardHouse: "Saltmarsh",
              boardsPerPanel: made.hold,
              depanelling: "0.065",
              breaks: [
                { quantity: 1, price: made.quotePrices[1] ?? "0" },
                { quantity: 3, price: made.quotePrices[2] ?? "0" },
              ],
              engineeringCharge: "12",
              freight: "4",
            }),
            quote({
              id: "area",
              boardHouse: "Hollow Mill",
              currency: "JPY",
              boardsPerPanel: made.formulaHold,
              pieceSize: { width: "58.125", height: "42" },
              priceModel: "formula",
              breaks: [],
              formula: { setUp: "900.5", areaRate: "97.25", areaUnit: made.areaUnit, perBoard: "31.4" },
            }),
          ],
        },
        work: {
          ratePerHour: made.ratePerHour,
          learningSlope: made.slope,
          kitsMadeBefore: made.madeBefore,
          tasks: [
            {
              id: "count",
              name: "Counting",
              editions: null,
              minutesPerKit: made.minutes[0] ?? "0",
              setUpMinutes: "30",
            },
            {
              id: "chip",
              name: "Programming",
              editions: ["full"],
              minutesPerKit: made.minutes[1] ?? "0",
              setUpMinutes: "5",
            },
          ],
        },
        packing: [{ id: "bag", name: "Bag", editions: ["full"], costPerKit: made.packing }],
        charges: [{ id: "photo", name: "Photographs", amount: made.charge, spreadOver: made.spreadOver }],
        replacements: made.replacements,
        channels: made.channels.map((terms, place) => channel({ id: `c${place}`, ...terms })),
      }),
    ),
);
