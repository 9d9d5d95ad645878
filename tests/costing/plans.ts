import type {
  Plan,
  PlanBoardQuote,
  PlanEdition,
  PlanOffer,
  PlanPart,
  PlanSupplier,
} from "#src/shapes/plan.ts";
import { channel } from "#tests/costing/price/channels.ts";

/** Small invented plans for tests: every field stands, and a test names only what it is about. */

export function supplier(over: Partial<PlanSupplier> = {}): PlanSupplier {
  return {
    id: "tamsin",
    name: "Tamsin",
    currency: "EUR",
    freight: { model: "none" },
    freeFreightFrom: null,
    handlingFee: "0",
    minimumOrderValue: null,
    belowMinimum: { term: "none" },
    leadTimeDays: null,
    ...over,
  };
}

export function offer(over: Partial<PlanOffer> = {}): PlanOffer {
  return {
    id: "offer",
    supplier: "tamsin",
    orderCode: "",
    currency: "EUR",
    priceModel: "whole-order",
    breaks: [{ quantity: 1, price: "0.10" }],
    minimumOrder: 1,
    orderMultiple: 1,
    stockShown: null,
    leadTimeDays: null,
    pricedOn: null,
    validUntil: null,
    ...over,
  };
}

export function part(over: Partial<PlanPart> = {}): PlanPart {
  return {
    id: "part",
    name: "Part",
    designators: "",
    quantities: [{ edition: "kit", perKit: 1 }],
    spareRate: "0",
    leastSpare: 0,
    freeStock: { quantity: 0, bookCost: null },
    keepShare: "0",
    onlyFromStock: false,
    pinnedOffer: null,
    offers: [offer()],
    ...over,
  };
}

export function edition(over: Partial<PlanEdition> = {}): PlanEdition {
  return { id: "kit", name: "Full kit", weight: 1, boardsPerKit: 1, price: null, ...over };
}

export function quote(over: Partial<PlanBoardQuote> = {}): PlanBoardQuote {
  return {
    id: "quote",
    boardHouse: "Kilnside",
    currency: "EUR",
    priceModel: "whole-order",
    breaks: [{ quantity: 1, price: "2.00" }],
    boardsPerPanel: null,
    pieceSize: null,
    formula: null,
    depanelling: "0",
    engineeringCharge: "0",
    stencilCharge: "0",
    freight: "0",
    leadTimeDays: null,
    pricedOn: null,
    validUntil: null,
    ...over,
  };
}

/** A plan whose every figure but takings is known: no boards, no work, nothing to pay but its parts. */
export function plan(over: Partial<Plan> = {}): Plan {
  return {
    format: "tinpenny-plan/2",
    kit: "Trial",
    revision: "A",
    currency: "EUR",
    rates: [],
    asOf: "2026-03-09",
    run: { kits: 10, sweepTo: 50 },
    editions: [edition()],
    lines: 1,
    parts: [],
    suppliers: [supplier()],
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
    work: { ratePerHour: null, learningSlope: "1", kitsMadeBefore: 0, tasks: [] },
    packing: [],
    charges: [],
    replacements: { share: "0", costEach: null },
    channels: [channel()],
    ...over,
  };
}

/** Freezes a plan through and through: proof that nothing inside is changed. */
export function frozen<T>(value: T): T {
  if (value !== null && typeof value === "object") {
    for (const inner of Object.values(value)) frozen(inner);
    Object.freeze(value);
  }
  return value;
}
