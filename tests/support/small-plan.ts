import type { KitPlan } from "#src/server/kit-plan.ts";
import type { Plan, PlanOffer, PlanPart } from "#src/shapes/plan.ts";
import { channel } from "#tests/costing/price/channels.ts";

const offer = (over: Partial<PlanOffer>): PlanOffer => ({
  id: "",
  supplier: "weir",
  orderCode: "",
  currency: "EUR",
  priceModel: "whole-order",
  breaks: [],
  minimumOrder: 1,
  orderMultiple: 1,
  stockShown: null,
  leadTimeDays: null,
  pricedOn: null,
  validUntil: null,
  ...over,
});

const part = (id: string, name: string, perKit: number, offers: PlanOffer[]): PlanPart => ({
  id,
  name,
  designators: `${name} 1`,
  quantities: [{ edition: "kit", perKit }],
  spareRate: "0",
  leastSpare: 0,
  freeStock: { quantity: 0, bookCost: null },
  keepShare: "0",
  onlyFromStock: false,
  pinnedOffer: null,
  offers,
});

/**
 * A plan to reckon by hand, a run of 40. Resistors 2 × 40 at 0.773875, charged 61.91; lamps free; freight 5.00;
 * bags 10.00; photographs 60.00; work 270 minutes at 18.00 an hour 81.00: together 217.91, a kit 5.44775.
 * A kit brings 12.00; ⌈217.91 ÷ 12⌉ = 19 sold pay for the run.
 */
export function smallPlan(): Plan {
  return {
    format: "tinpenny-plan/2",
    kit: "Gate Bell",
    revision: "A",
    currency: "EUR",
    rates: [],
    asOf: "2026-03-09",
    run: { kits: 40, sweepTo: 200 },
    editions: [{ id: "kit", name: "Kit", weight: 1, boardsPerKit: 0, price: "12" }],
    lines: 2,
    parts: [
      part("resistor", "R", 2, [offer({ id: "r", breaks: [{ quantity: 1, price: "0.773875" }] })]),
      part("lamp", "LA", 1, [offer({ id: "l", breaks: [{ quantity: 1, price: "0" }] })]),
    ],
    suppliers: [
      {
        id: "weir",
        name: "Weir Parts",
        currency: "EUR",
        freight: { model: "flat", amount: "5" },
        freeFreightFrom: null,
        handlingFee: "0",
        minimumOrderValue: null,
        belowMinimum: { term: "none" },
        leadTimeDays: null,
      },
    ],
    shutOutSuppliers: [],
    boards: {
      needed: false,
      size: null,
      panelTerms: [],
      yield: "1",
      confidence: "0.95",
      quotes: [],
      chosenQuote: null,
    },
    work: {
      ratePerHour: "18",
      learningSlope: "1",
      kitsMadeBefore: 0,
      tasks: [{ id: "bag", name: "Bagging", editions: null, minutesPerKit: "6", setUpMinutes: "30" }],
    },
    packing: [{ id: "bags", name: "Bags", editions: null, costPerKit: "0.25" }],
    charges: [{ id: "photos", name: "Photographs", amount: "60", spreadOver: null }],
    replacements: { share: "0", costEach: null },
    channels: [channel()],
  };
}

/** The same as a page holds it. */
export function heldSmallPlan(): KitPlan {
  return {
    plan: smallPlan(),
    spare: { rate: "0", own: [] },
    versions: { run: 1, workshop: 1, rows: { kit: 1, bag: 1, bags: 1, photos: 1 } },
  };
}
