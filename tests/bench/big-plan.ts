import type { Plan, PlanPart } from "#src/shapes/plan.ts";
import { edition, offer, part, plan, quote, supplier } from "#tests/costing/plans.ts";
import { channel } from "#tests/costing/price/channels.ts";

/** Lehmer's generator with Park and Miller's numbers (CACM 31, 1988): the same plan on every machine. */
function chance(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state * 48271) % 2147483647;
    return state % below;
  };
}

/**
 * The size section 15 names: parts × offers × breaks from eight suppliers in three currencies, four
 * editions, spare rates, multiples, keep shares, stock, lots of boards and work with learning.
 */
export function bigPlan(parts: number, offers: number, breaks: number, sweepTo: number): Plan {
  const pick = chance(20260309);
  const currencies = ["EUR", "EUR", "EUR", "USD", "GBP", "EUR", "USD", "EUR"];
  return plan({
    rates: [
      { currency: "USD", perForeignUnit: "0.8797", dated: "2026-03-06" },
      { currency: "GBP", perForeignUnit: "1.16298", dated: "2026-03-06" },
    ],
    run: { kits: 120, sweepTo },
    editions: [
      edition({ id: "full", name: "Full kit", weight: 6, price: "34.00" }),
      edition({ id: "built", name: "Built", weight: 1, price: "59.00" }),
      edition({ id: "chip", name: "Board and chip", weight: 2, price: "14.00" }),
      edition({ id: "bare", name: "Bare board", weight: 1, price: "6.50" }),
    ],
    suppliers: currencies.map((currency, index) =>
      supplier({
        id: `s${index}`,
        name: `Supplier ${index}`,
        currency,
        freight: { model: "flat", amount: `${3 + index}.90` },
        freeFreightFrom: index % 2 === 0 ? `${50 + 10 * index}` : null,
        minimumOrderValue: index % 3 === 0 ? "25" : null,
        belowMinimum: { term: "fee", fee: "5.00" },
      }),
    ),
    parts: Array.from({ length: parts }, (_, index) => bigPart(index, offers, breaks, currencies, pick)),
    boards: {
      needed: true,
      size: null,
      panelTerms: [],
      yield: "0.97",
      confidence: "0.95",
      quotes: [
        quote({ id: "lots", priceModel: "lots", breaks: lots(), engineeringCharge: "40", freight: "18" }),
        quote({
          id: "each",
          boardHouse: "Saltmarsh",
          breaks: [1, 10, 50, 200].map((q, i) => ({ quantity: q, price: `${4 - i}.10` })),
          freight: "12",
        }),
      ],
      chosenQuote: null,
    },
    work: {
      ratePerHour: "18",
      learningSlope: "0.9",
      kitsMadeBefore: 0,
      tasks: [
        { id: "count", name: "Counting out", editions: null, minutesPerKit: "6.5", setUpMinutes: "60" },
        {
          id: "chip",
          name: "Programming",
          editions: ["full", "built", "chip"],
          minutesPerKit: "2",
          setUpMinutes: "20",
        },
        { id: "build", name: "Building", editions: ["built"], minutesPerKit: "75", setUpMinutes: "0" },
      ],
    },
    packing: [{ id: "bag", name: "Bags and box", editions: null, costPerKit: "1.12" }],
    charges: [
      { id: "photo", name: "Photographs", amount: "150", spreadOver: null },
      { id: "proto", name: "Prototypes", amount: "192", spreadOver: 500 },
    ],
    replacements: { share: "0.02", costEach: "3.40" },
    channels: [
      channel({
        weight: 7,
        taxRate: "0.21",
        feeRate: "0.029",
        feeFixed: "0.30",
        postageCharged: "4.50",
        postagePaid: "5.10",
        minutesPerOrder: "12",
      }),
      channel({ id: "stall", name: "Club stall", weight: 3, taxRate: "0.21", minutesPerOrder: "20" }),
    ],
  });
}

function lots() {
  return [
    { quantity: 5, price: "9.00" },
    { quantity: 10, price: "14.00" },
    { quantity: 50, price: "48.00" },
    { quantity: 100, price: "80.00" },
  ];
}

function bigPart(
  index: number,
  offers: number,
  breaks: number,
  currencies: readonly string[],
  pick: (below: number) => number,
): PlanPart {
  const base = 20_000 + pick(600_000);
  return part({
    id: `p${index}`,
    name: `Part ${index}`,
    quantities: [
      { edition: "full", perKit: 1 + pick(6) },
      { edition: "built", perKit: 1 + pick(6) },
      { edition: "chip", perKit: pick(2) },
    ],
    spareRate: ["0", "0.02", "0.05"][pick(3)] ?? "0",
    leastSpare: pick(4),
    freeStock: { quantity: pick(5) === 0 ? pick(200) : 0, bookCost: "0.021" },
    keepShare: ["0", "0", "0.5", "1"][pick(4)] ?? "0",
    offers: Array.from({ length: offers }, (_, nth) => {
      const at = (index + nth) % currencies.length;
      const own = base + pick(Math.trunc(base / 4));
      return offer({
        id: `p${index}o${nth}`,
        supplier: `s${at}`,
        currency: currencies[at] ?? "EUR",
        orderMultiple: [1, 1, 5, 10][pick(4)] ?? 1,
        breaks: Array.from({ length: breaks }, (_, step) => ({
          quantity: [1, 10, 25, 50, 100, 250, 500, 1000][step] ?? 1000 * step,
          price: (Math.trunc(own * 0.93 ** step) / 1e6).toFixed(6),
        })),
      });
    }),
  });
}
