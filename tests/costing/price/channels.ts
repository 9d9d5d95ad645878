import type { PlanChannel } from "#src/shapes/plan.ts";

/** A channel that takes nothing: a test names only what it is about. */
export function channel(over: Partial<PlanChannel> = {}): PlanChannel {
  return {
    id: "site",
    name: "Own site",
    weight: 1,
    editions: null,
    discount: "0",
    ownPrices: [],
    taxRate: "0",
    taxStated: "inside",
    feeRate: "0",
    feeFixed: "0",
    feeOnPostage: true,
    feeOnTax: true,
    postageCharged: "0",
    postagePaid: "0",
    packingCost: "0",
    other: { name: "", amount: "0", sharedOver: 1 },
    minutesPerOrder: "0",
    kitsPerOrder: "1",
    ...over,
  };
}

const twentyOne = { taxRate: "0.21" };

/** Four invented channels: site, marketplace, stall, shop. */
export const FOUR: PlanChannel[] = [
  channel({
    ...twentyOne,
    weight: 55,
    feeRate: "0.015",
    feeFixed: "0.25",
    postageCharged: "4.95",
    postagePaid: "4.10",
    packingCost: "0.95",
    minutesPerOrder: "19",
  }),
  channel({
    ...twentyOne,
    id: "market",
    name: "Marketplace",
    weight: 20,
    ownPrices: [{ edition: "kit", price: "36.00" }],
    feeRate: "0.09",
    feeFixed: "0.50",
    postageCharged: "4.95",
    postagePaid: "4.10",
    packingCost: "0.95",
    minutesPerOrder: "17",
  }),
  channel({
    ...twentyOne,
    id: "stall",
    name: "Club stall",
    weight: 15,
    feeRate: "0.0175",
    other: { name: "Stall hire", amount: "45.00", sharedOver: 25 },
    minutesPerOrder: "26",
  }),
  channel({
    ...twentyOne,
    id: "shop",
    name: "Wholesale",
    weight: 10,
    discount: "0.27",
    taxStated: "on-top",
    postagePaid: "1.07",
    minutesPerOrder: "7",
  }),
];
